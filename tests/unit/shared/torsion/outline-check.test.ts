import { describe, expect, it } from 'vitest'
import type { Outline } from '#shared/torsion/outline/outline'
import { checkOutline, windingNumber } from '#shared/torsion/outline/outline-check'
import { circleLoop, loopEdges, reversedLoop } from '#shared/torsion/outline/outline'
import { outlineTorsion } from '#shared/torsion/outline/outline-torsion'
import { reentrantVertices, unboundedSentence } from '#shared/torsion/outline/reentrant'
import { given } from '../../../reference/engine'
import { machinedAngle, quarter, rectangle, sector, solid, tube, v } from '../../../reference/outlines'

const reasonOf = (outline: Outline): string => {
  const result = outlineTorsion(outline)
  return result.ok ? '' : result.reason
}

describe('an outline that bounds no section', () => {
  it.each<[string, Outline, RegExp]>([
    ['crossing edges', solid(v(0, 0), v(2, 2), v(2, 0), v(0, 2)), /meet at \(1, 1\)/],
    ['an arc through the opposite side', solid(v(0, 0), v(10, 0), v(10, 1, -0.9), v(0, 1)), /meet/],
    ['a double vertex', solid(v(0, 0), v(1, 0), v(1, 0), v(1, 1)), /no length; remove the double vertex/],
    ['an edge walked back', solid(v(0, 0), v(2, 0), v(1, 0), v(1, 1)), /folds back/],
    ['a zero-width slit', solid(v(0, 0), v(4, 0), v(4, 4), v(2, 4), v(2, 2), v(2, 4), v(0, 4)), /folds back|meet/],
    ['a gap of 10⁻⁹', solid(v(0, 0), v(4, 0), v(4, 4), v(2 + 1e-9, 4), v(2, 1), v(2 - 1e-9, 4), v(0, 4)), /folds back|come within/],
    ['a wall of 10⁻⁹', { outer: circleLoop(0, 0, 1), holes: [circleLoop(0, 0, 1 - 1e-9)] }, /come within 1e-9|meet/],
    ['a hole outside', { outer: circleLoop(0, 0, 2), holes: [circleLoop(5, 0, 1)] }, /Hole 1 lies outside/],
    ['a hole that touches', { outer: circleLoop(0, 0, 2), holes: [circleLoop(1, 0, 1)] }, /meet at \(2, /],
    ['overlapping holes', { outer: circleLoop(0, 0, 9), holes: [circleLoop(0, 0, 2), circleLoop(1, 0, 2)] }, /meet/],
    ['a hole in a hole', { outer: circleLoop(0, 0, 9), holes: [circleLoop(0, 0, 4), circleLoop(0, 0, 2)] }, /Hole 2 lies in hole 1/],
    ['the same hole twice', { outer: circleLoop(0, 0, 9), holes: [circleLoop(0, 0, 4), circleLoop(0, 0, 4)] }, /meet/],
    ['no number', solid(v(0, 0), v(Number.NaN, 0), v(1, 1)), /vertex 2 is no point/],
    ['infinity', solid(v(0, 0), v(Infinity, 0), v(1, 1)), /vertex 2 is no point/],
    ['nothing', solid(), /at least two vertices/],
    ['one vertex', solid(v(0, 0, 1)), /at least two vertices/],
    ['two vertices and no arc', solid(v(0, 0), v(1, 0)), /folds back/],
    ['a point', solid(v(0, 0), v(0, 0), v(0, 0)), /measures 0 mm/],
    ['far off', solid(v(1e9, 0), v(1e9 + 1, 0), v(1e9, 1)), /too far from the origin/],
    ['2,001 edges', solid(...Array.from({ length: 2001 }, (_, k) => v(Math.cos(k * Math.PI / 1000.5), Math.sin(k * Math.PI / 1000.5)))), /2001 edges/],
    ['too much detail', solid(...Array.from({ length: 400 }, (_, k) => v((10 + k % 2) * Math.cos(k * Math.PI / 200), (10 + k % 2) * Math.sin(k * Math.PI / 200)))), /needs 9600 unknowns/],
  ])('%s', (_, outline, reason) => expect(reasonOf(outline)).toMatch(reason))
})

describe('a sound outline', () => {
  it('is wound with the material on the left, whichever way it was given', () => {
    const clockwise: Outline = { outer: reversedLoop(circleLoop(3, 1, 5)), holes: [circleLoop(4, 1, 2)] }
    const { outline, properties } = given(checkOutline(clockwise))
    expect(properties.A).toBeCloseTo(21 * Math.PI, 10)
    expect(properties.centroid.x).toBeCloseTo((25 * 3 - 4 * 4) / 21, 12)
    expect(outline.outer.every(({ bulge }) => (bulge ?? 0) > 0)).toBe(true)
    expect(outline.holes[0]?.every(({ bulge }) => (bulge ?? 0) < 0)).toBe(true)
  })

  it('keeps the names of its edges when it is turned round', () => {
    const names = (outline: Outline): string[] => given(checkOutline(outline)).edges.map(({ name }) => name).sort()
    const drawn = rectangle(3, 2)
    expect(names({ outer: reversedLoop(drawn.outer), holes: [] })).toEqual(names(drawn))
    expect(names(solid(v(0, 0), v(0, 1), v(1, 0)))).toEqual(['edge 1', 'edge 2', 'edge 3'])
  })

  it('has the exact area properties of its arcs', () => {
    // Semicircle R = 1: A = π/2, centroid 4/3π from the diameter, I about the diameter π/8.
    const { properties } = given(checkOutline(solid(v(-1, 0), v(1, 0, 1))))
    expect(properties.A).toBeCloseTo(Math.PI / 2, 14)
    expect(properties.centroid.y).toBeCloseTo(4 / (3 * Math.PI), 14)
    expect(properties.Iyy).toBeCloseTo(Math.PI / 8, 14)
    expect(properties.Ixx).toBeCloseTo(Math.PI / 8 - 8 / (9 * Math.PI), 14)
    // A quarter of a circle more than a square: A = 1 + (π/4 − ½)·… on one side of bulge tan(π/8).
    expect(given(checkOutline(solid(v(0, 0, quarter), v(1, 0), v(1, 1), v(0, 1)))).properties.A).toBeCloseTo(1 + (Math.PI / 4 - 0.5) / 2, 14)
  })

  it('loses no digits far from the origin or on a nearly straight arc', () => {
    const far = given(checkOutline(solid(v(1e5, 1e5), v(1e5 + 3, 1e5), v(1e5 + 3, 1e5 + 2), v(1e5, 1e5 + 2)))).properties
    expect(far.Ixx).toBeCloseTo(2, 8)
    const bulge = 1e-5
    const { properties } = given(checkOutline(solid(v(0, 0, bulge), v(1, 0), v(1, 1), v(0, 1))))
    // Flat segment: area ⅔·chord·rise, rise = bulge/2.
    expect(properties.A - 1).toBeCloseTo(bulge / 3, 12)
  })

  it('knows inside from outside across arcs', () => {
    const edges = loopEdges(solid(v(-1, 0), v(1, 0, 1)).outer)
    expect([{ x: 0, y: 0.99 }, { x: 0, y: 1.01 }, { x: 0, y: -0.01 }, { x: 0.9, y: 0.9 }].map(point => windingNumber(edges, point) !== 0)).toEqual([true, false, false, false])
  })
})

describe('sharp re-entrant vertices', () => {
  it('are found with the thickness behind them, and no number stands for the stress there', () => {
    const result = given(outlineTorsion(machinedAngle(60, 5, 0)))
    if (result.shear.bounded) throw new Error('bounded')
    expect(result.shear.vertices).toMatchObject([{ at: { x: 5, y: 5 }, thickness: 5, excluded: 2.5, edges: ['edge 3', 'edge 4'] }])
    expect(result.shear.vertices[0]?.interior).toBeCloseTo(1.5 * Math.PI, 12)
    const { first } = result.shear.outside ?? {}
    expect(Math.hypot((first?.at.x ?? 0) - 5, (first?.at.y ?? 0) - 5)).toBeGreaterThanOrEqual(2.5)
    expect(unboundedSentence(result.shear.vertices[0] ?? expect.fail())).toBe('Unbounded in linear elasticity at (5, 5), between edge 3 and edge 4: a finite value needs the real fillet radius.')
  })

  it('are the corners of a rectangular hole, and the apex of a sector beyond 180°', () => {
    const hollow: Outline = { outer: circleLoop(0, 0, 10), holes: [rectangle(4, 4).outer] }
    expect(reentrantVertices(given(checkOutline(hollow))).length).toBe(4)
    expect(reentrantVertices(given(checkOutline(sector(270)))).length).toBe(1)
    expect(reentrantVertices(given(checkOutline(sector(150)))).length).toBe(0)
    expect(reentrantVertices(given(checkOutline(tube(5, 3)))).length).toBe(0)
  })

  it('leave the greatest shear bounded at 184°, where a nearly straight vertex carries no real corner', () => {
    const nearly = given(outlineTorsion(solid(v(-10, 0), v(0, 10 * Math.tan(2 * Math.PI / 180)), v(10, 0), v(10, 10), v(-10, 10))))
    expect(nearly.shear.bounded).toBe(true)
  })
})
