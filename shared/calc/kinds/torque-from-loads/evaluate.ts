import { noLinks, type Links } from '#shared/calc/links'
import { METHOD_REVISION } from '#shared/calc/method'
import { fired } from '#shared/calc/guards/catalogue'
import { refusedGuards, unusualGuards } from '#shared/calc/guards/inputs'
import { inOrder } from '#shared/calc/guards/order'
import { parseTorqueFromLoads, type LoadedCase, type TorqueFromLoadsModel } from '#shared/calc/kinds/torque-from-loads/parse'
import { torqueFromLoadsSketch } from '#shared/calc/kinds/torque-from-loads/sketch'
import { output } from '#shared/calc/parts/output'
import { lengthShown } from '#shared/calc/parts/say'
import { shownUnits } from '#shared/calc/parts/shown-units'
import { line, num, qty, res, sym } from '#shared/calc/parts/tex'
import type { Evaluation, Guard, Output, ResultTable, WorkingStep } from '#shared/calc/types'
import { torqueAbout } from '#shared/torsion/shear/shear-flow'

export interface SolvedCase { given: LoadedCase, torque: number, Vx: number, Vy: number }

/** Torque and resultant of every case. Never throws. */
export function evaluateTorqueFromLoads(inputs: unknown, links: Links = noLinks): Evaluation {
  const parsed = parseTorqueFromLoads(inputs, links)
  if (!parsed.ok) return { ok: false, faults: parsed.faults }
  const { model } = parsed
  const cases = model.cases.map((given): SolvedCase => ({
    given, torque: torqueAbout(model.centre, given.forces, given.couple.value),
    Vx: given.forces.reduce((sum, one) => sum + one.Vx, 0), Vy: given.forces.reduce((sum, one) => sum + one.Vy, 0),
  }))
  if (cases.some(({ torque }) => !Number.isFinite(torque))) return { ok: false, faults: [{ path: 'cases', message: 'A torque is not a finite number. Check the forces and their points.' }] }
  return {
    ok: true,
    result: {
      kind: 'torque-from-loads', methodRevision: METHOD_REVISION, outputs: outputs(model, cases), walls: [], cases: [], margins: [], governing: null,
      heads: cases.map(({ given: { id, title, source, level, temperature } }) => ({ id, title, source, level, temperature })),
      tables: [table(model, cases)], guards: guards(model, cases), working: working(model, cases), drawing: torqueFromLoadsSketch(model, cases),
    },
  }
}

function outputs(model: TorqueFromLoadsModel, cases: readonly SolvedCase[]): Output[] {
  const u = shownUnits(model)
  const [torque, force] = model.units === 'SI' ? ['N·m', 'N'] as const : ['lbf·in', 'lbf'] as const
  const largest = heaviest(cases)
  return [
    ...output('x_S', 'x_S', 'Reference point, x', model.centre.x, 'length', u.length, '§5.3'), ...output('y_S', 'y_S', 'Reference point, y', model.centre.y, 'length', u.length, '§5.3'),
    ...(largest ? output('T:largest', 'T', `Largest torque of all cases (${largest.given.id})`, largest.torque, 'torque', torque, '§5.3', { primary: true }) : []),
    ...cases.flatMap(({ given: { id }, torque: T, Vx, Vy }) => [
      ...output(`T@${id}`, 'T', `Torque, case ${id}`, T, 'torque', torque, '§5.3', { caseId: id, primary: cases.length <= 4 }),
      ...output(`Vx@${id}`, 'V_x', `Force along x, case ${id}`, Vx, 'force', force, '§5.3', { caseId: id }),
      ...output(`Vy@${id}`, 'V_y', `Force along y, case ${id}`, Vy, 'force', force, '§5.3', { caseId: id }),
    ]),
  ]
}

const heaviest = (cases: readonly SolvedCase[]): SolvedCase | null =>
  cases.reduce<SolvedCase | null>((high, one) => (high === null || Math.abs(one.torque) > Math.abs(high.torque) ? one : high), null)

function table(model: TorqueFromLoadsModel, cases: readonly SolvedCase[]): ResultTable {
  const [torque, force] = model.units === 'SI' ? ['N·m', 'N'] as const : ['lbf·in', 'lbf'] as const
  return {
    key: 'cases', title: 'Torque by case',
    columns: [
      { key: 'case', label: 'Case', dimension: null, unit: '' }, { key: 'title', label: 'Title', dimension: null, unit: '' }, { key: 'level', label: 'Level', dimension: null, unit: '' },
      { key: 'Vx', label: 'Force along x', symbol: 'V_x', dimension: 'force', unit: force }, { key: 'Vy', label: 'Force along y', symbol: 'V_y', dimension: 'force', unit: force }, { key: 'T', label: 'Torque', symbol: 'T', dimension: 'torque', unit: torque },
    ],
    rows: cases.map(({ given, torque: T, Vx, Vy }) => ({ id: given.id, cells: [given.id, given.title, given.level, Vx, Vy, T] })),
  }
}

function guards(model: TorqueFromLoadsModel, cases: readonly SolvedCase[]): Guard[] {
  const found = [...refusedGuards(model.refused), ...unusualGuards(model.unusual)]
  if (model.reference !== 'shear centre') {
    found.push(fired('G-22', { values: { cases: cases.length }, message: `The torque is taken about ${model.reference === 'centroid' ? 'the centroid' : 'another point'} at ${lengthShown(model.units, model.centre.x)}, ${lengthShown(model.units, model.centre.y)} and not about the shear centre.` }))
  }
  return inOrder(found)
}

/** The case with the largest torque, force by force. */
function working(model: TorqueFromLoadsModel, cases: readonly SolvedCase[]): WorkingStep[] {
  const one = heaviest(cases)
  if (!one) return []
  const { x, y } = model.centre
  const terms = one.given.forces.map(({ Vx, Vy, at }) => `${num(Vy)}(${num(at.x)}-${num(x)})-${num(Vx)}(${num(at.y)}-${num(y)})`)
  return [{
    heading: `Torque about the reference point, case ${one.given.id}`, method: '§5.3',
    lines: [
      ...one.given.forces.map(({ point, at }) => line(`${sym('x', point)},\\ ${sym('y', point)}`, '', `${res(at.x, 'mm')},\\ ${res(at.y, 'mm')}`)),
      line('T = T_0 + \\sum\\left[V_y(x_P-x_S)-V_x(y_P-y_S)\\right]', [qty(one.given.couple.value, 'N·mm'), ...terms].join(' + '), res(one.torque, 'N·mm')),
    ],
  }]
}
