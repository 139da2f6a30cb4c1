import type { z } from 'zod'
import type { Fault } from '#shared/calc/types'

/** Most faults of one schema that are told at once. */
const MOST = 50

/** What a schema refused, as faults at the fields. */
export const schemaFaults = (error: z.ZodError): Fault[] =>
  error.issues.slice(0, MOST).map(issue => ({ path: issue.path.join('.'), message: issue.message }))
