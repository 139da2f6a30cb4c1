/** What happened at the invented maker, in the order in which it happened. Times are the scenario's own. */
import { ANGLE, HAT_A, HAT_B, RAIL } from './check-sheets'
import type { DemoNote } from './demo-note'
import { angleBracket } from './notes/angle-bracket'
import { channelRail } from './notes/channel-rail'
import { crossBar } from './notes/cross-bar'
import { hatStiffener, hatStiffenerFirstB } from './notes/hat-stiffener'
import { latchGuide } from './notes/latch-guide'
import { lippedChannel } from './notes/lipped-channel'
import { REASONS } from './loose-reasons'

const only = <T extends { key: string }>(sections: T[], ...keys: string[]): T[] => sections.filter(one => keys.includes(one.key))

const SET_UP = ['scope', 'references', 'description', 'assumptions']
// The texts of the data are tied to the calculations, so these come with them.
const DATA = ['section-analysis', 'geometry', 'materials', 'loads']
const ANALYSIS = ['span-analysis', 'stresses', 'stability', 'deflections']

export const HAT: DemoNote = {
  project: 'QW-19', counter: 31, number: 'QSN-19-0031', title: 'Flap inner hat stiffener: torsion imposed by the twist of the flap', part: 'QW19-5721-14', drawingIssue: 'C',
  createdBy: 'ilse', createdAt: '2026-02-16 08:55',
  issues: [
    {
      letter: 'A', openedBy: 'ilse', openedAt: '2026-02-16 08:55',
      acts: [
        { act: 'save', by: 'ilse', at: '2026-02-16 10:20', sections: only(hatStiffener('A'), ...SET_UP) },
        { act: 'save', by: 'ilse', at: '2026-02-23 14:05', sections: only(hatStiffener('A'), ...SET_UP, ...DATA) },
        { act: 'save', by: 'ilse', at: '2026-03-03 09:40', sections: only(hatStiffener('A'), ...SET_UP, ...DATA, ...ANALYSIS), label: 'All cases solved' },
        { act: 'save', by: 'ilse', at: '2026-03-09 15:50', sections: hatStiffener('A') },
        { act: 'answer', by: 'ilse', at: '2026-03-09 16:02', answers: [{ calc: 'C3', guard: 'G-28', text: 'At this rate of twist the section carries more torque than the linear result says, so for the given torque it twists less: safe side for the alignment. The longitudinal stress that goes with it is below one megapascal.' }] },
        { act: 'explain', by: 'ilse', at: '2026-03-09 16:10', reasons: REASONS.hat },
        { act: 'submit', by: 'ilse', at: '2026-03-09 16:20', checker: 'meera', approver: 'catalina' },
        { act: 'tick', by: 'meera', at: '2026-03-16 10:30', calcs: ['C1', 'C2', 'C3'] },
        { act: 'judge', by: 'meera', at: '2026-03-16 11:00', note: 'True for this part.' },
        { act: 'check', by: 'meera', at: '2026-03-16 11:20', items: HAT_A },
        { act: 'pass', by: 'meera', at: '2026-03-16 11:31' },
        { act: 'release', by: 'catalina', at: '2026-03-20 10:04' },
      ],
    },
    {
      letter: 'B', openedBy: 'ilse', openedAt: '2026-06-08 08:40',
      acts: [
        {
          act: 'metadata', by: 'ilse', at: '2026-06-08 08:52', drawingIssue: 'D',
          changeNote: 'Drawing issue D thickens the sheet from 1.2 mm to 1.6 mm and opens the inside bend radius from 3.0 mm to 3.2 mm, because the thin brims were dented in assembly and the larger position sensor needs a stiffer bay. The shear of the imposed twist rises with the thickness; the twist of the sensor bay falls.',
        },
        { act: 'save', by: 'ilse', at: '2026-06-15 15:30', sections: hatStiffenerFirstB().map(one => (['sensitivity', 'conclusion'].includes(one.key) ? hatStiffener('A').find(old => old.key === one.key) ?? one : one)) },
        { act: 'save', by: 'ilse', at: '2026-06-16 10:20', sections: hatStiffenerFirstB(), label: 'Thicker sheet throughout' },
        { act: 'answer', by: 'ilse', at: '2026-06-16 10:42', answers: [{ calc: '*', guard: 'G-02', text: 'The end correction is applied to both free edges, and the brim carries no load other than its own shear. The wall formula with that correction stays within a thousandth of the exact strip at this slenderness.' }] },
        { act: 'explain', by: 'ilse', at: '2026-06-17 16:50', reasons: REASONS.hat },
        { act: 'submit', by: 'ilse', at: '2026-06-17 17:12', checker: 'koji', approver: 'catalina' },
        { act: 'remark', remark: {
          by: 'koji', at: '2026-06-19 09:20', on: { section: 'description', quote: 'riveted through its crown' },
          text: 'Say plainly that the hat is not a closed cell with the skin, and why. A reader who knows the older stiffener will assume it is.',
          replies: [{ by: 'ilse', at: '2026-06-19 11:02', text: 'Added: one row through the crown, brims free, therefore open.' }], closedAt: '2026-06-22 14:48',
        } },
        { act: 'remark', remark: {
          by: 'koji', at: '2026-06-19 09:34', on: { calc: 'C2', field: 'length' },
          text: 'Clip to clip is measured to the middle of the clips. Should it not be between their edges?',
          replies: [{ by: 'ilse', at: '2026-06-19 11:15', text: 'Between the edges it would be shorter and twist less. Left at the middle, safe side.' }], closedAt: '2026-06-22 14:51',
        } },
        { act: 'return', by: 'koji', at: '2026-06-19 09:36', reason: 'Two remarks, the first to answer in the text: say why the section is open.' },
        { act: 'save', by: 'ilse', at: '2026-06-19 11:01', sections: hatStiffener('B'), label: 'Why the hat is open' },
        { act: 'submit', by: 'ilse', at: '2026-06-19 11:20', checker: 'koji', approver: 'catalina' },
        { act: 'tick', by: 'koji', at: '2026-06-22 14:55', calcs: ['C1', 'C2', 'C3'] },
        { act: 'judge', by: 'koji', at: '2026-06-22 15:05', note: 'Agreed; strip formula repeated by hand.' },
        { act: 'check', by: 'koji', at: '2026-06-22 15:15', items: HAT_B },
        { act: 'pass', by: 'koji', at: '2026-06-22 15:20' },
        { act: 'release', by: 'catalina', at: '2026-06-26 09:15' },
      ],
    },
  ],
}

