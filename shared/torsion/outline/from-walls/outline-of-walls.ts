/**
 * The outline of a thin-walled section: each wall offset by half its thickness to either side, joined at the nodes by
 * mitres, fillets and bends of the drawing, free ends square (§4). Arcs stay arcs. Geometry only: nothing of the
 * thin-walled theories is used, so that the solution on this outline is a second method.
 */
import type { Refusal } from '#shared/torsion/section'
import type { Outline, OutlineVertex, PlanePoint } from '#shared/torsion/outline/outline'
import type { Join } from '#shared/torsion/outline/from-walls/corner-join'
import type { SideTurn, WalledSection, WallSide } from '#shared/torsion/outline/from-walls/wall-sides'
import { joinOf, joinVertex } from '#shared/torsion/outline/from-walls/corner-join'
import { sideWalks, wallsFault, wallSides } from '#shared/torsion/outline/from-walls/wall-sides'
import { turn } from '#shared/torsion/geometry'
import { loopEdges } from '#shared/torsion/outline/outline'
import { checkOutline } from '#shared/torsion/outline/outline-check'
import { signedArea } from '#shared/torsion/outline/outline-properties'
import { refusal } from '#shared/torsion/section'

export interface WallsOutline { readonly ok: true, readonly outline: Outline }

const sideName = ({ wall, forward }: WallSide): string => `${forward ? 'left' : 'right'} side of wall ${wall.id}`

const tooShort = ({ wall, from, to }: WallSide): Refusal =>
  refusal(`Wall ${wall.id} is too short for the corners at ${from.id} and ${to.id}: nothing is left of it on one side. Lengthen it or lessen the radii.`)

/** How far round its circle a side reaches; trimming moves its ends by less than half a turn. */
function sweptOf({ curve, sweep, leaves, leavesBack }: WallSide, start: PlanePoint, end: PlanePoint): number {
  if (curve.kind === 'line') return 0
  const angle = (at: PlanePoint): number => Math.atan2(at.y - curve.centre.y, at.x - curve.centre.x)
  const quarter = curve.sense * Math.PI / 2
  return sweep + turn(angle(end) - (leavesBack + Math.PI - quarter)) - turn(angle(start) - (leaves - quarter))
}

/** One side between its joins: one edge, or two where an arc turns by more than half a circle. */
function sideVertices(side: WallSide, start: PlanePoint, end: PlanePoint, size: number): OutlineVertex[] | Refusal {
  const { curve } = side
  const name = sideName(side)
  if (curve.kind === 'line') {
    const length = (end.x - start.x) * Math.cos(curve.direction) + (end.y - start.y) * Math.sin(curve.direction)
    if (length < -1e-9 * size) return tooShort(side)
    return length <= 1e-9 * size ? [] : [{ ...start, bulge: 0, name }]
  }
  const swept = sweptOf(side, start, end)
  if (swept * curve.sense * curve.radius < -1e-9 * size) return tooShort(side)
  if (Math.abs(swept) * curve.radius <= 1e-9 * size) return []
  if (Math.abs(swept) <= Math.PI) return [{ ...start, bulge: Math.tan(swept / 4), name }]
  const middle = Math.atan2(start.y - curve.centre.y, start.x - curve.centre.x) + swept / 2
  const bulge = Math.tan(swept / 8)
  return [{ ...start, bulge, name }, { x: curve.centre.x + curve.radius * Math.cos(middle), y: curve.centre.y + curve.radius * Math.sin(middle), bulge, name }]
}

function loopOf(walk: readonly SideTurn[], section: WalledSection, size: number): OutlineVertex[] | Refusal {
  const joins: Join[] = []
  for (const at of walk) {
    const join = joinOf(at, section.junctions?.find(({ node }) => node === at.side.to.id))
    if ('ok' in join) return join
    joins.push(join)
  }
  const loop: OutlineVertex[] = []
  for (const [index, { side }] of walk.entries()) {
    const [before, join] = [joins.at(index - 1), joins[index]]
    if (!before || !join) continue
    const vertices = sideVertices(side, before.start, join.end, size)
    if ('ok' in vertices) return vertices
    loop.push(...vertices, ...joinVertex(join, size))
  }
  return loop
}

/** The largest extent of the nodes and arcs, for tolerances. */
const sizeOf = ({ nodes, walls }: WalledSection): number => nodes.reduce((most, { x, y }) => Math.max(most, Math.hypot(x - (nodes[0]?.x ?? 0), y - (nodes[0]?.y ?? 0))), 0)
  + walls.reduce((most, { t, arc }) => Math.max(most, t, arc ? arc.radius * Math.min(Math.abs(arc.sweep), 2) : 0), 0)

/**
 * Outer loop and holes of walls with thickness (mm). Every inside corner at a machined junction takes its fillet; a bend
 * takes its inside radius and, outside, that radius and the thickness. Refused with a sentence where walls are too short
 * for their corners, overlap, meet at less than 15°, or are not joined to each other.
 */
export function outlineOfWalls(section: WalledSection): WallsOutline | Refusal {
  const fault = wallsFault(section)
  if (fault) return refusal(fault)
  const sides = wallSides(section)
  if ('ok' in sides) return sides
  const walks = sideWalks(sides)
  if ('ok' in walks) return walks
  const size = sizeOf(section)
  const loops: OutlineVertex[][] = []
  for (const walk of walks) {
    const loop = loopOf(walk, section, size)
    if ('ok' in loop) return loop
    if (loop.length < 2) return refusal('A cell of the section is filled by its walls. Move the walls apart or make them thinner.')
    loops.push(loop)
  }
  // Walked with the empty space on the left, the outside runs clockwise and every cell counter-clockwise.
  const isOuter = (loop: OutlineVertex[]): boolean => signedArea(loopEdges(loop)) < 0
  const [outer, ...others] = loops.filter(isOuter)
  if (!outer) return refusal('The walls overlap so far that they bound no section. Move them apart or make them thinner.')
  if (others.length > 0) return refusal('The walls fall into parts that are not joined, or a cell is filled by its walls. Join the parts, or move the walls apart.')
  const checked = checkOutline({ outer, holes: loops.filter(loop => loop !== outer) })
  return checked.ok ? { ok: true, outline: checked.outline } : refusal(`The sides of the walls do not make an outline. ${checked.reason}`)
}
