/** Whether the face has a shape for a character. */
export type HasGlyph = (codePoint: number) => boolean

const SUPERSCRIPTS = '⁰¹²³⁴⁵⁶⁷⁸⁹'
/** A negative power of ten, whose raised minus the face lacks. */
const NEGATIVE_POWER = /(⁻[⁰¹²³⁴⁵⁶⁷⁸⁹]+)/
const PARTS = ['stack', 'columns', 'ul', 'ol'] as const

const lowered = (power: string) => [...power].map(sign => sign === '⁻' ? '\u2212' : String(SUPERSCRIPTS.indexOf(sign))).join('')

/** A thin space may break a line between a number and its unit: a narrow one that may not takes its place. */
function spelled(text: string, has: HasGlyph): string {
  const tied = text.replaceAll('\u2009', '\u202F')
  const known = (sign: string) => /\s/.test(sign) || has(sign.codePointAt(0) ?? 0)
  if ([...tied].every(known)) return tied
  return [...tied].map(sign => known(sign) ? sign : `[U+${(sign.codePointAt(0) ?? 0).toString(16).toUpperCase().padStart(4, '0')}]`).join('')
}

function preparedString(text: string, has: HasGlyph): unknown {
  const parts = text.split(NEGATIVE_POWER)
  if (parts.length === 1) return spelled(text, has)
  return parts.filter(Boolean).map(part => part.startsWith('⁻') ? { text: lowered(part), sup: true } : { text: spelled(part, has) })
}

/**
 * Content whose every character can be printed: one that the face lacks is
 * named by its number rather than shown as an empty box.
 */
export function preparedText(content: unknown, has: HasGlyph): unknown {
  if (typeof content === 'string') {
    const prepared = preparedString(content, has)
    return typeof prepared === 'string' ? prepared : { text: prepared }
  }
  if (Array.isArray(content)) return content.map(one => preparedText(one, has))
  if (typeof content !== 'object' || content === null || 'equation' in content) return content
  const node: Record<string, unknown> = { ...content }
  if (typeof node.text === 'string') node.text = preparedString(node.text, has)
  else if (node.text !== undefined) node.text = preparedText(node.text, has)
  if (typeof node.svg === 'string') node.svg = node.svg.replaceAll('⁻', '\u2212')
  for (const key of PARTS) if (node[key] !== undefined) node[key] = preparedText(node[key], has)
  const { table } = node as { table?: { body: unknown } }
  if (table) node.table = { ...table, body: preparedText(table.body, has) }
  return node
}
