/** The ramp under a sketch: ticks with values, and above the bar the walls that reach each level. */
import { n, polygon, text, segment, type Canvas, type Pixel } from '#shared/calc/drawing/svg-canvas'
import { rampColour } from '#shared/calc/drawing/svg-theme'
import type { WallShape } from '#shared/calc/drawing/svg-walls'
import type { Drawing } from '#shared/calc/types'
import { fromEngine } from '#shared/units/units'
import { significant } from '#shared/units/display'

export const LEGEND_HEIGHT = 50
const STEPS = 48

/** `top` is where the legend may begin, in pixels. */
export function drawLegend(canvas: Canvas, ramp: NonNullable<Drawing['ramp']>, walls: WallShape[], top: number): string {
  const left = canvas.width * 0.1
  const width = canvas.width * 0.8
  const bar = top + 18
  // Each step runs on to the end under the next, so that no seam shows between two.
  const steps = Array.from({ length: STEPS }, (_, i) =>
    `<rect x="${n(left + width * i / STEPS)}" y="${n(bar)}" width="${n(width * (1 - i / STEPS))}" height="7" fill="${rampColour(canvas.palette, (i + 0.5) / STEPS)}"/>`).join('')
  const frame = `<rect x="${n(left)}" y="${n(bar)}" width="${n(width)}" height="7" fill="none" stroke="${canvas.palette.rule}" stroke-width=".6"/>`
  const place = (level: number): Pixel => [left + width * level, bar]
  return steps + frame + levelMarks(canvas, walls, place) + ticks(canvas, ramp, place)
}

function ticks(canvas: Canvas, ramp: NonNullable<Drawing['ramp']>, place: (level: number) => Pixel): string {
  const largest = fromEngine(ramp.max, ramp.unit)
  const tick = (level: number, value: string, anchor: 'start' | 'middle' | 'end') => {
    const [x, y] = place(level)
    return segment([x, y + 7], [x, y + 11], canvas.palette.ink3, 0.7) + text(canvas, [x, y + 22], value, { anchor, colour: canvas.palette.ink3 })
  }
  return tick(0, '0', 'start') + tick(0.5, significant(largest / 2, 3), 'middle')
    + tick(1, `${significant(largest, 3)}\u2009${ramp.unit}`, 'end')
}

/** Walls of one level share a mark; a mark too close to its neighbour joins it. */
function levelMarks(canvas: Canvas, walls: WallShape[], place: (level: number) => Pixel): string {
  const levels = new Map<string, { level: number, names: string[] }>()
  for (const wall of [...walls].sort((a, b) => (a.level ?? 0) - (b.level ?? 0))) {
    if (wall.wall === undefined || wall.level === undefined) continue
    const key = wall.level.toFixed(2)
    const group = levels.get(key) ?? { level: wall.level, names: [] }
    if (!group.names.includes(wall.wall)) group.names.push(wall.wall)
    levels.set(key, group)
  }
  return [...levels.values()].map(({ level, names }) => {
    const [x, y] = place(level)
    const wedge = polygon([[x, y], [x - 3.5, y - 6], [x + 3.5, y - 6]], `fill="${canvas.palette.ink2}"`)
    const named = names.length > 12 ? `${names.slice(0, 12).join(' ')} …` : names.join(' ')
    return wedge + text(canvas, [x - 6, y - 3], named, { anchor: level < 0.12 ? 'start' : 'end', colour: canvas.palette.ink3 })
  }).join('')
}
