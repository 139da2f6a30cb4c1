/** Records of a note as they are stored: invented figures. */
import type { LoadCasesInputs } from '#shared/calc/kinds/load-cases/schema'
import { blankMaterial } from '#shared/calc/kinds/material/kind'
import type { MaterialInput } from '#shared/calc/parts/material-fields'

export const materialInputs = (): MaterialInput => ({
  ...blankMaterial('SI'),
  id: 'QM-31', name: 'Sheet alloy of the example', specification: 'EX-S-4', form: 'sheet', basis: 'A', source: 'Example data sheet 7', edition: '2',
  E: { text: '71', unit: 'GPa' }, G: { text: '26.9', unit: 'GPa' }, nu: { text: '0.33', unit: '' },
  Ftu: { text: '440', unit: 'MPa' }, Fty: { text: '320', unit: 'MPa' }, Fsu: { text: '265', unit: 'MPa' },
})

export const loadCasesInputs = (): LoadCasesInputs => ({
  document: 'EX-L-12 issue 3', temperatureUnit: '°C',
  columns: [{ key: 'T', title: 'Torque', dimension: 'torque', unit: 'N·m' }, { key: 'Vy', title: 'Shear force', dimension: 'force', unit: 'kN' }],
  rows: [
    { id: 'L01', title: 'Gust up', source: '', level: 'limit', temperature: '20', cells: ['12.5', '3.2'] },
    { id: 'L02', title: 'Gust down', source: '', level: 'limit', temperature: '', cells: ['-14', ''] },
    { id: 'L03', title: 'Landing', source: 'EX-L-13 page 4', level: 'ultimate', temperature: '-40', cells: ['90 lbf·in', '-1.1'] },
  ],
})
