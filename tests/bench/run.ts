/**
 * npm run bench: every benchmark in one run as one table, and in results.json. Times are of this machine at this
 * hour; the ratio to the baseline of the same run is what may be compared with another. results.json is not
 * committed: it would be out of date with the next commit and say another machine's times.
 */
import { spawnSync } from 'node:child_process'
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { availableParallelism, cpus, loadavg, tmpdir } from 'node:os'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { ENGINE_VERSION } from '#shared/calc/registry'
import { baselineName } from './baseline-name'
import { compareOutlines, comparisonTable } from './compare-outline'
import type { Measured } from './note-in-use.measure'

interface Benchmark { name: string, mean: number, min: number, p75: number, sampleCount: number }
interface Report { files: { groups: { fullName: string, benchmarks: Benchmark[] }[] }[] }
interface Row { group: string, name: string, mean: number, least: number, p75: number, runs: number, ratio: number }

/** Vitest measures; its report holds milliseconds. */
function measured(): Row[] {
  const folder = mkdtempSync(join(tmpdir(), 'torquill-bench-'))
  const report = join(folder, 'report.json')
  try {
    const { status } = spawnSync('npx', ['vitest', 'bench', '--run', '--project', 'unit', `--outputJson=${report}`], { stdio: ['ignore', 'ignore', 'inherit'] })
    if (status !== 0) throw new Error('The benchmarks did not run to their end; vitest says why above.')
    const { files } = JSON.parse(readFileSync(report, 'utf8')) as Report
    const found = files.flatMap(file => file.groups.flatMap(({ fullName, benchmarks }) => benchmarks.map(one => ({ group: fullName.split(' > ').slice(1).join(', '), ...one }))))
    const baseline = found.find(one => one.name === baselineName)?.min
    if (baseline === undefined) throw new Error(`The baseline “${baselineName}” is missing.`)
    return found.map(({ group, name, mean, min, p75, sampleCount }) => ({ group, name, mean, least: min, p75, runs: sampleCount, ratio: min / baseline }))
  } finally {
    rmSync(folder, { recursive: true, force: true })
  }
}

/** The large note in the built server, the database and Chromium. */
function measuredInUse(): Measured[] {
  const folder = mkdtempSync(join(tmpdir(), 'torquill-measured-'))
  const report = join(folder, 'measured.json')
  try {
    const { status } = spawnSync('npx', ['vitest', 'run', '--project', 'measure'], { stdio: ['ignore', 'ignore', 'inherit'], env: { ...process.env, TORQUILL_MEASURED: report } })
    if (status !== 0) throw new Error('The large note could not be measured; vitest says why above.')
    return JSON.parse(readFileSync(report, 'utf8')) as Measured[]
  } finally {
    rmSync(folder, { recursive: true, force: true })
  }
}

const tableInUse = (rows: readonly Measured[]) => rows.map(({ name, median, least, baseline, ofBaseline }) =>
  `${name}: median ${figures(median)} ms, least ${figures(least)}${baseline === '' ? '' : `, ${figures(ofBaseline)} of ${baseline}`}`).join('\n')

const figures = (value: number) => Number(value.toPrecision(3)).toString()

function table(rows: readonly Row[]): string {
  const cells = rows.map(({ group, name, least, mean, ratio }) => [`${group}: ${name}`, figures(least), figures(mean), figures(ratio)])
  const head = ['benchmark', 'least, ms', 'mean, ms', 'of the baseline']
  const widths = head.map((title, i) => Math.max(title.length, ...cells.map(row => (row[i] ?? '').length)))
  return [head, ...cells].map(row => row.map((cell, i) => i === 0 ? cell.padEnd(widths[i] ?? 0) : cell.padStart((widths[i] ?? 0) + 3)).join('')).join('\n')
}

const began = loadavg()[0]
const rows = measured()
const outlines = compareOutlines()
const inUse = measuredInUse()
const machine = { node: process.versions.node, processor: cpus()[0]?.model ?? '', cores: availableParallelism(), loadBefore: began }
writeFileSync(fileURLToPath(new URL('./results.json', import.meta.url)), `${JSON.stringify({ engine: ENGINE_VERSION, machine, rows, outlines, inUse }, null, 2)}\n`)
process.stdout.write(`${table(rows)}\n\nGeneral outline beside a general finite-element program, CPU time\n${comparisonTable(outlines)}\n\nA note of two hundred calculations and three hundred pages in use\n${tableInUse(inUse)}\n`)
