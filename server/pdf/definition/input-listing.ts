import type { Content } from 'pdfmake/interfaces'
import type { NoteCalculation } from '#shared/note/calculations'
import { withUnit } from '#shared/units/display'
import type { UnitId } from '#shared/units/units'
import { INK2 } from '#server/pdf/definition/colours'
import { ruledTable } from '#server/pdf/definition/tables'

export interface ListedInput { place: string, value: string }

type Entries = Record<string, unknown>
const isEntries = (value: unknown): value is Entries => typeof value === 'object' && value !== null && !Array.isArray(value)
const isQuantity = (value: unknown): value is { text: string, unit: UnitId } =>
  isEntries(value) && 'text' in value && 'unit' in value && Object.keys(value).length === 2

/** `twistAllowed` as `twist allowed`; symbols such as `Ftu` stay. */
const words = (key: string) => /^[A-Z]/.test(key) ? key : key.replace(/[A-Z]/g, capital => ` ${capital.toLowerCase()}`)

/** A value in one line. Names of a group's members stand before their values. */
function inLine(value: unknown): string {
  if (value === null || value === '') return '–'
  if (typeof value === 'boolean') return value ? 'yes' : 'no'
  if (isQuantity(value)) return value.text === '' ? '–' : withUnit(value.text, value.unit)
  if (Array.isArray(value)) return value.length === 0 ? 'none' : value.map(one => `(${inLine(one)})`).join(' ')
  if (isEntries(value)) return Object.entries(value).filter(([key]) => key !== 'id').map(([key, one]) => `${words(key)} ${inLine(one)}`).join('; ')
  return String(value)
}

const label = (value: unknown, index: number) => isEntries(value) ? String(value.id ?? value.node ?? index + 1) : String(index + 1)

/** The stored inputs of a calculation of any kind, line by line, as they were typed. */
export function listInputs(inputs: Entries): ListedInput[] {
  return Object.entries(inputs).flatMap(([key, value]): ListedInput[] => {
    const place = words(key)
    if (Array.isArray(value) && value.length > 0) return value.map((one: unknown, i) => ({ place: `${place}, ${label(one, i)}`, value: inLine(one) }))
    if (isEntries(value) && Object.values(value).some(Array.isArray)) {
      return listInputs(value).map(one => ({ place: `${place}, ${one.place}`, value: one.value }))
    }
    return [{ place, value: inLine(value) }]
  })
}

export const inputListing = (calculation: NoteCalculation): Content => ruledTable({
  columns: [{ width: 96, head: 'Input' }, { width: '*', head: 'As typed' }],
  rows: listInputs(calculation.inputs).map(({ place, value }) => [{ text: place, color: INK2 }, value]),
})
