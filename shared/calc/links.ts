/** What the inputs of a calculation may be linked to, as a kind sees it: sources with values, or the reason why there is none. */
import type { z } from 'zod'
import type { linkSource } from '#shared/calc/parts/fields'
import type { Dimension } from '#shared/units/units'

export type LinkSource = z.infer<typeof linkSource>

export type LinkedValue
  = | { ok: true, value: number, dimension: Dimension }
    | { ok: false, reason: string }

export interface Links {
  /** Value in engine units, or a sentence that says why there is none and what to do. */
  value: (source: LinkSource) => LinkedValue
}

/** A calculation that stands alone: nothing can be linked. */
export const noLinks: Links = {
  value: () => ({ ok: false, reason: 'This calculation stands alone and cannot be linked to another; type the value.' }),
}

/** Dimensions that may stand for one another: a bare ratio for a number, a sectorial coordinate for an area. */
const ALIKE: Dimension[][] = [['ratio', 'number', 'margin'], ['area', 'sectorial'], ['bimoment', 'torsionalStiffness']]

export const fitsDimension = (has: Dimension, asked: Dimension): boolean =>
  has === asked || ALIKE.some(group => group.includes(has) && group.includes(asked))

const isSource = (value: unknown): value is LinkSource => typeof value === 'object' && value !== null && 'of' in value

/** Every source that the inputs name, with the path of its field, wherever it stands. */
export function linksOf(inputs: unknown, path: readonly string[] = []): { path: string, source: LinkSource }[] {
  if (typeof inputs !== 'object' || inputs === null) return []
  return Object.entries(inputs).flatMap(([key, inside]) =>
    key === 'from' && isSource(inside) ? [{ path: path.join('.'), source: inside }] : linksOf(inside, [...path, key]))
}
