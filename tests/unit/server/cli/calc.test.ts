/** The real commands, as a shell or a spreadsheet starts them. */
import { spawnSync } from 'node:child_process'
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, describe, expect, it } from 'vitest'
import { stripInputs } from '../../../factories/open-section'

const root = new URL('../../../..', import.meta.url).pathname
const folder = mkdtempSync(join(tmpdir(), 'torquill-calc-'))
afterAll(() => rmSync(folder, { recursive: true }))

function npm(script: string, args: string[], options: { input?: string, cwd?: string } = {}) {
  const { status, stdout, stderr } = spawnSync('npm', ['run', '--silent', '--prefix', root, script, '--', ...args], { encoding: 'utf8', cwd: root, ...options })
  return { status, stdout, stderr }
}
const strip = { kind: 'open-section', title: 'Strip', inputs: stripInputs() }

describe('npm run calc', () => {
  it('reads a file from where it was called and prints nothing but JSON', () => {
    writeFileSync(join(folder, 'strips.json'), JSON.stringify([strip, strip]))
    const { status, stdout, stderr } = npm('calc', ['strips.json'], { cwd: folder })
    expect({ status, stderr }).toEqual({ status: 0, stderr: '' })
    expect(JSON.parse(stdout)).toMatchObject([{ ok: true, calculation: 1, title: 'Strip' }, { ok: true, calculation: 2 }])
  })

  it('reads standard input, with the working', () => {
    const { status, stdout } = npm('calc', ['--working', '-'], { input: JSON.stringify(strip) })
    expect(status).toBe(0)
    expect(JSON.parse(stdout)).toMatchObject({ ok: true, kind: 'open-section', working: expect.arrayContaining([expect.objectContaining({ method: expect.stringContaining('§') })]) })
  })

  it('says each fault in one line and ends with 1, the results that hold beside it', () => {
    const bad = { ...strip, title: 'Bad', inputs: { ...stripInputs(), length: { text: '1,5', unit: 'mm' }, twistAllowed: { text: '', unit: '°' } } }
    const { status, stdout, stderr } = npm('calc', ['-'], { input: JSON.stringify([strip, bad]) })
    expect(status).toBe(1)
    expect(JSON.parse(stdout)).toMatchObject([{ ok: true }, { ok: false }])
    expect(stderr.trim().split('\n')).toEqual([expect.stringMatching(/^calculation 2 \(Bad\), inputs\.length: .*\.$/)])
  })

  it('ends with 1 on JSON that is none, and with 2 where there is no file', () => {
    expect(npm('calc', ['-'], { input: '{' })).toMatchObject({ status: 1, stdout: '', stderr: expect.stringMatching(/^This is not valid JSON/) })
    expect(npm('calc', ['missing.json'], { cwd: folder })).toMatchObject({ status: 2, stdout: '', stderr: expect.stringContaining('missing.json') })
    expect(npm('calc', [])).toMatchObject({ status: 2, stderr: expect.stringContaining('Usage') })
  })

  it('lists kinds and prints a schema', () => {
    expect(JSON.parse(npm('calc', ['--kinds']).stdout)).toContainEqual({ kind: 'open-section', version: 1, title: 'Open section', record: false })
    expect(JSON.parse(npm('calc', ['--schema', 'open-section']).stdout)).toMatchObject({ type: 'object' })
    expect(npm('calc', ['--schema', 'beam'])).toMatchObject({ status: 2, stderr: expect.stringContaining('open-section') })
  })
})
