/**
 * Sectorial properties of an open section (methods reference §3.1): centroid,
 * second moments, shear centre, warping constants, and what the large-twist
 * check needs. mm, mm², mm⁴, mm⁶. Where walls differ in E everything but the
 * plain area is weighted by E over the largest E.
 */
import type { OpenSection, Point, Refusal } from '#shared/torsion/section'
import type { Piece } from '#shared/torsion/mid-line'
import type { Station, WalkedPiece } from '#shared/torsion/stations'
import { refusal } from '#shared/torsion/section'
import { directionOf, distance, pathEnd, pathLength, pathPoint, pathStart } from '#shared/torsion/geometry'
import { thicknessAt } from '#shared/torsion/mid-line'
import { midLineOf } from '#shared/torsion/section-check'
import { sectorialGrowth, sectorialTurns } from '#shared/torsion/sectorial-growth'
import { stationsOf, walk } from '#shared/torsion/stations'

export interface SectorialProperties {
  readonly ok: true
  /** Plain area Σ L·t. */
  readonly A: number
  readonly centroid: Point
  /** About the centroid, axes as given. */
  readonly Ixx: number
  readonly Iyy: number
  readonly Ixy: number
  readonly shearCentre: Point
  /** Warping constant of the mid-line, about the shear centre. */
  readonly gammaPrimary: number
  /** Across the thickness. */
  readonly gammaSecondary: number
  /** What to use: the primary constant, with the secondary one added once it is more than a tenth of it (angles, tees, cruciforms). */
  readonly gamma: number
  /** Normalised ω, at each node; at a bend, at the middle of the bend. */
  readonly omegaAt: Readonly<Record<string, number>>
  readonly omegaMax: number
  readonly omegaMaxAt: Point
  /** ∫ρ²dA and ∫ρ⁴dA − (∫ρ²dA)²/A about the shear centre, and the farthest mid-line point, for the large-twist check. */
  readonly Ips: number
  readonly In: number
  readonly rhoMax: number
  /** Weighted area, equal to A unless walls differ in E. */
  readonly weightedArea: number
  /** The E everything is referred to; null where no wall gives one. */
  readonly referenceE: number | null
  readonly weighted: boolean
  /** The walls lie on one line: the shear centre is on it and the warping constant of the mid-line is zero. */
  readonly oneLine: boolean
  /** |∫ω|, |∫ωx|, |∫ωy| over max|ω|·A·size: rounding error, below 1e-9. */
  readonly residuals: { readonly area: number, readonly x: number, readonly y: number }
}

const integral = (stations: readonly Station[], value: (at: Station) => number): number =>
  stations.reduce((total, at) => total + at.area * value(at), 0)

interface Weights { readonly of: (piece: Piece) => number, readonly referenceE: number | null, readonly weighted: boolean }

/** Either every wall gives its E or none does. */
function weights(pieces: readonly Piece[]): Weights | Refusal {
  const given = pieces.flatMap(({ E }) => (E === null ? [] : [E]))
  if (given.length === 0) return { of: () => 1, referenceE: null, weighted: false }
  if (given.length < pieces.length) return refusal('Some walls give a modulus of elasticity and some do not. Give it for all walls.')
  const reference = Math.max(...given)
  return { of: ({ E }) => (E ?? reference) / reference, referenceE: reference, weighted: given.some(E => E !== reference) }
}

interface SecondMoments { readonly Ixx: number, readonly Iyy: number, readonly Ixy: number }

function secondMoments(stations: readonly Station[], { x, y }: Point): SecondMoments {
  return {
    Ixx: integral(stations, at => (at.y - y) ** 2),
    Iyy: integral(stations, at => (at.x - x) ** 2),
    Ixy: integral(stations, at => (at.x - x) * (at.y - y)),
  }
}

