import { createHash, randomUUID } from 'node:crypto'
import { Transform } from '@tiptap/pm/transform'
import type { Node } from '@tiptap/pm/model'
import { canonicalJson } from '#shared/note/canonical'
import { noteSchema, readDocument } from '#shared/note/schema'
import type { SaveContent } from '#shared/schemas/notes'
import type { Json } from './note-document'

/** The payload of a save: what the browser sends after the given edit of the stored document. */
export function saveOf(stored: unknown, baseSave: number, edit: (change: Transform, doc: Node) => void): SaveContent {
  const doc = readDocument(stored)
  const change = new Transform(doc)
  edit(change, doc)
  return {
    baseSave, steps: change.steps.map(step => step.toJSON() as Record<string, unknown>), key: randomUUID(),
    docHash: createHash('sha256').update(canonicalJson(change.doc.toJSON())).digest('hex'),
  }
}

/** Position just inside the section of this key. */
export function insideSection(doc: Node, key: string): number {
  let found = -1
  doc.forEach((node, offset) => {
    if (node.attrs.key === key) found = offset + 1
  })
  if (found < 0) throw new Error(`no section ${key}`)
  return found
}

/** Puts a block at the start of a section. */
export const insertBlock = (key: string, block: Json) => (change: Transform, doc: Node) => {
  change.insert(insideSection(doc, key), noteSchema().nodeFromJSON(block))
}

/** Types text into the first paragraph of a section. */
export const typeText = (key: string, text: string) => (change: Transform, doc: Node) => {
  change.insert(insideSection(doc, key) + 1, noteSchema().text(text))
}
