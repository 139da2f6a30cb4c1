/** Equilateral triangle (exact, Saint-Venant) and right isosceles triangle (series, and a computed peak) (methods §1.4, §1.5). */
import { isoscelesHandbook, isoscelesJ, isoscelesPeak, isoscelesPlastic } from '#shared/torsion/solids/published'
import { solidTorsion, type SolidTorsion } from '#shared/torsion/solids/solid'

/** @param a side, mm; origin at the centroid, one side at the bottom. */
export function torsionOfEquilateral(a: number): SolidTorsion {
  const J = Math.sqrt(3) / 80 * a ** 4
  return solidTorsion({
    A: Math.sqrt(3) / 4 * a ** 2, J, method: '§1.4',
    peak: { perRate: 20 * J / a ** 3, place: 'the middle of the sides', at: { x: 0, y: -a / (2 * Math.sqrt(3)) } },
    plastic: a ** 3 / 12,
  })
}

/** @param a leg, mm; origin at the right angle, legs along the axes. */
export function torsionOfRightIsosceles(a: number): SolidTorsion {
  const J = isoscelesJ * a ** 4
  return solidTorsion({
    A: a ** 2 / 2, J, method: '§1.5',
    peak: { perRate: isoscelesPeak * a, place: 'the middle of the hypotenuse', at: { x: a / 2, y: a / 2 } },
    plastic: isoscelesPlastic * a ** 3,
    remembered: [{ of: 'peak', value: isoscelesHandbook * J / a ** 3, source: 'handbook value, from memory; 2.4 % high, that is safe' }],
  })
}
