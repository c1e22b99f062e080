import { refuse } from '#shared/errors'
import type { Accepted } from '#shared/marking/types'
import type { DisputeDetail } from '#shared/schemas/disputes'
import { askedSteps, isNumber } from '#shared/schemas/askedSteps'
import { findQuantity } from '#shared/thermo/registry'
import type { Read } from '../../db/writer'
import { erasedText, readPrivateTexts } from '../ledger/readPrivateTexts'
import { markedStep } from '../marking/markedStep'
import { markHistory } from '../marking/markHistory'
import { currentSteps } from '../marking/readEvaluations'
import type { Reference } from '../marking/reference'
import { judgementOfRow } from '../marking/storedEvaluation'
import type { LoadedShare } from '../shares/loadedShare'
import { disputeGround, reasonNotToRule, type DisputeGround, type Ruler } from './disputeGround'
import { likeCases } from './likeCases'
import { actorName } from './rulers'

export interface DisputeEvidence { reference: Reference, loadShare: (shareId: string) => Promise<LoadedShare> }

/**
 * A dispute with its evidence: what was typed and how it was read, the reference's working and the parts of the band, the share,
 * the history of the mark. A student sees their own objection and its rulings, and neither the like cases nor what staff wrote to each other.
 * @throws {DomainError} `not_found`, `not_released`
 */
export async function describeDispute(read: Read, evidence: DisputeEvidence, asker: Ruler, disputeId: string): Promise<DisputeDetail> {
  const ground = await disputeGround(read, disputeId)
  const isStudent = asker.role === 'student'
  const [loaded, stored, submission, rulings] = await Promise.all([
    evidence.loadShare(ground.shareId),
    currentSteps(read, [ground.submissionId]),
    read.selectFrom('submission').selectAll().where('id', '=', ground.submissionId).executeTakeFirstOrThrow(),
    read.selectFrom('ruling').selectAll().where('dispute_id', '=', disputeId).orderBy('at').execute(),
  ])
  const reasons = await readPrivateTexts(read, rulings.map(ruling => ruling.reason_digest))
  const steps = askedSteps(loaded.revision.body)
  const at = steps.findIndex(step => step.key === ground.stepKey)
  const step = steps[at]
  const own = stored.find(each => each.stepKey === ground.stepKey)
  if (!step || !own?.evaluation) return refuse('not_found')
  const student = await actorName(read, ground.studentIds[0] ?? '')
  const section = ground.sectionId === null ? null : await read.selectFrom('section').select('name').where('id', '=', ground.sectionId).executeTakeFirst()
  const zone = loaded.posting?.zone ?? 'UTC'
  const convention = await read.selectFrom('convention_revision').select(['convention_key', 'no']).where('id', '=', own.evaluation.convention_revision_id).executeTakeFirstOrThrow()
  const build = await read.selectFrom('reference_build').select('version').where('digest', '=', own.evaluation.reference_digest).executeTakeFirstOrThrow()
  const mayNotRule = isStudent ? 'not_allowed' as const : await reasonNotToRule(read, ground, asker)
  return {
    id: ground.id, version: ground.version, state: ground.state, openedAt: iso(ground.openedAt), zone, courseId: ground.courseId,
    lab: { id: ground.labId, title: ground.labTitle, revisionNo: loaded.revision.no },
    submission: { id: submission.id, receiptNo: submission.receipt_no, attempt: submission.attempt, at: iso(submission.received_at), lateDays: submission.late_units },
    student, section: section?.name ?? null,
    share: { id: loaded.share.id, no: loaded.share.ordinal + 1, lowM: loaded.share.item.lowM, highM: loaded.share.item.highM, leg: loaded.share.item.leg, dataSet: loaded.share.item.dataSetTitle },
    step: markedStep(step, at + 1, loaded.asks[step.key] ?? step.title, own),
    convention: `${convention.convention_key}, revision ${convention.no}`, reference: build.version,
    plot: plotOf(loaded),
    notes: await notesOf(read, disputeId, isStudent),
    history: (await markHistory(read, ground.submissionId)).filter(entry => entry.stepKey === ground.stepKey),
    rulings: await Promise.all(rulings.map(async ruling => ({ level: ruling.level, kind: ruling.kind, reason: reasons.get(ruling.reason_digest) ?? erasedText, by: await actorName(read, ruling.by_actor_id), at: iso(ruling.at) }))),
    takenBy: ground.state === 'taken' && ground.takenBy !== null ? await actorName(read, ground.takenBy) : null,
    isMine: ground.takenBy === asker.actorId,
    mayNotRule,
    options: isStudent || mayNotRule !== null ? [] : await optionsOf(read, evidence.reference, ground, isNumber(step) ? step.quantity : null, own.evaluation),
    earlierRulings: isStudent ? [] : await earlierRulings(read, ground, loaded),
  }
}

