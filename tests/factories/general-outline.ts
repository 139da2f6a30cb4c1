/** Inputs of general outlines for tests, made up by us: a thick machined angle, a sharp bracket, a keyed shaft in inches, a lug with a bore. */
import type { GeneralOutlineInputs } from '#shared/calc/kinds/general-outline/schema'
import type { UnitId } from '#shared/units/units'
import { quantity, sheet2024, sheet6061 } from './open-section'

type Vertex = Extract<GeneralOutlineInputs['outer'], { by: 'vertices' }>['vertices'][number]

/** `radius` rounds the corner; `sweep` (degrees) makes the edge from here an arc. */
export const corner = (x: string, y: string, { radius, sweep, name = '', unit = 'mm' }: { radius?: string, sweep?: string, name?: string, unit?: 'mm' | 'in' } = {}): Vertex => ({
  x: quantity(x, unit), y: quantity(y, unit), radius: radius === undefined ? null : quantity(radius, unit), sweep: sweep === undefined ? null : quantity(sweep, '°'), name,
})
const loop = (...vertices: Vertex[]): GeneralOutlineInputs['outer'] => ({ by: 'vertices', vertices })

const plain = (): Omit<GeneralOutlineInputs, 'units' | 'outer' | 'holes' | 'materials' | 'loading'> => ({
  length: null, twistAllowed: null, twistOrigin: '',
  factors: { ultimate: '1.5', fitting: '', casting: '', bearing: '', onLimit: true, divideUltimate: false, partial: false, reason: '' },
  ends: 'free', first: { by: 'none' },
  declarations: { fitting: false, repeated: false, cutOut: 'none', taper: null, layered: false, welded: false, builtIn: false },
})

const given = (method: Extract<GeneralOutlineInputs['first'], { by: 'given' }>['method'], values: { J?: string, W?: string, Gamma?: string }, chi = ''): GeneralOutlineInputs['first'] => {
  const of = (text: string | undefined, unit: UnitId) => (text === undefined ? null : quantity(text, unit) as never)
  return { by: 'given', method, J: of(values.J, 'mm⁴'), W: of(values.W, 'mm³'), Gamma: of(values.Gamma, 'mm⁶'), chi, source: 'calculation above' }
}
export const firstMethod = given

/** Legs 60 × 60 × 15, fillet 6: the thick angle of the requirement, under 300 N·m. The first value is that of the junction formula. */
export function thickAngleInputs(): GeneralOutlineInputs {
  return {
    ...plain(), units: 'SI', holes: [], materials: [sheet6061()],
    outer: loop(corner('0', '0', { name: 'back' }), corner('60', '0'), corner('60', '15', { name: 'upper face' }), corner('15', '15', { radius: '6' }), corner('15', '60'), corner('0', '60')),
    loading: { by: 'torque', torque: quantity('300', 'N·m'), level: 'limit', temperature: quantity('23', '°C'), source: 'test load' },
    length: quantity('400', 'mm'), twistAllowed: quantity('6', '°'), twistOrigin: 'drawing note',
    first: given('open, corrected', { J: '116500' }),
  }
}

/** A sharp-cornered bracket under three cases; the peak is unbounded. */
export function sharpBracketInputs(): GeneralOutlineInputs {
  const row = (id: string, torque: string, level: 'limit' | 'ultimate', temperature: string) => ({ id, title: `Case ${id}`, source: 'load note', level, torque: quantity(torque, 'N·m'), temperature: quantity(temperature, '°C') })
  return {
    ...plain(), units: 'SI', holes: [], materials: [sheet2024()],
    outer: loop(corner('0', '0'), corner('40', '0'), corner('40', '8'), corner('8', '8'), corner('8', '30'), corner('0', '30')),
    loading: { by: 'cases', cases: [row('B01', '30', 'limit', '23'), row('B02', '-45', 'ultimate', '71'), row('B03', '12', 'limit', '-40')] },
    length: quantity('250', 'mm'),
  }
}

/** A shaft of 2 in with a keyway whose corners are rounded, in US customary units. */
export function keyedShaftInputs(): GeneralOutlineInputs {
  const inches = { unit: 'in' as const }
  return {
    ...plain(), units: 'US', holes: [], materials: [sheet2024()],
    outer: loop(
      corner('0.25', '0.968245836552', { name: 'shaft', sweep: '-331.0449757', ...inches }), corner('-0.25', '0.968245836552', inches),
      corner('-0.25', '0.7', { radius: '0.06', name: 'bottom of the keyway', ...inches }), corner('0.25', '0.7', { radius: '0.06', ...inches }),
    ),
    loading: { by: 'torque', torque: quantity('9', 'kip·in'), level: 'limit', temperature: quantity('73', '°F'), source: 'drive note' },
    length: quantity('20', 'in'), ends: 'restrained',
  }
}

/** A plate with two bores, following the structure at an imposed rate of twist. */
export function boredPlateInputs(): GeneralOutlineInputs {
  const bore = (id: string, x: string) => ({ id, shape: { by: 'circle' as const, x: quantity(x, 'mm'), y: quantity('15', 'mm'), radius: quantity('8', 'mm') } })
  return {
    ...plain(), units: 'SI', holes: [bore('A', '20'), bore('B', '60')], materials: [sheet6061()],
    outer: loop(corner('0', '0', { radius: '4' }), corner('80', '0', { radius: '4' }), corner('80', '30', { radius: '4' }), corner('0', '30', { radius: '4' })),
    loading: { by: 'rate', cases: [{ id: 'R1', title: 'Wing twist', source: 'load note', level: 'limit', rate: quantity('1.5', '°/m'), temperature: null }] },
    first: given('closed', { J: '160000' }, '0.3'),
  }
}
