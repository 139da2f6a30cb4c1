/**
 * Where panels end: a density along every edge, made from the geometry alone.
 * Towards a vertex, its own or one seen across a wall, panels shrink with the
 * distance; beside the vertex they shrink further as its power 2/3, so that the
 * singular terms of corners cost no accuracy. A finer mesh multiplies the
 * density, so that three meshes are of one family.
 */
import type { OutlineCorner, SoundOutline } from '#shared/torsion/outline/outline-check'
import type { OutlineEdge, PlanePoint } from '#shared/torsion/outline/outline'
import type { Stretch } from '#shared/torsion/outline/panels'
import { edgePoint } from '#shared/torsion/outline/outline'
import { boxDistance, edgeBox, nearPairs, nearestOnEdge } from '#shared/torsion/outline/edge-distance'

/** A place towards which panels shrink. */
interface Focus { readonly at: PlanePoint, /** Below this distance the shrinking is that of a corner, mm. */ readonly reach: number, /** Panels need not be shorter than in this distance. */ readonly floor: number }

/** Turn below which two edges run on into each other. */
const smoothTurn = 1e-6
/** Power of the distance beside a corner. */
const cornerPower = 2 / 3
/** Largest angle of an arc panel on a mesh of density one. */
const arcStep = Math.PI / 8
/** Of the size: nearer than sound edges come to each other. */
const touchingWithin = 1e-6
/** Nearer to an end of its edge than this part of it, a place is that end: whether a foot falls before or behind a tangent vertex is decided by the last bit. */
const insideBy = 1e-6
const isInside = (part: number): boolean => part > insideBy && part < 1 - insideBy
/** Samples along an edge. */
const samples = 96

const curvature = ({ arc }: OutlineEdge): number => (arc ? Math.sign(arc.sweep) / arc.radius : 0)

/** Whether nothing at all changes at a vertex: the two halves of a circle, or of a straight side. */
function runsOn({ before, after, interior }: OutlineCorner): boolean {
  return Math.abs(interior - Math.PI) < smoothTurn && Math.abs(curvature(before) - curvature(after)) * Math.min(before.length, after.length) < smoothTurn
}

/** Distance from a vertex to the nearest edge that it is not part of, and not more than its own edges. */
function reachOf({ at, before, after }: OutlineCorner, edges: readonly OutlineEdge[]): number {
  let reach = Math.min(before.length, after.length)
  for (const edge of edges) {
    if (edge === before || edge === after) continue
    const { left, right, low, high } = edgeBox(edge)
    if (Math.hypot(Math.max(0, left - at.x, at.x - right), Math.max(0, low - at.y, at.y - high)) < reach) reach = Math.min(reach, nearestOnEdge(at, edge).distance)
  }
  return reach
}

/** Where curved edges come near each other, the shear varies over the root of gap times radius. Neighbours that touch at their common vertex are no narrow place. */
function narrowPlaces(edges: readonly OutlineEdge[], touching: number): Focus[] {
  const boxes = edges.map(edgeBox)
  return edges.flatMap((p, index) => edges.slice(index + 1).flatMap((q, next): Focus[] => {
    const bend = Math.abs(curvature(p) + curvature(q))
    const [pBox, qBox] = [boxes[index], boxes[index + 1 + next]]
    if (bend === 0 || !pBox || !qBox || boxDistance(pBox, qBox) > 2 / bend) return []
    return nearPairs(p, q).filter(pair => isInside(pair.p) && isInside(pair.q) && pair.distance > touching && pair.distance * bend < 0.5).flatMap((pair): Focus[] => {
      const floor = Math.sqrt(2 * pair.distance / bend)
      return [edgePoint(p, pair.p), edgePoint(q, pair.q)].map(at => ({ at, reach: 0, floor: floor / 4 }))
    })
  }))
}

function fociOf({ corners, edges, size }: SoundOutline): Focus[] {
  const vertices = corners.filter(corner => !runsOn(corner)).map((corner): Focus => ({ at: corner.at, reach: reachOf(corner, edges), floor: 0 }))
  return [...vertices, ...narrowPlaces(edges, touchingWithin * size)]
}

/** Length of a panel at a point, on a mesh of density one. */
function panelLength(at: PlanePoint, foci: readonly Focus[], most: number): number {
  let least = most
  for (const { at: focus, reach, floor } of foci) {
    const [dx, dy] = [at.x - focus.x, at.y - focus.y]
    const distance = Math.sqrt(dx * dx + dy * dy + floor * floor)
    if (distance >= least) continue
    const length = distance < reach ? reach ** (1 - cornerPower) * distance ** cornerPower : distance
    least = Math.min(least, length)
  }
  return least
}

/** Cumulated density along an edge at sample points that crowd to its ends. */
export interface EdgeDensity { readonly edge: OutlineEdge, readonly parts: Float64Array, readonly sum: Float64Array }

function densityOf(edge: OutlineEdge, foci: readonly Focus[]): EdgeDensity {
  const [parts, sum] = [new Float64Array(samples + 1), new Float64Array(samples + 1)]
  const most = edge.arc ? Math.min(edge.length, arcStep * edge.arc.radius) : edge.length
  const place = (u: number): number => u ** 3 / (u ** 3 + (1 - u) ** 3)
  for (let k = 1; k <= samples; k += 1) {
    parts[k] = place(k / samples)
    const [from, to] = [parts[k - 1] ?? 0, parts[k] ?? 0]
    const middle = place((k - 0.5) / samples)
    sum[k] = (sum[k - 1] ?? 0) + (to - from) * edge.length / panelLength(edgePoint(edge, middle), foci, most)
  }
  return { edge, parts, sum }
}

/** The density of every edge, once for all meshes of an outline. */
export function meshDensity(sound: SoundOutline): EdgeDensity[] {
  const foci = fociOf(sound)
  return sound.edges.map(edge => densityOf(edge, foci))
}

function placeAt({ parts, sum }: EdgeDensity, value: number): number {
  let k = 1
  while (k < samples && (sum[k] ?? 0) < value) k += 1
  const [low, high] = [sum[k - 1] ?? 0, sum[k] ?? 1]
  return (parts[k - 1] ?? 0) + ((parts[k] ?? 1) - (parts[k - 1] ?? 0)) * (value - low) / (high - low)
}

/** Panels of an edge on a mesh of the given density; `refine` halves every panel of the base mesh so many times over. */
function edgeStretches(density: EdgeDensity, base: number, refine: number): Stretch[] {
  const total = density.sum[samples] ?? 1
  const count = Math.max(1, Math.ceil(base * total - 0.35)) * refine
  const ends = Array.from({ length: count + 1 }, (_, k) => (k === 0 ? 0 : k === count ? 1 : placeAt(density, total * k / count)))
  return ends.slice(1).map((to, k) => ({ edge: density.edge, from: ends[k] ?? 0, to }))
}

/** The panels of a mesh: `base` is the density of the coarsest, `refine` 1, 2 or 4. */
export const meshStretches = (densities: readonly EdgeDensity[], base: number, refine: number): Stretch[] =>
  densities.flatMap(density => edgeStretches(density, base, refine))
