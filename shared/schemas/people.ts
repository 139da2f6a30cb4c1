import { z } from 'zod'

/** A password: long enough to resist guessing, any characters, never cut. */
export const passwordSchema = z.string()
  .min(10, 'Use at least 10 characters.')
  .max(200, 'Use at most 200 characters.')
  .refine(p => !/^(.)\1*$/u.test(p), 'Use more than one character.')
  .refine(p => !/torquill|password|12345678|qwert/i.test(p), 'This is among the first that are guessed; use something of your own.')

export const emailSchema = z.string().trim().toLowerCase().max(254).pipe(z.email('Type an e-mail address, such as name@example.org.'))
const nameSchema = z.string().trim().min(2, 'Type the name as it should stand on a cover.').max(120).regex(/^[^\p{Cc}]*$/u, 'Leave out control characters.')

export const addPersonSchema = z.object({
  email: emailSchema,
  name: nameSchema,
  auditor: z.boolean().default(false),
  administrator: z.boolean().default(false),
})
export type AddPerson = z.infer<typeof addPersonSchema>

export const changePersonSchema = z.object({
  name: nameSchema.optional(),
  auditor: z.boolean().optional(),
  administrator: z.boolean().optional(),
  disabled: z.boolean().optional(),
})
export type ChangePerson = z.infer<typeof changePersonSchema>

export const addProjectSchema = z.object({
  code: z.string().trim().min(1, 'Type a short code, such as QW-19.').max(20).regex(/^[\p{L}\p{N}._-]+$/u, 'Use letters, digits, dots and dashes.'),
  name: z.string().trim().min(1, 'Type the project\'s name.').max(120),
  notePattern: z.string().trim().max(40).regex(/^[\p{L}\p{N}._-]*\{0{1,8}\}[\p{L}\p{N}._-]*$/u, 'Write the pattern with its counter in braces, such as QSN-19-{0000}.'),
  basis: z.string().trim().max(400).default(''),
  criteria: z.string().trim().max(2000).default(''),
})
export type AddProject = z.infer<typeof addProjectSchema>

export const projectRoles = ['analyst', 'checker', 'approver'] as const
export const setMemberSchema = z.object({ personId: z.uuid(), roles: z.array(z.enum(projectRoles)).max(3) })
export type SetMember = z.infer<typeof setMemberSchema>

export const forgottenSchema = z.object({ email: emailSchema })
export const setPasswordSchema = z.object({ token: z.string().min(20).max(200), password: passwordSchema })
