/** From what a drawing measures to lengths on the mid-line. mm. */
import type { ConversionLine, ConversionTerm, MeasuredOn } from '#shared/torsion/profiles/profile'

/** What a mid-line length differs from the given one by: nothing, less half of what adjoins, or more. */
const signs: Record<MeasuredOn, number> = { 'outside': -1, 'inside': 1, 'mid-line': 0 }

/** A thickness that adjoins an end, with its symbol. */
export interface Adjoining { readonly symbol: string, readonly t: number }

export const conversion = (of: string, symbol: string, terms: readonly ConversionTerm[]): ConversionLine =>
  ({ of, symbol, terms, value: sumOf(terms) })

export const sumOf = (terms: readonly ConversionTerm[]): number => terms.reduce((total, { factor, value }) => total + factor * value, 0)

/** `h` becomes `h_m`, `b_l` becomes `b_{l,m}`. */
export function onMidLine(symbol: string): string {
  const [letter, index] = symbol.split('_')
  return index === undefined ? `${letter}_m` : `${letter}_{${index},m}`
}

/** Half of every adjoining thickness off an outside length, onto an inside one; equal symbols are counted together. */
export function midLength(of: string, given: { readonly symbol: string, readonly value: number }, measured: MeasuredOn, adjoining: readonly Adjoining[]): ConversionLine {
  const symbols = [...new Set(adjoining.map(({ symbol }) => symbol))]
  const halves = symbols.flatMap((symbol): ConversionTerm[] => {
    const same = adjoining.filter(one => one.symbol === symbol)
    return signs[measured] === 0 ? [] : [{ symbol, factor: signs[measured] * same.length / 2, value: same[0]?.t ?? 0 }]
  })
  return conversion(of, onMidLine(given.symbol), [{ symbol: given.symbol, factor: 1, value: given.value }, ...halves])
}

/** Half the thickness off an outside radius, onto an inside one. */
export function midRadius(given: ConversionTerm, measured: MeasuredOn, t: number): ConversionLine {
  const half = signs[measured] === 0 ? [] : [{ symbol: 't', factor: signs[measured] / 2, value: t }]
  return conversion('radius of the mid-line', 'R_m', [given, ...half])
}

/**
 * Where two faces meet at a corner that turns by `turn`, seen along a wall of
 * thickness `own` from the crossing of the mid-lines: half of what adjoins at a
 * right angle.
 */
export const cornerReach = (own: number, adjoining: number, turn: number): number => (adjoining - own * Math.cos(turn)) / (2 * Math.sin(turn))
