/**
 * Proof that the reference rows see: a fault of 1 % in one constant or one
 * elementary result of the engine must be seen by at least four fifths of the
 * rows whose value it moves. The fault is put in by replacing one export of
 * one module while the engine is loaded afresh; the engine itself knows
 * nothing of it. Which rows a part feeds is measured, not declared: those
 * whose value moves at all.
 *
 * Not covered: checks that only refuse, rounding for display, texts.
 */
import { beforeAll, describe, expect, it, vi } from 'vitest'
import type { Engine } from '../reference/engine'
import type { ReferenceRow } from '../reference/row'
import { loadEngine } from '../reference/engine'
import { deviation } from '../reference/row'

export const fault = 1.01
const leastSeen = 0.8
export type Exports = Record<string, unknown>
type Numeric = Record<string, number>
export interface Mutation {
  readonly name: string
  /** Under `shared/`, without extension: `torsion/published`. */
  readonly module: string
  readonly spoil: (exports: Exports) => Exports
}

/** A published number 1 % high. */
export const scaled = (key: string) => (all: Exports): Exports => ({ ...all, [key]: (all[key] as number) * fault })

/** One number of a published object or list 1 % high. */
export const coefficient = (table: string, key: string | number) => (all: Exports): Exports => {
  const published = all[table] as Numeric | number[]
  const value = ((published as Numeric)[key] ?? 0) * fault
  return { ...all, [table]: Array.isArray(published) ? published.with(Number(key), value) : { ...published, [key]: value } }
}

/** The second number of every pair of a published table 1 % high. */
export const ordinates = (table: string) => (all: Exports): Exports => ({ ...all, [table]: (all[table] as [number, number][]).map(([x, y]) => [x, y * fault]) })

/** Everything a function gives 1 % high: a number, the numbers of a list, or the named fields of an object. */
export function result(name: string, ...fields: string[]) {
  return (all: Exports): Exports => {
    const original = all[name] as (...given: unknown[]) => unknown
    const spoilt = (value: unknown): unknown => {
      if (Array.isArray(value)) return value.map(spoilt)
      if (typeof value === 'number') return value * fault
      if (value === null || typeof value !== 'object') return value
      return { ...value, ...Object.fromEntries(fields.filter(field => field in value).map(field => [field, spoilt((value as Exports)[field])])) }
    }
    return { ...all, [name]: (...given: unknown[]) => spoilt(original(...given)) }
  }
}

async function spoiltEngine({ module, spoil }: Mutation): Promise<Engine> {
  const path = `#shared/${module}`
  vi.resetModules()
  vi.doMock(path, async original => spoil({ ...(await original<Exports>()) }))
  const engine = await loadEngine()
  vi.doUnmock(path)
  vi.resetModules()
  // Loading once more settles the release before the same path is replaced again.
  await loadEngine()
  return engine
}

/** NaN and refusals count as moved and as seen. */
const valueOf = (row: ReferenceRow, engine: Engine): number => {
  try {
    return row.actual(engine)
  } catch {
    return Number.NaN
  }
}

/** One test for each mutation, against the rows of one topic: all rows of the engine would take too long. */
export function describeFaults(title: string, mutations: readonly Mutation[], rows: readonly ReferenceRow[]): void {
  describe(title, () => {
    const sound = new Map<ReferenceRow, number>()
    beforeAll(async () => {
      const engine = await loadEngine()
      for (const row of rows) sound.set(row, row.actual(engine))
    })
    const moved = (row: ReferenceRow, value: number): boolean => !(Math.abs(value - (sound.get(row) ?? 0)) <= 1e-12 * Math.abs(row.expected))

    it.each(mutations.map(one => [one.name, one] as const))('%s', async (_, mutation) => {
      const engine = await spoiltEngine(mutation)
      const fed = rows.map(row => ({ row, value: valueOf(row, engine) })).filter(({ row, value }) => moved(row, value))
      const blind = fed.filter(({ row, value }) => deviation(row, value) <= 1)
      expect(fed.length, 'reference rows fed').toBeGreaterThan(0)
      expect((fed.length - blind.length) / fed.length, `not seen by ${blind.map(({ row }) => `${row.id} ${row.quantity}`).join('; ')}`).toBeGreaterThanOrEqual(leastSeen)
    })
  })
}
