import { refuse } from '#shared/errors'
import { once, type Once } from '../../db/queries/requestKeys'
import type { Stores } from '../../db/writer'
import type { FileStore } from '../../files/store'
import { shownFileName } from '../data/fileName'
import { newId } from '../ids'
import { appendEntry, courseChain, keepPrivateText } from '../ledger/appendEntry'
import { disputeGround } from './disputeGround'

/** A photograph or a scan of working fits; a data file belongs elsewhere. */
export const largestDisputeFile = 10 * 1_048_576
/** Of both sides together: enough for evidence, too few to fill a disk. */
export const mostDisputeFiles = 8

export interface AttachFile { disputeId: string, actorId: string, name: string, body: AsyncIterable<Uint8Array>, expectedBytes?: number, request: Omit<Once, 'bodySha256'> }

/**
 * Adds a file to a dispute. It is kept as it came, by its digest, and is only ever handed out for download.
 * @throws {DomainError} `too_large`, `dispute_closed`, `file_empty`, `no_room`, `invalid` where the dispute holds as many files as it takes
 */
export async function attachFile({ write }: Stores, files: FileStore, input: AttachFile, now: number): Promise<{ digest: string, size: number }> {
  const received = await files.receive(input.body, { mostBytes: largestDisputeFile, ...(input.expectedBytes === undefined ? {} : { expectedBytes: input.expectedBytes }) })
  if (received.size === 0) {
    await received.discard()
    return refuse('file_empty')
  }
  const name = shownFileName(input.name)
  const reply = { digest: received.sha256.toString('hex'), size: received.size }
  try {
    await received.keep()
    return await write(trx => once(trx, { ...input.request, bodySha256: received.sha256 }, async () => {
      const ground = await disputeGround(trx, input.disputeId)
      if (ground.state === 'ruled' || ground.state === 'closed' || ground.state === 'withdrawn') refuse('dispute_closed')
      const held = await trx.selectFrom('dispute_note').select(eb => eb.fn.countAll().as('files')).where('dispute_id', '=', ground.id).where('file_digest', 'is not', null).executeTakeFirstOrThrow()
      if (Number(held.files) >= mostDisputeFiles) refuse('invalid', {}, [{ path: 'file', message: `A dispute takes at most ${mostDisputeFiles} files.` }])
      const about = ground.studentIds.includes(input.actorId) ? input.actorId : ground.studentIds[0] ?? refuse('not_found')
      await trx.insertInto('work_file').values({ digest: received.sha256, about_membership_id: about, size: received.size, original_name: name }).onConflict(conflict => conflict.columns(['digest', 'about_membership_id']).doNothing()).execute()
      const privateDigest = await keepPrivateText(trx, about, `Added a file: ${name}`)
      await trx.insertInto('dispute_note').values({ id: newId(now), dispute_id: ground.id, by_actor_id: input.actorId, audience: 'all', private_digest: privateDigest, file_digest: received.sha256, file_about_membership_id: about, at: now }).execute()
      await appendEntry(trx, { chain: courseChain(ground.courseId), at: now, actor: input.actorId, action: 'dispute.file_added', privateDigest, facts: { dispute: ground.id, file: reply.digest, size: reply.size } })
      return reply
    }))
  }
  catch (error) {
    await received.discard()
    throw error
  }
}

/** A file of this dispute by its digest; another dispute's is not there. */
export async function disputeFile({ read }: Stores, input: { disputeId: string, digest: string }): Promise<{ sha256: Buffer, name: string, size: number }> {
  const row = await read.selectFrom('dispute_note').innerJoin('work_file', join => join.onRef('work_file.digest', '=', 'dispute_note.file_digest').onRef('work_file.about_membership_id', '=', 'dispute_note.file_about_membership_id')).select(['work_file.digest', 'work_file.original_name', 'work_file.size'])
    .where('dispute_note.dispute_id', '=', input.disputeId).where('work_file.digest', '=', Buffer.from(input.digest, 'hex')).executeTakeFirst()
  return row ? { sha256: row.digest, name: row.original_name, size: row.size } : refuse('not_found')
}
