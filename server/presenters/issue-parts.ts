import { answerLapsed } from '#shared/calc/lapse'
import { calculationsOf } from '#shared/note/calculations'
import type { LooseNumber } from '#shared/note/loose-numbers'
import { sheetLines } from '#shared/review/check-sheet'
import type { AnswerView, CheckItemView, LooseView, PersonRef, RemarkView, SignatureView, TickView } from '#shared/schemas/issue-view'
import type { GuardAnswer } from '#server/database/entities/guard-answer'
import type { Results } from '#server/notes/evaluate-document'
import { documentOf } from '#server/notes/reading'
import { sheetFactsOf } from '#server/notes/sheet-facts'
import type { Standing } from '#server/notes/standing'
import { tickHashOf } from '#server/notes/tick-facts'

/** The parts of an issue view that are about its content: answers, loose numbers, remarks, ticks, check sheet, signatures. */
export const personRef = (person: { id: string, name: string }): PersonRef => ({ id: person.id, name: person.name })
const refOrNull = (person: { id: string, name: string } | null | undefined) => person ? personRef(person) : null
const iso = (date: Date | null | undefined) => date?.toISOString() ?? null

function lapseOf(answer: GuardAnswer, results: Results): string | null {
  const evaluation = results[answer.calcId]
  if (!evaluation?.ok) return 'The calculation has no result now.'
  return answerLapsed(answer.facts, evaluation.result.guards.find(g => g.key === answer.guardKey), evaluation.result.methodRevision)
}

export function presentAnswers({ answers }: Standing, results: Results): AnswerView[] {
  return answers.map(a => ({
    id: a.id, calcId: a.calcId, guardKey: a.guardKey, kind: a.kind, text: a.text, author: personRef(a.author), at: a.at.toISOString(), save: a.saveNumber,
    lapsed: lapseOf(a, results),
    judged: a.judgedBy && a.judgedAt ? { accepted: a.accepted === true, by: personRef(a.judgedBy), at: a.judgedAt.toISOString(), note: a.judgement } : null,
    approved: a.approvedBy && a.approvedAt ? { by: personRef(a.approvedBy), at: a.approvedAt.toISOString() } : null,
  }))
}

/** An explanation holds while the verdict is the one it was given at. */
export function presentLoose({ decisions }: Standing, numbers: LooseNumber[]): LooseView[] {
  return numbers.map((number) => {
    const given = decisions.find(d => d.blockId === number.blockId && d.text === number.text && d.ordinal === number.ordinal && d.verdict === number.verdict)
    return { ...number, decision: given ? { reason: given.reason, by: personRef(given.author), at: given.at.toISOString() } : null }
  })
}

export function presentRemarks({ remarks, entries }: Standing, fileNames: Map<string, string>): RemarkView[] {
  return remarks.map(r => ({
    id: r.id, number: r.number, state: r.state, anchor: r.anchor, anchorState: r.anchorState, author: personRef(r.author), at: r.at.toISOString(), save: r.saveNumber,
    entries: entries.filter(e => e.remark.id === r.id).map(e => ({
      id: e.id, author: personRef(e.author), at: e.at.toISOString(), text: e.text, proposed: e.proposed ?? null,
      file: e.fileId ? { id: e.fileId, name: fileNames.get(e.fileId) ?? 'attachment' } : null,
    })),
    closed: r.closedBy && r.closedAt ? { by: personRef(r.closedBy), at: r.closedAt.toISOString() } : null,
  }))
}

export function presentTicks({ issue, ticks, answers }: Standing): TickView[] {
  const calculations = new Map(calculationsOf(documentOf(issue)).map(c => [c.id, c]))
  return ticks.map((t) => {
    const calculation = calculations.get(t.calcId)
    return { calcId: t.calcId, by: personRef(t.person), at: t.at.toISOString(), save: t.saveNumber, holds: calculation !== undefined && tickHashOf(issue, calculation, answers) === t.hash }
  })
}

export function presentCheckSheet({ issue, sheet, content }: Standing): CheckItemView[] {
  return sheetLines(sheetFactsOf(issue), sheet, content.hash).map((line) => {
    const entry = sheet.find(e => e.item === line.item)
    return { ...line, by: refOrNull(entry?.person), at: iso(entry?.at) }
  })
}

export const presentSignatures = ({ signatures }: Standing): SignatureView[] => signatures.map(s => ({
  meaning: s.meaning, by: personRef(s.person), at: s.at.toISOString(), save: s.saveNumber, contentHash: s.contentHash, void: s.voidReason ?? null,
}))
