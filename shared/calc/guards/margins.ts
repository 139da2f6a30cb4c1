/** Guards on margins: yield exceeded at limit, small and negative margins. */
import type { Guard, MarginRow } from '#shared/calc/types'
import { fired } from '#shared/calc/guards/catalogue'
import { figure } from '#shared/calc/parts/say'
import { showMargin } from '#shared/units/display'

const SMALL_MARGIN = 0.05

/** The worst margin of each mode, where it is negative or small (G-34). */
export function marginGuards(rows: readonly MarginRow[]): Guard[] {
  const modes = [...new Set(rows.map(m => m.mode))]
  return modes.flatMap((mode): Guard[] => {
    const worst = least(rows.filter(m => m.mode === mode))
    if (!worst || worst.ms === null || worst.ms >= SMALL_MARGIN) return []
    const negative = worst.ms < 0
    return [fired('G-34', {
      of: mode, ...about(worst), severity: negative ? 'stop' : 'caution', deviable: negative, values: { MS: worst.ms },
      title: negative ? 'Negative margin' : 'Small margin',
      message: `${worst.modeLabel}: the margin is ${showMargin(worst.ms)} at ${worst.place} in case ${worst.caseId}, ${negative ? 'below zero' : `below +${SMALL_MARGIN}`}.`,
      ...(negative ? { ask: 'Change the part, or conclude “not adequate” in a written deviation.' } : {}),
    })]
  })
}

const about = (row: MarginRow) => ({ ...(row.wall === undefined ? {} : { wall: row.wall }), caseId: row.caseId })

function least(rows: MarginRow[]): MarginRow | undefined {
  return rows.reduce<MarginRow | undefined>((low, row) => row.rf !== null && (low?.rf === undefined || low.rf === null || row.rf < low.rf) ? row : low, undefined)
}

/** The worst stress above yield at limit (G-26); `modes` are those whose allowable is a yield strength. */
export function yieldGuards(rows: readonly MarginRow[], modes: readonly string[], stress: 'shear' | 'equivalent' = 'shear'): Guard[] {
  const over = rows.filter(row => modes.includes(row.mode) && row.ms !== null && row.ms < 0)
  const worst = least(over)
  if (!worst) return []
  return [fired('G-26', {
    ...about(worst), values: { 'stress, MPa': worst.applied, 'yield, MPa': worst.allowable },
    message: `At limit load the ${stress} stress at ${worst.place} in case ${worst.caseId} is ${figure(worst.applied)} MPa, above the yield strength of ${figure(worst.allowable)} MPa.`,
  })]
}
