/**
 * Whether an outline bounds a section, and the same outline with the material
 * on the left of every edge. What is wrong is said with the edges by name.
 */
import type { Outline, OutlineEdge, OutlineLoop, OutlineRefusal, PlanePoint } from '#shared/torsion/outline/outline'
import type { Box } from '#shared/torsion/outline/edge-distance'
import type { AreaProperties } from '#shared/torsion/outline/outline-properties'
import { edgeDirection, edgePoint, loopEdges, outlineRefusal, reversedLoop } from '#shared/torsion/outline/outline'
import { boxDistance, edgeBox, nearPairs } from '#shared/torsion/outline/edge-distance'
import { propertiesOfEdges, signedArea } from '#shared/torsion/outline/outline-properties'

/** A vertex with the edges it joins; the interior angle is that of the material, rad, 0…2π. */
export interface OutlineCorner { readonly at: PlanePoint, readonly before: OutlineEdge, readonly after: OutlineEdge, readonly interior: number }

export interface SoundOutline {
  readonly ok: true
  /** Outer loop counter-clockwise, holes clockwise. */
  readonly outline: Outline
  readonly edges: readonly OutlineEdge[]
  readonly corners: readonly OutlineCorner[]
  readonly properties: AreaProperties
  /** Diagonal of the box round the outer loop, mm. */
  readonly size: number
}
export type OutlineCheck = SoundOutline | OutlineRefusal

/** Most edges an outline may have: pairs of edges are compared with each other. */
export const mostEdges = 2000
/** Of the size: shorter edges and narrower gaps cannot be told from rounding on a drawing. */
const leastEdge = 1e-7
const leastGap = 1e-5
/** Within this distance of a common vertex, of the size, two edges are near each other by right. */
const besideVertex = 1e-4
/** An edge folding back on its neighbour within a degree encloses nothing that could be computed. */
const leastAngle = Math.PI / 180
/** How far from the origin the outline may lie, in sizes. */
const mostOffset = 1e6

const mm = (value: number): string => `${Number(value.toPrecision(3))} mm`
const place = ({ x, y }: PlanePoint): string => `(${Number(x.toPrecision(6))}, ${Number(y.toPrecision(6))})`
const loopName = (index: number): string => (index === 0 ? 'The outer loop' : `Hole ${index}`)

function numbersFault(loops: readonly OutlineLoop[]): string | null {
  for (const [index, loop] of loops.entries()) {
    for (const [at, { x, y, bulge = 0 }] of loop.entries()) {
      if (![x, y, bulge].every(value => Number.isFinite(value) && Math.abs(value) < 1e12)) return `${loopName(index)}: vertex ${at + 1} is no point; give its x, y and bulge as numbers.`
    }
    if (loop.length < 2) return `${loopName(index)} needs at least two vertices; a circle is given as two arcs.`
  }
  const count = loops.reduce((total, loop) => total + loop.length, 0)
  return count > mostEdges ? `The outline has ${count} edges; at most ${mostEdges} can be taken. Draw curves as arcs and not as many short lines.` : null
}

function edgeFault(edges: readonly OutlineEdge[], size: number): string | null {
  const short = edges.find(({ length }) => !(length > leastEdge * size))
  if (short) return `The ${short.name} at ${place(short.a)} has no length; remove the double vertex.`
  const endless = edges.find(({ arc }) => arc && !(arc.radius < 1e6 * size && Math.abs(arc.sweep) < 2 * Math.PI - leastAngle))
  return endless ? `The arc ${endless.name} at ${place(endless.a)} is nearly straight or nearly a full circle; draw a line or two arcs.` : null
}

/** The turn from one direction to the next, in (−π, π]. */
const turned = (from: number, to: number): number => {
  const once = to - from - 2 * Math.PI * Math.round((to - from) / (2 * Math.PI))
  return once <= -Math.PI ? once + 2 * Math.PI : once
}

/** The vertices of a loop walked with the material on the left. */
export function loopCorners(edges: readonly OutlineEdge[]): OutlineCorner[] {
  return edges.flatMap((after, index) => {
    const before = edges[(index + edges.length - 1) % edges.length]
    if (!before) return []
    return [{ at: after.a, before, after, interior: Math.PI - turned(edgeDirection(before, 1), edgeDirection(after, 0)) }]
  })
}

function angleFault(corners: readonly OutlineCorner[]): string | null {
  const folded = corners.find(({ interior }) => interior < leastAngle || interior > 2 * Math.PI - leastAngle)
  return folded ? `The ${folded.after.name} folds back on the ${folded.before.name} at ${place(folded.at)}; open the angle or remove the vertex.` : null
}

const apart = (p: PlanePoint, q: PlanePoint): number => Math.hypot(p.x - q.x, p.y - q.y)

/** Vertices that two edges have in common. */
function shared(p: OutlineEdge, q: OutlineEdge, inLoop: number): PlanePoint[] {
  if (p.loop !== q.loop) return []
  const follows = (one: OutlineEdge, other: OutlineEdge): boolean => (one.index + 1) % inLoop === other.index
  return [...(follows(p, q) ? [p.b] : []), ...(follows(q, p) ? [q.b] : [])]
}

