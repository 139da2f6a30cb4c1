/** The form that is read from the schema of a kind. */
import { describe, expect, it } from 'vitest'
import { z } from 'zod'
import { formFields, type FormField } from '#shared/calc/form/form-fields'
import { choice, declared, optionalQuantity, paragraph, quantity } from '#shared/calc/parts/fields'
import { calcKind, calcKindNames } from '#shared/calc/registry'

const schema = z.strictObject({
  units: choice('Units of the results', ['SI', 'US']),
  radius: quantity('Outside radius', 'length', { symbol: 'R_o', description: 'Half of the diameter.' }),
  allowed: optionalQuantity('Twist allowed', 'angle'),
  hollow: declared('Hollow'),
  reason: paragraph.meta({ title: 'Reason' }),
  forces: z.array(z.strictObject({ id: z.string().max(20), size: quantity('Size', 'force') })).min(1).max(9).meta({ title: 'Forces' }),
  shape: z.discriminatedUnion('by', [
    z.strictObject({ by: z.literal('circle'), radius: quantity('Radius', 'length') }).meta({ title: 'round bar' }),
    z.strictObject({ by: z.literal('thick-tube'), outside: quantity('Outside', 'length') }),
  ]).meta({ title: 'Shape' }),
})
const fields = formFields(schema)
const field = <T extends FormField['type']>(path: string, type: T) => {
  const found = fields.find(each => each.path === path)
  if (found?.type !== type) throw new Error(`${path} is a ${found?.type ?? 'nothing'}`)
  return found as Extract<FormField, { type: T }>
}

describe('the form of a schema', () => {
  it('asks under the label, symbol and help of each field', () => {
    expect(field('radius', 'quantity')).toMatchObject({ title: 'Outside radius', symbol: 'R_o', help: 'Half of the diameter.', dimension: 'length', optional: false })
    expect(field('allowed', 'quantity')).toMatchObject({ title: 'Twist allowed', optional: true })
    expect(field('units', 'choice').options.map(each => each.value)).toEqual(['SI', 'US'])
    expect(field('hollow', 'switch').title).toBe('Hollow')
    expect(field('reason', 'text').long).toBe(true)
  })
  it('begins a new row and a new way with empty fields in the units of the system', () => {
    expect(field('forces', 'list')).toMatchObject({ most: 9, least: 1 })
    expect(field('forces', 'list').blank('US')).toEqual({ id: '', size: { text: '', unit: 'lbf' } })
    const { ways } = field('shape', 'ways')
    expect(ways.map(way => way.label)).toEqual(['round bar', 'Thick tube'])
    expect(ways[1]?.blank('SI')).toEqual({ by: 'thick-tube', outside: { text: '', unit: 'mm' } })
    expect(ways.map(way => way.fields.map(each => each.path))).toEqual([['radius'], ['outside']])
  })
})

describe.each(calcKindNames())('the form of %s', (name) => {
  const every = (list: readonly FormField[]): FormField[] => list.flatMap(each =>
    [each, ...('fields' in each ? every(each.fields) : []), ...('ways' in each ? each.ways.flatMap(way => every(way.fields)) : [])])
  const kind = calcKind(name)

  it('names every field', () => {
    for (const each of every(formFields(kind.schema))) expect(each.title, each.path).toMatch(/^[A-Z\p{L}]/u)
  })
  it('reaches every input of a fresh calculation', () => {
    const paths = formFields(kind.schema).map(each => each.path)
    for (const key of Object.keys(kind.blank() as object)) expect(paths).toContain(key)
  })
})
