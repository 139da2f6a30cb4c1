/** Outlines made from walls: shapes against those drawn by hand, laws, and what is refused. */
import { describe, expect, it } from 'vitest'
import fc from 'fast-check'
import type { Outline } from '#shared/torsion/outline/outline'
import type { AreaProperties } from '#shared/torsion/outline/outline-properties'
import type { WalledSection } from '#shared/torsion/outline/from-walls/wall-sides'
import { checkOutline } from '#shared/torsion/outline/outline-check'
import { outlineEdges } from '#shared/torsion/outline/outline'
import { outlineOfWalls } from '#shared/torsion/outline/from-walls/outline-of-walls'
import { given } from '../../../reference/engine'
import { bentHat, machinedAngle, machinedTee, twoCellBox } from '../../../reference/outlines'
import * as sections from '../../../reference/sections'
import { roundBox, twoCellWalls } from '../../../reference/walls-outline-rows'

const outlineOf = (section: WalledSection): Outline => given(outlineOfWalls(section)).outline
const propertiesOf = (outline: Outline): AreaProperties => given(checkOutline(outline)).properties
const reasonOf = (section: WalledSection): string => {
  const made = outlineOfWalls(section)
  return made.ok ? 'made' : made.reason
}
/** What no motion in the plane changes: area, polar moment, and the product of the principal moments. */
const invariants = ({ A, Ixx, Iyy, Ixy, Ip }: AreaProperties): number[] => [A, Ip, Ixx * Iyy - Ixy * Ixy]
function same(one: AreaProperties, other: AreaProperties, tolerance = 1e-9): void {
  const expected = invariants(other)
  for (const [index, value] of invariants(one).entries()) expect(Math.abs(value / (expected[index] ?? 0) - 1)).toBeLessThan(tolerance)
}

const hat = (height: number, width: number, flange: number, t: number, inside: number): WalledSection => {
  const [x, top, tip] = [(width - t) / 2, height - t / 2, width / 2 - t + flange]
  return sections.chain([[-tip, t / 2], [-x, t / 2], [-x, top], [x, top], [x, t / 2], [tip, t / 2]], t, [1, 2, 3, 4].map(node => ({ node: String(node), radius: inside, make: 'bent' as const })))
}

