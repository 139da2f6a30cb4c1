/**
 * Elementary functions differ in the last bit between engines of JavaScript and their versions. No result may hang
 * on that bit: a server and a browser would show different numbers. Here every tenth value of them is off by one bit.
 */
import { afterEach, describe, expect, it } from 'vitest'
import { loadEngine } from '../../../reference/engine'
import { chapterOf, rowKey, sectionOf } from '../../../reference/method-sections'
import { referenceRows } from '../../../reference/rows'

const functions = ['sin', 'cos', 'tan', 'atan', 'atan2', 'asin', 'acos', 'log', 'log1p', 'exp', 'expm1', 'sinh', 'cosh', 'tanh', 'pow', 'cbrt'] as const
const bit = 2.22e-16
const exactMath = Math

/** A sequence that repeats, 0…1. */
function sequence(seed: number): () => number {
  let state = seed
  return () => {
    state = (Math.imul(state, 1_664_525) + 1_013_904_223) >>> 0
    return state / 2 ** 32
  }
}

/** Math with every tenth value off by one bit, up or down. */
function blurredMath(seed: number): Math {
  const next = sequence(seed)
  const blur = (value: number): number => next() < 0.1 ? value * (1 + (next() < 0.5 ? bit : -bit)) : value
  const blurred = Object.fromEntries(functions.map((name) => {
    const exact = exactMath[name] as (a: number, b?: number) => number
    return [name, (a: number, b?: number) => blur(exact(a, b))]
  }))
  return Object.assign(Object.create(Math), blurred, { hypot: (...given: number[]) => blur(exactMath.hypot(...given)) }) as Math
}
afterEach(() => {
  globalThis.Math = exactMath
})

describe('the last bit of elementary functions', () => {
  it.each([1, 2, 3])('moves no reference case, sequence %i', async (seed) => {
    const engine = await loadEngine()
    const exact = referenceRows.map(row => row.actual(engine))
    globalThis.Math = blurredMath(seed)
    // A copy, so that nothing solved before is taken again.
    const blurred = { ...engine }
    const far = referenceRows.flatMap((row, i) => {
      const [a = Number.NaN, b] = [exact[i], row.actual(blurred)]
      const most = chapterOf(sectionOf(row)) === '4' ? 1e-10 : 1e-12
      return Math.abs(a - b) <= most * Math.abs(a) ? [] : [`${rowKey(row)}: ${a}, then ${b}`]
    })
    expect(far).toEqual([])
  })
})
