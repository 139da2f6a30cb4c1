/**
 * What a tick stands on: the inputs, results, answers and method revision of one calculation, as one canonical
 * text (RFC 8785). The server hashes this text; a tick holds while the text is the same.
 * Stored results are used, never recomputed ones: two machines may differ in the last digit.
 */
import canonicalize from 'canonicalize'
import type { Evaluation, Guard } from '#shared/calc/types'

export interface TickedAnswer { guardKey: string, kind: 'answer' | 'deviation', text: string }
export interface TickedParts {
  kind: string
  kindVersion: number
  title: string
  inputs: unknown
  result: Evaluation
  answers: TickedAnswer[]
  methodRevision: string
}

export function tickHash(parts: TickedParts): string {
  const answers = parts.answers
    .map(({ guardKey, kind, text }) => ({ guardKey, kind, text }))
    .sort((a, b) => order(a.guardKey, b.guardKey) || order(a.kind, b.kind) || order(a.text, b.text))
  const canonical = canonicalize({ ...parts, answers })
  if (canonical === undefined) throw new TypeError('A calculation that is ticked must be plain data.')
  return canonical
}

const order = (a: string, b: string) => a < b ? -1 : a > b ? 1 : 0

/** G-45: the calculation was ticked and is no longer what was ticked. Review raises it; null while the tick holds. */
export function changedAfterTick(ticked: string, now: string): Guard | null {
  if (ticked === now) return null
  return {
    id: 'G-45', key: 'G-45', severity: 'stop', deviable: false, title: 'Changed after the check',
    message: 'The inputs, results, answers or method of this calculation changed after it was ticked.',
    ask: 'The checker ticks it again.', values: {}, source: 'configuration control',
  }
}
