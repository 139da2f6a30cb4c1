/** QSN-40-0009: a guide rail in check, with a typed value that the calculation contradicts. */
import { calc, ol, p, section, table, ul, type DemoSection } from '../build-document'
import { RAIL_CASES } from '../load-cases'
import { QM_106 } from '../materials'
import { openSection, polyline, torqueCases } from '../open-section-inputs'

const rail = () => openSection({
  units: 'SI',
  geometry: polyline({
    corners: [['60', '-70'], ['0', '-70'], ['0', '70'], ['60', '70']], names: ['lower flange', 'web', 'upper flange'], t: ['6.0', '5.0', '6.0'], material: 'QM-106', unit: 'mm',
  }),
  junctions: [], material: QM_106,
  loading: torqueCases(RAIL_CASES, 'N·m', '°C'), length: '900', twistAllowed: '2.4', twistOrigin: 'QL8-SC-001 issue 1, paragraph 7: rotation that the rollers tolerate',
  partial: true, factorReason: 'QL8-SC-001 issue 1, paragraph 4: 1.5 on variable loads, 1.00 on yield; the ultimate strength is not used.',
})

/** The note as it was submitted for check. */
export function channelRail(): DemoSection[] {
  return [
    section('scope',
      p('Side guide rail QL8-3310-02 of the lift platform, both sides. Not covered: the cleats and their bolts (QSN-40-0011), fatigue (QSN-40-0010), and vertical bending, which the platform deck carries.')),
    section('references', ol(
      'Drawing QL8-3310-02 issue C.', 'QL8-LDS-012 issue 1, Loader loads, table 2.', 'QM-MD-106 issue 2, material record QM-106.',
      'QL8-SC-001 issue 1, Structural criteria of the loader.', 'EN 1993-1-1, Design of steel structures; EN 1915-2, Ground support equipment, stability and strength.',
      'Torsion methods reference, revision A, paragraphs 1.9, 3.1 and 7.8.')),
    section('description',
      p('The rail is a pressed channel that stands on its web beside the platform. A pair of rollers, one above and one below, passes a couple to it while the platform tilts. The pair gives no net force, so there is torque but no bending. Each end stands in a slotted cleat, which holds the rotation by the web and leaves the flanges free to move along the rail.'),
      p('Axes: x from the web towards the flange tips, y up, z along the rail. Torque and twist are positive right-handed about z.')),
    section('assumptions', ol(
      'Linear elastic.',
      'The cleats hold rotation and let the section warp. Reason: the slots grip the web only. If the flanges jammed, the twist would fall: safe side for the rollers.',
      'The contour keeps its shape. Reason: the rollers bear at the corners of the web.',
      'The rollers stand at mid-span, where the twist is largest for a given couple; half of the couple goes to either cleat.',
      'Corners are taken to the intersection of the mid-lines.',
      'Nominal thickness; the tolerances of the plate are covered by the criteria.')),
    section('geometry',
      p('Flanges 60 mm by 6.0 mm and web 140 mm by 5.0 mm, mid-line. The rail is 1800 mm long between cleats, so each half is 900 mm.'),
      table(['Wall', 'What it is', 'Free edge'], ['a', 'lower flange', 'at node 1'], ['b', 'web', 'none'], ['c', 'upper flange', 'at node 4'])),
    section('materials',
      p('QM-106 issue 2, structural steel S355J2, S basis, accepted by paragraph 3 of the criteria. Tension yield ⟦C1 Fty:QM-106⟧, shear modulus ⟦C1 G:QM-106⟧. No shear ultimate is published and none is used; shear yield is taken as the tension yield divided by the square root of three. Demonstration data.')),
    section('loads',
      p('Eight cases at characteristic level, each as the torque carried to the nearer cleat. R06, emergency stop with the pallet off centre, has the largest. R07 and R08 are wind and turn the other way.')),
    section('section-analysis',
      calc('C1', 'Channel rail, corners to the intersection', rail()),
      p('The torsion constant is ⟦C1 J⟧. The shear centre lies at x = ⟦C1 x_S⟧, on the far side of the web, and the warping constant is ⟦C1 Gamma⟧.')),
    section('span-analysis',
      p('In R06 each cleat reacts ⟦C1 T@R06⟧; the two reactions together are the couple of the rollers. The rate of twist is ⟦C1 theta@R06⟧ and the twist at the rollers 2.12°.')),
    section('stresses', p('R06 gives ⟦C1 tau_max@R06⟧ in the flanges; the web has less, because it is thinner. With the factor on variable loads the stress stays far below yield in shear.')),
    section('stability', p('The flanges are exactly ten thicknesses wide and belong to class 3 of EN 1993-1-1. Elastic stresses are used, so no separate check is needed.')),
    section('deflections',
      p('The rollers tolerate ⟦C1 twist_allowed⟧ (QL8-SC-001 paragraph 7). R06 twists the rail by ⟦C1 twist_deg@R06⟧, a margin of ⟦C1 MS:twist@R06⟧. R05 follows with ⟦C1 MS:twist@R05⟧.')),
    section('sensitivity',
      p('The twist goes with the inverse cube of the thickness. The flanges carry most of the torque; their share is ⟦C1 share:a⟧ each.')),
    section('open-points', p('None.')),
    section('conclusion',
      ul('QL8-SC-001 paragraph 7: rotation at the rollers, least margin ⟦C1 MS:twist@R06⟧ in R06. Met.', 'EN 1993-1-1: shear stress elastic in all cases. Met.'),
      p('The rail is adequate with the loads of issue 1.')),
  ]
}
