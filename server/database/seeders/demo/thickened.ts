/** The true outline of a bent sheet: its mid-line thickened, with the bends rounded on both faces. */
import type { LoopInput } from '#shared/calc/kinds/general-outline/schema'
import { typed, type Corner } from './inputs'

export interface Thickened { corners: Corner[], t: number | number[], inside: string, outside: string }

type Point = [x: number, y: number]
interface Run { along: Point, across: Point, half: number }

const cross = (a: Point, b: Point): number => a[0] * b[1] - a[1] * b[0]

function runsOf(points: Point[], t: number | number[]): Run[] {
  return points.slice(1).map(([x, y], index): Run => {
    const [x0, y0] = points[index] as Point
    const length = Math.hypot(x - x0, y - y0)
    const along: Point = [(x - x0) / length, (y - y0) / length]
    return { along, across: [-along[1], along[0]], half: (typeof t === 'number' ? t : t[index] ?? 0) / 2 }
  })
}

/** Where the faces of two walls meet, at the signed distances of their own half thickness from the corner. */
function meeting(at: Point, before: Run, after: Run, side: 1 | -1): Point {
  const turn = cross(before.along, after.along)
  const [d1, d2] = [side * before.half, side * after.half]
  const [[x1, y1], [x2, y2]] = [before.along, after.along]
  return [at[0] + (d1 * x2 - d2 * x1) / turn, at[1] + (d1 * y2 - d2 * y1) / turn]
}

const vertex = ([x, y]: Point, radius: string | null) =>
  ({ x: typed(x.toFixed(5), 'mm'), y: typed(y.toFixed(5), 'mm'), radius: radius === null ? null : typed(radius, 'mm'), sweep: null, name: '' })

/** One loop round an open sheet with square ends. */
export function thickened({ corners, t, inside, outside }: Thickened): LoopInput {
  const points = corners.map(([x, y]): Point => [Number(x), Number(y)])
  const runs = runsOf(points, t)
  const face = (side: 1 | -1) => points.map((at, index) => {
    const [before, after] = [runs[index - 1], runs[index]]
    if (before && after) return vertex(meeting(at, before, after, side), cross(before.along, after.along) * side > 0 ? inside : outside)
    const { across, half } = before ?? after as Run
    return vertex([at[0] + side * half * across[0], at[1] + side * half * across[1]], null)
  })
  return { by: 'vertices', vertices: [...face(1), ...face(-1).reverse()] }
}
