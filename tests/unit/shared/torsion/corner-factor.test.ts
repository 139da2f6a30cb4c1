import { describe, expect, it } from 'vitest'
import fc from 'fast-check'
import { bentAngle, chain, channel, graph, machinedAngle, machinedTee, twoMaterials } from '../../../reference/sections'
import { given } from '../../../reference/engine'
import { bendFactor, stripFactor } from '#shared/torsion/bend-factor'
import { cornerFactor, machinedFactor } from '#shared/torsion/corner-factor'
import { machinedCornerTable } from '#shared/torsion/published'
import { torsionOfOpenSection } from '#shared/torsion/open-section'

const machined = (radius: number, angle = Math.PI / 2) =>
  chain([[10, 0], [0, 0], [10 * Math.cos(angle), 10 * Math.sin(angle)]], 1, [{ node: '1', radius, make: 'machined' }])
const reasonOf = (result: { ok: boolean, reason?: string }): string => result.reason ?? 'a factor was given'

describe('the table of machined corners', () => {
  const slopes = (of: (x: number) => number): number[] =>
    machinedCornerTable.slice(1).map(([x, K], index) => {
      const [x0, K0] = machinedCornerTable[index] as readonly [number, number]
      return (of(K) - of(K0)) / (of(x) - of(x0))
    })

  it('is convex in its values and in their logarithms, so that a chord is never low', () => {
    for (const of of [(x: number) => x, Math.log]) {
      const rising = slopes(of)
      expect([...rising].sort((a, b) => a - b)).toEqual(rising)
    }
  })

  it('is met at its points and lies between its neighbours elsewhere', () => {
    for (const [x, K] of machinedCornerTable) expect(machinedFactor(x)).toBe(K)
    fc.assert(fc.property(fc.double({ min: 0.05, max: 2, noNaN: true }), (x) => {
      const K = machinedFactor(x) ?? Number.NaN
      const above = machinedCornerTable.findIndex(([at]) => at >= x)
      const [[, a], [, b]] = [machinedCornerTable[Math.max(above - 1, 0)] ?? [0, 0], machinedCornerTable[above] ?? [0, 0]]
      expect(K).toBeLessThanOrEqual(Math.max(a, b))
      expect(K).toBeGreaterThanOrEqual(Math.min(a, b))
    }), { seed: 20_261_012 })
  })

  it('is high by little: at r/t 0.76 two independent solutions give 1.4894 and 1.4891', () => {
    expect(machinedFactor(0.76)).toBeGreaterThan(1.48936)
    expect(machinedFactor(0.76)).toBeLessThan(1.48936 * 1.001)
  })

  it('is not carried beyond its ends', () => {
    for (const ratio of [0, 0.049, 2.001, 10, Number.NaN, -1]) expect(machinedFactor(ratio)).toBeNull()
    expect(reasonOf(cornerFactor(machined(0), '1'))).toMatch(/the table runs from 0.05 t to 2 t/)
    expect(reasonOf(cornerFactor(machined(2.1), '1'))).toMatch(/the table runs/)
  })
})

describe('outside the tables there is a reason and no factor', () => {
  it.each([
    ['walls of differing thickness', graph([[10, 0], [0, 0], [0, 10]], [{ from: 0, to: 1, t: 1 }, { from: 1, to: 2, t: 2 }], [{ node: '1', radius: 1, make: 'machined' }]), '1', /equal walls/],
    ['a step in thickness', graph([[-10, 0], [0, 0], [10, 0]], [{ from: 0, to: 1, t: 1 }, { from: 1, to: 2, t: 2 }], [{ node: '1', radius: 1, make: 'machined' }]), '1', /steps from 1 to 2 mm/],
    ['a tee', machinedTee, '1', /3 walls meet/],
    ['another angle', machined(0.5, 2), '1', /right angle/],
    ['no radius given', channel, '1', /not given/],
    ['differing modulus', { ...twoMaterials, walls: twoMaterials.walls.map(wall => ({ ...wall, t: 2 })), junctions: [{ node: '2', radius: 1, make: 'machined' as const }] }, '2', /shear modulus/],
    ['a bend of no radius', chain([[10, 0], [0, 0], [0, 10]], 1, [{ node: '1', radius: 0, make: 'bent' }]), '1', /greater than zero/],
    ['a node without a corner', machinedAngle, '0', /no corner/],
    ['an arc wall', { nodes: [{ id: 'a', x: 0, y: 0 }, { id: 'b', x: 10, y: 10 }, { id: 'c', x: 0, y: 10 + 1e-9 }], walls: [{ id: '1', from: 'a', to: 'b', t: 1, G: 1, arc: { radius: 10, sweep: Math.PI / 2 } }, { id: '2', from: 'b', to: 'c', t: 1, G: 1 }], junctions: [{ node: 'b', radius: 1, make: 'machined' as const }] }, 'b', /arc wall/],
  ] as const)('%s', (_, section, node, reason) => {
    expect(reasonOf(cornerFactor(section, node))).toMatch(reason)
  })
})

describe('corners of a section', () => {
  it('are named with their source', () => {
    expect(given(cornerFactor(machinedAngle, '1'))).toMatchObject({ source: 'table', radiusRatio: 0.5, t: 1 })
    expect(given(cornerFactor(bentAngle, '1'))).toMatchObject({ source: 'bend' })
  })

  it('are not where the mid-line runs on', () => {
    const split = chain([[0, 0], [10, 0], [20, 0]], 1)
    expect(given(torsionOfOpenSection(split)).corners).toEqual([])
    const tangentArc = { nodes: [{ id: 'a', x: 0, y: 0 }, { id: 'b', x: 10, y: 0 }, { id: 'c', x: 20, y: 10 }], walls: [{ id: '1', from: 'a', to: 'b', t: 1, G: 1 }, { id: '2', from: 'b', to: 'c', t: 1, G: 1, arc: { radius: 10, sweep: Math.PI / 2 } }], junctions: [] }
    expect(given(torsionOfOpenSection(tangentArc)).corners).toEqual([])
  })
})

describe('bend factor', () => {
  it('falls to one as the bend grows wide, along 1 + t/6ri, without a break where its series takes over', () => {
    for (const inside of [9999, 9999.9, 10_000.1, 10_001, 1e8]) expect(bendFactor(inside, 1)).toBeCloseTo(1 + 1 / (6 * inside), 8)
    expect(bendFactor(1e300, 1)).toBe(1)
  })

  it('needs a radius', () => {
    for (const inside of [0, -1, Number.NaN]) expect(bendFactor(inside, 1)).toBeNull()
    expect(stripFactor({ radius: 0.5, t: 1 })).toMatchObject({ ok: false })
    expect(stripFactor({ radius: 2, t: 1 })).toMatchObject({ ok: true, K: bendFactor(1.5, 1) })
  })
})
