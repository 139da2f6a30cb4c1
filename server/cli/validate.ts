/** npm run validate: the engine against every reference case, for a terminal or, with --json, for other tools. */
import { parseArgs } from 'node:util'
import { loadEngine } from '#reference/engine'
import { referenceRows } from '#reference/rows'
import { judgeRow } from '#server/validation/judge-row'
import { report } from '#server/validation/report'
import { print } from './print'
import type { ValidationCase } from '#shared/schemas/validation'

const { values } = parseArgs({ options: { json: { type: 'boolean', default: false }, failed: { type: 'boolean', default: false } } })
const engine = await loadEngine()
const found = report({
  state: 'done', rows: referenceRows.map(row => judgeRow(row, engine)), cases: referenceRows.length, reason: null, finishedAt: new Date().toISOString(),
})

const tolerated = ({ kind, value }: ValidationCase['tolerance']) => `${value.toExponential(0)} ${kind === 'rel' ? 'relative' : 'absolute'}`
const lines = ({ agrees, id, quantity, inputs, unit, expected, got, difference, tolerance, source, reason }: ValidationCase) => [
  `  ${agrees ? 'agrees' : 'FAILS '}  ${id}  ${quantity}${inputs === '' ? '' : `  (${inputs})`}`,
  `          expected ${expected} ${unit}  got ${got ?? 'nothing'}  difference ${difference?.toExponential(1) ?? '–'}  tolerance ${tolerated(tolerance)}`,
  `          source: ${source}`, ...(reason === null ? [] : [`          ${reason}`]),
]
const text = () => [
  `Torquill engine ${found.engine}, method revision ${found.methodRevision}`, `${found.runtime}, ${found.finishedAt}`,
  ...found.chapters.flatMap(({ chapter, title }) => {
    const shown = found.rows.filter(row => row.chapter === chapter && !(values.failed && row.agrees))
    return shown.length > 0 ? ['', `${chapter}  ${title}`, ...shown.flatMap(lines)] : []
  }),
  '', `${found.cases} cases, ${found.cases - found.failed} agree, ${found.failed} fail`,
].join('\n')

print(values.json ? JSON.stringify(found, null, 2) : text())
if (found.failed > 0) process.exitCode = 1
