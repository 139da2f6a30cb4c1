/** Guards on the section itself: slenderness, seams, bends, corners, corrections, taper, cut-outs. */
import type { Guard } from '#shared/calc/types'
import { fired } from '#shared/calc/kinds/open-section/guard-catalogue'
import { SEAM_TOLERANCE } from '#shared/calc/kinds/open-section/parse-geometry'
import type { Unusual } from '#shared/calc/kinds/open-section/model'
import type { CornerSolution, Solution } from '#shared/calc/kinds/open-section/solution'
import { below, degrees, figure, lengthShown } from '#shared/calc/kinds/open-section/say'

const SLENDER = 10
const STOCKY = 5
const CURVED = 2
const SMALL_RADIUS = 0.25
const CORRECTION_SHARE = 0.15
const TAPER = 10 * Math.PI / 180

export function geometryGuards(s: Solution): Guard[] {
  return [
    ...refusedInputs(s), ...slenderness(s), ...seams(s), ...curvature(s),
    ...s.corners.flatMap(c => corner(s, c)), ...corrections(s), ...taperAndCutOut(s), ...outsideTheory(s), ...unusual(s),
  ]
}

function refusedInputs(s: Solution): Guard[] {
  return s.model.refused.map(r => fired('G-01', {
    of: r.path, values: { value: r.value },
    message: `${capital(r.label)} is “${r.typed}” and must be above zero; it was left out and nothing that needs it is given.`,
  }))
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
        : `Wall ${seam.wall} is named to end at node ${seam.node} but stops ${lengthShown(s, seam.gap)} from it; the section is computed open there.`,
    })
  })
}

function curvature(s: Solution): Guard[] {
  const arcs = s.model.walls.flatMap((wall): Guard[] => {
    if (!wall.arc) return []
    const ratio = wall.arc.radius / wall.t.value
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
      message: `The inside radius at node ${c.node} is ${lengthShown(s, c.junction.radius.value)}, ${figure(c.ratio)} of the thickness, below ${SMALL_RADIUS}.${used}`,
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

function taperAndCutOut(s: Solution): Guard[] {
  const { taper, cutOut } = s.model.declarations
  const guards: Guard[] = []
  if (taper !== null && Math.abs(taper) > TAPER) {
    guards.push(fired('G-38', { values: { 'half-angle, °': degrees(Math.abs(taper)) }, message: `The bar tapers at a half-angle of ${figure(degrees(Math.abs(taper)))}°, more than 10°.` }))
  }
  if (cutOut !== 'none') {
    const peak = cutOut === 'at the peak'
    guards.push(fired('G-40', {
      severity: peak ? 'stop' : 'caution', values: { 'at the peak': peak ? 1 : 0 },
      message: peak ? 'A hole, cut-out or slot lies where the stress peaks; this method knows nothing of it.' : 'A hole, cut-out or slot lies in the length, away from the peak stress.',
    }))
  }
  return guards
}

function outsideTheory(s: Solution): Guard[] {
  const { layered, welded } = s.model.declarations
  return [
    ...(layered ? [fired('G-37', { of: 'layered', values: { declared: 1 }, message: 'The material is declared anisotropic or layered; the theory is for isotropic walls.' })] : []),
    ...(welded ? [fired('G-37', { of: 'welded', values: { declared: 1 }, message: 'A weld with a heat-affected zone is declared in the walls; their properties are not those of the record.' })] : []),
  ]
}

/** One per field; the load cases share one, which names the most unusual and how many others there are. */
function unusual(s: Solution): Guard[] {
  const fields = new Map<string, Unusual[]>()
  for (const u of s.model.unusual) {
    const field = u.path.replace(/^loading\.cases\.\d+\./, 'loading.')
    fields.set(field, [...fields.get(field) ?? [], u])
  }
  return [...fields].flatMap(([field, found]) => {
    const [worst] = [...found].sort((a, b) => strangeness(b) - strangeness(a))
    if (!worst) return []
    const more = found.length === 1 ? '' : ` ${found.length - 1} more ${found.length === 2 ? 'case is' : 'cases are'} as unusual.`
    return [fired('G-44', {
      of: field, values: { value: worst.value },
      message: `${capital(worst.label)} is ${figure(Math.abs(worst.value) / worst.typical)} times what is usual for its kind; the unit “${worst.unit}” may be wrong.${more}`,
    })]
  })
}

/** How far from the usual size, up or down alike. */
const strangeness = (u: Unusual) => Math.abs(Math.log(Math.abs(u.value) / u.typical))

const capital = (sentence: string) => sentence.charAt(0).toUpperCase() + sentence.slice(1)
