import { createHash } from 'node:crypto'
import type { H3Event } from 'h3'
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
  const token = await getToken({ event, cookieName: sessionCookie().name })
  if (!token || typeof token.sid !== 'string' || typeof token.uid !== 'string') return null
  return resumeSession(useStores(), createHash('sha256').update(token.sid).digest(), now)
}
