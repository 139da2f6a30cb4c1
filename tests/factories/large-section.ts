/** The largest inputs that a kind must compute at the pace of typing: 100 walls, 1,000 load cases. */
import type { LoadCasesInputs } from '#shared/calc/kinds/load-cases/schema'
import type { NoteCalc } from '#shared/calc/note-links'
import type { OpenSectionInputs } from '#shared/calc/kinds/open-section/schema'
import { polyline, quantity, sheet6061, stripInputs } from './open-section'

const tableId = '7b1c9f6e-52f4-4c0b-9d57-2b7f6e0c4a11'

/** A meander of sheet: every second wall 30 mm high, those between 10 mm long. */
export function largeOpenSection(walls = 100): OpenSectionInputs {
  const corners = Array.from({ length: walls + 1 }, (_, i) => [String(10 * Math.ceil(i / 2)), String(i % 4 < 2 ? 0 : 30)] as const)
  const chain = polyline(corners, [], '1.6', 'QM-107')
  return {
    ...stripInputs(), ...chain, walls: chain.walls.map((wall, i) => ({ ...wall, id: `w${i + 1}`, name: `wall ${i + 1}` })), materials: [sheet6061()],
    junctions: Array.from({ length: walls - 1 }, (_, i) => ({ node: String(i + 2), radius: quantity('3.2', 'mm'), make: 'bent' as const })),
    loading: { by: 'table', table: tableId, quantity: 'T' },
  }
}

/** Torques of a loads document, limit and ultimate, hot and cold, in both senses. */
export function largeTable(cases = 1000): LoadCasesInputs {
  return {
    document: 'EX-L-20 issue 1', temperatureUnit: '°C', columns: [{ key: 'T', title: 'Torque', dimension: 'torque', unit: 'N·m' }],
    rows: Array.from({ length: cases }, (_, i) => ({ id: `L${i + 1}`, title: `Case ${i + 1}`, source: '', level: i % 7 === 0 ? 'ultimate' : 'limit', temperature: String(i % 100 - 30), cells: [String(i % 50 - 24)] })),
  }
}

/** A section of a note with the table that it takes its cases from. */
export const withLargeTable = (kind: string, inputs: unknown): NoteCalc[] => [
  { id: tableId, label: 'Table 1', title: 'Torques', kind: 'load-cases', kindVersion: 1, inputs: largeTable() },
  { id: 'section', label: 'Calculation 1', title: 'Section', kind, kindVersion: 1, inputs },
]
