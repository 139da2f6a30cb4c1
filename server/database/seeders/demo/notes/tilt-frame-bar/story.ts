import { tiltFrameBar } from './text'
import type { DemoNote } from '../../demo-note'

export const TILT_FRAME_BAR: DemoNote = {
  project: 'QL-8', counter: 15, number: 'QSN-40-0015', title: 'Tilt frame cross bar', part: 'QL8-3340-01', drawingIssue: 'preliminary',
  createdBy: 'ilse', createdAt: '2026-10-09 14:02',
  issues: [{ letter: 'A', openedBy: 'ilse', openedAt: '2026-10-09 14:02', acts: [{ act: 'save', by: 'ilse', at: '2026-10-09 14:26', sections: tiltFrameBar() }] }],
}
