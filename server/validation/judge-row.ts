import type { Engine } from '#reference/engine'
import { chapterOf, rowKey, sectionOf } from '#reference/method-sections'
import { deviation, type ReferenceRow } from '#reference/row'
import type { ValidationCase } from '#shared/schemas/validation'

type Answer = { got: number, reason: null } | { got: null, reason: string }

/** What the engine gives for a row, or why it gives nothing: a refusal fails a reference case. */
function ask(row: ReferenceRow, engine: Engine): Answer {
  try {
    const got = row.actual(engine)
    return Number.isFinite(got) ? { got, reason: null } : { got: null, reason: 'The engine gave no finite number.' }
  } catch (error) {
    return { got: null, reason: error instanceof Error ? error.message : String(error) }
  }
}

/** One reference case against the running engine. Never throws. */
export function judgeRow(row: ReferenceRow, engine: Engine): ValidationCase {
  const { id, quantity, inputs, unit, expected, source, tolerance } = row
  const section = sectionOf(row)
  const { got, reason } = ask(row, engine)
  const scale = tolerance.kind === 'rel' ? Math.abs(expected) : 1
  return {
    key: rowKey(row), section, chapter: chapterOf(section), id, quantity, inputs, unit, expected, source, tolerance, got, reason,
    difference: got === null || scale === 0 ? null : Math.abs(got - expected) / scale,
    agrees: got !== null && deviation(row, got) <= 1,
  }
}
