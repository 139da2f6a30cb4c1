/** Laws of the bar with restrained warping, for any number of members, supports and any kL. */
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { branched, channel, hat, slitTube, unequalI, zed } from '../../../reference/sections'
import { fibreStresses, sectorialRun } from '#shared/torsion/warping/sectorial-run'
import { warpingBar, type BarCase, type BarResponse, type Support, type WarpingBar } from '#shared/torsion/warping/warping-bar'
import type { Member } from '#shared/torsion/warping/member'

const num = (min: number, max: number) => fc.double({ min, max, noNaN: true })
/** kL of a member from pure warping to pure twist. */
const member = fc.record({ length: num(50, 2000), GJ: num(1e5, 1e10), u: num(-2, 3) }).map(({ length, GJ, u }): Member => ({ length, GJ, EG: GJ * (length / 10 ** u) ** 2 }))
const members = fc.array(member, { minLength: 1, maxLength: 6 })
const restraint = fc.constantFrom('free' as const, 'fixed' as const)
const made = (list: readonly Member[], supports: readonly Support[]): WarpingBar => {
  const bar = warpingBar(list, supports)
  if (!bar.ok) throw new Error(bar.reason)
  return bar
}
const solved = (bar: WarpingBar, load: Partial<BarCase>): BarResponse => {
  const response = bar.respond({ torques: [], distributed: [], bimoments: [], ...load })
  if ('ok' in response) throw new Error(response.reason)
  return response
}
const near = (value: number, expected: number, tolerance: number, scale = Math.abs(expected)) => expect(Math.abs(value - expected), `${value} against ${expected}`).toBeLessThanOrEqual(tolerance * scale)
const loadOn = (count: number, T: number[], m: number): Partial<BarCase> => ({ torques: T.slice(0, count + 1).map((one, node) => ({ node, T: one })), distributed: Array.from({ length: count }, (_, i) => ({ member: i, m })) })
/** Loads in steps: what lies at the edge of what numbers hold is no load. */
const load = fc.integer({ min: -1000, max: 1000 }).map(i => i * 100)
const spread = fc.integer({ min: -500, max: 500 }).map(i => i / 10)
const torques = fc.array(load, { minLength: 7, maxLength: 7 })
const ends = fc.tuple(restraint, restraint, restraint)
const supportsOf = ([w1, t2, w2]: readonly ['free' | 'fixed', 'free' | 'fixed', 'free' | 'fixed'], count: number): Support[] => [{ node: 0, twist: 'fixed', warping: w1 }, { node: count, twist: t2, warping: w2 }]
const most = (response: BarResponse) => response.nodes.reduce((high, one) => Math.max(high, Math.abs(one.phi)), 0)
/** A bimoment of this size could arise: torques over the whole length. */
const bendingScale = (list: readonly Member[], T: readonly number[], m: number) => {
  const length = list.reduce((sum, one) => sum + one.length, 0)
  return T.reduce((sum, one) => sum + Math.abs(one), 1) * length + Math.abs(m) * length ** 2
}
const runs = { numRuns: 600 }

