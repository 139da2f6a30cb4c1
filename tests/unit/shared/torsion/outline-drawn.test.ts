import { describe, expect, it } from 'vitest'
import fc from 'fast-check'
import { checkOutline } from '#shared/torsion/outline/outline-check'
import { polarMoments } from '#shared/torsion/outline/outline-properties'
import { roundedLoop } from '#shared/torsion/outline/rounded-loop'
import { rememberOutline, solvedOutline } from '#shared/torsion/outline/solved-outlines'
import { outlineTorsion } from '#shared/torsion/outline/outline-torsion'
import { given } from '../../../reference/engine'
import { disc, machinedAngle, rectangle, solid, tube, v } from '../../../reference/outlines'

const drawn = (...points: (readonly [number, number, number?])[]) => points.map(([x, y, radius]) => ({ x, y, ...(radius === undefined ? {} : { radius }) }))

describe('corner radii of a drawing', () => {
  it('take the corners off a square, outside and inside alike', () => {
    const square = given(roundedLoop(drawn([0, 0, 2], [10, 0, 2], [10, 10, 2], [0, 10, 2])))
    expect(given(checkOutline({ outer: square.loop, holes: [] })).properties.A).toBeCloseTo(100 - (4 - Math.PI) * 4, 10)
    const angle = given(roundedLoop(drawn([0, 0], [60, 0], [60, 15], [15, 15, 6], [15, 60], [0, 60])))
    expect(given(outlineTorsion({ outer: angle.loop, holes: [] })).J.value).toBeCloseTo(given(outlineTorsion(machinedAngle(60, 15, 6))).J.value, 6)
  })

  it('may use a whole edge, so that a square becomes a circle', () => {
    const { loop } = given(roundedLoop(drawn([-5, -5, 5], [5, -5, 5], [5, 5, 5], [-5, 5, 5])))
    expect(loop).toHaveLength(4)
    expect(given(checkOutline({ outer: loop, holes: [] })).properties.A).toBeCloseTo(25 * Math.PI, 10)
  })

  it('touch both edges tangentially at any angle', () => {
    fc.assert(fc.property(fc.double({ min: 0.3, max: 2.8, noNaN: true }), fc.double({ min: 0.01, max: 0.5, noNaN: true }), (angle, radius) => {
      const { loop } = given(roundedLoop([{ x: 10, y: 0 }, { x: 0, y: 0, radius }, { x: 10 * Math.cos(angle), y: 10 * Math.sin(angle) }]))
      const { corners } = given(checkOutline({ outer: loop, holes: [] }))
      expect(corners.filter(({ interior }) => Math.abs(interior - Math.PI) < 1e-6)).toHaveLength(2)
    }), { numRuns: 50 })
  })

  it.each([
    ['too large', drawn([0, 0], [4, 0, 3], [4, 4, 3], [0, 4]), /take 6 mm of an edge of 4 mm/],
    ['negative', drawn([0, 0], [4, 0, -1], [4, 4]), /must not be negative/],
    ['no number', drawn([0, 0], [4, 0, Number.NaN], [4, 4]), /must not be negative/],
    ['on a straight line', drawn([0, 0], [2, 0, 1], [4, 0], [4, 4]), /is no corner/],
    ['at an arc', [{ x: 0, y: 0, bulge: 0.3 }, { x: 4, y: 0, radius: 1 }, { x: 4, y: 4 }], /joins an arc/],
    ['of nothing', [], /^$/],
  ])('%s', (_, vertices, reason) => {
    const rounded = roundedLoop(vertices)
    expect(rounded.ok ? '' : rounded.reason).toMatch(reason)
  })
})

describe('polar moments', () => {
  it('are those of circle, tube and strip', () => {
    const of = (outline: Parameters<typeof checkOutline>[0], x = 0, y = 0) => polarMoments(given(checkOutline(outline)).edges, { x, y })
    // ∫ρ² = πR⁴/2, ∫ρ⁴ = πR⁶/3 (algebra).
    expect(of(disc(3)).second).toBeCloseTo(Math.PI * 81 / 2, 8)
    expect(of(disc(3)).fourth).toBeCloseTo(Math.PI * 729 / 3, 8)
    expect(of(tube(3, 2)).fourth).toBeCloseTo(Math.PI * (729 - 64) / 3, 8)
    // Strip b × t about its middle: ∫(x² + y²)² = t·b⁵/80 + b³t³/72 + b·t⁵/80.
    expect(of(rectangle(60, 2), 30, 1).fourth).toBeCloseTo(2 * 60 ** 5 / 80 + 60 ** 3 * 8 / 72 + 60 * 32 / 80, 4)
  })
})

describe('solutions that are kept', () => {
  it('are those of the engine, and may be put in from elsewhere', () => {
    const outline = solid(v(0, 0), v(7, 0), v(7, 3), v(0, 3))
    const solution = outlineTorsion(outline)
    expect(solvedOutline(outline)).toEqual(solution)
    rememberOutline(outline, solution)
    expect(solvedOutline(outline)).toBe(solution)
    for (let k = 0; k < 40; k += 1) rememberOutline(solid(v(0, 0), v(7, 0), v(7, 3 + k)), solution)
    expect(solvedOutline(outline)).not.toBe(solution)
  })
})
