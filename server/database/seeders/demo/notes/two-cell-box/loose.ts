/** Why the typed quantities of this note stay untied. */
import { looseRows, type LooseReason } from '../../demo-note'

export const LOOSE: LooseReason[] = [
  ...looseRows('description', 'Description of the part, drawing dimension.', '220 mm'),
  ...looseRows('assumptions', 'Stated inside the assumption.', '220 mm'),
  ...looseRows('geometry', 'Drawing dimension.', '150 mm', '140 mm', '92 mm', '190 mm', '240 mm', '3.5 mm', '2.5 mm', '2.0 mm'),
  ...looseRows('materials', 'Table limit of the material record.', '71 °C'),
  ...looseRows('span-analysis', 'Span from the drawing.', '1180 mm'),
  ...looseRows('stability', 'Drawing dimension.', '220 mm'),
  ...looseRows('sensitivity', 'Trial value of the sensitivity.', '0.1 mm', '200 mm'),
]
