// npm test: everything from nothing. Installs what is missing, then lint, types, unit, API and browser tests.
import { readFileSync, rmSync } from 'node:fs'
import { join } from 'node:path'
import { spawnSync } from 'node:child_process'
import { ensureBuild } from './build.mjs'
import { ensureServerPrograms, serverPrograms } from './cluster.mjs'
import { ensureDebian, ensureNodeModules, ensurePrepared, onPath } from './packages.mjs'
import { root, run, say } from './shell.mjs'
import { startThrowAway } from './throw-away.mjs'

const deep = process.argv.includes('--deep')
const counts = { passed: 0, failed: 0 }
/** Named once more at the end: a record of the run may keep its last lines only. */
const failures = []

function step(name, command, args, env = {}) {
  const began = Date.now()
  say(`\n${name}`)
  const done = spawnSync(command, args, { cwd: root, stdio: 'inherit', env: { ...process.env, NUXT_TELEMETRY_DISABLED: '1', TZ: 'UTC', ...env } })
  const ok = done.status === 0
  say(`${name}: ${ok ? 'passed' : 'FAILED'} (${Math.round((Date.now() - began) / 1000)} s)`)
  return ok
}

/** Lint and types count as one test each. */
const single = (name, command, args) => {
  const ok = step(name, command, args)
  counts[ok ? 'passed' : 'failed'] += 1
  if (!ok) failures.push(name)
}

function vitest(project, env) {
  const report = join(root, `.data/report-${project}.json`)
  rmSync(report, { force: true })
  const ok = step(`${project} tests`, 'npx', ['vitest', 'run', '--project', project, '--reporter=default', '--reporter=json', `--outputFile.json=${report}`], env)
  try {
    const { numPassedTests, numFailedTests, numPendingTests, testResults } = JSON.parse(readFileSync(report, 'utf8'))
    for (const { name, message, status: outcome, assertionResults } of testResults) {
      if (outcome === 'failed' && !assertionResults.length) failures.push(`${project}: ${name}: ${message.split('\n')[0]}`)
      for (const { status, fullName, failureMessages } of assertionResults) {
        if (status === 'failed') failures.push(`${project}: ${fullName}: ${failureMessages[0]?.split('\n')[0] ?? ''}`)
      }
    }
    counts.passed += numPassedTests
    counts.failed += numFailedTests
    if (numPendingTests) say(`${numPendingTests} tests were left out`)
    if (!ok && !numFailedTests) counts.failed += 1
    if (!numPassedTests && !numFailedTests) counts.failed += 1
  } catch {
    counts.failed += 1
  }
}

function install() {
  ensureDebian({
    'postgresql': () => serverPrograms() !== null, 'chromium': onPath('chromium'), 'poppler-utils': onPath('pdfsig'), 'qpdf': onPath('qpdf'),
    'openssl': onPath('openssl'), 'libnss3-tools': onPath('certutil'), 'mupdf-tools': onPath('mutool'),
  })
  ensureNodeModules()
  ensurePrepared()
  ensureServerPrograms()
}

function oneCopy(name) {
  const tree = JSON.parse(run('npm', ['ls', name, '--all', '--json']))
  const versions = new Set()
  const walk = node => Object.entries(node.dependencies ?? {}).forEach(([dependency, inside]) => {
    if (dependency === name && inside.version) versions.add(inside.version)
    walk(inside)
  })
  walk(tree)
  const ok = versions.size === 1
  if (!ok) say(`${name} is installed in ${[...versions].join(', ')}: two copies break the editor`)
  counts[ok ? 'passed' : 'failed'] += 1
}

async function main() {
  const began = Date.now()
  install()
  say(`Set-up: ${Math.round((Date.now() - began) / 1000)} s`)
  if (deep) {
    vitest('deep', {})
  } else {
    single('lint', 'npx', ['eslint', '.', '--max-warnings', '0'])
    single('types', 'npx', ['nuxi', 'typecheck'])
    oneCopy('prosemirror-model')
    vitest('types', {})
    vitest('unit', {})
    const build = ensureBuild()
    const database = await startThrowAway()
    try {
      const env = { TORQUILL_TEST_BUILD: build, DATABASE_URL: database.application, DATABASE_OWNER_URL: database.owner }
      vitest('api', env)
      vitest('browser', env)
    } finally {
      database.stop()
    }
  }
  if (failures.length) say(`\nFailed:\n${failures.join('\n')}`)
  say(`\n${counts.passed} passed, ${counts.failed} failed`)
  process.exit(counts.failed ? 1 : 0)
}

main().catch((error) => {
  say(error instanceof Error ? error.message : String(error))
  say(`\n${counts.passed} passed, ${counts.failed + 1} failed`)
  process.exit(1)
})
