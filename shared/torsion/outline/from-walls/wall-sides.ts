/** The sides of walls in the order in which a walk round the section meets them, the empty space on the left. */
import type { Junction, OpenWall, Point, Refusal, SectionNode } from '#shared/torsion/section'
import type { WallPath } from '#shared/torsion/geometry'
import type { SideCurve } from '#shared/torsion/outline/from-walls/side-curve'
import { leavingDirection, pathLength, wallPath } from '#shared/torsion/geometry'
import { refusal } from '#shared/torsion/section'

/** What an outline is made of: an open section, or the walls of a closed one with the corners of its drawing. */
export interface WalledSection {
  readonly nodes: readonly SectionNode[]
  readonly walls: readonly Omit<OpenWall, 'G' | 'E'>[]
  readonly junctions?: readonly Junction[]
}
type Wall = WalledSection['walls'][number]

/** One side of a wall, walked with the wall on the right. */
export interface WallSide {
  readonly wall: Wall
  /** Whether it is walked from the wall's first node to its second. */
  readonly forward: boolean
  readonly from: SectionNode
  readonly to: SectionNode
  /** Directions in which the mid-line leaves each node. */
  readonly leaves: number
  readonly leavesBack: number
  /** Distance of the side from the mid-line at either end, mm. */
  readonly halfStart: number
  readonly halfEnd: number
  readonly curve: SideCurve
  /** Signed angle swept by the mid-line; 0 for a straight wall. */
  readonly sweep: number
}

/** Walls that meet at less than this have no outline worth drawing: their sides meet far from the node. rad */
export const leastWallAngle = 15 * Math.PI / 180
/** Most walls an outline is made of. */
const mostOutlineWalls = 300

const repeated = (ids: readonly string[]): string | undefined => ids.find((id, index) => ids.indexOf(id) !== index)
const positive = (value: number): boolean => Number.isFinite(value) && value > 0 && value < 1e9

function wallFault({ id, t, tEnd = t, arc }: Wall): string | null {
  if (!positive(t) || !positive(tEnd)) return `Wall ${id} needs a thickness greater than zero.`
  if (!arc) return null
  if (!positive(arc.radius)) return `Wall ${id} needs a radius greater than zero.`
  if (!(Number.isFinite(arc.sweep) && arc.sweep !== 0 && Math.abs(arc.sweep) <= 2 * Math.PI * (1 + 1e-12))) return `Wall ${id} needs a swept angle other than zero and of at most a full circle.`
  if (arc.startDirection !== undefined && !Number.isFinite(arc.startDirection)) return `Wall ${id} needs a start direction.`
  if (tEnd !== t) return `Wall ${id} is an arc that tapers; an outline takes arcs of one thickness. Part it into steps.`
  if (arc.radius <= Math.max(t, tEnd) / 2) return `Wall ${id} is as thick as its arc is wide; its inner side has no radius left. Use a general outline.`
  return null
}

/** Two nodes of walls at one place. */
function seam(nodes: WalledSection['nodes'], walls: WalledSection['walls']): readonly string[] | undefined {
  const used = new Set(walls.flatMap(({ from, to }) => [from, to]))
  const places = nodes.filter(({ id }) => used.has(id))
  const least = 1e-6 * Math.min(...walls.map(({ t }) => t))
  return places.flatMap((a, i) => places.slice(i + 1).filter(b => Math.hypot(a.x - b.x, a.y - b.y) <= least).map(b => [a.id, b.id]))[0]
}

/** What keeps the walls from being drawn at all. */
export function wallsFault({ nodes, walls, junctions = [] }: WalledSection): string | null {
  if (walls.length === 0) return 'The section has no walls. Add the first wall.'
  if (walls.length > mostOutlineWalls) return `The section has ${walls.length} walls; an outline is made of at most ${mostOutlineWalls}.`
  const known = new Set(nodes.map(({ id }) => id))
  const twice = repeated(nodes.map(({ id }) => id)) ?? repeated(walls.map(({ id }) => id)) ?? repeated(junctions.map(({ node }) => node))
  if (twice !== undefined) return `The name ${twice} is given twice.`
  const lost = nodes.find(({ x, y }) => !(Math.abs(x) < 1e9 && Math.abs(y) < 1e9))
  if (lost) return `The node ${lost.id} needs two coordinates.`
  const stray = walls.find(({ from, to }) => !known.has(from) || !known.has(to))
  if (stray) return `Wall ${stray.id} ends at a node that does not exist.`
  const slit = seam(nodes, walls)
  if (slit) return `Nodes ${slit.join(' and ')} are at one place, but not joined. An outline needs the width of the slit: move them apart, or join the walls at one node.`
  const radius = junctions.find(one => !(one.radius >= 0 && one.radius < 1e9))
  if (radius) return `The corner at ${radius.node} needs a radius of zero or more.`
  return walls.reduce<string | null>((fault, wall) => fault ?? wallFault(wall), null)
}

