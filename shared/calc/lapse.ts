/** When an answer to a guard no longer holds (product rule: moved values, or another condition than the one answered). */
import type { Guard, Severity } from '#shared/calc/types'

/** What is stored beside an answer: the condition as it stood. */
export interface GuardFacts {
  severity: Severity
  message: string
  ask: string
  values: Record<string, number>
  wall?: string
  caseId?: string
  methodRevision: string
}

/** A value may move this far before its answer is void. */
const ALLOWED_MOVE = 0.01
/** Recomputing on another machine may differ in the last digits. */
const NOISE = 1e-9

export function guardFacts(guard: Guard, methodRevision: string): GuardFacts {
  return {
    severity: guard.severity, message: guard.message, ask: guard.ask, values: { ...guard.values }, methodRevision,
    ...(guard.wall === undefined ? {} : { wall: guard.wall }),
    ...(guard.caseId === undefined ? {} : { caseId: guard.caseId }),
  }
}

/**
 * Why the answer given at `given` no longer holds, in one sentence; null while it holds.
 * A guard that no longer fires (`now` undefined) leaves nothing to answer, so nothing lapses.
 */
export function answerLapsed(given: GuardFacts, now: Guard | undefined, methodRevision = given.methodRevision): string | null {
  if (!now) return null
  if (given.methodRevision !== methodRevision) return `The method was revised from ${given.methodRevision} to ${methodRevision}.`
  if (given.severity !== now.severity) return `The guard was a ${given.severity} and is now a ${now.severity}.`
  if (given.wall !== now.wall) return `It now speaks of ${place('wall', now.wall)}, before of ${place('wall', given.wall)}.`
  if (given.caseId !== now.caseId) return `It now speaks of ${place('case', now.caseId)}, before of ${place('case', given.caseId)}.`
  if (maskNumbers(given.message) !== maskNumbers(now.message) || maskNumbers(given.ask) !== maskNumbers(now.ask)) return 'The wording of the condition changed.'
  return movedValue(given.values, now.values)
}

const place = (what: string, which: string | undefined) => which === undefined ? `no single ${what}` : `${what} ${which}`

function movedValue(then: Record<string, number>, now: Record<string, number>): string | null {
  const names = [...new Set([...Object.keys(then), ...Object.keys(now)])].sort()
  for (const name of names) {
    const was = then[name]
    const is = now[name]
    if (was === undefined || is === undefined) return `The condition is judged on other values than before (${name}).`
    if (Math.abs(is - was) > Math.abs(was) * ALLOWED_MOVE + NOISE * Math.max(Math.abs(was), Math.abs(is))) {
      return was === 0 ? `${name} moved away from zero.` : `${name} moved by ${percent(is, was)} %, more than 1 %.`
    }
  }
  return null
}

function percent(is: number, was: number): string {
  const change = Math.abs((is - was) / was) * 100
  return change >= 1000 ? 'more than 1000' : change.toFixed(1)
}

/** Numbers in a sentence may move; its words may not. Numbers include thin-spaced thousands, exponents and both minus signs. */
export function maskNumbers(sentence: string): string {
  return sentence
    .replace(/[>≈−+-]*\d[\d.]*(?:[\u2009\u202F]\d{3})*(?:[\d.]*)(?:\s*×\s*10[⁻⁰¹²³⁴-⁹]+|[eE][+-]?\d+)?/gu, '#')
    .replace(/\s+/gu, ' ')
    .trim()
}
