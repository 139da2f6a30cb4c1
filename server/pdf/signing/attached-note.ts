import { createHash } from 'node:crypto'
import { inflateSync } from 'node:zlib'
import { dictionary, resolve, type PdfFile } from '#server/pdf/signing/pdf-file'
import { NotOurs } from '#server/pdf/signing/pdf-values'

/** What the attached data says of the note. */
export interface AttachedNote {
  number: string
  letter: string
  state: string
  contentHash: string | null
  /** Whether the attached frozen parts hash to the content hash; null where none are attached. */
  contentMatches: boolean | null
  /** The attached files by name, as they were written. */
  files: Record<string, Buffer>
}

export const NOTE_FILE = 'note.json'
/** Canonical JSON of the frozen parts: its SHA-256 is the content hash. */
export const CONTENT_FILE = 'content.json'
const MAX_INFLATED = 200 * 1024 * 1024

function attachedFiles(pdf: Buffer, file: PdfFile): Record<string, Buffer> {
  const root = dictionary(resolve(file, file.trailer.get('Root')))
  const tree = dictionary(resolve(file, dictionary(resolve(file, root.get('Names'))).get('EmbeddedFiles')))
  const names = tree.get('Names')
  const files: Record<string, Buffer> = {}
  for (let i = 0; names?.kind === 'array' && i < names.items.length; i += 2) {
    const [name, spec] = [names.items[i], resolve(file, names.items[i + 1])]
    const reference = dictionary(dictionary(spec).get('EF')).get('F')
    const object = reference?.kind === 'ref' ? file.objects.get(reference.id) : undefined
    if (name?.kind !== 'text' || !object?.stream) throw new NotOurs('an attached file is missing')
    files[name.value] = inflateSync(pdf.subarray(object.stream.start, object.stream.end), { maxOutputLength: MAX_INFLATED })
  }
  return files
}

/** Reads the note's data out of a file that has been verified. */
export function readNoteData(pdf: Buffer, file: PdfFile): AttachedNote {
  const files = attachedFiles(pdf, file)
  const data: unknown = JSON.parse(files[NOTE_FILE]?.toString('utf8') ?? 'null')
  if (typeof data !== 'object' || data === null) throw new NotOurs('the note\'s data is not attached')
  const field = (name: string) => String((data as Record<string, unknown>)[name] ?? '')
  const contentHash = field('contentHash') || null
  const content = files[CONTENT_FILE]
  const contentMatches = content ? createHash('sha256').update(content).digest('hex') === contentHash : null
  return { number: field('number'), letter: field('letter'), state: field('state'), contentHash, contentMatches, files }
}
