import type { Content } from 'pdfmake/interfaces'
import { INK3 } from '#server/pdf/definition/colours'
import { setEquation } from '#server/pdf/equations'
import { equationRun, PAGE } from '#server/pdf/typeset'

interface EquationPlace { margin: [number, number, number, number], label?: string | undefined, size?: number }

/** An equation on a line of its own, made smaller where it would run over the measure. */
export function blockEquation(tex: string, { margin, label, size = 10.5 }: EquationPlace): Content {
  const room = PAGE.measure - margin[0] - margin[2] - (label ? 40 : 0)
  const natural = setEquation(tex, size, true)
  const fitted = natural.width > room ? setEquation(tex, size * room / natural.width, true) : natural
  const set = { text: [equationRun(fitted)] } as Content
  if (!label) return { ...set as object, margin } as Content
  return { columns: [{ width: '*', ...set as object }, { width: 40, text: label, alignment: 'right', color: INK3, margin: [0, Math.max(0, (fitted.height - 14) / 2), 0, 0] }], margin } as Content
}
