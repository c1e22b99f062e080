import type { Read } from '../../db/writer'

/** Who is told of an objection: the TAs of the section; where it has none, its instructors and leads. */
export async function rulersOf(db: Read, courseId: string, sectionId: string | null): Promise<string[]> {
  const tas = sectionId === null
    ? []
    : await db.selectFrom('ta_section').innerJoin('membership', 'membership.id', 'ta_section.membership_id').select('membership.id').where('ta_section.section_id', '=', sectionId).where('membership.state', '=', 'active').execute()
  return tas.length > 0 ? tas.map(row => row.id) : teachersOf(db, courseId)
}

export async function teachersOf(db: Read, courseId: string): Promise<string[]> {
  const rows = await db.selectFrom('membership').select('id').where('course_id', '=', courseId).where('role', 'in', ['lead', 'instructor']).where('state', '=', 'active').execute()
  return rows.map(row => row.id)
}

/** The name that staff and the student read beside an act; a pseudonym where the person was erased. */
export async function actorName(db: Read, actorId: string): Promise<string> {
  const member = await db.selectFrom('membership').leftJoin('person', 'person.id', 'membership.person_id').select(['person.display_name', 'membership.pseudonym']).where('membership.id', '=', actorId).executeTakeFirst()
  if (member) return member.display_name ?? member.pseudonym
  const role = await db.selectFrom('department_role').leftJoin('person', 'person.id', 'department_role.person_id').select(['person.display_name', 'department_role.pseudonym']).where('department_role.id', '=', actorId).executeTakeFirst()
  return role?.display_name ?? role?.pseudonym ?? 'Tetherhouse'
}
