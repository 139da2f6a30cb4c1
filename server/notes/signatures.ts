import { randomUUID } from 'node:crypto'
import type { Issue } from '#server/database/entities/issue'
import { SignatureSchema, type Signature } from '#server/database/entities/signature'
import type { CommandContext } from '#server/utils/command-context'

/** The actor signs the issue as it stands. */
export async function sign({ em, actor, clock }: CommandContext, issue: Issue, meaning: Signature['meaning'], contentHash: string): Promise<Signature> {
  const signature = em.create(SignatureSchema, { id: randomUUID(), issue, person: actor, meaning, at: clock(), saveNumber: issue.saveNumber, contentHash })
  await em.flush()
  return signature
}

/** Signatures that an act undoes are voided with its reason, never deleted. */
export async function voidSignatures({ em, clock }: Pick<CommandContext, 'em' | 'clock'>, issue: Issue, meanings: Signature['meaning'][], reason: string): Promise<void> {
  const standing = await em.find(SignatureSchema, { issue, meaning: { $in: meanings }, voidedAt: null })
  for (const signature of standing) Object.assign(signature, { voidedAt: clock(), voidReason: reason })
  await em.flush()
}
