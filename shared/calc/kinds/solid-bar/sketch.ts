/** The outline to scale with its peak. */
import type { Drawing, Shape } from '#shared/calc/types'
import { largestSize } from '#shared/calc/kinds/solid-bar/guards'
import type { SolidBarSolution } from '#shared/calc/kinds/solid-bar/solve'
import type { Solid } from '#shared/torsion/solids/solid'
import { showQuantity } from '#shared/units/display'

type Pair = [number, number]
const turn = (count: number, at: (angle: number) => Pair, from = 0, to = 2 * Math.PI): Pair[] => Array.from({ length: count + 1 }, (_, i) => at(from + (to - from) * i / count))
const circle = (R: number) => turn(72, angle => [R * Math.cos(angle), R * Math.sin(angle)])

/** Outer outline and hole, in the axes the shape is described in. */
function outlines(solid: Solid): Pair[][] {
  switch (solid.shape) {
    case 'circle': return solid.innerRadius > 0 ? [circle(solid.outerRadius), circle(solid.innerRadius)] : [circle(solid.outerRadius)]
    case 'ellipse': {
      const at = (k: number) => turn(72, angle => [k * solid.semiMajor * Math.cos(angle), k * solid.semiMinor * Math.sin(angle)])
      return solid.ratio > 0 ? [at(1), at(solid.ratio)] : [at(1)]
    }
    case 'rectangle': {
      const [x, y] = [solid.width / 2, solid.height / 2]
      return [[[-x, -y], [x, -y], [x, y], [-x, y]]]
    }
    case 'equilateral triangle': {
      const [a, r] = [solid.side, solid.side / (2 * Math.sqrt(3))]
      return [[[-a / 2, -r], [a / 2, -r], [0, 2 * r]]]
    }
    case 'right isosceles triangle': return [[[0, 0], [solid.leg, 0], [0, solid.leg]]]
    case 'sector': return [[[0, 0], ...turn(48, angle => [solid.radius * Math.cos(angle), solid.radius * Math.sin(angle)], -solid.angle / 2, solid.angle / 2)]]
    case 'semicircle': return [turn(48, angle => [solid.radius * Math.cos(angle), solid.radius * Math.sin(angle)], 0, Math.PI)]
    case 'segment': {
      const half = Math.acos(1 - solid.depth / solid.radius)
      return [turn(72, angle => [solid.radius * Math.cos(angle), solid.radius * Math.sin(angle)], Math.PI / 2 + half, 2.5 * Math.PI - half)]
    }
    default: {
      const n = solid.shape === 'pentagon' ? 5 : solid.shape === 'hexagon' ? 6 : 8
      const R = solid.flats / 2 / Math.cos(Math.PI / n)
      return [turn(n, angle => [R * Math.cos(angle), R * Math.sin(angle)], -Math.PI / 2 + Math.PI / n, 1.5 * Math.PI + Math.PI / n).slice(0, n)]
    }
  }
}

export function solidBarSketch({ model, torsion, cases, governing }: SolidBarSolution): Drawing {
  const loops = outlines(model.solid)
  const points = loops.flat()
  const [xs, ys] = [points.map(([x]) => x), points.map(([, y]) => y)]
  const [left, right, low, high] = [Math.min(...xs), Math.max(...xs), Math.min(...ys), Math.max(...ys)]
  const size = largestSize(model.solid)
  const room = 0.45 * size
  const c = cases.find(one => one.model.id === governing?.caseId) ?? cases[0]
  const stress = c ? showQuantity(c.tauMax, 'stress', model.units === 'SI' ? 'MPa' : 'ksi') : ''
  const { at, place } = torsion.peak
  const [mx, my] = [(left + right) / 2, (low + high) / 2]
  const away: Pair = Math.hypot(at.x - mx, at.y - my) > 1e-6 * size ? [at.x - mx, at.y - my] : [0, -1]
  const shapes: Shape[] = [
    ...loops.map((loop): Shape => ({ type: 'path', points: loop, closed: true, role: 'wall', level: 0.35 })),
    { type: 'dimension', from: [left, low], to: [right, low], offset: -0.22 * size, text: showQuantity(right - left, 'length', model.units === 'SI' ? 'mm' : 'in') },
    { type: 'dimension', from: [left, low], to: [left, high], offset: 0.22 * size, text: showQuantity(high - low, 'length', model.units === 'SI' ? 'mm' : 'in') },
    ...(stress === '' ? [] : [{ type: 'peak', at: [at.x, at.y], text: stress, away } satisfies Shape]),
  ]
  return {
    shapes, box: { x: left - room, y: low - room, width: right - left + 2 * room, height: high - low + 2 * room },
    alt: `${model.solid.shape}, ${showQuantity(right - left, 'length', 'mm')} wide and ${showQuantity(high - low, 'length', 'mm')} high${stress === '' ? '' : `; largest shear stress ${stress} at ${place}`}.`,
  }
}
