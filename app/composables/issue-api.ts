import type { ApiError } from '#shared/schemas/api-error'
import { refusalOf } from '~/composables/use-api'

export type Answer<T> = { ok: true, value: T } | { ok: false, status: number, error: ApiError }

/**
 * Asks the server from anywhere in the browser, also from a timer or while the
 * page is being left, where no component is being set up.
 */
export async function ask<T>(url: string, options: { method?: 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE', body?: Record<string, unknown> | FormData, keepalive?: boolean } = {}): Promise<Answer<T>> {
  try {
    const value = await $fetch<unknown>(url, { retry: 0, ...options })
    return { ok: true, value: value as T }
  } catch (thrown) {
    return refusalOf(thrown)
  }
}
