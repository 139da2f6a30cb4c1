/** Wall stability: faults are seen, laws hold, and what is no thin wall is refused. */
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { describeFaults, fault, result, type Exports, type Mutation } from '../../../factories/engine-faults'
import { stabilityRows } from '../../../reference/stability-rows'
import type { PlateEdges } from '#shared/torsion/stability/ritz'
import { cylinderBuckling, fittedCoefficient, panelBuckling, panelCoefficient } from '#shared/torsion/stability/wall-stability'

const module = 'torsion/stability/published'
const fit = (name: string, i: number) => (all: Exports): Exports => {
  const fits = all.fits as Record<string, readonly (readonly [number, number])[]>
  return { ...all, fits: { ...fits, [name]: (fits[name] ?? []).map(([power, c], k) => [power, k === i ? c * fault : c]) } }
}
const nested = (table: string, key: string) => (all: Exports): Exports => {
  const held = all[table] as Record<string, number>
  return { ...all, [table]: { ...held, [key]: (held[key] ?? 0) * fault } }
}
const parts: Mutation[] = [
  ...(['supported supported', 'clamped clamped'] as const).flatMap(name => [0, 1].map((i): Mutation => ({ name: `fit ${name}, term ${i}`, module, spoil: fit(name, i) }))),
  ...[0, 1, 2].map((i): Mutation => ({ name: `fit long clamped, term ${i}`, module, spoil: fit('clamped supported', i) })),
  ...[0, 1, 2, 3].map((i): Mutation => ({ name: `fit short clamped, term ${i}`, module, spoil: fit('supported clamped', i) })),
  { name: 'strip, supported', module, spoil: nested('longStrip', 'supported') }, { name: 'strip, clamped', module, spoil: nested('longStrip', 'clamped') },
  { name: 'cylinder coefficient', module, spoil: nested('cylinder', 'c') }, { name: 'cylinder knock-down', module, spoil: nested('cylinder', 'knockdown') }, { name: 'cylinder power', module, spoil: nested('cylinder', 'power') },
  { name: 'Ritz coefficient', module: 'torsion/stability/ritz', spoil: result('shearBucklingCoefficient') },
  { name: 'panel', module: 'torsion/stability/wall-stability', spoil: result('panelBuckling', 'tau', 'Z', 'fit') },
  { name: 'cylinder', module: 'torsion/stability/wall-stability', spoil: result('cylinderBuckling', 'tau') },
]
// Each row of the table is a Ritz solution of its own; two sides of it tell as much of a fault as all.
const telling = stabilityRows.filter(row => !/a\/b (1\.25|1\.5|3|5)$/.test(row.inputs))
describeFaults('a 1 % fault in wall stability', parts, telling)

const edge = fc.constantFrom('supported' as const, 'clamped' as const)
const edges: fc.Arbitrary<PlateEdges> = fc.record({ long: edge, short: edge })
const num = (min: number, max: number) => fc.double({ min, max, noNaN: true })
const near = (value: number, expected: number, tolerance: number) => expect(Math.abs(value - expected), `${value} against ${expected}`).toBeLessThanOrEqual(tolerance * Math.abs(expected))
const stress = (panel: Parameters<typeof panelBuckling>[0]) => {
  const found = panelBuckling(panel)
  if (!found.ok) throw new Error(found.reason)
  return found
}

describe('laws of wall stability', () => {
  it('scale: the stress is that of its shape, with the modulus and the square of t/b', () => {
    fc.assert(fc.property(num(1, 6), edges, num(0.2, 5), num(0.5, 3), (ratio, held, k, t) => {
      const panel = { length: 300 * ratio, width: 300, t, E: 71_000, nu: 0.33, edges: held, radius: null }
      near(stress({ ...panel, length: panel.length * k, width: 300 * k, t: t * k }).tau, stress(panel).tau, 1e-9)
      near(stress({ ...panel, E: 71_000 * k }).tau, k * stress(panel).tau, 1e-9)
    }), { numRuns: 25 })
  })
  it('turn: the sides may be given in either order', () => {
    fc.assert(fc.property(num(1, 6), edges, (ratio, held) => {
      const panel = { length: 300 * ratio, width: 300, t: 1, E: 71_000, nu: 0.33, edges: held, radius: null }
      near(stress({ ...panel, length: 300, width: 300 * ratio }).tau, stress(panel).tau, 1e-12)
    }), { numRuns: 20 })
  })
  it('a longer panel is never stronger, a clamped edge never weaker, and all lie above the infinite strip', () => {
    fc.assert(fc.property(num(1, 7), num(1.02, 1.3), edges, (ratio, k, held) => {
      const ks = panelCoefficient(ratio, held)
      expect(panelCoefficient(ratio * k, held)).toBeLessThanOrEqual(ks * (1 + 1e-6))
      expect(ks).toBeGreaterThanOrEqual(panelCoefficient(ratio, { long: 'supported', short: 'supported' }) * (1 - 1e-9))
      expect(ks).toBeGreaterThanOrEqual(panelCoefficient(99, held) * 0.999)
    }), { numRuns: 25 })
  })
  it('the published fits stay within 5 % of it', () => {
    fc.assert(fc.property(num(1, 5), edges, (ratio, held) => {
      near(fittedCoefficient(ratio, held), panelCoefficient(ratio, held), 0.05)
    }), { numRuns: 25 })
  })
  it('a thicker and a shorter cylinder is stronger', () => {
    fc.assert(fc.property(num(20, 200), num(40, 300), num(0.5, 20), num(1.05, 2), (R, slender, length, k) => {
      const tau = (t: number, L: number) => {
        const found = cylinderBuckling({ radius: R, t, length: L, E: 71_000, nu: 0.33 })
        return found.ok ? found.tau : Number.NaN
      }
      const t = R / slender
      expect(tau(t * k, R * length)).toBeGreaterThan(tau(t, R * length))
      expect(tau(t, R * length / k)).toBeGreaterThanOrEqual(tau(t, R * length) * 0.999)
    }), { numRuns: 500 })
  })
  it.each([0, -1, Number.NaN, Infinity])('refuses %s for any of its sizes', (bad) => {
    const panel = { length: 300, width: 200, t: 1, E: 71_000, nu: 0.33, edges: { long: 'supported', short: 'supported' } as const, radius: null }
    for (const key of ['length', 'width', 't', 'E'] as const) expect(panelBuckling({ ...panel, [key]: bad })).toMatchObject({ ok: false })
    expect(panelBuckling({ ...panel, nu: bad === 0 ? 0.5 : bad })).toMatchObject({ ok: false })
    for (const key of ['radius', 't', 'length', 'E'] as const) expect(cylinderBuckling({ radius: 40, t: 1, length: 300, E: 71_000, nu: 0.33, [key]: bad })).toMatchObject({ ok: false })
  })
})
