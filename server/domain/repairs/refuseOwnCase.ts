import { refuse } from '#shared/errors'
import type { Read } from '../../db/writer'

/**
 * Nobody puts right their own case, in whichever role they act, nor that of somebody with whom they declared a conflict of interest.
 * @throws {DomainError} `own_work`
 */
export async function refuseOwnCase(db: Read, actorId: string, membershipId: string): Promise<void> {
  const conflict = await db.selectFrom('conflict_of_interest').select('membership_id').where('membership_id', '=', actorId).where('other_id', '=', membershipId).executeTakeFirst()
  if (conflict || actorId === membershipId) refuse('own_work')
  const student = await db.selectFrom('membership').select('person_id as personId').where('id', '=', membershipId).executeTakeFirst()
  const actor = await db.selectFrom('membership').select('person_id as personId').where('id', '=', actorId).executeTakeFirst()
    ?? await db.selectFrom('department_role').select('person_id as personId').where('id', '=', actorId).executeTakeFirst()
  if (student && student.personId !== null && student.personId === actor?.personId) refuse('own_work')
}
