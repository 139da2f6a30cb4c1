// Running other programs, with Node's built-ins only: launchers work before anything is installed.
import { spawn, spawnSync } from 'node:child_process'
import { fileURLToPath } from 'node:url'

export const root = fileURLToPath(new URL('../..', import.meta.url)).replace(/\/$/, '')

/** Runs a program to its end; throws with its output when it fails. */
export function run(command, args, options = {}) {
  const { quiet = true, ...rest } = options
  const done = spawnSync(command, args, { cwd: root, encoding: 'utf8', stdio: quiet ? 'pipe' : 'inherit', maxBuffer: 64 << 20, ...rest })
  if (done.error) throw done.error
  if (done.status !== 0) throw new Error(`${command} ${args.join(' ')} ended with ${done.status ?? done.signal}\n${done.stdout ?? ''}${done.stderr ?? ''}`)
  return done.stdout ?? ''
}

/** Whether a program runs and succeeds. */
export function succeeds(command, args, options = {}) {
  return spawnSync(command, args, { cwd: root, stdio: 'ignore', ...options }).status === 0
}

/** A child that lives on; its lines are passed to `onLine`. */
export function start(command, args, options = {}, onLine = () => {}) {
  const child = spawn(command, args, { cwd: root, stdio: ['ignore', 'pipe', 'pipe'], ...options })
  for (const stream of [child.stdout, child.stderr]) {
    let rest = ''
    stream.setEncoding('utf8')
    stream.on('data', (text) => {
      const lines = (rest + text).split('\n')
      rest = lines.pop() ?? ''
      lines.forEach(onLine)
    })
  }
  return child
}

/** Ends a child politely and waits; after the patience it is killed. */
export function stop(child, patience = 15_000) {
  if (!child || child.exitCode !== null || child.signalCode !== null) return Promise.resolve()
  return new Promise((resolve) => {
    const timer = setTimeout(() => child.kill('SIGKILL'), patience)
    child.once('exit', () => {
      clearTimeout(timer)
      resolve()
    })
    child.kill('SIGTERM')
  })
}

/** Asks again until `probe` answers true, or gives up with the reason. */
export async function until(probe, { patience = 60_000, every = 200, what = 'the service' } = {}) {
  const end = Date.now() + patience
  for (;;) {
    if (await probe()) return
    if (Date.now() > end) throw new Error(`Waited ${patience / 1000} s for ${what} in vain.`)
    await new Promise(resolve => setTimeout(resolve, every))
  }
}

let told = process.stdout
export const say = text => told.write(`${text}\n`)

/** For commands whose standard output other programs read: what is said goes to standard error. */
export const keepStandardOutputForData = () => {
  told = process.stderr
}