const flipped = (curve: SideCurve): SideCurve =>
  (curve.kind === 'line' ? { ...curve, direction: curve.direction + Math.PI } : { ...curve, sense: curve.sense === 1 ? -1 : 1 })

/** The curve of the left side of a path. */
function leftCurve(path: WallPath, halfStart: number, halfEnd: number): SideCurve {
  if (path.kind === 'arc') {
    const sense = path.sweep > 0 ? 1 : -1
    return { kind: 'circle', centre: path.centre, radius: path.radius - sense * halfStart, sense }
  }
  const normal = leavingDirection(path, 'start') + Math.PI / 2
  const beside = (from: Point, half: number): Point => ({ x: from.x + half * Math.cos(normal), y: from.y + half * Math.sin(normal) })
  const [a, b] = [beside(path.start, halfStart), beside(path.end, halfEnd)]
  return { kind: 'line', at: a, direction: Math.atan2(b.y - a.y, b.x - a.x) }
}

/** Both sides of every wall: that walked forwards, then that walked backwards. */
export function wallSides({ nodes, walls }: WalledSection): WallSide[] | Refusal {
  const places = new Map(nodes.map(node => [node.id, node]))
  const sides: WallSide[] = []
  for (const wall of walls) {
    const [from, to] = [places.get(wall.from), places.get(wall.to)]
    if (!from || !to) return refusal(`Wall ${wall.id} ends at a node that does not exist.`)
    const path = wallPath({ ...wall, G: 1 }, from, to)
    if ('ok' in path) return refusal(`Wall ${wall.id} cannot be drawn. ${path.reason}`)
    const [half, halfFar] = [wall.t / 2, (wall.tEnd ?? wall.t) / 2]
    if (pathLength(path) <= 1e-6 * half) return refusal(`Wall ${wall.id} has no length. Move one of its ends.`)
    const [leaves, leavesBack] = [leavingDirection(path, 'start'), leavingDirection(path, 'end')]
    const sweep = path.kind === 'arc' ? path.sweep : 0
    const right = flipped(leftCurve(path, -half, -halfFar))
    sides.push(
      { wall, forward: true, from, to, leaves, leavesBack, halfStart: half, halfEnd: halfFar, curve: leftCurve(path, half, halfFar), sweep },
      { wall, forward: false, from: to, to: from, leaves: leavesBack, leavesBack: leaves, halfStart: halfFar, halfEnd: half, curve: right, sweep: -sweep },
    )
  }
  return sides
}

/** A side with that which follows it round its end node, and the angle of the empty wedge between them, 0…2π. */
export interface SideTurn { readonly side: WallSide, readonly next: WallSide, readonly wedge: number, /** Walls that meet at the node. */ readonly meeting: number }

const whole = (angle: number): number => ((angle % (2 * Math.PI)) + 2 * Math.PI) % (2 * Math.PI)

/** For each side, the one that follows: at a node the first wall clockwise from the one walked. */
function turns(sides: readonly WallSide[]): Map<WallSide, SideTurn> | Refusal {
  const around = new Map<string, WallSide[]>()
  for (const side of sides) around.set(side.from.id, [...around.get(side.from.id) ?? [], side])
  for (const list of around.values()) list.sort((a, b) => whole(a.leaves) - whole(b.leaves))
  const after = new Map<WallSide, SideTurn>()
  for (const [index, side] of sides.entries()) {
    const list = around.get(side.to.id) ?? []
    const twin = sides[index + (side.forward ? 1 : -1)]
    const next = twin && list[(list.indexOf(twin) - 1 + list.length) % list.length]
    if (!next) continue
    const wedge = list.length === 1 ? 2 * Math.PI : whole(side.leavesBack - next.leaves)
    if (wedge < leastWallAngle) return refusal(`Walls ${side.wall.id} and ${next.wall.id} meet at ${side.to.id} at less than ${Math.round(leastWallAngle * 180 / Math.PI)}°; their sides overlap far from the node. Open the angle, or use a general outline.`)
    after.set(side, { side, next, wedge, meeting: list.length })
  }
  return after
}

/** The walks round every empty space: one outside, one in every cell. */
export function sideWalks(sides: readonly WallSide[]): SideTurn[][] | Refusal {
  const after = turns(sides)
  if ('ok' in after) return after
  const walked = new Set<WallSide>()
  const walks: SideTurn[][] = []
  for (const first of sides) {
    const walk: SideTurn[] = []
    for (let at = after.get(first); at && !walked.has(at.side); at = after.get(at.next)) {
      walked.add(at.side)
      walk.push(at)
    }
    if (walk.length > 0) walks.push(walk)
  }
  return walks
}
