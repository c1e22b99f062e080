import CredentialsImport from 'next-auth/providers/credentials'
import { createHash } from 'node:crypto'
import { NuxtAuthHandler } from '#auth'
import { loadActor } from '../../domain/people/loadActor'
import { endSession } from '../../domain/people/endSessions'
import { signIn } from '../../domain/people/signIn'
import { now } from '../../utils/now'
import { openStores, useStores } from '../../utils/useStores'

// next-auth 4 is CommonJS: the bundled import may be the namespace object.
type Credentials = typeof CredentialsImport
const CredentialsProvider = ((CredentialsImport as unknown as { default?: Credentials }).default ?? CredentialsImport) as Credentials

/** Sign-in by e-mail and passphrase. The token carries an opaque session token; who it is, is looked up on every request. */
export default NuxtAuthHandler({
  secret: process.env.AUTH_SECRET,
  session: { strategy: 'jwt', maxAge: 12 * 3600 },
  pages: { signIn: '/sign-in' },
  providers: [
    CredentialsProvider({
      name: 'passphrase',
      credentials: { email: { type: 'email' }, password: { type: 'password' } },
      async authorize(given, request) {
        await openStores()
        const address = String((request.headers as Record<string, string> | undefined)?.['x-tetherhouse-address'] ?? 'unknown')
        const signedIn = await signIn(useStores(), { email: String(given?.email ?? ''), passphrase: String(given?.password ?? ''), address }, now())
        return signedIn && { id: signedIn.personId, sid: signedIn.token, name: signedIn.displayName, email: signedIn.email }
      },
    }),
  ],
  callbacks: {
    jwt({ token, user }) {
      if (user) {
        token.uid = user.id
        token.sid = user.sid
      }
      return token
    },
    async session({ session, token }) {
      // A token without our own session (one of next-auth's state cookies, a forged one) is nobody's.
      if (typeof token.sid !== 'string') return { expires: session.expires } as typeof session
      await openStores()
      const actor = await loadActor(useStores().read, createHash('sha256').update(token.sid).digest(), now())
      if (!actor) return { expires: session.expires } as typeof session
      return { ...session, user: { id: actor.personId, name: actor.displayName, email: actor.email } }
    },
  },
  events: {
    async signOut({ token }) {
      if (typeof token?.sid === 'string') await endSession(useStores(), createHash('sha256').update(token.sid).digest(), 'signed out', now())
    },
  },
})
