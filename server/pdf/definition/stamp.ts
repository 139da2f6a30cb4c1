import type { Content } from 'pdfmake/interfaces'
import { CAUTION, INK2, PASS, STOP } from '#server/pdf/definition/colours'

const COLOURS: Record<string, string> = { released: PASS, withdrawn: STOP, superseded: INK2, abandoned: INK2 }

/** The state in a double rule, tilted as a hand would set it. */
export function stamp(state: string, day: string | null): Content {
  const colour = COLOURS[state] ?? CAUTION
  const words = state.toUpperCase()
  const width = 118
  const dashed = state === 'superseded' ? ' stroke-dasharray="4 2"' : ''
  const box = (inset: number, weight: number) =>
    `<rect x="${8 + inset}" y="${8 + inset}" width="${width - 16 - 2 * inset}" height="${42 - 2 * inset}" rx="1.5" fill="none" stroke="${colour}" stroke-width="${weight}"${dashed}/>`
  const text = (y: number, size: number, weight: string, spacing: number, value: string) =>
    `<text x="${width / 2}" y="${y}" text-anchor="middle" font-family="Source Serif" font-size="${size}" font-weight="${weight}" letter-spacing="${spacing}" fill="${colour}">${value}</text>`
  const lines = day ? text(29, words.length > 10 ? 10 : 12, 'bold', 1.6, words) + text(42, 9, 'normal', 0.3, day) : text(34, words.length > 10 ? 10 : 12, 'bold', 1.6, words)
  return {
    svg: `<svg xmlns="http://www.w3.org/2000/svg" width="${width}" height="58" viewBox="0 0 ${width} 58"><g transform="rotate(-2.2 ${width / 2} 29)">${box(0, 0.75)}${box(2.5, 1.7)}${lines}</g></svg>`,
    width, alignment: 'right',
  }
}
