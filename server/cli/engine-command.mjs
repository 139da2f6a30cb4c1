// Runs a command of the engine alone: it needs neither a database nor the build of the pages, only a bundle made in a moment.
import { spawnSync } from 'node:child_process'
import { ensureEngineCommand } from './build.mjs'
import { ensureNodeModules } from './packages.mjs'
import { keepStandardOutputForData, root } from './shell.mjs'

keepStandardOutputForData()
ensureNodeModules()
const [name, ...args] = process.argv.slice(2)
process.exit(spawnSync(process.execPath, [ensureEngineCommand(name), ...args], { cwd: root, stdio: 'inherit' }).status ?? 1)
