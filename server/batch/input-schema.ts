import { z } from 'zod'
import { calcKind } from '#shared/calc/registry'

/** The JSON Schema of a kind's inputs, made from the schema that the page and the server check with. @throws for an unknown kind. */
export function inputSchema(name: string): Record<string, unknown> {
  const { kind, version, title, schema } = calcKind(name)
  return { ...z.toJSONSchema(schema, { io: 'input' }), title: `Inputs of “${title}”, kind ${kind}, version ${version}` }
}
