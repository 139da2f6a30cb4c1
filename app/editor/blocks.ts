import type { Node } from '@tiptap/pm/model'

/** One block of a section, by the id it carries or, for a list or table, the first id inside it. */
export interface BlockAt { key: string, sectionKey: string, node: Node, pos: number, after: string | null }

/** The id of a block, or the first one inside it. */
export function blockKey(node: Node): string | null {
  const own: unknown = node.attrs.id
  if (typeof own === 'string') return own
  let found: string | null = null
  node.descendants((child) => {
    if (found === null && typeof child.attrs.id === 'string') found = child.attrs.id
    return found === null
  })
  return found
}

/** The blocks of a note in their order, each with its section and its predecessor. */
export function blocksOf(doc: Node): BlockAt[] {
  const blocks: BlockAt[] = []
  doc.forEach((section, sectionPos) => {
    let after: string | null = null
    section.forEach((node, offset) => {
      const key = blockKey(node)
      if (key === null) return
      blocks.push({ key, sectionKey: String(section.attrs.key), node, pos: sectionPos + 1 + offset, after })
      after = key
    })
  })
  return blocks
}
