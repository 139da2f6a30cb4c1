import canonicalize from 'canonicalize'

/**
 * The one text form of a JSON value (RFC 8785): what is stored, hashed and signed.
 * Throws a TypeError for a value that is not JSON (undefined, NaN, Infinity).
 */
export function canonicalJson(value: unknown): string {
  const text = canonicalize(value)
  if (text === undefined) throw new TypeError('Only JSON values have a canonical form.')
  return text
}
