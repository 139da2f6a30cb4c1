import type { TypedQuantity } from '#shared/calc/types'
import type { LoadingInput } from '#shared/calc/parts/loading-fields'
import type { MaterialInput } from '#shared/calc/parts/material-fields'
import type { OpenSectionInputs } from '#shared/calc/kinds/open-section/schema'
import type { WallEndInput, WallInput } from '#shared/calc/parts/wall-fields'
import { nextLetters, nextNumbered } from '#shared/calc/walls/names'
import type { UnitId } from '#shared/units/units'

const empty = (unit: UnitId): TypedQuantity => ({ text: '', unit })
const degrees = (text: string): TypedQuantity => ({ text, unit: '°' })

export const lengthUnit = (inputs: Pick<OpenSectionInputs, 'units'>): UnitId => (inputs.units === 'SI' ? 'mm' : 'in')
export const torqueUnit = (inputs: OpenSectionInputs): UnitId => (inputs.units === 'SI' ? 'N·m' : 'lbf·in')
export const rateUnit = (inputs: OpenSectionInputs): UnitId => (inputs.units === 'SI' ? '°/m' : '°/ft')
export const stressUnit = (inputs: OpenSectionInputs): UnitId => (inputs.units === 'SI' ? 'MPa' : 'ksi')
export const temperatureUnit = (inputs: OpenSectionInputs): UnitId => (inputs.units === 'SI' ? '°C' : '°F')

/** The next wall goes on from the end of the last one, square to it, as thick and of the same material. */
export function nextWall(inputs: OpenSectionInputs): WallInput {
  const last = inputs.walls.at(-1)
  const unit = lengthUnit(inputs)
  const nodes = inputs.walls.flatMap(wall => [wall.from, wall.to])
  return {
    id: nextLetters(inputs.walls.map(wall => wall.id)),
    name: '',
    from: last?.to ?? '1',
    to: nextNumbered('', last ? nodes : ['1']),
    end: { by: 'length', length: empty(unit), direction: degrees('90') },
    t: last ? { ...last.t } : empty(unit),
    material: last?.material ?? inputs.materials[0]?.id ?? 'M1',
  }
}

/** Another way to give the end of a wall, keeping what both ways share. */
export function endBy(by: string, end: WallEndInput, unit: UnitId): WallEndInput {
  const direction = 'direction' in end ? end.direction : degrees('0')
  if (by === 'point') return { by: 'point', x: empty(unit), y: empty(unit) }
  if (by === 'arc') return { by: 'arc', radius: empty(unit), sweep: degrees('90'), direction }
  return { by: 'length', length: 'length' in end ? end.length : empty(unit), direction }
}

/** Stands until a table is chosen; it names nothing, so the fault of the field says what to do. */
const NO_TABLE = '00000000-0000-0000-0000-000000000000'

interface Head { id: string, title: string, source: string, level: 'limit' | 'ultimate', temperature: TypedQuantity | null }
const headOf = ({ id, title, source, level, temperature }: Head): Head => ({ id, title, source, level, temperature })

/** The cases typed so far; those of a linked table are not this calculation's own. */
function headsOf(loading: LoadingInput): Head[] {
  if (loading.by === 'table') return []
  return loading.by === 'torque' ? [{ id: 'L01', title: '', source: loading.source, level: loading.level, temperature: loading.temperature }] : loading.cases.map(headOf)
}

/** Another way to load the section, keeping the torque or the cases already typed. */
export function loadingBy(by: string, inputs: OpenSectionInputs): LoadingInput {
  const now = inputs.loading
  if (by === 'torque') {
    const first = now.by === 'cases' ? now.cases[0] : undefined
    return { by: 'torque', torque: first?.torque ?? empty(torqueUnit(inputs)), level: first?.level ?? 'limit', temperature: first?.temperature ?? null, source: first?.source ?? '' }
  }
  if (by === 'table') return { by: 'table', table: NO_TABLE, quantity: 'T' }
  const heads = headsOf(now)
  if (by === 'cases') return { by: 'cases', cases: heads.map(head => ({ ...head, torque: now.by === 'torque' ? now.torque : empty(torqueUnit(inputs)) })) }
  return { by: 'rate', cases: heads.map(head => ({ ...head, rate: empty(rateUnit(inputs)) })) }
}

/** One more row under the load cases, at the level and from the source of the last one. */
export function withNextCase(inputs: OpenSectionInputs): LoadingInput {
  const now = inputs.loading
  if (now.by === 'torque' || now.by === 'table') return withNextCase({ ...inputs, loading: loadingBy('cases', inputs) })
  const last = now.cases.at(-1)
  const head = { id: nextNumbered('L', now.cases.map(each => each.id), 2), title: '', source: last?.source ?? '', level: last?.level ?? 'limit' as const, temperature: last?.temperature ?? null }
  if (now.by === 'cases') return { by: 'cases', cases: [...now.cases, { ...head, torque: empty(now.cases.at(-1)?.torque.unit ?? torqueUnit(inputs)) }] }
  return { by: 'rate', cases: [...now.cases, { ...head, rate: empty(now.cases.at(-1)?.rate.unit ?? rateUnit(inputs)) }] }
}

/** A material with the fields of another left empty. */
export function nextMaterial(inputs: OpenSectionInputs): MaterialInput {
  const stress = stressUnit(inputs)
  const modulus: UnitId = inputs.units === 'SI' ? 'GPa' : 'Msi'
  return {
    id: nextNumbered('M', inputs.materials.map(each => each.id)),
    name: '', specification: '', form: '', thicknessRange: '', family: 'aluminium', basis: 'none', loadPath: 'single', source: '', edition: '',
    E: empty(modulus), G: empty(modulus), nu: empty(''), Ftu: empty(stress), Fty: empty(stress), Fsu: empty(stress), Fsy: null,
    temperatureFrom: null, temperatureTo: null, knockdown: [], knockdownSource: '',
  }
}

/** Nodes at which two walls or more meet: where a corner radius can stand. */
export function meetingNodes(inputs: OpenSectionInputs): string[] {
  const count = new Map<string, number>()
  for (const wall of inputs.walls) for (const node of new Set([wall.from, wall.to])) count.set(node, (count.get(node) ?? 0) + 1)
  return [...count].filter(([, walls]) => walls > 1).map(([node]) => node)
}
