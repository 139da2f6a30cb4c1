import type { Guard } from '#shared/calc/types'
import type { AnswerView } from '#shared/schemas/issue-view'

export type Tone = 'stop' | 'caution' | 'info' | 'pass'

export interface GuardState { words: string, tone: Tone, glyph: 'stop' | 'caution' | 'caution-answered' | 'information', /** Something is still to be written. */ open: boolean }

/** How a guard stands, in the words of the note: what is asked, and whether it has been met. */
export function guardState(guard: Guard, answer: AnswerView | null): GuardState {
  if (guard.severity === 'information') return { words: 'information', tone: 'info', glyph: 'information', open: false }
  if (guard.severity === 'stop' && !guard.deviable) return { words: 'stop', tone: 'stop', glyph: 'stop', open: true }
  const stop = guard.severity === 'stop'
  const what = stop ? 'deviation' : 'answer'
  const open = { tone: stop ? 'stop' : 'caution', glyph: stop ? 'stop' : 'caution', open: true } as const
  const met = { glyph: stop ? 'stop' : 'caution-answered', open: false } as const
  if (!answer) return { words: stop ? 'stop, needs a deviation' : 'caution, not answered', ...open }
  if (answer.lapsed) return { words: `${what} lapsed`, ...open }
  if (answer.judged && !answer.judged.accepted) return { words: `${what} not accepted`, ...open }
  if (answer.approved) return { words: `${what} accepted, approved`, tone: 'pass', ...met }
  if (answer.judged) return { words: `${what} accepted`, tone: 'pass', ...met }
  return { words: stop ? 'stop, deviation written' : 'caution, answered', tone: open.tone, ...met }
}
