import type { EntityManager, MikroORM } from '@mikro-orm/postgresql'
import { connect } from '#server/database/orm'
import { environment } from './environment'

let pending: Promise<MikroORM> | undefined

/** The application's ORM, connected once. Awaited per request, since server plugins are not. */
export function useOrm(): Promise<MikroORM> {
  pending ??= connect(environment().databaseUrl)
  return pending
}

/** A fresh identity map: one per request. */
export async function freshEm(): Promise<EntityManager> {
  return (await useOrm()).em.fork()
}

export async function closeOrm() {
  const orm = await pending
  pending = undefined
  await orm?.close()
}
