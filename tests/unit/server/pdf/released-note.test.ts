/** A released note judged by tools that others wrote; always by what they say, never by their exit code alone. */
import { rmSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { noteJson } from '#server/pdf/note-attachments'
import { run } from './outside-tools'
import { signedSample, splitSignature, type SignedSample } from './signed-sample'

let sample: SignedSample
let file: string
let nss: string
const at = (name: string) => join(sample.folder, name)
const write = (name: string, bytes: Buffer | string) => {
  writeFileSync(at(name), bytes)
  return at(name)
}

beforeAll(async () => {
  sample = await signedSample()
  file = write('note.pdf', sample.pdf)
  nss = `sql:${sample.folder}`
  expect(run('certutil', '-N', '-d', nss, '--empty-password').code).toBe(0)
  expect(run('certutil', '-A', '-d', nss, '-n', 'root', '-t', 'C,C,C', '-i', join(sample.authority, 'root.pem')).code).toBe(0)
}, 60_000)
afterAll(() => rmSync(sample.folder, { recursive: true, force: true }))

describe('the signature', () => {
  it('is valid, over the whole file and trusted, says pdfsig', () => {
    const { text } = run('pdfsig', '-nssdir', nss, file)
    expect(text).toContain('Signature Validation: Signature is Valid.')
    expect(text).toContain('Total document signed')
    expect(text).toContain('Certificate Validation: Certificate is Trusted.')
    expect(text).toContain('Signature Type: ETSI.CAdES.detached')
    expect(text).not.toContain('Signature #2')
  })

  it('verifies as CAdES, says openssl, and carries no signing time', () => {
    const { cms, signed } = splitSignature(sample.pdf)
    const args = ['-inform', 'DER', '-in', write('cms.der', cms)]
    const verified = run('openssl', 'cms', '-verify', '-cades', '-binary', ...args, '-content', write('signed.bin', signed), '-CAfile', join(sample.authority, 'root.pem'), '-out', at('out.bin'))
    expect(verified.text).toContain('CAdES Verification successful')
    const { text } = run('openssl', 'cms', '-cmsout', '-print', '-noout', ...args)
    // Attributes of PAdES B-B: content type, message digest, signing certificate (RFC 5652, RFC 5035).
    for (const id of ['1.2.840.113549.1.9.3', '1.2.840.113549.1.9.4', '1.2.840.113549.1.9.16.2.47']) expect(text).toContain(`(${id})`)
    expect(text).not.toContain('1.2.840.113549.1.9.5')
  })

  it('leaves one revision, certified against any change', () => {
    expect(sample.pdf.toString('latin1').match(/%%EOF\n/g)).toHaveLength(1)
    expect(run('mutool', 'sign', '-v', file).text).toContain('The document is unchanged since signing.')
    expect(run('mutool', 'show', file, 'trailer/Root/Perms').text).toContain('DocMDP')
    expect(sample.pdf.toString('latin1')).toContain('/P 1')
  })
})

describe('the file', () => {
  it('is sound, says qpdf, without a warning', () => {
    const checked = run('qpdf', '--check', file)
    expect(checked.text).toContain('No syntax or stream encoding errors found')
    expect(checked.text.toLowerCase()).not.toContain('warning')
    expect(checked.code).toBe(0)
  })

  it('has its fonts embedded and its title and language set', () => {
    const fonts = run('pdffonts', file).text.trim().split('\n').slice(2)
    expect(fonts.length).toBeGreaterThanOrEqual(3)
    for (const font of fonts) expect(font).toMatch(/\s+yes yes yes\s+\d+\s+0$/)
    expect(run('pdfinfo', file).text).toContain('Title:           QSN-19-0031 issue B: Hat stiffener under fairlead torque, ribs 7 & 8')
    expect(sample.pdf.toString('latin1')).toContain('/Lang (en)')
    expect(run('pdfinfo', '-meta', file).text).toContain('ribs 7 &amp; 8')
  })

  it('carries the data it was made from', () => {
    const listed = run('pdfdetach', '-list', file).text
    expect(listed).toContain('note.json')
    expect(run('pdfdetach', '-savefile', 'note.json', '-o', at('data.json'), file).code).toBe(0)
    expect(run('cmp', at('data.json'), write('expected.json', noteJson(sample.data))).text).toBe('')
    run('pdfdetach', '-savefile', 'content.json', '-o', at('content.json'), file)
    expect(run('sha256sum', at('content.json')).text).toContain(sample.data.contentHash)
    expect(sample.pdf.toString('latin1')).toContain('/AFRelationship /Source')
  })
})

describe('what is read', () => {
  it('names number, issue and page on every page, and the demonstration', () => {
    const pages = run('pdftotext', '-layout', file, '-').text.split('\f').slice(0, -1)
    expect(pages.length).toBeGreaterThanOrEqual(6)
    pages.forEach((page, i) => {
      expect(page).toContain('QSN-19-0031 issue B')
      expect(page).toContain(`page ${i + 1} of ${pages.length}`)
      expect(page).toContain('Demonstration only')
    })
  })

  it('says on the cover who did what, and what to beware of', () => {
    const cover = run('pdftotext', '-raw', '-f', '1', '-l', '1', file, '-').text.replace(/\s+/g, ' ')
    for (const words of ['Ilse Tveråmo', 'Meera Ranganekar', 'Catalina Ferreyrón', 'wrote the note and submitted it for check', 'signed 2026-10-09 09:12 UTC',
      'confirms the check and releases the note for use', 'RELEASED', 'aids for qualified engineers', 'governing code', 'responsible approver', 'Certified electronically: QSN-19-0031 issue B']) {
      expect(cover).toContain(words)
    }
    expect(cover.replaceAll(' ', '')).toContain(sample.data.contentHash)
  })

  it('counts the pages of its contents rightly', () => {
    const pages = run('pdftotext', '-layout', file, '-').text.split('\f')
    const contents = pages[1] ?? ''
    for (const title of ['Section analysis', 'Conclusion and statement of compliance', 'Appendices']) {
      const number = Number(new RegExp(`${title}\\s+(\\d+)`).exec(contents)?.[1])
      expect(pages[number - 1]).toContain(title)
    }
  })

  it('keeps the words of an equation behind its drawing', () => {
    expect(run('qpdf', '--qdf', '--stream-data=uncompress', file, '-').text).toContain('/ActualText (F_{sy}=F_{ty}/\\\\sqrt{3})')
  })
})
