import { createHash } from 'node:crypto'
import type { RulingTable } from '../../db/schema/moderation'
import type { RepairTable } from '../../db/schema/repairs'
import type { AnswerTable, EvaluationTable, MarkTable, SubmissionTable } from '../../db/schema/work'
import { digestOf } from './appendEntry'

/**
 * Digests of the rows that an entry of the ledger covers: one for each column, over all covered rows in order. They are kept in
 * the entry's facts and computed again by `audit`: a value that was changed behind the product's back no longer gives the digest
 * that the chain holds, and the column in which it stands has a name.
 * Left out are only the columns that point back at the entry, which are not known before it.
 */
export type ColumnDigests = Readonly<Record<string, string>>

type Unlinked<T> = Omit<T, 'ledger_chain' | 'ledger_seq'>

/** A third of a SHA-256 is plenty for finding a column; the entry's own digest over all of them is whole. */
const kept = 20

function columnDigests<T extends object>(rows: readonly T[], columns: readonly (keyof T & string)[], key: (row: T) => string): ColumnDigests {
  const inOrder = [...rows].sort((a, b) => (key(a) < key(b) ? -1 : key(a) > key(b) ? 1 : 0))
  const keys = inOrder.map(key)
  return Object.fromEntries(columns.map((column) => {
    const values = inOrder.map((row, at) => [keys[at], plain(row[column])])
    return [column, createHash('sha256').update(JSON.stringify(values)).digest('hex').slice(0, kept)]
  }))
}

const plain = (value: unknown): unknown => Buffer.isBuffer(value) ? value.toString('hex') : value ?? null
const hex = (bytes: Buffer | null): string | null => bytes?.toString('hex') ?? null

const submissionColumns = ['id', 'seq', 'share_id', 'attempt', 'by_membership_id', 'lab_revision_id', 'received_at', 'due_at_applied', 'late_units', 'late_rule_json', 'late_reason', 'claimed_sent_at', 'request_key', 'body_sha256', 'receipt_no'] as const
const answerColumns = ['step_key', 'typed', 'reading', 'value_si', 'unit_ucum', 'digits', 'resolution_si', 'private_digest'] as const
const evaluationColumns = ['id', 'step_key', 'reference_digest', 'convention_revision_id', 'data_set_version_id', 'lab_revision_id', 'inputs_json', 'carried_json', 'accepted_json', 'center_bits', 'low_bits', 'high_bits', 'parts_json', 'slips_json', 'trace_json', 'digest', 'outcome', 'refusal_code'] as const
const markColumns = ['id', 'submission_id', 'step_key', 'version', 'points_milli', 'max_milli', 'evaluation_id', 'cause'] as const
const rulingColumns = ['id', 'dispute_id', 'level', 'kind', 'reason_digest', 'by_actor_id', 'at'] as const
const repairColumns = ['id', 'seq', 'membership_id', 'lab_id', 'kind', 'due_at', 'extra_days', 'submission_id', 'late_units', 'late_rule_json', 'reason_digest', 'by_actor_id', 'at'] as const

export const submissionDigest = (row: Unlinked<SubmissionTable>): ColumnDigests => columnDigests([row], submissionColumns, each => each.id)
export const answersDigest = (rows: readonly AnswerTable[]): ColumnDigests => columnDigests(rows, answerColumns, row => `${row.submission_id} ${row.step_key}`)
export const evaluationsDigest = (rows: readonly EvaluationTable[]): ColumnDigests => columnDigests(rows, evaluationColumns, row => row.id)
export const marksDigest = (rows: readonly Unlinked<MarkTable>[]): ColumnDigests => columnDigests(rows, markColumns, row => `${row.submission_id} ${row.step_key} ${row.version}`)
export const rulingDigest = (row: Unlinked<RulingTable>): ColumnDigests => columnDigests([row], rulingColumns, each => each.id)
export const repairDigest = (row: Unlinked<RepairTable>): ColumnDigests => columnDigests([row], repairColumns, each => each.id)
/** Entries from before reasons could be erased cover the text itself. */
export const rulingReasonDigest = (ruling: { id: string, reason: string }): ColumnDigests => columnDigests([ruling], ['reason'], each => each.id)

/** Of one evaluation: also the value of its own `digest` column. */
export function evaluationDigest(row: Omit<EvaluationTable, 'id' | 'digest'>): Buffer {
  return digestOf({
    submission: row.submission_id, step: row.step_key, reference: hex(row.reference_digest), convention: row.convention_revision_id, dataSetVersion: row.data_set_version_id,
    revision: row.lab_revision_id, inputs: row.inputs_json, carried: row.carried_json, accepted: row.accepted_json, center: hex(row.center_bits), low: hex(row.low_bits), high: hex(row.high_bits),
    parts: row.parts_json, slips: row.slips_json, trace: row.trace_json, outcome: row.outcome, refusal: row.refusal_code,
  })
}

/** How every entry that touches marks tells of them, in thousandths: what the ledger adds up to is the last `after` of each step. */
export interface MarkFact { submission: string, step: string, version: number, before: number | null, after: number, max: number }
