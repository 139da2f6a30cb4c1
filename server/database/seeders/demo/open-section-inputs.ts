/** Inputs of the demonstration's open sections, from few words. */
import type { JunctionInput, WallInput } from '#shared/calc/parts/wall-fields'
import type { LoadingInput } from '#shared/calc/parts/loading-fields'
import type { MaterialInput } from '#shared/calc/parts/material-fields'
import type { OpenSectionInputs } from '#shared/calc/kinds/open-section/schema'
import type { UnitId } from '#shared/units/units'
import type { DemoCase } from './load-cases'

const typed = (text: string, unit: UnitId) => ({ text, unit })

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
export function polyline({ corners, names, t, material, unit }: PolylineWalls): Pick<OpenSectionInputs, 'start' | 'walls'> {
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

/** One arc from the origin, leaving along `direction` and turning through `sweep`. */
export function arcWall(wall: { name: string, radius: string, sweep: string, direction: string, t: string, material: string }): Pick<OpenSectionInputs, 'start' | 'walls'> {
  return {
    start: { x: typed('0', 'mm'), y: typed('0', 'mm') },
    walls: [{
      id: 'a', name: wall.name, from: '1', to: '2', t: typed(wall.t, 'mm'), material: wall.material,
      end: { by: 'arc', radius: typed(wall.radius, 'mm'), sweep: typed(wall.sweep, '°'), direction: typed(wall.direction, '°') },
    }],
  }
}

export const corners = (nodes: string[], radius: string, make: JunctionInput['make'], unit: 'mm' | 'in'): JunctionInput[] =>
  nodes.map(node => ({ node, radius: typed(radius, unit), make }))

export const torqueCases = (cases: DemoCase[], unit: UnitId, temperatureUnit: '°C' | '°F'): LoadingInput => ({
  by: 'cases',
  cases: cases.map(({ id, title, source, value, temperature }) => ({ id, title, source, level: 'limit', torque: typed(value, unit), temperature: typed(temperature, temperatureUnit) })),
})

export const rateCases = (cases: DemoCase[], unit: UnitId): LoadingInput => ({
  by: 'rate',
  cases: cases.map(({ id, title, source, value, temperature }) => ({ id, title, source, level: 'limit', rate: typed(value, unit), temperature: typed(temperature, '°C') })),
})

export interface SectionWords {
  units: 'SI' | 'US'
  geometry: Pick<OpenSectionInputs, 'start' | 'walls'>
  junctions: JunctionInput[]
  material: MaterialInput
  loading: LoadingInput
  length?: string
  twistAllowed?: string
  twistOrigin?: string
  fitting?: string
  /** The basis works with partial factors; `factorReason` then quotes its paragraph. */
  partial?: boolean
  factorReason: string
  repeated?: boolean
}

/** Inputs of an open section with free ends. */
export function openSection(words: SectionWords): OpenSectionInputs {
  const unit = words.units === 'SI' ? 'mm' : 'in'
  return {
    units: words.units, ...words.geometry, junctions: words.junctions, materials: [words.material], loading: words.loading,
    length: words.length === undefined ? null : typed(words.length, unit),
    twistAllowed: words.twistAllowed === undefined ? null : typed(words.twistAllowed, '°'),
    twistOrigin: words.twistOrigin ?? '',
    factors: {
      ultimate: '1.5', fitting: words.fitting ?? '', casting: '', bearing: '', onLimit: words.fitting !== undefined,
      divideUltimate: false, partial: words.partial ?? false, reason: words.factorReason,
    },
    ends: 'free',
    declarations: { fitting: words.fitting !== undefined, repeated: words.repeated ?? false, cutOut: 'none', taper: null, layered: false, welded: false, builtIn: false },
  }
}
