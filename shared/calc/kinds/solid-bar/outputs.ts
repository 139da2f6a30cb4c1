import type { ComparedValue, Output } from '#shared/calc/types'
import type { SolidBarSolution } from '#shared/calc/kinds/solid-bar/solve'
import { barOutputs } from '#shared/calc/parts/bar-outputs'
import { output } from '#shared/calc/parts/output'
import { shownUnits } from '#shared/calc/parts/shown-units'

export function solidBarOutputs(s: SolidBarSolution): Output[] {
  const { model, torsion } = s
  const u = shownUnits(model)
  const m = torsion.method
  return [
    ...output('A', 'A', 'Area', torsion.A, 'area', u.area, m), ...output('J', 'J', 'Torsion constant', torsion.J, 'inertia', u.inertia, m, { primary: true }),
    ...output('GJ', 'GJ', 'Torsional stiffness', s.GJ, 'torsionalStiffness', u.stiffness, m),
    ...output('W_T', 'W_T', 'Torsional modulus', torsion.WT, 'firstMoment', model.units === 'SI' ? 'mm³' : 'in³', m, { primary: true }),
    ...model.sizes.flatMap(({ symbol, label, measured }) => output(`size:${symbol.replace('\\', '')}`, symbol, label.charAt(0).toUpperCase() + label.slice(1), measured.value, symbol === '\\alpha' ? 'angle' : 'length', measured.unit, m)),
    ...plastic(s), ...secondary(s),
    ...barOutputs({ ...s, bar: model.bar, method: m }, u),
  ]
}

/** For information: never a margin of its own (methods §7.5). */
function plastic({ model, torsion }: SolidBarSolution): Output[] {
  const { plastic: heap } = torsion
  const yielding = model.material.Fsy
  return heap === null || yielding === null ? [] : output('T_p', 'T_p', 'Fully plastic torque, for information', heap * yielding, 'torque', model.units === 'SI' ? 'N·m' : 'lbf·in', '§7.5')
}

function secondary({ cases, places, model, torsion }: SolidBarSolution): Output[] {
  const u = shownUnits(model)
  return places.slice(1).flatMap((place, i) => cases.flatMap(c =>
    output(`tau:${i + 2}@${c.model.id}`, `\\tau_{${i + 2}}`, `Shear at ${place.place}, case ${c.model.id}`, place.perTorque * Math.abs(c.torque), 'stress', u.stress, torsion.method, { caseId: c.model.id })))
}

/** Remembered formulas beside the values used; the peak is compared for the heaviest case. */
export function solidBarCompared({ model, torsion, cases }: SolidBarSolution): ComparedValue[] {
  const u = shownUnits(model)
  const heaviest = cases.reduce((high, c) => Math.max(high, Math.abs(c.torque)), 0)
  return torsion.remembered.map(({ of, value, source }) => of === 'J'
    ? { key: 'J', label: 'Torsion constant', used: torsion.J, compared: value, dimension: 'inertia', unit: u.inertia, source }
    : { key: 'tau', label: 'Largest shear stress', used: heaviest / torsion.WT, compared: heaviest * value / torsion.J, dimension: 'stress', unit: u.stress, source })
}
