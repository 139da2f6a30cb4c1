import { describe, expect, it } from 'vitest'
import { blankDocument } from '#shared/note/blank-note'
import { checkDocument } from '#shared/note/check-document'
import type { Inline, Json } from '../../../factories/note-document'
import { bulletList, calculation, equation, figure, heading, inlineEquation, marked, noteDocument, paragraph, table, testId, tied, withId } from '../../../factories/note-document'

const inLoads = (...blocks: Json[]) => noteDocument({ loads: blocks })
const text = (...parts: Inline[]) => inLoads(paragraph(...parts))
const codeOf = (json: unknown) => {
  const checked = checkDocument(json)
  return checked.ok ? 'ok' : checked.code
}

const full = noteDocument({
  'loads': [heading(1, 'Torques'), paragraph('The torque is ', tied(testId(1), 'J', 'mm⁴'), ' and ', inlineEquation('\\theta\''), marked(' bold', 'bold')), bulletList('one', 'two')],
  'section-analysis': [calculation('Hat', { id: testId(1), inputs: { units: 'SI', walls: [{ id: 'a', t: { text: '1.6', unit: 'mm' } }] } }), equation('\\tau = G t \\theta\''), figure('Section'), table(['wall', 't'], ['a', '1.6 mm'])],
}, { stability: 'the walls are too stocky to buckle' })

describe('a document that may be stored', () => {
  it('takes a blank note and a full one', () => {
    let id = 0
    expect(codeOf(blankDocument(() => testId(id += 1)))).toBe('ok')
    expect(codeOf(full)).toBe('ok')
  })
  it.each(['https://example.org/a?b=c', 'http://example.org', 'mailto:loads@example.org', '#part-2'])('takes a link to %s', href =>
    expect(codeOf(text(marked('here', 'link', { href })))).toBe('ok'))
})

const nested = (depth: number): Json => {
  let list = bulletList('end')
  for (let level = 0; level < depth; level += 1) {
    list = { type: 'bulletList', content: [{ type: 'listItem', content: [paragraph('x'), list] }] }
  }
  return list
}
const withInputs = (inputs: unknown) => inLoads(calculation('x', { inputs: inputs as Record<string, unknown> }))
const sections = full.content ?? []

describe('a document that is refused', () => {
  it.each<[string, unknown, string]>([
    ['a script node', inLoads({ type: 'script', content: [] }), 'document.schema'],
    ['an iframe node', inLoads({ type: 'iframe', attrs: { src: 'x' } }), 'document.schema'],
    ['a node named like a property of objects', inLoads({ type: 'constructor' }), 'document.schema'],
    ['an unknown mark', text(marked('x', 'script')), 'document.schema'],
    ['a javascript link', text(marked('x', 'link', { href: 'javascript:alert(1)' })), 'document.attribute'],
    ['a disguised javascript link', text(marked('x', 'link', { href: ' java\tscript:alert(1)' })), 'document.attribute'],
    ['a data link', text(marked('x', 'link', { href: 'data:text/html,x' })), 'document.attribute'],
    ['a vbscript link', text(marked('x', 'link', { href: 'vbscript:x' })), 'document.attribute'],
    ['a link without a scheme', text(marked('x', 'link', { href: '//evil.example' })), 'document.attribute'],
    ['a heading of level 9', inLoads(heading(9, 'x')), 'document.attribute'],
    ['an attribute injected into an id', inLoads(withId('x" onload=', paragraph('x'))), 'document.id'],
    ['an attribute nobody knows', inLoads({ ...paragraph('x'), attrs: { id: testId(5), style: 'color:red' } }), 'document.attribute'],
    ['a missing id', inLoads({ type: 'paragraph', content: [{ type: 'text', text: 'x' }] }), 'document.id'],
    ['an id used twice', inLoads(withId(testId(5), paragraph('a')), withId(testId(5), paragraph('b'))), 'document.id'],
    ['an empty text', inLoads({ ...paragraph(), content: [{ type: 'text', text: '' }] }), 'document.malformed'],
    ['a NUL in the text', text('a\u0000b'), 'document.malformed'],
    ['half a surrogate pair', text('a\ud800b'), 'document.malformed'],
    ['lists 2,000 deep', inLoads(nested(2000)), 'document.too-deep'],
    ['a calculation inside a list', inLoads({ type: 'bulletList', content: [{ type: 'listItem', content: [calculation('x')] }] }), 'document.schema'],
    ['text straight in a section', inLoads({ type: 'text', text: 'x' }), 'document.schema'],
    ['a document inside a section', inLoads({ type: 'doc', content: [] }), 'document.schema'],
    ['a prototype key in inputs', withInputs(JSON.parse('{"__proto__":{"x":1}}')), 'document.attribute'],
    ['a constructor key in inputs', withInputs({ a: [{ constructor: 1 }] }), 'document.attribute'],
    ['inputs that are a list', withInputs([1]), 'document.attribute'],
    ['inputs over 64 kB', withInputs({ a: 'x'.repeat(65 * 1024) }), 'document.attribute'],
    ['an infinite number in inputs', withInputs({ a: JSON.parse('1e999') }), 'document.attribute'],
    ['inputs 500 deep', withInputs(JSON.parse(`${'{"a":'.repeat(500)}1${'}'.repeat(500)}`)), 'document.attribute'],
    ['a picture by address', inLoads({ ...figure('x'), attrs: { ...figure('x').attrs, fileId: 'data:image/png;base64,AA' } }), 'document.attribute'],
    ['a macro in TeX', inLoads(equation('\\def\\x{1}')), 'document.attribute'],
    ['201 calculations', inLoads(...Array.from({ length: 201 }, (_, n) => calculation(`c${n}`))), 'document.too-many-calculations'],
    ['60,001 nodes', inLoads(...Array.from({ length: 60_001 }, () => paragraph())), 'document.too-many-nodes'],
    ['more than 5 million characters', text('x'.repeat(5_000_001)), 'document.too-much-text'],
    ['a missing section', { ...full, content: sections.slice(1) }, 'document.sections'],
    ['sections out of order', { ...full, content: [sections[3], ...sections.slice(0, 3), ...sections.slice(4)] }, 'document.sections'],
    ['a section nobody knows', { ...full, content: [...sections.slice(0, 3), { ...sections[3], attrs: { id: testId(6), key: 'preface' } }, ...sections.slice(4)] }, 'document.attribute'],
    ['text in a generated section', noteDocument({ summary: [paragraph('MS = 0.2')] }), 'document.sections'],
    ['a generated section that is not applicable', noteDocument({}, { margins: 'none' }), 'document.sections'],
    ['null', null, 'document.malformed'],
    ['a list', [], 'document.malformed'],
    ['a field beside those of a node', inLoads({ ...paragraph('x'), storedMarks: [] } as Json), 'document.malformed'],
  ])('%s', (_, json, code) => expect(codeOf(json)).toBe(code))

  it('says where the fault is', () => {
    expect(checkDocument(inLoads(paragraph('a'), heading(9, 'x')))).toMatchObject({ ok: false, path: 'content.9.content.1.attrs.level' })
  })
  it('leaves the prototype of objects alone', () => {
    codeOf(withInputs(JSON.parse('{"__proto__":{"polluted":1}}')))
    expect(({} as Record<string, unknown>).polluted).toBeUndefined()
  })
  it('answers a document 20,000 deep without running out of stack', () => {
    expect(codeOf(JSON.parse(`${'{"type":"doc","content":['.repeat(20_000)}${']}'.repeat(20_000)}`))).toBe('document.schema')
  })
})
