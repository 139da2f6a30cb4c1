/** Reads `walls.0.t` from plain JSON; undefined where the path leads nowhere. */
export function getIn(value: unknown, path: string): unknown {
  let at: unknown = value
  for (const key of path.split('.')) {
    if (typeof at !== 'object' || at === null) return undefined
    at = (at as Record<string, unknown>)[key]
  }
  return at
}

/** A copy with one place changed; everything beside the way there stays the same object. */
export function setIn<T>(value: T, path: string, next: unknown): T {
  const [key, ...rest] = path.split('.')
  if (key === undefined || key === '') return next as T
  const inner: unknown = rest.length ? setIn(getIn(value, key), rest.join('.'), next) : next
  if (Array.isArray(value)) return value.map((item: unknown, i) => (String(i) === key ? inner : item)) as T
  return { ...value, [key]: inner }
}
