/** How deep a cell is: its least width across any of its walls, mm. What holds its shape is judged by it (G-15). */
import type { WallSection } from '#shared/torsion/cells/wall-graph'
import { pathPoints, wallPath } from '#shared/torsion/geometry'
import type { Point } from '#shared/torsion/section'

const COARSE = Math.PI / 6

export function cellDepth({ nodes, walls }: WallSection, ofCell: readonly string[]): number {
  const at = new Map(nodes.map(node => [node.id, node]))
  const wanted = new Set(ofCell)
  const chains = walls.filter(wall => wanted.has(wall.id)).flatMap((wall): Point[][] => {
    const [from, to] = [at.get(wall.from), at.get(wall.to)]
    const path = from && to ? wallPath(wall, from, to) : null
    return path && !('ok' in path) ? [pathPoints(path, COARSE)] : []
  })
  const points = chains.flat()
  const directions = chains.flatMap(chain => chain.slice(1).map((p, i) => Math.atan2(p.y - (chain[i]?.y ?? 0), p.x - (chain[i]?.x ?? 0))))
  return directions.reduce((least, direction) => Math.min(least, acrossTo(points, direction)), Infinity)
}

function acrossTo(points: readonly Point[], direction: number): number {
  const [c, s] = [Math.cos(direction), Math.sin(direction)]
  let [low, high] = [Infinity, -Infinity]
  for (const { x, y } of points) {
    const across = c * y - s * x
    if (across < low) low = across
    if (across > high) high = across
  }
  return high - low
}
