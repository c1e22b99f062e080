import { refuse } from '#shared/errors'
import type { Stores } from '../../db/writer'
import { checkPassphrase } from './checkPassphrase'
import { holderOfToken, spendToken } from './oneTimeToken'
import { hashPassphrase } from './passphrase'
import { setPassphrase } from './setPassphrase'
import type { SignInLimits } from './signInLimits'

/** Sets a new passphrase by a mailed link, which is good once; every session ends. Whoever tried too often before may sign in with it at once. */
export async function resetPassphrase({ read, write }: Stores, limits: SignInLimits, { token, passphrase, address, browserOf }: { token: string, passphrase: string, address: string, browserOf: (email: string) => string | null }, now: number): Promise<void> {
  const personId = await holderOfToken(read, { purpose: 'reset', token, now }) ?? refuse('token_invalid')
  const person = await read.selectFrom('person').select(['email_norm', 'display_name']).where('id', '=', personId).where('state', '=', 'active').executeTakeFirst() ?? refuse('token_invalid')
  checkPassphrase(passphrase, [person.email_norm ?? '', person.display_name ?? ''])
  const argon2id = await hashPassphrase(passphrase)
  await write(async (trx) => {
    await spendToken(trx, { purpose: 'reset', token, now })
    await setPassphrase(trx, { personId, argon2id, why: 'passphrase reset', now })
  })
  if (person.email_norm !== null) await limits.clearAccount({ account: person.email_norm, address, browser: browserOf(person.email_norm) })
}
