/** From the outline as numbers to its solution. Pure; failures are values. */
import type { GeneralOutlineModel } from '#shared/calc/kinds/general-outline/model'
import type { CaseSolution, Compared, Solution, WagnerState } from '#shared/calc/kinds/general-outline/solution'
import type { CaseModel } from '#shared/calc/parts/model'
import type { Fault } from '#shared/calc/types'
import { judgedMargins } from '#shared/calc/kinds/general-outline/margins'
import { knockdownOf, levelsOf, type Levels } from '#shared/calc/parts/strength'
import { judgeAgreement, type ComparedQuantity } from '#shared/torsion/outline/agreement'
import type { Outline, OutlineEdge, PlanePoint } from '#shared/torsion/outline/outline'
import { edgePoint } from '#shared/torsion/outline/outline'
import type { OutlineTorsion } from '#shared/torsion/outline/outline-torsion'
import { checkOutline } from '#shared/torsion/outline/outline-check'
import { polarMoments } from '#shared/torsion/outline/outline-properties'
import { solvedOutline } from '#shared/torsion/outline/solved-outlines'
import { wagner } from '#shared/torsion/wagner'

export type Solved = { ok: true, solution: Solution } | { ok: false, faults: Fault[] }

export function solveGeneralOutline(model: GeneralOutlineModel): Solved {
  const sound = checkOutline(model.outline)
  const torsion = sound.ok ? solvedOutline(model.outline) : sound
  if (!sound.ok || !torsion.ok) return { ok: false, faults: [{ path: faultPath(model.outline, torsion.ok ? '' : torsion.reason), message: `G-06: ${torsion.ok ? '' : torsion.reason}` }] }
  const levels = model.cases.map(c => levelsOf(model.factors, c.level))
  const refused = levels.flatMap((one, i) => one.ok ? [] : [{ path: `loading.cases.${i}`, message: one.reason }])
  if (refused.length > 0) return { ok: false, faults: refused }
  const { shear } = torsion
  const peaks = shear.bounded ? shear.peaks : null
  const GJ = model.material.G * torsion.J.value
  const large = largeTwist(model, torsion, sound.edges, GJ)
  const cases = model.cases.flatMap((c, i) => {
    const level = levels[i]
    return level?.ok ? [solveCase(model, c, level, GJ, peaks?.estimate.value ?? null, large)] : []
  })
  const W = peaks ? torsion.J.value / peaks.estimate.value : null
  const base = { model, torsion, edges: sound.edges, size: sound.size, peaks, GJ, W, kL: decay(model, torsion, GJ), cases, compared: comparisons(model, torsion, W) }
  const unsized = [GJ, ...cases.flatMap(c => [c.torque, c.rate, c.tau ?? 0])].some(value => !Number.isFinite(value))
  if (unsized) return { ok: false, faults: [{ path: 'outer', message: 'G-01: The numbers are too large to compute with; check them and their units.' }] }
  const { rows, governing } = judgedMargins(base)
  return { ok: true, solution: { ...base, margins: rows, governing } }
}

/** A reason that speaks of a hole stands at the holes. */
const faultPath = (outline: Outline, reason: string): string => (outline.holes.length > 0 && /\bhole\b/i.test(reason) ? 'holes' : 'outer')

/** kL = L √(GJ / EΓ), where all of them are known. */
function decay(model: GeneralOutlineModel, { gamma }: OutlineTorsion, GJ: number): number | null {
  const E = model.material.E
  if (!model.length || E === null || !gamma || !(gamma.value > 0)) return null
  const kL = model.length.value * Math.sqrt(GJ / (E * gamma.value))
  return Number.isFinite(kL) ? kL : null
}

type LargeTwist = (rate: number) => WagnerState | null

/** The large-twist effect by the fourth moment of the outline about its shear centre. */
function largeTwist(model: GeneralOutlineModel, torsion: OutlineTorsion, edges: Solution['edges'], GJ: number): LargeTwist {
  const E = model.material.E
  const { A } = torsion.properties
  const { second, fourth } = polarMoments(edges, torsion.shearCentre)
  const rhoMax = farthest(edges, torsion.shearCentre)
  const In = fourth - second * second / A
  return (rate) => {
    const effect = E === null ? null : wagner({ E, GJ, In, Ips: second, A, rhoMax, rate })
    return effect?.ok ? { In, ratio: effect.ratio, torque: effect.torque, stress: effect.edgeStress } : null
  }
}

/** Arcs are searched in sixteenths, which is within 0.1 % of their farthest point. */
function farthest(edges: Solution['edges'], from: PlanePoint): number {
  const parts = (edge: OutlineEdge): number[] => (edge.arc ? Array.from({ length: 16 }, (_, k) => k / 16) : [0])
  return Math.max(...edges.flatMap(edge => parts(edge).map((part) => {
    const at = edgePoint(edge, part)
    return Math.hypot(at.x - from.x, at.y - from.y)
  })))
}

/** A part that follows the structure has its rate of twist given, any other its torque. */
function solveCase(model: GeneralOutlineModel, c: CaseModel, { toLimit, toUltimate }: Levels, GJ: number, perRate: number | null, large: LargeTwist): CaseSolution {
  const rate = c.rate ? c.rate.value : (c.torque?.value ?? 0) / GJ
  return {
    model: c, rate, torque: c.rate ? GJ * rate : c.torque?.value ?? 0, twist: model.length ? rate * model.length.value : null, toLimit, toUltimate,
    tau: perRate === null ? null : model.material.G * Math.abs(rate) * perRate,
    knockdown: knockdownOf(model.material, c.temperature?.value),
    wagnerLimit: large(rate * toLimit), wagnerUltimate: large(rate * toUltimate),
  }
}

/** The first method against this one. The shear is compared at one torque: the moduli stand in the inverse ratio. */
function comparisons({ first }: GeneralOutlineModel, { J, gamma }: OutlineTorsion, W: number | null): Compared[] {
  if (!first) return []
  const pair = (quantity: ComparedQuantity, one: number | undefined, second: number | null): Compared[] =>
    one === undefined || second === null ? [] : [{ quantity, first: one, second, agreement: judgeAgreement(first.method, quantity, one, second) }]
  const { J: J1, W: W1, Gamma } = first
  return [
    ...pair('J', J1?.value, J.value),
    ...pair('tau', W1 ? 1 / W1.value : undefined, W === null ? null : 1 / W),
    ...pair('gamma', Gamma?.value, gamma?.value ?? null),
  ]
}
