/** Guards on single inputs: refused values and suspicious sizes. */
import type { Guard } from '#shared/calc/types'
import { fired } from '#shared/calc/guards/catalogue'
import type { Refused, Unusual } from '#shared/calc/parts/model'
import { capital, figure } from '#shared/calc/parts/say'

/** An input left out because it is not above zero (G-01). */
export function refusedGuards(refused: readonly Refused[]): Guard[] {
  return refused.map(r => fired('G-01', {
    of: r.path, values: { value: r.value },
    message: `${capital(r.label)} is “${r.typed}” and must be above zero; it was left out and nothing that needs it is given.`,
  }))
}

/** One per field; the load cases share one, which names the most unusual and how many others there are. */
export function unusualGuards(unusual: readonly Unusual[]): Guard[] {
  const fields = new Map<string, Unusual[]>()
  for (const u of unusual) {
    const field = u.path.replace(/cases\.\d+\./, '')
    fields.set(field, [...fields.get(field) ?? [], u])
  }
  return [...fields].flatMap(([field, found]) => {
    const [worst] = [...found].sort((a, b) => strangeness(b) - strangeness(a))
    if (!worst) return []
    const more = found.length === 1 ? '' : ` ${found.length - 1} more ${found.length === 2 ? 'case is' : 'cases are'} as unusual.`
    return [fired('G-44', {
      of: field, values: { value: worst.value },
      message: `${capital(worst.label)} is ${figure(Math.abs(worst.value) / worst.typical)} times what is usual for its kind; the unit “${worst.unit}” may be wrong.${more}`,
    })]
  })
}

/** How far from the usual size, up or down alike. */
const strangeness = (u: Unusual) => Math.abs(Math.log(Math.abs(u.value) / u.typical))
