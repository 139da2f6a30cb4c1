import { availableParallelism } from 'node:os'
import type { Outline, OutlineRefusal } from '#shared/torsion/outline/outline'
import type { OutlineOptions, OutlineTorsion } from '#shared/torsion/outline/outline-torsion'
import { startThread } from '#server/utils/start-thread'
import { ThreadPool, type PoolRefusal } from './thread-pool'

export interface OutlineTask { outline: Outline, options?: OutlineOptions }
export type OutlineAnswer = OutlineTorsion | OutlineRefusal | PoolRefusal

/** A core is left to the requests; an outline of ordinary size takes a fraction of a second. */
const limits = { threads: Math.max(1, availableParallelism() - 1), mostWaiting: 16, timeLimit: 20_000 }
/** Solutions kept: a note is computed again at every save, its outlines seldom change. */
const kept = 100

let pool: ThreadPool<OutlineTask, OutlineTorsion | OutlineRefusal> | undefined
const solutions = new Map<string, OutlineTorsion | OutlineRefusal>()

/** Keeps an answer as the newest, and forgets the oldest beyond the number kept. */
function keep(key: string, answer: OutlineTorsion | OutlineRefusal): OutlineTorsion | OutlineRefusal {
  solutions.delete(key)
  solutions.set(key, answer)
  for (const oldest of solutions.keys()) {
    if (solutions.size <= kept) break
    solutions.delete(oldest)
  }
  return answer
}

/**
 * Solves an outline on a thread of its own, or gives what is already known of
 * it: the same outline has the same solution, bit by bit. Never rejects; with
 * a `code` the answer is that of a busy, overlong, cancelled or broken run.
 */
export async function solveOutline(task: OutlineTask, signal?: AbortSignal): Promise<OutlineAnswer> {
  const key = JSON.stringify(task)
  const known = solutions.get(key)
  if (known) return keep(key, known)
  pool ??= new ThreadPool(() => startThread('outline/outline-thread'), limits)
  const given = await pool.run(task, signal)
  return given.ok ? keep(key, given.answer) : given
}

/** Ends the threads; for a server that stops, and for tests. */
export async function closeOutlinePool(): Promise<void> {
  const open = pool
  pool = undefined
  await open?.close()
}
