import fc from 'fast-check'
import { Transform } from '@tiptap/pm/transform'
import { describe, expect, it } from 'vitest'
import { canonicalJson } from '#shared/note/canonical'
import { checkDocument } from '#shared/note/check-document'
import { noteSchema, readDocument } from '#shared/note/schema'
import { applySteps } from '#shared/note/steps'
import { blocksById } from '#shared/note/block-text'
import { bulletList, calculation, marked, noteDocument, paragraph, table, testId, withId } from '../../../factories/note-document'

const A = testId(1)
const CALC = testId(3)
const stored = noteDocument({
  loads: [withId(A, paragraph('The torque is 186 N·m', marked(' at limit', 'italic'), '.')), bulletList('one', 'two'), table(['a', 'b'], ['1', '2'])],
  geometry: [calculation('Hat', { id: CALC, inputs: { t: { text: '1.6', unit: 'mm' } } })],
})
const doc = readDocument(stored)
const at = (id: string) => blocksById(doc).get(id)?.pos ?? -1
const steps = (change: (tr: Transform) => void) => {
  const tr = new Transform(doc)
  change(tr)
  return { json: tr.steps.map(step => step.toJSON() as Record<string, unknown>), doc: tr.doc }
}

const text = (words: string) => noteSchema().text(words)

describe('the steps of a save', () => {
  it('lead to the document the editor has', () => {
    const edit = steps((tr) => {
      tr.insert(at(A) + 5, text('limit '))
      tr.addMark(at(A) + 1, at(A) + 4, noteSchema().mark('bold'))
      tr.setNodeAttribute(at(CALC) + 6, 'inputs', { t: { text: '1.8', unit: 'mm' } })
    })
    const applied = applySteps(readDocument(stored), edit.json)
    expect(applied).toMatchObject({ ok: true, canonical: canonicalJson(edit.doc.toJSON()) })
    expect(applied.ok && applied.steps).toHaveLength(3)
  })
  const replaceAll = (json: unknown) => [{ stepType: 'replace', from: at(A), to: at(A) + (doc.nodeAt(at(A))?.nodeSize ?? 0), slice: { content: [json] } }]
  it.each<[string, unknown, string]>([
    ['no list', {}, 'steps.malformed'],
    ['an unknown step', [{ stepType: 'script' }], 'steps.malformed'],
    ['a step on the document itself', [{ stepType: 'docAttr', attr: 'x', value: 1 }], 'steps.malformed'],
    ['too many', Array.from({ length: 5001 }, () => ({ stepType: 'replace', from: 0, to: 0 })), 'steps.too-many'],
    ['one outside the document', [{ stepType: 'replace', from: 0, to: 1e6 }], 'steps.do-not-apply'],
    ['one with a text for a place', [{ stepType: 'replace', from: '1', to: 2 }], 'steps.do-not-apply'],
    ['one that removes a section', [{ stepType: 'replace', from: 0, to: doc.child(0).nodeSize }], 'document.sections'],
    ['one that adds a script', replaceAll({ type: 'script' }), 'steps.do-not-apply'],
    ['one that adds a javascript link', replaceAll(paragraph(marked('x', 'link', { href: 'javascript:x' }))), 'steps.do-not-apply'],
    ['one that adds a block without an id', replaceAll({ type: 'paragraph' }), 'document.id'],
    ['one that gives an id twice', replaceAll(withId(CALC, paragraph('x'))), 'document.id'],
    ['one with a prototype key', JSON.parse(`[{"stepType":"attr","pos":${at(CALC)},"attr":"inputs","value":{"__proto__":{}}}]`), 'steps.malformed'],
    ['one with inputs that are no object', [{ stepType: 'attr', pos: at(CALC), attr: 'inputs', value: 7 }], 'steps.do-not-apply'],
    ['one nested 5,000 deep', JSON.parse(`[{"stepType":"replace","slice":${'{"content":['.repeat(5000)}${']}'.repeat(5000)}}]`), 'steps.malformed'],
  ])('are refused: %s', (_, json, code) => {
    const applied = applySteps(readDocument(stored), json)
    expect(applied.ok ? 'ok' : applied.code).toBe(code)
  })
})

describe('for any document and any steps', () => {
  const words = fc.stringMatching(/^[a-zA-Z0-9 ·τθ′²⁴]{1,12}$/)
  const block = fc.oneof(
    words.map(value => paragraph(value)),
    fc.array(words, { minLength: 1, maxLength: 3 }).map(items => bulletList(...items)),
    fc.tuple(words, fc.jsonValue({ maxDepth: 3 })).map(([title, value]) => calculation(title, { inputs: { value: JSON.parse(JSON.stringify(value).replaceAll('__proto__', 'p')) as unknown } })),
  )
  it('a sound document keeps its canonical text when it is stored and read again', () => {
    fc.assert(fc.property(fc.array(block, { minLength: 1, maxLength: 6 }), (blocks) => {
      const checked = checkDocument(noteDocument({ loads: blocks }))
      if (!checked.ok) return expect(checked.code).toBe('document.attribute')
      const again = checkDocument(JSON.parse(checked.canonical))
      expect(again.ok && again.canonical).toBe(checked.canonical)
      expect(again.ok && again.doc.eq(checked.doc)).toBe(true)
    }), { numRuns: 60 })
  })
  it('the canonical text does not depend on the order of keys', () => {
    fc.assert(fc.property(fc.dictionary(words, fc.jsonValue()), (value) => {
      const reversed = Object.fromEntries(Object.entries(value).reverse())
      expect(canonicalJson(reversed)).toBe(canonicalJson(value))
      expect(canonicalJson(JSON.parse(canonicalJson(value)))).toBe(canonicalJson(value))
    }))
  })
  const step = fc.tuple(fc.nat(), fc.nat(60), fc.oneof(fc.constant(null), words))
  it('what comes out is a sound document or a refusal, never an exception', () => {
    let sound = 0
    fc.assert(fc.property(fc.array(step, { minLength: 1, maxLength: 6 }), (edits) => {
      const json = edits.map(([a, b, value]) => {
        const from = a % doc.content.size
        return { stepType: 'replace', from, to: Math.min(doc.content.size, from + b), ...(value ? { slice: { content: [{ type: 'text', text: value }] } } : {}) }
      })
      const applied = applySteps(readDocument(stored), json)
      if (!applied.ok) return
      sound += 1
      expect(checkDocument(applied.doc.toJSON())).toMatchObject({ ok: true, canonical: applied.canonical })
    }), { numRuns: 300 })
    expect(sound).toBeGreaterThan(0)
  })
})
