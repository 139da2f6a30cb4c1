import type { GeneralOutlineInputs } from '#shared/calc/kinds/general-outline/schema'
import { blankOpenSection } from '#shared/calc/kinds/open-section/blank'

/** A fresh outline: four empty vertices, no hole, one material, one torque. */
export function blankGeneralOutline(units: 'SI' | 'US' = 'SI'): GeneralOutlineInputs {
  const { materials, loading, length, twistAllowed, twistOrigin, factors, ends, declarations } = blankOpenSection(units)
  const empty = () => ({ text: '', unit: units === 'SI' ? 'mm' as const : 'in' as const })
  return {
    units,
    outer: { by: 'vertices', vertices: Array.from({ length: 4 }, () => ({ x: empty(), y: empty(), radius: null, sweep: null, name: '' })) },
    holes: [], materials, loading, length, twistAllowed, twistOrigin, factors, ends, first: { by: 'none' }, declarations,
  }
}
