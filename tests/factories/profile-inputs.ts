/** Open sections that are given by a profile: the demonstration's hat, a rolled-size tee, a zed in inches and a slit tube. Each call makes a fresh object. */
import type { OpenSectionInputs } from '#shared/calc/kinds/open-section/schema'
import { profileShapeNames, type ProfileInput, type ProfileShape } from '#shared/calc/parts/profile-fields'
import { dimensionsOf } from '#shared/calc/parts/parse-profile'
import { hatInputs, quantity, stripInputs } from './open-section'

const mm = (text: string) => quantity(text, 'mm')
const inch = (text: string) => quantity(text, 'in')

/** The hat of the demonstration: 15 + 28 + 15 mm wide walls, webs 6 mm out over 30 mm of height. */
export function hatProfile(): Extract<ProfileInput, { shape: 'hat' }> {
  return {
    shape: 'hat', material: 'QM-101', measured: 'mid-line', make: 'bent', radius: mm('3.2'),
    brim: mm('15'), height: mm('30'), crown: mm('28'), lean: quantity('11.309932474020213', '°'), tBrim: mm('1.6'), tWeb: mm('1.6'), tCrown: mm('1.6'),
  }
}
export const hatProfileInputs = (): OpenSectionInputs => ({ ...hatInputs(), walls: [], junctions: [], profile: hatProfile() })

const withProfile = (profile: ProfileInput): OpenSectionInputs => ({ ...stripInputs(), profile })

export const teeProfileInputs = (): OpenSectionInputs => withProfile({
  shape: 'tee', material: 'QM-107', measured: 'outside', make: 'machined', radius: mm('3'), flange: mm('60'), height: mm('45'), tFlange: mm('4'), tStem: mm('3'),
})

export const zedProfileInputs = (): OpenSectionInputs => ({
  ...withProfile({
    shape: 'zed', material: 'QM-107', measured: 'inside', make: 'bent', radius: inch('0.16'),
    lower: inch('0.9'), height: inch('2.1'), upper: inch('0.8'), tLower: inch('0.063'), tWeb: inch('0.063'), tUpper: inch('0.063'),
  }), units: 'US',
})

export const slitTubeProfileInputs = (): OpenSectionInputs => withProfile({ shape: 'slit tube', material: 'QM-107', measured: 'outside', diameter: mm('62'), t: mm('2') })

/** A profile of every shape with plausible dimensions: lengths 60, lips and caps 12, walls 2, corners 3 mm, angles as they come. */
export function profileOf(shape: ProfileShape, measured: ProfileInput['measured'] = 'outside'): ProfileInput {
  const value = (key: string) => (key === 'lean' ? quantity('10', '°') : key === 'angle' ? quantity('250', '°') : mm(/^t(?:[A-Z]|$)/.test(key) ? '2' : key === 'radius' && shape !== 'arc' ? '3' : key === 'lip' || key === 'cap' ? '12' : '60'))
  const branched = shape === 'tee' || shape === 'I' || shape === 'J'
  return {
    shape, material: 'QM-107', measured, ...(shape === 'arc' || shape === 'slit tube' ? {} : { make: branched ? 'machined' : 'bent' }),
    ...Object.fromEntries(dimensionsOf(shape).map(({ key }) => [key, value(key)])),
  } as ProfileInput
}
export const everyProfile = (): ProfileInput[] => profileShapeNames.map(shape => profileOf(shape))
