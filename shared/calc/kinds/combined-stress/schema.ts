/** Stresses that act at one fibre, station and case, and the interaction they are judged by (methods §7.4). */
import { z } from 'zod'
import { declarations } from '#shared/calc/parts/declaration-fields'
import { choice, identifier, name, quantity, unitSystem } from '#shared/calc/parts/fields'
import { caseHead, factors } from '#shared/calc/parts/loading-fields'
import { materials } from '#shared/calc/parts/material-fields'

export const MAX_POINTS = 300
export const MAX_PARTS = 12

const rule = z.discriminatedUnion('by', [
  z.strictObject({ by: z.literal('circle') }).meta({ title: 'R_n² + R_s² = 1' }),
  z.strictObject({ by: z.literal('powers'), a: quantity('Exponent of the normal ratio', 'number', { symbol: 'a' }), b: quantity('Exponent of the shear ratio', 'number', { symbol: 'b' }) }).meta({ title: 'R_n^a + R_s^b = 1' }),
  z.strictObject({ by: z.literal('panel'), Fc: quantity('Allowable normal stress', 'stress', { symbol: 'F_c', description: 'Buckling stress of the panel in compression or bending.' }), Fs: quantity('Allowable shear stress', 'stress', { symbol: 'F_s', description: 'Buckling stress of the panel in shear.' }), loaded: choice('Loaded by', ['compression', 'bending']) }).meta({ title: 'panel buckling' }),
  z.strictObject({ by: z.literal('steady'), steady: choice('Steady part', ['normal', 'shear'], 'The margin is on the other part alone.') }).meta({ title: 'one part steady' }),
  z.strictObject({ by: z.literal('none') }).meta({ title: 'equivalent stress only' }),
]).meta({ title: 'Interaction at ultimate' })

const normal = z.strictObject({ title: name.meta({ title: 'Component' }), sigma: quantity('Normal stress', 'stress', { symbol: '\\sigma', description: 'Tension positive, at this fibre.' }) })

const point = z.strictObject({
  ...caseHead,
  place: name.meta({ title: 'Fibre and station', description: 'The same for every component: what acts elsewhere or in another case does not belong here.' }),
  material: identifier,
  normal: z.array(normal).max(MAX_PARTS).meta({ title: 'Normal stresses' }),
  torsion: quantity('Shear of torsion', 'stress', { symbol: '\\tau_{T}' }),
  warping: quantity('Shear of restrained warping', 'stress', { symbol: '\\tau_\\omega' }),
  direct: quantity('Direct shear', 'stress', { symbol: '\\tau_V' }),
})

export const combinedStressSchema = z.strictObject({
  units: unitSystem,
  rule,
  points: z.array(point).max(MAX_POINTS).meta({ title: 'Points' }),
  materials,
  factors,
  declarations,
})

export type CombinedStressInputs = z.infer<typeof combinedStressSchema>
