/** Guards on ends, stresses, twist and margins. */
import type { Guard, MarginRow } from '#shared/calc/types'
import { fired } from '#shared/calc/kinds/open-section/guard-catalogue'
import { degrees, figure } from '#shared/calc/kinds/open-section/say'
import type { CaseSolution, Solution, WagnerState } from '#shared/calc/kinds/open-section/solution'
import { showMargin } from '#shared/units/display'

const LONG_BAR = 10
const WAGNER_CAUTION = 0.02
const WAGNER_STOP = 0.1
/** Degrees over the whole length at limit. */
const TWIST_CAUTION = 10
const TWIST_STOP = 20
/** Typed angles are compared a hair above, so that 20° is not above 20°. */
const HAIR = 1e-12
const FATIGUE_SHARE = 0.3
const FATIGUE_FACTOR = 1.5
const SMALL_MARGIN = 0.05

interface Rotation { c: CaseSolution, level: 'limit' | 'ultimate', state: WagnerState | null }

export function loadingGuards(s: Solution): Guard[] {
  return [...endGuards(s), ...yieldGuard(s), ...fatigue(s), ...wagner(s), ...totalTwist(s), ...margins(s)]
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
  } else if (declarations.builtIn) {
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

/** One guard for the calculation, naming the worst case and level: what is written for it covers the milder ones. */
function wagner(s: Solution): Guard[] {
  const states = s.cases.flatMap((c): Rotation[] => [{ c, level: 'limit', state: c.wagnerLimit }, { c, level: 'ultimate', state: c.wagnerUltimate }])
  const worst = states.reduce<Rotation | undefined>((high, next) => next.state && next.state.ratio > (high?.state?.ratio ?? WAGNER_CAUTION) ? next : high, undefined)
  if (!worst?.state) return []
  const { c, level, state } = worst
  const stop = state.ratio > WAGNER_STOP
  const stress = state.stress === null ? '' : `, with a longitudinal stress of ${figure(state.stress)} MPa`
  return [fired('G-28', {
    caseId: c.model.id, severity: stop ? 'stop' : 'caution', values: { ratio: state.ratio },
    message: `At ${level} load case ${c.model.id} has a Wagner ratio of ${figure(state.ratio)}, above ${stop ? WAGNER_STOP : WAGNER_CAUTION}: at this rate of twist the section carries ${figure(state.torque)} N·mm${stress}.`,
  })]
}

/** One guard for the calculation, naming the case that twists the bar most. */
function totalTwist(s: Solution): Guard[] {
  const twistOf = (c: CaseSolution) => degrees(Math.abs(c.twist ?? 0) * c.toLimit)
  const worst = s.cases.reduce<CaseSolution | undefined>((high, next) => high && twistOf(high) >= twistOf(next) ? high : next, undefined)
  if (!worst) return []
  const twist = twistOf(worst)
  if (twist <= TWIST_CAUTION * (1 + HAIR)) return []
  const stop = twist > TWIST_STOP * (1 + HAIR)
  return [fired('G-29', {
    caseId: worst.model.id, severity: stop ? 'stop' : 'caution', deviable: stop, values: { 'twist, °': twist },
    message: `At limit load case ${worst.model.id} twists the bar by ${figure(twist)}°, more than ${stop ? TWIST_STOP : TWIST_CAUTION}°.`,
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
