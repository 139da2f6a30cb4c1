/** Inside corners of the cells: where the flow turns, and what the radius makes of its stress (methods §2.3). */
import type { ClosedSectionModel } from '#shared/calc/kinds/closed-section/parse'
import type { ModelJunction, ModelWall } from '#shared/calc/parts/wall-model'
import { cellCornerFactor, type CellCorner } from '#shared/torsion/cells/cell-corner'
import type { CellTorsion, CellWall } from '#shared/torsion/cells/torsion-of-cells'
import { turn } from '#shared/torsion/geometry'
import { refusal, type Refusal } from '#shared/torsion/section'

export interface CellCornerSolution {
  node: string
  junction: ModelJunction | null
  walls: ModelWall[]
  /** Of the wall whose stress is raised. */
  worst: ModelWall
  /** Smallest angle between two walls, rad. */
  between: number
  ratio: number
  sharp: boolean
  factor: CellCorner | Refusal
  /** K·|q|/t per θ′, N/mm; null where there is no factor. */
  perRate: number | null
}

/** A turn of less than this is no corner. */
const STRAIGHT = 5 * Math.PI / 180
/** The factors come from right angles; a sharper corner raises the stress more. */
const RIGHT = Math.PI / 2 * (1 - 1e-6)

export function cellCorners(model: ClosedSectionModel, torsion: CellTorsion): CellCornerSolution[] {
  const results = new Map(torsion.walls.map(wall => [wall.id, wall]))
  return model.nodes.flatMap((node): CellCornerSolution[] => {
    const meeting = model.walls.filter(wall => wall.from === node.id || wall.to === node.id)
    const walls = meeting.filter(wall => results.get(wall.id)?.fin === false)
    const junction = model.junctions.find(j => j.node === node.id) ?? null
    const between = smallestAngle(walls, node.id)
    if (walls.length < 2 || (between > Math.PI - STRAIGHT && junction === null)) return []
    return [cornerOf(node.id, junction, walls, between, results)]
  })
}

const leaving = (wall: ModelWall, node: string): number => (wall.from === node ? wall.startDirection : wall.endDirection + Math.PI)

function smallestAngle(walls: readonly ModelWall[], node: string): number {
  let least = Math.PI
  walls.forEach((a, i) => walls.slice(i + 1).forEach((b) => {
    least = Math.min(least, Math.abs(turn(leaving(a, node) - leaving(b, node))))
  }))
  return least
}

function cornerOf(node: string, junction: ModelJunction | null, walls: ModelWall[], between: number, results: ReadonlyMap<string, CellWall>): CellCornerSolution {
  const mean = (wall: ModelWall) => results.get(wall.id)?.meanPerRate ?? 0
  const [first] = walls as [ModelWall]
  const radius = junction?.radius.value ?? 0
  const stressed = walls.map(wall => ({ wall, factor: factorOf(junction, wall, walls.length, between) }))
  const refused = stressed.find(one => !one.factor.ok)
  const of = ({ wall, factor }: (typeof stressed)[number]) => (factor.ok ? factor.K : 1) * mean(wall)
  const worst = refused ?? stressed.reduce((high, one) => (of(one) > of(high) ? one : high))
  return {
    node, junction, walls, between, worst: worst.wall, ratio: radius / (worst.wall ?? first).t.value, sharp: radius === 0, factor: worst.factor,
    perRate: worst.factor.ok ? worst.factor.K * mean(worst.wall) : null,
  }
}

function factorOf(junction: ModelJunction | null, wall: ModelWall, count: number, between: number): CellCorner | Refusal {
  if (count > 2) return refusal('Three or more walls of cells meet here; the factors are for two.')
  if (between < RIGHT) return refusal('The walls meet at less than a right angle; the factors are for right angles and wider ones.')
  return cellCornerFactor(junction?.radius.value ?? 0, wall.t.value, junction?.make ?? 'machined')
}
