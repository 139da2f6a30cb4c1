/** A picture of every profile with the letters of its dimensions, measured as the drawing measures. Not to scale. */
import { dimensionsOf, thicknessOf } from '#shared/calc/parts/parse-profile'
import type { ProfileInput, ProfileShape } from '#shared/calc/parts/profile-fields'
import type { Drawing, Shape } from '#shared/calc/types'
import type { OpenWall, Point } from '#shared/torsion/section'
import type { Profile } from '#shared/torsion/profiles/profile'
import { sectionOfProfile } from '#shared/torsion/profiles/section-of-profile'

type Measured = ProfileInput['measured']
type At = (node: number) => Point
/** A dimension from one place to another; `ends` says which of them meet a wall, so that the way of measuring moves it. */
interface Mark { symbol: string, from: Point, to: Point, offset: number, ends: readonly [boolean, boolean] }

const THICK = 5
const LINE = 17
const joined = [true, true] as const
const free = [false, false] as const
const edge = (from: boolean, to: boolean) => [from, to] as const

const mark = (symbol: string, from: Point, to: Point, offset: number, ends: Mark['ends']): Mark => ({ symbol, from, to, offset, ends })
const upright = (x: number, low: number, high: number): [Point, Point] => [{ x, y: low }, { x, y: high }]

/** Which places each dimension runs between; nodes are numbered as the profile numbers them. */
const marks: Record<ProfileShape, (at: At) => Mark[]> = {
  'angle': at => [mark('b', at(2), at(1), -LINE, edge(true, false)), mark('h', at(2), at(3), LINE, edge(true, false))],
  'tee': at => [mark('b', at(1), at(3), LINE, free), mark('h', ...upright(at(3).x, at(4).y, 0), -LINE, edge(false, true))],
  'channel': at => [mark('b_l', at(2), at(1), -LINE, edge(true, false)), mark('h', at(2), at(3), LINE, joined), mark('b_u', at(3), at(4), LINE, edge(true, false))],
  'zed': at => [mark('b_l', at(1), at(2), -LINE, edge(false, true)), mark('h', ...upright(at(4).x, 0, at(3).y), -LINE, joined), mark('b_u', at(3), at(4), LINE, edge(true, false))],
  'hat': at => [mark('b', at(1), at(2), -LINE, edge(false, true)), mark('h', ...upright(at(1).x, 0, at(3).y), LINE, joined), mark('c', at(3), at(4), LINE, joined)],
  'J': at => [mark('b', at(1), at(3), -LINE, free), mark('h', ...upright(at(1).x, 0, at(4).y), LINE, joined), mark('c', at(4), at(5), LINE, edge(true, false))],
  'lipped channel': at => [mark('c', at(2), at(1), -LINE, edge(true, false)), mark('b', at(3), at(2), -LINE, joined), mark('h', at(3), at(4), LINE, joined)],
  'I': at => [mark('b_l', at(1), at(3), -LINE, free), mark('h', ...upright(at(3).x, 0, at(4).y), -LINE, joined), mark('b_u', at(5), at(6), LINE, free)],
  'slit tube': at => [mark('D', { x: -at(1).x, y: 0 }, { x: at(1).x, y: 0 }, -at(1).x - LINE, joined)],
  'arc': at => [mark('R', { x: 0, y: 0 }, { x: Math.hypot(at(1).x, at(1).y), y: 0 }, 0, edge(false, true))],
}

const SAMPLE: Record<string, number> = { lip: 16, cap: 26, brim: 24, crown: 34, lower: 44, upper: 34, width: 46, height: 54, flange: 44, base: 46, diameter: 58, radius: 0, angle: 4.4, lean: 0.17 }

/** Thicknesses differ by a hair, so that each wall tells which of them is its own. */
function sample(shape: ProfileShape): { profile: Profile, thicknesses: { key: string, symbol: string, value: { value: number, unit: 'mm', typed: string } }[] } {
  const dimensions = dimensionsOf(shape)
  const values = dimensions.map(({ key, symbol }, i) => ({ key, symbol, value: { value: /^t(?:[A-Z]|$)/.test(key) ? THICK + i * 1e-6 : shape === 'arc' && key === 'radius' ? 30 : SAMPLE[key] ?? 0, unit: 'mm' as const, typed: '' } }))
  const numbers = Object.fromEntries(values.map(({ key, value }) => [key, value.value]))
  return { profile: { shape, measured: 'mid-line', make: 'machined', ...numbers } as unknown as Profile, thicknesses: values }
}

const symbolParts = (symbol: string): { text: string, sub?: string } => {
  const [letter = '', index] = symbol.split('_')
  const text = letter === '\\delta' ? 'δ' : letter === '\\alpha' ? 'α' : letter
  return index === undefined ? { text } : { text, sub: index }
}
export { symbolParts }

