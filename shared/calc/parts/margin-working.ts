/** The lines from a strength and a computed action to a margin, with every factor between them (methods §7). */
import type { MarginRow, WorkingLine } from '#shared/calc/types'
import type { KnockdownPoint, MaterialModel } from '#shared/calc/parts/model'
import { knockdownOf, type StrengthName } from '#shared/calc/parts/strength'
import { line, num, qty, res } from '#shared/calc/parts/tex'
import { showMargin } from '#shared/units/display'
import { engineUnit } from '#shared/units/units'

/** What lies behind one margin row. */
export interface MarginSource {
  row: MarginRow
  /** The strength judged by and the materials that may give it, the weakest of which does; none for a limit that is typed. */
  strength: { name: StrengthName, materials: readonly MaterialModel[] } | null
  /** Symbol of a typed limit, e.g. `\varphi_a`; used where `strength` is null. */
  limit?: string
  temperature: number | undefined
  /** From the level given to the level of the row, and the special factor in force there. */
  toLevel: number
  special: number
  /** f_FS, for the line that applies it. */
  safety: number
  /** Symbol of the computed action before any factor, and after. */
  symbol: string
  factored: string
}

const INDEX: Record<StrengthName, string> = { Fsu: 'su', Fsy: 'sy', Ftu: 'tu', Fty: 'ty' }

export function marginLines(source: MarginSource): WorkingLine[] {
  return [...allowableLines(source), ...appliedLines(source), marginLine(source)]
}

/** The material whose strength the row was judged by: the weakest at the temperature of the case. */
function weakest({ strength, temperature }: MarginSource): MaterialModel | null {
  if (!strength) return null
  const value = (m: MaterialModel) => (m[strength.name] ?? Infinity) * knockdownOf(m, temperature)
  return strength.materials.reduce<MaterialModel | null>((low, m) => low === null || value(m) < value(low) ? m : low, null)
}

function allowableLines(source: MarginSource): WorkingLine[] {
  const m = weakest(source)
  if (!m || !source.strength) return []
  const { name } = source.strength
  const value = m[name]
  if (value === null) return []
  const k = knockdownOf(m, source.temperature)
  const fromTension = name === 'Fsy' && !m.FsyGiven && m.Fty !== null
    ? [line('F_{sy} = \\frac{F_{ty}}{\\sqrt3}', `\\frac{${qty(m.Fty, 'MPa')}}{\\sqrt3}`, res(value, 'MPa'))]
    : []
  if (k === 1) return fromTension.length > 0 ? fromTension : [line(`F_{${INDEX[name]}}`, `\\text{${m.id.replaceAll('_', '\\_')}}`, res(value, 'MPa'))]
  return [...fromTension, ...interpolation(m, source.temperature, k), line(`F_{${INDEX[name]}}(\\vartheta) = k\\,F_{${INDEX[name]}}`, `${num(k)}\\cdot ${qty(value, 'MPa')}`, res(value * k, 'MPa'))]
}

function interpolation(m: MaterialModel, T: number | undefined, k: number): WorkingLine[] {
  if (T === undefined) return []
  const above = m.knockdown.findIndex(p => p.temperature >= T)
  const [lower, upper]: (KnockdownPoint | undefined)[] = [m.knockdown[above - 1], m.knockdown[above]]
  if (!lower || !upper || upper.temperature === T) return []
  return [line('k = k_1 + (k_2 - k_1)\\frac{\\vartheta - \\vartheta_1}{\\vartheta_2 - \\vartheta_1}',
    `${num(lower.factor)} + (${num(upper.factor)} - ${num(lower.factor)})\\frac{${num(T)} - ${num(lower.temperature)}}{${num(upper.temperature)} - ${num(lower.temperature)}}`,
    num(k))]
}

const isFactored = ({ toLevel, special }: MarginSource) => toLevel !== 1 || special !== 1

/** What the action becomes at the level of the row; no line where no factor acts. */
function appliedLines(source: MarginSource): WorkingLine[] {
  if (!isFactored(source)) return []
  const { row, toLevel, special } = source
  const unit = engineUnit(row.dimension)
  const FS = num(source.safety)
  const level = toLevel === 1 ? ['', ''] : toLevel > 1 ? ['\\,f_{FS}', `\\cdot ${FS}`] : ['/f_{FS}', `/${FS}`]
  return [line(
    `${source.factored} = ${source.symbol}${level[0]}${special === 1 ? '' : '\\,f_{sp}'}`,
    `${qty(row.applied / (toLevel * special), unit)}${level[1]}${special === 1 ? '' : `\\cdot ${num(special)}`}`, res(row.applied, unit),
  )]
}

function marginLine(source: MarginSource): WorkingLine {
  const { row, strength } = source
  const unit = engineUnit(row.dimension)
  const m = weakest(source)
  const hot = m !== null && knockdownOf(m, source.temperature) !== 1
  const top = strength ? `F_{${INDEX[strength.name]}}${hot ? '(\\vartheta)' : ''}` : source.limit ?? '\\text{allowable}'
  const bottom = isFactored(source) ? source.factored : source.symbol
  const shown = showMargin(row.ms).replace('\u2212', '-').replace('>', '{>}')
  return line(`MS = \\frac{${top}}{${bottom}} - 1`, `\\frac{${qty(row.allowable, unit)}}{${qty(row.applied, unit)}} - 1`, `${num(row.ms ?? 0).replace(/^\((.*)\)$/, '$1')}\\quad\\text{shown as }${shown}`)
}
