/** Open sections given by a profile: the same results as the same section typed as walls, and every fault at its dimension. */
import { describe, expect, it } from 'vitest'
import { z } from 'zod'
import { evaluateOpenSection } from '#shared/calc/kinds/open-section/evaluate'
import { openSectionSchema, type OpenSectionInputs } from '#shared/calc/kinds/open-section/schema'
import type { ProfileInput } from '#shared/calc/parts/profile-fields'
import { profileTable } from '#shared/calc/walls/profile-table'
import { hatInputs, quantity, stripInputs } from '../../../../factories/open-section'
import { everyProfile, hatProfile, hatProfileInputs, profileOf, teeProfileInputs, zedProfileInputs } from '../../../../factories/profile-inputs'

function resultOf(inputs: OpenSectionInputs) {
  const evaluation = evaluateOpenSection(inputs)
  if (!evaluation.ok) throw new Error(evaluation.faults.map(f => `${f.path}: ${f.message}`).join('; '))
  return evaluation.result
}
const outputs = (inputs: OpenSectionInputs) => new Map(resultOf(inputs).outputs.map(o => [o.key, o.value]))
const faultsOf = (profile: ProfileInput) => {
  const evaluation = evaluateOpenSection({ ...stripInputs(), profile })
  return evaluation.ok ? [] : evaluation.faults
}
/** The stored inputs after the walls of the profile were taken over. */
function asWalls(inputs: OpenSectionInputs): OpenSectionInputs {
  const { profile, ...rest } = inputs
  const table = profile && profileTable(profile, inputs.units === 'SI' ? 'mm' : 'in')
  if (!table) throw new Error('no table')
  return { ...rest, ...table }
}

describe('an open section by its profile', () => {
  it('gives what its walls typed by hand give', () => {
    const [typed, made] = [outputs(hatInputs()), outputs(hatProfileInputs())]
    for (const key of ['J', 'GJ', 'A', 'Gamma', 'Ixx', 'developed', 'tau_max@S10', 'share:c', 'Kc:3']) expect(made.get(key)! / typed.get(key)!, key).toBeCloseTo(1, 10)
  })

  it('measures over the faces: flange 60 × 4 and stem 45 − 4/2 by 3 mm, added up by hand', () => {
    const made = outputs(teeProfileInputs())
    expect(made.get('L:c')).toBeCloseTo(43, 12)
    expect(made.get('J_plain')).toBeCloseTo((60 * 4 ** 3 + 43 * 3 ** 3) / 3, 9)
  })

  it('shows the conversion in its working, and none for what was measured on the mid-line', () => {
    const conversion = (inputs: OpenSectionInputs) => resultOf(inputs).working.find(step => step.heading.includes('dimensions to the mid-line'))
    expect(conversion(teeProfileInputs())?.lines).toEqual([{ symbols: 'h_m = h - \\tfrac12\\,t_f', numbers: '45\\,\\mathrm{mm} - \\tfrac12\\,4\\,\\mathrm{mm}', result: '43\\,\\mathrm{mm}' }])
    expect(conversion(zedProfileInputs())?.lines).toHaveLength(3)
    expect(conversion(hatProfileInputs())).toBeUndefined()
  })

  it.each(everyProfile().map(profile => [profile.shape, profile] as const))('becomes a wall table with the same results: %s', (_, profile) => {
    const inputs = { ...stripInputs(), profile }
    const [made, walls] = [outputs(inputs), outputs(asWalls(inputs))]
    for (const key of ['J', 'J_bulge', 'A', 'Gamma', 'tau_max@T', 'tau_corner@T', 'developed']) {
      const [a, b] = [made.get(key), walls.get(key)]
      if (a === undefined || b === undefined) expect(b, key).toBe(a)
      else expect(Math.abs(a - b), key).toBeLessThanOrEqual(1e-8 * Math.max(Math.abs(a), 1e-12))
    }
  })

  it('keeps inches and what was typed when it becomes a wall table', () => {
    const table = asWalls(zedProfileInputs())
    expect(table.profile).toBeUndefined()
    expect(table.walls.map(wall => wall.t)).toEqual(Array.from({ length: 3 }, () => quantity('0.063', 'in')))
    // Clear 2.1 and two halves of 0.063.
    expect(table.walls[1]?.end).toEqual({ by: 'length', length: quantity('2.163', 'in'), direction: quantity('90', '°') })
    expect(table.junctions.map(each => each.radius.text)).toEqual(['0.16', '0.16'])
  })

  it('lets the wall table rest while a profile stands', () => {
    const resting = { ...hatProfileInputs(), walls: stripInputs().walls, start: { x: quantity('nonsense', 'mm'), y: quantity('', 'mm') } }
    expect(outputs(resting).get('J')).toBe(outputs(hatProfileInputs()).get('J'))
  })
})

describe('faults of a profile', () => {
  it.each([
    ['an empty dimension', { ...hatProfile(), height: quantity('', 'mm') }, 'profile.height', /^Give the height/],
    ['no number', { ...hatProfile(), crown: quantity('wide', 'mm') }, 'profile.crown', /./],
    ['zero thickness', { ...hatProfile(), tWeb: quantity('0', 'mm') }, 'profile.tWeb', /greater than zero/],
    ['a negative radius', { ...hatProfile(), radius: quantity('-1', 'mm') }, 'profile.radius', /must not be negative/],
    ['a radius that does not fit', { ...hatProfile(), radius: quantity('30', 'mm') }, 'profile.radius', /too large/],
    ['two sheets in one bend', { ...hatProfile(), tCrown: quantity('2', 'mm') }, 'profile.make', /one sheet/],
    ['a web that lies down', { ...hatProfile(), lean: quantity('80', '°') }, 'profile.lean', /lean/],
    ['walls thicker than the height', { ...profileOf('channel'), make: 'machined', height: quantity('2', 'mm') } as ProfileInput, 'profile.height', /no longer than/],
    ['lips that close the section', { ...profileOf('lipped channel'), lip: quantity('40', 'mm') } as ProfileInput, 'profile.lip', /Shorten the lips/],
    ['a material that is none', { ...hatProfile(), material: 'Z' }, 'profile.material', /material of the profile/],
  ] as [string, ProfileInput, string, RegExp][])('%s stands at its field', (_, profile, path, message) => {
    const inputs = { ...profile, material: profile.material === 'Z' ? 'Z' : 'QM-107' }
    const found = faultsOf(inputs).find(fault => fault.path === path)
    expect(found?.message).toMatch(message)
  })

  it('refuses a dimension that the shape does not have, and is published as JSON Schema', () => {
    expect(openSectionSchema.safeParse({ ...stripInputs(), profile: { ...hatProfile(), diameter: quantity('3', 'mm') } }).success).toBe(false)
    expect(JSON.stringify(z.toJSONSchema(openSectionSchema))).toContain('Lean of the webs')
  })
})
