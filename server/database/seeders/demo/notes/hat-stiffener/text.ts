/** QSN-19-0031: a hat stiffener that follows the twist of the flap. */
import { calc, notApplicable, ol, p, section, table, type DemoSection } from '../../build-document'
import { QM_101 } from '../../materials'
import { following, hat, outline, SHEETS, skin, together, type Sheet } from './calculations'

const written = (sheet: Sheet, why: string): DemoSection[] => [
  section('scope',
    p('Flap inner stiffener QW19-5721-14, left and right, bays 3 to 9, all aeroplanes. Not covered: column and local buckling (QSN-19-0028), rivets to the skin (QSN-19-0029), fatigue and damage tolerance (QSN-19-0061, which uses the stress spectrum of the same loads document; the calculations here are therefore run with the repeated-load flag off).')),
  section('references', ol(
    `Drawing QW19-5721-14 issue ${sheet.drawing}.`,
    'QW19-LDS-020 issue 3, Flap system loads.',
    'QW19-FEM-061 issue 4, Flap finite element model, station tables.',
    'QM-MD-101 issue 2, material record QM-101.',
    'QW19-SC-002 issue 2, Structural design criteria.',
    'Torsion methods reference, revision A, paragraphs 1.9, 1.10, 3.1, 6, 7.4.',
    '14 CFR and CS 25.303, 25.305, 25.613.',
    'V. Z. Vlasov, Thin-walled elastic beams.')),
  section('description',
    p('The stiffener is a hat pressed from sheet. It runs spanwise inside the flap and is riveted through its *crown*, in one row, to the stringer cap of the upper skin; its two brims hang free. ' + why + 'The flap twists under air load, and the stiffener has no choice but to follow: it receives a rate of twist, and its torque is a result. Axes: x along the brims, y from the brim mid-line towards the crown, z outboard; torque and twist are positive right-handed about z.')),
  section('assumptions', ol(
    'Homogeneous, isotropic, linear elastic sheet. The bends are not re-heated. Verified: process sheet QWP-114.',
    'The stiffener takes the rate of twist of the flap at its own station. Reason: forty rivets a metre through the crown. If wrong (rivets slip), the stiffener is relieved: safe side.',
    'Warping is free except for the part forced by the *change* of the rate of twist along the span; that part is computed with the imposed twist. Reason: the ends are cut 12 mm short of the ribs.',
    'The contour keeps its shape. Reason: nylon clips at 150 mm hold the brims apart.',
    'Warping, bending and axial stress are added by magnitude although their maxima lie at different points. Safe side, worth less than two per cent here.',
    'Nominal thickness; the drawing tolerance of ±0.05 mm moves the stress by three per cent, against margins above one.')),
  section('geometry',
    p(`Mid-line dimensions: brims 15 mm, webs 30 mm deep leaning 6 mm inward, crown 28 mm, thickness ${sheet.t} mm, inside bend radius ${sheet.radius} mm. Developed length ⟦hat developed⟧. Slenderness is judged on the walls between mid-line intersections; the brim has ⟦hat slenderness:a⟧.`),
    table(['Wall', 'From', 'To', 'What it is'],
      ['a', '1', '2', 'inboard brim, free edge at node 1'], ['b', '2', '3', 'inboard web'], ['c', '3', '4', 'crown, riveted'],
      ['d', '4', '5', 'outboard web'], ['e', '5', '6', 'outboard brim, free edge at node 6'])),
  section('materials',
    p('QM-101 issue 2, 2024-T3 bare sheet, B basis, redundant load path: F_su ⟦QM-101 Fsu⟧, F_tu ⟦QM-101 Ftu⟧, F_ty ⟦QM-101 Fty⟧, G ⟦QM-101 G⟧. F_sy is taken as F_ty/√3. At 71 °C all strengths are multiplied by ⟦hat k:QM-101@S07⟧. Demonstration data.'),
    calc('QM-101', 'material', '2024-T3 bare sheet', QM_101)),
  section('loads',
    p('Twelve cases S01 to S12, all at limit level, all solved. The governing case S07 (flap 40, gust up, hot day) imposes ⟦SKIN rate@S07⟧ with a gradient of ⟦SKIN gradient@S07⟧ and an axial force of ⟦SKIN axial@S07⟧ at 71 °C. The largest rate of twist, ⟦SKIN rate@S10⟧, occurs with the outboard carriage jammed (S10), where the axial force is smaller. Imposed displacements are factored by 1.5 for ultimate like loads, as QW19-SC-002 requires.'),
    calc('SKIN', 'load-cases', 'Imposed rates of twist, S01 to S12', skin)),
  section('section-analysis',
    calc('hat', 'open-section', `Hat section, issue ${sheet.drawing} sheet`, hat(sheet)),
    p('J = ⟦hat J⟧ (⟦hat J_plain⟧ before the end correction). The shear centre lies at y = ⟦hat y_S⟧, outside the crown; Γ = ⟦hat Gamma⟧; the largest sectorial coordinate, ⟦hat omega_max⟧, is at the brim tips. The bend factor for an inside radius of twice the thickness is ⟦hat Kc:2⟧.'),
    calc('outline', 'general-outline', 'Cross-check by the two-dimensional solution', outline(sheet)),
    p('The two-dimensional solution of the true outline, ⟦#outline⟧, gives J = ⟦outline J⟧ (the corrected thin walls differ by ⟦outline difference:J⟧), the shear centre at y = ⟦outline y_S⟧ and Γ = ⟦outline Gamma⟧. The small difference in Γ is the thickness of the walls, which the centre line does not know.')),
  section('span-analysis',
    calc('following', 'imposed-twist', 'Twelve cases of imposed rate of twist', following(sheet)),
    p('The rate of twist is prescribed at every station, so there is no span to solve. In case S10 the stiffener carries a torque of ⟦following T@S10⟧ and a bimoment of ⟦following B@S10⟧; it returns that torque to the flap. Its stiffness is ⟦following GJ_ratio⟧ of the flap box, far below the five per cent at which the two would have to be solved together.')),
  section('stresses',
    calc('together', 'combined-stress', 'Axial, warping, bending and shear at the worst fibre', together(sheet)),
    p('Case S07, worst fibre: of the axial force, of warping (⟦following sigma_w@S07⟧) and of the bending between rivet line and shear centre (⟦following sigma_b@S07⟧), as magnitudes together ⟦together sigma@S07⟧. Shear at the bends is ⟦following tau@S07⟧. Case S10 has the largest shear, ⟦following tau@S10⟧. The von Mises stress in S07 is ⟦together sigma_eq@S07⟧.'),
    p('At ultimate the circle rule, solved as a load multiplier, gives ⟦together MS:interaction-ultimate⟧ in S07; von Mises at limit gives ⟦together MS:equivalent-yield⟧. The cold case S08 lies close behind with ⟦together MS:interaction-ultimate@S08⟧. In shear alone all margins exceed ten, ⟦following MS:shear-ultimate⟧ being the least at ultimate.'),
    calc('margins', 'margin-table', 'All margins of the note', { rows: 'least of each mode' })),
  section('stability',
    p('Not applicable here because buckling of the stiffener is the subject of QSN-19-0028; the shear found is too small to change it.')),
  notApplicable('deflections', 'The twist is imposed; its limit belongs to the flap.'),
  section('sensitivity',
    p('Sheets 0.2 mm thinner and thicker were tried in quick calculations: thicker is better in total, because the axial stress falls faster than the shear rises. In shear alone thicker is worse.')),
  section('open-points',
    p('None.')),
  section('conclusion',
    p('With a least margin of ⟦margins MS⟧ the stiffener meets CS 25.305 at limit and ultimate load for the imposed twist of the flap.')),
]

const OPEN = 'The rivets stand in one row through the crown and the brims are free, so the hat closes no cell with the skin: it is an open section. '

/** Issue A, or issue B as it was released. */
export const hatStiffener = (letter: 'A' | 'B'): DemoSection[] => written(SHEETS[letter], letter === 'A' ? '' : OPEN)

/** Issue B as it was first submitted, before the checker asked why the section is open. */
export const hatStiffenerFirstB = (): DemoSection[] => written(SHEETS.B, '')
