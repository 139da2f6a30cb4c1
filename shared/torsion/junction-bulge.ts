/**
 * The torsion constant that the material of a machined junction adds
 * (El Darwish & Johnston 1965, methods reference §1.10), for right-angled L and
 * T junctions in one material, inside the range in which it was verified.
 */
import type { OpenSection, Refusal } from '#shared/torsion/section'
import type { MidLine, WallAtNode } from '#shared/torsion/mid-line'
import { refusal } from '#shared/torsion/section'
import { smoothTurn, tapers, turnBetween } from '#shared/torsion/mid-line'
import { bulgeOfL, bulgeOfT } from '#shared/torsion/junction-formula'
import { rightAngleWithin } from '#shared/torsion/corner-factor'

export interface JunctionBulge {
  readonly ok: true
  readonly form: 'L' | 'T'
  readonly alpha: number
  /** Largest circle inscribed at the junction, mm. */
  readonly D: number
  /** α·D⁴, mm⁴. */
  readonly J: number
  readonly G: number
  readonly through: readonly string[]
  readonly abutting: string
  /** What the formula's lengths differ from the mid-line lengths by, mm. */
  readonly lengthChange: Readonly<Record<string, number>>
  /** The wall whose end at the corner is counted as free: the through wall of an L. */
  readonly cornerEnd: string | null
}
export type BulgeAtNode = { readonly node: string, readonly bulge: JunctionBulge | Refusal }

interface Range { readonly thickness: readonly [number, number], readonly radius: readonly [number, number] }

/**
 * Ranges of t₂/t₁ and r/t₁ in which the formula was compared with finite
 * differences of the stress function: J within +0.3 % and −0.6 %. Beyond r/t₁
 * of 1 it is up to 7 % high where the walls differ, so only equal walls of an
 * L go further.
 */
const ranges = {
  equalL: { thickness: [1, 1], radius: [0.125, 2] },
  L: { thickness: [0.5, 1], radius: [0.125, 1] },
  T: { thickness: [0.25, 1], radius: [0.125, 1] },
} as const satisfies Record<string, Range>

const rangeOf = (form: 'L' | 'T', t1: number, t2: number): Range => (form === 'L' && t1 === t2 ? ranges.equalL : ranges[form])

function outOfRange(form: 'L' | 'T', node: string, t1: number, t2: number, r: number): Refusal | null {
  const { thickness, radius } = rangeOf(form, t1, t2)
  const [x, y] = [t2 / t1, r / t1]
  const within = (value: number, [low, high]: readonly [number, number]): boolean => value >= low * (1 - 1e-9) && value <= high * (1 + 1e-9)
  if (!within(x, thickness)) return refusal(`At ${node} the abutting wall is ${x.toPrecision(3)} of the through wall; the junction formula is verified from ${thickness[0]} to ${thickness[1]}.`)
  if (!within(y, radius)) return refusal(`At ${node} the fillet is ${y.toPrecision(3)} of the through wall; the junction formula is verified from ${radius[0]} to ${radius[1]}.`)
  return null
}

const perpendicular = (a: WallAtNode, b: WallAtNode): boolean => Math.abs(turnBetween(a, b) - Math.PI / 2) <= rightAngleWithin

/** Thicker wall first; of equal walls the longer, so that the result does not hang on the order of the table. */
function throughFirst(meeting: readonly [WallAtNode, WallAtNode], lengths: ReadonlyMap<string, number>): readonly [WallAtNode, WallAtNode] {
  const [a, b] = meeting
  const size = ({ wall }: WallAtNode): number => lengths.get(wall.id) ?? 0
  return b.wall.t > a.wall.t || (b.wall.t === a.wall.t && size(b) > size(a)) ? [b, a] : [a, b]
}

function bulgeL2(node: string, r: number, meeting: readonly [WallAtNode, WallAtNode], lengths: ReadonlyMap<string, number>): JunctionBulge | Refusal {
  const [through, abutting] = throughFirst(meeting, lengths)
  if (!perpendicular(through, abutting)) return refusal(`At ${node} the walls do not meet at a right angle, which the junction formula is for.`)
  const [t1, t2] = [through.wall.t, abutting.wall.t]
  return outOfRange('L', node, t1, t2, r) ?? {
    ok: true, form: 'L', ...bulgeOfL(t1, t2, r), G: through.wall.G, through: [through.wall.id], abutting: abutting.wall.id,
    lengthChange: { [through.wall.id]: t2 / 2, [abutting.wall.id]: -t1 / 2 }, cornerEnd: through.wall.id,
  }
}

function bulgeT3(node: string, r: number, meeting: readonly WallAtNode[]): JunctionBulge | Refusal {
  const stem = meeting.find(one => meeting.every(other => other === one || perpendicular(one, other)))
  const [a, b] = meeting.filter(one => one !== stem)
  if (!stem || !a || !b || turnBetween(a, b) > smoothTurn) return refusal(`At ${node} three walls meet otherwise than as a T; the junction formula is for a T.`)
  if (a.wall.t !== b.wall.t) return refusal(`At ${node} the flange has two thicknesses; the junction formula is for one.`)
  const [t1, t2] = [a.wall.t, stem.wall.t]
  return outOfRange('T', node, t1, t2, r) ?? {
    ok: true, form: 'T', ...bulgeOfT(t1, t2, r), G: a.wall.G, through: [a.wall.id, b.wall.id], abutting: stem.wall.id,
    lengthChange: { [stem.wall.id]: -t1 / 2 }, cornerEnd: null,
  }
}

function bulgeAt(node: string, r: number, meeting: readonly WallAtNode[], { lengths }: MidLine): JunctionBulge | Refusal {
  const [a, b] = meeting
  if (!a || !b || meeting.length > 3) return refusal(`At ${node} ${meeting.length} walls meet; the junction formula is for an L or a T.`)
  if (meeting.some(({ path }) => path.kind === 'arc')) return refusal(`At ${node} an arc wall meets; the junction formula is for straight walls.`)
  if (meeting.some(({ wall }) => tapers(wall))) return refusal(`At ${node} a tapering wall meets; the junction formula is for walls of one thickness.`)
  if (meeting.some(({ wall }) => wall.G !== a.wall.G)) return refusal(`At ${node} walls of differing shear modulus meet; the junction formula is for one material.`)
  return meeting.length === 2 ? bulgeL2(node, r, [a, b], lengths) : bulgeT3(node, r, meeting)
}

/** The bulge at every machined corner of a drawn mid-line, or why the formula does not apply there. */
export function bulgesOnMidLine(section: OpenSection, midLine: MidLine): BulgeAtNode[] {
  return section.junctions
    .filter(({ make }) => make === 'machined')
    .map(({ node, radius }) => ({ node, radius, meeting: midLine.atNode.get(node) ?? [] }))
    .filter(({ meeting: [a, b, c] }) => a && b && (c || turnBetween(a, b) >= smoothTurn))
    .map(({ node, radius, meeting }) => ({ node, bulge: bulgeAt(node, radius, meeting, midLine) }))
}
