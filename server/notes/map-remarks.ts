import { mapAnchors } from '#shared/note/anchors'
import type { AppliedSteps } from '#shared/note/steps'
import type { Issue } from '#server/database/entities/issue'
import { RemarkSchema } from '#server/database/entities/remark'
import type { CommandContext } from '#server/utils/command-context'

/** Carries the anchors of remarks over the author's steps; what cannot be carried stays as an orphan and is looked for again at each save. */
export async function mapRemarks({ em }: CommandContext, issue: Issue, applied: AppliedSteps): Promise<void> {
  const remarks = await em.find(RemarkSchema, { issue })
  if (!remarks.length) return
  const mapped = mapAnchors(remarks.map(r => ({ anchor: r.anchor, state: r.anchorState })), applied.before, applied.steps, applied.doc)
  remarks.forEach((remark, i) => {
    const now = mapped[i]
    if (!now) return
    remark.anchor = now.anchor
    remark.anchorState = now.state
  })
  await em.flush()
}
