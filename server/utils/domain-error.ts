/** Code → status of everything the server refuses in words. One table, so that a code always means the same. */
export const statusOf = {
  'not-signed-in': 401,
  'password-wrong': 403,
  'password-needed': 401,
  'not-allowed': 403,
  'cross-site': 403,
  'not-found': 404,
  'wrong-state': 409,
  'stale': 409,
  'save-conflict': 409,
  'pen-held': 409,
  'engine-moved': 409,
  'taken': 409,
  'last-administrator': 409,
  'something-remains': 409,
  'not-eligible': 403,
  'invalid-input': 422,
  'invalid-document': 422,
  'link-spent': 410,
  'too-large': 413,
  'not-this-kind': 415,
  'throttled': 429,
  'engine-busy': 503,
} as const
export type ErrorCode = keyof typeof statusOf

/** A refusal the person can act on: a stable code and a sentence that says what to do. Anything else that is thrown is a fault of ours. */
export class DomainError extends Error {
  constructor(
    readonly code: ErrorCode,
    message: string,
    readonly more: { fields?: Record<string, string>, details?: Record<string, unknown> } = {},
  ) {
    super(message)
    this.name = 'DomainError'
  }
}
