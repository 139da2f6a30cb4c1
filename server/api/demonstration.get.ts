import type { Demonstration } from '#shared/schemas/lists'
import { DEMO_SIGN_INS } from '#server/database/seeders/demo/people'
import { environment } from '#server/utils/environment'
import { defineApi } from '#server/utils/define-api'

/** Whether this is the demonstration, and who may sign in to it; production names nobody. */
export default defineApi({ can: 'public' }, async (): Promise<Demonstration> => {
  const { demonstration } = environment()
  return { demonstration, people: demonstration ? DEMO_SIGN_INS : [] }
})
