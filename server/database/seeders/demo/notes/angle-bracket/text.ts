/** QSN-19-0067: a machined angle between actuator and door frame, in inches. */
import { calc, notApplicable, ol, p, section, type DemoSection } from '../../build-document'
import { QM_103 } from '../../materials'
import { forces, pad, section as outline, together, torsion, walls } from './calculations'

/** First with the pad measured from the mid-line; passed with the pad where it is, and with root and tolerance as the checker asked. */
export const angleBracket = (step: 'first' | 'passed'): DemoSection[] => [
  section('scope',
    p('Cargo door actuator bracket QW19-5231-07, one per door. Not covered: the two root bolts and the pad lug (QSN-19-0068), fatigue (QSN-19-0069).')),
  section('references', ol(
    'Drawing QW19-5231-07 issue B (dimensions in inches, supplier practice).',
    'QW19-LDS-041 issue 1, Cargo door loads, table 3.',
    'QM-MD-103 issue 1, material record QM-103.',
    'QW19-SC-002 issue 2, Structural design criteria.',
    'Torsion methods reference, revision A, paragraphs 1.10, 4, 5.3, 5.4, 7.',
    'El Darwish and Johnston, torsion constants of structural shapes, J. Struct. Div. ASCE, 1965.',
    '14 CFR and CS 25.303, 25.305, 25.613, 25.619, 25.625.')),
  section('description',
    p('The bracket is an angle with unequal legs, machined from plate. Its root is held to the door frame by two bolts, one through each leg close to the corner; under both toes the frame is relieved by 0.06 in (drawing view D), so that the toes can move along z. The actuator pushes on a pad near the toe of the long leg, 2.40 in from the clamp line, and so twists the angle about its shear centre, close to the corner. Axes as in the loads document: x along the long leg, y along the short leg, origin at the outer corner, z from the clamp to the pad.')),
  section('assumptions', ol(
    'Linear elastic, isotropic; the short-transverse direction is not loaded, as both legs lie in the plane of the plate.',
    step === 'first'
      ? 'Warping is free at the root. Reason: the bolts stand beside the corner, where an angle hardly warps.'
      : 'Warping is free at the root. Reason: the bolts stand beside the corner, where an angle hardly warps, and the toes are clear of the frame. If the toes were held, the *secondary* warping of the thick legs would matter: unsafe side, see section 18. The relief is therefore a key characteristic of the drawing.',
    'The bolts fix bending and twist at the bolt line, called clamp line below. If the bolts give, twist grows; the margin on twist covers a quarter.',
    step === 'first' ? 'Thickness and fillet are the *minima* of the drawing.' : 'Thickness and fillet are the *minima* of the drawing: 0.250 in (+0.010/−0) and 0.190 in (+0.030/−0).',
    'Stress at the fillet is the linear elastic peak. No credit is taken for yielding.',
    'The highest pertinent special factor is the fitting factor 1.15. It is applied at limit also (QW19-SC-002 para 5.3).')),
  section('geometry',
    p('Outside legs 2.00 in and 1.55 in, both 0.250 in thick; fillet 0.190 in, outer corner sharp. Slenderness: long leg ⟦walls slenderness:a⟧ and short leg ⟦walls slenderness:b⟧ between the intersections of the mid-lines.')),
  section('materials',
    p('QM-103 issue 1, 7050-T7451 plate, A basis, single load path: F_su ⟦QM-103 Fsu|ksi⟧, F_tu ⟦QM-103 Ftu|ksi⟧, F_ty ⟦QM-103 Fty|ksi⟧, G ⟦QM-103 G|ksi⟧. At 160 °F the strengths are multiplied by 0.960 (71.1 °C, between the table points). Demonstration data.'),
    calc('QM-103', 'material', '7050-T7451 plate', QM_103)),
  section('loads',
    p('Nine cases at limit level. K05, door held open in a 65 kt gust on a hot ramp: ⟦BRACKET Vy@K05⟧ along y and ⟦BRACKET Vx@K05⟧ along x at 160 °F. K07, actuator stall: ⟦BRACKET Vy@K07⟧ along y.'),
    calc('BRACKET', 'load-cases', 'Force at the actuator pad, K01 to K09', forces)),
  section('section-analysis',
    calc('section', 'general-outline', 'Angle with fillet, two-dimensional solution', outline),
    calc('pad', 'torque-from-loads', 'Force at the pad about the shear centre', pad(step === 'first' ? '1.735' : '1.860')),
    calc('walls', 'open-section', 'Angle by walls with the corrections of junction and ends', walls),
    p('J = ⟦section J⟧; the wall formula gives ⟦walls J⟧. The peak stress sits in the middle of the fillet; its ratio to G θ′ t agrees with the factor of the table, ⟦walls Kc:2⟧. The simple factor 1 + t/4r would give 1.33 and would be unsafe. Shear centre x = ⟦section x_S⟧, y = ⟦section y_S⟧.'),
    p('Before its corrections the wall formula has ⟦walls J_plain⟧; the bulge of the corner adds ⟦walls J_bulge⟧ and the ends take ⟦walls J_ends⟧. The outline differs from the sum by ⟦torsion difference:J⟧.')),
  section('span-analysis',
    calc('torsion', 'general-outline', 'The nine cases on the outline', torsion),
    p('One force, one support: the torque is constant from pad to clamp. K05: ⟦pad T@K05⟧; K07: ⟦pad T@K07⟧.')),
  section('stresses',
    calc('together', 'combined-stress', 'Fillet and toe: torsion, direct shear, bending', together),
    p('K05, limit: flat ⟦walls tau_max@K05⟧; fillet from torsion ⟦torsion tau_max@K05⟧, with the direct shear of the force together ⟦together tau@K05⟧; bending at the fillet ⟦together sigma@K05⟧ and at the toe of the short leg ⟦together sigma@K05-toe⟧.'),
    p('At ultimate the circle rule leaves ⟦together MS:interaction-ultimate⟧ in K05 at the fillet. Next are K07 with ⟦together MS:interaction-ultimate@K07⟧ and K03 with ⟦together MS:interaction-ultimate@K03⟧. At the toe K07 leaves ⟦together MS:interaction-ultimate@K07-toe⟧; von Mises at limit leaves ⟦together MS:equivalent-yield⟧.'),
    calc('margins', 'margin-table', 'All margins of the note', { rows: 'least of each mode' })),
  notApplicable('stability', 'The compressed leg is 5.2 thicknesses wide.'),
  section('deflections',
    p('The actuator rod end tolerates ⟦torsion twist_allowed⟧ of pad rotation (drawing note 9). K07: ⟦torsion theta@K07⟧ over 2.40 in is ⟦torsion twist_deg@K07⟧; margin ⟦torsion MS:twist⟧. The Wagner ratio is ⟦torsion wagner@K07⟧, linear.')),
  section('sensitivity',
    p('A fillet cut to 0.16 in would take most of the least margin, one of 0.13 in or a thickness of 0.24 in more than all of it (torsion part changed only, quick calculations). No concession below the drawing minima can be granted on this note.'),
    ...(step === 'first' ? [] : [p('If both toes were held rigidly, the secondary warping of the thick legs, Γ = ⟦section Gamma⟧, would bring a stress along z of 44.5 ksi at the long toe in K05 at limit, more than the 41.2 ksi available; the pad would twist less by a third. The relief must not be shimmed.')])),
  section('open-points',
    p('None. The relief under the toes is in the key characteristics list of the drawing.')),
  section('conclusion',
    p('With a least margin of ⟦margins MS⟧ the bracket meets CS 25.305, 25.619 and 25.625 at drawing minimum dimensions.')),
]
