/**
 * The fixed sections of a torsion substantiation note, in order. A generated
 * section is drawn from results, records and signatures and holds no text; any
 * other is written, or marked *not applicable* with the reason.
 * Source: methods reference §12.
 */
export interface TemplateSection {
  /** Stable in stored documents. */
  key: string
  /** As printed: `0` to `20`, then `A`. */
  number: string
  title: string
  generated: boolean
  /** Must be written or marked not applicable before the issue is submitted. */
  required: boolean
  /** What the section is for: one line under its title. */
  purpose: string
  /** Shown while the section is empty; never part of the document. Empty for a generated section. */
  guidance: string
}

const generated = (number: string, key: string, title: string, purpose: string): TemplateSection =>
  ({ key, number, title, generated: true, required: false, purpose, guidance: '' })

const written = (number: string, key: string, title: string, purpose: string, guidance: string): TemplateSection =>
  ({ key, number, title, generated: false, required: true, purpose, guidance })

export const TEMPLATE: readonly TemplateSection[] = [
  generated('0', 'cover', 'Cover and status', 'Number, issue, part, people with their dates, and the state of this issue.'),
  generated('1', 'revisions', 'Revision record', 'What changed since the last issue, why, and which margins moved by how much.'),
  generated('2', 'summary', 'Summary of results', 'The least margin of every failure mode with its case and place.'),
  written('3', 'scope', 'Scope and limits', 'Which parts are covered, and what is not.',
    'Name the part numbers, the serial range and the drawing issues this note covers. Then say what it leaves to other papers: fatigue, joints, dynamic behaviour.'),
  written('4', 'references', 'References', 'Every source used, with its issue or edition.',
    'List the drawings, the loads document, the material data, the certification basis and the books used, each with its issue or edition.'),
  written('5', 'description', 'Description', 'The structure and its load path in words.',
    'Describe the part, where the torque enters and where it leaves, and what it is joined to. Show the axes and the positive directions.'),
  written('6', 'assumptions', 'Assumptions', 'Numbered, each with its reason.',
    'Number the assumptions. For each give the reason, what happens to the margins if it is wrong, and where it is verified.'),
  written('7', 'geometry', 'Geometry', 'Dimensions used and the policy behind them.',
    'Say whether nominal or minimum thickness is used and why, where the dimensions were read, and how the stations along the part are named.'),
  written('8', 'materials', 'Materials and allowables', 'Records used, with basis, source and factors.',
    'For each material give the specification, form, basis and source, the temperature it is used at, and every factor put on its allowables.'),
  written('9', 'loads', 'Load cases', 'The torques, where they come from and at which level.',
    'Give the cases with their source pages and their level, limit or ultimate, the factors put on them, and which cases envelope which.'),
  generated('10', 'method', 'Method and its applicability', 'The method of each calculation, its guards and the answers given.'),
  written('11', 'section-analysis', 'Section analysis', 'Section properties and the stress they lead to.',
    'Put the section calculations here. State the torsion constant, the shear centre and where the stress peaks, by tied values.'),
  written('12', 'span-analysis', 'Span analysis', 'How the torque runs along the part and how far the part twists.',
    'Show the torque along the part, its reactions and the twist, and that applied and reacted torques sum to zero.'),
  written('13', 'stresses', 'Stresses', 'Stress per case, station and wall.',
    'Give the shear stresses of each case and wall, and how they combine with direct shear and normal stress where these are present.'),
  written('14', 'stability', 'Stability', 'Buckling of walls and panels.',
    'Show that the walls stay unbuckled at the level at which they must, or name the paper that shows it.'),
  generated('15', 'margins', 'Margins', 'Every margin per mode and case, the governing one marked.'),
  written('16', 'deflections', 'Deflections', 'Twist against what is allowed.',
    'Compare the twist with its limit and name where the limit comes from.'),
  generated('17', 'verification', 'Independent verification', 'Ticks of the checker and results by a second method.'),
  written('18', 'sensitivity', 'Sensitivity', 'What moves the least margin.',
    'Say how the least margin moves with minimum thickness, fillet radius, support stiffness and end fixity, on the unsafe side first.'),
  written('19', 'open-points', 'Open points and limitations', 'What is still to be done, by whom and when.',
    'List what is open, each point with an owner and a date. If nothing is open, say so.'),
  written('20', 'conclusion', 'Conclusion and statement of compliance', 'What has been shown, paragraph by paragraph.',
    'Go through the paragraphs of the certification basis and name the result that answers each. Close with adequate or not adequate, and for what.'),
  generated('A', 'appendices', 'Appendices', 'Working, inputs, the record of the check, and deviations.'),
]

const byKey = new Map(TEMPLATE.map(section => [section.key, section]))

/** The section of that key, or undefined for a key the template does not know. */
export const templateSection = (key: string): TemplateSection | undefined => byKey.get(key)
