/**
 * Calculations of QSN-19-0067: the machined angle as an outline and by walls, the torque of the pad about the
 * shear centre, and torsion, direct shear and bending together at the fillet and at the toe.
 */
import type { CombinedStressInputs } from '#shared/calc/kinds/combined-stress/schema'
import type { GeneralOutlineInputs } from '#shared/calc/kinds/general-outline/schema'
import type { OpenSectionInputs } from '#shared/calc/kinds/open-section/schema'
import type { TorqueFromLoadsInputs } from '#shared/calc/kinds/torque-from-loads/schema'
import type { LoadingInput } from '#shared/calc/parts/loading-fields'
import { bar, casesOf, corners, declared, factorsOf, fromRecord, linked, polyline, typed } from '../../inputs'
import { BRACKET, cellOf, headsOf, loadRecord, ofCase } from '../../load-tables'
import { QM_103 } from '../../materials'

const fitting = factorsOf('QW19-SC-002 issue 2: 1.5 on limit loads; fitting factor 1.15 on ultimate and on limit (paragraph 5.3).', { fitting: '1.15', onLimit: true })
const machined = { ...declared({ fitting: true, repeated: true }), builtIn: true }
const PAD = { length: typed('2.40', 'in'), twistAllowed: typed('3.0', '°'), twistOrigin: 'drawing QW19-5231-07, note 9: alignment of the actuator' }

const vertex = (x: string, y: string, radius?: string) => ({ x: typed(x, 'in'), y: typed(y, 'in'), radius: radius === undefined ? null : typed(radius, 'in'), sweep: null, name: '' })

const outline = (loading: LoadingInput, first: GeneralOutlineInputs['first'], more: object, declarations: GeneralOutlineInputs['declarations']): GeneralOutlineInputs => ({
  units: 'US', holes: [], ends: 'free', first,
  outer: { by: 'vertices', vertices: [vertex('0', '0'), vertex('2.00', '0'), vertex('2.00', '0.250'), vertex('0.250', '0.250', '0.190'), vertex('0.250', '1.55'), vertex('0', '1.55')] },
  ...bar(QM_103, loading, fitting, more), declarations,
})

/** The section alone: its shear centre is what the torque is taken about. */
export const section = outline(
  { by: 'torque', torque: typed('1', 'lbf·in'), level: 'limit', temperature: null, source: 'unit torque' }, { by: 'none' }, {}, { ...declared({ fitting: true }), builtIn: false })

/** The nine cases on the same outline. */
export const torsion = outline(
  casesOf('pad', 'T'), { by: 'given', method: 'open, corrected', J: linked('walls', 'J', 'in⁴'), W: null, Gamma: null, chi: '', source: 'walls with the corrections of the junction and the ends' }, PAD, machined)

export const walls: OpenSectionInputs = {
  units: 'US', ...polyline({ corners: [['1.875', '0'], ['0', '0'], ['0', '1.425']], names: ['long leg', 'short leg'], t: '0.250', material: 'QM-103', unit: 'in' }),
  junctions: corners(['2'], '0.190', 'machined', 'in'), ends: 'free', ...bar(QM_103, casesOf('pad', 'T'), fitting), declarations: { ...declared({ fitting: true, repeated: true }), builtIn: false },
}

/** Force at the pad, `x` from the outer corner. */
export const pad = (x: string): TorqueFromLoadsInputs => ({
  units: 'US', reference: { is: 'shear centre', x: linked('section', 'x_S', 'in'), y: linked('section', 'y_S', 'in') },
  points: [{ id: 'pad', title: 'centre of the actuator pad', x: typed(x, 'in'), y: typed('0.125', 'in') }],
  cases: headsOf(BRACKET).map(head => ({
    ...head, couple: typed('0', 'lbf·in'), forces: [{ point: 'pad', Vx: ofCase('BRACKET', 'Vx', head.id, 'lbf'), Vy: ofCase('BRACKET', 'Vy', head.id, 'lbf') }],
  })),
})

/** Stress per unit force along x and y, psi/lbf: flexural flow of the thin walls at the corner over the thickness, and bending of 2.40 in about the axes of the outline. */
const PER_FORCE = { direct: [1.38182, -2.39234], fillet: [-4.99150, -5.75964], toe: [2.72708, 18.3029] } as const

/** Typed in ksi to six figures, as magnitude: signs follow the force, and all cases load one way and back. */
function ofForce(id: string, [perX, perY]: readonly [number, number]) {
  const psi = Math.abs(perX * Number(cellOf(BRACKET, id, 'Vx')) + perY * Number(cellOf(BRACKET, id, 'Vy')))
  return typed((psi / 1000).toPrecision(6), 'ksi')
}

const none = typed('0', 'ksi')

export const together: CombinedStressInputs = {
  units: 'US', rule: { by: 'circle' },
  points: headsOf(BRACKET).flatMap(head => [
    {
      ...head, place: 'middle of the fillet, at the clamp line', material: 'QM-103', normal: [{ title: 'bending, arm of the pad', sigma: ofForce(head.id, PER_FORCE.fillet) }],
      torsion: linked('torsion', `tau_max@${head.id}`, 'ksi'), warping: none, direct: ofForce(head.id, PER_FORCE.direct),
    },
    {
      ...head, id: `${head.id}-toe`, place: 'toe of the short leg, at the clamp line', material: 'QM-103', normal: [{ title: 'bending, arm of the pad', sigma: ofForce(head.id, PER_FORCE.toe) }],
      torsion: linked('walls', `tau_max@${head.id}`, 'ksi'), warping: none, direct: none,
    },
  ]),
  materials: [fromRecord(QM_103)], factors: fitting, declarations: declared({ fitting: true, repeated: true }),
}

export const forces = loadRecord(BRACKET)
