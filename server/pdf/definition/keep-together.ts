import type { Content } from 'pdfmake/interfaces'

/** What is kept on one page must fit on one: more characters than these are let go. */
const PAGE_OF_TEXT = 1800
const CELL_OF_TEXT = 900

/** How much text there is in a piece of content. */
export function textLength(content: unknown): number {
  if (typeof content === 'string') return content.length
  if (Array.isArray(content)) return content.reduce((sum: number, one) => sum + textLength(one), 0)
  if (typeof content !== 'object' || content === null) return 0
  const { text, stack, columns, ul, ol } = content as Record<string, unknown>
  return [text, stack, columns, ul, ol].reduce((sum: number, one) => sum + textLength(one), 0)
}

/** Whether the rows of a table are short enough never to be parted. */
export const rowsFit = (rows: unknown[][]): boolean => rows.every(row => row.every(cell => textLength(cell) < CELL_OF_TEXT))

type Stacked = { stack: Content[], unbreakable?: boolean }
const isStack = (content: unknown): content is Stacked => typeof content === 'object' && content !== null && 'stack' in content

function breaksByRows(content: unknown): boolean {
  if (typeof content !== 'object' || content === null) return false
  return 'table' in content || 'ul' in content || 'ol' in content || (isStack(content) && content.stack.some(breaksByRows))
}

/**
 * Puts a heading before a block so that no page ends with the heading. A block
 * in pieces keeps its first piece with it; what may be longer than a page, or
 * breaks by rows, only follows.
 */
export function headed(heading: Content, block: Content): Content {
  if (isStack(block) && isStack(block.stack[0]) && block.stack[0].unbreakable) {
    const [first, ...rest] = block.stack
    return { ...block, stack: [headed(heading, first as Content), ...rest] } as Content
  }
  const parts = { stack: [heading, block] }
  return breaksByRows(block) || textLength(block) > PAGE_OF_TEXT ? parts : { ...parts, unbreakable: true }
}
