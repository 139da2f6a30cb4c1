import { z } from 'zod'

const line = (what: string, max: number) => z.string().trim().min(1, `Type ${what}.`).max(max, `Use at most ${max} characters.`).regex(/^[^\p{Cc}]*$/u, 'Leave out control characters and line breaks.')

export const titleSchema = line('a title that says which part and which torsion it is about', 160)
export const partSchema = line('the part number', 80)
export const drawingIssueSchema = line('the drawing issue', 20)

export const createNoteSchema = z.object({ projectId: z.uuid('Choose a project.'), title: titleSchema, part: partSchema, drawingIssue: drawingIssueSchema })
export type CreateNote = z.infer<typeof createNoteSchema>

export const metadataSchema = z.object({
  title: titleSchema, part: partSchema, drawingIssue: drawingIssueSchema,
  changeNote: z.string().trim().max(2000, 'Use at most 2,000 characters.'),
  save: z.int().min(1),
})
export type Metadata = z.infer<typeof metadataSchema>

export const saveContentSchema = z.object({
  baseSave: z.int().min(1),
  steps: z.array(z.record(z.string(), z.unknown())).min(1).max(5000),
  docHash: z.string().regex(/^[0-9a-f]{64}$/),
  key: z.uuid(),
})
export type SaveContent = z.infer<typeof saveContentSchema>

export const labelSchema = z.object({ label: z.string().trim().max(80).nullable() })

export const registerSorts = ['number', 'title', 'part', 'state', 'margin', 'lastChange'] as const
export const registerQuerySchema = z.object({
  q: z.string().trim().max(200).default(''),
  state: z.string().max(20).optional(),
  project: z.string().max(20).optional(),
  person: z.uuid().optional(),
  sort: z.enum(registerSorts).default('lastChange'),
  dir: z.enum(['asc', 'desc']).default('desc'),
  page: z.coerce.number().int().min(1).max(100_000).default(1),
  size: z.coerce.number().int().min(1).max(100).default(25),
})
export type RegisterQuery = z.infer<typeof registerQuerySchema>

export interface RegisterRow {
  number: string, noteId: string, issueId: string, letter: string, title: string, part: string, drawingIssue: string
  project: { code: string, name: string }, state: string, releasing: boolean
  analyst: string | null, checker: string | null, approver: string | null
  leastMargin: number | null, leastMarginMode: string | null, lastChange: string
}

export const trailQuerySchema = z.object({
  chain: z.string().max(80).optional(),
  actor: z.uuid().optional(),
  act: z.string().max(60).optional(),
  outcome: z.enum(['done', 'refused']).optional(),
  from: z.iso.date().optional(),
  to: z.iso.date().optional(),
  q: z.string().trim().max(200).default(''),
  page: z.coerce.number().int().min(1).max(100_000).default(1),
  size: z.coerce.number().int().min(1).max(200).default(50),
})
export type TrailQuery = z.infer<typeof trailQuerySchema>
