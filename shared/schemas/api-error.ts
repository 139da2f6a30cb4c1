/** The one shape in which the server refuses: a stable code, a sentence that says what to do, and what helps to do it. */
export interface ApiError {
  code: string
  message: string
  /** Faults by field path, for forms. */
  fields?: Record<string, string>
  /** Facts the client needs, e.g. the current save on a conflict. */
  details?: Record<string, unknown>
  incident?: string
}
