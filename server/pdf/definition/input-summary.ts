import type { Content } from 'pdfmake/interfaces'
import { openSectionSchema, type OpenSectionInputs } from '#shared/calc/kinds/open-section/schema'
import type { CalcResult, TypedQuantity } from '#shared/calc/types'
import type { NoteCalculation } from '#shared/note/calculations'
import { withUnit } from '#shared/units/display'
import { HAIR, INK3 } from '#server/pdf/definition/colours'
import { TABLE_TEXT } from '#server/pdf/definition/tables'

type Fact = [label: string, value: string]
const typed = (quantity: TypedQuantity | null) => quantity === null || quantity.text === '' ? 'not given' : withUnit(quantity.text, quantity.unit)

/** What the results beside it rest on, in a few lines; everything typed stands in the appendix. */
export function inputSummary(calculation: NoteCalculation, result: CalcResult): Content {
  const parsed = calculation.kind === 'open-section' ? openSectionSchema.safeParse(calculation.inputs) : null
  const facts = parsed?.success ? openSectionFacts(parsed.data) : []
  return {
    table: {
      widths: [70, '*'],
      body: [...facts, ['Method', `revision ${result.methodRevision}`]].map(([label, value]) => [{ text: label ?? '', color: INK3 }, value ?? '']),
    },
    layout: {
      hLineWidth: i => i === 0 ? 0 : 0.5, hLineColor: () => HAIR, vLineWidth: () => 0,
      paddingLeft: () => 0, paddingRight: () => 6, paddingTop: () => 3, paddingBottom: () => 2,
    },
    margin: [0, 2, 0, 6], ...TABLE_TEXT,
  }
}

function openSectionFacts(inputs: OpenSectionInputs): Fact[] {
  const { factors, junctions, materials } = inputs
  const special = [['fitting', factors.fitting], ['casting', factors.casting], ['bearing', factors.bearing]].filter(([, value]) => value !== '')
  return [
    ...materials.map((one): Fact => ['Material', `${one.id}, ${one.name}, ${one.form}, to ${one.specification}; basis ${one.basis}, ${one.loadPath} load path; ${one.source}, ${one.edition}`]),
    ['Corners', junctions.length === 0 ? 'none given' : junctions.map(one => `${one.node} ${one.make} ${typed(one.radius)}`).join(', ')],
    ['Bar', `length ${typed(inputs.length)}, ends ${inputs.ends === 'unknown' ? 'not known' : inputs.ends}, twist allowed ${typed(inputs.twistAllowed)}${inputs.twistOrigin ? ` (${inputs.twistOrigin})` : ''}`],
    ['Factors', `${factors.ultimate} limit to ultimate${special.map(([name, value]) => `, ${name} ${value}`).join('')}${special.length > 0 ? factors.onLimit ? ', at limit too' : ', at ultimate only' : ''}${factors.reason ? ` (${factors.reason})` : ''}`],
    ['Loads', loads(inputs.loading)],
  ]
}

function loads(loading: OpenSectionInputs['loading']): string {
  if (loading.by === 'torque') return `one torque of ${typed(loading.torque)} at ${loading.level}${loading.source ? `, ${loading.source}` : ''}`
  if (loading.by === 'table') return `the cases of another calculation, ${loading.quantity}`
  const sources = [...new Set(loading.cases.map(one => one.source).filter(Boolean))]
  return `${loading.cases.length} cases ${loading.by === 'rate' ? 'of imposed rate of twist' : 'of torque'}${sources.length > 0 ? `; ${sources.slice(0, 3).join('; ')}${sources.length > 3 ? ' and others' : ''}` : ''}`
}
