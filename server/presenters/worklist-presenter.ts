import type { EntityManager } from '@mikro-orm/postgresql'
import type { Person } from '#server/database/entities/person'

export async function presentWorklist(_em: EntityManager, _person: Person): Promise<unknown[]> {
  return []
}
