/** Why the typed quantities of this note stay untied. */
import { looseRows, type LooseReason } from '../../demo-note'

export const LOOSE: LooseReason[] = [
  ...looseRows('description', 'Description of the part, drawing dimension.', '0.06 in', '2.40 in'),
  ...looseRows('assumptions', 'Stated inside the assumption.', '0.250 in', '0.190 in'),
  ...looseRows('geometry', 'Drawing dimension.', '2.00 in', '1.55 in', '0.250 in', '0.190 in'),
  ...looseRows('materials', 'Table limit of the material record.', '160 °F', '71.1 °C'),
  ...looseRows('deflections', 'Limit with its origin.', '2.40 in'),
  ...looseRows('sensitivity', 'Trial value of the sensitivity.', '0.16 in', '0.13 in', '0.24 in'),
  ...looseRows('loads', 'Temperature of case K05, table.', '160 °F'),
  ...looseRows('sensitivity', 'Bounding run of the held root, worked by hand.', '44.5 ksi', '41.2 ksi'),
]
