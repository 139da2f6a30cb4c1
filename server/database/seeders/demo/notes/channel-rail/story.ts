import { CHECK } from './check'
import { LOOSE } from './loose'
import { channelRail } from './text'
import { DATA, only, SET_UP } from '../../saves'
import type { DemoNote } from '../../demo-note'

export const RAIL_NOTE: DemoNote = {
  project: 'QL-8', counter: 9, number: 'QSN-40-0009', title: 'Platform guide rail: restrained warping under roller couples', part: 'QL8-3310-02', drawingIssue: 'C',
  createdBy: 'ilse', createdAt: '2026-08-31 09:00',
  issues: [{
    letter: 'A', openedBy: 'ilse', openedAt: '2026-08-31 09:00',
    acts: [
      { act: 'save', by: 'ilse', at: '2026-08-31 11:30', sections: only(channelRail(), ...SET_UP, ...DATA) },
      { act: 'save', by: 'ilse', at: '2026-09-17 14:05', sections: channelRail() },
      { act: 'answer', by: 'ilse', at: '2026-09-17 14:31', answers: [
        { calc: '*', guard: 'G-16', text: 'The warping solution is this note.' },
        { calc: '*', guard: 'G-25', text: 'QL8-SC-001 paragraph 3 accepts grade minima.' },
        { calc: '*', guard: 'G-21', text: 'Both ends are welded all round to plates that are alike; the shares follow from the stations of the rollers. The forked run bounds what a softer end would do.' },
        { calc: '*', guard: 'G-28', text: 'Bounding run at characteristic level: it is read for the twist that the built-in ends save, and no margin rests on it.' },
        { calc: '*', guard: 'G-10', text: 'The corners are taken to the intersection of the mid-lines to keep the section simple; the drawing bends both. S355J2 is ductile and the load of this note is static, so a local peak yields without harm. Fatigue is treated in QSN-40-0010.' },
      ] },
      { act: 'explain', by: 'ilse', at: '2026-09-18 15:50', reasons: LOOSE },
      { act: 'submit', by: 'ilse', at: '2026-09-18 16:05', checker: 'noemie', approver: 'catalina' },
      { act: 'remark', remark: {
        by: 'noemie', at: '2026-09-25 11:20', on: { section: 'description', quote: 'prevents both twist and warping' }, text: 'Say how thick the end plate is.',
        replies: [{ by: 'ilse', at: '2026-09-25 15:02', text: '20 mm, it is in the sentence.' }], closedAt: '2026-09-28 09:50',
      } },
      { act: 'remark', remark: {
        by: 'noemie', at: '2026-09-28 10:05', on: { section: 'span-analysis', quote: '165.1×10⁶ N·mm²' },
        text: 'Typed, not tied, and marked as intended with the reason "hand value". The calculation says otherwise. Tie it.', replies: [],
      } },
      { act: 'remark', remark: {
        by: 'noemie', at: '2026-09-28 10:40', on: { calc: 'built-in', field: 'junctions' },
        text: 'The drawing bends the corners with 6 mm inside. Your own cross-check gives a lower Γ than the walls. Model the bends and state what is left of the margin.',
        replies: [{ by: 'ilse', at: '2026-10-01 08:30', text: 'Tried in a quick calculation: margin +0.02 with bends and loads issue 1. Will go into the note.' }],
      } },
      { act: 'remark', remark: {
        by: 'noemie', at: '2026-09-28 11:10', on: { calc: 'strength', field: 'cases' },
        text: 'QL8-LDS-012 issue 2 raises R04 and R06. With it the margin is +0.01 before the bends are counted. With both it is -0.03. Talk to design about 7 mm flanges before the next submission.',
        replies: [{ by: 'ilse', at: '2026-10-01 08:41', text: 'Agreed. Asked design on 2026-10-01.' }, { by: 'noemie', at: '2026-10-02 09:00', text: 'Leave open until the drawing answer is in.' }],
      } },
      { act: 'check', by: 'noemie', at: '2026-10-02 09:20', items: CHECK },
    ],
  }],
}
