/** QSN-40-0012: a latch shaft as it was submitted and returned, with half its torque. */
import { calc, notApplicable, ol, p, section, type DemoSection } from '../../build-document'
import { QM_105 } from '../../materials'
import { cases, seat, shaft, spline } from './calculations'

/** `drawing` is the issue named in the references; the geometry stayed that of issue A. */
export const latchShaft = (drawing: 'A' | 'B'): DemoSection[] => [
  section('scope',
    p('Latch shaft QL8-4120-05 with its two levers. Not covered: lever arms (QSN-40-0013), bearing pressure on the flat, fatigue (QSN-40-0010).')),
  section('references', ol(
    `Drawing QL8-4120-05 issue ${drawing}.`,
    'QL8-LDS-012 issue 1, table 4.',
    'QM-MD-105 issue 1.',
    'QL8-SC-001 issue 1.',
    'Torsion methods reference, revision A, paragraphs 1.1, 1.7, 4, 5.2, 7.')),
  section('description',
    p('A short solid shaft turns the pallet latch. A handle drives it through an eight-tooth spline; beyond the spline two levers sit side by side on a common D seat, each clamped with one bolt. Torque is positive right-handed about z, which points from the handle to the levers.')),
  section('assumptions', ol(
    'Linear elastic.',
    'The two levers share the torque equally. Reason: they are alike.',
    'The splined length is as strong as the circle of its roots. Reason: common practice.',
    'Radius 9.0 mm, flat 1.8 mm deep.')),
  section('geometry',
    p('D seat: radius 9.0 mm, depth of the flat 1.8 mm, 46 mm long. Spline: eight teeth 3.5 mm wide, tip radius 8.85 mm at mid-tooth, root circle 7.7 mm, root fillet 0.6 mm, 88 mm long.')),
  section('materials',
    p('QM-105 issue 1, 17-4PH H1025 bar, A basis: F_su ⟦QM-105 Fsu⟧, F_ty ⟦QM-105 Fty⟧, G ⟦QM-105 G⟧; F_sy = F_ty/√3. Demonstration data.'),
    calc('QM-105', 'material', '17-4PH H1025 bar', QM_105)),
  section('loads',
    p('Four cases. L02, latch against the pallet stop at 0.5 m/s: ⟦LATCH T@L02⟧ on the whole shaft, of which half, ⟦LATCH half@L02⟧, is taken by each lever.'),
    calc('LATCH', 'load-cases', 'Torque of the shaft, L01 to L04, and per lever', cases)),
  section('section-analysis',
    calc('seat', 'solid-bar', 'D-shaft seat of the lever', seat),
    calc('spline', 'solid-bar', 'Splined length, circle of the roots', spline),
    p('D seat J = ⟦seat J⟧, the stress peaks in the middle of the flat; root circle J = ⟦spline J⟧.')),
  section('span-analysis',
    calc('shaft', 'torque-along-bar', 'Twist of the shaft', shaft),
    p('Constant torque; twist of L02 ⟦shaft twist_max@L02⟧.')),
  section('stresses',
    p('L02: D seat ⟦seat tau_max@L02⟧, spline ⟦spline tau_max@L02⟧.'),
    p('L02 leaves ⟦seat MS:shear-ultimate⟧ at the seat at ultimate, ⟦seat MS:shear-yield⟧ at yield, and ⟦spline MS:shear-ultimate⟧ in the splined length at ultimate.'),
    calc('margins', 'margin-table', 'All margins of the note', { rows: 'least of each mode' })),
  notApplicable('stability', 'The shaft is solid.'),
  notApplicable('deflections', 'The latch has no twist limit.'),
  section('sensitivity', p('The margins are large; no dimension was varied.')),
  section('open-points', p('None.')),
  section('conclusion', p('With a least margin of ⟦margins MS⟧ the shaft meets QL8-SC-001 with the loads of issue 1.')),
]
