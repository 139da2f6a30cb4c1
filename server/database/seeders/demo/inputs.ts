/** Inputs that the demonstration's calculations share, from few words. */
import type { BarInputs } from '#shared/calc/parts/bar-fields'
import type { DeclarationsInput } from '#shared/calc/parts/declaration-fields'
import type { FactorsInput, LoadingInput } from '#shared/calc/parts/loading-fields'
import type { MaterialInput } from '#shared/calc/parts/material-fields'
import type { JunctionInput, WallInput, WallTable } from '#shared/calc/parts/wall-fields'
import type { UnitId } from '#shared/units/units'
import { named } from './build-document'

export const typed = <Unit extends UnitId>(text: string, unit: Unit) => ({ text, unit })

/** A field that takes an output of another calculation of the note. */
export const linked = <Unit extends UnitId>(name: string, key: string, unit: Unit) => ({ text: '', unit, from: { calculation: named(name), key } })

export type Corner = [x: string, y: string]

export interface PolylineWalls {
  /** Corner points of the mid-line, in the length unit. */
  corners: Corner[]
  names: string[]
  t: string | string[]
  material: string
  unit: 'mm' | 'in'
}

/** Walls `a`, `b`, … along a polyline whose corners are the nodes `1`, `2`, …. */
export function polyline({ corners, names, t, material, unit }: PolylineWalls): Pick<WallTable, 'start' | 'walls'> {
  const [first = ['0', '0'], ...rest] = corners
  return {
    start: { x: typed(first[0], unit), y: typed(first[1], unit) },
    walls: rest.map(([x, y], index): WallInput => ({
      id: String.fromCharCode(97 + index), name: names[index] ?? '', from: String(index + 1), to: String(index + 2),
      end: { by: 'point', x: typed(x, unit), y: typed(y, unit) },
      t: typed(typeof t === 'string' ? t : t[index] ?? '', unit), material,
    })),
  }
}

export const corners = (nodes: string[], radius: string, make: JunctionInput['make'], unit: 'mm' | 'in'): JunctionInput[] =>
  nodes.map(node => ({ node, radius: typed(radius, unit), make }))

/** A material as the note's record of the same name holds it. */
export const fromRecord = (material: MaterialInput): MaterialInput => ({ ...material, record: named(material.id) })

/** All cases of a record or calculation that give this quantity. */
export const casesOf = (name: string, quantity: string): LoadingInput => ({ by: 'table', table: named(name), quantity })

export const factorsOf = (reason: string, more: Partial<FactorsInput> = {}): FactorsInput =>
  ({ ultimate: '1.5', fitting: '', casting: '', bearing: '', onLimit: false, divideUltimate: false, partial: false, reason, ...more })

export const declared = (more: Partial<DeclarationsInput> = {}): DeclarationsInput =>
  ({ fitting: false, repeated: false, cutOut: 'none', taper: null, layered: false, welded: false, ...more })

/** What every section kind asks beside its section. */
export const bar = (material: MaterialInput, loading: LoadingInput, factors: FactorsInput, more: Partial<BarInputs> = {}): BarInputs => ({
  materials: [fromRecord(material)], loading, length: null, twistAllowed: null, twistOrigin: '', factors, declarations: declared(), ...more,
})
