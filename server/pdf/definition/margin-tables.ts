import type { Content, TableCell } from 'pdfmake/interfaces'
import { showMargin, showQuantity } from '#shared/units/display'
import { INK, INK2, INK3 } from '#server/pdf/definition/colours'
import { leastByMode, type NoteContext, type PlacedMargin } from '#server/pdf/definition/note-context'
import { calculationAnchor } from '#server/pdf/definition/anchors'
import { alignDecimals, ruledTable } from '#server/pdf/definition/tables'

const quantities = ({ row }: PlacedMargin): TableCell[] =>
  [row.applied, row.allowable].map(value => ({ text: showQuantity(value, row.dimension, row.unit), noWrap: true }))

/** One row per failure mode. The cover has no room for places, which may be long; the summary has. */
export function leastMarginTable(context: NoteContext, options: { places: boolean }): Content {
  const least = leastByMode(context)
  if (least.length === 0) return { text: 'No margins.', color: INK3, margin: [0, 4, 0, 10] }
  const shown = alignDecimals(least.map(({ row }) => showMargin(row.ms)))
  return ruledTable({
    columns: [
      { width: '*', head: 'Failure mode' }, { width: 'auto', head: 'Level' }, { width: 'auto', head: 'Case' }, ...(options.places ? [{ width: 110 as const, head: 'Place' }] : []),
      { width: 'auto', head: 'Applied', right: true }, { width: 'auto', head: 'Allowed', right: true }, { width: 44, head: 'Margin', right: true }, { width: 26, head: 'Page', right: true },
    ],
    rows: least.map((one, i) => [
      one.row.modeLabel, one.row.level, one.row.caseId, ...(options.places ? [one.row.place] : []), ...quantities(one), shown[i] ?? '',
      { pageReference: calculationAnchor(one.calculation.id) } as unknown as TableCell,
    ]),
    governing: 0,
  })
}

/** `Shear on the flats, ultimate` names its level already. */
const modeAndLevel = ({ row }: PlacedMargin) => row.modeLabel.endsWith(row.level) ? row.modeLabel : `${row.modeLabel}, ${row.level}`

/**
 * The least margin of each calculation, mode and case. The rows of the other
 * walls and corners can only be larger: they stand in the data that is attached.
 */
function worstPlaces(margins: PlacedMargin[]): PlacedMargin[] {
  const seen = new Set<string>()
  // Least first, so that the first of a key is its worst place.
  return margins.filter(({ calculation, row }) => {
    const key = `${calculation.id} ${row.mode} ${row.caseId}`
    if (seen.has(key)) return false
    seen.add(key)
    return true
  })
}

/** The margins of the note with a ruler from a little below zero to +1. */
export function allMarginsTable({ margins: all }: NoteContext): Content {
  const margins = worstPlaces(all)
  if (margins.length === 0) return { text: 'This issue has no margins.', color: INK3 }
  const shown = alignDecimals(margins.map(({ row }) => showMargin(row.ms)))
  return ruledTable({
    columns: [
      { width: '*', head: 'Failure mode and level' }, { width: 'auto', head: 'Calc., case' }, { width: 84, head: 'Place' },
      { width: 'auto', head: 'Applied', right: true }, { width: 'auto', head: 'Allowed', right: true }, { width: 38, head: 'Margin', right: true }, { width: 58, head: '0 to +1', right: true },
    ],
    rows: margins.map((one, i) => [
      modeAndLevel(one), `${one.calculation.label}, ${one.row.caseId}`, one.row.place, ...quantities(one), shown[i] ?? '', ruler(one.row.ms),
    ]),
    ...(margins[0]?.row.ms === null ? {} : { governing: 0 }),
  })
}

const RULER = { left: 4, zero: 15, one: 54 }

/** A margin on a line: zero in ink, a wedge where it stands, an arrow where it is beyond. */
function ruler(ms: number | null): TableCell {
  const { left, zero, one } = RULER
  const tick = (x: number) => `<path d="M${x} 8v-2.5" stroke="${INK3}" stroke-width=".5"/>`
  const at = zero + (ms ?? 2) * (one - zero)
  const mark = at > one ? `<path d="M49 4.5l5 3.5-5 3.5" fill="none" stroke="${INK2}" stroke-width="1"/>`
    : `<path d="M${Math.max(at, left).toFixed(2)} 8l-3-5h6z" fill="${INK}"/>`
  const ticks = [left, ...[0.25, 0.5, 0.75, 1].map(v => zero + v * (one - zero))].map(tick).join('')
  return {
    svg: `<svg xmlns="http://www.w3.org/2000/svg" width="58" height="12" viewBox="0 0 58 12"><path d="M${left} 8H${one}" stroke="${INK3}" stroke-width=".5"/>${ticks}<path d="M${zero} 2v9" stroke="${INK}" stroke-width=".9"/>${mark}</svg>`,
    width: 58, alignment: 'right',
  }
}
