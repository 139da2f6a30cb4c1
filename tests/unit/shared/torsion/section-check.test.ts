import { describe, expect, it } from 'vitest'
import type { FaultCode, OpenSection, OpenWall } from '#shared/torsion/section'
import { channel, chain, graph, hat, slitTube } from '../../../reference/sections'
import { checkSection } from '#shared/torsion/section-check'
import { torsionOfOpenSection } from '#shared/torsion/open-section'
import { sectorialProperties } from '#shared/torsion/sectorial'

const codes = (section: OpenSection): FaultCode[] => {
  const checked = checkSection(section)
  return checked.ok ? [] : checked.faults.map(({ code }) => code)
}
const wall = (change: Partial<OpenWall>): OpenSection => ({ ...channel, walls: channel.walls.map((one, index) => (index === 1 ? { ...one, ...change } : one)) })

describe('a sound section', () => {
  it.each([['channel', channel], ['hat with bends', hat], ['one wall', chain([[0, 0], [10, 0]], 1)]] as const)('%s', (_, section) => {
    expect(checkSection(section)).toEqual({ ok: true, seams: [] })
  })

  it('may touch itself at an open seam, which is told', () => {
    expect(checkSection(slitTube)).toEqual({ ok: true, seams: [{ nodes: ['a', 'b'], gap: 0 }] })
  })

  it('may have nodes without walls', () => {
    expect(checkSection({ ...channel, nodes: [...channel.nodes, { id: 'spare', x: 1, y: 1 }] }).ok).toBe(true)
  })
})

describe('numbers and names (G-01)', () => {
  it.each([
    ['thickness of zero', { t: 0 }], ['negative thickness', { t: -1 }], ['thickness that is no number', { t: Number.NaN }], ['shear modulus of zero', { G: 0 }],
    ['infinite modulus', { E: Infinity }], ['radius of zero', { arc: { radius: 0, sweep: 1 } }], ['swept angle of zero', { arc: { radius: 1, sweep: 0 } }],
    ['more than a full circle', { arc: { radius: 1, sweep: 7 } }], ['start direction that is no number', { arc: { radius: 1, sweep: 1, startDirection: Number.NaN } }],
  ] as const)('%s', (_, change) => {
    expect(codes(wall(change))).toEqual(['bad-number'])
  })

  it('finds unknown nodes, names given twice and corners given twice', () => {
    expect(codes(wall({ to: 'nowhere' }))).toEqual(['unknown-node'])
    expect(codes(wall({ id: 'w0' }))).toEqual(['duplicate-id'])
    expect(codes({ ...channel, nodes: [...channel.nodes, { id: '0', x: 5, y: 5 }] })).toEqual(['duplicate-id'])
    expect(codes({ ...channel, junctions: [1, 2].map(() => ({ node: '1', radius: 1, make: 'bent' as const })) })).toEqual(['junction'])
    expect(codes({ ...channel, junctions: [{ node: 'x', radius: -1, make: 'bent' }] })).toEqual(['unknown-node', 'bad-number'])
    expect(codes({ ...channel, nodes: channel.nodes.map(node => ({ ...node, x: Number.NaN })) })).toContain('bad-number')
    expect(codes({ nodes: [], walls: [], junctions: [] })).toEqual(['no-walls'])
  })

  it('are all told at once', () => {
    expect(codes({ ...channel, walls: channel.walls.map(one => ({ ...one, t: 0, G: -1 })) })).toHaveLength(6)
  })
})

describe('the graph of the walls', () => {
  it('has no loop (a closed section is another calculation)', () => {
    expect(codes(graph([[0, 0], [10, 0], [10, 10]], [{ from: 0, to: 1, t: 1 }, { from: 1, to: 2, t: 1 }, { from: 2, to: 0, t: 1 }]))).toEqual(['loop'])
    expect(codes(graph([[0, 0], [10, 0]], [{ from: 0, to: 1, t: 1 }, { from: 1, to: 0, t: 1 }]))).toEqual(['loop'])
  })

  it('is connected', () => {
    expect(codes(graph([[0, 0], [10, 0], [0, 5], [10, 5]], [{ from: 0, to: 1, t: 1 }, { from: 2, to: 3, t: 1 }]))).toEqual(['not-connected'])
  })

  it('has walls with length', () => {
    expect(codes(graph([[0, 0], [10, 0], [10, 1e-12]], [{ from: 0, to: 1, t: 1 }, { from: 1, to: 2, t: 1 }]))).toEqual(['zero-length'])
    expect(codes(graph([[0, 0], [10, 0]], [{ from: 0, to: 1, t: 1 }, { from: 1, to: 1, t: 1 }]))).toContain('zero-length')
  })
})

