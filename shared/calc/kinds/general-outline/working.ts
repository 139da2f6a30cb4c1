/** The derivation with the numbers put in: three meshes to J and the peak, the load to the rate of twist and the stress, the stress to the margin. */
import type { WorkingLine, WorkingStep } from '#shared/calc/types'
import type { CaseSolution, Solution } from '#shared/calc/kinds/general-outline/solution'
import type { Measured } from '#shared/calc/parts/model'
import { centres } from '#shared/calc/kinds/general-outline/outputs'
import { leastOfModes } from '#shared/calc/parts/margin-rows'
import { marginLines, type MarginSource } from '#shared/calc/parts/margin-working'
import { degrees } from '#shared/calc/parts/say'
import { line, num, qty, res, sub, sym } from '#shared/calc/parts/tex'
import type { MeshEstimate } from '#shared/torsion/outline/convergence'
import { engineUnit, type Dimension, type UnitId } from '#shared/units/units'

export function generalOutlineWorking(s: Solution): WorkingStep[] {
  return [conversions(s), torsionStep(s), ...peakStep(s), areaStep(s), ...comparedStep(s), ...caseSteps(s), ...marginSteps(s)].filter(step => step.lines.length > 0)
}

/** The case of the governing margin first, then those of the other modes; without margins the first case. */
export function decisiveCases(s: Solution): CaseSolution[] {
  const ids = [s.governing?.caseId, ...leastOfModes(s.margins).map(row => row.caseId)]
  const found = [...new Set(ids)].flatMap(id => s.cases.find(c => c.model.id === id) ?? [])
  return found.length > 0 ? found : s.cases.slice(0, 1)
}

/** What was typed in other units, as the working uses it. */
function conversions(s: Solution): WorkingStep {
  const { material: m, length, twistAllowed } = s.model
  const from = (symbol: string, measured: Measured | null, dimension: Dimension): WorkingLine[] => {
    const unit = engineUnit(dimension)
    return measured === null || measured.unit === unit ? [] : [line(symbol, res(measured.value, measured.unit), res(measured.value, unit))]
  }
  const given = (symbol: string, value: number | null, unit: UnitId) => (value === null ? [] : from(symbol, { value, unit, typed: '' }, 'stress'))
  return {
    heading: 'Typed values in N, mm, MPa and rad', method: '§10',
    lines: [
      ...from('L', length, 'length'), ...from('\\varphi_a', twistAllowed, 'angle'), ...given('G', m.G, m.units.G), ...given('E', m.E, m.units.E),
      ...(['Fsu', 'Fty'] as const).flatMap(name => given(`F_{${name.slice(1)}}`, m[name], m.units.strength)),
      ...decisiveCases(s).flatMap(c => [...from(sym('T', c.model.id), c.model.torque, 'torque'), ...from(sym('\\theta\'', c.model.id), c.model.rate, 'rateOfTwist')]),
    ],
  }
}

/** The values on three meshes, the order they show and what is left uncertain. */
function estimateLines(symbol: string, { value, onMeshes, order, uncertainty }: MeshEstimate, unit: UnitId, unknowns: readonly number[]): WorkingLine[] {
  const meshes = onMeshes.map((one, k) => line(`${symbol}_${k + 1}`, `N = ${unknowns[k] ?? 0}`, res(one, unit)))
  const [a, b, c] = onMeshes.map(num)
  const seen = order === null ? [] : [line('p', `\\log_2\\left|\\frac{${b} - ${a}}{${c} - ${b}}\\right|`, num(Number(order.toPrecision(2))))]
  const part = value === 0 ? 0 : uncertainty / Math.abs(value)
  return [...meshes, ...(order !== null && onMeshes[2] !== onMeshes[1] ? seen : []), line(symbol, `${symbol}_3`, `${res(value, unit)} \\pm ${num(Number((100 * part).toPrecision(2)))}\\,\\%`)]
}

