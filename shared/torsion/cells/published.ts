/** Published and computed constants of closed sections and of wall stability, in one place. */

/** Machined inside fillet with a sharp outside corner in a closed cell: [r/t, peak over q/t], boundary elements of a square tube b/t = 20 (methods §2.3). */
export const closedMachinedTable: readonly (readonly [number, number])[] = [[0.125, 2.4], [0.25, 1.88], [0.5, 1.46], [1, 1.15]]
/** Part of G θ′ t that acts at the face of a circular wall; a straight one takes all of it (methods §2.1, exact tube). */
export const circularFacePart = 0.5
/** A system of cells that is worse conditioned than this is refused. */
export const worstCondition = 1e10
/** Warping below this part of the size squared is that of rounded dimensions; a rectangle of sides 1 : 0.98 lies above it (own judgement). */
export const leastWarping = 1e-3
