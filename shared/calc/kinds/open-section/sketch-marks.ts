/** Balloons, dimensions, arrows and flags around the walls, placed where they hide nothing. */
import type { Shape } from '#shared/calc/types'
import { thicknessAlong, type ModelWall } from '#shared/calc/parts/wall-model'
import { shownUnits } from '#shared/calc/parts/shown-units'
import { midLine, polar, type Pt } from '#shared/calc/kinds/open-section/sketch-walls'
import type { Solution } from '#shared/calc/kinds/open-section/solution'
import { significant } from '#shared/units/display'
import { fromEngine } from '#shared/units/units'

/** Section space as the sketch sees it: millimetres per pixel at nominal size, and what is already taken. */
export interface Room { pixel: number, centre: Pt, taken: Spot[] }
export interface Spot { at: Pt, radius: number }

const MOST_MARKED = 24
const MOST_NAMED = 60
const distance = (a: Pt, b: Pt) => Math.hypot(a[0] - b[0], a[1] - b[1])

/**
 * Distance of the nearest of these spots from any of the points, negative where one lies inside. Once it is known
 * to be no more than `enough`, which of the spots is nearest no longer matters and the search ends.
 */
export function clearOf(points: Pt[], spots: Spot[], enough = -Infinity): number {
  let least = Infinity
  for (const [x, y] of points) {
    for (const { at: [u, v], radius } of spots) {
      // Asked some hundred thousand times for one sketch: most spots are too far off in x or y alone, and Math.hypot is slow.
      const reach = least + radius
      const [dx, dy] = [x - u, y - v]
      if (dx >= reach || -dx >= reach || dy >= reach || -dy >= reach) continue
      const clear = Math.sqrt(dx * dx + dy * dy) - radius
      if (clear < least) least = clear
      if (least <= enough) return least
    }
  }
  return least
}

/** The walls as rows of spots that reach `beyond` pixels over their faces. */
export function wallSpots(s: Solution, room: Room, beyond: number): Spot[] {
  return s.walls.flatMap(({ wall }) => {
    const count = Math.min(Math.max(1, Math.ceil(wall.length / (8 * room.pixel))), 60)
    return Array.from({ length: count + 1 }, (_, i) => {
      const m = middleOf(s, wall, i / count)
      return { at: m.at, radius: m.half + beyond * room.pixel }
    })
  })
}

interface Middle { at: Pt, direction: number, half: number }
export function middleOf(s: Solution, wall: ModelWall, part = 0.5): Middle {
  const stations = midLine(s, wall)
  const half = thicknessAlong(wall, part) / 2
  const [a, b] = [stations[0], stations.at(-1)]
  if (stations.length > 2) {
    const mid = stations[Math.round((stations.length - 1) * part)]
    return { at: mid?.at ?? [0, 0], direction: mid?.direction ?? 0, half }
  }
  const [p, q]: [Pt, Pt] = [a?.at ?? [0, 0], b?.at ?? [0, 0]]
  return { at: [p[0] + (q[0] - p[0]) * part, p[1] + (q[1] - p[1]) * part], direction: a?.direction ?? 0, half }
}

/** Side of the wall that looks away from the middle of the section: +1 left, −1 right of its direction. */
export function outerSide(m: Middle, centre: Pt): 1 | -1 {
  const left = polar(m.at, m.direction + Math.PI / 2, 1)
  return distance(left, centre) >= distance(m.at, centre) ? 1 : -1
}

/** Lengths of walls that differ from one another, each on the outer side; and the overall size. */
export function dimensions(s: Solution, room: Room, extent: { min: Pt, max: Pt }): Shape[] {
  const unit = shownUnits(s.model).length
  const seen = new Set<string>()
  const walls = s.walls.filter(({ wall }) => !wall.arc && wall.length > 14 * room.pixel).flatMap(({ wall }): Shape[] => {
    const value = lengthText(wall, unit)
    if (seen.has(value) || seen.size >= MOST_MARKED / 2) return []
    seen.add(value)
    const m = middleOf(s, wall)
    const offset = freeOffset(m, room)
    const [from, to] = midLine(s, wall).map(st => st.at)
    if (!from || !to) return []
    const shape = { type: 'dimension' as const, from, to, offset, text: value }
    keepClear(shape, room)
    return [shape]
  })
  return [...walls, ...overall(extent, unit, seen, room)]
}

/** The nearest line outside the wall on which the value hides no other mark. */
function freeOffset(m: Middle, room: Room): number {
  const side = outerSide(m, room.centre)
  const offsets = [24, 42, 60, 78].map(away => side * (m.half + away * room.pixel))
  const clear = (offset: number) => room.taken.every(t => distance(polar(m.at, m.direction + Math.PI / 2, offset), t.at) > t.radius + 8 * room.pixel)
  return offsets.find(clear) ?? offsets[0] ?? 0
}

/** Overall width and height of the mid-line, where no wall says it already. */
function overall({ min, max }: { min: Pt, max: Pt }, unit: 'mm' | 'cm' | 'm' | 'in' | 'ft', seen: Set<string>, room: Room): Shape[] {
  const shapes: Shape[] = []
  const width = short(fromEngine(max[0] - min[0], unit))
  const height = short(fromEngine(max[1] - min[1], unit))
  if (max[0] - min[0] > 20 * room.pixel && !seen.has(width)) shapes.push({ type: 'dimension', from: [min[0], min[1]], to: [max[0], min[1]], offset: -52 * room.pixel, text: width })
  if (max[1] - min[1] > 20 * room.pixel && !seen.has(height)) shapes.push({ type: 'dimension', from: [min[0], min[1]], to: [min[0], max[1]], offset: 52 * room.pixel, text: height })
  for (const shape of shapes) if (shape.type === 'dimension') keepClear(shape, room)
  return shapes
}

