import type { OpenSectionInputs } from '#shared/calc/kinds/open-section/schema'
import { dimensionsOf } from '#shared/calc/parts/parse-profile'
import type { ProfileInput, ProfileShape } from '#shared/calc/parts/profile-fields'
import type { WallTable } from '#shared/calc/parts/wall-fields'
import { lengthUnit } from '~/editor/open-section-edits'

/** Three walls that meet are joined by no bend. */
const BRANCHED: ProfileShape[] = ['tee', 'I', 'J']

/** A profile of this shape with its dimensions empty; what the shape before it had under the same name stays. */
export function profileFor(shape: ProfileShape, inputs: OpenSectionInputs): ProfileInput {
  const before = new Map<string, unknown>(Object.entries(inputs.profile ?? {}))
  const unit = lengthUnit(inputs)
  const blank = (key: string, angle: boolean) => (angle ? { text: key === 'lean' ? '0' : '', unit: '°' } : { text: '', unit })
  const dimensions = dimensionsOf(shape).map(({ key, angle }) => [key, before.get(key) ?? blank(key, angle)])
  const round = shape === 'arc' || shape === 'slit tube'
  const make = BRANCHED.includes(shape) ? 'machined' : before.get('make') ?? 'bent'
  return {
    shape, material: before.get('material') ?? inputs.walls[0]?.material ?? inputs.materials[0]?.id ?? 'M1', measured: before.get('measured') ?? 'outside',
    ...(round ? {} : { make }), ...Object.fromEntries(dimensions),
  } as ProfileInput
}

/** The walls of the profile take its place. */
export function editedAsWalls({ profile: _replaced, ...inputs }: OpenSectionInputs, table: WallTable): OpenSectionInputs {
  return { ...inputs, ...table }
}

/** The wall table that rested is read again. */
export const withoutProfile = ({ profile: _removed, ...inputs }: OpenSectionInputs): OpenSectionInputs => inputs
