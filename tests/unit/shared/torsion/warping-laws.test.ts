/** Laws of the bar with restrained warping, for any number of members, supports and any kL. */
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { branched, channel, hat, slitTube, unequalI, zed } from '../../../reference/sections'
import { fibreStresses, sectorialRun } from '#shared/torsion/warping/sectorial-run'
import { warpingBar, type BarCase, type BarResponse, type Support, type WarpingBar } from '#shared/torsion/warping/warping-bar'
import type { Member } from '#shared/torsion/warping/member'
import { cutBar } from '#shared/torsion/warping/cut-bar'
import { compressedStiffness } from '#shared/torsion/warping/compression'
import { measures, stressPeaks } from '#shared/torsion/warping/stress-peaks'
import { twistsByMatrices } from '../../../factories/member-matrix'

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
    }), { numRuns: 200 })
  })
})

describe('laws of the distributed torque and of extremes', () => {
  const moderate = fc.record({ length: num(50, 2000), GJ: num(1e6, 1e9), u: num(0.4, 20) }).map(({ length, GJ, u }): Member => ({ length, GJ, EG: GJ * (length / u) ** 2 }))
  const spring = fc.oneof(restraint, num(1e3, 1e9))
  it('agrees with the 4 × 4 member matrices, assembled and solved by another program', () => {
    fc.assert(fc.property(fc.array(moderate, { minLength: 1, maxLength: 5 }), fc.tuple(spring, spring, spring), torques, spread, load, ([first, ...rest], [w1, t2, w2], T, m, B) => {
      const list = [first!, ...rest]
      const supports: Support[] = [{ node: 0, twist: 'fixed', warping: w1 }, { node: list.length, twist: t2, warping: w2 }]
      const acting: BarCase = { torques: [], distributed: [], bimoments: [{ node: list.length, B: B * 100 }], ...loadOn(list.length, T, m) }
      const expected = twistsByMatrices(list, supports, acting)
      const response = solved(made(list, supports), acting)
      const scale = Math.max(...expected.map(Math.abs), 1e-12)
      response.nodes.forEach(({ phi }, i) => near(phi, expected[i]!, 1e-6, scale))
    }), { numRuns: 1000 })
  })
  it('splits a torque that grows along the member as it splits the member', () => {
    fc.assert(fc.property(member, ends, num(0.1, 0.9), spread, spread, (one, end, part, m, mEnd) => {
      const between = m + (mEnd - m) * part
      const a = solved(made([one], supportsOf(end, 1)), { distributed: [{ member: 0, m, mEnd }] })
      const b = solved(made([{ ...one, length: one.length * part }, { ...one, length: one.length * (1 - part) }], supportsOf(end, 2)), { distributed: [{ member: 0, m, mEnd: between }, { member: 1, m: between, mEnd }] })
      near(b.nodes[2]!.phi, a.nodes[1]!.phi, 1e-9, most(a) + most(b) + 1e-30)
      near(b.members[0]!.B1, a.members[0]!.B1, 1e-9, bendingScale([one], [], Math.abs(m) + Math.abs(mEnd)) + 1e-30)
    }), runs)
  })
  it('keeps its digits in a hundred members as in one, from almost pure warping to pure twist', () => {
    fc.assert(fc.property(num(-1, 4), load, spread, (power, T, m) => {
      const one: Member = { length: 1200, GJ: 7e7, EG: 7e7 * (1200 / 10 ** power) ** 2 }
      const many = Array.from({ length: 100 }, () => ({ ...one, length: 12 }))
      const clamped = (count: number): Support[] => [{ node: 0, twist: 'fixed', warping: 'fixed' }, { node: count, twist: 'free', warping: 'free' }]
      const a = solved(made([one], clamped(1)), { torques: [{ node: 1, T }], distributed: [{ member: 0, m }] })
      const b = solved(made(many, clamped(100)), { torques: [{ node: 100, T }], distributed: many.map((_, i) => ({ member: i, m })) })
      near(b.nodes[100]!.phi, a.nodes[1]!.phi, 1e-10, most(a) + most(b) + 1e-30)
    }), { numRuns: 60 })
  })
  it('closes: the run of every member ends at the twist of the next node', () => {
    fc.assert(fc.property(members, ends, torques, spread, (list, end, T, m) => {
      const bar = made(list, supportsOf(end, list.length))
      expect(bar.run(solved(bar, loadOn(list.length, T, m))).closure).toBeLessThan(1e-7)
    }), runs)
  })
  it('finds no less than a fine look along the bar, and what it finds is there', () => {
    fc.assert(fc.property(fc.array(moderate, { minLength: 1, maxLength: 3 }), ends, torques, spread, spread, (list, end, T, m, mEnd) => {
      const bar = made(list, supportsOf(end, list.length))
      const response = solved(bar, { ...loadOn(list.length, T, 0), distributed: [{ member: 0, m, mEnd }] })
      const peaks = bar.peaks(response)
      for (const what of ['phi', 'rate', 'B', 'T'] as const) {
        const fine = Array.from({ length: 400 }, (_, i) => bar.stateAt(response, Math.min(bar.length, bar.length * i / 399))).map(at => ('ok' in at ? 0 : Math.abs(at[what])))
        expect(Math.abs(peaks[what][what])).toBeGreaterThanOrEqual(Math.max(...fine) * (1 - 1e-9))
        const there = bar.stateAt(response, Math.min(bar.length, peaks[what].z))
        // At a node two values stand side by side.
        if (!('ok' in there) && !bar.stations(response).some(at => at.z === peaks[what].z)) near(there[what], peaks[what][what], 1e-7, Math.abs(peaks[what][what]) + 1e-30)
      }
    }), { numRuns: 150 })
  })
  it('finds the stresses of every fibre at every station, and between them', () => {
    const run = sectorialRun(branched)
    if (!run.ok) throw new Error(run.reason)
    const { fibres, properties: { gamma } } = run
    const peaksOf = stressPeaks([{ fibres, normal: 400, shear: 250 }])
    fc.assert(fc.property(moderate, ends, load, spread, num(-30, 30), (one, end, T, m, axial) => {
      const bar = made([{ ...one, EG: 70_000 * gamma, GJ: 2.7e4 * 400 }], supportsOf(end, 1))
      const response = solved(bar, { torques: [{ node: 1, T }], distributed: [{ member: 0, m }] })
      const [peaks] = peaksOf({ run: bar.run(response), ends: response.members, gamma, axial })
      const all = bar.stations(response).flatMap(({ B, Tw, rate }) => fibreStresses(run, { B, Tw, rate, axial }))
      const value = { sigma: (s: number) => s, tau: (_: number, t: number) => t, mises: (s: number, t: number) => Math.sqrt(s * s + 3 * t * t), circle: (s: number, t: number) => Math.hypot(s / 400, t / 250) }
      for (const measure of measures) {
        const brute = all.reduce((high, at) => Math.max(high, value[measure](Math.abs(at.sigma), at.tauSv + at.tauOmega)), 0)
        expect(peaks![measure].value).toBeGreaterThanOrEqual(brute * (1 - 1e-9))
        expect(peaks![measure].value).toBeLessThanOrEqual(brute * 1.02 + 1e-9)
      }
    }), { numRuns: 100 })
  })
  it('loses stiffness in proportion to compression, and none to tension', () => {
    fc.assert(fc.property(num(1e5, 1e10), num(1, 1e7), num(0, 500), (GJ, Ips, compression) => {
      const at = (stress: number) => compressedStiffness({ GJ, Ips, compression: stress })
      const [one, two, pulled] = [at(compression), at(2 * compression), at(-compression)]
      if (!one.ok || !two.ok || !pulled.ok) throw new Error('refused')
      near(GJ - two.GJ, 2 * (GJ - one.GJ), 1e-9, GJ + 2 * compression * Ips)
      expect(pulled.GJ).toBe(GJ)
    }), runs)
  })
  it('cuts a bar at every place without losing length', () => {
    fc.assert(fc.property(fc.array(num(1, 500), { minLength: 1, maxLength: 4 }), fc.array(num(0, 1), { maxLength: 8 }), (lengths, parts) => {
      const total = lengths.reduce((sum, length) => sum + length, 0)
      const places = parts.map(part => part * total)
      const cut = cutBar(lengths.map((length, i) => ({ length, GJ: i + 1, EG: 0 })), places)
      if (!cut.ok) throw new Error(cut.reason)
      near(cut.members.reduce((sum, { length }) => sum + length, 0), total, 1e-12)
      for (const z of places) near(cut.nodes[cut.nodeAt(z)]!, z, 1e-8, total)
      lengths.forEach((length, i) => near(cut.members.filter(one => one.GJ === i + 1).reduce((sum, one) => sum + one.length, 0), length, 1e-8, total))
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
    expect(bar.respond({ torques: [{ node: 1, T: 1e308 }, { node: 1, T: 1e308 }], distributed: [], bimoments: [] })).toMatchObject({ ok: false })
    expect(bar.stateAt(solved(bar, {}), 101)).toMatchObject({ ok: false })
  })
  it('refuses a bimoment where nothing warps, and a spring of zero as the only hold', () => {
    const plain = made([{ ...one, EG: 0 }], held)
    expect(plain.respond({ torques: [], distributed: [], bimoments: [{ node: 1, B: 5 }] })).toMatchObject({ ok: false, reason: expect.stringMatching(/no member that warps/) as string })
    expect(warpingBar([one], [{ node: 0, twist: 0, warping: 'fixed' }])).toMatchObject({ ok: false })
  })
  it('cuts no bar that is none, and no place beyond it', () => {
    expect(cutBar([], [])).toMatchObject({ ok: false })
    expect(cutBar([{ ...one, length: 0 }], [])).toMatchObject({ ok: false })
    expect(cutBar([one], [101])).toMatchObject({ ok: false })
    expect(cutBar([one], [Number.NaN])).toMatchObject({ ok: false })
  })
  it('gives no stiffness under compression for what is no number', () => {
    expect(compressedStiffness({ GJ: 0, Ips: 1, compression: 1 })).toMatchObject({ ok: false })
    expect(compressedStiffness({ GJ: 1, Ips: 1, compression: Number.NaN })).toMatchObject({ ok: false })
  })
})
