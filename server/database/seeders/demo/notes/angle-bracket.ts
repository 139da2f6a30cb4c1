/** QSN-19-0067: a machined angle in US customary units, waiting for approval. */
import { calc, notApplicable, ol, p, section, table, ul, type DemoSection } from '../build-document'
import { BRACKET_CASES, type DemoCase } from '../load-cases'
import { QM_103 } from '../materials'
import { corners, openSection, polyline, torqueCases } from '../open-section-inputs'

const angle = (fillet: string, cases: DemoCase[]) => openSection({
  units: 'US',
  geometry: polyline({ corners: [['2.000', '0.125'], ['0.125', '0.125'], ['0.125', '1.550']], names: ['long leg', 'short leg'], t: '0.250', material: 'QM-103', unit: 'in' }),
  junctions: corners(['2'], fillet, 'machined', 'in'), material: QM_103,
  loading: torqueCases(cases, 'lbf·in', '°F'), length: '2.40', twistAllowed: '3.0', twistOrigin: 'Drawing QW19-5231-07 note 9: pad rotation that the rod end tolerates',
  fitting: '1.15', factorReason: 'QW19-SC-002 issue 2: 1.5 on limit loads; the bracket is a fitting, so 1.15 acts on ultimate and on limit (paragraph 5.3). It is the highest special factor that pertains.',
  repeated: true,
})

