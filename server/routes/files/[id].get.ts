import { z } from 'zod'
import { currentPerson } from '#server/access/current-person'
import { seesProject } from '#server/access/policies'
import { StoredFileSchema } from '#server/database/entities/stored-file'
import { getFile } from '#server/storage/files'
import { DomainError } from '#server/utils/domain-error'
import { toApiError } from '#server/utils/api-error'
import { freshEm } from '#server/utils/orm'

const disposition = (kind: 'inline' | 'attachment', name: string) =>
  `${kind}; filename="${name.replace(/[^\x20-\x7E]|["\\]/g, '_')}"; filename*=UTF-8''${encodeURIComponent(name)}`

/** A stored file, for those who may see its issue. Images show in place; everything else is downloaded. */
export default defineEventHandler(async (event) => {
  try {
    const id = z.uuid().safeParse(getRouterParam(event, 'id'))
    const em = await freshEm()
    const person = await currentPerson(event, em)
    if (!person) throw new DomainError('not-signed-in', 'Sign in to see this file.')
    const file = id.success ? await em.findOne(StoredFileSchema, { id: id.data }, { populate: ['issue', 'issue.note'] }) : null
    if (!file || !await seesProject(em, person, file.issue.note.project.id)) throw new DomainError('not-found', 'There is no such file here that you may see.')
    const image = file.mime.startsWith('image/')
    setResponseHeaders(event, {
      'Content-Type': file.mime, 'Content-Disposition': disposition(image ? 'inline' : 'attachment', file.name),
      'Cache-Control': image ? 'private, max-age=31536000, immutable' : 'no-store',
      'X-Content-Type-Options': 'nosniff', 'Content-Security-Policy': 'sandbox; default-src \'none\'',
    })
    return await getFile(file.storageKey)
  } catch (thrown) {
    throw toApiError(thrown)
  }
})
