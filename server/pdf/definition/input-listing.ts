import type { Content } from 'pdfmake/interfaces'
import type { LinkSource } from '#shared/calc/links'
import type { TypedQuantity } from '#shared/calc/types'
import type { NoteCalculation } from '#shared/note/calculations'
import { showQuantity, withUnit } from '#shared/units/display'
import { unitFits, type UnitId } from '#shared/units/units'
import { INK2 } from '#server/pdf/definition/colours'
import { resultOf, type NoteContext } from '#server/pdf/definition/note-context'
import { ruledTable } from '#server/pdf/definition/tables'

export interface ListedInput { place: string, value: string }

type Entries = Record<string, unknown>
export const isEntries = (value: unknown): value is Entries => typeof value === 'object' && value !== null && !Array.isArray(value)
const isQuantity = (value: unknown): value is TypedQuantity => isEntries(value) && 'text' in value && 'unit' in value

/** A linked value as it is now, with the calculation it comes from; without a note to look in, the name of the link. */
function linkedValue({ calculation, key }: LinkSource, unit: UnitId, context: NoteContext | null): string {
  const label = context?.calculations.find(one => one.id === calculation)?.label ?? 'another calculation'
  const output = context ? resultOf(context.data, calculation)?.outputs.find(one => one.key === key) : undefined
  const value = output ? `${showQuantity(output.value, output.dimension, unitFits(unit, output.dimension) ? unit : output.unit)} ` : ''
  return `${value}(from ${label}, ${key})`
}

/** `twistAllowed` as `twist allowed`; symbols such as `Ftu` stay. */
const words = (key: string) => /^[A-Z]/.test(key) ? key : key.replace(/[A-Z]/g, capital => ` ${capital.toLowerCase()}`)

/** A value in one line. Names of a group's members stand before their values. */
export function inLine(value: unknown, context: NoteContext | null = null): string {
  if (value === null || value === '') return '–'
  if (typeof value === 'boolean') return value ? 'yes' : 'no'
  if (isQuantity(value) && value.from) return linkedValue(value.from, value.unit, context)
  if (isQuantity(value)) return value.text === '' ? '–' : withUnit(value.text, value.unit)
  if (Array.isArray(value)) return value.length === 0 ? 'none' : value.map(one => `(${inLine(one, context)})`).join(' ')
  if (isEntries(value)) return Object.entries(value).filter(([key]) => key !== 'id').map(([key, one]) => `${words(key)} ${inLine(one, context)}`).join('; ')
  return String(value)
}

const label = (value: unknown, index: number) => isEntries(value) ? String(value.id ?? value.node ?? index + 1) : String(index + 1)

/** The stored inputs of a calculation of any kind, line by line, as they were typed. */
export function listInputs(inputs: Entries, context: NoteContext | null = null): ListedInput[] {
  return Object.entries(inputs).flatMap(([key, value]): ListedInput[] => {
    const place = words(key)
    if (Array.isArray(value) && value.length > 0) return value.map((one: unknown, i) => ({ place: `${place}, ${label(one, i)}`, value: inLine(one, context) }))
    if (isEntries(value) && Object.values(value).some(Array.isArray)) {
      return listInputs(value, context).map(one => ({ place: `${place}, ${one.place}`, value: one.value }))
    }
    return [{ place, value: inLine(value, context) }]
  })
}

/** Where a profile stands, the wall table rests: it is kept for the editor and nothing of it is read. */
const inForce = (inputs: Entries): Entries =>
  inputs.profile === undefined ? inputs : Object.fromEntries(Object.entries(inputs).filter(([key]) => key !== 'start' && key !== 'walls' && key !== 'junctions'))

export const inputListing = (calculation: NoteCalculation, context: NoteContext): Content => ruledTable({
  columns: [{ width: 96, head: 'Input' }, { width: '*', head: 'As typed' }],
  rows: listInputs(inForce(calculation.inputs), context).map(({ place, value }) => [{ text: place, color: INK2 }, value]),
})
