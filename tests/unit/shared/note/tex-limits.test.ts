import { describe, expect, it } from 'vitest'
import { texFault } from '#shared/note/tex-limits'

describe('TeX of an equation', () => {
  it.each([
    '\\theta\' = \\frac{T}{GJ}',
    'J = \\frac{1}{3}\\sum_i L_i t_i^3 = 1\\,234~\\mathrm{mm^4}',
    '\\tau_{\\max} = \\begin{cases} G t \\theta\' & \\text{flat} \\\\ K_c G t \\theta\' & \\text{corner} \\end{cases}',
    '\\left( \\frac{a}{b} \\right)^2 \\le 12\\%',
    '\\int_0^L m\\,\\mathrm{d}z',
    '',
  ])('may stand: %s', tex => expect(texFault(tex)).toBeNull())
  it.each([
    ['\\def\\a{1}', 'def'], ['\\newcommand{\\a}{1}', 'newcommand'], ['\\let\\a\\b', 'let'], ['\\require{html}', 'require'],
    ['\\href{javascript:x}{y}', 'href'], ['\\url{x}', 'url'], ['\\class{a}{b}', 'class'], ['\\style{a}{b}', 'style'], ['\\cssId{a}{b}', 'cssId'],
    ['\\includegraphics{x}', 'includegraphics'], ['\\htmlData{a=b}{c}', 'htmlData'], ['\\phantom{1.5}', 'phantom'], ['\\rule{9999em}{1em}', 'rule'],
    ['\\color{white}1', 'color'], ['\\unicode{65}', 'unicode'], ['\\begin{verbatim}x\\end{verbatim}', 'environment'],
    ['a % hidden', 'bare %'], ['#1', 'bare #'], ['$x$', 'bare $'], ['{x', 'open'], ['x}', 'never opened'],
    [`${'{'.repeat(30)}${'}'.repeat(30)}`, 'deeply'], ['x'.repeat(2001), 'longer'],
  ])('is refused: %s', (tex, why) => expect(texFault(tex)).toContain(why))
})