const iso = (instant: number): string => new Date(instant).toISOString()

/** Temperature against height over the rows that the step was asked on. */
function plotOf(loaded: LoadedShare): DisputeDetail['plot'] {
  const heights = loaded.rows.columns.find(column => column.quantity === 'height')
  const values = loaded.rows.columns.find(column => column.quantity === 'air-temperature')
  if (!heights || !values) return null
  const points = loaded.rows.use.flatMap((isUsed, row) => {
    const height = heights.values[row]
    const value = values.values[row]
    return isUsed && height !== null && height !== undefined && value !== null && value !== undefined ? [{ height, value }] : []
  })
  return { quantity: values.quantity, unit: values.unit, heights: points.map(point => point.height), values: points.map(point => point.value) }
}

async function notesOf(read: Read, disputeId: string, isStudent: boolean): Promise<DisputeDetail['notes']> {
  let query = read.selectFrom('dispute_note').leftJoin('private_body', 'private_body.digest', 'dispute_note.private_digest').leftJoin('work_file', join => join.onRef('work_file.digest', '=', 'dispute_note.file_digest').onRef('work_file.about_membership_id', '=', 'dispute_note.file_about_membership_id'))
    .select(['dispute_note.by_actor_id', 'dispute_note.at', 'private_body.body', 'work_file.digest', 'work_file.original_name', 'work_file.size']).where('dispute_note.dispute_id', '=', disputeId)
  if (isStudent) query = query.where('dispute_note.audience', '=', 'all')
  const rows = await query.orderBy('dispute_note.at').execute()
  return Promise.all(rows.map(async row => ({
    by: await actorName(read, row.by_actor_id), at: iso(row.at), text: row.body ?? erasedText,
    file: row.digest && row.original_name !== null && row.size !== null ? { digest: row.digest.toString('hex'), name: row.original_name, size: row.size } : null,
  })))
}

/** Readings that explain the value as a slip does, and variants of the quantity that are not accepted yet, with whose marks each would move. */
async function optionsOf(read: Read, reference: Reference, ground: DisputeGround, quantity: string | null, row: Parameters<typeof judgementOfRow>[0]): Promise<DisputeDetail['options']> {
  const { slip } = judgementOfRow(row)
  const variants = quantity === null ? [] : findQuantity(quantity)?.variants ?? []
  const candidates: { kind: 'slip' | 'variant', key: string, label: string, accept: Accepted }[] = [
    ...(slip ? [{ kind: 'slip' as const, key: slip.key, label: slip.label, accept: { kind: 'slip' as const, slip: slip.key, ruling: '' } }] : []),
    ...variants.map(variant => ({ kind: 'variant' as const, key: variant.key, label: variant.label, accept: { kind: 'variant' as const, variant: variant.key, ruling: '' } })),
  ]
  const options = await Promise.all(candidates.map(async ({ accept, ...candidate }) => {
    const cases = await likeCases(read, reference, ground.labId, ground.stepKey, accept)
    return { ...candidate, cases: cases.map(each => ({ submissionId: each.submissionId, student: each.student, shareNo: each.shareNo, typed: each.typed, beforeMilli: each.beforeMilli, afterMilli: each.afterMilli, hasAsked: each.hasAsked })) }
  }))
  // What would move nobody, this student included, is no option here.
  return options.filter(option => option.cases.some(each => each.submissionId === ground.submissionId))
}

async function earlierRulings(read: Read, ground: DisputeGround, loaded: LoadedShare): Promise<DisputeDetail['earlierRulings']> {
  const rows = await read.selectFrom('ruling').innerJoin('dispute', 'dispute.id', 'ruling.dispute_id').innerJoin('submission', 'submission.id', 'dispute.submission_id').innerJoin('share', 'share.id', 'submission.share_id')
    .select(['dispute.id', 'dispute.step_key', 'ruling.kind', 'ruling.reason_digest', 'ruling.by_actor_id', 'ruling.at']).where('share.lab_id', '=', ground.labId).where('dispute.id', '!=', ground.id).orderBy('ruling.at', 'desc').limit(5).execute()
  const reasons = await readPrivateTexts(read, rows.map(row => row.reason_digest))
  return Promise.all(rows.map(async row => ({
    disputeId: row.id, stepNo: askedSteps(loaded.revision.body).findIndex(step => step.key === row.step_key) + 1, kind: row.kind, reason: reasons.get(row.reason_digest) ?? erasedText, by: await actorName(read, row.by_actor_id), at: iso(row.at),
  })))
}
