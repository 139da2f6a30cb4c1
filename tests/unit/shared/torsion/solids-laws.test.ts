/** Laws of the solids: they hold for every size, and one shape passes into another. */
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { Solid, SolidTorsion } from '#shared/torsion/solids/solid'
import { respondOfSolid, torsionOfSolid } from '#shared/torsion/solids/torsion-of-solid'

const solved = (solid: Solid): SolidTorsion => {
  const found = torsionOfSolid(solid)
  if (!found.ok) throw new Error(found.reason)
  return found
}
const near = (value: number, expected: number, tolerance: number) => expect(Math.abs(value - expected)).toBeLessThanOrEqual(tolerance * Math.abs(expected))
const size = fc.double({ min: 0.1, max: 1000, noNaN: true })
const share = fc.double({ min: 0.01, max: 0.99, noNaN: true })
const ellipse = fc.record({ shape: fc.constant('ellipse' as const), semiMajor: size, semiMinor: size, ratio: fc.oneof(fc.constant(0), share) })
const rectangle = fc.record({ shape: fc.constant('rectangle' as const), width: size, height: size })
const circle = fc.tuple(size, share).map(([R, k]): Solid => ({ shape: 'circle', outerRadius: R, innerRadius: k > 0.5 ? R * k : 0 }))
const quick: fc.Arbitrary<Solid> = fc.oneof(
  circle, ellipse, rectangle,
  fc.tuple(size, share).map(([radius, s]): Solid => ({ shape: 'segment', radius, depth: s * radius })),
  size.map((side): Solid => ({ shape: 'equilateral triangle', side })), size.map((leg): Solid => ({ shape: 'right isosceles triangle', leg })),
  size.map((radius): Solid => ({ shape: 'semicircle', radius })),
  fc.tuple(fc.constantFrom('pentagon' as const, 'hexagon' as const, 'octagon' as const), size).map(([shape, flats]): Solid => ({ shape, flats })),
)
const sector = fc.tuple(size, fc.double({ min: 0.1, max: Math.PI, noNaN: true })).map(([radius, angle]): Solid => ({ shape: 'sector', radius, angle }))
const times = (solid: Solid, k: number): Solid =>
  Object.fromEntries(Object.entries(solid).map(([key, value]) => [key, typeof value === 'number' && key !== 'ratio' && key !== 'angle' ? value * k : value])) as unknown as Solid
const many = { numRuns: 3000 }

