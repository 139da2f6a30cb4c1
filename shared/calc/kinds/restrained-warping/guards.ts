/** Every guard of a bar with restrained warping that fires. */
import { fired } from '#shared/calc/guards/catalogue'
import { factorGuards } from '#shared/calc/guards/factors'
import { fatigueGuards, type StressShare } from '#shared/calc/guards/fatigue'
import { marginGuards, yieldGuards } from '#shared/calc/guards/margins'
import { materialGuards } from '#shared/calc/guards/materials'
import { inOrder } from '#shared/calc/guards/order'
import { totalTwistGuards, wagnerGuards, type CaseWagner } from '#shared/calc/guards/rotation'
import { geometryGuards } from '#shared/calc/kinds/open-section/guards-geometry'
import type { WagnerState } from '#shared/calc/kinds/open-section/solution'
import type { WarpingCase, WarpingSolution } from '#shared/calc/kinds/restrained-warping/solution'
import { figure } from '#shared/calc/parts/say'
import type { Guard } from '#shared/calc/types'
import { compressionCaution } from '#shared/torsion/warping/compression'

/** From here on an end changes the twist little (methods §3.6). */
const LONG_BAR = 10

export function restrainedWarpingGuards(s: WarpingSolution): Guard[] {
  const { model, section, margins, cases } = s
  const used = section.model.materials.filter(m => section.model.walls.some(wall => wall.material === m))
  const notches = section.corners.flatMap(c => c.factor.ok ? [{ place: `node ${c.node}`, factor: c.factor.K }] : [])
  return inOrder([
    ...geometryGuards(section), ...materialGuards({ materials: used, cases: model.cases, partial: model.factors.partial, needs: ['Fsu', 'Ftu', 'Fty'] }),
    ...factorGuards(model.factors, model.declarations.fitting), ...endGuards(s), ...sharing(s), ...equivalentYield(s), ...yieldGuards(margins, ['corner-yield']).map(one => ({ ...one, key: `${one.key}:corner` })),
    ...fatigueGuards({ repeated: model.declarations.repeated, notches, worst: worstShare(s) }),
    ...wagnerGuards(cases.flatMap(wagnerStates)), ...totalTwistGuards(cases.map(c => ({ caseId: c.model.id, twist: c.peaks.phi.phi * c.toLimit }))), ...compression(s), ...marginGuards(margins),
  ])
}

/** The warping solution is here (G-16, G-17); what it takes as free to warp is asked for (G-18). */
function endGuards({ model, kL }: WarpingSolution): Guard[] {
  const guards: Guard[] = []
  const restrained = model.supports.filter(one => one.warping !== 'free')
  if (restrained.length > 0 && kL < LONG_BAR) {
    guards.push(fired('G-16', {
      severity: 'caution', deviable: false, values: { kL }, title: 'Warping restrained', ask: 'Show that the supports hold warping as stated, or bound the result with them free.',
      message: `Warping is held at ${restrained.length === 1 ? 'one support' : `${restrained.length} supports`} and kL = ${figure(kL)}, below ${LONG_BAR}: twist and stress rest on that restraint.`,
    }))
  }
  if (restrained.length > 0 && kL >= LONG_BAR) guards.push(fired('G-17', { values: { kL }, message: `kL = ${figure(kL)}, at or above ${LONG_BAR}: the restrained end changes the twist little; its normal stress is in the results.` }))
  const free = model.supports.filter(one => one.twist !== 'free' && one.warping === 'free').length
  if (model.declarations.builtIn && free > 0) guards.push(fired('G-18', { values: { kL }, message: `A support is declared to hold the section, and warping is taken as free at ${free === 1 ? 'one support' : `${free} supports`} (kL = ${figure(kL)}).` }))
  return guards
}

/** More supports than equilibrium needs (G-21). */
function sharing({ model }: WarpingSolution): Guard[] {
  const count = model.supports.filter(one => one.twist !== 'free').length
  return count < 2 ? [] : [fired('G-21', { values: { supports: count }, message: `${count} supports share the torque by their stiffness and that of the bar between them.` })]
}

/** Equivalent stress above yield at limit (G-26). */
function equivalentYield({ margins }: WarpingSolution): Guard[] {
  const worst = margins.filter(row => row.mode === 'equivalent-yield' && row.ms !== null && row.ms < 0).sort((a, b) => (a.ms ?? 0) - (b.ms ?? 0))[0]
  if (!worst) return []
  return [fired('G-26', {
    caseId: worst.caseId, ...(worst.wall === undefined ? {} : { wall: worst.wall }), values: { 'stress, MPa': worst.applied, 'yield, MPa': worst.allowable },
    message: `At limit load the equivalent stress at ${worst.place} in case ${worst.caseId} is ${figure(worst.applied)} MPa, above the yield strength of ${figure(worst.allowable)} MPa.`,
  })]
}

/** What comes nearest to its ultimate shear strength at limit load (methods §7.6). */
function worstShare({ cases, groups }: WarpingSolution): StressShare | null {
  return cases.reduce<StressShare | null>((worst, c) => groups.reduce<StressShare | null>((high, { place, wall, materials }, i) => {
    const strength = Math.min(...materials.map(m => m.Fsu ?? Infinity))
    const share = (c.stress[i]?.tau.value ?? 0) * c.toLimit / strength
    return share > (high?.share ?? 0) ? { share, place, ...(wall === undefined ? {} : { wall }), caseId: c.model.id } : high
  }, worst), null)
}

function wagnerStates(c: WarpingCase): CaseWagner[] {
  const of = (level: CaseWagner['level'], state: WagnerState | null) => state ? [{ caseId: c.model.id, level, ...state }] : []
  return [...of('limit', c.wagnerLimit), ...of('ultimate', c.wagnerUltimate)]
}

/** Compression takes stiffness from a bar in torsion (G-41); held along its length to a stiffer structure it does not turn. */
function compression({ model, cases }: WarpingSolution): Guard[] {
  const worst = cases.reduce<WarpingCase | null>((high, c) => (c.compression > (high?.compression ?? compressionCaution) ? c : high), null)
  if (!worst) return []
  const buckles = worst.compression >= 1
  const held = model.declarations.heldAlong
  const share = `At ultimate the compression of case ${worst.model.id} takes ${figure(worst.compression * 100)} % off GJ`
  return [fired('G-41', {
    caseId: worst.model.id, severity: buckles && !held ? 'stop' : 'caution', values: { 'σI/GJ': worst.compression },
    message: buckles ? `${share}: free to turn, the bar buckles in torsion, and the results shown are those without compression.` : `${share}; twist and stresses of this case are computed with what is left.`,
    ...(held ? { ask: 'Say where the restraint along the length is substantiated.' } : {}),
  })]
}
