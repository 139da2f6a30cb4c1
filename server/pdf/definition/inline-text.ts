import type { Mark, Node } from '@tiptap/pm/model'
import { setEquation } from '#server/pdf/equations'
import { ACCENT } from '#server/pdf/definition/colours'
import { tiedText, type NoteContext } from '#server/pdf/definition/note-context'
import { equationRun, type TextRun } from '#server/pdf/typeset'

function markStyle(mark: Mark): Record<string, unknown> {
  switch (mark.type.name) {
    case 'bold': return { bold: true }
    case 'italic': return { italics: true }
    case 'underline': return { underline: true }
    case 'strike': return { strike: true }
    case 'subscript': return { sub: true }
    case 'superscript': return { sup: true }
    case 'link': return linkStyle(String(mark.attrs.href))
    default: return {}
  }
}

/** A link inside the note has no place of its own in the file: its words stay, its address does not. */
const linkStyle = (href: string) => href.startsWith('#') ? {} : { link: href, color: ACCENT }

function styled(text: string, marks: readonly Mark[]): TextRun {
  const { underline, strike, ...style } = Object.assign({}, ...marks.map(markStyle)) as Record<string, unknown>
  const decoration = [underline ? 'underline' : '', strike ? 'lineThrough' : ''].filter(Boolean)
  return { text, ...style, ...(decoration.length > 0 ? { decoration } : {}) }
}

/** The runs of a paragraph or heading: text with its marks, equations in the line, and tied values as they stand. */
export function inlineRuns(block: Node, context: NoteContext, size = 10.5): TextRun[] {
  const runs: TextRun[] = []
  block.forEach((node) => {
    const { calcId, key, unit, tex } = node.attrs as Record<string, string>
    switch (node.type.name) {
      case 'text': runs.push(styled(node.text ?? '', node.marks)); break
      case 'hardBreak': runs.push({ text: '\n' }); break
      case 'inlineEquation': runs.push(equationRun(setEquation(tex ?? '', size))); break
      case 'tied': runs.push({ ...styled(tiedText(context.data, calcId ?? '', key ?? '', unit ?? null), node.marks), noWrap: true }); break
    }
  })
  return runs
}
