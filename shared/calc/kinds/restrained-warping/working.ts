/** From section and ends to bimoments, to the stresses of the deciding fibre, to the margins; every line with its numbers. */
import type { MarginRow, WorkingLine, WorkingStep } from '#shared/calc/types'
import { sectionSteps } from '#shared/calc/kinds/open-section/working-section'
import { decisiveCase } from '#shared/calc/kinds/restrained-warping/diagrams'
import { factorOf, STRESS_MODES } from '#shared/calc/kinds/restrained-warping/margins'
import type { WarpingCase, WarpingSolution } from '#shared/calc/kinds/restrained-warping/solution'
import { settled } from '#shared/calc/kinds/restrained-warping/settled'
import { leastOfModes } from '#shared/calc/parts/margin-rows'
import { marginLines, type MarginSource } from '#shared/calc/parts/margin-working'
import { degrees } from '#shared/calc/parts/say'
import { line, num, qty, res, sym } from '#shared/calc/parts/tex'
import { fibreStress } from '#shared/torsion/warping/sectorial-run'
import type { StressPeak } from '#shared/torsion/warping/stress-peaks'

/** Members written out; of a longer bar the first ones. */
const MOST_MEMBERS = 12

export function restrainedWarpingWorking(s: WarpingSolution): WorkingStep[] {
  const c = decisiveCase(s)
  if (!c) return []
  const of = `, case ${c.model.id}`
  return [
    ...sectionSteps(s.section),
    { heading: 'Shear centre and warping constant', method: '§3.1', lines: warpingConstant(s) },
    { heading: 'Decay of warping along the bar', method: '§3.6', lines: decay(s) },
    { heading: `Bimoments of the axial forces${of}`, method: '§3.3', lines: bimoments(s, c) },
    { heading: `Stiffness under compression${of}`, method: '§7.7', lines: compression(s, c) },
    { heading: `Torque and bimoment at the ends of each member${of}`, method: '§3.5', lines: members(c) },
    { heading: `Reactions${of}`, method: '§3.5', lines: reactions(s, c) },
    { heading: `Largest values along the bar${of}`, method: '§3.3', lines: largest(c) },
    ...marginSteps(s),
  ].filter(step => step.lines.length > 0)
}

function warpingConstant({ section, run: { properties: p, residual } }: WarpingSolution): WorkingLine[] {
  const { x, y } = section.sectorial?.shearCentre ?? p.shearCentre
  const by = '\\text{along the mid-line}'
  const used = p.gamma > p.gammaPrimary
    ? line('\\Gamma = \\Gamma_1 + \\int \\frac{t^2}{12}\\rho^2\\,\\mathrm{d}A', `${num(p.gammaPrimary)} + ${num(p.gammaSecondary)}`, res(p.gamma, 'mm⁶'))
    : line('\\Gamma = \\int \\omega^2\\,\\mathrm{d}A', by, res(p.gamma, 'mm⁶'))
  return [
    line('x_S,\\ y_S', by, `${res(x, 'mm')},\\ ${res(y, 'mm')}`), used,
    line('\\omega_{max}', by, res(p.omegaMax, 'mm²')),
    line('\\left|\\int S_\\omega\\,\\mathrm{d}\\omega + \\Gamma_1\\right| / \\Gamma_1', '\\text{the flow of warping carries its torque}', num(residual)),
  ]
}

const decay = ({ section, EG, E, run, k, kL, model }: WarpingSolution): WorkingLine[] => [
  line('E\\Gamma', `${qty(E, 'MPa')}\\cdot ${qty(run.properties.gamma, 'mm⁶')}`, `${num(EG)}\\ \\mathrm{N{\\cdot}mm^4}`),
  line('k = \\sqrt{\\frac{GJ}{E\\Gamma}}', `\\sqrt{\\frac{${num(section.GJ)}}{${num(EG)}}}`, res(k, '1/mm')),
  line('kL', `${num(k)}\\cdot ${qty(model.length.value, 'mm')}`, num(kL)),
]

const bimoments = ({ run }: WarpingSolution, c: WarpingCase): WorkingLine[] => c.model.eccentric.map(({ P, node }) => {
  const omega = run.properties.omegaAt[node] ?? 0
  return line(`B = P\\,${sym('\\omega', node)}`, `${qty(P.value, 'N')}\\cdot ${qty(omega, 'mm²')}`, res(P.value * omega, 'N·mm²'))
})

function compression({ section, run: { properties: p } }: WarpingSolution, c: WarpingCase): WorkingLine[] {
  if (c.model.axial === 0) return []
  const stress = line('\\bar\\sigma = N/A', `${qty(c.model.axial, 'N')}/${qty(p.weightedArea, 'mm²')}`, res(c.axialStress, 'MPa'))
  if (!(c.compression > 0 && c.compression < 1)) return [stress]
  const ultimate = -c.axialStress * c.toUltimate
  return [stress, line('GJ_{eff} = GJ - |\\bar\\sigma_{ult}|\\,I_{ps}', `${num(section.GJ)} - ${qty(ultimate, 'MPa')}\\cdot ${num(p.Ips)}`, res(c.GJ, 'N·mm²'))]
}

