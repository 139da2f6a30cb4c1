/** What three meshes say about a value: the order of convergence seen and how far it may still be off (§4.2, G-33). */
import { leastOrder } from '#shared/torsion/outline/published'

export interface MeshEstimate {
  /** On the finest mesh. */
  readonly value: number
  /** On the last three meshes, the finest last. */
  readonly onMeshes: readonly [number, number, number]
  /** log₂ of the ratio of the two differences; null where both are down to rounding. */
  readonly order: number | null
  /**
   * How far the value may be off, in its unit: the last difference carried on at the order seen, at second order
   * where it is higher. Where the differences change sign the last may be small by accident: then a quarter of
   * the first at least.
   */
  readonly uncertainty: number
}

/** Differences below this part of the value are rounding. */
const rounding = 1e-10
/** An order seen once is not trusted beyond this for the uncertainty. */
const mostTrusted = 2
/** Below this order the meshes do not converge and the spread is what is known. */
const leastTrusted = 0.3

/** The estimate from the values on three meshes, each with twice the unknowns of the one before. */
export function estimateFromMeshes(coarse: number, middle: number, fine: number): MeshEstimate {
  const [first, second] = [Math.abs(middle - coarse), Math.abs(fine - middle)]
  const floor = rounding * Math.abs(fine)
  const onMeshes = [coarse, middle, fine] as const
  if (second <= floor) return { value: fine, onMeshes, order: first <= floor ? null : Math.log2(first / floor), uncertainty: floor }
  const order = Math.log2(Math.max(first, floor) / second)
  const carried = order < leastTrusted ? Math.max(first, second) : second / (2 ** Math.min(order, mostTrusted) - 1)
  const uncertainty = (middle - coarse) * (fine - middle) < 0 ? Math.max(carried, first / 4) : carried
  return { value: fine, onMeshes, order, uncertainty }
}

export interface ConvergenceVerdict {
  /** `information`: an order below the expected with the uncertainty inside its limit. */
  readonly verdict: 'inside' | 'information' | 'caution'
  readonly message: string
}

const percent = (part: number): string => `${Number((100 * part).toPrecision(2))} %`

/**
 * Judges an estimate against a limit on its uncertainty (part of the value).
 * The caution is for the uncertainty alone (amendment to G-33); orders above
 * the range for linear elements are those of the panels used.
 */
export function judgeConvergence(name: string, { value, order, uncertainty }: MeshEstimate, limit: number): ConvergenceVerdict {
  const part = value === 0 ? (uncertainty === 0 ? 0 : Infinity) : uncertainty / Math.abs(value)
  const seen = order === null ? 'differences down to rounding' : `observed order ${order.toFixed(1)}`
  if (!(part <= limit)) return { verdict: 'caution', message: `${name} is known to ±${percent(part)} only (${seen}); at most ±${percent(limit)} is accepted. Give the outline more real detail, such as fillets, or the reason why this suffices.` }
  const low = order !== null && order < leastOrder
  return { verdict: low ? 'information' : 'inside', message: `${name} is known to ±${percent(part)} (${seen}${low ? `, less than ${leastOrder}` : ''}); at most ±${percent(limit)} is accepted.` }
}
