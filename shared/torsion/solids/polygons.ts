/** Regular pentagon, hexagon and octagon (methods §1.8). */
import { polygons } from '#shared/torsion/solids/published'
import { solidTorsion, type SolidTorsion } from '#shared/torsion/solids/solid'

/** @param d twice the apothem, mm; centre at the origin, one side at the bottom. */
export function torsionOfPolygon(shape: keyof typeof polygons, d: number): SolidTorsion {
  const { sides, J, peak } = polygons[shape]
  const A = sides * Math.tan(Math.PI / sides) * d ** 2 / 4
  return solidTorsion({
    A, J: J * d ** 4, method: '§1.8',
    peak: { perRate: peak * d, place: 'the middle of the sides', at: { x: 0, y: -d / 2 } },
    plastic: A * d / 3,
  })
}
