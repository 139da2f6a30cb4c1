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
