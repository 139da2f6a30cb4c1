import type { EntityManager } from '@mikro-orm/postgresql'
import type { RegisterQuery, RegisterRow } from '#shared/schemas/notes'
import type { Person } from '#server/database/entities/person'

interface Row {
  number: string, note_id: string, id: string, letter: string, title: string, part: string, drawing_issue: string
  code: string, project_name: string, state: string, releasing: boolean
  analyst: string | null, checker: string | null, approver: string | null
  least_margin: number | null, least_margin_mode: string | null, last_change_at: Date, total: string
}

/** Columns a register may be sorted by; nothing typed ever becomes a column name. */
const columns: Record<RegisterQuery['sort'], string> = {
  number: 'n.number', title: 'i.title', part: 'i.part', state: 'i.state', margin: 'i.least_margin', lastChange: 'i.last_change_at',
}

const escaped = (text: string) => `%${text.replace(/[\\%_]/g, c => `\\${c}`)}%`

function conditions(person: Person, query: RegisterQuery) {
  const where: string[] = []
  const values: unknown[] = []
  const add = (sql: string, ...more: unknown[]) => {
    where.push(sql)
    values.push(...more)
  }
  if (!person.auditor && !person.administrator) add('n.project_id in (select project_id from project_member where person_id = ?)', person.id)
  if (query.state) add('i.state = ?', query.state)
  if (query.project) add('p.code = ?', query.project)
  if (query.person) add('? in (i.analyst_id, i.checker_id, i.approver_id)', query.person)
  for (const word of query.q.split(/\s+/).filter(Boolean).slice(0, 8)) {
    add(`(concat_ws(' ', n.number, i.letter, i.title, i.part, p.code, p.name, a.name, c.name, v.name) ilike ?)`, escaped(word))
  }
  return { where: where.length ? `where ${where.join(' and ')}` : '', values }
}

/** The newest issue of every note a person may see: searched, filtered, sorted and paged by the database. */
export async function presentRegister(em: EntityManager, person: Person, query: RegisterQuery) {
  const { where, values } = conditions(person, query)
  const rows = await em.execute<Row[]>(`
    select n.number, n.id as note_id, i.id, i.letter, i.title, i.part, i.drawing_issue, p.code, p.name as project_name, i.state,
      i.release_requested_at is not null and i.state = 'for approval' as releasing,
      a.name as analyst, c.name as checker, v.name as approver, i.least_margin, i.least_margin_mode, i.last_change_at,
      count(*) over () as total
    from note n
    join lateral (select * from issue where note_id = n.id order by created_at desc limit 1) i on true
    join project p on p.id = n.project_id
    left join person a on a.id = i.analyst_id
    left join person c on c.id = i.checker_id
    left join person v on v.id = i.approver_id
    ${where}
    order by ${columns[query.sort]} ${query.dir === 'asc' ? 'asc' : 'desc'} nulls last, n.number asc
    limit ? offset ?`, [...values, query.size, (query.page - 1) * query.size])
  return { items: rows.map(present), total: Number(rows[0]?.total ?? 0), page: query.page, size: query.size }
}

const present = (row: Row): RegisterRow => ({
  number: row.number, noteId: row.note_id, issueId: row.id, letter: row.letter, title: row.title, part: row.part, drawingIssue: row.drawing_issue,
  project: { code: row.code, name: row.project_name }, state: row.state, releasing: row.releasing,
  analyst: row.analyst, checker: row.checker, approver: row.approver,
  leastMargin: row.least_margin, leastMarginMode: row.least_margin_mode, lastChange: new Date(row.last_change_at).toISOString(),
})
