import type { SubmissionReply } from '#shared/schemas/work'
import { insertRows, keptQuery } from '../../db/keptQuery'
import type { Once } from '../../db/queries/requestKeys'
import type { AnswerTable, MarkTable, SubmissionTable } from '../../db/schema/work'
import type { Trx } from '../../db/writer'
import { newId } from '../ids'
import { appendEntry, courseChain } from '../ledger/appendEntry'
import { answersDigest, evaluationsDigest, marksDigest, submissionDigest, type MarkFact } from '../ledger/coveredDigests'
import { evaluationRow, type Judged } from '../marking/storedEvaluation'
import { queueNotice } from '../notices/queueNotice'
import type { LoadedShare } from '../shares/loadedShare'
import type { PostedGround } from './ground'
import type { DecidedLateness } from './lateness'

/** What a student hands in, and under which request key. */
export interface SubmitLab {
  personId: string
  membershipId: string
  shareId: string
  request: Omit<Once, 'personId' | 'now'>
  answers: Readonly<Record<string, string>>
  claimedSentAt: number | null
}

export interface NewSubmission {
  ground: PostedGround
  loaded: LoadedShare
  judged: readonly Judged[]
  referenceDigest: Buffer
  input: SubmitLab
  lateness: DecidedLateness
  receivedAt: number
}

const lastSubmission = keptQuery(db => db.selectFrom('submission').select('seq').orderBy('seq', 'desc').limit(1))

/** Writes a submission, its answers, evaluations and marks, the ledger's entry that covers them, and the receipt's notice. */
export async function insertSubmission(trx: Trx, { ground, loaded, judged, referenceDigest, input, lateness, receivedAt }: NewSubmission): Promise<SubmissionReply> {
  const id = newId(receivedAt)
  const attempt = ground.attemptsMade + 1
  const [last] = await lastSubmission(trx, {})
  const seq = (last?.seq ?? 0) + 1
  const submission: Omit<SubmissionTable, 'ledger_chain' | 'ledger_seq'> = {
    id, seq, share_id: ground.shareId, attempt, by_membership_id: input.membershipId, lab_revision_id: loaded.revision.id,
    received_at: receivedAt, due_at_applied: lateness.dueAt, late_units: lateness.startedDays, late_rule_json: JSON.stringify(ground.lateRule), late_reason: lateness.reason,
    claimed_sent_at: input.claimedSentAt, request_key: input.request.key, body_sha256: input.request.bodySha256, receipt_no: receiptNo(ground.courseCode, seq),
  }
  const answers = judged.map(step => answerRow(id, step))
  const evaluations = judged.map(step => evaluationRow({
    id: newId(receivedAt), submissionId: id, referenceDigest, conventionRevisionId: loaded.conventionRevisionId, dataSetVersionId: loaded.dataSetVersionId, labRevisionId: loaded.revision.id,
  }, step))
  const marks = judged.map((step, at): Omit<MarkTable, 'ledger_chain' | 'ledger_seq'> => ({
    id: newId(receivedAt), submission_id: id, step_key: step.stepKey, version: 1, points_milli: step.judgement.pointsMilli, max_milli: step.question.maxMilli,
    evaluation_id: evaluations[at]?.id ?? null, cause: 'submission',
  }))
  const entry = await appendEntry(trx, {
    chain: courseChain(ground.courseId), at: receivedAt, actor: input.membershipId, action: 'submission.stored',
    facts: {
      submission: id, receipt: submission.receipt_no, share: ground.shareId, lab: ground.labId, posting: ground.postingId, attempt, lateDays: lateness.startedDays,
      covers: { submission: submissionDigest(submission), answers: answersDigest(answers), evaluations: evaluationsDigest(evaluations), marks: marksDigest(marks) },
      marks: marks.map((mark): MarkFact => ({ submission: id, step: mark.step_key, version: 1, before: null, after: mark.points_milli, max: mark.max_milli })),
    },
  })
  const link = { ledger_chain: entry.chain, ledger_seq: entry.seq }
  await insertRows(trx, 'submission', [{ ...submission, ...link }])
  await insertRows(trx, 'answer', answers)
  await insertRows(trx, 'evaluation', evaluations)
  await insertRows(trx, 'mark', marks.map(mark => ({ ...mark, ...link })))
  const receipt = { no: submission.receipt_no, at: new Date(receivedAt).toISOString(), digest: entry.digest.toString('hex'), ledger: { chain: entry.chain, seq: entry.seq } }
  await queueNotice(trx, {
    eventKey: `receipt:${id}`, template: 'receipt', toMembershipId: input.membershipId, now: receivedAt,
    facts: {
      course: ground.courseCode, lab: ground.labTitle, receiptNo: receipt.no, at: receivedAt, zone: ground.zone, digest: receipt.digest, chain: receipt.ledger.chain, seq: receipt.ledger.seq,
      path: `/c/${ground.courseId}/work/${ground.shareId}/receipt/${receipt.no}`,
    },
  })
  return { submissionId: id, attempt, receipt, lateDays: lateness.startedDays }
}

/** A number that a person can read out: the course's code and the running number of the installation. */
export function receiptNo(courseCode: string, seq: number): string {
  const code = courseCode.normalize('NFKD').replace(/[^A-Za-z0-9]/g, '').toUpperCase()
  return `${code || 'LAB'}-${String(seq).padStart(5, '0')}`
}

function answerRow(submissionId: string, { stepKey, answer }: Judged): AnswerTable {
  return {
    submission_id: submissionId, step_key: stepKey, typed: answer.typed, reading: answer.reading, value_si: answer.valueSi, unit_ucum: answer.unitUcum,
    digits: answer.digits, resolution_si: answer.halfUnitSi, private_digest: null,
  }
}