export const ANGLE_BRACKET: DemoNote = {
  project: 'QW-19', counter: 67, number: 'QSN-19-0067', title: 'Cargo door actuator bracket: torsion of a machined angle', part: 'QW19-5231-07', drawingIssue: 'B',
  createdBy: 'tunde', createdAt: '2026-09-14 09:25',
  issues: [{
    letter: 'A', openedBy: 'tunde', openedAt: '2026-09-14 09:25',
    acts: [
      { act: 'save', by: 'tunde', at: '2026-09-14 11:40', sections: only(angleBracket('returned'), ...SET_UP, ...DATA) },
      { act: 'save', by: 'tunde', at: '2026-09-28 14:50', sections: angleBracket('returned') },
      { act: 'answer', by: 'tunde', at: '2026-09-28 15:10', answers: [
        { calc: '*', guard: 'G-02', text: 'Junction bulge and end corrections are applied, which hold within a tenth of a per cent for equal legs of this shape; the peak is taken from the table of the machined angle and not from the thin wall.' },
        { calc: '*', guard: 'G-11', text: 'Both corrections were applied, and the free ends of the through leg were counted at the corner as well. The sum was repeated by hand from reference 6.' },
        { calc: '*', guard: 'G-27', text: 'Every opening of the door loads the fillet. Fatigue is treated in QSN-19-0069 with the peak stress of this note.' },
        { calc: '*', guard: 'G-28', text: 'At this rate of twist the section carries more torque than the linear result says, so for the given torque fillet and pad see less. The longitudinal stress is largest at the toes, where the shear is low, and is about a tenth of the tension strength; at the corner it is compression.' },
        { calc: '*', guard: 'G-34', text: 'The allowable is A basis, thickness and fillet are drawing minima, and the governing torque is the measured stall of the actuator. Nothing in the chain is a mean value.' },
      ] },
      { act: 'explain', by: 'tunde', at: '2026-09-30 16:30', reasons: REASONS.angle },
      { act: 'submit', by: 'tunde', at: '2026-09-30 16:45', checker: 'koji', approver: 'padraig' },
      { act: 'remark', remark: {
        by: 'koji', at: '2026-10-02 13:52', on: { section: 'assumptions', quote: 'minima of the drawing' }, text: 'State that the tolerance runs one way only, so that nobody reads them as nominal.',
        replies: [{ by: 'tunde', at: '2026-10-05 09:20', text: 'Added to assumption 4.' }], closedAt: '2026-10-08 09:31',
      } },
      { act: 'remark', remark: {
        by: 'koji', at: '2026-10-02 13:58', on: { calc: 'C1', field: 'ends' }, text: 'The legs are thick. What happens at the root if the frame holds the toes?',
        replies: [{ by: 'tunde', at: '2026-10-05 11:06', text: 'It would stress them along z. The drawing relieves the frame under both toes; description, assumption 2 and open points now say so.' }], closedAt: '2026-10-08 09:40',
      } },
      { act: 'return', by: 'koji', at: '2026-10-02 14:00', reason: 'Say what keeps the toes free at the root, and which way the tolerance runs.' },
      { act: 'save', by: 'tunde', at: '2026-10-05 11:04', sections: angleBracket('passed'), label: 'Toes relieved, tolerance stated' },
      { act: 'explain', by: 'tunde', at: '2026-10-05 11:10', reasons: REASONS.angle },
      { act: 'submit', by: 'tunde', at: '2026-10-05 11:20', checker: 'koji', approver: 'padraig' },
      { act: 'tick', by: 'koji', at: '2026-10-08 09:50', calcs: ['C1', 'C2'] },
      { act: 'judge', by: 'koji', at: '2026-10-08 10:12', note: 'True for this part.' },
      { act: 'check', by: 'koji', at: '2026-10-08 10:30', items: ANGLE },
      { act: 'pass', by: 'koji', at: '2026-10-08 10:40' },
    ],
  }],
}