/** `returned` is what the note said before the checker asked about the root and the tolerance. */
export function angleBracket(state: 'returned' | 'passed'): DemoSection[] {
  const passed = state === 'passed'
  return [
    section('scope',
      p('Cargo door actuator bracket QW19-5231-07, one per door, all aeroplanes. The note covers the torsion of the angle between its clamp line and the pad of the actuator.'),
      p('Not covered: the shear pin that takes the force of the actuator, the two root bolts and the lug of the pad (QSN-19-0068); fatigue (QSN-19-0069).')),
    section('references', ol(
      'Drawing QW19-5231-07 issue B, dimensions in inches.',
      'QW19-LDS-041 issue 1, Cargo door loads, table 3.',
      'QM-MD-103 issue 1, material record QM-103.',
      'QW19-SC-002 issue 2, Structural design criteria.',
      'Torsion methods reference, revision A, paragraphs 1.10, 7.1, 7.3 and 7.7.',
      'M. A. El Darwish and B. G. Johnston, torsion of structural shapes, Journal of the Structural Division, ASCE, 1965.',
      'CS-25 and 14 CFR part 25, paragraphs 303, 305, 613, 619 and 625.')),
    section('description',
      p('The bracket is an angle with unequal legs, machined from plate. Its root is held to the door frame by two bolts, one through each leg close to the corner. The actuator drives a pad near the toe of the long leg. A pin beside the pad takes the force itself into the frame, so that the angle is left with the torque.'),
      ...(passed ? [p('Under both toes the frame is relieved by 0.06 in (drawing view D), so that the toes can move along z when the section warps.')] : []),
      p('Axes as in the loads document: x along the long leg, y along the short leg, origin at the outer corner, z from the clamp line to the pad. Torque is positive right-handed about z; most cases are negative.')),
    section('assumptions', ol(
      'Linear elastic and isotropic. The short-transverse direction is not loaded, as both legs lie in the plane of the plate.',
      passed
        ? 'Warping is free at the root. Reason: the bolts stand beside the corner, where an angle hardly warps, and the toes are clear of the frame. If the toes were held, thick legs would be stressed along z: unsafe side. The relief is a key characteristic of the drawing.'
        : 'Warping is free at the root, because the bolts stand beside the corner.',
      'The bolts fix the twist at the bolt line, called the clamp line here. If they give, the twist grows; the margin on twist covers a quarter.',
      passed
        ? 'Thickness and fillet are the *minima* of the drawing, not its nominal values: the drawing tolerates only more of both.'
        : 'Thickness and fillet are the minima of the drawing.',
      'Stress at the fillet is the linear elastic peak. No credit is taken for yielding.')),
    section('geometry',
      p('Least dimensions of the drawing: legs 2.00 in and 1.55 in outside, 0.250 in thick, inside fillet 0.190 in, outer corner sharp. The slenderness of the legs is ⟦C1 slenderness:a⟧ and ⟦C1 slenderness:b⟧. Mid-lines lie half a thickness inside the outer faces; the walls run from their crossing to the toes.'),
      table(['Wall', 'What it is', 'Free edge'], ['a', 'long leg, along x', 'at node 1'], ['b', 'short leg, along y', 'at node 3'])),
    section('materials',
      p('QM-103 issue 1, aluminium alloy 7050-T7451 in plate, A basis, since the bracket is the single load path of its door: ultimate shear ⟦C1 Fsu:QM-103⟧, tension yield ⟦C1 Fty:QM-103⟧, shear modulus ⟦C1 G:QM-103⟧. The record is in SI; its US sheet is used here, and shear yield is taken as the tension yield divided by the square root of three. On the hot ramp the strengths are multiplied by ⟦C1 k:QM-103@K05⟧ (table 2 of the record). Demonstration data.')),
    section('loads',
      p('Nine cases at limit level, torque about the line of the pin. K05 holds the door open in a gust on a hot ramp; K07 stalls the actuator at its end stop and has the largest torque; K08 repeats it hot. K04 turns the other way.'),
      p('The bracket is a fitting within 25.625. The fitting factor is the highest special factor that pertains and multiplies the factor of safety once (25.619); by paragraph 5.3 of the criteria it acts at limit too. The load is repeated at every opening of the door.')),
    section('section-analysis',
      p('The legs are stocky: junction and ends carry a good part of the torsion constant, so both corrections are applied and the corner factor is read from the table of the methods reference.'),
      calc('C1', 'Angle at drawing minima, fillet as drawn', angle('0.190', BRACKET_CASES)),
      p('The torsion constant is ⟦C1 J⟧. The fillet carries the peak: its factor on the stress of the flats is ⟦C1 Kc:2⟧. The common rule of thumb for a fillet would give less here and would be unsafe, because it does not know how much the junction fattens.')),
    section('span-analysis',
      p('One torque, one support: the torque is constant from pad to clamp line. K05 carries ⟦C1 T@K05⟧ and K07 carries ⟦C1 T@K07⟧; the clamp returns the same.'),
      p('The rate of twist of K07 is ⟦C1 theta@K07⟧, which turns the pad, 2.40 in from the clamp line, by ⟦C1 twist_deg@K07⟧.')),
    section('stresses',
      p('At limit the flats reach ⟦C1 tau_max@K05⟧ in K05 and the fillet ⟦C1 tau_corner@K05⟧. K07 has ⟦C1 tau_corner@K07⟧ at the fillet, at a temperature where the strength is not reduced. So the hot gust K05 governs although K07 has the larger torque. The pin takes the direct shear and the bending of the force, so nothing is added to the torsion at the fillet.')),
    notApplicable('stability', 'The compressed leg is fewer than six thicknesses wide and its stress is shear.'),
    section('deflections',
      p('The rod end of the actuator tolerates a pad rotation of ⟦C1 twist_allowed⟧ (drawing note 9). K07 turns it by ⟦C1 twist_deg@K07⟧ at limit load, a margin of ⟦C1 MS:twist@K07⟧.')),
    section('sensitivity',
      p('The drawing tolerates a fillet of up to 0.220 in on every part. C2 solves it for the two cases that lie closest to their limit, since a larger fillet fattens the junction and could raise the peak.'),
      calc('C2', 'Angle with the largest fillet of the drawing', angle('0.220', BRACKET_CASES.filter(one => ['K05', 'K07'].includes(one.id)))),
      p('The fillet stress of K05 is ⟦C2 tau_corner@K05⟧ there, against ⟦C1 tau_corner@K05⟧ at the minimum, and the margin ⟦C2 MS:corner-ultimate@K05⟧: the smallest fillet is the worst within the tolerance. A thinner leg would be worse still, for the torsion constant goes with the cube of the thickness. No concession below the drawing minima can be granted on this note.')),
    section('open-points', p(passed ? 'None. The relief under the toes is in the key characteristics list of the drawing.' : 'None.')),
    section('conclusion',
      ul('25.305 (b) with 25.303, 25.619 and 25.625: shear at the fillet, ultimate, ⟦C1 MS:corner-ultimate@K05⟧ in K05 and ⟦C1 MS:corner-ultimate@K07⟧ in K07. Met.',
        '25.305 (a): yield at the fillet in K07, ⟦C1 MS:corner-yield@K07⟧, and twist, ⟦C1 MS:twist@K07⟧. Met.',
        '25.613: A basis on a single load path, temperature included. Met.'),
      p('The bracket is adequate at drawing minimum dimensions, with little to spare at the fillet.')),
  ]
}
