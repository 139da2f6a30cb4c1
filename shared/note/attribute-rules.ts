/**
 * The attributes of every node and mark and what each may hold. The schema takes
 * its `validate` from here and the server's check walks by it, so that browser and
 * server cannot come to differ. A name not listed here is not an attribute.
 */
import { isRecord, isStorable, jsonFault } from '#shared/note/plain-json'
import { templateSection } from '#shared/note/template'
import { texFault } from '#shared/note/tex-limits'

/** Says what is wrong with the value, or null. */
export type AttributeRule = (value: unknown) => string | null

export const MAX_INPUT_CHARACTERS = 64 * 1024

const UUID = /^[0-9a-f]{8}-[0-9a-f]{4}-[1-8][0-9a-f]{3}-[89ab][0-9a-f]{3}-[0-9a-f]{12}$/
const KIND = /^[a-z][a-z0-9-]{0,39}$/
const HREF = /^(?:https?:\/\/[^\s\\]+|mailto:[^\s\\]+|#[^\s\\]*)$/i

/** Whether the value is a lower-case UUID, the form in which clients make ids. */
export const isUuid = (value: unknown): value is string => typeof value === 'string' && UUID.test(value)

/** Whether a link may point there: http, https, mailto, or a place in the note. */
export const isAllowedHref = (value: unknown): value is string =>
  typeof value === 'string' && value.length <= 2000 && isStorable(value) && HREF.test(value)

const uuid: AttributeRule = value => isUuid(value) ? null : 'must be a UUID'
const text = (max: number): AttributeRule => value =>
  typeof value === 'string' && value.length <= max && isStorable(value) ? null : `must be text of at most ${max} characters`
const textOrNull = (max: number): AttributeRule => value => value === null ? null : text(max)(value)
const integer = (min: number, max: number): AttributeRule => value =>
  Number.isInteger(value) && Number(value) >= min && Number(value) <= max ? null : `must be a whole number from ${min} to ${max}`
const oneOf = (...allowed: unknown[]): AttributeRule => value => allowed.includes(value) ? null : `must be one of ${allowed.join(', ')}`

const sectionKey: AttributeRule = value => typeof value === 'string' && templateSection(value) ? null : 'must be the key of a section of the template'
const kind: AttributeRule = value => typeof value === 'string' && KIND.test(value) ? null : 'must be the name of a calculation kind'
const href: AttributeRule = value => isAllowedHref(value) ? null : 'must be an http, https, mailto or # address'
const tex: AttributeRule = value => typeof value !== 'string' ? 'must be text' : isStorable(value) ? texFault(value) : 'holds a character that cannot be stored'
const outputKey: AttributeRule = value => typeof value === 'string' && value !== '' ? text(160)(value) : 'must name an output'
const inputs: AttributeRule = (value) => {
  if (!isRecord(value)) return 'must be an object'
  const fault = jsonFault(value, { depth: 12, values: 20_000, characters: MAX_INPUT_CHARACTERS })
  if (fault) return fault
  return JSON.stringify(value).length <= MAX_INPUT_CHARACTERS ? null : 'is too large'
}

const cell = {
  colspan: integer(1, 40),
  rowspan: integer(1, 400),
  // Columns are not resized, so that a table prints as it is seen.
  colwidth: oneOf(null),
  align: oneOf(null, 'left', 'right', 'center'),
}

export const NODE_RULES: Record<string, Record<string, AttributeRule>> = {
  doc: {},
  section: { id: uuid, key: sectionKey, notApplicable: textOrNull(2000) },
  paragraph: { id: uuid },
  heading: { id: uuid, level: integer(1, 3) },
  bulletList: {},
  orderedList: { start: integer(1, 9999) },
  listItem: {},
  table: {},
  tableRow: {},
  tableHeader: cell,
  tableCell: cell,
  equation: { id: uuid, tex },
  figure: { id: uuid, fileId: uuid, alt: text(1000), caption: text(1000) },
  calculation: { id: uuid, kind, kindVersion: integer(1, 9999), title: text(200), inputs },
  hardBreak: {},
  inlineEquation: { tex },
  tied: { calcId: uuid, key: outputKey, unit: textOrNull(24) },
  text: {},
}

export const MARK_RULES: Record<string, Record<string, AttributeRule>> = {
  bold: {},
  italic: {},
  underline: {},
  strike: {},
  subscript: {},
  superscript: {},
  link: { href },
}
