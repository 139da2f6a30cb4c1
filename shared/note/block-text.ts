import type { Node } from '@tiptap/pm/model'

/** Stands for one inline atom, so that offsets in the text equal positions in the block. */
export const ATOM = '\uFFFC'

/** The text of a paragraph or heading with one U+FFFC for each inline atom and line break. */
export const blockText = (block: Node): string => block.textBetween(0, block.content.size, '', ATOM)

export interface PlacedBlock { node: Node, pos: number }

/** Every node that has an id, by its id. */
export function blocksById(doc: Node): Map<string, PlacedBlock> {
  const found = new Map<string, PlacedBlock>()
  doc.descendants((node, pos) => {
    if (typeof node.attrs.id === 'string') found.set(node.attrs.id, { node, pos })
    return !node.isTextblock
  })
  return found
}
