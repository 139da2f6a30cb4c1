import { inject } from 'vitest'

/** Lets the commands run in the test process as they run on the server: same database, same secrets. */
export function useServerEnvironment() {
  const running = inject('running')
  Object.assign(process.env, {
    DATABASE_URL: running.databaseUrl, TORQUILL_BASE_URL: running.baseUrl, NUXT_AUTH_SECRET: running.authSecret,
    TORQUILL_DATA_DIR: running.dataDir, SMTP_URL: `smtp://127.0.0.1:${running.mailPort}`,
  })
  return running
}
