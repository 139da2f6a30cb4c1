import { createPrivateKey, generateKeyPairSync, X509Certificate, type KeyObject } from 'node:crypto'
import { access, mkdir, mkdtemp, readFile, rename, rm, writeFile } from 'node:fs/promises'
import { dirname, join } from 'node:path'
import { makeCertificate } from '#server/pdf/signing/certificate'

/** What signs released notes. Only the job worker loads it. */
export interface Signer {
  /** As on the cover and in the signature. */
  name: string
  key: KeyObject
  /** DER. */
  certificate: Buffer
  root: Buffer
}

const FILES = { rootKey: 'root-key.pem', root: 'root.pem', signerKey: 'signer-key.pem', signer: 'signer.pem' } as const
const YEAR = 365.25 * 24 * 3600 * 1000
const ROOT_YEARS = 30
const SIGNER_YEARS = 15

const toPem = (der: Buffer) => `-----BEGIN CERTIFICATE-----\n${der.toString('base64').replace(/.{64}/g, '$&\n').trim()}\n-----END CERTIFICATE-----\n`
const newKeys = () => generateKeyPairSync('ec', { namedCurve: 'P-256' })
const keyPem = (key: KeyObject) => key.export({ type: 'pkcs8', format: 'pem' }).toString()

async function writeAuthority(folder: string, now: Date): Promise<void> {
  const [rootKeys, signerKeys] = [newKeys(), newKeys()]
  const issuer = { name: 'Local authority', ...rootKeys }
  // Whole seconds: certificates know no smaller ones.
  const from = new Date(Math.floor(now.getTime() / 1000) * 1000 - 60_000)
  const until = (years: number) => new Date(from.getTime() + years * YEAR)
  const root = makeCertificate({ subject: issuer.name, publicKey: rootKeys.publicKey, issuer, authority: true, from, until: until(ROOT_YEARS) })
  const signer = makeCertificate({ subject: 'Release of notes', publicKey: signerKeys.publicKey, issuer, authority: false, from, until: until(SIGNER_YEARS) })
  await writeFile(join(folder, FILES.rootKey), keyPem(rootKeys.privateKey), { mode: 0o400 })
  await writeFile(join(folder, FILES.signerKey), keyPem(signerKeys.privateKey), { mode: 0o400 })
  await writeFile(join(folder, FILES.root), toPem(root), { mode: 0o444 })
  await writeFile(join(folder, FILES.signer), toPem(signer), { mode: 0o444 })
}

const exists = (path: string) => access(path).then(() => true, () => false)

/** Made beside and moved into place whole, so that two workers starting at once agree on one authority. */
async function ensureAuthority(folder: string, now: Date): Promise<void> {
  if (await exists(join(folder, FILES.signer))) return
  await mkdir(dirname(folder), { recursive: true })
  const making = await mkdtemp(`${folder}-`)
  try {
    await writeAuthority(making, now)
    await rename(making, folder)
  } catch (fault) {
    await rm(making, { recursive: true, force: true })
    if (!await exists(join(folder, FILES.signer))) throw fault
  }
}

/**
 * The signer of released notes, under an authority of this installation that is made at the first start.
 * @param folder outside the reach of the web process; keys in it have mode 0400
 * @param now for the validity of what is made
 * @throws when the folder holds keys that do not belong together
 */
export async function loadSigner(folder: string, now = new Date()): Promise<Signer> {
  await ensureAuthority(folder, now)
  const [key, signer, root] = await Promise.all([FILES.signerKey, FILES.signer, FILES.root].map(file => readFile(join(folder, file), 'utf8')))
  const privateKey = createPrivateKey(key ?? '')
  const [certificate, authority] = [new X509Certificate(signer ?? ''), new X509Certificate(root ?? '')]
  if (!certificate.checkPrivateKey(privateKey) || !certificate.verify(authority.publicKey)) {
    throw new Error(`The signing key, its certificate and the root in ${folder} do not belong together. Restore the folder from its backup.`)
  }
  return { name: 'Torquill, release of notes', key: privateKey, certificate: certificate.raw, root: authority.raw }
}

/** The root that signatures are verified against, as PEM; readable by everyone and no secret. */
export const readRoot = (folder: string): Promise<string> => readFile(join(folder, FILES.root), 'utf8')
