/** Whether a section can be computed: sound numbers and names, one tree of walls, no crossing (guards G-01, G-06, G-07). */
import type { FaultCode, OpenSection, OpenSeam, OpenWall, SectionCheck, SectionFault } from '#shared/torsion/section'
import type { MidLine } from '#shared/torsion/mid-line'
import { distance } from '#shared/torsion/geometry'
import { drawMidLine, wallPaths } from '#shared/torsion/mid-line'
import { crossings } from '#shared/torsion/crossing'

/** Ends nearer than this part of the size are at one place (G-07). */
const seamGap = 1e-6

const fault = (code: FaultCode, message: string, walls: readonly string[] = [], nodes: readonly string[] = []): SectionFault => ({ code, message, walls, nodes })
const positive = (value: number): boolean => Number.isFinite(value) && value > 0

function wallNumbers({ id, t, tEnd, G, E, arc }: OpenWall): SectionFault[] {
  const faults: SectionFault[] = []
  if (!positive(t)) faults.push(fault('bad-number', `Wall ${id} needs a thickness greater than zero.`, [id]))
  if (tEnd !== undefined && !positive(tEnd)) faults.push(fault('bad-number', `Wall ${id} needs a thickness greater than zero at its end.`, [id]))
  if (!positive(G)) faults.push(fault('bad-number', `Wall ${id} needs a shear modulus greater than zero.`, [id]))
  if (E !== undefined && !positive(E)) faults.push(fault('bad-number', `Wall ${id} needs a modulus of elasticity greater than zero.`, [id]))
  if (!arc) return faults
  if (!positive(arc.radius)) faults.push(fault('bad-number', `Wall ${id} needs a radius greater than zero.`, [id]))
  if (!Number.isFinite(arc.sweep) || arc.sweep === 0 || Math.abs(arc.sweep) > 2 * Math.PI * (1 + 1e-12)) faults.push(fault('bad-number', `Wall ${id} needs a swept angle other than zero and of at most a full circle.`, [id]))
  if (arc.startDirection !== undefined && !Number.isFinite(arc.startDirection)) faults.push(fault('bad-number', `Wall ${id} needs a start direction.`, [id]))
  return faults
}

const repeated = (ids: readonly string[]): string[] => [...new Set(ids.filter((id, index) => ids.indexOf(id) !== index))]

function numbersAndNames(section: OpenSection): SectionFault[] {
  const { nodes, walls, junctions } = section
  const known = new Set(nodes.map(({ id }) => id))
  const unknown = (node: string, walls: string[]): SectionFault[] => (known.has(node) ? [] : [fault('unknown-node', `The node ${node} does not exist.`, walls, [node])])
  return [
    ...(walls.length === 0 ? [fault('no-walls', 'The section has no walls. Add the first wall.')] : []),
    ...repeated(nodes.map(({ id }) => id)).map(id => fault('duplicate-id', `The node ${id} is given twice.`, [], [id])),
    ...repeated(walls.map(({ id }) => id)).map(id => fault('duplicate-id', `The wall ${id} is given twice.`, [id])),
    ...repeated(junctions.map(({ node }) => node)).map(id => fault('junction', `The corner at ${id} is given twice.`, [], [id])),
    ...nodes.filter(({ x, y }) => !Number.isFinite(x) || !Number.isFinite(y)).map(({ id }) => fault('bad-number', `The node ${id} needs two coordinates.`, [], [id])),
    ...walls.flatMap(wallNumbers),
    ...walls.flatMap(({ id, from, to }) => [...unknown(from, [id]), ...unknown(to, [id])]),
    ...junctions.flatMap(({ node }) => unknown(node, [])),
    ...junctions.filter(({ radius }) => !(Number.isFinite(radius) && radius >= 0)).map(({ node }) => fault('bad-number', `The corner at ${node} needs a radius of zero or more.`, [], [node])),
  ]
}

