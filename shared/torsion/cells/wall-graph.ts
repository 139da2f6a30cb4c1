/**
 * A planar graph of walls: sound numbers, no crossing, one connected part; and the cells it closes, found by
 * walking half-edges with the face on the left (methods §2.2). Arcs are walls like others.
 */
import { crossings } from '#shared/torsion/crossing'
import { distance, leavingDirection, pathEnd, pathLength, pathStart, turn, wallPath, type WallPath } from '#shared/torsion/geometry'
import type { Piece } from '#shared/torsion/mid-line'
import { refusal, type OpenWall, type Point, type Refusal, type SectionNode } from '#shared/torsion/section'
import { sectorialGrowth } from '#shared/torsion/sectorial-growth'

export interface WallSection { readonly nodes: readonly SectionNode[], readonly walls: readonly OpenWall[] }

export interface GraphWall {
  readonly wall: OpenWall
  readonly path: WallPath
  readonly length: number
  /** Index of the cell on the left of from → to, and on its right; −1 is outside. */
  readonly left: number
  readonly right: number
}

export interface Cell {
  /** Enclosed by the mid-line, mm². */
  readonly area: number
  /** Walls of its boundary, + where from → to runs counter-clockwise about the cell; a fin inside appears in both senses and is left out. */
  readonly walls: readonly { readonly index: number, readonly sense: 1 | -1 }[]
}

export interface WallGraph {
  readonly ok: true
  readonly walls: readonly GraphWall[]
  readonly cells: readonly Cell[]
  /** The largest extent. */
  readonly size: number
  /** Two free ends nearest to each other, where there are two: a seam that was meant to be closed shows here (G-07). */
  readonly gap: { readonly nodes: readonly [string, string], readonly distance: number } | null
}

/** Ends nearer than this part of the size are at one place. */
const together = 1e-9
/** More walls than this are no section. */
export const mostWalls = 2000

interface HalfEdge { readonly index: number, readonly forward: boolean, readonly from: string, readonly to: string, readonly direction: number, readonly curvature: number }

export function wallGraph(section: WallSection): WallGraph | Refusal {
  const fault = soundNumbers(section)
  if (fault) return refusal(fault)
  const nodes = new Map(section.nodes.map(node => [node.id, node]))
  const paths: WallPath[] = []
  for (const wall of section.walls) {
    const [from, to] = [nodes.get(wall.from), nodes.get(wall.to)]
    const path = from && to ? wallPath(wall, from, to) : refusal(`Wall ${wall.id} ends at a node that does not exist.`)
    if ('ok' in path) return refusal(`Wall ${wall.id} cannot be drawn. ${path.reason}`)
    paths.push(path)
  }
  const size = extent(paths)
  const misplaced = placesFault(section, paths, size)
  if (misplaced) return refusal(misplaced)
  return facesOf(section, paths, size)
}

function soundNumbers({ nodes, walls }: WallSection): string | null {
  if (walls.length === 0) return 'The section has no walls. Add the first wall.'
  if (walls.length > mostWalls) return `The section has ${walls.length} walls; at most ${mostWalls} can be computed.`
  const seen = new Set<string>()
  for (const { id, x, y } of nodes) {
    if (seen.has(id)) return `The node ${id} is given twice.`
    if (!Number.isFinite(x) || !Number.isFinite(y)) return `The node ${id} needs two coordinates.`
    seen.add(id)
  }
  const ids = new Set<string>()
  for (const { id, from, to, t, tEnd = t, G, arc } of walls) {
    if (ids.has(id)) return `The wall ${id} is given twice.`
    ids.add(id)
    if (!(Number.isFinite(t) && t > 0)) return `Wall ${id} needs a thickness greater than zero.`
    if (tEnd !== t) return `Wall ${id} tapers; here a wall has one thickness. Part it into steps.`
    if (!(Number.isFinite(G) && G > 0)) return `Wall ${id} needs a shear modulus greater than zero.`
    if (arc && !(Number.isFinite(arc.radius) && arc.radius > 0)) return `Wall ${id} needs a radius greater than zero.`
    if (arc && !(Number.isFinite(arc.sweep) && arc.sweep !== 0 && Math.abs(arc.sweep) <= 2 * Math.PI * (1 + 1e-12))) return `Wall ${id} needs a swept angle other than zero and of at most a full circle.`
    if (!seen.has(from) || !seen.has(to)) return `Wall ${id} ends at a node that does not exist.`
  }
  return null
}

