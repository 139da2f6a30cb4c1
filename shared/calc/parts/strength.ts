/** Strengths at the temperature of a case and the step between load levels, as the kinds use them. */
import type { LoadLevel } from '#shared/calc/types'
import type { FactorModel, MaterialModel } from '#shared/calc/parts/model'
import { knockDownAt } from '#shared/torsion/allowables'
import { factorAction } from '#shared/torsion/factors'
import type { Refusal } from '#shared/torsion/section'
import type { UnitId } from '#shared/units/units'

/** Factor on the strengths of a material at a temperature, °C; beyond the table the nearest point is used and G-30 stops the note. */
export function knockdownOf({ knockdown }: MaterialModel, temperature: number | undefined): number {
  const [first, last] = [knockdown[0], knockdown.at(-1)]
  if (temperature === undefined || !first || !last) return 1
  if (temperature <= first.temperature) return first.factor
  if (temperature >= last.temperature) return last.factor
  const at = knockDownAt(knockdown, temperature)
  return at.ok ? at.factor : Math.min(first.factor, last.factor)
}

export interface Levels { readonly ok: true, readonly toLimit: number, readonly toUltimate: number }

/**
 * What a load given at a level is multiplied by to reach limit and ultimate, without special factors.
 * Ultimate loads are not raised again; they are divided for the checks at limit only where the author confirms it (methods §8).
 */
export function levelsOf({ ultimate, divideUltimate }: Pick<FactorModel, 'ultimate' | 'divideUltimate'>, level: LoadLevel): Levels | Refusal {
  const unit = factorAction(1, level, { safety: ultimate, special: 1, specialAtLimit: false }, divideUltimate)
  return unit.ok ? { ok: true, toLimit: unit.limit ?? 1, toUltimate: unit.ultimate } : unit
}

export type StrengthName = 'Fsu' | 'Fsy' | 'Ftu' | 'Fty'

/** Lowest strength of those materials at the temperature; null where one of them has none. */
export function lowestStrength(materials: readonly MaterialModel[], name: StrengthName, knockdown: (material: MaterialModel) => number): number | null {
  let low = Infinity
  for (const material of materials) {
    const strength = material[name]
    if (strength === null) return null
    low = Math.min(low, strength * knockdown(material))
  }
  return low < Infinity ? low : null
}

export const strengthUnit = (materials: readonly MaterialModel[]): UnitId => materials[0]?.units.strength ?? 'MPa'
