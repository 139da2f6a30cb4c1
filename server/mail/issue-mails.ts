import { showMargin } from '#shared/units/display'
import type { Issue } from '#server/database/entities/issue'
import type { Person } from '#server/database/entities/person'
import type { Standing } from '#server/notes/standing'

/** The least margin as messages and screens show it; empty where nothing is loaded. */
export const shownMargin = (issue: Issue) => issue.leastMargin === null || issue.leastMargin === undefined ? '' : showMargin(issue.leastMargin)

export const deviationsIn = ({ answers }: Standing) => answers.filter(a => a.kind === 'deviation').length

/** Everybody who had a hand in the issue, each once, the actor left out. */
export function concerned({ issue, parts }: Standing, actor: Person): Person[] {
  const all = [issue.analyst, issue.checker, issue.approver, ...parts.filter(p => p.issue.id === issue.id).map(p => p.person)]
  const people = new Map(all.flatMap(person => person ? [[person.id, person] as const] : []))
  people.delete(actor.id)
  return [...people.values()]
}
