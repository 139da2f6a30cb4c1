import type { EntityManager } from '@mikro-orm/postgresql'
import type { Person } from '#server/database/entities/person'
import { recordAct, type ActSubject } from '#server/audit/record'
import { DomainError } from './domain-error'

/** What a command works with. The actor comes from here and from nowhere else, so nobody can act in another's name. */
export interface CommandContext {
  em: EntityManager
  actor: Person
  clock: () => Date
}

/** The act a command carries out, for the trail. */
export interface ActName {
  chain: string
  act: string
  subject: ActSubject
}

const retryable = new Set(['40001', '40P01'])
const codeOf = (error: unknown) => (error as { code?: string } | null)?.code ?? ''

/**
 * One act = one transaction. `work` sees a context inside the transaction and
 * writes its own trail row. A refusal is recorded in a transaction of its own
 * and thrown on; deadlocks are tried again, three times at the most.
 */
export async function runCommand<T>(context: CommandContext, name: ActName, work: (inside: CommandContext) => Promise<T>): Promise<T> {
  for (let attempt = 1; ; attempt++) {
    try {
      return await context.em.fork().transactional(async em => work({ ...context, em }))
    } catch (error) {
      if (retryable.has(codeOf(error)) && attempt < 3) continue
      const refusal = asRefusal(error)
      if (refusal) await recordRefusal(context, name, refusal)
      throw refusal ?? error
    }
  }
}

/** The database's own refusals, in words. */
function asRefusal(error: unknown): DomainError | null {
  if (error instanceof DomainError) return error
  if (codeOf(error) !== '23505') return null
  const constraint = (error as { constraint?: string }).constraint ?? ''
  if (constraint.startsWith('issue_part')) return new DomainError('not-eligible', 'You have another part in this issue already, so this one must be somebody else\'s.')
  if (constraint === 'issue_one_on_its_way') return new DomainError('wrong-state', 'Another issue of this note is on its way already; finish or abandon it first.')
  return new DomainError('stale', 'Somebody else did this a moment ago. Load the page again to see it.')
}

/** Leaves a refusal in the trail, in a transaction of its own. */
export async function recordRefusal(context: CommandContext, name: ActName, refusal: DomainError) {
  await context.em.fork().transactional(async (em) => {
    await recordAct({ ...context, em }, { ...name, outcome: 'refused', reason: `${refusal.code}: ${refusal.message}` })
  })
}
