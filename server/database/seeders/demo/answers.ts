import type { Guard } from '#shared/calc/types'
import type { DemoAct } from './demo-note'

/**
 * What the analyst wrote about a guard of the calculation called `name`, or
 * null. An answer to `G-02` serves every wall that raises it; the last one counts.
 */
export function answerFor(acts: DemoAct[], name: string, guard: Pick<Guard, 'id' | 'key'>): string | null {
  const answers = acts.flatMap(act => act.act === 'answer' ? act.answers : [])
    .filter(answer => (answer.calc === '*' || answer.calc === name) && (answer.guard === guard.id || answer.guard === guard.key))
  return answers[answers.length - 1]?.text ?? null
}
