/** The highest stress of the case shown: where it is, and a place for its flag that hides nothing. */
import type { Shape } from '#shared/calc/types'
import { shownUnits } from '#shared/calc/parts/shown-units'
import { clearOf, middleOf, nearby, outerSide, wallSpots, type Room, type Spot } from '#shared/calc/kinds/open-section/sketch-marks'
import { leavingDirection, polar, type Pt } from '#shared/calc/kinds/open-section/sketch-walls'
import type { CaseSolution, CornerSolution, Solution } from '#shared/calc/kinds/open-section/solution'
import { significant } from '#shared/units/display'
import { fromEngine } from '#shared/units/units'

/** Pixels: lettering of a small picture is larger against its lines, so a letter is given its width there. */
const LETTER = 7.9
const LINE_RADIUS = 9
/** Room that the arrows beside a face take. */
const ARROWS = 6
const CROSSING = -30
/** Pixels of air beyond which more is no better. */
const CLEAR = 3
const DEGREE = Math.PI / 180
const TURNS = [0, 20, -20, 40, -40, 60, -60, 80, -80]
const REACHES = [32, 46, 60, 78, 100, 130]

/** At a corner where its factor makes it the largest, else on the outer face of its wall. */
export function peakMark(s: Solution, c: CaseSolution, room: Room): Shape[] {
  if (!(c.tauMax > 0)) return []
  const unit = shownUnits(s.model).stress
  const say = (tau: number) => `${significant(fromEngine(tau, unit), 3)}\u2009${unit} peak`
  const corner = c.tauCorner !== null && c.tauCorner > c.tauMax ? s.corners.find(k => k.node === c.tauCornerNode) : undefined
  const inner = corner && innerPoint(s, corner)
  if (inner && c.tauCorner !== null) return [peakAt(s, inner.at, inner.away, say(c.tauCorner), room)]
  const wall = s.walls.find(w => w.wall.id === c.tauMaxWall)?.wall
  if (!wall) return []
  const m = middleOf(s, wall, 0.75)
  const normal = m.direction + outerSide(m, room.centre) * Math.PI / 2
  return [peakAt(s, polar(m.at, normal, m.half), polar([0, 0], normal, 1), say(c.tauMax), room)]
}

interface Flag { knee: Pt, end: Pt, leaderFrom: Pt, cost: number }

/** Of many places round the peak, the nearest whose leader and lettering are clear of walls and marks. */
function peakAt(s: Solution, at: Pt, away: Pt, text: string, room: Room): Shape {
  const p = room.pixel
  const places = flagPlaces(at, Math.atan2(away[1], away[0]), text, p)
  const around = places.flatMap(({ knee, end }) => [knee, end])
  const walls = nearby(around, wallSpots(s, room, 1), 0)
  const hidden = nearby(around, [...wallSpots(s, room, ARROWS), ...room.taken], (LINE_RADIUS + CLEAR + 5) * p)
  /** What a flag costs by what it hides; `most` at which it is no longer wanted. */
  const hides = ({ knee, end, leaderFrom }: Flag, most: number) => {
    const lettering = clearOf(along(knee, end, 8 * p).map(([x, y]): Pt => [x, y + 5 * p]), hidden, (CLEAR - most + LINE_RADIUS) * p) / p - LINE_RADIUS
    // The leader starts on a wall and may pass through marks, but through a wall only if nothing else serves.
    const leader = clearOf(along(leaderFrom, knee, 6 * p), walls, -1e-12) < 0 ? CROSSING : CLEAR
    return CLEAR - Math.min(lettering, leader, CLEAR)
  }
  let [best, least]: [Flag | undefined, number] = [undefined, Infinity]
  for (const flag of places) {
    // The places come in order of their cost where they hide nothing: none that follows can be better.
    if (flag.cost >= least) break
    const cost = flag.cost + hides(flag, least - flag.cost)
    if (cost < least) [best, least] = [flag, cost]
  }
  if (!best) return { type: 'peak', at, text, away }
  room.taken.push(...along(best.knee, best.end, 10 * p).map(([x, y]) => ({ at: [x, y + 5 * p] as Pt, radius: LINE_RADIUS * p })))
  return { type: 'peak', at, text, away, flag: { knee: best.knee, end: best.end } }
}

function flagPlaces(at: Pt, direction: number, text: string, p: number): Flag[] {
  const long = (text.length * LETTER + 6) * p
  const places = TURNS.flatMap(turn => REACHES.flatMap(reach => ([1, -1] as const).map((side): Flag => {
    const knee = polar(at, direction + turn * DEGREE, reach * p)
    return { knee, end: [knee[0] + side * long, knee[1]], leaderFrom: polar(at, direction + turn * DEGREE, 14 * p), cost: reach / 60 + Math.abs(turn) / 60 }
  })))
  return places.sort((a, b) => a.cost - b.cost)
}

function along(a: Pt, b: Pt, step: number): Pt[] {
  const count = Math.max(1, Math.ceil(Math.hypot(b[0] - a[0], b[1] - a[1]) / step))
  return Array.from({ length: count + 1 }, (_, i): Pt => [a[0] + (b[0] - a[0]) * i / count, a[1] + (b[1] - a[1]) * i / count])
}

/** Side of the shear centre, out of four, on which its letter is furthest from the walls. */
export function letterSide(s: Solution, at: Pt, room: Room): [number, number] {
  const walls: Spot[] = wallSpots(s, room, 1)
  const sides: [number, number][] = [[1, 1], [-1, 1], [-1, -1], [1, -1]]
  const clear = ([x, y]: [number, number]) => Math.min(clearOf([[at[0] + x * 13 * room.pixel, at[1] + y * 10 * room.pixel]], walls), 6 * room.pixel)
  return sides.reduce((a, b) => clear(b) > clear(a) + 1e-9 ? b : a)
}

/** The inner surface of a two-walled corner, in the direction that halves the angle between its walls. */
function innerPoint(s: Solution, corner: CornerSolution): { at: Pt, away: Pt } | null {
  const node = s.model.nodes.find(n => n.id === corner.node)
  const [a, b] = corner.walls
  if (!node || !a || !b) return null
  const [u, v] = [polar([0, 0], leavingDirection(a, corner.node), 1), polar([0, 0], leavingDirection(b, corner.node), 1)]
  const middle: Pt = [u[0] + v[0], u[1] + v[1]]
  const long = Math.hypot(middle[0], middle[1])
  if (long < 1e-6) return null
  const away: Pt = [middle[0] / long, middle[1] / long]
  const half = Math.acos(Math.min(Math.max(u[0] * away[0] + u[1] * away[1], -1), 1))
  // From the node to the inner surface: half the thickness, and what the radius fills.
  const r = corner.junction?.radius.value ?? 0
  const depth = (corner.worst.t.value / 2 + r) / Math.sin(half) - r
  return { at: [node.x + away[0] * depth, node.y + away[1] * depth], away }
}
