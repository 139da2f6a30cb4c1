/**
 * What the inputs of a calculation may be linked to, as a kind sees it: outputs of other calculations, the
 * records of the note (a material, a table of load cases), or the reason why there is none.
 */
import type { z } from 'zod'
import type { linkSource } from '#shared/calc/parts/fields'
import type { Evaluation, LoadLevel } from '#shared/calc/types'
import type { Dimension } from '#shared/units/units'

export type LinkSource = z.infer<typeof linkSource>

/** Says what is missing and what to do. */
interface Missing { ok: false, reason: string }
export type LinkedValue = { ok: true, value: number, dimension: Dimension } | Missing

/** A load case of another calculation with its value of one quantity, in engine units. */
export interface LinkedCase { id: string, title: string, source: string, level: LoadLevel, temperature: number | null, value: number, dimension: Dimension }

export interface Links {
  /** One output. */
  value: (source: LinkSource) => LinkedValue
  /** The stored inputs of a record of this kind. */
  record: (calculation: string, kind: string) => { ok: true, inputs: unknown } | Missing
  /** Every case of a calculation that gives this quantity, e.g. all its torques `T`. */
  cases: (calculation: string, quantity: string) => { ok: true, cases: LinkedCase[] } | Missing
  /** Every other calculation of the note that does not gather itself, in the order of the note. */
  gathered: () => { id: string, label: string, title: string, evaluation: Evaluation }[]
}

const alone: Missing = { ok: false, reason: 'This calculation stands alone and cannot be linked to another; type the value.' }
/** A calculation that stands alone: nothing can be linked. */
export const noLinks: Links = { value: () => alone, record: () => alone, cases: () => alone, gathered: () => [] }

/** Dimensions that may stand for one another: a bare ratio for a number, a sectorial coordinate for an area. */
const ALIKE: Dimension[][] = [['ratio', 'number', 'margin'], ['area', 'sectorial'], ['bimoment', 'torsionalStiffness']]

export const fitsDimension = (has: Dimension, asked: Dimension): boolean =>
  has === asked || ALIKE.some(group => group.includes(has) && group.includes(asked))

/** Another calculation that the inputs name, and where. `key` is absent where a whole record or table is taken. */
export interface FoundLink { path: string, calculation: string, key?: string }

/** Inputs are never changed in place, and a note asks for the same links several times over. */
const found = new WeakMap<object, readonly FoundLink[]>()

/** Every calculation that the inputs name: single values under `from`, records under `record`, tables under `table`. */
export function linksOf(inputs: unknown): readonly FoundLink[] {
  if (typeof inputs !== 'object' || inputs === null) return []
  const known = found.get(inputs)
  if (known) return known
  const links: FoundLink[] = []
  gatherLinks(inputs, '', links)
  found.set(inputs, links)
  return links
}

function gatherLinks(inputs: object, at: string, links: FoundLink[]): void {
  for (const [field, inside] of Object.entries(inputs) as [string, unknown][]) {
    if (typeof inside === 'string' && (field === 'record' || field === 'table')) links.push({ path: at, calculation: inside })
    if (typeof inside !== 'object' || inside === null) continue
    const source = field === 'from' ? sourceIn(inside) : null
    if (source) links.push({ path: at, ...source })
    else gatherLinks(inside, at === '' ? field : `${at}.${field}`, links)
  }
}

function sourceIn(value: unknown): LinkSource | null {
  if (typeof value !== 'object' || value === null || !('calculation' in value) || !('key' in value)) return null
  return typeof value.calculation === 'string' && typeof value.key === 'string' ? { calculation: value.calculation, key: value.key } : null
}
