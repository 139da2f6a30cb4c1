/** QSN-40-0012: a curved latch guide, returned because the torque of a pair was read as the torque of each. */
import { calc, notApplicable, ol, p, section, ul, type DemoSection } from '../build-document'
import { LATCH_CASES, type DemoCase } from '../load-cases'
import { QM_106 } from '../materials'
import { arcWall, openSection, torqueCases } from '../open-section-inputs'

// The fault of this note: half of the table's torque, as if a pair of guides always shared it.
const halved = (cases: DemoCase[]): DemoCase[] => cases.map(one => ({ ...one, value: String(Number(one.value) / 2), source: `${one.source}, halved` }))

const guide = () => openSection({
  units: 'SI', geometry: arcWall({ name: 'trough', radius: '62', sweep: '190', direction: '-85', t: '6.0', material: 'QM-106' }), junctions: [], material: QM_106,
  loading: torqueCases(halved(LATCH_CASES), 'N·m', '°C'), length: '240', twistAllowed: '1.2', twistOrigin: 'Drawing QL8-4120-07 note 4: play of the latch at its tip',
  partial: true, factorReason: 'QL8-SC-001 issue 1, paragraph 4: 1.5 on variable loads, 1.00 on yield; the ultimate strength is not used.',
})

export function latchGuide(): DemoSection[] {
  return [
    section('scope', p('Latch guide QL8-4120-07 of the lift platform, fitted in pairs. Not covered: the bolts of its feet (QSN-40-0013), fatigue (QSN-40-0010).')),
    section('references', ol('Drawing QL8-4120-07 issue B.', 'QL8-LDS-012 issue 1, Loader loads, table 4.', 'QM-MD-106 issue 2, material record QM-106.', 'QL8-SC-001 issue 1, Structural criteria of the loader.', 'Torsion methods reference, revision A, paragraphs 1.9 and 1.10.')),
    section('description', p('The guide is a trough rolled from plate, a little more than half a circle, open upwards. The latch runs in it and turns it about its own axis when it strikes the pallet stop. Its feet hold the rotation at one end; the other end is free.'), p('Axes: x and y in the section, z from the feet to the latch. Torque is positive right-handed about z.')),
    section('assumptions', ol('Linear elastic.', 'The two guides of a pair share the torque equally. Reason: they are alike.', 'Warping is free. Reason: common practice.', 'Nominal thickness.')),
    section('geometry', p('Mid-line radius 62 mm, swept angle 190°, plate 6.0 mm, length 240 mm from the feet to the latch.')),
    section('materials', p('QM-106 issue 2, structural steel S355J2, S basis. Shear yield is taken as the tension yield divided by the square root of three. Demonstration data.')),
    section('loads', p('Four cases at characteristic level. G02, latch against the pallet stop at speed, governs with ⟦C1 T@G02⟧ in each guide.')),
    section('section-analysis', calc('C1', 'Trough rolled from plate', guide()), p('The torsion constant is ⟦C1 J⟧; the inside face of the arc carries a little more than the outside.')),
    section('span-analysis', p('The torque is constant from the latch to the feet. G02 twists the guide by ⟦C1 twist_deg@G02⟧.')),
    section('stresses', p('G02 gives ⟦C1 tau_max@G02⟧.')),
    notApplicable('stability', 'The plate is thick for its curvature and the stress is shear.'),
    section('deflections', p('The latch may play by ⟦C1 twist_allowed⟧ (drawing note 4). G02 leaves a margin of ⟦C1 MS:twist@G02⟧.')),
    section('sensitivity', p('A thinner plate would twist more, by the cube of the thickness.')),
    section('open-points', p('None.')),
    section('conclusion', ul('Rotation of the latch: least margin ⟦C1 MS:twist@G02⟧ in G02. Met.'), p('The guide is adequate.')),
  ]
}
