/** A number moves only with a new method revision that says why. */
import { describe, expect, it } from 'vitest'
import { METHOD_REVISION } from '#shared/calc/method'
import { goldenNow, movesBetween } from '../../reference/golden'
import { readGolden } from '../../reference/golden-files'
import { methodRevisions } from '../../reference/revisions'

describe('method revisions', () => {
  it('are lettered in order, each with its reason, the last one in force', () => {
    expect(methodRevisions.map(entry => entry.revision)).toEqual(methodRevisions.map((_, i) => String.fromCharCode(65 + i)))
    expect(methodRevisions.every(entry => entry.why.length > 10)).toBe(true)
    expect(methodRevisions.at(-1)?.revision).toBe(METHOD_REVISION)
  })

  it('keep their results, the older ones too', () => {
    expect(methodRevisions.filter(({ revision }) => readGolden(revision) === null)).toEqual([])
  })

  it(`${METHOD_REVISION}: no number has moved, none is missing (npm run golden adds what is new)`, async () => {
    const { moved, gone, added } = movesBetween(readGolden(METHOD_REVISION) ?? {}, await goldenNow())
    expect(moved.map(({ name, was, is }) => `${name}: was ${was}, is ${is}`)).toEqual([])
    expect(gone).toEqual([])
    expect(added).toEqual([])
  })
})

describe('moves between two results', () => {
  const row = 'row C-44 | J | an angle | mm⁴'
  it('are told beyond 1e-12 of the value, for outlines beyond what their equations make of the last bit', () => {
    expect(movesBetween({ [row]: 1 }, { [row]: 1 + 0.9e-12 }).moved).toEqual([])
    expect(movesBetween({ [row]: 1 }, { [row]: 1 + 1.1e-12 }).moved).toHaveLength(1)
    expect(movesBetween({ [row]: 1 }, { [row]: -1 }).moved).toHaveLength(1)
    expect(movesBetween({ [`outline ${row}`]: 1 }, { [`outline ${row}`]: 1 + 0.9e-10 }).moved).toEqual([])
    expect(movesBetween({ [`outline ${row}`]: 1 }, { [`outline ${row}`]: 1 + 1.1e-10 }).moved).toHaveLength(1)
    expect(movesBetween({ [row]: 1 }, { [row]: Number.NaN }).moved).toHaveLength(1)
  })

  it('tell what is gone and what is new', () => {
    expect(movesBetween({ a: 1, b: 2 }, { b: 2, c: 3 })).toEqual({ moved: [], gone: ['a'], added: ['c'] })
  })
})
