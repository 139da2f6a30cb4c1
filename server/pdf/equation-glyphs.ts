import type { LiteElement, LiteNode } from 'mathjax-full/js/adaptors/lite/Element.js'

/** An outline or a bar of an equation, placed: x to the right, y upwards, scaled by `scale`. */
export type Glyph
  = | { kind: 'outline', path: string, x: number, y: number, scaleX: number, scaleY: number }
    | { kind: 'bar', x: number, y: number, width: number, height: number }

interface Place { x: number, y: number, scaleX: number, scaleY: number }
const TRANSFORM = /(translate|scale)\(\s*(-?[\d.]+)(?:[\s,]+(-?[\d.]+))?\s*\)/g

/** The place inside a transform; null where it turns or slants. */
function moved(place: Place, transform: string | undefined): Place | null {
  if (!transform) return place
  let { x, y, scaleX, scaleY } = place
  if (transform.replace(TRANSFORM, '').trim() !== '') return null
  for (const [, verb, first = '0', second] of transform.matchAll(TRANSFORM)) {
    if (verb === 'translate') {
      x += Number(first) * scaleX
      y += Number(second ?? '0') * scaleY
    } else {
      scaleX *= Number(first)
      scaleY *= Number(second ?? first)
    }
  }
  return { x, y, scaleX, scaleY }
}

const isElement = (node: LiteNode): node is LiteElement => 'children' in node
const attribute = (element: LiteElement, name: string): string | undefined => element.attributes[name] as string | undefined

/**
 * Reads outlines and bars out of an equation that was set as SVG. Almost all
 * equations are made of nothing else; null for those that are (words in other
 * alphabets, frames, stretched braces), which are then drawn as a picture.
 */
export function glyphsOf(svg: LiteElement): Glyph[] | null {
  const glyphs: Glyph[] = []
  // The outermost group turns y upwards, which is how a PDF counts it.
  const group = svg.children.find(isElement)
  if (!group || attribute(group, 'transform') !== 'scale(1,-1)') return null
  const read = (element: LiteElement, outer: Place): boolean => {
    const place = moved(outer, attribute(element, 'transform'))
    if (!place) return false
    const value = (name: string) => Number(attribute(element, name) ?? '0')
    switch (element.kind) {
      case 'g': return element.children.filter(isElement).every(child => read(child, place))
      case 'path': {
        const path = attribute(element, 'd') ?? ''
        if (path !== '') glyphs.push({ kind: 'outline', path, ...place })
        return true
      }
      case 'rect': {
        if (attribute(element, 'fill') === 'none' || attribute(element, 'stroke-width') !== undefined) return false
        glyphs.push({ kind: 'bar', x: place.x + value('x') * place.scaleX, y: place.y + value('y') * place.scaleY, width: value('width') * place.scaleX, height: value('height') * place.scaleY })
        return true
      }
      default: return false
    }
  }
  return group.children.filter(isElement).every(child => read(child, { x: 0, y: 0, scaleX: 1, scaleY: 1 })) ? glyphs : null
}

const NUMBER = /-?\d*\.?\d+(?:e-?\d+)?/gi
const shown = (value: number) => String(Math.round(value * 1000) / 1000)

/** An outline (absolute M, L, H, V, C, Q, T, Z) as operators of a PDF page: quadratic curves become cubic ones. */
export function outlineOperators(path: string): string {
  const out: string[] = []
  let [x, y, controlX, controlY] = [0, 0, 0, 0]
  const line = (toX: number, toY: number, operator = 'l') => {
    out.push(`${shown(toX)} ${shown(toY)} ${operator}`)
    ;[x, y, controlX, controlY] = [toX, toY, toX, toY]
  }
  const quadratic = (cx: number, cy: number, toX: number, toY: number) => {
    const between = (from: number, control: number) => from + 2 / 3 * (control - from)
    out.push(`${[between(x, cx), between(y, cy), between(toX, cx), between(toY, cy), toX, toY].map(shown).join(' ')} c`)
    ;[x, y, controlX, controlY] = [toX, toY, cx, cy]
  }
  for (const [, command = '', rest = ''] of path.matchAll(/([A-Za-z])([^A-Za-z]*)/g)) {
    const [a = 0, b = 0, c = 0, d = 0] = (rest.match(NUMBER) ?? []).map(Number)
    switch (command) {
      case 'M': line(a, b, 'm'); break
      case 'L': line(a, b); break
      case 'H': line(a, y); break
      case 'V': line(x, a); break
      case 'Q': quadratic(a, b, c, d); break
      case 'T': quadratic(2 * x - controlX, 2 * y - controlY, a, b); break
      case 'Z': out.push('h'); break
      default: throw new Error(`An outline holds the unknown command ${command}.`)
    }
  }
  return out.join('\n')
}
