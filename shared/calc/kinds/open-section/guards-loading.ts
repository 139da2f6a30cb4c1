/** Guards on ends, stresses, twist and margins. */
import type { Guard, MarginRow } from '#shared/calc/types'
import { fired } from '#shared/calc/kinds/open-section/guard-catalogue'
import { degrees, figure } from '#shared/calc/kinds/open-section/say'
import type { CaseSolution, Solution, WagnerState } from '#shared/calc/kinds/open-section/solution'
import { showMargin } from '#shared/units/display'

const LONG_BAR = 10
const WAGNER_CAUTION = 0.02
const WAGNER_STOP = 0.1
const FATIGUE_SHARE = 0.3
const FATIGUE_FACTOR = 1.5
const SMALL_MARGIN = 0.05

export function loadingGuards(s: Solution): Guard[] {
  return [...endGuards(s), ...yieldGuard(s), ...fatigue(s), ...s.cases.flatMap(c => wagner(c)), ...s.cases.flatMap(c => totalTwist(c)), ...margins(s)]
}

function endGuards(s: Solution): Guard[] {
  const { ends, declarations, length } = s.model
  const guards: Guard[] = []
  if (ends !== 'free') {
    const known = s.kL === null ? (length ? 'kL is not known, since E is missing' : 'the length of the bar is not given, so kL is not known') : `kL = ${figure(s.kL)}`
    guards.push(fired('G-16', {
      values: s.kL === null ? {} : { kL: s.kL },
      message: ends === 'restrained'
        ? `An end is restrained against warping (${known}); the twist and stress here are those of free warping.`
        : `It is not known whether the ends are free to warp (${known}); the twist and stress here are those of free warping.`,
    }))
    if (ends === 'restrained' && s.kL !== null && s.kL >= LONG_BAR) {
      guards.push(fired('G-17', { values: { kL: s.kL }, message: `kL = ${figure(s.kL)}, at or above ${LONG_BAR}: the restrained end changes the twist little but carries a normal stress.` }))
    }
  }
  else if (declarations.builtIn) {
    guards.push(fired('G-18', {
      values: s.kL === null ? {} : { kL: s.kL },
      message: `A support is declared to hold the section, and free warping is assumed there${s.kL === null ? '' : ` (kL = ${figure(s.kL)})`}.`,
    }))
  }
  return guards
}

function yieldGuard(s: Solution): Guard[] {
  const over = s.margins.filter(m => m.mode === 'shear-yield' || m.mode === 'corner-yield').filter(m => m.ms !== null && m.ms < 0)
  const worst = least(over)
  if (!worst) return []
  return [fired('G-26', {
    ...about(worst), values: { 'stress, MPa': worst.applied, 'yield, MPa': worst.allowable },
    message: `At limit load the shear stress at ${worst.place} in case ${worst.caseId} is ${figure(worst.applied)} MPa, above the yield strength of ${figure(worst.allowable)} MPa.`,
  })]
}

/** The notch of a corner, a declared repeated load, or a stress high enough for fatigue to matter (methods §7.6). */
function fatigue(s: Solution): Guard[] {
  const guards: Guard[] = []
  if (s.model.declarations.repeated) guards.push(fired('G-27', { of: 'repeated', values: { declared: 1 }, message: 'The load is declared repeated; no life is computed here.' }))
  const notch = s.corners.flatMap(c => c.factor.ok && c.factor.K > FATIGUE_FACTOR ? [{ node: c.node, K: c.factor.K }] : []).sort((a, b) => b.K - a.K)[0]
  if (notch) guards.push(fired('G-27', { of: 'notch', values: { K: notch.K }, message: `The corner factor at node ${notch.node} is ${figure(notch.K)}, above ${FATIGUE_FACTOR}.` }))
  let worst: { share: number, wall: string, caseId: string } | null = null
  for (const c of s.cases) {
    for (const { wall } of s.walls) {
      const Fsu = wall.material.Fsu
      const share = Fsu === null ? 0 : Math.abs(c.tau.get(wall.id) ?? 0) * c.toLimit / Fsu
      if (share > FATIGUE_SHARE && share > (worst?.share ?? 0)) worst = { share, wall: wall.id, caseId: c.model.id }
    }
  }
  if (worst) {
    guards.push(fired('G-27', {
      of: 'stress', wall: worst.wall, caseId: worst.caseId, values: { 'τ/Fsu': worst.share },
      message: `At limit load wall ${worst.wall} reaches ${figure(worst.share)} of its ultimate shear strength in case ${worst.caseId}, above ${FATIGUE_SHARE}.`,
    }))
  }
  return guards
}

function wagner(c: CaseSolution): Guard[] {
  const at = (level: 'limit' | 'ultimate', w: WagnerState | null): { level: string, w: WagnerState }[] => w && w.ratio > WAGNER_CAUTION ? [{ level, w }] : []
  // One guard per case: the level that is worse says it all, and the ultimate ratio is never the smaller one.
  const worst = [...at('limit', c.wagnerLimit), ...at('ultimate', c.wagnerUltimate)].sort((a, b) => b.w.ratio - a.w.ratio)[0]
  if (!worst) return []
  const { level, w } = worst
  const stop = w.ratio > WAGNER_STOP
  const stress = w.stress === null ? '' : `, with a longitudinal stress of ${figure(w.stress)} MPa`
  return [fired('G-28', {
    of: c.model.id, caseId: c.model.id, severity: stop ? 'stop' : 'caution', values: { ratio: w.ratio },
    message: `At ${level} load case ${c.model.id} has a Wagner ratio of ${figure(w.ratio)}, above ${stop ? WAGNER_STOP : WAGNER_CAUTION}: at this rate of twist the section carries ${figure(w.torque)} N·mm${stress}.`,
  })]
}

function totalTwist(c: CaseSolution): Guard[] {
  if (c.twist === null) return []
  const twist = degrees(Math.abs(c.twist) * c.toLimit)
  if (twist <= 10 * (1 + 1e-12)) return []
  const stop = twist > 20 * (1 + 1e-12)
  return [fired('G-29', {
    of: c.model.id, caseId: c.model.id, severity: stop ? 'stop' : 'caution', deviable: stop, values: { 'twist, °': twist },
    message: `At limit load case ${c.model.id} twists the bar by ${figure(twist)}°, more than ${stop ? 20 : 10}°.`,
  })]
}

function margins(s: Solution): Guard[] {
  const modes = [...new Set(s.margins.map(m => m.mode))]
  return modes.flatMap((mode): Guard[] => {
    const worst = least(s.margins.filter(m => m.mode === mode))
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
