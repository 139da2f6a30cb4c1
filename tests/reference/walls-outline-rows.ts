/** Reference rows of §4 for outlines made from walls: their areas by hand, and the torsion that independent programs give for the same shapes. */
import type { WalledSection } from '#shared/torsion/outline/from-walls/wall-sides'
import type { OutlineTorsion } from '#shared/torsion/outline/outline-torsion'
import type { AreaProperties } from '#shared/torsion/outline/outline-properties'
import type { Engine } from './engine'
import type { ReferenceRow } from './row'
import { given } from './engine'
import { abs, rel, row } from './row'
import * as sections from './sections'

const properties = (e: Engine, section: WalledSection): AreaProperties => given(e.checkOutline(given(e.outlineOfWalls(section)).outline)).properties

const solved = new WeakMap<Engine, Map<WalledSection, OutlineTorsion>>()
function solve(engine: Engine, section: WalledSection): OutlineTorsion {
  const known = solved.get(engine) ?? new Map<WalledSection, OutlineTorsion>()
  solved.set(engine, known)
  const solution = known.get(section) ?? given(engine.outlineTorsion(given(engine.outlineOfWalls(section)).outline))
  known.set(section, solution)
  return solution
}
const J = (section: WalledSection) => (e: Engine): number => solve(e, section).J.value
const peak = (section: WalledSection) => (e: Engine) => {
  const { shear } = solve(e, section)
  if (!shear.bounded) throw new Error('The greatest shear is unbounded')
  return shear.peaks.estimate.value
}

/** C-52: the centre-lines of `twoCellBox`. */
export const twoCellWalls: WalledSection = sections.graph(
  [[0, 0], [100, 0], [240, 0], [240, 80], [100, 80], [0, 80]],
  [{ from: 0, to: 1, t: 2 }, { from: 1, to: 2, t: 2 }, { from: 2, to: 3, t: 1.5 }, { from: 3, to: 4, t: 2 }, { from: 4, to: 5, t: 2 }, { from: 5, to: 0, t: 2 }, { from: 1, to: 4, t: 3 }],
)
/** A box 60 × 40 on its mid-lines, t = 2, bent corners of inside radius 3. */
export const roundBox: WalledSection = sections.graph(
  [[0, 0], [60, 0], [60, 40], [0, 40]], [0, 1, 2, 3].map(from => ({ from, to: (from + 1) % 4, t: 2 })),
  [0, 1, 2, 3].map(node => ({ node: String(node), radius: 3, make: 'bent' as const })),
)
/** A tube of R = 22.5, t = 5 as two half circles. */
export const halves: WalledSection = {
  nodes: [{ id: 'a', x: 22.5, y: 0 }, { id: 'b', x: -22.5, y: 0 }],
  walls: [['a', 'b'] as const, ['b', 'a'] as const].map(([from, to], i) => ({ id: `half ${i}`, from, to, t: 5, arc: { radius: 22.5, sweep: Math.PI } })),
}

const elements = 'boundary elements on the warping function, linear, extrapolated (order 2.00)'
const areas: ReferenceRow[] = [
  row('§4', 'area of a channel from its walls', 'as C-38', 620, 'mm²', rel(1e-12), '2·4·41.5 + 3·96', e => properties(e, sections.channel).A),
  row('§4', 'area of a filleted angle from its walls', 'as C-44', 19 + 0.25 * (1 - Math.PI / 4), 'mm²', rel(1e-12), '19 + r²(1 − π/4)', e => properties(e, sections.machinedAngle).A),
  row('§4', 'area of a tee from its walls', 'as C-46', 23 + 0.5 * (1 - Math.PI / 4), 'mm²', rel(1e-12), '14 + 9 + 2r²(1 − π/4)', e => properties(e, sections.machinedTee).A),
  row('§4', 'area of a bent angle from its walls', 'as C-48', 17 + Math.PI / 2, 'mm²', rel(1e-12), '2·8.5·t + (π/2)(r + t/2)·t', e => properties(e, sections.bentAngle).A),
  row('§4', 'area of a circular arc from its wall', 'R 40, t 1.5, 120°', 40 * Math.PI, 'mm²', rel(1e-12), 'R·2π/3·t', e => properties(e, sections.openArc).A),
  row('§4', 'area of a tapering strip from its wall', 'as C-120', 100, 'mm²', rel(1e-12), '40·(2 + 3)/2', e => properties(e, sections.taperedStrip).A),
  row('§4', 'polar moment of a tube from two arcs', 'Ro 25, Ri 20 mm', Math.PI / 2 * (25 ** 4 - 20 ** 4), 'mm⁴', rel(1e-11), 'π/2·(Ro⁴ − Ri⁴)', e => properties(e, halves).Ip),
  row('§4', 'second moment of an I from its walls', 'as C-67', 2 * (60 * 5 ** 3 / 12 + 300 * 60 ** 2) + 4 * 115 ** 3 / 12, 'mm⁴', rel(1e-12), '2(b·t³/12 + b·t·60²) + 4·115³/12', e => properties(e, sections.doublySymmetricI).Ixx),
  row('§4', 'area of a box with bends from its walls', '60 × 40, t 2, inside radius 3', 2 * (200 - 8 * 4) + 4 * Math.PI / 2 * 4 * 2, 'mm²', rel(1e-12), 'straight lengths and four quarter rings', e => properties(e, roundBox).A),
]
const torsion: ReferenceRow[] = [
  row('C-44', 'angle J by the outline of its walls', 'legs 10, t 1, fillet 0.5 mm', 6.342047, 'mm⁴', rel(5e-5), elements, J(sections.machinedAngle)),
  row('C-47', 'angle shear by the outline of its walls', 'as C-44', 1.52603, 'mm', rel(1e-3), elements, peak(sections.machinedAngle)),
  row('C-46', 'tee J by the outline of its walls', 'flange 14 × 1, stem to 10 × 1, fillets 0.5 mm', 7.990392, 'mm⁴', rel(5e-5), elements, J(sections.machinedTee)),
  row('C-48', 'bent angle J by the outline of its walls', 'legs 10, t 1, inside radius 0.5 mm', 5.989008, 'mm⁴', rel(5e-5), elements, J(sections.bentAngle)),
  row('C-52', 'two-cell box J by the outline of its walls', 'cells 100 × 80 and 140 × 80 mm', 4_457_367.56, 'mm⁴', abs(1), 'finite elements refined to 105,000 quadratic triangles: bound [4457366.99, 4457368.13]', J(twoCellWalls)),
  row('C-03', 'tube J by the outline of its walls', 'Ro 25, Ri 20 mm', 362_264.902867073, 'mm⁴', rel(1e-7), 'exact (Saint-Venant)', J(halves)),
]

export const wallAreaRows = areas
export const wallsOutlineRows: readonly ReferenceRow[] = [...areas, ...torsion]
