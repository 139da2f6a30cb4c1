/** QSN-19-0044: the torque tube of the flap drive. Released, and behind on its material since. */
import { calc, ol, p, section, type DemoSection } from '../../build-document'
import { QM_104 } from '../../materials'
import { cases, drive, inboard, outboard } from './calculations'

/** As first submitted, or with the paragraph that the checker asked for. */
export const torqueTube = (step: 'returned' | 'passed'): DemoSection[] => [
  section('scope',
    p('Flap drive torque tube QW19-2741-03, left and right. Not covered: the bolts and the serrations of the horn sleeve (QSN-19-0045), fatigue (QSN-19-0062), bending between bearings (QSN-19-0046).')),
  section('references', ol(
    'Drawing QW19-2741-03 issue B.',
    'QW19-LDS-020 issue 3, Flap system loads, group TUBE.',
    'QW19-FEM-061 issue 4, table 9, rib shares.',
    'QM-MD-104 issue 2, material record QM-104.',
    'QW19-SYS-027 issue 1, Flap drive, rigging and position sensing.',
    'QW19-SC-002 issue 2, Structural design criteria.',
    'Torsion methods reference, revision A, paragraphs 1.1, 5.1, 7.1, 7.8.',
    '14 CFR and CS 25.303, 25.305, 25.613, 25.619, 25.625.')),
  section('description',
    p('The tube carries the torque of the flap motor from the horn at z = 0 outboard to three drive ribs. It is drawn from one seamless tube: 38 mm outside diameter with a wall of 1.65 mm as far as z = 370 mm, then 35 mm with 1.25 mm. The change of diameter is a taper 25 mm long. The inner end is clamped in a serrated sleeve, which is a fitting; the outer end is free. Bearings at the ribs carry side load only. Torque and twist are positive right-handed about z, which points outboard.')),
  section('assumptions', ol(
    'Linear elastic, isotropic tube.',
    'The rib shares do not change with the case. Reason: the shares were measured on the flap rig (QWT-063) at three settings. If wrong by a tenth at rib 1, the torque in segment 2 rises by five per cent and its margin stays above that of the joint.',
    'The horn is rigid. Deflection of the horn is budgeted separately in reference 5. Unsafe side for twist if forgotten; safe for stress.',
    'The taper is gentle (radius changes by 0.06 per unit length), so each station is treated with its own section.',
    'Nominal diameters and wall; the drawing allows the wall to be under size by 0.03 mm, worth two per cent, which QW19-SC-002 para 4.2 permits to be ignored.',
    'Dynamic amplification of the jam case is contained in the measured stall torque.')),
  section('geometry',
    p('Stations: horn 0, rib one 220 mm, step 370 mm, rib two 450 mm, rib three 700 mm. The wall is 8.7 per cent of the radius in segment 1 and 7.1 per cent in segment 2, so both are above the 5 per cent at which buckling would have to be considered.')),
  section('materials',
    p('QM-104 issue 2, 4130 normalised seamless tube, A basis, single load path: F_su ⟦QM-104 Fsu⟧, F_ty ⟦QM-104 Fty⟧, G ⟦QM-104 G⟧; F_sy = F_ty/√3. Strength falls linearly to 0.98 at 90 °C. Demonstration data.'),
    calc('QM-104', 'material', '4130 normalised tube', QM_104)),
  section('loads',
    p('Sixteen cases, all at limit level. T08, landing flap 40 with gust up, ⟦TUBE T@T08⟧ at room temperature; T09, the same after a hot soak, ⟦TUBE T@T09⟧ at 85 °C. Negative cases are gusts down and ground gusts; the section is symmetric, so only the magnitude matters for stress.'),
    p('The ribs take shares of the torque of the drive that were measured on the flap rig: 0.35, 0.40 and 0.25 from inboard to outboard (reference 3). The table gives their torques, and what passes rib one.'),
    calc('TUBE', 'load-cases', 'Drive and rib torques, T01 to T16', cases)),
  section('section-analysis',
    calc('inboard', 'solid-bar', 'Circular tube, segment 1', inboard),
    calc('outboard', 'solid-bar', 'Circular tube, segment 2', outboard),
    p('J is ⟦inboard J⟧ in segment 1 and ⟦outboard J⟧ in segment 2.')),
  section('span-analysis',
    calc('drive', 'torque-along-bar', 'Built in at the horn, three ribs', drive),
    p('In case T08 the torque is ⟦drive T:a@T08⟧ to rib one, ⟦drive T:b@T08⟧ to rib two and ⟦drive T:d@T08⟧ to rib three; the horn reacts ⟦drive R:0@T08⟧, which closes the diagram.')),
  section('stresses',
    p('Case T09: ⟦inboard tau_max@T09⟧ in segment 1 at the horn and ⟦outboard tau_max@T09⟧ in segment 2 between the step and rib two. Case T08: ⟦inboard tau_max@T08⟧ and ⟦outboard tau_max@T08⟧.'),
    step === 'returned'
      ? p('At the horn the factor of 25.625 applies, being the highest pertinent special factor; it multiplies the 1.5 at ultimate and also the limit level. T08 gives ⟦drive MS:shear-ultimate@T08⟧ and T09 ⟦drive MS:shear-ultimate⟧.')
      : p('At the horn the factor of 25.625 applies, being the highest pertinent special factor; it multiplies the 1.5 at ultimate and, by QW19-SC-002 para 5.3, also the limit level. T08 gives ⟦drive MS:shear-ultimate@T08⟧ and T09 ⟦drive MS:shear-ultimate⟧.'),
    calc('margins', 'margin-table', 'All margins of the note', { rows: 'least of each mode' })),
  section('stability',
    p('Not governing; see section 7.')),
  section('deflections',
    p('The sensor of the flap position tolerates ⟦drive twist_allowed⟧ of wind-up between horn and outer rib (reference 5, para 6.2). Case T08 gives ⟦drive twist_max@T08|rad⟧, which is ⟦drive twist_max@T08⟧, a margin of ⟦drive MS:twist⟧ at limit load.')),
  section('sensitivity',
    p('The least margin is proportional to F_su: a fall of F_su of 6.8 per cent uses it up. This is the number to watch when the material record changes.')),
  section('open-points',
    p('None at release.')),
  section('conclusion',
    p('With a least margin of ⟦margins MS⟧ the tube meets CS 25.305 and 25.625 and the wind-up limit of the flap drive.')),
]
