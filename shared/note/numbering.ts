import type { Node } from '@tiptap/pm/model'
import { templateSection } from '#shared/note/template'

/** Numbers by the id of the block; derived from the document each time, never stored. */
export interface Numbering {
  /** `7.1`, `7.1.2` */
  headings: Map<string, string>
  /** `Figure 3` */
  figures: Map<string, string>
  /** `Table 2`, by the id of the first paragraph in the table, since a table has no id of its own. */
  tables: Map<string, string>
  /** `(4)` */
  equations: Map<string, string>
  /** `C1` */
  calculations: Map<string, string>
}

/** The id under which a table is known. */
export function tableKey(table: Node): string | null {
  let key: string | null = null
  table.descendants((node) => {
    if (key === null && node.type.name === 'paragraph' && typeof node.attrs.id === 'string') key = node.attrs.id
    return key === null
  })
  return key
}

/** Counts headings below the section's own number. A level that is skipped does not leave a gap: it counts as the next one. */
function headingCounter(sectionNumber: string) {
  const counts: number[] = []
  const levels: number[] = []
  return (level: number): string => {
    while (levels.length > 0 && (levels.at(-1) ?? 0) > level) levels.pop()
    if (levels.at(-1) !== level) levels.push(level)
    counts.length = Math.min(counts.length, levels.length)
    const at = levels.length - 1
    counts[at] = (counts[at] ?? 0) + 1
    return [sectionNumber, ...counts].join('.')
  }
}

/** Numbers the headings, figures, tables, displayed equations and calculations of a note in the order of the document. */
export function numberingOf(doc: Node): Numbering {
  const numbers: Numbering = { headings: new Map(), figures: new Map(), tables: new Map(), equations: new Map(), calculations: new Map() }
  const number = (into: Map<string, string>, id: unknown, text: (count: number) => string) => {
    if (typeof id === 'string') into.set(id, text(into.size + 1))
  }
  doc.forEach((section) => {
    const nextHeading = headingCounter(templateSection(String(section.attrs.key))?.number ?? '')
    section.descendants((node) => {
      const id: unknown = node.attrs.id
      switch (node.type.name) {
        case 'heading': number(numbers.headings, id, () => nextHeading(Number(node.attrs.level))); break
        case 'figure': number(numbers.figures, id, count => `Figure ${count}`); break
        case 'table': number(numbers.tables, tableKey(node), count => `Table ${count}`); break
        case 'equation': number(numbers.equations, id, count => `(${count})`); break
        case 'calculation': number(numbers.calculations, id, count => `C${count}`); break
      }
      return !node.isTextblock
    })
  })
  return numbers
}
