/** TeX read as plain text, so that one scan serves text and equations alike. */

export interface PlainTex {
  text: string
  /** Offset in the TeX for each character of the text, and one for its end. */
  at: number[]
}

const LETTERS: Record<string, string> = {
  alpha: 'α', beta: 'β', gamma: 'γ', delta: 'δ', epsilon: 'ε', varepsilon: 'ε', zeta: 'ζ', eta: 'η', theta: 'θ', vartheta: 'θ', kappa: 'κ', lambda: 'λ',
  mu: 'μ', nu: 'ν', xi: 'ξ', pi: 'π', rho: 'ρ', sigma: 'σ', tau: 'τ', phi: 'φ', varphi: 'φ', chi: 'χ', psi: 'ψ', omega: 'ω',
  Gamma: 'Γ', Delta: 'Δ', Theta: 'Θ', Lambda: 'Λ', Sigma: 'Σ', Phi: 'Φ', Psi: 'Ψ', Omega: 'Ω',
}
const SIGNS: Record<string, string> = {
  cdot: '·', times: '×', approx: '≈', simeq: '≈', le: '≤', leq: '≤', ge: '≥', geq: '≥', pm: '±', prime: '′', circ: '°', degree: '°', quad: ' ', qquad: ' ', equiv: '=', to: '→',
}
const DROPPED = new Set(['mathrm', 'text', 'textrm', 'operatorname', 'mathit', 'mathbf', 'left', 'right', 'bigl', 'bigr', 'big', 'Big', 'displaystyle', 'dfrac', 'frac', 'tfrac', 'sqrt', 'boldsymbol'])
const SUPERSCRIPTS: Record<string, string> = { 0: '⁰', 1: '¹', 2: '²', 3: '³', 4: '⁴', 5: '⁵', 6: '⁶', 7: '⁷', 8: '⁸', 9: '⁹', '-': '⁻', '−': '⁻' }
const TOKEN = /\\([A-Za-z]+)|\\(.)|\^\{?([-−]?\d{1,2})\}?|[\s\S]/g

/** What one token of TeX says in plain text. `next` is the character after it. */
function plainOf(match: RegExpMatchArray, next: string): string {
  const [token, word, sign, power] = match
  if (word !== undefined) return LETTERS[word] ?? SIGNS[word] ?? (DROPPED.has(word) ? '' : ' ')
  if (sign !== undefined) return sign === '\\' ? '\n' : /[%&#$]/.test(sign) ? sign : ' '
  if (power !== undefined) return [...power].map(digit => SUPERSCRIPTS[digit] ?? digit).join('')
  switch (token) {
    case '{': case '}': case '^': case '_': return ''
    case '\'': return '′'
    case '~': case '&': return ' '
    case ' ': return /[A-Za-z0-9.=]/.test(next) ? ' ' : ''
    default: return token
  }
}

/** Reads TeX as text: letters for Greek commands, ′ for primes, raised digits for powers, thin spaces as spaces. */
export function plainTex(tex: string): PlainTex {
  const source = tex.replaceAll('}{', '}/')
  let text = ''
  const at: number[] = []
  for (const match of source.matchAll(TOKEN)) {
    const plain = plainOf(match, source[(match.index ?? 0) + match[0].length] ?? '')
    for (const character of plain) {
      text += character
      for (let unit = 0; unit < character.length; unit += 1) at.push(match.index ?? 0)
    }
  }
  at.push(tex.length)
  return { text, at }
}
