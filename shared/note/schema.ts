import { getExtensionField, getSchema, Mark, Node as TiptapNode } from '@tiptap/core'
import type { AnyConfig, AnyExtension, Attribute } from '@tiptap/core'
import { Subscript } from '@tiptap/extension-subscript'
import { Superscript } from '@tiptap/extension-superscript'
import { Table, TableCell, TableHeader, TableRow } from '@tiptap/extension-table'
import { StarterKit } from '@tiptap/starter-kit'
import type { Node, Schema } from '@tiptap/pm/model'
import type { AttributeRule } from '#shared/note/attribute-rules'
import { isAllowedHref, MARK_RULES, NODE_RULES } from '#shared/note/attribute-rules'
import { CalculationNode, EquationNode, FigureNode, InlineEquationNode, NoteDocument, SectionNode, TiedNode } from '#shared/note/nodes'

// Calculations, tables, figures and headings stand in a section, not inside a list or a cell: they are numbered and printed from there.
const LIST_ITEM_CONTENT = 'paragraph (paragraph | bulletList | orderedList)*'
const CELL_CONTENT = '(paragraph | bulletList | orderedList)+'

const idAttribute: Attribute = {
  default: null,
  keepOnSplit: false,
  parseHTML: (element: HTMLElement) => element.getAttribute('data-id'),
  renderHTML: attributes => attributes.id ? { 'data-id': String(attributes.id) } : {},
} as Attribute

/** While one types, a new paragraph has no id for the moment until the editor gives it one; the server's check takes none without. */
const validator = (rule: AttributeRule, mayBeNull: boolean) => (value: unknown) => {
  const fault = mayBeNull && value === null ? null : rule(value)
  if (fault) throw new RangeError(`It ${fault}.`)
}

/** Keeps of an extension's attributes those the rules list, each with its check. */
function ruled(attributes: Record<string, Attribute>, rules: Record<string, AttributeRule>): Record<string, Attribute> {
  return Object.fromEntries(Object.entries(rules).map(([name, rule]) => {
    const attribute = attributes[name] ?? idAttribute
    return [name, { ...attribute, validate: validator(rule, !attribute.isRequired && attribute.default === null) }]
  }))
}

function withRules(extension: AnyExtension): AnyExtension {
  const rules = extension.type === 'node' ? NODE_RULES[extension.name] : MARK_RULES[extension.name]
  if (!rules || extension.name === 'text') return extension
  const ruledAttributes = {
    addAttributes(this: { parent?: (() => object) | null }) {
      return ruled((this.parent?.() ?? {}) as Record<string, Attribute>, rules)
    },
  }
  if (extension instanceof TiptapNode) return extension.extend(ruledAttributes)
  return extension instanceof Mark ? extension.extend(ruledAttributes) : extension
}

/** The parts of the kit one by one, so that each can carry the rules. */
function kitExtensions(): AnyExtension[] {
  const kit = StarterKit.configure({
    document: false, blockquote: false, code: false, codeBlock: false, horizontalRule: false, trailingNode: false,
    heading: { levels: [1, 2, 3] },
    link: {
      openOnClick: false, autolink: false, linkOnPaste: true, defaultProtocol: 'https', protocols: ['http', 'https', 'mailto'],
      isAllowedUri: isAllowedHref, HTMLAttributes: { target: '_blank', rel: 'noopener noreferrer nofollow' },
    },
  })
  const add = getExtensionField<AnyConfig['addExtensions']>(kit, 'addExtensions', { name: kit.name, options: kit.options, storage: kit.storage })
  return (add?.() ?? []).map(extension => extension.name === 'listItem' && extension instanceof TiptapNode
    ? extension.extend({ content: LIST_ITEM_CONTENT })
    : extension)
}

/** Extensions that take the place of those of the same name, for instance with a view. */
export type Replacements = Partial<Record<'section' | 'calculation' | 'tied' | 'equation' | 'inlineEquation' | 'figure' | 'table', AnyExtension>>

/**
 * All extensions of a note. The editor passes extended ones (`CalculationNode.extend({ addNodeView })`);
 * the server takes them as they are. Undo, list and table keys come with them.
 */
export function noteExtensions(replace: Replacements = {}): AnyExtension[] {
  const own: AnyExtension[] = [
    NoteDocument, ...kitExtensions(), Subscript, Superscript,
    Table.configure({ resizable: false, allowTableNodeSelection: true }), TableRow,
    TableHeader.extend({ content: CELL_CONTENT }), TableCell.extend({ content: CELL_CONTENT }),
    SectionNode, CalculationNode, TiedNode, EquationNode, InlineEquationNode, FigureNode,
  ]
  const replaced: Record<string, AnyExtension | undefined> = replace
  return own.map(extension => withRules(replaced[extension.name] ?? extension))
}

let schema: Schema | undefined

/** The schema of a note, made once. Needs no DOM. */
export function noteSchema(): Schema {
  schema ??= getSchema(noteExtensions())
  return schema
}

/** Reads a stored document, which was checked when it was stored. Throws a RangeError where it does not fit the schema. */
export const readDocument = (json: unknown): Node => noteSchema().nodeFromJSON(json)
