/**
 * Where a remark points. Anchors live outside the document, because the one who
 * remarks may not edit it; they follow the author's edits instead.
 */
import type { Node } from '@tiptap/pm/model'
import type { Step } from '@tiptap/pm/transform'
import { Mapping } from '@tiptap/pm/transform'
import { locateQuote } from '#shared/note/anchor-search'
import type { PlacedBlock } from '#shared/note/block-text'
import { blocksById, blockText } from '#shared/note/block-text'

/** Offsets count UTF-16 units of the block's text, with one U+FFFC for each inline atom. */
export interface TextAnchor { kind: 'text', blockId: string, from: number, to: number, quote: string, prefix: string, suffix: string }
/** A calculation as a whole, or one field of its inputs by its path, e.g. `walls.0.t`. */
export interface CalculationAnchor { kind: 'calculation', calcId: string, field?: string }
export type Anchor = TextAnchor | CalculationAnchor

/** `edited`: the place is known, its words changed. `orphaned`: the place is gone; it comes back when the quote does. */
export type AnchorState = 'ok' | 'edited' | 'orphaned'
export interface Anchored { anchor: Anchor, state: AnchorState }

const CONTEXT = 32

/**
 * Makes the anchor of a range in a paragraph or heading.
 * @returns null where the block is missing, holds no text, or the range is empty or outside it.
 */
export function textAnchor(doc: Node, blockId: string, from: number, to: number): TextAnchor | null {
  const block = blocksById(doc).get(blockId)?.node
  return block?.isTextblock ? anchorIn(blockText(block), blockId, from, to) : null
}

function anchorIn(text: string, blockId: string, from: number, to: number): TextAnchor | null {
  if (!Number.isInteger(from) || !Number.isInteger(to) || from < 0 || from >= to || to > text.length) return null
  return {
    kind: 'text', blockId, from, to,
    quote: text.slice(from, to),
    prefix: text.slice(Math.max(0, from - CONTEXT), from),
    suffix: text.slice(to, to + CONTEXT),
  }
}

/** Whether an anchor sent by a client points at what it says it points at in this document. */
export function anchorHolds(doc: Node, anchor: Anchor): boolean {
  if (anchor.kind === 'calculation') return blocksById(doc).get(anchor.calcId)?.node.type.name === 'calculation'
  return textAnchor(doc, anchor.blockId, anchor.from, anchor.to)?.quote === anchor.quote
}

/** Positions in the document, for drawing; null for a place that is not there. */
export function anchorRange(doc: Node, anchor: Anchor): { from: number, to: number } | null {
  const block = blocksById(doc).get(anchor.kind === 'text' ? anchor.blockId : anchor.calcId)
  if (!block) return null
  if (anchor.kind === 'calculation') return { from: block.pos, to: block.pos + block.node.nodeSize }
  return anchor.to > block.node.content.size ? null : { from: block.pos + 1 + anchor.from, to: block.pos + 1 + anchor.to }
}

/** Finds the place again by its words alone: first in its block, then where its surroundings are the same. */
function relocateText(anchor: TextAnchor, doc: Node, blocks: Map<string, PlacedBlock>): Anchored {
  const place = locateQuote(anchor, doc, blocks)
  const moved = place && anchorIn(place.text, place.blockId, place.from, place.from + anchor.quote.length)
  return moved ? { anchor: moved, state: 'ok' } : { anchor, state: 'orphaned' }
}

/** Where the range went through the steps, or null when nothing of it is left in a block with an id. */
function mappedText(anchor: TextAnchor, before: Map<string, PlacedBlock>, mapping: Mapping, after: Node): Anchored | null {
  const block = before.get(anchor.blockId)
  if (!block?.node.isTextblock || anchor.to > block.node.content.size) return null
  const from = mapping.map(block.pos + 1 + anchor.from, 1)
  const to = mapping.map(block.pos + 1 + anchor.to, -1)
  if (from >= to || to > after.content.size) return null
  const start = after.resolve(from)
  const id: unknown = start.parent.attrs.id
  if (!start.parent.isTextblock || typeof id !== 'string') return null
  // A block that was split keeps the part where the remark begins.
  const end = Math.min(to, start.end())
  const now = anchorIn(blockText(start.parent), id, from - start.start(), end - start.start())
  if (!now) return null
  if (now.quote === anchor.quote) return { anchor: now, state: 'ok' }
  // The quote stays what was remarked on; only the place follows.
  return { anchor: { ...now, quote: anchor.quote, prefix: anchor.prefix, suffix: anchor.suffix }, state: 'edited' }
}

const fieldOf = (inputs: unknown, path: string | undefined): unknown =>
  (path ?? '').split('.').filter(Boolean).reduce<unknown>((value, key) =>
    typeof value === 'object' && value !== null && Object.hasOwn(value, key) ? (value as Record<string, unknown>)[key] : undefined, inputs)

function mapCalculation(item: Anchored, anchor: CalculationAnchor, before: Map<string, PlacedBlock>, after: Map<string, PlacedBlock>): Anchored {
  const now = after.get(anchor.calcId)?.node
  if (now?.type.name !== 'calculation') return { anchor, state: 'orphaned' }
  const then = before.get(anchor.calcId)?.node
  const same = !then || JSON.stringify(fieldOf(then.attrs.inputs, anchor.field)) === JSON.stringify(fieldOf(now.attrs.inputs, anchor.field))
  if (!same) return { anchor, state: 'edited' }
  return { anchor, state: item.state === 'orphaned' ? 'ok' : item.state }
}

/**
 * Carries anchors over a save. A lost text place is sought again by its quote,
 * also one that was lost earlier, so that undoing a deletion brings it back.
 * @param steps The steps that lead from `before` to `after`.
 */
export function mapAnchors<T extends Anchored>(items: readonly T[], before: Node, steps: readonly Step[], after: Node): T[] {
  const mapping = new Mapping(steps.map(step => step.getMap()))
  const then = blocksById(before)
  const now = blocksById(after)
  return items.map((item) => {
    if (item.anchor.kind === 'calculation') return { ...item, ...mapCalculation(item, item.anchor, then, now) }
    const mapped = item.state === 'orphaned' ? null : mappedText(item.anchor, then, mapping, after)
    return { ...item, ...(mapped ?? relocateText(item.anchor, after, now)) }
  })
}

/**
 * Finds anchors again in a document without knowing the steps (after an import,
 * or a save sent whole). A place whose words cannot be found is orphaned.
 */
export function relocateAnchors<T extends Anchored>(items: readonly T[], doc: Node): T[] {
  const blocks = blocksById(doc)
  return items.map((item) => {
    if (item.anchor.kind === 'calculation') return { ...item, ...mapCalculation(item, item.anchor, blocks, blocks) }
    return { ...item, ...relocateText(item.anchor, doc, blocks) }
  })
}
