import { runCommandLine } from './commands'

const [name, ...args] = process.argv.slice(2)
try {
  await runCommandLine(name ?? '', args)
} catch (error) {
  process.stderr.write(`${error instanceof Error ? error.message : String(error)}\n`)
  process.exitCode = 1
}
