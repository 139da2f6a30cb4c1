/** The section to scale: walls with their stress, names, dimensions, centroid, shear centre, torque and peak. */
import type { Drawing, Shape } from '#shared/calc/types'
import { decisiveCases } from '#shared/calc/kinds/open-section/working-cases'
import { shownUnits } from '#shared/calc/parts/shown-units'
import { axes, balloons, dimensions, flowArrows, thicknessNotes, type Room } from '#shared/calc/kinds/open-section/sketch-marks'
import { letterSide, peakMark } from '#shared/calc/kinds/open-section/sketch-peak'
import { filletShapes, midLine, polar, wallShapes, type Pt } from '#shared/calc/kinds/open-section/sketch-walls'
import type { CaseSolution, Solution } from '#shared/calc/kinds/open-section/solution'
import { showQuantity, withUnit } from '#shared/units/display'

/** Pixels of the picture at its nominal size, and of the section inside it. */
const PICTURE = 470
const SECTION = { width: 290, height: 190 }
const MOST_NAMED = 12

export function openSectionSketch(s: Solution): Drawing | null {
  const extent = extentOf(s)
  const [width, height] = [extent.max[0] - extent.min[0], extent.max[1] - extent.min[1]]
  const size = Math.max(width, height)
  if (!(size > 0)) return null
  const pixel = 1 / Math.min(SECTION.width / Math.max(width, size * 0.05), SECTION.height / Math.max(height, size * 0.05))
  const shown = decisiveCases(s)[0] ?? null
  const level = (wall: string) => shown && shown.tauMax > 0 ? Math.min((shown.tau.get(wall) ?? 0) / shown.tauMax, 1) : 0
  const room: Room = { pixel, centre: [(extent.min[0] + extent.max[0]) / 2, (extent.min[1] + extent.max[1]) / 2], taken: [] }
  const centres = centreMarks(s, room)
  const measured = dimensions(s, room, extent)
  const peak = shown ? peakMark(s, shown, room) : []
  const marked: Shape[] = [
    ...wallShapes(s, level), ...filletShapes(s, level), ...measured, ...flowArrows(s, room), ...centres, ...peak,
    ...thicknessNotes(s, room), ...balloons(s, room),
  ]
  const shapes = [...marked, ...torqueMark(s, shown, extent, marked, pixel)]
  const unit = shownUnits(s.model).stress
  return {
    shapes, box: boxOf(shapes, pixel), alt: altText(s, shown),
    ...(shown && shown.tauMax > 0 ? { ramp: { max: shown.tauMax, unit, label: `Shear stress at the faces, ${caseName(s, shown)}` } } : {}),
  }
}

function extentOf(s: Solution): { min: Pt, max: Pt } {
  const points = s.walls.flatMap(({ wall }) => midLine(s, wall).map(st => st.at))
  const of = (pick: (...v: number[]) => number, axis: 0 | 1) => pick(...points.map(p => p[axis]))
  return { min: [of(Math.min, 0), of(Math.min, 1)], max: [of(Math.max, 0), of(Math.max, 1)] }
}

function caseName(s: Solution, c: CaseSolution): string {
  return c.model.id === 'T' && s.cases.length === 1 ? `given at ${c.model.level}` : `case ${c.model.id}, given at ${c.model.level}`
}

/** Centroid with the axes, and shear centre. */
function centreMarks(s: Solution, room: Room): Shape[] {
  const p = s.sectorial
  if (!p) return []
  const [C, S]: [Pt, Pt] = [[p.centroid.x, p.centroid.y], [p.shearCentre.x, p.shearCentre.y]]
  room.taken.push({ at: C, radius: 14 * room.pixel }, { at: S, radius: 20 * room.pixel }, { at: polar(C, Math.PI / 4, 20 * room.pixel), radius: 20 * room.pixel })
  return [...axes(C, room), { type: 'centroid', at: C }, { type: 'shear-centre', at: S, side: letterSide(s, S, room) }]
}

