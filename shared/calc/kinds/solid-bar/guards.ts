import { fired } from '#shared/calc/guards/catalogue'
import { inOrder } from '#shared/calc/guards/order'
import type { SolidBarSolution } from '#shared/calc/kinds/solid-bar/solve'
import { barGuards } from '#shared/calc/parts/bar-guards'
import { lengthShown } from '#shared/calc/parts/say'
import type { Guard } from '#shared/calc/types'

export function solidBarGuards(s: SolidBarSolution): Guard[] {
  const { model, torsion } = s
  return inOrder([
    ...barGuards({ bar: model.bar, cases: s.cases, places: s.places, margins: s.margins, notches: [], refused: model.refused, unusual: model.unusual }),
    ...(torsion.unbounded === null ? [] : [fired('G-10', { of: 'apex', values: { 'included angle, °': 1 }, message: torsion.unbounded })]),
    ...shortBar(s),
  ])
}

/** Shorter than its largest dimension, a bar knows nothing of free ends (G-39). */
function shortBar({ model }: SolidBarSolution): Guard[] {
  const size = largestSize(model.solid)
  const length = model.bar.length
  if (length === null || length.value >= size) return []
  return [fired('G-39', {
    values: { 'L, mm': length.value }, message: `The bar is ${lengthShown(model.units, length.value)} long, less than the largest dimension of its section, ${lengthShown(model.units, size)}.`,
  })]
}

/** Largest extent of the section, mm. */
export function largestSize(solid: SolidBarSolution['model']['solid']): number {
  switch (solid.shape) {
    case 'circle': return 2 * solid.outerRadius
    case 'ellipse': return 2 * Math.max(solid.semiMajor, solid.semiMinor)
    case 'rectangle': return Math.max(solid.width, solid.height)
    case 'equilateral triangle': return solid.side
    case 'right isosceles triangle': return solid.leg * Math.SQRT2
    case 'sector': return solid.angle > Math.PI ? 2 * solid.radius : Math.max(solid.radius, 2 * solid.radius * Math.sin(solid.angle / 2))
    case 'semicircle': return 2 * solid.radius
    case 'segment': return 2 * solid.radius
    default: return solid.flats / Math.cos(Math.PI / (solid.shape === 'pentagon' ? 5 : solid.shape === 'hexagon' ? 6 : 8))
  }
}
