/**
 * The mid-line of a section: its walls, trimmed where a bend of given radius
 * replaces the corner, and the bends between them.
 */
import type { Junction, OpenSection, OpenWall, Point, SectionFault, SectionNode } from '#shared/torsion/section'
import type { WallPath } from '#shared/torsion/geometry'
import { along, arcFromTangent, directionOf, distance, leavingDirection, pathEnd, pathLength, pathStart, turn, wallPath } from '#shared/torsion/geometry'

/** A stretch of mid-line whose thickness is constant or linear. A bend belongs half to each of its two walls. */
export interface Piece {
  readonly path: WallPath
  readonly from: string
  readonly to: string
  /** Thickness at its start and at its end, mm. */
  readonly t: number
  readonly tEnd: number
  readonly G: number
  readonly E: number | null
  readonly walls: readonly { readonly id: string, readonly part: number }[]
  /** The node whose corner it replaces, for a bend. */
  readonly bendAt: string | null
}

/** The thickness after `part` (0…1) of a stretch, mm. */
export const thicknessAt = ({ t, tEnd }: Pick<Piece, 't' | 'tEnd'>, part: number): number => (t === tEnd ? t : t + part * (tEnd - t))

/** Whether the thickness of a wall changes along it. */
export const tapers = ({ t, tEnd = t }: OpenWall): boolean => tEnd !== t

/** A wall end at a node: which end, and the direction in which the wall leaves the node. */
export interface WallAtNode { readonly wall: OpenWall, readonly end: 'start' | 'end', readonly direction: number, readonly path: WallPath }

export interface MidLine {
  readonly pieces: readonly Piece[]
  /** Walls meeting at each node. */
  readonly atNode: ReadonlyMap<string, readonly WallAtNode[]>
  /** Wall lengths between mid-line intersections. */
  readonly lengths: ReadonlyMap<string, number>
  /** The largest extent, for tolerances. */
  readonly size: number
}

/** Below this the walls run on smoothly and there is no corner; above half a turn less this they fold back. */
export const smoothTurn = 1e-6

/** Angle by which the mid-line turns from one wall into the next, 0…π. */
export const turnBetween = (a: WallAtNode, b: WallAtNode): number => Math.abs(turn(b.direction - a.direction - Math.PI))

/** The paths of all walls, or the walls whose path cannot be drawn. The section's numbers and names must be sound. */
export function wallPaths(section: OpenSection): { paths: Map<string, WallPath>, faults: SectionFault[] } {
  const nodes = new Map(section.nodes.map(node => [node.id, node]))
  const paths = new Map<string, WallPath>()
  const faults: SectionFault[] = []
  for (const wall of section.walls) {
    const path = wallPath(wall, nodeAt(nodes, wall.from), nodeAt(nodes, wall.to))
    if ('ok' in path) faults.push({ code: 'arc-mismatch', message: `Wall ${wall.id} cannot be drawn. ${path.reason}`, walls: [wall.id], nodes: [wall.from, wall.to] })
    else paths.set(wall.id, path)
  }
  return { paths, faults }
}

function nodeAt(nodes: ReadonlyMap<string, SectionNode>, id: string): SectionNode {
  const node = nodes.get(id)
  if (!node) throw new Error(`The node ${id} was not checked.`)
  return node
}

/** Which walls meet at each node. */
export function wallsAtNodes(section: OpenSection, paths: ReadonlyMap<string, WallPath>): Map<string, WallAtNode[]> {
  const atNode = new Map<string, WallAtNode[]>()
  const add = (node: string, one: WallAtNode) => atNode.set(node, [...(atNode.get(node) ?? []), one])
  for (const wall of section.walls) {
    const path = paths.get(wall.id)
    if (!path) continue
    add(wall.from, { wall, end: 'start', direction: leavingDirection(path, 'start'), path })
    add(wall.to, { wall, end: 'end', direction: leavingDirection(path, 'end'), path })
  }
  return atNode
}

interface Bend { readonly node: string, readonly trim: number, readonly piece: Piece, readonly walls: readonly [string, string] }

const bendFault = (node: string, walls: readonly WallAtNode[], message: string): SectionFault =>
  ({ code: 'bend', message, walls: walls.map(({ wall }) => wall.id), nodes: [node] })

