import type { Plot } from '#shared/calc/types'
import { fromEngine, toEngine, type UnitId } from '#shared/units/units'

export interface Extent { from: number, to: number }

/** What the series span; zero belongs to the values, so that a small change is not shown as a large one. */
export function plotExtent(plot: Plot): { x: Extent, y: Extent } {
  const points = plot.series.flatMap(series => series.points)
  return { x: span(points.map(([x]) => x)), y: span([0, ...points.map(([, y]) => y)]) }
}

function span(values: number[]): Extent {
  const [from, to] = values.reduce(([low, high], value) => [Math.min(low, value), Math.max(high, value)], [Infinity, -Infinity])
  if (!(from < to)) return Number.isFinite(from) ? { from: from - (Math.abs(from) || 1) * 0.5, to: from + (Math.abs(from) || 1) * 0.5 } : { from: 0, to: 1 }
  return { from, to }
}

/** Round values within the extent, in the unit shown: steps of 1, 2 or 5 times a power of ten. Values are in engine units. */
export function niceTicks({ from, to }: Extent, unit: UnitId, about: number): number[] {
  const [low, high] = [fromEngine(from, unit), fromEngine(to, unit)]
  const rough = (high - low) / about
  if (!(rough > 0) || !Number.isFinite(rough)) return []
  const power = 10 ** Math.floor(Math.log10(rough))
  const step = [1, 2, 5, 10].map(k => k * power).find(one => one >= rough) ?? 10 * power
  const first = Math.ceil(low / step - 1e-9)
  const count = Math.floor(high / step + 1e-9) - first + 1
  return Array.from({ length: Math.max(0, Math.min(count, 4 * about)) }, (_, i) => toEngine((first + i) * step, unit))
}