function members(c: WarpingCase): WorkingLine[] {
  const { nodes, members: ends } = c.response
  return ends.slice(0, MOST_MEMBERS).flatMap((one, e) => {
    const [from, to] = [nodes[e]?.z ?? 0, nodes[e + 1]?.z ?? 0]
    const span = `\\text{from }${qty(from, 'mm')}\\text{ to }${qty(to, 'mm')}`
    return [line(`T(0)_{${e + 1}},\\ B(0)_{${e + 1}},\\ B(L)_{${e + 1}}`, span, `${res(settled(one.T, c.peaks.T.T), 'N·mm')},\\ ${res(settled(one.B1, c.peaks.B.B), 'N·mm²')},\\ ${res(settled(one.B2, c.peaks.B.B), 'N·mm²')}`)]
  })
}

const reactions = ({ model, cut }: WarpingSolution, c: WarpingCase): WorkingLine[] => [
  ...model.supports.flatMap(({ z, twist }, i) => {
    const found = c.response.reactions.find(one => one.node === cut.nodeAt(z))
    return twist === 'free' || !found ? [] : [line(`R_{${i + 1}}`, `\\text{at }${qty(z, 'mm')}`, res(found.torque, 'N·mm'))]
  }),
  line('\\left|\\sum R + \\sum T\\right|', '\\text{over the largest of them}', num(c.response.residual)),
]

function largest({ peaks: { phi, rate, B } }: WarpingCase): WorkingLine[] {
  const at = (z: number) => `\\text{at }${qty(z, 'mm')}`
  return [
    line('|\\varphi|_{max}', at(phi.z), `${res(Math.abs(phi.phi), 'rad')} = ${num(degrees(Math.abs(phi.phi)))}^{\\circ}`),
    line('|\\theta\'|_{max}', at(rate.z), res(Math.abs(rate.rate), 'rad/mm')),
    line('|B|_{max}', at(B.z), res(Math.abs(B.B), 'N·mm²')),
  ]
}

/** For the least margin of each mode: the fibre and station, its stresses, and the way to the margin. */
function marginSteps(s: WarpingSolution): WorkingStep[] {
  return leastOfModes(s.margins).flatMap((row): WorkingStep[] => {
    const c = s.cases.find(one => one.model.id === row.caseId)
    if (!c) return []
    const heading = `${row.modeLabel}: least margin, ${row.place}, case ${row.caseId}`
    return [{ heading, method: row.mode === 'twist' ? '§7.8' : row.mode.startsWith('corner') ? '§1.10, §7.3' : '§3.3, §7.4', lines: [...stressLines(s, c, row), ...marginLines(sourceOf(s, c, row))] }]
  })
}

function stressLines(s: WarpingSolution, c: WarpingCase, row: MarginRow): WorkingLine[] {
  const mode = STRESS_MODES.find(one => one.mode === row.mode)
  const index = s.groups.findIndex(({ id }) => row.key === `${row.mode}:${id.replace(' ', '-')}@${row.caseId}`)
  const peak = mode && c.stress[index]?.[mode.measure]
  if (peak) return [...fibreLines(s, c, peak), ...combinedLines(s, c, row, peak, index)]
  const corner = s.corners.findIndex(({ node }) => row.key === `${row.mode}:corner-${node}@${row.caseId}`)
  const place = s.corners[corner]
  if (!place) return []
  return [line('\\tau_c = K_c\\,G\\,t\\,|\\theta\'|_{max} + \\frac{|T_\\omega|_{max}}{\\Gamma}\\left(\\frac{S_\\omega}{t}\\right)_{max}', `${num(place.perRate)}\\cdot ${num(Math.abs(c.peaks.rate.rate))} + ${qty(Math.abs(c.peaks.Tw.Tw), 'N·mm')}\\cdot ${num(place.perTorque)}`, res(c.corner[corner] ?? 0, 'MPa'))]
}

/** A fibre at its station, with what is zero but for rounding shown as zero. */
function atFibre(s: WarpingSolution, c: WarpingCase, { fibre, place }: StressPeak) {
  const { properties, fibres } = s.run
  const most = fibres.reduce((high, one) => Math.max(high, Math.abs(one.S)), 0)
  const sound = { ...fibre, omega: settled(fibre.omega, properties.omegaMax), S: settled(fibre.S, most) }
  const state = { B: settled(place.B, c.peaks.B.B), Tw: settled(place.Tw, c.peaks.T.T), rate: settled(place.rate, c.peaks.rate.rate) }
  return { ...fibreStress(sound, properties.gamma, { ...state, axial: c.axialStress }), ...state, z: place.z }
}

