/** What every calculation kind must keep to, whatever it computes. */
import fc from 'fast-check'
import katex from 'katex'
import { describe, expect, it } from 'vitest'
import { calcSamples } from '../../../factories/calc-samples'
import { stripInputs } from '../../../factories/open-section'
import { drawingToSvg } from '#shared/calc/drawing-svg'
import { calcKind, calcKindNames, evaluateCalculation } from '#shared/calc/registry'
import type { CalcResult, Evaluation } from '#shared/calc/types'

/** Every path to a leaf of a JSON value. */
function leaves(value: unknown, path: (string | number)[] = []): (string | number)[][] {
  if (typeof value !== 'object' || value === null) return [path]
  return Object.entries(value).flatMap(([key, inside]) => leaves(inside, [...path, Array.isArray(value) ? Number(key) : key]))
}

function withLeaf(value: unknown, path: (string | number)[], leaf: unknown): unknown {
  const copy: unknown = structuredClone(value)
  let at = copy as Record<string | number, unknown>
  for (const step of path.slice(0, -1)) at = at[step] as Record<string | number, unknown>
  const last = path.at(-1)
  if (last !== undefined) at[last] = leaf
  return copy
}

const typedText = fc.oneof(
  fc.constantFrom('', '0', '-1', '1e300', '1e-300', '3/0', '1,5', 'NaN', '∞', '12.5 kip-in', '1e9', '0.0001', '360', '90', '-90', '2', '50', '<b>', '\\frac'),
  fc.double({ noNaN: true, noDefaultInfinity: true }).map(String), fc.string({ maxLength: 12 }),
)
const anything = fc.oneof(typedText, fc.constantFrom(null, true, false, 'free', 'unknown', 'bent', 'machined', 'US', 'ultimate', 'a', 'b', '1', '2', '3'), fc.jsonValue())

function finiteEverywhere(value: unknown, path: string): void {
  if (typeof value === 'number') expect(Number.isFinite(value), path).toBe(true)
  if (typeof value === 'object' && value !== null) for (const [key, inside] of Object.entries(value)) finiteEverywhere(inside, `${path}.${key}`)
}

const unique = (keys: string[]) => expect(new Set(keys).size, keys.filter((k, i) => keys.indexOf(k) !== i).join(' ')).toBe(keys.length)

// A wall may be named “NaN”; only what the program computes is judged.
const withoutNames = (tex: string) => tex.replace(/\\text\{(?:[^{}\\]|\\.|\{\})*\}/g, '')
const withoutText = (svg: string) => svg.replace(/>[^<]*</g, '><').replace(/aria-label="[^"]*"/g, '')

function sound(result: CalcResult) {
  finiteEverywhere(result, 'result')
  unique(result.outputs.map(o => o.key))
  unique(result.guards.map(g => g.key))
  unique(result.margins.map(m => m.key))
  const governing = result.margins.filter(m => m.governing)
  expect(governing.map(m => m.key)).toEqual(result.governing === null ? [] : [result.governing])
  for (const m of result.margins) if (m.rf !== null) expect(m.rf).toBeGreaterThanOrEqual(governing[0]?.rf ?? Infinity)
  for (const line of result.working.flatMap(s => s.lines)) expect(withoutNames(`${line.symbols}${line.numbers}${line.result}`)).not.toMatch(/NaN|Infinity|undefined|null/)
  expect(result.drawing?.alt ?? 'none').toMatch(/\S/)
  if (result.drawing) expect(withoutText(drawingToSvg(result.drawing, { width: 470, theme: 'print' }))).not.toMatch(/NaN|Infinity|undefined/)
}

function judged(evaluation: Evaluation) {
  if (evaluation.ok) return sound(evaluation.result)
  expect(evaluation.faults.length).toBeGreaterThan(0)
  for (const fault of evaluation.faults) expect(fault.message).toMatch(/\S/)
}

describe.each(calcKindNames())('calculation kind %s', (name) => {
  const kind = calcKind(name)
  const given = Object.values(calcSamples[name] ?? {}).map(make => make())

  it('has samples here', () => expect(given.length).toBeGreaterThan(0))
  it('begins blank with inputs its own schema takes, and asks for what is missing', () => {
    const blank = kind.blank()
    expect(kind.schema.safeParse(blank)).toMatchObject({ success: true })
    expect(JSON.parse(JSON.stringify(blank))).toEqual(blank)
    const evaluation = kind.evaluate(blank)
    expect(evaluation.ok).toBe(false)
  })
  it('evaluates its samples soundly, the same each time, and leaves the inputs alone', () => {
    for (const inputs of given) {
      const before = JSON.stringify(inputs)
      const first = kind.evaluate(inputs)
      // What gathers from the other calculations of a note has nothing to gather here.
      expect(first.ok).toBe(kind.gathers !== true)
      judged(first)
      expect(kind.evaluate(inputs)).toEqual(first)
      expect(JSON.stringify(inputs)).toBe(before)
      expect(JSON.parse(JSON.stringify(first))).toEqual(first)
    }
  })
  it('sets every line of its working as mathematics without complaint', () => {
    for (const inputs of given) {
      const evaluation = kind.evaluate(inputs)
      if (!evaluation.ok) continue
      expect(evaluation.result.working.length > 0).toBe(!kind.record)
      for (const { symbols, numbers, result } of evaluation.result.working.flatMap(s => s.lines)) {
        expect(() => katex.renderToString(`${symbols} = ${numbers} = ${result}`, { throwOnError: true, strict: 'error' })).not.toThrow()
      }
    }
  })
  it('never throws on anything put in place of one or two fields', () => {
    fc.assert(fc.property(fc.constantFrom(...given), fc.nat(), anything, fc.nat(), anything, (inputs, i, first, j, second) => {
      const paths = leaves(inputs)
      const once = withLeaf(inputs, paths[i % paths.length] ?? [], first)
      const twice = withLeaf(once, paths[j % paths.length] ?? [], second)
      judged(kind.evaluate(once))
      judged(kind.evaluate(twice))
    }), { numRuns: 200, seed: 1800133696 })
  })
  it('never throws on any JSON at all', () => {
    fc.assert(fc.property(fc.jsonValue(), value => judged(kind.evaluate(value))), { numRuns: 100 })
  })
})

describe('registry', () => {
  it('keeps an unknown kind or version as a fault', () => {
    expect(evaluateCalculation({ kind: 'unknown', kindVersion: 1, inputs: {} })).toMatchObject({ ok: false, faults: [{ path: 'kind' }] })
    expect(evaluateCalculation({ kind: 'open-section', kindVersion: 99, inputs: stripInputs() })).toMatchObject({ ok: false, faults: [{ path: 'kindVersion' }] })
    expect(evaluateCalculation({ kind: 'open-section', kindVersion: 1, inputs: stripInputs() }).ok).toBe(true)
  })
})
