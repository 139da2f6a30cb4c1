/**
 * The units a quantity may be typed and shown in, SI and US customary, and
 * their exact conversion to the engine's own: N, mm, MPa, rad, °C (and kg/m³
 * for density, which no formula of the engine mixes with the others).
 *
 * Every factor is exact by definition: 1 in = 25.4 mm, 1 lb = 0.45359237 kg,
 * standard gravity 9.80665 m/s². It is held as a ratio, so that the powers of
 * ten divide instead of multiplying by a rounded fraction.
 */

export type Dimension
  = | 'length' | 'area' | 'inertia' | 'warping' | 'sectorial' | 'force' | 'torque' | 'stress' | 'angle' | 'rateOfTwist'
    | 'temperature' | 'ratio' | 'density' | 'bimoment' | 'shearFlow' | 'torsionalStiffness' | 'margin' | 'number'
    | 'firstMoment' | 'distributedTorque' | 'rotationalStiffness' | 'warpingStiffness' | 'decay' | 'rateGradient'

/** Engine value = (typed value − offset) · multiply / divide. */
interface Conversion { readonly multiply: number, readonly divide: number, readonly offset?: number }

const per = (multiply: number, divide = 1): Conversion => ({ multiply, divide })

/** 1 in = 254/10 mm: as a ratio, 3/16 in is 4.7625 mm to the last bit. */
const inch = per(254, 10)
const poundForce = 4.4482216152605
const degree = Math.PI / 180

const areas = {
  'mm²': per(1),
  'cm²': per(100),
  'm²': per(1e6),
  'in²': per(64516, 100),
}
const momentsTimesLength = {
  'N·mm²': per(1),
  'N·m²': per(1e6),
  'kN·m²': per(1e9),
  'lbf·in²': per(2869.814657301463),
}
const plain = { '': per(1) }

const table = {
  length: { 'mm': per(1), 'cm': per(10), 'm': per(1000), 'in': inch, 'ft': per(3048, 10) },
  area: areas,
  inertia: { 'mm⁴': per(1), 'cm⁴': per(1e4), 'm⁴': per(1e12), 'in⁴': per(4162314256, 1e4) },
  warping: { 'mm⁶': per(1), 'cm⁶': per(1e6), 'in⁶': per(268535866540096, 1e6) },
  sectorial: areas,
  force: { 'N': per(1), 'kN': per(1000), 'lbf': per(poundForce), 'kip': per(4448.2216152605) },
  torque: {
    'N·mm': per(1),
    'N·m': per(1000),
    'kN·m': per(1e6),
    'lbf·in': per(112.9848290276167),
    'lbf·ft': per(1355.8179483314004),
    'kip·in': per(112984.8290276167),
    'kip·ft': per(1355817.9483314),
  },
  stress: {
    'MPa': per(1),
    'GPa': per(1000),
    'kPa': per(1, 1000),
    'hPa': per(1, 1e4),
    'Pa': per(1, 1e6),
    'N/mm²': per(1),
    'psi': per(0.006894757293168361),
    'ksi': per(6.894757293168361),
    'Msi': per(6894.757293168361),
  },
  angle: { 'rad': per(1), 'mrad': per(1, 1000), '°': per(degree) },
  rateOfTwist: {
    'rad/mm': per(1),
    'rad/m': per(1, 1000),
    'rad/in': per(10, 254),
    '°/mm': per(degree),
    '°/m': per(degree, 1000),
    '°/in': per(10 * degree, 254),
    '°/ft': per(10 * degree, 3048),
  },
  temperature: { '°C': per(1), '°F': { multiply: 1, divide: 1.8, offset: 32 }, 'K': { multiply: 1, divide: 1, offset: 273.15 } },
  ratio: { '': per(1), '%': per(1, 100) },
  density: { 'kg/m³': per(1), 'g/cm³': per(1000), 'lb/in³': per(27679.904710203), 'lb/ft³': per(0.45359237, 0.028316846592), 'slug/ft³': per(14.593902937206364, 0.028316846592) },
  bimoment: momentsTimesLength,
  shearFlow: { 'N/mm': per(1), 'N/m': per(1, 1000), 'kN/m': per(1), 'lbf/in': per(0.1751268352464764) },
  torsionalStiffness: momentsTimesLength,
  margin: plain,
  number: plain,
  /** Torsional modulus, statical moment. */
  firstMoment: { 'mm³': per(1), 'cm³': per(1000), 'in³': per(16387064, 1000) },
  distributedTorque: { 'N·mm/mm': per(1), 'N·m/m': per(1), 'kN·m/m': per(1000), 'lbf·in/in': per(poundForce), 'lbf·ft/ft': per(poundForce) },
  /** Torque per angle of a torsional spring. */
  rotationalStiffness: { 'N·mm/rad': per(1), 'N·m/rad': per(1000), 'kN·m/rad': per(1e6), 'N·m/°': per(1000 * 180, Math.PI), 'lbf·in/rad': per(112.9848290276167) },
  /** Bimoment per rate of twist of a spring against warping. */
  warpingStiffness: { 'N·mm³/rad': per(1), 'N·m³/rad': per(1e9), 'lbf·in³/rad': per(72893.29229545717) },
  decay: { '1/mm': per(1), '1/m': per(1, 1000), '1/in': per(10, 254) },
  /** Change of the rate of twist along the bar, φ″. */
  rateGradient: { 'rad/mm²': per(1), 'rad/m²': per(1, 1e6), '°/m²': per(degree, 1e6), 'rad/in²': per(100, 64516) },
} as const satisfies Record<Dimension, Record<string, Conversion>>

