/** Turns a drawing into SVG text. Pure: the page and the PDF call the same function and get the same lines. */
import { escapeXml, n, type Canvas } from '#shared/calc/drawing/svg-canvas'
import { drawLegend, LEGEND_HEIGHT } from '#shared/calc/drawing/svg-legend'
import { drawMark } from '#shared/calc/drawing/svg-marks'
import { paletteOf, type DrawingTheme } from '#shared/calc/drawing/svg-theme'
import { drawWalls, isWall } from '#shared/calc/drawing/svg-walls'
import type { Drawing } from '#shared/calc/types'

export type { DrawingTheme } from '#shared/calc/drawing/svg-theme'

/** Width at which lettering stands at its nominal size. */
const NOMINAL_WIDTH = 470

/**
 * @param drawing shapes in section space (mm, y upwards)
 * @param options.width width of the picture in pixels (or points, in a PDF); the height follows
 */
export function drawingToSvg(drawing: Drawing, options: { width: number, theme: DrawingTheme }): string {
  const { box } = drawing
  const width = Math.max(options.width, 40)
  const scale = width / (box.width > 0 ? box.width : 1)
  const legend = drawing.ramp ? LEGEND_HEIGHT : 0
  const picture = Math.max(box.height * scale, 1)
  const canvas: Canvas = {
    palette: paletteOf(options.theme), scale, width, height: picture + legend,
    mark: Math.min(Math.max(width / NOMINAL_WIDTH, 0.78), 1.15),
    px: ([x, y]) => [(x - box.x) * scale, picture - (y - box.y) * scale],
  }
  const walls = drawing.shapes.filter(isWall)
  const marks = drawing.shapes.filter(shape => !isWall(shape)).map(shape => drawMark(canvas, shape)).join('')
  const ramp = drawing.ramp ? drawLegend(canvas, drawing.ramp, walls, picture) : ''
  const size = `width="${n(width)}" height="${n(canvas.height)}" viewBox="0 0 ${n(width)} ${n(canvas.height)}"`
  return `<svg xmlns="http://www.w3.org/2000/svg" ${size} role="img" aria-label="${escapeXml(drawing.alt)}">${drawWalls(canvas, walls)}${marks}${ramp}</svg>`
}
