import type { Act, IssueView, Remaining } from '#shared/schemas/issue-view'

export type StripAct = Extract<Act, 'submit' | 'recall' | 'return' | 'pass' | 'release' | 'abandon' | 'withdraw' | 'reassign' | 'open-next'>

export interface StripVerb { act: StripAct, words: string, kind: 'primary' | 'plain' | 'stop' | 'link', why: string | null }

const words: Record<StripAct, string> = {
  'submit': 'Submit for check', 'recall': 'Recall', 'return': 'Return', 'pass': 'Pass', 'release': 'Release',
  'abandon': 'Abandon', 'withdraw': 'Withdraw', 'reassign': 'Reassign', 'open-next': 'Open the next issue',
}
const kinds: Partial<Record<StripAct, StripVerb['kind']>> = { submit: 'primary', pass: 'primary', release: 'primary', return: 'stop', abandon: 'link', withdraw: 'stop', reassign: 'link' }

/** Acts of each state; the first is the one it is there for. */
const offered: Record<string, StripAct[]> = {
  'draft': ['submit', 'abandon'],
  'in check': ['pass', 'return', 'recall', 'reassign'],
  'for approval': ['release', 'return', 'recall', 'reassign'],
  'released': ['open-next', 'withdraw'],
  'withdrawn': ['open-next'],
}

export const countOf = (remaining: readonly Remaining[]): number => remaining.reduce((sum, each) => sum + Math.max(1, each.count), 0)

/** What stands between the issue and the act its state is there for. */
export function remainingFor(issue: IssueView): { act: 'submit' | 'pass' | 'release', head: string, items: Remaining[] } | null {
  if (issue.state === 'draft') return { act: 'submit', head: 'Before it can go to check', items: issue.remaining.submit }
  if (issue.state === 'in check') return { act: 'pass', head: 'Before it can be passed', items: issue.remaining.pass }
  if (issue.state === 'for approval') return { act: 'release', head: 'Before it can be released', items: issue.remaining.release }
  return null
}

/**
 * The verbs of the strip. The one the state is there for always stands, and says
 * what remains or whose it is; the others stand for those who may use them.
 */
export function stripVerbs(issue: IssueView): StripVerb[] {
  return (offered[issue.state] ?? []).flatMap((act, i): StripVerb[] => {
    const ability = issue.abilities[act]
    const remaining = act === 'submit' || act === 'pass' || act === 'release' ? countOf(issue.remaining[act]) : 0
    const kind = kinds[act] ?? 'plain'
    if (ability.can && remaining === 0) return [{ act, words: words[act], kind, why: null }]
    if (i > 0) return ability.can ? [{ act, words: words[act], kind, why: null }] : []
    if (issue.releasing) return [{ act, words: 'Release being made', kind, why: 'The worker makes and signs the PDF; this page shows when it is done.' }]
    if (act === 'open-next') return []
    const why = ability.why ?? 'Something still stands in the way.'
    return [{ act, words: remaining ? `${words[act]}: ${remaining === 1 ? '1 thing remains' : `${remaining} things remain`}` : words[act], kind, why }]
  })
}
