import { randomUUID } from 'node:crypto'
import { createError, isError, type H3Error } from 'h3'
import { ZodError } from 'zod'
import type { ApiError } from '#shared/schemas/api-error'
import { DomainError, statusOf } from './domain-error'

function answer(status: number, data: ApiError): H3Error {
  return createError({ statusCode: status, statusMessage: data.code, data })
}

/** Faults of a parsed input by field path, each a sentence. */
export function fieldFaults(error: ZodError): Record<string, string> {
  const fields: Record<string, string> = {}
  for (const fault of error.issues) fields[fault.path.join('.') || 'body'] ??= fault.message
  return fields
}

/** Turns whatever was thrown into the one shape the client knows. The inside of an unknown error stays in the log. */
export function toApiError(thrown: unknown): H3Error {
  if (thrown instanceof DomainError) {
    return answer(statusOf[thrown.code], { code: thrown.code, message: thrown.message, ...thrown.more })
  }
  if (thrown instanceof ZodError) {
    return answer(422, { code: 'invalid-input', message: 'Some fields cannot be taken as they are; each says what it needs.', fields: fieldFaults(thrown) })
  }
  if (isError(thrown) && thrown.statusCode < 500) return thrown
  const incident = randomUUID().slice(0, 8)
  console.error(`incident ${incident}`, thrown)
  return answer(500, { code: 'server-fault', message: `Something failed on our side. What you typed is still here; try again, and if it fails again name incident ${incident} to the administrator.`, incident })
}
