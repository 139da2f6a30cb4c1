import { z } from 'zod'
import { ISSUE_STATES } from '#shared/review/states'

/** What the person saw when they pressed: the act is refused with 409 when the issue has moved on since. */
const expect = z.object({ state: z.enum(ISSUE_STATES), save: z.int().min(1) })
const act = z.object({ expect })
const reason = z.string().trim().min(3, 'Write the reason, so that others can follow it.').max(2000, 'Use at most 2,000 characters.')
const password = z.string().min(1, 'Type your password.').max(1024)
const text = (what: string, max = 4000) => z.string().trim().min(1, `Write ${what}.`).max(max, `Use at most ${max.toLocaleString('en')} characters.`)
const uuid = z.uuid()

export const submitSchema = act.extend({ checkerId: z.uuid('Choose a checker.'), approverId: z.uuid('Choose an approver.') })
export const recallSchema = act
export const returnSchema = act.extend({ reason })
export const passSchema = act.extend({ password })
export const releaseSchema = act.extend({ password, acceptedDeviations: z.array(uuid).max(500) })
export const abandonSchema = act.extend({ reason })
export const withdrawSchema = act.extend({ reason, password })
export const reassignSchema = act.extend({ checkerId: uuid.optional(), approverId: uuid.optional(), reason })
  .refine(r => r.checkerId ?? r.approverId, { message: 'Name another checker or approver.', path: ['checkerId'] })

export const answerSchema = z.object({ calcId: uuid, guardKey: z.string().min(1).max(120), text: text('the answer') })
export const judgeSchema = z.object({ accepted: z.boolean(), note: z.string().trim().max(2000).default('') })
  .refine(j => j.accepted || j.note !== '', { message: 'Say what is missing, so that the analyst can mend it.', path: ['note'] })

export const looseSchema = z.object({
  blockId: z.string().min(1).max(60), text: z.string().min(1).max(200), ordinal: z.int().min(0).max(10_000),
  /** null takes the explanation away. */
  reason: text('why this number stays as typed', 500).nullable(),
})

const anchorSchema = z.discriminatedUnion('kind', [
  z.object({
    kind: z.literal('text'), blockId: uuid, from: z.int().min(0), to: z.int().min(0),
    quote: z.string().max(2000), prefix: z.string().max(200), suffix: z.string().max(200),
  }).refine(a => a.to > a.from, { message: 'Select the words the remark is about.' }),
  z.object({ kind: z.literal('calculation'), calcId: uuid, field: z.string().max(120).optional() }),
])
export const remarkSchema = z.object({ anchor: anchorSchema, text: text('the remark'), proposed: z.string().max(4000).nullable().default(null), fileId: uuid.nullable().default(null) })
export const replySchema = z.object({ text: text('the reply'), fileId: uuid.nullable().default(null) })
export const remarkStateSchema = z.object({ state: z.enum(['open', 'closed']) })

export const tickSchema = z.object({ calcId: uuid, ticked: z.boolean() })
export const checkItemSchema = z.object({ item: z.int().min(1).max(99), verdict: z.enum(['ok', 'not ok', 'not applicable']), evidence: z.string().trim().max(2000).default('') })

export type Submit = z.infer<typeof submitSchema>
export type Recall = z.infer<typeof recallSchema>
export type Return = z.infer<typeof returnSchema>
export type Pass = z.infer<typeof passSchema>
export type Release = z.infer<typeof releaseSchema>
export type Abandon = z.infer<typeof abandonSchema>
export type Withdraw = z.infer<typeof withdrawSchema>
export type Reassign = z.infer<typeof reassignSchema>
export type AnswerGuard = z.infer<typeof answerSchema>
export type JudgeAnswer = z.infer<typeof judgeSchema>
export type ExplainLoose = z.infer<typeof looseSchema>
export type AddRemark = z.infer<typeof remarkSchema>
export type ReplyToRemark = z.infer<typeof replySchema>
export type SetRemarkState = z.infer<typeof remarkStateSchema>
export type TickCalculation = z.infer<typeof tickSchema>
export type FillCheckItem = z.infer<typeof checkItemSchema>
