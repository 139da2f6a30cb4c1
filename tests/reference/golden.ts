/** What the engine gives at one method revision: every reference row, and every number of the sample calculations. */
import { calcKind, gathers } from '#shared/calc/registry'
import { allSamples } from '../factories/calc-samples'
import { loadEngine } from './engine'
import { chapterOf, rowKey, sectionOf } from './method-sections'
import { referenceRows } from './rows'

/** Numbers by name. A reference row by its key; of a calculation `open-section, hat: J`. */
export type Golden = Readonly<Record<string, number>>

export interface Moves {
  /** By more than the numbers may differ between machines. */
  readonly moved: readonly { readonly name: string, readonly was: number, readonly is: number }[]
  readonly gone: readonly string[]
  readonly added: readonly string[]
}

const same = 1e-12
/** Elementary functions differ in the last bit between machines; the boundary equations of an outline multiply that by their condition. */
const sameByOutline = 1e-10
const byOutline = /^(outline row|general-outline,)/

/** A value that is nought but for rounding is compared with the size it was rounded at. */
const scaleOf = (was: number, is: number): number => Math.max(Math.abs(was), Math.abs(is))

/** What moved from one golden result to another, what is no longer there, and what is new. */
export function movesBetween(before: Golden, now: Golden): Moves {
  const names = Object.keys(before)
  return {
    moved: names.flatMap((name) => {
      const [was, is] = [before[name], now[name]]
      if (was === undefined || is === undefined) return []
      return Math.abs(is - was) <= (byOutline.test(name) ? sameByOutline : same) * scaleOf(was, is) ? [] : [{ name, was, is }]
    }),
    gone: names.filter(name => !(name in now)),
    added: Object.keys(now).filter(name => !(name in before)),
  }
}

async function rowValues(): Promise<[string, number][]> {
  const engine = await loadEngine()
  return referenceRows.map(row => [`${chapterOf(sectionOf(row)) === '4' ? 'outline row' : 'row'} ${rowKey(row)}`, row.actual(engine)])
}

/** What gathers from the other calculations of a note has no numbers of its own. @throws where a sample is refused: the contract test tells more. */
function sampleValues(): [string, number][] {
  return allSamples().filter(({ kind }) => !gathers(kind)).flatMap(({ kind, name, inputs }): [string, number][] => {
    const evaluation = calcKind(kind).evaluate(inputs)
    if (!evaluation.ok) throw new Error(`${kind}, ${name}: ${evaluation.faults.map(fault => `${fault.path}: ${fault.message}`).join(' ')}`)
    const { outputs, margins } = evaluation.result
    return [
      ...outputs.map((output): [string, number] => [`${kind}, ${name}: ${output.key}`, output.value]),
      ...margins.flatMap((margin): [string, number][] => margin.ms === null ? [] : [[`${kind}, ${name}: ${margin.key}`, margin.ms]]),
    ]
  })
}

/** What the engine gives now. */
export const goldenNow = async (): Promise<Golden> => Object.fromEntries([...await rowValues(), ...sampleValues()])