/** The torque stands over everything else, above the shear centre where that lies within the width of the section. */
function torqueMark(s: Solution, shown: CaseSolution | null, extent: { min: Pt, max: Pt }, below: Shape[], pixel: number): Shape[] {
  if (!shown || !s.sectorial) return []
  const unit = shown.model.torque?.unit ?? shownUnits(s.model).torque
  const top = Math.max(...below.flatMap(shape => reachOf(shape, pixel)).map(point => point[1]))
  const x = Math.min(Math.max(s.sectorial.shearCentre.x, extent.min[0]), extent.max[0])
  return [{ type: 'torque', at: [x, top - 20 * pixel], radius: 40 * pixel, text: `T ${showQuantity(shown.torque, 'torque', unit)}` }]
}

/** Everything that is drawn, with room for its lettering, at least as wide as the nominal picture. */
function boxOf(shapes: Shape[], pixel: number): Drawing['box'] {
  const points = shapes.flatMap(shape => reachOf(shape, pixel))
  const xs = points.map(p => p[0])
  const ys = points.map(p => p[1])
  const pad = 8 * pixel
  const [left, right] = [Math.min(...xs) - pad, Math.max(...xs) + pad]
  const [bottom, top] = [Math.min(...ys) - pad, Math.max(...ys) + pad]
  const width = Math.max(right - left, PICTURE * pixel)
  return { x: (left + right - width) / 2, y: bottom, width, height: top - bottom }
}

const around = ([x, y]: Pt, dx: number, dy = dx): Pt[] => [[x - dx, y - dy], [x + dx, y + dy]]

function reachOf(shape: Shape, p: number): Pt[] {
  switch (shape.type) {
    case 'path': return shape.points
    case 'line': return [shape.from, shape.to]
    case 'label': return around(shape.at, 4 * p + shape.text.length * 3 * p, 10 * p)
    case 'balloon': return around(shape.at, 11 * p)
    case 'dimension': {
      const along = Math.atan2(shape.to[1] - shape.from[1], shape.to[0] - shape.from[0])
      const out = shape.offset + Math.sign(shape.offset) * 6 * p
      return [shape.from, shape.to].flatMap(end => around(polar(end, along + Math.PI / 2, out), 12 * p))
    }
    case 'centroid': case 'shear-centre': return around(shape.at, 18 * p)
    case 'peak': return [...around(shape.at, 12 * p), ...(shape.flag ? [shape.flag.knee, shape.flag.end].flatMap(end => around(end, 2 * p, 18 * p)) : around(shape.at, 34 * p, 44 * p))]
    case 'torque': return [...around(shape.at, Math.max(shape.radius, shape.text.length * 3.2 * p), 0), [shape.at[0], shape.at[1] + shape.radius + 24 * p]]
  }
}

function altText(s: Solution, c: CaseSolution | null): string {
  const unit = shownUnits(s.model)
  const named = s.walls.slice(0, MOST_NAMED).map(({ wall }) => `${wall.id}${wall.name.trim() === '' ? '' : ` ${wall.name.trim()}`} ${showQuantity(wall.length, 'length', unit.length)} by ${/[a-z]/i.test(wall.t.typed) ? wall.t.typed : withUnit(wall.t.typed, wall.t.unit)}${wall.arc ? ' arc' : ''}`)
  const more = s.walls.length > MOST_NAMED ? `, and ${s.walls.length - MOST_NAMED} more` : ''
  const walls = `Open section to scale with ${s.walls.length} ${s.walls.length === 1 ? 'wall' : 'walls'}: ${named.join('; ')}${more}.`
  const at = (p: { x: number, y: number }) => `x ${showQuantity(p.x, 'length', unit.length)}, y ${showQuantity(p.y, 'length', unit.length)}`
  const centres = s.sectorial ? ` Centroid at ${at(s.sectorial.centroid)}; shear centre at ${at(s.sectorial.shearCentre)}.` : ''
  if (!c) return walls + centres
  const corner = c.tauCorner !== null && c.tauCorner > c.tauMax ? `, and ${showQuantity(c.tauCorner, 'stress', unit.stress)} at corner ${c.tauCornerNode ?? ''}` : ''
  return `${walls}${centres} ${caseName(s, c).replace(/^./, l => l.toUpperCase())}: shear zero on the mid-line and ${showQuantity(c.tauMax, 'stress', unit.stress)} at the faces of wall ${c.tauMaxWall}${corner}.`
}
