/** All calculation kinds. One line per kind; a second registration of a name is a programmer's error. */
import { closedSection } from '#shared/calc/kinds/closed-section/kind'
import { combinedStress } from '#shared/calc/kinds/combined-stress/kind'
import { generalOutline } from '#shared/calc/kinds/general-outline/kind'
import { imposedTwist } from '#shared/calc/kinds/imposed-twist/kind'
import { loadCases } from '#shared/calc/kinds/load-cases/kind'
import { marginTable } from '#shared/calc/kinds/margin-table/kind'
import { material } from '#shared/calc/kinds/material/kind'
import { openSection } from '#shared/calc/kinds/open-section/kind'
import { noLinks, type Links } from '#shared/calc/links'
import { restrainedWarping } from '#shared/calc/kinds/restrained-warping/kind'
import { solidBar } from '#shared/calc/kinds/solid-bar/kind'
import { torqueAlongBar } from '#shared/calc/kinds/torque-along-bar/kind'
import { torqueFromLoads } from '#shared/calc/kinds/torque-from-loads/kind'
import type { CalcKind, Evaluation } from '#shared/calc/types'

/** Changes whenever any kind may give another number than before. */
export const ENGINE_VERSION = '1.0.0'

// Inputs are checked by each kind itself; the registry never looks inside them.
type AnyKind = CalcKind<unknown>

export interface Registry { kind: (name: string) => AnyKind, has: (name: string) => boolean, names: () => string[] }

/** @throws when a kind is registered twice. */
export function makeRegistry(kinds: AnyKind[]): Registry {
  const byName = new Map<string, AnyKind>()
  for (const entry of kinds) {
    if (byName.has(entry.kind)) throw new Error(`Calculation kind “${entry.kind}” is registered twice.`)
    byName.set(entry.kind, entry)
  }
  return {
    kind(name) {
      const found = byName.get(name)
      if (!found) throw new Error(`Calculation kind “${name}” is not registered.`)
      return found
    },
    has: name => byName.has(name),
    names: () => [...byName.keys()],
  }
}

const registry = makeRegistry([openSection, closedSection, generalOutline, solidBar, torqueFromLoads, torqueAlongBar, restrainedWarping, imposedTwist, combinedStress, marginTable, material, loadCases])

/** @throws when no kind has this name; ask `isCalcKind` first where the name comes from a document. */
export const calcKind = (name: string): AnyKind => registry.kind(name)
export const isCalcKind = (name: string): boolean => registry.has(name)
/** Whether blocks of this kind are records of the note rather than calculations. */
export const isRecordKind = (name: string): boolean => registry.has(name) && registry.kind(name).record === true
/** Whether it reads the results of all other calculations. */
export const gathers = (name: string): boolean => registry.has(name) && registry.kind(name).gathers === true
export const calcKindNames = (): string[] => registry.names()

/**
 * Evaluates one calculation of a document. Never throws: an unknown kind or a newer version than this
 * engine knows is a fault, and the calculation is shown locked rather than dropped.
 */
export function evaluateCalculation(calculation: { kind: string, kindVersion: number, inputs: unknown }, links: Links = noLinks): Evaluation {
  if (!registry.has(calculation.kind)) {
    return { ok: false, faults: [{ path: 'kind', message: `This version does not know the calculation kind “${calculation.kind.slice(0, 60)}”; it is kept as it is and cannot be changed here.` }] }
  }
  const kind = registry.kind(calculation.kind)
  if (calculation.kindVersion !== kind.version) {
    return { ok: false, faults: [{ path: 'kindVersion', message: `This calculation was written for version ${calculation.kindVersion} of “${kind.title}”; this engine has version ${kind.version}. It is kept as it is.` }] }
  }
  return kind.evaluate(calculation.inputs, links)
}
