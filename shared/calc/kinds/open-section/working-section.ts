/** Lengths, junction bulges and the torsion constant, wall by wall. */
import type { WorkingLine, WorkingStep } from '#shared/calc/types'
import type { CornerSolution, Solution, WallSolution } from '#shared/calc/kinds/open-section/solution'
import { addends, line, num, qty, res, sym } from '#shared/calc/parts/tex'
import { bulgeL, bulgeT } from '#shared/torsion/published'
import { cubicThickness } from '#shared/torsion/wall-stiffness'

export function sectionSteps(s: Solution): WorkingStep[] {
  return [
    { heading: 'Length of each wall between nodes', method: '§1.9', lines: s.walls.map(w => nodeLength(s, w)) },
    { heading: 'What each bend takes off the mid-line', method: '§1.9', lines: bendsOf(s).map(bendLine) },
    { heading: 'Developed length of the walls that are bent', method: '§1.9', lines: s.walls.flatMap(w => developedLine(s, w)) },
    { heading: 'Material of the machined junctions', method: '§1.10', lines: s.bulges.flatMap(bulgeLines) },
    { heading: 'Torsion constant of each wall', method: '§1.9', lines: s.walls.flatMap(w => wallLines(s, w)) },
    { heading: 'Torsion constant and stiffness of the section', method: '§1.9', lines: totals(s) },
  ]
}

function nodeLength(s: Solution, { wall }: WallSolution): WorkingLine {
  if (wall.arc) return line(`${sym('L', wall.id)} = r_m\\,|\\Delta|`, `${qty(wall.arc.radius, 'mm')}\\cdot ${qty(Math.abs(wall.arc.sweep), 'rad')}`, res(wall.length, 'mm'))
  const from = s.model.nodes.find(n => n.id === wall.from)
  const to = s.model.nodes.find(n => n.id === wall.to)
  const difference = (axis: 'x' | 'y') => num((to?.[axis] ?? 0) - (from?.[axis] ?? 0))
  return line(`${sym('L', wall.id)} = \\sqrt{\\Delta x^2 + \\Delta y^2}`, `\\sqrt{${difference('x')}^2 + ${difference('y')}^2}`, res(wall.length, 'mm'))
}

/** Bent corners: the mid-line runs round the bend and is shorter than along the two tangents. */
function bendsOf(s: Solution): CornerSolution[] {
  return s.corners.filter(c => c.junction?.make === 'bent' && c.walls.length === 2)
}

const turnOf = (c: CornerSolution) => c.interior - Math.PI
const meanRadius = (c: CornerSolution) => (c.junction?.radius.value ?? 0) + c.worst.t.value / 2
const shortening = (c: CornerSolution) => meanRadius(c) * (Math.tan(turnOf(c) / 2) - turnOf(c) / 2)

function bendLine(c: CornerSolution): WorkingLine {
  const half = num(turnOf(c) / 2)
  return line(
    `${sym('\\delta', c.node)} = \\left(r_i + \\frac{t}{2}\\right)\\left(\\tan\\frac{\\alpha}{2} - \\frac{\\alpha}{2}\\right)`,
    `\\left(${qty(c.junction?.radius.value ?? 0, 'mm')} + \\frac{${qty(c.worst.t.value, 'mm')}}{2}\\right)\\left(\\tan ${half} - ${half}\\right)`,
    res(shortening(c), 'mm'),
  )
}

function developedLine(s: Solution, w: WallSolution): WorkingLine[] {
  const bends = bendsOf(s).filter(c => c.walls.includes(w.wall))
  if (bends.length === 0) return []
  return [line(
    `${sym('L', `d,${w.wall.id}`)} = ${sym('L', w.wall.id)} ${bends.map(c => `- ${sym('\\delta', c.node)}`).join(' ')}`,
    `${qty(w.wall.length, 'mm')} ${bends.map(c => `- ${qty(shortening(c), 'mm')}`).join(' ')}`, res(w.developed, 'mm'),
  )]
}

