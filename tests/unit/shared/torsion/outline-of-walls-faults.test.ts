/** A 1 % fault in how walls become an outline is seen by the reference rows. */
import type { Exports, Mutation } from '../../../factories/engine-faults'
import { describeFaults, fault, result } from '../../../factories/engine-faults'
import { wallAreaRows } from '../../../reference/walls-outline-rows'

const at = (name: string): string => `torsion/outline/from-walls/${name}`

/** The radius of every fillet and bend 1 % high. */
const wider = (all: Exports): Exports => {
  const moved = all.movedLeft as (curve: unknown, by: number) => unknown
  return { ...all, movedLeft: (curve: unknown, by: number) => moved(curve, by * fault) }
}

/** The thickness of every wall 1 % high. */
const thicker = (all: Exports): Exports => {
  const sides = all.wallSides as (section: { walls: readonly { t: number }[] }) => unknown
  return { ...all, wallSides: (section: { walls: readonly { t: number }[] }) => sides({ ...section, walls: section.walls.map(wall => ({ ...wall, t: wall.t * fault })) }) }
}

const parts: Mutation[] = [
  { name: 'radii of fillets and bends', module: at('side-curve'), spoil: wider },
  { name: 'thickness of walls', module: at('wall-sides'), spoil: thicker },
  { name: 'bulge of corners', module: at('corner-join'), spoil: result('joinOf', 'bulge') },
]

describeFaults('a 1 % fault in an outline made from walls', parts, wallAreaRows)
