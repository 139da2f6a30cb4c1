/** The answers to “What would it take” in words and as a plot. */
import type { MarginAt } from '#shared/calc/inverse/least-margin'
import type { Variable } from '#shared/calc/inverse/variables'
import { roundedToPass, type ZeroMargin, type ZeroMargins } from '#shared/calc/inverse/zero-margin'
import type { Plot } from '#shared/calc/types'
import { showMargin, withUnit } from '#shared/units/display'
import { toEngine } from '#shared/units/units'

const TREND: Record<ZeroMargins['trend'], string> = {
  rises: 'The margin rises with it over the whole range.', falls: 'The margin falls with it over the whole range.',
  flat: 'The margin does not hang on it.', neither: 'The margin neither rises nor falls with it throughout: look at the plot before you choose.',
}

const shown = (value: number, unit: Variable['unit']) => withUnit(String(Number(value.toPrecision(6))), unit)

export const proposalOf = ({ value, passesAbove }: ZeroMargin): number => roundedToPass(value, passesAbove)

export const marginWords = (at: MarginAt): string => (!at.ok ? 'no result' : at.least ? showMargin(at.least.ms) : 'no load')

/** What was found, sentence by sentence. */
export function answerWords(variable: Variable, { zeros, jumps, samples, trend, reasons }: ZeroMargins): string[] {
  const [first, last] = [samples[0]?.value ?? 0, samples.at(-1)?.value ?? 0]
  const found = zeros.map((zero) => {
    const { mode, caseId, place } = zero.least
    return `The least margin is zero at ${shown(proposalOf(zero), variable.unit)}, rounded ${zero.passesAbove ? 'up' : 'down'} so that it passes; there ${mode.toLowerCase()} governs, case ${caseId}, ${place}.`
  })
  const margins = samples.flatMap(({ at }) => (at.ok && at.least ? [at.least.ms] : []))
  const none = zeros.length > 0 || margins.length === 0 ? [] : [`Between ${shown(first, variable.unit)} and ${shown(last, variable.unit)} the least margin ${jumps.length > 0 ? 'passes through zero nowhere' : (margins[0] ?? 0) < 0 ? 'stays negative' : 'stays positive'}.`]
  return [
    ...found, ...none,
    ...jumps.map(jump => `At about ${shown(jump, variable.unit)} the margin changes its sign in a jump, where another rule begins to hold.`),
    ...(margins.length > 0 ? [TREND[trend]] : []),
    ...(reasons.length > 0 ? [`Part of the range gives no result: ${reasons[0] ?? ''}`] : []),
  ]
}

/** Margins above this say only that there is plenty. */
const MOST = 4
/** The plot shows the variable from the present value over this to the present value times this. */
const REACH = 4

/** The margin against the variable; where there is no result the line is broken. */
export function marginPlot(variable: Variable, { samples }: ZeroMargins): Plot {
  const runs: [number, number][][] = [[]]
  for (const { value, at } of samples) {
    const near = value >= variable.value / REACH && value <= variable.value * REACH
    if (near && at.ok && at.least && at.least.ms <= MOST) runs.at(-1)?.push([toEngine(value, variable.unit), at.least.ms])
    else if (runs.at(-1)?.length) runs.push([])
  }
  return {
    key: 'take', title: `Least margin against ${variable.label.charAt(0).toLowerCase()}${variable.label.slice(1)}`,
    x: { label: variable.label, symbol: 'x', dimension: variable.dimension, unit: variable.unit }, y: { label: 'Least margin', symbol: 'MS', dimension: 'margin', unit: '' },
    series: runs.filter(points => points.length > 1).map((points, i) => ({ name: i === 0 ? 'Least margin' : `Least margin, part ${i + 1}`, points })),
  }
}
