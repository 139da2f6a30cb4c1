import type { Node } from '@tiptap/pm/model'
import type { Anchor } from '#shared/note/anchors'
import { textAnchor } from '#shared/note/anchors'
import { blockText } from '#shared/note/block-text'
import { readDocument } from '#shared/note/schema'
import { calcId } from './build-document'
import type { DemoRemark } from './demo-note'

function sectionOf(doc: Node, key: string): Node {
  for (let index = 0; index < doc.childCount; index += 1) {
    if (doc.child(index).attrs.key === key) return doc.child(index)
  }
  throw new Error(`The note has no section ${key}`)
}

/** Where a remark of the story points in the document as stored. Throws where its quote does not stand there. */
export function findPlace(note: string, document: unknown, on: DemoRemark['on']): Anchor {
  if ('calc' in on) return { kind: 'calculation', calcId: calcId(note, on.calc), ...(on.field === undefined ? {} : { field: on.field }) }
  const doc = readDocument(document)
  let anchor: Anchor | null = null
  sectionOf(doc, on.section).descendants((node) => {
    const from = anchor === null && node.isTextblock ? blockText(node).indexOf(on.quote) : -1
    if (from >= 0) anchor = textAnchor(doc, String(node.attrs.id), from, from + on.quote.length)
    return anchor === null
  })
  if (anchor === null) throw new Error(`${note}: "${on.quote}" does not stand in section ${on.section}`)
  return anchor
}
