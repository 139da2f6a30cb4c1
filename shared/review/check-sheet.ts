/**
 * The list the checker completes. Item numbers are those of the methods
 * reference (§12.2); an item is on the sheet where the note holds what it is
 * about. An item is settled by *ok*, or by *not applicable* with a reason; *not
 * ok* stands in the way until the issue is returned and mended.
 */
export type CheckVerdict = 'ok' | 'not ok' | 'not applicable'

/** What the note holds, as far as the sheet depends on it. */
export interface SheetFacts {
  /** Kinds of the calculations in the note. */
  kinds: readonly string[]
  /** Whether the note has an issue before this one. */
  laterIssue: boolean
}

export interface CheckItem { item: number, text: string }

type Applies = (facts: SheetFacts) => boolean
const always: Applies = () => true
const withKind = (...kinds: string[]): Applies => facts => facts.kinds.some(kind => kinds.includes(kind))
const SECTIONS = ['open-section', 'closed-section', 'solid-bar', 'general-outline', 'restrained-warping']
const section = withKind(...SECTIONS)
const thinWalls = withKind('open-section', 'closed-section', 'restrained-warping')

const ITEMS: readonly (CheckItem & { applies: Applies })[] = [
  { item: 1, applies: always, text: 'Drawing number and issue are those of the current configuration.' },
  { item: 2, applies: section, text: 'Thicknesses and radii, at the least, were read again from the drawing and not from the note.' },
  { item: 3, applies: thinWalls, text: 'Mid-line and outer dimensions are not mixed up.' },
  { item: 4, applies: section, text: 'The policy on minimum or nominal thickness is followed.' },
  { item: 5, applies: section, text: 'The section drawn to scale looks like the part.' },
  { item: 6, applies: section, text: 'Area and second moments were found again by another route.' },
  { item: 7, applies: section, text: 'Open or closed is judged rightly; seams and cut-outs are considered.' },
  { item: 8, applies: section, text: 'The torsion constant was found again by a second method, within the accepted difference.' },
  { item: 9, applies: section, text: 'The place of the largest shear makes physical sense.' },
  { item: 10, applies: section, text: 'Corner radii are modelled; a sharp corner is reported as unbounded and not as a number.' },
  { item: 11, applies: thinWalls, text: 'The shear centre was found again and the torque is taken about it.' },
  { item: 12, applies: withKind('open-section', 'restrained-warping'), text: 'End conditions agree with the hardware; where warping is held, its effect is evaluated.' },
  { item: 13, applies: withKind('restrained-warping'), text: 'Bimoment and warping stress are combined with the other stresses at the same point.' },
  { item: 14, applies: withKind('torque-along-a-bar', 'restrained-warping'), text: 'Applied and reacted torques sum to zero; each jump of the diagram equals its applied torque.' },
  { item: 15, applies: always, text: 'The sign convention is stated and used throughout.' },
  { item: 16, applies: withKind('torque-along-a-bar'), text: 'Where supports share the torque, their stiffness is bounded.' },
  { item: 17, applies: always, text: 'Each load is traced to document, issue, page and level, limit or ultimate.' },
  { item: 18, applies: always, text: 'The factor of safety is applied once; the special factor is the highest that pertains, on fitting, attachment and bearing.' },
  { item: 19, applies: always, text: 'All load cases are run, reversals included; the governing case is found per mode.' },
  { item: 20, applies: always, text: 'Allowables agree with the source page in value, basis, form, thickness range, direction and temperature.' },
  { item: 21, applies: always, text: 'The basis of the allowables suits the load path.' },
  { item: 22, applies: always, text: 'The origin of the shear yield strength is stated.' },
  { item: 23, applies: withKind('combined-stress'), text: 'The interaction equation suits the loading; the reserve factor is solved as a multiplier of the load.' },
  { item: 24, applies: withKind('wall-stability'), text: 'Panel fixity, buckling coefficient and the level at which buckling is allowed are justified.' },
  { item: 25, applies: section, text: 'The guards for large twist, total twist and yield are judged at the right level.' },
  { item: 26, applies: always, text: 'Each guard is answered with a reason that is true for this part.' },
  { item: 27, applies: always, text: 'Units: one number of each sort was found by hand from the typed inputs.' },
  { item: 28, applies: always, text: 'Margins are truncated and signed rightly; pass or fail is judged at full precision.' },
  { item: 29, applies: always, text: 'The limit on deflection and its source are given.' },
  { item: 30, applies: withKind('general-outline'), text: 'The convergence record of the numerical solution is present and acceptable.' },
  { item: 31, applies: always, text: 'One way from load through stress to margin was followed by hand or by a separate calculation, which is attached.' },
  { item: 32, applies: always, text: 'Text, tables and figures agree with the calculations; no result is typed over.' },
  { item: 33, applies: section, text: 'Sensitivities on the unsafe side were looked at.' },
  { item: 34, applies: facts => facts.laterIssue, text: 'What changed since the last issue is what the revision record says, and nothing else changed.' },
  { item: 35, applies: always, text: 'I am not an author of this note and did not supply the numbers I check.' },
]

/** The items on the sheet of a note, in order. */
export const checkItems = (facts: SheetFacts): CheckItem[] =>
  ITEMS.filter(item => item.applies(facts)).map(({ item, text }) => ({ item, text }))

/** An item as it was filled in, with the hash of the content it was filled in at. */
export interface FilledItem { item: number, verdict: CheckVerdict, evidence: string, hash: string }
export interface SheetLine extends CheckItem { verdict: CheckVerdict | null, evidence: string, lapsed: boolean }

/** The sheet as it stands: an entry lapses when anything of the content has changed since. */
export function sheetLines(facts: SheetFacts, filled: readonly FilledItem[], contentHash: string): SheetLine[] {
  return checkItems(facts).map((item) => {
    const entry = filled.find(one => one.item === item.item)
    return { ...item, verdict: entry?.verdict ?? null, evidence: entry?.evidence ?? '', lapsed: entry !== undefined && entry.hash !== contentHash }
  })
}

/** Why a verdict cannot be written down as it is, or null. *Not ok* and *not applicable* both need their words. */
export function verdictFault(verdict: CheckVerdict, evidence: string): string | null {
  if (evidence.trim() !== '' || verdict === 'ok') return null
  return verdict === 'not applicable' ? 'Say why this does not apply to this note.' : 'Say what is not ok, so that the analyst can mend it.'
}
