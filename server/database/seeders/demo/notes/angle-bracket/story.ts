import { CHECK } from './check'
import { LOOSE } from './loose'
import { angleBracket } from './text'
import { DATA, only, SET_UP } from '../../saves'
import type { DemoAnswer, DemoNote } from '../../demo-note'

const SHORT: DemoAnswer = { calc: 'torsion', guard: 'G-39', text: 'The torque enters at the pad and leaves at the bolts; near both the stress is spread otherwise than the theory says. The peak is taken as if the whole length were undisturbed, which the strain survey of the door rig supports (QWT-081).' }
const FATIGUE: DemoAnswer = { calc: '*', guard: 'G-27', text: 'Every opening of the door loads the fillet. Fatigue is treated in QSN-19-0069 with the peak stress of this note.' }

export const ANGLE_BRACKET: DemoNote = {
  project: 'QW-19', counter: 67, number: 'QSN-19-0067', title: 'Cargo door actuator bracket: torsion of a machined angle', part: 'QW19-5231-07', drawingIssue: 'B',
  createdBy: 'tunde', createdAt: '2026-09-14 09:25',
  issues: [{
    letter: 'A', openedBy: 'tunde', openedAt: '2026-09-14 09:25',
    acts: [
      { act: 'save', by: 'tunde', at: '2026-09-14 11:40', sections: only(angleBracket('first'), ...SET_UP, ...DATA.filter(key => key !== 'section-analysis'), 'section-analysis', 'span-analysis') },
      { act: 'save', by: 'tunde', at: '2026-09-28 14:50', sections: angleBracket('first') },
      { act: 'answer', by: 'tunde', at: '2026-09-28 15:10', answers: [
        { calc: 'walls', guard: 'G-02', text: 'Stress from the two-dimensional solution; walls used for comparison only.' },
        { calc: 'walls', guard: 'G-11', text: 'Both corrections applied; their sum is confirmed by the outline.' },
        { calc: 'torsion', guard: 'G-18', text: 'Toes relieved by 0.06 in, drawing view D; bolts beside the corner.' },
        FATIGUE,
        SHORT,
        { calc: '*', guard: 'G-28', text: 'At this rate of twist the section carries more torque than the linear result says, so for the given torque fillet and pad see less. The longitudinal stress that goes with it is about a tenth of the tension strength.' },
      ] },
      { act: 'explain', by: 'tunde', at: '2026-09-30 16:30', reasons: LOOSE },
      { act: 'submit', by: 'tunde', at: '2026-09-30 16:45', checker: 'koji', approver: 'padraig' },
      { act: 'remark', remark: {
        by: 'koji', at: '2026-10-02 13:40', on: { calc: 'pad', field: 'points' }, text: 'Pad centre on the drawing is 1.860 in from the outer corner; this has 1.735, measured from the mid-line.',
        replies: [{ by: 'tunde', at: '2026-10-05 09:12', text: 'Corrected; the least margin fell from +0.10 to +0.03.' }], closedAt: '2026-10-08 09:30',
      } },
      { act: 'remark', remark: {
        by: 'koji', at: '2026-10-02 13:52', on: { section: 'assumptions', quote: 'minima' }, text: 'State the tolerance, so that nobody reads 0.250 as nominal.',
        replies: [{ by: 'tunde', at: '2026-10-05 09:20', text: 'Added to assumption 4.' }], closedAt: '2026-10-08 09:31',
      } },
      { act: 'remark', remark: {
        by: 'koji', at: '2026-10-02 13:58', on: { calc: 'together' }, text: 'The legs are thick. What happens at the root if the frame holds the toes? Γ of the two-dimensional solution is not zero.',
        replies: [{ by: 'tunde', at: '2026-10-05 11:06', text: '44.5 ksi at the long toe, not acceptable. The drawing relieves the frame under the toes; assumption 2 rewritten, section 18 added, G-18 answered.' }], closedAt: '2026-10-08 09:40',
      } },
      { act: 'return', by: 'koji', at: '2026-10-02 14:00', reason: 'Pad position; warping at the root.' },
      { act: 'save', by: 'tunde', at: '2026-10-05 09:15', sections: angleBracket('passed'), label: 'Pad position, tolerance, relief of the toes' },
      { act: 'answer', by: 'tunde', at: '2026-10-05 09:26', answers: [
        { calc: 'together', guard: 'G-34', text: 'A basis, drawing minima, peak repeated by the wall formula with the factor of the table, measured load envelope.' },
        { calc: 'walls', guard: 'G-11', text: 'Both corrections applied; their sum is confirmed by the outline.' },
        { calc: 'torsion', guard: 'G-18', text: 'Toes relieved by 0.06 in, drawing view D; bolts beside the corner.' },
        FATIGUE,
        SHORT,
        { calc: '*', guard: 'G-28', text: 'At this rate of twist the section carries more torque than the linear result says, so for the given torque fillet and pad see less. The longitudinal stress that goes with it is about a tenth of the tension strength.' },
      ] },
      { act: 'explain', by: 'tunde', at: '2026-10-05 11:10', reasons: LOOSE },
      { act: 'submit', by: 'tunde', at: '2026-10-05 11:20', checker: 'koji', approver: 'padraig' },
      { act: 'tick', by: 'koji', at: '2026-10-08 09:50' },
      { act: 'judge', by: 'koji', at: '2026-10-08 10:12', note: 'True for this part.' },
      { act: 'check', by: 'koji', at: '2026-10-08 10:30', items: CHECK },
      { act: 'pass', by: 'koji', at: '2026-10-08 10:40' },
    ],
  }],
}
