import { mathjax } from 'mathjax-full/js/mathjax.js'
import { liteAdaptor } from 'mathjax-full/js/adaptors/liteAdaptor.js'
import { RegisterHTMLHandler } from 'mathjax-full/js/handlers/html.js'
import { TeX } from 'mathjax-full/js/input/tex.js'
import { SVG } from 'mathjax-full/js/output/svg.js'
import 'mathjax-full/js/input/tex/ams/AmsConfiguration.js'

/** An equation as vectors. Lengths in points. */
export interface Equation {
  tex: string
  svg: string
  width: number
  height: number
  /** How far it reaches below the baseline. */
  depth: number
}

/** An ex of the mathematics face, in ems. */
const EX = 0.442

const adaptor = liteAdaptor()
RegisterHTMLHandler(adaptor)
// Paths are written out where they stand: pdfmake's SVG reader then needs no references.
const typesetter = mathjax.document('', {
  InputJax: new TeX({ packages: ['base', 'ams'], maxBuffer: 20_000, maxMacros: 1000, formatError: (_jax: unknown, error: Error) => { throw error } }),
  OutputJax: new SVG({ fontCache: 'none' }),
})

/**
 * Sets TeX (base and ams) as vectors at a size in points.
 * @throws Error with the fault TeX finds, naming the equation.
 */
export function setEquation(tex: string, size: number, display = false, colour = '#1C2733'): Equation {
  const svg = adaptor.firstChild(convert(tex, display)) as Parameters<typeof adaptor.getAttribute>[0]
  const inPoints = (name: 'width' | 'height') => Number.parseFloat(adaptor.getAttribute(svg, name)) * EX * size
  const [width, height] = [inPoints('width'), inPoints('height')]
  const drop = /vertical-align:\s*(-?[\d.]+)ex/.exec(adaptor.getAttribute(svg, 'style') ?? '')
  const depth = -Number.parseFloat(drop?.[1] ?? '0') * EX * size
  adaptor.setAttribute(svg, 'width', String(width))
  adaptor.setAttribute(svg, 'height', String(height))
  adaptor.removeAttribute(svg, 'style')
  return { tex, svg: adaptor.outerHTML(svg).replaceAll('currentColor', colour), width, height, depth }
}

function convert(tex: string, display: boolean) {
  try {
    return typesetter.convert(tex, { display, em: 16, ex: 16 * EX, containerWidth: 80 * 16 }) as Parameters<typeof adaptor.firstChild>[0]
  } catch (fault) {
    throw new Error(`The equation ${tex} cannot be set: ${fault instanceof Error ? fault.message : String(fault)}`)
  }
}
