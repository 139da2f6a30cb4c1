/** A 1 % fault in any part of restrained warping is seen by its reference rows. */
import { describeFaults, fault, result, type Exports, type Mutation } from '../../../factories/engine-faults'
import { warpingRows } from '../../../reference/warping-rows'

const member = 'torsion/warping/member'
const array = (name: string) => (all: Exports): Exports => {
  const original = all[name] as (...given: unknown[]) => Float64Array
  return { ...all, [name]: (...given: unknown[]) => original(...given).map(value => value * fault) }
}
/** Some of what the ends and loads give at a place, 1 % high. */
const shares = (from: number, count: number) => (all: Exports): Exports => {
  const original = all.writeShape as (member: unknown, u: number, z: number, shape: Float64Array, o: number) => void
  return { ...all, writeShape: (of: unknown, u: number, z: number, shape: Float64Array, o: number) => {
    original(of, u, z, shape, o)
    for (let i = o + from; i < o + from + count; i += 1) shape[i] = (shape[i] ?? 0) * fault
  } }
}
const parts: Mutation[] = [
  ...['even', 'evenLoad', 'odd', 'oddLoad'].map((key): Mutation => ({ name: `relation of the ends, ${key}`, module: member, spoil: result('memberRelations', key) })),
  { name: 'decay', module: member, spoil: result('decayOf') },
  { name: 'bimoment from the ends', module: member, spoil: shares(0, 2) },
  { name: 'bimoment from the load', module: member, spoil: shares(2, 2) },
  { name: 'slope or integral of the bimoment', module: member, spoil: shares(4, 4) },
  { name: 'second integral of the bimoment', module: member, spoil: shares(8, 4) },
  { name: 'solution of the equations', module: 'torsion/banded', spoil: array('solveBand') },
  { name: 'gathered statical moment', module: 'torsion/shear/gather', spoil: result('gatherFromFreeEdges') },
  { name: 'growth of ω', module: 'torsion/sectorial-growth', spoil: result('sectorialGrowth') },
  { name: 'stiffness under compression', module: 'torsion/warping/compression', spoil: result('compressedStiffness', 'GJ', 'ratio') },
  { name: 'stress at a fibre', module: 'torsion/warping/sectorial-run', spoil: (all) => {
    const spoilt = (one: Record<string, unknown>) => ({ ...one, ...Object.fromEntries(['sigma', 'tauSv', 'tauOmega', 'left', 'right'].map(key => [key, fault * Number(one[key])])) })
    const [single, list] = [all.fibreStress as (...given: unknown[]) => Record<string, unknown>, all.fibreStresses as (...given: unknown[]) => Record<string, unknown>[]]
    return { ...all, fibreStress: (...given: unknown[]) => spoilt(single(...given)), fibreStresses: (...given: unknown[]) => list(...given).map(spoilt) }
  } },
]

describeFaults('a 1 % fault in restrained warping', parts, warpingRows)
