import { refuse } from '#shared/errors'
import type { Accepted } from '#shared/marking/types'
import type { RulingBody } from '#shared/schemas/disputes'
import type { MarkTable } from '../../db/schema/work'
import { once, type Once } from '../../db/queries/requestKeys'
import type { Read, Stores, Trx } from '../../db/writer'
import { newId } from '../ids'
import { noteChange, refuseOlder } from '../lastChange'
import { appendEntry, courseChain, digestOf, keepPrivateText } from '../ledger/appendEntry'
import { evaluationsDigest, marksDigest, rulingDigest, type MarkFact } from '../ledger/coveredDigests'
import type { Reference } from '../marking/reference'
import { evaluationRow } from '../marking/storedEvaluation'
import { queueNotice } from '../notices/queueNotice'
import { disputeGround, reasonNotToRule, type DisputeGround, type Ruler } from './disputeGround'
import { likeCases, type LikeCase } from './likeCases'
import { actorName, teachersOf } from './rulers'

export interface RuleDispute { disputeId: string, ruler: Ruler, seenVersion: number, body: RulingBody, request: Once }
export interface RulingReply { rulingId: string, version: number, state: 'ruled' | 'appealed' | 'closed', changed: number }

type NewMark = Omit<MarkTable, 'ledger_chain' | 'ledger_seq'>

/**
 * Decides a dispute, once: of two who rule at the same time one ruling stands and the other is told whose.
 *
 *   uphold  the mark stands
 *   change  this submission's mark becomes another, never lower than it is
 *   accept  a reading or method counts as right in this lab from now on, for all who did the same
 *   fault   the reference may be wrong: the instructor rules
 *
 * Who would be moved by an acceptance is judged outside the unit of work and checked inside by the marks' versions.
 * @throws {DomainError} `already_ruled`, `changed_meanwhile`, `taken_by_another`, `own_work`, `goes_to_instructor`, `points_out_of_range`
 */
export async function ruleDispute({ read, write }: Stores, reference: Reference, input: RuleDispute, now: number): Promise<RulingReply> {
  const rulingId = newId(now)
  for (let tries = 0; tries < 3; tries++) {
    const seen = await disputeGround(read, input.disputeId)
    const accept = input.body.kind === 'accept' ? acceptedOfRuling(input.body.accept, rulingId) : null
    const newest = await newestSubmission(read, seen.labId)
    const cases = accept ? await likeCases(read, reference, seen.labId, seen.stepKey, accept) : []
    try {
      return await write(trx => once(trx, input.request, () => store(trx, reference, input, { rulingId, accept, cases, newest }, now)))
    }
    catch (error) {
      if (!(error instanceof StaleCases)) throw error
    }
  }
  return refuse('changed_meanwhile', { by: 'Somebody' })
}

class StaleCases extends Error {}

/** The number of the submission that came last in a lab; 0 where there is none. */
async function newestSubmission(db: Read, labId: string): Promise<number> {
  const row = await db.selectFrom('submission').innerJoin('share', 'share.id', 'submission.share_id').select(eb => eb.fn.max('submission.seq').as('seq')).where('share.lab_id', '=', labId).executeTakeFirst()
  return Number(row?.seq ?? 0)
}

function acceptedOfRuling(accept: { kind: 'slip' | 'variant', key: string }, ruling: string): Accepted {
  return accept.kind === 'slip' ? { kind: 'slip', slip: accept.key, ruling } : { kind: 'variant', variant: accept.key, ruling }
}

async function store(trx: Trx, reference: Reference, input: RuleDispute, { rulingId, accept, cases, newest }: { rulingId: string, accept: Accepted | null, cases: readonly LikeCase[], newest: number }, now: number): Promise<RulingReply> {
  const ground = await disputeGround(trx, input.disputeId)
  await assertMayRule(trx, ground, input, now)
  // Work handed in since the cases were judged was judged without what is accepted here, and would be left out of it.
  if (accept && await newestSubmission(trx, ground.labId) !== newest) throw new StaleCases()
  const level = ground.state === 'appealed' ? 'appeal' as const : 'first' as const
  const cause = level === 'appeal' ? 'appeal' as const : 'ruling' as const
  const evaluations = cases.map(each => evaluationRow({
    id: newId(now), submissionId: each.submissionId, referenceDigest: reference.digest, conventionRevisionId: each.row.convention_revision_id,
    dataSetVersionId: each.row.data_set_version_id, labRevisionId: each.row.lab_revision_id,
  }, each.judged))
  const marks: { row: NewMark, before: number }[] = input.body.kind === 'change'
    ? [await changedMark(trx, ground, input.body.pointsMilli, cause, now)]
    : await Promise.all(cases.map(async (each, at) => ({
        before: each.beforeMilli,
        row: { id: newId(now), submission_id: each.submissionId, step_key: ground.stepKey, version: await nextVersion(trx, each, ground.stepKey), points_milli: each.afterMilli, max_milli: each.maxMilli, evaluation_id: evaluations[at]?.id ?? null, cause },
      })))

  const privateDigest = await keepPrivateText(trx, ground.studentIds[0] ?? refuse('not_found'), input.body.reason)
  const ruling = { id: rulingId, dispute_id: ground.id, level, kind: input.body.kind, reason_digest: privateDigest.toString('hex'), by_actor_id: input.ruler.actorId, at: now }
  const entry = await appendEntry(trx, {
    chain: courseChain(ground.courseId), at: now, actor: input.ruler.actorId, action: level === 'appeal' ? 'dispute.appeal_ruled' : 'dispute.ruled', privateDigest,
    facts: {
      dispute: ground.id, ruling: rulingId, kind: input.body.kind, level, submission: ground.submissionId, step: ground.stepKey, lab: ground.labId, accepted: accept,
      covers: { ruling: rulingDigest(ruling), evaluations: evaluationsDigest(evaluations), marks: marksDigest(marks.map(mark => mark.row)) },
      marks: marks.map(({ row, before }): MarkFact => ({ submission: row.submission_id, step: row.step_key, version: row.version, before, after: row.points_milli, max: row.max_milli })),
    },
  })
  const link = { ledger_chain: entry.chain, ledger_seq: entry.seq }
  await trx.insertInto('ruling').values({ ...ruling, ...link }).execute()
  if (accept) {
    const bodyJson = JSON.stringify(accept)
    await trx.insertInto('accepted').values({ id: newId(now), lab_id: ground.labId, step_key: ground.stepKey, body_json: bodyJson, digest: digestOf(bodyJson), from_ruling_id: rulingId, added_at: now, revoked_at: null }).execute()
  }
  if (evaluations.length > 0) await trx.insertInto('evaluation').values(evaluations).execute()
  if (marks.length > 0) await trx.insertInto('mark').values(marks.map(mark => ({ ...mark.row, ...link }))).execute()
  const state = input.body.kind === 'fault' && level === 'first' ? 'appealed' as const : level === 'appeal' ? 'closed' as const : 'ruled' as const
  await trx.updateTable('dispute').set({ state, version: ground.version + 1, taken_by: null, taken_until: null }).where('id', '=', ground.id).execute()
  await noteChange(trx, ground.id, input.ruler.actorId, now)
  await closeLikeDisputes(trx, ground, cases)
  await tell(trx, ground, rulingId, state, cases, now)
  return { rulingId, version: ground.version + 1, state, changed: marks.length }
}

