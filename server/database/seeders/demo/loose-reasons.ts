/** Why the typed quantities of the demonstration's notes stay untied. */
import type { Node } from '@tiptap/pm/model'
import type { LooseReason } from './demo-note'

const drawing = 'Dimension of the drawing.'
const rows = (section: string, reason: string, ...texts: string[]): LooseReason[] => texts.map(text => ({ section, text, reason }))

export const REASONS: Record<'hat' | 'angle' | 'rail' | 'latch', LooseReason[]> = {
  hat: [
    ...rows('geometry', drawing, '15 mm', '30 mm', '28 mm', '6 mm', '1.2 mm', '3.0 mm', '1.6 mm', '3.2 mm'),
    ...rows('span-analysis', 'Distance between the clips, drawing.', '300 mm'),
    ...rows('sensitivity', 'Least sheet of the drawing, entered in C3.', '1.15 mm', '1.55 mm'),
  ],
  angle: [
    ...rows('description', drawing, '0.06 in'),
    ...rows('geometry', drawing, '2.00 in', '1.55 in', '0.250 in', '0.190 in'),
    ...rows('span-analysis', 'Clamp line to pad, drawing.', '2.40 in'),
    ...rows('sensitivity', 'Largest fillet of the drawing, entered in C2.', '0.220 in'),
  ],
  rail: [
    ...rows('geometry', drawing, '60 mm', '6.0 mm', '140 mm', '5.0 mm', '1800 mm', '900 mm'),
    ...rows('span-analysis', 'hand value', '2.12°'),
  ],
  latch: [
    ...rows('geometry', drawing, '62 mm', '190°', '6.0 mm', '240 mm'),
  ],
}

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
