/** Guards of a closed section: thick walls, seams, joints, the shape of the cells, corners, the built-in root. */
import { fired } from '#shared/calc/guards/catalogue'
import type { Notch } from '#shared/calc/guards/fatigue'
import { inOrder } from '#shared/calc/guards/order'
import type { CellCornerSolution } from '#shared/calc/kinds/closed-section/corners'
import type { ClosedSectionSolution } from '#shared/calc/kinds/closed-section/solve'
import type { BarCase } from '#shared/calc/parts/bar-cases'
import { barGuards } from '#shared/calc/parts/bar-guards'
import { below, degrees, figure, lengthShown } from '#shared/calc/parts/say'
import { knockdownOf, lowestStrength } from '#shared/calc/parts/strength'
import type { Guard } from '#shared/calc/types'
import { showQuantity } from '#shared/units/display'

const CHI_CAUTION = 0.05
const CHI_STOP = 0.2
const SMALL_RADIUS = 0.25
const CURVED = 2
const FIN = { slender: 10, stocky: 5 }
const ROOT_SHARE = 0.5
/** Typed values are compared a hair above, so that a limit itself passes. */
const HAIR = 1 + 1e-12

export function closedSectionGuards(s: ClosedSectionSolution): Guard[] {
  const { model } = s
  const notches = s.corners.flatMap(({ node, factor }): Notch[] => (factor.ok ? [{ place: `node ${node}`, factor: factor.K }] : []))
  return inOrder([
    ...barGuards({ bar: model.bar, cases: s.cases, places: s.places, margins: s.margins, notches, refused: model.refused, unusual: model.unusual }),
    ...fins(s), ...thickness(s), ...seams(s), ...arcs(s), ...s.corners.flatMap(c => corner(s, c)), ...joints(s), ...contour(s), ...root(s), ...shortBar(s),
  ])
}

/** Largest of all cases at ultimate, with the special factor. */
export function heaviestAtUltimate({ cases, model }: ClosedSectionSolution): { c: BarCase, torque: number } | null {
  const factor = (c: BarCase) => Math.abs(c.torque) * c.toUltimate * model.bar.factors.special
  const c = cases.reduce<BarCase | null>((high, one) => (high === null || factor(one) > factor(high) ? one : high), null)
  return c && { c, torque: factor(c) }
}

/** Walls that close no cell are open walls (G-02, G-03). */
function fins({ torsion }: ClosedSectionSolution): Guard[] {
  return torsion.walls.flatMap(({ id, fin, length, t }): Guard[] => {
    const ratio = length / t
    if (!fin || !below(ratio, FIN.slender)) return []
    const stocky = below(ratio, FIN.stocky)
    return [fired(stocky ? 'G-03' : 'G-02', { of: id, wall: id, values: { 'L/t': ratio }, message: `Wall ${id} closes no cell and has L/t = ${figure(ratio)}, below ${stocky ? FIN.stocky : FIN.slender}.` })]
  })
}

function thickness({ chi }: ClosedSectionSolution): Guard[] {
  if (chi === null || chi.chi <= CHI_CAUTION * HAIR) return []
  const stop = chi.chi > CHI_STOP * HAIR
  return [fired(stop ? 'G-05' : 'G-04', {
    wall: chi.wall, values: { 'χ': chi.chi },
    message: `Across wall ${chi.wall} the stress varies by χ = ${figure(chi.chi)} of its mean, above ${stop ? CHI_STOP : CHI_CAUTION}; the stress at the face is used.`,
  })]
}

function seams({ model, torsion }: ClosedSectionSolution): Guard[] {
  const missed = model.seams.map(seam => fired('G-07', {
    of: seam.wall, wall: seam.wall, values: { 'gap, mm': seam.gap },
    message: `Wall ${seam.wall} is named to end at node ${seam.node} but stops ${lengthShown(model.units, seam.gap)} from it; the section is computed open there.`,
  }))
  const thickest = Math.max(...torsion.walls.map(wall => wall.t))
  if (missed.length > 0 || torsion.gap === null || torsion.gap.distance > thickest) return missed
  const [a, b] = torsion.gap.nodes
  return [fired('G-07', { of: 'ends', values: { 'gap, mm': torsion.gap.distance }, message: `The free ends ${a} and ${b} stand ${lengthShown(model.units, torsion.gap.distance)} apart; the section is computed open there.` })]
}

function arcs({ model }: ClosedSectionSolution): Guard[] {
  return model.walls.flatMap((wall): Guard[] => {
    const ratio = wall.arc ? wall.arc.radius / wall.t.value : Infinity
    return below(ratio, CURVED) ? [fired('G-08', { of: wall.id, wall: wall.id, values: { 'r/t': ratio }, message: `Arc ${wall.id} has a mean radius of ${figure(ratio)} times its thickness, below ${CURVED}.` })] : []
  })
}

function corner({ model }: ClosedSectionSolution, c: CellCornerSolution): Guard[] {
  if (c.sharp) {
    return [fired('G-10', {
      of: c.node, values: { 'angle, °': degrees(c.between), 'r, mm': 0 },
      message: `The inside corner at node ${c.node} (${figure(degrees(c.between))}° between the walls) has no radius: the stress there is unbounded in linear elasticity, and no corner margin is given.`,
    })]
  }
  const guards: Guard[] = []
  if (!c.factor.ok) {
    guards.push(fired('G-09', {
      of: `factor:${c.node}`, severity: 'stop', deviable: true, title: 'No corner factor', values: { 'r/t': c.ratio },
      ask: 'Give the corner factor of a second method with its source, or change the corner to one the factors cover.',
      message: `No corner factor at node ${c.node} (r/t = ${figure(c.ratio)}): ${c.factor.reason} No corner margin is given.`,
    }))
  }
  if (below(c.ratio, SMALL_RADIUS)) {
    const used = c.factor.ok ? ` The factor used is ${figure(c.factor.K)}.` : ''
    guards.push(fired('G-09', { of: c.node, values: { 'r/t': c.ratio }, message: `The inside radius at node ${c.node} is ${lengthShown(model.units, c.junction?.radius.value ?? 0)}, ${figure(c.ratio)} of the thickness, below ${SMALL_RADIUS}.${used}` }))
  }
  return guards
}

