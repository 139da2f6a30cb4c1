import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, afterEach, beforeAll, describe, expect, it, vi } from 'vitest'
import { ObjectStore } from '../../../factories/object-store'

const dataDir = mkdtempSync(join(tmpdir(), 'torquill-files-'))
/** Every byte there is, so that nothing is taken for text on the way. */
const bytes = Buffer.from(Array.from({ length: 512 }, (_, i) => i % 256))
const key = 'uploads/3f0c/9e1a.pdf'

let store: ObjectStore
beforeAll(async () => {
  store = await ObjectStore.start()
})
afterEach(() => {
  store.trouble = null
  vi.unstubAllEnvs()
})
afterAll(async () => {
  await store.stop()
  rmSync(dataDir, { recursive: true, force: true })
})

/** The module as a fresh process has it. */
async function filesWith(filesUrl: string | undefined) {
  vi.resetModules()
  vi.stubEnv('DATABASE_URL', 'postgresql://none')
  vi.stubEnv('NUXT_AUTH_SECRET', 'a-secret-for-tests-only')
  vi.stubEnv('TORQUILL_DATA_DIR', dataDir)
  vi.stubEnv('TORQUILL_FILES_URL', filesUrl)
  return import('#server/storage/files')
}

describe('a folder', () => {
  it('gives back what it was given', async () => {
    const { getFile, putFile } = await filesWith(undefined)
    await putFile(key, bytes)
    expect((await getFile(key)).equals(bytes)).toBe(true)
    await expect(getFile('uploads/none.pdf')).rejects.toThrow('not in the store')
  })
})

describe('a store that speaks S3', () => {
  it('is given objects under their key, signed, and gives them back', async () => {
    const { getFile, putFile } = await filesWith(store.url())
    await putFile(key, bytes)
    expect([...store.objects.keys()]).toEqual([`/notes/${key}`])
    expect((await getFile(key)).equals(bytes)).toBe(true)
    await expect(getFile('uploads/none.pdf')).rejects.toThrow('not in the store')
  })

  it.each([['a wrong secret', () => store.url('notes', 'wrong')], ['a bucket that is not there', () => store.url('nowhere')]])('with %s loses nothing silently', async (_, url) => {
    const { putFile } = await filesWith(url())
    await expect(putFile(key, bytes)).rejects.toThrow()
  })

  it('in trouble fails the act instead of losing the file', async () => {
    const { getFile, putFile } = await filesWith(store.url())
    store.trouble = 503
    await expect(putFile(key, bytes)).rejects.toThrow()
    await expect(getFile(key)).rejects.toThrow()
  })
})
