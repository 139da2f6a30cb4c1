/** Strengths at the temperature of the case, factored stresses and margins: the least of each mode. */
import type { MarginRow, WorkingStep } from '#shared/calc/types'
import { leastOfModes } from '#shared/calc/parts/margin-rows'
import { marginLines, type MarginSource } from '#shared/calc/parts/margin-working'
import { sym } from '#shared/calc/parts/tex'
import type { CaseSolution, Solution } from '#shared/calc/kinds/open-section/solution'

export function marginSteps(s: Solution): WorkingStep[] {
  return leastOfModes(s.margins).flatMap((row): WorkingStep[] => {
    const c = s.cases.find(one => one.model.id === row.caseId)
    if (!c) return []
    const where = row.mode === 'twist' ? '' : `, ${row.place}`
    return [{ heading: `${row.modeLabel}: least margin${where}, case ${row.caseId}`, method: row.mode === 'twist' ? '§7.8' : '§7.3', lines: marginLines(sourceOf(s, c, row)) }]
  })
}

/** The action, its factors and its allowable: of twist the typed limit, of a wall its own strength, of a corner the weaker one. */
function sourceOf(s: Solution, c: CaseSolution, row: MarginRow): MarginSource {
  const ultimate = row.level === 'ultimate'
  const common = { row, temperature: c.model.temperature?.value, toLevel: ultimate ? c.toUltimate : c.toLimit, safety: s.model.factors.ultimate }
  if (row.mode === 'twist') return { ...common, strength: null, limit: '\\varphi_a', special: 1, symbol: '|\\varphi|', factored: '\\varphi_{lim}' }
  const corner = s.corners.find(k => row.place === `corner ${k.node}`)
  const materials = corner ? corner.walls.map(w => w.material) : s.walls.filter(w => w.wall.id === row.wall).map(w => w.wall.material)
  return {
    ...common, strength: { name: ultimate ? 'Fsu' : 'Fsy', materials },
    special: ultimate ? s.model.factors.special : s.model.factors.specialAtLimit,
    symbol: sym('\\tau', row.mode.startsWith('corner') ? row.place.replace('corner ', '') : row.wall ?? ''),
    factored: ultimate ? '\\tau_{ult}' : '\\tau_{lim}',
  }
}