/** What one fastener or spot takes of the flow along its wall, at ultimate (G-12). */
export function jointForces(s: ClosedSectionSolution): { wall: string, pitch: number, flow: number, force: number, caseId: string }[] {
  const heaviest = heaviestAtUltimate(s)
  return s.model.joints.map(({ wall, pitch }) => {
    const result = s.torsion.walls.find(one => one.id === wall.id)
    const flow = Math.abs(result?.flow ?? 0) * s.torsion.Gref * (heaviest?.torque ?? 0) / s.GJ
    return { wall: wall.id, pitch: pitch.value, flow, force: flow * pitch.value, caseId: heaviest?.c.model.id ?? '' }
  })
}

function joints(s: ClosedSectionSolution): Guard[] {
  const force = (value: number) => showQuantity(value, 'force', s.model.units === 'SI' ? 'N' : 'lbf')
  return jointForces(s).map(joint => fired('G-12', {
    of: joint.wall, wall: joint.wall, caseId: joint.caseId, values: { 'pitch, mm': joint.pitch, 'q, N/mm': joint.flow },
    message: `Wall ${joint.wall} relies on a joint of ${lengthShown(s.model.units, joint.pitch)} pitch; at ultimate load case ${joint.caseId} gives each fastener or spot ${force(joint.force)} of the shear flow.`,
  }))
}

/** The contour keeps its shape where diaphragms stand at the loads and no farther apart than two depths (G-15). */
function contour({ model, depths }: ClosedSectionSolution): Guard[] {
  const depth = depths.reduce((least, one) => Math.min(least, one), Infinity)
  const { diaphragmSpacing: spacing, diaphragmAtLoad: atLoad, units } = model
  const of = `the depth of the shallowest cell is ${lengthShown(units, depth)}`
  const guards: Guard[] = []
  if (spacing === null) guards.push(fired('G-15', { of: 'spacing', values: { 'depth, mm': depth }, message: `No spacing of diaphragms is given; ${of}.` }))
  else if (spacing.value > 2 * depth * HAIR) guards.push(fired('G-15', { of: 'spacing', values: { 'spacing, mm': spacing.value, 'depth, mm': depth }, message: `Diaphragms stand ${lengthShown(units, spacing.value)} apart, more than two depths: ${of}.` }))
  if (atLoad === null) guards.push(fired('G-15', { of: 'load', values: { 'depth, mm': depth }, message: `How far the loads are from a diaphragm is not given; ${of}.` }))
  else if (Math.abs(atLoad.value) > depth * HAIR) guards.push(fired('G-15', { of: 'load', values: { 'distance, mm': Math.abs(atLoad.value), 'depth, mm': depth }, message: `A load enters ${lengthShown(units, Math.abs(atLoad.value))} from the next diaphragm, more than one depth: ${of}.` }))
  return guards
}

/** Held against warping at high stress, a section that warps has an axial stress at its root (G-20); one that keeps plane has none. */
function root(s: ClosedSectionSolution): Guard[] {
  const { model, places, cases } = s
  if (model.root === 'free' || !s.warps) return []
  const peak = places.reduce<(typeof places)[number] | null>((high, place) => (high === null || place.perTorque > high.perTorque ? place : high), null)
  if (!peak) return []
  const shares = cases.flatMap((c) => {
    const strength = lowestStrength(peak.materials, 'Fsu', m => knockdownOf(m, c.model.temperature?.value))
    return strength === null ? [] : [{ c, strength, tau: peak.perTorque * Math.abs(c.torque) * c.toUltimate * model.bar.factors.special }]
  })
  const worst = shares.reduce<(typeof shares)[number] | null>((high, one) => (high === null || one.tau / one.strength > high.tau / high.strength ? one : high), null)
  if (!worst || worst.tau <= ROOT_SHARE * worst.strength * HAIR) return []
  const held = model.root === 'built in' ? 'The root is built in' : 'Whether the root is built in is not known'
  return [fired('G-20', {
    caseId: worst.c.model.id, ...(peak.wall === undefined ? {} : { wall: peak.wall }), values: { 'τ/Fsu': worst.tau / worst.strength },
    message: `${held}; at ultimate load ${peak.place} reaches ${figure(worst.tau)} MPa in case ${worst.c.model.id}, ${figure(worst.tau / worst.strength)} of its ultimate shear strength, above ${ROOT_SHARE}.`,
  })]
}

/** Shorter than its largest dimension, a bar knows nothing of free ends (G-39). */
function shortBar({ model, torsion }: ClosedSectionSolution): Guard[] {
  const { length } = model.bar
  if (length === null || !below(length.value, torsion.size)) return []
  return [fired('G-39', { values: { 'L, mm': length.value }, message: `The bar is ${lengthShown(model.units, length.value)} long, less than the largest dimension of its section, ${lengthShown(model.units, torsion.size)}.` })]
}
