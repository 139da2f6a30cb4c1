/** A note of many calculations and pages: families of one load, bars and sections that follow it, and text between. */
import { largeNote } from './large-note'
import { calculation, noteDocument, testId, withId, type Json } from './note-document'
import { hatInputs, lippedChannelInputs } from './open-section'
import { channelBarInputs } from './restrained-warping'
import { solidBarInputs } from './solid-bar'
import { steppedShaftInputs } from './torque-along-bar'
import { webLoadInputs } from './torque-from-loads'

type Inputs = Record<string, unknown>
const of = (kind: string, inputs: unknown) => ({ kind, inputs: inputs as Inputs })

/** One family of ten: the load, five bars that take its torque, and four calculations of their own. */
function family(loadId: string): { kind: string, inputs: Inputs }[] {
  const torque = (key: string) => ({ text: '', unit: 'N·m', from: { calculation: loadId, key } })
  const bar = (key: string) => of('solid-bar', { ...solidBarInputs(), loading: { by: 'torque', torque: torque(key), level: 'limit', temperature: null, source: 'EX-L-20 page 3' } })
  return [
    of('torque-from-loads', webLoadInputs()), bar('T@L01'), bar('T@L02'), bar('T@L01'), bar('T@L02'), bar('T@L01'),
    of('open-section', hatInputs()), of('open-section', lippedChannelInputs()), of('restrained-warping', channelBarInputs()), of('torque-along-bar', steppedShaftInputs()),
  ]
}

/** Ids of the calculations of `calculatedNote`, in order: every tenth is a load, with five bars after it that follow it. */
export const calculationId = (index: number): string => testId(700_000 + index)

/** `count` calculations, a multiple of ten, and the text of `pages` pages. */
export function calculatedNote(count: number, pages: number): Json {
  const blocks = Array.from({ length: count / 10 }, (_, f) => family(calculationId(10 * f)).map(({ kind, inputs }, i): Json =>
    withId(calculationId(10 * f + i), calculation(`Part ${f + 1}, ${i + 1}`, { kind, inputs })))).flat()
  const text = (largeNote(pages).toJSON() as Json).content?.find(section => section.attrs?.key === 'description')?.content ?? []
  return noteDocument({ 'description': text, 'section-analysis': blocks })
}
