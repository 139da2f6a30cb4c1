/** Circle, circular tube, ellipse and similar hollow ellipse: exact (Saint-Venant; methods §1.1, §1.2). */
import type { Refusal } from '#shared/torsion/section'
import { refusal } from '#shared/torsion/section'
import { solidTorsion, type SolidTorsion } from '#shared/torsion/solids/solid'

/** @param Ro mm, > 0  @param Ri mm, 0 ≤ Ri < Ro */
export function torsionOfCircle(Ro: number, Ri: number): SolidTorsion | Refusal {
  if (!(Ri < Ro)) return refusal('The inside radius must be smaller than the outside radius.')
  const J = Math.PI / 2 * (Ro ** 4 - Ri ** 4)
  return solidTorsion({
    A: Math.PI * (Ro ** 2 - Ri ** 2), J, method: '§1.1',
    peak: { perRate: Ro, place: 'the whole outer surface', at: { x: Ro, y: 0 } },
    secondary: Ri > 0 ? [{ perRate: Ri, place: 'the inner surface', at: { x: Ri, y: 0 } }] : [],
    plastic: 2 / 3 * Math.PI * (Ro ** 3 - Ri ** 3),
  })
}

/** @param a, b semi-axes, mm, in either order  @param ratio inner over outer of a similar, concentric hole, 0 ≤ ratio < 1 */
export function torsionOfEllipse(first: number, second: number, ratio: number): SolidTorsion | Refusal {
  if (!(ratio < 1)) return refusal('The hole must be smaller than the ellipse: give a ratio below 1.')
  const [a, b] = first >= second ? [first, second] : [second, first]
  const whole = 1 - ratio ** 4
  const squares = a ** 2 + b ** 2
  const alongFirst = first >= second
  const minorEnd = alongFirst ? { x: 0, y: b } : { x: b, y: 0 }
  const majorEnd = alongFirst ? { x: a, y: 0 } : { x: 0, y: a }
  return solidTorsion({
    A: Math.PI * a * b * (1 - ratio ** 2), J: Math.PI * a ** 3 * b ** 3 / squares * whole, method: '§1.2',
    peak: { perRate: 2 * a ** 2 * b / squares, place: 'the ends of the minor axis', at: minorEnd },
    secondary: [{ perRate: 2 * a * b ** 2 / squares, place: 'the ends of the major axis', at: majorEnd }],
    plastic: a === b ? 2 / 3 * Math.PI * a ** 3 * (1 - ratio ** 3) : null,
  })
}
