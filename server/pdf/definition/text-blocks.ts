import type { Node } from '@tiptap/pm/model'
import type { Content, TableCell } from 'pdfmake/interfaces'
import { tableKey } from '#shared/note/numbering'
import { calculationContent } from '#server/pdf/definition/calculation'
import { HAIR, INK, INK2 } from '#server/pdf/definition/colours'
import { blockEquation } from '#server/pdf/definition/block-equation'
import { headingAnchor, sectionAnchor } from '#server/pdf/definition/anchors'
import { HANG, subHeading } from '#server/pdf/definition/headings'
import { inlineRuns } from '#server/pdf/definition/inline-text'
import { headed, rowsFit } from '#server/pdf/definition/keep-together'
import type { NoteContext } from '#server/pdf/definition/note-context'
import { TABLE_TEXT } from '#server/pdf/definition/tables'
import { PAGE } from '#server/pdf/typeset'

const INDENT: [number, number, number, number] = [HANG, 0, 24, 6]

/** The blocks of a written section in order. */
export function sectionBlocks(section: Node, context: NoteContext): Content[] {
  const blocks: Content[] = []
  let heading: Content | null = null
  section.forEach((node) => {
    const content = block(node, context, String(section.attrs.key))
    if (node.type.name === 'heading') {
      if (heading) blocks.push(heading)
      heading = content
    } else {
      blocks.push(heading ? headed(heading, content) : content)
      heading = null
    }
  })
  return heading ? [...blocks, heading] : blocks
}

function block(node: Node, context: NoteContext, sectionKey: string): Content {
  const id = String(node.attrs.id ?? '')
  const { numbering } = context
  switch (node.type.name) {
    case 'heading': return subHeading(numbering.headings.get(id) ?? '', inlineRuns(node, context), headingAnchor(id), sectionAnchor(sectionKey), Number(node.attrs.level))
    case 'bulletList': case 'orderedList': return { ...list(node, context) as object, margin: INDENT } as Content
    case 'table': return table(node, context)
    case 'equation': return blockEquation(String(node.attrs.tex), { margin: [HANG, 4, 0, 8], label: numbering.equations.get(id) })
    case 'figure': return figure(node, context)
    case 'calculation': return calculationContent(id, context)
    default: return { text: inlineRuns(node, context), margin: INDENT } as Content
  }
}

function list(node: Node, context: NoteContext): Content {
  const items: Content[] = []
  node.forEach((item) => {
    const parts: Content[] = []
    item.forEach(child => parts.push(child.type.name === 'paragraph' ? { text: inlineRuns(child, context), margin: [0, 0, 0, 2] } as Content : list(child, context)))
    items.push(parts.length === 1 && parts[0] ? parts[0] : { stack: parts })
  })
  return node.type.name === 'bulletList' ? { ul: items, markerColor: INK2 } : { ol: items, start: Number(node.attrs.start ?? 1) }
}

function cellContent(cell: Node, context: NoteContext): Content[] {
  const parts: Content[] = []
  cell.forEach(child => parts.push(child.type.name === 'paragraph' ? { text: inlineRuns(child, context, TABLE_TEXT.fontSize) } as Content : list(child, context)))
  return parts
}

/** A table with merged cells: what a cell covers is left empty, as pdfmake wants it. */
function tableBody(node: Node, context: NoteContext): TableCell[][] {
  const rows: TableCell[][] = Array.from({ length: node.childCount }, () => [])
  node.forEach((row, _offset, y) => {
    let x = 0
    row.forEach((cell) => {
      while (rows[y]?.[x] !== undefined) x++
      const [colSpan, rowSpan] = [Number(cell.attrs.colspan ?? 1), Math.min(Number(cell.attrs.rowspan ?? 1), node.childCount - y)]
      for (let dy = 0; dy < rowSpan; dy++) for (let dx = 0; dx < colSpan; dx++) (rows[y + dy] ?? [])[x + dx] = ''
      const head = cell.type.name === 'tableHeader' ? { bold: true, color: INK2 } : {}
      const target = rows[y]
      if (target) target[x] = { stack: cellContent(cell, context), colSpan, rowSpan, ...head } as TableCell
    })
  })
  const width = Math.max(...rows.map(row => row.length))
  return rows.map(row => Array.from({ length: width }, (_, i) => row[i] ?? ''))
}

function headRows(node: Node): number {
  let count = 0
  while (count < node.childCount - 1 && node.child(count).firstChild?.type.name === 'tableHeader' && node.child(count).lastChild?.type.name === 'tableHeader') count++
  return count
}

function table(node: Node, context: NoteContext): Content {
  const body = tableBody(node, context)
  const heads = headRows(node)
  const number = context.numbering.tables.get(tableKey(node) ?? '')
  return {
    stack: [
      ...(number ? [{ text: number, fontSize: 8.5, color: INK2 }] : []),
      {
        table: { headerRows: heads, dontBreakRows: rowsFit(body), widths: (body[0] ?? []).map(() => '*'), body },
        layout: {
          hLineWidth: (i: number) => i === 0 ? 0 : i === heads ? 1 : i === body.length ? 0.75 : 0.5,
          hLineColor: (i: number) => i === heads || i === body.length ? INK : HAIR,
          vLineWidth: () => 0, paddingLeft: (i: number) => i === 0 ? 0 : 6, paddingRight: () => 4, paddingTop: () => 3.5, paddingBottom: () => 3,
        },
        ...TABLE_TEXT,
      },
    ],
    margin: [HANG, 4, 0, 12],
  }
}

/** A picture with its caption under it, never parted. */
function figure(node: Node, context: NoteContext): Content {
  const { id, fileId, alt, caption } = node.attrs as Record<'id' | 'fileId' | 'alt' | 'caption', string>
  const number = context.numbering.figures.get(id) ?? 'Figure'
  const picture: Content = context.data.figures[fileId]
    ? { image: fileId, fit: [PAGE.measure - HANG, 420] as [number, number] }
    : { text: `The picture of this figure is not in the store. It shows: ${alt}`, italics: true, color: INK2 }
  return { stack: [picture, { text: [{ text: `${number}. `, bold: true }, caption], fontSize: 9, margin: [0, 5, 0, 0] }], unbreakable: true, margin: [HANG, 6, 0, 12] }
}
