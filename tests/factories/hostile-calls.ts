/** One sound call of every public front of the engine, for tests that put hostile numbers into it. */
import type { Engine } from '../reference/engine'
import type { Profile } from '#shared/torsion/profiles/profile'
import { rectangle } from '../reference/outlines'
import { bentAngle, channel, graph, machinedAngle, openArc } from '../reference/sections'

export interface HostileCall {
  readonly name: keyof Engine
  /** Says which of several calls of one front it is. */
  readonly what?: string
  readonly give: (engine: Engine) => unknown[]
  /** Arguments that hostile numbers go into; the others are results of the engine. All, where absent. */
  readonly hostile?: readonly number[]
  /** Asks what the front gave instead of the front itself. */
  readonly ask?: (engine: Engine, given: readonly never[]) => unknown
  /** Takes long: fewer numbers are tried. */
  readonly slow?: true
}

const opened = (engine: Engine) => engine.torsionOfOpenSection(channel)
const solids = [
  { shape: 'circle', outerRadius: 25, innerRadius: 20 }, { shape: 'ellipse', semiMajor: 30, semiMinor: 18, ratio: 0.6 }, { shape: 'rectangle', width: 50, height: 20 },
  { shape: 'equilateral triangle', side: 40 }, { shape: 'right isosceles triangle', leg: 30 }, { shape: 'sector', radius: 20, angle: 1.5 },
  { shape: 'semicircle', radius: 20 }, { shape: 'segment', radius: 12, depth: 2.4 }, { shape: 'hexagon', flats: 24 },
]

const three = { tLower: 4, tWeb: 3, tUpper: 4 }
const profiles: Profile[] = [
  { shape: 'angle', measured: 'outside', make: 'machined', radius: 2, width: 30, height: 40, tWidth: 2, tHeight: 3 },
  { shape: 'tee', measured: 'outside', make: 'machined', radius: 2, flange: 50, height: 40, tFlange: 3, tStem: 2 },
  { shape: 'channel', measured: 'inside', make: 'machined', radius: 3, lower: 40, height: 100, upper: 30, ...three },
  { shape: 'zed', measured: 'mid-line', make: 'machined', radius: 3, lower: 40, height: 100, upper: 30, ...three },
  { shape: 'hat', measured: 'outside', make: 'bent', radius: 3, brim: 20, height: 40, crown: 40, lean: 0.2, tBrim: 2, tWeb: 2, tCrown: 2 },
  { shape: 'lipped channel', measured: 'outside', make: 'bent', radius: 3, lip: 15, flange: 40, height: 80, tLip: 2, tFlange: 2, tWeb: 2 },
  { shape: 'I', measured: 'outside', make: 'machined', radius: 3, lower: 40, height: 100, upper: 30, ...three },
  { shape: 'J', measured: 'outside', make: 'machined', radius: 3, base: 40, height: 60, cap: 20, tBase: 3, tWeb: 2, tCap: 3 },
  { shape: 'arc', measured: 'outside', radius: 40, angle: 2, t: 2 },
  { shape: 'slit tube', measured: 'outside', diameter: 80, t: 2 },
]

const box = graph([[0, 0], [100, 0], [100, 60], [0, 60], [50, 0]], [{ from: 0, to: 4, t: 2 }, { from: 4, to: 1, t: 2 }, { from: 1, to: 2, t: 3 }, { from: 2, to: 3, t: 2 }, { from: 3, to: 0, t: 1.5 }])
const boxed = (engine: Engine) => engine.torsionOfCells(box)
const members = [{ length: 300, GJ: 7e7, EG: 1.3e13 }, { length: 900, GJ: 6e7, EG: 1.1e13 }]
const held = [{ node: 0, twist: 'fixed', warping: 'fixed' }, { node: 2, twist: 1e9, warping: 1e12 }] as const
const segments = [{ length: 400, stiffness: { along: 'uniform', GJ: 6e9 } }, { length: 300, stiffness: { along: 'linear', GJ1: 4e9, GJ2: 2e9 } }, { length: 200, stiffness: { along: 'tapering circle', G: 79_000, d1: 30, d2: 26 } }] as const
const flatPanel = { length: 200, width: 120, t: 1.2, E: 71_000, nu: 0.33, edges: { long: 'supported', short: 'supported' }, radius: null }
const following = { GJ: 7e7, shearPerRate: 80_700, warping: { EG: 1.3e13, E: 71_000, omega: 1238 } }

