import type { RepairBody, RepairTold } from '#shared/schemas/repairs'
import type { Stores, Trx } from '../../db/writer'
import { doOnce, type Asked } from '../asked'
import { accommodate } from './accommodate'
import { extendDue } from './extendDue'
import { grantAttempt } from './grantAttempt'
import { moveMember } from './moveMember'
import { setStanding } from './setStanding'
import { studentOf, type Student } from './studentOf'

export interface RepairMember { courseId: string, memberId: string, body: RepairBody }

/**
 * The one place from which a student's case is put right, whatever it needs: each repair in one unit of work, by name, in the ledger, told to the student.
 * @throws {DomainError} `not_found`, `invalid`, `dates_invalid`, `lab_withdrawn`, `own_work`
 */
export function repairMember({ write }: Stores, input: Asked & RepairMember, now: number): Promise<RepairTold> {
  return write(trx => doOnce(trx, input, async () => ({ told: await repair(trx, await studentOf(trx, input.courseId, input.memberId), input.actorId, input.body, now) })))
}

async function repair(trx: Trx, student: Student, actorId: string, body: RepairBody, now: number): Promise<string[]> {
  switch (body.kind) {
    case 'extension': return (await extendDue(trx, student, { actorId, ...body }, now)).told
    case 'accommodation': return accommodate(trx, student, { actorId, ...body }, now)
    case 'attempt': return grantAttempt(trx, student, { actorId, ...body }, now)
    case 'section': return moveMember(trx, student, { actorId, ...body }, now)
    default: return setStanding(trx, student, { actorId, ...body }, now)
  }
}
