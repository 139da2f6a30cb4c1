/**
 * Every limit the two-dimensional method is judged by, in one place, so that a
 * reader can compare them with the methods reference and a test can disturb each.
 */

/** §4.4: interior angles above this are re-entrant; the stress of linear elasticity has no bound there. rad */
export const reentrantAbove = 185 * Math.PI / 180
/** §4.4: radius of the disc left out round a sharp re-entrant vertex, in local thicknesses. */
export const excludedDisc = 0.5

/** §4.2: accepted uncertainty of the torsion constant and of the peak shear, of the value. */
export const uncertaintyLimits = { J: 0.002, tau: 0.01 } as const
/** §4.2: the order that three meshes should show at least. Its upper bound of 2.3 is for linear elements; these panels are of sixth order. */
export const leastOrder = 1.7

/** §4.5: expected difference between the closed or thin-walled method and the two-dimensional one, of the value. */
export const agreementLimits = {
  'exact shape': { 'J': 0.001, 'tau': 0.005 },
  'open, corrected': { 'J': 0.005, 'tau': 0.01, 'tau in a fillet': 0.03 },
  'open, mid-line only': { J: 0.05, tau: 0.05 },
  'closed': { J: 0.03, tau: 0.02 },
} as const
/** §4.5 as amended: expected difference of the warping constant between the sharp mid-line and the outline with its bends. */
export const agreementOfGamma = 0.1
/** §4.5: a closed section is in the table up to this face factor. */
export const mostChi = 0.1
/** §4.5: beyond this many times the expected difference the calculation stops. */
export const stopFactor = 3
