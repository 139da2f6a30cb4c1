import type { CommandContext } from '#server/utils/command-context'
import { DomainError } from '#server/utils/domain-error'
import { passwordHolds } from './passwords'
import { clearFailures, countFailure, refuseIfThrottled } from './throttle'

/**
 * A signature needs the password afresh. Wrong entries are counted per
 * person; after five, signing is closed for a quarter of an hour.
 * @throws DomainError password-wrong or throttled
 */
export async function confirmPassword({ em, actor, clock }: CommandContext, password: string): Promise<void> {
  await refuseIfThrottled(em, 'signing', actor.id, clock())
  if (await passwordHolds(actor.passwordHash, password)) return clearFailures(em, 'signing', actor.id)
  await countFailure(em, 'signing', actor.id, clock())
  throw new DomainError('password-wrong', 'This is not your password. Type it again to sign.', { fields: { password: 'Type the password you sign in with.' } })
}
