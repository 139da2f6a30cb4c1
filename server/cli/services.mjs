// The running parts of Torquill: server, job worker, mail catcher. Started in order, stopped in the reverse order.
import { rmSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { root, start, stop, until } from './shell.mjs'

/** The environment that the server and the worker share. */
export function environmentOf({ databaseUrl, baseUrl, authSecret, dataDir, smtpUrl, demonstration = false, organisation, caughtMailDir, filesUrl }) {
  return {
    ...process.env,
    NODE_ENV: 'production',
    TZ: 'UTC',
    DATABASE_URL: databaseUrl,
    TORQUILL_BASE_URL: baseUrl,
    AUTH_ORIGIN: `${baseUrl}/api/auth`,
    NUXT_AUTH_SECRET: authSecret,
    TORQUILL_DATA_DIR: dataDir,
    SMTP_URL: smtpUrl,
    TORQUILL_DEMONSTRATION: demonstration ? '1' : '0',
    ...(organisation ? { TORQUILL_ORGANISATION: organisation } : {}),
    ...(caughtMailDir ? { TORQUILL_CAUGHT_MAIL_DIR: caughtMailDir } : {}),
    ...(filesUrl ? { TORQUILL_FILES_URL: filesUrl } : {}),
  }
}

/** Starts server and worker of a build; answers when the server is healthy. */
export async function startServices(build, env, { port, onLine = () => {}, onEnd = () => {} }) {
  const worker = start(process.execPath, [join(build, 'worker.mjs')], { env }, line => onLine(`worker: ${line}`))
  const server = start(process.execPath, [join(build, 'server/index.mjs')], { env: { ...env, HOST: '127.0.0.1', PORT: String(port), NITRO_HOST: '127.0.0.1', NITRO_PORT: String(port) } }, line => onLine(`server: ${line}`))
  const children = [server, worker]
  const mark = join(build, `running-${process.pid}`)
  writeFileSync(mark, '')
  let stopping = false
  for (const child of children) child.once('exit', code => !stopping && onEnd(code))
  const stopAll = async () => {
    stopping = true
    for (const child of children) await stop(child)
    rmSync(mark, { force: true })
  }
  try {
    await until(async () => {
      if (server.exitCode !== null) throw new Error('The server ended while starting; its lines above say why.')
      return fetch(`http://127.0.0.1:${port}/api/health`).then(r => r.ok, () => false)
    }, { what: 'the server to answer /api/health' })
  } catch (error) {
    await stopAll()
    throw error
  }
  return { stop: stopAll, server, worker }
}

/** The catcher that stands in for a mail server. */
export async function startCatcher(build, { port, folder, onLine = () => {} }) {
  const child = start(process.execPath, [join(build, 'mail-catcher.mjs'), String(port), folder], { cwd: root, env: process.env }, line => onLine(`mail: ${line}`))
  const { createConnection } = await import('node:net')
  await until(() => new Promise((resolve) => {
    const socket = createConnection(port, '127.0.0.1', () => {
      socket.end()
      resolve(true)
    })
    socket.once('error', () => resolve(false))
  }), { what: 'the mail catcher' })
  return { stop: () => stop(child) }
}

/** Arguments for Node.js that run one of the terminal's commands from a build. */
export const commandOf = (build, ...args) => [join(build, 'command.mjs'), ...args]
