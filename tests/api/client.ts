import { inject } from 'vitest'

export interface Answer<T = Record<string, unknown>> { status: number, body: T, headers: Headers }

/** A browser without a screen: keeps cookies, sends what our pages send. */
export class Client {
  private cookies = new Map<string, string>()
  constructor(readonly baseUrl: string = inject('running').baseUrl) {}

  private remember(response: Response) {
    for (const line of response.headers.getSetCookie()) {
      const [pair = ''] = line.split(';')
      const at = pair.indexOf('=')
      this.cookies.set(pair.slice(0, at), pair.slice(at + 1))
    }
  }

  cookieHeader() {
    return [...this.cookies].map(([name, value]) => `${name}=${value}`).join('; ')
  }

  async raw(method: string, path: string, init: { body?: BodyInit, headers?: Record<string, string> } = {}): Promise<Response> {
    const response = await fetch(this.baseUrl + path, {
      method, redirect: 'manual', body: init.body,
      headers: { 'cookie': this.cookieHeader(), 'origin': this.baseUrl, 'sec-fetch-site': 'same-origin', ...init.headers },
    })
    this.remember(response)
    return response
  }

  async call<T = Record<string, unknown>>(method: string, path: string, body?: unknown): Promise<Answer<T>> {
    const response = await this.raw(method, path, body === undefined ? {} : { body: JSON.stringify(body), headers: { 'content-type': 'application/json' } })
    const text = await response.text()
    const json: unknown = text && response.headers.get('content-type')?.includes('json') ? JSON.parse(text) : text
    // h3 wraps an error's data; tests speak of the inside.
    const inside = response.status >= 400 && json && typeof json === 'object' && 'data' in json ? (json as { data: unknown }).data : json
    return { status: response.status, body: inside as T, headers: response.headers }
  }

  get = <T = Record<string, unknown>>(path: string) => this.call<T>('GET', path)
  post = <T = Record<string, unknown>>(path: string, body: unknown = {}) => this.call<T>('POST', path, body)
  put = <T = Record<string, unknown>>(path: string, body: unknown = {}) => this.call<T>('PUT', path, body)
  patch = <T = Record<string, unknown>>(path: string, body: unknown = {}) => this.call<T>('PATCH', path, body)
  delete = <T = Record<string, unknown>>(path: string) => this.call<T>('DELETE', path)

  /** The sign-in form's own way: token, then credentials. */
  async signIn(email: string, password: string): Promise<{ ok: boolean, url: string }> {
    const { body: { csrfToken } } = await this.get<{ csrfToken: string }>('/api/auth/csrf')
    const response = await this.raw('POST', '/api/auth/callback/credentials', {
      body: new URLSearchParams({ csrfToken, email, password, json: 'true' }), headers: { 'content-type': 'application/x-www-form-urlencoded' },
    })
    const { url } = await response.json() as { url: string }
    return { ok: response.status === 200 && !url.includes('error='), url }
  }

  async signOut(): Promise<void> {
    const { body: { csrfToken } } = await this.get<{ csrfToken: string }>('/api/auth/csrf')
    await this.raw('POST', '/api/auth/signout', { body: new URLSearchParams({ csrfToken, json: 'true' }), headers: { 'content-type': 'application/x-www-form-urlencoded' } })
  }
}
