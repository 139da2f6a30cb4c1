import { describe, expect, it } from 'vitest'
import { calculationsOf, filesOf, tiedValuesOf } from '#shared/note/calculations'
import { numberingOf, tableKey } from '#shared/note/numbering'
import { readDocument } from '#shared/note/schema'
import { outlineOf, sectionsOf, unfinishedSections } from '#shared/note/sections'
import { TEMPLATE } from '#shared/note/template'
import type { Json } from '../../../factories/note-document'
import { calculation, equation, figure, heading, noteDocument, paragraph, table, testId, tied, withId } from '../../../factories/note-document'

describe('the template', () => {
  it('has the sections of a substantiation note in order', () => {
    // Methods reference §12; generated ones as the note is laid out.
    expect(TEMPLATE.map(section => section.number)).toEqual([...Array.from({ length: 21 }, (_, n) => String(n)), 'A'])
    expect(TEMPLATE.filter(section => section.generated).map(section => section.number)).toEqual(['0', '1', '2', '10', '15', '17', 'A'])
    expect(new Set(TEMPLATE.map(section => section.key)).size).toBe(TEMPLATE.length)
  })
})

describe('numbers', () => {
  const first = heading(1, 'Section')
  const deep = heading(3, 'Corner')
  const second = heading(2, 'Wall')
  const third = heading(1, 'Stations')
  const grid = table(['a'], ['b'])
  const blocks = [first, deep, second, third, grid, figure('x'), equation('a'), calculation('Hat')]
  const later = calculation('Clip')
  const doc = readDocument(noteDocument({ geometry: blocks, materials: [heading(2, 'Sheet'), later, figure('y')] }))
  const numbers = numberingOf(doc)
  it('counts headings below their section and skips no number', () => {
    expect([...numbers.headings.values()]).toEqual(['7.1', '7.1.1', '7.1.2', '7.2', '8.1'])
  })
  it('counts the rest through the note', () => {
    expect([...numbers.figures.values()]).toEqual(['Figure 1', 'Figure 2'])
    expect([...numbers.equations.values()]).toEqual(['(1)'])
    expect(numbers.calculations.get(String(later.attrs?.id))).toBe('C2')
    const key = grid.content?.[0]?.content?.[0]?.content?.[0]?.attrs?.id
    expect(numbers.tables.get(String(key))).toBe('Table 1')
    expect(tableKey(readDocument(grid))).toBe(key)
  })
  it('gives the outline', () => {
    const entries = outlineOf(doc).filter(entry => entry.sectionKey === 'geometry')
    expect(entries.map(entry => `${entry.number} ${entry.title}`)).toEqual(['7 Geometry', '7.1 Section', '7.1.1 Corner', '7.1.2 Wall', '7.2 Stations'])
    expect(entries.map(entry => doc.nodeAt(entry.pos)?.attrs.id)).toEqual(entries.map(entry => entry.id))
  })
})

describe('what a note holds', () => {
  const doc = readDocument(noteDocument({
    loads: [paragraph('T ', tied(testId(1), 'T@L04', 'N·m')), figure('x')],
    geometry: [calculation('Clip', { id: testId(2) })],
    conclusion: [calculation('Hat', { id: testId(1) }), paragraph(tied(testId(9), 'J'))],
  }))
  it('lists calculations with labels and places', () => {
    const found = calculationsOf(doc)
    expect(found.map(({ id, label, title, sectionKey }) => [id, label, title, sectionKey])).toEqual([[testId(2), 'C1', 'Clip', 'geometry'], [testId(1), 'C2', 'Hat', 'conclusion']])
    expect(found.every(({ pos, id }) => doc.nodeAt(pos)?.attrs.id === id)).toBe(true)
  })
  it('lists tied values with their block', () => {
    const found = tiedValuesOf(doc)
    expect(found.map(({ calcId, key, unit, sectionKey }) => [calcId, key, unit, sectionKey])).toEqual([[testId(1), 'T@L04', 'N·m', 'loads'], [testId(9), 'J', null, 'conclusion']])
    expect(found.every(({ pos }) => doc.nodeAt(pos)?.type.name === 'tied')).toBe(true)
  })
  it('lists the files of figures', () => expect(filesOf(doc)).toHaveLength(1))
})

describe('sections that stand in the way', () => {
  const filled = Object.fromEntries(TEMPLATE.filter(section => !section.generated).map(section => [section.key, [paragraph('Text.')]]))
  const faults = (sections: Partial<Record<string, Json[]>>, reasons: Partial<Record<string, string>> = {}) =>
    unfinishedSections(readDocument(noteDocument({ ...filled, ...sections }, reasons))).map(({ sectionKey, problem }) => `${sectionKey} ${problem}`)
  it('lets a note through in which each is written', () => expect(faults({})).toEqual([]))
  it('lets a section through that is not applicable with a reason', () => expect(faults({ stability: [paragraph()] }, { stability: 'No slender wall.' })).toEqual([]))
  it('finds the empty one, also under a heading or white space', () => {
    expect(faults({ scope: [paragraph()], loads: [heading(1, 'Torques'), paragraph('  ')] })).toEqual(['scope empty', 'loads empty'])
  })
  it('counts a calculation or a tied value as content', () => expect(faults({ scope: [calculation('x')], loads: [paragraph(tied(testId(1), 'J'))] })).toEqual([]))
  it('wants a reason', () => expect(faults({ stability: [paragraph()] }, { stability: ' ' })).toEqual(['stability no-reason']))
  it('refuses text under not applicable', () => expect(faults({}, { stability: 'None.' })).toEqual(['stability both']))
  it('finds guidance that was left', () => {
    const guidance = TEMPLATE.find(section => section.key === 'scope')?.guidance ?? ''
    expect(faults({ scope: [paragraph(guidance), withId(testId(77), paragraph('More.'))] })).toEqual(['scope guidance'])
  })
  it('leaves generated sections out', () => expect(sectionsOf(readDocument(noteDocument(filled))).filter(section => section.empty).every(section => section.generated)).toBe(true))
})
