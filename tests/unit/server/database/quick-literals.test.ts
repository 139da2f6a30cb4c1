import { PostgreSqlPlatform } from '@mikro-orm/postgresql'
import fc from 'fast-check'
import { expect, it } from 'vitest'
import { textLiteral } from '#server/database/quick-literals'

it('a text becomes the literal that the driver of PostgreSQL makes of it', () => {
  const platform = new PostgreSqlPlatform()
  const text = fc.string({ unit: fc.constantFrom('\'', '\\', '"', '$', 'a', ' ', '\n', '\0', '—', '\ud83d\ude00', '?', ';--') })
  fc.assert(fc.property(text, one => textLiteral(one) === platform.escape(one)), { numRuns: 2000 })
  expect(textLiteral('it\'s')).toBe('\'it\'\'s\'')
})
