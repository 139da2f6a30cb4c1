/** Evidence that the checker wrote, by item of the check sheet. */
import type { DemoCheckItem } from '../../demo-note'

export const CHECK: DemoCheckItem[] = [
  { item: 2, verdict: 'not ok', evidence: 'flat 1.8 is issue A' },
  { item: 6, verdict: 'ok', evidence: 'area of the segment by hand' },
  { item: 8, verdict: 'ok', evidence: 'D seat' },
  { item: 10, verdict: 'not ok', evidence: 'root fillets not modelled' },
  { item: 16, verdict: 'not ok', evidence: 'sharing not bounded, remark 1' },
  { item: 17, verdict: 'ok', evidence: 'table 4 line 2' },
  { item: 26, verdict: 'not ok', evidence: 'G-21 answer' },
  { item: 35, verdict: 'ok', evidence: 'confirmed' },
]
