/** The bends of a profile and the angle each turns by. */
import type { OpenSection } from '#shared/torsion/section'
import { directionOf, turn } from '#shared/torsion/geometry'

export interface BendTurn { readonly node: string, readonly radius: number, readonly t: number, /** rad, 0…π */ readonly turn: number }

/** Every bent corner of a chain of straight walls, in the order of its nodes. */
export function turnsAtBends({ nodes, walls, junctions }: OpenSection): BendTurn[] {
  const at = (id: string) => nodes.find(node => node.id === id)
  return junctions.filter(({ make }) => make === 'bent').flatMap(({ node, radius }): BendTurn[] => {
    const [before, after] = [walls.find(({ to }) => to === node), walls.find(({ from }) => from === node)]
    const [a, b, c] = [before && at(before.from), at(node), after && at(after.to)]
    if (!a || !b || !c || !before) return []
    return [{ node, radius, t: before.t, turn: Math.abs(turn(directionOf(b, c) - directionOf(a, b))) }]
  })
}
