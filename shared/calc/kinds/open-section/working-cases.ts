/** Rate of twist, twist, torque shares and stresses of the cases that decide a margin. */
import type { WorkingLine, WorkingStep } from '#shared/calc/types'
import type { CaseSolution, CornerSolution, Solution, WallSolution } from '#shared/calc/kinds/open-section/solution'
import { leastOfModes } from '#shared/calc/parts/margin-rows'
import { degrees } from '#shared/calc/parts/say'
import { machinedCornerTable } from '#shared/torsion/published'
import { line, num, qty, res, sym } from '#shared/calc/parts/tex'

/** The case of the governing margin first, then those of the other modes; without margins the first case. */
export function decisiveCases(s: Solution): CaseSolution[] {
  const least = leastOfModes(s.margins)
  const ids = [s.governing?.caseId, ...least.map(row => row.caseId)]
  const found = [...new Set(ids)].flatMap(id => s.cases.find(c => c.model.id === id) ?? [])
  return found.length > 0 ? found : s.cases.slice(0, 1)
}

export function caseSteps(s: Solution): WorkingStep[] {
  return decisiveCases(s).flatMap((c, i): WorkingStep[] => {
    const name = c.model.id === 'T' && s.cases.length === 1 ? '' : `, case ${c.model.id}`
    const level = c.model.level === 'ultimate' ? ' (given at ultimate)' : ''
    return [
      { heading: `${s.model.by === 'rate' ? 'Torque from the imposed rate of twist' : 'Rate of twist'}${name}${level}`, method: s.model.by === 'rate' ? '§6' : '§1.9', lines: rateLines(s, c) },
      ...(i === 0 ? [{ heading: `Torque carried by each wall${name}`, method: '§1.9', lines: s.walls.map(w => shareLine(s, c, w)) }] : []),
      { heading: `Shear stress at the faces${name}`, method: '§1.9', lines: stressWalls(s, i === 0).flatMap(w => faceLines(c, w)) },
      { heading: `Shear stress at the inner corners${name}`, method: '§1.10', lines: cornersShown(s, i === 0).flatMap(k => cornerLines(c, k)) },
      { heading: `Large twist${name}, at limit`, method: '§7.7', lines: wagnerLines(s, c) },
    ]
  })
}

function rateLines(s: Solution, c: CaseSolution): WorkingLine[] {
  const rate = res(c.rate, 'rad/mm')
  const first = s.model.by === 'rate'
    ? line('T = GJ\\,\\theta\'', `${qty(s.GJ, 'N·mm²')}\\cdot ${qty(c.rate, 'rad/mm')}`, res(c.torque, 'N·mm'))
    : line('\\theta\' = \\frac{T}{GJ}', `\\frac{${qty(c.torque, 'N·mm')}}{${qty(s.GJ, 'N·mm²')}}`, rate)
  const perMetre = line('\\theta\'', `${qty(c.rate, 'rad/mm')}\\cdot 1000\\,\\mathrm{mm/m}`, `${res(c.rate, 'rad/m')} = ${res(c.rate, '°/m')}`)
  if (c.twist === null || !s.model.length) return [first, perMetre]
  return [
    first, perMetre,
    line('\\varphi = \\theta\'\\,L', `${qty(c.rate, 'rad/mm')}\\cdot ${qty(s.model.length.value, 'mm')}`, `${res(c.twist, 'rad')} = ${num(degrees(c.twist))}^{\\circ}`),
  ]
}

function shareLine(s: Solution, c: CaseSolution, w: WallSolution): WorkingLine {
  const G = s.G === null ? `${sym('G', w.wall.id)} ` : ''
  const top = s.G === null ? `${num(w.wall.G)}\\cdot ${num(w.J)}` : num(w.J)
  return line(`${sym('T', w.wall.id)} = T\\,\\frac{${G}${sym('J', w.wall.id)}}{${s.G === null ? 'GJ' : 'J'}}`,
    `${qty(c.torque, 'N·mm')}\\cdot\\frac{${top}}{${s.G === null ? num(s.GJ) : num(s.J)}}`, res(c.torque * w.share, 'N·mm'))
}

/** All walls for the governing case; for the others only walls that hold a least margin. */
function stressWalls(s: Solution, all: boolean): WallSolution[] {
  const decisive = new Set(leastOfModes(s.margins).map(row => row.wall))
  return all ? s.walls : s.walls.filter(w => decisive.has(w.wall.id))
}

