/** Inputs of bars with restrained warping, made up for tests: a channel bracket, a bracket that twists between two ends, a tee post, a hat in inches. */
import type { RestrainedWarpingInputs } from '#shared/calc/kinds/restrained-warping/schema'
import { polyline, quantity, sheet2024, sheet6061 } from './open-section'

type Support = RestrainedWarpingInputs['supports'][number]
type Case = RestrainedWarpingInputs['cases'][number]
const mm = (text: string) => quantity(text, 'mm') as { text: string, unit: 'mm' }
const inch = (text: string) => quantity(text, 'in') as { text: string, unit: 'in' }

const plain = (): Pick<RestrainedWarpingInputs, 'junctions' | 'twistAllowed' | 'twistOrigin' | 'factors' | 'declarations'> => ({
  junctions: [], twistAllowed: null, twistOrigin: '',
  factors: { ultimate: '1.5', fitting: '', casting: '', bearing: '', onLimit: true, divideUltimate: false, partial: false, reason: '' },
  declarations: { fitting: false, repeated: false, cutOut: 'none', taper: null, layered: false, welded: false, builtIn: false, heldAlong: false },
})
export const builtInAt = (z: Support['z']): Support => ({ z, twist: 'held', twistStiffness: null, warping: 'held', warpingStiffness: null })
export const forkAt = (z: Support['z']): Support => ({ ...builtInAt(z), warping: 'free' })
export const caseOf = (id: string, more: Partial<Case> = {}): Case => ({ id, title: `Case ${id}`, source: 'made up for tests', level: 'limit', temperature: null, torques: [], distributed: [], eccentric: [], axial: null, ...more })
export const torqueAt = (z: Support['z'], T: string): Case['torques'][number] => ({ z, T: { text: T, unit: 'N·m' } })

/** The channel C-38 of the reference rows with its moduli: flanges 40 × 4, web 100 × 3, E 71 000, G 26 900 MPa; bends too small to matter are left out. */
export function channelBarInputs(more: Partial<RestrainedWarpingInputs> = {}): RestrainedWarpingInputs {
  return {
    units: 'SI', ...polyline([['40', '100'], ['0', '100'], ['0', '0'], ['40', '0']], ['upper flange', 'web', 'lower flange'], ['4', '3', '4'], 'QM-107'),
    materials: [{ ...sheet6061(), E: quantity('71', 'GPa') as never, G: quantity('26.9', 'GPa') as never }], ...plain(),
    length: mm('1200'), supports: [builtInAt(mm('0'))], cases: [caseOf('W1', { torques: [torqueAt(mm('1200'), '10')] })],
    twistAllowed: { text: '8', unit: '°' }, twistOrigin: 'made-up requirement', ...more,
  }
}

/** A bent hat between a built-in end and a fork, torques at two stations, one growing, an eccentric pull and compression. */
export function hatBarInputs(): RestrainedWarpingInputs {
  return {
    units: 'SI',
    ...polyline([['-35', '0'], ['-20', '0'], ['-14', '30'], ['14', '30'], ['20', '0'], ['35', '0']], ['left brim', 'left web', 'crown', 'right web', 'right brim'], '1.6', 'QM-101'),
    materials: [sheet2024()], ...plain(), junctions: ['2', '3', '4', '5'].map(node => ({ node, radius: mm('3.2'), make: 'bent' as const })),
    length: mm('760'), supports: [builtInAt(mm('0')), { ...forkAt(mm('760')), warping: 'spring', warpingStiffness: { text: '4', unit: 'N·m³/rad' } }],
    cases: [
      caseOf('H1', { torques: [torqueAt(mm('240'), '6.5'), torqueAt(mm('520'), '-2')], temperature: quantity('23', '°C') as never }),
      caseOf('H2', { distributed: [{ from: mm('200'), to: mm('600'), m1: { text: '4', unit: 'N·mm/mm' }, m2: { text: '11', unit: 'N·mm/mm' } }], temperature: quantity('71', '°C') as never }),
      caseOf('H3', { torques: [torqueAt(mm('240'), '4')], eccentric: [{ z: mm('520'), node: '1', P: { text: '300', unit: 'N' } }], axial: { text: '-900', unit: 'N' }, level: 'ultimate' }),
    ],
    twistAllowed: { text: '2.5', unit: '°' }, twistOrigin: 'made-up requirement',
  }
}

/** A tee in inches, welded end plates at both ends that turn together with what they are bolted to. */
export function teeBarInputs(): RestrainedWarpingInputs {
  const { start, walls } = polyline([['-1', '2'], ['0', '2'], ['1', '2']], ['flange, left', 'flange, right'], '0.125', 'QM-101', 'in')
  return {
    units: 'US', start, walls: [...walls, { id: 'c', name: 'stem', from: '2', to: '4', end: { by: 'point', x: inch('0'), y: inch('0') }, t: inch('0.125'), material: 'QM-101' }],
    materials: [sheet2024()], ...plain(), length: inch('18'), supports: [builtInAt(inch('0')), { ...builtInAt(inch('18')), twist: 'spring', twistStiffness: { text: '4000', unit: 'lbf·in/rad' } }],
    cases: [caseOf('P1', { torques: [{ z: inch('7'), T: { text: '180', unit: 'lbf·in' } }], level: 'ultimate' }), caseOf('P2', { torques: [{ z: inch('12'), T: { text: '-140', unit: 'lbf·in' } }] })],
    factors: { ...plain().factors, divideUltimate: true },
  }
}
