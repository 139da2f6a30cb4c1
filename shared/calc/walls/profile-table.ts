/** The walls of a profile as a wall table: shown beside it, and what it becomes when it is edited as walls. */
import { noLinks, type Links } from '#shared/calc/links'
import { readProfile, thicknessOf } from '#shared/calc/parts/parse-profile'
import type { ProfileInput } from '#shared/calc/parts/profile-fields'
import type { JunctionInput, WallTable } from '#shared/calc/parts/wall-fields'
import { typedReader } from '#shared/calc/parts/typed-reader'
import type { TypedQuantity } from '#shared/calc/types'
import { readTyped, type PlacedSection, type PlacedWall } from '#shared/calc/walls/placed'
import { writtenTable } from '#shared/calc/walls/written'
import type { UnitId } from '#shared/units/units'

const nothing: TypedQuantity = { text: '', unit: 'mm' }

/** Null while the dimensions give no section. Thickness and radius keep what was typed, with their links. */
export function profileTable(profile: ProfileInput, unit: UnitId, links: Links = noLinks): WallTable | null {
  const got = readProfile(profile, { G: 1 }, typedReader(links))
  if (!got) return null
  const { made: { section, names }, dimensions } = got
  const typed = profile as Record<string, unknown>
  const walls = section.walls.map((wall): PlacedWall => {
    const key = thicknessOf(wall.t, dimensions)?.key
    const input = {
      id: wall.id, name: names[wall.id] ?? '', from: wall.from, to: wall.to, end: { by: 'point' as const, x: nothing, y: nothing },
      t: key === undefined ? nothing : typed[key] as TypedQuantity, material: profile.material,
    }
    const arc = wall.arc ? { radius: wall.arc.radius, sweep: wall.arc.sweep, direction: wall.arc.startDirection ?? 0 } : null
    return { id: wall.id, from: wall.from, to: wall.to, arc, input }
  })
  const junctions = 'make' in profile ? section.junctions.map(({ node, make }): JunctionInput => ({ node, make, radius: profile.radius })) : []
  const placed: PlacedSection = { nodes: new Map(section.nodes.map(({ id, x, y }) => [id, { x, y }])), walls, junctions, loose: [] }
  return writtenTable(placed, { start: { x: nothing, y: nothing } }, { unit, read: readTyped(links) })
}
