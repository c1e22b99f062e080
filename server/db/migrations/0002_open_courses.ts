import { sql, type Kysely, type Migration } from 'kysely'

/** A draft of a course is now hidden from its students. What was a draft until now was read by them all the same: it is open. */
export const openCourses: Migration = {
  async up(db: Kysely<unknown>): Promise<void> {
    await sql`update course set state = 'open' where state = 'draft' and exists (select 1 from membership where membership.course_id = course.id and membership.role = 'student')`.execute(db)
  },
}
