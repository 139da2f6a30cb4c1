/** From section and bar as numbers to twist, bimoments and stresses of every case. Pure; failures are values. */
import type { Fault } from '#shared/calc/types'
import { warpingMargins } from '#shared/calc/kinds/restrained-warping/margins'
import type { RestrainedWarpingModel, WarpingCaseModel } from '#shared/calc/kinds/restrained-warping/parse'
import type { CornerPlace, StressGroup, WarpingCase, WarpingSolution } from '#shared/calc/kinds/restrained-warping/solution'
import type { Solution as SectionSolution, WagnerState } from '#shared/calc/kinds/open-section/solution'
import { engineSection, solveOpenSection } from '#shared/calc/kinds/open-section/solve'
import { levelsOf, lowestStrength } from '#shared/calc/parts/strength'
import { refusal, type Refusal } from '#shared/torsion/section'
import { wagner } from '#shared/torsion/wagner'
import { compressedStiffness } from '#shared/torsion/warping/compression'
import { cutBar } from '#shared/torsion/warping/cut-bar'
import { sectorialRun, type SectorialRun } from '#shared/torsion/warping/sectorial-run'
import { stressPeaks } from '#shared/torsion/warping/stress-peaks'
import { warpingBar, type BarCase, type WarpingBar } from '#shared/torsion/warping/warping-bar'

export type Solved = { ok: true, solution: WarpingSolution } | { ok: false, faults: Fault[] }
const fault = (path: string, message: string): Solved => ({ ok: false, faults: [{ path, message }] })

export function solveRestrainedWarping(model: RestrainedWarpingModel): Solved {
  const solved = solveOpenSection(model.section)
  if (!solved.ok) return solved
  const section = solved.solution
  const run = sectorialRun(engineSection(model.section))
  if (!run.ok) return fault('walls', run.reason)
  const { gamma, referenceE } = run.properties
  if (referenceE === null) return fault('materials', 'Give the modulus of elasticity of every material.')
  const EG = referenceE * gamma
  const cut = cutBar([{ length: model.length.value, GJ: section.GJ, EG }], placesOf(model))
  if (!cut.ok) return fault('length', cut.reason)
  const groups = groupsOf(model, run)
  const base = { model, section, run, cut, groups, corners: cornersOf(section, run), EG, E: referenceE, k: Math.sqrt(section.GJ / EG), kL: model.length.value * Math.sqrt(section.GJ / EG) }
  return withCases(base)
}

type Base = Omit<WarpingSolution, 'cases' | 'margins' | 'governing'>

/** Where something stands, begins or ends in any case. */
const placesOf = ({ supports, cases }: RestrainedWarpingModel): number[] => [
  ...supports.map(one => one.z), ...cases.flatMap(c => [...c.torques.map(one => one.z), ...c.eccentric.map(one => one.z), ...c.distributed.flatMap(one => [one.from, one.to])]),
]

function groupsOf({ section }: RestrainedWarpingModel, { fibres }: SectorialRun): StressGroup[] {
  const named = new Set(fibres.map(fibre => fibre.wall))
  const walls = section.walls.filter(wall => named.has(wall.id)).map((wall): StressGroup => ({
    id: wall.id, wall: wall.id, place: wall.name.trim() === '' ? `wall ${wall.id}` : `wall ${wall.id} (${wall.name.trim()})`, materials: [wall.material],
  }))
  const bends = section.junctions.filter(({ node }) => named.has(`bend ${node}`)).map(({ node }): StressGroup => ({
    id: `bend ${node}`, place: `the bend at node ${node}`, materials: section.walls.filter(wall => wall.from === node || wall.to === node).map(wall => wall.material),
  }))
  return [...walls, ...bends]
}

/** A corner takes its factor on the shear of twist, and beside it the largest flow of the walls that meet there. */
function cornersOf(section: SectionSolution, { fibres, properties: { gamma } }: SectorialRun): CornerPlace[] {
  return section.corners.flatMap((corner): CornerPlace[] => {
    const perRate = section.perRate.corner.get(corner.node)
    if (perRate === undefined) return []
    const meeting = new Set([...corner.walls.map(wall => wall.id), `bend ${corner.node}`])
    const flow = fibres.reduce((high, { wall, S, t }) => (meeting.has(wall) ? Math.max(high, Math.abs(S) / t) : high), 0)
    return [{ node: corner.node, wall: corner.worst.id, place: `corner ${corner.node}`, materials: corner.walls.map(wall => wall.material), perRate, perTorque: flow / gamma }]
  })
}

