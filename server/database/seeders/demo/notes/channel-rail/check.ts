/** Evidence that the checker wrote, by item of the check sheet. */
import type { DemoCheckItem } from '../../demo-note'

export const CHECK: DemoCheckItem[] = [
  { item: 1, verdict: 'ok', evidence: 'QL8-3310-02 issue C' },
  { item: 2, verdict: 'not ok', evidence: 'bend radius 6 mm on the drawing is not in the walls: remark 3' },
  { item: 3, verdict: 'ok', evidence: 'mid-line from outside sizes' },
  { item: 5, verdict: 'ok', evidence: 'plot' },
  { item: 7, verdict: 'ok', evidence: 'open' },
  { item: 8, verdict: 'ok', evidence: 'J within 5 %' },
  { item: 10, verdict: 'not ok', evidence: 'remark 3' },
  { item: 11, verdict: 'ok', evidence: 'closed form' },
  { item: 12, verdict: 'ok', evidence: 'kL and the welded plate seen on site' },
  { item: 14, verdict: 'ok', evidence: 'reactions close' },
  { item: 15, verdict: 'ok', evidence: 'section 5' },
  { item: 17, verdict: 'not ok', evidence: 'issue 2 published: remark 4' },
  { item: 18, verdict: 'ok', evidence: '1.5 once' },
  { item: 22, verdict: 'ok', evidence: 'Fty/√3' },
  { item: 32, verdict: 'not ok', evidence: 'section 12, bimoment: remark 2' },
  { item: 35, verdict: 'ok', evidence: 'confirmed' },
]
