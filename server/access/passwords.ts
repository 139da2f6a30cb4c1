import { hash, verify } from '@node-rs/argon2'

/** argon2id with 46 MiB, one pass, one lane: the second of the two settings that OWASP recommends. */
const cost = { memoryCost: 46 * 1024, timeCost: 1, parallelism: 1 }
const nobody = hash('nobody signs in with this', cost)

let running = 0
const waiting: (() => void)[] = []

/** Two hashes at a time: more would only starve the requests beside them. */
async function inTurn<T>(work: () => Promise<T>): Promise<T> {
  if (running >= 2) await new Promise<void>(resolve => waiting.push(resolve))
  running++
  try {
    return await work()
  } finally {
    running--
    waiting.shift()?.()
  }
}

export const hashPassword = (password: string) => inTurn(() => hash(password.normalize('NFKC'), cost))

/** Takes as long for an account that does not exist or has no password yet. */
export async function passwordHolds(stored: string | null | undefined, password: string): Promise<boolean> {
  const against = stored ?? await nobody
  const holds = await inTurn(() => verify(against, password.normalize('NFKC')))
  return holds && stored !== null && stored !== undefined
}
