import { defineEventHandler, getQuery, getRouterParams, readRawBody, getRequestHeader, setResponseHeader, type H3Event } from 'h3'
import type { EntityManager } from '@mikro-orm/postgresql'
import type { z } from 'zod'
import { policies, type Granted, type PolicyName } from '#server/access/policies'
import { currentPerson } from '#server/access/current-person'
import type { Person } from '#server/database/entities/person'
import type { CommandContext } from './command-context'
import { toApiError } from './api-error'
import { DomainError } from './domain-error'
import { freshEm } from './orm'
import { serverClock } from './clock'

interface Spec<Can extends PolicyName, P, Q, B> {
  can: Can
  params?: z.ZodType<P>
  query?: z.ZodType<Q>
  body?: z.ZodType<B>
  /** Bytes of the body, 256 kB unless said otherwise. */
  limit?: number
  /** The handler reads the body itself: uploads. */
  raw?: boolean
}

export type ApiRequest<Can extends PolicyName, P, Q, B> = Granted<Can> & {
  event: H3Event
  em: EntityManager
  clock: () => Date
  params: P
  query: Q
  body: B
  /** For commands: throws where nobody is signed in. */
  command: CommandContext
}

async function readBody(event: H3Event, limit: number): Promise<unknown> {
  if (!['POST', 'PUT', 'PATCH', 'DELETE'].includes(event.method)) return undefined
  const declared = Number(getRequestHeader(event, 'content-length') ?? 0)
  if (declared > limit) throw new DomainError('too-large', `This is larger than ${Math.round(limit / 1024)} kB, the most that is taken here.`)
  const text = await readRawBody(event, 'utf8')
  if (!text) return {}
  if (Buffer.byteLength(text) > limit) throw new DomainError('too-large', `This is larger than ${Math.round(limit / 1024)} kB, the most that is taken here.`)
  if (!getRequestHeader(event, 'content-type')?.startsWith('application/json')) throw new DomainError('not-this-kind', 'Send JSON, with the content type application/json.')
  try {
    return JSON.parse(text)
  } catch {
    throw new DomainError('invalid-input', 'The body is not valid JSON.')
  }
}

/**
 * A route in one sentence: who may ask, what it takes, what it does. Parses
 * with zod, asks the policy, and turns every refusal into the one error shape.
 */
export function defineApi<Can extends PolicyName, R, P = Record<string, string>, Q = Record<string, unknown>, B = unknown>(
  spec: Spec<Can, P, Q, B>,
  handler: (request: ApiRequest<Can, P, Q, B>) => Promise<R>,
) {
  return defineEventHandler(async (event) => {
    try {
      setResponseHeader(event, 'Cache-Control', 'no-store')
      const em = await freshEm()
      const actor = await currentPerson(event, em)
      const rawParams = getRouterParams(event, { decode: true })
      const granted = await policies[spec.can]({ em, actor, params: rawParams }) as Granted<Can>
      const params = (spec.params ? spec.params.parse(rawParams) : rawParams) as P
      const query = (spec.query ? spec.query.parse(getQuery(event)) : getQuery(event)) as Q
      const body = spec.raw ? undefined : await readBody(event, spec.limit ?? 256 * 1024)
      const request = {
        ...granted, event, em, params, query,
        body: (spec.body ? spec.body.parse(body) : body) as B,
        clock: serverClock,
        command: { em, actor: actor as Person, clock: serverClock },
      }
      return await handler(request)
    } catch (thrown) {
      throw toApiError(thrown)
    }
  })
}
