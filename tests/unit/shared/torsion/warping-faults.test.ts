/** A 1 % fault in any part of restrained warping is seen by its reference rows. */
import { describeFaults, fault, result, type Exports, type Mutation } from '../../../factories/engine-faults'
import { warpingRows } from '../../../reference/warping-rows'

const member = 'torsion/warping/member'
const array = (name: string) => (all: Exports): Exports => {
  const original = all[name] as (...given: unknown[]) => Float64Array
  return { ...all, [name]: (...given: unknown[]) => original(...given).map(value => value * fault) }
}
const parts: Mutation[] = [
  ...['K11', 'K12', 'K22', 'K24'].map((key): Mutation => ({ name: `stiffness ${key}`, module: member, spoil: result('memberStiffness', key) })),
  { name: 'nodal torque of a uniform torque', module: member, spoil: result('uniformLoad', 'torque') },
  { name: 'nodal bimoment of a uniform torque', module: member, spoil: result('uniformLoad', 'bimoment') },
  { name: 'solution of the equations', module: 'torsion/cholesky', spoil: array('solveFactorised') },
  { name: 'gathered statical moment', module: 'torsion/shear/gather', spoil: result('gatherFromFreeEdges') },
  { name: 'growth of ω', module: 'torsion/sectorial-growth', spoil: result('sectorialGrowth') },
  { name: 'stress at a fibre', module: 'torsion/warping/sectorial-run', spoil: (all) => {
    const original = all.fibreStresses as (...given: unknown[]) => Record<string, unknown>[]
    return { ...all, fibreStresses: (...given: unknown[]) => original(...given).map(one => ({ ...one, sigma: fault * Number(one.sigma), tauSv: fault * Number(one.tauSv), tauOmega: fault * Number(one.tauOmega) })) }
  } },
]

describeFaults('a 1 % fault in restrained warping', parts, warpingRows)
