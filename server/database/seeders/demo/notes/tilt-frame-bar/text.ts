/** QSN-40-0015: a cross bar, two saves old. */
import { calc, ol, p, section, type DemoSection } from '../../build-document'
import { QM_108 } from '../../materials'
import { flatBar } from './calculations'

export const tiltFrameBar = (): DemoSection[] => [
  section('scope', p('Cross bar of the tilt frame, QL8-3340-01. What is not covered: to be written.')),
  section('references', ol('Drawing QL8-3340-01, preliminary.', 'QL8-SC-001 issue 1.', 'QM-MD-108 issue 1.')),
  section('assumptions', ol('Homogeneous, isotropic, linear elastic (from the standard list, reason to be written).')),
  section('materials', p('QM-108 issue 1, C45 cold drawn, S basis; G ⟦QM-108 G⟧.'), calc('QM-108', 'material', 'C45 cold drawn', QM_108)),
  section('section-analysis',
    calc('flat', 'solid-bar', 'Trial: flat bar 64 × 28', flatBar),
    p('First trial carried over from a quick calculation: J = ⟦flat J⟧, largest shear ⟦flat tau_max@T⟧ in the middle of the long side, twist ⟦flat twist_deg@T⟧. The torque is a guess until the loads are pinned.')),
]
