/** Torque and twist of the deciding case, segment by segment, then the margins. */
import type { WorkingLine, WorkingStep } from '#shared/calc/types'
import type { AlongCase, AlongSolution } from '#shared/calc/kinds/torque-along-bar/solve'
import { leastOfModes } from '#shared/calc/parts/margin-rows'
import { marginLines, type MarginSource } from '#shared/calc/parts/margin-working'
import { degrees } from '#shared/calc/parts/say'
import { line, num, qty, res, sym } from '#shared/calc/parts/tex'
import { flexibility } from '#shared/torsion/span/segment'

export function alongWorking(s: AlongSolution): WorkingStep[] {
  const decisive = s.cases.find(c => c.model.id === s.governing?.caseId) ?? s.cases[0]
  if (!decisive) return []
  return [
    { heading: 'Flexibility of the segments', method: '§5.1', lines: s.model.segments.map(segmentLine) },
    { heading: `Reactions, case ${decisive.model.id}`, method: '§5.2', lines: reactions(decisive) },
    { heading: `Torque and twist, case ${decisive.model.id}`, method: '§5.1', lines: twists(s, decisive) },
    { heading: `Shear stress, case ${decisive.model.id}`, method: '§5.1', lines: stresses(s, decisive) },
    ...marginSteps(s),
  ].filter(step => step.lines.length > 0)
}

function segmentLine({ id, engine }: AlongSolution['model']['segments'][number]): WorkingLine {
  const { length, stiffness } = engine
  const f = res(flexibility(engine), '')
  if (stiffness.along !== 'tapering circle' || Math.abs(stiffness.d1 - stiffness.d2) < 1e-7 * stiffness.d1) {
    const GJ = stiffness.along === 'uniform' ? stiffness.GJ : stiffness.along === 'linear' ? stiffness.GJ1 : stiffness.G * Math.PI / 32 * stiffness.d1 ** 4
    return line(`${sym('f', id)} = \\frac{L}{GJ}`, `\\frac{${qty(length, 'mm')}}{${qty(GJ, 'N·mm²')}}`, `${f}\\ \\mathrm{rad/(N{\\cdot}mm)}`)
  }
  const { G, d1, d2 } = stiffness
  return line(`${sym('f', id)} = \\frac{32L}{3\\pi G(d_1-d_2)}\\left(\\frac1{d_2^3}-\\frac1{d_1^3}\\right)`, `\\frac{32\\cdot ${num(length)}}{3\\pi\\cdot ${num(G)}(${num(d1)}-${num(d2)})}\\left(\\frac1{${num(d2)}^3}-\\frac1{${num(d1)}^3}\\right)`, `${f}\\ \\mathrm{rad/(N{\\cdot}mm)}`)
}

const reactions = (c: AlongCase): WorkingLine[] => [
  ...c.response.reactions.map(one => line(`R_{${one.node}}`, c.response.reactions.length > 1 ? '\\text{by compatibility}' : '-\\sum T', res(one.torque, 'N·mm'))),
  line('\\sum R + \\sum T', '\\text{over the largest of them}', num(c.response.residual)),
]

function twists({ model }: AlongSolution, c: AlongCase): WorkingLine[] {
  return model.segments.flatMap((segment, i) => {
    const [from, to, ends] = [c.response.nodes[i], c.response.nodes[i + 1], c.response.segments[i]]
    if (!from || !to || !ends) return []
    const loaded = ends.m1 !== 0 || ends.m2 !== 0
    const f = flexibility(segment.engine)
    return [
      line(`${sym('T', segment.id)}`, loaded ? '\\text{at its start}' : '', res(ends.T, 'N·mm')),
      line(`\\varphi_{${i + 1}} = \\varphi_{${i}} + ${loaded ? '\\int\\frac{T}{GJ}\\,\\mathrm{d}z' : `${sym('T', segment.id)}\\,${sym('f', segment.id)}`}`, loaded ? `${num(from.phi)} + ${num(to.phi - from.phi)}` : `${num(from.phi)} + ${qty(ends.T, 'N·mm')}\\cdot ${num(f)}`, `${res(to.phi, 'rad')} = ${num(degrees(to.phi))}^{\\circ}`),
    ]
  })
}

function stresses({ model }: AlongSolution, c: AlongCase): WorkingLine[] {
  return model.segments.flatMap((segment, i) => {
    const state = c.segments[i]
    if (!state || state.tau === null || segment.perTorque === null) return []
    return [line(`${sym('\\tau', segment.id)} = \\frac{|T|}{W_T}`, `\\frac{${qty(Math.abs(state.torque), 'N·mm')}}{${qty(1 / segment.perTorque, 'mm³')}}`, res(state.tau, 'MPa'))]
  })
}

function marginSteps(s: AlongSolution): WorkingStep[] {
  const { factors } = s.model
  return leastOfModes(s.margins).flatMap((row): WorkingStep[] => {
    const c = s.cases.find(one => one.model.id === row.caseId)
    if (!c) return []
    const ultimate = row.level === 'ultimate'
    const segment = s.model.segments.find(one => row.key.startsWith(`${row.mode}:${one.id}@`))
    const common = { row, temperature: c.model.temperature?.value, toLevel: ultimate ? c.toUltimate : c.toLimit, safety: factors.ultimate }
    const source: MarginSource = segment
      ? { ...common, strength: { name: ultimate ? 'Fsu' : 'Fsy', materials: [segment.material] }, special: ultimate ? factors.special : factors.specialAtLimit, symbol: sym('\\tau', segment.id), factored: ultimate ? '\\tau_{ult}' : '\\tau_{lim}' }
      : { ...common, strength: null, limit: '\\varphi_a', special: 1, symbol: '|\\varphi|_{max}', factored: '\\varphi_{lim}' }
    return [{ heading: `${row.modeLabel}: least margin, ${row.place}, case ${row.caseId}`, method: segment ? '§7.3' : '§7.8', lines: marginLines(source) }]
  })
}
