import { readdirSync, readFileSync, statSync } from 'node:fs'
import { join, relative } from 'node:path'

const base = new URL('../../server/api', import.meta.url).pathname

export interface Route { file: string, method: string, path: string, policy: string | null, text: string }

function* files(folder: string): Generator<string> {
  for (const name of readdirSync(folder)) {
    const path = join(folder, name)
    if (statSync(path).isDirectory()) yield* files(path)
    else yield path
  }
}

/** Every JSON route as its file says it: method, address with its parameters, policy. */
export function allRoutes(): Route[] {
  return [...files(base)].map((file) => {
    const text = readFileSync(file, 'utf8')
    const name = relative(base, file)
    const [, stem = '', method = 'any'] = /^(.*?)(?:\.(get|post|put|patch|delete))?\.ts$/.exec(name) ?? []
    const path = `/api/${stem.replace(/(^|\/)index$/, '')}`.replace(/\/$/, '')
    return { file: name, method: method.toUpperCase(), path, policy: /defineApi\(\{\s*can: '([^']+)'/.exec(text)?.[1] ?? null, text }
  })
}
