/** Small pieces every mark is made of. Only presentation attributes: the same text serves a page and a PDF. */
import type { Palette } from '#shared/calc/drawing/svg-theme'

export type Pixel = readonly [number, number]

export interface Canvas {
  palette: Palette
  /** From section space (mm, y upwards) to pixels. */
  px: (point: readonly [number, number]) => Pixel
  /** Pixels per millimetre. */
  scale: number
  /** Multiplies lettering and marks on small drawings. */
  mark: number
  width: number
  height: number
}

export const SANS = 'Source Sans 3, Source Sans Pro, sans-serif'
export const SERIF = 'Source Serif 4, Source Serif Pro, serif'

/** Text from people stands in these drawings: every string passes here. */
export function escapeXml(text: string): string {
  return text
    // Control characters are not allowed in XML at all, so they are left out.
    .split('').filter(c => c >= ' ' || c === '\t').join('')
    .replace(/&/g, '&amp;').replace(/</g, '&lt;').replace(/>/g, '&gt;').replace(/"/g, '&quot;').replace(/'/g, '&#39;')
}

/** A coordinate with two decimals; anything not finite would break the drawing and becomes 0. */
export function n(value: number): string {
  return Number.isFinite(value) ? String(Math.round(value * 100) / 100) : '0'
}

export const at = ([x, y]: Pixel) => `${n(x)} ${n(y)}`

export function polygon(points: readonly Pixel[], attributes: string, closed = true): string {
  return points.length < 2 ? '' : `<path d="M${points.map(at).join('L')}${closed ? 'Z' : ''}" ${attributes}/>`
}

export function segment(a: Pixel, b: Pixel, colour: string, width: number, dash = ''): string {
  return `<path d="M${at(a)}L${at(b)}" fill="none" stroke="${colour}" stroke-width="${n(width)}"${dash ? ` stroke-dasharray="${dash}"` : ''}/>`
}

/** A slim solid arrowhead with its point at `tip`, coming from `from`. */
export function arrowhead(tip: Pixel, from: Pixel, colour: string, length = 7, half = 1.4): string {
  const [ux, uy] = unit([tip[0] - from[0], tip[1] - from[1]])
  const back: Pixel = [tip[0] - ux * length, tip[1] - uy * length]
  return polygon([tip, [back[0] - uy * half, back[1] + ux * half], [back[0] + uy * half, back[1] - ux * half]], `fill="${colour}"`)
}

export function unit([x, y]: Pixel): Pixel {
  const size = Math.hypot(x, y)
  return size > 0 ? [x / size, y / size] : [1, 0]
}

export interface TextStyle { anchor?: 'start' | 'middle' | 'end', colour?: string, size?: number, weight?: number, italic?: boolean, ground?: boolean, rotate?: number, /** An index under the line behind it. */ sub?: string }

/** One line of lettering. `ground` lays paper behind it so that it reads over a line. */
export function text(canvas: Canvas, place: Pixel, value: string, style: TextStyle = {}): string {
  const size = (style.size ?? 11.5) * canvas.mark
  const anchor = style.anchor ?? 'start'
  const turn = style.rotate ? ` transform="rotate(${n(style.rotate)} ${at(place)})"` : ''
  const look = `font-family="${style.italic ? SERIF : SANS}" font-size="${n(size)}"${style.italic ? ' font-style="italic"' : ''}${style.weight ? ` font-weight="${style.weight}"` : ''}`
  const letters = `<text x="${n(place[0])}" y="${n(place[1])}" text-anchor="${anchor}" fill="${style.colour ?? canvas.palette.ink}" ${look}${turn}>${escapeXml(value)}${style.sub ? `<tspan dy="${n(size * 0.22)}" font-size="${n(size * 0.74)}">${escapeXml(style.sub)}</tspan>` : ''}</text>`
  return style.ground ? groundBehind(canvas, place, value + (style.sub ?? ''), size, anchor, turn) + letters : letters
}

/** Lettering of this face is about half as wide as it is high. */
export const textWidth = (value: string, size: number) => value.length * size * 0.5

function groundBehind(canvas: Canvas, [x, y]: Pixel, value: string, size: number, anchor: string, turn: string): string {
  const width = textWidth(value, size) + 3
  const left = anchor === 'middle' ? x - width / 2 : anchor === 'end' ? x - width : x - 1.5
  return `<rect x="${n(left)}" y="${n(y - size * 0.82)}" width="${n(width)}" height="${n(size * 1.02)}" fill="${canvas.palette.paper}"${turn}/>`
}
