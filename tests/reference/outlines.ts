/** The outlines of the reference rows, mm, with the names of edges that rows ask for. */
import type { Outline, OutlineVertex } from '#shared/torsion/outline/outline'
import { circleLoop } from '#shared/torsion/outline/outline'

/** Bulge of a quarter circle. */
export const quarter = Math.tan(Math.PI / 8)
export const v = (x: number, y: number, bulge = 0, name?: string): OutlineVertex => ({ x, y, bulge, ...(name === undefined ? {} : { name }) })
export const solid = (...outer: OutlineVertex[]): Outline => ({ outer, holes: [] })

export const rectangle = (a: number, b: number): Outline => solid(v(0, 0, 0, 'long'), v(a, 0, 0, 'short'), v(a, b, 0, 'long'), v(0, b, 0, 'short'))
export const disc = (radius: number): Outline => ({ outer: circleLoop(0, 0, radius), holes: [] })
export const tube = (outer: number, inner: number, offset = 0): Outline => ({ outer: circleLoop(0, 0, outer), holes: [circleLoop(offset, 0, inner)] })
export const equilateral = (a: number): Outline => solid(v(0, 0), v(a, 0), v(a / 2, a * Math.sqrt(3) / 2))
export const rightIsosceles = (a: number): Outline => solid(v(0, 0, 0, 'leg'), v(a, 0, 0, 'hypotenuse'), v(0, a, 0, 'leg'))

/** Apex at the origin; edges `edge` and `arc`. */
export function sector(degrees: number, radius = 1): Outline {
  const angle = degrees * Math.PI / 180
  return solid(v(0, 0, 0, 'edge'), v(radius, 0, Math.tan(angle / 4), 'arc'), v(radius * Math.cos(angle), radius * Math.sin(angle), 0, 'edge'))
}

/** Circle with one flat, `depth` removed; edges `arc` and `flat`. */
export function flatted(radius: number, depth: number): Outline {
  const half = Math.acos(1 - depth / radius)
  const at = (angle: number, bulge: number, name: string): OutlineVertex => v(radius * Math.cos(angle), radius * Math.sin(angle), bulge, name)
  return solid(at(Math.PI / 2 + half, Math.tan((Math.PI - half) / 2), 'arc'), at(Math.PI / 2 - half, 0, 'flat'))
}

/** Regular polygon, `d` twice the apothem. */
export function regularPolygon(sides: number, d = 1): Outline {
  const radius = d / 2 / Math.cos(Math.PI / sides)
  return solid(...Array.from({ length: sides }, (_, k) => v(radius * Math.cos(2 * Math.PI * k / sides), radius * Math.sin(2 * Math.PI * k / sides))))
}

/** An ellipse in arcs that rise from their chords as far as the ellipse does. */
export function ellipseLoop(a: number, b: number, arcs: number): OutlineVertex[] {
  const point = (k: number): { x: number, y: number } => ({ x: a * Math.cos(2 * Math.PI * k / arcs), y: b * Math.sin(2 * Math.PI * k / arcs) })
  return Array.from({ length: arcs }, (_, k) => {
    const [from, middle, to] = [point(k), point(k + 0.5), point(k + 1)]
    const chord = Math.hypot(to.x - from.x, to.y - from.y)
    const sagitta = Math.abs((middle.x - from.x) * (to.y - from.y) - (middle.y - from.y) * (to.x - from.x)) / chord
    return { ...from, bulge: 2 * sagitta / chord }
  })
}
export const ellipse = (a: number, b: number, arcs: number): Outline => ({ outer: ellipseLoop(a, b, arcs), holes: [] })
export const hollowEllipse = (a: number, b: number, ratio: number, arcs: number): Outline => ({ outer: ellipseLoop(a, b, arcs), holes: [ellipseLoop(ratio * a, ratio * b, arcs)] })

/** Equal legs by outside length, sharp outer corner, fillet or sharp inside. */
export const machinedAngle = (leg: number, t: number, fillet: number): Outline =>
  solid(v(0, 0), v(leg, 0), v(leg, t), ...(fillet > 0 ? [v(t + fillet, t, -quarter, 'fillet'), v(t, t + fillet)] : [v(t, t)]), v(t, leg), v(0, leg))

/** Equal legs by outside length, concentric bend. */
export const bentAngle = (leg: number, t: number, inside: number): Outline =>
  solid(v(0, inside + t, quarter), v(inside + t, 0), v(leg, 0), v(leg, t), v(t + inside, t, -quarter, 'bend'), v(t, t + inside), v(t, leg), v(0, leg))

/** Flange b × t, stem of the same thickness to the overall height h, fillets. */
export const machinedTee = (b: number, t: number, h: number, fillet: number): Outline => solid(
  v(-b / 2, 0), v(b / 2, 0), v(b / 2, t), v(t / 2 + fillet, t, -quarter, 'fillet'), v(t / 2, t + fillet), v(t / 2, h),
  v(-t / 2, h), v(-t / 2, t + fillet, -quarter, 'fillet'), v(-t / 2 - fillet, t), v(-b / 2, t),
)

/** Hat of sheet, outside dimensions: web height, top width, flange from the outside of the web, inside bend radius. */
export function bentHat(height: number, width: number, flange: number, t: number, inside: number): Outline {
  const [x, ro, tip] = [width / 2, inside + t, width / 2 - t + flange]
  const right = [
    v(tip, 0), v(tip, t), v(x + inside, t, -quarter), v(x, t + inside), v(x, height - ro, quarter), v(x - ro, height),
  ]
  const left = [
    v(-x + ro, height, quarter), v(-x, height - ro), v(-x, t + inside, -quarter), v(-x - inside, t), v(-tip, t), v(-tip, 0),
    v(-x - inside, 0, quarter), v(-x + t, ro), v(-x + t, height - ro, -quarter), v(-x + ro, height - t),
  ]
  return solid(...right, ...left, v(x - ro, height - t, -quarter), v(x - t, height - ro), v(x - t, ro, quarter), v(x + inside, 0))
}

const box = (left: number, low: number, right: number, high: number): OutlineVertex[] => [v(left, low), v(right, low), v(right, high), v(left, high)]

/** C-52: mid-line cells 100 × 80 and 140 × 80; left wall 2, web 3, right wall 1.5, covers 2. */
export const twoCellBox: Outline = { outer: box(-1, -1, 240.75, 81), holes: [box(1, 1, 98.5, 79), box(101.5, 1, 239.25, 79)] }

/** C-91: 120 × 60 on the mid-line from x = 0, left wall 3, right wall 1.5, covers 2. */
export const unequalBox: Outline = { outer: box(-1.5, -1, 120.75, 61), holes: [box(1.5, 1, 119.25, 59)] }
