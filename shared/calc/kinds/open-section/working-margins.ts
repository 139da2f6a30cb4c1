/** Strengths at the temperature of the case, factored stresses and margins: the least of each mode. */
import type { MarginRow, WorkingLine, WorkingStep } from '#shared/calc/types'
import type { KnockdownPoint, MaterialModel } from '#shared/calc/kinds/open-section/model'
import type { CaseSolution, Solution } from '#shared/calc/kinds/open-section/solution'
import { line, num, qty, res, sym } from '#shared/calc/kinds/open-section/tex'
import { leastOfModes } from '#shared/calc/kinds/open-section/working-cases'
import { showMargin } from '#shared/units/display'

export function marginSteps(s: Solution): WorkingStep[] {
  return leastOfModes(s).flatMap((row): WorkingStep[] => {
    const c = s.cases.find(one => one.model.id === row.caseId)
    if (!c) return []
    const where = row.mode === 'twist' ? '' : `, ${row.place}`
    return [{ heading: `${row.modeLabel}: least margin${where}, case ${row.caseId}`, method: row.mode === 'twist' ? '§7.8' : '§7.3', lines: [...allowable(s, c, row), ...applied(s, c, row), margin(s, c, row)] }]
  })
}

const isUltimate = (row: MarginRow) => row.level === 'ultimate'

function allowable(s: Solution, c: CaseSolution, row: MarginRow): WorkingLine[] {
  if (row.mode === 'twist') return []
  const m = materialBehind(s, c, row)
  if (!m) return []
  const k = c.knockdown.get(m.id) ?? 1
  const index = isUltimate(row) ? 'su' : 'sy'
  const strength = isUltimate(row) ? m.Fsu : m.Fsy
  if (strength === null) return []
  const fromTension = !isUltimate(row) && !m.FsyGiven && m.Fty !== null
    ? [line('F_{sy} = \\frac{F_{ty}}{\\sqrt3}', `\\frac{${qty(m.Fty, 'MPa')}}{\\sqrt3}`, res(strength, 'MPa'))]
    : []
  if (k === 1) return fromTension.length > 0 ? fromTension : [line(`F_{${index}}`, `\\text{${m.id.replaceAll('_', '\\_')}}`, res(strength, 'MPa'))]
  return [...fromTension, ...interpolation(m, c), line(`F_{${index}}(\\vartheta) = k\\,F_{${index}}`, `${num(k)}\\cdot ${qty(strength, 'MPa')}`, res(strength * k, 'MPa'))]
}

/** The material whose strength the row was judged by: the wall's own, at a corner the weaker one. */
function materialBehind(s: Solution, c: CaseSolution, row: MarginRow): MaterialModel | null {
  const corner = s.corners.find(k => row.place === `corner ${k.node}`)
  const candidates = corner ? corner.walls.map(w => w.material) : s.walls.filter(w => w.wall.id === row.wall).map(w => w.wall.material)
  const strength = (m: MaterialModel) => ((isUltimate(row) ? m.Fsu : m.Fsy) ?? Infinity) * (c.knockdown.get(m.id) ?? 1)
  return candidates.reduce<MaterialModel | null>((low, m) => low === null || strength(m) < strength(low) ? m : low, null)
}

function interpolation(m: MaterialModel, c: CaseSolution): WorkingLine[] {
  const T = c.model.temperature?.value
  if (T === undefined) return []
  const above = m.knockdown.findIndex(p => p.temperature >= T)
  const [lower, upper]: (KnockdownPoint | undefined)[] = [m.knockdown[above - 1], m.knockdown[above]]
  if (!lower || !upper || upper.temperature === T) return []
  return [line('k = k_1 + (k_2 - k_1)\\frac{\\vartheta - \\vartheta_1}{\\vartheta_2 - \\vartheta_1}',
    `${num(lower.factor)} + (${num(upper.factor)} - ${num(lower.factor)})\\frac{${num(T)} - ${num(lower.temperature)}}{${num(upper.temperature)} - ${num(lower.temperature)}}`,
    num(c.knockdown.get(m.id) ?? 1))]
}

/** Factor from the level given to the level of the row, and the special factor in force there. */
function factorsOf(s: Solution, c: CaseSolution, row: MarginRow): { toLevel: number, special: number } {
  const toLevel = isUltimate(row) ? c.toUltimate : c.toLimit
  if (row.mode === 'twist') return { toLevel, special: 1 }
  return { toLevel, special: isUltimate(row) ? s.model.factors.special : s.model.factors.specialAtLimit }
}

/** The symbol of what was computed for the case, before any factor. */
function unfactored(row: MarginRow): string {
  if (row.mode === 'twist') return '|\\varphi|'
  return sym('\\tau', row.mode.startsWith('corner') ? row.place.replace('corner ', '') : row.wall ?? '')
}

const isFactored = ({ toLevel, special }: { toLevel: number, special: number }) => toLevel !== 1 || special !== 1

function factored(row: MarginRow): string {
  return row.mode === 'twist' ? '\\varphi_{lim}' : isUltimate(row) ? '\\tau_{ult}' : '\\tau_{lim}'
}

/** What the stress or twist of the case becomes at the level of the row; no line where no factor acts. */
function applied(s: Solution, c: CaseSolution, row: MarginRow): WorkingLine[] {
  const factors = factorsOf(s, c, row)
  if (!isFactored(factors)) return []
  const { toLevel, special } = factors
  const unit = row.mode === 'twist' ? 'rad' : 'MPa'
  const FS = num(s.model.factors.ultimate)
  const level = toLevel === 1 ? ['', ''] : toLevel > 1 ? ['\\,f_{FS}', `\\cdot ${FS}`] : ['/f_{FS}', `/${FS}`]
  return [line(
    `${factored(row)} = ${unfactored(row)}${level[0]}${special === 1 ? '' : '\\,f_{sp}'}`,
    `${qty(row.applied / (toLevel * special), unit)}${level[1]}${special === 1 ? '' : `\\cdot ${num(special)}`}`, res(row.applied, unit),
  )]
}

function margin(s: Solution, c: CaseSolution, row: MarginRow): WorkingLine {
  const unit = row.mode === 'twist' ? 'rad' : 'MPa'
  const k = row.mode === 'twist' ? 1 : c.knockdown.get(materialBehind(s, c, row)?.id ?? '') ?? 1
  const strength = isUltimate(row) ? 'F_{su}' : 'F_{sy}'
  const top = row.mode === 'twist' ? '\\varphi_a' : `${strength}${k === 1 ? '' : '(\\vartheta)'}`
  const bottom = isFactored(factorsOf(s, c, row)) ? factored(row) : unfactored(row)
  const shown = showMargin(row.ms).replace('\u2212', '-').replace('>', '{>}')
  return line(`MS = \\frac{${top}}{${bottom}} - 1`, `\\frac{${qty(row.allowable, unit)}}{${qty(row.applied, unit)}} - 1`, `${num(row.ms ?? 0).replace(/^\((.*)\)$/, '$1')}\\quad\\text{shown as }${shown}`)
}