export const RAIL_NOTE: DemoNote = {
  project: 'QL-8', counter: 9, number: 'QSN-40-0009', title: 'Platform guide rail: torsion under roller couples', part: 'QL8-3310-02', drawingIssue: 'C',
  createdBy: 'ilse', createdAt: '2026-08-31 09:10',
  issues: [{
    letter: 'A', openedBy: 'ilse', openedAt: '2026-08-31 09:10',
    acts: [
      { act: 'save', by: 'ilse', at: '2026-08-31 11:30', sections: only(channelRail(), ...SET_UP, ...DATA) },
      { act: 'save', by: 'ilse', at: '2026-09-17 16:05', sections: channelRail() },
      { act: 'answer', by: 'ilse', at: '2026-09-18 08:30', answers: [
        { calc: '*', guard: 'G-25', text: 'Paragraph 3 of QL8-SC-001 accepts the minima of the grade for the loader.' },
        { calc: '*', guard: 'G-10', text: 'The drawing bends both corners; they are taken to the intersection of the mid-lines to keep the section simple. S355J2 is ductile and the load of this note is static, so a local peak yields without harm. Fatigue is treated in QSN-40-0010 with the bend as drawn.' },
      ] },
      { act: 'explain', by: 'ilse', at: '2026-09-18 08:50', reasons: REASONS.rail },
      { act: 'submit', by: 'ilse', at: '2026-09-18 09:05', checker: 'noemie', approver: 'catalina' },
      { act: 'remark', remark: {
        by: 'noemie', at: '2026-09-28 10:05', on: { section: 'span-analysis', quote: '2.12°' },
        text: 'Typed, not tied, and kept with the reason "hand value". The calculation says otherwise: two digits have changed places. Tie it.', replies: [],
      } },
      { act: 'remark', remark: {
        by: 'noemie', at: '2026-09-28 10:40', on: { calc: 'C1', field: 'junctions' },
        text: 'The drawing bends the corners with 6 mm inside. Model the bends and state what is left of the margin.',
        replies: [{ by: 'ilse', at: '2026-10-01 08:30', text: 'Tried in a copy of C1: the margin stays positive but falls. Will go into C1 when the issue comes back to me.' }],
      } },
      { act: 'remark', remark: {
        by: 'noemie', at: '2026-09-28 11:10', on: { section: 'loads', quote: 'has the largest' },
        text: 'Issue 2 of the loads has been published and raises R04 and R06. Talk to design about thicker flanges before the next submission.',
        replies: [{ by: 'ilse', at: '2026-10-01 08:41', text: 'Agreed. Asked design.' }, { by: 'noemie', at: '2026-10-02 09:00', text: 'Leave open until the answer is in.' }],
      } },
      { act: 'check', by: 'noemie', at: '2026-10-02 09:20', items: RAIL },
    ],
  }],
}

