/**
 * Stored inputs of an open section: what a person typed (text and unit), names and choices.
 * Nothing here is a converted number: the server parses the typed text at every evaluation.
 */
import { z } from 'zod'
import { declarationFields } from '#shared/calc/parts/declaration-fields'
import { choice, declared, optionalQuantity, source, unitSystem } from '#shared/calc/parts/fields'
import { factors, loading } from '#shared/calc/parts/loading-fields'
import { materials } from '#shared/calc/parts/material-fields'
import { profile } from '#shared/calc/parts/profile-fields'
import { junctions, start, taperingWalls } from '#shared/calc/parts/wall-fields'

const declarations = z.strictObject({
  ...declarationFields,
  builtIn: declared('A support holds the section', 'A support is built in, or holds the section in twist by more than a point.'),
})

export const openSectionSchema = z.strictObject({
  units: unitSystem,
  start,
  walls: taperingWalls,
  junctions,
  /** Given, the walls follow from it, and the wall table rests as it was. */
  profile: profile.optional(),
  materials,
  loading,
  length: optionalQuantity('Length of the bar', 'length', { symbol: 'L' }),
  twistAllowed: optionalQuantity('Twist allowed', 'angle', { symbol: '\\varphi_a' }),
  twistOrigin: source,
  factors,
  ends: choice('Ends', ['free', 'restrained', 'unknown'], 'Whether the ends are free to warp.'),
  declarations,
})

export type OpenSectionInputs = z.infer<typeof openSectionSchema>
