/** Why the typed quantities of this note stay untied. */
import { looseRows, type LooseReason } from '../../demo-note'

export const LOOSE: LooseReason[] = [
  ...looseRows('assumptions', 'Stated inside the assumption.', '12 mm', '150 mm', '±0.05 mm'),
  ...looseRows('geometry', 'Drawing dimension.', '15 mm', '30 mm', '6 mm', '28 mm', '1.6 mm', '3.2 mm'),
  ...looseRows('materials', 'Table limit of the material record.', '71 °C'),
  ...looseRows('section-analysis', 'Checker\'s own figure.', '1.4 per cent'),
  ...looseRows('sensitivity', 'Trial value of the sensitivity.', '1.4 mm', '1.8 mm'),
  ...looseRows('loads', 'Temperature of case S07, table.', '71 °C'),
  ...looseRows('sensitivity', 'Step of the trial.', '0.2 mm'),
  ...looseRows('geometry', 'Drawing dimension.', '1.2 mm', '3.0 mm'),
]
