/**
 * Where a remark points. Anchors live outside the document, because the one who
 * remarks may not edit it; they follow the author's edits instead.
 */

/** Offsets count UTF-16 units of the block's text, with one U+FFFC for each inline atom. */
export interface TextAnchor { kind: 'text', blockId: string, from: number, to: number, quote: string, prefix: string, suffix: string }
/** A calculation as a whole, or one field of its inputs by its path. */
export interface CalculationAnchor { kind: 'calculation', calcId: string, field?: string }
export type Anchor = TextAnchor | CalculationAnchor

/** `edited`: the place is known, its words changed. `orphaned`: the place is gone; it comes back when the quote does. */
export type AnchorState = 'ok' | 'edited' | 'orphaned'