function fibreLines(s: WarpingSolution, c: WarpingCase, peak: StressPeak): WorkingLine[] {
  const { gamma } = s.run.properties
  const { fibre, B, Tw, rate, z, sigma, tauSv, tauOmega } = atFibre(s, c, peak)
  const axial = c.axialStress === 0 ? ['', ''] : [' + \\bar\\sigma', ` + ${num(fibre.weight * c.axialStress)}`]
  const across = fibre.across === 0 ? ['', ''] : [' \\pm \\omega_t', ` \\pm ${num(fibre.across)}`]
  const weight = fibre.weight === 1 ? ['', ''] : ['\\frac{E}{E_0}', `${num(fibre.weight)}\\cdot`]
  const omega = fibre.across === 0 ? [`\\omega`, qty(fibre.omega, 'mm²')] : [`(\\omega${across[0]})`, `(${num(fibre.omega)}${across[1]})`]
  return [
    line('x,\\ y,\\ z', '\\text{fibre and station}', `${res(fibre.at.x, 'mm')},\\ ${res(fibre.at.y, 'mm')},\\ ${res(z, 'mm')}`),
    line(`\\sigma = ${weight[0]}\\frac{B\\,${omega[0]}}{\\Gamma}${axial[0]}`, `${weight[1]}\\frac{${qty(B, 'N·mm²')}\\cdot ${omega[1]}}{${qty(gamma, 'mm⁶')}}${axial[1]}`, res(sigma, 'MPa')),
    line('\\tau_{SV} = G\\,t\\,|\\theta\'|', `${qty(fibre.G, 'MPa')}\\cdot ${qty(fibre.t, 'mm')}\\cdot ${qty(Math.abs(rate), 'rad/mm')}`, res(tauSv, 'MPa')),
    line('\\tau_\\omega = \\frac{|T_\\omega\\,S_\\omega|}{\\Gamma\\,t}', `\\frac{${qty(Math.abs(Tw), 'N·mm')}\\cdot ${qty(Math.abs(fibre.S), 'mm⁴')}}{${qty(gamma, 'mm⁶')}\\cdot ${qty(fibre.t, 'mm')}}`, res(tauOmega, 'MPa')),
    line('\\tau = \\tau_{SV} + \\tau_\\omega', `${num(tauSv)} + ${num(tauOmega)}`, res(tauSv + tauOmega, 'MPa')),
  ]
}

function combinedLines(s: WarpingSolution, c: WarpingCase, row: MarginRow, peak: StressPeak, index: number): WorkingLine[] {
  const { value } = peak
  const { sigma, tauSv, tauOmega } = atFibre(s, c, peak)
  const [S, T] = [num(Math.abs(sigma)), num(tauSv + tauOmega)]
  if (row.mode === 'equivalent-yield') return [line('\\sigma_{vm} = \\sqrt{\\sigma^2 + 3\\tau^2}', `\\sqrt{${S}^2 + 3\\cdot ${T}^2}`, res(value, 'MPa'))]
  if (row.mode !== 'combined-ultimate') return []
  const materials = s.groups[index]?.materials ?? []
  const least = (name: 'Ftu' | 'Fsu') => Math.min(...materials.map(m => m[name] ?? Infinity))
  const cold = line('R = \\sqrt{\\left(\\frac{\\sigma}{F_{tu}}\\right)^2 + \\left(\\frac{\\tau}{F_{su}}\\right)^2}', `\\sqrt{\\left(\\frac{${S}}{${num(least('Ftu'))}}\\right)^2 + \\left(\\frac{${T}}{${num(least('Fsu'))}}\\right)^2}`, num(value))
  const k = value * factorOf(s, c, row.level) / row.applied
  return row.applied === 0 || Math.abs(k - 1) < 1e-9 ? [cold] : [cold, line('R(\\vartheta) = R/k', `${num(value)}/${num(k)}`, num(value / k))]
}

function sourceOf(s: WarpingSolution, c: WarpingCase, row: MarginRow): MarginSource {
  const { factors } = s.model
  const ultimate = row.level === 'ultimate'
  const common = { row, temperature: c.model.temperature?.value, toLevel: ultimate ? c.toUltimate : c.toLimit, safety: factors.ultimate }
  const level = ultimate ? 'ult' : 'lim'
  if (row.mode === 'twist') return { ...common, strength: null, limit: '\\varphi_a', special: 1, symbol: '|\\varphi|_{max}', factored: '\\varphi_{lim}' }
  const special = ultimate ? factors.special : factors.specialAtLimit
  if (row.mode === 'combined-ultimate') return { ...common, strength: null, limit: '1', special, symbol: 'R', factored: 'R_{ult}' }
  const corner = s.corners.find(({ node }) => row.key === `${row.mode}:corner-${node}@${row.caseId}`)
  if (corner) return { ...common, strength: { name: ultimate ? 'Fsu' : 'Fsy', materials: corner.materials }, special, symbol: '\\tau_c', factored: `\\tau_{c,${level}}` }
  const materials = s.groups.find(({ place }) => place === row.place)?.materials ?? []
  const [symbol, name] = row.mode === 'shear-ultimate' ? ['\\tau', 'Fsu'] as const : row.mode === 'normal-ultimate' ? ['|\\sigma|', 'Ftu'] as const : ['\\sigma_{vm}', 'Fty'] as const
  return { ...common, strength: { name, materials }, special, symbol, factored: `${symbol}_{${level}}`.replace('_{vm}_{lim}', '_{vm,lim}') }
}
