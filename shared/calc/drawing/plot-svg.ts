/** A plot as SVG text, for the page and the PDF alike: axes with round ticks, one line per series, zero marked. */
import { niceTicks, plotExtent, type Extent } from '#shared/calc/drawing/plot-scale'
import { escapeXml, n, segment, text, textWidth, type Canvas, type Pixel } from '#shared/calc/drawing/svg-canvas'
import { paletteOf, type DrawingTheme, type Palette } from '#shared/calc/drawing/svg-theme'
import type { Plot, PlotAxis } from '#shared/calc/types'
import { showValue, significant } from '#shared/units/display'
import { fromEngine } from '#shared/units/units'

/** Lines are told apart by dash as well as by colour. */
const DASHES = ['', '6 3', '2 2', '8 3 2 3', '1 3', '10 4']
const NOMINAL_WIDTH = 560
const HEIGHT = 220
/** Above this many lines the envelope says more than the names. */
const MOST_NAMED = 6

export interface PlotFrame { left: number, right: number, top: number, bottom: number, x: Extent, y: Extent }

/** Where the plot's own coordinates lie in the picture, so that a pointer can be read back. */
export function plotFrame(plot: Plot, width: number): PlotFrame {
  const { x, y } = plotExtent(plot)
  return { left: 62, right: Math.max(width, 160) - 12, top: 20, bottom: HEIGHT - 36, x, y }
}

export function plotToSvg(plot: Plot, { width: asked, theme }: { width: number, theme: DrawingTheme }): string {
  const width = Math.max(asked, 160)
  const palette = paletteOf(theme)
  const canvas: Canvas = { palette, scale: 1, width, height: HEIGHT, mark: Math.min(Math.max(width / NOMINAL_WIDTH, 0.85), 1.1), px: ([x, y]) => [x, y] }
  const frame = plotFrame(plot, width)
  const marks = [...axisX(canvas, plot.x, frame), ...axisY(canvas, plot.y, frame), ...lines(plot, frame, palette), ...names(canvas, plot, frame)]
  const alt = escapeXml(`${plot.title}: ${plot.y.label} over ${plot.x.label}`)
  return `<svg xmlns="http://www.w3.org/2000/svg" width="${n(width)}" height="${HEIGHT}" viewBox="0 0 ${n(width)} ${HEIGHT}" role="img" aria-label="${alt}">${marks.join('')}</svg>`
}

const along = (value: number, extent: Extent, from: number, to: number) => from + (value - extent.from) / (extent.to - extent.from) * (to - from)
const place = ([x, y]: readonly [number, number], frame: PlotFrame): Pixel => [along(x, frame.x, frame.left, frame.right), along(y, frame.y, frame.bottom, frame.top)]

/** Axis name with its unit, as `Torque, N·m`. */
const axisName = ({ label, unit }: PlotAxis) => (unit === '' ? label : `${label}, ${unit}`)
const tickText = (value: number, axis: PlotAxis) => significant(Number(fromEngine(value, axis.unit).toPrecision(12)), 5).replace(/(\.\d*?)0+(?=×|$)/, '$1').replace(/\.(?=×|$)/, '')

function axisX(canvas: Canvas, axis: PlotAxis, frame: PlotFrame): string[] {
  const { palette } = canvas
  const ticks = niceTicks(frame.x, axis.unit, 6)
  return [
    segment([frame.left, frame.bottom], [frame.right, frame.bottom], palette.rule, 0.75),
    ...ticks.flatMap((value) => {
      const x = along(value, frame.x, frame.left, frame.right)
      return [segment([x, frame.bottom], [x, frame.bottom + 4], palette.rule, 0.75), text(canvas, [x, frame.bottom + 15], tickText(value, axis), { anchor: 'middle', colour: palette.ink2, size: 10.5 })]
    }),
    text(canvas, [frame.right, frame.bottom + 30], axisName(axis), { anchor: 'end', colour: palette.ink2, size: 11 }),
  ]
}

function axisY(canvas: Canvas, axis: PlotAxis, frame: PlotFrame): string[] {
  const { palette } = canvas
  return [
    ...niceTicks(frame.y, axis.unit, 5).flatMap((value) => {
      const y = along(value, frame.y, frame.bottom, frame.top)
      return [segment([frame.left, y], [frame.right, y], palette.rule, value === 0 ? 0.9 : 0.3, value === 0 ? '' : '1 3'), text(canvas, [frame.left - 6, y + 3.5], tickText(value, axis), { anchor: 'end', colour: palette.ink2, size: 10.5 })]
    }),
    text(canvas, [4, 11], axisName(axis), { colour: palette.ink2, size: 11 }),
  ]
}

function lines(plot: Plot, frame: PlotFrame, palette: Palette): string[] {
  return plot.series.map(({ points }, i) => {
    const dash = DASHES[i % DASHES.length]
    const path = points.map((point, k) => `${k === 0 ? 'M' : 'L'}${place(point, frame).map(n).join(' ')}`).join('')
    return path === '' ? '' : `<path d="${path}" fill="none" stroke="${i % 2 === 0 ? palette.accent : palette.ink}" stroke-width="1.6"${dash ? ` stroke-dasharray="${dash}"` : ''}/>`
  })
}

/** The key of the lines, above the plot at the right; one line needs none. */
function names(canvas: Canvas, plot: Plot, frame: PlotFrame): string[] {
  if (plot.series.length < 2 || plot.series.length > MOST_NAMED) return []
  let x = frame.right
  return [...plot.series.entries()].reverse().flatMap(([i, { name }]) => {
    const dash = DASHES[i % DASHES.length] ?? ''
    x -= textWidth(name, 11) + 6
    const label = text(canvas, [x, 11], name, { colour: canvas.palette.ink2, size: 11 })
    x -= 28
    return [label, segment([x + 2, 7.5], [x + 24, 7.5], i % 2 === 0 ? canvas.palette.accent : canvas.palette.ink, 1.6, dash)]
  })
}

/** The points of every series as comma-separated values, in the units shown. */
export function plotToCsv(plot: Plot): string {
  const cell = (value: string) => (/[",\n]/.test(value) ? `"${value.replaceAll('"', '""')}"` : value)
  const head = ['series', axisName(plot.x), axisName(plot.y)].map(cell).join(',')
  const rows = plot.series.flatMap(({ name, points }) => points.map(([x, y]) => [cell(name), fromEngine(x, plot.x.unit), fromEngine(y, plot.y.unit)].join(',')))
  return [head, ...rows].join('\r\n')
}

/** Value of a series at x between its points, which are in order; null outside. A jump gives the value before it. */
export function seriesAt(points: readonly (readonly [number, number])[], x: number): number | null {
  for (let i = 1; i < points.length; i += 1) {
    const [[x0, y0], [x1, y1]] = [points[i - 1] ?? [0, 0], points[i] ?? [0, 0]]
    if (x < x0 || x > x1) continue
    return x1 === x0 ? y0 : y0 + (y1 - y0) * (x - x0) / (x1 - x0)
  }
  return points.length === 1 && points[0]?.[0] === x ? points[0][1] : null
}

export const plotValue = (value: number, axis: PlotAxis): string => showValue(value, axis.dimension, axis.unit)
