/** Faults in the parts that open sections are made of: every published constant, each elementary result. */
import type { Mutation } from '../../../factories/engine-faults'
import { coefficient, describeFaults, ordinates, result, scaled } from '../../../factories/engine-faults'
import { programRows } from '../../../reference/program-rows'
import { sectorialRows } from '../../../reference/sectorial-rows'
import { torsionRows } from '../../../reference/torsion-rows'

const constants: Mutation[] = [
  { name: 'loss at a free end', module: 'torsion/published', spoil: scaled('freeEndLoss') },
  { name: 'loss at an end beside a bulge', module: 'torsion/published', spoil: scaled('junctionEndLoss') },
  ...['bulgeL', 'bulgeT'].flatMap(table => ['c0', 'c1', 'c2', 'c3', 'c4'].map((key): Mutation => ({ name: `${table} ${key}`, module: 'torsion/published', spoil: coefficient(table, key) }))),
  { name: 'table of machined corners', module: 'torsion/published', spoil: ordinates('machinedCornerTable') },
]
const results: Mutation[] = [
  { name: 'G·L·t³/3', module: 'torsion/wall-stiffness', spoil: result('wallStiffness', 'plainGJ') },
  { name: 'change of length at a junction', module: 'torsion/wall-stiffness', spoil: result('wallStiffness', 'lengthTerm') },
  { name: 'end term', module: 'torsion/wall-stiffness', spoil: result('wallStiffness', 'endTerm') },
  { name: 'face stress', module: 'torsion/wall-stiffness', spoil: result('faceStress') },
  { name: 'bulge of an L', module: 'torsion/junction-formula', spoil: result('bulgeOfL', 'J') },
  { name: 'bulge of a T', module: 'torsion/junction-formula', spoil: result('bulgeOfT', 'J') },
  { name: 'bend factor', module: 'torsion/bend-factor', spoil: result('bendFactor') },
  { name: 'strip factor', module: 'torsion/bend-factor', spoil: result('stripFactor', 'K') },
  { name: 'length of a path', module: 'torsion/geometry', spoil: result('pathLength') },
  { name: 'growth of the sectorial coordinate', module: 'torsion/sectorial-growth', spoil: result('sectorialGrowth') },
  { name: 'area of an integration point', module: 'torsion/stations', spoil: result('stationsOf', 'area') },
  { name: 'ω of an integration point', module: 'torsion/stations', spoil: result('stationsOf', 'omega') },
  { name: 'x of an integration point', module: 'torsion/stations', spoil: result('stationsOf', 'x') },
  { name: 'y of an integration point', module: 'torsion/stations', spoil: result('stationsOf', 'y') },
  { name: 'large-twist ratio', module: 'torsion/wagner', spoil: result('wagner', 'ratio', 'edgeStress', 'axisStress') },
  { name: 'strip rate limit', module: 'torsion/wagner', spoil: result('stripRateLimit') },
  { name: 'strip as large twist takes it', module: 'torsion/wagner', spoil: result('stripAsWagner', 'In', 'Ips') },
  { name: 'reserve factor', module: 'torsion/margins', spoil: result('reserveFactor', 'ms') },
  { name: 'special factor', module: 'torsion/factors', spoil: result('specialFactor', 'value') },
  { name: 'factored action', module: 'torsion/factors', spoil: result('factorAction', 'limit', 'ultimate') },
  { name: 'knock-down', module: 'torsion/allowables', spoil: result('knockDownAt', 'factor') },
  { name: 'shear allowable at yield', module: 'torsion/allowables', spoil: result('shearAllowables', 'yield') },
  { name: 'F_ty/√3', module: 'torsion/allowables', spoil: result('shearYieldFromTension') },
  { name: 'characteristic length', module: 'torsion/warping-length', spoil: result('characteristicLength') },
]

describeFaults('a 1 % fault in the engine', [...constants, ...results], [...torsionRows, ...sectorialRows, ...programRows])
