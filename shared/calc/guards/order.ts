import type { Guard } from '#shared/calc/types'

/** In the order of the methods reference, then by what they speak of. */
export const inOrder = (guards: Guard[]): Guard[] =>
  guards.sort((a, b) => a.id < b.id ? -1 : a.id > b.id ? 1 : a.key < b.key ? -1 : a.key > b.key ? 1 : 0)
