/** Laws of bars along a span, of interaction and of imposed twist. */
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { circleRule, compressionWithShear, powerRule, varyingOnly, vonMises } from '#shared/torsion/combined/interaction'
import { followTwist, shareTwist } from '#shared/torsion/imposed/imposed-twist'
import { flexibility, flexibilityIntegral, type Segment } from '#shared/torsion/span/segment'
import { spanBar, type SpanBar, type SpanCase, type SpanResponse, type SpanSupport } from '#shared/torsion/span/span-bar'

const num = (min: number, max: number) => fc.double({ min, max, noNaN: true })
const steps = (size: number) => fc.integer({ min: -500, max: 500 }).map(i => i * size)
const segment: fc.Arbitrary<Segment> = fc.oneof(
  fc.record({ length: num(10, 1000), stiffness: num(1e6, 1e10).map(GJ => ({ along: 'uniform', GJ } as const)) }),
  fc.record({ length: num(10, 1000), stiffness: fc.tuple(num(10, 60), num(0.4, 2.5)).map(([d, k]) => ({ along: 'tapering circle', G: 79_000, d1: d, d2: d * k } as const)) }),
  fc.record({ length: num(10, 1000), stiffness: fc.tuple(num(1e6, 1e10), num(0.1, 10)).map(([GJ, k]) => ({ along: 'linear', GJ1: GJ, GJ2: GJ * k } as const)) }),
)
const segments = fc.array(segment, { minLength: 1, maxLength: 6 })
const loads = fc.record({ T: fc.array(steps(100), { minLength: 7, maxLength: 7 }), m1: steps(0.1), m2: steps(0.1) })
const made = (list: readonly Segment[], supports: readonly SpanSupport[]): SpanBar => {
  const bar = spanBar(list, supports)
  if (!bar.ok) throw new Error(bar.reason)
  return bar
}
const solved = (bar: SpanBar, load: Partial<SpanCase>): SpanResponse => {
  const response = bar.respond({ torques: [], distributed: [], ...load })
  if ('ok' in response) throw new Error(response.reason)
  return response
}
const caseOf = (count: number, { T, m1, m2 }: { T: number[], m1: number, m2: number }): SpanCase => ({ torques: T.slice(0, count + 1).map((one, node) => ({ node, T: one })), distributed: Array.from({ length: count }, (_, i) => ({ segment: i, m1, m2 })) })
const rigid = (...nodes: number[]): SpanSupport[] => nodes.map(node => ({ node, stiffness: 'rigid' }))
const supports = (count: number, spring: number): SpanSupport[] => [{ node: 0, stiffness: 'rigid' }, ...(count > 1 ? [{ node: 1, stiffness: spring }] : []), { node: count, stiffness: 'rigid' }]
const near = (value: number, expected: number, tolerance: number, scale = Math.abs(expected)) => expect(Math.abs(value - expected), `${value} against ${expected}`).toBeLessThanOrEqual(tolerance * scale)
const most = (response: SpanResponse) => response.nodes.reduce((high, one) => Math.max(high, Math.abs(one.phi)), 1e-20)
const runs = { numRuns: 600 }

