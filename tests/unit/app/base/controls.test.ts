// @vitest-environment happy-dom
import { afterEach, describe, expect, it } from 'vitest'
import { nextTick } from 'vue'
import BaseButton from '~/components/base/BaseButton.vue'
import BaseCheck from '~/components/base/BaseCheck.vue'
import BaseDialog from '~/components/base/BaseDialog.vue'
import BaseInput from '~/components/base/BaseInput.vue'
import BaseNotice from '~/components/base/BaseNotice.vue'
import BaseRefusal from '~/components/base/BaseRefusal.vue'
import BaseSegments from '~/components/base/BaseSegments.vue'
import BaseSelect from '~/components/base/BaseSelect.vue'
import { faultsOf, mountBase } from './mount-base'

afterEach(() => {
  document.body.innerHTML = ''
})

describe('a verb', () => {
  it('that cannot be used says what remains, can be reached, and does nothing', async () => {
    const button = mountBase(BaseButton, { props: { why: '3 things remain' }, slots: { default: 'Submit for check' } })
    await button.trigger('click')
    expect(button.emitted('press')).toBeUndefined()
    expect(button.attributes()).toMatchObject({ 'aria-disabled': 'true' })
    expect(button.attributes('disabled')).toBeUndefined()
    expect(button.text()).toBe('Submit for check: 3 things remain')
    expect(await faultsOf(button.element)).toEqual([])
  })

  it('pressed twice while it is under way acts once', async () => {
    const button = mountBase(BaseButton, { slots: { default: 'Release' } })
    await button.trigger('click')
    await button.setProps({ busy: true })
    await button.trigger('click')
    expect(button.emitted('press')).toHaveLength(1)
  })
})

describe('a field', () => {
  it('ties its fault to the control and keeps what was typed', async () => {
    const field = mountBase(BaseInput, { props: { label: 'Part number', modelValue: '5721 14', error: 'Type the part number.', hint: 'As on the drawing.' } })
    const input = field.find('input')
    const described = (input.attributes('aria-describedby') ?? '').split(' ').map(id => document.getElementById(id)?.textContent?.trim())
    expect(described).toEqual(['As on the drawing.', 'Type the part number.'])
    expect(input.attributes('aria-invalid')).toBe('true')
    expect(input.element.value).toBe('5721 14')
    expect(await faultsOf(field.element)).toEqual([])
  })

  it.each([
    ['select', BaseSelect, { label: 'project', modelValue: '', inline: true, options: [{ value: '', label: 'any' }] }],
    ['box', BaseCheck, { label: 'Auditor', modelValue: false, hint: 'Reads every project.' }],
    ['one of few', BaseSegments, { legend: 'State', modelValue: '', options: [{ value: '', label: 'all' }, { value: 'draft', label: 'draft', count: 3 }] }],
  ])('%s has its name', async (_, component, props) => {
    expect(await faultsOf(mountBase(component, { props }).element.parentElement ?? document.body)).toEqual([])
  })
})

describe('a refusal', () => {
  it('is told at once, what went well is told without haste', () => {
    expect(mountBase(BaseNotice, { props: { voice: 'stop' }, slots: { default: 'No.' } }).attributes('role')).toBe('alert')
    expect(mountBase(BaseNotice, { props: { voice: 'pass' }, slots: { default: 'Yes.' } }).attributes('role')).toBe('status')
  })

  it('for want of a sign-in leaves the page where it is, with what was typed', () => {
    const link = mountBase(BaseRefusal, { props: { error: { code: 'not-signed-in', message: 'Sign in to go on.' } } }).find('a')
    expect(link.attributes()).toMatchObject({ href: '/sign-in', target: '_blank' })
  })
})

describe('a dialog', () => {
  const dialog = () => mountBase(BaseDialog, { props: { open: true, title: 'New note', description: 'It opens at issue A.' }, slots: { default: '<label>Title <input id="first"></label>' } })

  it('has its name and begins at its first field', async () => {
    dialog()
    await nextTick()
    await nextTick()
    const element = document.querySelector('[role=dialog]')
    expect(element).not.toBeNull()
    expect(document.activeElement?.id).toBe('first')
    expect(await faultsOf(element ?? document.body)).toEqual([])
  })

  it('is left by escape', async () => {
    const wrapper = dialog()
    await nextTick()
    document.querySelector('#first')?.dispatchEvent(new KeyboardEvent('keydown', { key: 'Escape', bubbles: true }))
    await nextTick()
    expect(wrapper.emitted('update:open')?.at(-1)).toEqual([false])
  })
})
