import { CHECK } from './check'
import { LOOSE } from './loose'
import { twoCellBox } from './text'
import { DATA, only, SET_UP } from '../../saves'
import type { DemoAnswer, DemoNote } from '../../demo-note'

const SEAMS: DemoAnswer = { calc: 'cells', guard: 'G-10', text: 'The corners are lapped and riveted: no inside radius of one sheet carries the flow round them, so there is no corner of the kind that the guard asks about. The rivets are treated in QSN-19-0053.' }

export const TWO_CELL_BOX: DemoNote = {
  project: 'QW-19', counter: 52, number: 'QSN-19-0052', title: 'Flap support box: torsion and shear of two cells', part: 'QW19-5712-01', drawingIssue: 'F',
  createdBy: 'noemie', createdAt: '2026-06-09 13:00',
  issues: [{
    letter: 'A', openedBy: 'noemie', openedAt: '2026-06-09 13:00',
    acts: [
      { act: 'save', by: 'noemie', at: '2026-06-09 15:10', sections: only(twoCellBox(), ...SET_UP) },
      { act: 'save', by: 'noemie', at: '2026-06-22 16:00', sections: only(twoCellBox(), ...SET_UP, ...DATA), label: 'Cells solved' },
      { act: 'save', by: 'noemie', at: '2026-06-30 16:02', sections: twoCellBox() },
      { act: 'answer', by: 'noemie', at: '2026-06-30 16:12', answers: [{ calc: 'cells', guard: 'G-12', text: 'Rivets.' }, SEAMS] },
      { act: 'explain', by: 'noemie', at: '2026-07-01 11:15', reasons: LOOSE },
      { act: 'submit', by: 'noemie', at: '2026-07-01 11:22', checker: 'meera', approver: 'catalina' },
      { act: 'remark', remark: {
        by: 'meera', at: '2026-07-03 10:31', on: { calc: 'cells', field: 'joints' }, text: '"Rivets" does not answer the guard. Say what a rivet carries and where its capacity is shown.',
        replies: [{ by: 'noemie', at: '2026-07-06 09:52', text: 'Answer rewritten.' }], closedAt: '2026-07-13 14:12',
      } },
      { act: 'return', by: 'meera', at: '2026-07-03 10:40', reason: 'The answer to G-12 is empty of reasons.' },
      { act: 'answer', by: 'noemie', at: '2026-07-06 09:50', answers: [{ calc: 'cells', guard: 'G-12', text: 'The load of a rivet stands in section 13; its capacity, with the fitting factor and the direct shear, is shown in QSN-19-0053.' }] },
      { act: 'submit', by: 'noemie', at: '2026-07-06 10:05', checker: 'meera', approver: 'catalina' },
      { act: 'tick', by: 'meera', at: '2026-07-13 14:15' },
      { act: 'judge', by: 'meera', at: '2026-07-13 14:21', note: 'Seen on the drawing and in QSN-19-0053.' },
      { act: 'check', by: 'meera', at: '2026-07-13 14:30', items: CHECK },
      { act: 'pass', by: 'meera', at: '2026-07-13 14:35' },
      { act: 'release', by: 'catalina', at: '2026-07-17 08:50' },
    ],
  }],
}
