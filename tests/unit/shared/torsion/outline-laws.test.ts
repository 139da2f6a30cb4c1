/** Laws of the torsion of any outline: scaling, motion, mirror, order, splitting, monotony, bounds, limits, honest uncertainty. */
import { describe, expect, it } from 'vitest'
import fc from 'fast-check'
import type { Outline, OutlineVertex } from '#shared/torsion/outline/outline'
import { outlineTorsion } from '#shared/torsion/outline/outline-torsion'
import { checkOutline } from '#shared/torsion/outline/outline-check'
import { circleLoop, outlineEdges, reversedLoop } from '#shared/torsion/outline/outline'
import { meshDensity, meshStretches } from '#shared/torsion/outline/mesh-density'
import { panelOrder, solveOnMesh } from '#shared/torsion/outline/mesh-solution'
import { reentrantVertices } from '#shared/torsion/outline/reentrant'
import { given } from '../../../reference/engine'
import { bentAngle, machinedAngle, machinedTee, rectangle, tube } from '../../../reference/outlines'

const runs = { numRuns: 24 }
const most = { mostUnknowns: 640 }
const solve = (outline: Outline) => given(outlineTorsion(outline, most))
const tauOf = (outline: Outline): number => {
  const { shear } = solve(outline)
  return shear.bounded ? shear.peaks.estimate.value : Number.NaN
}
const close = (actual: number, expected: number, tolerance = 1e-8, scale = Math.abs(expected)): void => {
  expect(Math.abs(actual - expected), `${actual} against ${expected}`).toBeLessThanOrEqual(tolerance * scale)
}
const real = (min: number, max: number) => fc.double({ min, max, noNaN: true })

/** A star-shaped loop of four to six vertices with some bulged edges, kept if it is sound and without sharp re-entrant vertices. */
const star = fc.array(fc.record({ radius: real(25, 50), turn: real(-0.25, 0.25), bulge: fc.oneof(fc.constant(0), real(-0.1, 0.4)) }), { minLength: 4, maxLength: 6 })
  .map((spokes): Outline => ({
    outer: spokes.map(({ radius, turn, bulge }, k) => {
      const angle = 2 * Math.PI * (k + turn) / spokes.length
      return { x: radius * Math.cos(angle), y: radius * Math.sin(angle), bulge }
    }), holes: [],
  }))
  .filter((outline) => {
    const sound = checkOutline(outline)
    return sound.ok && reentrantVertices(sound).length === 0 && sound.corners.every(({ interior }) => interior > 0.5)
  })
const rolled = fc.record({ leg: real(20, 60), t: real(3, 7), r: real(0.3, 1.5) }).map(({ leg, t, r }) => machinedAngle(leg, t, r * t))
const bent = fc.record({ leg: real(20, 40), t: real(2, 4), r: real(0.5, 2) }).map(({ leg, t, r }) => bentAngle(leg, t, r * t))
const tee = fc.record({ b: real(30, 50), h: real(25, 45), t: real(4, 6), r: real(0.3, 0.8) }).map(({ b, h, t, r }) => machinedTee(b, t, h, r * t))
const hollow = fc.record({ outline: star, radius: real(3, 9), x: real(-4, 4), y: real(-4, 4) })
  .map(({ outline, radius, x, y }): Outline => ({ outer: outline.outer, holes: [circleLoop(x, y, radius)] }))
  .filter(outline => checkOutline(outline).ok)
const outlines = fc.oneof(star, rolled, bent, tee, hollow)
const solidOutlines = fc.oneof(star, rolled, bent, tee)

const mapped = ({ outer, holes }: Outline, by: (vertex: OutlineVertex) => OutlineVertex): Outline => ({ outer: outer.map(by), holes: holes.map(hole => hole.map(by)) })
const sizeOf = (outline: Outline): number => {
  const sound = checkOutline(outline)
  return sound.ok ? sound.size : Number.NaN
}

