/**
 * Stored inputs of an open section: what a person typed (text and unit), names and choices.
 * Nothing here is a converted number: the server parses the typed text at every evaluation.
 *
 * Geometry: the first wall starts at `start`; every other wall starts or ends at a node that another
 * wall has placed. Directions are degrees from +x, counter-clockwise; a sweep is positive counter-clockwise.
 */
import { z } from 'zod'
import { isUnit, type UnitId } from '#shared/units/units'

export const MAX_WALLS = 60
export const MAX_CASES = 200
export const MAX_MATERIALS = 20
export const MAX_KNOCKDOWN = 20

const typedText = z.string().max(40)
const unit = z.custom<UnitId>(value => typeof value === 'string' && isUnit(value), 'Choose one of the listed units.')
export const typedQuantity = z.strictObject({ text: typedText, unit })
/** Names that appear in output keys and in equations: plain letters, digits and a few joining signs. */
const identifier = z.string().regex(/^[A-Za-z0-9][A-Za-z0-9._+/-]{0,19}$/, 'Use up to 20 letters, digits, dots, dashes or slashes.')
const name = z.string().max(80)
const source = z.string().max(240)
const paragraph = z.string().max(2000)
/** A pure number, typed: kept as text like every other input. */
const typedNumber = z.string().max(20)

const wallEnd = z.discriminatedUnion('by', [
  z.strictObject({ by: z.literal('point'), x: typedQuantity, y: typedQuantity }),
  z.strictObject({ by: z.literal('length'), length: typedQuantity, direction: typedQuantity }),
  z.strictObject({ by: z.literal('arc'), radius: typedQuantity, sweep: typedQuantity, direction: typedQuantity }),
])

const wall = z.strictObject({
  id: identifier, name, from: identifier, to: identifier, end: wallEnd, t: typedQuantity, material: identifier,
})

/** Inside radius at a node where walls meet: a machined fillet, or the inside radius of a bend. */
const junction = z.strictObject({ node: identifier, radius: typedQuantity, make: z.enum(['machined', 'bent']) })

const material = z.strictObject({
  id: identifier,
  name,
  specification: source,
  form: name,
  thicknessRange: name,
  /** Aluminium alloys need a knock-down above 70 °C; others are judged by their own range. */
  family: z.enum(['aluminium', 'other']),
  basis: z.enum(['A', 'B', 'S', 'none']),
  loadPath: z.enum(['single', 'redundant']),
  source,
  edition: name,
  E: typedQuantity,
  G: typedQuantity,
  nu: typedQuantity,
  Ftu: typedQuantity.nullable(),
  Fty: typedQuantity.nullable(),
  Fsu: typedQuantity.nullable(),
  /** Where absent, yield in shear is taken as Fty divided by the square root of three. */
  Fsy: typedQuantity.nullable(),
  temperatureFrom: typedQuantity.nullable(),
  temperatureTo: typedQuantity.nullable(),
  /** Factor on all strengths against temperature, linear between points. */
  knockdown: z.array(z.strictObject({ temperature: typedQuantity, factor: typedNumber })).max(MAX_KNOCKDOWN),
  knockdownSource: source,
})

const level = z.enum(['limit', 'ultimate'])
const caseHead = { id: identifier, title: name, source, level, temperature: typedQuantity.nullable() }
const loading = z.discriminatedUnion('by', [
  z.strictObject({ by: z.literal('torque'), torque: typedQuantity, level, temperature: typedQuantity.nullable(), source }),
  z.strictObject({ by: z.literal('cases'), cases: z.array(z.strictObject({ ...caseHead, torque: typedQuantity })).max(MAX_CASES) }),
  z.strictObject({ by: z.literal('rate'), cases: z.array(z.strictObject({ ...caseHead, rate: typedQuantity })).max(MAX_CASES) }),
])

const factors = z.strictObject({
  /** Factor of safety from limit to ultimate. */
  ultimate: typedNumber,
  /** Special factors, empty where none applies; the highest one is used, never the product. */
  fitting: typedNumber,
  casting: typedNumber,
  bearing: typedNumber,
  /** Whether the special factor acts at limit too. */
  onLimit: z.boolean(),
  /** A case given at ultimate may be divided by the factor of safety for the yield and twist checks. */
  divideUltimate: z.boolean(),
  /** The basis works with partial factors; `reason` then carries its paragraph. */
  partial: z.boolean(),
  reason: paragraph,
})

const declarations = z.strictObject({
  /** The section is a fitting, or carries one, not proven by test. */
  fitting: z.boolean(),
  /** The load is repeated. */
  repeated: z.boolean(),
  /** A hole, cut-out or slot in the length, and whether it lies where the stress peaks. */
  cutOut: z.enum(['none', 'away from the peak', 'at the peak']),
  /** Half-angle of taper along the bar. */
  taper: typedQuantity.nullable(),
  layered: z.boolean(),
  welded: z.boolean(),
  /** A support is built in, or holds the section in twist by more than a point. */
  builtIn: z.boolean(),
})

export const openSectionSchema = z.strictObject({
  units: z.enum(['SI', 'US']),
  start: z.strictObject({ x: typedQuantity, y: typedQuantity }),
  walls: z.array(wall).max(MAX_WALLS),
  junctions: z.array(junction).max(MAX_WALLS),
  materials: z.array(material).max(MAX_MATERIALS),
  loading,
  length: typedQuantity.nullable(),
  twistAllowed: typedQuantity.nullable(),
  twistOrigin: source,
  factors,
  ends: z.enum(['free', 'restrained', 'unknown']),
  declarations,
})

export type OpenSectionInputs = z.infer<typeof openSectionSchema>
export type WallInput = OpenSectionInputs['walls'][number]
export type WallEndInput = WallInput['end']
export type JunctionInput = OpenSectionInputs['junctions'][number]
export type MaterialInput = OpenSectionInputs['materials'][number]
export type LoadingInput = OpenSectionInputs['loading']
