import { createHash, createHmac, hkdfSync } from 'node:crypto'
import { refuse } from '#shared/errors'
import type { Read, Trx } from '../../db/writer'
import { newId } from '../ids'

export type TokenPurpose = 'invite' | 'reset'

const lifetime: Record<TokenPurpose, number> = { invite: 14 * 86_400_000, reset: 3_600_000 }

/**
 * The token of a one-time link: made from its id and the house's secret, so that it stands in the mail alone.
 * The database keeps its SHA-256, the outbox its id; a mail that is sent twice carries the same one.
 */
export function tokenOf(purpose: TokenPurpose, tokenId: string): string {
  const secret = process.env.AUTH_SECRET
  if (!secret) throw new Error('AUTH_SECRET is not set: one-time links cannot be made.')
  const key = Buffer.from(hkdfSync('sha256', secret, '', 'one-time links', 32))
  return createHmac('sha256', key).update(`${purpose}:${tokenId}`).digest('base64url')
}

/** Makes a link's token valid and returns its id. Earlier unused ones of the same purpose end: the newest mail counts. */
export async function issueToken(trx: Trx, { purpose, personId, now }: { purpose: TokenPurpose, personId: string, now: number }): Promise<string> {
  const tokenId = newId(now)
  await trx.updateTable('one_time_token').set({ used_at: now }).where('person_id', '=', personId).where('purpose', '=', purpose).where('used_at', 'is', null).execute()
  await trx.insertInto('one_time_token').values({ token_sha256: sha256(tokenOf(purpose, tokenId)), purpose, person_id: personId, ends_at: now + lifetime[purpose], used_at: null }).execute()
  return tokenId
}

/** Whose link it is, while it is good; otherwise null. */
export async function holderOfToken(read: Read | Trx, { purpose, token, now }: { purpose: TokenPurpose, token: string, now: number }): Promise<string | null> {
  const row = await read.selectFrom('one_time_token').select(['person_id', 'ends_at', 'used_at']).where('token_sha256', '=', sha256(token)).where('purpose', '=', purpose).executeTakeFirst()
  return row && row.used_at === null && row.ends_at > now ? row.person_id : null
}

/** Uses a link up, in the same unit of work as what it allows. */
export async function spendToken(trx: Trx, given: { purpose: TokenPurpose, token: string, now: number }): Promise<string> {
  const personId = await holderOfToken(trx, given) ?? refuse('token_invalid')
  await trx.updateTable('one_time_token').set({ used_at: given.now }).where('token_sha256', '=', sha256(given.token)).execute()
  return personId
}

const sha256 = (text: string) => createHash('sha256').update(text).digest()
