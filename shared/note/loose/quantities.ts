/** Which numbers of a text are quantities: a number with a unit, or a bare one beside a symbol of the note. */
import type { Fact, FactIndex } from '#shared/note/loose/facts'
import type { NumberToken } from '#shared/note/loose/number-tokens'
import { numberTokens } from '#shared/note/loose/number-tokens'
import type { Beside } from '#shared/note/loose/symbols'
import { besideNumber, symbolKey } from '#shared/note/loose/symbols'
import type { ScannedText } from '#shared/note/loose/texts'
import { unitAt, unitInHeading } from '#shared/note/loose/unit-spellings'
import type { UnitId } from '#shared/units/units'
import { unitFits } from '#shared/units/units'

export interface Quantity {
  token: NumberToken
  from: number
  to: number
  /** Null for a bare number beside a symbol. */
  unit: UnitId | null
  /** The results whose symbol or name stands directly before it. */
  beside: Fact[]
  /** It belongs to something that is no result of the note: `limit`, `pitch`, `F_cr`. */
  foreign: boolean
}

/** What comes before a number that only points somewhere. */
const REFERENCE = /(?:(?:^|[\s(,;])(?:sections?|sect?\.|figures?|figs?\.|tables?|equations?|eqs?\.|steps?|pages?|p\.|pp\.|paras?\.?|paragraphs?|refs?\.?|references?|items?|issues?|sheets?|bays?|notes?|chapters?|appendix|annex|lines?|rows?|columns?|remarks?|saves?|assumptions?|guards?|calculations?|frames?|ribs?|stringers?|serials?|drawings?|revisions?|rev\.?|parts?|nos?\.|numbers?|cases?|CS|CFR|FAR|EN|ISO|AMC|AC|NACA|TN|dated)|§+)\s*(?:nos?\.\s*)?$/i
const LIST_BETWEEN = /^\s?(?:,|and|or|to|–|-|through|, and)\s?$/
const SAME_UNIT_BETWEEN = /^\s?(?:,|and|or|to|–|-|×|x|by|, and)\s?$/
const DATE = /\d{4}-\d{2}-\d{2}|\d{1,2}\s(?:January|February|March|April|May|June|July|August|September|October|November|December)\s\d{4}|\d{1,2}\.\d{1,2}\.\d{4}/g

/** Words that give a number an owner of its own. */
const OWNERS = new Set(['limit', 'limits', 'allowable', 'allowed', 'permitted', 'permissible', 'tolerance', 'gap', 'pitch', 'radius', 'diameter', 'offset', 'distance', 'arm', 'spacing',
  'span', 'depth', 'width', 'thickness', 'length', 'stock', 'clearance', 'requirement', 'target', 'threshold', 'most', 'least', 'than', 'below', 'above', 'under', 'exceed', 'temperature'])

interface Read { token: NumberToken, unit: UnitId | null, to: number, reference: boolean }

function dateSpans(text: string): [number, number][] {
  return [...text.matchAll(DATE)].map(match => [match.index, match.index + match[0].length])
}

/** The numbers that are no part of a date. Both lists are in order, so one walk does. */
function outside(tokens: NumberToken[], dates: [number, number][]): NumberToken[] {
  let next = 0
  return tokens.filter((token) => {
    while ((dates[next]?.[1] ?? Infinity) < token.to) next += 1
    const date = dates[next]
    return !date || token.from < date[0] - 1
  })
}

/** Reads the numbers with their units; a number in a list takes the unit at the end of the list. */
function readNumbers(text: string): Read[] {
  const dates = dateSpans(text)
  const tokens = outside(numberTokens(text), dates)
  const reads: Read[] = []
  for (const token of tokens) {
    const found = unitAt(text, token.to, !token.plain)
    const last = reads.at(-1)
    const continues = last !== undefined && last.reference && LIST_BETWEEN.test(text.slice(last.to, token.from).slice(0, 10))
    const points = token.plain && (continues || REFERENCE.test(text.slice(Math.max(0, token.from - 20), token.from)))
    const reference = points && (found === null || found.unit === 'in')
    // A letter straight behind it makes it part of a name: 4130N, 2nd.
    if (!found && /[\p{L}_]/u.test(text[token.to] ?? '')) continue
    reads.push({ token, unit: reference ? null : found?.unit ?? null, to: reference || !found ? token.to : found.to, reference })
  }
  for (let at = reads.length - 2; at >= 0; at -= 1) {
    const [read, next] = [reads[at], reads[at + 1]]
    if (!read || !next || read.unit !== null || read.reference || next.unit === null || next.unit === '%') continue
    if (SAME_UNIT_BETWEEN.test(text.slice(read.to, next.token.from).slice(0, 8))) read.unit = next.unit
  }
  return reads
}

/** The results whose symbol or name stands before the number. A Latin letter needs an equality, since `A` is an article too. */
function factsBeside(beside: Beside, index: FactIndex): Fact[] {
  const { symbol, words, equated } = beside
  if (symbol !== null) {
    const facts = index.bySymbol.get(symbol)
    if (facts && (equated || !/^[A-Za-z]$/.test(symbol))) return facts
  }
  for (const [name, facts] of index.byName) {
    if (words.endsWith(name) && !/\p{L}/u.test(words.at(-name.length - 1) ?? ' ')) return facts
  }
  return []
}

function isForeign(beside: Beside): boolean {
  const last = /\p{L}+$/u.exec(beside.words)?.[0] ?? ''
  if (OWNERS.has(last)) return true
  // A short symbol set equal to the number: `F_cr = 57 MPa`, `r = 3.2 mm`.
  return beside.equated && beside.symbol !== null && (beside.symbol.length <= 2 || /^(?=.*[A-Z\u0370-\u03ff])\p{L}[\p{L}\p{N}]{1,3}$/u.test(beside.symbol))
}

/** What stands between the first equality and the last: `= 186/(1.5 × 65.7) − 1 =`. */
const ARITHMETIC = /=[\d\s.,()+\u2212\u2013\-×·*/]{1,100}=\s*$/u

/** The words before a number, a line of plain arithmetic left out, so that its result stands beside its symbol. */
const before = (text: string, at: number): string => text.slice(Math.max(0, at - 140), at).replace(ARITHMETIC, '= ')

/** A bare number counts only where it is clearly set equal: `J of 3 walls` is none, nor is a term of a sum or product. */
function bareCounts(read: Read, beside: Beside, text: string): boolean {
  const { token } = read
  if (/^\s?[/×·*+\u2212\u2013]/u.test(text.slice(read.to, read.to + 2))) return false
  if (!token.plain) return true
  return beside.equated && !/^\s\p{Ll}/u.test(text.slice(read.to, read.to + 2))
}

/** The only number of a cell takes symbol and unit from the headings. */
function fromHeadings(read: Read, scanned: ScannedText, index: FactIndex): Quantity | null {
  const { token } = read
  if (scanned.headings.length === 0 || scanned.text.replace(/^[>≥\s]+/, '').trim() !== scanned.text.slice(token.from, read.to)) return null
  for (const heading of scanned.headings) {
    const unit = unitInHeading(heading)
    const head = heading.replace(/[,([].*$/s, '').trim()
    const beside = index.bySymbol.get(symbolKey(head)) ?? index.byName.get(head.toLowerCase()) ?? []
    const fitting = unit === null ? beside : beside.filter(fact => unitFits(unit, fact.dimension))
    if (unit !== null || fitting.length > 0) return { token, from: token.from, to: read.to, unit: read.unit ?? unit, beside: fitting, foreign: false }
  }
  return null
}

function quantityOf(read: Read, scanned: ScannedText, index: FactIndex): Quantity[] {
  const { token } = read
  if (read.reference) return []
  if (read.unit === null) {
    const cell = fromHeadings(read, scanned, index)
    if (cell) return [cell]
  }
  const beside = besideNumber(before(scanned.text, token.from))
  const near = factsBeside(beside, index)
  const { unit } = read
  const place = { token, from: token.from, to: read.to }
  const fitting = unit === null ? near : near.filter(fact => unitFits(unit, fact.dimension))
  if (unit === null) return near.length > 0 && bareCounts(read, beside, scanned.text) ? [{ ...place, unit: null, beside: near, foreign: false }] : []
  // A list gave its unit to a number that already belongs to a symbol without one.
  if (near.length > 0 && fitting.length === 0 && read.to === token.to) return [{ ...place, unit: null, beside: near, foreign: false }]
  return [{ ...place, unit, beside: fitting.length > 0 ? fitting : near, foreign: near.length === 0 && isForeign(beside) }]
}

/** The quantities of one text, in order. Linear in its length. */
export function quantitiesIn(scanned: ScannedText, index: FactIndex): Quantity[] {
  return readNumbers(scanned.text).flatMap(read => quantityOf(read, scanned, index))
}
