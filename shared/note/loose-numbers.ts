import type { Node } from '@tiptap/pm/model'
import type { Evaluation } from '#shared/calc/types'
import { calculationsOf } from '#shared/note/calculations'
import { contextOf } from '#shared/note/loose/context'
import type { FactIndex } from '#shared/note/loose/facts'
import { factIndex } from '#shared/note/loose/facts'
import { judge } from '#shared/note/loose/judge'
import { ScanMemory, type Judged } from '#shared/note/loose/memory'
import type { Quantity } from '#shared/note/loose/quantities'
import { quantitiesIn } from '#shared/note/loose/quantities'
import type { ScannedText } from '#shared/note/loose/texts'
import { textsOf, titleText } from '#shared/note/loose/texts'
import { dimensionOf, toEngine } from '#shared/units/units'
import type { Dimension } from '#shared/units/units'

export type LooseVerdict = 'agreeing' | 'ambiguous' | 'disagreeing' | 'unrelated'

/** A result the number may stand for. */
export interface LooseCandidate {
  calcId: string
  /** Key of the output. */
  key: string
  /** `C1 · Rate of twist, case L04` */
  label: string
  /** The value in its own unit, as a tied value would show it. */
  shown: string
  /** Whether the number can be tied to it; an applied stress of a margin can only be named. */
  tieable: boolean
}

/** Which text of the block the number stands in. */
export type LooseField = 'text' | 'title' | 'tex' | 'caption' | 'alt'

/** A typed quantity that is tied to nothing. */
export interface LooseNumber {
  /** Id of the paragraph, heading, equation, figure or calculation; `title` for the title of the note. */
  blockId: string
  field: LooseField
  /** Offsets in that text, with one U+FFFC for each inline atom. A number inside an inline equation has those of the equation. */
  from: number
  to: number
  /** As typed, unit included. */
  text: string
  /** Which one of the same text in this block, from 0. */
  ordinal: number
  verdict: LooseVerdict
  /** In engine units (N, mm, MPa, rad, °C); null where it has no unit of its own. */
  value: number | null
  dimension: Dimension | null
  candidates: LooseCandidate[]
  /** One sentence for the list. */
  reason: string
}

/** What the scan must know beside the document and the results. */
export interface NoteNames {
  /** The title of the note, which is scanned too. */
  noteTitle?: string
}

interface Found extends Judged { scanned: ScannedText }

const engineValue = ({ token, unit }: Quantity) => unit === null ? null : toEngine(token.value, unit)

function looseNumber({ scanned, quantity, judgement }: Found, ordinal: number): LooseNumber {
  const { blockId, field } = scanned
  return {
    blockId, field, from: scanned.from(quantity.from), to: scanned.to(quantity.to),
    text: scanned.text.slice(quantity.from, quantity.to), ordinal,
    value: engineValue(quantity), dimension: quantity.unit === null ? null : dimensionOf(quantity.unit),
    ...judgement,
  }
}

function scanText(scanned: ScannedText, index: FactIndex): Judged[] {
  return quantitiesIn(scanned, index).map((quantity) => {
    const context = contextOf(scanned.text, quantity.from, quantity.to, scanned.beyond, index)
    return { quantity, judgement: judge(quantity, context, index) }
  })
}

/**
 * Finds every typed quantity of a note that is tied to nothing and compares it with the results.
 *
 * A quantity is a number with a unit, or a bare number beside a symbol of the note. It agrees when
 * it equals a result at the precision at which it was typed, in any compatible unit. It disagrees when
 * - it stands beside the symbol or name of a result and differs from it,
 * - it is the value of another case or wall than the one its sentence names, or
 * - one of the slips listed in `loose/slips` turns it into a result, and enough digits and words speak for that
 *   result. The fewer the words, the more digits are needed, because chance alone brings short numbers close.
 * Not quantities: what points to a section, figure, table, step, page, paragraph or issue, dates, citations, and
 * numbers that are part of a name such as a drawing number, an alloy or a standard.
 *
 * @param results Evaluations by the id of the calculation; one that failed gives nothing to compare with.
 * @param memory Of the scan before, where the caller keeps one; it saves time and changes nothing.
 */
export function scanLooseNumbers(doc: Node, results: Readonly<Record<string, Evaluation>>, names: NoteNames = {}, memory = new ScanMemory()): LooseNumber[] {
  const calculations = calculationsOf(doc)
  const index = memory.begin(results, calculations.map(({ id, label }) => `${id} ${label}`).join('\n'), () => factIndex(calculations, results))
  const found = [...titleText(names.noteTitle ?? ''), ...textsOf(doc)]
    .flatMap(scanned => memory.recall(scanned, () => scanText(scanned, index)).map((judged): Found => ({ ...judged, scanned })))
  const counts = new Map<string, number>()
  return found.map((item) => {
    const key = JSON.stringify([item.scanned.blockId, item.scanned.text.slice(item.quantity.from, item.quantity.to)])
    const ordinal = counts.get(key) ?? 0
    counts.set(key, ordinal + 1)
    return looseNumber(item, ordinal)
  })
}
