import { createHash, randomUUID } from 'node:crypto'
import { imageSize } from 'image-size'
import type { Issue } from '#server/database/entities/issue'
import { StoredFileSchema, type StoredFile } from '#server/database/entities/stored-file'
import { putFile } from '#server/storage/files'
import type { CommandContext } from '#server/utils/command-context'
import { DomainError } from '#server/utils/domain-error'

export const uploadLimit = 8 * 1024 * 1024
const pixels = 40_000_000

/** The first bytes tell what a file is; its name and declared type do not count. */
const kinds = [
  { mime: 'image/png', extension: 'png', starts: [0x89, 0x50, 0x4E, 0x47, 0x0D, 0x0A, 0x1A, 0x0A], figure: true },
  { mime: 'image/jpeg', extension: 'jpg', starts: [0xFF, 0xD8, 0xFF], figure: true },
  { mime: 'application/pdf', extension: 'pdf', starts: [0x25, 0x50, 0x44, 0x46, 0x2D], figure: false },
] as const

function measure(bytes: Buffer): { width: number, height: number } {
  try {
    const { width, height } = imageSize(bytes)
    if (width && height && width * height <= pixels) return { width, height }
  } catch {
    throw new DomainError('not-this-kind', 'This image cannot be read. Save it again as PNG or JPEG and upload that.')
  }
  throw new DomainError('too-large', 'This image has more than 40 million pixels. Reduce it and upload again.')
}

/** A name that is safe to show and to put into a header. */
const cleanName = (name: string) => name.replace(/^.*[\\/]/, '').replace(/[\p{Cc}\p{Cf}"\\]/gu, '').slice(0, 120) || 'file'

/** Takes a figure or an attachment into the store. Only PNG, JPEG and, as an attachment, PDF. */
export async function storeUpload({ em, actor, clock }: CommandContext, issue: Issue, upload: { name: string, bytes: Buffer }, purpose: 'figure' | 'attachment'): Promise<StoredFile> {
  if (upload.bytes.length > uploadLimit) throw new DomainError('too-large', 'Files up to 8 MB are taken; this one is larger.')
  const kind = kinds.find(k => k.starts.every((byte, i) => upload.bytes[i] === byte))
  if (!kind || (purpose === 'figure' && !kind.figure)) {
    throw new DomainError('not-this-kind', purpose === 'figure' ? 'Figures are PNG or JPEG images.' : 'Attachments are PNG, JPEG or PDF files.')
  }
  const size = kind.figure ? measure(upload.bytes) : null
  const id = randomUUID()
  const storageKey = `uploads/${issue.id}/${id}.${kind.extension}`
  await putFile(storageKey, upload.bytes)
  const file = em.create(StoredFileSchema, {
    id, issue, purpose, name: cleanName(upload.name), mime: kind.mime, size: upload.bytes.length,
    sha256: createHash('sha256').update(upload.bytes).digest('hex'), width: size?.width ?? null, height: size?.height ?? null,
    storageKey, uploadedBy: actor, at: clock(),
  })
  await em.flush()
  return file
}
