/** The torque that each case could carry: its own times the reserve factor of its least margin (methods §7.3). */
import type { CalcResult } from '#shared/calc/types'

export interface AllowableTorque { caseId: string, title: string, /** N·mm, at the level the case is given at. */ torque: number, allowable: number, mode: string, place: string }

/**
 * Exact because stresses and twist grow with the torque, and a reserve factor is by definition what the load may be
 * multiplied by. Cases that carry nothing have none.
 */
export function allowableTorques(result: CalcResult): AllowableTorque[] {
  return result.cases.flatMap((row): AllowableTorque[] => {
    const own = result.margins.filter(margin => margin.caseId === row.caseId && margin.rf !== null)
    const least = own.reduce<(typeof own)[number] | null>((low, margin) => (low === null || (margin.rf ?? Infinity) < (low.rf ?? Infinity) ? margin : low), null)
    if (!least || least.rf === null || row.torque === 0) return []
    return [{ caseId: row.caseId, title: row.title, torque: row.torque, allowable: row.torque * least.rf, mode: least.modeLabel, place: least.place }]
  })
}
