/**
 * At which value of a variable the least margin is zero. Nothing is assumed of the way it goes there: the range is
 * sampled, every change of sign is bracketed and halved, and what is no crossing but a jump is told as one.
 */
import type { LeastMargin, MarginAt } from '#shared/calc/inverse/least-margin'

export interface Sample { value: number, at: MarginAt }

export interface ZeroMargin {
  value: number
  /** The margin is positive above it, else below it. */
  passesAbove: boolean
  least: LeastMargin
}

export interface ZeroMargins {
  /** In order of value. */
  samples: Sample[]
  /** How the margin goes with the variable over the samples that have one. */
  trend: 'rises' | 'falls' | 'neither' | 'flat'
  zeros: ZeroMargin[]
  /** Values at which the margin changes its sign without passing through zero: a limit of a table, another governing rule. */
  jumps: number[]
  /** Why samples have no result, each reason once. */
  reasons: string[]
}

/** Looked at from this part of the present value to its inverse. */
const RANGE = 16
const STEPS = 24
/** A change of sign over a relative step this small is a crossing if the margin changes no more than `JUMP` over it. */
const CLOSE = 1e-13
const JUMP = 1e-6

/** Yields after every evaluation, so that who asks may let the page breathe in between. */
export function* zeroMargins(marginAt: (value: number) => MarginAt, present: number): Generator<undefined, ZeroMargins> {
  const samples: Sample[] = []
  for (let k = -STEPS; k <= STEPS; k += 1) {
    const value = present * RANGE ** (k / STEPS)
    samples.push({ value, at: marginAt(value) })
    yield
  }
  const [zeros, jumps]: [ZeroMargin[], number[]] = [[], []]
  for (let i = 1; i < samples.length; i += 1) {
    const [low, high] = [samples[i - 1], samples[i]] as [Sample, Sample]
    const [a, b] = [marginIn(low.at), marginIn(high.at)]
    if (a === null || b === null || (a.ms >= 0) === (b.ms >= 0)) continue
    const found = yield* halved(marginAt, low.value, high.value, a, b)
    if ('jump' in found) jumps.push(found.jump)
    else zeros.push(found)
  }
  return { samples, trend: trendOf(samples), zeros, jumps, reasons: [...new Set(samples.flatMap(({ at }) => (at.ok ? [] : [at.reason])))] }
}

const marginIn = (at: MarginAt): LeastMargin | null => (at.ok ? at.least : null)

function* halved(marginAt: (value: number) => MarginAt, from: number, to: number, atFrom: LeastMargin, atTo: LeastMargin): Generator<undefined, ZeroMargin | { jump: number }> {
  let [low, high, a, b] = [from, to, atFrom, atTo]
  for (let i = 0; i < 80 && high - low > CLOSE * high; i += 1) {
    const middle = (low + high) / 2
    const at = marginIn(marginAt(middle))
    yield
    // Between two values with a margin one without: the margin does not pass through zero there.
    if (at === null) return { jump: middle }
    if ((at.ms >= 0) === (a.ms >= 0)) [low, a] = [middle, at]
    else [high, b] = [middle, at]
  }
  if (Math.abs(a.ms - b.ms) > JUMP) return { jump: high }
  const passesAbove = b.ms >= 0
  return { value: passesAbove ? high : low, passesAbove, least: passesAbove ? b : a }
}

function trendOf(samples: readonly Sample[]): ZeroMargins['trend'] {
  const margins = samples.flatMap(({ at }) => marginIn(at)?.ms ?? [])
  const steps = margins.slice(1).map((ms, i) => ms - (margins[i] ?? ms))
  const slack = 1e-12 * Math.max(1, ...margins.map(Math.abs))
  const [up, down] = [steps.some(step => step > slack), steps.some(step => step < -slack)]
  return up && down ? 'neither' : up ? 'rises' : down ? 'falls' : 'flat'
}

/** A value with so many figures, rounded to the side on which the margin is positive (methods §10, rule 5a). */
export function roundedToPass(value: number, passesAbove: boolean, figures = 4): number {
  const step = 10 ** (Math.floor(Math.log10(value)) - figures + 1)
  // A value that has so many figures already is not moved by what its binary form adds.
  const count = passesAbove ? Math.ceil(value / step - 1e-9) : Math.floor(value / step + 1e-9)
  return Number((count * step).toPrecision(12))
}