function extent(paths: readonly WallPath[]): number {
  const points = paths.flatMap(path => [pathStart(path), pathEnd(path)])
  const span = (values: number[]) => values.reduce((high, value) => Math.max(high, value), -Infinity) - values.reduce((low, value) => Math.min(low, value), Infinity)
  return Math.max(span(points.map(p => p.x)), span(points.map(p => p.y)), ...paths.map(path => (path.kind === 'arc' ? Math.min(2 * path.radius, pathLength(path)) : 0)))
}

/** Zero lengths, nodes at one place, walls that cross away from a node, parts that hang on nothing. */
function placesFault({ nodes, walls }: WallSection, paths: readonly WallPath[], size: number): string | null {
  const used = nodes.filter(({ id }) => walls.some(wall => wall.from === id || wall.to === id))
  const sorted = [...used].sort((a, b) => a.x - b.x)
  for (const [i, a] of sorted.entries()) {
    for (let k = i + 1; k < sorted.length && (sorted[k]?.x ?? Infinity) - a.x <= together * size; k += 1) {
      const b = sorted[k]
      if (b && distance(a, b) <= together * size) return `Nodes ${a.id} and ${b.id} are at one place. Join the walls at one of them, or move them apart by the slit.`
    }
  }
  const empty = walls.findIndex((_, i) => pathLength(paths[i] ?? { kind: 'line', start: { x: 0, y: 0 }, end: { x: 0, y: 0 } }) <= together * size)
  if (empty >= 0) return `Wall ${walls[empty]?.id ?? ''} has no length. Move one of its ends.`
  const pieces = walls.map((wall, i): Piece => ({ path: paths[i] as WallPath, from: wall.from, to: wall.to, t: wall.t, tEnd: wall.t, G: wall.G, E: wall.E ?? null, walls: [{ id: wall.id, part: 1 }], bendAt: null }))
  const [crossed] = crossings(pieces, size)
  if (crossed) return `Walls ${crossed.a.walls[0]?.id ?? ''} and ${crossed.b.walls[0]?.id ?? ''} meet without a common node. Put a node there or move a wall.`
  return connected(walls) ? null : 'The walls fall into parts that are not joined. Join them, or compute each part for itself.'
}

function connected(walls: readonly OpenWall[]): boolean {
  const parent = new Map<string, string>()
  const root = (node: string): string => {
    let at = node
    for (let up = parent.get(at); up !== undefined && up !== at; up = parent.get(at)) at = up
    return at
  }
  let parts = 0
  for (const { from, to } of walls) {
    for (const node of [from, to]) {
      if (parent.has(node)) continue
      parent.set(node, node)
      parts += 1
    }
    const [a, b] = [root(from), root(to)]
    if (a !== b) {
      parent.set(a, b)
      parts -= 1
    }
  }
  return parts === 1
}

function halfEdges({ walls }: WallSection, paths: readonly WallPath[]): HalfEdge[] {
  return walls.flatMap((wall, index): HalfEdge[] => {
    const path = paths[index] as WallPath
    const bend = path.kind === 'arc' ? Math.sign(path.sweep) / path.radius : 0
    return [
      { index, forward: true, from: wall.from, to: wall.to, direction: leavingDirection(path, 'start'), curvature: bend },
      { index, forward: false, from: wall.to, to: wall.from, direction: leavingDirection(path, 'end'), curvature: -bend },
    ]
  })
}

