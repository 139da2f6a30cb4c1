/** Laws of closed sections and of direct shear, on random boxes of cells with fins and arcs. */
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { respondOfCells, torsionOfCells, type CellTorsion } from '#shared/torsion/cells/torsion-of-cells'
import type { WallSection } from '#shared/torsion/cells/wall-graph'
import { shearFlow, superpose, torqueAbout } from '#shared/torsion/shear/shear-flow'

const solved = (section: WallSection): CellTorsion => {
  const found = torsionOfCells(section)
  if (!found.ok) throw new Error(found.reason)
  return found
}
const flows = (section: WallSection) => {
  const found = shearFlow(section)
  if (!found.ok) throw new Error(found.reason)
  return found
}
const near = (value: number, expected: number, tolerance: number, scale = Math.abs(expected)) => expect(Math.abs(value - expected)).toBeLessThanOrEqual(tolerance * scale)
const num = (min: number, max: number) => fc.double({ min, max, noNaN: true })
const thickness = num(0.5, 4)

/** A row of one to four cells of differing widths and heights, sheared, with random thicknesses and moduli and a fin at the end. */
const box = fc.record({
  widths: fc.array(num(20, 150), { minLength: 1, maxLength: 4 }), heights: fc.array(num(20, 120), { minLength: 5, maxLength: 5 }), lean: num(-0.3, 0.3),
  t: fc.array(thickness, { minLength: 14, maxLength: 14 }), G: fc.array(fc.constantFrom(26_000, 42_000, 79_000), { minLength: 14, maxLength: 14 }), fin: fc.boolean(),
}).map(({ widths, heights, lean, t, G, fin }): WallSection => {
  const x = widths.reduce<number[]>((at, width) => [...at, (at.at(-1) ?? 0) + width], [0])
  const nodes = x.flatMap((left, i) => [{ id: `b${i}`, x: left, y: lean * left }, { id: `t${i}`, x: left, y: lean * left + (heights[i] ?? 50) }])
  let k = 0
  const wall = (id: string, from: string, to: string) => {
    k += 1
    return { id, from, to, t: t[k % 14] ?? 1, G: G[k % 14] ?? 26_000 }
  }
  const walls = x.flatMap((_, i) => [wall(`w${i}`, `b${i}`, `t${i}`), ...(i + 1 < x.length ? [wall(`bottom${i}`, `b${i}`, `b${i + 1}`), wall(`top${i}`, `t${i}`, `t${i + 1}`)] : [])])
  const last = x.length - 1
  return fin ? { nodes: [...nodes, { id: 'f', x: (x[last] ?? 0) + 30, y: lean * (x[last] ?? 0) }], walls: [...walls, wall('fin', `b${last}`, 'f')] } : { nodes, walls }
})
const moved = (section: WallSection, map: (x: number, y: number) => [number, number], k = 1): WallSection => ({
  nodes: section.nodes.map(({ id, x, y }) => {
    const [u, v] = map(x, y)
    return { id, x: u, y: v }
  }),
  walls: section.walls.map(wall => ({ ...wall, t: wall.t * k })),
})
const many = { numRuns: 1000 }

