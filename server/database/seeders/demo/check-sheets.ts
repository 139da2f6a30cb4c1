/** Evidence that the demonstration's checkers wrote, by item of the check sheet. */
import type { DemoCheckItem } from './demo-note'

const ok = (item: number, evidence: string): DemoCheckItem => ({ item, verdict: 'ok', evidence })
const none = (item: number, evidence: string): DemoCheckItem => ({ item, verdict: 'not applicable', evidence })
const wrong = (item: number, evidence: string): DemoCheckItem => ({ item, verdict: 'not ok', evidence })

interface Facts { drawing: string, dimensions: string, midline: string, thickness: string, second: string, corner: string, loads: string, cases: string, allowables: string, basis: string, hand: string, changes: string }

/** A complete sheet: what differs between notes is given, the rest is the same question answered the same way. */
function complete(facts: Facts): DemoCheckItem[] {
  return [
    ok(1, facts.drawing), ok(2, facts.dimensions), ok(3, facts.midline), ok(4, facts.thickness), ok(5, 'sketch of C1 printed to scale and laid on the drawing'),
    ok(6, 'area from developed length times thickness, second moments by own table'), ok(7, 'open: no cell closes anywhere, seen on the part'), ok(8, facts.second),
    ok(9, facts.corner), ok(10, 'radii of the drawing entered at every corner'), ok(11, 'own sectorial table; torque is given about the axis of twist'),
    ok(12, 'ends free, as the drawing shows'), none(13, 'no bimoment with free ends'), ok(14, 'constant torque, equal and opposite at the ends'), ok(15, 'section 5, used throughout'),
    none(16, 'one support, nothing shared'), ok(17, facts.loads), ok(18, 'once, and the highest special factor where one pertains'), ok(19, facts.cases), ok(20, facts.allowables),
    ok(21, facts.basis), ok(22, 'tension yield over square root of three, section 8'), none(23, 'no interaction'), none(24, 'no panel'), ok(25, 'read in the guards, limit and ultimate'),
    ok(26, 'answers read against the part, all true'), ok(27, 'one torque, one stress and one twist by hand from typed inputs'), ok(28, 'table read line by line'), ok(29, 'source opened and read'),
    none(30, 'no numerical solution in this note'), ok(31, facts.hand), ok(32, 'no loose number left without a reason'), ok(33, 'section 18 read, unsafe side covered'), ok(34, facts.changes), ok(35, 'confirmed'),
  ]
}

export const HAT_A = complete({
  drawing: 'QW19-5721-14 issue C read in the vault', dimensions: 'thickness and radius read from view B-B', midline: 'drawing gives outside sizes; half a thickness taken off each side',
  thickness: 'nominal, criteria paragraph 4.2', second: 'torsion constant by own sum of strips', corner: 'inside of the lower bends', loads: 'S07, S10 and W03 read in their tables', cases: 'sixteen cases; S10 for shear, W03 for twist, S11 and W04 turn back',
  allowables: 'QM-MD-101 issue 2 tables 1 and 3', basis: 'B basis, seven stiffeners side by side', hand: 'W03 from torque to margin, sheet kept with the check', changes: 'first issue',
})

export const HAT_B = complete({
  drawing: 'QW19-5721-14 issue D read in the vault', dimensions: 'thickness and radius read from view B-B', midline: 'drawing gives outside sizes; half a thickness taken off each side',
  thickness: 'nominal, criteria paragraph 4.2; C3 has the least sheet', second: 'torsion constant by own sum of strips', corner: 'inside of the lower bends', loads: 'S07, S10 and W03 read in their tables, sensor issue 3', cases: 'sixteen cases; S10 for shear, W03 for twist, S11 and W04 turn back',
  allowables: 'QM-MD-101 issue 2 tables 1 and 3', basis: 'B basis, seven stiffeners side by side', hand: 'W03 from torque to margin, sheet kept with the check', changes: 'redline from A to B read: sheet, radius, sensor, description',
})

export const ANGLE = complete({
  drawing: 'QW19-5231-07 issue B', dimensions: 'least thickness and least fillet read from zone C4', midline: 'outside sizes less half a thickness', thickness: 'minimum, assumption 4',
  second: 'torsion constant by the formula of reference 6, by hand', corner: 'middle of the fillet', loads: 'table 3 lines 5 and 7', cases: 'nine cases; hot and room temperature lie close together, K04 turns back',
  allowables: 'record read in SI and converted by hand', basis: 'A basis, single load path', hand: 'K07 from torque to margin, sheet kept with the check', changes: 'first issue',
})

/** The channel rail's sheet, half done: three items are not in order. */
export const RAIL: DemoCheckItem[] = [
  ok(1, 'QL8-3310-02 issue C'), wrong(2, 'bend radius of the drawing is not in C1: remark 2'), ok(3, 'mid-line from outside sizes'), ok(5, 'sketch looks like the part'), ok(7, 'open'),
  ok(8, 'closed form of the channel gives the same within the end correction'), wrong(10, 'remark 2'), ok(11, 'closed form'), ok(14, 'two cleats, half the couple each'), ok(15, 'section 5'),
  wrong(17, 'issue 2 of the loads has been published: remark 3'), ok(18, '1.5 once'), ok(22, 'tension yield over square root of three'), wrong(32, 'twist in section 12 is typed over: remark 1'),
]
