/** Changes that no save holds yet, as they are kept on this machine. */
export interface Unsent {
  issueId: string
  personId: string
  baseSave: number
  steps: unknown[]
  /** Time of the last change, ISO. */
  at: string
}

const key = (issueId: string, personId: string) => `torquill:unsent:${issueId}:${personId}`

/** The browser's storage may be full or forbidden: keeping then fails, and the strip says so. */
export function keepUnsent(storage: Storage, unsent: Unsent): boolean {
  try {
    storage.setItem(key(unsent.issueId, unsent.personId), JSON.stringify(unsent))
    return true
  } catch {
    return false
  }
}

export function forgetUnsent(storage: Storage, issueId: string, personId: string) {
  storage.removeItem(key(issueId, personId))
}

export function readUnsent(storage: Storage, issueId: string, personId: string): Unsent | null {
  const text = storage.getItem(key(issueId, personId))
  if (!text) return null
  try {
    const unsent = JSON.parse(text) as Unsent
    return Array.isArray(unsent.steps) && Number.isInteger(unsent.baseSave) ? unsent : null
  } catch {
    return null
  }
}
