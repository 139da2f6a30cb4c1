import { lippedChannel } from './text'
import { DATA, only, SET_UP } from '../../saves'
import type { DemoNote } from '../../demo-note'

export const LIPPED_CHANNEL: DemoNote = {
  project: 'QW-19', counter: 71, number: 'QSN-19-0071', title: 'Sill seal carrier: twist of a lipped channel', part: 'QW19-5240-11', drawingIssue: 'A',
  createdBy: 'noemie', createdAt: '2026-10-01 10:12',
  issues: [{
    letter: 'A', openedBy: 'noemie', openedAt: '2026-10-01 10:12',
    acts: [
      { act: 'save', by: 'noemie', at: '2026-10-01 11:15', sections: only(lippedChannel(), ...SET_UP) },
      { act: 'save', by: 'noemie', at: '2026-10-07 16:05', sections: only(lippedChannel(), ...SET_UP, ...DATA, 'span-analysis', 'stresses', 'stability'), label: 'Cross-check run' },
      { act: 'answer', by: 'noemie', at: '2026-10-07 16:20', answers: [{ calc: 'carrier', guard: 'G-02', text: 'End correction applied; the outline agrees on J.' }] },
      { act: 'save', by: 'noemie', at: '2026-10-09 15:50', sections: lippedChannel(), label: 'Next stocked sheet tried' },
    ],
  }],
}
