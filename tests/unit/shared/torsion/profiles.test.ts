/** Profiles: one section from three ways of measuring, what is refused, and that random ones keep their laws. */
import { describe, expect, it } from 'vitest'
import fc from 'fast-check'
import type { MeasuredOn, Profile } from '#shared/torsion/profiles/profile'
import { given } from '../../../reference/engine'
import { sectionOfProfile } from '#shared/torsion/profiles/section-of-profile'
import { torsionOfOpenSection } from '#shared/torsion/open-section'
import { sectorialProperties } from '#shared/torsion/sectorial'

const moduli = { G: 26_900, E: 71_000 }
const made = (profile: Profile) => given(sectionOfProfile(profile, moduli))
const reason = (profile: Profile): string => {
  const result = sectionOfProfile(profile, moduli)
  return result.ok ? 'was made' : result.reason
}

const length = fc.double({ min: 25, max: 120, noNaN: true })
const t = fc.double({ min: 0.5, max: 4, noNaN: true })
const corners = { make: fc.constant('machined' as const), radius: fc.double({ min: 0, max: 3, noNaN: true }), measured: fc.constantFrom<MeasuredOn>('outside', 'inside', 'mid-line') }
const three = { lower: length, height: length, upper: length, tLower: t, tWeb: t, tUpper: t }
const profiles: fc.Arbitrary<Profile> = fc.oneof(
  fc.record({ shape: fc.constant('angle' as const), ...corners, width: length, height: length, tWidth: t, tHeight: t }),
  fc.record({ shape: fc.constant('tee' as const), ...corners, flange: length, height: length, tFlange: t, tStem: t }),
  fc.record({ shape: fc.constantFrom('channel' as const, 'zed' as const), ...corners, ...three }),
  fc.record({ shape: fc.constant('I' as const), ...corners, ...three }),
  fc.record({ shape: fc.constant('hat' as const), ...corners, brim: length, height: length, crown: length, lean: fc.double({ min: 0, max: 0.5, noNaN: true }), tBrim: t, tWeb: t, tCrown: t }),
  fc.record({ shape: fc.constant('lipped channel' as const), ...corners, lip: fc.double({ min: 10, max: 20, noNaN: true }), flange: length, height: fc.double({ min: 60, max: 120, noNaN: true }), tLip: t, tFlange: t, tWeb: t }),
  fc.record({ shape: fc.constant('J' as const), ...corners, base: length, height: length, cap: length, tBase: t, tWeb: t, tCap: t }),
  fc.record({ shape: fc.constant('arc' as const), measured: corners.measured, radius: length, angle: fc.double({ min: 0.2, max: 6, noNaN: true }), t }),
  fc.record({ shape: fc.constant('slit tube' as const), measured: corners.measured, diameter: length, t }),
)
const runs = { numRuns: 1500, seed: 20_261_012 }

/** Every length and thickness times `by`; angles stay. */
const scaled = (profile: Profile, by: number): Profile =>
  Object.fromEntries(Object.entries(profile).map(([key, value]) => [key, typeof value === 'number' && key !== 'lean' && key !== 'angle' ? by * value : value])) as unknown as Profile

/** Lengths of a machined profile, measured another way, that describe the same piece of metal. */
function remeasured(p: Extract<Profile, { shape: 'channel' | 'zed' }>, measured: MeasuredOn): Profile {
  const sign = { 'outside': 1, 'inside': -1, 'mid-line': 0 }
  const change = (sign[measured] - sign[p.measured]) / 2
  return { ...p, measured, lower: p.lower + change * p.tWeb, upper: p.upper + change * p.tWeb, height: p.height + change * (p.tLower + p.tUpper) }
}

