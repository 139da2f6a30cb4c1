import type { Node } from '@tiptap/pm/model'
import type { TextAnchor } from '#shared/note/anchors'
import type { PlacedBlock } from '#shared/note/block-text'
import { blockText } from '#shared/note/block-text'

interface Place { blockId: string, text: string, from: number }

/** A short quote says too little to be recognised without its surroundings. */
const TELLING_LENGTH = 12

function commonSuffix(a: string, b: string): number {
  let length = 0
  while (length < a.length && length < b.length && a[a.length - 1 - length] === b[b.length - 1 - length]) length += 1
  return length
}

function commonPrefix(a: string, b: string): number {
  let length = 0
  while (length < a.length && length < b.length && a[length] === b[length]) length += 1
  return length
}

function occurrences(text: string, quote: string): number[] {
  const found: number[] = []
  for (let at = text.indexOf(quote); at >= 0 && found.length < 100; at = text.indexOf(quote, at + 1)) found.push(at)
  return found
}

/** How much of the remembered surroundings stands around that place. */
const agreement = (anchor: TextAnchor, text: string, at: number): number =>
  commonSuffix(anchor.prefix, text.slice(0, at)) + commonPrefix(anchor.suffix, text.slice(at + anchor.quote.length))

function inBlock(anchor: TextAnchor, block: PlacedBlock | undefined): Place | null {
  if (!block?.node.isTextblock) return null
  const text = blockText(block.node)
  const ranked = occurrences(text, anchor.quote)
    .map(from => ({ from, agreement: agreement(anchor, text, from), distance: Math.abs(from - anchor.from) }))
    .sort((a, b) => b.agreement - a.agreement || a.distance - b.distance)
  return ranked[0] ? { blockId: anchor.blockId, text, from: ranked[0].from } : null
}

/** In another block only where it cannot be mistaken: one place with the same surroundings, or one place at all for a telling quote. */
function elsewhere(anchor: TextAnchor, doc: Node): Place | null {
  const places: (Place & { whole: boolean })[] = []
  const surroundings = anchor.prefix.length + anchor.suffix.length
  doc.descendants((node) => {
    if (!node.isTextblock) return true
    const text = blockText(node)
    for (const from of occurrences(text, anchor.quote)) {
      if (typeof node.attrs.id !== 'string') continue
      places.push({ blockId: node.attrs.id, text, from, whole: surroundings > 0 && agreement(anchor, text, from) === surroundings })
    }
    return false
  })
  const whole = places.filter(place => place.whole)
  if (whole.length === 1) return whole[0] ?? null
  return places.length === 1 && anchor.quote.length >= TELLING_LENGTH ? places[0] ?? null : null
}

/** The place that carries the quote of a lost anchor, or null. */
export function locateQuote(anchor: TextAnchor, doc: Node, blocks: Map<string, PlacedBlock>): Place | null {
  if (anchor.quote === '') return null
  return inBlock(anchor, blocks.get(anchor.blockId)) ?? elsewhere(anchor, doc)
}