/** @param measured without it the bare shape is drawn, for a choice among shapes */
export function profilePicture(shape: ProfileShape, measured?: Measured): Drawing {
  const { profile, thicknesses } = sample(shape)
  const made = sectionOfProfile(profile, { G: 1 })
  const section = made.ok ? made.section : { nodes: [], walls: [], junctions: [] }
  const at: At = node => section.nodes[node - 1] ?? { x: 0, y: 0 }
  const byId = (id: string) => section.nodes.find(node => node.id === id) ?? { x: 0, y: 0 }
  const meeting = (id: string) => section.walls.filter(wall => wall.from === id || wall.to === id).length > 1
  const walls = section.walls.map((wall): Shape => ({ type: 'path', role: 'wall', closed: true, points: bandOf(wall, byId, meeting) }))
  const letters = measured === undefined ? [] : [
    ...marks[shape](at).map(one => dimensionShape(one, measured)),
    ...section.walls.flatMap((wall, i) => thicknessLetter(section.walls, i, thicknessOf(wall.t, thicknesses)?.symbol ?? '', byId)),
    ...cornerLetters(shape, at),
  ]
  const shapes = [...walls, ...letters]
  return { shapes, box: boxOf(walls, measured === undefined ? 4 : LINE + 12), alt: `${shape}${measured === undefined ? '' : ` with the letters of its dimensions, measured ${measured === 'mid-line' ? 'on the mid-line' : measured}`}` }
}

/** Both faces of a wall, drawn on to the far face of what it meets. */
function bandOf(wall: OpenWall, at: (id: string) => Point, meeting: (id: string) => boolean): [number, number][] {
  const [a, b] = [at(wall.from), at(wall.to)]
  const half = wall.t / 2
  if (wall.arc) {
    const { radius, sweep } = wall.arc
    const start = Math.atan2(a.y, a.x)
    const gap = Math.abs(sweep) > 6.2 ? 0.09 : 0
    const angles = Array.from({ length: 61 }, (_, i) => start + gap + (sweep - 2 * gap) * i / 60)
    const ring = (r: number) => angles.map((angle): [number, number] => [r * Math.cos(angle), r * Math.sin(angle)])
    return [...ring(radius + half), ...ring(radius - half).reverse()]
  }
  const length = Math.hypot(b.x - a.x, b.y - a.y)
  const [ux, uy] = [(b.x - a.x) / length, (b.y - a.y) / length]
  const [head, tail] = [meeting(wall.from) ? half : 0, meeting(wall.to) ? half : 0]
  const corner = (p: Point, along: number, side: number): [number, number] => [p.x + along * ux - side * half * uy, p.y + along * uy + side * half * ux]
  return [corner(a, -head, 1), corner(b, tail, 1), corner(b, tail, -1), corner(a, -head, -1)]
}

/** Outside dimensions reach over the wall they meet by half its thickness, inside ones stop short of it. */
function dimensionShape({ symbol, from, to, offset, ends }: Mark, measured: Measured): Shape {
  const length = Math.hypot(to.x - from.x, to.y - from.y)
  const reach = { 'outside': 1, 'inside': -1, 'mid-line': 0 }[measured] * THICK / 2
  const [ux, uy] = [(to.x - from.x) / length, (to.y - from.y) / length]
  const moved = (p: Point, by: number): [number, number] => [p.x + by * ux, p.y + by * uy]
  return { type: 'dimension', from: moved(from, ends[0] ? -reach : 0), to: moved(to, ends[1] ? reach : 0), offset, symbol: true, ...symbolParts(symbol) }
}

/** The letter of a thickness beside the first wall that has it, away from its ends. */
function thicknessLetter(walls: readonly OpenWall[], index: number, symbol: string, at: (id: string) => Point): Shape[] {
  const wall = walls[index]
  if (!wall || walls.findIndex(one => one.t === wall.t) < index) return []
  const [a, b] = [at(wall.from), at(wall.to)]
  if (wall.arc) {
    const angle = Math.atan2(a.y, a.x) + wall.arc.sweep * 0.42
    const r = wall.arc.radius - 11
    return [{ type: 'label', role: 'axis', at: [r * Math.cos(angle), r * Math.sin(angle) - 2], anchor: 'middle', ...symbolParts(symbol) }]
  }
  const flat = Math.abs(b.y - a.y) < Math.abs(b.x - a.x)
  const place: [number, number] = flat ? [a.x + (b.x - a.x) * 0.62, a.y + (a.y + b.y > 20 ? -10.5 : 5.5)] : [(a.x + b.x) / 2 + 8, (a.y + b.y) / 2 + 2]
  return [{ type: 'label', role: 'axis', at: place, anchor: flat ? 'middle' : 'start', ...symbolParts(symbol) }]
}

/** Angles have no dimension line of their own. */
function cornerLetters(shape: ProfileShape, at: At): Shape[] {
  if (shape === 'hat') return [{ type: 'line', role: 'note', from: [at(2).x, at(2).y], to: [at(2).x, at(3).y] }, { type: 'label', role: 'axis', at: [at(2).x - 5, at(3).y - 12], anchor: 'end', text: 'δ' }]
  if (shape === 'arc') return [{ type: 'label', role: 'axis', at: [-4, -2], anchor: 'end', text: 'α' }]
  return []
}

function boxOf(walls: readonly Shape[], room: number): Drawing['box'] {
  const points = walls.flatMap(shape => (shape.type === 'path' ? shape.points : []))
  const [xs, ys] = [points.map(p => p[0]), points.map(p => p[1])]
  const [left, bottom] = [Math.min(...xs) - room, Math.min(...ys) - room]
  return { x: left, y: bottom, width: Math.max(...xs) + room - left, height: Math.max(...ys) + room - bottom }
}
