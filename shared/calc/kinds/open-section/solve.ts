/** From the section as numbers to its solution: torsion, sectorial properties, corners, every case. Pure; failures are values. */
import type { Fault } from '#shared/calc/types'
import { marginRows } from '#shared/calc/kinds/open-section/margins'
import type { CaseModel } from '#shared/calc/parts/model'
import type { OpenSectionModel } from '#shared/calc/kinds/open-section/model'
import { cornersOf } from '#shared/calc/kinds/open-section/solve-corners'
import { leastOfModes } from '#shared/calc/parts/margin-rows'
import { largestPlace, MOST_VALUES, scaledValues } from '#shared/calc/parts/place-values'
import { knockdownOf, levelsOf, type Levels } from '#shared/calc/parts/strength'
import type { CaseSolution, CornerSolution, Sectorial, Solution, WagnerState, WallSolution } from '#shared/calc/kinds/open-section/solution'
import { stripFactor } from '#shared/torsion/bend-factor'
import { torsionOfOpenSection, type OpenSection, type OpenTorsion } from '#shared/torsion/open-section'
import { respondToRate, respondToTorque } from '#shared/torsion/response'
import type { Refusal } from '#shared/torsion/section'
import { checkSection } from '#shared/torsion/section-check'
import { sectorialProperties, type SectorialProperties } from '#shared/torsion/sectorial'
import { wagner } from '#shared/torsion/wagner'
import { faceStress } from '#shared/torsion/wall-stiffness'

export type Solved = { ok: true, solution: Solution } | { ok: false, faults: Fault[] }

export function solveOpenSection(model: OpenSectionModel): Solved {
  const section = engineSection(model)
  const torsion = torsionOfOpenSection(section)
  if (!torsion.ok) return { ok: false, faults: engineFaults(section, model, torsion.reason) }
  const walls = wallSolutions(model, torsion)
  const corners = cornersOf(model, torsion)
  const properties = sectorialProperties(section)
  const sectorial = properties.ok ? toSectorial(properties) : null
  const G = model.walls.every(w => w.G === model.walls[0]?.G) ? model.walls[0]?.G ?? null : null
  const perRate = stressPerRate(torsion, walls, corners)
  const worst = { face: largestPlace(perRate.face) ?? ['', 0], corner: largestPlace(perRate.corner) } as const
  const levels = { limit: levelsOf(model.factors, 'limit'), ultimate: levelsOf(model.factors, 'ultimate') }
  const knockdowns = knockdownByTemperature(model)
  const loads = model.cases.map(c => ({ c, response: responseOf(c, torsion), levels: levels[c.level] }))
  const refused = loads.flatMap(({ response, levels }, i) => [response, levels].flatMap(one => one.ok ? [] : [{ path: `cases.${i}`, message: one.reason }]))
  if (refused.length > 0) return { ok: false, faults: refused }
  const p = properties.ok ? properties : null
  const cases = loads.flatMap(({ c, response, levels }) =>
    response.ok && levels.ok ? [solveCase({ model, torsion, perRate, worst, p }, c, response, levels, knockdowns(c.temperature?.value))] : [])
  const base = {
    model, G, GJ: torsion.GJ, walls, corners, sectorial, cases, perRate,
    J: sum(walls.map(w => w.J)), Jplain: sum(walls.map(w => w.Jplain)),
    ...corrections(model, torsion), developed: torsion.developed, kL: decay(model, torsion, sectorial, p?.referenceE ?? null),
  }
  const { rows, governing } = marginRows(base)
  return { ok: true, solution: { ...base, margins: rows, governing, detailed: detailedCases(cases, walls.length + perRate.corner.size, rows, governing) } }
}

/** Per rate of twist: the response is linear, so that every case is a multiple of this. */
function stressPerRate(torsion: OpenTorsion, walls: WallSolution[], corners: CornerSolution[]): Solution['perRate'] {
  const flat = new Map(torsion.perWall.map(({ id, t, G }) => [id, faceStress(G, t, 1)]))
  return {
    face: new Map(walls.map(w => [w.wall.id, (flat.get(w.wall.id) ?? 0) * w.faceFactor])),
    corner: new Map(corners.flatMap(k => k.factor.ok ? [[k.node, k.factor.K * (flat.get(k.worst.id) ?? 0)] as const] : [])),
  }
}

