/** Every mark of a sketch beside its walls: axes, balloons, dimensions, centroid, shear centre, peak, torque. */
import { arrowhead, at, n, polygon, segment, text, textWidth, unit, type Canvas, type Pixel } from '#shared/calc/drawing/svg-canvas'
import type { Shape } from '#shared/calc/types'

type Of<T extends Shape['type']> = Extract<Shape, { type: T }>
interface Spot { at: readonly [number, number] }

export function drawMark(canvas: Canvas, shape: Shape): string {
  switch (shape.type) {
    case 'path': return drawPath(canvas, shape)
    case 'line': return drawLine(canvas, shape)
    case 'label': return text(canvas, canvas.px(shape.at), shape.text, { anchor: shape.anchor ?? 'start', italic: shape.role === 'axis', size: shape.role === 'axis' ? 12.5 : 11.5, colour: shape.role === 'note' ? canvas.palette.ink3 : canvas.palette.ink, ...(shape.sub ? { sub: shape.sub } : {}) })
    case 'balloon': return drawBalloon(canvas, shape)
    case 'dimension': return drawDimension(canvas, shape)
    case 'centroid': return drawCentroid(canvas, shape)
    case 'shear-centre': return drawShearCentre(canvas, shape)
    case 'peak': return drawPeak(canvas, shape)
    case 'torque': return drawTorque(canvas, shape)
  }
}

function drawPath(canvas: Canvas, shape: Of<'path'>): string {
  return polygon(shape.points.map(canvas.px), `fill="none" stroke="${canvas.palette.ink2}" stroke-width=".8"`, shape.closed)
}

function drawLine(canvas: Canvas, shape: Of<'line'>): string {
  const a = canvas.px(shape.from)
  const b = canvas.px(shape.to)
  const { ink, ink2, ink3 } = canvas.palette
  switch (shape.role) {
    case 'flow': return segment(a, b, ink, 1) + arrowhead(b, a, ink)
    case 'axis': return segment(a, b, ink2, 0.8) + arrowhead(b, a, ink2)
    case 'note': return segment(a, b, ink3, 0.7, '10 3 2 3')
    default: return segment(a, b, ink3, 0.7)
  }
}

function drawBalloon(canvas: Canvas, shape: Of<'balloon'>): string {
  const { palette, mark } = canvas
  const centre = canvas.px(shape.at)
  const radius = Math.max(8.5, 3 + shape.text.length * 3) * mark
  return segment(canvas.px(shape.leaderTo), centre, palette.ink3, 0.7)
    + `<circle cx="${n(centre[0])}" cy="${n(centre[1])}" r="${n(radius)}" fill="${palette.paper}" stroke="${palette.ink2}" stroke-width=".8"/>`
    + text(canvas, [centre[0], centre[1] + 4 * mark], shape.text, { anchor: 'middle' })
}

/** Extension lines, dimension line with slim arrowheads, and the value above the line. */
function drawDimension(canvas: Canvas, shape: Of<'dimension'>): string {
  const { ink3 } = canvas.palette
  const a = canvas.px(shape.from)
  const b = canvas.px(shape.to)
  const along = unit([b[0] - a[0], b[1] - a[1]])
  // A positive offset lies to the left of from→to in section space, whose y runs against that of the screen.
  const side: Pixel = [along[1], -along[0]]
  const offset = shape.offset * canvas.scale
  const sign = Math.sign(offset) || 1
  const move = (p: Pixel, d: number): Pixel => [p[0] + side[0] * d, p[1] + side[1] * d]
  const start = move(a, offset)
  const end = move(b, offset)
  const length = Math.hypot(b[0] - a[0], b[1] - a[1])
  const lines = [[a, start], [b, end]].map(([p, q]) => segment(move(p as Pixel, sign * 3), move(q as Pixel, sign * 4), ink3, 0.7)).join('')
  const middle: Pixel = [(start[0] + end[0]) / 2, (start[1] + end[1]) / 2]
  return lines + dimensionLine(canvas, start, end, along, length) + dimensionText(canvas, middle, along, shape)
}

function dimensionLine(canvas: Canvas, start: Pixel, end: Pixel, along: Pixel, length: number): string {
  const { ink3 } = canvas.palette
  if (length >= 22) return segment(start, end, ink3, 0.7) + arrowhead(start, end, ink3) + arrowhead(end, start, ink3)
  // Too short for two arrowheads inside: they point inwards from outside.
  const before: Pixel = [start[0] - along[0] * 14, start[1] - along[1] * 14]
  const after: Pixel = [end[0] + along[0] * 14, end[1] + along[1] * 14]
  return segment(before, start, ink3, 0.7) + segment(after, end, ink3, 0.7) + arrowhead(start, before, ink3) + arrowhead(end, after, ink3)
}

