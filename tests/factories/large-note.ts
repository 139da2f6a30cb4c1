/** Notes of a size, and texts of a malice, that no person would write by hand: for what must stay quick. */
import { readDocument } from '#shared/note/schema'
import { calculations } from '../unit/shared/note/sample-results'
import { inlineEquation, noteDocument, paragraph, table, type Json } from './note-document'

const SENTENCES = [
  'In case L04 the rate of twist is 27.28 °/m, that is 0.476 rad/m, and the torsion constant of the channel is J = 3864.2 mm⁴, end terms included.',
  'The bar is 420 mm long between its clips and the free end turns through 15.08° in L07; the torque of L07 is 63 450 N·mm at limit.',
  'Rivets stand in one row at 25 mm pitch, the sheet is stocked in 1.6 mm and 2.0 mm, and the bolt is torqued to 4.5 N·m at assembly.',
  'See section 7.4 and figure 3; the drawing was issued 2026-06-26 and checked on 12 March 2026 against paragraph 5 of reference 4.',
  'Wall a is 3.2 mm thick, wall b 4 mm; in L04 wall a sees 39.9 MPa and wall b 49.9 MPa, so a margin of +1.48 leaves room.',
]

/** About forty lines a page: thirteen paragraphs of three sentences, and a table on every third page. */
export function largeNote(pages: number) {
  const blocks = Array.from({ length: pages }, (_, page): Json[] => [
    ...Array.from({ length: 13 }, (_, line) => paragraph([0, 1, 2].map(i => SENTENCES[(page + line * 2 + i) % SENTENCES.length]).join(' '))),
    ...page % 3 === 0 ? [table(['Case', 'Torque, N·m', 'Rate, °/m'], ...Array.from({ length: 12 }, (_, row) => [`L${row}`, `${40 + row}.2`, `${20 + row}.5`]))] : [],
  ]).flat()
  return readDocument(noteDocument({ 'description': blocks, 'section-analysis': calculations() }))
}

const repeated = (text: string, characters: number) => text.repeat(Math.ceil(characters / text.length)).slice(0, characters)
const around = (blocks: Json[]) => readDocument(noteDocument({ 'description': blocks, 'section-analysis': calculations() }))

/** One text of so many characters, of a sort that makes careless scanning slow. */
export const HOSTILE: Readonly<Record<string, (characters: number) => ReturnType<typeof around>>> = {
  'digits without an end': n => around([paragraph(repeated('1234567890', n))]),
  'numbers only': n => around([paragraph(repeated('1 ', n))]),
  'quantities only': n => around([paragraph(repeated('39.9 MPa, ', n))]),
  'dates only': n => around([paragraph(repeated('2026-06-26 ', n))]),
  'arithmetic without a result': n => around([paragraph(repeated('= 186/(1.5 × 65.68) − ', n))]),
  'points and commas': n => around([paragraph(repeated('1.,', n))]),
  'exponents': n => around([paragraph(repeated('1e1e1×10', n))]),
  'white space': n => around([paragraph(`1${' '.repeat(n)}mm`)]),
  'capitals': n => around([paragraph(repeated('A1 ', n))]),
  'letters without an end': n => around([paragraph(`${repeated('margin', n)} 5 mm`)]),
  'symbols': n => around([paragraph(repeated('J = 5 ', n))]),
  'one wide row': n => around([table(Array.from({ length: n / 20 }, () => 'Torque'), Array.from({ length: n / 20 }, () => '12.5 N·m'))]),
  'equations in one paragraph': n => around([paragraph(...Array.from({ length: n / 10 }, () => inlineEquation('\\tau=1')))]),
  'braces': n => around([paragraph(...Array.from({ length: n / 1000 }, () => inlineEquation(repeated('{1}_', 900))))]),
}
