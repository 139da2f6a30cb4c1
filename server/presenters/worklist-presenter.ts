import type { EntityManager } from '@mikro-orm/postgresql'
import type { IssueState } from '#shared/review/states'
import { waitingFor, type Waiting } from '#shared/review/worklist'
import type { Person } from '#server/database/entities/person'

interface Row {
  id: string, number: string, letter: string, title: string, code: string, project_name: string, state: IssueState
  release_requested_at: Date | null, release_failure: string | null, last_change_at: Date, least_margin: number | null, cautions: number
  is_analyst: boolean, is_checker: boolean, is_approver: boolean, remarks_open: string, remarks_answered: string
  returned_by: string | null, returned_why: string | null
}

export interface WorklistItem {
  issueId: string, number: string, letter: string, title: string, project: { code: string, name: string }, state: IssueState
  why: string, act: Waiting['act'], since: string, leastMargin: number | null, cautions: number
}

/** Issues on their way in which the person has something to do, the longest waiting first. */
const sql = `
  select i.id, n.number, i.letter, i.title, p.code, p.name as project_name, i.state, i.release_requested_at, i.release_failure, i.last_change_at, i.least_margin, i.cautions,
    coalesce(i.checker_id = :person, false) as is_checker, coalesce(i.approver_id = :person, false) as is_approver,
    (coalesce(i.analyst_id = :person, false) or exists (select 1 from issue_part q where q.issue_id = i.id and q.person_id = :person and q.part = 'contributor')) as is_analyst,
    (select count(*) from remark r where r.issue_id = i.id and r.state = 'open') as remarks_open,
    (select count(*) from remark r where r.issue_id = i.id and r.state = 'answered') as remarks_answered,
    back.by as returned_by, back.reason as returned_why
  from issue i
  join note n on n.id = i.note_id
  join project p on p.id = n.project_id
  left join lateral (
    select a.name as by, t.reason from trail_row t join person a on a.id = t.actor_id
    where t.chain = 'note:' || n.id and t.act in ('return', 'submit') and t.outcome = 'done' and t.subject_id = i.id::text
    order by t.seq desc limit 1
  ) back on true
  where i.state in ('draft', 'in check', 'for approval')
    and exists (select 1 from project_member m where m.project_id = p.id and m.person_id = :person)
    and (:person in (i.analyst_id, i.checker_id, i.approver_id) or exists (select 1 from issue_part q where q.issue_id = i.id and q.person_id = :person))
  order by i.last_change_at`

function waiting(row: Row): WorklistItem[] {
  const found = waitingFor({
    state: row.state, releasing: row.release_requested_at !== null, releaseFailure: row.release_failure,
    isAnalyst: row.is_analyst, isChecker: row.is_checker, isApprover: row.is_approver,
    returned: row.returned_by && row.returned_why ? { by: row.returned_by, reason: row.returned_why } : null,
    remarks: { open: Number(row.remarks_open), answered: Number(row.remarks_answered) },
  })
  if (!found) return []
  return [{
    issueId: row.id, number: row.number, letter: row.letter, title: row.title, project: { code: row.code, name: row.project_name }, state: row.state,
    ...found, since: new Date(row.last_change_at).toISOString(), leastMargin: row.least_margin, cautions: row.cautions,
  }]
}

export async function presentWorklist(em: EntityManager, person: Person): Promise<WorklistItem[]> {
  // The query builder knows no named parameters: each occurrence takes its place in order.
  const values = Array.from(sql.matchAll(/:person/g), () => person.id)
  const rows = await em.execute<Row[]>(sql.replaceAll(':person', '?'), values)
  return rows.flatMap(waiting)
}
