import { createHash } from 'node:crypto'
import { canonicalJson } from '#shared/note/canonical'
import type { Attachment } from '#server/pdf/attach-file'
import type { NotePdfData } from '#server/pdf/note-pdf-data'
import { CONTENT_FILE, NOTE_FILE } from '#server/pdf/signing/attached-note'

/** The data of a print as canonical JSON: pictures by their hash, and the frozen parts left to their own file. */
export function noteJson(data: NotePdfData): string {
  const { figures, frozen: _, ...plain } = data
  const pictures = Object.entries(figures).map(([id, { mime, bytes }]) =>
    [id, { mime, size: bytes.length, sha256: createHash('sha256').update(bytes).digest('hex') }])
  return canonicalJson({ form: 'torquill note 1', ...plain, figures: Object.fromEntries(pictures) })
}

/** What a released note carries, so that anyone can verify and recompute it without us. */
export function noteAttachments(data: NotePdfData): Attachment[] {
  const modified = new Date(data.createdAt)
  const note = { name: NOTE_FILE, description: `Data of ${data.number} issue ${data.letter}`, bytes: Buffer.from(noteJson(data)), modified }
  if (data.frozen === null) return [note]
  return [note, { name: CONTENT_FILE, description: 'Frozen parts; their SHA-256 is the content hash', bytes: Buffer.from(data.frozen), modified }]
}