describe('the shape', () => {
  it.each([
    ['a filleted angle', sections.machinedAngle, machinedAngle(10, 1, 0.5)], ['a tee with two fillets', sections.machinedTee, machinedTee(14, 1, 10, 0.5)],
    ['a hat of bent sheet', hat(40, 40, 20, 2, 3), bentHat(40, 40, 20, 2, 3)], ['two cells with a shared web', twoCellWalls, twoCellBox],
  ])('of %s is the one drawn from its outside dimensions', (_, section, drawn) => {
    same(propertiesOf(outlineOf(section)), propertiesOf(drawn))
  })

  it('rounds every one of the four corners of a cross', () => {
    const cross = sections.graph([[0, 0], [20, 0], [0, 20], [-20, 0], [0, -20]], [1, 2, 3, 4].map(to => ({ from: 0, to, t: 4 })), [{ node: '0', radius: 3, make: 'machined' }])
    // Two strips 40 × 4 less their common square, and four fillets of r²(1 − π/4).
    expect(propertiesOf(outlineOf(cross)).A).toBeCloseTo(2 * 160 - 16 + 4 * 9 * (1 - Math.PI / 4), 10)
  })

  it('joins a wall to an arc with a fillet tangent to both', () => {
    const fin: WalledSection = { nodes: [{ id: 'a', x: 30, y: 0 }, { id: 'b', x: -30, y: 0 }, { id: 'top', x: 0, y: 30 }, { id: 'tip', x: 0, y: 50 }], walls: [
      { id: 'p', from: 'a', to: 'top', t: 2, arc: { radius: 30, sweep: Math.PI / 2 } }, { id: 'q', from: 'top', to: 'b', t: 2, arc: { radius: 30, sweep: Math.PI / 2 } },
      { id: 'r', from: 'b', to: 'a', t: 2, arc: { radius: 30, sweep: Math.PI } }, { id: 'fin', from: 'top', to: 'tip', t: 2 },
    ], junctions: [{ node: 'top', radius: 4, make: 'machined' }] }
    const { outer, holes } = outlineOf(fin)
    const sound = given(checkOutline({ outer, holes }))
    expect(holes).toHaveLength(1)
    const arcs = sound.edges.filter(({ name }) => name === 'fillet at top').map(({ arc }) => arc?.radius ?? 0)
    expect(arcs).toHaveLength(2)
    for (const radius of arcs) expect(radius).toBeCloseTo(4, 10)
    // Tangent: no corner that the solver would call re-entrant is left.
    expect(Math.max(...sound.corners.map(({ interior }) => interior))).toBeLessThan(Math.PI + 1e-9)
  })

  it('cuts a wall of another thickness with a step where the walls run on', () => {
    const stepped = sections.graph([[0, 0], [30, 0], [50, 0]], [{ from: 0, to: 1, t: 2 }, { from: 1, to: 2, t: 3 }])
    const outline = outlineOf(stepped)
    expect(propertiesOf(outline).A).toBeCloseTo(30 * 2 + 20 * 3, 10)
    expect(outlineEdges(outline).filter(({ name }) => name === 'step at 1').map(({ length }) => length)).toEqual([0.5, 0.5].map(value => expect.closeTo(value, 10)))
  })

  it('takes the inside radius of a bend and, outside, that radius and the thickness', () => {
    const radii = outlineEdges(outlineOf(roundBox)).flatMap(({ arc, loop }) => (arc ? [{ loop, radius: arc.radius }] : []))
    expect(radii.filter(({ loop }) => loop === 0).map(({ radius }) => radius)).toEqual(Array.from({ length: 4 }, () => expect.closeTo(5, 10)))
    expect(radii.filter(({ loop }) => loop === 1).map(({ radius }) => radius)).toEqual(Array.from({ length: 4 }, () => expect.closeTo(3, 10)))
  })
})

const real = (min: number, max: number) => fc.double({ min, max, noNaN: true })
/** Sharp, or a radius that a drawing can show. */
const radii = fc.oneof(fc.constant(0), real(0.1, 6))
/** A chain of three walls with a branch, walls of differing thickness, machined corners. */
const branchedSection = fc.record({ t: fc.array(real(1, 4), { minLength: 4, maxLength: 4 }), lean: real(-0.5, 0.5), radius: radii }).map(({ t, lean, radius }): WalledSection =>
  sections.graph(
    [[50, 0], [0, 0], [60 * Math.sin(lean), 60 * Math.cos(lean)], [60 * Math.sin(lean) + 40, 60 * Math.cos(lean)], [-30, -8]],
    [{ from: 0, to: 1, t: t[0] ?? 1 }, { from: 1, to: 2, t: t[1] ?? 1 }, { from: 2, to: 3, t: t[2] ?? 1 }, { from: 1, to: 4, t: t[3] ?? 1 }],
    [{ node: '1', radius, make: 'machined' }, { node: '2', radius, make: 'machined' }],
  ))
const moved = (section: WalledSection, by: (x: number, y: number) => readonly [number, number]): WalledSection =>
  ({ ...section, nodes: section.nodes.map(({ id, x, y }) => ({ id, x: by(x, y)[0], y: by(x, y)[1] })) })