describe('laws of the bar', () => {
  it('balances: torques and reactions sum to zero, and the torque is continuous but for what is applied', () => {
    fc.assert(fc.property(members, ends, torques, spread, (list, end, T, m) => {
      const response = solved(made(list, supportsOf(end, list.length)), loadOn(list.length, T, m))
      expect(response.residual).toBeLessThan(1e-7)
      for (let i = 1; i < list.length; i += 1) {
        const [left, right] = [response.members[i - 1]!, response.members[i]!]
        near(left.T - m * list[i - 1]!.length - right.T, T[i]!, 1e-6, 1e6)
        near(left.B2, right.B1, 1e-7, bendingScale(list, T, m))
      }
    }), runs)
  })
  it('superposes: two loads together give the sum, twice a load twice everything', () => {
    fc.assert(fc.property(members, ends, torques, torques, spread, (list, end, a, b, m) => {
      const bar = made(list, supportsOf(end, list.length))
      const [one, other, both] = [solved(bar, loadOn(list.length, a, m)), solved(bar, loadOn(list.length, b, 2 * m)), solved(bar, loadOn(list.length, a.map((v, i) => v + b[i]!), 3 * m))]
      both.nodes.forEach((node, i) => near(node.phi, one.nodes[i]!.phi + other.nodes[i]!.phi, 1e-9, most(one) + most(other) + 1e-30))
    }), runs)
  })
  it('is reciprocal: the twist at one place from a torque at another is the same the other way round (Maxwell)', () => {
    fc.assert(fc.property(members, ends, fc.nat(6), fc.nat(6), (list, end, i, j) => {
      const bar = made(list, supportsOf(end, list.length))
      const [a, b] = [i % (list.length + 1), j % (list.length + 1)]
      const [ab, ba] = [solved(bar, { torques: [{ node: a, T: 1e5 }] }), solved(bar, { torques: [{ node: b, T: 1e5 }] })]
      near(ab.nodes[b]!.phi, ba.nodes[a]!.phi, 1e-8, Math.max(most(ab), most(ba), 1e-30))
    }), runs)
  })
  it('splits: a member cut in two gives the same everywhere', () => {
    fc.assert(fc.property(member, ends, num(0.1, 0.9), load, spread, (one, end, part, T, m) => {
      const [whole, parts] = [made([one], supportsOf(end, 1)), made([{ ...one, length: one.length * part }, { ...one, length: one.length * (1 - part) }], supportsOf(end, 2))]
      const a = solved(whole, { torques: [{ node: 1, T }], distributed: [{ member: 0, m }] })
      const b = solved(parts, { torques: [{ node: 2, T }], distributed: [{ member: 0, m }, { member: 1, m }] })
      near(b.nodes[2]!.phi, a.nodes[1]!.phi, 1e-7, most(a) + most(b) + 1e-30)
      near(b.members[0]!.B1, a.members[0]!.B1, 1e-7, bendingScale([one], [T], m))
    }), runs)
  })
  it('mirrors: turned end for end, the twist runs the other way', () => {
    fc.assert(fc.property(members, load, fc.nat(6), (list, T, pick) => {
      const n = list.length
      const node = pick % (n + 1)
      const built = (count: number): Support[] => [{ node: 0, twist: 'fixed', warping: 'fixed' }, { node: count, twist: 'fixed', warping: 'free' }]
      const back = (count: number): Support[] => [{ node: 0, twist: 'fixed', warping: 'free' }, { node: count, twist: 'fixed', warping: 'fixed' }]
      const [one, other] = [solved(made(list, built(n)), { torques: [{ node, T }] }), solved(made([...list].reverse(), back(n)), { torques: [{ node: n - node, T }] })]
      one.nodes.forEach((at, i) => near(other.nodes[n - i]!.phi, at.phi, 1e-7, most(one) + 1e-30))
    }), runs)
  })
  it('stiffens: holding the warping of an end never lets it twist more, and without EΓ it is T L/GJ', () => {
    fc.assert(fc.property(member, num(1, 1e5), (one, T) => {
      const twist = (w1: 'free' | 'fixed', w2: 'free' | 'fixed', EG = one.EG) => solved(made([{ ...one, EG }], [{ node: 0, twist: 'fixed', warping: w1 }, { node: 1, twist: 'free', warping: w2 }]), { torques: [{ node: 1, T }] }).nodes[1]!.phi
      const plain = T * one.length / one.GJ
      near(twist('free', 'free'), plain, 1e-6)
      near(twist('fixed', 'fixed', 0), plain, 1e-12)
      expect(twist('fixed', 'free')).toBeLessThanOrEqual(plain * (1 + 1e-6))
      expect(twist('fixed', 'fixed')).toBeLessThanOrEqual(twist('fixed', 'free') * (1 + 1e-6))
    }), runs)
  })
  it('a spring lies between nothing and a held end', () => {
    fc.assert(fc.property(member, num(1e2, 1e12), (one, spring) => {
      const twist = (warping: 'free' | 'fixed' | number) => solved(made([one], [{ node: 0, twist: 'fixed', warping }, { node: 1, twist: 'free', warping: 'free' }]), { torques: [{ node: 1, T: 1e4 }] }).nodes[1]!.phi
      expect(twist(spring)).toBeLessThanOrEqual(twist('free') * (1 + 1e-6))
      expect(twist(spring)).toBeGreaterThanOrEqual(twist('fixed') * (1 - 1e-6))
    }), runs)
  })
  it('its run satisfies the equation: T = GJ φ′ − EΓ φ‴ at stations, and ends where the nodes are', () => {
    fc.assert(fc.property(members, ends, torques, spread, (list, end, T, m) => {
      const bar = made(list, supportsOf(end, list.length))
      const response = solved(bar, loadOn(list.length, T, m))
      for (const at of bar.stations(response)) {
        expect(Number.isFinite(at.phi) && Number.isFinite(at.B) && Number.isFinite(at.rate)).toBe(true)
        near(at.Tsv + at.Tw, at.T, 1e-9, Math.abs(at.T) + 1)
      }
      const last = bar.stations(response).at(-1)!
      near(last.phi, response.nodes.at(-1)!.phi, 1e-6, most(response) + bendingScale(list, T, m) / Math.min(...list.map(one => one.GJ)))
    }), runs)
  })
})

