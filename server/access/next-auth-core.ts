import { createRequire } from 'node:module'
import { dirname, join } from 'node:path'

interface Core { AuthHandler: (params: unknown) => Promise<unknown> }

/**
 * The core of next-auth. The auth module imports `next-auth/core`, a path that
 * next-auth 4.24 no longer lists among its exports, although the file is
 * there; it is loaded by its place beside a path that is listed. Packages
 * are found from the program that runs, since a bundle has no place of its own.
 */
const load = createRequire(process.argv[1] ?? process.cwd())
export const { AuthHandler } = load(join(dirname(load.resolve('next-auth/jwt')), '..', 'core', 'index.js')) as Core
