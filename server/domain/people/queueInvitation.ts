import type { Trx } from '../../db/writer'
import { queueNotice } from '../notices/queueNotice'
import { issueToken } from './oneTimeToken'

/** Invites a person who has no passphrase yet: a link, good once and for two weeks, by mail. Inviting again ends the earlier link. */
export async function queueInvitation(trx: Trx, { personId, now }: { personId: string, now: number }): Promise<void> {
  const tokenId = await issueToken(trx, { purpose: 'invite', personId, now })
  await queueNotice(trx, { eventKey: `invitation:${tokenId}`, template: 'invitation', facts: { tokenId }, toPersonId: personId, now })
}
