/** The reference point, the points of application and the torque of the heaviest case. */
import type { SolvedCase } from '#shared/calc/kinds/torque-from-loads/evaluate'
import type { TorqueFromLoadsModel } from '#shared/calc/kinds/torque-from-loads/parse'
import type { Drawing, Shape } from '#shared/calc/types'
import { showQuantity } from '#shared/units/display'

export function torqueFromLoadsSketch(model: TorqueFromLoadsModel, cases: readonly SolvedCase[]): Drawing | null {
  const all = [model.centre, ...model.points.map(one => one.at)]
  const [xs, ys] = [all.map(p => p.x), all.map(p => p.y)]
  const size = Math.max(Math.max(...xs) - Math.min(...xs), Math.max(...ys) - Math.min(...ys))
  if (!(size > 0)) return null
  const heaviest = cases.reduce<SolvedCase | null>((high, one) => (high === null || Math.abs(one.torque) > Math.abs(high.torque) ? one : high), null)
  const [torque, length] = model.units === 'SI' ? ['N·m', 'mm'] as const : ['lbf·in', 'in'] as const
  const largest = Math.max(...(heaviest?.given.forces ?? []).map(({ Vx, Vy }) => Math.hypot(Vx, Vy)), 0)
  const shapes: Shape[] = [
    { type: 'shear-centre', at: [model.centre.x, model.centre.y] },
    ...model.points.map((one): Shape => ({ type: 'balloon', at: [one.at.x + 0.12 * size, one.at.y + 0.12 * size], text: one.id, leaderTo: [one.at.x, one.at.y] })),
    ...(largest > 0 ? heaviest?.given.forces ?? [] : []).filter(({ Vx, Vy }) => Math.hypot(Vx, Vy) > 0).map(({ Vx, Vy, at }): Shape => {
      const k = 0.3 * size / largest
      return { type: 'line', from: [at.x, at.y], to: [at.x + k * Vx, at.y + k * Vy], role: 'flow' }
    }),
    ...model.points.slice(0, 1).map((one): Shape => ({ type: 'dimension', from: [model.centre.x, Math.min(...ys)], to: [one.at.x, Math.min(...ys)], offset: -0.3 * size, text: showQuantity(Math.abs(one.at.x - model.centre.x), 'length', length) })),
    ...(heaviest ? [{ type: 'torque', at: [model.centre.x, model.centre.y], radius: 0.2 * size * Math.sign(heaviest.torque || 1), text: showQuantity(heaviest.torque, 'torque', torque) } satisfies Shape] : []),
  ]
  const room = 0.6 * size
  return {
    shapes, box: { x: Math.min(...xs) - room, y: Math.min(...ys) - room, width: Math.max(...xs) - Math.min(...xs) + 2 * room, height: Math.max(...ys) - Math.min(...ys) + 2 * room },
    alt: `Reference point and ${model.points.length} points of application${heaviest ? `; the torque of case ${heaviest.given.id} is ${showQuantity(heaviest.torque, 'torque', torque)}` : ''}.`,
  }
}
