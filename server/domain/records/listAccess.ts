import type { AccessPage } from '#shared/schemas/departmentReplies'
import type { Read } from '../../db/writer'

const linesPerPage = 50

/**
 * Who looked at whose record, when, and by which route: the newest first, a page at a time; of one person, both what they looked at and who looked at theirs.
 * People stand in it by name, and by pseudonym or number once they are erased.
 */
export async function listAccess(read: Read, { personId, before }: { personId: string | null, before: number | null }): Promise<AccessPage> {
  let query = read.selectFrom('access_log').innerJoin('membership', 'membership.id', 'access_log.subject_membership_id').innerJoin('course', 'course.id', 'membership.course_id').innerJoin('term', 'term.id', 'course.term_id')
    .leftJoin('person as looker', 'looker.id', 'access_log.actor_person_id').leftJoin('person as subject', 'subject.id', 'membership.person_id')
    .select(['access_log.seq', 'access_log.at', 'access_log.route', 'access_log.actor_person_id as lookerId', 'looker.display_name as looker', 'subject.display_name as subject', 'membership.pseudonym', 'course.code', 'term.name as term'])
  if (personId !== null) {
    const theirs = await read.selectFrom('membership').select('id').where('person_id', '=', personId).execute()
    query = query.where(eb => eb.or([eb('access_log.actor_person_id', '=', personId), eb('access_log.subject_membership_id', 'in', [...theirs.map(row => row.id), ''])]))
  }
  if (before !== null) query = query.where('access_log.seq', '<', before)
  const [rows, people] = await Promise.all([query.orderBy('access_log.seq', 'desc').limit(linesPerPage + 1).execute(), peopleInLog(read)])
  const lines = rows.slice(0, linesPerPage)
  return {
    people,
    lines: lines.map(row => ({ seq: row.seq, at: new Date(row.at).toISOString(), by: row.looker ?? row.lookerId, about: row.subject ?? row.pseudonym, course: `${row.code}, ${row.term}`, route: row.route })),
    next: rows.length > linesPerPage ? lines[lines.length - 1]?.seq ?? null : null,
  }
}

/** Whoever looked or was looked at, as far as they still have a name. */
async function peopleInLog(read: Read): Promise<AccessPage['people']> {
  const rows = await read.selectFrom('person').select(['person.id', 'person.display_name as name'])
    .where(eb => eb.or([
      eb.exists(eb.selectFrom('access_log').select('access_log.seq').whereRef('access_log.actor_person_id', '=', 'person.id')),
      eb.exists(eb.selectFrom('membership').innerJoin('access_log', 'access_log.subject_membership_id', 'membership.id').select('access_log.seq').whereRef('membership.person_id', '=', 'person.id')),
    ])).orderBy('person.display_name').execute()
  return rows.flatMap(({ id, name }) => name === null ? [] : [{ id, name }])
}