/** A bend replaces the corner: each wall gives up the tangent length r·tan(φ/2). Null where the walls already run on smoothly. */
function bendAt(junction: Junction, meeting: readonly WallAtNode[], corner: Point): Bend | SectionFault | null {
  const [a, b] = meeting
  const { node, radius } = junction
  if (!a || !b) return null
  if (meeting.length > 2) return bendFault(node, meeting, `At ${node} more than two walls meet; one bend joins two walls. Give the corner as machined or part the walls.`)
  const phi = turnBetween(a, b)
  if (phi < smoothTurn) return null
  if (phi > Math.PI - 1e-3) return bendFault(node, meeting, `At ${node} the walls fold back on each other, which no bend radius can join.`)
  if (a.path.kind === 'arc' || b.path.kind === 'arc') return bendFault(node, meeting, `At ${node} a bend joins an arc wall. Give arc walls tangent to their neighbours; a bend radius is for straight walls.`)
  if (tapers(a.wall) || tapers(b.wall) || a.wall.t !== b.wall.t || a.wall.G !== b.wall.G || a.wall.E !== b.wall.E) return bendFault(node, meeting, `At ${node} a bend joins walls of differing thickness or modulus. Bent sheet is one sheet: make them equal or give the corner as machined.`)
  const middle = radius + a.wall.t / 2
  const trim = middle * Math.tan(phi / 2)
  const start = along(corner, a.direction, trim)
  const path = arcFromTangent(start, a.direction + Math.PI, middle, turn(b.direction - a.direction - Math.PI))
  const walls = [a.wall.id, b.wall.id] as const
  const { t, G, E = null } = a.wall
  const piece: Piece = { path, from: vertex(node, walls[0]), to: vertex(node, walls[1]), t, tEnd: t, G, E, walls: walls.map(id => ({ id, part: 0.5 })), bendAt: node }
  return { node, trim, piece, walls }
}

/** Where a bend replaces a node, each wall has its own end there. */
const vertex = (node: string, wall: string): string => `${node} of ${wall}`

/** Builds the mid-line of a section whose numbers, names and graph are sound. */
export function drawMidLine(section: OpenSection, paths: ReadonlyMap<string, WallPath>): { midLine: MidLine | null, faults: SectionFault[] } {
  const atNode = wallsAtNodes(section, paths)
  const nodes = new Map(section.nodes.map(node => [node.id, node]))
  const found = section.junctions
    .filter(({ make }) => make === 'bent')
    .map(junction => bendAt(junction, atNode.get(junction.node) ?? [], nodeAt(nodes, junction.node)))
  const faults = found.filter((one): one is SectionFault => one !== null && 'code' in one)
  const bends = new Map(found.filter((one): one is Bend => one !== null && 'piece' in one).map(bend => [bend.node, bend]))
  const pieces: Piece[] = []
  const lengths = new Map<string, number>()
  for (const wall of section.walls) {
    const path = paths.get(wall.id)
    if (!path) continue
    lengths.set(wall.id, pathLength(path))
    const piece = trimmed(wall, path, bends)
    if (piece) pieces.push(piece)
    else faults.push({ code: 'bend', message: `The bends at the ends of wall ${wall.id} need more than its length. Lengthen the wall or lessen a radius.`, walls: [wall.id], nodes: [wall.from, wall.to] })
  }
  pieces.push(...[...bends.values()].map(({ piece }) => piece))
  return { midLine: faults.length > 0 ? null : { pieces, atNode, lengths, size: sizeOf(pieces) }, faults }
}

/** A wall less its tangent lengths, or null where they exceed it. */
function trimmed(wall: OpenWall, path: WallPath, bends: ReadonlyMap<string, Bend>): Piece | null {
  const own = (node: string): Bend | undefined => {
    const bend = bends.get(node)
    return bend?.walls.includes(wall.id) ? bend : undefined
  }
  const head = own(wall.from)
  const tail = own(wall.to)
  const { t, tEnd = t, G, E = null, id } = wall
  const common = { from: head ? vertex(wall.from, id) : wall.from, to: tail ? vertex(wall.to, id) : wall.to, t, tEnd, G, E, walls: [{ id, part: 1 }], bendAt: null }
  if (path.kind === 'arc' || (!head && !tail)) return { ...common, path }
  const length = distance(path.start, path.end)
  const left = length - (head?.trim ?? 0) - (tail?.trim ?? 0)
  if (left < -1e-9 * length) return null
  const direction = directionOf(path.start, path.end)
  const start = along(path.start, direction, head?.trim ?? 0)
  return { ...common, path: { kind: 'line', start, end: along(start, direction, Math.max(left, 0)) } }
}

function sizeOf(pieces: readonly Piece[]): number {
  const points = pieces.flatMap(({ path }) => [pathStart(path), pathEnd(path)])
  const span = (values: number[]): number => Math.max(...values) - Math.min(...values)
  const radii = pieces.map(({ path }) => (path.kind === 'arc' ? Math.min(2 * path.radius, pathLength(path)) : 0))
  return Math.max(Math.hypot(span(points.map(({ x }) => x)), span(points.map(({ y }) => y))), ...radii)
}
