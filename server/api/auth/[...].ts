import CredentialsProvider from 'next-auth/providers/credentials'
import { getRequestIP } from 'h3'
import { NuxtAuthHandler } from '#auth'
import { signIn } from '#server/access/sign-in'
import { PersonSchema } from '#server/database/entities/person'
import { DomainError } from '#server/utils/domain-error'
import { environment } from '#server/utils/environment'
import { serverClock } from '#server/utils/clock'
import { freshEm } from '#server/utils/orm'

const half = 12 * 60 * 60
// The package is CommonJS: bundled it comes as a namespace, in development as the function.
const credentials = (CredentialsProvider as unknown as { default?: typeof CredentialsProvider }).default ?? CredentialsProvider

async function authorize(typed: Record<string, string> | undefined, request: { headers?: Record<string, string> }) {
  try {
    const person = await signIn(await freshEm(), {
      email: typed?.email ?? '', password: typed?.password ?? '', address: request.headers?.['x-torquill-address'] ?? 'unknown',
    }, serverClock)
    return person ? { id: person.id, name: person.name, email: person.email, epoch: person.sessionEpoch } : null
  } catch (error) {
    if (error instanceof DomainError && error.code === 'throttled') throw new Error('throttled')
    console.error('sign-in', error)
    return null
  }
}

const handler = NuxtAuthHandler({
  secret: environment().authSecret,
  pages: { signIn: '/sign-in', error: '/sign-in' },
  session: { strategy: 'jwt', maxAge: half },
  providers: [credentials({ name: 'Torquill', credentials: { email: {}, password: {} }, authorize })],
  callbacks: {
    jwt: ({ token, user }) => user ? { ...token, sub: user.id, epoch: (user as { epoch?: number }).epoch } : token,
    session: ({ session, token }) => ({ ...session, user: { name: session.user?.name, id: token.sub } }),
  },
  events: {
    // A token cannot be called back, so signing out raises the epoch that every token is compared with.
    signOut: async ({ token }) => {
      const em = await freshEm()
      await em.nativeUpdate(PersonSchema, { id: String(token.sub), sessionEpoch: Number(token.epoch) }, { sessionEpoch: Number(token.epoch) + 1 })
    },
  },
})

export default defineEventHandler((event) => {
  event.node.req.headers['x-torquill-address'] = getRequestIP(event) ?? 'unknown'
  return handler(event)
})