function torsionStep(s: Solution): WorkingStep {
  const { J, unknowns } = s.torsion
  return {
    heading: 'Torsion constant by boundary elements on three meshes', method: '§4.1, §4.2',
    lines: [...estimateLines('J', J, 'mm⁴', unknowns), line('GJ', `${qty(s.model.material.G, 'MPa')}\\cdot ${qty(J.value, 'mm⁴')}`, res(s.GJ, 'N·mm²'))],
  }
}

/** The peak, or the vertices at which there is none. */
function peakStep(s: Solution): WorkingStep[] {
  const { shear, unknowns, J } = s.torsion
  if (!shear.bounded) {
    return [{
      heading: 'Peak shear: unbounded at sharp re-entrant vertices', method: '§4.4',
      lines: shear.vertices.map(({ at, interior }) => line('\\alpha > 185^{\\circ}', `\\text{at }(${num(at.x)},\\ ${num(at.y)})\\,\\mathrm{mm}`, `${num(Number(degrees(interior).toPrecision(6)))}^{\\circ},\\ \\tau\\to\\infty`)),
    }]
  }
  const { estimate, first } = shear.peaks
  return [{
    heading: `Peak shear on ${first.edge}, at x ${Number(first.at.x.toPrecision(6))}, y ${Number(first.at.y.toPrecision(6))} mm`, method: '§4.1, §4.2',
    lines: [
      ...estimateLines('h', estimate, 'mm', unknowns).map(one => ({ ...one, symbols: one.symbols === 'h' ? 'h = \\frac{\\tau_{max}}{G\\theta\'}' : one.symbols })),
      ...s.W === null ? [] : [line('W_T = \\frac{J}{h}', `\\frac{${qty(J.value, 'mm⁴')}}{${qty(estimate.value, 'mm')}}`, res(s.W, 'mm³'))],
    ],
  }]
}

function areaStep(s: Solution): WorkingStep {
  const { A, Ixx, Iyy, Ixy } = s.torsion.properties
  const { centroid, shearCentre } = centres(s)
  const by = '\\text{along the outline}'
  const { gamma } = s.torsion
  const E = s.model.material.E
  return {
    heading: 'Area, centroid, shear centre and warping constant', method: '§4.1',
    lines: [
      line('A', by, res(A, 'mm²')),
      line('x_C,\\ y_C', by, `${res(centroid.x, 'mm')},\\ ${res(centroid.y, 'mm')}`),
      line('I_{xx},\\ I_{yy},\\ I_{xy}', by, `${res(Ixx, 'mm⁴')},\\ ${res(Iyy, 'mm⁴')},\\ ${res(Math.abs(Ixy) < 1e-9 * (Ixx + Iyy) ? 0 : Ixy, 'mm⁴')}`),
      line('x_S,\\ y_S', by, `${res(shearCentre.x, 'mm')},\\ ${res(shearCentre.y, 'mm')}`),
      ...gamma ? [line('\\Gamma = \\int \\phi_S^2\\,\\mathrm{d}A', by, res(gamma.value, 'mm⁶'))] : [],
      ...gamma && s.kL !== null && s.model.length && E !== null
        ? [line('kL = L\\sqrt{\\frac{GJ}{E\\Gamma}}', `${qty(s.model.length.value, 'mm')}\\,\\sqrt{\\frac{${qty(s.GJ, 'N·mm²')}}{${qty(E, 'MPa')}\\cdot ${qty(gamma.value, 'mm⁶')}}}`, num(s.kL))]
        : [],
    ],
  }
}

function comparedStep(s: Solution): WorkingStep[] {
  const shown = { 'J': ['J', 'mm⁴'], 'tau': ['1/W_T', ''], 'tau in a fillet': ['1/W_T', ''], 'gamma': ['\\Gamma', 'mm⁶'] } as const
  return [{
    heading: 'The first method against this one', method: '§4.5',
    lines: s.compared.map(({ quantity, first, second, agreement: { difference } }) => {
      const [symbol, unit] = shown[quantity]
      const value = (one: number) => (unit === '' ? `${num(one)}\\,\\mathrm{mm^{-3}}` : qty(one, unit))
      return line(`\\Delta_{${sub(quantity)}} = \\frac{(${symbol})_1}{(${symbol})_2} - 1`, `\\frac{${value(first)}}{${value(second)}} - 1`, `${num(Number((100 * difference).toPrecision(3)))}\\,\\%`)
    }),
  }]
}

