import { describe, expect, it } from 'vitest'
import { knockDownAt, shearAllowables } from '#shared/torsion/allowables'
import { factorAction, specialFactor } from '#shared/torsion/factors'
import { envelope, governingRows, passes, reserveFactor } from '#shared/torsion/margins'
import { stripAsWagner, stripRateLimit, wagner } from '#shared/torsion/wagner'
import { characteristicLength } from '#shared/torsion/warping-length'

describe('reserve factor', () => {
  it('compares magnitudes', () => {
    expect(reserveFactor(100, -50)).toEqual({ ok: true, loaded: true, rf: 2, ms: 1 })
  })

  it('is high without load and never infinite', () => {
    const high = { ok: true, loaded: false, rf: null, ms: null }
    expect(reserveFactor(100, 0)).toEqual(high)
    expect(reserveFactor(1e300, 1e-300)).toEqual(high)
    expect(passes(null)).toBe(true)
    expect(passes(0)).toBe(true)
    expect(passes(-1e-15)).toBe(false)
  })

  it('needs an allowable and a number', () => {
    for (const allowable of [0, -1, Number.NaN, Infinity]) expect(reserveFactor(allowable, 1).ok).toBe(false)
    expect(reserveFactor(1, Number.NaN).ok).toBe(false)
  })
})

describe('governing', () => {
  it('is the least margin, with every row within half a per cent of its reserve factor', () => {
    expect(governingRows([0.5, 0.1, null, 0.1054, 0.1057])).toEqual([1, 3])
    expect(governingRows([0.2, 0.2])).toEqual([0, 1])
    expect(governingRows([null, null])).toEqual([])
    expect(governingRows([])).toEqual([])
  })

  it('lists a case that a reader would call equal: +1.4169 and +1.4242 (independent reference program)', () => {
    expect(governingRows([1.4169081893722963, 1.424247982990476, 1.6634])).toEqual([0, 1])
  })
})

describe('envelope', () => {
  it('keeps the sign and the case', () => {
    const values = [{ caseId: 'A', value: 3 }, { caseId: 'B', value: -7 }, { caseId: 'C', value: 3 }]
    expect(envelope(values)).toEqual({ max: values[0], min: values[1] })
    expect(envelope([])).toBeNull()
  })
})

describe('factors', () => {
  it('take the highest special factor and never their product (25.619)', () => {
    expect(specialFactor({ fitting: 1.15, casting: 1.25, bearing: 1 })).toEqual({ value: 1.25, name: 'casting', notApplied: ['fitting'] })
    expect(specialFactor({})).toEqual({ value: 1, name: null, notApplied: [] })
    expect(specialFactor({ fitting: 0.9 })).toEqual({ value: 1, name: null, notApplied: [] })
  })

  it('act once on each level', () => {
    const factors = { safety: 1.5, special: 1.15, specialAtLimit: true }
    expect(factorAction(100, 'limit', factors)).toMatchObject({ limit: 114.99999999999999, ultimateFactor: 1.5 * 1.15 })
    expect(factorAction(100, 'limit', { ...factors, specialAtLimit: false })).toMatchObject({ limit: 100 })
  })

  it('give a load prescribed as ultimate no factor of safety, and a limit level only when confirmed', () => {
    const factors = { safety: 1.5, special: 1, specialAtLimit: true }
    expect(factorAction(150, 'ultimate', factors)).toMatchObject({ ultimate: 150, limit: null, limitFactor: null })
    expect(factorAction(150, 'ultimate', factors, true)).toMatchObject({ ultimate: 150, limit: 100 })
  })

  it('are at least one', () => {
    expect(factorAction(1, 'limit', { safety: 0.9, special: 1, specialAtLimit: true })).toMatchObject({ ok: false })
    expect(factorAction(1, 'limit', { safety: 1.5, special: Number.NaN, specialAtLimit: true })).toMatchObject({ ok: false })
    expect(factorAction(Number.NaN, 'limit', { safety: 1.5, special: 1, specialAtLimit: true })).toMatchObject({ ok: false })
  })
})

describe('allowables', () => {
  const points = [{ temperature: 71, factor: 0.97 }, { temperature: -55, factor: 1 }, { temperature: 23, factor: 1 }, { temperature: 100, factor: 0.93 }]
  it.each([[23, 1], [71, 0.97], [47, 0.985], [-55, 1], [100, 0.93], [85.5, 0.95]])('at %d °C the factor is %d', (temperature, factor) => {
    const found = knockDownAt(points, temperature)
    expect(found.ok && found.factor).toBeCloseTo(factor, 12)
  })

  it('are not carried beyond the record', () => {
    expect(knockDownAt(points, 101)).toEqual({ ok: false, reason: 'The material record gives strengths from -55 to 100 °C; the case is at 101 °C.' })
    expect(knockDownAt(points, -56).ok).toBe(false)
    expect(knockDownAt([], 23).ok).toBe(false)
    expect(knockDownAt(points, Number.NaN).ok).toBe(false)
    expect(knockDownAt([{ temperature: 23, factor: 0 }], 23).ok).toBe(false)
  })

  it('take the lower factor of a step, and one point alone at its temperature', () => {
    expect(knockDownAt([{ temperature: 23, factor: 1 }, { temperature: 23, factor: 0.9 }], 23)).toEqual({ ok: true, factor: 0.9 })
    expect(knockDownAt([{ temperature: 23, factor: 1 }], 23)).toEqual({ ok: true, factor: 1 })
  })

  it('use a published shear yield before F_ty/√3, and make up no shear ultimate', () => {
    expect(shearAllowables({ Fsu: null, Fsy: 200, Fty: 400 }, 0.5)).toEqual({ ultimate: null, yield: 100, yieldSource: 'published' })
    expect(shearAllowables({ Fsu: 300, Fsy: null, Fty: null }, 1)).toEqual({ ultimate: 300, yield: null, yieldSource: null })
    expect(shearAllowables({ Fsu: 300, Fsy: null, Fty: 300 }, 1).yield).toBeCloseTo(173.205, 3)
  })
})

describe('large twist', () => {
  const strip = { b: 60, t: 2, E: 71_000, G: 26_900 }
  it('has the ratio of the limit at the limiting rate, and grows with its square', () => {
    const ratio = (rate: number): number => {
      const effect = wagner(stripAsWagner(strip, rate))
      return effect.ok ? effect.ratio : Number.NaN
    }
    const limit = stripRateLimit(strip)
    expect(ratio(limit)).toBeCloseTo(0.02, 12)
    expect(ratio(2 * limit)).toBeCloseTo(0.08, 12)
    expect(ratio(-limit)).toBeCloseTo(0.02, 12)
  })

  it('adds to the torque in its own sense', () => {
    const effect = wagner(stripAsWagner(strip, -0.002))
    expect(effect.ok && effect.torque / effect.linearTorque - effect.ratio).toBeCloseTo(1, 12)
  })

  it('needs finite, positive stiffness', () => {
    expect(wagner({ ...stripAsWagner(strip, 1), GJ: 0 }).ok).toBe(false)
    expect(wagner(stripAsWagner(strip, Number.NaN)).ok).toBe(false)
    expect(wagner(stripAsWagner(strip, 1e200)).ok).toBe(false)
  })
})

describe('characteristic length', () => {
  it('is absent where nothing warps', () => {
    expect(characteristicLength(71_000, 0, 1e6)).toBeNull()
    expect(characteristicLength(Number.NaN, 1, 1)).toBeNull()
  })
})
