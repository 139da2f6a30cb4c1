/**
 * The guards of all calculation kinds as data: what they are called, what the author must write, where they come from.
 * G-06 (crossing walls, zero length) and a G-01 input without which nothing can be computed are faults of the inputs.
 * Conditions and numbers are judged in guards-*.ts. Severity is that of the ordinary case; a judgement may raise it.
 */
import type { Guard, Severity } from '#shared/calc/types'

export interface GuardEntry { title: string, severity: Severity, deviable: boolean, ask: string, source: string }

const practice = 'common practice'
const entry = (title: string, severity: Severity, ask: string, source: string, deviable = false): GuardEntry => ({ title, severity, deviable, ask, source })

export const GUARDS = {
  'G-01': entry('Input not above zero', 'stop', 'Correct the input.', practice),
  'G-02': entry('Wall slenderness', 'caution', 'Write why thin-wall theory serves here, or name the end correction or second method that covers it.', `${practice}; §1.9`),
  'G-03': entry('Very stocky wall', 'stop', 'Give the result of a second method for this section.', `${practice}; §1.9`, true),
  'G-04': entry('Thickness of a closed wall', 'caution', 'Compare with the general outline, or write why the stress at the face, which is applied, suffices.', '§2.1'),
  'G-05': entry('Very thick closed wall', 'stop', 'Give the result of the general outline for this section.', '§2.1', true),
  'G-07': entry('Walls close a loop', 'stop', 'Confirm the seam: end the wall at a node of its own where the section is open, or treat it as a closed section.', 'geometry'),
  'G-08': entry('Tightly curved wall', 'caution', 'Give the result of a second method, or write why the radius does not matter.', practice),
  'G-09': entry('Inner corner radius', 'caution', 'State the radius on the drawing and the factor used.', '§1.10'),
  'G-10': entry('Sharp re-entrant corner', 'stop', 'Give the actual radius; or justify local yielding of a ductile material under static load, never for fatigue.', 'linear elasticity; §4.4', true),
  'G-11': entry('Junctions and ends in J', 'caution', 'State which corrections were applied and why they hold.', '§1.10'),
  'G-12': entry('Joint in a closed section', 'caution', 'Show that the fasteners or spots carry the shear flow, and state the thickness that counts between them.', practice),
  'G-13': entry('Wall buckles in shear', 'stop', 'Name the fixity and the source of the coefficient; beyond buckling, refer to an analysis of diagonal tension.', 'NACA TN 3781, TN 2661; §2.5', true),
  'G-14': entry('Edges better than simply supported', 'caution', 'Give the evidence that the edges are held.', practice),
  'G-15': entry('Shape of the cells', 'caution', 'Write how the contour of the cells is held.', practice),
  'G-16': entry('Ends not free to warp', 'stop', 'Give the warping solution of this bar, or show that the ends are free to warp.', 'Vlasov; §3', true),
  'G-17': entry('Restrained end of a long bar', 'information', 'The warping stress at the restrained end is to be reported.', '§3.6'),
  'G-18': entry('Free warping at a support', 'caution', 'Write why warping is free although the support holds the section.', practice),
  'G-19': entry('Step in a warping bar', 'caution', 'Bound the result: run it with the warping continuous and with it free at the step.', '§3.5'),
  'G-20': entry('Closed section held at high stress', 'caution', 'Address the axial stress at the root of the closed section.', '§3.8'),
  'G-21': entry('Torque shared by supports', 'caution', 'State the stiffness of each support, its bounds, and that no clearance delays one of them.', '§5.2'),
  'G-22': entry('Load not referred to the shear centre', 'stop', 'Take the torque about the shear centre.', '§5.3'),
  'G-23': entry('Material without basis or source', 'stop', 'Refer to controlled data: specification, basis, source and edition.', '25.613'),
  'G-24': entry('B basis on a single load path', 'stop', 'Use A-basis values, or show that the load path is redundant.', '25.613'),
  'G-25': entry('S basis used', 'caution', 'Name the acceptance of specification minima by the project.', 'practice of material data handbooks'),
  'G-26': entry('Yield exceeded at limit', 'stop', 'The linear stress is not a stress beyond yield; change the part or deviate.', '25.305', true),
  'G-27': entry('Repeated load or notch', 'caution', 'Name where fatigue and damage tolerance are treated.', `25.571; ${practice}; §7.6`),
  'G-28': entry('Large rate of twist', 'caution', 'Give the nonlinear torque and the longitudinal stress.', '§7.7'),
  'G-29': entry('Large total twist', 'caution', 'Write why the direction of the load still holds.', practice),
  'G-30': entry('Temperature outside the data', 'stop', 'Give the factor at this temperature and its source.', '25.613(c)'),
  'G-31': entry('Elastic constants disagree', 'information', 'Give the source of each constant.', 'isotropy'),
  'G-32': entry('Two methods compared', 'caution', 'Explain the difference between the two methods.', '§4.5'),
  'G-33': entry('Numerical convergence', 'caution', 'Give the outline its real detail, or the reason why the uncertainty suffices.', '§4.2'),
  'G-34': entry('Small or negative margin', 'caution', 'Write what makes the data good enough for so small a margin.', practice),
  'G-35': entry('Factors below the usual', 'stop', 'Quote the paragraph of the certification basis that allows it.', '25.303; 25.625', true),
  'G-36': entry('Two special factors', 'caution', 'State which is the highest pertinent one; they are not multiplied.', '25.619'),
  'G-37': entry('Outside the theory', 'stop', 'This method does not cover it: use another.', 'theory'),
  'G-38': entry('Taper', 'caution', 'Give a local solution, or write why the taper does not matter.', practice),
  'G-39': entry('Short bar', 'caution', 'Write why the ends of so short a bar do not matter.', 'Saint-Venant'),
  'G-40': entry('Cut-out in the length', 'caution', 'Give a local factor with its source.', practice),
  'G-41': entry('Torque with axial compression', 'caution', 'Give the result with the stiffness reduced by the compression.', '§7.7'),
  'G-42': entry('Stiffness of the part that follows', 'caution', 'Solve part and structure together, or show that the structure’s twist was found with the part.', '§6'),
  'G-43': entry('Range of the cylinder formula', 'caution', 'State the formula used and its source.', 'NASA SP-8007, from memory; §2.6'),
  'G-44': entry('Unusual size', 'information', 'Confirm the number and its unit.', practice),
} satisfies Record<string, GuardEntry>

export type GuardId = keyof typeof GUARDS

export interface Finding {
  /** What sets this finding apart from others of the same guard, e.g. a wall or a mode. */
  of?: string
  message: string
  values: Record<string, number>
  wall?: string
  caseId?: string
  severity?: Severity
  deviable?: boolean
  title?: string
  ask?: string
}

/** A guard that fired, with its data filled in. */
export function fired(id: GuardId, finding: Finding): Guard {
  const data = GUARDS[id]
  return {
    id, key: finding.of === undefined ? id : `${id}:${finding.of}`,
    severity: finding.severity ?? data.severity,
    deviable: finding.deviable ?? data.deviable,
    title: finding.title ?? data.title, message: finding.message, ask: finding.ask ?? data.ask, values: finding.values,
    ...(finding.wall === undefined ? {} : { wall: finding.wall }),
    ...(finding.caseId === undefined ? {} : { caseId: finding.caseId }),
    source: data.source,
  }
}
