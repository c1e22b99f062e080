import { createHash } from 'node:crypto'
import { getHeader, type H3Event } from 'h3'
import { getToken } from '#auth'
import type { Actor } from '../domain/people/actor'
import { resumeSession } from '../domain/people/resumeSession'
import { sessionCookie } from './sessionCookie'
import { useStores } from './useStores'

/**
 * The person behind a request, looked up in `session` each time: an ended session, a closed account
 * or a changed passphrase takes effect with the next request. Null when nobody is signed in.
 */
export async function findActor(event: H3Event, now: number): Promise<Actor | null> {
  const session = await openSeal(event)
  return session && resumeSession(useStores(), session.tokenSha256, now)
}

interface Sealed { tokenSha256: Buffer, endsAt: number }

/**
 * What was sealed into a cookie does not change, and opening it (a key derived anew, a decryption) costs more than looking its session up:
 * those seen last stay opened, by a digest of what was sent, until their own end. Whether the session behind still stands is not kept.
 */
const opened = new Map<string, Sealed>()
const mostOpened = 2000

async function openSeal(event: H3Event): Promise<Sealed | null> {
  const sent = createHash('sha256').update(JSON.stringify([getHeader(event, 'cookie') ?? '', getHeader(event, 'authorization') ?? ''])).digest('base64')
  const known = opened.get(sent)
  if (known && known.endsAt > Date.now()) return known
  opened.delete(sent)
  const token = await getToken({ event, cookieName: sessionCookie().name })
  if (!token || typeof token.sid !== 'string' || typeof token.uid !== 'string') return null
  const sealed = { tokenSha256: createHash('sha256').update(token.sid).digest(), endsAt: typeof token.exp === 'number' ? token.exp * 1000 : 0 }
  if (opened.size >= mostOpened) opened.delete(opened.keys().next().value ?? '')
  opened.set(sent, sealed)
  return sealed
}
