/**
 * Solutions kept for the outlines met last: the same outline has the same
 * solution bit by bit, and a calculation is evaluated again at every change of
 * a load or a strength. Whoever solves elsewhere (a thread) may put its answer in.
 */
import type { Outline, OutlineRefusal } from '#shared/torsion/outline/outline'
import type { OutlineTorsion } from '#shared/torsion/outline/outline-torsion'
import { outlineTorsion } from '#shared/torsion/outline/outline-torsion'

const kept = 32
const known = new Map<string, OutlineTorsion | OutlineRefusal>()

const keyOf = ({ outer, holes }: Outline): string => JSON.stringify([outer, holes])

/** Puts in what was solved elsewhere by the same engine. */
export function rememberOutline(outline: Outline, answer: OutlineTorsion | OutlineRefusal): void {
  known.set(keyOf(outline), answer)
  for (const oldest of known.keys()) {
    if (known.size <= kept) break
    known.delete(oldest)
  }
}

/** `outlineTorsion`, or what is known of it. */
export function solvedOutline(outline: Outline): OutlineTorsion | OutlineRefusal {
  const answer = known.get(keyOf(outline))
  if (answer) return answer
  const solved = outlineTorsion(outline)
  rememberOutline(outline, solved)
  return solved
}
