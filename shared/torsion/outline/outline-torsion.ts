/**
 * Torsion of a section given by its outline: the independent second method
 * (§4). A boundary-integral equation for the shear itself, panels with six
 * Gauss nodes on the exact lines and arcs, exact integrals near the panels,
 * three meshes of one family, refined further where they do not yet agree.
 */
import type { Outline, OutlineRefusal, PlanePoint } from '#shared/torsion/outline/outline'
import type { SoundOutline } from '#shared/torsion/outline/outline-check'
import type { AreaProperties } from '#shared/torsion/outline/outline-properties'
import type { BoundaryPeak } from '#shared/torsion/outline/boundary-peaks'
import type { EdgeDensity } from '#shared/torsion/outline/mesh-density'
import type { MeshEstimate } from '#shared/torsion/outline/convergence'
import type { ReentrantVertex } from '#shared/torsion/outline/reentrant'
import type { MeshSolution, SelfCheck } from '#shared/torsion/outline/mesh-solution'
import { outlineRefusal } from '#shared/torsion/outline/outline'
import { checkOutline } from '#shared/torsion/outline/outline-check'
import { estimateFromMeshes } from '#shared/torsion/outline/convergence'
import { meshDensity, meshStretches } from '#shared/torsion/outline/mesh-density'
import { solveOnMesh, panelOrder } from '#shared/torsion/outline/mesh-solution'
import { uncertaintyLimits } from '#shared/torsion/outline/published'
import { reentrantVertices } from '#shared/torsion/outline/reentrant'

/** Greatest shear per G·θ′ (mm) with its place; the next greatest on other edges follow. */
export interface ShearPeaks { readonly estimate: MeshEstimate, readonly first: BoundaryPeak, readonly next: readonly BoundaryPeak[] }

export type PeakShear
  = | { readonly bounded: true, readonly peaks: ShearPeaks }
    /** Sharp re-entrant vertices: no greatest shear exists. `outside`: greatest value outside their discs, never to be shown without saying so. */
    | { readonly bounded: false, readonly vertices: readonly ReentrantVertex[], readonly outside: ShearPeaks | null }

export interface OutlineTorsion {
  readonly ok: true
  /** mm⁴ */
  readonly J: MeshEstimate
  readonly shear: PeakShear
  /** mm, in the axes of the outline. */
  readonly shearCentre: PlanePoint
  /** How far the shear centre moved between the last two meshes, mm. */
  readonly shearCentreMoved: number
  /** Warping constant about the shear centre, mm⁶; null with holes, where it is not computed. */
  readonly gamma: MeshEstimate | null
  /** Φ on each hole, mm²: the shear flow round it is G·θ′·Φ. */
  readonly holePhi: readonly number[]
  readonly properties: AreaProperties
  /** Unknowns of the last three meshes. */
  readonly unknowns: readonly [number, number, number]
  readonly checks: readonly SelfCheck[]
}

export interface OutlineOptions {
  /** Most unknowns of a mesh; time grows with the cube. */
  readonly mostUnknowns?: number
}

/** Density of the coarsest mesh. */
const baseDensity = 0.125
const defaultMost = 2000
/** Below these parts of uncertainty no finer mesh is made. */
const enough = { J: 2e-4, tau: 4e-3 }

function shearEstimate(solutions: readonly MeshSolution[]): ShearPeaks | null {
  const [a, b, c] = solutions.map(({ peaks }) => peaks[0])
  const [first, ...next] = solutions.at(-1)?.peaks ?? []
  return a && b && c && first ? { estimate: estimateFromMeshes(a.tau, b.tau, c.tau), first, next: next.slice(0, 2) } : null
}

const estimateOf = (solutions: readonly MeshSolution[], pick: (one: MeshSolution) => number): MeshEstimate => {
  const [a, b, c] = solutions.slice(-3).map(pick)
  return estimateFromMeshes(a ?? 0, b ?? 0, c ?? 0)
}

