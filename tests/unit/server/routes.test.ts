import { describe, expect, it } from 'vitest'
import { policies } from '#server/access/policies'
import { allRoutes } from '../../factories/routes'

/** The one route that is not ours: next-auth answers it and checks its own token. */
const outside = new Set(['auth/[...].ts'])

describe('routes', () => {
  const routes = allRoutes().filter(route => !outside.has(route.file))

  it('finds them', () => expect(routes.length).toBeGreaterThan(30))

  it.each(routes)('$method $path has a policy of the one table', ({ policy }) => {
    expect(policy).not.toBeNull()
    expect(Object.keys(policies)).toContain(policy)
  })

  it.each(routes)('$method $path is one sentence, 25 lines at the most', ({ text }) => {
    expect(text.split('\n').length).toBeLessThanOrEqual(26)
  })

  it.each(routes.filter(route => route.method === 'GET'))('$path changes nothing', ({ text }) => {
    expect(text).not.toContain('#server/commands/')
  })
})
