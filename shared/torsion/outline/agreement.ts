/** Whether the closed or thin-walled method and the two-dimensional one agree as they should (§4.5, G-32). */
import { agreementLimits, agreementOfGamma, mostChi, stopFactor } from '#shared/torsion/outline/published'

/** What the first method was. */
export type FirstMethod
  = | { readonly kind: 'exact shape' }
    | { readonly kind: 'open, corrected' }
    | { readonly kind: 'open, mid-line only' }
    | { readonly kind: 'closed', /** Largest face factor χ of the walls that matter. */ readonly chi: number }

/** `tau`: on the flats, or mid-wall of a closed section. */
export type ComparedQuantity = 'J' | 'tau' | 'tau in a fillet' | 'gamma'

export interface Agreement {
  /** First over second, less one. */
  readonly difference: number
  /** Expected at most; null where no expectation is published. */
  readonly expected: number | null
  readonly verdict: 'inside' | 'caution' | 'stop'
  readonly message: string
}

function expectedFor(method: FirstMethod, quantity: ComparedQuantity): number | null {
  if (quantity === 'gamma') return agreementOfGamma
  if (method.kind === 'closed' && !(method.chi <= mostChi)) return null
  const limits: Partial<Record<ComparedQuantity, number>> = agreementLimits[method.kind]
  return limits[quantity] ?? null
}

const names: Record<ComparedQuantity, string> = { 'J': 'the torsion constant', 'tau': 'the peak shear', 'tau in a fillet': 'the shear in the fillet', 'gamma': 'the warping constant' }
const percent = (part: number): string => `${Number((100 * part).toPrecision(2))} %`

/**
 * Judges a value of the first method against that of the second. Both must be
 * finite and the second not zero; anything else is a caution that says so.
 */
export function judgeAgreement(method: FirstMethod, quantity: ComparedQuantity, first: number, second: number): Agreement {
  const difference = first / second - 1
  const expected = expectedFor(method, quantity)
  const name = names[quantity]
  if (!Number.isFinite(difference)) return { difference: 0, expected, verdict: 'caution', message: `The two methods cannot be compared in ${name}; both must give a value.` }
  const seen = `The first method gives ${name} ${percent(Math.abs(difference))} ${difference < 0 ? 'below' : 'above'} the two-dimensional solution`
  if (expected === null) {
    const why = method.kind === 'closed' ? `for a face factor above ${mostChi}` : `for ${name} by this method`
    return { difference, expected, verdict: 'caution', message: `${seen}; no expected difference is known ${why}. Say why the difference is as it should be.` }
  }
  const off = Math.abs(difference)
  const verdict = off <= expected ? 'inside' : off <= stopFactor * expected ? 'caution' : 'stop'
  const asked = { inside: `; at most ${percent(expected)} is expected.`, caution: `, more than the ${percent(expected)} expected. Explain the difference.`, stop: `, more than ${stopFactor} times the ${percent(expected)} expected. One of the two is not the section; correct it.` }
  return { difference, expected, verdict, message: seen + asked[verdict] }
}
