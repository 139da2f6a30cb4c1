/** Which section of the methods reference a row proves, and what the sections are called. */
import type { ReferenceRow } from './row'

export const chapters: Readonly<Record<string, string>> = {
  '1': 'Section torsion', '2': 'Closed cells and wall stability', '3': 'Restrained warping', '4': 'General outline', '5': 'Bars along a span',
  '6': 'Imposed twist', '7': 'Margins and large twist', '8': 'Load cases', '10': 'Units and display', 'P': 'Sections and cases of independent programs',
}

/** Last number of the checks C-01… that stands in a section, in their order. */
const lastCheck: readonly (readonly [number, string])[] = [
  [4, '1.1'], [7, '1.2'], [20, '1.3'], [22, '1.4'], [24, '1.5'], [30, '1.6'], [33, '1.7'], [37, '1.8'], [43, '1.9'], [49, '1.10'],
  [51, '2.1'], [58, '2.2'], [60, '2.1'], [63, '2.5'], [72, '3.2'], [75, '3.7'], [76, '3.6'], [85, '3.4'], [87, '5.2'], [88, '5.1'], [89, '5.3'], [91, '5.4'],
  [92, '6'], [95, '7.4'], [97, '10'], [99, '7.7'], [101, '7.5'], [104, '10'], [105, '5.3'], [106, '4.1'], [107, '2.6'], [108, '1.6'], [109, '1.7'], [110, '1.8'],
  [114, '3.5'], [115, '2.1'], [116, '7.3'], [117, '8'], [118, '1.10'], [119, '7.7'], [120, '1.9'],
]

/** `1.9`; `P` for a row that an independent program gave for a whole section or case. */
export function sectionOf({ id, section }: Pick<ReferenceRow, 'id' | 'section'>): string {
  if (section !== undefined) return section
  const named = /^§(\d+(?:\.\d+)?)/.exec(id)
  if (named?.[1]) return named[1]
  const check = /^C-(\d+)/.exec(id)
  return (check && lastCheck.find(([last]) => Number(check[1]) <= last)?.[1]) ?? 'P'
}

/** `1` for `1.9`. */
export const chapterOf = (section: string): string => section.split('.')[0] ?? section

/** What tells a row from every other, in golden results and in the address of its line. */
export const rowKey = ({ id, quantity, inputs, unit }: ReferenceRow): string => [id, quantity, inputs, unit].join(' | ')
