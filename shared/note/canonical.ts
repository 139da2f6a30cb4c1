/**
 * The one text form of a JSON value (RFC 8785): what is stored, hashed and signed. Numbers and strings are written
 * as JSON.stringify writes them, which is what the RFC asks for; what it adds is the order of the members. So the
 * members are brought into their order and one JSON.stringify writes all: a save does it over megabytes, where the
 * usual package, which is the measure of the tests, takes four times as long and leaves its pieces to be collected.
 * @throws TypeError for a value that is not JSON (undefined, NaN, Infinity).
 */
export function canonicalJson(value: unknown): string {
  if (absent(value)) throw notJson()
  try {
    return JSON.stringify(ordered(value))
  } catch (error) {
    if (error !== OUT_OF_ORDER) throw error
    return written(value)
  }
}

/** Thrown where an object cannot hold its members in their order. */
const OUT_OF_ORDER = new Error('members out of order')
const notJson = () => new TypeError('Only JSON values have a canonical form.')
const absent = (value: unknown): boolean => value === undefined || typeof value === 'symbol' || typeof value === 'function'
const hasJsonForm = (value: object): value is { toJSON: () => unknown } => 'toJSON' in value && typeof value.toJSON === 'function'

/** The same value with the members of every object in the order of the UTF-16 units of their names. */
function ordered(value: unknown): unknown {
  if (typeof value === 'number' && !Number.isFinite(value)) throw notJson()
  if (typeof value === 'bigint') throw notJson()
  if (typeof value !== 'object' || value === null) return value
  if (hasJsonForm(value)) return ordered(value.toJSON())
  if (Array.isArray(value)) return value.map(ordered)
  const members: Record<string, unknown> = {}
  for (const name of Object.keys(value).sort()) {
    // JavaScript puts names that are whole numbers first, by their value, and takes __proto__ for something else.
    if (isIndex(name) || name === '__proto__') throw OUT_OF_ORDER
    members[name] = ordered((value as Record<string, unknown>)[name])
  }
  return members
}

/** Asked of every member of a note: most names are told by their first letter. */
function isIndex(name: string): boolean {
  const first = name.charCodeAt(0)
  return first >= 48 && first <= 57 && /^\d+$/.test(name)
}

/** Piece by piece, for what no object can hold in order. */
function written(value: unknown): string {
  if (typeof value === 'bigint' || (typeof value === 'number' && !Number.isFinite(value))) throw notJson()
  if (typeof value !== 'object' || value === null) return absent(value) ? 'null' : JSON.stringify(value)
  if (hasJsonForm(value)) return written(value.toJSON())
  if (Array.isArray(value)) return `[${value.map(written).join(',')}]`
  const inside = value as Record<string, unknown>
  const members = Object.keys(value).sort().filter(name => !absent(inside[name])).map(name => `${JSON.stringify(name)}:${written(inside[name])}`)
  return `{${members.join(',')}}`
}
