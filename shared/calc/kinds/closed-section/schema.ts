/** Stored inputs of a closed section: a wall table whose walls close one or more cells, what holds its contour, and the bar tail. */
import { z } from 'zod'
import { barFields } from '#shared/calc/parts/bar-fields'
import { choice, identifier, optionalQuantity, quantity, unitSystem } from '#shared/calc/parts/fields'
import { junctions, start, walls } from '#shared/calc/parts/wall-fields'

export const MAX_JOINTS = 20

const joint = z.strictObject({
  wall: identifier.meta({ title: 'Wall', description: 'The wall along which the joint runs.' }),
  pitch: quantity('Pitch', 'length', { symbol: 's', description: 'Distance of fasteners or spots along the bar.' }),
})

export const closedSectionSchema = z.strictObject({
  units: unitSystem,
  start,
  walls,
  junctions,
  joints: z.array(joint).max(MAX_JOINTS).meta({ title: 'Joints', description: 'Rows of fasteners or spot welds that close a cell.' }),
  diaphragmSpacing: optionalQuantity('Spacing of diaphragms', 'length', { description: 'Ribs, frames or plugs that hold the shape of the cells.' }),
  diaphragmAtLoad: optionalQuantity('From a load to the next diaphragm', 'length', { description: 'Zero where each load enters at a diaphragm.' }),
  root: choice('Root', ['free', 'built in', 'unknown'], 'Whether an end is held against warping.'),
  ...barFields,
})

export type ClosedSectionInputs = z.infer<typeof closedSectionSchema>
