/** A section and its picture in a mirror, joined into one. */
import type { JunctionInput } from '#shared/calc/parts/wall-fields'
import { nextLetters, nextNumbered } from '#shared/calc/walls/names'
import type { PlacedSection, PlacedWall } from '#shared/calc/walls/placed'
import { isJoined, nodeNames, placeOn, wallNames, type Edited } from '#shared/calc/walls/section-edits'
import { sizeOf } from '#shared/calc/walls/written'
import type { Point } from '#shared/torsion/section'

/** A line along x at a height, or along y at a distance, mm. */
export interface Axis { readonly along: 'x' | 'y', readonly at: number }

const mirroredPoint = ({ x, y }: Point, { along, at }: Axis): Point => (along === 'x' ? { x, y: 2 * at - y } : { x: 2 * at - x, y })
/** A node counts as lying where another does within this share of the size. */
const TOGETHER = 1e-7

/**
 * Adds every wall's mirror image. Nodes on the axis are shared, and a wall whose image is there already is not
 * drawn twice, so that a symmetric section stays as it is.
 */
export function mirrorSection(section: PlacedSection, axis: Axis): Edited {
  const size = sizeOf(section.nodes.values())
  const nodes = new Map(section.nodes)
  const names = nodeNames(section)
  const image = new Map<string, string>()
  for (const [id, point] of section.nodes) {
    const wanted = mirroredPoint(point, axis)
    const there = [...nodes].find(([, one]) => Math.hypot(one.x - wanted.x, one.y - wanted.y) <= TOGETHER * size)
    const name = there?.[0] ?? nextNumbered('', names)
    if (!there) {
      nodes.set(name, wanted)
      names.push(name)
    }
    image.set(id, name)
  }
  const letters = wallNames(section)
  const copies = section.walls.flatMap((wall): PlacedWall[] => {
    const copy = mirroredWall(wall, image, axis)
    if (section.walls.some(one => sameWall(one, copy, nodes, size))) return []
    const id = nextLetters(letters)
    letters.push(id)
    return [{ ...copy, id, input: { ...copy.input, id } }]
  })
  const walls = [...section.walls, ...copies]
  if (!isJoined(walls)) return { ok: false, reason: `No node lies on the axis, so that the mirrored walls would be joined to nothing. Move a node to ${axis.along === 'x' ? 'y' : 'x'} = ${Number(axis.at.toPrecision(6))} mm, or choose a node and mirror about it.` }
  const corners = section.junctions.flatMap((junction): JunctionInput[] => {
    const node = image.get(junction.node)
    return node === undefined || section.junctions.some(one => one.node === node) ? [] : [{ ...junction, node }]
  })
  const used = new Map([...nodes].filter(([node]) => walls.some(wall => wall.from === node || wall.to === node)))
  return { ok: true, section: { ...section, nodes: used, walls, junctions: [...section.junctions, ...corners] } }
}

function mirroredWall(wall: PlacedWall, image: ReadonlyMap<string, string>, axis: Axis): PlacedWall {
  const [from, to] = [image.get(wall.from) ?? wall.from, image.get(wall.to) ?? wall.to]
  const arc = wall.arc && { radius: wall.arc.radius, sweep: -wall.arc.sweep, direction: axis.along === 'x' ? -wall.arc.direction : Math.PI - wall.arc.direction }
  return { ...wall, from, to, arc, input: { ...wall.input, from, to } }
}

/** Between the same nodes, either way round, and over the same middle. */
function sameWall(one: PlacedWall, other: PlacedWall, nodes: ReadonlyMap<string, Point>, size: number): boolean {
  const ends = (wall: PlacedWall) => [wall.from, wall.to].toSorted().join(' ')
  if (ends(one) !== ends(other)) return false
  const middle = (wall: PlacedWall) => {
    const [a, b] = [nodes.get(wall.from), nodes.get(wall.to)]
    return a && b ? placeOn(wall, a, b, 0.5) : { x: Number.NaN, y: Number.NaN }
  }
  const [p, q] = [middle(one), middle(other)]
  return Math.hypot(p.x - q.x, p.y - q.y) <= TOGETHER * size
}