/** Lesser over greater principal second moment: zero for walls on one line, whatever its direction. */
function slimness({ Ixx, Iyy, Ixy }: SecondMoments): number {
  const [mean, spread] = [(Ixx + Iyy) / 2, Math.hypot((Ixx - Iyy) / 2, Ixy)]
  return (mean - spread) / (mean + spread)
}

/** Shear centre from ω about the centroid. */
function shearCentreOf(stations: readonly Station[], centroid: Point, { Ixx, Iyy, Ixy }: SecondMoments): Point {
  const Iwx = integral(stations, at => at.omega * (at.x - centroid.x))
  const Iwy = integral(stations, at => at.omega * (at.y - centroid.y))
  const delta = Ixx * Iyy - Ixy * Ixy
  return { x: centroid.x + (Iyy * Iwy - Ixy * Iwx) / delta, y: centroid.y - (Ixx * Iwx - Ixy * Iwy) / delta }
}

/** Walls on one line bend across it as a stack of thin strips: the shear centre is their centroid weighted by t³. */
function shearCentreOnLine(stations: readonly Station[]): Point {
  const stiffness = integral(stations, at => at.t * at.t)
  return { x: integral(stations, at => at.t * at.t * at.x) / stiffness, y: integral(stations, at => at.t * at.t * at.y) / stiffness }
}

/** Warping across the thickness, ∫(t²/12)·s²dA with s from the foot of the perpendicular out of the shear centre. */
const secondaryGamma = (stations: readonly Station[], pole: Point): number =>
  integral(stations, at => at.t * at.t / 12 * ((at.x - pole.x) * Math.cos(at.tangent) + (at.y - pole.y) * Math.sin(at.tangent)) ** 2)

/**
 * Below a tenth of the mid-line's constant the secondary one is less than what
 * a mid-line knows of the outline, and is left out; where walls point at one
 * place (angle, tee, cruciform, bent or sharp) it is what there is.
 */
const secondaryCounts = 0.1

/** Where |ω| or the distance from the pole may be greatest: ends of pieces and turning points inside arcs. */
function peaks(walked: readonly WalkedPiece[], pole: Point): { omega: number, at: Point }[] {
  return walked.flatMap(({ piece: { path }, startOmega, endOmega }) => [
    { omega: startOmega, at: pathStart(path) },
    { omega: endOmega, at: pathEnd(path) },
    ...(path.kind === 'arc' ? sectorialTurns(path, pole) : []).map(part => ({ omega: startOmega + sectorialGrowth(path, pole, part), at: pathPoint(path, part) })),
  ])
}

/** The farthest mid-line point from the pole. */
function farthest(pieces: readonly Piece[], pole: Point): number {
  const candidates = pieces.flatMap(({ path }) => {
    const ends = [pathStart(path), pathEnd(path)]
    if (path.kind === 'line') return ends
    const away = directionOf(pole, path.centre)
    const full = 2 * Math.PI
    const part = ((Math.sign(path.sweep) * (away - path.startAngle)) % full + full) % full / Math.abs(path.sweep)
    return part < 1 ? [...ends, pathPoint(path, part)] : ends
  })
  return Math.max(...candidates.map(at => distance(pole, at)))
}

function omegaAtNodes(section: OpenSection, walked: readonly WalkedPiece[], pole: Point, omegaAt: ReadonlyMap<string, number>, mean: number): Record<string, number> {
  const bends = new Map(walked.filter(({ piece }) => piece.bendAt !== null).map(one => [one.piece.bendAt, one]))
  return Object.fromEntries(section.nodes.flatMap(({ id }) => {
    const bend = bends.get(id)
    const omega = bend ? bend.startOmega + sectorialGrowth(bend.piece.path, pole, 0.5) : omegaAt.get(id)
    return omega === undefined ? [] : [[id, omega - mean]]
  }))
}