/** Whether the last three meshes agree well enough to stop. Where the shear is unbounded, what is left of it need only be accepted. */
function settled(solutions: readonly MeshSolution[], bounded: boolean): boolean {
  const J = estimateOf(solutions, one => one.J)
  const tau = shearEstimate(solutions.slice(-3))?.estimate
  return J.uncertainty <= enough.J * J.value && (!tau || tau.uncertainty <= (bounded ? enough.tau : uncertaintyLimits.tau) * tau.value)
}

function failedCheck(checks: readonly SelfCheck[]): OutlineRefusal | null {
  const failed = checks.find(({ ok }) => !ok)
  return failed ? outlineRefusal(`The solution fails its own check (${failed.name}: ${failed.value.toExponential(1)}, at most ${failed.limit.toExponential(1)}). The walls are too thin for this method; use the thin-walled one.`) : null
}

const tooLarge = (unknowns: number, most: number): OutlineRefusal =>
  outlineRefusal(`The outline needs ${unknowns} unknowns, at most ${most} are taken. Draw curves as arcs and leave out details that carry no torsion, or use the thin-walled methods.`)

/** Solutions on meshes that double, at least three, more until they agree or the next would be too large. */
function solutionsOf(sound: SoundOutline, densities: readonly EdgeDensity[], vertices: readonly ReentrantVertex[], most: number): MeshSolution[] | OutlineRefusal {
  const solutions: MeshSolution[] = []
  for (let refine = 1; ; refine *= 2) {
    const stretches = meshStretches(densities, baseDensity, refine)
    const unknowns = stretches.length * panelOrder
    if (refine > 4 && (unknowns > most || settled(solutions, vertices.length === 0))) return solutions
    if (refine === 1 && 4 * unknowns > most) return tooLarge(4 * unknowns, most)
    const solution = solveOnMesh(sound, stretches, vertices)
    if (!solution) return outlineRefusal('The equations of the outline have no solution to working accuracy; check it for gaps and walls far thinner than the rest.')
    const failed = failedCheck(solution.checks.filter(({ geometry }) => geometry))
    if (failed) return failed
    solutions.push(solution)
  }
}

function peakShear(solutions: readonly MeshSolution[], vertices: readonly ReentrantVertex[]): PeakShear | null {
  const peaks = shearEstimate(solutions)
  if (vertices.length) return { bounded: false, vertices, outside: peaks }
  return peaks && { bounded: true, peaks }
}

/**
 * Torsion constant, peak boundary shear, shear centre and warping constant of
 * an outline (mm), with the order and uncertainty seen on three meshes. Sharp
 * re-entrant vertices leave the peak unbounded. Refused where the outline is
 * unsound, needs too many unknowns, or fails its own checks.
 */
export function outlineTorsion(outline: Outline, { mostUnknowns = defaultMost }: OutlineOptions = {}): OutlineTorsion | OutlineRefusal {
  const sound = checkOutline(outline)
  if (!sound.ok) return sound
  // Every edge carries a panel at least, on the third mesh four: refused before any work.
  const least = 4 * panelOrder * sound.edges.length
  if (least > mostUnknowns) return tooLarge(least, mostUnknowns)
  const vertices = reentrantVertices(sound)
  const found = solutionsOf(sound, meshDensity(sound), vertices, mostUnknowns)
  if ('ok' in found) return found
  const solutions = found.slice(-3)
  const [coarse, middle, fine] = solutions
  const shear = peakShear(solutions, vertices)
  if (!coarse || !middle || !fine || !shear) return outlineRefusal('The shear along the outline could not be read; check the outline.')
  const failed = failedCheck(fine.checks)
  if (failed) return failed
  return {
    ok: true, J: estimateOf(solutions, one => one.J), shear, shearCentre: fine.shearCentre,
    shearCentreMoved: Math.hypot(fine.shearCentre.x - middle.shearCentre.x, fine.shearCentre.y - middle.shearCentre.y),
    gamma: fine.gamma === null ? null : estimateOf(solutions, one => one.gamma ?? 0),
    holePhi: fine.holePhi, properties: sound.properties, unknowns: [coarse.unknowns, middle.unknowns, fine.unknowns], checks: fine.checks,
  }
}
