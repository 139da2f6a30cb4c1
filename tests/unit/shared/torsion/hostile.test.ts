/**
 * Zero, negative, tiny, huge and no numbers at all in every number that a public front of the engine takes: it gives
 * finite results or says in a sentence why not. Never NaN, never Infinity, never an exception.
 */
import { describe, expect, it } from 'vitest'
import { hostileCalls, notFronts, type HostileCall } from '../../../factories/hostile-calls'
import { loadEngine } from '../../../reference/engine'

const engine = await loadEngine()
const few = [0, -1, 1e-300, 1e300, Number.NaN, Infinity]
const many = [...few, -0, 5e-324, 1e-30, 1e-9, 1e9, 1e30, Number.MAX_VALUE, -Number.MAX_VALUE, -Infinity]

type Path = readonly (string | number)[]

/** Every number inside a value. */
function numbersIn(value: unknown, path: Path = []): Path[] {
  if (typeof value === 'number') return [path]
  if (typeof value !== 'object' || value === null) return []
  return Object.entries(value).flatMap(([key, inside]) => numbersIn(inside, [...path, Array.isArray(value) ? Number(key) : key]))
}

function withNumber(value: unknown, path: Path, number: number): unknown {
  const [key, ...rest] = path
  if (key === undefined) return number
  const inside = (value as Record<string | number, unknown>)[key]
  return Array.isArray(value) ? value.with(Number(key), withNumber(inside, rest, number)) : { ...value as object, [key]: withNumber(inside, rest, number) }
}

/** kL of a member that does not warp is infinite by its meaning. */
const mayBeInfinite = /^result\.u\.\d+$/

/** Where a result is not finite. */
function notFinite(value: unknown, path = 'result'): string[] {
  if (value === Infinity && mayBeInfinite.test(path)) return []
  if (typeof value === 'number') return Number.isFinite(value) ? [] : [`${path} is ${value}`]
  if (typeof value !== 'object' || value === null) return []
  return Object.entries(value).flatMap(([key, inside]) => notFinite(inside, `${path}.${key}`))
}

/** What is wrong with an answer, or nothing. */
function faultsOf(answer: unknown): string[] {
  if (typeof answer === 'object' && answer !== null && 'ok' in answer && answer.ok === false) {
    const { reason } = answer as { reason?: unknown }
    return typeof reason === 'string' && /^[A-Z0-9§].{15,}[.:)]$/s.test(reason) ? [] : [`the reason is no sentence: ${String(reason)}`]
  }
  return notFinite(answer)
}

function ask({ name, ask: further }: HostileCall, given: readonly unknown[]): unknown {
  if (further) return further(engine, given as never[])
  return (engine[name] as (...given: unknown[]) => unknown)(...given)
}

describe('hostile numbers', () => {
  it.each(hostileCalls.map(call => [`${call.name}${call.what ? `, ${call.what}` : ''}`, call] as const))('%s', (_, call) => {
    const given = call.give(engine)
    expect(faultsOf(ask(call, given)), 'the sound call').toEqual([])
    expect(ask(call, given)).not.toMatchObject({ ok: false })
    const places = given.flatMap((argument, i) => call.hostile && !call.hostile.includes(i) ? [] : numbersIn(argument, [i]))
    expect(places.length).toBeGreaterThan(0)
    const faults = places.flatMap(path => (call.slow ? few : many).flatMap((number) => {
      try {
        return faultsOf(ask(call, withNumber(given, path, number) as unknown[])).map(fault => `${path.join('.')} = ${number}: ${fault}`)
      } catch (error) {
        return [`${path.join('.')} = ${number} throws ${String(error)}`]
      }
    }))
    expect(faults).toEqual([])
  })

  it('are tried on every function of the engine, or a reason stands why not', () => {
    const known = new Set<string>([...hostileCalls.map(call => call.name), ...Object.values(notFronts).flat()])
    expect(Object.entries(engine).filter(([name, part]) => typeof part === 'function' && !known.has(name)).map(([name]) => name)).toEqual([])
  })
})
