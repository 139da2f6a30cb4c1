/** Every text of a note in which a number can stand. */
import type { Node } from '@tiptap/pm/model'
import { ATOM, blockText } from '#shared/note/block-text'
import { plainTex } from '#shared/note/loose/tex-text'
import type { LooseField } from '#shared/note/loose-numbers'

export interface ScannedText {
  blockId: string
  field: LooseField
  text: string
  /** Offset in the block for an offset in `text`. */
  from: (offset: number) => number
  to: (offset: number) => number
  /** Words that belong to it but stand elsewhere: the heading and the row of a cell. */
  beyond: string
  /** For a cell that holds a bare number: the headings that may say its symbol and unit. */
  headings: string[]
}

const same = (offset: number) => offset

function plain(blockId: unknown, field: LooseField, text: unknown): ScannedText[] {
  return typeof blockId === 'string' && typeof text === 'string' && /\d/.test(text)
    ? [{ blockId, field, text, from: same, to: same, beyond: '', headings: [] }]
    : []
}

function equationText(blockId: unknown, tex: unknown): ScannedText[] {
  if (typeof blockId !== 'string' || typeof tex !== 'string') return []
  const { text, at } = plainTex(tex)
  const place = (offset: number) => at[Math.min(offset, at.length - 1)] ?? tex.length
  return [{ blockId, field: 'tex', text, from: place, to: place, beyond: '', headings: [] }]
}

/** An equation inside a paragraph has the place of its atom. */
function inlineEquations(block: Node): ScannedText[] {
  const found: ScannedText[] = []
  // Bounded, or a paragraph of many equations would be read once for each.
  const beyond = blockText(block).replaceAll(ATOM, ' ').slice(0, 300)
  block.forEach((node, offset) => {
    if (node.type.name !== 'inlineEquation') return
    const { text } = plainTex(String(node.attrs.tex))
    found.push({ blockId: String(block.attrs.id), field: 'text', text, from: () => offset, to: () => offset + 1, beyond, headings: [] })
  })
  return found
}

function blockTexts(block: Node, beyond = '', headings: string[] = []): ScannedText[] {
  return [...plain(block.attrs.id, 'text', blockText(block)).map(text => ({ ...text, beyond, headings })), ...inlineEquations(block)]
}

/** The cells of a table with the heading of their column and the first cell of their row. */
function tableTexts(table: Node): ScannedText[] {
  const header = table.firstChild
  const found: ScannedText[] = []
  table.forEach((row, _, rowIndex) => {
    const label = row.firstChild?.textContent ?? ''
    const words = row.textBetween(0, row.content.size, ' ', ' ').slice(0, 300)
    row.forEach((cell, __, column) => {
      const heading = rowIndex > 0 && column < (header?.childCount ?? 0) ? header?.child(column).textContent ?? '' : ''
      const headings = [heading, column > 0 ? label : ''].filter(Boolean)
      cell.descendants((node) => {
        if (node.isTextblock) found.push(...blockTexts(node, `${heading} ${words}`.slice(0, 300), headings))
        return !node.isTextblock
      })
    })
  })
  return found
}

/** The texts of a note in order: paragraphs, headings, cells, equations, captions, titles. */
export function textsOf(doc: Node): ScannedText[] {
  const found: ScannedText[] = []
  doc.descendants((node) => {
    const { id } = node.attrs as { id?: unknown }
    if (node.type.name === 'table') {
      found.push(...tableTexts(node))
      return false
    }
    if (node.isTextblock) found.push(...blockTexts(node))
    if (node.type.name === 'equation') found.push(...equationText(id, node.attrs.tex))
    if (node.type.name === 'figure') found.push(...plain(id, 'caption', node.attrs.caption), ...plain(id, 'alt', node.attrs.alt))
    if (node.type.name === 'calculation') found.push(...plain(id, 'title', node.attrs.title))
    return !node.isTextblock
  })
  return found
}

/** The title of the note as one more text. */
export const titleText = (title: string): ScannedText[] => plain('title', 'title', title)
