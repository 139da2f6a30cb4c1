/**
 * Whether a closed section warps (methods §3.8): the axial displacement along the walls, d w/d s = q/(G t θ′) − p,
 * less the plane that only tilts the section. A circular tube of constant wall and a section in which the product
 * p·t is the same in every wall keep plane; all others need a word about their built-in root. mm, mm² per rad/mm.
 */
import { finiteOrRefused } from '#shared/torsion/finite'
import { leastWarping } from '#shared/torsion/cells/published'
import type { CellTorsion } from '#shared/torsion/cells/torsion-of-cells'
import type { WallSection } from '#shared/torsion/cells/wall-graph'
import { pathLength, pathPoint, wallPath, type WallPath } from '#shared/torsion/geometry'
import { refusal, type Point, type Refusal } from '#shared/torsion/section'
import { sectorialGrowth } from '#shared/torsion/sectorial-growth'

export interface CellWarping {
  readonly ok: true
  /** Largest distance of w/θ′ from its plane, mm². */
  readonly largest: number
  readonly warps: boolean
}

/** A point of the mid-line with its w/θ′. */
interface Place { readonly at: Point, readonly w: number }

const parts = [0.25, 0.5, 0.75]

/** @returns a refusal where a wall cannot be drawn; `torsion` is that of the same section. */
export function cellWarping(section: WallSection, torsion: CellTorsion): CellWarping | Refusal {
  const nodes = new Map(section.nodes.map(node => [node.id, node]))
  const paths: WallPath[] = []
  for (const wall of section.walls) {
    const [from, to] = [nodes.get(wall.from), nodes.get(wall.to)]
    const path = from && to ? wallPath(wall, from, to) : refusal(`Wall ${wall.id} ends at a node that does not exist.`)
    if ('ok' in path) return path
    paths.push(path)
  }
  const largest = farthestFromPlane(placesOf(section, paths, torsion), torsion.size)
  return finiteOrRefused({ ok: true as const, largest, warps: largest > leastWarping * torsion.size ** 2 })
}

/** Along a tree of the walls, since w is single-valued: the flows of the cells were found by that. */
function placesOf({ walls }: WallSection, paths: readonly WallPath[], torsion: CellTorsion): Place[] {
  const pole = paths[0]?.start ?? { x: 0, y: 0 }
  const growth = (i: number, part: number): number => {
    const [path, wall] = [paths[i], torsion.walls[i]]
    if (!path || !wall) return 0
    return wall.flow * torsion.Gref / (wall.G * wall.t) * part * pathLength(path) - sectorialGrowth(path, pole, part)
  }
  const at = new Map<string, number>()
  const [first] = walls
  if (first) at.set(first.from, 0)
  for (let before = -1; before < at.size;) {
    before = at.size
    walls.forEach(({ from, to }, i) => {
      const [a, b] = [at.get(from), at.get(to)]
      if (a !== undefined && b === undefined) at.set(to, a + growth(i, 1))
      if (a === undefined && b !== undefined) at.set(from, b - growth(i, 1))
    })
  }
  return walls.flatMap(({ from }, i): Place[] => {
    const path = paths[i]
    const start = at.get(from) ?? 0
    if (!path) return []
    return [0, ...(path.kind === 'arc' ? parts : []), 1].map(part => ({ at: pathPoint(path, part), w: start + growth(i, part) }))
  })
}

/** Least squares of w = c + a x + b y about the mean; on one line the plane is that of the line. */
function farthestFromPlane(places: readonly Place[], size: number): number {
  const n = places.length
  const mean = (value: (place: Place) => number) => places.reduce((sum, place) => sum + value(place), 0) / n
  const [mx, my, mw] = [mean(p => p.at.x), mean(p => p.at.y), mean(p => p.w)]
  const product = (a: (place: Place) => number, b: (place: Place) => number) => mean(p => a(p) * b(p))
  const [x, y, w] = [(p: Place) => p.at.x - mx, (p: Place) => p.at.y - my, (p: Place) => p.w - mw]
  const [xx, yy, xy, xw, yw] = [product(x, x), product(y, y), product(x, y), product(x, w), product(y, w)]
  const det = xx * yy - xy * xy
  const flat = !(det > 1e-12 * size ** 4)
  const [a, b] = flat ? [0, 0] : [(xw * yy - yw * xy) / det, (yw * xx - xw * xy) / det]
  return places.reduce((high, p) => Math.max(high, Math.abs(w(p) - a * x(p) - b * y(p))), 0)
}