describe('laws of bars along a span', () => {
  it('balance: reactions and torques sum to zero to 1e-10', () => {
    fc.assert(fc.property(segments, loads, num(1e3, 1e8), (list, load, spring) => {
      expect(solved(made(list, supports(list.length, spring)), caseOf(list.length, load)).residual).toBeLessThan(1e-10)
    }), runs)
  })
  it('superpose', () => {
    fc.assert(fc.property(segments, loads, loads, num(1e3, 1e8), (list, a, b, spring) => {
      const bar = made(list, supports(list.length, spring))
      const sum = { T: a.T.map((one, i) => one + b.T[i]!), m1: a.m1 + b.m1, m2: a.m2 + b.m2 }
      const [one, other, both] = [a, b, sum].map(load => solved(bar, caseOf(list.length, load)))
      both!.nodes.forEach((node, i) => near(node.phi, one!.nodes[i]!.phi + other!.nodes[i]!.phi, 1e-10, most(one!) + most(other!)))
    }), runs)
  })
  it('are reciprocal (Maxwell)', () => {
    fc.assert(fc.property(segments, fc.nat(6), fc.nat(6), num(1e3, 1e8), (list, i, j, spring) => {
      const bar = made(list, supports(list.length, spring))
      const [a, b] = [i % (list.length + 1), j % (list.length + 1)]
      const [ab, ba] = [solved(bar, { torques: [{ node: a, T: 1000 }] }), solved(bar, { torques: [{ node: b, T: 1000 }] })]
      near(ab.nodes[b]!.phi, ba.nodes[a]!.phi, 1e-10, most(ab) + most(ba))
    }), runs)
  })
  it('end for end, twist runs the same', () => {
    fc.assert(fc.property(segments, fc.nat(6), (list, pick) => {
      const node = pick % (list.length + 1)
      const back = [...list].reverse().map(({ length, stiffness: s }): Segment => ({ length, stiffness: s.along === 'uniform' ? s : s.along === 'linear' ? { ...s, GJ1: s.GJ2, GJ2: s.GJ1 } : { ...s, d1: s.d2, d2: s.d1 } }))
      const [one, other] = [solved(made(list, rigid(0)), { torques: [{ node, T: 1e4 }] }), solved(made(back, rigid(list.length)), { torques: [{ node: list.length - node, T: 1e4 }] })]
      one.nodes.forEach((at, i) => near(other.nodes[list.length - i]!.phi, at.phi, 1e-8, most(one)))
    }), runs)
  })
  it('a taper’s closed form is the integral of its stiffness, and between the uniform bars of its ends', () => {
    fc.assert(fc.property(segment, (one) => {
      const closed = flexibility(one)
      near(flexibilityIntegral(one, 0, 1, () => 1), closed, 1e-9)
    }), runs)
  })
  it('the run of twist ends where the nodes are, and its torque falls by what is applied', () => {
    fc.assert(fc.property(segments, loads, (list, load) => {
      const bar = made(list, rigid(0))
      const response = solved(bar, caseOf(list.length, load))
      near(bar.stations(response).at(-1)!.phi, response.nodes.at(-1)!.phi, 1e-8, most(response) + 1e-12)
      near(response.segments.at(-1)!.T - list.at(-1)!.length * (load.m1 + load.m2) / 2, load.T[list.length]!, 1e-9, 1e5)
    }), { numRuns: 500 })
  })
  it('no station exceeds the ends and the turns of its segment', () => {
    fc.assert(fc.property(segments, loads, num(1e3, 1e8), (list, load, spring) => {
      const bar = made(list, supports(list.length, spring))
      const response = solved(bar, caseOf(list.length, load))
      const turns = bar.turns(response)
      const [fine, met] = [bar.stations(response, 37), [...bar.stations(response, 1), ...turns]]
      const most = (value: (at: (typeof fine)[number]) => number, at: typeof fine) => at.reduce((high, one) => Math.max(high, Math.abs(value(one))), 0)
      for (const value of [(at: (typeof fine)[number]) => at.T, (at: (typeof fine)[number]) => at.phi]) expect(most(value, fine)).toBeLessThanOrEqual(most(value, met) * (1 + 1e-7) + 1e-12)
    }), { numRuns: 200 })
    const held = made([{ length: 100, stiffness: { along: 'uniform', GJ: 1e7 } }], rigid(0))
    const found = held.turns(solved(held, { distributed: [{ segment: 0, m1: 40, m2: -60 }] }))
    // m falls from 40 to −60 and is zero at 40 % of the length: algebra.
    expect(found.some(at => Math.abs(at.z - 40) < 1e-9)).toBe(true)
  })
  it('a stiffer support takes more', () => {
    fc.assert(fc.property(segments, num(1e3, 1e7), num(1.1, 9), (list, spring, k) => {
      const reaction = (stiffness: number) => Math.abs(solved(made(list, [{ node: 0, stiffness: 'rigid' }, { node: list.length, stiffness }]), { torques: [{ node: list.length, T: 1e4 }] }).reactions[1]!.torque)
      expect(reaction(spring * k)).toBeGreaterThanOrEqual(reaction(spring) * (1 - 1e-12))
    }), runs)
  })
})