function caseSteps(s: Solution): WorkingStep[] {
  return decisiveCases(s).map((c): WorkingStep => {
    const name = c.model.id === 'T' && s.cases.length === 1 ? '' : `, case ${c.model.id}`
    const level = c.model.level === 'ultimate' ? ' (given at ultimate)' : ''
    return { heading: `Rate of twist and stress${name}${level}`, method: c.model.rate ? '§6' : '§4.1', lines: [...rateLines(s, c), ...stressLines(s, c)] }
  })
}

function rateLines(s: Solution, c: CaseSolution): WorkingLine[] {
  const first = c.model.rate
    ? line('T = GJ\\,\\theta\'', `${qty(s.GJ, 'N·mm²')}\\cdot ${qty(c.rate, 'rad/mm')}`, res(c.torque, 'N·mm'))
    : line('\\theta\' = \\frac{T}{GJ}', `\\frac{${qty(c.torque, 'N·mm')}}{${qty(s.GJ, 'N·mm²')}}`, res(c.rate, 'rad/mm'))
  const twist = c.twist === null || !s.model.length
    ? []
    : [line('\\varphi = \\theta\'\\,L', `${qty(c.rate, 'rad/mm')}\\cdot ${qty(s.model.length.value, 'mm')}`, `${res(c.twist, 'rad')} = ${num(degrees(c.twist))}^{\\circ}`)]
  return [first, ...twist]
}

function stressLines(s: Solution, c: CaseSolution): WorkingLine[] {
  const { material } = s.model
  const rate = qty(Math.abs(c.rate), 'rad/mm')
  const peak = c.tau === null || !s.peaks ? [] : [line('\\tau_{max} = G\\,|\\theta\'|\\,h', `${qty(material.G, 'MPa')}\\cdot ${rate}\\cdot ${qty(s.peaks.estimate.value, 'mm')}`, res(c.tau, 'MPa'))]
  const w = c.wagnerLimit
  const large = w && material.E !== null
    ? [line('r_W = \\frac{E\\,I_n\\,\\theta\'^2}{2\\,GJ}', `\\frac{${qty(material.E, 'MPa')}\\cdot ${qty(w.In, 'mm⁶')}\\cdot (${qty(c.rate * c.toLimit, 'rad/mm')})^2}{2\\cdot ${qty(s.GJ, 'N·mm²')}}`, num(w.ratio))]
    : []
  return [...peak, ...large]
}

function marginSteps(s: Solution): WorkingStep[] {
  return leastOfModes(s.margins).flatMap((row): WorkingStep[] => {
    const c = s.cases.find(one => one.model.id === row.caseId)
    if (!c) return []
    const ultimate = row.level === 'ultimate'
    const common = { row, temperature: c.model.temperature?.value, toLevel: ultimate ? c.toUltimate : c.toLimit, safety: s.model.factors.ultimate }
    const source: MarginSource = row.mode === 'twist'
      ? { ...common, strength: null, limit: '\\varphi_a', special: 1, symbol: '|\\varphi|', factored: '\\varphi_{lim}' }
      : {
          ...common, strength: { name: ultimate ? 'Fsu' : 'Fsy', materials: [s.model.material] }, special: ultimate ? s.model.factors.special : s.model.factors.specialAtLimit,
          symbol: '\\tau_{max}', factored: ultimate ? '\\tau_{ult}' : '\\tau_{lim}',
        }
    const where = row.mode === 'twist' ? '' : `, ${row.place}`
    return [{ heading: `${row.modeLabel}: least margin${where}, case ${row.caseId}`, method: row.mode === 'twist' ? '§7.8' : '§7.3', lines: marginLines(source) }]
  })
}