function pairFault(p: OutlineEdge, q: OutlineEdge, common: readonly PlanePoint[], size: number): string | null {
  for (const pair of nearPairs(p, q)) {
    const at = edgePoint(p, pair.p)
    if (pair.distance > leastGap * size || common.some(vertex => apart(vertex, at) < besideVertex * size)) continue
    const how = pair.distance <= 1e-9 * size ? 'meet' : `come within ${mm(pair.distance)} of each other`
    return `The ${p.name} and the ${q.name} ${how} at ${place(at)}; edges may meet at their common vertices only.`
  }
  return null
}

function contactFault(loops: readonly (readonly OutlineEdge[])[], size: number): string | null {
  const all = loops.flatMap(edges => edges.map(edge => ({ edge, box: edgeBox(edge), inLoop: edges.length })))
  const sorted = [...all].sort((p, q) => p.box.left - q.box.left)
  const near = (p: Box, q: Box): boolean => boxDistance(p, q) <= leastGap * size
  for (const [index, { edge, box, inLoop }] of sorted.entries()) {
    for (let next = index + 1; next < sorted.length; next += 1) {
      const other = sorted[next]
      if (!other || other.box.left > box.right + leastGap * size) break
      if (!near(box, other.box)) continue
      const fault = pairFault(edge, other.edge, shared(edge, other.edge, inLoop), size)
      if (fault) return fault
    }
  }
  return null
}

/** How often a loop of edges winds round a point: its polygon, and the segment of every arc. */
export function windingNumber(edges: readonly OutlineEdge[], point: PlanePoint): number {
  let winding = 0
  for (const { a, b, arc } of edges) {
    const side = (b.x - a.x) * (point.y - a.y) - (b.y - a.y) * (point.x - a.x)
    if (a.y <= point.y && b.y > point.y && side > 0) winding += 1
    if (a.y > point.y && b.y <= point.y && side < 0) winding -= 1
    // The closed half-plane of the chord belongs to the polygon's side of the count.
    const sense = arc ? Math.sign(arc.sweep) : 0
    if (arc && Math.hypot(point.x - arc.cx, point.y - arc.cy) < arc.radius && side * sense < 0) winding += sense
  }
  return winding
}

function nestingFault(loops: readonly (readonly OutlineEdge[])[]): string | null {
  const [outer, ...holes] = loops
  const probes = holes.map(hole => hole[0] && edgePoint(hole[0], 0.37))
  const outside = probes.findIndex(probe => probe && outer && windingNumber(outer, probe) === 0)
  if (outside >= 0) return `Hole ${outside + 1} lies outside the outer loop; each hole lies in the material.`
  for (const [index, hole] of holes.entries()) {
    const inside = probes.findIndex((probe, other) => other !== index && probe && windingNumber(hole, probe) !== 0)
    if (inside >= 0) return `Hole ${inside + 1} lies in hole ${index + 1}; material inside a hole is a section of its own.`
  }
  return null
}

/** The loop with the material on its left. Edges are named first, so that they keep the place they were given in. */
function wound(given: OutlineLoop, index: number): OutlineLoop {
  const edges = loopEdges(given, index)
  const loop = given.map((vertex, at) => ({ ...vertex, name: edges[at]?.name ?? '' }))
  return (signedArea(edges) > 0) === (index === 0) ? loop : reversedLoop(loop)
}

/** Checks an outline, normalises its winding and works out its edges, vertices and area properties. */
export function checkOutline(given: Outline): OutlineCheck {
  const numbers = numbersFault([given.outer, ...given.holes])
  if (numbers) return outlineRefusal(numbers)
  const box = loopEdges(given.outer).map(edgeBox)
  const [left, right] = [Math.min(...box.map(one => one.left)), Math.max(...box.map(one => one.right))]
  const [low, high] = [Math.min(...box.map(one => one.low)), Math.max(...box.map(one => one.high))]
  const size = Math.hypot(right - left, high - low)
  if (!(size > 1e-9 && size < 1e9)) return outlineRefusal(`The outer loop measures ${mm(size)} across; sections between 1 nm and 1000 km can be taken.`)
  if (Math.max(Math.abs(left), Math.abs(right), Math.abs(low), Math.abs(high)) > mostOffset * size) return outlineRefusal('The outline lies too far from the origin for its size; move it nearer.')
  const outline: Outline = { outer: wound(given.outer, 0), holes: given.holes.map((hole, index) => wound(hole, index + 1)) }
  const loops = [outline.outer, ...outline.holes].map((loop, index) => loopEdges(loop, index))
  const edges = loops.flat()
  const corners = loops.flatMap(loopCorners)
  const fault = edgeFault(edges, size) ?? angleFault(corners) ?? contactFault(loops, size) ?? nestingFault(loops)
  if (fault) return outlineRefusal(fault)
  const properties = propertiesOfEdges(edges)
  if (!(properties.A > 1e-9 * size * size)) return outlineRefusal('The outline encloses no area; give its vertices in order round the section.')
  return { ok: true, outline, edges, corners, properties, size }
}
