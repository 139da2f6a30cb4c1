/**
 * The sectorial coordinate and its statical moment along every stretch of an open section, and the stresses
 * of restrained warping at the same fibre (methods §3.3). mm², mm⁴; MPa.
 */
import { thicknessAt } from '#shared/torsion/mid-line'
import { midLineOf } from '#shared/torsion/section-check'
import { pathLength, pathPoint, tangentAt } from '#shared/torsion/geometry'
import { refusal, type OpenSection, type Point, type Refusal } from '#shared/torsion/section'
import { sectorialGrowth } from '#shared/torsion/sectorial-growth'
import { sectorialProperties, type SectorialProperties } from '#shared/torsion/sectorial'
import { gatherFromFreeEdges } from '#shared/torsion/shear/gather'
import { rulePoints, stationsOf, walk } from '#shared/torsion/stations'

/** A fibre of the mid-line. */
export interface Fibre {
  /** The wall, or the bend between two walls as `bend 3`. */
  readonly wall: string
  readonly at: Point
  readonly t: number
  readonly G: number
  /** E of the wall over the E that the section is referred to. */
  readonly weight: number
  /** Normalised ω on the mid-line, and what varies to the face through the thickness where walls meet in one point. */
  readonly omega: number
  readonly across: number
  /** S_ω gathered from the free edges along from → to of the wall. */
  readonly S: number
}

export interface SectorialRun {
  readonly ok: true
  readonly properties: SectorialProperties
  readonly fibres: readonly Fibre[]
  /** |∫S_ω dω + Γ| / Γ of the mid-line: rounding. */
  readonly residual: number
}

/** Points along each stretch at which ω and S_ω are given. */
const PARTS: readonly number[] = [0, 1, 2, 3, 4, 5, 6, 7, 8].map(i => i / 8)

/** @returns the refusal of the sectorial properties where they cannot be given. */
export function sectorialRun(section: OpenSection): SectorialRun | Refusal {
  const properties = sectorialProperties(section)
  if (!properties.ok) return properties
  const checked = midLineOf(section)
  if (!checked.ok) return refusal(checked.reason)
  const { shearCentre: pole, gammaPrimary, gammaSecondary, referenceE } = properties
  const { pieces } = checked.midLine
  const { walked } = walk(pieces, pole)
  const weigh = (E: number | null) => (E === null || referenceE === null ? 1 : E / referenceE)
  const stations = stationsOf(walked, pole, piece => weigh(piece.E))
  const mean = stations.reduce((sum, one) => sum + one.area * one.omega, 0) / properties.weightedArea
  const runs = walked.map(({ piece, startOmega }) => {
    const length = pathLength(piece.path)
    const omega = (part: number) => startOmega - mean + sectorialGrowth(piece.path, pole, part)
    const moment = (part: number) => part * length * weigh(piece.E) * rulePoints(piece.path).reduce((sum, one) => sum + one.weight * thicknessAt(piece, part * one.part) * omega(part * one.part), 0)
    return { piece, length, omega, moment }
  })
  const start = gatherFromFreeEdges(runs.map(({ piece }) => piece), runs.map(({ moment }) => moment(1)))
  const secondary = gammaSecondary > 0.1 * gammaPrimary
  const fibres = runs.flatMap(({ piece, omega, moment }, i) => partsOf(omega).map((part): Fibre => {
    const at = pathPoint(piece.path, part)
    const tangent = tangentAt(piece.path, part)
    const along = (at.x - pole.x) * Math.cos(tangent) + (at.y - pole.y) * Math.sin(tangent)
    return {
      wall: piece.bendAt === null ? piece.walls[0]?.id ?? '' : `bend ${piece.bendAt}`, at, t: thicknessAt(piece, part), G: piece.G, weight: weigh(piece.E),
      omega: gammaPrimary === 0 ? 0 : omega(part), across: secondary ? Math.abs(along) * thicknessAt(piece, part) / 2 : 0, S: gammaPrimary === 0 ? 0 : (start[i] ?? 0) + moment(part),
    }
  }))
  // ∫S dω by parts on each stretch: [S ω] − ∫ω dS, with dS = ω t ds.
  const closed = runs.reduce((sum, { piece, length, omega, moment }, i) => {
    const S = (part: number) => (start[i] ?? 0) + moment(part)
    const square = length * weigh(piece.E) * rulePoints(piece.path).reduce((total, one) => total + one.weight * thicknessAt(piece, one.part) * omega(one.part) ** 2, 0)
    return sum + S(1) * omega(1) - S(0) * omega(0) - square
  }, 0)
  return { ok: true, properties, fibres, residual: gammaPrimary === 0 ? 0 : Math.abs(closed + gammaPrimary) / gammaPrimary }
}

