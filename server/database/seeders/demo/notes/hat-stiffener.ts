/** QSN-19-0031: a hat stiffener that is twisted by the flap. Released at issue A, then at issue B. */
import { calc, notApplicable, ol, p, section, table, tex, ul, type DemoSection } from '../build-document'
import { SENSOR_CASES, SKIN_CASES } from '../load-cases'
import { QM_101 } from '../materials'
import { corners, openSection, polyline, rateCases, torqueCases, type SectionWords } from '../open-section-inputs'

/** What differs between the two issues. */
interface Sheet { letter: 'A' | 'B', drawing: string, t: string, least: string, radius: string, sensor: string }

export const SHEETS: Record<'A' | 'B', Sheet> = {
  A: { letter: 'A', drawing: 'C', t: '1.2', least: '1.15', radius: '3.0', sensor: '2' },
  B: { letter: 'B', drawing: 'D', t: '1.6', least: '1.55', radius: '3.2', sensor: '3' },
}

const hat = (t: string, radius: string): Pick<SectionWords, 'units' | 'geometry' | 'junctions' | 'material'> => ({
  units: 'SI',
  geometry: polyline({
    corners: [['-35', '0'], ['-20', '0'], ['-14', '30'], ['14', '30'], ['20', '0'], ['35', '0']],
    names: ['brim, inboard', 'web, inboard', 'crown', 'web, outboard', 'brim, outboard'], t, material: 'QM-101', unit: 'mm',
  }),
  junctions: corners(['2', '3', '4', '5'], radius, 'bent', 'mm'),
  material: QM_101,
})

const criteria = 'QW19-SC-002 issue 2: 1.5 on limit loads, imposed displacements factored like loads; no special factor pertains.'

const imposedTwist = (sheet: Sheet) => openSection({ ...hat(sheet.t, sheet.radius), loading: rateCases(SKIN_CASES, '°/m'), factorReason: criteria })

const sensorBay = (sheet: Sheet, t: string) => openSection({
  ...hat(t, sheet.radius), loading: torqueCases(SENSOR_CASES[sheet.letter], 'N·m', '°C'),
  length: '300', twistAllowed: '1.95', twistOrigin: `QW19-SYS-031 issue ${sheet.sensor}, paragraph 6: alignment of the position sensor`, factorReason: criteria,
})

const scope = () => section('scope',
  p('Flap inner stiffener QW19-5721-14, left and right, bays 3 to 9, all aeroplanes. The note covers the torsion of the stiffener: the twist that the flap imposes on its whole length, and the torque of the position sensor in bay 5.'),
  p('Not covered here:'),
  ul('column and local buckling and the tension of flap bending, which use the shear found here (QSN-19-0028);',
    'the rivets to the skin (QSN-19-0029);',
    'fatigue and damage tolerance (QSN-19-0061, with the stress spectrum of the same loads document), for which reason the calculations are run as not repeated.'))

const references = (sheet: Sheet) => section('references', ol(
  `Drawing QW19-5721-14 issue ${sheet.drawing}.`,
  'QW19-LDS-020 issue 3, Flap system loads, station table 12.',
  `QW19-SYS-031 issue ${sheet.sensor}, Flap position sensor, installation data.`,
  'QM-MD-101 issue 2, material record QM-101.',
  'QW19-SC-002 issue 2, Structural design criteria.',
  'Torsion methods reference, revision A, paragraphs 1.9, 1.10, 3.1, 6 and 7.',
  'CS-25 and 14 CFR part 25, paragraphs 303, 305 and 613.',
  'V. Z. Vlasov, Thin-walled elastic beams.'))

const description = (sheet: Sheet) => section('description',
  p('The stiffener is a hat pressed from sheet. It runs spanwise inside the flap and is riveted through its crown to the stringer cap of the upper skin; its two brims hang free.'
    + (sheet.letter === 'A' ? '' : ' The rivets stand in one row in the crown only, so the hat closes no cell with the skin: it is an open section, unlike the stiffener it replaced on the first prototype.')),
  p('The flap twists under air load and the stiffener has no choice but to follow. It receives a *rate of twist*, and the torque in it is a result. In bay 5 the drag link of the position sensor pulls on a bracket between two nylon clips and adds a torque of its own.'),
  p('Axes: x along the brims, y from the mid-line of the brims towards the crown, z outboard. Torque and twist are positive right-handed about z.'))

