/** The equations of the cells in symbols and numbers, their solution, then cases and margins. */
import type { ClosedSectionSolution } from '#shared/calc/kinds/closed-section/solve'
import { barMarginSteps, caseSteps, type BarResult } from '#shared/calc/parts/bar-outputs'
import { addends, line, num, qty, res, sub, sym } from '#shared/calc/parts/tex'
import type { WorkingLine, WorkingStep } from '#shared/calc/types'
import type { CellWall } from '#shared/torsion/cells/torsion-of-cells'

/** Of more cells or walls than this only those are written that decide. */
const MOST_CELLS = 8
const MOST_LINES = 12

export function closedSectionWorking(s: ClosedSectionSolution): WorkingStep[] {
  const result: BarResult = { ...s, places: [...s.places, ...s.cornerPlaces], bar: s.model.bar, method: '§2.1' }
  return [
    { heading: 'Typed values in N, mm, MPa and rad', method: '§10', lines: conversions(s) },
    { heading: 'Areas inside the mid-lines', method: '§2.1', lines: s.torsion.cells.slice(0, MOST_CELLS).map((cell, i) => line(`A_{${i + 1}} = \\tfrac12\\oint r\\,ds`, `\\text{walls ${cell.walls.slice(0, MOST_LINES).map(plain).join(', ')}}`, res(cell.area, 'mm²'))) },
    { heading: 'Flexibilities of the cells', method: '§2.2', lines: flexibilities(s) },
    { heading: `Equations of the cells for ${s.oneModulus ? 'Gθ′' : 'G_ref θ′'} = 1, and their solution`, method: '§2.2', lines: equations(s) },
    { heading: 'Torsion constant', method: '§2.2', lines: constant(s) },
    { heading: 'Mean stress, and its variation through the wall', method: '§2.1', lines: thicknessLines(s) },
    { heading: 'Corners', method: '§2.3', lines: cornerLines(s) },
    ...caseSteps(result, c => stressLines(s, c.torque, c.tauMaxPlace)),
    ...barMarginSteps(result),
  ].filter(step => step.lines.length > 0)
}

const plain = (id: string) => id.replaceAll('_', '\\_')

function conversions({ model }: ClosedSectionSolution): WorkingLine[] {
  const walls = model.walls.filter(wall => wall.t.unit !== 'mm').slice(0, MOST_LINES).map(wall => line(sym('t', wall.id), res(wall.t.value, wall.t.unit), res(wall.t.value, 'mm')))
  return walls
}

const flexibility = ({ length, t, G }: CellWall, Gref: number): number => length * Gref / (t * G)
const term = ({ length, t, G }: CellWall, Gref: number): string => `\\frac{${num(length)}}{${num(t)}}${G === Gref ? '' : `\\cdot\\frac{${num(Gref)}}{${num(G)}}`}`

/** δ of each cell and of each pair that shares walls; the symbol has the indices of both. */
function flexibilities({ torsion, oneModulus }: ClosedSectionSolution): WorkingLine[] {
  const { walls, Gref } = torsion
  const integral = oneModulus ? '\\frac{ds}{t}' : '\\frac{G_{ref}}{G}\\frac{ds}{t}'
  const sum = (own: readonly CellWall[]) => addends(own.map(wall => term(wall, Gref)), `\\sum \\frac{L}{t}\\text{ of ${own.length} walls}`)
  const value = (own: readonly CellWall[]) => own.reduce((total, wall) => total + flexibility(wall, Gref), 0)
  const shown = torsion.cells.slice(0, MOST_CELLS)
  return shown.flatMap((_, i) => {
    const own = walls.filter(wall => !wall.fin && (wall.left === i || wall.right === i))
    const shared = shown.flatMap((__, j) => {
      const both = j > i ? own.filter(wall => wall.left === j || wall.right === j) : []
      return both.length === 0 ? [] : [line(`\\delta_{${i + 1},${j + 1}} = \\int ${integral}`, sum(both), num(value(both)))]
    })
    return [line(`\\delta_{${i + 1}} = \\oint ${integral}`, sum(own), num(value(own))), ...shared]
  })
}

