/**
 * Walls with their stress through the thickness: paper at the mid-line, full at both faces.
 *
 * A wall outline holds an even number of points: the first half runs along one face, the second half
 * comes back along the other. Point i and point 2n−1−i face each other, so a band at any depth is a
 * mix of the two; no gradients are needed and arcs are drawn as well as straight walls.
 */
import { n, polygon, type Canvas, type Pixel } from '#shared/calc/drawing/svg-canvas'
import { rampColour } from '#shared/calc/drawing/svg-theme'
import type { Shape } from '#shared/calc/types'

export type WallShape = Extract<Shape, { type: 'path' }>
const BANDS = 14
const OUTLINE = 1.1
const LEAST_THICKNESS = 2

export function isWall(shape: Shape): shape is WallShape {
  return shape.type === 'path' && shape.role === 'wall'
}

/** All walls: first every outline, then every filling, so that the line runs round the whole section and not between walls. */
export function drawWalls(canvas: Canvas, walls: WallShape[]): string {
  const outlines = walls.map(w => polygon(facesOf(canvas, w, 1), `fill="${canvas.palette.ink}" stroke="${canvas.palette.ink}" stroke-width="${n(OUTLINE * 2 + 0.4)}" stroke-linejoin="round"`))
  const loose = walls.filter(w => w.wall === undefined).map(w => filled(canvas, w, 1, w.level ?? 0))
  const bands = Array.from({ length: BANDS }, (_, k) => 1 - k / BANDS)
    .flatMap(depth => walls.filter(w => w.wall !== undefined).map(w => filled(canvas, w, depth, (w.level ?? 0) * depth)))
  return [...outlines, ...loose, ...bands].join('')
}

function filled(canvas: Canvas, wall: WallShape, depth: number, level: number): string {
  const colour = rampColour(canvas.palette, level)
  return polygon(facesOf(canvas, wall, depth), `fill="${colour}" stroke="${colour}" stroke-width=".4"`)
}

/** The outline drawn in towards its mid-line to a share `depth` of its thickness. */
function facesOf(canvas: Canvas, wall: WallShape, depth: number): Pixel[] {
  const points = wall.points.map(canvas.px)
  if (wall.wall === undefined) return points
  const last = points.length - 1
  const widen = depth * thinWallFactor(points)
  return points.map((p, i) => {
    const facing = points[last - i] ?? p
    const mid: Pixel = [(p[0] + facing[0]) / 2, (p[1] + facing[1]) / 2]
    return [mid[0] + (p[0] - mid[0]) * widen, mid[1] + (p[1] - mid[1]) * widen] as const
  })
}

/** A wall thinner than two pixels is drawn two pixels thick. */
function thinWallFactor(points: Pixel[]): number {
  const middle = Math.floor(points.length / 4)
  const a = points[middle]
  const b = points[points.length - 1 - middle]
  const thickness = a && b ? Math.hypot(a[0] - b[0], a[1] - b[1]) : 0
  return thickness > 0 && thickness < LEAST_THICKNESS ? LEAST_THICKNESS / thickness : 1
}
