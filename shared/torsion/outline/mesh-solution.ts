/** Everything read from the shear on one mesh, in mm, and the checks that hold on any section. */
import type { OutlineEdge, PlanePoint } from '#shared/torsion/outline/outline'
import type { SoundOutline } from '#shared/torsion/outline/outline-check'
import type { BoundaryPeak, Disc } from '#shared/torsion/outline/boundary-peaks'
import type { BoundaryShear } from '#shared/torsion/outline/boundary-shear'
import type { PanelMesh, Stretch } from '#shared/torsion/outline/panels'
import type { ReentrantVertex } from '#shared/torsion/outline/reentrant'
import { boundaryPeaks } from '#shared/torsion/outline/boundary-peaks'
import { boundaryShear } from '#shared/torsion/outline/boundary-shear'
import { signedArea } from '#shared/torsion/outline/outline-properties'
import { panelMesh } from '#shared/torsion/outline/panels'
import { constantFromMoment, constantFromSquares } from '#shared/torsion/outline/torsion-constant'
import { trefftzCentre, warpingConstant, warpingMoments, warpingOnBoundary } from '#shared/torsion/outline/warping-function'

/** Gauss nodes on a panel. */
export const panelOrder = 6

/** Something that must vanish or agree on any section, as a part of its natural size. */
export interface SelfCheck {
  readonly name: string
  readonly value: number
  readonly limit: number
  readonly ok: boolean
  /** Holds on every mesh, however coarse: it concerns the geometry only. */
  readonly geometry: boolean
}

export interface MeshSolution {
  readonly unknowns: number
  readonly J: number
  readonly peaks: readonly BoundaryPeak[]
  readonly shearCentre: PlanePoint
  readonly gamma: number | null
  readonly holePhi: readonly number[]
  readonly checks: readonly SelfCheck[]
}

const selfCheck = (name: string, value: number, limit: number, geometry = false): SelfCheck => ({ name, value: Math.abs(value), limit, ok: Math.abs(value) <= limit, geometry })

/** Area and polar moment of the panels by their nodes. */
function areaOfPanels({ count, x, y, nx, ny, w }: PanelMesh): { A: number, Ip: number } {
  let [A, Ip] = [0, 0]
  for (let i = 0; i < count; i += 1) {
    const [px, py] = [x[i] as number, y[i] as number]
    const reach = (w[i] as number) * (px * (nx[i] as number) + py * (ny[i] as number))
    A += reach / 2
    Ip += reach * (px * px + py * py) / 4
  }
  return { A, Ip }
}

/** Signed areas of the loops, the outer first, in squared lengths of the mesh. */
function loopAreas(edges: readonly OutlineEdge[], loops: number, scale: number): number[] {
  return Array.from({ length: loops }, (_, loop) => signedArea(edges.filter(edge => edge.loop === loop)) / (scale * scale))
}

interface Constants { readonly squares: number, readonly moment: number }

function selfChecks(sound: SoundOutline, mesh: PanelMesh, { loopPhi }: BoundaryShear, { squares, moment }: Constants, sharp: boolean): SelfCheck[] {
  const { A, Ip } = sound.properties
  const byPanels = areaOfPanels(mesh)
  const checks = [
    selfCheck('area by the panels against the exact area', byPanels.A * sound.size ** 2 / A - 1, 1e-6, true),
    selfCheck('polar moment by the panels against the exact moment', byPanels.Ip * sound.size ** 4 / Ip - 1, 1e-5, true),
    selfCheck('stress function on the outer loop, which is zero, over the area', (loopPhi[0] ?? 0) * sound.size ** 2 / A, 1e-3),
  ]
  // A sharp re-entrant vertex spoils the squares, so that they are no check there.
  return sharp ? checks : [...checks, selfCheck('torsion constant by the moment of the shear against that by its squares', moment / squares - 1, 0.02)]
}

/** Solves on the given panels. Null where the equations are singular. */
export function solveOnMesh(sound: SoundOutline, stretches: readonly Stretch[], vertices: readonly ReentrantVertex[]): MeshSolution | null {
  const { properties, size, edges } = sound
  const mesh = panelMesh(stretches, panelOrder, properties.centroid, size)
  const areas = loopAreas(edges, mesh.loops, size)
  const solved = boundaryShear(mesh, areas)
  if (!solved) return null
  const constants = { squares: constantFromSquares(mesh, solved.tau), moment: constantFromMoment(mesh, solved.tau, properties.Ip / size ** 4) }
  const phi = warpingOnBoundary(mesh, solved, areas)
  const moments = warpingMoments(mesh, phi)
  const second = { A: properties.A / size ** 2, Ixx: properties.Ixx / size ** 4, Iyy: properties.Iyy / size ** 4, Ixy: properties.Ixy / size ** 4 }
  const centre = trefftzCentre(moments, second)
  const discs: Disc[] = vertices.map(({ at, excluded }) => ({ at, radius: excluded }))
  const sharp = vertices.length > 0
  return {
    unknowns: mesh.count,
    J: (sharp ? constants.moment : constants.squares) * size ** 4,
    peaks: boundaryPeaks(mesh, solved.tau, size, size, discs),
    shearCentre: { x: properties.centroid.x + size * centre.x, y: properties.centroid.y + size * centre.y },
    gamma: mesh.loops === 1 ? warpingConstant(mesh, phi, moments, second) * size ** 6 : null,
    holePhi: [...solved.loopPhi.slice(1)].map(value => value * size ** 2),
    checks: selfChecks(sound, mesh, solved, constants, sharp),
  }
}
