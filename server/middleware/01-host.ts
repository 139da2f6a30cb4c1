import { environment } from '#server/utils/environment'

/** One canonical address: another host name is sent there, so that links, cookies and origins agree. */
export default defineEventHandler((event) => {
  const canonical = new URL(environment().baseUrl)
  if (event.path === '/api/health') return
  const host = getRequestHeader(event, 'host') ?? ''
  if (host === canonical.host) return
  if (event.method === 'GET' || event.method === 'HEAD') return sendRedirect(event, `${canonical.origin}${event.path}`, 308)
  throw createError({ statusCode: 421, statusMessage: 'wrong-host', data: { code: 'wrong-host', message: `This server answers as ${canonical.host}.` } })
})
