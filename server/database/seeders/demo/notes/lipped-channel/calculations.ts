/** Calculations of QSN-19-0071: the carrier as drawn, its twist between clips, held warping, the next sheet, and the outline. */
import type { GeneralOutlineInputs } from '#shared/calc/kinds/general-outline/schema'
import type { OpenSectionInputs } from '#shared/calc/kinds/open-section/schema'
import type { RestrainedWarpingInputs } from '#shared/calc/kinds/restrained-warping/schema'
import type { TorqueAlongBarInputs } from '#shared/calc/kinds/torque-along-bar/schema'
import { bar, casesOf, corners, declared, factorsOf, fromRecord, linked, polyline, typed, type Corner } from '../../inputs'
import { headsOf, loadRecord, ofCase, SILL } from '../../load-tables'
import { QM_107 } from '../../materials'
import { thickened } from '../../thickened'

const MID_LINE: Corner[] = [['40', '-24'], ['40', '-40'], ['0', '-40'], ['0', '40'], ['40', '40'], ['40', '24']]
const LIMIT = { twistAllowed: typed('1.50', '°'), twistOrigin: 'QW19-SYS-044 issue 2, paragraph 5: alignment of the seal between clips' }
const criteria = factorsOf('QW19-SC-002 issue 2: 1.5 on limit loads; no special factor pertains.')

const walls = (t: string) => ({
  ...polyline({ corners: MID_LINE, names: ['lower lip', 'lower flange', 'web', 'upper flange', 'upper lip'], t, material: 'QM-107', unit: 'mm' }),
  junctions: corners(['2', '3', '4', '5'], '5.0', 'bent', 'mm'),
})

/** The section as drawn. */
export const carrier: OpenSectionInputs = { units: 'SI', ...walls('2.5'), ends: 'free', ...bar(QM_107, casesOf('SILL', 'T'), criteria), declarations: { ...declared(), builtIn: true } }

/** The section in other sheet, twisted over the distance of the clips. */
export const trial = (t: string): OpenSectionInputs => ({
  units: 'SI', ...walls(t), ends: 'free', ...bar(QM_107, casesOf('SILL', 'T'), criteria, { length: typed('410', 'mm'), ...LIMIT }), declarations: { ...declared(), builtIn: true },
})

/** One bar from clip to clip, torque at one end. The modulus is the torsion constant over thickness and bend factor. */
export const betweenClips: TorqueAlongBarInputs = {
  units: 'SI', segments: [{ id: 'a', title: 'clip to clip', length: typed('410', 'mm'), material: 'QM-107', section: { by: 'constants', J: linked('carrier', 'J', 'mm⁴'), WT: typed('345.711', 'mm³') } }],
  supports: [{ node: '0', stiffness: null, clearance: null }], materials: [fromRecord(QM_107)],
  cases: headsOf(SILL).map(head => ({ ...head, torques: [{ node: '1', T: ofCase('SILL', 'T', head.id, 'lbf·in') }], distributed: [] })),
  ...LIMIT, factors: criteria, declarations: declared(),
}

/** The decisive case with one clip or both holding the warping as well. */
export const heldWarping = (far: 'held' | 'free'): RestrainedWarpingInputs => ({
  units: 'SI', ...walls('2.5'), materials: [fromRecord(QM_107)], length: typed('410', 'mm'),
  supports: [
    { z: typed('0', 'mm'), twist: 'held', twistStiffness: null, warping: 'held', warpingStiffness: null },
    ...(far === 'held' ? [{ z: typed('410', 'mm'), twist: 'free' as const, twistStiffness: null, warping: 'held' as const, warpingStiffness: null }] : []),
  ],
  cases: headsOf(SILL).filter(({ id }) => id === 'L04').map(head => ({ ...head, torques: [{ z: typed('410', 'mm'), T: ofCase('SILL', 'T', head.id, 'lbf·in') }], distributed: [], eccentric: [], axial: null })),
  twistAllowed: null, twistOrigin: '', factors: criteria, declarations: { ...declared(), builtIn: true, heldAlong: false },
})

export const outline: GeneralOutlineInputs = {
  units: 'SI', outer: thickened({ corners: MID_LINE, t: 2.5, inside: '5.0', outside: '7.5' }), holes: [], ends: 'free',
  first: { by: 'given', method: 'open, corrected', J: linked('carrier', 'J', 'mm⁴'), W: null, Gamma: linked('carrier', 'Gamma', 'mm⁶'), chi: '', source: 'thin walls with end correction, sheet 2.5 mm' },
  ...bar(QM_107, casesOf('SILL', 'T'), criteria), declarations: { ...declared(), builtIn: false },
}

export const seal = loadRecord(SILL)