const assumptions = () => section('assumptions', ol(
  'The sheet is homogeneous, isotropic and linear elastic; the bends are not heated again. Verified on process sheet QWP-114.',
  'The stiffener takes the rate of twist of the flap at its own station. Reason: the row of rivets is dense. If the rivets slip, the stiffener is relieved: safe side.',
  'Warping is free. Reason: the ends are cut short of the ribs and stand clear. If a rib touched an end, the twist would fall and normal stress would appear; the cut is a key characteristic of the drawing.',
  'The contour keeps its shape. Reason: nylon clips hold the brims apart.',
  'The sensor\'s torque enters at one clip and leaves at the other. A torque spread along the bay would twist it less: safe side.',
  'Thickness is nominal, as the criteria say (reference 5, paragraph 4.2). C3 shows the least sheet that the drawing admits.',
  'Shear from the imposed twist and from the sensor is added without regard to sign where both are present. Safe side.'))

const geometry = (sheet: Sheet) => section('geometry',
  p(`Nominal mid-line dimensions, read from view B-B of the drawing, which gives outside sizes: brims 15 mm, depth 30 mm, crown 28 mm, webs leaning 6 mm inward; sheet ${sheet.t} mm, inside bend radius ${sheet.radius} mm.`),
  table(['Wall', 'From', 'To', 'What it is'],
    ['a', '1', '2', 'inboard brim, free edge at node 1'], ['b', '2', '3', 'inboard web'], ['c', '3', '4', 'crown, riveted'],
    ['d', '4', '5', 'outboard web'], ['e', '5', '6', 'outboard brim, free edge at node 6']),
  p('Slenderness is judged between the intersections of the mid-lines; the brims have ⟦C1 slenderness:a⟧. The shear centre stands outside the crown, as it must for a hat.'))

const materials = () => section('materials',
  p('QM-101 issue 2, aluminium alloy 2024-T3 in bare sheet, B basis. Seven stiffeners lie side by side and any one may fail without loss of the flap: the load path is redundant, so a B basis suits it (25.613).'),
  table(['Property', 'Value', 'Where from'],
    ['shear modulus', '⟦C1 G:QM-101⟧', 'record'], ['ultimate shear strength', '⟦C1 Fsu:QM-101⟧', 'record'],
    ['tension yield', '⟦C1 Fty:QM-101⟧', 'record'], ['shear yield', '⟦C1 Fsy:QM-101⟧', 'tension yield over the square root of three']),
  p('Shear yield is not published. It is taken as the tension yield divided by the square root of three, as the calculations state. At the temperature of the hot day all strengths are multiplied by ⟦C1 k:QM-101@S07⟧ (table 3 of the record). Demonstration data: these values may not be used for a real part.'))

const loads = (sheet: Sheet) => section('loads',
  p('All cases are given at limit level and all of them are solved; nothing was screened out beforehand.'),
  ul('S01 to S12 impose a rate of twist. S10, the jammed outboard carriage, has the largest rate, ⟦C1 theta_deg@S10⟧; S07 is the largest on a hot day, ⟦C1 theta_deg@S07⟧. S11 turns the other way.',
    'W01 to W04 are torques of the sensor link in bay 5. W03 drives the iced link with ⟦C2 T@W03⟧, W04 drives it back with ⟦C2 T@W04⟧.'),
  p('Imposed displacements are factored like loads, as the criteria require; no special factor pertains, since no fitting lies in the path of the torque.'),
  p(`The sensor's torques are those of issue ${sheet.sensor} of its installation data${sheet.letter === 'A' ? '.' : ', which belongs to the larger sensor.'}`))

const sectionAnalysis = (sheet: Sheet) => section('section-analysis',
  p('C1 solves the hat for the twelve imposed rates of twist. The stress follows from the rate alone:'),
  tex('\\tau = K_c\\,G\\,t\\,\\theta\''),
  calc('C1', 'Hat section, rate of twist imposed by the flap', imposedTwist(sheet)),
  p('The torsion constant is ⟦C1 J⟧ after the deduction for the two free edges. The shear centre lies at y = ⟦C1 y_S⟧ and the warping constant is ⟦C1 Gamma⟧; with the ends free it is stated for those who model the stiffener as a bar.'),
  p('The bay of the position sensor has the same section and carries a torque instead. C2 solves it, C3 repeats it with the least sheet.'),
  calc('C2', 'Sensor bay, torque of the sensor link', sensorBay(sheet, sheet.t)),
  calc('C3', 'Sensor bay at the least sheet of the drawing', sensorBay(sheet, sheet.least)),
  p('The torsion constant falls from ⟦C2 J⟧ to ⟦C3 J⟧ between the nominal and the least sheet: it goes with the cube of the thickness.'))

