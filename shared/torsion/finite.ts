/** The last check of a front: no number leaves it that is none. */
import { refusal, type Refusal } from '#shared/torsion/section'

/** Every number of a result, however deep. */
function allFinite(value: unknown): boolean {
  if (typeof value === 'number') return Number.isFinite(value)
  if (ArrayBuffer.isView(value)) return (value as Float64Array).every(Number.isFinite)
  return typeof value !== 'object' || value === null || Object.values(value).every(allFinite)
}

/** The result, or a refusal where sizes beyond the range of numbers made one of its values infinite or lost it. */
export const finiteOrRefused = <T extends object>(result: T): T | Refusal =>
  allFinite(result) ? result : refusal('The numbers are too large, too small or too far apart to compute with. Check them and their units.')
