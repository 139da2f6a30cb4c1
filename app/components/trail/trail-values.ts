/** Old and new values of an act are stored as canonical JSON; these put them into words. */
export interface ValueLine { name: string, was: string, is: string }

function parsed(text: string | null): unknown {
  if (text === null) return null
  try {
    return JSON.parse(text) as unknown
  } catch {
    return text
  }
}
const isRecord = (value: unknown): value is Record<string, unknown> => typeof value === 'object' && value !== null && !Array.isArray(value)

function inWords(value: unknown): string {
  if (value === undefined || value === null) return ''
  if (typeof value === 'string') return value
  if (typeof value === 'boolean') return value ? 'yes' : 'no'
  if (Array.isArray(value)) return value.map(inWords).join(', ') || 'none'
  return JSON.stringify(value)
}

/** What was and what became, one line a name; a bare value stands under `value`. */
export function valueLines(old: string | null, now: string | null): ValueLine[] {
  const [before, after] = [parsed(old), parsed(now)]
  if (before === null && after === null) return []
  if (!isRecord(before) && !isRecord(after)) return [{ name: 'value', was: inWords(before), is: inWords(after) }]
  const [was, is] = [isRecord(before) ? before : {}, isRecord(after) ? after : {}]
  return [...new Set([...Object.keys(was), ...Object.keys(is)])].map(name => ({ name, was: inWords(was[name]), is: inWords(is[name]) }))
}

const identifier = /^[0-9a-f-]{32,64}$/

/** The new values in one line, without ids and fingerprints; cut where it is long. */
export function valueSummary(now: string | null): string {
  const told = valueLines(null, now).filter(line => line.is !== '' && !identifier.test(line.is)).map(line => line.name === 'value' ? line.is : `${line.name} ${line.is}`).join(', ')
  return told.length > 90 ? `${told.slice(0, 89)}…` : told
}

/** The number of the save an act on an issue speaks of, which can be rebuilt. */
export function saveOf(subjectType: string, now: string | null): number | null {
  const after = parsed(now)
  return subjectType === 'issue' && isRecord(after) && typeof after.save === 'number' ? after.save : null
}
