/** Guards on ends, stresses, twist and margins. */
import type { Guard } from '#shared/calc/types'
import { fired } from '#shared/calc/guards/catalogue'
import { factorGuards } from '#shared/calc/guards/factors'
import { fatigueGuards, type StressShare } from '#shared/calc/guards/fatigue'
import { marginGuards, yieldGuards } from '#shared/calc/guards/margins'
import { totalTwistGuards, wagnerGuards, type CaseWagner } from '#shared/calc/guards/rotation'
import type { Solution, WagnerState } from '#shared/calc/kinds/open-section/solution'
import { figure } from '#shared/calc/parts/say'

const LONG_BAR = 10

export function loadingGuards(s: Solution): Guard[] {
  return [
    ...factorGuards(s.model.factors, s.model.declarations.fitting), ...endGuards(s), ...yieldGuards(s.margins, ['shear-yield', 'corner-yield']), ...fatigue(s),
    ...wagnerGuards(wagnerStates(s)), ...totalTwistGuards(twists(s)), ...marginGuards(s.margins),
  ]
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

/** The notch of a corner, a declared repeated load, or a stress high enough for fatigue to matter (methods §7.6). */
function fatigue(s: Solution): Guard[] {
  const notches = s.corners.flatMap(c => c.factor.ok ? [{ place: `node ${c.node}`, factor: c.factor.K }] : [])
  let worst: StressShare | null = null
  for (const { wall } of s.walls) {
    const perRate = wall.material.Fsu === null ? 0 : (s.perRate.face.get(wall.id) ?? 0) / wall.material.Fsu
    for (const c of s.cases) {
      const share = perRate * Math.abs(c.rate) * c.toLimit
      if (share > (worst?.share ?? 0)) worst = { share, place: `wall ${wall.id}`, wall: wall.id, caseId: c.model.id }
    }
  }
  return fatigueGuards({ repeated: s.model.declarations.repeated, notches, worst })
}

function wagnerStates(s: Solution): CaseWagner[] {
  const of = (caseId: string, level: CaseWagner['level'], state: WagnerState | null) => state ? [{ caseId, level, ...state }] : []
  return s.cases.flatMap(c => [...of(c.model.id, 'limit', c.wagnerLimit), ...of(c.model.id, 'ultimate', c.wagnerUltimate)])
}

const twists = (s: Solution) => s.cases.map(c => ({ caseId: c.model.id, twist: (c.twist ?? 0) * c.toLimit }))