type Table = typeof table

/** The units of one dimension: `UnitOf<'torque'>` refuses `'MPa'` at compile time. */
export type UnitOf<D extends Dimension> = D extends Dimension ? keyof Table[D] & string : never
export type UnitId = { [D in Dimension]: UnitOf<D> }[Dimension]

/**
 * A unit beside its dimension, in one call: a unit that is known when compiling must fit (`'MPa'` beside `'torque'`
 * does not compile); one that is known only when running, because somebody chose it, may be any.
 */
export type FittingUnit<D extends Dimension, U extends UnitId> = U & (UnitId extends U ? UnitId : UnitOf<D>)

export const dimensions = Object.keys(table) as Dimension[]

const conversions = new Map<string, Conversion>()
const homes = new Map<string, Dimension>()
for (const dimension of dimensions) {
  for (const [unit, conversion] of Object.entries<Conversion>(table[dimension])) {
    conversions.set(unit, conversion)
    if (!homes.has(unit)) homes.set(unit, dimension)
  }
}
// The empty unit belongs to four dimensions; a bare number is what it is when nothing else is known.
homes.set('', 'number')

/** The unit of each dimension that the engine computes in. */
const engineUnits = {
  length: 'mm', area: 'mm²', inertia: 'mm⁴', warping: 'mm⁶', sectorial: 'mm²', force: 'N', torque: 'N·mm', stress: 'MPa',
  angle: 'rad', rateOfTwist: 'rad/mm', temperature: '°C', ratio: '', density: 'kg/m³', bimoment: 'N·mm²', shearFlow: 'N/mm',
  torsionalStiffness: 'N·mm²', margin: '', number: '', firstMoment: 'mm³', distributedTorque: 'N·mm/mm', rotationalStiffness: 'N·mm/rad',
  warpingStiffness: 'N·mm³/rad', decay: '1/mm', rateGradient: 'rad/mm²',
} as const satisfies { [D in Dimension]: UnitOf<D> }

/** The unit in which the engine holds this dimension. */
export function engineUnit(dimension: Dimension): UnitId {
  return engineUnits[dimension]
}

/** The units of a dimension, the engine's own first. */
export function unitsOf(dimension: Dimension): UnitId[] {
  return Object.keys(table[dimension]) as UnitId[]
}

/** Whether a stored text is one of the unit symbols, spelt as shown. */
export function isUnit(text: string): text is UnitId {
  return conversions.has(text)
}

/** Whether the unit may carry this dimension (`mm²` carries an area and a sectorial coordinate). */
export function unitFits(unit: UnitId, dimension: Dimension): boolean {
  return Object.hasOwn(table[dimension], unit)
}

/** The first dimension the unit carries; where two share it, ask `unitFits`. */
export function dimensionOf(unit: UnitId): Dimension {
  const dimension = homes.get(unit)
  if (!dimension) throw new Error(`Unknown unit: ${unit}`)
  return dimension
}

function conversionOf(unit: UnitId): Conversion {
  const conversion = conversions.get(unit)
  if (!conversion) throw new Error(`Unknown unit: ${unit}`)
  return conversion
}

/** From the typed unit to engine units. Temperatures are points on their scale; for differences see `intervalToEngine`. */
export function toEngine(value: number, unit: UnitId): number {
  const { multiply, divide, offset = 0 } = conversionOf(unit)
  return (value - offset) * multiply / divide
}

/** From engine units to the unit shown. */
export function fromEngine(value: number, unit: UnitId): number {
  const { multiply, divide, offset = 0 } = conversionOf(unit)
  return value * divide / multiply + offset
}

/** A difference of two values: the zero of the scale plays no part (a rise of 18 °F is 10 °C). */
export function intervalToEngine(difference: number, unit: UnitId): number {
  const { multiply, divide } = conversionOf(unit)
  return difference * multiply / divide
}

/** The engine's difference in the unit shown. */
export function intervalFromEngine(difference: number, unit: UnitId): number {
  const { multiply, divide } = conversionOf(unit)
  return difference * divide / multiply
}
