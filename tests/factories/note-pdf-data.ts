/** A whole issue as it is handed to the printer: three calculations, every sort of block, answers, a check sheet. All of it is invented. */
import { createHash } from 'node:crypto'
import { crc32, deflateSync } from 'node:zlib'
import { ENGINE_VERSION, evaluateCalculation } from '#shared/calc/registry'
import type { Evaluation } from '#shared/calc/types'
import { canonicalJson } from '#shared/note/canonical'
import type { NotePdfData, PdfAnswer } from '#server/pdf/note-pdf-data'
import { angleSection, hatSection, weakHat } from './sample-sections'
import { bulletList, calculation, equation, heading, inlineEquation, marked, noteDocument, paragraph, table, testId, tied, type Json } from './note-document'

export const HAT = testId(1)
export const ANGLE = testId(2)
export const SLIT = testId(3)
const PICTURE = testId(9)

const AUTHOR = 'Ilse Tveråmo'
const CHECKER = 'Meera Ranganekar'
const APPROVER = 'Catalina Ferreyrón'

interface Section { id: string, title: string, inputs: Record<string, unknown> }
const SECTIONS: Section[] = [
  { id: HAT, title: 'Hat stiffener over the bay', inputs: hatSection() },
  { id: ANGLE, title: 'End angle at rib 8', inputs: angleSection() },
  { id: SLIT, title: 'Hat stiffener at the thinnest delivery', inputs: hatSection('2.4') },
]

const block = ({ id, title, inputs }: Section): Json => calculation(title, { id, inputs })
const evaluations = (sections: Section[]): Record<string, Evaluation> =>
  Object.fromEntries(sections.map(({ id, inputs }) => [id, evaluateCalculation({ kind: 'open-section', kindVersion: 1, inputs })]))

function sampleDocument(sections: Section[]): Json {
  const [first = SECTIONS[0], ...rest] = sections
  return noteDocument({
    scope: [
      paragraph('This note covers hat stiffener ', marked('QW19-5721-14', 'bold'), ' to drawing issue D, serial numbers 1 and on. Joints are held in ', marked('QSN-19-0031, section 7', 'italic'), ', fatigue in QSN-19-0112.'),
      bulletList('Bending of the skin panel is not covered.', 'Dynamic behaviour of the cable run is not covered.'),
    ],
    references: [
      table(['Document', 'Issue', 'Used for'], ['QW19-SYS-031, flap position sensor', '3', 'torque of the link'], ['Material sheet 101', '2', 'allowables of 2024-T3'], ['CS-25 & 14 CFR part 25', '–', 'paragraphs 303, 305, 613']),
      paragraph('The regulation is read at ', marked('its publisher', 'link', { href: 'https://www.easa.europa.eu/' }), '.'),
    ],
    description: [
      paragraph('The stiffener carries the torque of the fairlead from rib 7 to rib 8. The axis ', inlineEquation('z'), ' runs outboard, and a torque is positive by the right hand about it.'),
      heading(2, 'Load path'),
      paragraph('The link enters the torque ', inlineEquation('T_{\\max}=\\frac{P\\,e}{1-\\mu}'), ' at the crown; it leaves through the end angle.'),
      { type: 'figure', attrs: { id: testId(10), fileId: PICTURE, alt: 'A shaded field', caption: 'The bay between ribs 7 and 8, seen from inboard.' } },
    ],
    assumptions: [{
      type: 'orderedList', attrs: { start: 1, type: null },
      content: ['Linear elastic, isotropic material.', 'Ends free to warp; the clips give no restraint.', 'Nominal thickness, as the criteria allow.'].map(text => ({ type: 'listItem', content: [paragraph(text)] })),
    }],
    geometry: [paragraph('Dimensions are read from the drawing at nominal size; 1', marked('st', 'superscript'), ' angle projection, walls lettered from the left foot.')],
    materials: [paragraph('Sheet 2024-T3, bare, ', marked('B', 'underline'), ' basis. The shear yield strength is taken as ', inlineEquation('F_{sy}=F_{ty}/\\sqrt{3}'), '.')],
    loads: [paragraph('Four cases at limit level; the cable jam L02 envelopes L01 and L04, its reverse L03 stands by itself.')],
    'section-analysis': [
      paragraph('The torsion constant of the hat is ', tied(HAT, 'J'), ' and its rate of twist in case L02 ', tied(HAT, 'theta_deg@L02', '°/m'), '.'),
      equation('J=\\sum_i\\frac{L_i\\,t_i^{3}}{3}\\left(1-0.630\\,\\frac{t_i}{L_i}\\right)'),
      ...(first ? [block(first)] : []), ...rest.map(block),
    ],
    deflections: [paragraph('The bar twists by ', tied(HAT, 'twist_deg@L02', '°'), ' where 4° are allowed.')],
    'open-points': [paragraph('None.')],
    conclusion: [paragraph('The stiffener meets CS-25 paragraphs 303 and 305 in torsion for the four cases named. Wear of 0.05 mm is allowed for by the delivery drawing.')],
  }, {
    'span-analysis': 'the torque is constant between the two ribs.', 'stresses': 'torsion acts alone.',
    'stability': 'no wall is thin enough to buckle below its yield.', 'sensitivity': 'the least margin is above one.',
  })
}

function chunk(type: string, data: Buffer): Buffer {
  const [length, sum] = [Buffer.alloc(4), Buffer.alloc(4)]
  length.writeUInt32BE(data.length)
  sum.writeUInt32BE(crc32(Buffer.concat([Buffer.from(type), data])))
  return Buffer.concat([length, Buffer.from(type), data, sum])
}