function dimensionText(canvas: Canvas, middle: Pixel, along: Pixel, { text: value, symbol, sub }: Of<'dimension'>): string {
  let angle = Math.atan2(along[1], along[0]) * 180 / Math.PI
  if (angle > 90) angle -= 180
  if (angle <= -90) angle += 180
  if (Math.abs(angle - 90) < 1e-6) angle = -90
  const up = (angle - 90) * Math.PI / 180
  const place: Pixel = [middle[0] + Math.cos(up) * 4 * canvas.mark, middle[1] + Math.sin(up) * 4 * canvas.mark]
  return text(canvas, place, value, { anchor: 'middle', ground: true, ...(symbol ? { italic: true, size: 13.5 } : {}), ...(sub ? { sub } : {}), rotate: Math.abs(angle) < 1e-6 ? 0 : angle })
}

function drawCentroid(canvas: Canvas, shape: Spot): string {
  const [x, y] = canvas.px(shape.at)
  const { ink, paper } = canvas.palette
  return `<circle cx="${n(x)}" cy="${n(y)}" r="5" fill="${paper}" stroke="${ink}" stroke-width=".9"/>`
    + `<path d="M${n(x)} ${n(y - 5)}A5 5 0 0 1 ${n(x + 5)} ${n(y)}L${at([x, y])}ZM${n(x)} ${n(y + 5)}A5 5 0 0 1 ${n(x - 5)} ${n(y)}L${at([x, y])}Z" fill="${ink}"/>`
    + text(canvas, [x + 9, y + 12], 'C', { ground: true })
}

function drawShearCentre(canvas: Canvas, shape: Of<'shear-centre'>): string {
  const [x, y] = canvas.px(shape.at)
  const { ink } = canvas.palette
  const [right, up] = shape.side ?? [1, 1]
  return `<circle cx="${n(x)}" cy="${n(y)}" r="3.6" fill="none" stroke="${ink}" stroke-width=".9"/>`
    + segment([x - 7, y], [x + 7, y], ink, 0.9) + segment([x, y - 7], [x, y + 7], ink, 0.9)
    + text(canvas, [x + 9 * right, y + (up > 0 ? -6 : 14)], 'S', { ground: true, anchor: right > 0 ? 'start' : 'end' })
}

/** A solid wedge on the face, a leader and a flag with the value. */
function drawPeak(canvas: Canvas, shape: Of<'peak'>): string {
  const [x, y] = canvas.px(shape.at)
  const { ink } = canvas.palette
  const out = unit(shape.away ? [shape.away[0], -shape.away[1]] : [0, -1])
  const { knee, way } = flagPlace(canvas, shape, out)
  const tip: Pixel = [knee[0] + way * flagLength(canvas, shape.text), knee[1]]
  const base: Pixel = [x + out[0] * 8.5, y + out[1] * 8.5]
  return segment([x, y], knee, ink, 0.7) + segment(knee, tip, ink, 0.7)
    + polygon([[x + out[0] * 0.5, y + out[1] * 0.5], [base[0] - out[1] * 4.5, base[1] + out[0] * 4.5], [base[0] + out[1] * 4.5, base[1] - out[0] * 4.5]], `fill="${ink}"`)
    + text(canvas, [way > 0 ? knee[0] + 2 : tip[0] + 2, knee[1] - 4], shape.text, { weight: 600, ground: true })
}

const flagLength = (canvas: Canvas, value: string) => textWidth(value, 11.5 * canvas.mark) * 1.12 + 6

/** The place the sketch chose; without one the flag stands aside of the face and turns where the edge is near. */
function flagPlace(canvas: Canvas, { at: peak, text: value, flag }: Of<'peak'>, out: Pixel): { knee: Pixel, way: number } {
  if (flag) return { knee: canvas.px(flag.knee), way: flag.end[0] < flag.knee[0] ? -1 : 1 }
  const [x, y] = canvas.px(peak)
  const wanted = out[0] < -0.3 ? -1 : 1
  const tip = (way: number) => x + way * (26 + flagLength(canvas, value))
  const way = tip(wanted) > 4 && tip(wanted) < canvas.width - 4 ? wanted : -wanted
  return { knee: [x + way * 26, y + (out[1] > 0.3 ? 26 : -26)], way }
}

/** Right-hand about z, which points out of the page: counter-clockwise, over the top. */
function drawTorque(canvas: Canvas, shape: Of<'torque'>): string {
  const [x, y] = canvas.px(shape.at)
  const r = shape.radius * canvas.scale
  const { accent } = canvas.palette
  const point = (degrees: number): Pixel => [x + r * Math.cos(degrees * Math.PI / 180), y - r * Math.sin(degrees * Math.PI / 180)]
  const start = point(35)
  const end = point(143)
  return `<path d="M${at(start)}A${n(r)} ${n(r)} 0 0 0 ${at(end)}" fill="none" stroke="${accent}" stroke-width="1.3"/>`
    + arrowhead(point(147), point(137), accent, 8.5, 1.8)
    + text(canvas, [x, y - r - 7], shape.text, { anchor: 'middle', weight: 600, colour: accent })
}