function equations({ torsion }: ClosedSectionSolution): WorkingLine[] {
  const { walls, cells, Gref } = torsion
  return cells.slice(0, MOST_CELLS).flatMap((cell, i) => {
    const own = walls.filter(wall => !wall.fin && (wall.left === i || wall.right === i))
    const between = new Map<number, number>()
    for (const wall of own) {
      const other = wall.left === i ? wall.right : wall.left
      if (other >= 0) between.set(other, (between.get(other) ?? 0) + flexibility(wall, Gref))
    }
    const total = own.reduce((sum, wall) => sum + flexibility(wall, Gref), 0)
    const others = [...between]
    const symbols = `\\delta_{${i + 1}}\\hat q_{${i + 1}}${others.map(([j]) => ` - \\delta_{${i + 1},${j + 1}}\\hat q_{${j + 1}}`).join('')}`
    const numbers = `${num(total)}\\cdot ${num(cell.flow)}${others.map(([j, value]) => ` - ${num(value)}\\cdot ${num(cells[j]?.flow ?? 0)}`).join('')}`
    const right = line(symbols, numbers, `2A_{${i + 1}} = ${res(2 * cell.area, 'mm²')}`)
    return others.length > 0 ? [right] : [line(`\\hat q_{${i + 1}} = \\frac{2A_{${i + 1}}}{\\delta_{${i + 1}}}`, `\\frac{2\\cdot ${qty(cell.area, 'mm²')}}{${num(total)}}`, res(cell.flow, 'mm'))]
  })
}

function constant({ torsion, GJ }: ClosedSectionSolution): WorkingLine[] {
  const fins = torsion.walls.filter(wall => wall.fin)
  const cells = torsion.cells.map(cell => `2\\cdot ${num(cell.area)}\\cdot ${num(cell.flow)}`)
  const strips = fins.map(({ length, t, G }) => `\\frac{${num(length)}\\cdot ${num(t)}^3}{3}${G === torsion.Gref ? '' : `\\cdot\\frac{${num(G)}}{${num(torsion.Gref)}}`}`)
  return [
    line(`J = 2\\sum A_i\\hat q_i${fins.length > 0 ? ' + \\sum \\frac{G}{G_{ref}}\\frac{L t^3}{3}' : ''}`, addends([...cells, ...strips], `\\text{${torsion.cells.length} cells and ${fins.length} strips}`), res(torsion.J, 'mm⁴')),
    line('GJ = G_{ref}\\,J', `${qty(torsion.Gref, 'MPa')}\\cdot ${qty(torsion.J, 'mm⁴')}`, res(GJ, 'N·mm²')),
  ]
}

/** Of the wall where χ counts, and of the one with the highest stress. */
function thicknessLines({ torsion, chi }: ClosedSectionSolution): WorkingLine[] {
  const wall = torsion.walls.find(one => one.id === chi?.wall)
  if (!wall || wall.chi === null) return []
  const half = wall.arc ? '\\tfrac12' : ''
  return [line(`${sym('\\chi', wall.id)} = \\frac{${half}G\\theta' t}{|q|/t}`, `\\frac{${half}${half === '' ? '' : '\\cdot '}${num(wall.G)}\\cdot ${num(wall.t)}}{${num(Math.abs(wall.flow))}\\cdot ${num(torsion.Gref)}/${num(wall.t)}}`, num(wall.chi))]
}

function cornerLines({ corners }: ClosedSectionSolution): WorkingLine[] {
  return corners.slice(0, MOST_LINES).flatMap(({ node, junction, worst, factor }): WorkingLine[] => {
    if (!factor.ok || junction === null) return []
    const [r, t] = [junction.radius.value, worst.t.value]
    const symbol = `K_{${sub(node)}}`
    return junction.make === 'bent'
      ? [line(`${symbol} = \\frac{t/r}{\\ln(1+t/r)}`, `\\frac{${num(t)}/${num(r)}}{\\ln(1+${num(t)}/${num(r)})}`, num(factor.K))]
      : [line(`${symbol} = K(r/t)`, `K(${num(r)}/${num(t)})\\ \\text{of the table}`, num(factor.K))]
  })
}

function stressLines({ torsion, GJ }: ClosedSectionSolution, torque: number, place: string): WorkingLine[] {
  const wall = torsion.walls.find(one => one.id === place)
  if (!wall) return []
  const rate = torque / GJ
  const q = wall.flow * torsion.Gref * rate
  const half = wall.arc && !wall.fin ? '\\tfrac12' : ''
  const variation = wall.facePerRate - wall.meanPerRate
  const face = Math.abs(rate) * wall.facePerRate
  const [t, tau] = [sym('t', wall.id), sym('\\tau', wall.id)]
  const rise = `${half}G|\\theta'|${t}`
  if (wall.fin) return [line(`${tau} = ${rise}`, `${num(wall.G)}\\cdot ${num(Math.abs(rate))}\\cdot ${num(wall.t)}`, res(face, 'MPa'))]
  return [
    line(`${sym('q', wall.id)} = ${sym('\\hat q', wall.id)}\\,G_{ref}\\theta'`, `${num(wall.flow)}\\cdot ${num(torsion.Gref)}\\cdot ${num(rate)}`, res(q, 'N/mm')),
    line(`${tau} = \\frac{|${sym('q', wall.id)}|}{${t}} + ${rise}`, `\\frac{${qty(Math.abs(q), 'N/mm')}}{${qty(wall.t, 'mm')}} + ${qty(Math.abs(rate) * variation, 'MPa')}`, res(face, 'MPa')),
  ]
}
