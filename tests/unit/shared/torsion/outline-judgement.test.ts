import { describe, expect, it } from 'vitest'
import { estimateFromMeshes, judgeConvergence } from '#shared/torsion/outline/convergence'
import { judgeAgreement } from '#shared/torsion/outline/agreement'
import { solveDense } from '#shared/torsion/outline/dense-solve'
import { outlineTorsion } from '#shared/torsion/outline/outline-torsion'
import { given } from '../../../reference/engine'
import { bentHat, machinedAngle } from '../../../reference/outlines'

describe('an estimate from three meshes', () => {
  it('sees the order of a sequence and trusts no more than the second', () => {
    // 1 + h⁴: differences 15/16 and 15/256, order 4; at second order a third of the last difference is left.
    const { order, uncertainty } = estimateFromMeshes(2, 1 + 1 / 16, 1 + 1 / 256)
    expect(order).toBeCloseTo(4, 12)
    expect(uncertainty).toBeCloseTo(15 / 256 / 3, 12)
  })

  it('mistrusts a last difference that is small because the values crossed', () => {
    expect(estimateFromMeshes(1.04, 1, 1.001).uncertainty).toBeCloseTo(0.01, 12)
    expect(estimateFromMeshes(1.04, 1, 0.999).uncertainty).toBeCloseTo(0.001 / 3, 12)
  })

  it('tells the spread where the meshes do not converge', () => {
    expect(estimateFromMeshes(1, 1.1, 1)).toMatchObject({ value: 1, order: 0, uncertainty: expect.closeTo(0.1, 12) })
    expect(estimateFromMeshes(1, 1.1, 1.3).uncertainty).toBeCloseTo(0.2, 12)
  })

  it('has no order where nothing changes, and a finite one where only rounding is left', () => {
    expect(estimateFromMeshes(2, 2, 2)).toMatchObject({ order: null, uncertainty: 2e-10 })
    expect(estimateFromMeshes(2.1, 2, 2).order).toBeGreaterThan(20)
    expect(estimateFromMeshes(0, 0, 0)).toMatchObject({ order: null, uncertainty: 0 })
  })

  it('is cautioned for its uncertainty, and a low order within it is information', () => {
    expect(judgeConvergence('J', estimateFromMeshes(1.1, 1.025, 1.00625), 0.01).verdict).toBe('inside')
    const wide = judgeConvergence('J', estimateFromMeshes(1.1, 1.025, 1.00625), 0.002)
    expect(wide.verdict).toBe('caution')
    expect(wide.message).toBe('J is known to ±0.62 % only (observed order 2.0); at most ±0.2 % is accepted. Give the outline more real detail, such as fillets, or the reason why this suffices.')
    const slow = judgeConvergence('J', estimateFromMeshes(1.002, 1.001, 1.0005), 0.002)
    expect(slow).toEqual({ verdict: 'information', message: 'J is known to ±0.05 % (observed order 1.0, less than 1.7); at most ±0.2 % is accepted.' })
    expect(judgeConvergence('J', estimateFromMeshes(1, 1, 1), 0.002)).toMatchObject({ verdict: 'inside', message: expect.stringContaining('down to rounding') })
    expect(judgeConvergence('J', { value: 0, onMeshes: [0, 0, 0], order: null, uncertainty: 1 }, 0.002).verdict).toBe('caution')
  })
})

describe('two methods', () => {
  it('agree, differ and contradict each other by the kind of section', () => {
    expect(judgeAgreement({ kind: 'open, corrected' }, 'J', 6.34623, 6.342047).verdict).toBe('inside')
    expect(judgeAgreement({ kind: 'open, corrected' }, 'J', 1.01, 1)).toEqual({ difference: expect.closeTo(0.01, 12), expected: 0.005, verdict: 'caution', message: 'The first method gives the torsion constant 1 % above the two-dimensional solution, more than the 0.5 % expected. Explain the difference.' })
    expect(judgeAgreement({ kind: 'exact shape' }, 'J', 0.9, 1)).toMatchObject({ verdict: 'stop', message: 'The first method gives the torsion constant 10 % below the two-dimensional solution, more than 3 times the 0.1 % expected. One of the two is not the section; correct it.' })
  })

  it('have no expectation where none is known, which is said', () => {
    expect(judgeAgreement({ kind: 'closed', chi: 0.2 }, 'J', 1, 1)).toMatchObject({ expected: null, verdict: 'caution', message: expect.stringContaining('face factor above 0.1') })
    expect(judgeAgreement({ kind: 'exact shape' }, 'tau in a fillet', 1, 1)).toMatchObject({ expected: null, verdict: 'caution' })
    expect(judgeAgreement({ kind: 'closed', chi: Number.NaN }, 'J', 1, 1).verdict).toBe('caution')
  })

  it('are not compared where one of them has no value', () => {
    for (const [a, b] of [[1, 0], [Number.NaN, 1], [Infinity, 1]] as const) {
      expect(judgeAgreement({ kind: 'exact shape' }, 'J', a, b)).toMatchObject({ difference: 0, verdict: 'caution', message: expect.stringContaining('cannot be compared') })
    }
  })
})

describe('dense equations', () => {
  it.each([1, 2, 31, 32, 33, 100, 131])('of %i unknowns are solved', (n) => {
    // A pseudo-random matrix with zeros on its diagonal needs every row exchange.
    const entry = (i: number, j: number): number => (i === j ? 0 : Math.sin(1 + 12.9898 * i + 78.233 * j + i * j))
    const a = Float64Array.from({ length: n * n }, (_, k) => (n === 1 ? 2 : entry(Math.floor(k / n), k % n)))
    const x = Float64Array.from({ length: n }, (_, k) => 1 + k % 3)
    const b = Float64Array.from({ length: n }, (_, i) => x.reduce((sum, value, j) => sum + (a[i * n + j] ?? 0) * value, 0))
    expect(solveDense(a, b)).toBe(true)
    for (const [k, value] of b.entries()) expect(value).toBeCloseTo(x[k] ?? 0, 8)
  })

  it('that contradict each other are refused', () => {
    expect(solveDense(Float64Array.of(1, 1, 1, 1), Float64Array.of(1, 2))).toBe(false)
    expect(solveDense(Float64Array.of(Number.NaN, 1, 1, 1), Float64Array.of(1, 2))).toBe(false)
  })
})

describe('the two sections of the requirement', () => {
  it.each([['thick angle', machinedAngle(60, 15, 6)], ['bent hat', bentHat(40, 40, 20, 2, 3)]] as const)('%s to 0.1 %% in J and 1 %% in peak shear by its own estimate, with checks passed', (_, outline) => {
    const { J, shear, checks } = given(outlineTorsion(outline))
    if (!shear.bounded) throw new Error('unbounded')
    expect(J.uncertainty / J.value).toBeLessThan(0.001)
    expect(shear.peaks.estimate.uncertainty / shear.peaks.estimate.value).toBeLessThan(0.01)
    expect(checks.every(({ ok }) => ok)).toBe(true)
    expect(shear.peaks.next).toHaveLength(2)
  })

  it('same bits each time: nothing depends on the clock or on what was solved before', () => {
    const first = given(outlineTorsion(machinedAngle(60, 15, 6)))
    given(outlineTorsion(bentHat(40, 40, 20, 2, 3)))
    expect(outlineTorsion(machinedAngle(60, 15, 6))).toEqual(first)
  })
})