describe('crossing walls (G-06)', () => {
  const walls = [{ from: 0, to: 1, t: 1 }, { from: 1, to: 2, t: 1 }, { from: 2, to: 3, t: 1 }]
  it.each([
    ['crossing', [[0, 0], [20, 0], [20, 10], [10, -10]]], ['ending on another', [[0, 0], [20, 0], [20, 10], [10, 0]]],
    ['folded back on itself', [[0, 0], [20, 0], [20, 10], [20, 2]]], ['lying on another', [[0, 0], [20, 0], [30, 0], [10, 0]]],
  ] as const)('%s', (_, points) => {
    expect(codes(graph(points, walls))).toContain('crossing')
  })

  it('is seen between lines and arcs, and between arcs', () => {
    const line = (id: string, from: string, to: string): OpenWall => ({ id, from, to, t: 1, G: 1 })
    const arc = (id: string, from: string, to: string, radius: number, sweep: number): OpenWall => ({ id, from, to, t: 1, G: 1, arc: { radius, sweep } })
    const section = (walls: OpenWall[]): OpenSection => ({ nodes: [{ id: 'a', x: -10, y: 0 }, { id: 'b', x: 10, y: 0 }, { id: 'c', x: 0, y: 20 }, { id: 'd', x: 0, y: -20 }], walls, junctions: [] })
    // The upper half circle from b to a is met by the line from c to d at (0, 10).
    expect(codes(section([arc('half', 'b', 'a', 10, Math.PI), line('link', 'a', 'd'), line('cut', 'd', 'c')]))).toEqual(['crossing'])
    expect(codes(section([arc('half', 'b', 'a', 10, -Math.PI), line('link', 'a', 'c')]))).toEqual([])
    expect(codes(section([arc('half', 'b', 'a', 10, Math.PI), line('link', 'b', 'd'), arc('cut', 'd', 'c', 20, Math.PI)]))).toEqual([])
    expect(codes(section([arc('half', 'b', 'a', 10, Math.PI), line('link', 'b', 'c'), arc('cut', 'c', 'd', 100, 2 * Math.asin(0.2))]))).toContain('crossing')
  })

  it('allows walls that only share a node, whatever the angle', () => {
    expect(codes(graph([[0, 0], [10, 0], [20, 1], [20, -1]], [{ from: 0, to: 1, t: 1 }, { from: 1, to: 2, t: 1 }, { from: 1, to: 3, t: 1 }]))).toEqual([])
  })
})

describe('bends', () => {
  const bent = (points: readonly (readonly [number, number])[], radius: number): OpenSection => chain(points, 2, [{ node: '1', radius, make: 'bent' }])
  it('must fit on their walls', () => {
    expect(codes(bent([[20, 0], [0, 0], [0, 20]], 19))).toEqual([])
    expect(codes(bent([[20, 0], [0, 0], [0, 20]], 19.1))).toEqual(['bend', 'bend'])
  })

  it('join two straight walls of one sheet', () => {
    expect(codes({ ...channel, junctions: [{ node: '1', radius: 3, make: 'bent' }] })).toEqual(['bend'])
    const tee = graph([[-10, 0], [0, 0], [10, 0], [0, 10]], [{ from: 0, to: 1, t: 1 }, { from: 1, to: 2, t: 1 }, { from: 1, to: 3, t: 1 }], [{ node: '1', radius: 3, make: 'bent' }])
    expect(codes(tee)).toEqual(['bend'])
    expect(codes(bent([[20, 0], [0, 0], [20, 1e-4]], 1))).toContain('bend')
  })

  it('do nothing where the walls run on', () => {
    expect(codes(bent([[20, 0], [0, 0], [-20, 0]], 5))).toEqual([])
  })
})

describe('a refusal', () => {
  it('carries the first reason to every caller', () => {
    const section = wall({ t: 0 })
    const reason = 'Wall w1 needs a thickness greater than zero.'
    expect(torsionOfOpenSection(section)).toMatchObject({ ok: false, reason })
    expect(sectorialProperties(section)).toMatchObject({ ok: false, reason })
  })

  it('is given for an arc that misses its end, and for one whose ends coincide without a direction', () => {
    expect(codes(wall({ arc: { radius: 10, sweep: 1 } }))).toEqual(['arc-mismatch'])
    expect(codes({ ...slitTube, walls: slitTube.walls.map(one => ({ ...one, arc: { radius: 50, sweep: 2 * Math.PI } })) })).toEqual(['arc-mismatch'])
  })

  it('is given for a wall stockier than its end correction', () => {
    expect(torsionOfOpenSection(chain([[0, 0], [1, 0]], 2))).toMatchObject({ ok: false, reason: expect.stringContaining('too short') })
  })

  it('is given where only some walls have a modulus of elasticity', () => {
    expect(sectorialProperties({ ...channel, walls: channel.walls.map(({ E: _E, ...one }, index) => (index === 0 ? one : { ...one, E: 71_000 })) })).toMatchObject({ ok: false, reason: expect.stringContaining('modulus of elasticity') })
  })
})
