/**
 * Margins of safety over place × case × mode. Numbers come first, in flat arrays; rows are made only for
 * those a reader needs, so that a thousand cases on a hundred walls stay cheap (methods §7.3, §8).
 */
import type { LoadLevel, MarginRow } from '#shared/calc/types'
import { bareReserve, tieWithin } from '#shared/torsion/margins'
import type { Dimension, UnitId } from '#shared/units/units'

export interface MarginMode { mode: string, label: string, level: LoadLevel, dimension: Dimension }
/** `where` goes into the row's key, `place` into sentences; `unit` is the one the allowable was given in. */
export interface MarginPlace { where: string, place: string, wall?: string, unit: UnitId }

/** One mode at some places: index = place · number of cases + case. A NaN allowable means that no margin exists there. */
export interface MarginSet {
  mode: MarginMode
  places: readonly MarginPlace[]
  caseIds: readonly string[]
  applied: Float64Array
  allowable: Float64Array
}

/** A set whose numbers are asked for one by one; null for no margin there. */
export function marginSet(mode: MarginMode, places: readonly MarginPlace[], caseIds: readonly string[], at: (place: number, inCase: number) => { applied: number, allowable: number } | null): MarginSet {
  const applied = new Float64Array(places.length * caseIds.length)
  const allowable = new Float64Array(applied.length).fill(Number.NaN)
  for (let p = 0, i = 0; p < places.length; p += 1) {
    for (let c = 0; c < caseIds.length; c += 1, i += 1) {
      const one = at(p, c)
      if (!one) continue
      applied[i] = one.applied
      allowable[i] = one.allowable
    }
  }
  return { mode, places, caseIds, applied, allowable }
}

/** Above this many margins only those are kept that a reader needs: the least of each place and mode, of each case and mode, and the ties. */
export const MOST_ROWS = 2000

export interface JudgedMargins { rows: MarginRow[], governing: MarginRow | null }

/** Every margin as a row, least and ties marked; condensed where there are too many. Rows stand case by case. */
export function judgeMargins(sets: readonly MarginSet[]): JudgedMargins {
  const reserves = sets.map(reservesOf)
  const leastOfMode = new Map<string, number>()
  sets.forEach(({ mode }, s) => leastOfMode.set(mode.mode, Math.min(leastOfMode.get(mode.mode) ?? Infinity, leastIn(reserves[s]))))
  const least = Math.min(Infinity, ...leastOfMode.values())
  const count = sets.reduce((total, { allowable }) => total + allowable.length, 0)
  const kept = sets.map((set, s) => count > MOST_ROWS ? needed(set, reserves[s] ?? new Float64Array(0), leastOfMode.get(set.mode.mode) ?? Infinity) : null)
  const rows: MarginRow[] = []
  let governing: MarginRow | null = null
  const cases = Math.max(0, ...sets.map(({ caseIds }) => caseIds.length))
  for (let c = 0; c < cases; c += 1) {
    sets.forEach((set, s) => {
      const rf = reserves[s]
      if (!rf || c >= set.caseIds.length) return
      for (let p = 0; p < set.places.length; p += 1) {
        const i = p * set.caseIds.length + c
        if (Number.isNaN(set.allowable[i]) || kept[s]?.[i] === 0) continue
        const row = rowOf(set, p, c, rf[i] ?? Infinity, leastOfMode.get(set.mode.mode) ?? Infinity)
        if (row.rf === least && !governing) {
          row.governing = true
          governing = row
        }
        rows.push(row)
      }
    })
  }
  return { rows, governing }
}

/** Infinity stands for no load here and never leaves this file. */
function reservesOf({ applied, allowable }: MarginSet): Float64Array {
  const rf = new Float64Array(applied.length)
  for (let i = 0; i < rf.length; i += 1) {
    const value = bareReserve(allowable[i] ?? Number.NaN, applied[i] ?? 0)
    rf[i] = value < Infinity ? value : Infinity
  }
  return rf
}

function leastIn(values: Float64Array | undefined): number {
  let least = Infinity
  for (const value of values ?? []) if (value < least) least = value
  return least
}

const isTie = (rf: number, least: number) => rf <= least * (1 + tieWithin)

/** 1 where a row is needed: least row of every place, and of every case, and all ties. */
function needed({ places, caseIds, allowable }: MarginSet, rf: Float64Array, least: number): Uint8Array {
  const keep = new Uint8Array(rf.length)
  const n = caseIds.length
  const leastOfCase = new Int32Array(n).fill(-1)
  for (let p = 0; p < places.length; p += 1) {
    let best = -1
    for (let i = p * n, c = 0; c < n; i += 1, c += 1) {
      if (Number.isNaN(allowable[i])) continue
      const value = rf[i] ?? Infinity
      if (best < 0 || value < (rf[best] ?? Infinity)) best = i
      const held = leastOfCase[c] ?? -1
      if (held < 0 || value < (rf[held] ?? Infinity)) leastOfCase[c] = i
      if (value < Infinity && isTie(value, least)) keep[i] = 1
    }
    if (best >= 0) keep[best] = 1
  }
  for (const i of leastOfCase) if (i >= 0) keep[i] = 1
  return keep
}

function rowOf(set: MarginSet, p: number, c: number, reserve: number, leastOfMode: number): MarginRow {
  const { mode, caseIds } = set
  const place = set.places[p] ?? { where: '', place: '', unit: '' }
  const i = p * caseIds.length + c
  const rf = reserve < Infinity ? reserve : null
  const caseId = caseIds[c] ?? ''
  return {
    key: place.where === '' ? `${mode.mode}@${caseId}` : `${mode.mode}:${place.where}@${caseId}`,
    mode: mode.mode, modeLabel: mode.label, level: mode.level, caseId,
    ...(place.wall === undefined ? {} : { wall: place.wall }),
    place: place.place, applied: set.applied[i] ?? 0, allowable: set.allowable[i] ?? 0, dimension: mode.dimension, unit: place.unit,
    loaded: rf !== null, rf, ms: rf === null ? null : rf - 1, governingOfMode: rf !== null && isTie(rf, leastOfMode), governing: false,
  }
}

/** The least row of every mode, governing mode first. */
export function leastOfModes(rows: readonly MarginRow[]): MarginRow[] {
  const least = new Map<string, MarginRow>()
  for (const row of rows) {
    const held = least.get(row.mode)
    if (row.rf !== null && (!held || row.rf < (held.rf ?? Infinity))) least.set(row.mode, row)
  }
  return [...least.values()].sort((a, b) => (a.rf ?? 0) - (b.rf ?? 0))
}
