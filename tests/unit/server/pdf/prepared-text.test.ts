import { describe, expect, it } from 'vitest'
import { preparedText } from '#server/pdf/prepared-text'
import { listInputs } from '#server/pdf/definition/input-listing'
import { alignDecimals } from '#server/pdf/definition/tables'
import { outlineOperators } from '#server/pdf/equation-glyphs'
import { setEquation } from '#server/pdf/equations'

const latin = (codePoint: number) => codePoint < 0x300 || codePoint === 0x2212 || codePoint === 0xD7
const prepared = (content: unknown) => preparedText(content, latin)

describe('text before it is set', () => {
  it('keeps a number with its unit', () => expect(prepared('5\u2009813\u2009N·mm')).toBe('5\u202F813\u202FN·mm'))
  it('raises a negative power itself, since the face has no raised minus', () => {
    expect(prepared({ text: '2.35×10⁻⁴ rad/mm', bold: true })).toEqual({ text: [{ text: '2.35×10' }, { text: '\u22124', sup: true }, { text: ' rad/mm' }], bold: true })
  })
  it('names a character that it cannot print', () => expect(prepared({ stack: ['wall 壁'] })).toEqual({ stack: ['wall [U+58C1]'] }))
  it('goes through tables, lists and columns', () => {
    expect(prepared({ table: { widths: ['*'], body: [[{ text: 'a\u2009b' }, '']] } })).toEqual({ table: { widths: ['*'], body: [[{ text: 'a\u202Fb' }, '']] } })
    expect(prepared({ ul: [{ columns: ['\u2009'] }] })).toEqual({ ul: [{ columns: ['\u202F'] }] })
  })
})

describe('numbers in a column', () => {
  it('stand under each other by their points', () => {
    const texts = alignDecimals(['95.313', '136.33', '7', '>+10', '–']).map(cell => (cell as { text: string }).text)
    expect(texts).toEqual(['95.313', '136.33\u2007', '7\u2009\u2007\u2007\u2007', '>+10', '–'])
  })
})

describe('inputs as typed', () => {
  it('are listed a line each, of whatever kind', () => {
    expect(listInputs({
      units: 'SI', twistAllowed: null, ends: 'free', walls: [{ id: 'a', t: { text: '2.50', unit: 'mm' } }],
      loading: { by: 'cases', cases: [{ id: 'L02', torque: { text: '3/16', unit: 'N·m' } }] }, declarations: { builtIn: false },
    })).toEqual([
      { place: 'units', value: 'SI' }, { place: 'twist allowed', value: '–' }, { place: 'ends', value: 'free' }, { place: 'walls, a', value: 't 2.50\u2009mm' },
      { place: 'loading, by', value: 'cases' }, { place: 'loading, cases, L02', value: 'torque 3/16\u2009N·m' }, { place: 'declarations', value: 'built in no' },
    ])
  })
})

describe('equations', () => {
  it('turn quadratic curves into cubic ones', () => {
    // A quadratic from (0, 0) by (3, 3) to (6, 0) has the cubic controls (2, 2) and (4, 2): a third of the way back from each end (degree elevation).
    expect(outlineOperators('M0 0Q3 3 6 0H9V2Z')).toBe('0 0 m\n2 2 4 2 6 0 c\n9 0 l\n9 2 l\nh')
  })
  it('are outlines where they can be, pictures where they cannot, and name themselves where they are wrong', () => {
    expect(setEquation('\\frac{GJ}{L}\\left(1-\\sqrt{x}\\right)', 10, true).glyphs).not.toBeNull()
    expect(setEquation('\\boxed{x}', 10).glyphs).toBeNull()
    expect(setEquation('\\text{Länge}', 10).svg()).toContain('<text')
    expect(() => setEquation('\\frac{1', 10)).toThrow('The equation \\frac{1 cannot be set')
  })
  it('hang below the line by their depth', () => {
    expect(setEquation('x', 10).depth).toBeLessThan(0.5)
    expect(setEquation('\\frac{a}{b}', 10, true).depth).toBeGreaterThan(4)
  })
})
