import { materialRecord, type MaterialInput } from '#shared/calc/parts/material-fields'
import type { KnockdownPoint, MaterialModel } from '#shared/calc/parts/model'
import type { TypedReader } from '#shared/calc/parts/typed-reader'
import { shearYieldFromTension } from '#shared/torsion/allowables'

/** A material record as numbers. Missing strengths stay missing: no default is invented (methods §7.2). */
export function parseMaterial(typed: MaterialInput, i: number, read: TypedReader): MaterialModel | null {
  const path = `materials.${i}`
  const input = typed.record === undefined ? typed : recordOf(typed.record, typed.id, path, read)
  return input && readMaterial(input, path, read)
}

/** The record of the note under the name it has in this calculation. */
function recordOf(record: string, id: string, path: string, read: TypedReader): MaterialInput | null {
  const got = read.links.record(record, 'material')
  const checked = got.ok ? materialRecord.safeParse(got.inputs) : null
  if (checked?.success) return { ...checked.data, id }
  read.fault(path, got.ok ? 'The material record is not complete; open it and correct it.' : got.reason)
  return null
}

/** Reads a record; faults are noted under `path`. */
export function readMaterial(input: MaterialInput, path: string, read: TypedReader): MaterialModel | null {
  const at = (field: string) => `${path}.${field}`
  const named = (what: string) => `${what} of material ${input.id}`
  const G = read.positive(input.G, at('G'), { label: named('the shear modulus'), dimension: 'stress', typical: 'modulus' })
  const E = read.optionalPositive(input.E, at('E'), { label: named('the modulus of elasticity'), dimension: 'stress', typical: 'modulus' })
  const nu = read.optionalPositive(input.nu, at('nu'), { label: named('Poisson’s ratio'), dimension: 'ratio' })
  const strength = (field: 'Ftu' | 'Fty' | 'Fsu' | 'Fsy', label: string) =>
    read.optionalPositive(input[field], at(field), { label: named(label), dimension: 'stress', typical: 'strength' })
  const Ftu = strength('Ftu', 'the ultimate tension strength')
  const Fty = strength('Fty', 'the yield strength in tension')
  const Fsu = strength('Fsu', 'the ultimate shear strength')
  const Fsy = strength('Fsy', 'the yield strength in shear')
  const degrees = (field: 'temperatureFrom' | 'temperatureTo') =>
    read.optional(input[field], at(field), { label: named('a temperature limit'), dimension: 'temperature' })?.value ?? null
  const temperatureFrom = degrees('temperatureFrom')
  const temperatureTo = degrees('temperatureTo')
  const knockdown = parseKnockdown(input, at('knockdown'), read)
  if (!G) return null
  return {
    id: input.id, name: input.name, family: input.family, specification: input.specification, form: input.form,
    basis: input.basis, loadPath: input.loadPath, source: input.source, edition: input.edition,
    E: E?.value ?? null, G: G.value, nu: nu?.value ?? null,
    Ftu: Ftu?.value ?? null, Fty: Fty?.value ?? null, Fsu: Fsu?.value ?? null,
    Fsy: Fsy?.value ?? (Fty ? shearYieldFromTension(Fty.value) : null), FsyGiven: Fsy !== null,
    temperatureFrom, temperatureTo, knockdown, knockdownSource: input.knockdownSource,
    units: { E: E?.unit ?? G.unit, G: G.unit, strength: (Fsu ?? Fty ?? Ftu)?.unit ?? 'MPa' },
  }
}

function parseKnockdown(input: MaterialInput, path: string, read: TypedReader): KnockdownPoint[] {
  const points = input.knockdown.flatMap((point, j) => {
    const temperature = read.number(point.temperature, `${path}.${j}.temperature`, { label: 'the temperature', dimension: 'temperature' })
    const factor = read.positive({ text: point.factor, unit: '' }, `${path}.${j}.factor`, { label: 'the factor', dimension: 'ratio' })
    return temperature && factor ? [{ temperature: temperature.value, factor: factor.value }] : []
  })
  points.sort((a, b) => a.temperature - b.temperature)
  if (points.some((p, j) => j > 0 && p.temperature === points[j - 1]?.temperature)) {
    read.fault(path, `Two factors are given for one temperature in material ${input.id}; keep one.`)
  }
  return points
}
