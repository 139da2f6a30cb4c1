// @vitest-environment happy-dom
import { describe, expect, it } from 'vitest'
import BaseGlyph from '~/components/base/BaseGlyph.vue'
import BaseMargin from '~/components/base/BaseMargin.vue'
import BaseRuler from '~/components/base/BaseRuler.vue'
import BaseStamp from '~/components/base/BaseStamp.vue'
import { ISSUE_STATES } from '#shared/review/states'
import { faultsOf, mountBase } from './mount-base'

describe('a margin', () => {
  // The demonstration's scenario gives the full value and the one displayed.
  it.each([[1.416908, '+1.41'], [0.073153, '+0.07'], [0.209439, '+0.20'], [0.032772, '+0.03'], [0.009623, '+0.00']])('%f is shown as %s', (ms, shown) => {
    expect(mountBase(BaseMargin, { props: { ms } }).text()).toBe(shown)
  })

  it('below zero says so in a word, not by its colour', () => {
    expect(mountBase(BaseMargin, { props: { ms: -0.128431 } }).text()).toBe('−0.13, negative')
  })

  it('that does not exist yet is told apart from one without load', () => {
    expect(mountBase(BaseMargin, { props: { ms: null, none: 'none yet' } }).text()).toBe('none yet')
    expect(mountBase(BaseMargin, { props: { ms: null } }).text()).toBe('high (no load)')
  })
})

describe('the ruler', () => {
  const classOf = (ms: number) => mountBase(BaseRuler, { props: { ms } }).findAll('path').at(-1)?.classes()

  it('sets a wedge between its ends and an arrow beyond them', () => {
    expect(classOf(0.11)).toEqual(['wedge'])
    expect(classOf(-0.04)).toEqual(['wedge', 'short'])
    expect(classOf(1.95)).toEqual(['beyond'])
    expect(classOf(-0.6)).toEqual(['beyond', 'short'])
  })

  it('puts the wedge of zero on the zero line', () => {
    const paths = mountBase(BaseRuler, { props: { ms: 0 } })
    const x = (path: string) => Number(/^M([\d.]+)/.exec(path)?.[1])
    expect(x(paths.find('.wedge').attributes('d') ?? '')).toBe(x(paths.find('.zero').attributes('d') ?? ''))
  })

  it('is silent, for the number stands beside it', () => expect(mountBase(BaseRuler, { props: { ms: 1 } }).attributes('aria-hidden')).toBe('true'))
})

describe('a stamp', () => {
  it.each(ISSUE_STATES)('of the state %s carries its word', async (state) => {
    const stamp = mountBase(BaseStamp, { props: { state, detail: 'issue B, save 14' } })
    expect(stamp.text().toLowerCase()).toContain(state)
    expect(stamp.text()).toContain('issue B, save 14')
    expect(await faultsOf(stamp.element)).toEqual([])
  })

  it('says that a release is being made', () => {
    expect(mountBase(BaseStamp, { props: { state: 'for approval', releasing: true, flat: true } }).text()).toBe('Release being made')
  })
})

describe('a mark', () => {
  it('that stands alone has its word, one beside a word is silent', () => {
    expect(mountBase(BaseGlyph, { props: { name: 'caution', label: 'caution' } }).attributes()).toMatchObject({ 'role': 'img', 'aria-label': 'caution' })
    expect(mountBase(BaseGlyph, { props: { name: 'caution' } }).attributes('aria-hidden')).toBe('true')
  })
})