/** A tree: every wall joins two parts that were apart, and one part is left. */
function graphFaults({ walls }: OpenSection): SectionFault[] {
  const parent = new Map<string, string>()
  const root = (node: string): string => {
    let at = node
    while (parent.has(at) && parent.get(at) !== at) at = parent.get(at) ?? at
    return at
  }
  const faults: SectionFault[] = []
  for (const { id, from, to } of walls) {
    for (const node of [from, to]) if (!parent.has(node)) parent.set(node, node)
    const [a, b] = [root(from), root(to)]
    if (a === b) faults.push(fault('loop', `Wall ${id} closes a loop. A closed section carries torque in another way: use a closed section, or open the seam.`, [id], [from, to]))
    else parent.set(a, b)
  }
  const parts = new Set([...parent.keys()].map(root))
  if (parts.size > 1) faults.push(fault('not-connected', 'The walls are not all connected. Join them at common nodes or make two calculations.', [], [...parts]))
  return faults
}

/** Wall lengths of zero, on the size of the whole. */
function zeroLengths(section: OpenSection): SectionFault[] {
  const nodes = new Map(section.nodes.map(node => [node.id, node]))
  const used = section.walls.flatMap(({ from, to }) => [nodes.get(from), nodes.get(to)]).filter(node => node !== undefined)
  const size = used.reduce((largest, node) => Math.max(largest, distance(used[0] ?? node, node)), 0)
  return section.walls
    .filter(({ from, to, arc }) => {
      const [a, b] = [nodes.get(from), nodes.get(to)]
      return !arc && (!a || !b || distance(a, b) <= 1e-9 * size)
    })
    .map(({ id, from, to }) => fault('zero-length', `Wall ${id} has no length. Move one of its ends.`, [id], [from, to]))
}

function crossingFaults({ pieces, size }: MidLine): SectionFault[] {
  return crossings(pieces, size).map(({ a, b, at }) => {
    const walls = [...new Set([...a.walls, ...b.walls].map(({ id }) => id))]
    const where = at ? ` near x = ${at.x.toPrecision(4)}, y = ${at.y.toPrecision(4)} mm` : ''
    return fault('crossing', walls.length > 1
      ? `Walls ${walls.join(' and ')} ${at ? 'meet' : 'lie on one another'}${where} without a common node. Put a node there or move a wall.`
      : `Wall ${walls[0]} meets its own bend${where}. Lessen the radius or lengthen the wall.`, walls)
  })
}

function seamsOf(section: OpenSection, { atNode, size }: MidLine): OpenSeam[] {
  const used = section.nodes.filter(({ id }) => atNode.has(id))
  return used.flatMap((a, index) => used.slice(index + 1).flatMap((b): OpenSeam[] => {
    const gap = distance(a, b)
    return gap <= seamGap * size ? [{ nodes: [a.id, b.id], gap }] : []
  }))
}

export type CheckedSection
  = | { readonly ok: true, readonly midLine: MidLine, readonly seams: readonly OpenSeam[] }
    | { readonly ok: false, readonly reason: string, readonly faults: readonly SectionFault[] }

const refused = (faults: readonly SectionFault[]): CheckedSection => ({ ok: false, reason: faults[0]?.message ?? 'The section cannot be computed.', faults })

/** Checks a section and draws its mid-line; each stage is judged only when the one before is sound. */
export function midLineOf(section: OpenSection): CheckedSection {
  const first = numbersAndNames(section)
  if (first.length > 0) return refused(first)
  const second = [...zeroLengths(section), ...graphFaults(section)]
  if (second.length > 0) return refused(second)
  const { paths, faults } = wallPaths(section)
  if (faults.length > 0) return refused(faults)
  const drawn = drawMidLine(section, paths)
  if (!drawn.midLine) return refused(drawn.faults)
  const fourth = crossingFaults(drawn.midLine)
  if (fourth.length > 0) return refused(fourth)
  return { ok: true, midLine: drawn.midLine, seams: seamsOf(section, drawn.midLine) }
}

/** Whether the section can be computed, every fault found, and the seams left open. */
export function checkSection(section: OpenSection): SectionCheck {
  const checked = midLineOf(section)
  return checked.ok ? { ok: true, seams: checked.seams } : checked
}
