import { z } from 'zod'
import { currentPerson } from '#server/access/current-person'
import { seesProject } from '#server/access/policies'
import { IssueSchema } from '#server/database/entities/issue'
import { DomainError } from '#server/utils/domain-error'
import { toApiError } from '#server/utils/api-error'
import { freshEm } from '#server/utils/orm'

/** The released PDF of an issue: one address that lasts, sent on to the stored file. */
export default defineEventHandler(async (event) => {
  try {
    const id = z.uuid().safeParse(getRouterParam(event, 'id'))
    const em = await freshEm()
    const person = await currentPerson(event, em)
    if (!person) throw new DomainError('not-signed-in', 'Sign in to see this PDF.')
    const issue = id.success ? await em.findOne(IssueSchema, { id: id.data }, { populate: ['note'], exclude: ['document', 'results'] }) : null
    if (!issue || !await seesProject(em, person, issue.note.project.id)) throw new DomainError('not-found', 'There is no such issue here that you may see.')
    if (!issue.pdfFileId) throw new DomainError('not-found', 'This issue has no released PDF.')
    return await sendRedirect(event, `/files/${issue.pdfFileId}`, 302)
  } catch (thrown) {
    throw toApiError(thrown)
  }
})
