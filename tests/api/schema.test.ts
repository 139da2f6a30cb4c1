import { expect, it } from 'vitest'
import { connect } from '#server/database/orm'
import { useServerEnvironment } from './environment'

it('the migrations make what the entities say', async () => {
  const orm = await connect(useServerEnvironment().ownerUrl)
  const wanted = await orm.schema.getUpdateSchemaSQL({ wrap: false, safe: true })
  await orm.close()
  // Refusals of our own (checks, partial indexes) are no part of the entities; columns and tables must not differ.
  expect(wanted.split('\n').filter(line => /add column|create table|drop column|set not null|drop not null/.test(line))).toEqual([])
})
