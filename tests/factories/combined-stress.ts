/** Points of combined stress as they are stored: invented figures. */
import type { CombinedStressInputs } from '#shared/calc/kinds/combined-stress/schema'
import { blankBar } from '#shared/calc/parts/bar-fields'
import { quantity } from './open-section'
import { materialInputs } from './records'

const MPa = (text: string) => quantity(text, 'MPa')
const point = (id: string, place: string, normal: string[], torsion: string, warping = '0', direct = '0'): CombinedStressInputs['points'][number] => ({
  id, title: '', source: 'EX-L-50', level: 'limit', temperature: null, place, material: 'QM-31', normal: normal.map((sigma, i) => ({ title: `N${i + 1}`, sigma: MPa(sigma) })), torsion: MPa(torsion), warping: MPa(warping), direct: MPa(direct),
})
export const combinedInputs = (): CombinedStressInputs => {
  const { factors, declarations } = blankBar('SI', materialInputs())
  return { units: 'SI', rule: { by: 'circle' }, points: [point('P1', 'Flange tip, station 0', ['80', '-30', '10'], '25', '-4', '6'), point('P2', 'Web, station 600', ['-95'], '40')], materials: [materialInputs()], factors, declarations }
}
export const panelInputs = (): CombinedStressInputs => ({ ...combinedInputs(), rule: { by: 'panel', Fc: MPa('100'), Fs: MPa('80'), loaded: 'compression' }, points: [{ ...point('P1', 'Skin panel', ['-40'], '40'), level: 'ultimate' }] })
export const steadyInputs = (): CombinedStressInputs => ({ ...combinedInputs(), units: 'US', rule: { by: 'steady', steady: 'normal' } })
export const powersInputs = (): CombinedStressInputs => ({ ...combinedInputs(), rule: { by: 'powers', a: quantity('1.5', ''), b: quantity('2', '') } })
