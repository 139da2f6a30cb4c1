/** Torques by case, an imposed rate of twist, and the factors in force, as a calculation holds them. */
import { z } from 'zod'
import { choice, declared, identifier, name, optionalQuantity, paragraph, quantity, source, typedNumber } from '#shared/calc/parts/fields'

export const MAX_CASES = 200

export const level = choice('Load level', ['limit', 'ultimate'])
const torque = quantity('Torque', 'torque', { symbol: 'T' })
const rate = quantity('Rate of twist', 'rateOfTwist', { symbol: '\\theta\'' })
const temperature = optionalQuantity('Temperature', 'temperature', { symbol: '\\vartheta' })

/** What every load case says of itself, whatever it loads. */
export const caseHead = { id: identifier, title: name, source, level, temperature }

/** One torque, a table of torques, a table of imposed rates of twist, or the cases of another calculation or record of the note. */
export const loading = z.discriminatedUnion('by', [
  z.strictObject({ by: z.literal('torque'), torque, level, temperature, source }),
  z.strictObject({ by: z.literal('cases'), cases: z.array(z.strictObject({ ...caseHead, torque })).max(MAX_CASES) }),
  z.strictObject({ by: z.literal('rate'), cases: z.array(z.strictObject({ ...caseHead, rate })).max(MAX_CASES) }),
  z.strictObject({ by: z.literal('table'), table: z.uuid(), quantity: z.string().min(1).max(40) }),
]).meta({ title: 'Loading', part: 'loading' })

export const factors = z.strictObject({
  /** Factor of safety from limit to ultimate. */
  ultimate: typedNumber,
  /** Special factors, empty where none applies; the highest one is used, never the product. */
  fitting: typedNumber,
  casting: typedNumber,
  bearing: typedNumber,
  onLimit: declared('The special factor acts at limit too'),
  /** A case given at ultimate may be divided by the factor of safety for the yield and twist checks. */
  divideUltimate: declared('Ultimate cases may be divided by the factor of safety'),
  /** The basis works with partial factors; `reason` then carries its paragraph. */
  partial: declared('The basis works with partial factors'),
  reason: paragraph,
}).meta({ title: 'Factors', part: 'factors' })

export type LoadingInput = z.infer<typeof loading>
export type FactorsInput = z.infer<typeof factors>
