import { refuse } from '#shared/errors'
import type { Stores } from '../../db/writer'
import type { Actor } from './actor'
import { checkPassphrase } from './checkPassphrase'
import { hashPassphrase, matchesPassphrase } from './passphrase'
import { setPassphrase } from './setPassphrase'
import type { SignInLimits } from './signInLimits'

/** Changes one's own passphrase by giving the present one; other sessions end, this one goes on. */
export async function changePassphrase({ read, write }: Stores, limits: SignInLimits, { actor, present, next, address }: { actor: Actor, present: string, next: string, address: string }, now: number): Promise<void> {
  // Who holds a stolen session may not guess the passphrase through here either.
  const who = { account: actor.email, address, isKnownBrowser: true, browser: actor.sessionId }
  const stored = await read.selectFrom('credential').select('argon2id').where('person_id', '=', actor.personId).executeTakeFirst()
  const isRight = await limits.attempt(who, async () => (stored && await matchesPassphrase(stored.argon2id, present) ? true : null))
  if (!isRight) refuse('invalid', {}, [{ path: 'present', message: 'This is not your present passphrase.' }])
  checkPassphrase(next, [actor.email, actor.displayName])
  const argon2id = await hashPassphrase(next)
  await write(trx => setPassphrase(trx, { personId: actor.personId, argon2id, keepSession: Buffer.from(actor.sessionId, 'hex'), why: 'passphrase changed', now }))
}