/** Cases come at few temperatures; each is looked up once. */
function knockdownByTemperature(model: OpenSectionModel): (temperature: number | undefined) => Map<string, number> {
  const known = new Map<number | undefined, Map<string, number>>()
  return (temperature) => {
    const held = known.get(temperature) ?? new Map(model.materials.map(m => [m.id, knockdownOf(m, temperature)]))
    known.set(temperature, held)
    return held
  }
}

/** All cases, or where values by place and case would be too many those of the least margins and of the largest stress. */
function detailedCases(cases: CaseSolution[], places: number, rows: Solution['margins'], governing: Solution['governing']): ReadonlySet<string> {
  if (cases.length * places <= MOST_VALUES) return new Set(cases.map(c => c.model.id))
  const highest = cases.reduce((top, c) => c.tauMax > top.tauMax ? c : top)
  return new Set([...(governing ? [governing.caseId] : []), ...leastOfModes(rows).map(row => row.caseId), highest.model.id])
}

const sum = (values: readonly number[]) => values.reduce((total, value) => total + value, 0)

/** The engine takes moduli of elasticity for all walls or for none. */
export function engineSection(model: Pick<OpenSectionModel, 'nodes' | 'walls' | 'junctions'>): OpenSection {
  const withE = model.walls.every(w => w.E !== null)
  return {
    nodes: model.nodes,
    walls: model.walls.map(w => ({
      id: w.id, from: w.from, to: w.to, t: w.t.value, G: w.G,
      ...(w.tEnd ? { tEnd: w.tEnd.value } : {}),
      ...(withE && w.E !== null ? { E: w.E } : {}),
      ...(w.arc ? { arc: { radius: w.arc.radius, sweep: w.arc.sweep, startDirection: w.arc.direction } } : {}),
    })),
    junctions: model.junctions.map(j => ({ node: j.node, radius: j.radius.value, make: j.make })),
  }
}

const GUARD_OF_FAULT: Record<string, string> = { 'crossing': 'G-06: ', 'zero-length': 'G-06: ', 'bad-number': 'G-01: ' }

/** The engine's reasons, each at the wall or corner it speaks of. */
function engineFaults(section: OpenSection, model: OpenSectionModel, reason: string): Fault[] {
  const check = checkSection(section)
  if (check.ok) return [{ path: 'walls', message: reason }]
  return check.faults.map((fault) => {
    const wall = model.walls.findIndex(w => fault.walls.includes(w.id))
    const corner = model.junctions.findIndex(j => fault.nodes.includes(j.node))
    const path = (fault.code === 'bend' || fault.code === 'junction') && corner >= 0 ? `junctions.${corner}.radius` : wall >= 0 ? `walls.${wall}.end` : 'walls'
    return { path, message: `${GUARD_OF_FAULT[fault.code] ?? ''}${fault.message}` }
  })
}

function wallSolutions(model: OpenSectionModel, torsion: OpenTorsion): WallSolution[] {
  return torsion.perWall.flatMap((w): WallSolution[] => {
    const wall = model.walls.find(m => m.id === w.id)
    if (!wall) return []
    const strip = wall.arc ? stripFactor({ radius: wall.arc.radius, t: wall.tMax }) : null
    return [{
      wall, freeEnds: w.freeEnds, cornerEnds: w.cornerEnds, developed: w.developed, effective: w.effective,
      Jplain: w.plainGJ / w.G, J: w.GJ / w.G, GJ: w.GJ, share: w.share, slenderness: w.slenderness,
      faceFactor: strip?.ok ? strip.K : 1, ends: -w.endTerm / w.G,
    }]
  })
}

function corrections(model: OpenSectionModel, torsion: OpenTorsion) {
  const bulges = torsion.bulges.flatMap(({ node, bulge }) => {
    if (!bulge.ok) return []
    const through = model.walls.find(w => w.id === bulge.through[0])
    const abutting = model.walls.find(w => w.id === bulge.abutting)
    const r = model.junctions.find(j => j.node === node)?.radius.value ?? 0
    return [{ node, form: bulge.form, alpha: bulge.alpha, D: bulge.D, J: bulge.J, r, t1: through?.t.value ?? 0, t2: abutting?.t.value ?? 0 }]
  })
  return {
    bulges, noBulge: torsion.bulges.flatMap(({ node, bulge }) => bulge.ok ? [] : [{ node, reason: bulge.reason }]),
    bulge: sum(bulges.map(b => b.J)), endLoss: torsion.endLoss,
    ends: sum(torsion.perWall.map(w => w.endTerm / w.G)),
  }
}

