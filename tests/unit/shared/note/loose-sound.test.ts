import { describe, expect, it } from 'vitest'
import { scanLooseNumbers } from '#shared/note/loose-numbers'
import { readDocument } from '#shared/note/schema'
import { noteDocument, paragraph } from '../../../factories/note-document'
import { calculations, RESULTS } from './sample-results'

/** Sentences in which every number is right, or is none of the calculations': nothing may be said to disagree. */
const SOUND = [
  'The torsion constant of the channel is J = 3864.2 mm⁴.', 'J = 3864 mm⁴, end terms included.', 'Before the end terms it was 3907.6 mm⁴.',
  'In case L04 the rate of twist is 27.28 °/m, that is 0.476 rad/m.', 'L07 gives 35.9 °/m.', 'The torque of L07 is 63 450 N·mm.', 'In L07 the torque is 63.45 N·m at limit.',
  'Case L09 brings 27.94 N·m to the free end.', 'The largest face stress in L07 is 65.7 MPa.', 'In L04 wall a sees 39.9 MPa and wall b 49.9 MPa.', 'The margin in L07 is +0.88.',
  'A margin of +1.48 in L04 leaves room.', 'The shear centre, y, lies at 38.447 mm from the brims.', 'The warping constant is 2.7536×10⁶ mm⁶.', 'At kL = 5.27 the root effect has died out.',
  'The free end turns through 15.08° in L07.', 'In L04 the twist over the length is 0.200 rad.', 'The developed mid-line length is 143.87 mm.', 'Wall a is 3.2 mm thick, wall b 4 mm.',
  'The shear modulus is G = 26.2 GPa.', 'F_su = 186 MPa by the record.', 'In B02 the torque on the clip is 412.6 lbf·in.', 'In B02 the clip carries a peak shear stress of 7.97 ksi.',
  'The bar is 420 mm long between its clips.', 'Twist is allowed up to 18°.', 'The clip is 2.4 in long.', 'MS = 186/(1.5 × 65.68) − 1 = +0.88 in L07.', 'The stiffness GJ is 101.24 N·m².',
  'Rivets stand in one row at 25 mm pitch.', 'The sheet is stocked in 1.6 mm and 2.0 mm.', 'A gap of 12 mm is left at each rib.', 'The bolt is torqued to 4.5 N·m at assembly.',
  'The tolerance on thickness is ±0.05 mm.', 'The part weighs 0.42 kg.', 'It was measured at 21 °C.', 'The hot day is taken as 71 °C.', 'The door weighs 340 kg and moves in 6 s.',
  'A stress below 20 MPa needs no corner factor here.', 'The limit of slenderness is 10.', 'The clip radius is 5.0 mm on the drawing.', 'The allowable by the earlier edition was 179 MPa.',
  'See section 7.4 and figure 3.', 'Table 5 on page 14 gives the cases.', 'CS 25.305 and 14 CFR 25.613 are met.', 'Issued 2026-06-26 and checked on 12 March 2026.', 'Drawing QW19-5240-11 issue A is used.',
  'The plate is 7050-T7451, the sheet 2024-T3.', 'Steps 3 to 5 repeat for ribs 7 and 8.', 'Reference 4, paragraph 5, states the seal.', 'Note QSN-19-0072 holds the clips.', 'EN 1993-1-1 is not used.',
  'Three of the 12 cases govern.', 'Both hands, aeroplanes 101 to 140, are covered.', 'The meeting was at 14:30 in room 2.', 'Assumption A3 holds for bays 3 to 9.', 'The screen of 2 cm mesh is not loaded.',
  'Equation 2 follows from equation 1.', 'The load is shared by 4 clips.', 'Temperature falls by 6.5 °C for each kilometre.', 'Item 31 of the check sheet asks for it.',
]

/** Sentences that hold no quantity at all: nothing may be listed. */
const EMPTY = [
  'See section 7.4 and figure 3.', 'Issued 2026-06-26 and checked on 12 March 2026.', 'Drawing QW19-5240-11 issue A is used.', 'The plate is 7050-T7451, the sheet 2024-T3.',
  'CS 25.305 and 14 CFR 25.613 are met.', 'Note QSN-19-0072 holds the clips.', 'Equation 2 follows from equation 1.', 'Item 31 of the check sheet asks for it.', 'Three of the 12 cases govern.',
]

const scan = (sentence: string) => scanLooseNumbers(readDocument(noteDocument({ 'description': [paragraph(sentence)], 'section-analysis': calculations() })), RESULTS)

describe('sixty sound sentences', () => {
  it('are sixty', () => expect(SOUND).toHaveLength(60))
  it.each(SOUND)('%s', (sentence) => {
    expect(scan(sentence).filter(({ verdict }) => verdict === 'disagreeing').map(({ text, reason }) => `${text}: ${reason}`)).toEqual([])
  })
  it.each(EMPTY)('lists nothing in: %s', (sentence) => {
    expect(scan(sentence).map(({ text }) => text)).toEqual([])
  })
})
