/** Guards on the section itself: slenderness, seams, bends, corners, corrections, taper, cut-outs. */
import type { Guard } from '#shared/calc/types'
import { fired } from '#shared/calc/guards/catalogue'
import { declaredGuards } from '#shared/calc/guards/declared'
import { refusedGuards, unusualGuards } from '#shared/calc/guards/inputs'
import { SEAM_TOLERANCE } from '#shared/calc/parts/parse-walls'
import type { CornerSolution, Solution } from '#shared/calc/kinds/open-section/solution'
import { below, degrees, figure, lengthShown } from '#shared/calc/parts/say'

const SLENDER = 10
const STOCKY = 5
const CURVED = 2
const SMALL_RADIUS = 0.25
const CORRECTION_SHARE = 0.15

export function geometryGuards(s: Solution): Guard[] {
  return [
    ...refusedGuards(s.model.refused), ...slenderness(s), ...seams(s), ...curvature(s),
    ...s.corners.flatMap(c => corner(s, c)), ...corrections(s), ...declaredGuards(s.model.declarations), ...unusualGuards(s.model.unusual),
  ]
}

function slenderness(s: Solution): Guard[] {
  return s.walls.flatMap(({ wall, slenderness: ratio }): Guard[] => {
    if (!below(ratio, SLENDER)) return []
    const about = { of: wall.id, wall: wall.id, values: { 'L/t': ratio } }
    return below(ratio, STOCKY)
      ? [fired('G-03', { ...about, message: `Wall ${wall.id} has L/t = ${figure(ratio)}, below ${STOCKY}: thin-wall theory does not hold for it.` })]
      : [fired('G-02', { ...about, message: `Wall ${wall.id} has L/t = ${figure(ratio)}; thin-wall theory asks for ${SLENDER}.` })]
  })
}

function seams(s: Solution): Guard[] {
  return s.model.seams.map((seam) => {
    const closed = seam.gap <= SEAM_TOLERANCE * seam.size
    return fired('G-07', {
      of: seam.wall, wall: seam.wall, values: { 'gap, mm': seam.gap },
      message: closed
        ? `Wall ${seam.wall} closes a loop at node ${seam.node}; the result is that of the section slit there.`
        : `Wall ${seam.wall} is named to end at node ${seam.node} but stops ${lengthShown(s.model.units, seam.gap)} from it; the section is computed open there.`,
    })
  })
}

function curvature(s: Solution): Guard[] {
  const arcs = s.model.walls.flatMap((wall): Guard[] => {
    if (!wall.arc) return []
    const ratio = wall.arc.radius / wall.tMax
    return below(ratio, CURVED)
      ? [fired('G-08', { of: wall.id, wall: wall.id, values: { 'r/t': ratio }, message: `Arc ${wall.id} has a mean radius of ${figure(ratio)} times its thickness, below ${CURVED}.` })]
      : []
  })
  const bends = s.corners.flatMap((c): Guard[] => {
    if (!c.junction || c.junction.make !== 'bent' || c.junction.radius.value <= 0) return []
    const ratio = c.ratio + 0.5
    return below(ratio, CURVED)
      ? [fired('G-08', { of: `bend:${c.node}`, values: { 'r/t': ratio }, message: `The bend at node ${c.node} has a mean radius of ${figure(ratio)} times the thickness, below ${CURVED}.` })]
      : []
  })
  return [...arcs, ...bends]
}

function corner(s: Solution, c: CornerSolution): Guard[] {
  if (c.sharp) {
    const angle = degrees(c.interior)
    return [fired('G-10', {
      of: c.node, values: { 'interior angle, °': angle, 'r, mm': 0 },
      message: `Node ${c.node} is a re-entrant corner of ${figure(angle)}° with no radius: the stress there is unbounded in linear elasticity, and no corner margin is given.`,
    })]
  }
  if (!c.junction) return []
  const guards: Guard[] = []
  if (!c.factor.ok) {
    guards.push(fired('G-09', {
      of: `factor:${c.node}`, severity: 'stop', deviable: true, title: 'No corner factor',
      values: { 'r/t': c.ratio }, ask: 'Give the corner factor of a second method with its source, or change the corner to one the tables cover.',
      message: `No corner factor at node ${c.node} (r/t = ${figure(c.ratio)}): ${c.factor.reason} No corner margin is given.`,
    }))
  }
  if (below(c.ratio, SMALL_RADIUS)) {
    const used = c.factor.ok ? ` The factor used is ${figure(c.factor.K)}.` : ''
    guards.push(fired('G-09', {
      of: c.node, values: { 'r/t': c.ratio },
      message: `The inside radius at node ${c.node} is ${lengthShown(s.model.units, c.junction.radius.value)}, ${figure(c.ratio)} of the thickness, below ${SMALL_RADIUS}.${used}`,
    }))
  }
  return guards
}

function corrections(s: Solution): Guard[] {
  const share = (Math.abs(s.bulge) + Math.abs(s.ends)) / s.J
  if (!(share > CORRECTION_SHARE)) return []
  return [fired('G-11', {
    values: { share },
    message: `Junction bulges and free ends together change J by ${figure(share * 100)} %, more than ${CORRECTION_SHARE * 100} % (bulges ${figure(s.bulge / s.J * 100)} %, ends ${figure(s.ends / s.J * 100)} %).`,
  })]
}
