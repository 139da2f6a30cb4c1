/**
 * Integration along a mid-line. On each piece the sectorial coordinate is known
 * in closed form, straight or arc; Gauss–Legendre points then integrate the
 * products (polynomials on lines, trigonometric on arcs) to rounding error, so
 * no arc is replaced by chords.
 */
import type { Point } from '#shared/torsion/section'
import type { WallPath } from '#shared/torsion/geometry'
import type { Piece } from '#shared/torsion/mid-line'
import { pathLength, pathPoint, tangentAt } from '#shared/torsion/geometry'
import { sectorialGrowth } from '#shared/torsion/sectorial-growth'

/** Abscissas and weights of the eight-point rule on (−1, 1); symmetric, so half is listed. Standard tables, checked by the test of the rule. */
const gauss: readonly (readonly [number, number])[] = [
  [0.1834346424956498, 0.362683783378362], [0.525532409916329, 0.3137066458778873],
  [0.7966664774136267, 0.2223810344533745], [0.9602898564975363, 0.1012285362903763],
]
/** Longest arc integrated by one rule; the truncation is then far below rounding. */
const panel = Math.PI / 4

/** Points (0…1) and weights (summing to 1) along one piece. */
export function rulePoints(path: WallPath): { part: number, weight: number }[] {
  const count = path.kind === 'line' ? 1 : Math.max(1, Math.ceil(Math.abs(path.sweep) / panel))
  return Array.from({ length: count }, (_, index) => index).flatMap(index =>
    gauss.flatMap(([x, w]) => [-x, x].map(at => ({ part: (index + (1 + at) / 2) / count, weight: w / 2 / count }))))
}

/** One integration point: where, how much area it stands for, and ω about the first pole. */
export interface Station extends Point { readonly area: number, readonly omega: number, readonly t: number, readonly tangent: number }

/** A piece with ω at its start, as the walk along the tree found it. */
export interface WalkedPiece { readonly piece: Piece, readonly startOmega: number, readonly endOmega: number }

/**
 * Walks the tree from one end and gives ω at the ends of every piece. At a
 * branch all pieces take one common value.
 */
export function walk(pieces: readonly Piece[], pole: Point): { walked: WalkedPiece[], omegaAt: Map<string, number> } {
  const [first] = pieces
  const omegaAt = new Map<string, number>(first ? [[first.from, 0]] : [])
  const walked: WalkedPiece[] = []
  const left = new Set(pieces)
  for (let found = true; found;) {
    found = false
    for (const piece of left) {
      const growth = sectorialGrowth(piece.path, pole, 1)
      const [atFrom, atTo] = [omegaAt.get(piece.from), omegaAt.get(piece.to)]
      const startOmega = atFrom ?? (atTo === undefined ? undefined : atTo - growth)
      if (startOmega === undefined) continue
      left.delete(piece)
      found = true
      omegaAt.set(piece.from, startOmega)
      omegaAt.set(piece.to, startOmega + growth)
      walked.push({ piece, startOmega, endOmega: startOmega + growth })
    }
  }
  return { walked, omegaAt }
}

/** The integration points of walked pieces; `weigh` scales the area, e.g. by a ratio of moduli. */
export function stationsOf(walked: readonly WalkedPiece[], pole: Point, weigh: (piece: Piece) => number): Station[] {
  return walked.flatMap(({ piece, startOmega }) => {
    const { path, t } = piece
    const area = pathLength(path) * t * weigh(piece)
    return rulePoints(path).map(({ part, weight }) => ({
      ...pathPoint(path, part),
      area: area * weight, omega: startOmega + sectorialGrowth(path, pole, part), t, tangent: tangentAt(path, part),
    }))
  })
}