/** Sectorial properties of a section given by its mid-line, with its bends and arcs exactly. */
export function sectorialProperties(section: OpenSection): SectorialProperties | Refusal {
  const checked = midLineOf(section)
  if (!checked.ok) return checked
  const { pieces, size } = checked.midLine
  const weigh = weights(pieces)
  if ('ok' in weigh) return weigh
  const origin = pathStart((pieces[0] as Piece).path)
  const unpoled = stationsOf(walk(pieces, origin).walked, origin, weigh.of)
  const weightedArea = integral(unpoled, () => 1)
  const centroid = { x: integral(unpoled, at => at.x) / weightedArea, y: integral(unpoled, at => at.y) / weightedArea }
  const atCentroid = stationsOf(walk(pieces, centroid).walked, centroid, weigh.of)
  const moments = secondMoments(atCentroid, centroid)
  const oneLine = slimness(moments) < 1e-9
  const shearCentre = oneLine ? shearCentreOnLine(atCentroid) : shearCentreOf(atCentroid, centroid, moments)
  const result = aboutShearCentre(section, pieces, shearCentre, weigh, { centroid, weightedArea, size })
  if (!Object.values(result).every(value => typeof value !== 'number' || Number.isFinite(value))) return refusal('The sectorial properties are not finite. Check coordinates and thicknesses.')
  return {
    ok: true, A: pieces.reduce((total, piece) => total + pathLength(piece.path) * thicknessAt(piece, 0.5), 0), centroid, ...moments, shearCentre, ...result,
    weightedArea, referenceE: weigh.referenceE, weighted: weigh.weighted, oneLine,
  }
}

/** Where all walls point at the shear centre ω is zero, and what is left is rounding error. */
function gammasOf(stations: readonly Station[], pole: Point, size: number) {
  const A = integral(stations, () => 1)
  const square = integral(stations, at => at.omega ** 2)
  const gammaPrimary = square <= 1e-20 * A * size ** 4 ? 0 : square
  const gammaSecondary = secondaryGamma(stations, pole)
  return { A, gammaPrimary, gammaSecondary, gamma: gammaSecondary > secondaryCounts * gammaPrimary ? gammaPrimary + gammaSecondary : gammaPrimary }
}

interface Known { readonly centroid: Point, readonly weightedArea: number, readonly size: number }

function aboutShearCentre(section: OpenSection, pieces: readonly Piece[], pole: Point, weigh: Weights, { centroid, weightedArea, size }: Known) {
  const { walked, omegaAt } = walk(pieces, pole)
  const raw = stationsOf(walked, pole, weigh.of)
  const mean = integral(raw, at => at.omega) / weightedArea
  const stations = raw.map(({ x, y, area, omega, t, tangent }) => ({ x, y, area, omega: omega - mean, t, tangent }))
  const { A, ...gammas } = gammasOf(stations, pole, size)
  const { gammaPrimary } = gammas
  const peak = peaks(walked, pole).map(one => ({ ...one, omega: one.omega - mean })).reduce((best, one) => (Math.abs(one.omega) > Math.abs(best.omega) ? one : best))
  const omegaMax = gammaPrimary === 0 ? 0 : Math.abs(peak.omega)
  const nodal = omegaAtNodes(section, walked, pole, omegaAt, mean)
  const scale = Math.max(omegaMax, 1e-6 * size * size) * A
  const Ips = integral(stations, at => distance(pole, at) ** 2)
  return {
    ...gammas, omegaAt: gammaPrimary === 0 ? Object.fromEntries(Object.keys(nodal).map(id => [id, 0])) : nodal, omegaMax, omegaMaxAt: peak.at,
    Ips, In: integral(stations, at => distance(pole, at) ** 4) - Ips * Ips / weightedArea, rhoMax: farthest(pieces, pole),
    residuals: {
      area: Math.abs(integral(stations, at => at.omega)) / scale,
      x: Math.abs(integral(stations, at => at.omega * (at.x - centroid.x))) / (scale * size),
      y: Math.abs(integral(stations, at => at.omega * (at.y - centroid.y))) / (scale * size),
    },
  }
}
