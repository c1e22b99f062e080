import { createHash, randomBytes } from 'node:crypto'
import { isOutOfRoom } from '../../db/dialect'
import type { Stores } from '../../db/writer'
import { heldSessions } from './heldSessions'
import { normalEmail } from './normalEmail'
import { matchesPassphrase, matchNothing } from './passphrase'
import { sessionLimits } from './sessionLimits'
import type { SignInLimits } from './signInLimits'

export interface SignedIn { personId: string, displayName: string, email: string, token: string }

export interface SignInAttempt {
  email: string
  passphrase: string
  address: string
  /** The browser's own mark, where it holds one for this account. */
  browser: string | null
}

/**
 * Checks e-mail and passphrase and opens a session; null when they do not go together, whatever the reason.
 * An unknown account costs the same work as a known one.
 * @throws {DomainError} `too_many_requests` after too many wrong tries, `busy` when too many wait
 */
export async function signIn({ read, write }: Stores, limits: SignInLimits, given: SignInAttempt, now: number): Promise<SignedIn | null> {
  const email = normalEmail(given.email)
  const who = { account: email, address: given.address, isKnownBrowser: given.browser !== null, browser: given.browser }
  const person = await read.selectFrom('person').innerJoin('credential', 'credential.person_id', 'person.id')
    .select(['person.id', 'person.display_name', 'person.state', 'person.credential_epoch', 'credential.argon2id']).where('person.email_norm', '=', email).executeTakeFirst()
  const right = await limits.attempt(who, async () => {
    const matches = person ? await matchesPassphrase(person.argon2id, given.passphrase) : await matchNothing(given.passphrase)
    return person && matches && person.state === 'active' ? person : null
  })
  if (!right) return null
  const token = randomBytes(32).toString('base64url')
  const tokenSha256 = createHash('sha256').update(token).digest()
  const endsAt = now + sessionLimits().longestMs
  try {
    await write(trx => trx.insertInto('session').values({
      token_sha256: tokenSha256, person_id: right.id, credential_epoch: right.credential_epoch, created_at: now, seen_at: now, ends_at: endsAt, ended_at: null, ended_why: null,
    }).execute())
  }
  catch (error) {
    if (!isOutOfRoom(error)) throw error
    heldSessions.hold(tokenSha256, { personId: right.id, credentialEpoch: right.credential_epoch, createdAt: now, seenAt: now, endsAt })
  }
  return { personId: right.id, displayName: right.display_name ?? '', email, token }
}
