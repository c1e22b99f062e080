import { refuse } from '#shared/errors'
import type { Stores } from '../../db/writer'
import { doOnce, type Asked } from '../asked'
import { appendEntry, courseChain, keepPrivateText } from '../ledger/appendEntry'
import { currentDraw, giveAnother } from './draws'

/** Gives a share's holder other data, openly: the reason stands with the share and the ledger says who did it. Work handed in on the old share stays with it. */
export async function redraw({ write }: Stores, input: Asked & { shareId: string, reason: string }, now: number): Promise<{ shareId: string }> {
  const reason = input.reason.trim()
  if (reason === '') refuse('invalid', {}, [{ path: 'reason', message: 'Say why.' }])
  return write(trx => doOnce(trx, input, async () => {
    const share = await trx.selectFrom('share').innerJoin('lab', 'lab.id', 'share.lab_id').select(['share.holder_id as holderId', 'lab.id as labId', 'lab.course_id as courseId', 'lab.state']).where('share.id', '=', input.shareId).executeTakeFirst()
    if (!share) return refuse('no_share')
    if (share.state !== 'posted') return refuse('lab_withdrawn')
    const draw = await currentDraw(trx, share.labId)
    if (!draw) return refuse('no_share')
    const holder = await trx.selectFrom('holder_member').select('membership_id').where('holder_id', '=', share.holderId).orderBy('membership_id').limit(1).executeTakeFirstOrThrow()
    const privateDigest = await keepPrivateText(trx, holder.membership_id, reason)
    const given = await giveAnother(trx, draw, share.holderId, privateDigest, now)
    await appendEntry(trx, { chain: courseChain(share.courseId), at: now, actor: input.actorId, action: 'share.redrawn', privateDigest, facts: { labId: share.labId, holderId: share.holderId, before: given.before, after: given.shareId, ordinal: given.ordinal } })
    return { shareId: given.shareId }
  }))
}
