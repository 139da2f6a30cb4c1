/** From the dimensions of a profile to lengths on the mid-line. */
import type { ProfileModel } from '#shared/calc/parts/parse-profile'
import { line, num, qty, res } from '#shared/calc/parts/tex'
import type { WorkingLine, WorkingStep } from '#shared/calc/types'
import type { ConversionLine, ConversionTerm } from '#shared/torsion/profiles/profile'

/** A length that is measured on the mid-line needs no line; bends have a step of their own. */
const shown = ({ symbol, terms: [first, ...rest] }: ConversionLine) => symbol !== 'L' && (rest.length > 0 || (first !== undefined && first.factor !== 1))

export function profileSteps(profile: ProfileModel | null): WorkingStep[] {
  const lines = (profile?.lines ?? []).filter(shown)
  return lines.length === 0 ? [] : [{ heading: `From the ${profile?.measured ?? ''} dimensions to the mid-line`, method: '§1.9', lines: lines.map(conversionLine) }]
}

const conversionLine = ({ symbol, terms, value }: ConversionLine): WorkingLine =>
  line(`${symbol} = ${sum(terms, term => term.symbol)}`, sum(terms, term => qty(term.value, 'mm')), res(value, 'mm'))

/** `h - \tfrac12 t_l - \tfrac12 t_u` */
function sum(terms: readonly ConversionTerm[], text: (term: ConversionTerm) => string): string {
  return terms.map((term, i) => `${term.factor < 0 ? '- ' : i > 0 ? '+ ' : ''}${factorText(Math.abs(term.factor))}${text(term)}`).join(' ')
}

const factorText = (factor: number): string => (factor === 1 ? '' : factor === 0.5 ? '\\tfrac12\\,' : `${num(factor)}\\,`)
