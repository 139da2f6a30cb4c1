/**
 * The walk over a document before the schema reads it: the schema recurses, drops
 * attributes it does not know and would take any link, so this comes first.
 */
import type { AttributeRule } from '#shared/note/attribute-rules'
import { isUuid, MARK_RULES, NODE_RULES } from '#shared/note/attribute-rules'
import type { DocumentFault } from '#shared/note/document-fault'
import { documentFault } from '#shared/note/document-fault'
import { isRecord, isStorable } from '#shared/note/plain-json'

export const DOCUMENT_LIMITS = { depth: 32, nodes: 60_000, characters: 5_000_000, calculations: 200, marks: 10 }

const NODE_FIELDS = new Set(['type', 'attrs', 'content', 'marks', 'text'])
const MARK_FIELDS = new Set(['type', 'attrs'])

interface Tally { nodes: number, characters: number, calculations: number, ids: Set<string> }
interface Item { value: unknown, path: string, depth: number }

const rulesOf = (table: Record<string, Record<string, AttributeRule>>, type: unknown) =>
  typeof type === 'string' && Object.hasOwn(table, type) ? table[type] : undefined

function attributesFault(attrs: unknown, rules: Record<string, AttributeRule>, path: string): DocumentFault | null {
  const given = attrs ?? {}
  if (!isRecord(given)) return documentFault('document.malformed', 'Attributes must be an object.', path)
  for (const name of Object.keys(given)) {
    const rule = Object.hasOwn(rules, name) ? rules[name] : undefined
    if (!rule) return documentFault('document.attribute', `There is no attribute ${name.slice(0, 40)} here.`, path)
    const fault = rule(given[name])
    if (fault) return documentFault('document.attribute', `The attribute ${name} is wrong: ${fault}`, `${path}.${name}`)
  }
  return null
}

function marksFault(marks: unknown, path: string): DocumentFault | null {
  if (marks === undefined) return null
  if (!Array.isArray(marks) || marks.length > DOCUMENT_LIMITS.marks) return documentFault('document.malformed', 'Marks must be a short list.', path)
  for (const [index, mark] of marks.entries()) {
    const at = `${path}.${index}`
    if (!isRecord(mark) || Object.keys(mark).some(key => !MARK_FIELDS.has(key))) return documentFault('document.malformed', 'A mark has a type and attributes only.', at)
    const rules = rulesOf(MARK_RULES, mark.type)
    if (!rules) return documentFault('document.schema', 'A note does not know this kind of mark.', at)
    const fault = attributesFault(mark.attrs, rules, `${at}.attrs`)
    if (fault) return fault
  }
  return null
}

/** Ids are made by the client; the server refuses one that is missing or used twice, it never mends it. */
function idFault(attrs: unknown, tally: Tally, path: string): DocumentFault | null {
  const id = isRecord(attrs) ? attrs.id : undefined
  if (!isUuid(id)) return documentFault('document.id', 'A block has no id. Reload the page and save again.', path)
  if (tally.ids.has(id)) return documentFault('document.id', 'Two blocks have the same id. Reload the page and save again.', path)
  tally.ids.add(id)
  return null
}

function textFault(node: Record<string, unknown>, tally: Tally, path: string): DocumentFault | null {
  if (node.type !== 'text') return 'text' in node ? documentFault('document.malformed', 'Only a text node holds text.', path) : null
  if (typeof node.text !== 'string' || node.text === '') return documentFault('document.malformed', 'A text node must hold text.', path)
  tally.characters += node.text.length
  if (tally.characters > DOCUMENT_LIMITS.characters) return documentFault('document.too-much-text', 'The note holds more than 5 million characters. Move part of it into another note.', path)
  return isStorable(node.text) ? null : documentFault('document.malformed', 'The text holds a character that cannot be stored. Type the passage again.', path)
}

function nodeFault({ value: node, path, depth }: Item, tally: Tally): DocumentFault | null {
  tally.nodes += 1
  if (tally.nodes > DOCUMENT_LIMITS.nodes) return documentFault('document.too-many-nodes', 'The note has too many blocks. Move part of it into another note.', path)
  if (depth > DOCUMENT_LIMITS.depth) return documentFault('document.too-deep', 'The document is nested too deeply. Flatten its lists.', path)
  if (!isRecord(node) || Object.keys(node).some(key => !NODE_FIELDS.has(key))) return documentFault('document.malformed', 'The document holds something that is not a node.', path)
  const rules = rulesOf(NODE_RULES, node.type)
  if (!rules || (depth === 1) !== (node.type === 'doc')) return documentFault('document.schema', 'A note does not take this kind of block here.', path)
  if (node.type === 'calculation' && ++tally.calculations > DOCUMENT_LIMITS.calculations) {
    return documentFault('document.too-many-calculations', `A note holds at most ${DOCUMENT_LIMITS.calculations} calculations. Move some into another note.`, path)
  }
  return (rules.id ? idFault(node.attrs, tally, `${path}.attrs.id`) : null)
    ?? attributesFault(node.attrs, rules, `${path}.attrs`)
    ?? marksFault(node.marks, `${path}.marks`)
    ?? textFault(node, tally, path)
}

/** Walks the document without recursion and says the first thing that is wrong, or null. */
export function walkDocument(json: unknown): DocumentFault | null {
  const tally: Tally = { nodes: 0, characters: 0, calculations: 0, ids: new Set() }
  const open: Item[] = [{ value: json, path: '', depth: 1 }]
  for (let item = open.pop(); item; item = open.pop()) {
    const fault = nodeFault(item, tally)
    if (fault) return { ...fault, path: fault.path.replace(/^\./, '') }
    const content = (item.value as Record<string, unknown>).content
    if (content === undefined) continue
    if (!Array.isArray(content)) return documentFault('document.malformed', 'The content of a block must be a list.', item.path)
    for (let index = content.length - 1; index >= 0; index -= 1) {
      open.push({ value: content[index] as unknown, path: `${item.path}.content.${index}`.replace(/^\./, ''), depth: item.depth + 1 })
    }
  }
  return null
}
