/** The length over which a held end is felt (methods reference §3.6): an end effect falls to 5 % in three of them. */

/** √(EΓ/GJ), mm; null for a section that does not warp or where a value is missing. */
export function characteristicLength(E: number, gamma: number, GJ: number): number | null {
  const length = Math.sqrt(E * gamma / GJ)
  return Number.isFinite(length) && length > 0 ? length : null
}
