import { X509Certificate } from 'node:crypto'
import { mkdtempSync, readFileSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import type { MikroORM } from '@mikro-orm/postgresql'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { verifyChain } from '#server/audit/verify'
import { migrate } from '#server/cli/migrate'
import { seed } from '#server/cli/seed'
import { IssueSchema } from '#server/database/entities/issue'
import { MailSchema } from '#server/database/entities/mail'
import { RemarkSchema } from '#server/database/entities/remark'
import { StoredFileSchema } from '#server/database/entities/stored-file'
import { TrailHeadSchema } from '#server/database/entities/trail-head'
import { TrailRowSchema } from '#server/database/entities/trail-row'
import { connect } from '#server/database/orm'
import { run } from '../../server/cli/shell.mjs'
import { startThrowAway } from '../../server/cli/throw-away.mjs'

let orm: MikroORM
let database: { application: string, owner: string, stop: () => void }
const dataDir = mkdtempSync(join(tmpdir(), 'torquill-demo-'))

beforeAll(async () => {
  database = await startThrowAway(`demo-${process.pid}`)
  Object.assign(process.env, { DATABASE_URL: database.application, NUXT_AUTH_SECRET: 'a-secret-for-tests-only-0123456789', TORQUILL_DATA_DIR: dataDir, TORQUILL_DEMONSTRATION: '1' })
  await migrate(database.owner, database.application)
  expect(await seed(database.application)).toContain('made')
  orm = await connect(database.application)
}, 600_000)

afterAll(async () => {
  await orm.close()
  database.stop()
  rmSync(dataDir, { recursive: true, force: true })
})

const all = () => orm.em.fork()

describe('the demonstration', () => {
  it('stands as its story ends', async () => {
    const issues = await all().find(IssueSchema, {}, { populate: ['note'], exclude: ['document', 'results'] })
    expect(Object.fromEntries(issues.map(issue => [`${issue.note.number} ${issue.letter}`, issue.state]))).toEqual({
      'QSN-19-0031 A': 'superseded', 'QSN-19-0031 B': 'released', 'QSN-19-0044 A': 'released', 'QSN-19-0052 A': 'released', 'QSN-19-0067 A': 'for approval', 'QSN-19-0071 A': 'draft',
      'QSN-40-0009 A': 'in check', 'QSN-40-0012 A': 'draft', 'QSN-40-0015 A': 'draft',
    })
  })

  it('is told once', async () => {
    expect(await seed(database.application)).toContain('left as it is')
  })

  it('left a trail that holds, without a refusal', async () => {
    for (const { chain } of await all().find(TrailHeadSchema, {})) expect(await verifyChain(all(), chain)).toMatchObject({ ok: true })
    expect(await all().count(TrailRowSchema, { outcome: 'refused' })).toBe(0)
  })

  it('released PDFs of at least six pages, signed within the life of their certificate', async () => {
    const files = await all().find(StoredFileSchema, { purpose: 'released-pdf' })
    expect(files).toHaveLength(4)
    const certificate = new X509Certificate(readFileSync(join(dataDir, 'authority', 'signer.pem')))
    for (const { storageKey, at } of files) {
      expect(at.getTime()).toBeGreaterThan(Date.parse(certificate.validFrom))
      const path = join(dataDir, 'files', storageKey)
      expect(Number(/Pages:\s+(\d+)/.exec(run('pdfinfo', [path]))?.[1])).toBeGreaterThanOrEqual(6)
    }
  })

  it('lost no remark', async () => {
    const remarks = await all().find(RemarkSchema, {})
    expect(remarks.length).toBeGreaterThanOrEqual(9)
    expect(remarks.filter(remark => remark.anchorState === 'orphaned')).toEqual([])
  })

  it('wrote one message per event and person, of every sort the story has', async () => {
    const templates = new Set((await all().find(MailSchema, {})).map(mail => mail.template))
    expect([...templates].sort()).toEqual(['answered', 'invited', 'passed', 'released', 'remarked', 'returned', 'submitted', 'superseded'])
  })
})
