import { randomUUID } from 'node:crypto'
import { compareLetters, nextLetter } from '#shared/review/letters'
import { recordAct } from '#server/audit/record'
import { GuardAnswerSchema } from '#server/database/entities/guard-answer'
import { IssueSchema, type Issue } from '#server/database/entities/issue'
import { LooseDecisionSchema } from '#server/database/entities/loose-decision'
import { SaveSchema } from '#server/database/entities/save'
import { actOnIssue } from '#server/notes/act-on-issue'
import { addPart } from '#server/notes/parts'
import type { Standing } from '#server/notes/standing'
import type { CommandContext } from '#server/utils/command-context'

/** Answers and explanations go with the content; each must be judged anew. */
function carryDecisions({ em }: CommandContext, { answers, decisions }: Standing, next: Issue): void {
  for (const { calcId, guardKey, kind, text, facts, author, at } of answers) {
    em.create(GuardAnswerSchema, { id: randomUUID(), issue: next, calcId, guardKey, kind, text, facts, author, at, saveNumber: 1, judgement: '' })
  }
  for (const { blockId, text, ordinal, verdict, reason, author, at } of decisions) {
    em.create(LooseDecisionSchema, { id: randomUUID(), issue: next, blockId, text, ordinal, verdict, reason, author, at })
  }
}

/** Any analyst of the project opens the next letter from a released or withdrawn issue, with its content. */
export function openNextIssue(context: CommandContext, issueId: string): Promise<Issue> {
  return actOnIssue(context, issueId, 'open next issue', ['open-next'], async (inside, issue, name, standing) => {
    const { em, actor, clock } = inside
    const now = clock()
    const last = standing.issues.map(i => i.letter).sort(compareLetters).at(-1) ?? issue.letter
    const { note, title, part, drawingIssue, document, documentHash, results, engineVersion, leastMargin, leastMarginMode, leastMarginCase, leastMarginCalc, cautions, stops } = issue
    const next = em.create(IssueSchema, {
      id: randomUUID(), note, letter: nextLetter(last), state: 'draft', title, part, drawingIssue, changeNote: '', analyst: actor, saveNumber: 1, savedAt: now, savedBy: actor,
      document, documentHash, results, engineVersion, leastMargin, leastMarginMode, leastMarginCase, leastMarginCalc, cautions, stops, lastChangeAt: now, createdAt: now, version: 1,
    })
    em.create(SaveSchema, { id: randomUUID(), issue: next, number: 1, author: actor, at: now, steps: '[]', snapshot: document, documentHash, changedResults: results, engineVersion })
    await em.flush()
    carryDecisions(inside, standing, next)
    await em.flush()
    await addPart(inside, next, 'contributor')
    await recordAct(inside, { ...name, subject: { type: 'issue', id: next.id, label: `${note.number} ${next.letter}` }, old: { from: issue.letter }, new: { letter: next.letter, documentHash } })
    return next
  })
}
