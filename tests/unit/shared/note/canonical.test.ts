/** The canonical form of JSON against the package of the RFC's author, and against the RFC's own example of order. */
import canonicalize from 'canonicalize'
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { canonicalJson } from '#shared/note/canonical'

describe('the canonical form (RFC 8785)', () => {
  it('is that of the package canonicalize, for any JSON, with names that are numbers among them', () => {
    const key = fc.oneof(fc.string(), fc.constantFrom('10', '9', '007', '1e3', 'a', 'é', '__proto__', '\ud83d\ude00'))
    const { value } = fc.letrec<{ value: unknown, leaf: unknown }>(tie => ({
      leaf: fc.oneof(fc.string({ unit: 'binary' }).filter(text => text.isWellFormed()), fc.double({ noNaN: true, noDefaultInfinity: true }), fc.boolean(), fc.constant(null), fc.integer()),
      value: fc.oneof({ maxDepth: 4 }, tie('leaf'), fc.array(tie('value'), { maxLength: 5 }), fc.array(fc.tuple(key, tie('value')), { maxLength: 6 }).map(entries => Object.fromEntries(entries))),
    }))
    fc.assert(fc.property(value, one => canonicalJson(one) === canonicalize(one)), { numRuns: 3000 })
  })

  it('orders names by their UTF-16 units, as the example of the RFC does (section 3.2.3)', () => {
    const given = { '\u20ac': 'Euro Sign', '\r': 'Carriage Return', '\ufb33': 'Hebrew Letter Dalet With Dagesh', '1': 'One', '\ud83d\ude00': 'Emoji: Grinning Face', '\u0080': 'Control', '\u00f6': 'Latin Small Letter O With Diaeresis' }
    expect(Object.values(JSON.parse(canonicalJson(given).replaceAll(/"([^"]+)":/g, (_, name: string) => `"x${name}":`)) as object)).toEqual([
      'Carriage Return', 'One', 'Control', 'Latin Small Letter O With Diaeresis', 'Euro Sign', 'Emoji: Grinning Face', 'Hebrew Letter Dalet With Dagesh',
    ])
  })

  it.each([[undefined], [Number.NaN], [{ a: Number.POSITIVE_INFINITY }], [{ 1: [Number.NaN] }], [{ 1: 0, b: Number.NaN }], [1n], [() => 1]])('has none for %s', (one) => {
    expect(() => canonicalJson(one)).toThrow(TypeError)
  })

  it('leaves out what is undefined, and takes the JSON form of dates', () => {
    expect(canonicalJson({ b: undefined, a: new Date(0), c: [undefined] })).toBe('{"a":"1970-01-01T00:00:00.000Z","c":[null]}')
    expect(canonicalJson({ 1: undefined, 0: new Date(0) })).toBe('{"0":"1970-01-01T00:00:00.000Z"}')
  })
})
