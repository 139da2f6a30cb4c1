/** Outputs under keys that stay the same when a calculation is edited; values are in engine units. */
import type { MarginRow, Output } from '#shared/calc/types'
import type { FactorModel, MaterialModel } from '#shared/calc/parts/model'
import type { Dimension, FittingUnit, UnitId } from '#shared/units/units'

export type Extra = Partial<Pick<Output, 'caseId' | 'wall' | 'primary'>>

/** An output, or nothing where the value does not exist. */
export function output<D extends Dimension, U extends UnitId>(
  key: string, symbol: string, label: string, value: number | null | undefined, dimension: D, unit: FittingUnit<D, U>, method: string, extra: Extra = {},
): Output[] {
  return value === null || value === undefined || !Number.isFinite(value) ? [] : [{ key, symbol, label, value, dimension, unit, method, ...extra }]
}

export function materialOutputs(materials: readonly MaterialModel[]): Output[] {
  return materials.flatMap((m) => {
    const strength = (name: 'Fsu' | 'Fsy' | 'Ftu' | 'Fty', index: string, label: string) =>
      output(`${name}:${m.id}`, `F_{${index}}`, `${label}, ${m.id}`, m[name], 'stress', m.units.strength, '§7.2')
    return [
      ...output(`E:${m.id}`, 'E', `Modulus of elasticity, ${m.id}`, m.E, 'stress', m.units.E, '§9'),
      ...output(`G:${m.id}`, 'G', `Shear modulus, ${m.id}`, m.G, 'stress', m.units.G, '§9'),
      ...output(`nu:${m.id}`, '\\nu', `Poisson’s ratio, ${m.id}`, m.nu, 'number', '', '§9'),
      ...strength('Ftu', 'tu', 'Ultimate tension strength'),
      ...strength('Fty', 'ty', 'Yield strength in tension'),
      ...strength('Fsu', 'su', 'Ultimate shear strength'),
      ...strength('Fsy', 'sy', m.FsyGiven ? 'Yield strength in shear' : 'Yield strength in shear, Fty/√3'),
    ]
  })
}

export const factorOutputs = (factors: FactorModel): Output[] => [
  ...output('f_FS', 'f_{FS}', 'Factor of safety', factors.ultimate, 'number', '', '§7.1'),
  ...output('f_sp', 'f_{sp}', 'Special factor in force', factors.special, 'number', '', '§7.1'),
]

/** The least margin of each mode and case, of each mode, of each case, and of all. */
export function marginOutputs(rows: readonly MarginRow[], governing: MarginRow | null): Output[] {
  const least = new Map<string, MarginRow>()
  const lower = (key: string, row: MarginRow) => {
    const held = least.get(key)
    if (row.rf !== null && (held?.rf === undefined || held.rf === null || row.rf < held.rf)) least.set(key, row)
  }
  for (const row of rows) {
    lower(`MS:${row.mode}@${row.caseId}`, row)
    lower(`MS:${row.mode}`, row)
    lower(`MS@${row.caseId}`, row)
  }
  const outputs = [...least].flatMap(([key, row]) => marginOutput(key, row, key.includes('@') ? {} : { primary: true }))
  return governing ? [...outputs, ...marginOutput('MS', governing, { primary: true })] : outputs
}

function marginOutput(key: string, row: MarginRow, extra: Extra): Output[] {
  const mode = row.modeLabel.charAt(0).toLowerCase() + row.modeLabel.slice(1)
  const label = key === 'MS' ? `Least margin (${mode}, case ${row.caseId})` : `Margin, ${mode}, case ${row.caseId}`
  return output(key, 'MS', label, row.ms, 'margin', '', '§7.3', { caseId: row.caseId, ...(row.wall === undefined ? {} : { wall: row.wall }), ...extra })
}

/** A single case needs no name in its labels; a case given at ultimate says so. */
export function caseLabel(count: number, inCase: { id: string, level: 'limit' | 'ultimate' }, single: string): string {
  const level = inCase.level === 'ultimate' ? ', given at ultimate' : ''
  return count === 1 && inCase.id === single ? level : `, case ${inCase.id}${level}`
}
