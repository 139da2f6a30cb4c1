/**
 * Margins of safety per wall × case × mode, each with its own level, factors and allowable (methods §7).
 * Governing is the least reserve factor; whatever lies within 0.5 % of it is listed beside it.
 */
import type { LoadLevel, MarginRow } from '#shared/calc/types'
import type { MaterialModel, ModelWall } from '#shared/calc/kinds/open-section/model'
import type { CaseSolution, CornerSolution, Solution } from '#shared/calc/kinds/open-section/solution'
import { reserveFactor, tieWithin } from '#shared/torsion/margins'
import type { Dimension, UnitId } from '#shared/units/units'

type Unjudged = Omit<Solution, 'margins' | 'governing'>
export type Mode = 'shear-ultimate' | 'shear-yield' | 'corner-ultimate' | 'corner-yield' | 'twist'

export const MODES: Record<Mode, { label: string, level: LoadLevel }> = {
  'shear-ultimate': { label: 'Shear on the flats, ultimate', level: 'ultimate' },
  'shear-yield': { label: 'Shear on the flats, yield', level: 'limit' },
  'corner-ultimate': { label: 'Shear at the corners, ultimate', level: 'ultimate' },
  'corner-yield': { label: 'Shear at the corners, yield', level: 'limit' },
  'twist': { label: 'Twist', level: 'limit' },
}
/** Above this many rows only those are kept that a reader needs: the least of each wall, corner and case, and the ties. */
export const MOST_ROWS = 2000

export function marginRows(s: Unjudged): { rows: MarginRow[], governing: MarginRow | null } {
  const all = s.cases.flatMap(c => [...s.walls.flatMap(w => flatRows(s, c, w.wall)), ...s.corners.flatMap(k => cornerRows(s, c, k)), ...twistRow(s, c)])
  const least = all.reduce((low, row) => row.rf !== null && row.rf < low ? row.rf : low, Infinity)
  const modeLeast = new Map<string, number>()
  for (const row of all) {
    if (row.rf !== null) modeLeast.set(row.mode, Math.min(modeLeast.get(row.mode) ?? Infinity, row.rf))
  }
  let governing: MarginRow | null = null
  for (const row of all) {
    if (row.rf === null) continue
    row.governingOfMode = isTie(row.rf, modeLeast.get(row.mode) ?? Infinity)
    if (row.rf === least && !governing) {
      row.governing = true
      governing = row
    }
  }
  return { rows: all.length > MOST_ROWS ? condense(all) : all, governing }
}

const isTie = (rf: number, least: number) => rf <= least * (1 + tieWithin)

function flatRows(s: Unjudged, c: CaseSolution, wall: ModelWall): MarginRow[] {
  const tau = Math.abs(c.tau.get(wall.id) ?? 0)
  const place = wall.name.trim() === '' ? `wall ${wall.id}` : `wall ${wall.id} (${wall.name.trim()})`
  const about = { where: wall.id, wall: wall.id, place }
  return stressRows(s, c, strengthOf(c, [wall.material]), tau, about, 'shear-ultimate', 'shear-yield')
}

function cornerRows(s: Unjudged, c: CaseSolution, corner: CornerSolution): MarginRow[] {
  const tau = c.corner.get(corner.node)
  if (tau === undefined) return []
  const about = { where: corner.node, wall: corner.worst.id, place: `corner ${corner.node}` }
  return stressRows(s, c, strengthOf(c, corner.walls.map(w => w.material)), Math.abs(tau), about, 'corner-ultimate', 'corner-yield')
}

interface About { where: string, wall: string, place: string }
interface Strength { ultimate: number | null, yielding: number | null, unit: UnitId }

/** Strengths at the temperature of the case; where walls of two materials meet, the lower one. */
function strengthOf(c: CaseSolution, materials: MaterialModel[]): Strength {
  const lowest = (pick: (m: MaterialModel) => number | null) => materials.reduce<number | null>((low, m) => {
    const value = pick(m)
    const now = value === null ? null : value * (c.knockdown.get(m.id) ?? 1)
    return now === null || low === null ? null : Math.min(low, now)
  }, Infinity)
  return { ultimate: lowest(m => m.Fsu), yielding: lowest(m => m.Fsy), unit: materials[0]?.units.strength ?? 'MPa' }
}

function stressRows(s: Unjudged, c: CaseSolution, strength: Strength, tau: number, about: About, ultimate: Mode, yielding: Mode): MarginRow[] {
  const { factors } = s.model
  return [
    ...(strength.ultimate === null ? [] : [row(c, ultimate, about, tau * c.toUltimate * factors.special, strength.ultimate, 'stress', strength.unit)]),
    ...(strength.yielding === null ? [] : [row(c, yielding, about, tau * c.toLimit * factors.specialAtLimit, strength.yielding, 'stress', strength.unit)]),
  ]
}

function twistRow(s: Unjudged, c: CaseSolution): MarginRow[] {
  const allowed = s.model.twistAllowed
  if (c.twist === null || allowed === null) return []
  return [row(c, 'twist', { where: '', wall: '', place: 'the bar' }, Math.abs(c.twist) * c.toLimit, allowed.value, 'angle', allowed.unit)]
}

function row(c: CaseSolution, mode: Mode, about: About, applied: number, allowable: number, dimension: Dimension, unit: UnitId): MarginRow {
  const reserve = reserveFactor(allowable, applied)
  const rf = reserve.ok ? reserve.rf : null
  return {
    key: about.where === '' ? `${mode}@${c.model.id}` : `${mode}:${about.where}@${c.model.id}`,
    mode, modeLabel: MODES[mode].label, level: MODES[mode].level, caseId: c.model.id,
    ...(about.wall === '' ? {} : { wall: about.wall }),
    place: about.place, applied, allowable, dimension, unit,
    loaded: rf !== null, rf, ms: rf === null ? null : rf - 1, governingOfMode: false, governing: false,
  }
}

/** Least row of every place and mode, and of every case and mode, and all ties. */
function condense(rows: MarginRow[]): MarginRow[] {
  const keep = new Set<MarginRow>()
  const least = new Map<string, MarginRow>()
  for (const r of rows) {
    if (r.governingOfMode || r.governing) keep.add(r)
    for (const group of [`${r.mode} ${r.place}`, `${r.mode} @${r.caseId}`]) {
      const held = least.get(group)
      if (!held || (r.rf ?? Infinity) < (held.rf ?? Infinity)) least.set(group, r)
    }
  }
  for (const r of least.values()) keep.add(r)
  return rows.filter(r => keep.has(r))
}

/** Rows of any mode whose reserve factor lies within 0.5 % of the governing one, without the governing row itself. */
export function tiesOfGoverning(rows: MarginRow[]): MarginRow[] {
  const least = rows.find(r => r.governing)?.rf
  return least === undefined || least === null ? [] : rows.filter(r => !r.governing && r.rf !== null && isTie(r.rf, least))
}
