/** Why the typed quantities of this note stay untied. */
import { looseRows, type LooseReason } from '../../demo-note'

export const LOOSE: LooseReason[] = [
  ...looseRows('description', 'Description of the part, drawing dimension.', '20 mm'),
  ...looseRows('assumptions', 'Stated inside the assumption.', '20 mm'),
  ...looseRows('geometry', 'Drawing dimension.', '60 mm', '6.0 mm', '140 mm', '5.0 mm', '1800 mm', '1380 mm'),
  ...looseRows('span-analysis', 'hand value', '165.1×10⁶ N·mm²'),
  ...looseRows('geometry', 'Drawing dimension.', '420', '900'),
  ...looseRows('section-analysis', 'Bend radii of the drawing.', '6', '11 mm'),
  ...looseRows('span-analysis', 'Station of the end.', '0'),
  ...looseRows('stresses', 'Station of the end.', '0'),
]
