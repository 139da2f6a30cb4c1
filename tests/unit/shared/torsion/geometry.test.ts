import { describe, expect, it } from 'vitest'
import fc from 'fast-check'
import { arcBetween, arcEnd, arcFromTangent, distance, pathLength, pathPoints, tangentAt, turn, wallEnd } from '#shared/torsion/geometry'

const origin = { x: 0, y: 0 }
const finite = (min: number, max: number) => fc.double({ min, max, noNaN: true })

describe('end points', () => {
  it('are found from length and direction', () => {
    const end = wallEnd({ x: 10, y: 5 }, 20, Math.PI / 2)
    expect(end.x).toBeCloseTo(10, 12)
    expect(end.y).toBeCloseTo(25, 12)
  })

  it('are found from radius and swept angle, to the left and to the right', () => {
    const left = arcEnd(origin, 0, 10, Math.PI / 2)
    expect(left.end.x).toBeCloseTo(10, 12)
    expect(left.end.y).toBeCloseTo(10, 12)
    expect(left.direction).toBeCloseTo(Math.PI / 2, 12)
    const right = arcEnd(origin, 0, 10, -Math.PI)
    expect(right.end.x).toBeCloseTo(0, 12)
    expect(right.end.y).toBeCloseTo(-20, 12)
  })

  it('of an arc given by its tangent and by its nodes are the same arc', () => {
    fc.assert(fc.property(finite(-3, 3), finite(1, 100), finite(-6.2, 6.2), (direction, radius, sweep) => {
      fc.pre(Math.abs(sweep) > 1e-3)
      const { end } = arcEnd(origin, direction, radius, sweep)
      const arc = arcBetween(origin, end, { radius, sweep })
      if ('ok' in arc) throw new Error(arc.reason)
      expect(distance(arc.centre, arcFromTangent(origin, direction, radius, sweep).centre)).toBeLessThan(1e-6 * radius)
      expect(pathLength(arc)).toBeCloseTo(radius * Math.abs(sweep), 9)
      expect(Math.abs(turn(tangentAt(arc, 1) - direction - sweep))).toBeLessThan(1e-6)
    }), { seed: 20_261_012 })
  })
})

describe('angles', () => {
  it('are brought into one turn', () => {
    expect(turn(3 * Math.PI)).toBeCloseTo(Math.PI, 12)
    expect(turn(-Math.PI)).toBeCloseTo(Math.PI, 12)
    expect(turn(0.5 - 4 * Math.PI)).toBeCloseTo(0.5, 12)
  })
})

describe('points for drawing', () => {
  it('start and end where the wall does and lie on it', () => {
    const arc = arcFromTangent(origin, 0, 10, 2)
    const points = pathPoints(arc)
    expect(points[0]).toEqual(origin)
    expect(points).toHaveLength(24)
    for (const point of points) expect(distance(arc.centre, point)).toBeCloseTo(10, 10)
    expect(pathPoints({ kind: 'line', start: origin, end: { x: 1, y: 1 } })).toHaveLength(2)
  })
})
