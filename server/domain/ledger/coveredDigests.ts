import type { AnswerTable, EvaluationTable, MarkTable, SubmissionTable } from '../../db/schema/tables'
import { digestOf } from './appendEntry'

/**
 * Digests of the rows that an entry of the ledger covers. They are kept in the entry's facts as hex and computed again by `audit`:
 * a column that was changed behind the product's back no longer gives the digest that the chain holds.
 * Left out are only the columns that point back at the entry, which are not known before it.
 */
const hex = (bytes: Buffer | null): string | null => bytes?.toString('hex') ?? null

export function submissionDigest(row: Omit<SubmissionTable, 'ledger_chain' | 'ledger_seq'>): string {
  return digestOf({
    id: row.id, seq: row.seq, share: row.share_id, attempt: row.attempt, by: row.by_membership_id, revision: row.lab_revision_id, receivedAt: row.received_at,
    dueAt: row.due_at_applied, lateUnits: row.late_units, lateRule: row.late_rule_json, lateReason: row.late_reason, claimedSentAt: row.claimed_sent_at,
    requestKey: row.request_key, body: hex(row.body_sha256), receipt: row.receipt_no,
  }).toString('hex')
}

export function answersDigest(rows: readonly AnswerTable[]): string {
  return digestOf(inOrder(rows, row => row.step_key).map(row => ({
    step: row.step_key, typed: row.typed, reading: row.reading, valueSi: row.value_si, unit: row.unit_ucum, digits: row.digits, resolutionSi: row.resolution_si, private: hex(row.private_digest),
  }))).toString('hex')
}

/** Of one evaluation: also the value of its own `digest` column. */
export function evaluationDigest(row: Omit<EvaluationTable, 'id' | 'digest'>): Buffer {
  return digestOf({
    submission: row.submission_id, step: row.step_key, reference: hex(row.reference_digest), convention: row.convention_revision_id, dataSetVersion: row.data_set_version_id,
    revision: row.lab_revision_id, inputs: row.inputs_json, carried: row.carried_json, accepted: row.accepted_json, center: hex(row.center_bits), low: hex(row.low_bits), high: hex(row.high_bits),
    parts: row.parts_json, slips: row.slips_json, trace: row.trace_json, outcome: row.outcome, refusal: row.refusal_code,
  })
}

export function evaluationsDigest(rows: readonly EvaluationTable[]): string {
  return digestOf(inOrder(rows, row => `${row.step_key} ${row.id}`).map(row => ({ id: row.id, step: row.step_key, digest: evaluationDigest(row).toString('hex') }))).toString('hex')
}

export function marksDigest(rows: readonly Omit<MarkTable, 'ledger_chain' | 'ledger_seq'>[]): string {
  return digestOf(inOrder(rows, row => `${row.step_key} ${row.version}`).map(row => ({
    id: row.id, submission: row.submission_id, step: row.step_key, version: row.version, points: row.points_milli, max: row.max_milli, evaluation: row.evaluation_id, cause: row.cause,
  }))).toString('hex')
}

function inOrder<T>(rows: readonly T[], key: (row: T) => string): T[] {
  return [...rows].sort((a, b) => (key(a) < key(b) ? -1 : key(a) > key(b) ? 1 : 0))
}

/** How every entry that touches marks tells of them, in thousandths: what the ledger adds up to is the last `after` of each step. */
export interface MarkFact { submission: string, step: string, version: number, before: number | null, after: number, max: number }