/** Counter-clockwise order at a node; walls that leave in one direction are told apart by which bends more to the left. */
function inOrder(edges: HalfEdge[]): HalfEdge[] {
  const base = edges[0]?.direction ?? 0
  const angle = (edge: HalfEdge) => {
    const from = turn(edge.direction - base)
    return from < -1e-9 ? from + 2 * Math.PI : Math.max(from, 0)
  }
  return edges.sort((a, b) => {
    const apart = angle(a) - angle(b)
    return Math.abs(apart) > 1e-9 ? apart : a.curvature - b.curvature
  })
}

function facesOf(section: WallSection, paths: readonly WallPath[], size: number): WallGraph | Refusal {
  const edges = halfEdges(section, paths)
  const around = new Map<string, HalfEdge[]>()
  for (const edge of edges) around.set(edge.from, [...around.get(edge.from) ?? [], edge])
  for (const [node, list] of around) around.set(node, inOrder(list))
  const faceOf = new Map<HalfEdge, number>()
  const loops: HalfEdge[][] = []
  for (const first of edges) {
    if (faceOf.has(first)) continue
    const loop: HalfEdge[] = []
    for (let at: HalfEdge | undefined = first; at && !faceOf.has(at); at = nextOf(at, edges, around)) {
      faceOf.set(at, loops.length)
      loop.push(at)
    }
    loops.push(loop)
  }
  const origin = pathStart(paths[0] as WallPath)
  const areas = loops.map(loop => loop.reduce((sum, { index, forward }) => sum + (forward ? 0.5 : -0.5) * sectorialGrowth(paths[index] as WallPath, origin, 1), 0))
  const outer = areas.reduce((low, area, i) => (area < (areas[low] ?? Infinity) ? i : low), 0)
  const numbers = new Map<number, number>()
  areas.forEach((_, i) => i !== outer && numbers.set(i, numbers.size))
  const flat = areas.findIndex((area, i) => i !== outer && !(area > 1e-12 * size * size))
  if (flat >= 0) return refusal(`The cell of walls ${[...new Set((loops[flat] ?? []).map(({ index }) => section.walls[index]?.id))].join(', ')} encloses no area. Move one of its walls.`)
  const cellAt = (edge: HalfEdge | undefined): number => (edge ? numbers.get(faceOf.get(edge) ?? outer) ?? -1 : -1)
  const walls = section.walls.map((wall, i): GraphWall => ({ wall, path: paths[i] as WallPath, length: pathLength(paths[i] as WallPath), left: cellAt(edges[2 * i]), right: cellAt(edges[2 * i + 1]) }))
  const cells = [...numbers.keys()].map((face): Cell => ({
    area: areas[face] ?? 0,
    walls: (loops[face] ?? []).flatMap(({ index, forward }) => (walls[index]?.left === walls[index]?.right ? [] : [{ index, sense: forward ? 1 as const : -1 as const }])),
  }))
  return { ok: true, walls, cells, size, gap: nearestEnds(section) }
}

/** At its end the walk takes the next wall clockwise from the one it came by, which keeps the face on the left. */
function nextOf(edge: HalfEdge, edges: readonly HalfEdge[], around: ReadonlyMap<string, HalfEdge[]>): HalfEdge | undefined {
  const twin = edges[2 * edge.index + (edge.forward ? 1 : 0)]
  const list = around.get(edge.to) ?? []
  const at = twin ? list.indexOf(twin) : 0
  return list[(at - 1 + list.length) % list.length]
}

function nearestEnds({ nodes, walls }: WallSection): WallGraph['gap'] {
  const count = new Map<string, number>()
  for (const { from, to } of walls) for (const node of [from, to]) count.set(node, (count.get(node) ?? 0) + 1)
  const free: (Point & { id: string })[] = nodes.filter(({ id }) => count.get(id) === 1)
  let best: WallGraph['gap'] = null
  free.forEach((a, i) => free.slice(i + 1).forEach((b) => {
    const apart = distance(a, b)
    if (!best || apart < best.distance) best = { nodes: [a.id, b.id], distance: apart }
  }))
  return best
}
