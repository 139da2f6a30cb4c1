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

/**
 * A set whose applied values grow with one number per case, as stresses do with |θ′|: `unit` at every place, `by`
 * in every case, `allowableAt` the allowable in every case at a place, or null where it has none.
 */
export function linearSet(mode: MarginMode, places: readonly MarginPlace[], caseIds: readonly string[], unit: (place: number) => number, by: Float64Array, allowableAt: (place: number) => Float64Array | null): MarginSet {
  const applied = new Float64Array(places.length * caseIds.length)
  const allowable = new Float64Array(applied.length)
  const n = caseIds.length
  for (let p = 0; p < places.length; p += 1) {
    const at = allowableAt(p)
    if (at) allowable.set(at, p * n)
    else allowable.fill(Number.NaN, p * n, (p + 1) * n)
    const one = unit(p)
    for (let c = 0, i = p * n; c < n; c += 1, i += 1) applied[i] = one * (by[c] as number)
  }
  return { mode, places, caseIds, applied, allowable }
}

/** Above this many margins only those are kept that a reader needs: the least of each place and mode, of each case, and the ties of each mode. */
export const MOST_ROWS = 2000

export interface JudgedMargins { rows: MarginRow[], governing: MarginRow | null }

/** Every margin as a row, least and ties marked; condensed where there are too many. Rows stand case by case. */
export function judgeMargins(sets: readonly MarginSet[]): JudgedMargins {
  const reserves = sets.map(reservesOf)
  const leastOfMode = new Map<string, number>()
  sets.forEach(({ mode }, s) => leastOfMode.set(mode.mode, Math.min(leastOfMode.get(mode.mode) ?? Infinity, leastIn(reserves[s]))))
  const least = Math.min(Infinity, ...leastOfMode.values())
  const count = sets.reduce((total, { allowable }) => total + allowable.length, 0)
  const rows = (count > MOST_ROWS ? needed(sets, reserves, leastOfMode) : all(sets)).map(({ s, i }) => {
    const set = sets[s] as MarginSet
    const n = set.caseIds.length
    return rowOf(set, Math.floor(i / n), i % n, reserves[s]?.[i] ?? Infinity, leastOfMode.get(set.mode.mode) ?? Infinity)
  })
  const governing = rows.find(row => row.rf === least) ?? null
  if (governing) governing.governing = true
  return { rows, governing }
}

/** Number of a set, and of a margin in it. */
interface Kept { s: number, i: number }

/** Case by case, in each case set by set and place by place. */
function inOrder(sets: readonly MarginSet[], kept: Kept[]): Kept[] {
  const caseOf = ({ s, i }: Kept) => i % (sets[s]?.caseIds.length ?? 1)
  return kept.sort((a, b) => caseOf(a) - caseOf(b) || a.s - b.s || a.i - b.i)
}

function all(sets: readonly MarginSet[]): Kept[] {
  const kept: Kept[] = []
  sets.forEach(({ allowable }, s) => allowable.forEach((value, i) => {
    if (!Number.isNaN(value)) kept.push({ s, i })
  }))
  return inOrder(sets, kept)
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

/** The least margin of every place and mode, of every case, and what ties with the least of its mode. */
function needed(sets: readonly MarginSet[], reserves: readonly Float64Array[], leastOfMode: ReadonlyMap<string, number>): Kept[] {
  const cases = Math.max(0, ...sets.map(({ caseIds }) => caseIds.length))
  const [setOfCase, indexOfCase, leastOfCase] = [new Int32Array(cases).fill(-1), new Int32Array(cases), new Float64Array(cases).fill(Infinity)]
  const keep = sets.map(({ allowable }) => new Uint8Array(allowable.length))
  sets.forEach(({ mode, places, caseIds, allowable }, s) => {
    const [rf, marks] = [reserves[s] as Float64Array, keep[s] as Uint8Array]
    const tied = (leastOfMode.get(mode.mode) ?? Infinity) * (1 + tieWithin)
    for (let p = 0, i = 0; p < places.length; p += 1) {
      let best = -1
      for (let c = 0; c < caseIds.length; c += 1, i += 1) {
        if (Number.isNaN(allowable[i])) continue
        const value = rf[i] as number
        if (best < 0 || value < (rf[best] as number)) best = i
        if (value < Infinity && value <= tied) marks[i] = 1
        if (value < (leastOfCase[c] as number) || setOfCase[c] === -1) {
          leastOfCase[c] = value
          setOfCase[c] = s
          indexOfCase[c] = i
        }
      }
      if (best >= 0) marks[best] = 1
    }
  })
  setOfCase.forEach((s, c) => {
    const marks = keep[s]
    if (marks) marks[indexOfCase[c] as number] = 1
  })
  const kept: Kept[] = []
  keep.forEach((marks, s) => {
    for (let i = marks.indexOf(1); i >= 0; i = marks.indexOf(1, i + 1)) kept.push({ s, i })
  })
  return inOrder(sets, kept)
}

function rowOf(set: MarginSet, p: number, c: number, reserve: number, leastOfMode: number): MarginRow {
  const { mode, caseIds } = set
  const place = set.places[p] ?? { where: '', place: '', unit: '' }
  const i = p * caseIds.length + c
  const rf = reserve < Infinity ? reserve : null
  const caseId = caseIds[c] ?? ''
  const row: MarginRow = {
    key: place.where === '' ? `${mode.mode}@${caseId}` : `${mode.mode}:${place.where}@${caseId}`,
    mode: mode.mode, modeLabel: mode.label, level: mode.level, caseId,
    place: place.place, applied: set.applied[i] ?? 0, allowable: set.allowable[i] ?? 0, dimension: mode.dimension, unit: place.unit,
    loaded: rf !== null, rf, ms: rf === null ? null : rf - 1, governingOfMode: rf !== null && isTie(rf, leastOfMode), governing: false,
  }
  if (place.wall !== undefined) row.wall = place.wall
  return row
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
