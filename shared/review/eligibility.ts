/**
 * Who may check and who may approve: people with the role who did not
 * contribute. What counts is every contribution to the issue and to the issues
 * before it that came after the last released one, abandoned ones included.
 */
import { letterRank } from '#shared/review/letters'
import { wasReleased, type IssueState } from '#shared/review/states'

export type ProjectRole = 'analyst' | 'checker' | 'approver'
export type Part = 'contributor' | 'checker' | 'approver'

/** One issue of the note. */
export interface IssueLine { letter: string, state: IssueState }
/** What a person has been to an issue of the note. */
export interface PartLine { letter: string, personId: string, part: Part }

/** Letters of the issues in which a contribution bars from checking `letter`, in order. */
export function lettersThatCount(issues: readonly IssueLine[], letter: string): string[] {
  const rank = letterRank(letter)
  const released = issues.filter(issue => wasReleased(issue.state)).map(issue => letterRank(issue.letter)).filter(one => one < rank)
  const last = Math.max(0, ...released)
  return issues
    .map(issue => issue.letter)
    .filter(one => letterRank(one) > last && letterRank(one) <= rank)
    .sort((a, b) => letterRank(a) - letterRank(b))
}

/** Letters to which the person contributed, among those that count for `letter`. */
export function contributedTo(personId: string, letter: string, issues: readonly IssueLine[], parts: readonly PartLine[]): string[] {
  const own = parts.filter(part => part.personId === personId && part.part === 'contributor')
  return lettersThatCount(issues, letter).filter(one => own.some(part => part.letter === one))
}

/** The part the person has in the issue itself, or null. */
export const partIn = (personId: string, letter: string, parts: readonly PartLine[]): Part | null =>
  parts.find(part => part.personId === personId && part.letter === letter)?.part ?? null

/** A person as eligibility sees them. */
export interface Candidate {
  /** `You`, or the name: it begins the sentence. */
  called: string
  disabled: boolean
  roles: readonly ProjectRole[]
  /** From `contributedTo`. */
  contributedTo: readonly string[]
  /** From `partIn`. */
  part: Part | null
}

const isYou = (person: Candidate) => person.called === 'You'
const verb = (person: Candidate, you: string, other: string) => `${person.called} ${isYou(person) ? you : other}`
const issuesInWords = (letters: readonly string[]) =>
  letters.length === 1 ? `issue ${letters[0]}` : `issues ${letters.slice(0, -1).join(', ')} and ${letters.at(-1)}`

/** Why the person may not check, tick, accept or pass the issue; null when they may. */
export function whyNotChecker(person: Candidate, letter: string): string | null {
  if (person.disabled) return verb(person, 'are disabled.', 'is disabled. Name somebody else.')
  if (!person.roles.includes('checker')) return verb(person, 'are no checker of this project.', 'is no checker of this project.')
  if (person.contributedTo.length) return `${person.called} contributed to ${issuesInWords(person.contributedTo)}, so ${isYou(person) ? 'you' : 'they'} cannot check ${letterOrIt(person.contributedTo, letter)}.`
  if (person.part === 'approver') return `${person.called} signed the release of issue ${letter}, so ${isYou(person) ? 'you' : 'they'} cannot check it.`
  return null
}

/** Why the person may not release the issue; null when they may. */
export function whyNotApprover(person: Candidate, letter: string): string | null {
  if (person.disabled) return verb(person, 'are disabled.', 'is disabled. Name somebody else.')
  if (!person.roles.includes('approver')) return verb(person, 'are no approver of this project.', 'is no approver of this project.')
  if (person.contributedTo.length) return `${person.called} contributed to ${issuesInWords(person.contributedTo)}, so ${isYou(person) ? 'you' : 'they'} cannot release ${letterOrIt(person.contributedTo, letter)}.`
  if (person.part === 'checker') return `${person.called} checked issue ${letter}, so ${isYou(person) ? 'you' : 'they'} cannot release it.`
  return null
}

/** Why the person may not write in the issue or submit it, the role aside; null when they may. */
export function whyNotAuthor(person: Candidate, letter: string): string | null {
  if (person.part === 'checker') return `${person.called} checked issue ${letter}, so ${isYou(person) ? 'you' : 'they'} cannot be one of its authors.`
  if (person.part === 'approver') return `${person.called} signed the release of issue ${letter}, so ${isYou(person) ? 'you' : 'they'} cannot be one of its authors.`
  return null
}

const letterOrIt = (letters: readonly string[], letter: string) => letters.length === 1 && letters[0] === letter ? 'it' : `issue ${letter}`
