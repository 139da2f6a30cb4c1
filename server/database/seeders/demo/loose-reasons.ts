/** Why the typed quantities of the demonstration's notes stay untied. */
import type { Node } from '@tiptap/pm/model'
import type { LooseReason } from './demo-note'

/** The key of the section in which a block stands. */
function sectionKeyOf(document: Node, blockId: string): string | null {
  let key: string | null = null
  document.forEach((section) => {
    section.descendants((node) => {
      if (node.attrs.id === blockId) key = String(section.attrs.key)
      return key === null
    })
  })
  return key
}

/** The reason written down for a typed quantity, or null. */
export function reasonFor(document: Node, reasons: LooseReason[], { blockId, text }: { blockId: string, text: string }): string | null {
  const section = sectionKeyOf(document, blockId)
  return reasons.find(one => one.section === section && one.text === text)?.reason ?? null
}
