import type { OpenSectionInputs } from '#shared/calc/kinds/open-section/schema'

/** A fresh open section: one wall, one material, one torque, fields empty, units as chosen. */
export function blankOpenSection(units: 'SI' | 'US' = 'SI'): OpenSectionInputs {
  const length = { text: '', unit: units === 'SI' ? 'mm' as const : 'in' as const }
  const stress = { text: '', unit: units === 'SI' ? 'MPa' as const : 'ksi' as const }
  const modulus = { text: '', unit: units === 'SI' ? 'GPa' as const : 'Msi' as const }
  const origin = { text: '0', unit: length.unit }
  return {
    units,
    start: { x: { ...origin }, y: { ...origin } },
    walls: [{
      id: 'a', name: '', from: '1', to: '2',
      end: { by: 'length', length: { ...length }, direction: { text: '0', unit: '°' } },
      t: { ...length }, material: 'M1',
    }],
    junctions: [],
    materials: [{
      id: 'M1', name: '', specification: '', form: '', thicknessRange: '', family: 'aluminium', basis: 'none', loadPath: 'single', source: '', edition: '',
      E: { ...modulus }, G: { ...modulus }, nu: { text: '', unit: '' },
      Ftu: { ...stress }, Fty: { ...stress }, Fsu: { ...stress }, Fsy: null,
      temperatureFrom: null, temperatureTo: null, knockdown: [], knockdownSource: '',
    }],
    loading: { by: 'torque', torque: { text: '', unit: units === 'SI' ? 'N·m' : 'lbf·in' }, level: 'limit', temperature: null, source: '' },
    length: null,
    twistAllowed: null,
    twistOrigin: '',
    factors: { ultimate: '1.5', fitting: '', casting: '', bearing: '', onLimit: true, divideUltimate: false, partial: false, reason: '' },
    ends: 'free',
    declarations: { fitting: false, repeated: false, cutOut: 'none', taper: null, layered: false, welded: false, builtIn: false },
  }
}
