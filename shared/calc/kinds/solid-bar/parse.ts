import { noLinks, type Links } from '#shared/calc/links'
import { materialNamed, parseBar, type BarModel, type ParsedModel } from '#shared/calc/parts/bar-fields'
import type { MaterialModel, Measured, Refused, Unusual } from '#shared/calc/parts/model'
import { schemaFaults } from '#shared/calc/parts/schema-faults'
import { typedReader, type Rule, type TypedReader } from '#shared/calc/parts/typed-reader'
import { solidBarSchema, type ShapeInput } from '#shared/calc/kinds/solid-bar/schema'
import type { Solid } from '#shared/torsion/solids/solid'
import type { TypedQuantity } from '#shared/calc/types'

/** A dimension with the symbol it has in the working and the words it has on the sketch. */
export interface Size { symbol: string, label: string, measured: Measured }

export interface SolidBarModel {
  units: 'SI' | 'US'
  solid: Solid
  sizes: Size[]
  material: MaterialModel
  bar: BarModel
  refused: Refused[]
  unusual: Unusual[]
}

export function parseSolidBar(value: unknown, links: Links = noLinks): ParsedModel<SolidBarModel> {
  const checked = solidBarSchema.safeParse(value)
  if (!checked.success) return { ok: false, faults: schemaFaults(checked.error) }
  const inputs = checked.data
  const read = typedReader(links)
  const shape = readShape(inputs.shape, read)
  const bar = parseBar(inputs, read)
  const material = bar && materialNamed(inputs.material, 'material', 'the bar', inputs, bar.materials, read)
  if (!shape || !bar || !material || read.faults.length > 0) return { ok: false, faults: read.faults }
  return { ok: true, model: { units: inputs.units, ...shape, material, bar, refused: read.refused, unusual: read.unusual } }
}

function readShape(input: ShapeInput, read: TypedReader): { solid: Solid, sizes: Size[] } | null {
  const sizes: Size[] = []
  const size = (typed: TypedQuantity, field: string, symbol: string, label: string, how: 'positive' | 'number' = 'positive', dimension: Rule['dimension'] = 'length'): number => {
    const rule: Rule = dimension === 'length' ? { label, dimension, typical: 'radius' } : { label, dimension }
    const measured = read[how](typed, `shape.${field}`, rule)
    if (measured) sizes.push({ symbol, label, measured })
    return measured?.value ?? Number.NaN
  }
  const solid = solidOf(input, size, (text, field) => read.number({ text, unit: '' }, `shape.${field}`, { label: 'the ratio of the hole', dimension: 'ratio' })?.value ?? Number.NaN)
  return read.faults.some(({ path }) => path.startsWith('shape.')) ? null : { solid, sizes }
}

type ReadSize = (typed: TypedQuantity, field: string, symbol: string, label: string, how?: 'positive' | 'number', dimension?: Rule['dimension']) => number

function solidOf(input: ShapeInput, size: ReadSize, ratio: (text: string, field: string) => number): Solid {
  switch (input.by) {
    case 'circle': return { shape: 'circle', outerRadius: size(input.radius, 'radius', 'R', 'the radius'), innerRadius: 0 }
    case 'tube': return { shape: 'circle', outerRadius: size(input.outer, 'outer', 'R_o', 'the outside radius'), innerRadius: size(input.inner, 'inner', 'R_i', 'the inside radius', 'number') }
    case 'ellipse': return { shape: 'ellipse', semiMajor: size(input.major, 'major', 'a', 'the semi-axis along x'), semiMinor: size(input.minor, 'minor', 'b', 'the semi-axis along y'), ratio: 0 }
    case 'hollow-ellipse': return { shape: 'ellipse', semiMajor: size(input.major, 'major', 'a', 'the semi-axis along x'), semiMinor: size(input.minor, 'minor', 'b', 'the semi-axis along y'), ratio: ratio(input.ratio, 'ratio') }
    case 'rectangle': return { shape: 'rectangle', width: size(input.width, 'width', 'a', 'the width'), height: size(input.height, 'height', 'b', 'the height') }
    case 'equilateral': return { shape: 'equilateral triangle', side: size(input.side, 'side', 'a', 'the side') }
    case 'isosceles': return { shape: 'right isosceles triangle', leg: size(input.leg, 'leg', 'a', 'the leg') }
    case 'sector': return { shape: 'sector', radius: size(input.radius, 'radius', 'R', 'the radius'), angle: size(input.angle, 'angle', '\\alpha', 'the included angle', 'positive', 'angle') }
    case 'semicircle': return { shape: 'semicircle', radius: size(input.radius, 'radius', 'R', 'the radius') }
    case 'segment': return { shape: 'segment', radius: size(input.radius, 'radius', 'R', 'the radius'), depth: size(input.depth, 'depth', 'h', 'the depth of the flat', 'number') }
    default: return { shape: input.sides, flats: size(input.flats, 'flats', 'd', 'twice the apothem') }
  }
}
