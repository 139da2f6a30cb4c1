/** Attacks on a released file. The verifier must refuse each; the sources of the classes are published work on incremental saving, signature wrapping and forged signatures. */
import { createHash } from 'node:crypto'
import { rmSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { loadSigner, readRoot } from '#server/pdf/signing/local-authority'
import { signDigest } from '#server/pdf/signing/cms'
import { CMS_ROOM } from '#server/pdf/signing/signature-field'
import { verifyNotePdf } from '#server/pdf/signing/verify'
import { shortPdfData } from '../../../factories/note-pdf-data'
import { run } from './outside-tools'
import { signedSample, type SignedSample } from './signed-sample'

let sample: SignedSample
beforeAll(async () => {
  sample = await signedSample(shortPdfData())
}, 60_000)
afterAll(() => rmSync(sample.folder, { recursive: true, force: true }))

const refused = (pdf: Buffer) => {
  const verdict = verifyNotePdf(pdf, sample.root)
  return verdict.valid ? 'accepted' : verdict.reason
}
const latin = (text: string) => Buffer.from(text, 'latin1')
/** Replaces text by other text of the same length. */
function swap(pdf: Buffer, from: string | RegExp, to: (found: string) => string): Buffer {
  const text = pdf.toString('latin1')
  const found = typeof from === 'string' ? from : from.exec(text)?.[0] ?? ''
  expect(found).not.toBe('')
  const changed = to(found)
  expect(changed).toHaveLength(found.length)
  return latin(text.replace(found, () => changed))
}
/** An update as an editor would append it: the catalog again, without its form and permissions. */
function appended(pdf: Buffer): Buffer {
  const text = pdf.toString('latin1')
  const root = Number(/\/Root (\d+) 0 R/.exec(text)?.[1])
  const catalog = new RegExp(`\\n${root} 0 obj\\n([\\s\\S]*?)\\nendobj`).exec(text)?.[1] ?? ''
  const last = /startxref\n(\d+)\n%%EOF\n$/.exec(text)?.[1] ?? ''
  const body = `${root} 0 obj\n${catalog.replace(/\/Lang \(en\)/, '/Lang (de)')}\nendobj\n`
  const table = pdf.length + body.length
  return Buffer.concat([pdf, latin(`${body}xref\n${root} 1\n${String(pdf.length).padStart(10, '0')} 00000 n \ntrailer\n<<\n/Size ${root + 1}\n/Root ${root} 0 R\n/Prev ${last}\n>>\nstartxref\n${table}\n%%EOF\n`)])
}
const tell = (name: string, pdf: Buffer) => {
  const path = join(sample.folder, name)
  writeFileSync(path, pdf)
  return { pdfsig: run('pdfsig', path).text, mutool: run('mutool', 'sign', '-v', path).text }
}

describe('a released file', () => {
  it('is verified, with what it says of the note', () => {
    const verdict = verifyNotePdf(sample.pdf, sample.root)
    expect(verdict).toMatchObject({
      valid: true, signer: 'Torquill, release of notes', claimedAt: '2026-10-12T09:00:20Z',
      note: { number: 'QSN-19-0031', letter: 'B', contentHash: sample.data.contentHash, contentMatches: true },
    })
  })

  it('is refused under another authority of the same names, and when its certificate is out of force', async () => {
    const other = join(sample.folder, 'other')
    await loadSigner(other)
    expect(verifyNotePdf(sample.pdf, await readRoot(other)).valid).toBe(false)
    expect(verifyNotePdf(sample.pdf, sample.root, new Date('2099-01-01')).valid).toBe(false)
  })
})

describe('told by us and by the tools of others', () => {
  it('one flipped byte', () => {
    const flipped = swap(sample.pdf, '/Lang (en)', () => '/Lang (fr)')
    expect(refused(flipped)).toContain('altered')
    const { pdfsig, mutool } = tell('flipped.pdf', flipped)
    expect(pdfsig).toContain('Digest Mismatch')
    expect(mutool).not.toContain('unchanged since signing')
  })

  it('one appended update', () => {
    const updated = appended(sample.pdf)
    expect(refused(updated)).toContain('end of the file')
    const { pdfsig, mutool } = tell('updated.pdf', updated)
    expect(pdfsig).toContain('Not total document signed')
    expect(mutool).toContain('edits since signing')
  })
})

describe('forgeries', () => {
  const attacks: [string, (pdf: Buffer) => Buffer][] = [
    ['bytes after the end', pdf => Buffer.concat([pdf, latin('% nothing\n')])],
    ['bytes before the head', pdf => Buffer.concat([latin('GIF89a\n'), pdf])],
    ['a range of nothing', pdf => swap(pdf, /\/ByteRange \[[^\]]*\]/, found => `${'/ByteRange [0 0 0 0'.padEnd(found.length - 1)}]`)],
    ['no range', pdf => swap(pdf, '/ByteRange', () => '/ByteRangf')],
    ['a range that ends early', pdf => swap(pdf, /\/ByteRange \[0 \d+ \d+ \d/, found => `${found.slice(0, -1)}0`)],
    ['an empty signature', pdf => swap(pdf, /\/Contents <3082[0-9a-f]*>/, found => `/Contents <${'0'.repeat(found.length - 12)}>`)],
    ['a second range in the gap', pdf => swap(pdf, /0{60}>/, () => `>/ByteRange [0 1 2 3] /Contents <${'0'.repeat(29)}>`.slice(0, 61))],
    ['bytes behind the signature', pdf => swap(pdf, /0{60}>/, found => `${found.slice(0, 20)}ff${found.slice(22)}`)],
    ['capital digits in the signature', pdf => swap(pdf, /\/Contents <3082[0-9a-f]{40}/, found => found.toUpperCase().replace('/CONTENTS', '/Contents'))],
    ['another permission', pdf => swap(pdf, '/P 1', () => '/P 3')],
    ['a certification taken off', pdf => swap(pdf, '/DocMDP', () => '/DocMDQ')],
    ['an action', pdf => swap(pdf, '/PageMode ', () => '/OpenActio').subarray(0)],
    ['a file without its end', pdf => pdf.subarray(0, pdf.length - 1)],
    ['half a file', pdf => pdf.subarray(0, pdf.length / 2)],
    ['no file', () => Buffer.alloc(0)],
    ['another sort of signature', pdf => swap(pdf, 'ETSI.CAdES.detached', () => 'adbe.pkcs7.detached')],
    ['another name on it', pdf => swap(pdf, 'Torquill, release of notes', () => 'Torquill, release of Notes')],
    ['another claimed time', pdf => swap(pdf, '/M (D:2026', () => '/M (D:2025')],
  ]
  it.each(attacks)('%s', (_name, attack) => {
    expect(refused(attack(sample.pdf))).not.toBe('accepted')
  })

  it('the same file signed anew by a stranger with the same names', async () => {
    const stranger = await loadSigner(join(sample.folder, 'stranger'))
    const pdf = Buffer.from(sample.pdf)
    const start = pdf.indexOf('/Contents <3082', 0, 'latin1') + '/Contents '.length
    const end = start + CMS_ROOM * 2 + 2
    const digest = createHash('sha256').update(pdf.subarray(0, start)).update(pdf.subarray(end)).digest()
    const cms = signDigest({ digest, certificate: stranger.certificate, root: stranger.root }, stranger.key)
    pdf.write(cms.toString('hex').padEnd(CMS_ROOM * 2, '0'), start + 1, 'latin1')
    expect(refused(pdf)).not.toBe('accepted')
    // With our root in place of the stranger's, the certificate still is not ours.
    const mixed = signDigest({ digest, certificate: stranger.certificate, root: sample.signer.root }, stranger.key)
    pdf.write(mixed.toString('hex').padEnd(CMS_ROOM * 2, '0'), start + 1, 'latin1')
    expect(refused(pdf)).toContain('pinned authority')
  })

  it('any byte of the signature object, and bytes all over the file', () => {
    const start = sample.pdf.indexOf('/Contents <3082', 0, 'latin1') + '/Contents <'.length
    const places = [...Array.from({ length: 300 }, (_, i) => start + i * 9), ...Array.from({ length: 100 }, (_, i) => Math.floor(i * sample.pdf.length / 100))]
    const accepted = places.filter((place) => {
      const pdf = Buffer.from(sample.pdf)
      pdf[place] = pdf[place] === 0x30 ? 0x31 : 0x30
      return verifyNotePdf(pdf, sample.root).valid
    })
    expect(accepted).toEqual([])
  })
})
