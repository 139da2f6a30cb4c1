/**
 * A fault of 1 % in one constant or one elementary result of the engine must
 * be seen by at least four fifths of the reference rows whose value it moves.
 * The fault is put in by replacing one export of one module while the engine
 * is loaded afresh; the engine itself knows nothing of it. Which rows a part
 * feeds is measured, not declared: those whose value moves at all.
 *
 * Covered: every published constant, each elementary result listed below.
 * Not covered: checks that only refuse, rounding for display, texts.
 */
import { describe, expect, it, vi } from 'vitest'
import type { Engine } from '../../../reference/engine'
import type { ReferenceRow } from '../../../reference/row'
import { loadEngine } from '../../../reference/engine'
import { deviation } from '../../../reference/row'
import { referenceRows } from '../../../reference/rows'

const fault = 1.01
const leastSeen = 0.8
type Exports = Record<string, unknown>
type Numeric = Record<string, number>
interface Mutation { readonly name: string, readonly module: string, readonly spoil: (exports: Exports) => Exports }

const scaled = (key: string) => (all: Exports): Exports => ({ ...all, [key]: (all[key] as number) * fault })
const coefficient = (table: string, key: string) => (all: Exports): Exports => ({ ...all, [table]: { ...(all[table] as Numeric), [key]: ((all[table] as Numeric)[key] ?? 0) * fault } })
/** Scales what a function gives: a number, or the named fields of an object. */
function result(name: string, ...fields: string[]) {
  return (all: Exports): Exports => {
    const original = all[name] as (...given: unknown[]) => unknown
    const spoilt = (value: unknown): unknown => {
      if (Array.isArray(value)) return value.map(spoilt)
      if (typeof value === 'number') return value * fault
      if (value === null || typeof value !== 'object') return value
      return { ...value, ...Object.fromEntries(fields.map(field => [field, ((value as Numeric)[field] ?? 0) * fault])) }
    }
    return { ...all, [name]: (...given: unknown[]) => spoilt(original(...given)) }
  }
}

const constants: Mutation[] = [
  { name: 'loss at a free end', module: 'published', spoil: scaled('freeEndLoss') },
  { name: 'loss at an end beside a bulge', module: 'published', spoil: scaled('junctionEndLoss') },
  ...['bulgeL', 'bulgeT'].flatMap(table => ['c0', 'c1', 'c2', 'c3', 'c4'].map((key): Mutation => ({ name: `${table} ${key}`, module: 'published', spoil: coefficient(table, key) }))),
  { name: 'table of machined corners', module: 'published', spoil: all => ({ ...all, machinedCornerTable: (all.machinedCornerTable as [number, number][]).map(([x, K]) => [x, K * fault]) }) },
]
const results: Mutation[] = [
  { name: 'G·L·t³/3', module: 'wall-stiffness', spoil: result('wallStiffness', 'plainGJ') },
  { name: 'change of length at a junction', module: 'wall-stiffness', spoil: result('wallStiffness', 'lengthTerm') },
  { name: 'end term', module: 'wall-stiffness', spoil: result('wallStiffness', 'endTerm') },
  { name: 'face stress', module: 'wall-stiffness', spoil: result('faceStress') },
  { name: 'bulge of an L', module: 'junction-formula', spoil: result('bulgeOfL', 'J') },
  { name: 'bulge of a T', module: 'junction-formula', spoil: result('bulgeOfT', 'J') },
  { name: 'bend factor', module: 'bend-factor', spoil: result('bendFactor') },
  { name: 'strip factor', module: 'bend-factor', spoil: result('stripFactor', 'K') },
  { name: 'length of a path', module: 'geometry', spoil: result('pathLength') },
  { name: 'growth of the sectorial coordinate', module: 'sectorial-growth', spoil: result('sectorialGrowth') },
  { name: 'area of an integration point', module: 'stations', spoil: result('stationsOf', 'area') },
  { name: 'ω of an integration point', module: 'stations', spoil: result('stationsOf', 'omega') },
  { name: 'x of an integration point', module: 'stations', spoil: result('stationsOf', 'x') },
  { name: 'y of an integration point', module: 'stations', spoil: result('stationsOf', 'y') },
  { name: 'large-twist ratio', module: 'wagner', spoil: result('wagner', 'ratio', 'edgeStress', 'axisStress') },
  { name: 'strip rate limit', module: 'wagner', spoil: result('stripRateLimit') },
  { name: 'strip as large twist takes it', module: 'wagner', spoil: result('stripAsWagner', 'In', 'Ips') },
  { name: 'reserve factor', module: 'margins', spoil: result('reserveFactor', 'ms') },
  { name: 'special factor', module: 'factors', spoil: result('specialFactor', 'value') },
  { name: 'factored action', module: 'factors', spoil: result('factorAction', 'limit', 'ultimate') },
  { name: 'knock-down', module: 'allowables', spoil: result('knockDownAt', 'factor') },
  { name: 'shear allowable at yield', module: 'allowables', spoil: result('shearAllowables', 'yield') },
  { name: 'F_ty/√3', module: 'allowables', spoil: result('shearYieldFromTension') },
  { name: 'characteristic length', module: 'warping-length', spoil: result('characteristicLength') },
]

const sound = await loadEngine()
const soundValues = new Map(referenceRows.map(row => [row, row.actual(sound)]))

async function spoiltEngine({ module, spoil }: Mutation): Promise<Engine> {
  const path = `#shared/torsion/${module}`
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
const moved = (row: ReferenceRow, value: number): boolean => !(Math.abs(value - (soundValues.get(row) ?? 0)) <= 1e-12 * Math.abs(row.expected))

describe('a 1 % fault in the engine', () => {
  it.each([...constants, ...results].map(one => [one.name, one] as const))('%s', async (_, mutation) => {
    const engine = await spoiltEngine(mutation)
    const fed = referenceRows.map(row => ({ row, value: valueOf(row, engine) })).filter(({ row, value }) => moved(row, value))
    const blind = fed.filter(({ row, value }) => deviation(row, value) <= 1)
    expect(fed.length, 'reference rows fed').toBeGreaterThan(0)
    expect((fed.length - blind.length) / fed.length, `not seen by ${blind.map(({ row }) => `${row.id} ${row.quantity}`).join('; ')}`).toBeGreaterThanOrEqual(leastSeen)
  })
})