/** What symmetry makes zero and arithmetic leaves at 1e-15 is shown as zero. */
function toSectorial(p: SectorialProperties): Sectorial {
  const size = p.rhoMax + Math.abs(p.centroid.x) + Math.abs(p.centroid.y)
  const settle = (value: number, scale: number) => Math.abs(value) < 1e-11 * scale ? 0 : value
  const point = ({ x, y }: { x: number, y: number }) => ({ x: settle(x, size), y: settle(y, size) })
  const I = p.Ixx + p.Iyy
  return {
    A: p.A, centroid: point(p.centroid), Ixx: settle(p.Ixx, I), Iyy: settle(p.Iyy, I), Ixy: settle(p.Ixy, I), shearCentre: point(p.shearCentre),
    Gamma: p.gamma, GammaPrimary: p.gammaPrimary, GammaSecondary: p.gammaSecondary ?? 0, omegaMax: p.omegaMax, E: p.referenceE, In: p.In,
  }
}

/** kL = L √(GJ / EΓ), where all of them are known. */
function decay(model: OpenSectionModel, torsion: OpenTorsion, sectorial: Sectorial | null, E: number | null): number | null {
  if (!sectorial || E === null || !model.length || !(sectorial.Gamma > 0)) return null
  const kL = model.length.value * Math.sqrt(torsion.GJ / (E * sectorial.Gamma))
  return Number.isFinite(kL) ? kL : null
}

interface CaseResponse { ok: true, torque: number, rate: number }

/** A part that follows the structure has its rate of twist given, any other its torque. What the engine refuses is asked of it, so that it says why. */
function responseOf(c: CaseModel, torsion: OpenTorsion): CaseResponse | Refusal {
  const torque = c.rate ? c.rate.value * torsion.GJ : c.torque?.value ?? 0
  const rate = c.rate ? c.rate.value : torque / torsion.GJ
  const peak = Math.abs(rate) * torsion.perWall.reduce((most, { G, t }) => Math.max(most, G * t), 0)
  if (Number.isFinite(torque) && Number.isFinite(rate) && Number.isFinite(peak)) return { ok: true, torque, rate }
  return c.rate ? respondToRate(torsion, c.rate.value) : respondToTorque(torsion, torque)
}

interface Section { model: OpenSectionModel, torsion: OpenTorsion, perRate: Solution['perRate'], worst: { face: readonly [string, number], corner: readonly [string, number] | null }, p: SectorialProperties | null }

function solveCase({ model, torsion, perRate, worst, p }: Section, c: CaseModel, { torque, rate }: CaseResponse, { toLimit, toUltimate }: Levels, knockdown: Map<string, number>): CaseSolution {
  const by = Math.abs(rate)
  return {
    model: c, torque, rate, twist: model.length ? rate * model.length.value : null, toLimit, toUltimate,
    tau: scaledValues(perRate.face, by), corner: scaledValues(perRate.corner, by), tauMax: worst.face[1] * by, tauMaxWall: worst.face[0],
    tauCorner: worst.corner ? worst.corner[1] * by : null, tauCornerNode: worst.corner?.[0] ?? null, knockdown,
    wagnerLimit: wagnerAt(torsion, p, rate * toLimit), wagnerUltimate: wagnerAt(torsion, p, rate * toUltimate),
  }
}

function wagnerAt(torsion: OpenTorsion, p: SectorialProperties | null, rate: number): WagnerState | null {
  if (!p || p.referenceE === null) return null
  const effect = wagner({ E: p.referenceE, GJ: torsion.GJ, In: p.In, Ips: p.Ips, A: p.weightedArea, rhoMax: p.rhoMax, rate })
  return effect.ok ? { In: p.In, ratio: effect.ratio, torque: effect.torque, stress: effect.edgeStress } : null
}
