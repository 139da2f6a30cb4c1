/** Calculations of QSN-19-0031: the hat, the twist it is given, the stresses together, and the outline as a second method. */
import type { CombinedStressInputs } from '#shared/calc/kinds/combined-stress/schema'
import type { GeneralOutlineInputs } from '#shared/calc/kinds/general-outline/schema'
import type { ImposedTwistInputs } from '#shared/calc/kinds/imposed-twist/schema'
import type { OpenSectionInputs } from '#shared/calc/kinds/open-section/schema'
import { bar, casesOf, corners, declared, factorsOf, fromRecord, linked, polyline, typed, type Corner } from '../../inputs'
import { cellOf, headsOf, loadRecord, ofCase, SKIN } from '../../load-tables'
import { QM_101 } from '../../materials'
import { thickened } from '../../thickened'

const MID_LINE: Corner[] = [['-35', '0'], ['-20', '0'], ['-14', '30'], ['14', '30'], ['20', '0'], ['35', '0']]

/** What differs between the two issues. Offset, fibre and area are those of the mid-line. */
export interface Sheet {
  letter: 'A' | 'B', drawing: string, t: string, radius: string, outer: string
  /** From the shear centre to the crown, and from the centroid to the outer face of the crown. */
  offset: string, fibre: string
  /** Area, and the largest sectorial coordinate. */
  area: string, omega: string
}

export const SHEETS: Record<'A' | 'B', Sheet> = {
  A: { letter: 'A', drawing: 'C', t: '1.2', radius: '3.0', outer: '4.2', offset: '8.4889', fibre: '15.860', area: '138.426', omega: '327.113' },
  B: { letter: 'B', drawing: 'D', t: '1.6', radius: '3.2', outer: '4.8', offset: '8.4475', fibre: '16.061', area: '183.886', omega: '325.663' },
}

const criteria = factorsOf('QW19-SC-002 issue 2: 1.5 on limit loads, imposed displacements factored like loads; no special factor pertains.')

export const hat = ({ t, radius }: Sheet): OpenSectionInputs => ({
  units: 'SI',
  ...polyline({
    corners: MID_LINE,
    names: ['brim, inboard', 'web, inboard', 'crown', 'web, outboard', 'brim, outboard'], t, material: 'QM-101', unit: 'mm',
  }),
  junctions: corners(['2', '3', '4', '5'], radius, 'bent', 'mm'), ends: 'free',
  ...bar(QM_101, casesOf('SKIN', 'rate'), criteria), declarations: { ...declared(), builtIn: false },
})

/** The twist of the flap on the section of `hat`, riveted along the crown. */
export const following = ({ t, offset, fibre }: Sheet): ImposedTwistInputs => ({
  units: 'SI', section: { by: 'open', J: linked('hat', 'J', 'mm⁴'), t: typed(t, 'mm'), K: linked('hat', 'Kc:2', '') }, material: 'QM-101',
  Gamma: linked('hat', 'Gamma', 'mm⁶'), omega: linked('hat', 'omega_max', 'mm²'), offset: typed(offset, 'mm'), fibre: typed(fibre, 'mm'),
  structure: typed('9100', 'N·m²'), materials: [fromRecord(QM_101)],
  cases: headsOf(SKIN).map(head => ({ ...head, rate: ofCase('SKIN', 'rate', head.id, '°/m'), gradient: ofCase('SKIN', 'gradient', head.id, '°/m²') })),
  factors: criteria, declarations: declared(),
})

/**
 * Normal stresses as magnitudes, typed to six figures: axial force over area, and E times the change of the rate of
 * twist times the sectorial coordinate, or times offset and fibre. Degrees per square metre become radians per square millimetre.
 */
function magnitudes(id: string, { area, offset, fibre, omega }: Sheet) {
  const curvature = 72400 * Math.abs(Number(cellOf(SKIN, id, 'gradient'))) * Math.PI / 180e6
  const mpa = (value: number) => typed(value.toPrecision(6), 'MPa')
  return { axial: mpa(Number(cellOf(SKIN, id, 'axial')) / Number(area)), warping: mpa(curvature * Number(omega)), bending: mpa(curvature * Number(offset) * Number(fibre)) }
}

export const together = (sheet: Sheet): CombinedStressInputs => ({
  units: 'SI', rule: { by: 'circle' },
  points: headsOf(SKIN).map(head => ({
    ...head, place: 'worst fibre, magnitudes added', material: 'QM-101',
    normal: [
      { title: 'axial force over area', sigma: magnitudes(head.id, sheet).axial },
      { title: 'warping', sigma: magnitudes(head.id, sheet).warping },
      { title: 'bending of the offset', sigma: magnitudes(head.id, sheet).bending },
    ],
    torsion: linked('following', `tau@${head.id}`, 'MPa'), warping: typed('0', 'MPa'), direct: typed('0', 'MPa'),
  })),
  materials: [fromRecord(QM_101)], factors: criteria, declarations: declared(),
})

export const outline = (sheet: Sheet): GeneralOutlineInputs => ({
  units: 'SI', outer: thickened({ corners: MID_LINE, t: Number(sheet.t), inside: sheet.radius, outside: sheet.outer }), holes: [], ends: 'free',
  first: { by: 'given', method: 'open, corrected', J: linked('hat', 'J', 'mm⁴'), W: null, Gamma: linked('hat', 'Gamma', 'mm⁶'), chi: '', source: `thin walls with end correction, sheet ${sheet.t} mm` },
  ...bar(QM_101, casesOf('SKIN', 'rate'), criteria), declarations: { ...declared(), builtIn: false },
})

export const skin = loadRecord(SKIN)
