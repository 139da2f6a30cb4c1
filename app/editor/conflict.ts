import { Fragment, type Node } from '@tiptap/pm/model'
import type { Transaction } from '@tiptap/pm/state'
import { blocksOf, type BlockAt } from '~/editor/blocks'

/** One block that the person changed on a save which is no longer the newest. */
export interface Clash {
  key: string
  sectionKey: string
  kind: 'changed' | 'added' | 'removed'
  /** The block in the save it was written on; null for an added one. */
  before: Node | null
  mine: Node | null
  /** The block in the newest save; null where that save has removed it, or never had it. */
  theirs: Node | null
  /** True where the newest save changed the same block too. */
  both: boolean
  after: string | null
}

/**
 * What of `mine`, written on `base`, differs from it and is not in the newest
 * save already, each beside what that save says there.
 */
export function clashes(base: Node, mine: Node, theirs: Node): Clash[] {
  const before = byKey(base)
  const now = byKey(theirs)
  const own = byKey(mine)
  const found: Clash[] = []
  for (const block of own.values()) {
    const was = before.get(block.key)
    if (was && was.node.eq(block.node)) continue
    const there = now.get(block.key)
    if (there?.node.eq(block.node)) continue
    found.push(clash(was ? 'changed' : 'added', block, was, block.node, there))
  }
  for (const was of before.values()) {
    if (own.has(was.key) || !now.has(was.key)) continue
    found.push(clash('removed', was, was, null, now.get(was.key)))
  }
  return found
}

function clash(kind: Clash['kind'], at: BlockAt, was: BlockAt | undefined, mine: Node | null, there: BlockAt | undefined): Clash {
  const both = was !== undefined && (there === undefined || !there.node.eq(was.node))
  return { key: at.key, sectionKey: at.sectionKey, kind, before: was?.node ?? null, mine, theirs: there?.node ?? null, both, after: at.after }
}

const byKey = (doc: Node) => new Map(blocksOf(doc).map(block => [block.key, block]))

/**
 * Puts the chosen changes on the newest save, as one transaction, so that one
 * undo takes them back. They may come from another editor: each block is read
 * anew with the schema of this document.
 */
export function reapply(tr: Transaction, chosen: readonly Clash[]): Transaction {
  const { schema } = tr.doc.type
  for (const change of chosen) {
    const now = byKey(tr.doc)
    const there = now.get(change.key)
    const mine = change.mine && schema.nodeFromJSON(change.mine.toJSON())
    if (mine === null) {
      if (there) tr.delete(there.pos, there.pos + there.node.nodeSize)
    } else if (there) {
      tr.replaceWith(there.pos, there.pos + there.node.nodeSize, Fragment.from(mine))
    } else {
      tr.insert(placeFor(tr.doc, change, now), mine)
    }
  }
  return tr
}

function placeFor(doc: Node, change: Clash, now: Map<string, BlockAt>): number {
  const previous = change.after === null ? undefined : now.get(change.after)
  if (previous && previous.sectionKey === change.sectionKey) return previous.pos + previous.node.nodeSize
  let place = doc.content.size
  doc.forEach((section, pos) => {
    if (section.attrs.key === change.sectionKey) place = change.after === null ? pos + 1 : pos + section.nodeSize - 1
  })
  return place
}

/** The person's changes as plain text, for the clipboard: nothing they wrote depends on this screen. */
export function asText(changes: readonly Clash[], words: (node: Node) => string): string {
  return changes.map((change) => {
    if (change.mine === null) return `Removed: ${change.before ? words(change.before) : ''}`
    return `${change.kind === 'added' ? 'Added' : 'Changed'}: ${words(change.mine)}`
  }).join('\n\n')
}
