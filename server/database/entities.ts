import { AttemptSchema } from './entities/attempt'
import { CheckEntrySchema } from './entities/check-entry'
import { GuardAnswerSchema } from './entities/guard-answer'
import { IssuePartSchema } from './entities/issue-part'
import { IssueSchema } from './entities/issue'
import { LeaseSchema } from './entities/lease'
import { LooseDecisionSchema } from './entities/loose-decision'
import { MailSchema } from './entities/mail'
import { NoteSchema } from './entities/note'
import { OneTimeLinkSchema } from './entities/one-time-link'
import { PersonSchema } from './entities/person'
import { ProjectMemberSchema } from './entities/project-member'
import { ProjectSchema } from './entities/project'
import { RemarkEntrySchema } from './entities/remark-entry'
import { RemarkSchema } from './entities/remark'
import { SaveSchema } from './entities/save'
import { SignatureSchema } from './entities/signature'
import { StoredFileSchema } from './entities/stored-file'
import { TickSchema } from './entities/tick'
import { TrailHeadSchema } from './entities/trail-head'
import { TrailRowSchema } from './entities/trail-row'

/** Every entity, listed by hand: nothing is discovered at run time, so that the server can be bundled. */
export const entities = [
  AttemptSchema,
  CheckEntrySchema,
  GuardAnswerSchema,
  IssuePartSchema,
  IssueSchema,
  LeaseSchema,
  LooseDecisionSchema,
  MailSchema,
  NoteSchema,
  OneTimeLinkSchema,
  PersonSchema,
  ProjectMemberSchema,
  ProjectSchema,
  RemarkEntrySchema,
  RemarkSchema,
  SaveSchema,
  SignatureSchema,
  StoredFileSchema,
  TickSchema,
  TrailHeadSchema,
  TrailRowSchema,
]
