/** Symbols and names of results, found in running text. */
import { plainTex } from '#shared/note/loose/tex-text'

/** One spelling for a symbol however it was set: `\theta'`, `θ’` and `theta'` are all `θ′`; `\tau_{max}` is `τmax`. */
export function symbolKey(tex: string): string {
  return plainTex(tex).text
    .replace(/[_\s\u2009\u00a0\u202f.,{}\\]/g, '')
    .replace(/['’ʹ`]/g, '′')
    .replace(/^(theta|tau|sigma|Gamma|omega|phi)(?![a-z])/, word => ({ theta: 'θ', tau: 'τ', sigma: 'σ', Gamma: 'Γ', omega: 'ω', phi: 'φ' })[word] ?? word)
}

/** The letter without its index: `τmax` → `τ`, `MS` stays. */
export function symbolBase(key: string): string {
  return /^(?:MS|RF|GJ|kL|[\p{L}]′*)/u.exec(key)?.[0] ?? key
}

/** What stands directly before a number. */
export interface Beside {
  /** Normalised symbol, or null. */
  symbol: string | null
  /** Words directly before, in lower case, for names such as `warping constant`. */
  words: string
  /** A sign or verb of equality stands between. */
  equated: boolean
}

const EQUAL_SIGN = /[=≈≃→]\s*$/
const LINKING = /(?:^|[\s(])(?:is|was|are|equals|becomes|gives|reaches|of|at|to|be|about|only|now|then|thus|therefore|just|roughly|exactly|still|works out|comes)\s*$/i
const EQUATING = /(?:is|was|equals|becomes|of|reaches)\s*$/i
const ASIDE = /(?:\s*\((?:[^()]{0,24})\)|[\s,]+(?:in|for|of|under|at)\s+(?:case\s+|wall\s+|calculation\s+)?(?:[A-Z]{1,4}-?\d{1,4}|(?<=wall\s)[a-z]|limit|ultimate)(?:\s+load)?)\s*,?\s*$/
const LAST_WORD = /([\p{L}\p{M}][\p{L}\p{M}\p{N}_′'’]*)$/u
const WINDOW = 72

/** Peels equality, fillers and asides off the end of the text before a number. */
function peel(before: string): { rest: string, equated: boolean } {
  let rest = before.slice(-WINDOW)
  let equated = false
  for (let round = 0; round < 6; round += 1) {
    const trimmed = rest.replace(/[\s\u2009([]{1,8}$/, '')
    const cut = [EQUAL_SIGN, LINKING, ASIDE].map(pattern => pattern.exec(trimmed)).find(match => match !== null && match !== undefined)
    if (!cut) return { rest: trimmed, equated }
    equated ||= EQUAL_SIGN.test(cut[0]) || EQUATING.test(cut[0])
    rest = trimmed.slice(0, cut.index)
  }
  return { rest: rest.trimEnd(), equated }
}

/** In a chain `θ′ = T/(GJ) = 0.0428` the number belongs to the symbol at its head. */
function headOfChain(before: string): string | null {
  const near = before.slice(-120)
  const clause = near.slice(Math.max(...['.', ';', ',', '\n'].map(end => near.lastIndexOf(end))) + 1)
  const first = clause.indexOf('=')
  if (first < 0 || first === clause.lastIndexOf('=') || !EQUAL_SIGN.test(clause)) return null
  return LAST_WORD.exec(clause.slice(0, first).trimEnd())?.[1] ?? null
}

/** Reads what stands before the number that begins at the end of `before`. Bounded by a window of characters. */
export function besideNumber(before: string): Beside {
  const { rest, equated } = peel(before)
  const head = equated ? headOfChain(before) : null
  const last = head ?? LAST_WORD.exec(rest.slice(-24))?.[1] ?? null
  return { symbol: last === null ? null : symbolKey(last), words: rest.toLowerCase(), equated }
}
