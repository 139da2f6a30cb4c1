import { describe, expect, it } from 'vitest'
import { isMailTemplate, MAIL_TEMPLATES, renderMail, type MailProps, type MailTemplate } from '#emails/registry'
import { LINK, SAMPLES } from './mail-samples'

const ATTACK = '<img src=x onerror=alert(1)>"\'&{{7*7}}${7*7}'

/** The same props with every string that a person may have typed replaced. */
function poisoned<T>(value: T, poison: string): T {
  if (typeof value === 'string') return (value === LINK ? value : poison) as T
  if (value === null || typeof value !== 'object') return value
  return Object.fromEntries(Object.entries(value).map(([key, inner]) => [key, poisoned(inner, poison)])) as T
}

function rendered(template: MailTemplate, poison?: string) {
  const props = SAMPLES[template] as MailProps<typeof template>
  return renderMail(template, poison === undefined ? props : poisoned(props, poison))
}

/** HTML back to the words a reader sees. */
function wordsOf(html: string): string {
  return html.replace(/<style>.*?<\/style>/gs, '').replace(/<br>/g, ' ').replace(/<[^>]*>/g, ' ')
    .replace(/&lt;/g, '<').replace(/&gt;/g, '>').replace(/&quot;/g, '"').replace(/&#39;/g, '\'').replace(/&amp;/g, '&').replace(/\s+/g, ' ')
}

describe.each(MAIL_TEMPLATES)('message %s', (template) => {
  it('has a subject, text, HTML and the link in both', () => {
    const mail = rendered(template)
    expect(mail.subject).toMatch(/^(QSN-19-0031 [AB]|Torquill): \S/)
    expect(mail.text).toContain(LINK)
    expect(mail.html).toContain(`href="${LINK}"`)
    expect(mail.html).toMatch(/^<!doctype html><html lang="en">/)
    expect(mail.html).toMatch(/<title>[^<]+<\/title>/)
    expect(mail.html).toContain('<meta name="color-scheme" content="light dark">')
  })

  it('keeps what people typed as text', () => {
    const { html, text } = rendered(template, ATTACK)
    expect(html).not.toContain('<img')
    expect(html.match(/<a [^>]*>/g)).toEqual(rendered(template).html.match(/<a [^>]*>/g))
    expect(wordsOf(html)).toContain(ATTACK)
    expect(text).toContain(ATTACK)
  })

  it('has a subject that nothing typed can break into a second header', () => {
    const { subject } = rendered(template, 'x\r\nBcc: everyone@quellmark.example\u0000\u2028y')
    expect(subject).not.toMatch(/[\p{Cc}\u2028\u2029]/u)
    expect(rendered(template, 'w'.repeat(500)).subject.length).toBeLessThanOrEqual(160)
  })

  it('says the same in text as in HTML', () => {
    const { html, text } = rendered(template)
    const words = wordsOf(html)
    const sentences = text.split('\n').map(line => line.replace(/^> /, '').trim()).filter(line => line.includes(' ') && !line.includes(':'))
    expect(sentences.filter(line => !words.includes(line))).toEqual([])
  })
})

describe('the registry', () => {
  it('knows its templates and no inherited name', () => {
    expect(isMailTemplate('returned')).toBe(true)
    expect(isMailTemplate('toString')).toBe(false)
  })

  it('refuses a link that is not http or https', () => {
    expect(() => renderMail('returned', { ...SAMPLES.returned, url: 'javascript:alert(1)' })).toThrow('http')
  })
})

describe('single messages', () => {
  it('names the act and the person in the subject', () => {
    expect(rendered('returned').subject).toBe('QSN-19-0031 B: returned by Koji Hatamori')
    expect(rendered('superseded').subject).toBe('QSN-19-0031 A: superseded by issue B')
  })

  it('says when a released note concludes that the part is not adequate', () => {
    expect(renderMail('released', { ...SAMPLES.released, adequate: false }).text).toContain('not adequate')
  })

  it('marks demonstration records', () => {
    expect(rendered('passed').text).toContain('Demonstration only')
    expect(renderMail('passed', { ...SAMPLES.passed, demonstration: false }).html).not.toContain('Demonstration only')
  })

  it('keeps the lines of a reason that was typed in several', () => {
    const { html, text } = renderMail('returned', { ...SAMPLES.returned, reason: 'First.\r\nSecond.' })
    expect(html).toContain('First.<br>Second.')
    expect(text).toContain('> First.\n> Second.')
  })
})
