/**
 * Writes a note's document from short source: sections of blocks, in which
 * `⟦C1 J⟧` or `⟦C1 twist@L04|°⟧` stands for a tied value, `$…$` for an equation
 * in the line, `*…*` for italic and `**…**` for bold.
 * Ids are made from the note and the place, so that two issues of a note share
 * the ids of what they share.
 */
import { createHash } from 'node:crypto'
import { blankDocument } from '#shared/note/blank-note'

export type DemoBlock
  = | { kind: 'paragraph', text: string }
    | { kind: 'heading', level: 1 | 2 | 3, text: string }
    | { kind: 'list', ordered: boolean, items: string[] }
    | { kind: 'table', head: string[], rows: string[][] }
    | { kind: 'equation', tex: string }
    | { kind: 'calculation', name: string, title: string, inputs: unknown }

export interface DemoSection { key: string, blocks: DemoBlock[], notApplicable?: string }

export const p = (text: string): DemoBlock => ({ kind: 'paragraph', text })
export const h = (text: string, level: 1 | 2 | 3 = 2): DemoBlock => ({ kind: 'heading', level, text })
export const ul = (...items: string[]): DemoBlock => ({ kind: 'list', ordered: false, items })
export const ol = (...items: string[]): DemoBlock => ({ kind: 'list', ordered: true, items })
export const table = (head: string[], ...rows: string[][]): DemoBlock => ({ kind: 'table', head, rows })
export const tex = (source: string): DemoBlock => ({ kind: 'equation', tex: source })
export const calc = (name: string, title: string, inputs: unknown): DemoBlock => ({ kind: 'calculation', name, title, inputs })
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

const INLINE = /⟦([A-Z]\d+) ([^⟧|]+)(?:\|([^⟧]+))?⟧|\$([^$]+)\$|\*\*([^*]+)\*\*|\*([^*]+)\*/g

function inline(note: string, source: string): Json[] {
  const nodes: Json[] = []
  const text = (words: string, mark?: string) => {
    if (words !== '') nodes.push({ type: 'text', text: words, ...(mark === undefined ? {} : { marks: [{ type: mark }] }) })
  }
  let done = 0
  for (const match of source.matchAll(INLINE)) {
    text(source.slice(done, match.index))
    const [whole, name, key, unit, equation, bold, italic] = match
    if (name !== undefined) nodes.push({ type: 'tied', attrs: { calcId: calcId(note, name), key, unit: unit ?? null } })
    else if (equation !== undefined) nodes.push({ type: 'inlineEquation', attrs: { tex: equation } })
    else if (bold !== undefined) text(bold, 'bold')
    else text(italic ?? '', 'italic')
    done = match.index + whole.length
  }
  text(source.slice(done))
  return nodes
}

function paragraph(note: string, id: string, source: string): Json {
  const content = inline(note, source)
  return { type: 'paragraph', attrs: { id }, ...(content.length === 0 ? {} : { content }) }
}

function tableNode(note: string, place: string[], block: Extract<DemoBlock, { kind: 'table' }>): Json {
  const row = (type: 'tableHeader' | 'tableCell', cells: string[], line: string): Json => ({
    type: 'tableRow',
    content: cells.map((cell, column) => ({ type, content: [paragraph(note, stableId(...place, line, String(column)), cell)] })),
  })
  return { type: 'table', content: [row('tableHeader', block.head, 'head'), ...block.rows.map((cells, index) => row('tableCell', cells, String(index)))] }
}

function blockNode(note: string, place: string[], block: DemoBlock, kindVersion: number): Json {
  const id = stableId(...place)
  switch (block.kind) {
    case 'paragraph': return paragraph(note, id, block.text)
    case 'heading': return { type: 'heading', attrs: { id, level: block.level }, content: inline(note, block.text) }
    case 'equation': return { type: 'equation', attrs: { id, tex: block.tex } }
    case 'table': return tableNode(note, place, block)
    case 'list': return {
      type: block.ordered ? 'orderedList' : 'bulletList',
      content: block.items.map((item, index) => ({ type: 'listItem', content: [paragraph(note, stableId(...place, String(index)), item)] })),
    }
    case 'calculation': return {
      type: 'calculation',
      attrs: { id: calcId(note, block.name), kind: 'open-section', kindVersion, title: block.title, inputs: block.inputs },
    }
  }
}

/** The document of `note` with these sections written and every other as the template leaves it. */
export function buildDocument(note: string, sections: DemoSection[], kindVersion: number): DemoDocument {
  let made = 0
  const blank = blankDocument(() => stableId(note, 'template', String(made++))) as unknown as DemoDocument
  const written = new Map(sections.map(one => [one.key, one]))
  const content = blank.content.map((node): Json => {
    const source = written.get(String(node.attrs?.key))
    if (source === undefined) return node
    written.delete(source.key)
    if (source.notApplicable !== undefined) return { ...node, attrs: { ...node.attrs, notApplicable: source.notApplicable } }
    return { ...node, content: source.blocks.map((block, index) => blockNode(note, [note, source.key, String(index)], block, kindVersion)) }
  })
  if (written.size > 0) throw new Error(`The template has no section ${[...written.keys()].join(', ')}`)
  return { ...blank, content }
}
