import type { Content } from 'pdfmake/interfaces'
import { openSectionSchema, type OpenSectionInputs } from '#shared/calc/kinds/open-section/schema'
import { dimensionsOf } from '#shared/calc/parts/parse-profile'
import { formFields, type FormField } from '#shared/calc/form/form-fields'
import { calcKind, isCalcKind } from '#shared/calc/registry'
import type { CalcResult, TypedQuantity } from '#shared/calc/types'
import type { NoteCalculation } from '#shared/note/calculations'
import { withUnit } from '#shared/units/display'
import { HAIR, INK3 } from '#server/pdf/definition/colours'
import { inLine, isEntries } from '#server/pdf/definition/input-listing'
import type { NoteContext } from '#server/pdf/definition/note-context'
import { TABLE_TEXT } from '#server/pdf/definition/tables'

type Fact = [label: string, value: string]
const typed = (quantity: TypedQuantity | null) => quantity === null || quantity.text === '' ? 'not given' : withUnit(quantity.text, quantity.unit)

/** What the results beside it rest on, in a few lines; everything typed stands in the appendix. */
export function inputSummary(calculation: NoteCalculation, result: CalcResult, context: NoteContext): Content {
  const parsed = calculation.kind === 'open-section' ? openSectionSchema.safeParse(calculation.inputs) : null
  const facts = parsed?.success ? openSectionFacts(parsed.data, context) : [['Inputs', factsOfForm(calculation, context)] satisfies Fact]
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

/** Single values of any kind under the labels of its form; of a list how many it holds. */
function factsOfForm({ kind, inputs }: NoteCalculation, context: NoteContext): string {
  if (!isCalcKind(kind)) return 'as listed in the appendix'
  const facts = (fields: readonly FormField[], at: Record<string, unknown>): string[] => fields.flatMap((field): string[] => {
    const value = at[field.path]
    if (field.type === 'quantity') return value === null || value === undefined ? [] : [`${field.title} ${inLine(value, context)}`]
    if (field.type === 'choice') return [`${field.title} ${String(value)}`]
    if (field.type === 'list') return Array.isArray(value) && value.length > 0 ? [`${value.length} ${field.title.toLowerCase()}`] : []
    if (field.type === 'ways') return isEntries(value) ? facts(field.ways.find(way => way.value === value.by)?.fields ?? [], value) : []
    return field.type === 'group' && field.part === undefined && isEntries(value) ? facts(field.fields, value) : []
  })
  return facts(formFields(calcKind(kind).schema), inputs).join('; ')
}

function openSectionFacts(inputs: OpenSectionInputs, context: NoteContext): Fact[] {
  const { factors, junctions, materials } = inputs
  const special = [['fitting', factors.fitting], ['casting', factors.casting], ['bearing', factors.bearing]].filter(([, value]) => value !== '')
  return [
    ...materials.map((one): Fact => ['Material', `${one.id}, ${one.name}, ${one.form}, to ${one.specification}; basis ${one.basis}, ${one.loadPath} load path; ${one.source}, ${one.edition}`]),
    ...(inputs.profile ? [profileFact(inputs.profile, context)] : []),
    ['Corners', inputs.profile ? 'as the profile says' : junctions.length === 0 ? 'none given' : junctions.map(one => `${one.node} ${one.make} ${typed(one.radius)}`).join(', ')],
    ['Bar', `length ${typed(inputs.length)}, ends ${inputs.ends === 'unknown' ? 'not known' : inputs.ends}, twist allowed ${typed(inputs.twistAllowed)}${inputs.twistOrigin ? ` (${inputs.twistOrigin})` : ''}`],
    ['Factors', `${factors.ultimate} limit to ultimate${special.map(([name, value]) => `, ${name} ${value}`).join('')}${special.length > 0 ? factors.onLimit ? ', at limit too' : ', at ultimate only' : ''}${factors.reason ? ` (${factors.reason})` : ''}`],
    ['Loads', loads(inputs.loading)],
  ]
}

/** Shape, way of measuring and every dimension with its unit. */
function profileFact(profile: NonNullable<OpenSectionInputs['profile']>, context: NoteContext): Fact {
  const values = new Map<string, unknown>(Object.entries(profile))
  const dimensions = dimensionsOf(profile.shape).map(({ key, title }) => `${title.toLowerCase()} ${inLine(values.get(key), context)}`)
  return ['Profile', `${profile.shape}, ${profile.measured} dimensions${'make' in profile ? `, ${profile.make}` : ''}: ${dimensions.join(', ')}; material ${profile.material}`]
}

function loads(loading: OpenSectionInputs['loading']): string {
  if (loading.by === 'torque') return `one torque of ${typed(loading.torque)} at ${loading.level}${loading.source ? `, ${loading.source}` : ''}`
  if (loading.by === 'table') return `the cases of another calculation, ${loading.quantity}`
  const sources = [...new Set(loading.cases.map(one => one.source).filter(Boolean))]
  return `${loading.cases.length} cases ${loading.by === 'rate' ? 'of imposed rate of twist' : 'of torque'}${sources.length > 0 ? `; ${sources.slice(0, 3).join('; ')}${sources.length > 3 ? ' and others' : ''}` : ''}`
}
