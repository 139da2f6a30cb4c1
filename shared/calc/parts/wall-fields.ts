/**
 * A wall table: straight and arc walls between named nodes.
 * The first wall starts at `start`; every other wall starts or ends at a node that another wall has
 * placed. Directions are degrees from +x, counter-clockwise; a sweep is positive counter-clockwise.
 */
import { z } from 'zod'
import { choice, identifier, name, quantity } from '#shared/calc/parts/fields'

export const MAX_WALLS = 100

const direction = quantity('Direction', 'angle', { description: 'From +x, counter-clockwise; of an arc, its tangent at the start.' })
const x = quantity('x', 'length')
const y = quantity('y', 'length')

const wallEnd = z.discriminatedUnion('by', [
  z.strictObject({ by: z.literal('point'), x, y }),
  z.strictObject({ by: z.literal('length'), length: quantity('Length', 'length'), direction }),
  z.strictObject({ by: z.literal('arc'), radius: quantity('Mid-line radius', 'length'), sweep: quantity('Swept angle', 'angle'), direction }),
])

const wall = z.strictObject({
  id: identifier, name, from: identifier, to: identifier, end: wallEnd, t: quantity('Thickness', 'length', { symbol: 't' }), material: identifier,
})

/** A wall whose thickness may change along it. */
const taperingWall = wall.extend({ tEnd: quantity('Thickness at its end', 'length', { symbol: 't_2', description: 'Only of a wall that tapers; linear along it.' }).nullable().optional() })

/** Inside radius at a node where walls meet: a machined fillet, or the inside radius of a bend. */
const junction = z.strictObject({ node: identifier, radius: quantity('Inside radius', 'length', { symbol: 'r' }), make: choice('Make', ['machined', 'bent']) })

export const start = z.strictObject({ x, y })
export const walls = z.array(wall).max(MAX_WALLS).meta({ title: 'Walls', part: 'walls' })
export const taperingWalls = z.array(taperingWall).max(MAX_WALLS).meta({ title: 'Walls', part: 'walls' })
export const junctions = z.array(junction).max(MAX_WALLS).meta({ title: 'Corners', part: 'junctions' })

export type WallInput = z.infer<typeof taperingWall>
export type WallEndInput = WallInput['end']
export type JunctionInput = z.infer<typeof junction>
/** Whether the walls of a kind may taper. */
export const mayTaper = (schema: z.ZodType): boolean => schema instanceof z.ZodObject && schema.shape.walls === taperingWalls

/** What `parseWalls` reads of a calculation's inputs. */
export interface WallTable { start: z.infer<typeof start>, walls: WallInput[], junctions: JunctionInput[] }
