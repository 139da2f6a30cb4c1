/** Solid bars as they are stored: invented parts. */
import type { SolidBarInputs, ShapeInput } from '#shared/calc/kinds/solid-bar/schema'
import { blankBar } from '#shared/calc/parts/bar-fields'
import { quantity } from './open-section'
import { materialInputs } from './records'

const mm = (text: string) => quantity(text, 'mm')

export const solidBarInputs = (shape: ShapeInput = { by: 'circle', radius: mm('18') }): SolidBarInputs => {
  const material = materialInputs()
  return {
    units: 'SI', shape, material: material.id, ...blankBar('SI', material),
    loading: { by: 'torque', torque: quantity('400', 'N·m'), level: 'limit', temperature: null, source: 'EX-L-2 page 9' },
    length: mm('300'), twistAllowed: quantity('5', '°'), twistOrigin: 'EX-R-1',
  }
}
/** A D-shaft with three cases, one reversed and one hot. */
export const flatShaftInputs = (): SolidBarInputs => ({
  ...solidBarInputs({ by: 'segment', radius: mm('12'), depth: mm('2.4') }),
  materials: [{ ...materialInputs(), temperatureFrom: quantity('-55', '°C'), temperatureTo: quantity('150', '°C'), knockdown: [{ temperature: quantity('20', '°C'), factor: '1' }, { temperature: quantity('150', '°C'), factor: '0.8' }], knockdownSource: 'EX-M-3' }],
  loading: {
    by: 'cases', cases: [
      { id: 'L01', title: 'Drive', source: 'EX-L-2', level: 'limit', temperature: null, torque: quantity('80', 'N·m') },
      { id: 'L02', title: 'Reverse', source: 'EX-L-2', level: 'limit', temperature: null, torque: quantity('-65', 'N·m') },
      { id: 'L03', title: 'Hot', source: 'EX-L-2', level: 'ultimate', temperature: quantity('100', '°C'), torque: quantity('95', 'N·m') },
    ],
  },
})
export const inchBarInputs = (): SolidBarInputs => ({
  ...solidBarInputs({ by: 'rectangle', width: quantity('2', 'in'), height: quantity('3/4', 'in') }), units: 'US',
  loading: { by: 'torque', torque: quantity('3500', 'lbf·in'), level: 'limit', temperature: null, source: 'EX-L-9' },
  length: quantity('10', 'in'), declarations: { ...solidBarInputs().declarations, fitting: true, repeated: true, taper: quantity('11', '°') },
  factors: { ...solidBarInputs().factors, fitting: '1.15', casting: '1.25', reason: 'EX-B-1 paragraph 4' },
})
export const solidBarShapes = (): Record<string, SolidBarInputs> => Object.fromEntries(([
  { by: 'circle', radius: mm('18') }, { by: 'tube', outer: mm('25'), inner: mm('20') }, { by: 'ellipse', major: mm('30'), minor: mm('18') },
  { by: 'hollow-ellipse', major: mm('18'), minor: mm('30'), ratio: '0.6' }, { by: 'rectangle', width: mm('20'), height: mm('50') }, { by: 'equilateral', side: mm('40') }, { by: 'isosceles', leg: mm('30') },
  { by: 'sector', radius: mm('20'), angle: quantity('90', '°') }, { by: 'sector', radius: mm('20'), angle: quantity('270', '°') }, { by: 'semicircle', radius: mm('20') }, { by: 'polygon', sides: 'hexagon', flats: mm('24') },
] satisfies ShapeInput[]).map((shape, i) => [`${shape.by} ${i}`, solidBarInputs(shape)]))
