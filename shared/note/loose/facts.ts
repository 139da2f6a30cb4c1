/** The results of a note as the scan compares with them. */
import type { CalcResult, Evaluation, MarginRow, Output } from '#shared/calc/types'
import type { NoteCalculation } from '#shared/note/calculations'
import { symbolBase, symbolKey } from '#shared/note/loose/symbols'
import { showQuantity } from '#shared/units/display'
import { fromEngine, unitFits } from '#shared/units/units'
import type { Dimension, UnitId } from '#shared/units/units'

export interface Fact {
  calcId: string
  calcLabel: string
  key: string
  symbol: string
  label: string
  /** Words of the label before its first comma, brought to one spelling. */
  words: string[]
  /** Names that mean this result when they stand before a number. */
  names: string[]
  value: number
  dimension: Dimension
  unit: UnitId
  /** The value in that unit. */
  own: number
  caseId: string | null
  wall: string | null
  shown: string
  /** Margins and reserve factors are truncated, never rounded. */
  truncated: boolean
  /** An output, so that the number can be tied to it. */
  tieable: boolean
}

export interface FactIndex {
  all: Fact[]
  /** By dimension, in rising order of magnitude. */
  byDimension: Map<Dimension, Fact[]>
  /** The lists of `byDimension` that a unit fits, kept as they are asked for. */
  inUnit: Map<UnitId, Fact[][]>
  /** All, in rising order of the magnitude they have in their own unit. */
  byOwn: Fact[]
  bySymbol: Map<string, Fact[]>
  byName: Map<string, Fact[]>
  cases: Set<string>
  walls: Set<string>
}

const STOPWORDS = new Set(['of', 'the', 'at', 'in', 'on', 'over', 'per', 'about', 'and', 'before', 'a'])
const SYNONYMS: Record<string, string> = { peak: 'largest', maximum: 'largest', greatest: 'largest', highest: 'largest', maximal: 'largest', shear: 'face', angle: 'twist' }

/** One spelling for words that mean the same here. */
export function contentWords(text: string): string[] {
  return (text.toLowerCase().match(/\p{L}{2,}/gu) ?? []).filter(word => !STOPWORDS.has(word)).map(word => (SYNONYMS[word] ?? word).slice(0, 6))
}

