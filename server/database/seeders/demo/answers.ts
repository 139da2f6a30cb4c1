import type { Guard } from '#shared/calc/types'
import { calcId } from './build-document'
import type { DemoAct } from './demo-note'

/**
 * What the analyst of `note` wrote about a guard of the calculation with that id,
 * or null. An answer to `G-02` serves every wall that raises it; the last one counts.
 */
export function answerFor(acts: DemoAct[], { note, id }: { note: string, id: string }, guard: Pick<Guard, 'id' | 'key'>): string | null {
  const answers = acts.flatMap(act => act.act === 'answer' ? act.answers : [])
    .filter(answer => (answer.calc === '*' || calcId(note, answer.calc) === id) && (answer.guard === guard.id || answer.guard === guard.key))
  return answers[answers.length - 1]?.text ?? null
}
