/** One segment of a bar in torsion without warping restraint: its stiffness along the length and what follows from it (methods §5.1). N, mm, rad. */

export type SegmentStiffness
  /** N·mm², > 0 */
  = | { readonly along: 'uniform', readonly GJ: number }
    /** Solid circle of diameters d1 → d2, linear; valid to a half-angle of about 10°. */
    | { readonly along: 'tapering circle', readonly G: number, readonly d1: number, readonly d2: number }
    /** GJ linear between its ends. */
    | { readonly along: 'linear', readonly GJ1: number, readonly GJ2: number }

export interface Segment { readonly length: number, readonly stiffness: SegmentStiffness }

/** Below this relative difference of its ends a taper is a uniform segment to rounding. */
const SAME = 1e-7

/** GJ at a part (0…1) of the length. */
export function stiffnessAt({ stiffness }: Segment, part: number): number {
  if (stiffness.along === 'uniform') return stiffness.GJ
  if (stiffness.along === 'linear') return stiffness.GJ1 + part * (stiffness.GJ2 - stiffness.GJ1)
  return stiffness.G * Math.PI / 32 * (stiffness.d1 + part * (stiffness.d2 - stiffness.d1)) ** 4
}

/** ∫dz/GJ over the segment: the twist of a unit torque, in closed form. */
export function flexibility(segment: Segment): number {
  const { length, stiffness } = segment
  if (stiffness.along === 'uniform') return length / stiffness.GJ
  if (stiffness.along === 'linear') {
    const { GJ1, GJ2 } = stiffness
    const apart = GJ2 / GJ1 - 1
    return Math.abs(apart) < SAME ? length / (GJ1 * (1 + apart / 2)) : length * Math.log1p(apart) / (GJ1 * apart)
  }
  const { G, d1, d2 } = stiffness
  if (Math.abs(d1 - d2) < SAME * d1) return length / (G * Math.PI / 32 * ((d1 + d2) / 2) ** 4)
  return 32 * length / (3 * Math.PI * G * (d1 - d2)) * (1 / d2 ** 3 - 1 / d1 ** 3)
}

/** Abscissas and weights of the eight-point Gauss rule on (−1, 1), half of it: standard table. */
const GAUSS: readonly (readonly [number, number])[] = [
  [0.1834346424956498, 0.362683783378362], [0.525532409916329, 0.3137066458778873], [0.7966664774136267, 0.2223810344533745], [0.9602898564975363, 0.1012285362903763],
]
const PANELS = 8

/** ∫ f(part)/GJ dz between two parts of the length; exact to rounding for the tapers taken here. */
export function flexibilityIntegral(segment: Segment, from: number, to: number, f: (part: number) => number): number {
  const width = (to - from) / PANELS
  let sum = 0
  for (let panel = 0; panel < PANELS; panel += 1) {
    for (const [x, w] of GAUSS) {
      for (const at of [-x, x]) {
        const part = from + (panel + (1 + at) / 2) * width
        sum += w / 2 * width * f(part) / stiffnessAt(segment, part)
      }
    }
  }
  return sum * segment.length
}
