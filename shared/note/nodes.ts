/**
 * The nodes that only a note has. They come without a view: the editor extends
 * them with one, the server reads documents with them as they are.
 * HTML is for the clipboard only.
 */
import { mergeAttributes, Node } from '@tiptap/core'

const required = { isRequired: true }
const attribute = (name: string) => ({
  ...required,
  parseHTML: (element: HTMLElement) => element.getAttribute(name) ?? '',
  renderHTML: () => ({}),
})

/** Reads JSON from the clipboard; anything else makes the parse rule pass. */
function parsedJson(element: HTMLElement, name: string): Record<string, unknown> | null {
  try {
    const value: unknown = JSON.parse(element.getAttribute(name) ?? '')
    return typeof value === 'object' && value !== null && !Array.isArray(value) ? value as Record<string, unknown> : null
  } catch {
    return null
  }
}

export const NoteDocument = Node.create({ name: 'doc', topNode: true, content: 'section+' })

/** A section of the template. Its heading is drawn from the template, so that it cannot be edited. */
export const SectionNode = Node.create({
  name: 'section',
  content: 'block+',
  isolating: true,
  defining: true,
  // With defaults, because a document must be able to begin with a section of its own; the check then refuses it.
  addAttributes: () => {
    const field = { default: null, renderHTML: () => ({}) }
    return { id: field, key: field, notApplicable: field }
  },
  // A pasted section would break the fixed order: its blocks are pasted, its frame is not.
  parseHTML: () => [],
  renderHTML: ({ node }) => ['section', { 'data-key': String(node.attrs.key), 'data-id': String(node.attrs.id) }, 0],
})

/** A live calculation. Results are never kept here. */
export const CalculationNode = Node.create({
  name: 'calculation',
  group: 'block',
  atom: true,
  isolating: true,
  draggable: true,
  addAttributes: () => {
    const field = { ...required, renderHTML: () => ({}) }
    return { id: field, kind: field, kindVersion: field, title: field, inputs: field }
  },
  parseHTML: () => [{ tag: 'div[data-torquill-calculation]', getAttrs: element => parsedJson(element, 'data-torquill-calculation') ?? false }],
  renderHTML: ({ node }) => ['div', { 'data-torquill-calculation': JSON.stringify(node.attrs) }],
  renderText: ({ node }) => String(node.attrs.title),
})

/** A number of a calculation, shown where it stands and following it. */
export const TiedNode = Node.create({
  name: 'tied',
  group: 'inline',
  inline: true,
  atom: true,
  addAttributes: () => {
    const field = { ...required, renderHTML: () => ({}) }
    return { calcId: field, key: field, unit: { default: null, renderHTML: () => ({}) } }
  },
  parseHTML: () => [{ tag: 'span[data-tied]', getAttrs: element => parsedJson(element, 'data-tied') ?? false }],
  renderHTML: ({ node }) => ['span', { 'data-tied': JSON.stringify(node.attrs) }],
})

export const EquationNode = Node.create({
  name: 'equation',
  group: 'block',
  atom: true,
  draggable: true,
  addAttributes: () => ({ id: attribute('data-id'), tex: attribute('data-tex') }),
  parseHTML: () => [{ tag: 'div[data-equation]' }],
  renderHTML: ({ node, HTMLAttributes }) =>
    ['div', mergeAttributes(HTMLAttributes, { 'data-equation': '', 'data-id': String(node.attrs.id), 'data-tex': String(node.attrs.tex) }), String(node.attrs.tex)],
  renderText: ({ node }) => String(node.attrs.tex),
})

export const InlineEquationNode = Node.create({
  name: 'inlineEquation',
  group: 'inline',
  inline: true,
  atom: true,
  addAttributes: () => ({ tex: attribute('data-tex') }),
  parseHTML: () => [{ tag: 'span[data-inline-equation]' }],
  renderHTML: ({ node }) => ['span', { 'data-inline-equation': '', 'data-tex': String(node.attrs.tex) }, String(node.attrs.tex)],
  renderText: ({ node }) => String(node.attrs.tex),
})

/** A stored picture, by the id of its file: never by address, so that nothing is fetched and nothing is embedded. */
export const FigureNode = Node.create({
  name: 'figure',
  group: 'block',
  atom: true,
  draggable: true,
  addAttributes: () => ({ id: attribute('data-id'), fileId: attribute('data-file'), alt: attribute('data-alt'), caption: attribute('data-caption') }),
  parseHTML: () => [{ tag: 'figure[data-file]' }],
  renderHTML: ({ node }) =>
    ['figure', { 'data-id': String(node.attrs.id), 'data-file': String(node.attrs.fileId), 'data-alt': String(node.attrs.alt), 'data-caption': String(node.attrs.caption) }],
  renderText: ({ node }) => String(node.attrs.caption),
})
