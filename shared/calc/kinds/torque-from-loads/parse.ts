import { noLinks, type Links } from '#shared/calc/links'
import { torqueFromLoadsSchema, type TorqueFromLoadsInputs } from '#shared/calc/kinds/torque-from-loads/schema'
import type { ParsedModel } from '#shared/calc/parts/bar-fields'
import type { Measured, Refused, Unusual } from '#shared/calc/parts/model'
import { schemaFaults } from '#shared/calc/parts/schema-faults'
import { typedReader, type TypedReader } from '#shared/calc/parts/typed-reader'
import type { LoadLevel } from '#shared/calc/types'
import type { Point } from '#shared/torsion/section'

export interface PlacedForce { point: string, Vx: number, Vy: number, at: Point }
export interface LoadedCase { id: string, title: string, source: string, level: LoadLevel, temperature: number | null, couple: Measured, forces: PlacedForce[] }
export interface TorqueFromLoadsModel {
  units: 'SI' | 'US'
  reference: 'shear centre' | 'centroid' | 'another point'
  centre: Point
  points: { id: string, title: string, at: Point }[]
  cases: LoadedCase[]
  refused: Refused[]
  unusual: Unusual[]
}

export function parseTorqueFromLoads(value: unknown, links: Links = noLinks): ParsedModel<TorqueFromLoadsModel> {
  const checked = torqueFromLoadsSchema.safeParse(value)
  if (!checked.success) return { ok: false, faults: schemaFaults(checked.error) }
  const inputs = checked.data
  const read = typedReader(links)
  const centre = readPoint(inputs.reference, 'reference', 'the reference point', read)
  const points = readPoints(inputs, read)
  const cases = readCases(inputs, points, read)
  if (inputs.cases.length === 0) read.fault('cases', 'Add at least one load case.')
  if (!centre || read.faults.length > 0) return { ok: false, faults: read.faults }
  return { ok: true, model: { units: inputs.units, reference: inputs.reference.is, centre, points, cases, refused: read.refused, unusual: read.unusual } }
}

function readPoint(typed: { x: TorqueFromLoadsInputs['reference']['x'], y: TorqueFromLoadsInputs['reference']['y'] }, path: string, label: string, read: TypedReader): Point | null {
  const x = read.number(typed.x, `${path}.x`, { label: `the x of ${label}`, dimension: 'length' })
  const y = read.number(typed.y, `${path}.y`, { label: `the y of ${label}`, dimension: 'length' })
  return x && y ? { x: x.value, y: y.value } : null
}

function readPoints({ points }: TorqueFromLoadsInputs, read: TypedReader): TorqueFromLoadsModel['points'] {
  const ids = new Set<string>()
  return points.flatMap((point, i) => {
    if (ids.has(point.id)) read.fault(`points.${i}.id`, `Point ${point.id} is listed twice; names stay unique.`)
    ids.add(point.id)
    const at = readPoint(point, `points.${i}`, `point ${point.id}`, read)
    return at ? [{ id: point.id, title: point.title, at }] : []
  })
}

function readCases({ cases, points: listed }: TorqueFromLoadsInputs, points: TorqueFromLoadsModel['points'], read: TypedReader): LoadedCase[] {
  const ids = new Set<string>()
  const known = new Set(listed.map(one => one.id))
  return cases.flatMap((row, i): LoadedCase[] => {
    const path = `cases.${i}`
    if (ids.has(row.id)) read.fault(`${path}.id`, `Case ${row.id} is listed twice; case names stay unique.`)
    ids.add(row.id)
    const temperature = read.optional(row.temperature, `${path}.temperature`, { label: `the temperature of case ${row.id}`, dimension: 'temperature' })
    const couple = read.number(row.couple, `${path}.couple`, { label: `the couple of case ${row.id}`, dimension: 'torque', typical: 'torque' })
    const forces = row.forces.flatMap((force, k): PlacedForce[] => {
      if (!known.has(force.point)) read.fault(`${path}.forces.${k}.point`, `Choose a point of the list for force ${k + 1} of case ${row.id}.`)
      const Vx = read.number(force.Vx, `${path}.forces.${k}.Vx`, { label: 'the force along x', dimension: 'force' })
      const Vy = read.number(force.Vy, `${path}.forces.${k}.Vy`, { label: 'the force along y', dimension: 'force' })
      const at = points.find(one => one.id === force.point)?.at
      return Vx && Vy && at ? [{ point: force.point, Vx: Vx.value, Vy: Vy.value, at }] : []
    })
    return couple ? [{ id: row.id, title: row.title, source: row.source, level: row.level, temperature: temperature?.value ?? null, couple, forces }] : []
  })
}
