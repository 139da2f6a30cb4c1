/** The sectorial coordinate along one wall, in closed form for lines and arcs. mm². */
import type { Point } from '#shared/torsion/section'
import type { ArcPath, WallPath } from '#shared/torsion/geometry'
import { pathPoint, pathStart } from '#shared/torsion/geometry'

/** δ − sin δ without cancellation: by its series below a twentieth, where four terms reach rounding. */
function sagittal(delta: number): number {
  if (Math.abs(delta) > 0.05) return delta - Math.sin(delta)
  const square = delta * delta
  return delta * square / 6 * (1 - square / 20 * (1 - square / 42 * (1 - square / 72)))
}

/**
 * Growth of the sectorial coordinate ∫(x dy − y dx) from the start of a piece
 * to `part` of it, pole at `pole`: twice the area of the triangle to the chord,
 * and for an arc twice the segment between chord and arc.
 */
export function sectorialGrowth(path: WallPath, pole: Point, part: number): number {
  const start = pathStart(path)
  const end = pathPoint(path, part)
  const triangle = (start.x - pole.x) * (end.y - start.y) - (start.y - pole.y) * (end.x - start.x)
  return path.kind === 'line' ? triangle : triangle + path.radius ** 2 * sagittal(part * path.sweep)
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
