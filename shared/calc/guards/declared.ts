/** Guards on what the author declares of the part. */
import type { Guard } from '#shared/calc/types'
import { fired } from '#shared/calc/guards/catalogue'
import { degrees, figure } from '#shared/calc/parts/say'

/** Half-angle of taper above which prismatic theory is in doubt (common practice). */
const TAPER = 10 * Math.PI / 180

export interface Declared {
  cutOut: 'none' | 'away from the peak' | 'at the peak'
  /** Half-angle, rad; null where the bar does not taper. */
  taper: number | null
  layered: boolean
  welded: boolean
}

/** Taper (G-38), cut-outs (G-40) and what lies outside the theory (G-37). */
export function declaredGuards(declared: Declared): Guard[] {
  return [...taperAndCutOut(declared), ...outsideTheory(declared)]
}

function taperAndCutOut({ taper, cutOut }: Declared): Guard[] {
  const guards: Guard[] = []
  if (taper !== null && Math.abs(taper) > TAPER) {
    guards.push(fired('G-38', { values: { 'half-angle, °': degrees(Math.abs(taper)) }, message: `The bar tapers at a half-angle of ${figure(degrees(Math.abs(taper)))}°, more than 10°.` }))
  }
  if (cutOut !== 'none') {
    const peak = cutOut === 'at the peak'
    guards.push(fired('G-40', {
      severity: peak ? 'stop' : 'caution', values: { 'at the peak': peak ? 1 : 0 },
      message: peak ? 'A hole, cut-out or slot lies where the stress peaks; this method knows nothing of it.' : 'A hole, cut-out or slot lies in the length, away from the peak stress.',
    }))
  }
  return guards
}

function outsideTheory({ layered, welded }: Declared): Guard[] {
  return [
    ...(layered ? [fired('G-37', { of: 'layered', values: { declared: 1 }, message: 'The material is declared anisotropic or layered; the theory is for isotropic walls.' })] : []),
    ...(welded ? [fired('G-37', { of: 'welded', values: { declared: 1 }, message: 'A weld with a heat-affected zone is declared in the walls; their properties are not those of the record.' })] : []),
  ]
}
