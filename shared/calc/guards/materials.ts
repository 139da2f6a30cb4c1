/** Guards on material records: basis, source, strengths, temperature, elastic constants. */
import type { Guard } from '#shared/calc/types'
import { fired } from '#shared/calc/guards/catalogue'
import type { CaseHead, MaterialModel } from '#shared/calc/parts/model'
import { figure } from '#shared/calc/parts/say'

const HOT_ALUMINIUM = 70

/** What is judged: the materials in use, the temperatures of the cases, and whether the basis works with partial factors. */
export interface MaterialUse {
  materials: readonly MaterialModel[]
  cases: readonly CaseHead[]
  partial: boolean
  /** Strengths that the margins of this calculation need: shear, unless said otherwise. */
  needs?: readonly ('Fsu' | 'Fsy' | 'Ftu' | 'Fty')[]
}

export function materialGuards(use: MaterialUse): Guard[] {
  return use.materials.flatMap(m => [...record(use, m), ...constants(m), ...temperatures(use, m)])
}

function record(use: MaterialUse, m: MaterialModel): Guard[] {
  const guards: Guard[] = []
  const missing = [
    ...(m.basis === 'none' ? ['a basis'] : []),
    ...(m.specification.trim() === '' ? ['a specification'] : []),
    ...(m.source.trim() === '' ? ['a source'] : []),
    ...(m.edition.trim() === '' ? ['an edition'] : []),
  ]
  if (missing.length > 0) guards.push(fired('G-23', { of: m.id, values: { missing: missing.length }, message: `Material ${m.id} has no ${missing.map(w => w.replace(/^an? /, '')).join(', no ')}.` }))
  const strengths = missingStrengths(use, m)
  if (strengths.length > 0) {
    guards.push(fired('G-23', {
      of: `strength:${m.id}`, title: 'Strength missing', values: { missing: strengths.length },
      message: `Material ${m.id} has no ${strengths.join(' and no ')}; the margins that need it are not given.`,
      ask: 'Give the strength with its source.',
    }))
  }
  if (m.basis === 'B' && m.loadPath === 'single') guards.push(fired('G-24', { of: m.id, values: { declared: 1 }, message: `Material ${m.id} has B-basis values and the load path is declared single.` }))
  if (m.basis === 'S') guards.push(fired('G-25', { of: m.id, values: { declared: 1 }, message: `Material ${m.id} has S-basis values: specification minima whose statistical assurance is unknown.` }))
  return guards
}

const STRENGTHS = { Fsu: 'ultimate shear strength', Fsy: 'yield strength', Ftu: 'ultimate tension strength', Fty: 'yield strength in tension' } as const

/** With partial factors the basis may be checked on yield alone. */
function missingStrengths({ partial, needs = ['Fsu', 'Fsy'] }: MaterialUse, m: MaterialModel): string[] {
  return needs.filter(name => m[name] === null && !(partial && (name === 'Fsu' || name === 'Ftu'))).map(name => STRENGTHS[name])
}

function constants(m: MaterialModel): Guard[] {
  if (m.E === null || m.nu === null) return []
  const apart = Math.abs(m.G - m.E / (2 * (1 + m.nu))) / m.G
  if (apart <= 0.03) return []
  return [fired('G-31', {
    of: m.id, severity: apart > 0.08 ? 'caution' : 'information', values: { apart },
    message: `G of material ${m.id} is ${figure(apart * 100)} % away from E / 2(1 + ν); ${apart > 0.08 ? '8' : '3'} % is the limit.`,
  })]
}

/** One guard per material, naming the case furthest outside its data and how many others are outside too. */
function temperatures(use: MaterialUse, m: MaterialModel): Guard[] {
  const outside = use.cases.flatMap((c) => {
    const fault = temperatureFault(m, c)
    return fault === null ? [] : [{ c, ...fault }]
  })
  const [worst] = outside.sort((a, b) => b.beyond - a.beyond)
  if (!worst) return []
  const others = outside.length - 1
  const more = others === 0 ? '' : others === 1 ? '; 1 more case is outside too' : `; ${others} more cases are outside too`
  return [fired('G-30', {
    of: m.id, caseId: worst.c.id, values: { 'T, °C': worst.T },
    message: `Case ${worst.c.id} is at ${figure(worst.T)} °C: ${worst.reason}${more}.`,
  })]
}

interface TemperatureFault { T: number, beyond: number, reason: string }

function temperatureFault(m: MaterialModel, c: CaseHead): TemperatureFault | null {
  const T = c.temperature?.value
  if (T === undefined) return null
  const first = m.knockdown[0]?.temperature
  const last = m.knockdown[m.knockdown.length - 1]?.temperature
  const from = m.temperatureFrom ?? first ?? null
  const to = m.temperatureTo ?? last ?? null
  if (from !== null && T < from - 1e-9) return { T, beyond: from - T, reason: `below the range of material ${m.id}, which begins at ${figure(from)} °C` }
  if (to !== null && T > to + 1e-9) return { T, beyond: T - to, reason: `above the range of material ${m.id}, which ends at ${figure(to)} °C` }
  if (m.family === 'aluminium' && T > HOT_ALUMINIUM && (last === undefined || last < T)) {
    return { T, beyond: T - HOT_ALUMINIUM, reason: `above ${HOT_ALUMINIUM} °C, where material ${m.id} (aluminium) has no knock-down factor` }
  }
  return null
}