/** A picture with transparency, made here so that no file is needed. */
export function samplePng(width = 320, height = 120): Buffer {
  const head = Buffer.alloc(13)
  head.writeUInt32BE(width, 0)
  head.writeUInt32BE(height, 4)
  head.set([8, 6, 0, 0, 0], 8)
  const rows = Buffer.alloc(height * (1 + 4 * width))
  for (let y = 0; y < height; y++) {
    for (let x = 0; x < width; x++) rows.set([40 + x / 2, 110, 100 + y / 2, 80 + (x + y) % 160], y * (1 + 4 * width) + 1 + 4 * x)
  }
  const signature = Buffer.from([0x89, 0x50, 0x4E, 0x47, 0x0D, 0x0A, 0x1A, 0x0A])
  return Buffer.concat([signature, chunk('IHDR', head), chunk('IDAT', deflateSync(rows)), chunk('IEND', Buffer.alloc(0))])
}

function answersTo(results: Record<string, Evaluation>): PdfAnswer[] {
  return Object.entries(results).flatMap(([calcId, evaluation]) => (evaluation.ok ? evaluation.result.guards : []).filter(guard => guard.severity !== 'information').map(guard => ({
    calcId, guardKey: guard.key, kind: guard.severity === 'stop' ? 'deviation' as const : 'answer' as const,
    text: 'Treated in QSN-19-0112, which covers the repeated load of the link with its scatter factor.', author: AUTHOR, at: '2026-10-07T13:20:00.000Z',
    judged: { accepted: true, by: CHECKER, at: '2026-10-09T08:05:00.000Z', note: 'Read.' },
    approved: guard.severity === 'stop' ? { by: APPROVER, at: '2026-10-12T09:00:00.000Z' } : null,
  })))
}

/** Sample of a released issue; `change` replaces what a test is about. */
export function samplePdfData(change: Partial<NotePdfData> = {}, sections = SECTIONS): NotePdfData {
  const document = sampleDocument(sections)
  const results = evaluations(sections)
  const frozen = canonicalJson({ number: 'QSN-19-0031', letter: 'B', document, results })
  const item = (number: number, text: string, verdict: 'ok' | 'not applicable', evidence: string) =>
    ({ item: number, text, verdict, evidence, by: CHECKER, at: '2026-10-09T08:40:00.000Z' })
  return {
    number: 'QSN-19-0031', letter: 'B', state: 'released', title: 'Hat stiffener under fairlead torque, ribs 7 & 8', part: 'QW19-5721-14', drawingIssue: 'D',
    project: { code: 'QW-19', name: 'Ondrell', basis: 'CS-25 and 14 CFR part 25, paragraphs 303, 305, 613, 619, 625' }, organisation: 'Quellmark Airframe Works',
    changeNote: 'Torques of the larger sensor.', save: 16, engineVersion: ENGINE_VERSION,
    contentHash: createHash('sha256').update(frozen).digest('hex'), frozen,
    people: [
      { role: 'Analyst', name: AUTHOR, at: '2026-10-08T15:10:00.000Z', save: 16 },
      { role: 'Checker', name: CHECKER, at: '2026-10-09T09:12:00.000Z', save: 16 },
      { role: 'Approver', name: APPROVER, at: '2026-10-12T09:00:00.000Z', save: 16 },
    ],
    contributors: ['Tunde Akinsola-Briggs'],
    revisions: [
      { letter: 'B', state: 'released', releasedAt: '2026-10-12T09:00:20.000Z', change: 'Torques of the larger sensor, QW19-SYS-031 issue 3.', leastMargin: 0.4169, leastMarginMode: 'Twist' },
      { letter: 'A', state: 'superseded', releasedAt: '2026-03-02T14:31:00.000Z', change: 'First issue.', leastMargin: 1.28, leastMarginMode: 'Twist' },
    ],
    document, results, answers: answersTo(results),
    loose: [{ blockId: testId(1001), text: '0.05 mm', reason: 'A tolerance of the drawing, no result of this note.', by: AUTHOR, at: '2026-10-07T13:25:00.000Z' }],
    ticks: sections.map(({ id }) => ({ calcId: id, by: CHECKER, at: '2026-10-09T08:31:00.000Z', save: 16 })),
    checkSheet: [
      item(1, 'Drawing number and issue are those of the current configuration.', 'ok', 'Read from the drawing register on the day.'),
      item(8, 'The torsion constant was found again by a second method, within the accepted difference.', 'ok', 'Strip sum by hand, 0.3 % lower.'),
      item(13, 'Bimoment and warping stress are combined with the other stresses at the same point.', 'not applicable', 'Ends are free.'),
      item(31, 'One way from load through stress to margin was followed by hand.', 'ok', 'Case L02, twist, on one sheet.'),
    ],
    figures: { [PICTURE]: { mime: 'image/png', bytes: samplePng() } },
    demonstration: true, uncontrolled: false, createdAt: '2026-10-12T09:00:20.000Z',
    ...change,
  }
}

/** The same with its first calculation only: quicker to set where the rest does not matter. */
export const shortPdfData = (): NotePdfData => samplePdfData({}, SECTIONS.slice(0, 1))

/** An issue whose section does not carry its torque, as an uncontrolled print of a draft. */
export function negativeDraft(): NotePdfData {
  return samplePdfData({
    state: 'draft', letter: 'A', uncontrolled: true, contentHash: null, frozen: null, ticks: [], checkSheet: [], answers: [], demonstration: false,
    people: [{ role: 'Analyst', name: AUTHOR, at: null, save: null }, { role: 'Checker', name: null, at: null, save: null }, { role: 'Approver', name: null, at: null, save: null }],
  }, [{ id: HAT, title: 'Hat stiffener, thin', inputs: weakHat() }])
}
