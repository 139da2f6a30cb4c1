/** Whether the corner radii of a profile fit on its walls. mm, rad. */
import type { Junction, OpenSection, OpenWall, Refusal, SectionNode } from '#shared/torsion/section'
import { directionOf, distance } from '#shared/torsion/geometry'
import { refusal } from '#shared/torsion/section'
import { mm } from '#shared/torsion/profiles/walls-of-profile'

interface Leaving { readonly wall: OpenWall, readonly direction: number }
interface Known { readonly nodes: ReadonlyMap<string, SectionNode>, readonly leaving: ReadonlyMap<string, readonly Leaving[]> }

const full = 2 * Math.PI
const positive = (angle: number): number => ((angle % full) + full) % full

function known({ nodes, walls }: OpenSection): Known {
  const byId = new Map(nodes.map(node => [node.id, node]))
  const leaving = new Map<string, Leaving[]>()
  for (const wall of walls) {
    const [a, b] = [byId.get(wall.from), byId.get(wall.to)]
    if (!a || !b) continue
    for (const [from, to] of [[a, b], [b, a]] as const) leaving.set(from.id, [...leaving.get(from.id) ?? [], { wall, direction: directionOf(from, to) }])
  }
  return { nodes: byId, leaving }
}

/** What a bend takes of the mid-line of each of its walls: its tangent length. */
export const bendTangent = (radius: number, t: number, turn: number): number => (radius + t / 2) * Math.tan(turn / 2)

/** What the inner corner with its fillet takes of a face: to the near face of the wall beside it, and the tangent length. */
export function filletTangent(radius: number, own: number, beside: number, between: number): number {
  return (beside / 2 + own / 2 * Math.cos(between)) / Math.sin(between) + radius / Math.tan(between / 2)
}

/** What the corner at one end takes of the left and the right face, seen from that end; at a bend, of the mid-line. */
function taken(end: string, wall: OpenWall, junction: Junction | undefined, { leaving }: Known): { left: number, right: number } {
  const here = leaving.get(end) ?? []
  const own = here.find(one => one.wall === wall)
  const others = here.filter(one => one.wall !== wall)
  if (!own || others.length === 0 || !junction) return { left: 0, right: 0 }
  const [first] = others
  if (junction.make === 'bent' && first) {
    const turn = Math.abs(Math.PI - positive(first.direction - own.direction))
    const need = bendTangent(junction.radius, wall.t, turn)
    return { left: need, right: need }
  }
  const side = (sense: 1 | -1): number => {
    const angles = others.map(one => ({ t: one.wall.t, between: positive(sense * (one.direction - own.direction)) }))
    const next = angles.reduce((least, one) => (one.between < least.between ? one : least))
    return next.between < Math.PI - 1e-6 ? filletTangent(junction.radius, wall.t, next.t, next.between) : 0
  }
  return { left: side(1), right: side(-1) }
}

/** @returns the refusal at the first wall that is too short for the radii at its ends. */
export function radiiFit(section: OpenSection, names: Readonly<Record<string, string>>): Refusal | null {
  const graph = known(section)
  const corners = new Map(section.junctions.map(junction => [junction.node, junction]))
  for (const wall of section.walls) {
    const [a, b] = [graph.nodes.get(wall.from), graph.nodes.get(wall.to)]
    if (!a || !b || wall.arc) continue
    const [head, tail] = [taken(wall.from, wall, corners.get(wall.from), graph), taken(wall.to, wall, corners.get(wall.to), graph)]
    const need = Math.max(head.left + tail.right, head.right + tail.left)
    const length = distance(a, b)
    if (need > length * (1 + 1e-9)) {
      const radius = (corners.get(wall.from) ?? corners.get(wall.to))?.radius ?? 0
      return refusal(`An inside radius of ${mm(radius)} is too large for the ${names[wall.id] ?? wall.id}: its corners take ${mm(need)} and it is ${mm(length)} long on the mid-line. Lessen the radius or lengthen the wall.`, 'r')
    }
  }
  return null
}
