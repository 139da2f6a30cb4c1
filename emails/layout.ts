/**
 * The one layout of every message. A template gives plain strings; the layout
 * escapes them, sets them as HTML and as text from the same parts, so that the
 * two never say different things.
 */

/** What a template gives back. `subject` is one line. */
export interface MailContent { subject: string, text: string, html: string }

export interface MailParts {
  /** One plain line: number, issue, act, person. */
  subject: string
  heading: string
  /** Sentences, one paragraph each. */
  paragraphs: string[]
  /** Label and value; a value may be empty, the row is then left out. */
  facts?: [label: string, value: string][]
  /** Words of a person, shown apart from ours. */
  quotes?: { label: string, text: string }[]
  action: { label: string, url: string }
  /** Why this person gets this message. */
  reason: string
  /** Demonstration records say so on everything that shows them. */
  demonstration?: boolean
}

const DEMONSTRATION = 'Demonstration only: invented people, parts and values.'
const AID = 'Results in Torquill are aids for qualified engineers and must be checked independently.'

const ENTITIES: Record<string, string> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;', '\'': '&#39;' }

/** Text that is safe between tags and inside a quoted attribute. */
export function escapeHtml(text: string): string {
  return text.replace(/[&<>"']/g, mark => ENTITIES[mark] ?? mark)
}

/** One line without line breaks or control characters: a header cannot be continued by what a person typed. */
export function plainLine(text: string): string {
  return text.replace(/[\p{Cc}\u2028\u2029]+/gu, ' ').replace(/\s+/g, ' ').trim()
}

/** A subject of at most 160 characters, so that no program folds it badly. */
function subjectLine(text: string): string {
  const line = plainLine(text)
  return line.length <= 160 ? line : `${line.slice(0, 159).trimEnd()}…`
}

/**
 * The address of a link: http or https only.
 * Throws on anything else: a message with another scheme is a programmer's error.
 */
function safeUrl(url: string): string {
  const { protocol, href } = new URL(url)
  if (protocol !== 'https:' && protocol !== 'http:') throw new Error(`A message may only link to http or https, not ${protocol}`)
  return href
}

const SERIF = '\'Source Serif 4\',Georgia,serif'
const SANS = '\'Source Sans 3\',\'Segoe UI\',Helvetica,Arial,sans-serif'

// Colours are inline for programs that drop style elements; the style element only turns them for a dark ground.
const DARK = `@media (prefers-color-scheme:dark){
.desk{background:#12161B!important}.sheet{background:#1D2329!important;border-color:#343C45!important}
.ink{color:#E6E2D8!important}.ink2{color:#BEBFBC!important}.ink3{color:#A0A5A8!important}
.rule{border-color:#E6E2D8!important}.hair{border-color:#343C45!important}
.press{background:#5CC0B2!important;color:#12161B!important}.link{color:#5CC0B2!important}.caution{color:#E0B04A!important}
}`

function paragraph(text: string): string {
  return `<p class="ink" style="margin:0 0 14px;font:17px/27px ${SERIF};color:#1C2733">${escapeHtml(text)}</p>`
}

function factRows(facts: [string, string][]): string {
  const rows = facts.map(([label, value]) => `<div class="hair" style="padding:5px 0;border-bottom:1px solid #D8D2C4">`
    + `<dt class="ink3" style="display:inline-block;width:148px;vertical-align:top;font:13px/20px ${SANS};color:#5C646C">${escapeHtml(label)}</dt>`
    + `<dd class="ink" style="display:inline-block;width:370px;max-width:100%;margin:0;overflow-wrap:anywhere;word-break:break-word;font:14px/20px ${SANS};color:#1C2733">${escapeHtml(value)}</dd></div>`)
  return rows.length === 0 ? '' : `<dl class="rule" style="margin:4px 0 22px;border-top:1.5px solid #1C2733">${rows.join('')}</dl>`
}

function quote({ label, text }: { label: string, text: string }): string {
  const lines = escapeHtml(text.trim()).replace(/\r\n|\r|\n/g, '<br>')
  return `<div class="hair" style="margin:0 0 18px;padding:0 0 0 16px;border-left:2.5px solid #0E665C">`
    + `<p class="ink3" style="margin:0 0 3px;font:13px/18px ${SANS};color:#5C646C">${escapeHtml(label)}</p>`
    + `<p class="ink" style="margin:0;font:italic 16px/25px ${SERIF};color:#1C2733">${lines}</p></div>`
}

function actionBlock(label: string, url: string): string {
  const href = escapeHtml(url)
  return `<p style="margin:8px 0 16px"><a class="press" href="${href}" style="display:inline-block;padding:9px 18px;background:#0E665C;color:#FCFBF7;`
    + `font:600 14px/20px ${SANS};text-decoration:none;border-radius:2px">${escapeHtml(label)}</a></p>`
    + `<p class="ink3" style="margin:0;font:13px/18px ${SANS};color:#5C646C">Or open <a class="link" href="${href}" style="color:#0E665C;word-break:break-all">${href}</a></p>`
}

function small(text: string, kind: 'ink3' | 'caution'): string {
  const colour = kind === 'caution' ? '#8A5A00' : '#5C646C'
  return `<p class="${kind}" style="margin:0 0 4px;font:13px/18px ${SANS};color:${colour}">${escapeHtml(text)}</p>`
}

function toHtml(parts: MailParts, subject: string, facts: [string, string][], url: string): string {
  const body = [
    ...parts.paragraphs.map(paragraph), factRows(facts), ...(parts.quotes ?? []).map(quote), actionBlock(parts.action.label, url),
  ].join('')
  const foot = [parts.demonstration ? small(DEMONSTRATION, 'caution') : '', small(parts.reason, 'ink3'), small(AID, 'ink3')].join('')
  return '<!doctype html><html lang="en"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width,initial-scale=1">'
    + `<meta name="color-scheme" content="light dark"><meta name="supported-color-schemes" content="light dark"><title>${escapeHtml(subject)}</title><style>${DARK}</style></head>`
    + '<body class="desk" style="margin:0;padding:24px 12px;background:#EFECE4">'
    + '<div class="sheet" role="article" style="max-width:600px;box-sizing:border-box;margin:0 auto;padding:28px 36px 32px;background:#FCFBF7;border:1px solid #D8D2C4">'
    + `<p class="ink2" style="margin:0 0 20px;font:600 14px/20px ${SANS};color:#424D58;letter-spacing:.04em">Torquill</p>`
    + `<h1 class="ink rule" style="margin:0 0 18px;padding:13px 0 0;border-top:2.5px solid #1C2733;font:600 24px/31px ${SERIF};color:#1C2733">${escapeHtml(parts.heading)}</h1>`
    + `${body}<div class="hair" style="margin:27px 0 0;padding:13px 0 0;border-top:1px solid #D8D2C4">${foot}</div></div></body></html>`
}

function toText(parts: MailParts, facts: [string, string][], url: string): string {
  const width = Math.max(0, ...facts.map(([label]) => label.length)) + 2
  const rows = facts.map(([label, value]) => `${`${label}:`.padEnd(width)} ${value}`)
  const quotes = (parts.quotes ?? []).map(({ label, text }) => `${label}\n${text.trim().split(/\r\n|\r|\n/).map(line => `> ${line}`).join('\n')}`)
  const foot = [...(parts.demonstration ? [DEMONSTRATION] : []), parts.reason, AID].join('\n')
  const blocks = [parts.heading, ...parts.paragraphs, rows.join('\n'), ...quotes, `${parts.action.label}: ${url}`, `-- \nTorquill\n${foot}`]
  return `${blocks.filter(block => block !== '').join('\n\n')}\n`
}

/** Sets the parts as a whole message. Throws when the link is not http or https. */
export function composeMail(parts: MailParts): MailContent {
  const subject = subjectLine(parts.subject)
  const url = safeUrl(parts.action.url)
  const facts = (parts.facts ?? []).filter(([, value]) => value.trim() !== '').map(([label, value]): [string, string] => [label, plainLine(value)])
  const plain = { ...parts, heading: plainLine(parts.heading), paragraphs: parts.paragraphs.map(plainLine) }
  return { subject, text: toText(plain, facts, url), html: toHtml(plain, subject, facts, url) }
}
