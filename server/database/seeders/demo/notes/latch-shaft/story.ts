import { CHECK } from './check'
import { LOOSE } from './loose'
import { latchShaft } from './text'
import { only, SET_UP } from '../../saves'
import type { DemoNote } from '../../demo-note'

export const LATCH_SHAFT: DemoNote = {
  project: 'QL-8', counter: 12, number: 'QSN-40-0012', title: 'Pallet latch shaft: torsion of seat and spline', part: 'QL8-4120-05', drawingIssue: 'A',
  createdBy: 'tunde', createdAt: '2026-09-22 10:05',
  issues: [{
    letter: 'A', openedBy: 'tunde', openedAt: '2026-09-22 10:05',
    acts: [
      { act: 'save', by: 'tunde', at: '2026-09-22 14:20', sections: only(latchShaft('A'), ...SET_UP) },
      { act: 'metadata', by: 'tunde', at: '2026-09-29 14:16', drawingIssue: 'B', changeNote: 'First issue; the drawing reference is raised to issue B.' },
      { act: 'save', by: 'tunde', at: '2026-09-29 14:18', sections: only(latchShaft('B'), ...SET_UP) },
      { act: 'save', by: 'tunde', at: '2026-10-01 16:20', sections: latchShaft('B') },
      { act: 'answer', by: 'tunde', at: '2026-10-02 11:42', answers: [{ calc: '*', guard: 'G-27', text: 'Fatigue in QSN-40-0010.' }] },
      { act: 'explain', by: 'tunde', at: '2026-10-02 11:45', reasons: LOOSE },
      { act: 'submit', by: 'tunde', at: '2026-10-02 11:50', checker: 'meera', approver: 'padraig' },
      { act: 'remark', remark: {
        by: 'meera', at: '2026-10-06 09:10', on: { section: 'assumptions', quote: 'they are alike' }, text: 'Alike is not the same as touching at the same moment. What is the play on the seat?',
        replies: [{ by: 'tunde', at: '2026-10-07 08:35', text: '0.2 mm. You are right, whole torque on one lever.' }],
      } },
      { act: 'remark', remark: { by: 'meera', at: '2026-10-06 09:18', on: { calc: 'seat', field: 'shape.depth' }, text: 'Drawing issue B shows 15.3 mm over the flat.', replies: [] } },
      { act: 'remark', remark: { by: 'meera', at: '2026-10-06 09:55', on: { calc: 'spline', field: 'shape' }, text: 'Solved the toothed outline: stress 0.00209 per unit torque against 0.00139 for the circle. Use the outline.', replies: [] } },
      { act: 'remark', remark: { by: 'meera', at: '2026-10-06 10:02', on: { section: 'assumptions', quote: 'common practice' }, text: '"Common practice" is not a reason. Name a source or compute it.', replies: [] } },
      { act: 'check', by: 'meera', at: '2026-10-06 10:12', items: CHECK },
      { act: 'return', by: 'meera', at: '2026-10-06 10:20', reason: '(1) Torque. Each lever has its own bolt and 0.2 mm of play on the seat; the first to touch carries everything until the other closes. Use the whole torque of table 4. (2) Drawing. Flat is 2.7 mm deep at issue B (15.3 mm over the flat); 1.8 mm is issue A. (3) Spline. The circle of the roots is not on the safe side: the two-dimensional solution of the toothed outline gives 1.50 times its stress, at the root fillet. With all three the least margin is +0.00, not +2.02. Correct and resubmit.' },
    ],
  }],
}
