/** A session that could not be stored because the disk is full. */
export interface HeldSession { personId: string, credentialEpoch: number, createdAt: number, seenAt: number, endsAt: number }

const most = 2000
const held = new Map<string, HeldSession>()

/**
 * Where the disk is full, people must still be able to sign in and read. Their session is then held in this process:
 * it ends with it, and like any other when it is signed out, lies idle, or the account closes.
 */
export const heldSessions = {
  hold(tokenSha256: Buffer, session: HeldSession): void {
    const [oldest] = held.keys()
    if (held.size >= most && oldest !== undefined) held.delete(oldest)
    held.set(tokenSha256.toString('hex'), session)
  },
  find: (tokenSha256: Buffer): HeldSession | undefined => held.get(tokenSha256.toString('hex')),
  seen(tokenSha256: Buffer, at: number): void {
    const session = held.get(tokenSha256.toString('hex'))
    if (session) session.seenAt = at
  },
  end: (tokenSha256: Buffer): boolean => held.delete(tokenSha256.toString('hex')),
  endAll(personId: string): void {
    for (const [key, session] of held) if (session.personId === personId) held.delete(key)
  },
}
