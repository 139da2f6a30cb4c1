import type { Component } from 'vue'
import type { FormField } from '#shared/calc/form/form-fields'
import CalcFactors from '~/components/calc/CalcFactors.vue'
import CalcJunctions from '~/components/calc/CalcJunctions.vue'
import CalcLoading from '~/components/calc/CalcLoading.vue'
import CalcMaterials from '~/components/calc/CalcMaterials.vue'
import CalcWalls from '~/components/calc/CalcWalls.vue'

/** Parts that many kinds share and that have a form of their own. */
const PARTS: Record<string, Component> = { walls: CalcWalls, junctions: CalcJunctions, materials: CalcMaterials, loading: CalcLoading, factors: CalcFactors }

/** A shared part stands under the name that its form knows it by; elsewhere the form is read from the schema. */
export const partOf = (field: FormField): Component | null =>
  'part' in field && field.part !== undefined && field.part === field.path ? PARTS[field.part] ?? null : null

/** A new way of giving something, with what both ways share kept as it was. */
export function keepShared(next: unknown, now: unknown): unknown {
  if (typeof next !== 'object' || next === null || typeof now !== 'object' || now === null) return next
  return Object.fromEntries(Object.entries(next).map(([key, value]) => [key, key !== 'by' && key in now ? (now as Record<string, unknown>)[key] : value]))
}
