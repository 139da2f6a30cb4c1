import { createHash } from 'node:crypto'
import { describe, expect, it } from 'vitest'
import { blankDocument } from '#shared/note/blank-note'
import { checkDocument } from '#shared/note/check-document'
import { applySteps } from '#shared/note/steps'
import { readDocument } from '#shared/note/schema'
import { buildDocument, p, section, stableId } from '#server/database/seeders/demo/build-document'
import { demoClock } from '#server/database/seeders/demo/demo-clock'
import { changeBetween } from '#server/database/seeders/demo/document-steps'
import { DEMO_NOTES } from '#server/database/seeders/demo/scenario'

const SAVES = DEMO_NOTES.flatMap(note => note.issues.flatMap(issue => issue.acts.flatMap(act =>
  act.act === 'save' ? [{ note: note.number, at: act.at, sections: act.sections }] : [])))

describe('documents of the demonstration', () => {
  it.each(SAVES)('$note, saved $at, is a note by the schema', ({ note, sections }) => {
    expect(checkDocument(buildDocument(note, sections))).toMatchObject({ ok: true })
  })

  it('are reached from each other by steps', () => {
    let made = 0
    const blank: unknown = blankDocument(() => stableId('any', String(made++)))
    for (const { number } of DEMO_NOTES) {
      let stored = blank
      for (const save of SAVES.filter(one => one.note === number)) {
        const after = buildDocument(number, save.sections)
        const { steps, docHash } = changeBetween(stored, after)
        const applied = applySteps(readDocument(stored), JSON.parse(JSON.stringify(steps)))
        if (!applied.ok) throw new Error(`${number} ${save.at}: ${applied.message}`)
        expect(createHash('sha256').update(applied.canonical).digest('hex')).toBe(docHash)
        stored = JSON.parse(applied.canonical)
      }
    }
  })

  it('touch only the section that changed', () => {
    const before = buildDocument('X', [section('scope', p('One.'), p('Two.')), section('loads', p('Three.'))])
    const after = buildDocument('X', [section('scope', p('One.'), p('Changed.')), section('loads', p('Three.'))])
    expect(changeBetween(before, after).steps).toHaveLength(1)
    expect(changeBetween(before, before).steps).toEqual([])
  })

  it('refuse a section that the template does not know', () => {
    expect(() => buildDocument('X', [section('appendix-z', p('x'))])).toThrow('appendix-z')
  })
})

describe('the scenario', () => {
  it('tells the acts of each note in the order of time, and the notes add up to one first to last', () => {
    for (const note of DEMO_NOTES) {
      const times = note.issues.flatMap(issue => [issue.openedAt, ...issue.acts.map(act => act.act === 'remark' ? act.remark.at : act.at)])
      expect([...times].sort(), note.number).toEqual(times)
    }
  })

  it('keeps analyst, checker and approver of each issue apart', () => {
    for (const note of DEMO_NOTES) {
      for (const issue of note.issues) {
        const writers = issue.acts.flatMap(act => act.act === 'save' ? [act.by] : [])
        for (const act of issue.acts) {
          if (act.act === 'submit') expect(new Set([...writers, act.checker, act.approver]).size, note.number).toBe(new Set(writers).size + 2)
        }
      }
    }
  })
})

describe('the clock of the demonstration', () => {
  it('is the scenario\'s own once that lies in the past', () => {
    expect(demoClock(new Date('2026-12-01T00:00:00Z')).at('2026-06-26 09:15').toISOString()).toBe('2026-06-26T09:15:00.000Z')
  })

  it('moves back by whole weeks before that, so that nothing lies in the future', () => {
    const now = new Date('2026-08-20T12:00:00Z')
    const shifted = demoClock(now).at('2026-10-12 09:00')
    expect(shifted.getTime()).toBeLessThanOrEqual(now.getTime())
    expect(shifted.getUTCDay()).toBe(1)
  })

  it('refuses a time it cannot read', () => {
    expect(() => demoClock(new Date(0)).at('2026-13-40 09:00')).toThrow('no moment')
  })
})
