import type { Content } from 'pdfmake/interfaces'
import type { NoteCalculation } from '#shared/note/calculations'
import { INK2 } from '#server/pdf/definition/colours'
import { ruledTable } from '#server/pdf/definition/tables'

export interface ListedInput { place: string, value: string }

const isQuantity = (value: object): value is { text: string, unit: string } =>
  'text' in value && 'unit' in value && Object.keys(value).length === 2

const label = (value: object, index: number) => {
  const { id, node } = value as { id?: unknown, node?: unknown }
  return String(id ?? node ?? index + 1)
}

/** Stored inputs as lines, of any kind of calculation: where each stands, and what was typed. */
export function listInputs(inputs: unknown, place: string[] = []): ListedInput[] {
  const here = place.join(' · ')
  if (inputs === null || inputs === '') return [{ place: here, value: '–' }]
  if (typeof inputs === 'boolean') return [{ place: here, value: inputs ? 'yes' : 'no' }]
  if (typeof inputs !== 'object') return [{ place: here, value: String(inputs) }]
  if (isQuantity(inputs)) return [{ place: here, value: inputs.text === '' ? '–' : `${inputs.text}${inputs.unit === '°' ? '' : '\u2009'}${inputs.unit}` }]
  if (Array.isArray(inputs)) {
    if (inputs.length === 0) return [{ place: here, value: 'none' }]
    return inputs.flatMap((one: unknown, i) => listInputs(one, [...place, typeof one === 'object' && one !== null ? label(one, i) : String(i + 1)]))
  }
  return Object.entries(inputs).filter(([key]) => key !== 'id').flatMap(([key, one]) => listInputs(one, [...place, words(key)]))
}

/** `twistAllowed` as `twist allowed`; symbols such as `Ftu` stay. */
const words = (key: string) => /^[A-Z]/.test(key) ? key : key.replace(/[A-Z]/g, capital => ` ${capital.toLowerCase()}`)

/** Every input of a calculation as it was typed, in two columns. */
export function inputListing(calculation: NoteCalculation): Content {
  const inputs = listInputs(calculation.inputs)
  const half = Math.ceil(inputs.length / 2)
  const column = (part: ListedInput[]): Content => part.length === 0
    ? { text: '' }
    : ruledTable({
        columns: [{ width: '*', head: 'Input' }, { width: 'auto', head: 'As typed', right: true }],
        rows: part.map(({ place, value }) => [{ text: place, color: INK2 }, { text: value, alignment: value.length > 24 ? 'left' : 'right' }]),
      })
  return { columns: [{ width: '*', ...column(inputs.slice(0, half)) as object }, { width: '*', ...column(inputs.slice(half)) as object }], columnGap: 18, fontSize: 8.5 } as Content
}
