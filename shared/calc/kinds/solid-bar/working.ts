/** J and the torsional modulus by the formula of the shape, then the bar's cases and margins. */
import type { WorkingLine, WorkingStep } from '#shared/calc/types'
import type { SolidBarSolution } from '#shared/calc/kinds/solid-bar/solve'
import { barMarginSteps, caseSteps, type BarResult } from '#shared/calc/parts/bar-outputs'
import { line, num, qty, res } from '#shared/calc/parts/tex'
import type { Solid } from '#shared/torsion/solids/solid'

export function solidBarWorking(s: SolidBarSolution): WorkingStep[] {
  const { model, torsion, GJ, places } = s
  const result: BarResult = { ...s, bar: model.bar, method: torsion.method }
  const [peak] = places
  return [
    { heading: 'Typed values in N, mm, MPa and rad', method: '§10', lines: conversions(s) },
    { heading: 'Torsion constant', method: torsion.method, lines: [constant(model.solid, torsion.J), line('GJ', `${qty(model.material.G, 'MPa')}\\cdot ${qty(torsion.J, 'mm⁴')}`, res(GJ, 'N·mm²'))] },
    { heading: `Torsional modulus, ${peak?.place ?? 'at the peak'}`, method: torsion.method, lines: [modulus(model.solid, torsion.peak.perRate), line('W_T = \\frac{J}{\\tau_{max}/G\\theta\'}', `\\frac{${qty(torsion.J, 'mm⁴')}}{${qty(torsion.peak.perRate, 'mm')}}`, res(torsion.WT, 'mm³'))] },
    ...caseSteps(result, c => [line('\\tau_{max} = \\frac{|T|}{W_T}', `\\frac{${qty(Math.abs(c.torque), 'N·mm')}}{${qty(torsion.WT, 'mm³')}}`, res(c.tauMax, 'MPa'))]),
    ...barMarginSteps(result),
  ].filter(step => step.lines.length > 0)
}

function conversions({ model }: SolidBarSolution): WorkingLine[] {
  return model.sizes.filter(({ measured, symbol }) => measured.unit !== (symbol === '\\alpha' ? 'rad' : 'mm')).map(({ symbol, measured }) =>
    line(symbol, res(measured.value, measured.unit), res(measured.value, symbol === '\\alpha' ? 'rad' : 'mm')))
}

const tabulated = (symbols: string, J: number, unit: 'mm⁴' | 'mm') => line(symbols, '\\text{by its series or table}', res(J, unit))

function constant(solid: Solid, J: number): WorkingLine {
  switch (solid.shape) {
    case 'circle': return solid.innerRadius === 0
      ? line('J = \\tfrac{\\pi}{2}R^4', `\\tfrac{\\pi}{2}\\,${num(solid.outerRadius)}^4`, res(J, 'mm⁴'))
      : line('J = \\tfrac{\\pi}{2}(R_o^4-R_i^4)', `\\tfrac{\\pi}{2}(${num(solid.outerRadius)}^4-${num(solid.innerRadius)}^4)`, res(J, 'mm⁴'))
    case 'ellipse': return line('J = \\frac{\\pi a^3b^3}{a^2+b^2}(1-\\kappa^4)', `\\frac{\\pi\\,${num(solid.semiMajor)}^3\\cdot ${num(solid.semiMinor)}^3}{${num(solid.semiMajor)}^2+${num(solid.semiMinor)}^2}(1-${num(solid.ratio)}^4)`, res(J, 'mm⁴'))
    case 'rectangle': {
      const [a, b] = [Math.max(solid.width, solid.height), Math.min(solid.width, solid.height)]
      return line('J = \\beta(a/b)\\,a\\,b^3', `${num(J / (a * b ** 3))}\\cdot ${num(a)}\\cdot ${num(b)}^3`, res(J, 'mm⁴'))
    }
    case 'equilateral triangle': return line('J = \\frac{\\sqrt3}{80}a^4', `\\frac{\\sqrt3}{80}\\,${num(solid.side)}^4`, res(J, 'mm⁴'))
    case 'right isosceles triangle': return line('J = 0.0260897\\,a^4', `0.0260897\\cdot ${num(solid.leg)}^4`, res(J, 'mm⁴'))
    case 'semicircle': return line('J = \\left(\\tfrac{\\pi}{2}-\\tfrac{4}{\\pi}\\right)R^4', `\\left(\\tfrac{\\pi}{2}-\\tfrac{4}{\\pi}\\right)${num(solid.radius)}^4`, res(J, 'mm⁴'))
    case 'sector': return tabulated('J = R^4\\,\\frac{8\\alpha}{\\pi^2}\\sum_{n\\,odd}\\frac{1}{n^2(\\lambda_n+2)^2},\\quad \\lambda_n=\\tfrac{n\\pi}{\\alpha}', J, 'mm⁴')
    case 'segment': return tabulated('J = R^4\\,f(h/R)', J, 'mm⁴')
    default: return line('J = c\\,d^4', `${num(J / solid.flats ** 4)}\\cdot ${num(solid.flats)}^4`, res(J, 'mm⁴'))
  }
}

function modulus(solid: Solid, perRate: number): WorkingLine {
  const symbol = '\\frac{\\tau_{max}}{G\\theta\'}'
  switch (solid.shape) {
    case 'circle': return line(`${symbol} = R`, qty(solid.outerRadius, 'mm'), res(perRate, 'mm'))
    case 'ellipse': {
      const [a, b] = [Math.max(solid.semiMajor, solid.semiMinor), Math.min(solid.semiMajor, solid.semiMinor)]
      return line(`${symbol} = \\frac{2a^2b}{a^2+b^2}`, `\\frac{2\\cdot ${num(a)}^2\\cdot ${num(b)}}{${num(a)}^2+${num(b)}^2}`, res(perRate, 'mm'))
    }
    case 'rectangle': {
      const b = Math.min(solid.width, solid.height)
      return line(`${symbol} = b\\,Q(a/b)`, `${num(b)}\\cdot ${num(perRate / b)}`, res(perRate, 'mm'))
    }
    case 'semicircle': return line(`${symbol} = \\frac{8}{3\\pi}R`, `\\frac{8}{3\\pi}\\,${num(solid.radius)}`, res(perRate, 'mm'))
    default: return tabulated(symbol, perRate, 'mm')
  }
}
