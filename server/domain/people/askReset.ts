import { refuse } from '#shared/errors'
import type { Stores } from '../../db/writer'
import { enqueueJob } from '../jobs/enqueueJob'
import { normalEmail } from './normalEmail'
import type { SignInLimits } from './signInLimits'

/**
 * Takes down that somebody asked for a new passphrase. Whether there is such an account is looked up afterwards (`sendReset`):
 * the asker is answered alike, in the same time, whatever it is.
 */
export async function askReset({ write }: Stores, limits: SignInLimits, { email, address }: { email: string, address: string }, now: number): Promise<void> {
  const account = normalEmail(email)
  const { waitS, isOneTooMany } = await limits.askReset({ account, address })
  if (waitS !== null) refuse('too_many_requests', { seconds: waitS })
  await write(trx => enqueueJob(trx, { kind: 'passphrase_reset', payload: { email: isOneTooMany ? '' : account }, now }))
}
