import type { Node } from '@tiptap/pm/model'

/** A calculation as it stands in the document. */
export interface NoteCalculation {
  id: string
  kind: string
  kindVersion: number
  title: string
  inputs: Record<string, unknown>
  /** `C1`, `C2` … in the order of the document; derived, never stored. */
  label: string
  sectionKey: string
  pos: number
}

export interface TiedValue {
  calcId: string
  key: string
  unit: string | null
  /** The paragraph or heading it stands in. */
  blockId: string
  sectionKey: string
  pos: number
}

function eachInSections(doc: Node, visit: (node: Node, pos: number, sectionKey: string, parent: Node) => void) {
  doc.forEach((section, offset) => {
    section.descendants((node, pos, parent) => {
      visit(node, offset + 1 + pos, String(section.attrs.key), parent ?? section)
    })
  })
}

/** The calculations of a note in order. */
export function calculationsOf(doc: Node): NoteCalculation[] {
  const found: NoteCalculation[] = []
  eachInSections(doc, (node, pos, sectionKey) => {
    if (node.type.name !== 'calculation') return
    const { id, kind, kindVersion, title, inputs } = node.attrs as Pick<NoteCalculation, 'id' | 'kind' | 'kindVersion' | 'title' | 'inputs'>
    found.push({ id, kind, kindVersion, title, inputs, label: `C${found.length + 1}`, sectionKey, pos })
  })
  return found
}

/** The tied values of a note in order. */
export function tiedValuesOf(doc: Node): TiedValue[] {
  const found: TiedValue[] = []
  eachInSections(doc, (node, pos, sectionKey, parent) => {
    if (node.type.name !== 'tied') return
    const { calcId, key, unit } = node.attrs as Pick<TiedValue, 'calcId' | 'key' | 'unit'>
    found.push({ calcId, key, unit, blockId: String(parent.attrs.id), sectionKey, pos })
  })
  return found
}

/** The files its figures show, each once. */
export function filesOf(doc: Node): string[] {
  const files = new Set<string>()
  doc.descendants((node) => {
    if (node.type.name === 'figure') files.add(String(node.attrs.fileId))
    return !node.isTextblock
  })
  return [...files]
}