describe('fibres of open sections', () => {
  it.each([['channel', channel], ['zed', zed], ['unequal I', unequalI], ['slit tube', slitTube], ['branched', branched], ['hat with bends', hat]] as const)('the flow of warping carries its torque in a %s: ∫S dω = −Γ', (_, section) => {
    const run = sectorialRun(section)
    if (!run.ok) throw new Error(run.reason)
    expect(run.residual).toBeLessThan(1e-9)
  })
  it('warping stress has no resultant: neither force nor moment', () => {
    for (const section of [channel, zed, unequalI, branched, hat]) {
      const run = sectorialRun(section)
      if (!run.ok) throw new Error(run.reason)
      expect(Math.max(run.properties.residuals.area, run.properties.residuals.x, run.properties.residuals.y)).toBeLessThan(1e-9)
      const { gamma } = run.properties
      for (const { fibre, sigma } of fibreStresses(run, { B: gamma, Tw: 0, rate: 0 })) near(sigma, Math.sign(fibre.omega || 1) * (Math.abs(fibre.omega) + fibre.across), 1e-9, run.properties.omegaMax + 1)
    }
  })
})

describe('hostile bars', () => {
  const one: Member = { length: 100, GJ: 1e7, EG: 1e12 }
  const held: Support[] = [{ node: 0, twist: 'fixed', warping: 'fixed' }]
  it.each<[string, Member[], Support[], RegExp]>([
    ['no member', [], held, /no length/], ['a length of zero', [{ ...one, length: 0 }], held, /length/], ['no stiffness', [{ ...one, GJ: 0 }], held, /GJ/],
    ['a negative EΓ', [{ ...one, EG: -1 }], held, /EΓ/], ['a length that is no number', [{ ...one, length: Number.NaN }], held, /length/],
    ['nothing that holds it', [one], [], /Nothing holds/], ['a warping support only', [one], [{ node: 0, twist: 'free', warping: 'fixed' }], /Nothing holds/],
    ['two supports at a node', [one], [...held, ...held], /two supports/], ['a support beyond its end', [one], [{ node: 7, twist: 'fixed', warping: 'free' }], /does not have/],
    ['a negative spring', [one], [{ node: 0, twist: -5, warping: 'free' }], /zero or more/], ['too many members', Array.from({ length: 999 }, () => one), held, /at most/],
  ])('refuses %s with a sentence', (_, list, supports, words) => {
    expect(warpingBar(list, supports)).toMatchObject({ ok: false, reason: expect.stringMatching(words) as string })
  })
  it('refuses loads that are none or stand nowhere', () => {
    const bar = made([one], held)
    expect(bar.respond({ torques: [{ node: 9, T: 1 }], distributed: [], bimoments: [] })).toMatchObject({ ok: false })
    expect(bar.respond({ torques: [{ node: 1, T: Infinity }], distributed: [], bimoments: [] })).toMatchObject({ ok: false })
    expect(bar.respond({ torques: [], distributed: [{ member: 4, m: 1 }], bimoments: [] })).toMatchObject({ ok: false })
  })
})
