import type { Stores } from '../../db/writer'
import type { Actor } from './actor'
import { heldSessions } from './heldSessions'
import { findSession, loadRoles } from './loadActor'

/** Being seen is noted at most this often: a durable write for each request would buy nothing. */
const notedEvery = 5 * 60_000

/** Who a request's session belongs to, noting now and then that it is in use, so that it ends when it lies idle. */
export async function resumeSession({ read, write }: Stores, tokenSha256: Buffer, now: number): Promise<Actor | null> {
  const session = await findSession(read, tokenSha256, now)
  if (!session) return null
  if (now - session.seenAt >= notedEvery) {
    heldSessions.seen(tokenSha256, now)
    // Not waited for, and a full disk must not end anyone's reading: then the session ends a little earlier.
    write(trx => trx.updateTable('session').set({ seen_at: now }).where('token_sha256', '=', tokenSha256).where('seen_at', '<', now).execute()).catch(() => {})
  }
  return loadRoles(read, session, tokenSha256, now)
}
