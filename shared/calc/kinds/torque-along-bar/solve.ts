import type { Fault, MarginRow } from '#shared/calc/types'
import type { BarCaseModel, TorqueAlongBarModel } from '#shared/calc/kinds/torque-along-bar/parse'
import { judgeMargins, marginSet, type MarginMode } from '#shared/calc/parts/margin-rows'
import { knockdownOf, levelsOf, strengthUnit } from '#shared/calc/parts/strength'
import { spanBar, type SpanBar, type SpanResponse, type SpanStation } from '#shared/torsion/span/span-bar'

export interface SegmentState { /** Largest |T| in the segment, with its sign, N·mm. */ torque: number, /** MPa at the slimmer end; null without a modulus. */ tau: number | null }
export interface AlongCase { model: BarCaseModel, response: SpanResponse, stations: SpanStation[], segments: SegmentState[], twistMax: number, toLimit: number, toUltimate: number }
export interface AlongSolution { model: TorqueAlongBarModel, bar: SpanBar, cases: AlongCase[], margins: MarginRow[], governing: MarginRow | null }
export type Solved = { ok: true, solution: AlongSolution } | { ok: false, faults: Fault[] }

export const ULTIMATE: MarginMode = { mode: 'shear-ultimate', label: 'Shear, ultimate', level: 'ultimate', dimension: 'stress' }
export const YIELD: MarginMode = { mode: 'shear-yield', label: 'Shear, yield', level: 'limit', dimension: 'stress' }
export const TWIST: MarginMode = { mode: 'twist', label: 'Twist', level: 'limit', dimension: 'angle' }

export function solveTorqueAlongBar(model: TorqueAlongBarModel): Solved {
  const bar = spanBar(model.segments.map(s => s.engine), model.supports)
  if (!bar.ok) return { ok: false, faults: [{ path: 'supports', message: bar.reason }] }
  const faults: Fault[] = []
  const cases = model.cases.flatMap((one, i): AlongCase[] => {
    const response = bar.respond(one.load)
    const levels = levelsOf(model.factors, one.level)
    if ('ok' in response || !levels.ok) {
      faults.push({ path: `cases.${i}`, message: 'ok' in response ? response.reason : levels.ok ? '' : levels.reason })
      return []
    }
    const stations = bar.stations(response)
    const everywhere = [...stations, ...bar.turns(response)]
    const segments = model.segments.map((segment, s): SegmentState => {
      const torque = everywhere.reduce((worst, at) => (at.segment === s && Math.abs(at.T) > Math.abs(worst) ? at.T : worst), 0)
      return { torque, tau: segment.perTorque === null ? null : segment.perTorque * Math.abs(torque) }
    })
    return [{ model: one, response, stations, segments, toLimit: levels.toLimit, toUltimate: levels.toUltimate, twistMax: everywhere.reduce((high, at) => Math.max(high, Math.abs(at.phi)), 0) }]
  })
  if (faults.length > 0) return { ok: false, faults }
  const { rows, governing } = judgeMargins(marginSets(model, cases))
  return { ok: true, solution: { model, bar, cases, margins: rows, governing } }
}

function marginSets(model: TorqueAlongBarModel, cases: readonly AlongCase[]) {
  const { factors, twistAllowed } = model
  const caseIds = cases.map(c => c.model.id)
  const places = model.segments.map(({ id, title, material }) => ({ where: id, place: title.trim() === '' ? `segment ${id}` : `segment ${id} (${title.trim()})`, unit: strengthUnit([material]) }))
  const stress = (mode: MarginMode, name: 'Fsu' | 'Fsy', factor: (c: AlongCase) => number) => marginSet(mode, places, caseIds, (s, i) => {
    const [segment, c] = [model.segments[s], cases[i]]
    const [tau, strength] = [c?.segments[s]?.tau ?? null, segment?.material[name] ?? null]
    return segment && c && tau !== null && strength !== null ? { applied: tau * factor(c), allowable: strength * knockdownOf(segment.material, c.model.temperature?.value) } : null
  })
  return [
    stress(ULTIMATE, 'Fsu', c => c.toUltimate * factors.special), stress(YIELD, 'Fsy', c => c.toLimit * factors.specialAtLimit),
    ...(twistAllowed === null ? [] : [marginSet(TWIST, [{ where: '', place: 'the bar', unit: twistAllowed.unit }], caseIds, (_, i) => {
      const c = cases[i]
      return c ? { applied: c.twistMax * c.toLimit, allowable: twistAllowed.value } : null
    })]),
  ]
}
