import { sql, type Kysely, type Migration } from 'kysely'
import { appendOnly } from '../appendOnly'
import { runStatements } from '../dialect'

/** The log of who looked at whose record is read now, by the person who looked and by whose record it was; and what stands in it stays as it is. */
export const accessLogRead: Migration = {
  async up(db: Kysely<unknown>): Promise<void> {
    await sql`create index access_log_by_actor on access_log (actor_person_id)`.execute(db)
    await sql`create index access_log_by_subject on access_log (subject_membership_id)`.execute(db)
    await runStatements(db, appendOnly('access_log'))
  },
}