describe('laws of closed sections', () => {
  it('torque shares of cells and fins sum to one, and the stiffness is that of the energy', () => {
    fc.assert(fc.property(box, num(1e3, 1e8), (section, T) => {
      const torsion = solved(section)
      expect(torsion.residual).toBeLessThan(1e-12)
      const response = respondOfCells(torsion, T)
      if (!response.ok) throw new Error(response.reason)
      // Twice the strain energy per length is T θ′; fins hold their part of it.
      const energy = torsion.walls.reduce((sum, wall, i) => sum + (wall.fin ? wall.finGJ * response.rate ** 2 : (response.q[i] ?? 0) ** 2 * wall.length / (wall.G * wall.t)), 0)
      near(energy, T * response.rate, 1e-10)
    }), many)
  })
  it('scale: J with the fourth power, stress with the third of the size', () => {
    fc.assert(fc.property(box, num(0.1, 10), (section, k) => {
      const [one, other] = [solved(section), solved(moved(section, (x, y) => [k * x, k * y], k))]
      near(other.GJ, one.GJ * k ** 4, 1e-10)
      one.walls.forEach((wall, i) => near((other.walls[i]?.facePerRate ?? 0) / other.GJ, wall.facePerRate / one.GJ / k ** 3, 1e-9))
    }), many)
  })
  it('turn, move and mirror: nothing changes but the sense of the flows in a mirror', () => {
    fc.assert(fc.property(box, num(-3, 3), num(-500, 500), (section, angle, off) => {
      const [c, s] = [Math.cos(angle), Math.sin(angle)]
      const one = solved(section)
      const turned = solved(moved(section, (x, y) => [c * x - s * y + off, s * x + c * y - off]))
      const mirrored = solved(moved(section, (x, y) => [-x, y]))
      near(turned.GJ, one.GJ, 1e-10)
      near(mirrored.GJ, one.GJ, 1e-10)
      one.walls.forEach((wall, i) => {
        near(turned.walls[i]?.flow ?? 0, wall.flow, 1e-9, Math.abs(one.cells[0]?.flow ?? 1))
        near(mirrored.walls[i]?.flow ?? 0, -wall.flow, 1e-9, Math.abs(one.cells[0]?.flow ?? 1))
      })
    }), many)
  })
  it('reverse a wall or split it: the stiffness stays, the reversed flow changes its sign', () => {
    fc.assert(fc.property(box, fc.nat(20), num(0.1, 0.9), (section, pick, part) => {
      const one = solved(section)
      const i = pick % section.walls.length
      const wall = section.walls[i]!
      const reversed = solved({ ...section, walls: section.walls.map((each, k) => (k === i ? { ...each, from: each.to, to: each.from } : each)) })
      near(reversed.GJ, one.GJ, 1e-12)
      near(reversed.walls[i]?.flow ?? 0, -(one.walls[i]?.flow ?? 0), 1e-10, Math.abs(one.cells[0]?.flow ?? 1))
      const [a, b] = [section.nodes.find(n => n.id === wall.from)!, section.nodes.find(n => n.id === wall.to)!]
      const split = solved({
        nodes: [...section.nodes, { id: 'split', x: a.x + part * (b.x - a.x), y: a.y + part * (b.y - a.y) }],
        walls: [...section.walls.filter((_, k) => k !== i), { ...wall, to: 'split' }, { ...wall, id: 'second', from: 'split' }],
      })
      near(split.GJ, one.GJ, 1e-10)
    }), many)
  })
  it('superpose: stresses are proportional to the torque', () => {
    fc.assert(fc.property(box, num(1, 1e6), num(0.1, 9), (section, T, k) => {
      const torsion = solved(section)
      const [one, other] = [respondOfCells(torsion, T), respondOfCells(torsion, -k * T)]
      if (!one.ok || !other.ok) throw new Error('refused')
      near(other.tauMax, k * one.tauMax, 1e-12)
      near(other.rate, -k * one.rate, 1e-12)
    }), many)
  })
  it('a wall made thicker never makes the section softer', () => {
    fc.assert(fc.property(box, fc.nat(20), num(1.01, 3), (section, pick, k) => {
      const i = pick % section.walls.length
      const thicker = { ...section, walls: section.walls.map((wall, n) => (n === i ? { ...wall, t: wall.t * k } : wall)) }
      expect(solved(thicker).GJ).toBeGreaterThanOrEqual(solved(section).GJ * (1 - 1e-12))
    }), many)
  })
  it('without their shared wall two cells act as one', () => {
    fc.assert(fc.property(num(20, 200), num(20, 200), num(20, 100), thickness, (a, b, h, t) => {
      const nodes = [[0, 0], [a, 0], [a + b, 0], [a + b, h], [a, h], [0, h]].map(([x, y], i) => ({ id: String(i), x: x!, y: y! }))
      const ring = nodes.map((node, i) => ({ id: `r${i}`, from: node.id, to: nodes[(i + 1) % 6]!.id, t, G: 27_000 }))
      near(solved({ nodes, walls: [...ring, { id: 'web', from: '1', to: '4', t: 1e-9, G: 27_000 }] }).GJ, solved({ nodes, walls: ring }).GJ, 1e-6)
    }), { numRuns: 300 })
  })
})

