/** npm run calc: calculations from JSON to JSON, for other tools and spreadsheets. */
import { readFileSync } from 'node:fs'
import { resolve } from 'node:path'
import { parseArgs } from 'node:util'
import { evaluateBatch } from '#server/batch/evaluate-batch'
import { inputSchema } from '#server/batch/input-schema'
import { readBatch, type BatchFault } from '#server/batch/read-batch'
import { print } from './print'
import { calcKind, calcKindNames, isCalcKind } from '#shared/calc/registry'

const usage = `Usage: npm run --silent calc -- FILE            evaluate the calculations in FILE; - reads standard input
       npm run --silent calc -- --working FILE  with the working of each result
       npm run --silent calc -- --kinds         list the kinds of calculation
       npm run --silent calc -- --schema KIND   print the JSON Schema of a kind's inputs`

/** Nothing was evaluated: wrong usage, or a file that cannot be read. Faults of the input end with 1. */
const cannotBegin = 2

const printJson = (value: unknown) => print(JSON.stringify(value, null, 2))
const complain = (line: string) => process.stderr.write(`${line}\n`)

/** `calculation 2 (Hat), inputs.walls.0.t: …` on one line, whatever the file holds. */
function lineOf({ calculation, title, path, message }: BatchFault): string {
  const where = [calculation === null ? '' : `calculation ${calculation}${title === '' ? '' : ` (${title})`}`, path].filter(part => part !== '').join(', ')
  return `${where === '' ? '' : `${where}: `}${message}`.replace(/\s+/g, ' ')
}

function evaluate(file: string, working: boolean): number {
  // npm moves to the project's folder; a path is meant from where the command was typed.
  const read = readBatch(readFileSync(file === '-' ? 0 : resolve(process.env.INIT_CWD ?? '.', file), 'utf8'))
  if (!read.ok) {
    read.faults.map(lineOf).forEach(complain)
    return 1
  }
  const { answers, faults } = evaluateBatch(read.batch, { working })
  printJson(read.batch.many ? answers : answers[0])
  faults.map(lineOf).forEach(complain)
  return faults.length > 0 ? 1 : 0
}

function main(): number {
  const { values, positionals } = parseArgs({
    allowPositionals: true,
    options: { working: { type: 'boolean', default: false }, kinds: { type: 'boolean', default: false }, schema: { type: 'string' } },
  })
  if (values.kinds) {
    printJson(calcKindNames().map(calcKind).map(({ kind, version, title, record = false }) => ({ kind, version, title, record })))
    return 0
  }
  if (values.schema !== undefined) {
    if (!isCalcKind(values.schema)) throw new Error(`“${values.schema}” is no kind of calculation; choose one of ${calcKindNames().join(', ')}.`)
    printJson(inputSchema(values.schema))
    return 0
  }
  const [file, ...rest] = positionals
  if (file === undefined || rest.length > 0) throw new Error(usage)
  return evaluate(file, values.working)
}

try {
  process.exitCode = main()
} catch (error) {
  complain(error instanceof Error ? error.message : String(error))
  process.exitCode = cannotBegin
}
