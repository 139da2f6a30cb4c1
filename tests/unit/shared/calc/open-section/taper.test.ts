/** A wall whose thickness changes along it: (t₁ + t₂)(t₁² + t₂²)/12 for t³/3, each free end by its own thickness, stress at the thick end. */
import { describe, expect, it } from 'vitest'
import { polyline, quantity, stripInputs } from '../../../../factories/open-section'
import { solid, v } from '../../../../reference/outlines'
import { evaluateOpenSection } from '#shared/calc/kinds/open-section/evaluate'
import type { OpenSectionInputs } from '#shared/calc/kinds/open-section/schema'
import { outlineTorsion } from '#shared/torsion/outline/outline-torsion'

/** A strip of 40 mm that grows from 2 to 3 mm, G 26 900 MPa as the strip of the factory says. */
function tapered(end: string, change: Partial<OpenSectionInputs> = {}): OpenSectionInputs {
  const strip = stripInputs()
  const { walls, start } = polyline([['0', '0'], ['40', '0']], ['strip'], '2', strip.materials[0]?.id ?? '')
  return { ...strip, start, walls: walls.map(wall => ({ ...wall, tEnd: quantity(end, 'mm') })), ...change }
}
function resultOf(inputs: unknown) {
  const evaluation = evaluateOpenSection(inputs)
  if (!evaluation.ok) throw new Error(JSON.stringify(evaluation.faults))
  return evaluation.result
}
const value = (inputs: unknown, key: string) => resultOf(inputs).outputs.find(each => each.key === key)?.value ?? Number.NaN

describe('a tapering wall', () => {
  it('has L/12 (t₁+t₂)(t₁²+t₂²) less 0.105 t⁴ at each end (algebra; Saint-Venant’s end correction)', () => {
    expect(value(tapered('3'), 'J_plain')).toBeCloseTo(40 / 12 * 5 * 13, 9)
    expect(value(tapered('3'), 'J')).toBeCloseTo(40 / 12 * 5 * 13 - 0.105 * (2 ** 4 + 3 ** 4), 2)
  })

  it('agrees with its outline, solved as a trapezium by the general method, to 0.1 %', () => {
    const outline = outlineTorsion(solid(v(0, -1), v(40, -1.5), v(40, 1.5), v(0, 1)))
    if (!outline.ok) throw new Error(outline.reason)
    expect(Math.abs(value(tapered('3'), 'J') / outline.J.value - 1)).toBeLessThan(1e-3)
  })

  it('is stressed most where it is thickest: τ = T·t_max/J', () => {
    const result = resultOf(tapered('3'))
    const [row] = result.cases
    expect(row?.tauMax).toBeCloseTo(Math.abs(row?.torque ?? 0) * 3 / value(tapered('3'), 'J'), 9)
  })

  it('may taper either way, with one result', () => {
    const other = tapered('2', { walls: tapered('2').walls.map(wall => ({ ...wall, t: quantity('3', 'mm') })) })
    expect(value(other, 'J')).toBeCloseTo(value(tapered('3'), 'J'), 12)
  })

  it('is written out in the working and drawn with both thicknesses', () => {
    const { working, drawing } = resultOf(tapered('3'))
    expect(working.flatMap(step => step.lines).some(each => each.numbers.includes('(2+3)(2^2+3^2)'))).toBe(true)
    expect(drawing?.shapes.some(shape => shape.type === 'label' && shape.text === 't 2 to 3')).toBe(true)
  })

  it.each([['', 'the thickness at the end of wall a'], ['-1', 'the thickness at the end of wall a']])('is told of an end thickness of “%s” at its field', (end, label) => {
    const evaluation = evaluateOpenSection(tapered(end))
    expect(evaluation.ok ? [] : evaluation.faults).toContainEqual(expect.objectContaining({ path: 'walls.0.tEnd', message: expect.stringContaining(label) }))
  })

  it('is no bent sheet: a bend at its end is refused', () => {
    const strip = stripInputs()
    const { walls, start } = polyline([['0', '0'], ['40', '0'], ['40', '30']], ['a', 'b'], '2', strip.materials[0]?.id ?? '')
    const evaluation = evaluateOpenSection({ ...strip, start, walls: walls.map((wall, i) => (i === 0 ? { ...wall, tEnd: quantity('3', 'mm') } : wall)), junctions: [{ node: '2', radius: quantity('3', 'mm'), make: 'bent' }] })
    expect(evaluation.ok ? [] : evaluation.faults.map(({ path }) => path)).toEqual(['junctions.0.radius'])
  })
})
