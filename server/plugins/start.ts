import { closeQueue, useQueue } from '#server/jobs/queue'
import { closeOutlinePool } from '#server/outline/solve-outline'
import { startValidation } from '#server/validation/validation-run'
import { environment } from '#server/utils/environment'
import { closeOrm, useOrm } from '#server/utils/orm'
import { ENGINE_VERSION } from '#shared/calc/registry'

/** Checks the environment at start, connects before the first request, and lets go in order at the end. */
export default defineNitroPlugin((nitro) => {
  const { databaseUrl } = environment()
  useQueue(databaseUrl)
  useOrm().catch(error => console.error('database', error.message))
  console.info(`engine ${ENGINE_VERSION}`)
  startValidation()
  nitro.hooks.hook('close', async () => {
    await closeOutlinePool()
    await closeQueue()
    await closeOrm()
  })
})
