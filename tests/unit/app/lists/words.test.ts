// @vitest-environment happy-dom
import { describe, expect, it } from 'vitest'
import { saveOf, valueLines, valueSummary } from '~/components/trail/trail-values'
import { showAge, showTime } from '~/composables/show-time'
import { refusalOf, signInAddress } from '~/composables/use-api'
import { dutyOf } from '~/composables/use-me'
import { isTyping } from '~/composables/use-shortcuts'

describe('times', () => {
  it('are UTC, whatever the machine is set to', () => {
    expect(showTime('2026-10-12T09:00:05+02:00')).toBe('2026-10-12 07:00')
    expect(showTime('2026-10-12T09:00:05Z', true)).toBe('2026-10-12 09:00:05')
  })

  it.each([[30, 'now'], [59 * 60, '59 min'], [60 * 60, '1 h'], [47.9 * 3600, '47 h'], [48 * 3600, '2 d'], [41.9 * 86_400, '41 d']])('%d seconds ago is %s, never rounded up', (seconds, shown) => {
    const now = Date.UTC(2026, 9, 12, 9)
    expect(showAge(new Date(now - seconds * 1000).toISOString(), now)).toBe(shown)
  })
})

describe('a refusal', () => {
  const error = { code: 'save-conflict', message: 'Somebody saved before you.', details: { save: 4 } }

  it('keeps the code, the sentence and the facts, wrapped or not', () => {
    expect(refusalOf({ statusCode: 409, data: error })).toEqual({ ok: false, status: 409, error })
    expect(refusalOf({ statusCode: 409, data: { statusCode: 409, data: error } })).toEqual({ ok: false, status: 409, error })
  })

  it('without an answer says that what was typed is kept', () => {
    const refusal = refusalOf(new TypeError('fetch failed'))
    expect(refusal).toMatchObject({ status: 0, error: { code: 'no-connection' } })
    expect(refusal.error.message).toContain('What you typed is kept')
  })

  it('of an unknown shape still says what to do', () => expect(refusalOf({ statusCode: 502, data: '<html>' }).error.message).toContain('Reload the page'))

  it('for want of a sign-in keeps the address', () => {
    expect(signInAddress('/notes?q=hat stiffener')).toBe('/sign-in?to=%2Fnotes%3Fq%3Dhat%20stiffener')
    expect(signInAddress('/')).toBe('/sign-in')
  })
})

describe('duties', () => {
  const project = (roles: ('analyst' | 'checker' | 'approver')[]) => ({ id: 'p', code: 'QW-19', name: 'Ondrell', roles })

  it('are named once, however many projects give them', () => {
    expect(dutyOf({ auditor: false, administrator: false, projects: [project(['checker', 'analyst']), project(['analyst'])] })).toBe('analyst and checker')
    expect(dutyOf({ auditor: true, administrator: true, projects: [project(['approver'])] })).toBe('approver, auditor and administrator')
    expect(dutyOf({ auditor: false, administrator: false, projects: [] })).toBe('no role yet')
  })
})

describe('single keys', () => {
  const element = (html: string) => {
    document.body.innerHTML = html
    return document.querySelector('[data-at]')
  }

  it.each([['<input data-at>', true], ['<textarea data-at></textarea>', true], ['<div role="dialog"><button data-at></button></div>', true], ['<input type="checkbox" data-at>', false], ['<a href="#" data-at></a>', false]])('%s takes them itself: %s', (html, typing) => {
    expect(isTyping(element(html))).toBe(typing)
  })
})

describe('values of the trail', () => {
  it('are set side by side by name', () => {
    expect(valueLines('{"roles":["analyst"]}', '{"person":"x","roles":["analyst","checker"]}')).toEqual([
      { name: 'roles', was: 'analyst', is: 'analyst, checker' }, { name: 'person', was: '', is: 'x' },
    ])
    expect(valueLines(null, null)).toEqual([])
    expect(valueLines('"draft"', '"in check"')).toEqual([{ name: 'value', was: 'draft', is: 'in check' }])
  })

  it('that are no JSON are shown as they stand', () => expect(valueLines(null, 'not json')).toEqual([{ name: 'value', was: '', is: 'not json' }]))

  it('are summed up without ids and fingerprints', () => {
    expect(valueSummary('{"document":"9c417e02b8d51f6a30c7e94b9c417e02b8d51f6a30c7e94b9c417e02b8d51f6a","save":16}')).toBe('save 16')
    expect(valueSummary(`{"text":"${'a'.repeat(200)}"}`)).toHaveLength(90)
  })

  it('name a save only on an issue', () => {
    expect(saveOf('issue', '{"save":16}')).toBe(16)
    expect(saveOf('person', '{"save":16}')).toBeNull()
    expect(saveOf('issue', '{"state":"draft"}')).toBeNull()
  })
})
