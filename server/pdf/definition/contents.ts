import type { Content, TableCell } from 'pdfmake/interfaces'
import { outlineOf } from '#shared/note/sections'
import { headingAnchor, sectionAnchor } from '#server/pdf/definition/anchors'
import { INK3 } from '#server/pdf/definition/colours'
import { tiedText, type NoteContext } from '#server/pdf/definition/note-context'

/** Sections and their headings with the pages they begin on. */
export function contents({ doc, data }: NoteContext): Content[] {
  const entries = outlineOf(doc, atom => atom.type.name === 'tied'
    ? tiedText(data, String(atom.attrs.calcId), String(atom.attrs.key), atom.attrs.unit as string | null)
    : String(atom.attrs.tex ?? ''))
  const rows = entries.filter(entry => entry.sectionKey !== 'cover' && entry.level <= 2).map((entry): TableCell[] => {
    const target = entry.kind === 'section' ? sectionAnchor(entry.sectionKey) : headingAnchor(entry.id)
    const look = entry.kind === 'section' ? { bold: true } : {}
    const aside = entry.notApplicable ? [{ text: '  not applicable', bold: false, color: INK3 }] : []
    return [
      { text: entry.kind === 'section' ? entry.number : '', color: INK3 },
      { text: entry.kind === 'section' ? [entry.title, ...aside] : `${entry.number}  ${entry.title}`, linkToDestination: target, margin: [entry.kind === 'section' ? 0 : 10, 0, 0, 0], ...look },
      { pageReference: target, alignment: 'right' } as unknown as TableCell,
    ]
  })
  return [
    { text: 'Contents', fontSize: 14.5, bold: true, margin: [0, 0, 0, 6], pageBreak: 'before', outline: true },
    { table: { widths: [26, '*', 30], body: rows }, layout: { hLineWidth: () => 0, vLineWidth: () => 0, paddingLeft: () => 0, paddingRight: () => 0, paddingTop: () => 1.2, paddingBottom: () => 1.2 }, fontSize: 10, lineHeight: 1.1, fontFeatures: ['tnum'] },
  ]
}
