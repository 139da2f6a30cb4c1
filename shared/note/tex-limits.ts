/**
 * What TeX a note may hold: the base and ams commands that only set mathematics.
 * A list of what is allowed, because both renderers know commands that define
 * macros, load packages, make links or hide text, and more may come.
 */

export const TEX_MAX_LENGTH = 2000
const MAX_DEPTH = 24

const words = (text: string) => text.split(/\s+/).filter(Boolean)

const COMMANDS = new Set(words(`
  alpha beta gamma delta epsilon varepsilon zeta eta theta vartheta iota kappa varkappa lambda mu nu xi omicron pi varpi
  rho varrho sigma varsigma tau upsilon phi varphi chi psi omega
  Gamma Delta Theta Lambda Xi Pi Sigma Upsilon Phi Psi Omega digamma
  varGamma varDelta varTheta varLambda varXi varPi varSigma varUpsilon varPhi varPsi varOmega
  frac dfrac tfrac cfrac binom dbinom tbinom sqrt over atop
  sum prod coprod int iint iiint oint bigcap bigcup bigvee bigwedge
  lim limsup liminf max min sup inf det gcd deg dim exp ln log lg
  sin cos tan cot sec csc arcsin arccos arctan sinh cosh tanh coth arg
  operatorname mathrm mathit mathbf mathsf mathtt mathcal mathbb mathfrak mathscr boldsymbol
  text textrm textit textbf textsf texttt rm it bf
  hat widehat tilde widetilde bar overline underline vec dot ddot dddot acute grave breve check mathring
  overbrace underbrace overset underset stackrel overrightarrow overleftarrow
  left right middle big Big bigg Bigg bigl bigr Bigl Bigr biggl biggr Biggl Biggr bigm Bigm
  langle rangle lfloor rfloor lceil rceil lvert rvert lVert rVert vert Vert lbrace rbrace lbrack rbrack
  cdot times div pm mp ast star circ bullet oplus ominus otimes odot cap cup vee wedge setminus
  le leq ge geq ne neq equiv approx sim simeq cong propto ll gg prec succ leqslant geqslant lesssim gtrsim nleq ngeq doteq approxeq
  in ni notin subset supset subseteq supseteq mid nmid parallel nparallel perp angle measuredangle
  to gets rightarrow leftarrow leftrightarrow Rightarrow Leftarrow Leftrightarrow longrightarrow longleftarrow
  Longrightarrow Longleftrightarrow mapsto uparrow downarrow updownarrow implies iff
  partial nabla infty prime backprime ell hbar Re Im aleph forall exists nexists emptyset varnothing
  therefore because land lor lnot neg not
  cdots ldots dots vdots ddots dotsb dotsc quad qquad enspace thinspace medspace thickspace negthinspace
  begin end hline displaystyle textstyle scriptstyle scriptscriptstyle limits nolimits
  boxed substack sideset intertext degree square blacksquare triangle dagger ddagger colon bmod pmod mod pod
`))

const ENVIRONMENTS = new Set(words(`
  array matrix pmatrix bmatrix Bmatrix vmatrix Vmatrix smallmatrix cases aligned alignedat gathered split
  align align* gather gather* equation equation* multline multline*
`))

const TOKEN = /\\([A-Za-z]+)|\\([^A-Za-z])|[{}#%&^_~$]/g

/** Names the environment opened or closed right after `\begin` or `\end`, or null when there is none. */
function environmentAt(tex: string, at: number): string | null {
  return /^\{([a-z]{1,12}\*?)\}/i.exec(tex.slice(at, at + 16))?.[1] ?? null
}

function commandFault(tex: string, word: string, after: number): string | null {
  if (!COMMANDS.has(word)) return `The equation uses \\${word}, which a note does not take. Write it with standard mathematics commands.`
  if (word !== 'begin' && word !== 'end') return null
  const name = environmentAt(tex, after)
  return name !== null && ENVIRONMENTS.has(name) ? null : `The equation uses an environment that a note does not take after \\${word}.`
}

/**
 * Says what is wrong with the TeX of an equation, or null when it may stand.
 * It judges safety and size; whether it sets well is for the renderer.
 */
export function texFault(tex: string): string | null {
  if (tex.length > TEX_MAX_LENGTH) return `The equation is longer than ${TEX_MAX_LENGTH} characters. Split it.`
  let depth = 0
  for (const token of tex.matchAll(TOKEN)) {
    const [text, word] = token
    if (word !== undefined) {
      const fault = commandFault(tex, word, token.index + text.length)
      if (fault) return fault
      if (word === 'begin' || word === 'left') depth += 1
      if (word === 'end' || word === 'right') depth -= 1
    } else if (text === '{') depth += 1
    else if (text === '}') depth -= 1
    else if (text === '#' || text === '%' || text === '$') return `The equation holds a bare ${text}. Write \\${text} instead.`
    if (depth > MAX_DEPTH) return 'The equation is nested too deeply. Split it.'
    if (depth < 0) return 'The equation closes a brace that it never opened.'
  }
  return depth === 0 ? null : 'The equation leaves a brace open.'
}
