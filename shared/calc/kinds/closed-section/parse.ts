import { noLinks, type Links } from '#shared/calc/links'
import { closedSectionSchema, type ClosedSectionInputs } from '#shared/calc/kinds/closed-section/schema'
import { parseBar, type BarModel, type ParsedModel } from '#shared/calc/parts/bar-fields'
import type { Measured, Refused, Unusual } from '#shared/calc/parts/model'
import { parseWalls, SEAM_TOLERANCE, type Geometry } from '#shared/calc/parts/parse-walls'
import { schemaFaults } from '#shared/calc/parts/schema-faults'
import { typedReader, type TypedReader } from '#shared/calc/parts/typed-reader'
import type { ModelWall, Seam } from '#shared/calc/parts/wall-model'

export interface Joint { wall: ModelWall, pitch: Measured }

export interface ClosedSectionModel extends Geometry {
  units: 'SI' | 'US'
  /** Ends that were named to meet and do not; those within the tolerance are joined and no longer here. */
  seams: Seam[]
  joints: Joint[]
  diaphragmSpacing: Measured | null
  diaphragmAtLoad: Measured | null
  root: ClosedSectionInputs['root']
  bar: BarModel
  refused: Refused[]
  unusual: Unusual[]
}

export function parseClosedSection(value: unknown, links: Links = noLinks): ParsedModel<ClosedSectionModel> {
  const checked = closedSectionSchema.safeParse(value)
  if (!checked.success) return { ok: false, faults: schemaFaults(checked.error) }
  const inputs = checked.data
  const read = typedReader(links)
  const bar = parseBar(inputs, read)
  const typed = parseWalls(inputs, bar?.materials ?? [], read)
  const diaphragmSpacing = read.optionalPositive(inputs.diaphragmSpacing, 'diaphragmSpacing', { label: 'the spacing of diaphragms', dimension: 'length' })
  const diaphragmAtLoad = read.optional(inputs.diaphragmAtLoad, 'diaphragmAtLoad', { label: 'the distance to the next diaphragm', dimension: 'length' })
  const joints = readJoints(inputs, typed?.walls ?? [], read)
  if (!bar || !typed || read.faults.length > 0) return { ok: false, faults: read.faults }
  return {
    ok: true,
    model: { units: inputs.units, ...joined(typed), joints, diaphragmSpacing, diaphragmAtLoad, root: inputs.root, bar, refused: read.refused, unusual: read.unusual },
  }
}

function readJoints(inputs: ClosedSectionInputs, walls: readonly ModelWall[], read: TypedReader): Joint[] {
  const named = new Set<string>()
  return inputs.joints.flatMap((joint, i): Joint[] => {
    const pitch = read.positive(joint.pitch, `joints.${i}.pitch`, { label: `the pitch of the joint in wall ${joint.wall}`, dimension: 'length' })
    if (!inputs.walls.some(w => w.id === joint.wall)) read.fault(`joints.${i}.wall`, 'Name a wall of the table.')
    if (named.has(joint.wall)) read.fault(`joints.${i}.wall`, `Wall ${joint.wall} has two joints; keep one.`)
    named.add(joint.wall)
    const wall = walls.find(w => w.id === joint.wall)
    return pitch && wall ? [{ wall, pitch }] : []
  })
}

/** Ends within the tolerance of the node they are named to meet are that node. */
function joined(geometry: Geometry): Geometry {
  const same = new Map(geometry.seams.filter(seam => seam.gap <= SEAM_TOLERANCE * seam.size).map(seam => [seam.wall, seam.node]))
  const walls = geometry.walls.map((wall): ModelWall => ({ ...wall, to: same.get(wall.id) ?? wall.to }))
  const used = new Set(walls.flatMap(wall => [wall.from, wall.to]))
  return { nodes: geometry.nodes.filter(node => used.has(node.id)), walls, junctions: geometry.junctions, seams: geometry.seams.filter(seam => !same.has(seam.wall)) }
}
