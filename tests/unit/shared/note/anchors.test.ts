import fc from 'fast-check'
import { Transform } from '@tiptap/pm/transform'
import { describe, expect, it } from 'vitest'
import type { Anchored, TextAnchor } from '#shared/note/anchors'
import { anchorHolds, anchorRange, mapAnchors, relocateAnchors, textAnchor } from '#shared/note/anchors'
import { blocksById } from '#shared/note/block-text'
import { noteSchema, readDocument } from '#shared/note/schema'
import { calculation, noteDocument, paragraph, testId, tied, withId } from '../../../factories/note-document'

const A = testId(1)
const B = testId(2)
const CALC = testId(3)
const TEXT = 'The torque enters at the hinge fitting and leaves through the rib.'
const doc = readDocument(noteDocument({
  description: [withId(A, paragraph(TEXT)), withId(B, paragraph('A second paragraph that says other things.'))],
  loads: [calculation('Hat', { id: CALC, inputs: { walls: [{ t: { text: '1.6', unit: 'mm' } }, { t: { text: '2', unit: 'mm' } }] } })],
}))

function remark(quote: string): Anchored & { anchor: TextAnchor } {
  const from = TEXT.indexOf(quote)
  const anchor = textAnchor(doc, A, from, from + quote.length)
  if (!anchor) throw new Error(`"${quote}" is not in the text`)
  return { anchor, state: 'ok' }
}
const at = (id: string) => blocksById(doc).get(id)?.pos ?? -1
const offset = (quote: string) => at(A) + 1 + TEXT.indexOf(quote)
const edit = (change: (tr: Transform) => void) => {
  const tr = new Transform(doc)
  change(tr)
  return tr
}
const carried = (item: Anchored, tr: Transform) => mapAnchors([item], tr.before, tr.steps, tr.doc)[0]
const quoted = (tr: Transform, item: Anchored | undefined) => {
  const range = item && anchorRange(tr.doc, item.anchor)
  return range ? tr.doc.textBetween(range.from, range.to) : null
}
const text = (words: string) => noteSchema().text(words)

describe('an anchor of text', () => {
  const item = remark('hinge fitting')
  it('remembers its surroundings', () => {
    expect(item.anchor).toMatchObject({ quote: 'hinge fitting', prefix: 'The torque enters at the ', suffix: ' and leaves through the rib.' })
    expect(anchorHolds(doc, item.anchor)).toBe(true)
    expect(anchorHolds(doc, { ...item.anchor, from: 3, to: 16 })).toBe(false)
  })
  it('cannot be empty or outside', () => {
    expect(textAnchor(doc, A, 4, 4)).toBeNull()
    expect(textAnchor(doc, A, 0, 1000)).toBeNull()
    expect(textAnchor(doc, testId(99), 0, 1)).toBeNull()
    expect(textAnchor(doc, CALC, 0, 1)).toBeNull()
  })
  it('moves with what is typed before it', () => {
    const tr = edit(tr => tr.insert(offset('torque'), text('limit ')))
    expect(carried(item, tr)).toMatchObject({ state: 'ok', anchor: { from: item.anchor.from + 6, prefix: 'The limit torque enters at the ' } })
    expect(quoted(tr, carried(item, tr))).toBe('hinge fitting')
  })
  it('is edited when its words change, and sound again when they return', () => {
    const tr = edit(tr => tr.replaceWith(offset('hinge'), offset('hinge') + 5, text('front')))
    const edited = carried(item, tr)
    expect(edited).toMatchObject({ state: 'edited', anchor: { quote: 'hinge fitting' } })
    const back = new Transform(tr.doc).replaceWith(offset('hinge'), offset('hinge') + 5, text('hinge'))
    expect(edited && mapAnchors([edited], back.before, back.steps, back.doc)[0]).toMatchObject({ state: 'ok' })
  })
  it('is orphaned by a deletion, and comes back when that is undone', () => {
    const tr = edit(tr => tr.delete(at(A), at(A) + (doc.nodeAt(at(A))?.nodeSize ?? 0)))
    const lost = carried(item, tr)
    expect(lost).toMatchObject({ state: 'orphaned', anchor: { quote: 'hinge fitting' } })
    const undo = new Transform(tr.doc)
    for (const [index, step] of tr.steps.map((step, i) => [i, step] as const).reverse()) undo.step(step.invert(tr.docs[index] ?? doc))
    expect(lost && mapAnchors([lost], undo.before, undo.steps, undo.doc)[0]).toMatchObject({ state: 'ok', anchor: { blockId: A, from: item.anchor.from } })
  })
  it('follows a paragraph that was moved under a new id', () => {
    const tr = edit((tr) => {
      tr.delete(at(A), at(A) + (doc.nodeAt(at(A))?.nodeSize ?? 0))
      tr.insert(tr.doc.content.size - 1, readDocument(withId(testId(50), paragraph(TEXT))))
    })
    expect(carried(item, tr)).toMatchObject({ state: 'ok', anchor: { blockId: testId(50) } })
  })
  it('survives a change of type, a split before it and a tied value before it', () => {
    const toHeading = edit(tr => tr.setNodeMarkup(at(A), noteSchema().nodes.heading, { id: A, level: 2 }))
    expect(carried(item, toHeading)).toMatchObject({ state: 'ok', anchor: { blockId: A } })
    const split = edit(tr => tr.split(offset('enters'), 1, [{ type: noteSchema().nodes.paragraph!, attrs: { id: testId(60) } }]))
    expect(carried(item, split)).toMatchObject({ state: 'ok', anchor: { blockId: testId(60) } })
    const atom = edit(tr => tr.insert(offset('enters'), readDocument(tied(CALC, 'J'))))
    expect(carried(item, atom)).toMatchObject({ state: 'ok', anchor: { from: item.anchor.from + 1 } })
  })
  it('keeps the part in which it begins when it is split', () => {
    const split = edit(tr => tr.split(offset('fitting'), 1, [{ type: noteSchema().nodes.paragraph!, attrs: { id: testId(61) } }]))
    expect(carried(item, split)).toMatchObject({ state: 'edited', anchor: { blockId: A } })
    expect(quoted(split, carried(item, split))).toBe('hinge ')
  })
  it('takes the nearest of several equal quotes by its surroundings', () => {
    const twice = readDocument(noteDocument({ description: [withId(A, paragraph(`A hinge fitting is new. ${TEXT}`))] }))
    expect(relocateAnchors([item], twice)[0]).toMatchObject({ state: 'ok', anchor: { from: item.anchor.from + 24 } })
  })
  it('does not guess between equal places elsewhere', () => {
    const twice = readDocument(noteDocument({ description: [paragraph('One hinge fitting.'), paragraph('Two hinge fitting.')] }))
    expect(relocateAnchors([item], twice)[0]).toMatchObject({ state: 'orphaned' })
  })
})

