import { randomUUID } from 'node:crypto'
import type { TickCalculation } from '#shared/schemas/acts'
import { recordAct } from '#server/audit/record'
import { TickSchema } from '#server/database/entities/tick'
import { actOnIssue } from '#server/notes/act-on-issue'
import { addPart } from '#server/notes/parts'
import { hashForTick } from '#server/notes/tick-facts'
import type { CommandContext } from '#server/utils/command-context'

/** The checker has followed a calculation, or takes the tick back. */
export function tickCalculation(context: CommandContext, issueId: string, input: TickCalculation): Promise<void> {
  return actOnIssue(context, issueId, input.ticked ? 'tick calculation' : 'untick calculation', ['tick'], async (inside, issue, name) => {
    const { em, actor, clock } = inside
    const held = await em.findOne(TickSchema, { issue, calcId: input.calcId })
    const old = held && { by: held.person.id, save: held.saveNumber }
    if (!input.ticked) {
      if (held) em.remove(held)
      await em.flush()
      return recordAct(inside, { ...name, old, new: { calculation: input.calcId } })
    }
    const hash = await hashForTick(em, issue, input.calcId)
    const tick = held ?? em.create(TickSchema, { id: randomUUID(), issue, calcId: input.calcId, person: actor, at: clock(), saveNumber: issue.saveNumber, hash })
    Object.assign(tick, { person: actor, at: clock(), saveNumber: issue.saveNumber, hash })
    await em.flush()
    await addPart(inside, issue, 'checker')
    await recordAct(inside, { ...name, old, new: { calculation: input.calcId, save: issue.saveNumber, hash } })
  })
}
