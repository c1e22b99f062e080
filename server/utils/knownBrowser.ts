import { createHmac, randomBytes, timingSafeEqual } from 'node:crypto'
import { getCookie, setCookie, type H3Event } from 'h3'
import { normalEmail } from '../domain/people/normalEmail'
import { isSecure } from './publicUrl'

/**
 * A browser that has signed in to an account holds a signed mark of it. Its tries are counted apart from strangers',
 * so that nobody's guessing locks the owner out. The mark opens nothing.
 */
export function knownBrowser(event: H3Event, email: string): string | null {
  const [nonce, mac] = (getCookie(event, cookieName()) ?? '').split('.')
  if (!nonce || !mac) return null
  const right = Buffer.from(macOf(nonce, email))
  const given = Buffer.from(mac)
  return right.length === given.length && timingSafeEqual(right, given) ? nonce : null
}

export function markBrowser(event: H3Event, email: string): void {
  const nonce = knownBrowser(event, email) ?? randomBytes(16).toString('base64url')
  setCookie(event, cookieName(), `${nonce}.${macOf(nonce, email)}`, { httpOnly: true, sameSite: 'lax', secure: isSecure(), path: '/', maxAge: 180 * 86_400 })
}

const cookieName = () => `${isSecure() ? '__Host-' : ''}tetherhouse.known`
const macOf = (nonce: string, email: string) => createHmac('sha256', process.env.AUTH_SECRET ?? '').update(`known browser:${nonce}:${normalEmail(email)}`).digest('base64url')
