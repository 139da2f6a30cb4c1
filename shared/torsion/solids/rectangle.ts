/** Rectangle: Saint-Venant's series, summed until it no longer changes (methods §1.3). */
import { rectangleHandbookJ, rectangleHandbookPeak } from '#shared/torsion/solids/published'
import { solidTorsion, type SolidTorsion } from '#shared/torsion/solids/solid'

const MOST_TERMS = 200
/** cosh of more than this leaves the range of numbers; its reciprocal is zero long before. */
const LARGEST = 700

/** Σ of terms with odd p until they no longer count. */
function oddSeries(term: (p: number, i: number) => number): number {
  let sum = 0
  for (let i = 0; i < MOST_TERMS; i += 1) {
    const next = term(2 * i + 1, i)
    sum += next
    if (Math.abs(next) < 1e-17) break
  }
  return sum
}

/** Σ of p⁻⁵ over odd p: 31/32 · ζ(5). */
const FIFTH_POWERS = 31 / 32 * 1.03692775514337

/** β of J = β a b³, n = a/b ≥ 1. The slow part of the series is a constant, the rest dies at once. */
export function rectangleBeta(n: number): number {
  const rest = oddSeries(p => (1 - Math.tanh(p * Math.PI * n / 2)) / p ** 5)
  return (1 - 192 / (Math.PI ** 5 * n) * (FIFTH_POWERS - rest)) / 3
}

/** Q of τ = Gθ′ b Q at the middle of the long sides. */
export function rectangleLongSide(n: number): number {
  const sum = oddSeries((p) => {
    const argument = p * Math.PI * n / 2
    return argument > LARGEST ? 0 : 1 / (p ** 2 * Math.cosh(argument))
  })
  return 1 - 8 / Math.PI ** 2 * sum
}

/** Σ of (−1)^i/p² over odd p: Catalan's constant. */
const CATALAN = 0.915965594177219

/** P of τ = Gθ′ b P at the middle of the short sides: the slow part of the series is Catalan's constant, the rest dies at once. */
export function rectangleShortSide(n: number): number {
  const rest = oddSeries((p, i) => (i % 2 === 0 ? 1 : -1) * (1 - Math.tanh(p * Math.PI * n / 2)) / p ** 2)
  return 8 / Math.PI ** 2 * (CATALAN - rest)
}

/** Young & Budynas, from memory: J within −0.49 %. */
export function rectangleHandbookConstant(a: number, b: number): number {
  const { c1, c2 } = rectangleHandbookJ
  return a * b ** 3 * (1 / 3 - c1 * b / a * (1 - (b / a) ** 4 / c2))
}

/** Young & Budynas, from memory: T/τ_max, mm³, within 0.27 %. */
export function rectangleHandbookModulus(a: number, b: number): number {
  const factor = rectangleHandbookPeak.reduce((sum, c, i) => sum + c * (b / a) ** (i + 1), 1)
  return a * b ** 2 / (3 * factor)
}

/** @param width, height full sides, mm, > 0; the middle of the section is the origin. */
export function torsionOfRectangle(width: number, height: number): SolidTorsion {
  const wide = width >= height
  const [a, b] = wide ? [width, height] : [height, width]
  const n = a / b
  const J = rectangleBeta(n) * a * b ** 3
  const along = (distance: number) => (wide ? { x: 0, y: distance } : { x: distance, y: 0 })
  const across = (distance: number) => (wide ? { x: distance, y: 0 } : { x: 0, y: distance })
  return solidTorsion({
    A: a * b, J, method: '§1.3',
    peak: { perRate: b * rectangleLongSide(n), place: 'the middle of the long sides', at: along(b / 2) },
    secondary: [{ perRate: b * rectangleShortSide(n), place: 'the middle of the short sides', at: across(a / 2) }],
    plastic: b ** 2 * (3 * a - b) / 6,
    remembered: [
      { of: 'J', value: rectangleHandbookConstant(a, b), source: 'Young & Budynas, torsion table, from memory; low by up to 0.49 %' },
      { of: 'peak', value: J / rectangleHandbookModulus(a, b), source: 'Young & Budynas, torsion table, from memory; within 0.27 %' },
    ],
  })
}
