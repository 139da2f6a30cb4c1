import { defineEntity, type InferEntity } from '@mikro-orm/core'
import type { IssueState } from '#shared/review/states'
import { NoteSchema } from './note'
import { PersonSchema } from './person'

/** A formal issue of a note, and its current working save. A partial unique index allows one on its way per note. */
export const IssueSchema = defineEntity({
  name: 'Issue',
  properties: p => ({
    id: p.uuid().primary(),
    note: () => p.manyToOne(NoteSchema),
    letter: p.text(),
    state: p.text().$type<IssueState>(),
    /** Set from the approver's signature until the worker has stored the PDF: the issue is locked. */
    releaseRequestedAt: p.datetime().nullable(),
    releaseFailure: p.text().nullable(),
    title: p.text(),
    part: p.text(),
    drawingIssue: p.text(),
    changeNote: p.text(),
    /** Who submitted it; while in draft, who opened it. */
    analyst: () => p.manyToOne(PersonSchema).nullable(),
    checker: () => p.manyToOne(PersonSchema).nullable(),
    approver: () => p.manyToOne(PersonSchema).nullable(),
    saveNumber: p.integer(),
    savedAt: p.datetime(),
    savedBy: () => p.manyToOne(PersonSchema),
    /** Canonical JSON text of the document, never jsonb: what is hashed is what is stored. */
    document: p.text(),
    documentHash: p.text(),
    /** Canonical JSON text of the evaluations by calculation id. */
    results: p.text(),
    engineVersion: p.text(),
    /** SHA-256 over all frozen parts, made when the check passes. */
    contentHash: p.text().nullable(),
    /** For the register: least margin over all calculations, and its mode. */
    leastMargin: p.double().$type<number>().nullable(),
    leastMarginMode: p.text().nullable(),
    leastMarginCase: p.text().nullable(),
    leastMarginCalc: p.uuid().nullable(),
    cautions: p.integer().default(0),
    stops: p.integer().default(0),
    lastChangeAt: p.datetime(),
    createdAt: p.datetime(),
    releasedAt: p.datetime().nullable(),
    pdfFileId: p.uuid().nullable(),
    version: p.integer().version(),
  }),
  uniques: [{ properties: ['note', 'letter'] }],
})
export type Issue = InferEntity<typeof IssueSchema>