describe('laws of the outline', () => {
  it('scales: J with λ⁴, shear per rate with λ, Γ with λ⁶', () => {
    fc.assert(fc.property(outlines, real(0.01, 100), (outline, by) => {
      const [one, other] = [solve(outline), solve(mapped(outline, vertex => ({ ...vertex, x: by * vertex.x, y: by * vertex.y })))]
      close(other.J.value, by ** 4 * one.J.value)
      if (one.shear.bounded && other.shear.bounded) close(other.shear.peaks.estimate.value, by * one.shear.peaks.estimate.value)
      if (one.gamma && other.gamma) close(other.gamma.value, by ** 6 * one.gamma.value, 1e-7)
    }), runs)
  })

  it('does not change when the outline is moved and turned; the shear centre moves with it', () => {
    fc.assert(fc.property(outlines, real(-3, 3), real(-500, 500), real(-500, 500), (outline, angle, dx, dy) => {
      const by = (x: number, y: number) => ({ x: dx + x * Math.cos(angle) - y * Math.sin(angle), y: dy + x * Math.sin(angle) + y * Math.cos(angle) })
      const [one, other] = [solve(outline), solve(mapped(outline, vertex => ({ ...vertex, ...by(vertex.x, vertex.y) })))]
      close(other.J.value, one.J.value)
      if (one.gamma && other.gamma) close(other.gamma.value, one.gamma.value, 1e-6)
      const centre = by(one.shearCentre.x, one.shearCentre.y)
      expect(Math.hypot(other.shearCentre.x - centre.x, other.shearCentre.y - centre.y)).toBeLessThan(1e-6 * sizeOf(outline))
    }), runs)
  })

  it('mirrors: J, shear and Γ stay, the shear centre changes sides', () => {
    fc.assert(fc.property(outlines, (outline) => {
      const [one, other] = [solve(outline), solve(mapped(outline, vertex => ({ ...vertex, x: -vertex.x, bulge: -(vertex.bulge ?? 0) })))]
      close(other.J.value, one.J.value)
      close(other.shearCentre.x, -one.shearCentre.x, 1e-7, sizeOf(outline))
      if (one.gamma && other.gamma) close(other.gamma.value, one.gamma.value, 1e-6)
      if (one.shear.bounded && other.shear.bounded) close(other.shear.peaks.estimate.value, one.shear.peaks.estimate.value)
    }), runs)
  })

  it('does not change with the vertex the list starts from, nor with the sense it is walked in', () => {
    fc.assert(fc.property(outlines, fc.nat(5), (outline, shift) => {
      const from = shift % outline.outer.length
      const started: Outline = { outer: [...outline.outer.slice(from), ...outline.outer.slice(0, from)], holes: outline.holes }
      const walked: Outline = { outer: reversedLoop(outline.outer), holes: outline.holes.map(reversedLoop) }
      const one = solve(outline)
      for (const other of [solve(started), solve(walked)]) {
        close(other.J.value, one.J.value)
        close(other.shearCentre.x, one.shearCentre.x, 1e-7, sizeOf(outline))
      }
    }), runs)
  })

  it('stays within its uncertainty when an edge is split in two', () => {
    fc.assert(fc.property(solidOutlines, fc.nat(20), real(0.2, 0.8), (outline, index, part) => {
      const edge = outlineEdges(outline)[index % outline.outer.length]
      fc.pre(edge !== undefined && edge.arc === null)
      const at = index % outline.outer.length
      const [a, b] = [outline.outer[at], outline.outer[(at + 1) % outline.outer.length]] as [OutlineVertex, OutlineVertex]
      const split = [...outline.outer.slice(0, at + 1), { x: a.x + part * (b.x - a.x), y: a.y + part * (b.y - a.y) }, ...outline.outer.slice(at + 1)]
      const [one, other] = [solve(outline), solve({ outer: split, holes: [] })]
      expect(Math.abs(other.J.value - one.J.value)).toBeLessThanOrEqual(one.J.uncertainty + other.J.uncertainty + 1e-7 * one.J.value)
    }), runs)
  })

  it('is honest: meshes twice as fine lie within the uncertainty told', () => {
    fc.assert(fc.property(outlines, (outline) => {
      const sound = given(checkOutline(outline))
      const told = solve(outline)
      const stretches = meshStretches(meshDensity(sound), 0.125, 8)
      fc.pre(stretches.length * panelOrder <= 900)
      const finer = solveOnMesh(sound, stretches, [])
      expect(Math.abs((finer?.J ?? Number.NaN) - told.J.value)).toBeLessThanOrEqual(told.J.uncertainty + 1e-7 * told.J.value)
      const { shear } = told
      if (shear.bounded) expect(Math.abs((finer?.peaks[0]?.tau ?? Number.NaN) - shear.peaks.estimate.value)).toBeLessThanOrEqual(shear.peaks.estimate.uncertainty + 2e-4 * shear.peaks.estimate.value)
    }), runs)
  })

  it('agrees with the series of the rectangle at any ratio of sides', () => {
    fc.assert(fc.property(real(1, 30), real(1, 50), (n, b) => {
      const terms = Array.from({ length: 200 }, (_, i) => 2 * i + 1)
      const beta = (1 - 192 / (Math.PI ** 5 * n) * terms.reduce((sum, p) => sum + Math.tanh(p * Math.PI * n / 2) / p ** 5, 0)) / 3
      const peak = 1 - 8 / Math.PI ** 2 * terms.reduce((sum, p) => sum + 1 / (p * p * Math.cosh(Math.min(700, p * Math.PI * n / 2))), 0)
      const { J } = solve(rectangle(n * b, b))
      expect(Math.abs(J.value - beta * n * b ** 4)).toBeLessThanOrEqual(J.uncertainty + 1e-6 * J.value)
      close(tauOf(rectangle(n * b, b)), peak * b, 2e-3)
    }), { numRuns: 40 })
  })

  it('agrees with the circular tube at any wall', () => {
    fc.assert(fc.property(real(1, 100), real(0.05, 0.995), (outer, ratio) => {
      const solution = solve(tube(outer, ratio * outer))
      close(solution.J.value, Math.PI / 2 * outer ** 4 * (1 - ratio ** 4), 1e-6)
      close(tauOf(tube(outer, ratio * outer)), outer, 1e-5)
      close(solution.holePhi[0] ?? Number.NaN, outer ** 2 * (1 - ratio ** 2) / 2, 1e-6)
    }), { numRuns: 40 })
  })

  it('keeps to the bounds of any solid section: J below A²/2π and below I_p, the peak above 2A over the perimeter, Γ not negative', () => {
    fc.assert(fc.property(solidOutlines, (outline) => {
      const { J, gamma, properties: { A, Ip }, shear } = solve(outline)
      expect(J.value).toBeLessThan(A * A / (2 * Math.PI))
      expect(J.value).toBeLessThan(Ip)
      expect(gamma?.value).toBeGreaterThan(0)
      const perimeter = outlineEdges(outline).reduce((sum, { length }) => sum + length, 0)
      if (shear.bounded) expect(shear.peaks.first.tau).toBeGreaterThan(2 * A / perimeter)
    }), runs)
  })

  it('gains stiffness from every material added: a fillet, a filled hole', () => {
    fc.assert(fc.property(real(20, 50), real(3, 6), real(0.3, 1), real(1.05, 1.5), (leg, t, r, more) => {
      expect(solve(machinedAngle(leg, t, more * r * t)).J.value).toBeGreaterThan(solve(machinedAngle(leg, t, r * t)).J.value)
    }), runs)
    fc.assert(fc.property(hollow, (outline) => {
      expect(solve({ outer: outline.outer, holes: [] }).J.value).toBeGreaterThan(solve(outline).J.value)
    }), runs)
  })

  it('finds the shear centre on the axis of symmetry', () => {
    fc.assert(fc.property(fc.oneof(rolled, bent), (outline) => {
      const { shearCentre } = solve(outline)
      close(shearCentre.x, shearCentre.y, 1e-8, sizeOf(outline))
    }), runs)
    fc.assert(fc.property(tee, outline => close(solve(outline).shearCentre.x, 0, 1e-8, sizeOf(outline))), runs)
  })

  it('shows a finite value or a reason for any numbers at all', () => {
    const anything = fc.oneof(fc.double(), fc.constantFrom(0, 1, -1, 1e-9, 1e9, 2, 3))
    const loop = fc.array(fc.record({ x: anything, y: anything, bulge: anything }), { maxLength: 6 })
    fc.assert(fc.property(loop, fc.array(loop, { maxLength: 1 }), (outer, holes) => {
      const result = outlineTorsion({ outer, holes }, { mostUnknowns: 200 })
      if (!result.ok) expect(result.reason).not.toBe('')
      else for (const value of [result.J.value, result.J.uncertainty, result.shearCentre.x, result.shearCentre.y, result.properties.A]) expect(Number.isFinite(value)).toBe(true)
    }), { numRuns: 400 })
  })
})
