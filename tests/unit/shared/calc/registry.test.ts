import { expect, it } from 'vitest'
import { calcKind, makeRegistry } from '#shared/calc/registry'

it('throws on a kind registered twice', () => {
  const kind = calcKind('open-section')
  expect(() => makeRegistry([kind, kind])).toThrow('registered twice')
})
it('throws on a kind that is not registered', () => {
  expect(() => calcKind('no-such-kind')).toThrow('not registered')
})
