import { ENGINE_VERSION } from '#shared/calc/registry'
import { defineApi } from '#server/utils/define-api'

export default defineApi({ can: 'public' }, async ({ em }) => {
  await em.execute('select 1')
  return { ok: true, database: 'answers', engine: ENGINE_VERSION }
})
