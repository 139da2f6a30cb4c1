/**
 * Values at named places that all grow with one number, as face stresses do with |θ′|: nothing is computed or
 * kept for a case before it is asked for, so that a thousand cases on a hundred walls stay cheap.
 */
export interface PlaceValues {
  get: (place: string) => number | undefined
  entries: () => [string, number][]
}

/** The values for one of it, times `by`. */
export const scaledValues = (unit: ReadonlyMap<string, number>, by: number): PlaceValues => ({
  get: (place) => {
    const one = unit.get(place)
    return one === undefined ? undefined : one * by
  },
  entries: () => [...unit].map(([place, one]) => [place, one * by]),
})

/** From this many values by place and case on, only the cases that a reader needs keep theirs. */
export const MOST_VALUES = 5000

/** The place of the largest value; the first of equal ones. */
export function largestPlace(values: ReadonlyMap<string, number>): [string, number] | null {
  let best: [string, number] | null = null
  for (const [place, value] of values) {
    if (best === null || value > best[1]) best = [place, value]
  }
  return best
}
