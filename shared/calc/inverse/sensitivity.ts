/** What the least margin becomes when each number is off by a part of itself, one at a time. */
import { withValue } from '#shared/calc/inverse/changed-inputs'
import type { MarginAt } from '#shared/calc/inverse/least-margin'
import type { Variable } from '#shared/calc/inverse/variables'

export interface SensitivityRow {
  variable: Variable
  less: MarginAt
  more: MarginAt
  /** Largest change of the margin either way; null where one side has no result. */
  effect: number | null
}

/** @param part of the value, e.g. 0.05 for ±5 %. The largest effect stands first; yields after every evaluation. */
export function* sensitivity(inputs: unknown, variables: readonly Variable[], part: number, marginOf: (inputs: unknown) => MarginAt): Generator<undefined, SensitivityRow[]> {
  const now = marginOf(inputs)
  const rows: SensitivityRow[] = []
  for (const variable of variables) {
    const less = marginOf(withValue(inputs, variable, variable.value * (1 - part)))
    yield
    const more = marginOf(withValue(inputs, variable, variable.value * (1 + part)))
    yield
    rows.push({ variable, less, more, effect: effectOf(now, [less, more]) })
  }
  return rows.sort((a, b) => (b.effect ?? Infinity) - (a.effect ?? Infinity))
}

function effectOf(now: MarginAt, ends: readonly MarginAt[]): number | null {
  const ms = (at: MarginAt) => (at.ok ? at.least?.ms ?? null : null)
  const from = ms(now)
  const changes = ends.map(ms).map(to => (from === null || to === null ? null : Math.abs(to - from)))
  return changes.some(change => change === null) ? null : Math.max(...changes as number[])
}