function bulgeLines(b: Solution['bulges'][number]): WorkingLine[] {
  const c = b.form === 'L' ? bulgeL : bulgeT
  const [x, y] = [b.t2 / b.t1, b.r / b.t1]
  const signed = (k: number) => k < 0 ? `- ${num(-k)}` : `+ ${num(k)}`
  const alpha = sym('\\alpha', b.node)
  const [r, t1, t2] = [num(b.r), num(b.t1), num(b.t2)]
  return [
    line(`${alpha} = c_0 + c_1\\frac{t_2}{t_1} + c_2\\frac{r}{t_1} + c_3\\frac{t_2 r}{t_1^2} + c_4\\frac{t_2^2}{t_1^2}`,
      `${num(c.c0)} ${signed(c.c1)}\\cdot ${num(x)} ${signed(c.c2)}\\cdot ${num(y)} ${signed(c.c3)}\\cdot ${num(x * y)} ${signed(c.c4)}\\cdot ${num(x * x)}`, num(b.alpha)),
    b.form === 'L'
      ? line(`${sym('D', b.node)} = 2\\left[3r + t_1 + t_2 - \\sqrt{2(2r+t_1)(2r+t_2)}\\right]`, `2\\left[3\\cdot ${r} + ${t1} + ${t2} - \\sqrt{2(2\\cdot ${r}+${t1})(2\\cdot ${r}+${t2})}\\right]`, res(b.D, 'mm'))
      : line(`${sym('D', b.node)} = \\frac{(t_1+r)^2 + t_2(r+t_2/4)}{2r+t_1}`, `\\frac{(${t1}+${r})^2 + ${t2}(${r}+${t2}/4)}{2\\cdot ${r}+${t1}}`, res(b.D, 'mm')),
    line(`${sym('J', `b,${b.node}`)} = ${alpha}\\,${sym('D', b.node)}^4`, `${num(b.alpha)}\\cdot (${qty(b.D, 'mm')})^4`, res(b.J, 'mm⁴')),
  ]
}

/** A wall whose thickness tapers: (t₁ + t₂)(t₁² + t₂²)/12 stands for t³/3, and each free end takes off by its own thickness. */
function taperLine(w: WallSolution, length: string, share: number | null, { c, t1, t2 }: { c: number, t1: number, t2: number }): WorkingLine {
  const [a, b] = [sym('t', `1,${w.wall.id}`), sym('t', `2,${w.wall.id}`)]
  return line(
    `${sym('J', w.wall.id)} = \\frac{${length}}{12}(${a}+${b})(${a}^2+${b}^2)${w.ends > 0 ? ' - c\\sum t_e^4' : ''}${share === null ? '' : ' + \\sum\\tfrac12 J_b'}`,
    `\\frac{${num(w.effective)}}{12}(${num(t1)}+${num(t2)})(${num(t1)}^2+${num(t2)}^2)${w.ends > 0 ? ` - ${num(c)}\\cdot ${num(w.ends / c)}` : ''}${share === null ? '' : ` + ${num(share)}`}`,
    res(w.J, 'mm⁴'),
  )
}

/** One wall: Lt³/3, less its ends, plus its half of each bulge. */
function wallLines(s: Solution, w: WallSolution): WorkingLine[] {
  const { wall } = w
  const ends = w.freeEnds + w.cornerEnds
  const share = w.J - w.effective * cubicThickness([wall.t.value, (wall.tEnd ?? wall.t).value]) + w.ends
  const hasBulge = Math.abs(share) > 1e-9 * w.J
  const changed = Math.abs(w.effective - w.developed) > 1e-9 * w.developed
  const length = changed ? sym('L', `e,${wall.id}`) : s.corners.some(c => c.junction?.make === 'bent' && c.walls.includes(wall)) ? sym('L', `d,${wall.id}`) : sym('L', wall.id)
  const t = sym('t', wall.id)
  if (wall.tEnd) return [taperLine(w, length, hasBulge ? share : null, { c: s.endLoss, t1: wall.t.value, t2: wall.tEnd.value })]
  return [
    ...(changed ? [line(`${sym('L', `e,${wall.id}`)} = ${sym('L', wall.id)} + \\Delta L`, `${qty(w.developed, 'mm')} ${w.effective < w.developed ? '-' : '+'} ${qty(Math.abs(w.effective - w.developed), 'mm')}`, res(w.effective, 'mm'))] : []),
    line(
      `${sym('J', wall.id)} = \\frac{${length} ${t}^3}{3}${ends > 0 ? ` - c\\,n\\,${t}^4` : ''}${hasBulge ? ' + \\sum\\tfrac12 J_b' : ''}`,
      `\\frac{${num(w.effective)}\\cdot ${num(wall.t.value)}^3}{3}${ends > 0 ? ` - ${num(s.endLoss)}\\cdot ${ends}\\cdot ${num(wall.t.value)}^4` : ''}${hasBulge ? ` + ${num(share)}` : ''}`,
      res(w.J, 'mm⁴'),
    ),
  ]
}

function totals(s: Solution): WorkingLine[] {
  const J = line('J = \\sum_i J_i', addends(s.walls.map(w => num(w.J)), `\\sum_{i=1}^{${s.walls.length}} J_i`), res(s.J, 'mm⁴'))
  const stiffness = s.G === null
    ? line('GJ = \\sum_i G_i J_i', addends(s.walls.map(w => `${num(w.wall.G)}\\cdot ${num(w.J)}`), `\\sum_{i=1}^{${s.walls.length}} G_i J_i`), res(s.GJ, 'N·mm²'))
    : line('GJ = G\\,J', `${qty(s.G, 'MPa')}\\cdot ${qty(s.J, 'mm⁴')}`, res(s.GJ, 'N·mm²'))
  return [J, stiffness]
}
