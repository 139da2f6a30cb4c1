/**
 * The junction and bend formulas against solutions of the whole outline. These
 * are other methods, so they agree within the error of a formula and not to
 * many figures; they show how good a formula is where it is allowed.
 */

export interface Comparison {
  readonly form: 'L' | 'T'
  /** Through thickness is 1. */
  readonly t2: number
  readonly r: number
  /** Overall sizes: along the through wall, and across it from its outer face. */
  readonly along: number
  readonly across: number
  readonly J: number
}

/** Finite differences of the stress function with cut boundary cells, meshes 1/16 and 1/32, extrapolated; they give 6.34203 and 7.99035 for the outlines whose boundary-element values are 6.342047 and 7.990392. */
export const outlineSolutions: readonly Comparison[] = [
  ...([[0.5, 0.125, 3.39705], [0.5, 0.25, 3.40988], [0.5, 0.5, 3.4524], [0.5, 0.75, 3.52091], [0.5, 1, 3.62009],
    [0.75, 0.125, 4.02557], [0.75, 0.25, 4.04765], [0.75, 0.5, 4.11606], [0.75, 0.75, 4.21961], [0.75, 1, 4.36295],
    [1, 0.125, 5.21427], [1, 0.25, 5.24613], [1, 0.5, 5.34202], [1, 0.75, 5.48297], [1, 1, 5.67377], [1, 1.5, 6.22764], [1, 2, 7.05365],
  ] as const).map(([t2, r, J]): Comparison => ({ form: 'L', t2, r, along: 10, across: 7, J })),
  ...([[0.25, 0.125, 4.51349], [0.25, 0.25, 4.53939], [0.25, 0.5, 4.63048], [0.25, 0.75, 4.78512], [0.25, 1, 5.01785],
    [0.5, 0.125, 4.78349], [0.5, 0.25, 4.82496], [0.5, 0.5, 4.95874], [0.5, 0.75, 5.17064], [0.5, 1, 5.47571],
    [0.75, 0.125, 5.4529], [0.75, 0.25, 5.51089], [0.75, 0.5, 5.69078], [0.75, 0.75, 5.96521], [0.75, 1, 6.34961],
    [1, 0.125, 6.68711], [1, 0.25, 6.76225], [1, 0.5, 6.99032], [1, 0.75, 7.3306], [1, 1, 7.79899],
  ] as const).map(([t2, r, J]): Comparison => ({ form: 'T', t2, r, along: 14, across: 7, J })),
]

/** Where the formula is up to 7 % high: no bulge may be added there. */
export const outOfRangeSolutions: readonly Comparison[] = [
  { form: 'L', t2: 0.5, r: 1.5, along: 10, across: 7, J: 3.93025 },
  { form: 'L', t2: 0.5, r: 2, along: 10, across: 7, J: 4.42523 },
  { form: 'L', t2: 0.75, r: 2, along: 10, across: 7, J: 5.44338 },
  { form: 'T', t2: 0.5, r: 1.5, along: 14, across: 7, J: 6.43291 },
  { form: 'T', t2: 1, r: 2, along: 14, across: 7, J: 11.34953 },
]

/** Peak stress in a 90° bend of sheet by boundary elements, [inside radius / t, K] (methods reference §1.10). */
export const bendSolutions: readonly (readonly [number, number])[] = [[0.25, 1.5424], [0.5, 1.3085], [1, 1.1631], [1.5, 1.11], [2, 1.0829]]
