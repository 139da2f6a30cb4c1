/** What the author declares of the part, beside its numbers. */
import { z } from 'zod'
import { choice, declared, optionalQuantity } from '#shared/calc/parts/fields'

export const declarationFields = {
  fitting: declared('Fitting', 'The section is a fitting, or carries one, not proven by test.'),
  repeated: declared('Repeated load'),
  cutOut: choice('Cut-out', ['none', 'away from the peak', 'at the peak'], 'A hole, cut-out or slot in the length, and whether it lies where the stress peaks.'),
  taper: optionalQuantity('Half-angle of taper', 'angle'),
  layered: declared('Layered material'),
  welded: declared('Welded in the section'),
}

export const declarations = z.strictObject(declarationFields)
export type DeclarationsInput = z.infer<typeof declarations>
