import { refuse } from '#shared/errors'
import type { Read } from '../../db/writer'
import { holderOfToken } from './oneTimeToken'

export interface Invited { personId: string, name: string, email: string }

/** Whom an invitation is for, while it is good. */
export async function readInvitation(read: Read, token: string, now: number): Promise<Invited> {
  const personId = await holderOfToken(read, { purpose: 'invite', token, now }) ?? refuse('token_invalid')
  const person = await read.selectFrom('person').select(['display_name', 'email_norm']).where('id', '=', personId).where('state', '=', 'invited').executeTakeFirst() ?? refuse('token_invalid')
  return { personId, name: person.display_name ?? '', email: person.email_norm ?? '' }
}
