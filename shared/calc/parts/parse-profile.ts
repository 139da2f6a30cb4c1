/** Reads a profile and places its walls, with what the conversion to the mid-line was. */
import type { TypedQuantity } from '#shared/calc/types'
import type { MaterialModel, Measured } from '#shared/calc/parts/model'
import type { Geometry } from '#shared/calc/parts/parse-walls'
import { profileShapes, type ProfileInput } from '#shared/calc/parts/profile-fields'
import type { FieldMeta } from '#shared/calc/parts/fields'
import type { TypedReader } from '#shared/calc/parts/typed-reader'
import type { ModelWall } from '#shared/calc/parts/wall-model'
import type { Moduli, Profile, ProfileSection } from '#shared/torsion/profiles/profile'
import { sectionOfProfile } from '#shared/torsion/profiles/section-of-profile'

/** The profile beside the section that was made of it, for the working. */
export interface ProfileModel {
  shape: ProfileInput['shape']
  measured: ProfileInput['measured']
  /** Every dimension as typed, with its symbol. */
  dimensions: { symbol: string, measured: Measured, angle: boolean }[]
  lines: ProfileSection['lines']
}

/** A dimension of a shape: the key it is stored under, and what its field says of itself. */
export interface ProfileDimension { key: string, title: string, symbol: string, help: string | null, angle: boolean }

export function dimensionsOf(shape: ProfileInput['shape']): ProfileDimension[] {
  return Object.entries(profileShapes[shape]).flatMap(([key, schema]): ProfileDimension[] => {
    const meta: Partial<FieldMeta> = schema.meta() ?? {}
    return meta.dimension === undefined ? [] : [{ key, title: meta.title ?? key, symbol: meta.symbol ?? key, help: meta.description ?? null, angle: meta.dimension === 'angle' }]
  })
}

/** Only these may be zero: a sharp corner, an upright web. */
const mayBeZero = (shape: ProfileInput['shape'], key: string) => key === 'lean' || (key === 'radius' && shape !== 'arc')

function readDimension(typed: TypedQuantity, { key, title, angle }: ProfileDimension, shape: ProfileInput['shape'], read: TypedReader): Measured | null {
  const label = `the ${title.charAt(0).toLowerCase()}${title.slice(1)}`
  const path = `profile.${key}`
  if (!mayBeZero(shape, key)) return read.positive(typed, path, { label, dimension: angle ? 'angle' : 'length', ...(angle ? {} : { typical: key.startsWith('t') ? 'thickness' as const : 'wall length' as const }) })
  const value = read.number(typed, path, { label, dimension: angle ? 'angle' : 'length', ...(angle ? {} : { typical: 'radius' as const }) })
  if (value && value.value < 0) {
    read.fault(path, `G-01: ${label} must not be negative; “${value.typed}” is.`)
    return null
  }
  return value
}

/** Where a refusal of the engine belongs: the dimension with that symbol, or the profile as a whole. */
function placeOf(at: string | undefined, profile: ProfileInput): string {
  if (at === 'make') return 'profile.make'
  const found = dimensionsOf(profile.shape).find(({ symbol }) => symbol === at)
  return found ? `profile.${found.key}` : 'profile'
}

/** What a profile makes of its typed dimensions. */
export interface MadeProfile { made: ProfileSection, dimensions: (ProfileDimension & { value: Measured })[] }

/** Null where a fault was noted. */
export function readProfile(profile: ProfileInput, moduli: Moduli, read: TypedReader): MadeProfile | null {
  const typed = profile as Record<string, unknown>
  const dimensions = dimensionsOf(profile.shape).flatMap((one) => {
    const value = readDimension(typed[one.key] as TypedQuantity, one, profile.shape, read)
    return value ? [{ ...one, value }] : []
  })
  if (dimensions.length < dimensionsOf(profile.shape).length) return null
  const numbers = Object.fromEntries(dimensions.map(({ key, value }) => [key, value.value]))
  // The schema of the shape asks for exactly the dimensions that the engine's profile of that shape has.
  const asked = { shape: profile.shape, measured: profile.measured, ...('make' in profile ? { make: profile.make } : {}), ...numbers } as unknown as Profile
  const made = sectionOfProfile(asked, moduli)
  if (made.ok) return { made, dimensions }
  read.fault(placeOf(made.at, profile), made.reason)
  return null
}

export type ParsedProfile = Geometry & { profile: ProfileModel }

/** Null where a fault was noted. */
export function parseProfile(profile: ProfileInput, inputs: { materials: readonly { id: string }[] }, materials: readonly MaterialModel[], read: TypedReader): ParsedProfile | null {
  const material = materials.find(m => m.id === profile.material)
  if (!inputs.materials.some(m => m.id === profile.material)) read.fault('profile.material', 'Choose the material of the profile.')
  // Moduli change nothing about where the walls lie, so that a missing one hides no fault of the dimensions.
  const got = readProfile(profile, { G: material?.G ?? 1, ...(material?.E ? { E: material.E } : {}) }, read)
  if (!got || !material || read.faults.length > 0) return null
  const { made, dimensions } = got
  return {
    ...geometryOf(made, dimensions, material),
    profile: { shape: profile.shape, measured: profile.measured, lines: made.lines, dimensions: dimensions.map(({ symbol, value, angle }) => ({ symbol, measured: value, angle })) },
  }
}

/** The dimension a thickness came from. */
export const thicknessOf = <Dimension extends { key: string, value: Measured }>(t: number, dimensions: readonly Dimension[]): Dimension | undefined =>
  dimensions.find(({ key, value }) => /^t(?:[A-Z]|$)/.test(key) && value.value === t)

function geometryOf({ section, names }: ProfileSection, dimensions: MadeProfile['dimensions'], material: MaterialModel): Geometry {
  const at = (id: string) => section.nodes.find(node => node.id === id) ?? { x: 0, y: 0 }
  const walls = section.walls.map((wall): ModelWall => {
    const [a, b] = [at(wall.from), at(wall.to)]
    const straight = Math.atan2(b.y - a.y, b.x - a.x)
    const arc = wall.arc && { radius: wall.arc.radius, sweep: wall.arc.sweep, direction: wall.arc.startDirection ?? straight - wall.arc.sweep / 2 }
    return {
      id: wall.id, name: names[wall.id] ?? '', from: wall.from, to: wall.to, material, G: wall.G, E: material.E,
      t: thicknessOf(wall.t, dimensions)?.value ?? { value: wall.t, unit: 'mm', typed: String(wall.t) }, tEnd: null, tMax: wall.t,
      length: arc ? arc.radius * Math.abs(arc.sweep) : Math.hypot(b.x - a.x, b.y - a.y), lengthTyped: null,
      startDirection: arc ? arc.direction : straight, endDirection: arc ? arc.direction + arc.sweep : straight, ...(arc ? { arc } : {}),
    }
  })
  const radius = dimensions.find(({ key }) => key === 'radius')?.value
  const junctions = radius ? section.junctions.map(({ node, make }) => ({ node, make, radius })) : []
  return { nodes: section.nodes.map(node => ({ ...node })), walls, junctions, seams: [] }
}