describe('laws of the solids', () => {
  it.each([['closed forms', quick, 3000], ['sectors', sector, 30]] as const)('scale: J with the fourth power of the size, the modulus with the third, the area with the second (%s)', (_, shapes, numRuns) => {
    fc.assert(fc.property(shapes, fc.double({ min: 0.1, max: 10, noNaN: true }), (solid, k) => {
      const [one, other] = [solved(solid), solved(times(solid, k))]
      near(other.J, one.J * k ** 4, 1e-11)
      near(other.WT, one.WT * k ** 3, 1e-11)
      near(other.A, one.A * k ** 2, 1e-11)
    }), { numRuns })
  })
  it('turn: the sides of a rectangle and the axes of an ellipse may be given in either order', () => {
    fc.assert(fc.property(size, size, share, (a, b, ratio) => {
      near(solved({ shape: 'rectangle', width: a, height: b }).J, solved({ shape: 'rectangle', width: b, height: a }).J, 1e-15)
      near(solved({ shape: 'ellipse', semiMajor: a, semiMinor: b, ratio }).WT, solved({ shape: 'ellipse', semiMajor: b, semiMinor: a, ratio }).WT, 1e-15)
    }), many)
  })
  it('superpose: twist and stress are proportional to the torque, and a reversed torque reverses the twist only', () => {
    fc.assert(fc.property(quick, fc.double({ min: 1, max: 1e7, noNaN: true }), fc.double({ min: 0.1, max: 9, noNaN: true }), (solid, T, k) => {
      const torsion = solved(solid)
      const [one, other] = [respondOfSolid(torsion, 27_000, T), respondOfSolid(torsion, 27_000, -k * T)]
      near(other.rate, -k * one.rate, 1e-12)
      near(other.tauMax, k * one.tauMax, 1e-12)
    }), many)
  })
  it('bound: no bar is stiffer than its polar moment, and of one area none is stiffer than the solid circle (Saint-Venant)', () => {
    fc.assert(fc.property(fc.oneof(rectangle, ellipse.map(e => ({ ...e, ratio: 0 })), quick.filter(s => s.shape !== 'circle' && s.shape !== 'ellipse')), (solid) => {
      const { A, J } = solved(solid)
      expect(J).toBeLessThanOrEqual(A ** 2 / (2 * Math.PI) * (1 + 1e-9))
    }), many)
  })
  it('yield before they are fully plastic, and reach between one and two times that torque', () => {
    fc.assert(fc.property(quick, (solid) => {
      const { plastic, WT } = solved(solid)
      if (plastic === null) return
      expect(plastic / WT).toBeGreaterThan(1)
      expect(plastic / WT).toBeLessThan(2)
    }), many)
  })
  it('peak where they say: no secondary place has more stress', () => {
    fc.assert(fc.property(quick, (solid) => {
      const { peak, secondary } = solved(solid)
      for (const place of secondary) expect(place.perRate).toBeLessThanOrEqual(peak.perRate * (1 + 1e-12))
    }), many)
  })
  it('pass into one another: round ellipse to circle, sector of 180° to semicircle, deepest flat to semicircle, no flat to circle', () => {
    fc.assert(fc.property(size, share, (R, ratio) => {
      near(solved({ shape: 'ellipse', semiMajor: R, semiMinor: R, ratio }).J, solved({ shape: 'circle', outerRadius: R, innerRadius: R * ratio }).J, 1e-12)
      near(solved({ shape: 'segment', radius: R, depth: R }).J, solved({ shape: 'semicircle', radius: R }).J, 1e-9)
      near(solved({ shape: 'segment', radius: R, depth: 0 }).J, solved({ shape: 'circle', outerRadius: R, innerRadius: 0 }).J, 1e-12)
    }), many)
    near(solved({ shape: 'sector', radius: 7, angle: Math.PI }).J, solved({ shape: 'semicircle', radius: 7 }).J, 1e-10)
  })
  it('lose stiffness with every hole and every flat', () => {
    fc.assert(fc.property(size, share, share, (R, a, b) => {
      const [less, more] = a < b ? [a, b] : [b, a]
      if (more - less < 1e-6) return
      expect(solved({ shape: 'circle', outerRadius: R, innerRadius: R * more }).J).toBeLessThan(solved({ shape: 'circle', outerRadius: R, innerRadius: R * less }).J)
      expect(solved({ shape: 'segment', radius: R, depth: R * more }).J).toBeLessThan(solved({ shape: 'segment', radius: R, depth: R * less }).J)
    }), many)
  })
  it('approach the thin wall: a thin tube is Bredt, a long strip is L t³/3', () => {
    fc.assert(fc.property(size, fc.double({ min: 1e-4, max: 1e-3, noNaN: true }), (R, k) => {
      const t = R * k
      near(solved({ shape: 'circle', outerRadius: R + t / 2, innerRadius: R - t / 2 }).J, 2 * Math.PI * R ** 3 * t, k ** 2)
      near(solved({ shape: 'rectangle', width: R, height: t }).J, R * t ** 3 / 3, 0.7 * k)
    }), many)
  })
})

describe('hostile dimensions', () => {
  const sentence = /^[A-Z].+\.$/
  it.each([0, -1, Number.NaN, Infinity, -Infinity, 1e-300, 1e300])('refuses %s with a sentence, whatever it stands for', (bad) => {
    const shapes: Solid[] = [
      { shape: 'circle', outerRadius: bad, innerRadius: 0 }, { shape: 'ellipse', semiMajor: bad, semiMinor: 1, ratio: 0 }, { shape: 'ellipse', semiMajor: 2, semiMinor: bad, ratio: 0 },
      { shape: 'rectangle', width: bad, height: 1 }, { shape: 'rectangle', width: 1, height: bad }, { shape: 'equilateral triangle', side: bad }, { shape: 'right isosceles triangle', leg: bad },
      { shape: 'sector', radius: bad, angle: 1 }, { shape: 'semicircle', radius: bad }, { shape: 'segment', radius: bad, depth: 0 }, { shape: 'hexagon', flats: bad },
    ]
    for (const solid of shapes) {
      const found = torsionOfSolid(solid)
      expect(found).toMatchObject({ ok: false })
      expect(found.ok ? '' : found.reason).toMatch(sentence)
    }
  })
  it('refuses what is no such shape', () => {
    for (const solid of [
      { shape: 'circle', outerRadius: 5, innerRadius: 5 }, { shape: 'ellipse', semiMajor: 5, semiMinor: 3, ratio: 1 }, { shape: 'sector', radius: 5, angle: 7 }, { shape: 'segment', radius: 5, depth: 5.1 },
      { shape: 'rectangle', width: 1e6, height: 1e-6 }, { shape: 'sector', radius: 5, angle: 0 },
    ] satisfies Solid[]) expect(torsionOfSolid(solid)).toMatchObject({ ok: false, reason: expect.stringMatching(sentence) as string })
  })
  it('gives no number for the stress at a re-entrant apex', () => {
    expect(solved({ shape: 'sector', radius: 5, angle: 3.5 }).unbounded).toContain('unbounded')
    expect(solved({ shape: 'sector', radius: 5, angle: 3 }).unbounded).toBeNull()
  })
})