describe('laws of the profiles', () => {
  it('give the same section however the same metal is measured', () => {
    const two = profiles.filter(p => p.shape === 'channel' || p.shape === 'zed')
    fc.assert(fc.property(two, corners.measured, (profile, measured) => {
      const [one, other] = [made(profile), made(remeasured(profile as Extract<Profile, { shape: 'channel' | 'zed' }>, measured))]
      for (const [index, node] of one.section.nodes.entries()) {
        expect(other.section.nodes[index]?.x).toBeCloseTo(node.x, 10)
        expect(other.section.nodes[index]?.y).toBeCloseTo(node.y, 10)
      }
    }), runs)
  })

  it('scale: lengths with λ, Γ with λ⁶', () => {
    fc.assert(fc.property(profiles, fc.double({ min: 0.2, max: 5, noNaN: true }), (profile, by) => {
      const [one, other] = [made(profile), made(scaled(profile, by))]
      for (const [index, { value }] of one.lines.entries()) expect((other.lines[index]?.value ?? 0) / value).toBeCloseTo(by, 10)
      const [gamma, larger] = [given(sectorialProperties(one.section)).gamma, given(sectorialProperties(other.section)).gamma]
      expect(larger / gamma / by ** 6).toBeCloseTo(1, 6)
    }), { ...runs, numRuns: 300 })
  })

  it('show lines that add up, and walls that are as long as their lines say', () => {
    fc.assert(fc.property(profiles, (profile) => {
      const { lines, section, names } = made(profile)
      for (const { terms, value } of lines) expect(terms.reduce((sum, one) => sum + one.factor * one.value, 0)).toBeCloseTo(value, 12)
      expect(Object.keys(names)).toEqual(section.walls.map(({ id }) => id))
      const lengths = section.walls.flatMap(({ from, to, arc }) => {
        const [a, b] = [from, to].map(id => section.nodes.find(node => node.id === id))
        return arc ? [] : [Math.hypot((b?.x ?? 0) - (a?.x ?? 0), (b?.y ?? 0) - (a?.y ?? 0))]
      })
      const told = lines.map(({ value }) => value)
      // A flange on both sides of a web stands in its line as a whole and in the section as two halves.
      for (const one of lengths) expect(told.some(value => Math.abs(value - one) < 1e-9 || Math.abs(value - 2 * one) < 1e-9)).toBe(true)
    }), runs)
  })

  it('turned up side down, a channel and a zed are the same', () => {
    const two = profiles.filter(p => p.shape === 'channel' || p.shape === 'zed')
    fc.assert(fc.property(two, (profile) => {
      const p = profile as Extract<Profile, { shape: 'channel' | 'zed' }>
      const over: Profile = { ...p, lower: p.upper, upper: p.lower, tLower: p.tUpper, tUpper: p.tLower }
      const [one, other] = [p, over].map(each => given(torsionOfOpenSection(made(each).section)).plainGJ) as [number, number]
      expect(other / one).toBeCloseTo(1, 12)
      const [gamma, turned] = [p, over].map(each => given(sectorialProperties(made(each).section)).gamma) as [number, number]
      expect(turned / gamma).toBeCloseTo(1, 8)
    }), { ...runs, numRuns: 300 })
  })

  it('measured outside are no larger than measured on the mid-line, and those no larger than inside', () => {
    fc.assert(fc.property(profiles, (profile) => {
      const [outside, middle, inside] = (['outside', 'mid-line', 'inside'] as const).map(measured => sectionOfProfile({ ...profile, measured }, moduli))
      const size = (one: typeof outside) => (one?.ok ? given(torsionOfOpenSection(one.section)).plainGJ : 0)
      expect(size(outside)).toBeLessThanOrEqual(size(middle))
      expect(size(middle)).toBeLessThanOrEqual(size(inside))
    }), { ...runs, numRuns: 300 })
  })
})

const channel: Profile = { shape: 'channel', measured: 'outside', make: 'bent', radius: 3, lower: 40, height: 60, upper: 30, tLower: 2, tWeb: 2, tUpper: 2 }
const lipped: Profile = { shape: 'lipped channel', measured: 'outside', make: 'bent', radius: 3, lip: 12, flange: 40, height: 60, tLip: 2, tFlange: 2, tWeb: 2 }

describe('a profile is refused with what to do', () => {
  it.each<[string, Profile, RegExp]>([
    ['a length of zero', { ...channel, lower: 0 }, /^The width of the lower flange of the channel must be a number greater than zero\.$/],
    ['no number', { ...channel, height: Number.NaN }, /height of the channel must be a number/],
    ['a negative radius', { ...channel, radius: -1 }, /radius of the channel must be a number greater than zero, or zero\./],
    ['a thickness of zero', { ...channel, tWeb: 0 }, /^The thickness of the web of the channel/],
    ['two thicknesses of one sheet', { ...channel, tWeb: 2.5 }, /one sheet: give all its walls one thickness/],
    ['a bend of three walls', { shape: 'tee', measured: 'outside', make: 'bent', radius: 3, flange: 40, height: 30, tFlange: 2, tStem: 2 }, /which no bend joins\. Give its corners as machined/],
    ['a bend that is longer than its lip', { ...lipped, radius: 12 }, /^An inside radius of 12 mm is too large for the lower lip: its corners take 13 mm and it is 11 mm long on the mid-line/],
    ['two bends on a short web', { ...channel, height: 16, radius: 7 }, /too large for the web: its corners take 16 mm and it is 14 mm long/],
    ['a fillet on a short leg', { shape: 'angle', measured: 'outside', make: 'machined', radius: 9, width: 40, height: 10, tWidth: 2, tHeight: 2 }, /too large for the upright leg: its corners take 10 mm and it is 9 mm/],
    ['a wall as short as its neighbour is thick', { shape: 'angle', measured: 'outside', make: 'machined', radius: 0, width: 2, height: 40, tWidth: 4, tHeight: 4 }, /^The lying leg of 2 mm is no longer than the walls beside it are thick/],
    ['lips that close the section', { ...lipped, lip: 31, radius: 2 }, /^The two lips, 30 mm each on the mid-line, close the section of 58 mm/],
    ['a hat whose webs lie down', { shape: 'hat', measured: 'outside', make: 'bent', radius: 3, brim: 20, height: 40, crown: 40, lean: 1.4, tBrim: 2, tWeb: 2, tCrown: 2 }, /lean outwards by 0° to less than 75°/],
    ['an arc of a full circle', { shape: 'arc', measured: 'outside', radius: 40, angle: 2 * Math.PI, t: 2 }, /Use the slit tube/],
    ['a tube without an inside', { shape: 'slit tube', measured: 'outside', diameter: 4, t: 2 }, /leaves no inner face/],
  ])('%s', (_, profile, expected) => {
    expect(reason(profile)).toMatch(expected)
  })

  it('but not where a radius just fits, nor for fillets on opposite sides of a web', () => {
    expect(reason({ ...lipped, radius: 10 })).toBe('was made')
    const zed: Profile = { shape: 'zed', measured: 'outside', make: 'machined', radius: 7, lower: 30, height: 14, upper: 30, tLower: 2, tWeb: 2, tUpper: 2 }
    expect(reason(zed)).toBe('was made')
    expect(reason({ ...zed, shape: 'channel' })).toMatch(/too large for the web/)
  })
})
