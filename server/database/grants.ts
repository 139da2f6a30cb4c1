/** What the application's role may do, table by table. Everything else is refused by the database. */
const grants: Record<string, string> = {
  attempt: 'select, insert, update, delete',
  check_entry: 'select, insert, update, delete',
  guard_answer: 'select, insert, update',
  issue: 'select, insert, update',
  issue_part: 'select, insert',
  lease: 'select, insert, update, delete',
  loose_decision: 'select, insert, update, delete',
  mail: 'select, insert, update',
  note: 'select, insert',
  one_time_link: 'select, insert, update',
  person: 'select, insert, update',
  project: 'select, insert, update',
  project_member: 'select, insert, delete',
  remark: 'select, insert, update',
  remark_entry: 'select, insert',
  save: 'select, insert, update (label, snapshot)',
  signature: 'select, insert, update (voided_at, void_reason)',
  stored_file: 'select, insert',
  tick: 'select, insert, update, delete',
  trail_head: 'select, insert, update',
  trail_row: 'select, insert',
}

/** SQL that gives `role` exactly these rights. Repeatable. */
export function grantStatements(role: string): string {
  const name = `"${role.replaceAll('"', '""')}"`
  const tables = Object.entries(grants).map(([table, rights]) => `grant ${rights} on ${table} to ${name};`)
  return [
    `grant usage on schema public to ${name};`,
    `revoke all on all tables in schema public from ${name};`,
    ...tables,
    `grant usage on schema pgboss to ${name};`,
    `grant select, insert, update, delete on all tables in schema pgboss to ${name};`,
    `grant usage, select on all sequences in schema pgboss to ${name};`,
    `grant execute on all functions in schema pgboss to ${name};`,
  ].join('\n')
}
