/** QSN-19-0071: a seal carrier that is strong enough and not stiff enough. A draft with a negative margin. */
import { calc, notApplicable, ol, p, section, ul, type DemoSection } from '../build-document'
import { SILL_CASES } from '../load-cases'
import { QM_107 } from '../materials'
import { corners, openSection, polyline, torqueCases } from '../open-section-inputs'

const carrier = (t: string) => openSection({
  units: 'SI',
  geometry: polyline({
    corners: [['40', '-24'], ['40', '-40'], ['0', '-40'], ['0', '40'], ['40', '40'], ['40', '24']],
    names: ['lower lip', 'lower flange', 'web', 'upper flange', 'upper lip'], t, material: 'QM-107', unit: 'mm',
  }),
  junctions: corners(['2', '3', '4', '5'], '5.0', 'bent', 'mm'), material: QM_107,
  loading: torqueCases(SILL_CASES, 'lbf·in', '°F'), length: '410', twistAllowed: '1.50', twistOrigin: 'QW19-SYS-044 issue 2, paragraph 5: alignment of the seal between clips',
  factorReason: 'QW19-SC-002 issue 2: 1.5 on limit loads; no special factor pertains.',
})

/** The draft as it stands; the conclusion is not written yet. */
export function lippedChannel(): DemoSection[] {
  return [
    section('scope',
      p('Seal carrier QW19-5240-11 on the sill of the cargo door. Not covered: clips and rivets (QSN-19-0072), and the handler who steps on the sill cover.')),
    section('references', ol(
      'Drawing QW19-5240-11 issue A.', 'QW19-LDS-041 issue 1, Cargo door loads, table 5, in lbf·in.', 'QM-MD-107 issue 1, material record QM-107.',
      'QW19-SYS-044 issue 2, Door seal, compression and alignment.', 'Torsion methods reference, revision A, paragraphs 1.9, 1.10 and 7.8.')),
    section('description',
      p('The carrier is a channel with inward lips, pressed from sheet, which holds the door seal between two clips. The seal drags on the door and turns the carrier about its own axis.'),
      p('Axes: x from the web to the lips, y up, z along the sill. Torque and twist are positive right-handed about z.')),
    section('assumptions', ol(
      'Linear elastic.',
      'Each clip holds the rotation and lets the section warp. Reason: two rivets in the web only. This is far on the safe side for twist. *Reason to be confirmed with design before submission.*',
      'The torque enters at one clip and leaves at the other. Safe side for twist against a drag spread along the bay.',
      'Nominal thickness.')),
    section('geometry',
      p('Web 80 mm, flanges 40 mm, lips 16 mm, mid-line to the intersections; sheet 2.5 mm, inside bend radius 5.0 mm. The clips stand 410 mm apart. The lips have a slenderness of ⟦C1 slenderness:a⟧.')),
    section('materials',
      p('QM-107 issue 1, aluminium alloy 6061-T6 in sheet, A basis: ultimate shear ⟦C1 Fsu:QM-107⟧, tension yield ⟦C1 Fty:QM-107⟧, shear modulus ⟦C1 G:QM-107⟧; shear yield is taken as the tension yield divided by the square root of three. Demonstration data.')),
    section('loads',
      p('Six cases at limit level, given per carrier in lbf·in. L04, seal iced and door opened by power, has the largest torque, ⟦C1 T@L04⟧, which is ⟦C1 T@L04|N·mm⟧. L02 is the cold closing.')),
    section('section-analysis',
      calc('C1', 'Lipped channel, sheet as drawn', carrier('2.5')),
      p('The torsion constant is ⟦C1 J⟧, the shear centre lies at x = ⟦C1 x_S⟧, behind the web, and the warping constant is ⟦C1 Gamma⟧.')),
    section('span-analysis',
      p('L04 turns at ⟦C1 theta@L04⟧ and so twists the bay between the clips by ⟦C1 twist_deg@L04⟧. L02 gives ⟦C1 twist_deg@L02⟧ and also fails, by a hair: ⟦C1 MS:twist@L02⟧. L05 passes with ⟦C1 MS:twist@L05⟧.')),
    section('stresses', p('L04 gives ⟦C1 tau_corner@L04⟧ at the bends, of no concern.')),
    notApplicable('stability', 'The stress is very low.'),
    section('deflections',
      p('The seal tolerates ⟦C1 twist_allowed⟧ between clips (reference 4, paragraph 5). L04 twists the carrier by ⟦C1 twist_deg@L04⟧: the margin is ⟦C1 MS:twist@L04⟧ and the carrier is not adequate as drawn.'),
      p('The next stocked sheet is 3.0 mm. C2 tries it.'),
      calc('C2', 'Lipped channel, next stocked sheet', carrier('3.0')),
      p('It would give ⟦C2 MS:twist@L04⟧, with a torsion constant of ⟦C2 J⟧.')),
    section('sensitivity',
      p('If the clips held the warping, the twist would fall far below the limit. Clips that take in the flanges may therefore be a lighter cure than thicker sheet. To be discussed with design; it needs a calculation with restrained ends.')),
    section('open-points', ul('Thickness or clips: Noémie Castagnoux with design, before submission.', 'Whether the clips let the section warp: design, same date.')),
  ]
}