describe('laws of direct shear', () => {
  it('the flow carries the force: its resultant is one along its axis and nothing across, and its ends fall to zero', () => {
    fc.assert(fc.property(box, (section) => {
      const { walls } = flows(section)
      const resultant = { xx: 0, xy: 0, yx: 0, yy: 0 }
      // Along straight walls the flow is a parabola: Simpson's rule is exact.
      section.walls.forEach((wall, i) => {
        const [a, b] = [section.nodes.find(n => n.id === wall.from)!, section.nodes.find(n => n.id === wall.to)!]
        const mean = (q: readonly number[]) => ((q[0] ?? 0) + 4 * (q[4] ?? 0) + (q[8] ?? 0)) / 6
        const [px, py] = [mean(walls[i]!.perX), mean(walls[i]!.perY)]
        resultant.xx += px * (b.x - a.x)
        resultant.xy += px * (b.y - a.y)
        resultant.yx += py * (b.x - a.x)
        resultant.yy += py * (b.y - a.y)
      })
      near(resultant.xx, 1, 1e-9)
      near(resultant.yy, 1, 1e-9)
      near(resultant.xy, 0, 1e-9, 1)
      near(resultant.yx, 0, 1e-9, 1)
    }), many)
  })
  it('the shear centre moves and turns with the section', () => {
    fc.assert(fc.property(box, num(-3, 3), num(-500, 500), (section, angle, off) => {
      const [c, s] = [Math.cos(angle), Math.sin(angle)]
      const { x, y } = flows(section).shearCentre
      const turned = flows(moved(section, (u, v) => [c * u - s * v + off, s * u + c * v])).shearCentre
      near(turned.x, c * x - s * y + off, 1e-7, 300)
      near(turned.y, s * x + c * y, 1e-7, 300)
    }), many)
  })
  it('a force through the shear centre gives no torque, and a couple the same about every point', () => {
    fc.assert(fc.property(num(-99, 99), num(-99, 99), num(-1e4, 1e4), num(-1e4, 1e4), (x, y, Vx, Vy) => {
      expect(torqueAbout({ x, y }, [{ Vx, Vy, at: { x, y } }])).toBe(0)
      near(torqueAbout({ x, y }, [{ Vx, Vy, at: { x: 5, y: 7 } }, { Vx: -Vx, Vy: -Vy, at: { x: 2, y: 3 } }]), Vy * 3 - Vx * 4, 1e-9, 1e6)
    }))
  })
  it('the peak of a straight wall is met between the parts too: a wall split anywhere has the same', () => {
    fc.assert(fc.property(num(10, 80), num(10, 80), num(60, 200), num(0.05, 0.95), num(-1e4, 1e4), num(-1e4, 1e4), (lower, upper, height, split, Vx, Vy) => {
      const nodes = [{ id: '1', x: lower, y: 0 }, { id: '2', x: 0, y: 0 }, { id: '3', x: 0, y: height }, { id: '4', x: upper, y: height }, { id: '5', x: 0, y: split * height }]
      const wall = (id: string, from: string, to: string, t: number) => ({ id, from, to, t, G: 27_000 })
      const [bottom, top] = [wall('a', '1', '2', 3), wall('c', '3', '4', 4)]
      const most = (walls: WallSection['walls']) => superpose(flows({ nodes: nodes.slice(0, walls.length + 1), walls }), Vx, Vy, walls.map(() => 0), walls.map(() => 0)).reduce((high, one) => Math.max(high, one.tau), 0)
      near(most([bottom, wall('b', '2', '5', 2), wall('d', '5', '3', 2), top]), most([bottom, wall('b', '2', '3', 2), top]), 1e-9)
    }), { numRuns: 300 })
  })
  it('superposed flows add with their signs before magnitudes are taken', () => {
    fc.assert(fc.property(box, num(-1e4, 1e4), num(-1e6, 1e6), (section, V, T) => {
      const torsion = solved(section)
      const response = respondOfCells(torsion, T)
      if (!response.ok) throw new Error(response.reason)
      const sheared = flows(section)
      const all = superpose(sheared, 0, V, [...response.q], torsion.walls.map(wall => wall.G * wall.t * Math.abs(response.rate)))
      const torsionOnly = superpose(sheared, 0, 0, [...response.q], torsion.walls.map(() => 0))
      const shearOnly = superpose(sheared, 0, V, torsion.walls.map(() => 0), torsion.walls.map(() => 0))
      all.forEach((wall, i) => {
        expect(wall.tau).toBeLessThanOrEqual(shearOnly[i]!.tau + torsionOnly[i]!.tau + torsion.walls[i]!.G * torsion.walls[i]!.t * Math.abs(response.rate) + 1e-6)
      })
    }), { numRuns: 300 })
  })
})

