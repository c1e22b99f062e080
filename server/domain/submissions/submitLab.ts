import { DomainError, refuse } from '#shared/errors'
import type { SubmissionReply } from '#shared/schemas/work'
import { findAnswer, once, type Once } from '../../db/queries/requestKeys'
import type { Stores } from '../../db/writer'
import { judgeSubmission } from '../marking/judgeSubmission'
import type { Reference } from '../marking/reference'
import type { LoadedShare } from '../shares/loadedShare'
import { isSameGround, postedGround, readGround, type PostedGround } from './ground'
import { closingOf, decideLateness } from './lateness'
import { insertSubmission, type SubmitLab } from './insertSubmission'
import { stoppedBy } from './stoppedBy'

export type { SubmitLab }

/** What judging needs beside the database: the build that judges, and the share with its rows. */
export interface Judging {
  reference: Reference
  loadShare: (shareId: string) => Promise<LoadedShare>
}

/** The ground moved between judging and storing: judge again. */
class StaleGround extends Error {}

const mostJudgings = 3

/**
 * Stores a submission with its marks, once: judged outside any transaction, stored inside one that first reads again what
 * the judgement rested on, and answered after the commit. A repetition under the same key gets the first answer, also when
 * the lab has closed since.
 *
 * `receivedAt` is the instant at which the complete request had arrived: lateness is decided from it, once.
 * @throws {DomainError} `not_found`, `lab_withdrawn`, `lab_not_open`, `lab_closed`, `attempts_used`, `marks_shown`, `term_closed`, `nothing_to_submit`, `request_key_reused`, `changed_meanwhile`
 */
export async function submitLab({ read, write }: Stores, judging: Judging, input: SubmitLab, receivedAt: number): Promise<SubmissionReply> {
  const request: Once = { ...input.request, personId: input.personId, now: receivedAt }
  try {
    for (let judgings = 0; judgings < mostJudgings; judgings++) {
      const ground = await readGround(read, input.shareId, input.membershipId)
      const posted = assertMaySubmit(postedGround(ground, receivedAt), receivedAt)
      const loaded = await judging.loadShare(input.shareId)
      const accepted = posted.acceptedIds.length === 0 ? [] : await read.selectFrom('accepted').select(['step_key', 'body_json']).where('id', 'in', [...posted.acceptedIds]).orderBy('added_at').orderBy('id').execute()
      const judged = judgeSubmission(judging.reference, loaded, input.answers, accepted)
      try {
        return await write(trx => once(trx, request, async () => {
          const again = await readGround(trx, input.shareId, input.membershipId)
          if (!again || !ground || !isSameGround(ground, again) || stoppedBy({ ...posted, attemptsMade: again.attemptsMade }, receivedAt) !== null) throw new StaleGround()
          return insertSubmission(trx, { ground: { ...posted, attemptsMade: again.attemptsMade }, loaded, judged, referenceDigest: judging.reference.digest, input, lateness: decideLateness(posted, receivedAt), receivedAt })
        }))
      }
      catch (error) {
        if (!(error instanceof StaleGround)) throw error
      }
    }
    return refuse('changed_meanwhile', { by: 'The course' })
  }
  catch (error) {
    // Between the first look and this refusal the same request may have been stored by its twin: then that is the answer.
    if (!(error instanceof DomainError) || error.code === 'request_key_reused') throw error
    const twin = await findAnswer<SubmissionReply>(read, request)
    if (!twin) throw error
    return twin.answer
  }
}

/** Refuses what the lab's dates, its attempts, its release or its term no longer let in. */
function assertMaySubmit(ground: PostedGround, receivedAt: number): PostedGround {
  const stopped = stoppedBy(ground, receivedAt)
  if (stopped === 'lab_closed') {
    const closesAt = closingOf(ground)
    return refuse('lab_closed', { at: closesAt === null ? null : new Date(closesAt).toISOString() })
  }
  if (stopped === 'attempts_used') return refuse('attempts_used', { attempts: ground.attempts })
  return stopped === null ? ground : refuse(stopped)
}
