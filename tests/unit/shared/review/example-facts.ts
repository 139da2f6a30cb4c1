import type { ReviewFacts } from '#shared/review/facts'

type Deep = { [Key in keyof ReviewFacts]?: ReviewFacts[Key] extends object | null ? Partial<NonNullable<ReviewFacts[Key]>> | null : ReviewFacts[Key] }

/** Issue B of a note whose A is released, submitted by Ana, checked by Che, for App to release; asked for by nobody in particular. */
export function factsWith(change: Deep = {}): ReviewFacts {
  const state = change.issue?.state ?? 'draft'
  const onItsWay = state === 'draft' || state === 'in check' || state === 'for approval'
  return {
    issue: {
      letter: 'B', state, releasing: false, analystId: 'ana', checkerId: 'che', approverId: 'app',
      checkerName: 'Che Ran', approverName: 'App Mul', ...change.issue,
    },
    note: { onItsWay: onItsWay ? 'B' : null, newestReleased: state === 'released' || state === 'withdrawn' ? 'B' : 'A', ...change.note },
    person: { id: 'who', disabled: false, auditor: false, administrator: false, roles: [], part: null, contributedTo: [], ...change.person },
    writer: change.writer ? { id: 'ana', name: 'Ana Tver', ...change.writer } : null,
    remaining: { submit: 0, pass: 0, release: 0, ...change.remaining },
  }
}
