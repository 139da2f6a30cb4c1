import type { Content } from 'pdfmake/interfaces'
import { calcKind, isCalcKind } from '#shared/calc/registry'
import { showMargin } from '#shared/units/display'
import { appendices } from '#server/pdf/definition/appendices'
import { INK2, INK3 } from '#server/pdf/definition/colours'
import { verdict } from '#server/pdf/definition/cover'
import { HANG } from '#server/pdf/definition/headings'
import { allMarginsTable, leastMarginTable } from '#server/pdf/definition/margin-tables'
import { resultOf, type NoteContext } from '#server/pdf/definition/note-context'
import { shownDay, shownTime } from '#server/pdf/definition/shown-time'
import { alignDecimals, ruledTable } from '#server/pdf/definition/tables'

const paragraph = (text: string): Content => ({ text, margin: [HANG, 0, 24, 6] })

/** The sections that are drawn from results, records and signatures, by their key. The cover has its page to itself. */
export function generatedSection(key: string, context: NoteContext): Content[] {
  switch (key) {
    case 'revisions': return [revisions(context)]
    case 'summary': return [{ text: verdict(context), margin: [HANG, 0, 24, 4] }, leastMarginTable(context, { places: true }), paragraph(`Certification basis: ${context.data.project.basis || 'not given'}.`)]
    case 'method': return methods(context)
    case 'margins': return [
      paragraph('A margin is allowable over applied, less one, cut to two decimals toward the unsafe side. It is decided on the unrounded number. Each row is the worst place of its calculation, mode and case; the other places are in the attached data.'),
      allMarginsTable(context),
    ]
    case 'verification': return verification(context)
    case 'appendices': return appendices(context)
    default: return []
  }
}

function revisions({ data }: NoteContext): Content {
  const margins = alignDecimals(data.revisions.map(one => one.leastMargin === null ? '–' : showMargin(one.leastMargin)))
  return ruledTable({
    columns: [{ width: 34, head: 'Issue' }, { width: 66, head: 'Released' }, { width: '*', head: 'What changed' }, { width: 'auto', head: 'State' }, { width: 58, head: 'Least margin', right: true }],
    rows: data.revisions.map((one, i) => [
      { text: one.letter, bold: one.letter === data.letter }, one.releasedAt ? shownDay(one.releasedAt) : '–', one.change || '–',
      { text: one.state, color: INK2 }, margins[i] ?? '',
    ]),
  })
}

function methods(context: NoteContext): Content[] {
  const { data, calculations } = context
  if (calculations.length === 0) return [paragraph('This note has no calculations.')]
  const rows = calculations.map((one) => {
    const result = resultOf(data, one.id)
    const parts = [...new Set((result?.working ?? []).map(step => step.method).concat((result?.outputs ?? []).map(output => output.method)))]
    const guards = result?.guards ?? []
    const answered = guards.filter(guard => data.answers.some(answer => answer.calcId === one.id && answer.guardKey === guard.key)).length
    const asking = guards.filter(guard => guard.severity !== 'information').length
    return [
      one.label, one.title, isCalcKind(one.kind) ? calcKind(one.kind).title : one.kind, result?.methodRevision ?? '–',
      { text: parts.flatMap(part => part.split(', ')).filter((part, i, all) => all.indexOf(part) === i).sort((a, b) => a.localeCompare(b, 'en', { numeric: true })).join(', ') || '–' },
      asking === 0 ? 'none' : `${answered} of ${asking} answered`,
    ]
  })
  return [
    paragraph(`Results were made by engine version ${data.engineVersion}. The sections named are those of its methods reference. What each method warns of, and the answers given, stand under the calculation; deviations stand in the appendix as well.`),
    ruledTable({
      columns: [{ width: 'auto', head: 'Calc.' }, { width: '*', head: 'Title' }, { width: 'auto', head: 'Kind' }, { width: 'auto', head: 'Revision' }, { width: 110, head: 'Sections of the reference' }, { width: 'auto', head: 'Cautions and stops' }],
      rows,
    }),
  ]
}

function verification({ data, calculations }: NoteContext): Content[] {
  const rows = calculations.map((one) => {
    const tick = data.ticks.find(found => found.calcId === one.id)
    return [one.label, one.title, tick ? tick.by : { text: 'not ticked', color: INK3 }, tick ? shownTime(tick.at) : '–', tick ? String(tick.save) : '–']
  })
  const checker = data.people.find(person => person.role === 'Checker')
  const done = data.checkSheet.filter(item => item.verdict !== null).length
  return [
    paragraph(`${checker?.name ?? 'The checker'} followed the calculations below step by step; a tick holds only while inputs, results and answers stay as they were. ${done} of ${data.checkSheet.length} items of the check sheet are filled; the sheet stands in the appendix, with the evidence of the repeated result.`),
    ruledTable({
      columns: [{ width: 'auto', head: 'Calc.' }, { width: '*', head: 'Title' }, { width: 'auto', head: 'Ticked by' }, { width: 'auto', head: 'When' }, { width: 'auto', head: 'Save', right: true }],
      rows,
    }),
  ]
}