export const hostileCalls: readonly HostileCall[] = [
  { name: 'torsionOfCells', give: () => [box] },
  { name: 'respondOfCells', give: engine => [boxed(engine), 5e6], hostile: [1] },
  { name: 'respondOfCellsToRate', give: engine => [boxed(engine), 1e-5], hostile: [1] },
  { name: 'cellCornerFactor', what: 'machined', give: () => [0.5, 1, 'machined'] },
  { name: 'cellCornerFactor', what: 'bent', give: () => [3, 1.5, 'bent'] },
  { name: 'shearFlow', what: 'open', give: () => [channel] },
  { name: 'shearFlow', what: 'closed', give: () => [box] },
  { name: 'warpingBar', give: () => [members, held] },
  {
    name: 'warpingBar', what: 'a case', give: () => [{ torques: [{ node: 1, T: 6000 }], distributed: [{ member: 1, m: 12, mEnd: 8 }], bimoments: [{ node: 2, B: 1e6 }] }],
    ask: (engine, [load]) => {
      const bar = engine.warpingBar(members, held)
      return bar.ok ? bar.respond(load as never) : bar
    },
  },
  { name: 'cutBar', give: () => [members, [40, 700]] },
  { name: 'compressedStiffness', give: () => [{ GJ: 7e7, Ips: 1.4e6, compression: 20 }] },
  { name: 'sectorialRun', give: () => [channel] },
  { name: 'spanBar', give: () => [segments, [{ node: 0, stiffness: 'rigid' }, { node: 2, stiffness: 1e9 }]] },
  {
    name: 'spanBar', what: 'a case', give: () => [{ torques: [{ node: 1, T: 120_000 }], distributed: [{ segment: 1, m1: 12, m2: 8 }] }],
    ask: (engine, [load]) => {
      const bar = engine.spanBar(segments, [{ node: 0, stiffness: 'rigid' }, { node: 2, stiffness: 1e9 }])
      return bar.ok ? bar.respond(load as never) : bar
    },
  },
  ...(['circleRule', 'compressionWithShear', 'bendingWithShear'] as const).map((name): HostileCall => ({ name, give: () => [0.6, 0.5] })),
  ...(['powerRule', 'varyingOnly'] as const).map((name): HostileCall => ({ name, give: () => [0.6, 0.5, 1, 2] })),
  { name: 'followTwist', give: () => [following, { rate: 4e-5, gradient: 1e-8, offset: 15, fibre: 40, E: 71_000 }] },
  { name: 'shareTwist', give: () => [7e7, 9e9] },
  { name: 'panelBuckling', what: 'flat', give: () => [flatPanel] },
  { name: 'panelBuckling', what: 'curved', give: () => [{ ...flatPanel, radius: 500 }] },
  { name: 'cylinderBuckling', give: () => [{ radius: 40, t: 1, length: 300, E: 71_000, nu: 0.33 }] },
  ...[channel, machinedAngle, bentAngle, openArc].map((section, i): HostileCall => ({ name: 'torsionOfOpenSection', what: `section ${i + 1}`, give: () => [section] })),
  ...[channel, openArc].map((section, i): HostileCall => ({ name: 'sectorialProperties', what: `section ${i + 1}`, give: () => [section] })),
  { name: 'respondToTorque', give: engine => [opened(engine), 10_000], hostile: [1] },
  { name: 'respondToRate', give: engine => [opened(engine), 4e-5], hostile: [1] },
  ...[machinedAngle, bentAngle].map((section, i): HostileCall => ({ name: 'cornerFactor', what: `section ${i + 1}`, give: () => [section, '1'] })),
  {
    name: 'cellWarping', give: () => [box],
    ask: (engine, [section]) => {
      const torsion = engine.torsionOfCells(section as never)
      return torsion.ok ? engine.cellWarping(section as never, torsion) : torsion
    },
  },
  { name: 'machinedFactor', give: () => [0.5] },
  { name: 'bendFactor', give: () => [0.5, 1] },
  { name: 'stripFactor', give: () => [{ radius: 1, t: 1 }] },
  { name: 'wagner', give: () => [{ E: 71_000, GJ: 1e6, In: 1e9, Ips: 1e6, A: 300, rhoMax: 50, rate: 1e-4 }] },
  { name: 'reserveFactor', give: () => [317, 93] },
  { name: 'factorAction', give: () => [62, 'limit', { safety: 1.5, special: 1.15, specialAtLimit: true }] },
  { name: 'knockDownAt', give: () => [[{ temperature: 20, factor: 1 }, { temperature: 120, factor: 0.8 }], 70] },
  { name: 'characteristicLength', give: () => [71_000, 1e9, 1e8] },
  ...solids.map((solid): HostileCall => ({ name: 'torsionOfSolid', what: solid.shape, give: () => [solid] })),
  ...profiles.map((profile): HostileCall => ({ name: 'sectionOfProfile', what: profile.shape, give: () => [profile, { G: 26_900, E: 71_000 }] })),
  ...[machinedAngle, bentAngle, openArc].map((section, i): HostileCall => ({ name: 'outlineOfWalls', what: `section ${i + 1}`, give: () => [section] })),
  { name: 'outlineOfWalls', what: 'cells', give: () => [box] },
  { name: 'checkOutline', give: () => [rectangle(2, 1)] },
  { name: 'outlineTorsion', give: () => [rectangle(2, 1)], slow: true },
]

/** Functions of the engine that are no fronts: a formula behind one, a conversion, a text, a judgement of results. */
export const notFronts: Readonly<Record<string, readonly string[]>> = {
  'a conversion or a text': [
    'dimensionOf', 'engineUnit', 'fromEngine', 'intervalFromEngine', 'intervalToEngine', 'isUnit', 'toEngine', 'unitFits', 'unitsOf', 'decimals', 'showMargin', 'showQuantity', 'showReserve', 'showValue',
    'significant', 'texNumber', 'texQuantity', 'texUnit', 'withUnit', 'unboundedSentence',
  ],
  'a bare formula behind a front': [
    'endLossOf', 'faceStress', 'cubicThickness', 'wallStiffness', 'cornersOnMidLine', 'bulgeOfL', 'bulgeOfT', 'stripAsWagner', 'stripIn', 'stripRateLimit', 'bareReserve', 'passes', 'specialFactor', 'shearAllowables',
    'shearYieldFromTension', 'respondOfSolid', 'isFin', 'cellMatrix', 'closedBendFactor', 'areaMoments', 'vonMises', 'plateStress', 'panelCoefficient', 'fittedCoefficient', 'cappedAtYield',
    'loopCorners', 'windingNumber', 'reentrantVertices',
  ],
  'a choice, sum or judgement among results': ['chiThatCounts', 'superpose', 'torqueAbout', 'fibreStress', 'fibreStresses', 'stressPeaks', 'worstStresses', 'atOneFibre', 'envelope', 'governingRows', 'estimateFromMeshes', 'judgeConvergence', 'judgeAgreement'],
}
