import { environment } from '#server/utils/environment'

const reading = new Set(['GET', 'HEAD', 'OPTIONS'])

/**
 * Protection against requests that another site makes in a person's name:
 * whatever changes something must come from our own pages. Browsers say so by
 * Sec-Fetch-Site, older ones by Origin; without either it is refused.
 */
export default defineEventHandler((event) => {
  if (reading.has(event.method)) return
  const site = getRequestHeader(event, 'sec-fetch-site')
  const origin = getRequestHeader(event, 'origin')
  const ours = origin ? origin === new URL(environment().baseUrl).origin : site === 'same-origin'
  if (ours && (site === undefined || site === 'same-origin')) return
  throw createError({ statusCode: 403, statusMessage: 'cross-site', data: { code: 'cross-site', message: 'This request did not come from a page of this server.' } })
})
