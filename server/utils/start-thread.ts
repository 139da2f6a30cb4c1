import { existsSync } from 'node:fs'
import { basename, dirname, join, resolve } from 'node:path'
import { pathToFileURL } from 'node:url'
import { Worker } from 'node:worker_threads'

/** Bundles of a build stand at its root; the server itself stands one folder deeper. */
function bundleOf(source: string): string | undefined {
  const program = dirname(resolve(process.argv[1] ?? '.'))
  return [program, dirname(program)].map(folder => join(folder, `${basename(source)}.mjs`)).find(file => existsSync(file))
}

/**
 * Starts a thread of ours: its bundle where a build runs (`build.mjs` lists the
 * bundles), its source in development and tests.
 * @param source under `server/`, without extension: `validation/validation-thread`
 */
export function startThread(source: string, workerData?: unknown): Worker {
  const bundle = bundleOf(source)
  if (bundle) return new Worker(bundle, { workerData })
  // A thread does not take the loader of TypeScript from its command line: it registers it itself.
  const file = pathToFileURL(resolve('server', `${source}.ts`)).href
  return new Worker(`import('tsx/esm/api').then(({ register }) => { register(); return import(${JSON.stringify(file)}) })`, { workerData, eval: true })
}
