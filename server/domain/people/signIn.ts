import { createHash, randomBytes } from 'node:crypto'
import type { Stores } from '../../db/writer'
import { matchesPassphrase, matchNothing } from './passphrase'

const sessionLength = 12 * 3_600_000

export interface SignedIn { personId: string, displayName: string, email: string, token: string }

/** Checks e-mail and passphrase and opens a session; null when they do not go together, whatever the reason. */
export async function signIn({ read, write }: Stores, given: { email: string, passphrase: string, address: string }, now: number): Promise<SignedIn | null> {
  const email = given.email.trim().normalize('NFKC').toLowerCase()
  const person = await read.selectFrom('person').innerJoin('credential', 'credential.person_id', 'person.id')
    .select(['person.id', 'person.display_name', 'person.email_norm', 'person.state', 'person.credential_epoch', 'credential.argon2id']).where('person.email_norm', '=', email).executeTakeFirst()
  const matches = person ? await matchesPassphrase(person.argon2id, given.passphrase) : await matchNothing(given.passphrase)
  if (!person || !matches || person.state !== 'active') return null
  const token = randomBytes(32).toString('base64url')
  await write(trx => trx.insertInto('session').values({
    token_sha256: createHash('sha256').update(token).digest(), person_id: person.id, credential_epoch: person.credential_epoch,
    created_at: now, seen_at: now, ends_at: now + sessionLength, ended_at: null, ended_why: null,
  }).execute())
  return { personId: person.id, displayName: person.display_name ?? '', email, token }
}
