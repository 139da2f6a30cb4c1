/** The sections of the reference rows. Dimensions are of the mid-line, mm, unless said otherwise. */
import type { Junction, OpenSection } from '#shared/torsion/section'

type Pair = readonly [number, number]
interface WallTable { readonly from: number, readonly to: number, readonly t: number, readonly G?: number }

/** Nodes by index as `0`, `1`, …; walls as `w0`, `w1`, …. */
export function graph(points: readonly Pair[], walls: readonly WallTable[], junctions: readonly Junction[] = [], moduli: { G?: number, E?: number } = {}): OpenSection {
  const { G = 26_900, E } = moduli
  return {
    nodes: points.map(([x, y], index) => ({ id: String(index), x, y })),
    walls: walls.map((wall, index) => ({ id: `w${index}`, from: String(wall.from), to: String(wall.to), t: wall.t, G: wall.G ?? G, ...(E === undefined ? {} : { E }) })),
    junctions,
  }
}

/** A chain of walls of one thickness. */
export const chain = (points: readonly Pair[], t: number, junctions: readonly Junction[] = [], moduli: { G?: number, E?: number } = {}): OpenSection =>
  graph(points, points.slice(1).map((_, index) => ({ from: index, to: index + 1, t })), junctions, moduli)

const bends = (radius: number, ...nodes: number[]): Junction[] => nodes.map(node => ({ node: String(node), radius, make: 'bent' }))
const fillet = (radius: number, node: number): Junction[] => [{ node: String(node), radius, make: 'machined' }]

/** C-38: flanges 40 × 4, web 100 × 3. */
export const channel = graph([[40, 0], [0, 0], [0, 100], [40, 100]], [{ from: 0, to: 1, t: 4 }, { from: 1, to: 2, t: 3 }, { from: 2, to: 3, t: 4 }], [], { E: 71_000 })

/** C-39: walls 40 × 2, 60 × 3 and 40 × 2.5 in two materials; the corners are square and sharp. */
export const twoMaterials = graph([[0, 40], [0, 0], [60, 0], [60, 40]], [{ from: 0, to: 1, t: 2 }, { from: 1, to: 2, t: 3 }, { from: 2, to: 3, t: 2.5, G: 43_000 }])

/** C-43: one wall 30 × 3. */
export const strip30x3 = chain([[0, 0], [30, 0]], 3)

/** C-120: one wall of 40 that grows from 2 to 3. */
export const taperedStrip: OpenSection = { ...chain([[0, 0], [40, 0]], 2), walls: [{ id: 'w0', from: '0', to: '1', t: 2, tEnd: 3, G: 26_900 }] }

/** C-44: equal legs of 10 outside, t = 1, fillet 0.5, sharp outer corner. */
export const machinedAngle = chain([[9.5, 0], [0, 0], [0, 9.5]], 1, fillet(0.5, 1))

/** C-46: flange 14 × 1, stem to 10 overall × 1, fillets 0.5. */
export const machinedTee = graph([[-7, 0], [0, 0], [7, 0], [0, -9.5]], [{ from: 0, to: 1, t: 1 }, { from: 1, to: 2, t: 1 }, { from: 1, to: 3, t: 1 }], fillet(0.5, 1))

/** C-48: legs of 10 outside, t = 1, inside radius 0.5, concentric outside. */
export const bentAngle = chain([[9.5, 0], [0, 0], [0, 9.5]], 1, bends(0.5, 1))

/** C-67: flanges 60 × 5, 120 between them, web 4. */
export const doublySymmetricI = iSection(60, 5, 60, 5, 120, 4)
/** C-68: flanges 80 × 6 (below) and 50 × 4, 150 between them, web 4. */
export const unequalI = iSection(80, 6, 50, 4, 150, 4)

function iSection(b1: number, t1: number, b2: number, t2: number, h: number, tw: number): OpenSection {
  return graph(
    [[-b1 / 2, 0], [0, 0], [b1 / 2, 0], [0, h], [-b2 / 2, h], [b2 / 2, h]],
    [{ from: 0, to: 1, t: t1 }, { from: 1, to: 2, t: t1 }, { from: 1, to: 3, t: tw }, { from: 4, to: 3, t: t2 }, { from: 3, to: 5, t: t2 }],
    [], { E: 71_000 },
  )
}

/** C-70: flanges 35 × 3, web 80 × 2.5. */
export const zed = graph([[-35, 0], [0, 0], [0, 80], [35, 80]], [{ from: 0, to: 1, t: 3 }, { from: 1, to: 2, t: 2.5 }, { from: 2, to: 3, t: 3 }])

/** C-71: R = 50, t = 2, centre at the origin, slit at (50, 0). */
export const slitTube: OpenSection = {
  nodes: [{ id: 'a', x: 50, y: 0 }, { id: 'b', x: 50, y: 0 }],
  walls: [{ id: 'ring', from: 'a', to: 'b', t: 2, G: 26_900, arc: { radius: 50, sweep: 2 * Math.PI, startDirection: Math.PI / 2 } }],
  junctions: [],
}

/** §3.2: an arc of half angle 60° about the origin, R = 40, t = 1.5, symmetric about x. */
export const openArc: OpenSection = {
  nodes: [{ id: 'a', x: 20, y: -20 * Math.sqrt(3) }, { id: 'b', x: 20, y: 20 * Math.sqrt(3) }],
  walls: [{ id: 'arc', from: 'a', to: 'b', t: 1.5, G: 26_900, arc: { radius: 40, sweep: 2 * Math.PI / 3 } }],
  junctions: [],
}

/** §3.7: the branched worked example. */
export const branched = graph(
  [[30, 0], [0, 0], [0, 60], [50, 60], [50, 45], [0, -20], [30, 12]],
  [{ from: 0, to: 1, t: 2 }, { from: 1, to: 2, t: 1.5 }, { from: 2, to: 3, t: 2 }, { from: 3, to: 4, t: 2 }, { from: 1, to: 5, t: 1.5 }, { from: 0, to: 6, t: 2 }],
)

/** Hat of 1.6 mm sheet: brims 15, webs 30 deep leaning 6, crown 28, inside radius 3.2; 2024-T3 at E 72.4, G 27.6 GPa. */
export const hat = chain([[-35, 0], [-20, 0], [-14, 30], [14, 30], [20, 0], [35, 0]], 1.6, bends(3.2, 1, 2, 3, 4), { G: 27_600, E: 72_400 })

/** Lipped channel: web 80, flanges 40, lips 16, inside radius 5, origin at the middle of the web; 6061-T6 at E 68.3, G 26.2 GPa. */
export const lippedChannel = (t: number): OpenSection =>
  chain([[40, -24], [40, -40], [0, -40], [0, 40], [40, 40], [40, 24]], t, bends(5, 1, 2, 3, 4), { G: 26_200, E: 68_300 })

/** Channel rail: flanges 60 × 6, web 140 × 5, origin at the middle of the web; S355 at E 210, G 80.8 GPa. */
export const rail = graph([[60, -70], [0, -70], [0, 70], [60, 70]], [{ from: 0, to: 1, t: 6 }, { from: 1, to: 2, t: 5 }, { from: 2, to: 3, t: 6 }], [], { G: 80_800, E: 210_000 })

/** Angle of 0.250 in, outside 2.00 × 1.55 in, fillet 0.190 in, sharp outer corner; 7050 at G 26.9 GPa. */
export const inchAngle = chain([[1.875 * 25.4, 0], [0, 0], [0, 1.425 * 25.4]], 6.35, fillet(0.19 * 25.4, 1))
