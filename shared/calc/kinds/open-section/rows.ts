/** Results by wall and by case, as tables show them. */
import type { CaseRow, WallRow } from '#shared/calc/types'
import type { Solution } from '#shared/calc/kinds/open-section/solution'

export function wallRows(s: Solution): WallRow[] {
  const least = leastBy(s, row => row.wall)
  const cases = s.cases.filter(c => s.detailed.has(c.model.id))
  return s.walls.map(({ wall, J, share, slenderness }) => ({
    wall: wall.id, name: wall.name, length: wall.length, thickness: wall.tMax, G: wall.G, J, share, slenderness, material: wall.material.id,
    torque: Object.fromEntries(cases.map(c => [c.model.id, c.torque * share])),
    tau: Object.fromEntries(cases.map(c => [c.model.id, c.tau.get(wall.id) ?? 0])),
    leastMargin: least.get(wall.id) ?? null,
  }))
}

export function caseRows(s: Solution): CaseRow[] {
  const least = leastBy(s, row => row.caseId)
  return s.cases.map(c => ({
    caseId: c.model.id, title: c.model.title, level: c.model.level, torque: c.torque, rate: c.rate, twist: c.twist,
    tauMax: c.tauMax, tauMaxWall: c.tauMaxWall, tauCorner: c.tauCorner, leastMargin: least.get(c.model.id) ?? null,
  }))
}

function leastBy(s: Solution, group: (row: Solution['margins'][number]) => string | undefined): Map<string, number> {
  const least = new Map<string, number>()
  for (const row of s.margins) {
    const key = group(row)
    if (key === undefined || row.ms === null) continue
    least.set(key, Math.min(least.get(key) ?? Infinity, row.ms))
  }
  return least
}
