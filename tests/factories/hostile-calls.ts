/** One sound call of every public front of the engine, for tests that put hostile numbers into it. */
import type { Engine } from '../reference/engine'
import { rectangle } from '../reference/outlines'
import { bentAngle, channel, machinedAngle, openArc } from '../reference/sections'

export interface HostileCall {
  readonly name: keyof Engine
  /** Says which of several calls of one front it is. */
  readonly what?: string
  readonly give: (engine: Engine) => unknown[]
  /** Arguments that hostile numbers go into; the others are results of the engine. All, where absent. */
  readonly hostile?: readonly number[]
  /** Takes long: fewer numbers are tried. */
  readonly slow?: true
}

const opened = (engine: Engine) => engine.torsionOfOpenSection(channel)
const solids = [
  { shape: 'circle', outerRadius: 25, innerRadius: 20 }, { shape: 'ellipse', semiMajor: 30, semiMinor: 18, ratio: 0.6 }, { shape: 'rectangle', width: 50, height: 20 },
  { shape: 'equilateral triangle', side: 40 }, { shape: 'right isosceles triangle', leg: 30 }, { shape: 'sector', radius: 20, angle: 1.5 },
  { shape: 'semicircle', radius: 20 }, { shape: 'segment', radius: 12, depth: 2.4 }, { shape: 'hexagon', flats: 24 },
]

export const hostileCalls: readonly HostileCall[] = [
  ...[channel, machinedAngle, bentAngle, openArc].map((section, i): HostileCall => ({ name: 'torsionOfOpenSection', what: `section ${i + 1}`, give: () => [section] })),
  ...[channel, openArc].map((section, i): HostileCall => ({ name: 'sectorialProperties', what: `section ${i + 1}`, give: () => [section] })),
  { name: 'respondToTorque', give: engine => [opened(engine), 10_000], hostile: [1] },
  { name: 'respondToRate', give: engine => [opened(engine), 4e-5], hostile: [1] },
  ...[machinedAngle, bentAngle].map((section, i): HostileCall => ({ name: 'cornerFactor', what: `section ${i + 1}`, give: () => [section, '1'] })),
  { name: 'machinedFactor', give: () => [0.5] },
  { name: 'bendFactor', give: () => [0.5, 1] },
  { name: 'stripFactor', give: () => [{ radius: 1, t: 1 }] },
  { name: 'wagner', give: () => [{ E: 71_000, GJ: 1e6, In: 1e9, Ips: 1e6, A: 300, rhoMax: 50, rate: 1e-4 }] },
  { name: 'reserveFactor', give: () => [317, 93] },
  { name: 'factorAction', give: () => [62, 'limit', { safety: 1.5, special: 1.15, specialAtLimit: true }] },
  { name: 'knockDownAt', give: () => [[{ temperature: 20, factor: 1 }, { temperature: 120, factor: 0.8 }], 70] },
  { name: 'characteristicLength', give: () => [71_000, 1e9, 1e8] },
  ...solids.map((solid): HostileCall => ({ name: 'torsionOfSolid', what: solid.shape, give: () => [solid] })),
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
    'endLossOf', 'faceStress', 'wallStiffness', 'cornersOnMidLine', 'bulgeOfL', 'bulgeOfT', 'stripAsWagner', 'stripIn', 'stripRateLimit', 'bareReserve', 'passes', 'specialFactor', 'shearAllowables',
    'shearYieldFromTension', 'respondOfSolid', 'loopCorners', 'windingNumber', 'reentrantVertices',
  ],
  'a choice or judgement among results': ['envelope', 'governingRows', 'estimateFromMeshes', 'judgeConvergence', 'judgeAgreement'],
}
