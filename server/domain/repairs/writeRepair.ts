import type { RepairTable } from '../../db/schema/repairs'
import { nextNumber } from '../../db/queries/counters'
import type { Trx } from '../../db/writer'
import { newId } from '../ids'
import { appendEntry, courseChain, keepPrivateText } from '../ledger/appendEntry'
import { repairDigest } from '../ledger/coveredDigests'
import { queueNotice } from '../notices/queueNotice'
import { refuseOwnCase } from './refuseOwnCase'
import type { Student } from './studentOf'

type Effect = Pick<RepairTable, 'kind'> & Partial<Pick<RepairTable, 'lab_id' | 'due_at' | 'extra_days' | 'submission_id' | 'late_units' | 'late_rule_json'>>

export interface NewRepair {
  student: Student
  effect: Effect
  labTitle: string | null
  reason: string | null
  actorId: string
  action: string
  facts: Readonly<Record<string, unknown>>
  zone: string
}

/**
 * Writes what was done for a student, whatever it was: the reason where it can be erased, the ledger's entry that covers the row, the row, and the mail to the student.
 * @throws {DomainError} `own_work`, which undoes all that the repair did before
 */
export async function writeRepair(trx: Trx, { student, effect, labTitle, reason, actorId, action, facts, zone }: NewRepair, now: number): Promise<void> {
  await refuseOwnCase(trx, actorId, student.membershipId)
  const privateDigest = reason === null ? null : await keepPrivateText(trx, student.membershipId, reason)
  const row = {
    id: newId(now), seq: await nextNumber(trx, 'repair'), membership_id: student.membershipId, lab_id: null, due_at: null, extra_days: null, submission_id: null, late_units: null, late_rule_json: null,
    ...effect, reason_digest: privateDigest?.toString('hex') ?? null, by_actor_id: actorId, at: now,
  }
  const entry = await appendEntry(trx, {
    chain: courseChain(student.courseId), at: now, actor: actorId, action, privateDigest,
    facts: { ...facts, repair: row.id, membershipId: student.membershipId, covers: { repair: repairDigest(row) } },
  })
  await trx.insertInto('repair').values({ ...row, ledger_chain: entry.chain, ledger_seq: entry.seq }).execute()
  await queueNotice(trx, {
    eventKey: `repair:${row.id}`, template: 'repair', toMembershipId: student.membershipId, now,
    facts: { course: student.courseCode, lab: labTitle, kind: effect.kind, dueAt: row.due_at, zone, path: `/c/${student.courseId}/marks` },
  })
}
