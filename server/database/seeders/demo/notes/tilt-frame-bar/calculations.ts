/** The one calculation of QSN-40-0015, carried in from a trial. */
import type { SolidBarInputs } from '#shared/calc/kinds/solid-bar/schema'
import { bar, factorsOf, typed } from '../../inputs'
import { QM_108 } from '../../materials'

export const flatBar: SolidBarInputs = {
  units: 'SI', shape: { by: 'rectangle', width: typed('64', 'mm'), height: typed('28', 'mm') }, material: 'QM-108',
  ...bar(QM_108, { by: 'torque', torque: typed('520', 'N·m'), level: 'limit', temperature: null, source: 'guess; no loads document is pinned yet' }, factorsOf(''), { length: typed('940', 'mm') }),
}
