/**
 * Every published or separately computed constant the open-section methods
 * rest on, in one place, so that a reader can compare them with their source
 * and a test can disturb each of them.
 */

/** Free end of a thin rectangle: exact (96/π⁵)·Σ(2i+1)⁻⁵ of Saint-Venant's series, on L·t³/3; a third of it is taken off per t⁴. */
export const freeEndLoss = 0.315124438 / 3

/** El Darwish & Johnston 1965 (from memory; the boundary-element values of the methods reference §1.10 agree): end loss used together with the bulge. */
export const junctionEndLoss = 0.105

/** α = c0 + c1·t₂/t₁ + c2·r/t₁ + c3·t₂r/t₁² + c4·t₂²/t₁² */
export interface BulgeCoefficients { readonly c0: number, readonly c1: number, readonly c2: number, readonly c3: number, readonly c4: number }

/** El Darwish & Johnston 1965, from memory, as printed in the methods reference §1.10. */
export const bulgeL: BulgeCoefficients = { c0: -0.0908, c1: 0.2621, c2: 0.1231, c3: -0.0752, c4: -0.0945 }
export const bulgeT: BulgeCoefficients = { c0: -0.042, c1: 0.2204, c2: 0.1355, c3: -0.0865, c4: -0.0725 }

/**
 * Peak stress in the fillet of a machined right angle with equal walls, over
 * G·θ′·t: [r/t, K]. Boundary elements, extrapolated, confirmed by finite
 * elements at 0.25, 0.5 and 1 (methods reference §1.10).
 */
export const machinedCornerTable: readonly (readonly [number, number])[] = [
  [0.05, 2.6856], [0.1, 2.1745], [0.125, 2.0402], [0.15, 1.941], [0.2, 1.8036], [0.25, 1.7131], [0.3, 1.6498],
  [0.5, 1.526], [0.75, 1.4893], [1, 1.5011], [1.5, 1.5807], [2, 1.6908],
]