describe('laws of interaction', () => {
  const R = num(0, 5)
  const ms = (reserve: ReturnType<typeof circleRule> | ReturnType<typeof powerRule>) => (reserve.ok ? reserve.rf ?? Infinity : Number.NaN)
  it('the load multiplied by the reserve factor just reaches the criterion', () => {
    fc.assert(fc.property(R, R, num(0.5, 4), num(0.5, 4), (a, b, p, q) => {
      fc.pre(a > 1e-6 || b > 1e-6)
      const rf = ms(powerRule(a, b, p, q))
      near((rf * a) ** p + (rf * b) ** q, 1, 1e-9)
      const panel = ms(compressionWithShear(a, b))
      near(panel * a + (panel * b) ** 2, 1, 1e-9)
    }), runs)
  })
  it('scale: twice the load has half the reserve', () => {
    fc.assert(fc.property(num(0.01, 5), num(0.01, 5), num(0.1, 9), (a, b, k) => {
      near(ms(circleRule(k * a, k * b)), ms(circleRule(a, b)) / k, 1e-12)
      near(ms(compressionWithShear(k * a, k * b)), ms(compressionWithShear(a, b)) / k, 1e-10)
    }), runs)
  })
  it('never shows more than one part alone would, and passes exactly where one less the sum does', () => {
    fc.assert(fc.property(num(0.01, 3), num(0.01, 3), (a, b) => {
      const rf = ms(circleRule(a, b))
      expect(rf).toBeLessThanOrEqual(Math.min(1 / a, 1 / b))
      expect(rf >= 1).toBe(a ** 2 + b ** 2 <= 1 || Math.abs(a ** 2 + b ** 2 - 1) < 1e-12)
    }), runs)
  })
  it('however small the ratios or the exponents, the multiplier is found', () => {
    near(ms(powerRule(1e-20, 0, 1, 2)), 1e20, 1e-12)
    near(ms(powerRule(1, 0, 0.002, 2)), 1, 1e-12)
    near(ms(powerRule(2, 2, 0.01, 0.01)), 0.5 ** 101, 1e-9)
  })
  it('with nothing steady, the varying margin is the proportional one', () => {
    fc.assert(fc.property(num(0.01, 3), (b) => {
      near(ms(varyingOnly(0, b, 2, 2)), ms(circleRule(0, b)), 1e-12)
    }), runs)
    expect(varyingOnly(1, 0.1, 2, 2)).toMatchObject({ ok: false })
  })
  it('von Mises is the normal stress without shear, and √3 times the shear without it', () => {
    fc.assert(fc.property(steps(0.7), (stress) => {
      near(vonMises(stress, 0), Math.abs(stress), 1e-15)
      near(vonMises(0, stress), Math.sqrt(3) * Math.abs(stress), 1e-15)
    }))
  })
  it.each([[-1, 0.5], [Number.NaN, 0.5], [Infinity, 0.5]])('refuses the ratio %s', (a, b) => {
    for (const found of [circleRule(a, b), compressionWithShear(a, b), powerRule(a, b, 2, 2), varyingOnly(a, b, 2, 2)]) expect(found).toMatchObject({ ok: false })
  })
  it('says that nothing is loaded instead of an infinite margin', () => {
    for (const found of [circleRule(0, 0), compressionWithShear(0, 0), powerRule(0, 0, 2, 2), varyingOnly(0.3, 0, 2, 2)]) expect(found).toMatchObject({ ok: true, loaded: false, rf: null })
  })
})

describe('laws of imposed twist', () => {
  it('thicker is worse: stress grows with thickness at the same rate, and torque with the stiffness', () => {
    fc.assert(fc.property(num(0.5, 5), num(1.1, 4), num(1e-6, 1e-3), (t, k, rate) => {
      const part = (thickness: number) => followTwist({ GJ: 27_000 * 100 * thickness ** 3 / 3, shearPerRate: 27_000 * thickness, warping: null }, { rate, gradient: 0, offset: 0, fibre: 0, E: 71_000 })
      const [thin, thick] = [part(t), part(k * t)]
      if (!thin.ok || !thick.ok) throw new Error('refused')
      near(thick.tau, k * thin.tau, 1e-12)
      near(thick.torque, k ** 3 * thin.torque, 1e-10)
    }), runs)
  })
  it('shares sum to one and lessen the twist', () => {
    fc.assert(fc.property(num(0, 1e9), num(1, 1e9), (part, structure) => {
      const shared = shareTwist(part, structure)
      if (!shared.ok) throw new Error('refused')
      near(shared.share + shared.reduction, 1, 1e-12)
    }), runs)
  })
})

describe('hostile spans', () => {
  const one: Segment = { length: 100, stiffness: { along: 'uniform', GJ: 1e7 } }
  it.each<[string, Segment[], SpanSupport[], RegExp]>([
    ['no segment', [], rigid(0), /no length/], ['no support', [one], [], /no support/], ['a spring of nothing alone', [one], [{ node: 0, stiffness: 0 }], /Nothing holds/],
    ['a length of zero', [{ ...one, length: 0 }], rigid(0), /length/], ['no stiffness', [{ length: 9, stiffness: { along: 'uniform', GJ: 0 } }], rigid(0), /stiffness/],
    ['a diameter that is no number', [{ length: 9, stiffness: { along: 'tapering circle', G: 1, d1: Number.NaN, d2: 3 } }], rigid(0), /stiffness/],
    ['a taper to nothing', [{ length: 9, stiffness: { along: 'tapering circle', G: 1, d1: 1e9, d2: 3 } }], rigid(0), /too far apart/],
    ['two supports at one node', [one], rigid(0, 0), /two supports/], ['a support beyond the end', [one], rigid(5), /does not have/], ['too many segments', Array.from({ length: 600 }, () => one), rigid(0), /at most/],
  ])('refuses %s with a sentence', (_, list, held, words) => expect(spanBar(list, held)).toMatchObject({ ok: false, reason: expect.stringMatching(words) as string }))
})
