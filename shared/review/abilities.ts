/**
 * Who may do what now. Each act is judged by its row of the table; the first
 * thing that stands against it is told in a sentence that says why.
 */
import type { Abilities, Act } from '#shared/schemas/issue-view'
import { whyNotApprover, whyNotAuthor, whyNotChecker, type Candidate } from '#shared/review/eligibility'
import type { Refusal, ReviewFacts } from '#shared/review/facts'
import { moveOf, movesOf, wrongStateSentence, type Move, type Need, type Who } from '#shared/review/transitions'

export const ACTS = [
  'write', 'answer', 'submit', 'recall', 'return', 'pass', 'release', 'abandon', 'withdraw', 'reassign', 'open-next',
  'remark', 'reply', 'close-remark', 'tick', 'accept', 'check-sheet', 'see',
] as const satisfies readonly Act[]

const you = ({ person }: ReviewFacts): Candidate =>
  ({ called: 'You', disabled: person.disabled, roles: person.roles, contributedTo: person.contributedTo, part: person.part })

const sees = ({ person }: ReviewFacts) => person.auditor || person.administrator || person.roles.length > 0
const isAnalyst = (facts: ReviewFacts) => facts.person.roles.includes('analyst')
const ownPart = (facts: ReviewFacts) => whyNotAuthor(you(facts), facts.issue.letter)

const noAnalyst: Refusal = { kind: 'role', why: 'This is for an analyst of the project.' }

const assigned = (role: 'checker' | 'approver', id: string | null, name: string | null, facts: ReviewFacts): Refusal | null => {
  if (!facts.person.roles.includes(role)) return { kind: 'role', why: `This is for the ${role}; you are no ${role} of this project.` }
  if (facts.person.id === id) return null
  return { kind: 'role', why: name ? `This is for ${name}, the ${role} of this issue.` : `No ${role} is named yet; the analyst names one on submitting.` }
}

/** Why the person is not the one the row speaks of; null when they are. */
const standing: Record<Who, (facts: ReviewFacts) => Refusal | null> = {
  'reader': facts => sees(facts) ? null : { kind: 'hidden', why: 'There is no such note.' },
  'project analyst': facts => isAnalyst(facts) ? null : noAnalyst,
  'analyst': (facts) => {
    if (!isAnalyst(facts)) return noAnalyst
    const part = ownPart(facts)
    return part === null ? null : { kind: 'part', why: part }
  },
  'author': (facts) => {
    if (!isAnalyst(facts)) return noAnalyst
    const worked = facts.person.part === 'contributor' || facts.issue.analystId === facts.person.id
    return worked ? null : { kind: 'role', why: 'This is for an analyst who worked on this issue.' }
  },
  'submitter': facts => isAnalyst(facts) && facts.issue.analystId === facts.person.id
    ? null
    : { kind: 'role', why: 'This is for the analyst who submitted the issue, or for an administrator.' },
  'checker': facts => assigned('checker', facts.issue.checkerId, facts.issue.checkerName, facts),
  'approver': facts => assigned('approver', facts.issue.approverId, facts.issue.approverName, facts),
  'project approver': facts => facts.person.roles.includes('approver') ? null : { kind: 'role', why: 'This is for an approver of the project.' },
  'administrator': facts => facts.person.administrator ? null : { kind: 'role', why: 'This is for an administrator.' },
  'worker': () => ({ kind: 'role', why: 'The server does this by itself.' }),
}

/** The first refusal of the row's people; null as soon as the person is one of them. */
function notAmong(row: Move, facts: ReviewFacts): Refusal | null {
  const refusals = row.who.map(who => standing[who](facts))
  // A part held is the more telling reason than a role missing.
  return refusals.includes(null) ? null : refusals.find(refusal => refusal?.kind === 'part') ?? refusals[0] ?? null
}

function independence(row: Move, facts: ReviewFacts): Refusal | null {
  const why = row.who.includes('approver') ? whyNotApprover(you(facts), facts.issue.letter) : whyNotChecker(you(facts), facts.issue.letter)
  return why === null ? null : { kind: 'part', why }
}

const things = (count: number) => count === 1 ? 'One thing still stands' : `${count} things still stand`

function completeness(row: Move, { remaining }: ReviewFacts): Refusal | null {
  const count = row.act === 'submit' ? remaining.submit : row.act === 'pass' ? remaining.pass : remaining.release
  const goal = row.act === 'submit' ? 'the check' : row.act === 'pass' ? 'the pass' : 'the release'
  return count === 0 ? null : { kind: 'remains', why: `${things(count)} between this issue and ${goal}. They are listed beside the text.` }
}

function noOtherOnItsWay({ issue, note }: ReviewFacts): Refusal | null {
  if (note.onItsWay !== null) return { kind: 'state', why: `Issue ${note.onItsWay} is on its way already; finish or abandon it first.` }
  if (note.newestReleased !== null && note.newestReleased !== issue.letter) return { kind: 'state', why: `Issue ${note.newestReleased} is newer; open the next letter from there.` }
  return null
}

const needs: Record<Need, (row: Move, facts: ReviewFacts) => Refusal | null> = {
  'unlocked': (_, { issue }) => issue.releasing ? { kind: 'locked', why: 'The release is being made; wait until it is done or has failed.' } : null,
  'independent': independence,
  'pen': (_, { writer, person }) => writer && writer.id !== person.id ? { kind: 'pen', why: `${writer.name} is writing. You can read along, and write when the pen is free.` } : null,
  'complete': completeness,
  'no other on its way': (_, facts) => noOtherOnItsWay(facts),
  // Given with the act, not known before it.
  'reason': () => null,
  'password': () => null,
}

/** What stands against an act, or null. Rights are judged before states, so that who has no right is told so in every state. */
export function refusalOf(act: Act, facts: ReviewFacts): Refusal | null {
  if (facts.person.disabled) return { kind: 'role', why: 'Your access has ended.' }
  const hidden = standing.reader(facts)
  if (hidden) return hidden
  const row = moveOf(facts.issue.state, act)
  if (!row) {
    const wouldBe = movesOf(act).map(other => notAmong(other, facts))
    const never = wouldBe.every(refusal => refusal?.kind === 'role') ? wouldBe[0] : null
    return never ?? { kind: 'state', why: wrongStateSentence(facts.issue.state, act) }
  }
  const other = notAmong(row, facts)
  if (other) return other
  for (const need of row.needs) {
    const refusal = needs[need](row, facts)
    if (refusal) return refusal
  }
  return null
}

/** Every act and whether the person may do it now, each refusal with its sentence. */
export function abilities(facts: ReviewFacts): Abilities {
  const entries = ACTS.map((act) => {
    const refusal = refusalOf(act, facts)
    return [act, refusal ? { can: false, why: refusal.why } : { can: true }]
  })
  return Object.fromEntries(entries) as Abilities
}