/** Keeps other marks off the line of a dimension, and further off its value. */
function keepClear({ from, to, offset }: Extract<Shape, { type: 'dimension' }>, room: Room): void {
  const normal = Math.atan2(to[1] - from[1], to[0] - from[0]) + Math.PI / 2
  const count = 2 * Math.ceil(distance(from, to) / (12 * room.pixel))
  for (let i = 0; i <= count; i++) {
    const at: Pt = [from[0] + (to[0] - from[0]) * i / count, from[1] + (to[1] - from[1]) * i / count]
    room.taken.push({ at: polar(at, normal, offset), radius: (i === count / 2 ? 9 : 3) * room.pixel })
  }
}

const short = (value: number) => significant(Number(value.toPrecision(4)), 4).replace(/(\.\d*?)0+(?=$|×)/u, '$1').replace(/\.(?=$|×)/u, '')

const lengthText = (wall: ModelWall, unit: 'mm' | 'cm' | 'm' | 'in' | 'ft') => wall.lengthTyped ?? short(fromEngine(wall.length, unit))

/** One thickness note per different thickness, beside the longest wall that has it. */
export function thicknessNotes(s: Solution, room: Room): Shape[] {
  const seen = new Set<string>()
  return [...s.walls].sort((a, b) => b.wall.length - a.wall.length).flatMap(({ wall }): Shape[] => {
    const thickness = wall.tEnd ? `${wall.t.typed} to ${wall.tEnd.typed}` : wall.t.typed
    if (seen.has(thickness) || seen.size > 8) return []
    seen.add(thickness)
    const places = [0.22, 0.78, 0.5].flatMap(part => ([-1, 1] as const).map((side) => {
      const m = middleOf(s, wall, part)
      return polar(m.at, m.direction + side * outerSide(m, room.centre) * Math.PI / 2, m.half + 17 * room.pixel)
    }))
    const clear = (p: Pt) => Math.min(...room.taken.map(t => distance(p, t.at) - t.radius - 14 * room.pixel), 0)
    const at = places.reduce((a, b) => clear(b) > clear(a) + 1e-9 ? b : a)
    room.taken.push({ at, radius: 15 * room.pixel })
    return [{ type: 'label', at, text: `t ${thickness}`, role: 'note', anchor: 'middle' }]
  })
}

/** The spots that come within `reach` of the box around these points: of a long section all others are far off. */
export function nearby(points: readonly Pt[], spots: readonly Spot[], reach: number): Spot[] {
  const [xs, ys] = [points.map(p => p[0]), points.map(p => p[1])]
  const [left, right, low, high] = [Math.min(...xs), Math.max(...xs), Math.min(...ys), Math.max(...ys)]
  return spots.filter(({ at: [x, y], radius }) => {
    const far = radius + reach
    return x > left - far && x < right + far && y > low - far && y < high + far
  })
}

/** Names of the walls; the place with the most room of several is taken. */
export function balloons(s: Solution, room: Room): Shape[] {
  const lines = s.walls.flatMap(({ wall }) => [0, 0.1, 0.2, 0.3, 0.4, 0.5, 0.6, 0.7, 0.8, 0.9, 1].map((part): Spot => {
    const m = middleOf(s, wall, part)
    return { at: m.at, radius: m.half }
  }))
  // More room than this is no better.
  const [air, own] = [8 * room.pixel, 9 * room.pixel]
  return s.walls.slice(0, MOST_NAMED).map(({ wall }): Shape => {
    const candidates = [0.5, 0.68, 0.32].flatMap(part => ([1, -1] as const).flatMap(side => [26, 40].map((away) => {
      const m = middleOf(s, wall, part)
      const normal = m.direction + side * Math.PI / 2
      return { at: polar(polar(m.at, normal, m.half + away * room.pixel), m.direction, 6 * room.pixel), leaderTo: polar(m.at, normal, m.half) }
    })))
    const near = nearby(candidates.map(one => one.at), [...room.taken, ...lines], air + own)
    const judged = candidates.map(one => ({ ...one, free: Math.min(clearOf([one.at], near) - own, air) }))
    const best = judged.reduce((a, b) => b.free > a.free + 1e-9 ? b : a)
    room.taken.push({ at: best.at, radius: 10 * room.pixel })
    return { type: 'balloon', at: best.at, text: wall.id, leaderTo: best.leaderTo }
  })
}

/** Opposed arrows on both faces of straight walls, in the sense of a positive torque: along the wall on its right, back on its left. */
export function flowArrows(s: Solution, room: Room): Shape[] {
  return s.walls.slice(0, MOST_MARKED).flatMap(({ wall }): Shape[] => {
    if (wall.arc || wall.length < 44 * room.pixel) return []
    const side = (part: number, way: 1 | -1): Pt => {
      const m = middleOf(s, wall, part)
      return polar(m.at, m.direction + way * Math.PI / 2, m.half + 5 * room.pixel)
    }
    return [
      { type: 'line', from: side(0.25, -1), to: side(0.75, -1), role: 'flow' },
      { type: 'line', from: side(0.75, 1), to: side(0.25, 1), role: 'flow' },
    ]
  })
}

/** Axes of the section, drawn at the centroid. */
export function axes([x, y]: Pt, room: Room): Shape[] {
  const p = room.pixel
  return [
    { type: 'line', from: [x + 9 * p, y], to: [x + 36 * p, y], role: 'axis' },
    { type: 'label', at: [x + 29 * p, y + 5 * p], text: 'x', role: 'axis' },
    { type: 'line', from: [x, y + 9 * p], to: [x, y + 36 * p], role: 'axis' },
    { type: 'label', at: [x + 5 * p, y + 27 * p], text: 'y', role: 'axis' },
  ]
}
