/** The benchmark that all others are told in multiples of. */
export const baselineName = 'a million square roots'
