import { CHECK } from './check'
import { LOOSE } from './loose'
import { torqueTube } from './text'
import { ANALYSIS, DATA, only, SET_UP } from '../../saves'
import type { DemoNote } from '../../demo-note'

export const TORQUE_TUBE: DemoNote = {
  project: 'QW-19', counter: 44, number: 'QSN-19-0044', title: 'Flap drive torque tube: strength and wind-up', part: 'QW19-2741-03', drawingIssue: 'B',
  createdBy: 'tunde', createdAt: '2026-04-20 09:10',
  issues: [{
    letter: 'A', openedBy: 'tunde', openedAt: '2026-04-20 09:10',
    acts: [
      { act: 'save', by: 'tunde', at: '2026-04-20 11:30', sections: only(torqueTube('returned'), ...SET_UP) },
      { act: 'save', by: 'tunde', at: '2026-05-04 15:20', sections: only(torqueTube('returned'), ...SET_UP, ...DATA, ...ANALYSIS), label: 'Sixteen cases solved' },
      { act: 'save', by: 'tunde', at: '2026-05-11 13:40', sections: torqueTube('returned') },
      { act: 'answer', by: 'tunde', at: '2026-05-11 14:05', answers: [{ calc: '*', guard: 'G-27', text: 'Fatigue is treated in QSN-19-0062 issue A, with the spectrum of the same loads document.' }] },
      { act: 'explain', by: 'tunde', at: '2026-05-12 15:30', reasons: LOOSE },
      { act: 'submit', by: 'tunde', at: '2026-05-12 15:40', checker: 'noemie', approver: 'padraig' },
      { act: 'remark', remark: {
        by: 'noemie', at: '2026-05-14 16:10', on: { section: 'stresses', quote: 'the highest pertinent special factor' },
        text: 'Quote the paragraph of the criteria that puts the fitting factor on the limit level too; the regulation itself does not.',
        replies: [{ by: 'tunde', at: '2026-05-15 08:47', text: 'QW19-SC-002 paragraph 5.3 added.' }], closedAt: '2026-05-18 10:22',
      } },
      { act: 'return', by: 'noemie', at: '2026-05-14 16:14', reason: 'One remark: the paragraph for the fitting factor at limit.' },
      { act: 'save', by: 'tunde', at: '2026-05-15 08:46', sections: torqueTube('passed'), label: 'Paragraph 5.3 quoted' },
      { act: 'explain', by: 'tunde', at: '2026-05-15 08:50', reasons: LOOSE },
      { act: 'submit', by: 'tunde', at: '2026-05-15 08:55', checker: 'noemie', approver: 'padraig' },
      { act: 'tick', by: 'noemie', at: '2026-05-18 10:24' },
      { act: 'judge', by: 'noemie', at: '2026-05-18 10:31', note: 'The fatigue note was opened and names the tube.' },
      { act: 'check', by: 'noemie', at: '2026-05-18 10:36', items: CHECK },
      { act: 'pass', by: 'noemie', at: '2026-05-18 10:40' },
      { act: 'release', by: 'padraig', at: '2026-05-22 11:00' },
    ],
  }],
}
