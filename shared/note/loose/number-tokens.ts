/** Numbers as people type them in running text. */

export interface NumberToken {
  /** Offsets in the text, sign included. */
  from: number
  to: number
  value: number
  /** Significant digits as typed, without leading zeros: `0.0428` → `428`, `1.50` → `150`. */
  digits: string
  /** One unit of the last typed place: 0.01 for `1.50`. */
  place: number
  /** Zeros at the end of a whole number may or may not be meant: `21500`. */
  trailingZeros: number
  /** A whole number without sign, point or power: what a reference looks like too. */
  plain: boolean
}

const SPACE = ' \u00a0\u2009\u202f'
const NUMBER = new RegExp(
  `(?:(\\d{1,3}(?:[${SPACE}]\\d{3})+(?!\\d)|\\d{1,3}(?:,\\d{3})+(?![\\d.,]*\\d)|\\d+)([.,]\\d+)?|(\\.\\d+))`
  + `(?:[eE]([+-]?\\d{1,3})(?![\\d.\\p{L}])|[${SPACE}]?[×x*·⋅][${SPACE}]?10(?:\\^?([-−+]?\\d{1,2})(?!\\d)|([⁻⁺]?[⁰¹²³⁴⁵⁶⁷⁸⁹]{1,2})))?`, 'gu')
const FRACTION = /^\/(\d{1,3})(?![\d./])/
const MAX_LENGTH = 40
const SUPERSCRIPTS = '⁰¹²³⁴⁵⁶⁷⁸⁹'

function powerOf(plain: string | undefined, caret: string | undefined, raised: string | undefined): number {
  const text = plain ?? caret ?? (raised ?? '0').replace(/[⁰¹²³⁴⁵⁶⁷⁸⁹]/g, digit => String(SUPERSCRIPTS.indexOf(digit))).replace('⁻', '-').replace('⁺', '')
  return Number(text.replace('−', '-'))
}

/** Where the sign stands that belongs to the number at `at`, or `at` when there is none. */
function signAt(text: string, at: number): number {
  const before = text[at - 1] ?? ''
  if (before === '±' || before === '+' || before === '−') return at - 1
  if (before !== '-' && before !== '–') return at
  return at === 1 || /[\s(=≈:[|/]/.test(text[at - 2] ?? '') ? at - 1 : at
}

/** A number glued to a letter or another number is part of a name: `S07`, `25.613`, `QW19-5721`. */
function isGlued(text: string, at: number, lastEnd: number): boolean {
  const before = text[at - 1] ?? ''
  if (/[\p{L}\p{N}_.,]/u.test(before)) return true
  if (before !== '-' && before !== '–' && before !== '/') return false
  const further = text[at - 2] ?? ''
  // A dash between two free numbers is a range; between a name and a number it belongs to the name.
  return /[\p{L}\p{N})]/u.test(further) && (before === '/' || lastEnd !== at - 1)
}

function tokenOf(text: string, match: RegExpExecArray | RegExpMatchArray & { index: number }): NumberToken {
  const [all, whole = '', fraction, bare, plainPower, caretPower, raisedPower] = match
  const decimals = (bare ?? fraction ?? '').slice(1)
  const head = whole.replace(/[^\d]/g, '')
  const power = powerOf(plainPower, caretPower, raisedPower)
  const from = signAt(text, match.index)
  const negative = from < match.index && /[-−–]/.test(text[from] ?? '')
  const size = Number(`${head || '0'}.${decimals || '0'}e${power}`)
  const significant = `${head}${decimals}`.replace(/^0+/, '')
  return {
    from, to: match.index + all.length,
    value: negative ? -size : size,
    digits: significant,
    place: 10 ** (power - decimals.length),
    trailingZeros: decimals === '' ? /0*$/.exec(significant)?.[0].length ?? 0 : 0,
    plain: from === match.index && all === whole && /^\d+$/.test(all),
  }
}

/** `3/16` after its upper number was read. */
function asFraction(token: NumberToken, text: string): NumberToken {
  const lower = token.plain ? FRACTION.exec(text.slice(token.to, token.to + 6)) : null
  if (!lower || Number(lower[1]) === 0) return token
  const value = token.value / Number(lower[1])
  // A fraction is exact: it counts as if typed to six figures.
  const place = 10 ** (Math.floor(Math.log10(value || 1)) - 5)
  return { ...token, to: token.to + lower[0].length, value, place, digits: String(Math.round(value / place)), trailingZeros: 0, plain: false }
}

/** Every free-standing number of the text, in order. Linear in the length of the text. */
export function numberTokens(text: string): NumberToken[] {
  const tokens: NumberToken[] = []
  let lastEnd = -1
  let skipTo = 0
  for (const match of text.matchAll(NUMBER)) {
    if (match.index < skipTo) continue
    const glued = isGlued(text, match.index, lastEnd)
    const token = asFraction(tokenOf(text, match), text)
    lastEnd = glued ? -1 : token.to
    skipTo = token.to
    if (!glued && match[0].length <= MAX_LENGTH && Number.isFinite(token.value)) tokens.push(token)
  }
  return tokens
}
