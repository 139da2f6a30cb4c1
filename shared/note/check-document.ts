import type { Node } from '@tiptap/pm/model'
import { canonicalJson } from '#shared/note/canonical'
import type { DocumentFault } from '#shared/note/document-fault'
import { documentFault } from '#shared/note/document-fault'
import { walkDocument } from '#shared/note/document-walk'
import { noteSchema } from '#shared/note/schema'
import { TEMPLATE } from '#shared/note/template'

export const MAX_DOCUMENT_BYTES = 16 * 1024 * 1024

export interface CheckedDocument { ok: true, doc: Node, canonical: string }

/** The sections are those of the template in its order; a generated one holds one empty paragraph and nothing else. */
function sectionsFault(doc: Node): DocumentFault | null {
  if (doc.childCount !== TEMPLATE.length) {
    return documentFault('document.sections', `A note has ${TEMPLATE.length} sections; this document has ${doc.childCount}.`)
  }
  for (const [index, template] of TEMPLATE.entries()) {
    const section = doc.child(index)
    const path = `content.${index}`
    if (section.attrs.key !== template.key) {
      return documentFault('document.sections', `Section ${template.number} must be "${template.title}".`, path)
    }
    if (!template.generated) continue
    const only = section.firstChild
    const drawn = section.childCount === 1 && only?.type.name === 'paragraph' && only.content.size === 0
    if (!drawn || section.attrs.notApplicable !== null) {
      return documentFault('document.sections', `Section ${template.number}, ${template.title}, is drawn from the results and holds no text.`, path)
    }
  }
  return null
}

function toNode(json: unknown): Node | DocumentFault {
  try {
    const doc = noteSchema().nodeFromJSON(json)
    doc.check()
    return doc
  } catch (error) {
    const why = error instanceof Error ? error.message : 'unknown'
    return documentFault('document.schema', `The document is not built as a note is: ${why}`)
  }
}

/**
 * Checks a document that came from outside: size, depth, every node, mark and
 * attribute, unique ids, the order of the sections. Changes nothing; a document
 * that fails is refused whole.
 */
export function checkDocument(json: unknown): CheckedDocument | DocumentFault {
  const walked = walkDocument(json)
  if (walked) return walked
  const doc = toNode(json)
  if ('ok' in doc) return doc
  const sections = sectionsFault(doc)
  if (sections) return sections
  const canonical = canonicalJson(doc.toJSON())
  if (new TextEncoder().encode(canonical).length > MAX_DOCUMENT_BYTES) {
    return documentFault('document.too-large', 'The note is larger than 16 MB. Move part of it into another note.')
  }
  return { ok: true, doc, canonical }
}
