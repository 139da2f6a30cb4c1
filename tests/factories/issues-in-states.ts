/** Issues in every state they can be in, brought there by the commands and the running worker. */
import type { MikroORM } from '@mikro-orm/postgresql'
import { expect, vi } from 'vitest'
import { abandonIssue } from '#server/commands/abandon-issue'
import { addRemark } from '#server/commands/add-remark'
import { openNextIssue } from '#server/commands/open-next-issue'
import { changeMetadata } from '#server/commands/change-metadata'
import { requestRelease } from '#server/commands/request-release'
import { returnNote } from '#server/commands/return-note'
import { setMember } from '#server/commands/set-member'
import { withdrawIssue } from '#server/commands/withdraw-issue'
import { layPen } from '#server/notes/pen'
import type { Person } from '#server/database/entities/person'
import { ISSUE_STATES } from '#shared/review/states'
import { checked, draftReady, expectOf, forApproval, issueOf, passedAgain, type Team } from './note-on-its-way'
import { contextOf, makePerson, makeTeam, password } from './people'

export const COLUMNS = [...ISSUE_STATES.slice(0, 3), 'being released', ...ISSUE_STATES.slice(3)] as const
export type Column = (typeof COLUMNS)[number]

const reason = 'The reason is written here.'

export class IssuesInStates {
  private constructor(private readonly orm: MikroORM, private readonly team: Team, private readonly others: Record<'colleague' | 'otherChecker' | 'otherApprover', Person>) {}

  static async with(orm: MikroORM): Promise<IssuesInStates> {
    const team = await makeTeam(orm)
    const join = async (name: string, role: 'analyst' | 'checker' | 'approver') => {
      const person = await makePerson(orm, team.administrator, name)
      await setMember(contextOf(orm, team.administrator), team.project.id, { personId: person.id, roles: [role] })
      return person
    }
    return new IssuesInStates(orm, team, { colleague: await join('Cora Colleague', 'analyst'), otherChecker: await join('Olga Other', 'checker'), otherApprover: await join('Oskar Other', 'approver') })
  }

  get people() {
    return { ...this.team, ...this.others }
  }

  named() {
    return { checkerId: this.team.checker.id, approverId: this.others.otherApprover.id }
  }

  private as = (who: 'analyst' | 'checker' | 'approver') => contextOf(this.orm, this.team[who])
  private now = async (id: string) => expectOf(await issueOf(this.orm, id))

  private async withRemark(make: typeof checked) {
    const { id, calcId } = await make(this.orm, this.team)
    await addRemark(this.as('checker'), id, { anchor: { kind: 'calculation', calcId }, text: 'Nominal?', proposed: null, fileId: null })
    return id
  }

  private async returned() {
    const id = await this.withRemark(checked)
    await returnNote(this.as('checker'), id, { expect: await this.now(id), reason })
    return id
  }

  /** The release pressed, and made by the worker. */
  private async release(id: string) {
    await requestRelease(this.as('approver'), id, { expect: await this.now(id), password, acceptedDeviations: [] })
    await vi.waitFor(async () => expect((await issueOf(this.orm, id)).state).toBe('released'), { timeout: 30_000, interval: 100 })
    return id
  }

  private async released() {
    return this.release((await forApproval(this.orm, this.team)).id)
  }

  /** Pressed as far as the lock; no job is left, so it stays so. */
  private async beingReleased() {
    const { id } = await forApproval(this.orm, this.team)
    await this.orm.em.fork().execute('update issue set release_requested_at = now() where id = ?', [id])
    return id
  }

  private async superseded() {
    const id = await this.released()
    const next = await openNextIssue(this.as('analyst'), id)
    await changeMetadata(this.as('analyst'), next.id, { title: 'Strip under torsion', part: 'X-1', drawingIssue: 'B', changeNote: 'Drawing issue B.', save: 1 })
    await passedAgain(this.orm, this.team, next.id)
    await this.release(next.id)
    return id
  }

  private async withdrawn() {
    const id = await this.released()
    await withdrawIssue(this.as('approver'), id, { expect: await this.now(id), reason, password })
    return id
  }

  private async abandoned() {
    const id = await this.returned()
    await abandonIssue(this.as('analyst'), id, { expect: await this.now(id), reason })
    return id
  }

  /** An issue of each state with something in it for every act: answers, ticks, a remark that is open. */
  make(column: Column): Promise<string> {
    const makers: Record<Column, () => Promise<string>> = {
      'draft': () => this.returned(), 'in check': () => this.withRemark(checked), 'for approval': async () => (await forApproval(this.orm, this.team)).id,
      'being released': () => this.beingReleased(), 'released': () => this.released(), 'superseded': () => this.superseded(),
      'withdrawn': () => this.withdrawn(), 'abandoned': () => this.abandoned(),
    }
    return makers[column]()
  }

  /** The same where nothing stands in the way of the next act. */
  async complete(column: Column): Promise<string> {
    if (column === 'draft') {
      const { id } = await draftReady(this.orm, this.team)
      await layPen(this.as('analyst'), await issueOf(this.orm, id))
      return id
    }
    if (column === 'in check') return (await checked(this.orm, this.team)).id
    return this.make(column)
  }
}
