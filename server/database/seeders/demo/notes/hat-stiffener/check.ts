/** Evidence that the checker wrote, by item of the check sheet. */
import type { DemoCheckItem } from '../../demo-note'

const OF_B: DemoCheckItem[] = [
  { item: 1, verdict: 'ok', evidence: 'QW19-5721-14 issue D read in the vault on 2026-06-18' },
  { item: 2, verdict: 'ok', evidence: 'thickness 1.6 and radius 3.2 read from view B-B' },
  { item: 3, verdict: 'ok', evidence: 'drawing gives outside sizes; 0.8 mm taken off each side' },
  { item: 4, verdict: 'ok', evidence: 'nominal, QW19-SC-002 para 4.2' },
  { item: 5, verdict: 'ok', evidence: 'outline printed 2:1 and laid on the drawing' },
  { item: 6, verdict: 'ok', evidence: 'area from developed length × 1.6' },
  { item: 7, verdict: 'ok', evidence: 'open: rivets in the crown only, brims free; seen on the mock-up' },
  { item: 8, verdict: 'ok', evidence: 'two-dimensional solution, −0.05 %' },
  { item: 9, verdict: 'ok', evidence: 'inside of the lower bends' },
  { item: 10, verdict: 'ok', evidence: 'all four bends' },
  { item: 11, verdict: 'ok', evidence: 'own sectorial table, 38.45 mm' },
  { item: 12, verdict: 'ok', evidence: 'ends cut short of the ribs; warping follows the imposed gradient' },
  { item: 13, verdict: 'ok', evidence: 'magnitudes added, safe side' },
  { item: 14, verdict: 'not applicable', evidence: 'no span solution' },
  { item: 15, verdict: 'ok', evidence: 'section 5' },
  { item: 16, verdict: 'not applicable', evidence: 'no shared supports' },
  { item: 17, verdict: 'ok', evidence: 'S07 and S10 read in QW19-LDS-020 issue 3' },
  { item: 18, verdict: 'ok', evidence: '1.5 once; no fitting in this note' },
  { item: 19, verdict: 'ok', evidence: 'twelve cases; S07 normal, S10 shear; S11 negative' },
  { item: 20, verdict: 'ok', evidence: 'QM-MD-101 issue 2 table 1 and 3' },
  { item: 21, verdict: 'ok', evidence: 'B basis, seven parallel stiffeners' },
  { item: 22, verdict: 'ok', evidence: 'Fty/√3, section 8' },
  { item: 23, verdict: 'ok', evidence: 'circle rule, tension with shear' },
  { item: 24, verdict: 'not applicable', evidence: 'QSN-19-0028' },
  { item: 25, verdict: 'ok', evidence: 'rate of twist 5.1e-5 rad/mm, Wagner negligible' },
  { item: 26, verdict: 'ok', evidence: 'G-02: agreed' },
  { item: 27, verdict: 'ok', evidence: 'S10 shear by hand from typed inputs' },
  { item: 28, verdict: 'ok', evidence: 'table read line by line' },
  { item: 29, verdict: 'not applicable', evidence: 'twist imposed' },
  { item: 30, verdict: 'ok', evidence: 'two meshes, J bracket 1e-7' },
  { item: 31, verdict: 'ok', evidence: 'S07 by hand, sheet attached' },
  { item: 32, verdict: 'ok', evidence: 'no loose number left' },
  { item: 33, verdict: 'ok', evidence: '1.4 mm' },
  { item: 34, verdict: 'ok', evidence: 'redline A to B read' },
  { item: 35, verdict: 'ok', evidence: 'confirmed' },
]

/** What the checker of issue A wrote otherwise: no guard had fired and nothing was there to compare with. */
const ONLY_A: DemoCheckItem[] = [
  { item: 1, verdict: 'ok', evidence: 'QW19-5721-14 issue C' },
  { item: 26, verdict: 'not applicable', evidence: 'no guard fired' },
  { item: 34, verdict: 'ok', evidence: 'first issue' },
]

export const CHECK: Record<'A' | 'B', DemoCheckItem[]> = { A: OF_B.map(item => ONLY_A.find(other => other.item === item.item) ?? item), B: OF_B }
