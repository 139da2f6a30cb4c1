import type { ZodError } from 'zod'

/** Faults of a form by field, the first of each: the same sentences the server would give. */
export function fieldFaults(error: ZodError): Record<string, string> {
  const faults: Record<string, string> = {}
  for (const issue of error.issues) faults[issue.path.join('.')] ??= issue.message
  return faults
}
