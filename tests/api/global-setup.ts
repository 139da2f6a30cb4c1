import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import type { TestProject } from 'vitest/node'
import { ensureBuild } from '../../server/cli/build.mjs'
import { freePort } from '../../server/cli/cluster.mjs'
import { commandOf, environmentOf, startServices } from '../../server/cli/services.mjs'
import { run } from '../../server/cli/shell.mjs'
import { startThrowAway } from '../../server/cli/throw-away.mjs'

export interface Running { baseUrl: string, databaseUrl: string, ownerUrl: string, authSecret: string, dataDir: string, mailPort: number, build: string }

declare module 'vitest' {
  interface ProvidedContext { running: Running }
}

/** The built server and worker against a throw-away database, once per test project. No mail server runs until a test starts one. */
export default async function setup(project: TestProject) {
  const build: string = process.env.TORQUILL_TEST_BUILD ?? ensureBuild()
  const database = await startThrowAway(`test-${project.name}-${process.pid}`)
  const dataDir = mkdtempSync(join(tmpdir(), 'torquill-test-'))
  const [port, mailPort] = [await freePort(), await freePort()]
  const running: Running = {
    baseUrl: `http://127.0.0.1:${port}`, databaseUrl: database.application, ownerUrl: database.owner,
    authSecret: 'a-secret-for-tests-only-0123456789', dataDir, mailPort, build,
  }
  const env = environmentOf({ ...running, smtpUrl: `smtp://127.0.0.1:${mailPort}` })
  run(process.execPath, commandOf(build, 'migrate'), { env: { ...env, DATABASE_OWNER_URL: database.owner } })
  const lines: string[] = []
  const services = await startServices(build, env, { port, onLine: (line: string) => {
    lines.push(line)
    if (process.env.TORQUILL_VERBOSE) console.log(line)
  } }).catch((error: Error) => {
    database.stop()
    throw new Error(`${error.message}\n${lines.join('\n')}`)
  })
  project.provide('running', running)
  return async () => {
    await services.stop()
    database.stop()
    rmSync(dataDir, { recursive: true, force: true })
  }
}
