/**
 * Writes a note's document from short source: sections of blocks, in which
 * `⟦hat J⟧` or `⟦carrier twist@L04|°⟧` stands for a tied value, `⟦#hat⟧` for the
 * label that the calculation has by its place (`C3`), `$…$` for an equation in
 * the line, `*…*` for italic and `**…**` for bold. Calculations have names of
 * their own here, because their labels move when one is put in front.
 * Ids are made from the note and the place, so that two issues of a note share
 * the ids of what they share.
 */
import { createHash } from 'node:crypto'
import { calcKind } from '#shared/calc/registry'
import { blankDocument } from '#shared/note/blank-note'
import { TEMPLATE } from '#shared/note/template'

export type DemoBlock
  = | { kind: 'paragraph', text: string }
    | { kind: 'heading', level: 1 | 2 | 3, text: string }
    | { kind: 'list', ordered: boolean, items: string[] }
    | { kind: 'table', head: string[], rows: string[][] }
    | { kind: 'equation', tex: string }
    | { kind: 'calculation', name: string, of: string, title: string, inputs: unknown }

export interface DemoSection { key: string, blocks: DemoBlock[], notApplicable?: string }

export const p = (text: string): DemoBlock => ({ kind: 'paragraph', text })
export const h = (text: string, level: 1 | 2 | 3 = 2): DemoBlock => ({ kind: 'heading', level, text })
export const ul = (...items: string[]): DemoBlock => ({ kind: 'list', ordered: false, items })
export const ol = (...items: string[]): DemoBlock => ({ kind: 'list', ordered: true, items })
export const table = (head: string[], ...rows: string[][]): DemoBlock => ({ kind: 'table', head, rows })
export const tex = (source: string): DemoBlock => ({ kind: 'equation', tex: source })
/** A calculation of the kind `of`, under a name by which texts and links of the note speak of it. */
export const calc = (name: string, of: string, title: string, inputs: unknown): DemoBlock => ({ kind: 'calculation', name, of, title, inputs })
export const section = (key: string, ...blocks: DemoBlock[]): DemoSection => ({ key, blocks })
export const notApplicable = (key: string, reason: string): DemoSection => ({ key, blocks: [], notApplicable: reason })

interface Json { type: string, attrs?: Record<string, unknown>, content?: Json[], text?: string, marks?: { type: string }[] }
export interface DemoDocument { type: 'doc', content: Json[] }

/** A UUID that depends on its words only. */
export function stableId(...words: string[]): string {
  const hex = createHash('sha256').update(words.join('\u0000')).digest('hex')
  return `${hex.slice(0, 8)}-${hex.slice(8, 12)}-4${hex.slice(13, 16)}-8${hex.slice(17, 20)}-${hex.slice(20, 32)}`
}

/** The id of the calculation called `name` in a note. */
export const calcId = (note: string, name: string): string => stableId(note, 'calculation', name)

/** Stands in the inputs of a calculation for another one of the note. */
export const named = (name: string): string => `@${name}`

/** Inputs with the ids of the calculations that they name. */
function withIds(note: string, value: unknown): unknown {
  if (Array.isArray(value)) return value.map(one => withIds(note, one))
  if (typeof value === 'object' && value !== null) return Object.fromEntries(Object.entries(value).map(([key, one]) => [key, withIds(note, one)]))
  return typeof value === 'string' && value.startsWith('@') ? calcId(note, value.slice(1)) : value
}

const INLINE = /⟦#([\w-]+)⟧|⟦([\w-]+) ([^⟧|]+)(?:\|([^⟧]+))?⟧|\$([^$]+)\$|\*\*([^*]+)\*\*|\*([^*]+)\*/g

/** The note that is written, with the labels of its calculations by name. */
interface Written { note: string, labels: ReadonlyMap<string, string> }

function labelOf({ labels }: Written, name: string): string {
  const label = labels.get(name)
  if (label === undefined) throw new Error(`The note has no calculation called ${name}`)
  return label
}

