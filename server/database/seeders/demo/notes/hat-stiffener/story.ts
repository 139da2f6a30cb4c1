import { CHECK } from './check'
import { LOOSE } from './loose'
import { hatStiffener, hatStiffenerFirstB } from './text'
import { ANALYSIS, DATA, only, SET_UP } from '../../saves'
import type { DemoNote } from '../../demo-note'

const unanswered = ['sensitivity', 'conclusion']

export const HAT: DemoNote = {
  project: 'QW-19', counter: 31, number: 'QSN-19-0031', title: 'Flap inner hat stiffener: torsion imposed by the twist of the flap', part: 'QW19-5721-14', drawingIssue: 'C',
  createdBy: 'ilse', createdAt: '2026-02-16 08:55',
  issues: [
    {
      letter: 'A', openedBy: 'ilse', openedAt: '2026-02-16 08:55',
      acts: [
        { act: 'save', by: 'ilse', at: '2026-02-16 10:20', sections: only(hatStiffener('A'), ...SET_UP) },
        { act: 'save', by: 'ilse', at: '2026-03-03 09:40', sections: only(hatStiffener('A'), ...SET_UP, ...DATA, ...ANALYSIS), label: 'All cases solved' },
        { act: 'save', by: 'ilse', at: '2026-03-09 15:50', sections: hatStiffener('A') },
        { act: 'explain', by: 'ilse', at: '2026-03-09 16:10', reasons: LOOSE },
        { act: 'submit', by: 'ilse', at: '2026-03-09 16:20', checker: 'meera', approver: 'catalina' },
        { act: 'tick', by: 'meera', at: '2026-03-16 10:30' },
        { act: 'check', by: 'meera', at: '2026-03-16 11:20', items: CHECK.A },
        { act: 'pass', by: 'meera', at: '2026-03-16 11:31' },
        { act: 'release', by: 'catalina', at: '2026-03-20 10:04' },
      ],
    },
    {
      letter: 'B', openedBy: 'ilse', openedAt: '2026-06-08 08:40',
      acts: [
        {
          act: 'metadata', by: 'ilse', at: '2026-06-08 08:52', drawingIssue: 'D',
          changeNote: 'Drawing issue D changes the sheet from 1.2 mm to 1.6 mm and the inside bend radius from 3.0 mm to 3.2 mm, because the thin brims were dented in assembly. The shear stress rises, since under an imposed twist it grows with the thickness; the axial stress falls faster.',
        },
        { act: 'save', by: 'ilse', at: '2026-06-15 15:30', sections: hatStiffenerFirstB().map(one => (unanswered.includes(one.key) ? hatStiffener('A').find(old => old.key === one.key) ?? one : one)) },
        { act: 'save', by: 'ilse', at: '2026-06-16 10:20', sections: hatStiffenerFirstB(), label: 'Thicker sheet throughout' },
        { act: 'answer', by: 'ilse', at: '2026-06-16 10:42', answers: [{ calc: 'hat', guard: 'G-02', text: 'End correction applied; the two-dimensional solution of the true outline agrees on J within 0.1 %. Free edges carry no load other than their own shear.' }] },
        { act: 'explain', by: 'ilse', at: '2026-06-17 16:50', reasons: LOOSE },
        { act: 'submit', by: 'ilse', at: '2026-06-17 17:12', checker: 'koji', approver: 'catalina' },
        { act: 'remark', remark: {
          by: 'koji', at: '2026-06-19 09:20', on: { section: 'description', quote: 'riveted through its crown' },
          text: 'Say plainly that the hat is not a closed cell with the skin, and why. A reader who knows the older stiffener will assume it is.',
          replies: [{ by: 'ilse', at: '2026-06-19 11:02', text: 'Added: one row through the crown, brims free, therefore open.' }], closedAt: '2026-06-22 14:48',
        } },
        { act: 'remark', remark: {
          by: 'koji', at: '2026-06-19 09:34', on: { calc: 'following', field: 'offset' },
          text: 'The attachment is taken at the mid-line of the crown. The rivet line is the faying surface, half a sheet further out. Effect?',
          replies: [{ by: 'ilse', at: '2026-06-19 11:15', text: 'The offset to the shear centre falls from 8.45 to 7.65 mm; the bending stress falls by a tenth of a very small number. Left at the mid-line, safe side.' }], closedAt: '2026-06-22 14:51',
        } },
        { act: 'return', by: 'koji', at: '2026-06-19 09:36', reason: 'Two remarks to answer, the first in the text.' },
        { act: 'save', by: 'ilse', at: '2026-06-19 11:01', sections: hatStiffener('B'), label: 'Why the hat is open' },
        { act: 'submit', by: 'ilse', at: '2026-06-19 11:20', checker: 'koji', approver: 'catalina' },
        { act: 'tick', by: 'koji', at: '2026-06-22 14:55' },
        { act: 'judge', by: 'koji', at: '2026-06-22 15:05', note: 'Agreed; strip formula repeated by hand.' },
        { act: 'check', by: 'koji', at: '2026-06-22 15:15', items: CHECK.B },
        { act: 'pass', by: 'koji', at: '2026-06-22 15:20' },
        { act: 'release', by: 'catalina', at: '2026-06-26 09:15' },
      ],
    },
  ],
}