export const LATCH_GUIDE: DemoNote = {
  project: 'QL-8', counter: 12, number: 'QSN-40-0012', title: 'Pallet latch guide: torsion of a curved trough', part: 'QL8-4120-07', drawingIssue: 'B',
  createdBy: 'tunde', createdAt: '2026-09-21 10:15',
  issues: [{
    letter: 'A', openedBy: 'tunde', openedAt: '2026-09-21 10:15',
    acts: [
      { act: 'save', by: 'tunde', at: '2026-09-21 14:20', sections: only(latchGuide(), ...SET_UP, ...DATA) },
      { act: 'save', by: 'tunde', at: '2026-10-01 11:20', sections: latchGuide() },
      { act: 'answer', by: 'tunde', at: '2026-10-01 11:40', answers: [{ calc: '*', guard: 'G-25', text: 'Paragraph 3 of QL8-SC-001 accepts the minima of the grade for the loader.' }] },
      { act: 'explain', by: 'tunde', at: '2026-10-01 11:50', reasons: REASONS.latch },
      { act: 'submit', by: 'tunde', at: '2026-10-01 12:05', checker: 'meera', approver: 'padraig' },
      { act: 'remark', remark: {
        by: 'meera', at: '2026-10-06 09:10', on: { section: 'assumptions', quote: 'they are alike' }, text: 'Alike is not the same as touching at the same moment. What is the play between latch and guide?',
        replies: [{ by: 'tunde', at: '2026-10-07 08:35', text: 'More than the guides can give. You are right: the whole torque on one guide.' }],
      } },
      { act: 'remark', remark: {
        by: 'meera', at: '2026-10-06 10:02', on: { section: 'assumptions', quote: 'common practice' }, text: 'Common practice is not a reason. Say what the feet hold, or compute it.', replies: [],
      } },
      { act: 'return', by: 'meera', at: '2026-10-06 10:08', reason: 'The torque of the pair stands on each guide alone until the other touches. Enter the whole torque, then see what is left of the margin.' },
    ],
  }],
}

export const LIPPED_CHANNEL: DemoNote = {
  project: 'QW-19', counter: 71, number: 'QSN-19-0071', title: 'Sill seal carrier: twist of a lipped channel', part: 'QW19-5240-11', drawingIssue: 'A',
  createdBy: 'noemie', createdAt: '2026-10-05 08:40',
  issues: [{
    letter: 'A', openedBy: 'noemie', openedAt: '2026-10-05 08:40',
    acts: [
      { act: 'save', by: 'noemie', at: '2026-10-05 11:15', sections: only(lippedChannel(), ...SET_UP, ...DATA) },
      { act: 'save', by: 'noemie', at: '2026-10-07 16:05', sections: only(lippedChannel(), ...SET_UP, ...DATA, 'span-analysis', 'stresses', 'stability') },
      { act: 'answer', by: 'noemie', at: '2026-10-07 16:20', answers: [{ calc: 'C1', guard: 'G-02', text: 'The end correction is applied to the lips; they carry no load other than their own shear.' }] },
      { act: 'save', by: 'noemie', at: '2026-10-09 15:30', sections: lippedChannel(), label: 'Next stocked sheet tried' },
    ],
  }],
}

export const CROSS_BAR: DemoNote = {
  project: 'QL-8', counter: 15, number: 'QSN-40-0015', title: 'Tilt frame cross bar', part: 'QL8-3340-01', drawingIssue: 'preliminary',
  createdBy: 'ilse', createdAt: '2026-10-09 14:02',
  issues: [{ letter: 'A', openedBy: 'ilse', openedAt: '2026-10-09 14:02', acts: [{ act: 'save', by: 'ilse', at: '2026-10-09 14:26', sections: crossBar() }] }],
}

/** The notes in the order in which they are told. Acts of different notes do not touch each other. */
export const DEMO_NOTES: DemoNote[] = [HAT, RAIL_NOTE, ANGLE_BRACKET, LATCH_GUIDE, LIPPED_CHANNEL, CROSS_BAR]
