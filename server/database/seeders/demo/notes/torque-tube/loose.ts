/** Why the typed quantities of this note stay untied. */
import { looseRows, type LooseReason } from '../../demo-note'

export const LOOSE: LooseReason[] = [
  ...looseRows('description', 'Description of the part, drawing dimension.', '38 mm', '1.65 mm', '370 mm', '35 mm', '1.25 mm', '25 mm'),
  ...looseRows('assumptions', 'Stated inside the assumption.', '0.03 mm'),
  ...looseRows('geometry', 'Drawing dimension.', '220 mm', '370 mm', '450 mm', '700 mm', '8.7 per cent', '7.1 per cent', '5 per cent'),
  ...looseRows('materials', 'Table limit of the material record.', '90 °C'),
  ...looseRows('sensitivity', 'Trial value of the sensitivity.', '6.8 per cent'),
  ...looseRows('loads', 'Temperature of case T09, table.', '85 °C'),
]
