/** Sharp re-entrant vertices: there the shear of linear elasticity has no bound, and no number stands for it (§4.4, G-10). */
import type { OutlineEdge, PlanePoint } from '#shared/torsion/outline/outline'
import type { OutlineCorner, SoundOutline } from '#shared/torsion/outline/outline-check'
import { edgeDirection, edgePoint } from '#shared/torsion/outline/outline'
import { nearestOnEdge } from '#shared/torsion/outline/edge-distance'
import { excludedDisc, reentrantAbove } from '#shared/torsion/outline/published'

export interface ReentrantVertex {
  readonly at: PlanePoint
  /** Angle of the material, rad. */
  readonly interior: number
  readonly edges: readonly [string, string]
  /** Thickness of the material across the vertex, mm. */
  readonly thickness: number
  /** Radius of the disc left out of the greatest shear, mm. */
  readonly excluded: number
}

/** Whether a direction from the vertex points into the material. */
function pointsInside({ after, interior }: OutlineCorner, direction: number): boolean {
  const fullTurn = 2 * Math.PI
  const turned = ((direction - edgeDirection(after, 0)) % fullTurn + fullTurn) % fullTurn
  return turned < interior
}

/** Nearest boundary seen from the vertex through the material, its own edges aside; half the root of the area where there is none. */
function thicknessAt(corner: OutlineCorner, edges: readonly OutlineEdge[], fallback: number): number {
  const seen = edges.filter(edge => edge !== corner.before && edge !== corner.after).flatMap((edge) => {
    const { distance, part } = nearestOnEdge(corner.at, edge)
    const foot = edgePoint(edge, part)
    return pointsInside(corner, Math.atan2(foot.y - corner.at.y, foot.x - corner.at.x)) ? [distance] : []
  })
  return seen.length ? Math.min(...seen) : fallback
}

/** The vertices whose interior angle exceeds 185°. */
export function reentrantVertices({ corners, edges, properties }: SoundOutline): ReentrantVertex[] {
  return corners.filter(({ interior }) => interior > reentrantAbove).map((corner) => {
    const thickness = thicknessAt(corner, edges, Math.sqrt(properties.A) / 2)
    return { at: corner.at, interior: corner.interior, edges: [corner.before.name, corner.after.name], thickness, excluded: excludedDisc * thickness }
  })
}

const place = ({ x, y }: PlanePoint): string => `(${Number(x.toPrecision(5))}, ${Number(y.toPrecision(5))})`

/** What a note says of such a vertex instead of a stress. */
export const unboundedSentence = ({ at, edges }: ReentrantVertex): string =>
  `Unbounded in linear elasticity at ${place(at)}, between ${edges[0]} and ${edges[1]}: a finite value needs the real fillet radius.`
