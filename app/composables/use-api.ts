import type { FetchError } from 'ofetch'
import type { ApiError } from '#shared/schemas/api-error'

export interface Refusal { ok: false, status: number, error: ApiError }
export type ApiAnswer<T> = { ok: true, value: T } | Refusal
type Body = object | FormData

const unreachable: ApiError = { code: 'no-connection', message: 'The server does not answer. What you typed is kept here; try again when the connection is back.' }

/** Nuxt may wrap what a handler threw in `data`. */
function errorIn(data: unknown): ApiError | null {
  if (typeof data !== 'object' || data === null) return null
  if ('code' in data && 'message' in data && typeof data.code === 'string') return data as ApiError
  return 'data' in data ? errorIn(data.data) : null
}

/** What was thrown by a fetch, as a refusal with a sentence; status 0 means no answer at all. */
export function refusalOf(thrown: unknown): Refusal {
  const failure = thrown as Partial<FetchError>
  const status = failure.statusCode ?? failure.response?.status ?? 0
  const known = errorIn(failure.data)
  if (known) return { ok: false, status, error: known }
  if (status === 0) return { ok: false, status, error: unreachable }
  return { ok: false, status, error: { code: 'unknown', message: `The server answered with status ${status}. Reload the page and try again; if it happens again, tell the administrator.` } }
}

/** Where to sign in and come back to. */
export const signInAddress = (to: string) => to === '/' ? '/sign-in' : `/sign-in?to=${encodeURIComponent(to)}`

/**
 * The one way in which the browser asks the server. A refusal comes back as a
 * value, so that its sentence can stand beside the thing refused. A read that
 * finds nobody signed in goes to the sign-in page and comes back; a write
 * stays, for what was typed must not be lost.
 */
export function useApi() {
  const nuxt = useNuxtApp()
  const route = useRoute()
  const fetcher = useRequestFetch() as typeof $fetch

  async function ask<T>(method: 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE', url: string, more: { body?: Body, query?: Record<string, unknown> } = {}): Promise<ApiAnswer<T>> {
    try {
      const value = await fetcher<unknown>(url, { method, retry: 0, query: more.query, body: more.body as Record<string, unknown> | undefined })
      return { ok: true, value: value as T }
    } catch (thrown) {
      const refusal = refusalOf(thrown)
      if (method === 'GET' && refusal.error.code === 'not-signed-in') await nuxt.runWithContext(() => navigateTo(signInAddress(route.fullPath)))
      return refusal
    }
  }
  return {
    get: <T>(url: string, query?: Record<string, unknown>) => ask<T>('GET', url, { query }),
    post: <T = { ok: true }>(url: string, body: Body = {}) => ask<T>('POST', url, { body }),
    put: <T = { ok: true }>(url: string, body: Body = {}) => ask<T>('PUT', url, { body }),
    patch: <T = { ok: true }>(url: string, body: Body = {}) => ask<T>('PATCH', url, { body }),
    remove: <T = { ok: true }>(url: string) => ask<T>('DELETE', url),
  }
}
