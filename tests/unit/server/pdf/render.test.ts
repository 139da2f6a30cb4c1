import { describe, expect, it } from 'vitest'
import { rmSync, writeFileSync } from 'node:fs'
import { mkdtemp, readdir, stat } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { renderNotePdf } from '#server/pdf/render'
import { loadSigner } from '#server/pdf/signing/local-authority'
import { negativeDraft, samplePng, shortPdfData } from '../../../factories/note-pdf-data'
import { run } from './outside-tools'

describe('a print', () => {
  it('is the same, byte for byte, each time', async () => {
    const data = shortPdfData()
    const [first, second] = [await renderNotePdf(data), await renderNotePdf(structuredClone(data))]
    expect(first.equals(second)).toBe(true)
  })

  it('of a draft is uncontrolled on every page and says at once that a margin is negative', async () => {
    const folder = await mkdtemp(join(tmpdir(), 'torquill-draft-'))
    const file = join(folder, 'draft.pdf')
    writeFileSync(file, await renderNotePdf(negativeDraft()))
    const pages = run('pdftotext', '-layout', file, '-').text.split('\f').slice(0, -1)
    for (const page of pages) expect(page).toContain('UNCONTROLLED when printed')
    expect(pages[0]).toContain('NOT ADEQUATE')
    expect(pages[0]).not.toContain('Demonstration')
    expect(run('pdfsig', file).text).toContain('does not contain any signatures')
    rmSync(folder, { recursive: true })
  })

  it('is never signed while uncontrolled', async () => {
    const folder = join(await mkdtemp(join(tmpdir(), 'torquill-')), 'authority')
    const signer = await loadSigner(folder)
    await expect(renderNotePdf(negativeDraft(), { signer })).rejects.toThrow('An uncontrolled print is not signed.')
  })

  it('refuses a picture it cannot unpack and names it', async () => {
    const broken = samplePng()
    broken.fill(0, 60, 400)
    const data = shortPdfData()
    const [id = ''] = Object.keys(data.figures)
    await expect(renderNotePdf({ ...data, figures: { [id]: { mime: 'image/png', bytes: broken } } })).rejects.toThrow('The bay between ribs 7 and 8')
  })
})

describe('the local authority', () => {
  it('is made once, keeps its keys to itself, and is the same for two that start at once', async () => {
    const parent = await mkdtemp(join(tmpdir(), 'torquill-'))
    const folder = join(parent, 'authority')
    const [one, two] = await Promise.all([loadSigner(folder), loadSigner(folder)])
    expect(one.certificate.equals(two.certificate)).toBe(true)
    expect((await loadSigner(folder)).certificate.equals(one.certificate)).toBe(true)
    for (const key of ['root-key.pem', 'signer-key.pem']) expect((await stat(join(folder, key))).mode & 0o777).toBe(0o400)
    expect(await readdir(parent)).toEqual(['authority'])
    const text = run('openssl', 'x509', '-in', join(folder, 'signer.pem'), '-noout', '-text').text
    expect(text).toContain('NIST CURVE: P-256')
    // Document signing, RFC 9336.
    expect(text).toMatch(/E-mail Protection, 1\.3\.6\.1\.5\.5\.7\.3\.36/)
    expect(run('openssl', 'verify', '-CAfile', join(folder, 'root.pem'), join(folder, 'signer.pem')).text).toContain('OK')
    rmSync(parent, { recursive: true })
  })
})