const span = () => section('span-analysis',
  p('Where the twist is imposed there is no span to solve: the rate is prescribed at every station. In case S10 the stiffener carries a torque of ⟦C1 T@S10⟧, which it returns to the flap.'),
  p('In the sensor bay the torque is constant from clip to clip. The largest, W03, turns at ⟦C2 theta@W03⟧ and so twists the bay by ⟦C2 twist_deg@W03⟧ over 300 mm, which is ⟦C2 twist@W03⟧. The torques at the two clips are equal and opposite.'))

const stresses = () => section('stresses',
  p('The largest shear of the imposed twist occurs in S10: ⟦C1 tau_max@S10⟧ on the flats and ⟦C1 tau_corner@S10⟧ on the inside of the bends. In the sensor bay W03 gives ⟦C2 tau_max@W03⟧ on the flats and ⟦C2 tau_corner@W03⟧ at the bends.'),
  p('Where both are present they are added by magnitude. Each alone has a margin above ten at limit and at ultimate, so their sum has a margin above four. This is enough to leave shear out of the decision, and the exact sum is not used further.'))

const deflections = (sheet: Sheet) => section('deflections',
  p(`The sensor tolerates a misalignment of ⟦C2 twist_allowed⟧ in its bay, measured against the flap (reference 3, paragraph 6); the twist of the flap itself moves sensor and link together and does not count. At limit load W03 twists the bay by ⟦C2 twist_deg@W03⟧, a margin of ⟦C2 MS:twist@W03⟧. W04 follows with ⟦C2 MS:twist@W04⟧.`),
  ...(sheet.letter === 'A' ? [] : [p('The larger sensor would have twisted the thinner sheet of issue A beyond its limit; this is one of the two reasons for the thicker sheet.')]))

const sensitivity = (sheet: Sheet) => section('sensitivity',
  p(`With the least sheet of the drawing, ${sheet.least} mm, the margin of W03 becomes ⟦C3 MS:twist@W03⟧ (C3). Thickness therefore matters: it enters the twist by its cube.`),
  p('In shear under the imposed twist the tendency is the opposite. There the stress grows with the thickness, because the rate is given and not the torque. Both margins were looked at for this reason.'),
  p('The bend radius moves the developed length a little and the corner factor less. If a clip were lost, the bay would be twice as long and twist twice as much: the clips are on the list of the inspection card.'))

const conclusion = (sheet: Sheet) => section('conclusion',
  ul('25.305 (a) and (b), imposed twist: shear at limit and ultimate in all twelve cases, C1. Met.',
    '25.305 (a), sensor bay: twist at limit within the alignment of the sensor, ⟦C2 MS:twist@W03⟧ in W03 with the nominal sheet (C2) and ⟦C3 MS:twist@W03⟧ with the least one (C3), which is the least margin of the note. Met.',
    '25.613: B basis on a redundant load path, temperature included. Met.'),
  p(`The stiffener of drawing issue ${sheet.drawing} is adequate for the twist that the flap imposes and for the torque of the position sensor.`))

/** All written sections of one issue. */
export function hatStiffener(letter: 'A' | 'B'): DemoSection[] {
  const sheet = SHEETS[letter]
  return [
    scope(), references(sheet), description(sheet), assumptions(), geometry(sheet), materials(), loads(sheet), sectionAnalysis(sheet), span(), stresses(),
    notApplicable('stability', 'Buckling of the stiffener is the subject of QSN-19-0028; the shear found here is too small to change it.'),
    deflections(sheet), sensitivity(sheet), section('open-points', p('None.')), conclusion(sheet),
  ]
}

/** Issue B as it was first submitted, before the checker asked why the section is open. */
export function hatStiffenerFirstB(): DemoSection[] {
  const early = description(SHEETS.A)
  return hatStiffener('B').map(one => one.key === 'description' ? early : one)
}
