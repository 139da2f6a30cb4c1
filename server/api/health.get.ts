import { validationSummary } from '#server/validation/validation-run'
import { defineApi } from '#server/utils/define-api'

export default defineApi({ can: 'public' }, async ({ em }) => {
  await em.execute('select 1')
  const { engine, methodRevision, state, cases, judged, failed } = validationSummary()
  return { ok: true, database: 'answers', engine, methodRevision, validation: { state, cases, judged, failed } }
})