describe('the laws', () => {
  const law = (change: (section: WalledSection, angle: number) => WalledSection) => () => fc.assert(fc.property(branchedSection, real(-3, 3), (section, angle) => {
    same(propertiesOf(outlineOf(change(section, angle))), propertiesOf(outlineOf(section)))
  }), { numRuns: 300 })

  it('turning the section turns its outline', law((section, angle) => moved(section, (x, y) => [x * Math.cos(angle) - y * Math.sin(angle) + 7, x * Math.sin(angle) + y * Math.cos(angle) - 3])))
  it('a mirrored section has the mirrored outline', law(section => moved(section, (x, y) => [-x, y])))
  it('the order and the sense of walls do not matter', law(section => ({ ...section, walls: section.walls.toReversed().map((wall, index) => (index % 2 ? wall : { ...wall, from: wall.to, to: wall.from })) })))
  it('a larger fillet adds r²·(cot(α/2) − (π − α)/2) in a corner of angle α', () => fc.assert(fc.property(real(0.6, 2.4), real(0.1, 3), (angle, radius) => {
    const corner = (r: number) => propertiesOf(outlineOf(sections.chain([[40, 0], [0, 0], [40 * Math.cos(angle), 40 * Math.sin(angle)]], 2, [{ node: '1', radius: r, make: 'machined' }]))).A
    expect(corner(radius) - corner(0)).toBeCloseTo(radius ** 2 * (1 / Math.tan(angle / 2) - (Math.PI - angle) / 2), 8)
  })))
  it('bent sheet of any angle has the area of its mid-line', () => fc.assert(fc.property(real(0.6, 2.6), radii, (angle, radius) => {
    const outline = outlineOf(sections.chain([[40, 0], [0, 0], [40 * Math.cos(angle), 40 * Math.sin(angle)]], 2, [{ node: '1', radius, make: 'bent' }]))
    const [turned, middle] = [Math.PI - angle, radius + 1]
    expect(propertiesOf(outline).A).toBeCloseTo(2 * (80 - 2 * middle * Math.tan(turned / 2) + middle * turned), 8)
  })))
})

describe('what is refused', () => {
  const angle = (points: readonly (readonly [number, number])[], radius: number, make: 'machined' | 'bent' = 'machined', t = 2) => sections.chain(points, t, [{ node: '1', radius, make }])
  it.each([
    ['no walls', { nodes: [], walls: [] }, /Add the first wall/],
    ['a fillet larger than its wall', angle([[10, 0], [0, 0], [0, 40]], 20), /Wall w0 is too short for the corners/],
    ['a bend larger than its wall', angle([[10, 0], [0, 0], [0, 40]], 12, 'bent'), /too short/],
    ['a very acute corner', angle([[40, 0], [0, 0], [40, 4]], 0), /at less than 15°/],
    ['a slit without width', sections.slitTube, /needs the width of the slit/],
    ['walls nearer than their thickness', sections.chain([[0, 0], [40, 0], [40, 1.5], [0, 1.5]], 2), /too short|do not make an outline/],
    ['walls that cross', sections.graph([[0, 0], [40, 40], [40, 0], [0, 40]], [{ from: 0, to: 1, t: 2 }, { from: 1, to: 2, t: 2 }, { from: 2, to: 3, t: 2 }]), /do not make an outline/],
    ['parts that are not joined', sections.graph([[0, 0], [40, 0], [0, 20], [40, 20]], [{ from: 0, to: 1, t: 2 }, { from: 2, to: 3, t: 2 }]), /not joined/],
    ['a bend of two thicknesses', sections.graph([[40, 0], [0, 0], [0, 40]], [{ from: 0, to: 1, t: 2 }, { from: 1, to: 2, t: 3 }], [{ node: '1', radius: 3, make: 'bent' }]), /differing thickness/],
    ['a bend of three walls', sections.graph([[-20, 0], [0, 0], [20, 0], [0, 20]], [{ from: 0, to: 1, t: 2 }, { from: 1, to: 2, t: 2 }, { from: 1, to: 3, t: 2 }], [{ node: '1', radius: 3, make: 'bent' }]), /more than two walls/],
    ['an arc narrower than its wall', { nodes: [{ id: 'a', x: 0, y: 0 }, { id: 'b', x: 2, y: 0 }], walls: [{ id: 'w', from: 'a', to: 'b', t: 2.5, arc: { radius: 1, sweep: Math.PI } }] }, /no radius left/],
    ['a cell filled by its walls', sections.graph([[0, 0], [3, 0], [3, 3], [0, 3]], [0, 1, 2, 3].map(from => ({ from, to: (from + 1) % 4, t: 4 }))), /too short|filled/],
  ])('%s', (_, section, reason) => {
    expect(reasonOf(section)).toMatch(reason)
  })
})
