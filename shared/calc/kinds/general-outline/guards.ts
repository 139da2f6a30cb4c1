/** Every guard of a general outline that fires, in the order of the methods reference. */
import type { Guard } from '#shared/calc/types'
import type { Solution, WagnerState } from '#shared/calc/kinds/general-outline/solution'
import { fired } from '#shared/calc/guards/catalogue'
import { declaredGuards } from '#shared/calc/guards/declared'
import { factorGuards } from '#shared/calc/guards/factors'
import { fatigueGuards, type StressShare } from '#shared/calc/guards/fatigue'
import { refusedGuards, unusualGuards } from '#shared/calc/guards/inputs'
import { marginGuards, yieldGuards } from '#shared/calc/guards/margins'
import { materialGuards } from '#shared/calc/guards/materials'
import { inOrder } from '#shared/calc/guards/order'
import { totalTwistGuards, wagnerGuards, type CaseWagner } from '#shared/calc/guards/rotation'
import { below, degrees, figure, lengthShown } from '#shared/calc/parts/say'
import { judgeConvergence } from '#shared/torsion/outline/convergence'
import { uncertaintyLimits } from '#shared/torsion/outline/published'
import { unboundedSentence } from '#shared/torsion/outline/reentrant'
import type { MeshEstimate } from '#shared/torsion/outline/convergence'

const LONG_BAR = 10
/** Share of F_su at the root of a closed section above which its axial stress matters (§3.8). */
const ROOT_SHARE = 0.5

export function generalOutlineGuards(s: Solution): Guard[] {
  const { model } = s
  return inOrder([
    ...refusedGuards(model.refused), ...sharpVertices(s), ...endGuards(s), ...secondMethod(s), ...convergence(s), ...shortBar(s),
    ...materialGuards({ materials: [model.material], cases: model.cases, partial: model.factors.partial }),
    ...factorGuards(model.factors, model.declarations.fitting), ...yieldGuards(s.margins, ['shear-yield']), ...fatigue(s),
    ...wagnerGuards(wagnerStates(s)), ...totalTwistGuards(s.cases.map(c => ({ caseId: c.model.id, twist: (c.twist ?? 0) * c.toLimit }))),
    ...declaredGuards(model.declarations), ...marginGuards(s.margins), ...unusualGuards(model.unusual),
  ])
}

/** One for each vertex, by its place in the outline, so that an answer stays with it. */
function sharpVertices({ torsion: { shear } }: Solution): Guard[] {
  if (shear.bounded) return []
  return shear.vertices.map((vertex, k) => fired('G-10', {
    of: `vertex-${k + 1}`, values: { 'interior angle, °': degrees(vertex.interior), 'r, mm': 0 },
    message: `${unboundedSentence(vertex)} The interior angle is ${figure(degrees(vertex.interior))}°; no stress margin is given.`,
  }))
}

function endGuards(s: Solution): Guard[] {
  const { ends, declarations, length } = s.model
  const hollow = s.model.outline.holes.length > 0
  if (hollow) return closedRoot(s)
  if (ends === 'free') {
    return declarations.builtIn
      ? [fired('G-18', { values: s.kL === null ? {} : { kL: s.kL }, message: `A support is declared to hold the section, and free warping is assumed there${s.kL === null ? '' : ` (kL = ${figure(s.kL)})`}.` })]
      : []
  }
  if (s.kL !== null && s.kL >= LONG_BAR) {
    return [fired('G-17', { values: { kL: s.kL }, message: `kL = ${figure(s.kL)}, at or above ${LONG_BAR}: a restrained end changes the twist little but carries a normal stress.` })]
  }
  const known = s.kL !== null ? `kL = ${figure(s.kL)}` : length ? 'kL is not known, since E is missing or the section does not warp' : 'the length of the bar is not given, so kL is not known'
  return [fired('G-16', {
    values: s.kL === null ? {} : { kL: s.kL },
    message: ends === 'restrained'
      ? `An end is restrained against warping (${known}); the twist and stress here are those of free warping.`
      : `It is not known whether the ends are free to warp (${known}); the twist and stress here are those of free warping.`,
  })]
}

/** A section with holes that is held, and highly stressed there (G-20). */
function closedRoot(s: Solution): Guard[] {
  const { ends, declarations, material } = s.model
  const worst = highest(s, c => c.toUltimate, material.Fsu)
  if ((ends === 'free' && !declarations.builtIn) || !worst || !(worst.share > ROOT_SHARE)) return []
  return [fired('G-20', {
    caseId: worst.caseId, values: { 'τ/Fsu': worst.share },
    message: `The section with holes is held, and at ultimate case ${worst.caseId} reaches ${figure(worst.share)} of the ultimate shear strength, above ${ROOT_SHARE}.`,
  })]
}

function secondMethod({ compared }: Solution): Guard[] {
  return compared.flatMap(({ quantity, agreement: { verdict, message, difference } }) => verdict === 'inside'
    ? []
    : [fired('G-32', { of: quantity, severity: verdict, values: { difference }, message })])
}

/** Of what is used: the torsion constant, and the peak shear or what is left of it outside sharp vertices. */
function convergence({ torsion: { J, shear } }: Solution): Guard[] {
  const judge = (of: string, name: string, estimate: MeshEstimate, limit: number): Guard[] => {
    const { verdict, message } = judgeConvergence(name, estimate, limit)
    if (verdict === 'inside') return []
    return [fired('G-33', { of, severity: verdict, values: { uncertainty: estimate.value === 0 ? 0 : estimate.uncertainty / Math.abs(estimate.value) }, message })]
  }
  const peaks = shear.bounded ? shear.peaks : shear.outside
  return [
    ...judge('J', 'The torsion constant', J, uncertaintyLimits.J),
    ...peaks ? judge('tau', shear.bounded ? 'The peak shear' : 'The largest shear outside sharp vertices', peaks.estimate, uncertaintyLimits.tau) : [],
  ]
}

function shortBar({ model, size }: Solution): Guard[] {
  if (!model.length || !below(model.length.value, size)) return []
  return [fired('G-39', { values: { 'L/size': model.length.value / size }, message: `The bar is ${lengthShown(model.units, model.length.value)} long, shorter than the largest dimension of its section, ${lengthShown(model.units, size)}.` })]
}

/** The highest peak shear over a strength, at the level a factor leads to. */
function highest(s: Solution, factor: (c: Solution['cases'][number]) => number, strength: number | null): StressShare | null {
  let worst: StressShare | null = null
  for (const c of s.cases) {
    const share = strength === null || c.tau === null ? 0 : c.tau * factor(c) / strength
    if (share > (worst?.share ?? 0)) worst = { share, place: s.peaks?.first.edge ?? '', caseId: c.model.id }
  }
  return worst
}

const fatigue = (s: Solution): Guard[] => fatigueGuards({ repeated: s.model.declarations.repeated, notches: [], worst: highest(s, c => c.toLimit, s.model.material.Fsu) })

function wagnerStates(s: Solution): CaseWagner[] {
  const of = (caseId: string, level: CaseWagner['level'], state: WagnerState | null) => state ? [{ caseId, level, ...state }] : []
  return s.cases.flatMap(c => [...of(c.model.id, 'limit', c.wagnerLimit), ...of(c.model.id, 'ultimate', c.wagnerUltimate)])
}
