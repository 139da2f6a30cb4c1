/** How the sides of two walls are joined at a node: mitre, fillet, bend, step, or the square end of a free wall. */
import type { Junction, Refusal } from '#shared/torsion/section'
import type { OutlineVertex, PlanePoint } from '#shared/torsion/outline/outline'
import type { SideCurve } from '#shared/torsion/outline/from-walls/side-curve'
import type { SideTurn } from '#shared/torsion/outline/from-walls/wall-sides'
import { directionAt, footOn, meetingNear, movedLeft } from '#shared/torsion/outline/from-walls/side-curve'
import { turn } from '#shared/torsion/geometry'
import { refusal } from '#shared/torsion/section'

/** Where one side ends and the next begins; what lies between them is an edge of its own where the points differ. */
export interface Join { readonly end: PlanePoint, readonly start: PlanePoint, /** Tangent of a quarter of the swept angle. */ readonly bulge: number, readonly name: string }

/** Walls that turn by less than this may run on. rad */
const stepTurn = 0.3
const smooth = 1e-6

/** Whether walls run on, so that a step joins them: their sides are parallel, or meet farther from the node than they are thick. */
function runOn({ side, next }: SideTurn, turned: number): boolean {
  if (Math.abs(turned) < smooth) return true
  return Math.abs(turned) < stepTurn && Math.abs(side.halfEnd - next.halfStart) > Math.sin(Math.abs(turned)) * (side.halfEnd + next.halfStart) / 2
}

/** The wedge of a bend or a fillet: + to the left, where the empty space lies, − to the right. */
interface Rounding { readonly radius: number, readonly name: string }

function roundingOf({ side, next, meeting }: SideTurn, turned: number, junction: Junction | undefined): Rounding | Refusal {
  const node = side.to.id
  const sharp = { radius: 0, name: `corner at ${node}` }
  if (!junction || Math.abs(turned) < smooth) return sharp
  if (junction.make === 'machined') return turned > 0 ? { radius: junction.radius, name: `fillet at ${node}` } : sharp
  if (meeting > 2) return refusal(`At ${node} more than two walls meet; one bend joins two walls. Give the corner as machined or part the walls.`)
  if (side.wall.t !== next.wall.t || side.halfEnd !== next.halfStart) return refusal(`At ${node} a bend joins walls of differing thickness. Bent sheet is one sheet: make them equal or give the corner as machined.`)
  return turned > 0
    ? { radius: junction.radius, name: `inside of the bend at ${node}` }
    : { radius: -(junction.radius + side.wall.t), name: `outside of the bend at ${node}` }
}

/** The square end of a wall: across it, from one side to the other. */
function freeEnd({ side, next }: SideTurn): Join {
  return { end: footOn(side.curve, besideNode(side.to, side.leavesBack - Math.PI / 2, side.halfEnd)), start: footOn(next.curve, besideNode(side.to, side.leavesBack + Math.PI / 2, side.halfEnd)), bulge: 0, name: `end at ${side.to.id}` }
}

const besideNode = (node: PlanePoint, direction: number, half: number): PlanePoint => ({ x: node.x + half * Math.cos(direction), y: node.y + half * Math.sin(direction) })

/** Both sides cut by the line that halves the turn. */
function stepped({ side, next }: SideTurn, turned: number): Join | null {
  const cut: SideCurve = { kind: 'line', at: side.to, direction: side.leavesBack + turned / 2 - Math.PI / 2 }
  const beside = besideNode(side.to, cut.direction, (side.halfEnd + next.halfStart) / 2)
  const [end, start] = [meetingNear(side.curve, cut, beside), meetingNear(next.curve, cut, beside)]
  return end && start && { end, start, bulge: 0, name: `step at ${side.to.id}` }
}

/** An arc tangent to both sides; for a radius of zero the point where they meet. */
function rounded({ side, next }: SideTurn, { radius, name }: Rounding): Join | null {
  const [p, q] = [movedLeft(side.curve, radius), movedLeft(next.curve, radius)]
  const centre = p && q && meetingNear(p, q, side.to)
  if (!centre) return null
  if (radius === 0) return { end: centre, start: centre, bulge: 0, name }
  const [end, start] = [footOn(side.curve, centre), footOn(next.curve, centre)]
  const swept = turn(directionAt(next.curve, start) - directionAt(side.curve, end))
  return swept * radius > 0 ? { end, start, bulge: Math.tan(swept / 4), name } : null
}

/** Joins a side to the one that follows it. Refused, with the node and the walls, where they cannot be joined. */
export function joinOf(at: SideTurn, junction: Junction | undefined): Join | Refusal {
  const { side, next, wedge, meeting } = at
  if (meeting === 1) return freeEnd(at)
  const turned = Math.PI - wedge
  const rounding = roundingOf(at, turned, junction)
  if ('ok' in rounding) return rounding
  const join = runOn(at, turned) ? stepped(at, turned) : rounded(at, rounding)
  const radius = rounding.radius > 0 ? ` with a radius of ${Number(rounding.radius.toPrecision(4))} mm` : ''
  return join ?? refusal(`The sides of walls ${side.wall.id} and ${next.wall.id} cannot be joined at ${side.to.id}${radius}. Lessen the radius or lengthen the walls.`)
}

/** The edge between the two sides, where there is one. */
export function joinVertex({ end, start, bulge, name }: Join, size: number): OutlineVertex[] {
  return Math.hypot(end.x - start.x, end.y - start.y) <= 1e-9 * size ? [] : [{ x: end.x, y: end.y, bulge, name }]
}
