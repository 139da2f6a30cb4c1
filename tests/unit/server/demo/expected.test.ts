import { describe, expect, it } from 'vitest'
import { evaluateNote } from '#shared/calc/evaluate-note'
import type { Output } from '#shared/calc/types'
import { calculationsOf } from '#shared/note/calculations'
import { readDocument } from '#shared/note/schema'
import { showMargin } from '#shared/units/display'
import { fromEngine, isUnit } from '#shared/units/units'
import { buildDocument, labelsOf } from '#server/database/seeders/demo/build-document'
import { DEMO_NOTES } from '#server/database/seeders/demo/scenario'
import { DEMO_EXPECTED, DEMO_GUARDS } from '#reference/demo-expected'
import { DEMO_GUARD_DIFFERENCES, DEMO_NOT_GIVEN, DEMO_PLACES } from '../../../factories/demo-places'

/** Six significant figures. */
const SIX_FIGURES = 1e-5

interface Found { outputs: Map<string, Output>, guards: Map<string, string[]> }

/** Outputs as `hat J`, of an issue before the last as `A:hat J`, and the ids of the guards of each calculation. */
function evaluated(number: string): Found {
  const note = DEMO_NOTES.find(one => one.number === number)
  const found: Found = { outputs: new Map(), guards: new Map() }
  note?.issues.forEach((issue, index) => {
    const saves = issue.acts.flatMap(act => act.act === 'save' ? [act.sections] : [])
    const sections = saves[saves.length - 1] ?? []
    const names = [...labelsOf(sections).keys()]
    const prefix = index === note.issues.length - 1 ? '' : `${issue.letter}:`
    const calculations = calculationsOf(readDocument(buildDocument(number, sections)))
    const { results } = evaluateNote(calculations)
    calculations.forEach(({ id }, i) => {
      const evaluation = results[id]
      if (evaluation?.ok !== true) throw new Error(`${number} ${names[i]} gives no result`)
      for (const output of evaluation.result.outputs) found.outputs.set(`${prefix}${names[i]} ${output.key}`, output)
      found.guards.set(`${prefix}${names[i]}`, [...new Set(evaluation.result.guards.filter(guard => guard.severity !== 'information').map(guard => guard.id))])
    })
  })
  return found
}

const told = DEMO_NOTES.map(note => note.number)
const FOUND = new Map(told.map(number => [number, evaluated(number)]))
const ROWS = DEMO_EXPECTED.filter(row => told.includes(row.note)).map(row => ({ ...row, name: `${row.note} ${row.calculation} ${row.output}` }))

describe('the figures of the demonstration', () => {
  it('are each compared, or absent for a reason that is written down', () => {
    const nowhere = ROWS.filter(({ note, calculation, output }) => {
      const key = `${note} ${calculation}`
      return (DEMO_PLACES[key]?.[output] === undefined) === (DEMO_NOT_GIVEN[key]?.[output] === undefined)
    })
    expect(nowhere.map(row => row.name)).toEqual([])
  })

  const placed = ROWS.flatMap((row) => {
    const place = DEMO_PLACES[`${row.note} ${row.calculation}`]?.[row.output]
    return place === undefined ? [] : [{ ...row, place }]
  })

  it.each(placed)('$name is $value $unit ($by)', ({ note, value, unit, place }) => {
    const output = FOUND.get(note)?.outputs.get(place.at)
    if (output === undefined) throw new Error(`${place.at} is no output`)
    const ours = (isUnit(unit) ? fromEngine(output.value, unit) : output.value) * (place.times ?? 1)
    const given = place.magnitude ? Math.abs(ours) : ours
    const asked = place.magnitude ? Math.abs(value) : value
    expect(Math.abs(given - asked), `${given} against ${asked}`).toBeLessThanOrEqual((place.within ?? SIX_FIGURES) * Math.abs(asked))
  })

  it.each(placed.filter(row => row.shown !== undefined))('$name is shown as $shown', ({ note, place, shown }) => {
    expect(showMargin(FOUND.get(note)?.outputs.get(place.at)?.value ?? null)).toBe(place.shown ?? shown)
  })
})

describe('the guards of the demonstration', () => {
  it.each(told)('%s raises those that the scenario expects, but for what is written down', (number) => {
    const raised = [...new Set([...FOUND.get(number)?.guards ?? []].flatMap(([, ids]) => ids))].sort()
    const expected = DEMO_GUARDS.filter(row => row.note === number).flatMap(row => row.guards)
    const { not, also } = DEMO_GUARD_DIFFERENCES[number] ?? { not: {}, also: {} }
    expect(raised).toEqual([...new Set([...expected.filter(id => !(id in not)), ...Object.keys(also)])].sort())
  })
})
