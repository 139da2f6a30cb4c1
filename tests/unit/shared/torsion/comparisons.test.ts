import { describe, expect, it } from 'vitest'
import type { Comparison } from '../../../reference/comparisons'
import type { OpenSection } from '#shared/torsion/section'
import { bendSolutions, outOfRangeSolutions, outlineSolutions } from '../../../reference/comparisons'
import { given } from '../../../reference/engine'
import { bentAngle, graph, machinedAngle, machinedTee } from '../../../reference/sections'
import { bendFactor } from '#shared/torsion/bend-factor'
import { torsionOfOpenSection } from '#shared/torsion/open-section'

const J = (section: OpenSection): number => given(torsionOfOpenSection(section)).J ?? Number.NaN

/** The outline's mid-line: through wall along x, abutting wall downwards. */
function midLine({ form, t2, r, along, across }: Comparison): OpenSection {
  const junction = [{ node: '0', radius: r, make: 'machined' as const }]
  const drop = -(across - 0.5)
  return form === 'L'
    ? graph([[0, 0], [along - t2 / 2, 0], [0, drop]], [{ from: 0, to: 1, t: 1 }, { from: 0, to: 2, t: t2 }], junction)
    : graph([[0, 0], [along / 2, 0], [-along / 2, 0], [0, drop]], [{ from: 0, to: 1, t: 1 }, { from: 0, to: 2, t: 1 }, { from: 0, to: 3, t: t2 }], junction)
}
const name = ({ form, t2, r }: Comparison): string => `${form}, t2/t1 ${t2}, r/t1 ${r}`

describe('junction formula against the solved outline', () => {
  it.each(outlineSolutions.map(one => [name(one), one] as const))('%s: J within +0.35 % and −0.7 %', (_, one) => {
    const error = J(midLine(one)) / one.J - 1
    expect(error).toBeLessThan(0.0035)
    expect(error).toBeGreaterThan(-0.007)
  })

  it.each(outOfRangeSolutions.map(one => [name(one), one] as const))('%s: no bulge is added, and J is low', (_, one) => {
    const torsion = given(torsionOfOpenSection(midLine(one)))
    expect(torsion.bulgeTerm).toBe(0)
    expect(torsion.bulges[0]?.bulge).toMatchObject({ ok: false, reason: expect.stringContaining('verified from') })
    expect(torsion.J).toBeLessThan(one.J)
  })

  it('agrees with the boundary elements and the finite-element bound of the angle (C-45, C-118) and of the tee', () => {
    expect(J(machinedAngle) / 6.342047 - 1).toBeCloseTo(0.0007, 4)
    expect(J(machinedAngle)).toBeGreaterThan(6.341923)
    expect(Math.abs(J(machinedTee) / 7.990392 - 1)).toBeLessThan(0.003)
  })
})

describe('bent sheet against the solved outline', () => {
  it('gives J within 0.2 % (C-48)', () => {
    expect(Math.abs(J(bentAngle) / 5.989008 - 1)).toBeLessThan(0.002)
  })

  it.each(bendSolutions)('the factor at ri/t = %d is %d or higher, by less than 5 %%', (ratio, K) => {
    const error = (bendFactor(ratio, 1) ?? 0) / K - 1
    expect(error).toBeGreaterThan(-5e-5)
    expect(error).toBeLessThan(0.05)
  })
})
