/** Which closed sections warp (§3.8). */
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { cellWarping } from '#shared/torsion/cells/cell-warping'
import { torsionOfCells } from '#shared/torsion/cells/torsion-of-cells'
import type { WallSection } from '#shared/torsion/cells/wall-graph'

const G = 27_000
function warpingOf(section: WallSection) {
  const torsion = torsionOfCells(section)
  if (!torsion.ok) throw new Error(torsion.reason)
  const warping = cellWarping(section, torsion)
  if (!warping.ok) throw new Error(warping.reason)
  return warping
}
/** a × b on the mid-line, turned by an angle. */
function rectangle(a: number, b: number, ta: number, tb: number, angle = 0): WallSection {
  const at = (id: string, x: number, y: number) => ({ id, x: x * Math.cos(angle) - y * Math.sin(angle) + 7, y: x * Math.sin(angle) + y * Math.cos(angle) - 3 })
  return {
    nodes: [at('1', 0, 0), at('2', a, 0), at('3', a, b), at('4', 0, b)],
    walls: [['1', '2', ta], ['2', '3', tb], ['3', '4', ta], ['4', '1', tb]].map(([from, to, t], i) => ({ id: String(i), from: String(from), to: String(to), t: Number(t), G })),
  }
}
const side = fc.double({ min: 20, max: 400, noNaN: true })
const angle = fc.double({ min: 0, max: 6, noNaN: true })

describe('warping of closed sections', () => {
  it('of a rectangle of one thickness is ab(a − b)/4(a + b) at its corners', () => {
    // Bredt's dw/ds = q/(Gtθ′) − p by hand; the same as the textbook formula T/(8abG)·(b/t_b − a/t_a), from memory.
    fc.assert(fc.property(side, side, angle, (a, b, turned) => {
      expect(warpingOf(rectangle(a, b, 2, 2, turned)).largest).toBeCloseTo(a * b * Math.abs(a - b) / (4 * (a + b)), 6)
    }), { numRuns: 300 })
  })
  it('is none where p·t is the same in every wall', () => {
    fc.assert(fc.property(side, side, angle, (a, b, turned) => {
      const warping = warpingOf(rectangle(a, b, 1 / b, 1 / a, turned))
      expect(warping.warps).toBe(false)
      expect(warping.largest).toBeLessThan(1e-9 * Math.max(a, b) ** 2)
    }), { numRuns: 300 })
  })
  it('is none of a circular tube of one thickness, and some where it differs', () => {
    const tube = (t: number): WallSection => ({
      nodes: [{ id: '1', x: 50, y: 0 }, { id: '2', x: -50, y: 0 }],
      walls: [{ id: 'a', from: '1', to: '2', t: 2, G, arc: { radius: 50, sweep: Math.PI } }, { id: 'b', from: '2', to: '1', t, G, arc: { radius: 50, sweep: Math.PI } }],
    })
    expect(warpingOf(tube(2))).toMatchObject({ warps: false })
    expect(warpingOf(tube(4))).toMatchObject({ warps: true })
  })
  it('does not hang on the sense in which walls are drawn', () => {
    const section = rectangle(120, 60, 2, 3)
    const reversed = { ...section, walls: section.walls.map((wall, i) => i % 2 ? { ...wall, from: wall.to, to: wall.from } : wall) }
    expect(warpingOf(reversed).largest).toBeCloseTo(warpingOf(section).largest, 9)
  })
})