async function assertMayRule(trx: Trx, ground: DisputeGround, input: RuleDispute, now: number): Promise<void> {
  const earlier = await trx.selectFrom('ruling').select(['by_actor_id', 'at']).where('dispute_id', '=', ground.id).orderBy('at', 'desc').limit(1).executeTakeFirst()
  if (earlier && ground.state !== 'appealed') refuse('already_ruled', { by: await actorName(trx, earlier.by_actor_id), at: new Date(earlier.at).toISOString() })
  const why = await reasonNotToRule(trx, ground, input.ruler)
  if (why) refuse(why)
  if (ground.takenBy !== null && ground.takenBy !== input.ruler.actorId && (ground.takenUntil ?? 0) > now) refuse('taken_by_another', { by: await actorName(trx, ground.takenBy) })
  if (ground.version !== input.seenVersion) await refuseOlder(trx, ground.id, ground.version)
}

async function changedMark(trx: Trx, ground: DisputeGround, pointsMilli: number, cause: 'ruling' | 'appeal', now: number): Promise<{ row: NewMark, before: number }> {
  const mark = await trx.selectFrom('mark_current').selectAll().where('submission_id', '=', ground.submissionId).where('step_key', '=', ground.stepKey).executeTakeFirstOrThrow()
  if (pointsMilli < mark.points_milli || pointsMilli > mark.max_milli) return refuse('points_out_of_range', { least: mark.points_milli / 1000, max: mark.max_milli / 1000 })
  return { before: mark.points_milli, row: { id: newId(now), submission_id: mark.submission_id, step_key: mark.step_key, version: mark.version + 1, points_milli: pointsMilli, max_milli: mark.max_milli, evaluation_id: mark.evaluation_id, cause } }
}

/** The mark that was judged outside must still be the one in force. */
async function nextVersion(trx: Trx, each: LikeCase, stepKey: string): Promise<number> {
  const mark = await trx.selectFrom('mark_current').select('version').where('submission_id', '=', each.submissionId).where('step_key', '=', stepKey).executeTakeFirstOrThrow()
  if (mark.version !== each.markVersion) throw new StaleCases()
  return mark.version + 1
}

/** Whoever objected to the same thing has the answer as well. */
async function closeLikeDisputes(trx: Trx, ground: DisputeGround, cases: readonly LikeCase[]): Promise<void> {
  const others = cases.filter(each => each.hasAsked && each.submissionId !== ground.submissionId).map(each => each.submissionId)
  if (others.length === 0) return
  const open = await trx.selectFrom('dispute').select(['id', 'version']).where('submission_id', 'in', others).where('step_key', '=', ground.stepKey).where('state', 'in', ['open', 'taken']).execute()
  for (const dispute of open) await trx.updateTable('dispute').set({ state: 'closed', version: dispute.version + 1, taken_by: null, taken_until: null }).where('id', '=', dispute.id).execute()
}

async function tell(trx: Trx, ground: DisputeGround, rulingId: string, state: 'ruled' | 'appealed' | 'closed', cases: readonly LikeCase[], now: number): Promise<void> {
  const facts = { course: ground.courseCode, lab: ground.labTitle }
  if (state === 'appealed') {
    for (const teacher of await teachersOf(trx, ground.courseId)) await queueNotice(trx, { eventKey: `dispute_fault:${rulingId}:${teacher}`, template: 'dispute_opened', toMembershipId: teacher, now, facts: { ...facts, path: `/c/${ground.courseId}/disputes/${ground.id}` } })
  }
  for (const student of ground.studentIds) await queueNotice(trx, { eventKey: `dispute_ruled:${rulingId}:${student}`, template: 'dispute_ruled', toMembershipId: student, now, facts: { ...facts, path: `/c/${ground.courseId}/disputes/${ground.id}` } })
  for (const each of cases) await queueNotice(trx, { eventKey: `dispute_ruled:${rulingId}:${each.membershipId}`, template: 'dispute_ruled', toMembershipId: each.membershipId, now, facts: { ...facts, path: `/c/${ground.courseId}/marks/${each.submissionId}` } })
}
