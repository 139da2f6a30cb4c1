/** A 1 % fault in any step from a drawing to the mid-line is seen by the rows of the profiles. */
import { describeFaults, result, type Mutation } from '../../../factories/engine-faults'
import { profileRows } from '../../../reference/profile-rows'

const at = (name: string): string => `torsion/profiles/${name}`
const parts: Mutation[] = [
  { name: 'mid-line length', module: at('conversion'), spoil: result('midLength', 'value') },
  { name: 'corner of a leaning wall', module: at('conversion'), spoil: result('cornerReach') },
  { name: 'sum of a line', module: at('conversion'), spoil: result('conversion', 'value') },
  { name: 'mid-line radius', module: at('conversion'), spoil: result('midRadius', 'value') },
  { name: 'tangent length of a bend', module: at('radii-fit'), spoil: result('bendTangent') },
  { name: 'angle of a bend', module: at('bend-turns'), spoil: result('turnsAtBends', 'turn') },
]

describeFaults('a 1 % fault in the profiles', parts, profileRows)