describe('an anchor of a calculation', () => {
  const whole: Anchored = { anchor: { kind: 'calculation', calcId: CALC }, state: 'ok' }
  const field: Anchored = { anchor: { kind: 'calculation', calcId: CALC, field: 'walls.0.t' }, state: 'ok' }
  const other: Anchored = { anchor: { kind: 'calculation', calcId: CALC, field: 'walls.1.t' }, state: 'ok' }
  it('sees a change of its field only', () => {
    const tr = edit(tr => tr.setNodeAttribute(at(CALC), 'inputs', { walls: [{ t: { text: '1.8', unit: 'mm' } }, { t: { text: '2', unit: 'mm' } }] }))
    expect(mapAnchors([whole, field, other], tr.before, tr.steps, tr.doc).map(item => item.state)).toEqual(['edited', 'edited', 'ok'])
  })
  it('is orphaned with its calculation and comes back with it', () => {
    const tr = edit(tr => tr.delete(at(CALC), at(CALC) + 1))
    const lost = mapAnchors([whole], tr.before, tr.steps, tr.doc)
    expect(lost[0]?.state).toBe('orphaned')
    expect(relocateAnchors(lost, doc)[0]?.state).toBe('ok')
  })
})

describe('over any edits', () => {
  const item = remark('leaves through the rib')
  const range = fc.tuple(fc.nat(), fc.nat(), fc.string({ maxLength: 6 }))
  it('points at its quote when it says so, and never outside the document', () => {
    fc.assert(fc.property(fc.array(range, { maxLength: 8 }), (edits) => {
      const tr = new Transform(doc)
      for (const [a, b, words] of edits) {
        const block = blocksById(tr.doc).get(a % 3 === 0 ? B : A)
        if (!block) continue
        const size = block.node.content.size
        const from = block.pos + 1 + (a % (size + 1))
        const to = Math.min(block.pos + 1 + size, from + (b % 9))
        if (words === '') tr.delete(from, to)
        else tr.replaceWith(from, to, text(words))
      }
      const now = carried(item, tr)
      if (now?.state === 'ok') expect(quoted(tr, now)).toBe('leaves through the rib')
      if (now?.state === 'edited') expect(quoted(tr, now)).toBeTruthy()
      if (now?.state === 'orphaned') expect(blocksById(tr.doc).get(A)?.node.textContent ?? '').not.toContain('leaves through the rib')
    }))
  })
})
