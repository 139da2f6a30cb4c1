/**
 * The revisions of the torsion methods, oldest first. A number that moves needs a new one: raise METHOD_REVISION,
 * say here why, and let `npm run golden` write what the engine gives now beside what it gave before.
 */
export interface MethodRevisionEntry {
  /** A, B … as METHOD_REVISION names it. */
  readonly revision: string
  /** Which methods changed and for what reason; what a reader of an older note must know. */
  readonly why: string
}

export const methodRevisions: readonly MethodRevisionEntry[] = [
  { revision: 'A', why: 'First revision.' },
]
