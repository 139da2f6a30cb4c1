/**
 * Documents for tests, written as one would speak them:
 * `noteDocument({ loads: [paragraph('The torque is ', tied(calc, 'J'))] })`.
 * Ids are made from a counter, so that a test can name them and a failure repeats.
 */
import { TEMPLATE } from '#shared/note/template'

export interface Json { type: string, attrs?: Record<string, unknown>, content?: Json[], text?: string, marks?: { type: string, attrs?: Record<string, unknown> }[] }
export type Inline = string | Json

/** A UUID that shows its number: `testId(7)` ends in `000000000007`. */
export const testId = (number: number): string => `00000000-0000-4000-8000-${String(number).padStart(12, '0')}`

let counter = 1000
const nextId = () => testId(counter += 1)

const inline = (parts: Inline[]): Json[] => parts.filter(part => part !== '').map(part => typeof part === 'string' ? { type: 'text', text: part } : part)
const withContent = (node: Json, content: Json[]): Json => content.length > 0 ? { ...node, content } : node

export const paragraph = (...parts: Inline[]): Json => withContent({ type: 'paragraph', attrs: { id: nextId() } }, inline(parts))
export const heading = (level: number, ...parts: Inline[]): Json => withContent({ type: 'heading', attrs: { id: nextId(), level } }, inline(parts))
export const marked = (text: string, type: string, attrs?: Record<string, unknown>): Json => ({ type: 'text', text, marks: [attrs ? { type, attrs } : { type }] })
export const bulletList = (...items: Inline[]): Json => ({ type: 'bulletList', content: items.map(item => ({ type: 'listItem', content: [paragraph(item)] })) })
export const table = (...rows: string[][]): Json => ({
  type: 'table',
  content: rows.map((row, index) => ({
    type: 'tableRow',
    content: row.map(text => ({
      type: index === 0 ? 'tableHeader' : 'tableCell',
      attrs: { colspan: 1, rowspan: 1, colwidth: null, align: null },
      content: [paragraph(text)],
    })),
  })),
})
export const equation = (tex: string): Json => ({ type: 'equation', attrs: { id: nextId(), tex } })
export const inlineEquation = (tex: string): Json => ({ type: 'inlineEquation', attrs: { tex } })
export const figure = (caption: string, alt = 'A drawing'): Json => ({ type: 'figure', attrs: { id: nextId(), fileId: nextId(), alt, caption } })
export const tied = (calcId: string, key: string, unit: string | null = null): Json => ({ type: 'tied', attrs: { calcId, key, unit } })
export const calculation = (title: string, options: { id?: string, kind?: string, kindVersion?: number, inputs?: Record<string, unknown> } = {}): Json => ({
  type: 'calculation',
  attrs: { id: options.id ?? nextId(), kind: options.kind ?? 'open-section', kindVersion: options.kindVersion ?? 1, title, inputs: options.inputs ?? {} },
})

/** The same block under an id of one's choice. */
export const withId = (id: string, node: Json): Json => ({ ...node, attrs: { ...node.attrs, id } })

/** A whole note: the blocks of the sections named by key, an empty paragraph in every other. */
export function noteDocument(sections: Partial<Record<string, Json[]>> = {}, notApplicable: Partial<Record<string, string>> = {}): Json {
  const unknown = Object.keys({ ...sections, ...notApplicable }).find(key => !TEMPLATE.some(section => section.key === key))
  if (unknown) throw new Error(`The template has no section "${unknown}".`)
  return {
    type: 'doc',
    content: TEMPLATE.map(section => ({
      type: 'section',
      attrs: { id: nextId(), key: section.key, notApplicable: notApplicable[section.key] ?? null },
      content: sections[section.key] ?? [paragraph()],
    })),
  }
}
