/** Runs the tools that judge a PDF from outside. A tool that is absent fails the test that needs it. */
import { spawnSync } from 'node:child_process'

export interface Said { code: number, text: string }

/** Both streams together: these tools say on either what they found, and their exit codes tell little. */
export function run(tool: string, ...args: string[]): Said {
  const done = spawnSync(tool, args, { encoding: 'utf8', maxBuffer: 64 * 1024 * 1024, timeout: 60_000 })
  if (done.error) throw new Error(`${tool} cannot be run: ${done.error.message}. Install the Debian packages poppler-utils, qpdf, mupdf-tools, openssl and libnss3-tools.`)
  return { code: done.status ?? -1, text: `${done.stdout}${done.stderr}` }
}