function inline(written: Written, source: string): Json[] {
  const nodes: Json[] = []
  const text = (words: string, mark?: string) => {
    if (words !== '') nodes.push({ type: 'text', text: words, ...(mark === undefined ? {} : { marks: [{ type: mark }] }) })
  }
  let done = 0
  for (const match of source.matchAll(INLINE)) {
    text(source.slice(done, match.index))
    const [whole, label, name, key, unit, equation, bold, italic] = match
    if (label !== undefined) text(labelOf(written, label))
    else if (name !== undefined) nodes.push({ type: 'tied', attrs: { calcId: calcId(written.note, name), key, unit: unit ?? null } })
    else if (equation !== undefined) nodes.push({ type: 'inlineEquation', attrs: { tex: equation } })
    else if (bold !== undefined) text(bold, 'bold')
    else text(italic ?? '', 'italic')
    done = match.index + whole.length
  }
  text(source.slice(done))
  return joined(nodes)
}

/** Runs of plain text are one node each, as the editor keeps them. */
function joined(nodes: Json[]): Json[] {
  return nodes.reduce<Json[]>((kept, node) => {
    const before = kept[kept.length - 1]
    if (before?.type === 'text' && node.type === 'text' && !before.marks && !node.marks) kept[kept.length - 1] = { type: 'text', text: `${before.text}${node.text}` }
    else kept.push(node)
    return kept
  }, [])
}

function paragraph(written: Written, id: string, source: string): Json {
  const content = inline(written, source)
  return { type: 'paragraph', attrs: { id }, ...(content.length === 0 ? {} : { content }) }
}

function tableNode(written: Written, place: string[], block: Extract<DemoBlock, { kind: 'table' }>): Json {
  const row = (type: 'tableHeader' | 'tableCell', cells: string[], line: string): Json => ({
    type: 'tableRow',
    content: cells.map((cell, column) => ({ type, content: [paragraph(written, stableId(...place, line, String(column)), cell)] })),
  })
  return { type: 'table', content: [row('tableHeader', block.head, 'head'), ...block.rows.map((cells, index) => row('tableCell', cells, String(index)))] }
}

function blockNode(written: Written, place: string[], block: DemoBlock): Json {
  const id = stableId(...place)
  switch (block.kind) {
    case 'paragraph': return paragraph(written, id, block.text)
    case 'heading': return { type: 'heading', attrs: { id, level: block.level }, content: inline(written, block.text) }
    case 'equation': return { type: 'equation', attrs: { id, tex: block.tex } }
    case 'table': return tableNode(written, place, block)
    case 'list': return {
      type: block.ordered ? 'orderedList' : 'bulletList',
      content: block.items.map((item, index) => ({ type: 'listItem', content: [paragraph(written, stableId(...place, String(index)), item)] })),
    }
    case 'calculation': return {
      type: 'calculation',
      attrs: { id: calcId(written.note, block.name), kind: block.of, kindVersion: calcKind(block.of).version, title: block.title, inputs: withIds(written.note, block.inputs) },
    }
  }
}

/** The names of the calculations in the order of the document, with the labels they have there. */
export function labelsOf(sections: DemoSection[]): Map<string, string> {
  const byKey = new Map(sections.map(one => [one.key, one]))
  const names = TEMPLATE.flatMap(({ key }) => (byKey.get(key)?.blocks ?? []).flatMap(block => block.kind === 'calculation' ? [block.name] : []))
  return new Map(names.map((name, index) => [name, `C${index + 1}`]))
}

/** The document of `note` with these sections written and every other as the template leaves it. */
export function buildDocument(note: string, sections: DemoSection[]): DemoDocument {
  let made = 0
  const blank = blankDocument(() => stableId(note, 'template', String(made++))) as unknown as DemoDocument
  const sources = new Map(sections.map(one => [one.key, one]))
  const written: Written = { note, labels: labelsOf(sections) }
  const content = blank.content.map((node): Json => {
    const source = sources.get(String(node.attrs?.key))
    if (source === undefined) return node
    sources.delete(source.key)
    if (source.notApplicable !== undefined) return { ...node, attrs: { ...node.attrs, notApplicable: source.notApplicable } }
    return { ...node, content: source.blocks.map((block, index) => blockNode(written, [note, source.key, String(index)], block)) }
  })
  if (sources.size > 0) throw new Error(`The template has no section ${[...sources.keys()].join(', ')}`)
  return { ...blank, content }
}
