/** A 1 % fault in any part of the closed sections or of direct shear is seen by their reference rows. */
import { describeFaults, fault, result, type Exports, type Mutation } from '../../../factories/engine-faults'
import { cellRows } from '../../../reference/cell-rows'

const at = (name: string): string => `torsion/cells/${name}`
const line = (i: number) => (all: Exports): Exports => ({
  ...all, closedMachinedTable: (all.closedMachinedTable as [number, number][]).map(([r, K], k) => [r, k === i ? K * fault : K]),
})
const array = (name: string) => (all: Exports): Exports => {
  const original = all[name] as (...given: unknown[]) => Float64Array
  return { ...all, [name]: (...given: unknown[]) => original(...given).map(value => value * fault) }
}

const parts: Mutation[] = [
  { name: 'part of the variation at a circular wall', module: at('published'), spoil: all => ({ ...all, circularFacePart: 2 }) },
  ...[0, 1, 2, 3].map((i): Mutation => ({ name: `machined corner, line ${i}`, module: at('published'), spoil: line(i) })),
  { name: 'flexibility of the cells', module: at('torsion-of-cells'), spoil: result('torsionOfCells', 'GJ', 'J', 'GJWithOwn') },
  { name: 'circulations', module: 'torsion/cholesky', spoil: array('solveFactorised') },
  { name: 'length of a wall', module: 'torsion/geometry', spoil: result('pathLength') },
  { name: 'area of a cell', module: 'torsion/sectorial-growth', spoil: result('sectorialGrowth') },
  { name: 'warping of a closed section', module: at('cell-warping'), spoil: result('cellWarping', 'largest') },
  { name: 'bend factor in a cell', module: at('cell-corner'), spoil: result('cellCornerFactor', 'K') },
  { name: 'second moments', module: 'torsion/shear/shear-flow', spoil: result('torqueAbout') },
  { name: 'shear centre', module: 'torsion/shear/shear-flow', spoil: (all) => {
    const original = all.shearFlow as (...given: unknown[]) => { ok: boolean, shearCentre?: { x: number, y: number } }
    return { ...all, shearFlow: (...given: unknown[]) => {
      const sound = original(...given)
      return sound.shearCentre ? { ...sound, shearCentre: { x: sound.shearCentre.x * fault, y: sound.shearCentre.y } } : sound
    } }
  } },
]

describeFaults('a 1 % fault in the closed sections', parts, cellRows)
