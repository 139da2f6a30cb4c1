import { createStorage, type Storage } from 'unstorage'
import fsDriver from 'unstorage/drivers/fs'
import { environment } from '#server/utils/environment'

let storage: Storage | undefined

/** Where files live: a folder by default, any S3-speaking store when TORQUILL_FILES_URL names one. */
async function open(): Promise<Storage> {
  const { filesUrl, dataDir } = environment()
  if (!filesUrl) return createStorage({ driver: fsDriver({ base: `${dataDir}/files` }) })
  const { default: s3Driver } = await import('unstorage/drivers/s3')
  const url = new URL(filesUrl)
  const insecure = url.searchParams.get('insecure') === '1'
  return createStorage({
    driver: s3Driver({
      accessKeyId: decodeURIComponent(url.username), secretAccessKey: decodeURIComponent(url.password),
      endpoint: `${insecure ? 'http' : 'https'}://${url.host}`, bucket: url.pathname.slice(1), region: url.searchParams.get('region') ?? 'us-east-1',
    }),
  })
}

async function files(): Promise<Storage> {
  storage ??= await open()
  return storage
}

/** @throws when the store has not taken it: a bucket that is not there answers 404, which the driver passes over in silence. */
export async function putFile(key: string, bytes: Buffer): Promise<void> {
  const store = await files()
  await store.setItemRaw(key, bytes)
  if (!await store.hasItem(key)) throw new Error(`file ${key} was not taken by the store`)
}

/** @throws when the store has lost it. */
export async function getFile(key: string): Promise<Buffer> {
  const found = await (await files()).getItemRaw<Buffer | ArrayBuffer>(key)
  if (!found) throw new Error(`file ${key} is not in the store`)
  return Buffer.isBuffer(found) ? found : Buffer.from(found)
}