describe('hostile graphs', () => {
  const n = (id: string, x: number, y: number) => ({ id, x, y })
  const w = (id: string, from: string, to: string, t = 2, G = 27_000) => ({ id, from, to, t, G })
  const square = [n('1', 0, 0), n('2', 50, 0), n('3', 50, 50), n('4', 0, 50)]
  const ring = [w('a', '1', '2'), w('b', '2', '3'), w('c', '3', '4'), w('d', '4', '1')]
  const reason = (section: WallSection) => {
    const found = torsionOfCells(section)
    return found.ok ? 'computed' : found.reason
  }
  it.each<[string, WallSection, RegExp]>([
    ['no walls', { nodes: square, walls: [] }, /no walls/],
    ['an open section', { nodes: square, walls: ring.slice(1) }, /close no cell/],
    ['a seam left open', { nodes: [...square, n('5', 1, 1e-4)], walls: [w('a', '5', '2'), ...ring.slice(1)] }, /stand 1\.00 mm apart/],
    ['two nodes at one place', { nodes: [...square, n('5', 0, 1e-9)], walls: [...ring, w('e', '5', '3')] }, /at one place/],
    ['crossing walls', { nodes: square, walls: [...ring, w('e', '1', '3'), w('f', '2', '4')] }, /without a common node/],
    ['a wall given twice', { nodes: square, walls: [...ring, w('a', '1', '3')] }, /given twice/],
    ['a node that does not exist', { nodes: square, walls: [...ring, w('e', '1', '9')] }, /does not exist/],
    ['a wall without length', { nodes: square, walls: [...ring, w('e', '1', '1')] }, /no length/],
    ['parts that are apart', { nodes: [...square, n('5', 99, 0), n('6', 99, 50)], walls: [...ring, w('e', '5', '6')] }, /not joined/],
    ['no thickness', { nodes: square, walls: [w('a', '1', '2', 0), ...ring.slice(1)] }, /thickness/],
    ['a modulus that is no number', { nodes: square, walls: [w('a', '1', '2', 2, Number.NaN), ...ring.slice(1)] }, /modulus/],
    ['a coordinate that is no number', { nodes: [n('1', Infinity, 0), ...square.slice(1)], walls: ring }, /coordinates/],
    ['moduli far apart', { nodes: [...square, n('5', 100, 0), n('6', 100, 50)], walls: [...ring, w('e', '2', '5', 2, 1e-9), w('f', '5', '6', 2, 1e-9), w('g', '6', '3', 2, 1e-9)] }, /computed|differ too much/],
  ])('gives a clear reason for %s', (_, section, words) => expect(reason(section)).toMatch(words))
  it('computes a thousand walls', () => {
    const count = 250
    const nodes = Array.from({ length: count + 1 }, (_, i) => [n(`b${i}`, 10 * i, 0), n(`t${i}`, 10 * i, 40)]).flat()
    const walls = Array.from({ length: count }, (_, i) => [w(`w${i}`, `b${i}`, `t${i}`), w(`l${i}`, `b${i}`, `b${i + 1}`), w(`u${i}`, `t${i}`, `t${i + 1}`)]).flat()
    expect(solved({ nodes, walls: [...walls, w('last', `b${count}`, `t${count}`)] }).cells).toHaveLength(count)
  })
  it('names the walls on either side of a fin inside a cell as one cell', () => {
    const torsion = solved({ nodes: [...square, n('5', 25, 25)], walls: [...ring, w('fin', '1', '5')] })
    expect(torsion.cells).toHaveLength(1)
    expect(torsion.walls.find(wall => wall.id === 'fin')).toMatchObject({ fin: true, chi: null })
    near(torsion.cells[0]!.area, 2500, 1e-12)
  })
})
