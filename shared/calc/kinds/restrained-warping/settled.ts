/** What is zero but for the last digits of binary arithmetic is shown as zero; `scale` is what it is small against. */
export const settled = (value: number, scale: number): number => (Math.abs(value) <= 1e-10 * Math.abs(scale) ? 0 : value)
