/** Why the typed quantities of this note stay untied. */
import { looseRows, type LooseReason } from '../../demo-note'

export const LOOSE: LooseReason[] = [
  ...looseRows('assumptions', 'Stated inside the assumption.', '9.0 mm', '1.8 mm'),
  ...looseRows('geometry', 'Drawing dimension.', '9.0 mm', '1.8 mm', '46 mm', '3.5 mm', '8.85 mm', '7.7 mm', '0.6 mm', '88 mm'),
]
