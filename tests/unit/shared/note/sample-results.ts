/**
 * Two calculations with a few results each, as the scan of loose numbers sees them.
 * Only their differences matter to the tests; C1 is the channel of G = 26 200 MPa, J = 3864.2 mm⁴
 * under three torques (θ′ = T/GJ, τ = G t θ′, φ = θ′ L, MS = 186/(1.5 τ) − 1), C2 a clip in inches.
 */
import type { CalcResult, Evaluation, Output } from '#shared/calc/types'
import type { Dimension, UnitId } from '#shared/units/units'
import { toEngine } from '#shared/units/units'
import type { Json } from '../../../factories/note-document'
import { calculation, testId } from '../../../factories/note-document'

export const C1 = testId(101)
export const C2 = testId(102)

type Row = [key: string, symbol: string, label: string, value: number, dimension: Dimension, unit: UnitId, extra?: Partial<Output>]

const output = ([key, symbol, label, value, dimension, unit, extra]: Row): Output =>
  ({ key, symbol, label, value: toEngine(value, unit), dimension, unit, method: '§1.9', ...extra })

const result = (rows: Row[]): CalcResult => ({
  kind: 'open-section', methodRevision: 'A', outputs: rows.map(output), walls: [], cases: [], margins: [], governing: null, guards: [], working: [], drawing: null,
})

function channelCase(id: string, torque: number, rate: number, degrees: number, twist: number, twistDegrees: number, a: number, b: number, ms: number, msTwist: number): Row[] {
  const of = `, case ${id}`
  const extra = { caseId: id }
  return [
    [`T@${id}`, 'T', `Torque${of}`, torque, 'torque', 'N·mm', extra],
    [`theta@${id}`, '\\theta\'', `Rate of twist${of}`, rate, 'rateOfTwist', 'rad/m', extra],
    [`theta_deg@${id}`, '\\theta\'', `Rate of twist${of}`, degrees, 'rateOfTwist', '°/m', extra],
    [`twist@${id}`, '\\varphi', `Twist over the length${of}`, twist, 'angle', 'rad', extra],
    [`twist_deg@${id}`, '\\varphi', `Twist over the length${of}`, twistDegrees, 'angle', '°', extra],
    [`tau:a@${id}`, '\\tau_{\\text{a}}', `Face stress, wall a${of}`, a, 'stress', 'MPa', { ...extra, wall: 'a' }],
    [`tau:b@${id}`, '\\tau_{\\text{b}}', `Face stress, wall b${of}`, b, 'stress', 'MPa', { ...extra, wall: 'b' }],
    [`tau_max@${id}`, '\\tau_{max}', `Largest face stress${of}`, b, 'stress', 'MPa', extra],
    [`MS:shear-ultimate@${id}`, 'MS', `Margin, shear on the flats, ultimate${of}`, ms, 'margin', '', { ...extra, wall: 'b' }],
    [`MS:twist@${id}`, 'MS', `Margin, twist${of}`, msTwist, 'margin', '', extra],
  ]
}

const channel: Row[] = [
  ['J', 'J', 'Torsion constant', 3864.2, 'inertia', 'mm⁴'],
  ['J_plain', 'J_0', 'Torsion constant before end and junction terms', 3907.6, 'inertia', 'mm⁴'],
  ['GJ', 'GJ', 'Torsional stiffness', 101_242_040, 'torsionalStiffness', 'N·mm²'],
  ['Gamma', '\\Gamma', 'Warping constant', 2.7536e6, 'warping', 'mm⁶'],
  ['developed', 'L_d', 'Developed mid-line length', 143.87, 'length', 'mm'],
  ['length', 'L', 'Length of the bar', 420, 'length', 'mm'],
  ['twist_allowed', '\\varphi_{a}', 'Twist allowed', 18, 'angle', '°'],
  ['y_S', 'y_S', 'Shear centre, y', 38.447, 'length', 'mm'],
  ['omega_max', '\\omega_{max}', 'Largest sectorial coordinate', 325.66, 'sectorial', 'mm²'],
  ['kL', 'kL', 'Decay parameter times length', 5.274, 'number', ''],
  ['Kc:2', 'K_{c,\\text{2}}', 'Corner factor, node 2', 1.0829, 'number', ''],
  ['t:a', 't_{\\text{a}}', 'Thickness, wall a', 3.2, 'length', 'mm', { wall: 'a' }],
  ['t:b', 't_{\\text{b}}', 'Thickness, wall b', 4, 'length', 'mm', { wall: 'b' }],
  ['G:QM-107', 'G', 'Shear modulus, QM-107', 26.2, 'stress', 'GPa'],
  ['Fsu:QM-107', 'F_{su}', 'Ultimate shear strength, QM-107', 186, 'stress', 'MPa'],
  ['f_FS', 'f_{FS}', 'Factor of safety', 1.5, 'number', ''],
  ...channelCase('L04', 48_200, 0.476087, 27.2778, 0.199957, 11.4567, 39.915, 49.894, 1.48527, 0.571133),
  ...channelCase('L07', 63_450, 0.626716, 35.9082, 0.263221, 15.0814, 52.5439, 65.6798, 0.887947, 0.193523),
  ...channelCase('L09', 27_940, 0.275971, 15.812, 0.115908, 6.64103, 23.1374, 28.9217, 3.28743, 1.71043),
]

const clip: Row[] = [
  ['J', 'J', 'Torsion constant', 0.012873, 'inertia', 'in⁴'],
  ['length', 'L', 'Length of the bar', 2.4, 'length', 'in'],
  ['Fsu:QM-103', 'F_{su}', 'Ultimate shear strength, QM-103', 44.8, 'stress', 'ksi'],
  ['T@B02', 'T', 'Torque, case B02', 412.6, 'torque', 'lbf·in', { caseId: 'B02' }],
  ['theta@B02', '\\theta\'', 'Rate of twist, case B02', 0.4709, 'rateOfTwist', '°/in', { caseId: 'B02' }],
  ['tau_max@B02', '\\tau_{max}', 'Largest face stress, case B02', 7.967, 'stress', 'ksi', { caseId: 'B02' }],
  ['MS:shear-ultimate@B02', 'MS', 'Margin, shear on the flats, ultimate, case B02', 2.74879, 'margin', '', { caseId: 'B02' }],
]

export const RESULTS: Record<string, Evaluation> = { [C1]: { ok: true, result: result(channel) }, [C2]: { ok: true, result: result(clip) } }

/** The two calculations, to stand in a section of the note. */
export const calculations = (): Json[] => [calculation('Seal carrier, channel', { id: C1 }), calculation('Hinge clip, angle', { id: C2 })]
