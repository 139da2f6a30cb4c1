import { mathjax } from 'mathjax-full/js/mathjax.js'
import { liteAdaptor } from 'mathjax-full/js/adaptors/liteAdaptor.js'
import { RegisterHTMLHandler } from 'mathjax-full/js/handlers/html.js'
import type { LiteElement } from 'mathjax-full/js/adaptors/lite/Element.js'
import { TeX } from 'mathjax-full/js/input/tex.js'
import { SVG } from 'mathjax-full/js/output/svg.js'
import 'mathjax-full/js/input/tex/ams/AmsConfiguration.js'
import { glyphsOf, type Glyph } from '#server/pdf/equation-glyphs'

/** An equation as vectors. Lengths in points. */
export interface Equation {
  tex: string
  width: number
  height: number
  /** How far it reaches below the baseline. */
  depth: number
  size: number
  /** Outlines in thousandths of the size, y upwards from the baseline; null where it holds more than outlines and bars. */
  glyphs: Glyph[] | null
  /** The same as a picture, for what `glyphs` cannot say. */
  svg: () => string
}

/** An ex of the mathematics face, in ems. */
const EX = 0.442
const INK = '#1C2733'

const adaptor = liteAdaptor()
RegisterHTMLHandler(adaptor)
// Paths are written out where they stand: no references have to be followed.
const typesetter = mathjax.document('', {
  InputJax: new TeX({ packages: ['base', 'ams'], maxBuffer: 20_000, maxMacros: 1000, formatError: (_jax: unknown, error: Error) => { throw error } }),
  OutputJax: new SVG({ fontCache: 'none' }),
})

/**
 * Sets TeX (base and ams) as vectors at a size in points.
 * @throws Error with the fault TeX finds, naming the equation.
 */
export function setEquation(tex: string, size: number, display = false): Equation {
  const svg = convert(tex, display)
  const inPoints = (name: 'width' | 'height') => Number.parseFloat(adaptor.getAttribute(svg, name)) * EX * size
  const [width, height] = [inPoints('width'), inPoints('height')]
  const drop = /vertical-align:\s*(-?[\d.]+)ex/.exec(adaptor.getAttribute(svg, 'style') ?? '')
  const depth = -Number.parseFloat(drop?.[1] ?? '0') * EX * size
  return { tex, width, height, depth, size, glyphs: glyphsOf(svg), svg: () => picture(svg, width, height) }
}

function picture(svg: LiteElement, width: number, height: number): string {
  adaptor.setAttribute(svg, 'width', String(width))
  adaptor.setAttribute(svg, 'height', String(height))
  adaptor.removeAttribute(svg, 'style')
  return adaptor.outerHTML(svg).replaceAll('currentColor', INK)
}

function convert(tex: string, display: boolean): LiteElement {
  try {
    const set = typesetter.convert(tex, { display, em: 16, ex: 16 * EX, containerWidth: 80 * 16 }) as LiteElement
    return adaptor.firstChild(set) as LiteElement
  } catch (fault) {
    throw new Error(`The equation ${tex} cannot be set: ${fault instanceof Error ? fault.message : String(fault)}`)
  }
}
