/**
 * Saint-Venant torsion of a thin-walled open section (methods reference §1.9,
 * §1.10): free warping, straight and arc walls, differing thickness and shear
 * modulus, thickness that tapers. N, mm, MPa, rad.
 */
import type { OpenSection, OpenSeam, Refusal } from '#shared/torsion/section'
import type { BulgeAtNode, JunctionBulge } from '#shared/torsion/junction-bulge'
import type { Corner } from '#shared/torsion/corner-factor'
import type { MidLine } from '#shared/torsion/mid-line'
import { refusal } from '#shared/torsion/section'
import { pathLength } from '#shared/torsion/geometry'
import { midLineOf } from '#shared/torsion/section-check'
import { bulgesOnMidLine } from '#shared/torsion/junction-bulge'
import { cornersOnMidLine } from '#shared/torsion/corner-factor'
import { endLossOf, wallStiffness } from '#shared/torsion/wall-stiffness'

export type { Junction, OpenSection, OpenWall, SectionNode, WallArc } from '#shared/torsion/section'

export interface WallTorsion {
  readonly id: string
  /** Between mid-line intersections, mm: what slenderness is judged on. */
  readonly L: number
  readonly slenderness: number
  /** Along the mid-line with half of each adjoining bend, mm. */
  readonly developed: number
  /** The length in L·t³/3: developed, but to the outer face or from the face at a junction whose bulge is added. */
  readonly effective: number
  /** The greatest thickness, mm: what the stress on the flat goes with. */
  readonly t: number
  readonly G: number
  /** Real free ends: 0, 1 or 2. */
  readonly freeEnds: number
  /** Its end at an L junction counted as free beside the bulge: 0, 1 or 2. */
  readonly cornerEnds: number
  /** What its free ends take off, N·mm², ≤ 0. */
  readonly endTerm: number
  /** N·mm², before corrections, after them, and as a part of the whole. */
  readonly plainGJ: number
  readonly GJ: number
  readonly share: number
}

export interface OpenTorsion {
  readonly ok: true
  /** N·mm² */
  readonly GJ: number
  /** GJ over the shear modulus, mm⁴; null where walls differ in it. */
  readonly J: number | null
  /** ΣG·L·t³/3 on the mid-line, and the corrections to it: plainGJ + lengthTerm + endTerm + bulgeTerm = GJ. */
  readonly plainGJ: number
  readonly lengthTerm: number
  readonly endTerm: number
  readonly bulgeTerm: number
  /** (|end term| + |bulge term|)/GJ: what G-11 judges. */
  readonly correctionShare: number
  /** What is taken off per t⁴ at each end. */
  readonly endLoss: number
  readonly perWall: readonly WallTorsion[]
  /** Whole mid-line with its bends, mm. */
  readonly developed: number
  /** Machined junctions with their bulge, or why none is added. */
  readonly bulges: readonly BulgeAtNode[]
  readonly corners: readonly Corner[]
  readonly seams: readonly OpenSeam[]
}

const applied = (bulges: readonly BulgeAtNode[]): JunctionBulge[] => bulges.map(({ bulge }) => bulge).filter(bulge => bulge.ok)
const sum = (values: readonly number[]): number => values.reduce((total, value) => total + value, 0)

/** A bulge is carried by the walls that meet there, through wall and abutting wall half each. */
function bulgeShare(bulge: JunctionBulge, wall: string): number {
  const part = wall === bulge.abutting ? 0.5 : bulge.through.includes(wall) ? 0.5 / bulge.through.length : 0
  return part * bulge.G * bulge.J
}

interface WallParts extends Omit<WallTorsion, 'share'> { readonly lengthTerm: number, readonly bulgeTerm: number }

function wallParts(section: OpenSection, { atNode, lengths, pieces }: MidLine, bulges: readonly JunctionBulge[]): WallParts[] {
  const ends = (id: string): number => atNode.get(id)?.length ?? 0
  return section.walls.map(({ id, from, to, t: start, tEnd = start, G }) => {
    const t = Math.max(start, tEnd)
    const developed = sum(pieces.flatMap(piece => piece.walls.filter(wall => wall.id === id).map(({ part }) => part * pathLength(piece.path))))
    const effective = developed + sum(bulges.map(bulge => bulge.lengthChange[id] ?? 0))
    const free = [...ends(from) === 1 ? [start] : [], ...ends(to) === 1 ? [tEnd] : []]
    const corners = bulges.filter(({ cornerEnd }) => cornerEnd === id).map(() => start)
    const stiffness = wallStiffness({ G, thickness: [start, tEnd], developed, effective, ends: [...free, ...corners], junctions: bulges.length > 0 })
    const bulgeTerm = sum(bulges.map(bulge => bulgeShare(bulge, id)))
    const L = lengths.get(id) ?? developed
    return { id, L, slenderness: L / t, developed, effective, t, G, freeEnds: free.length, cornerEnds: corners.length, ...stiffness, bulgeTerm, GJ: stiffness.plainGJ + stiffness.lengthTerm + stiffness.endTerm + bulgeTerm }
  })
}

/** Torsional stiffness of the section and each wall's part in it, with end correction, junction bulges and bends. */
export function torsionOfOpenSection(section: OpenSection): OpenTorsion | Refusal {
  const checked = midLineOf(section)
  if (!checked.ok) return checked
  const { midLine, seams } = checked
  const bulges = bulgesOnMidLine(section, midLine)
  const parts = wallParts(section, midLine, applied(bulges))
  const short = parts.find(({ effective, GJ }) => !(effective > 0 && GJ > 0))
  if (short) return refusal(`Wall ${short.id} is too short for its thickness: the corrections at its ends leave no stiffness. Use the general outline.`)
  const GJ = sum(parts.map(part => part.GJ))
  if (!Number.isFinite(GJ)) return refusal('The torsional stiffness is not a finite number. Check thicknesses and lengths.')
  const [endTerm, bulgeTerm] = [sum(parts.map(part => part.endTerm)), sum(parts.map(part => part.bulgeTerm))]
  const G = parts[0]?.G ?? 0
  return {
    ok: true, GJ, J: parts.every(part => part.G === G) ? GJ / G : null,
    plainGJ: sum(parts.map(part => part.plainGJ)), lengthTerm: sum(parts.map(part => part.lengthTerm)), endTerm, bulgeTerm,
    correctionShare: (Math.abs(endTerm) + Math.abs(bulgeTerm)) / GJ, endLoss: endLossOf(applied(bulges).length > 0),
    perWall: parts.map(({ lengthTerm: _length, bulgeTerm: _bulge, ...wall }) => ({ ...wall, share: wall.GJ / GJ })),
    developed: sum(parts.map(part => part.developed)), bulges, corners: cornersOnMidLine(section, midLine), seams,
  }
}