/** The equal parts, and where ω passes through zero between two of them: there the flow has its extreme. */
function partsOf(omega: (part: number) => number): number[] {
  return PARTS.flatMap((part, i) => {
    const next = PARTS[i + 1]
    return next === undefined || omega(part) * omega(next) >= 0 ? [part] : [part, zeroBetween(omega, part, next)]
  })
}

function zeroBetween(value: (part: number) => number, from: number, to: number): number {
  let [low, high] = [from, to]
  for (let i = 0; i < 60; i += 1) {
    const middle = (low + high) / 2
    if (value(low) * value(middle) <= 0) high = middle
    else low = middle
  }
  return (low + high) / 2
}

export interface FibreStress {
  readonly fibre: Fibre
  /** σ_ω with what else stretches the bar, at the worse face, MPa, with its sign. */
  readonly sigma: number
  /** τ_SV at the faces and the mean τ_ω of the flow, MPa, magnitudes. */
  readonly tauSv: number
  readonly tauOmega: number
  /** Shear stress along from → to on the face that lies to the left of the wall and to its right, MPa: twist runs round the wall, the flow along it. */
  readonly left: number
  readonly right: number
}

/** What a station does to its fibres: B in N·mm², T_ω in N·mm, φ′ in rad/mm, and the mean stress of an axial force, MPa. */
export interface StationAction { readonly B: number, readonly Tw: number, readonly rate: number, readonly axial?: number }

/** σ at the worse face from the bimoment and the axial stress on the reference modulus. */
const worseSigma = ({ omega, across, weight }: Fibre, perOmega: number, axial: number): number => {
  const mid = weight * (perOmega * omega + axial)
  return mid + (mid < 0 ? -1 : 1) * weight * Math.abs(perOmega) * across
}

/** The stresses of one fibre at one station. */
export function fibreStress(fibre: Fibre, gamma: number, { B, Tw, rate, axial = 0 }: StationAction): FibreStress {
  const { S, t, G } = fibre
  const twist = G * t * rate
  const flow = gamma === 0 ? 0 : -Tw * S / (gamma * t)
  return { fibre, sigma: worseSigma(fibre, gamma === 0 ? 0 : B / gamma, axial), tauSv: Math.abs(twist), tauOmega: Math.abs(flow), left: flow - twist, right: flow + twist }
}

/** The stresses of one station at every fibre: what is combined stands at one place and one station. */
export const fibreStresses = ({ fibres, properties }: SectorialRun, action: StationAction): FibreStress[] =>
  fibres.map(fibre => fibreStress(fibre, properties.gamma, action))

/** The largest stress of each sort at one station, with its fibre. */
export function worstStresses(stresses: readonly FibreStress[]): { sigma: FibreStress, tauOmega: FibreStress, tau: FibreStress } | null {
  const [first] = stresses
  if (!first) return null
  const worst = (value: (one: FibreStress) => number) => stresses.reduce((high, one) => (value(one) > value(high) ? one : high), first)
  return { sigma: worst(one => Math.abs(one.sigma)), tauOmega: worst(one => one.tauOmega), tau: worst(one => one.tauOmega + one.tauSv) }
}
