import { jointForces } from '#shared/calc/kinds/closed-section/guards'
import type { ClosedSectionSolution } from '#shared/calc/kinds/closed-section/solve'
import type { BarCase } from '#shared/calc/parts/bar-cases'
import { barOutputs, decisiveCases } from '#shared/calc/parts/bar-outputs'
import { output } from '#shared/calc/parts/output'
import { MOST_VALUES } from '#shared/calc/parts/place-values'
import { shownUnits, type ShownUnits } from '#shared/calc/parts/shown-units'
import type { Output } from '#shared/calc/types'

export const flowUnit = (units: 'SI' | 'US') => (units === 'SI' ? 'N/mm' as const : 'lbf/in' as const)

export function closedSectionOutputs(s: ClosedSectionSolution): Output[] {
  const { model, torsion } = s
  const u = shownUnits(model)
  const cells = torsion.cells.flatMap((cell, i) => [
    ...output(`A:${i + 1}`, `A_{${i + 1}}`, `Area of cell ${i + 1}`, cell.area, 'area', u.area, '§2.1', { primary: torsion.cells.length === 1 }),
    ...output(`share:${i + 1}`, `T_{${i + 1}}/T`, `Torque share of cell ${i + 1}`, cell.share, 'ratio', '', '§2.2'),
  ])
  return [
    ...output('J', 'J', s.oneModulus ? 'Torsion constant' : 'Stiffness over the largest shear modulus of the cells', torsion.J, 'inertia', u.inertia, '§2.2', { primary: true }),
    ...output('GJ', 'GJ', 'Torsional stiffness', s.GJ, 'torsionalStiffness', u.stiffness, '§2.2', { primary: !s.oneModulus }),
    ...output('G_ref', 'G_{ref}', 'Shear modulus that flows are referred to', torsion.Gref, 'stress', model.walls[0]?.material.units.G ?? 'MPa', '§2.2'),
    ...cells,
    ...output('chi_max', '\\chi_{max}', `Variation across wall ${s.chi?.wall ?? ''} over its mean stress`, s.chi?.chi, 'ratio', '', '§2.1', { primary: true, ...(s.chi ? { wall: s.chi.wall } : {}) }),
    ...s.corners.flatMap(({ node, factor }) => output(`K:${node}`, 'K', `Corner factor, node ${node}`, factor.ok ? factor.K : null, 'number', '', '§2.3')),
    ...jointForces(s).flatMap(joint => output(`F_joint:${joint.wall}`, 'F', `Force of a fastener in wall ${joint.wall} at ultimate, case ${joint.caseId}`, joint.force, 'force', model.units === 'SI' ? 'N' : 'lbf', '§2.1', { wall: joint.wall, caseId: joint.caseId })),
    ...barOutputs({ ...s, bar: model.bar, method: '§2.1' }, u),
    ...detailed(s).flatMap(c => [...flowOutputs(s, c), ...stressOutputs(s, c, u)]),
  ]
}

/** Values by wall for every case, or where these are too many for the cases that decide. */
function detailed({ cases, margins, governing, places, cornerPlaces }: ClosedSectionSolution): BarCase[] {
  return cases.length * (places.length + cornerPlaces.length) > MOST_VALUES ? decisiveCases(cases, margins, governing) : [...cases]
}

function flowOutputs({ model, torsion, GJ }: ClosedSectionSolution, c: BarCase): Output[] {
  const unit = flowUnit(model.units)
  const flow = torsion.Gref * c.torque / GJ
  const caseId = c.model.id
  return [
    ...torsion.cells.flatMap((cell, i) => output(`q:cell-${i + 1}@${caseId}`, `q_{${i + 1}}`, `Shear flow of cell ${i + 1}, case ${caseId}`, cell.flow * flow, 'shearFlow', unit, '§2.2', { caseId })),
    ...torsion.walls.flatMap((wall, i) => wall.fin ? [] : output(`q:${wall.id}@${caseId}`, `q_{\\text{${wall.id.replaceAll('_', '\\_')}}}`, `Shear flow in wall ${wall.id} from ${model.walls[i]?.from ?? ''} to ${model.walls[i]?.to ?? ''}, case ${caseId}`, wall.flow * flow, 'shearFlow', unit, '§2.4', { caseId, wall: wall.id })),
  ]
}

function stressOutputs({ places, cornerPlaces }: ClosedSectionSolution, c: BarCase, u: ShownUnits): Output[] {
  const caseId = c.model.id
  const at = (place: (typeof places)[number], key: string, what: string, method: string) =>
    output(`${key}:${place.where}@${caseId}`, '\\tau', `Shear at ${what}${place.place}, case ${caseId}`, place.perTorque * Math.abs(c.torque), 'stress', u.stress, method, { caseId, ...(place.wall === undefined ? {} : { wall: place.wall }) })
  return [...places.flatMap(place => at(place, 'tau', 'the face of ', '§2.1')), ...cornerPlaces.flatMap(place => at(place, 'tau_corner', '', '§2.3'))]
}
