/**
 * Peak stress at an inside corner over the stress G·θ′·t on the flats
 * (methods reference §1.10). Outside what has been computed there is no factor,
 * and never a factor of one.
 */
import type { Junction, OpenSection, Refusal } from '#shared/torsion/section'
import type { MidLine, WallAtNode } from '#shared/torsion/mid-line'
import { refusal } from '#shared/torsion/section'
import { smoothTurn, tapers, turnBetween } from '#shared/torsion/mid-line'
import { midLineOf } from '#shared/torsion/section-check'
import { bendFactor } from '#shared/torsion/bend-factor'
import { machinedCornerTable } from '#shared/torsion/published'

export interface CornerValue {
  readonly ok: true
  readonly K: number
  /** The table of machined corners, or the closed form of a concentric bend. */
  readonly source: 'table' | 'bend'
  /** Thickness of the equal walls, mm, and inside radius over it. */
  readonly t: number
  readonly radiusRatio: number
}
export type CornerFactor = CornerValue | Refusal

export interface Corner { readonly node: string, readonly walls: readonly string[], readonly factor: CornerFactor }

/** A corner counts as a right angle within half a degree. */
export const rightAngleWithin = Math.PI / 360
/** Thicknesses count as equal within this part. */
const equalWithin = 1e-6

/**
 * Between the points of the table: the lesser of the chord in (r/t, K) and the
 * chord in their logarithms. The values are convex in both, so that either
 * chord lies above the curve and so does the lesser. Null outside the table.
 */
export function machinedFactor(ratio: number): number | null {
  const above = machinedCornerTable.findIndex(([x]) => x >= ratio)
  const upper = machinedCornerTable[above]
  if (!upper) return null
  if (upper[0] === ratio) return upper[1]
  const lower = machinedCornerTable[above - 1]
  if (!lower) return null
  const [[x0, k0], [x1, k1]] = [lower, upper]
  const chord = k0 + (k1 - k0) * (ratio - x0) / (x1 - x0)
  const logarithmic = k0 * (k1 / k0) ** (Math.log(ratio / x0) / Math.log(x1 / x0))
  return Math.min(chord, logarithmic)
}

const near = (a: number, b: number): boolean => Math.abs(a - b) <= equalWithin * Math.max(Math.abs(a), Math.abs(b))

const thicknessThere = ({ wall: { t, tEnd = t }, end }: WallAtNode): number => (end === 'start' ? t : tEnd)

/** Whether the mid-line runs on through a node with nothing changing: no corner at all. */
function runsOn(meeting: readonly WallAtNode[]): boolean {
  const [a, b] = meeting
  return meeting.length === 2 && !!a && !!b && turnBetween(a, b) < smoothTurn && near(thicknessThere(a), thicknessThere(b))
}

function twoWallFactor(junction: Junction, a: WallAtNode, b: WallAtNode): CornerFactor {
  const { node, radius, make } = junction
  const { t } = a.wall
  const turned = turnBetween(a, b)
  if (tapers(a.wall) || tapers(b.wall)) return refusal(`At ${node} a tapering wall meets; the tables hold for walls of one thickness.`)
  if (turned < smoothTurn) return refusal(`At ${node} the thickness steps from ${a.wall.t} to ${b.wall.t} mm; no factor is published here for a step.`)
  if (!near(a.wall.t, b.wall.t)) return refusal(`At ${node} walls of ${a.wall.t} and ${b.wall.t} mm meet; the tables hold for equal walls.`)
  if (!near(a.wall.G, b.wall.G)) return refusal(`At ${node} walls of differing shear modulus meet; the tables hold for one material.`)
  const radiusRatio = radius / t
  if (make === 'bent') {
    const K = bendFactor(radius, t)
    return K === null ? refusal(`The bend at ${node} needs an inside radius greater than zero.`) : { ok: true, K, source: 'bend', t, radiusRatio }
  }
  if (a.path.kind === 'arc' || b.path.kind === 'arc') return refusal(`At ${node} an arc wall meets at a corner; the table holds for straight walls.`)
  if (Math.abs(turned - Math.PI / 2) > rightAngleWithin) return refusal(`At ${node} the walls do not meet at a right angle, which the table is for.`)
  const K = machinedFactor(radiusRatio)
  const [[least], [most]] = [machinedCornerTable[0] ?? [0, 0], machinedCornerTable.at(-1) ?? [0, 0]]
  return K === null
    ? refusal(`At ${node} the fillet is ${radiusRatio.toPrecision(3)} t; the table runs from ${least} t to ${most} t.`)
    : { ok: true, K, source: 'table', t, radiusRatio }
}

function factorAt(node: string, meeting: readonly WallAtNode[], section: OpenSection): CornerFactor {
  const junction = section.junctions.find(one => one.node === node)
  if (!junction) return refusal(`The fillet or bend radius at ${node} is not given.`)
  const [a, b] = meeting
  if (!a || !b || meeting.length !== 2) return refusal(`At ${node} ${meeting.length} walls meet; the tables hold for two.`)
  return twoWallFactor(junction, a, b)
}

/** The corners of a drawn mid-line: every node where walls meet otherwise than running on. */
export function cornersOnMidLine(section: OpenSection, { atNode }: MidLine): Corner[] {
  return [...atNode].filter(([, meeting]) => meeting.length >= 2 && !runsOn(meeting)).map(([node, meeting]) => ({
    node, walls: meeting.map(({ wall }) => wall.id), factor: factorAt(node, meeting, section),
  }))
}

/** The factor at one node, or why there is none. */
export function cornerFactor(section: OpenSection, node: string): CornerFactor {
  const checked = midLineOf(section)
  if (!checked.ok) return checked
  const corner = cornersOnMidLine(section, checked.midLine).find(one => one.node === node)
  return corner?.factor ?? refusal(`At ${node} there is no corner.`)
}
