/** The two-dimensional solution with its three-mesh estimate, as a note asks for it. `compare-outline.ts` sets it beside a general finite-element program. */
import { bench, describe } from 'vitest'
import { outlineTorsion } from '#shared/torsion/outline/outline-torsion'
import { bentHat, machinedAngle, machinedTee, twoCellBox } from '../reference/outlines'

describe('general outline', () => {
  bench('thick angle 60 × 60 × 15, fillet 6', () => void outlineTorsion(machinedAngle(60, 15, 6)))
  bench('bent hat of 2 mm sheet, 40 × 40, flanges 20, inside radius 3', () => void outlineTorsion(bentHat(40, 40, 20, 2, 3)))
  bench('machined tee 14 × 10 × 1, fillets 0.5', () => void outlineTorsion(machinedTee(14, 1, 10, 0.5)))
  bench('two-cell box of thin walls', () => void outlineTorsion(twoCellBox), { iterations: 3 })
})
