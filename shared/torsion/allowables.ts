/** Shear allowables of a wall at the temperature of a case (methods reference §7.2). Stresses in MPa, temperatures in °C. */
import type { Refusal } from '#shared/torsion/section'
import { refusal } from '#shared/torsion/section'

export interface KnockDownPoint { readonly temperature: number, readonly factor: number }

export type KnockDown = { readonly ok: true, readonly factor: number } | Refusal

const usable = ({ temperature, factor }: KnockDownPoint): boolean => Number.isFinite(temperature) && Number.isFinite(factor) && factor > 0

/**
 * The factor on strength at a temperature, linear between the points given and
 * never carried beyond them: outside, the record does not say (G-30).
 */
export function knockDownAt(points: readonly KnockDownPoint[], temperature: number): KnockDown {
  if (!Number.isFinite(temperature)) return refusal('The temperature is not a finite number.')
  if (points.length === 0) return refusal('The material record gives no knock-down factors.')
  if (!points.every(usable)) return refusal('Each knock-down factor needs a temperature and a factor greater than zero.')
  const sorted = [...points].sort((a, b) => a.temperature - b.temperature)
  const above = sorted.findIndex(point => point.temperature >= temperature)
  const upper = sorted[above]
  if (upper?.temperature === temperature) return lowestAt(sorted, temperature)
  const lower = sorted[above - 1]
  if (!upper || !lower) {
    return refusal(`The material record gives strengths from ${sorted[0]?.temperature} to ${sorted.at(-1)?.temperature} °C; the case is at ${temperature} °C.`)
  }
  const part = (temperature - lower.temperature) / (upper.temperature - lower.temperature)
  return { ok: true, factor: lower.factor + part * (upper.factor - lower.factor) }
}

/** Two points at one temperature are a step; the lower factor is the safe one. */
function lowestAt(points: readonly KnockDownPoint[], temperature: number): KnockDown {
  return { ok: true, factor: Math.min(...points.filter(point => point.temperature === temperature).map(point => point.factor)) }
}

export interface ShearStrengths {
  /** F_su; null where the record has none: there is no default. */
  readonly Fsu: number | null
  /** F_sy where published. */
  readonly Fsy: number | null
  readonly Fty: number | null
}

export interface ShearAllowables {
  /** Knocked down; null where the record gives none. */
  readonly ultimate: number | null
  readonly yield: number | null
  readonly yieldSource: 'published' | 'from F_ty' | null
}

/** von Mises: F_sy = F_ty/√3. */
export const shearYieldFromTension = (Fty: number): number => Fty / Math.sqrt(3)

/** Both shear allowables times the knock-down factor, F_sy from F_ty/√3 where it is not published. */
export function shearAllowables(strengths: ShearStrengths, factor: number): ShearAllowables {
  const { Fsu, Fsy, Fty } = strengths
  const yieldAtRoom = Fsy ?? (Fty === null ? null : shearYieldFromTension(Fty))
  return {
    ultimate: Fsu === null ? null : Fsu * factor,
    yield: yieldAtRoom === null ? null : yieldAtRoom * factor,
    yieldSource: Fsy !== null ? 'published' : Fty === null ? null : 'from F_ty',
  }
}