function withCases(base: Base): Solved {
  const { model, groups, run } = base
  const judge = stressPeaks(groups.map(({ id, materials }) => ({
    fibres: run.fibres.filter(fibre => fibre.wall === id), normal: lowestStrength(materials, 'Ftu', () => 1), shear: lowestStrength(materials, 'Fsu', () => 1),
  })))
  const bars = barsOf(base)
  const faults: Fault[] = []
  const cases = model.cases.flatMap((one, i): WarpingCase[] => {
    const found = solveCase(base, one, bars, judge)
    if (!('ok' in found)) return [found]
    faults.push({ path: `cases.${i}`, message: found.reason })
    return []
  })
  if (faults.length > 0) return { ok: false, faults }
  const { rows, governing } = warpingMargins({ ...base, cases })
  return { ok: true, solution: { ...base, cases, margins: rows, governing } }
}

/** Bars of every stiffness that compression leaves; made once each. */
function barsOf({ model: { supports }, cut }: Base): (GJ: number) => WarpingBar | Refusal {
  const known = new Map<number, WarpingBar | Refusal>()
  return (GJ) => {
    const held = known.get(GJ) ?? warpingBar(cut.members.map(one => ({ ...one, GJ })), supports.map(({ z, twist, warping }) => ({ node: cut.nodeAt(z), twist, warping })))
    known.set(GJ, held)
    return held
  }
}

function loadOf({ cut, section, run }: Base, { torques, distributed, eccentric }: WarpingCaseModel): BarCase | Refusal {
  const unknown = eccentric.find(({ node }) => run.properties.omegaAt[node] === undefined)
  if (unknown) return refusal(`An axial force stands at node ${unknown.node}, which the section does not have. Name one of ${section.model.nodes.map(node => node.id).slice(0, 12).join(', ')}.`)
  return {
    torques: torques.map(({ z, T }) => ({ node: cut.nodeAt(z), T: T.value })),
    bimoments: eccentric.map(({ z, P, node }) => ({ node: cut.nodeAt(z), B: P.value * (run.properties.omegaAt[node] ?? 0) })),
    distributed: distributed.flatMap(({ from, to, m1, m2 }) => {
      const [first, last] = [cut.nodeAt(from), cut.nodeAt(to)]
      const value = (node: number) => m1 + (m2 - m1) * ((cut.nodes[node] ?? 0) - from) / (to - from)
      return Array.from({ length: last - first }, (_, i) => ({ member: first + i, m: value(first + i), mEnd: value(first + i + 1) }))
    }),
  }
}

function solveCase(base: Base, one: WarpingCaseModel, bars: ReturnType<typeof barsOf>, judge: ReturnType<typeof stressPeaks>): WarpingCase | Refusal {
  const { model, section, run: { properties }, corners } = base
  const levels = levelsOf(model.factors, one.level)
  if (!levels.ok) return levels
  const load = loadOf(base, one)
  if ('ok' in load) return load
  const axialStress = one.axial / properties.weightedArea
  const squeezed = compressedStiffness({ GJ: section.GJ, Ips: properties.Ips, compression: -axialStress * levels.toUltimate })
  if (!squeezed.ok) return squeezed
  // A bar that compression alone would turn has no stiffness left to be solved with: G-41 stops it, and the results are those without compression.
  const GJ = squeezed.ratio < 1 ? squeezed.GJ : section.GJ
  const bar = bars(GJ)
  if (!bar.ok) return bar
  const response = bar.respond(load)
  if ('ok' in response) return response
  const run = bar.run(response)
  const peaks = bar.peaks(response, run)
  const [rate, Tw] = [Math.abs(peaks.rate.rate), Math.abs(peaks.Tw.Tw)]
  return {
    model: one, load, response, run, peaks, axialStress, compression: squeezed.ratio, GJ, toLimit: levels.toLimit, toUltimate: levels.toUltimate,
    stress: judge({ run, ends: response.members, gamma: properties.gamma, axial: axialStress }),
    corner: corners.map(({ perRate, perTorque }) => perRate * rate + perTorque * Tw),
    wagnerLimit: wagnerAt(base, rate * levels.toLimit), wagnerUltimate: wagnerAt(base, rate * levels.toUltimate),
  }
}

function wagnerAt({ section, run: { properties: p }, E }: Base, rate: number): WagnerState | null {
  const effect = wagner({ E, GJ: section.GJ, In: p.In, Ips: p.Ips, A: p.weightedArea, rhoMax: p.rhoMax, rate })
  return effect.ok ? { In: p.In, ratio: effect.ratio, torque: effect.torque, stress: effect.edgeStress } : null
}
