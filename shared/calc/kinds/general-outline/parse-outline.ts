/** From typed loops to an outline in mm; every fault at its field. */
import type { GeneralOutlineInputs, LoopInput } from '#shared/calc/kinds/general-outline/schema'
import type { TypedReader } from '#shared/calc/parts/typed-reader'
import { circleLoop, type Outline, type OutlineLoop } from '#shared/torsion/outline/outline'
import { roundedLoop, type DrawnVertex } from '#shared/torsion/outline/rounded-loop'

export interface ParsedOutline { outline: Outline, holes: string[] }

/** Null where a loop could not be read; the faults are then in `read`. */
export function parseOutline({ outer, holes }: Pick<GeneralOutlineInputs, 'outer' | 'holes'>, read: TypedReader): ParsedOutline | null {
  const ids = new Set<string>()
  holes.forEach(({ id }, i) => {
    if (ids.has(id)) read.fault(`holes.${i}.id`, `Hole ${id} is listed twice; hole names stay unique.`)
    ids.add(id)
  })
  const outerLoop = parseLoop(outer, 'outer', 'outer loop', read)
  const holeLoops = holes.map(({ id, shape }, i) => parseLoop(shape, `holes.${i}.shape`, `hole ${id}`, read))
  if (!outerLoop || holeLoops.some(loop => !loop)) return null
  return { outline: { outer: outerLoop, holes: holeLoops.flatMap(loop => loop ? [loop] : []) }, holes: holes.map(({ id }) => id) }
}

function parseLoop(input: LoopInput, path: string, called: string, read: TypedReader): OutlineLoop | null {
  if (input.by === 'circle') {
    const x = read.number(input.x, `${path}.x`, { label: `x of the centre of the ${called}`, dimension: 'length' })
    const y = read.number(input.y, `${path}.y`, { label: `y of the centre of the ${called}`, dimension: 'length' })
    const radius = read.positive(input.radius, `${path}.radius`, { label: `the radius of the ${called}`, dimension: 'length', typical: 'wall length' })
    return x && y && radius ? circleLoop(x.value, y.value, radius.value, called) : null
  }
  if (input.vertices.length < 2) {
    read.fault(`${path}.vertices`, `Give the vertices of the ${called} in order.`)
    return null
  }
  const drawn = input.vertices.flatMap((vertex, k): DrawnVertex[] => {
    const at = `${path}.vertices.${k}`
    const of = `vertex ${k + 1} of the ${called}`
    const x = read.number(vertex.x, `${at}.x`, { label: `x of ${of}`, dimension: 'length' })
    const y = read.number(vertex.y, `${at}.y`, { label: `y of ${of}`, dimension: 'length' })
    const radius = read.optional(vertex.radius, `${at}.radius`, { label: `the corner radius at ${of}`, dimension: 'length', typical: 'radius' })
    const sweep = read.optional(vertex.sweep, `${at}.sweep`, { label: `the swept angle from ${of}`, dimension: 'angle' })
    if (sweep && Math.abs(sweep.value) >= 2 * Math.PI) read.fault(`${at}.sweep`, 'G-06: An arc sweeps less than a full circle; give a circle as a loop of its own.')
    if (!x || !y) return []
    const named = vertex.name.trim()
    const edge = named === '' ? `edge ${k + 1}${called === 'outer loop' ? '' : ` of ${called}`}` : named
    return [{ x: x.value, y: y.value, bulge: Math.tan((sweep?.value ?? 0) / 4), name: edge, cornerName: `corner ${k + 1}${called === 'outer loop' ? '' : ` of ${called}`}`, radius: radius?.value ?? 0 }]
  })
  if (drawn.length < input.vertices.length) return null
  const rounded = roundedLoop(drawn)
  if (rounded.ok) return rounded.loop
  read.fault(`${path}.vertices`, rounded.reason)
  return null
}
