import type { Fault, MarginRow } from '#shared/calc/types'
import { barMargins, solveBar, type BarCase, type StressPlace } from '#shared/calc/parts/bar-cases'
import type { SolidBarModel } from '#shared/calc/kinds/solid-bar/parse'
import { strengthUnit } from '#shared/calc/parts/strength'
import type { SolidTorsion } from '#shared/torsion/solids/solid'
import { torsionOfSolid } from '#shared/torsion/solids/torsion-of-solid'

export interface SolidBarSolution { model: SolidBarModel, torsion: SolidTorsion, GJ: number, places: StressPlace[], cases: BarCase[], margins: MarginRow[], governing: MarginRow | null }
export type Solved = { ok: true, solution: SolidBarSolution } | { ok: false, faults: Fault[] }

export function solveSolidBar(model: SolidBarModel): Solved {
  const torsion = torsionOfSolid(model.solid)
  if (!torsion.ok) return { ok: false, faults: [{ path: 'shape', message: torsion.reason }] }
  const GJ = model.material.G * torsion.J
  const materials = [model.material]
  const places = [torsion.peak, ...torsion.secondary].map((place, i): StressPlace => ({
    where: i === 0 ? '' : String(i), place: place.place, unit: strengthUnit(materials), materials, perTorque: place.perRate / torsion.J,
  }))
  const solved = solveBar(model.bar, GJ, places)
  if (!solved.ok) return solved
  // Every place has the same strength: the peak decides, and the others would only repeat it.
  const { rows, governing } = barMargins(model.bar, solved.cases, places.slice(0, 1))
  return { ok: true, solution: { model, torsion, GJ, places, cases: solved.cases, margins: rows, governing } }
}
