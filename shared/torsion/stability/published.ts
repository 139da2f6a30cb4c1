/** Published constants of wall stability, in one place. */

/** k_s fits in β = b/a (NACA TN 3781 and stability handbooks, from memory): [power, coefficient]; up to 3 % either way of the Ritz values. */
export const fits = {
  'supported supported': [[0, 5.34], [2, 4]],
  'clamped clamped': [[0, 8.98], [2, 5.6]],
  'clamped supported': [[0, 8.98], [2, 5.61], [3, -1.99]],
  'supported clamped': [[0, 5.34], [1, 2.31], [2, -3.44], [3, 8.39]],
} as const satisfies Record<string, readonly (readonly [number, number])[]>

/** Infinitely long strip: the limit of k_s for long plates, below every finite one. */
export const longStrip = { supported: 5.34, clamped: 8.98 } as const
/** Longer than this a plate is taken as a strip, which is on the safe side. */
export const longestPlate = 8

/** Cylinder in torsion, NASA SP-8007 (1968), from memory and to be confirmed against the released document: k_xy = c (γZ)^p, knock-down γ^p. */
export const cylinder = { c: 0.85, power: 0.75, knockdown: 0.67, leastZ: 50, mostZ: 78 } as const
/** Curvature parameter below which a curved panel is a flat one. */
export const flatBelow = 1
