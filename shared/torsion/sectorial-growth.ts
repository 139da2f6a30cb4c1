/** The sectorial coordinate along one wall, in closed form for lines and arcs. mm². */
import type { Point } from '#shared/torsion/section'
import type { ArcPath, WallPath } from '#shared/torsion/geometry'
import { pathPoint, pathStart } from '#shared/torsion/geometry'

/** Growth of the sectorial coordinate ∫(x dy − y dx) from the start of a piece to `part` of it, pole at `pole`. */
export function sectorialGrowth(path: WallPath, pole: Point, part: number): number {
  const start = pathStart(path)
  if (path.kind === 'line') {
    const end = pathPoint(path, part)
    return (start.x - pole.x) * (end.y - start.y) - (start.y - pole.y) * (end.x - start.x)
  }
  const { centre, radius, startAngle, sweep } = path
  const end = startAngle + part * sweep
  return radius * ((centre.x - pole.x) * (Math.sin(end) - Math.sin(startAngle)) - (centre.y - pole.y) * (Math.cos(end) - Math.cos(startAngle)))
    + radius * radius * part * sweep
}

/** Parts of an arc at which the sectorial coordinate about `pole` stops growing: its extremes inside the arc. */
export function sectorialTurns({ centre, radius, startAngle, sweep }: ArcPath, pole: Point): number[] {
  const [a, b] = [centre.x - pole.x, centre.y - pole.y]
  const reach = Math.hypot(a, b)
  if (reach <= radius) return []
  const [towards, open] = [Math.atan2(b, a), Math.acos(-radius / reach)]
  const full = 2 * Math.PI
  return [towards + open, towards - open]
    .map(angle => ((Math.sign(sweep) * (angle - startAngle)) % full + full) % full / Math.abs(sweep))
    .filter(part => part < 1)
}
