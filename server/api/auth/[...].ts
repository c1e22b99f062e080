import CredentialsImport from 'next-auth/providers/credentials'
import { AsyncLocalStorage } from 'node:async_hooks'
import { createHash } from 'node:crypto'
import { createError, defineEventHandler, getHeader, readBody, setResponseHeader, type H3Event } from 'h3'
import { NuxtAuthHandler } from '#auth'
import { DomainError } from '#shared/errors'
import { endSession } from '../../domain/people/endSessions'
import { loadActor } from '../../domain/people/loadActor'
import { normalEmail } from '../../domain/people/normalEmail'
import { signIn } from '../../domain/people/signIn'
import { addressOf } from '../../utils/address'
import { answerProblem } from '../../utils/answerProblem'
import { knownBrowser, markBrowser } from '../../utils/knownBrowser'
import { logLine } from '../../utils/logLine'
import { now } from '../../utils/now'
import { assertOwnOrigin } from '../../utils/origin'
import { problemOf } from '../../utils/problem'
import { publicUrl } from '../../utils/publicUrl'
import { sessionCookie } from '../../utils/sessionCookie'
import { useLimits } from '../../utils/useLimits'
import { openStores, useStores } from '../../utils/useStores'

type Credentials = typeof CredentialsImport
const isProvider = (value: unknown): value is Credentials => typeof value === 'function'
// next-auth 4 is CommonJS: the bundled import may be the namespace object.
const inner: unknown = 'default' in CredentialsImport ? CredentialsImport.default : null
const CredentialsProvider = isProvider(inner) ? inner : CredentialsImport

/** The request that a sign-in belongs to: next-auth hands its callbacks no event. */
const asking = new AsyncLocalStorage<H3Event>()
let asked = 0

/** Sign-in by e-mail and passphrase. The token carries an opaque session token; who it is, is looked up on every request. */
const nextAuth = NuxtAuthHandler({
  secret: process.env.AUTH_SECRET,
  session: { strategy: 'jwt', maxAge: 12 * 3600 },
  cookies: { sessionToken: sessionCookie() },
  pages: { signIn: '/sign-in', signOut: '/sign-in', error: '/sign-in' },
  logger: {
    error: code => logLine('warn', { event: 'auth', code }),
    warn: () => {},
    debug: () => {},
  },
  providers: [
    CredentialsProvider({
      name: 'passphrase',
      credentials: { email: { type: 'email' }, password: { type: 'password' } },
      async authorize(given) {
        const event = asking.getStore()
        if (!event) throw new Error('A sign-in without a request.')
        const email = String(given?.email ?? '')
        const address = addressOf(event)
        const signedIn = await signIn(useStores(), useLimits(), { email, passphrase: String(given?.password ?? ''), address, browser: knownBrowser(event, email) }, now()).catch((error: unknown) => {
          // next-auth writes what is thrown into an address: only our own codes may stand there.
          if (error instanceof DomainError) throw error
          logLine('error', { event: 'sign-in failed', request: event.context.requestId, stack: error instanceof Error ? error.stack : String(error) })
          throw new DomainError('failed')
        })
        logLine('info', { event: signedIn ? 'signed in' : 'sign-in refused', person: signedIn?.personId ?? null, address })
        if (!signedIn) return null
        markBrowser(event, email)
        return { id: signedIn.personId, sid: signedIn.token, name: signedIn.displayName, email: signedIn.email }
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
      const nobody = {} as typeof session
      if (typeof token.sid !== 'string' || typeof token.uid !== 'string') return nobody
      const actor = await loadActor(useStores().read, createHash('sha256').update(token.sid).digest(), now())
      if (!actor || actor.personId !== token.uid) return nobody
      return { ...session, user: { id: actor.personId, name: actor.displayName, email: actor.email } }
    },
  },
  events: {
    async signOut({ token }) {
      if (typeof token?.sid === 'string') await endSession(useStores(), createHash('sha256').update(token.sid).digest(), 'signed out', now())
    },
  },
})

const largestForm = 16_384

export default defineEventHandler(async (event) => {
  const action = (event.context.params?._ ?? '').split('/')[0]
  if (action === '_log') throw createError({ statusCode: 404 }) // browsers have nothing to write into our log
  setResponseHeader(event, 'Cache-Control', 'no-store')
  try {
    await openStores()
    if (event.method === 'POST') {
      assertOwnOrigin(event)
      // A body is read whole: its length must be told, and small.
      const length = Number(getHeader(event, 'content-length') ?? Number.NaN)
      if (!(length <= largestForm)) throw new DomainError('too_large', { limit: '16 kB' })
      if (action === 'callback') await refuseTooManyTries(event)
      if (action === 'signout') setResponseHeader(event, 'Clear-Site-Data', '"cache"')
    }
    asked++
    try {
      return await asking.run(event, () => nextAuth(event))
    }
    finally {
      // while anything follows its requests, every promise of the process pays for it
      if (--asked === 0) asking.disable()
    }
  }
  catch (error) {
    if (error instanceof DomainError) return answerProblem(event, { ...problemOf(error), ...failedUrl(error) })
    throw error
  }
})

/** next-auth turns what its callback throws into a redirect; who has tried too often is told in so many words, before it runs. */
async function refuseTooManyTries(event: H3Event): Promise<void> {
  const body: unknown = await readBody(event)
  const email = typeof body === 'object' && body !== null && 'email' in body ? String(body.email) : ''
  const browser = knownBrowser(event, email)
  const seconds = await useLimits().look({ account: normalEmail(email), address: addressOf(event), isKnownBrowser: browser !== null, browser })
  if (seconds !== null) throw new DomainError('too_many_requests', { seconds })
}

/** The sign-in page's own client looks for the reason in a `url`. */
function failedUrl(error: DomainError): { url: string } {
  const query = new URLSearchParams({ error: error.code, ...(typeof error.facts.seconds === 'number' ? { seconds: String(error.facts.seconds) } : {}) })
  return { url: `${publicUrl()}/sign-in?${query}` }
}