const headOf = (label: string) => /^[^,(]*/.exec(label)?.[0].trim() ?? label

function namesOf(output: Pick<Output, 'label' | 'dimension'>): string[] {
  if (output.dimension === 'margin') return ['margin of safety', 'margin']
  const head = headOf(output.label).toLowerCase()
  return head.includes(' ') ? [head] : []
}

function outputFact(output: Output, calculation: NoteCalculation): Fact {
  const { key, label, value, dimension, unit } = output
  return {
    calcId: calculation.id, calcLabel: calculation.label, key, symbol: symbolKey(output.symbol), label: `${calculation.label} · ${label}`,
    words: contentWords(headOf(label)), names: namesOf(output), value, dimension, unit, own: fromEngine(value, unit),
    caseId: output.caseId ?? null, wall: output.wall ?? null, shown: showQuantity(value, dimension, unit),
    truncated: dimension === 'margin', tieable: true,
  }
}

/** A reserve factor is one more than its margin; texts speak of either. */
const reserveFact = (margin: Fact): Fact => ({
  ...margin, symbol: 'RF', names: ['reserve factor'], words: contentWords('reserve factor'), value: margin.value + 1, own: margin.value + 1, dimension: 'number',
  label: `${margin.label}, as reserve factor`,
})

/** Applied stress and allowable of a margin: a text may state them, although only outputs can be tied. */
function marginFacts(row: MarginRow, calculation: NoteCalculation): Fact[] {
  const about = {
    calcId: calculation.id, calcLabel: calculation.label, key: row.key, names: [], dimension: row.dimension, unit: row.unit,
    caseId: row.caseId, wall: row.wall ?? null, truncated: false, tieable: false,
  }
  const label = `${calculation.label} · ${row.modeLabel}, ${row.place}, case ${row.caseId}`
  const shown = (value: number) => showQuantity(value, row.dimension, row.unit)
  const symbol = row.dimension === 'stress' ? 'τ' : 'φ'
  return [
    { ...about, symbol, label: `${label}: applied`, words: contentWords(`applied ${row.modeLabel}`), value: row.applied, own: fromEngine(row.applied, row.unit), shown: shown(row.applied) },
    { ...about, symbol: '', label: `${label}: allowable`, words: contentWords('allowable'), value: row.allowable, own: fromEngine(row.allowable, row.unit), shown: shown(row.allowable) },
  ]
}

function factsOf(result: CalcResult, calculation: NoteCalculation): Fact[] {
  const outputs = result.outputs.map(output => outputFact(output, calculation))
  return [...outputs, ...outputs.filter(fact => fact.dimension === 'margin').map(reserveFact), ...result.margins.flatMap(row => marginFacts(row, calculation))]
}

function push<K>(into: Map<K, Fact[]>, key: K, fact: Fact) {
  const list = into.get(key)
  if (list) list.push(fact)
  else into.set(key, [fact])
}

/** Letters of which a text may drop the index: `τ` for any `τmax`. A Latin letter without its index means something else. */
const BASES = new Set(['τ', 'θ′', 'φ', 'σ', 'ω', 'MS', 'RF'])

/** Gathers the results of all calculations that could be computed. */
export function factIndex(calculations: readonly NoteCalculation[], results: Readonly<Record<string, Evaluation>>): FactIndex {
  const all = calculations.flatMap((calculation) => {
    const evaluation = Object.hasOwn(results, calculation.id) ? results[calculation.id] : undefined
    return evaluation?.ok ? factsOf(evaluation.result, calculation) : []
  }).filter(fact => Number.isFinite(fact.value))
  const index: FactIndex = { all, byDimension: new Map(), inUnit: new Map(), byOwn: [...all].sort((a, b) => Math.abs(a.own) - Math.abs(b.own)), bySymbol: new Map(), byName: new Map(), cases: new Set(), walls: new Set() }
  for (const fact of all) {
    push(index.byDimension, fact.dimension, fact)
    if (fact.symbol !== '') push(index.bySymbol, fact.symbol, fact)
    const base = symbolBase(fact.symbol)
    if (base !== fact.symbol && BASES.has(base)) push(index.bySymbol, base, fact)
    for (const name of fact.names) push(index.byName, name, fact)
    if (fact.caseId !== null) index.cases.add(fact.caseId)
    if (fact.wall !== null) index.walls.add(fact.wall)
  }
  for (const facts of index.byDimension.values()) facts.sort((a, b) => Math.abs(a.value) - Math.abs(b.value))
  return index
}

/** The facts a unit can state, each dimension in rising order of magnitude. */
export function factsIn(unit: UnitId, index: FactIndex): Fact[][] {
  const known = index.inUnit.get(unit)
  if (known) return known
  const found = [...index.byDimension].filter(([dimension]) => unitFits(unit, dimension)).map(([, sorted]) => sorted)
  index.inUnit.set(unit, found)
  return found
}

/** Facts whose magnitude lies from `low` to `high`, in a list sorted by that magnitude. */
export function factsBetween(sorted: readonly Fact[], low: number, high: number, magnitude: (fact: Fact) => number = fact => Math.abs(fact.value)): Fact[] {
  let start = 0
  let end = sorted.length
  while (start < end) {
    const middle = (start + end) >> 1
    const fact = sorted[middle]
    if (fact && magnitude(fact) < low) start = middle + 1
    else end = middle
  }
  const found: Fact[] = []
  for (let at = start; at < sorted.length; at += 1) {
    const fact = sorted[at]
    if (!fact || magnitude(fact) > high) break
    found.push(fact)
  }
  return found
}
