/** Inner corners: where walls meet, how far the material turns there, and the stress factor or the reason why none is given. */
import { thicknessAtNode, type ModelJunction, type ModelWall } from '#shared/calc/parts/wall-model'
import type { OpenSectionModel } from '#shared/calc/kinds/open-section/model'
import type { CornerSolution } from '#shared/calc/kinds/open-section/solution'
import type { OpenTorsion } from '#shared/torsion/open-section'

/** A material angle above this is a re-entrant corner (G-10). */
const RE_ENTRANT = 185 * Math.PI / 180

export function cornersOf(model: OpenSectionModel, torsion: OpenTorsion): CornerSolution[] {
  return torsion.corners.flatMap(({ node, walls: ids, factor }): CornerSolution[] => {
    const walls = ids.flatMap(id => model.walls.find(w => w.id === id) ?? [])
    const first = walls[0]
    if (!first) return []
    const junction = model.junctions.find(j => j.node === node) ?? null
    const interior = materialAngle(node, walls)
    const step = walls.length === 2 && walls.some(w => thicknessAtNode(w, node) !== thicknessAtNode(first, node))
    const reEntrant = interior > RE_ENTRANT || step
    if (!reEntrant && !junction) return []
    const thickest = walls.reduce((a, b) => b.tMax > a.tMax ? b : a)
    return [{
      node, junction, walls, interior: step ? Math.max(interior, 1.5 * Math.PI) : interior,
      factor: factor.ok ? { ok: true, K: factor.K, source: factor.source === 'bend' ? 'closed form of a concentric bend' : 'table of machined right angles' } : { ok: false, reason: withoutPlace(factor.reason) },
      sharp: reEntrant && !hasRadius(junction), ratio: (junction?.radius.value ?? 0) / thickest.tMax,
      worst: walls.reduce((a, b) => b.G * b.tMax > a.G * a.tMax ? b : a),
    }]
  })
}

const hasRadius = (junction: ModelJunction | null) => junction !== null && junction.radius.value > 0

/** 2π less the smallest angle between neighbouring walls as they leave the node. */
function materialAngle(node: string, walls: ModelWall[]): number {
  const directions = walls.map(w => leaving(w, node)).sort((a, b) => a - b)
  const gaps = directions.map((d, i) => {
    const next = directions[i + 1]
    return next === undefined ? (directions[0] ?? 0) + 2 * Math.PI - d : next - d
  })
  return 2 * Math.PI - Math.min(...gaps)
}

function leaving(wall: ModelWall, node: string): number {
  const full = 2 * Math.PI
  const angle = wall.from === node ? wall.startDirection : wall.endDirection + Math.PI
  return ((angle % full) + full) % full
}

/** The guard names the node itself, so the engine's “At 2 walls of …” becomes “Walls of …”. */
function withoutPlace(reason: string): string {
  const rest = reason.replace(/^At \S+ /u, '')
  return rest.charAt(0).toUpperCase() + rest.slice(1)
}