function cornersShown(s: Solution, all: boolean): CornerSolution[] {
  const decisive = new Set(leastOfModes(s.margins).map(row => row.place))
  return all ? s.corners : s.corners.filter(k => decisive.has(`corner ${k.node}`))
}

function faceLines(c: CaseSolution, w: WallSolution): WorkingLine[] {
  const { wall } = w
  const rate = Math.abs(c.rate)
  const product = `${qty(wall.G, 'MPa')}\\cdot ${qty(wall.tMax, 'mm')}\\cdot ${qty(rate, 'rad/mm')}`
  const tau = c.tau.get(wall.id) ?? 0
  const t = sym('t', wall.tEnd ? `max,${wall.id}` : wall.id)
  if (!wall.arc) return [line(`${sym('\\tau', wall.id)} = G\\,${t}\\,|\\theta'|`, product, res(tau, 'MPa'))]
  const ri = wall.arc.radius - wall.tMax / 2
  return [
    bendFactorLine(sym('K', wall.id), ri, wall.tMax, w.faceFactor),
    line(`${sym('\\tau', wall.id)} = ${sym('K', wall.id)}\\,G\\,${t}\\,|\\theta'|`, `${num(w.faceFactor)}\\cdot ${product}`, res(tau, 'MPa')),
  ]
}

function cornerLines(c: CaseSolution, k: CornerSolution): WorkingLine[] {
  if (!k.factor.ok) return []
  const K = sym('K', `c,${k.node}`)
  const { worst } = k
  const factor = k.junction?.make === 'bent'
    ? bendFactorLine(K, k.junction.radius.value, worst.tMax, k.factor.K)
    : tableLine(K, k.ratio, k.factor.K)
  return [factor, line(`${sym('\\tau', k.node)} = ${K}\\,G\\,t\\,|\\theta'|`,
    `${num(k.factor.K)}\\cdot ${qty(worst.G, 'MPa')}\\cdot ${qty(worst.tMax, 'mm')}\\cdot ${qty(Math.abs(c.rate), 'rad/mm')}`, res(c.corner.get(k.node) ?? 0, 'MPa'))]
}

/** Between two points of the table: the lesser of the chord in x = r/t and the chord in logarithms. */
function tableLine(symbol: string, x: number, K: number): WorkingLine {
  const above = machinedCornerTable.findIndex(([ratio]) => ratio >= x)
  const upper = machinedCornerTable[above]
  const lower = machinedCornerTable[above - 1]
  if (!upper || !lower || upper[0] === x) return line(`${symbol} = K_c(r/t)`, `K_c(${num(x)})\\ \\text{as tabulated}`, num(K))
  const [[x1, k1], [x2, k2]] = [lower, upper]
  return line(
    `${symbol} = \\min\\left[K_1 + (K_2-K_1)\\tfrac{x-x_1}{x_2-x_1},\\ K_1\\left(\\tfrac{K_2}{K_1}\\right)^{\\frac{\\ln(x/x_1)}{\\ln(x_2/x_1)}}\\right],\\quad x = \\tfrac rt`,
    `\\min\\left[${num(k1)} + (${num(k2)}-${num(k1)})\\tfrac{${num(x)}-${num(x1)}}{${num(x2)}-${num(x1)}},\\ ${num(k1)}\\left(\\tfrac{${num(k2)}}{${num(k1)}}\\right)^{\\frac{\\ln(${num(x)}/${num(x1)})}{\\ln(${num(x2)}/${num(x1)})}}\\right]`,
    num(K),
  )
}

function bendFactorLine(symbol: string, ri: number, t: number, K: number): WorkingLine {
  const ro = num(ri + t)
  return line(`${symbol} = \\frac1t\\left[\\frac{r_o^2-r_i^2}{2r_i\\ln(r_o/r_i)}-r_i\\right]`,
    `\\frac{1}{${num(t)}}\\left[\\frac{${ro}^2-${num(ri)}^2}{2\\cdot ${num(ri)}\\,\\ln(${ro}/${num(ri)})}-${num(ri)}\\right]`, num(K))
}

function wagnerLines(s: Solution, c: CaseSolution): WorkingLine[] {
  const w = c.wagnerLimit
  const E = s.sectorial?.E ?? null
  if (!w || E === null) return []
  return [line('r_W = \\frac{E\\,I_n\\,\\theta\'^2}{2\\,GJ}', `\\frac{${qty(E, 'MPa')}\\cdot ${qty(w.In, 'mm⁶')}\\cdot (${qty(c.rate * c.toLimit, 'rad/mm')})^2}{2\\cdot ${qty(s.GJ, 'N·mm²')}}`, num(w.ratio))]
}
