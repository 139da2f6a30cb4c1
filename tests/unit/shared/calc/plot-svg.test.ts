/** Plots along the span: ticks, readings, files. */
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { niceTicks, plotExtent } from '#shared/calc/drawing/plot-scale'
import { plotToCsv, plotToSvg, seriesAt } from '#shared/calc/drawing/plot-svg'
import type { Plot } from '#shared/calc/types'
import { fromEngine } from '#shared/units/units'

const plot = (points: [number, number][]): Plot => ({
  key: 'torque', title: 'Torque along the bar', x: { label: 'Station', symbol: 'z', dimension: 'length', unit: 'mm' },
  y: { label: 'Torque', symbol: 'T', dimension: 'torque', unit: 'N·m' }, series: [{ name: 'L01 "up"', points }, { name: 'L02', points: points.map(([x, y]) => [x, -y]) }],
})

describe('a plot', () => {
  it('has round ticks in the unit shown, inside what it spans', () => {
    expect(niceTicks({ from: 0, to: 1234 }, 'mm', 6)).toEqual([0, 500, 1000])
    expect(niceTicks({ from: -30_000, to: 150_000 }, 'N·m', 5).map(value => fromEngine(value, 'N·m'))).toEqual([0, 50, 100, 150])
    fc.assert(fc.property(fc.double({ min: -1e9, max: 1e9, noNaN: true }), fc.double({ min: 1e-6, max: 1e9, noNaN: true }), (from, size) => {
      const ticks = niceTicks({ from, to: from + size }, 'mm', 5)
      const slack = 1e-6 * size + 1e-12 * Math.abs(from)
      for (const tick of ticks) {
        expect(tick).toBeGreaterThanOrEqual(from - slack)
        expect(tick).toBeLessThanOrEqual(from + size + slack)
      }
      expect(ticks.length).toBeLessThanOrEqual(20)
    }))
  })
  it('always shows zero of the value, and survives a single point, no point and equal values', () => {
    expect(plotExtent(plot([[0, 5000], [100, 6000]])).y).toEqual({ from: -6000, to: 6000 })
    for (const points of [[], [[5, 3]], [[0, 2], [10, 2]]] as [number, number][][]) expect(plotToSvg(plot(points), { width: 400, theme: 'light' })).not.toMatch(/NaN|Infinity|undefined/)
  })
  it('reads between its points, and before a jump', () => {
    const points: [number, number][] = [[0, 10], [100, 30], [100, -30], [200, -30]]
    expect(seriesAt(points, 50)).toBe(20)
    expect(seriesAt(points, 100)).toBe(30)
    expect(seriesAt(points, 150)).toBe(-30)
    expect(seriesAt(points, 201)).toBeNull()
  })
  it('becomes a file with the units in its head', () => {
    expect(plotToCsv(plot([[0, 5000]]))).toBe('series,"Station, mm","Torque, N·m"\r\n"L01 ""up""",0,5\r\nL02,0,-5')
  })
  it('keeps names out of its markup', () => {
    const named = plot([[0, 1], [1, 2]])
    named.series[0]!.name = '<script>'
    expect(plotToSvg(named, { width: 400, theme: 'print' })).not.toContain('<script>')
  })
})
