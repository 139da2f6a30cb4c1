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
import { thicknessAt } from '#shared/torsion/mid-line'
import { sectorialGrowth } from '#shared/torsion/sectorial-growth'

/** Abscissas and weights of the eight-point rule on (−1, 1); symmetric, so half is listed. Standard tables, checked by the test of the rule. */
const gauss: readonly (readonly [number, number])[] = [
  [0.1834346424956498, 0.362683783378362], [0.525532409916329, 0.3137066458778873],
  [0.7966664774136267, 0.2223810344533745], [0.9602898564975363, 0.1012285362903763],
]
/** Longest arc integrated by one rule; the truncation is then far below rounding. */
const panel = Math.PI / 4

interface RulePoint { readonly part: number, readonly weight: number }
const rules = new Map<number, readonly RulePoint[]>()

/** Points (0…1) and weights (summing to 1) along one piece. */
export function rulePoints(path: WallPath): readonly RulePoint[] {
  const count = path.kind === 'line' ? 1 : Math.max(1, Math.ceil(Math.abs(path.sweep) / panel))
  const known = rules.get(count)
  if (known) return known
  const rule = Array.from({ length: count }, (_, index) => index).flatMap(index =>
    gauss.flatMap(([x, w]) => [-x, x].map(at => ({ part: (index + (1 + at) / 2) / count, weight: w / 2 / count }))))
  rules.set(count, rule)
  return rule
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
  const meeting = new Map<string, Piece[]>()
  for (const piece of pieces) for (const node of [piece.from, piece.to]) meeting.set(node, [...meeting.get(node) ?? [], piece])
  const done = new Set<Piece>()
  // The list grows while it is walked: each node in it has its ω.
  const reached = first ? [first.from] : []
  for (const node of reached) {
    for (const piece of meeting.get(node) ?? []) {
      if (done.has(piece)) continue
      done.add(piece)
      const growth = sectorialGrowth(piece.path, pole, 1)
      const startOmega = piece.from === node ? omegaAt.get(node) ?? 0 : (omegaAt.get(node) ?? 0) - growth
      const far = piece.from === node ? piece.to : piece.from
      omegaAt.set(far, piece.from === node ? startOmega + growth : startOmega)
      walked.push({ piece, startOmega, endOmega: startOmega + growth })
      reached.push(far)
    }
  }
  return { walked, omegaAt }
}

/** The integration points of walked pieces; `weigh` scales the area, e.g. by a ratio of moduli. */
export function stationsOf(walked: readonly WalkedPiece[], pole: Point, weigh: (piece: Piece) => number): Station[] {
  const stations: Station[] = []
  for (const { piece, startOmega } of walked) {
    const { path } = piece
    const length = pathLength(path) * weigh(piece)
    for (const { part, weight } of rulePoints(path)) {
      // Written out: copying a point into each of some thousand stations took most of the time of a long section.
      const { x, y } = pathPoint(path, part)
      const t = thicknessAt(piece, part)
      stations.push({ x, y, area: length * t * weight, omega: startOmega + sectorialGrowth(path, pole, part), t, tangent: tangentAt(path, part) })
    }
  }
  return stations
}
