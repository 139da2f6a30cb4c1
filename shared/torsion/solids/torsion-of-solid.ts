/** Torsion of solid and hollow bars in closed form: the front of this folder. */
import { refusal, type Refusal } from '#shared/torsion/section'
import { torsionOfPolygon } from '#shared/torsion/solids/polygons'
import { torsionOfRectangle } from '#shared/torsion/solids/rectangle'
import { torsionOfCircle, torsionOfEllipse } from '#shared/torsion/solids/rounds'
import { torsionOfSector, torsionOfSemicircle } from '#shared/torsion/solids/sector'
import { torsionOfSegment } from '#shared/torsion/solids/segment'
import type { Solid, SolidTorsion } from '#shared/torsion/solids/solid'
import { torsionOfEquilateral, torsionOfRightIsosceles } from '#shared/torsion/solids/triangles'

/** Sizes beyond these lose their powers in binary numbers. */
const [SMALLEST, LARGEST] = [1e-9, 1e9]
/** Where a ratio of sizes is larger, a bar is a sheet and no bar. */
const MOST_SLENDER = 1e9

const mayBeZero = new Set(['innerRadius', 'ratio', 'depth'])

/**
 * J, peak shear with its place, torsional modulus and what else is known of the shape. Free warping, away
 * from where the torque is brought in; isotropic, linear.
 * @returns a refusal where a dimension is missing, not positive, out of range or against the shape.
 */
export function torsionOfSolid(solid: Solid): SolidTorsion | Refusal {
  const sizes = Object.entries(solid).filter((entry): entry is [string, number] => entry[0] !== 'shape')
  const bad = sizes.find(([name, value]) => !(Number.isFinite(value) && (value > 0 || (value === 0 && mayBeZero.has(name)))))
  if (bad) return refusal(`The ${wordsOf(bad[0])} must be ${mayBeZero.has(bad[0]) ? 'zero or more' : 'greater than zero'}.`)
  const lengths = sizes.filter(([name]) => name !== 'ratio' && name !== 'angle').map(([, value]) => value).filter(value => value > 0)
  if (lengths.some(value => value < SMALLEST || value > LARGEST)) return refusal('A dimension is too small or too large to compute with. Check the number and its unit.')
  if (Math.max(...lengths) / Math.min(...lengths) > MOST_SLENDER) return refusal('The dimensions are too far apart to be those of one bar. Check the numbers and their units.')
  const found = solve(solid)
  return found.ok && !(found.J > 0 && Number.isFinite(found.J) && found.peak.perRate > 0) ? refusal('Nothing is left of the section: check its dimensions.') : found
}

const wordsOf = (name: string): string => name.replaceAll(/[A-Z]/g, letter => ` ${letter.toLowerCase()}`)

function solve(solid: Solid): SolidTorsion | Refusal {
  switch (solid.shape) {
    case 'circle': return torsionOfCircle(solid.outerRadius, solid.innerRadius)
    case 'ellipse': return torsionOfEllipse(solid.semiMajor, solid.semiMinor, solid.ratio)
    case 'rectangle': return torsionOfRectangle(solid.width, solid.height)
    case 'equilateral triangle': return torsionOfEquilateral(solid.side)
    case 'right isosceles triangle': return torsionOfRightIsosceles(solid.leg)
    case 'sector': return torsionOfSector(solid.radius, solid.angle)
    case 'semicircle': return torsionOfSemicircle(solid.radius)
    case 'segment': return torsionOfSegment(solid.radius, solid.depth)
    default: return torsionOfPolygon(solid.shape, solid.flats)
  }
}

export interface SolidResponse {
  /** Rate of twist, rad/mm. */
  readonly rate: number
  /** Peak shear stress, MPa. */
  readonly tauMax: number
}

/** Rate of twist and peak shear for a torque in N·mm; G in MPa. */
export const respondOfSolid = ({ J, WT }: SolidTorsion, G: number, torque: number): SolidResponse =>
  ({ rate: torque / (G * J), tauMax: Math.abs(torque) / WT })
