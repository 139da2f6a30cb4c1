/** A 1 % fault in any part of spans, imposed twist or combined stress is seen by its reference rows. */
import { describeFaults, fault, result, type Exports, type Mutation } from '../../../factories/engine-faults'
import { spanRows } from '../../../reference/span-rows'

const array = (name: string) => (all: Exports): Exports => {
  const original = all[name] as (...given: unknown[]) => Float64Array
  return { ...all, [name]: (...given: unknown[]) => original(...given).map(value => value * fault) }
}
const parts: Mutation[] = [
  { name: 'flexibility of a segment', module: 'torsion/span/segment', spoil: result('flexibility') },
  { name: 'twist of a distributed torque', module: 'torsion/span/segment', spoil: result('flexibilityIntegral') },
  { name: 'solution of the equations', module: 'torsion/cholesky', spoil: array('solveFactorised') },
  ...['torque', 'tau', 'bimoment', 'sigmaWarping', 'sigmaBending'].map((key): Mutation => ({ name: `following part: ${key}`, module: 'torsion/imposed/imposed-twist', spoil: result('followTwist', key) })),
  { name: 'shares', module: 'torsion/imposed/imposed-twist', spoil: result('shareTwist', 'share') },
  ...['circleRule', 'compressionWithShear', 'bendingWithShear', 'powerRule', 'varyingOnly'].map((name): Mutation => ({ name, module: 'torsion/combined/interaction', spoil: result(name, 'ms') })),
  { name: 'von Mises', module: 'torsion/combined/interaction', spoil: result('vonMises') },
  { name: 'one fibre', module: 'torsion/combined/interaction', spoil: result('atOneFibre', 'sigma', 'tau') },
]

describeFaults('a 1 % fault in spans and combined stress', parts, spanRows)
