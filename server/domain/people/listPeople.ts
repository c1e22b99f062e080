import { refuse } from '#shared/errors'
import type { Read } from '../../db/writer'

export const peoplePerPage = 50

/** People of the department by name, a page at a time; `search` looks in names and addresses. */
export async function listPeople(read: Read, { search, page }: { search: string, page: number }) {
  const words = search.trim().toLowerCase().split(/\s+/).filter(Boolean)
  let query = read.selectFrom('person').where('state', '<>', 'erased')
  for (const word of words) {
    const like = `%${word.replace(/[\\%_]/g, '')}%`
    query = query.where(where => where.or([where(where.fn<string>('lower', ['display_name']), 'like', like), where('email_norm', 'like', like)]))
  }
  const [people, all] = await Promise.all([
    query.select(['id', 'display_name as name', 'email_norm as email', 'state']).orderBy('display_name').orderBy('id').limit(peoplePerPage).offset((page - 1) * peoplePerPage).execute(),
    query.select(count => count.fn.countAll<number>().as('n')).executeTakeFirstOrThrow(),
  ])
  const ids = people.map(person => person.id)
  const [roles, memberships] = ids.length === 0
    ? [[], []]
    : await Promise.all([
        read.selectFrom('department_role').select(['person_id as personId', 'role']).where('person_id', 'in', ids).where('state', '=', 'active').execute(),
        read.selectFrom('membership').innerJoin('course', 'course.id', 'membership.course_id').innerJoin('term', 'term.id', 'course.term_id')
          .select(['membership.person_id as personId', 'membership.role', 'course.code']).where('membership.person_id', 'in', ids).where('membership.state', '=', 'active').where('term.state', '<>', 'closed').orderBy('course.code').execute(),
      ])
  return {
    page, pages: Math.max(1, Math.ceil(all.n / peoplePerPage)), count: all.n,
    people: people.map(person => ({
      id: person.id, name: person.name ?? '', email: person.email ?? '', state: person.state as 'invited' | 'active' | 'closed',
      roles: roles.filter(held => held.personId === person.id).map(held => held.role),
      courses: memberships.filter(member => member.personId === person.id).map(member => ({ code: member.code, role: member.role })),
    })),
  }
}

/** One person with everything they are in the department: roles, and courses of all terms. */
export async function describePerson(read: Read, personId: string) {
  const person = await read.selectFrom('person').select(['id', 'display_name as name', 'email_norm as email', 'state', 'created_at as createdAt']).where('id', '=', personId).where('state', '<>', 'erased').executeTakeFirst()
  if (!person) return refuse('not_found')
  const [roles, memberships, sessions] = await Promise.all([
    read.selectFrom('department_role').select(['id', 'role', 'until_at as untilAt']).where('person_id', '=', personId).where('state', '=', 'active').orderBy('role').execute(),
    read.selectFrom('membership').innerJoin('course', 'course.id', 'membership.course_id').innerJoin('term', 'term.id', 'course.term_id').leftJoin('section', 'section.id', 'membership.section_id')
      .select(['membership.id', 'membership.role', 'membership.state', 'course.id as courseId', 'course.code', 'course.title', 'term.name as term', 'section.name as section'])
      .where('membership.person_id', '=', personId).orderBy('term.starts_on', 'desc').orderBy('course.code').execute(),
    read.selectFrom('session').select(count => count.fn.countAll<number>().as('n')).where('person_id', '=', personId).where('ended_at', 'is', null).executeTakeFirstOrThrow(),
  ])
  return {
    id: person.id, name: person.name ?? '', email: person.email ?? '', state: person.state as 'invited' | 'active' | 'closed', createdAt: new Date(person.createdAt).toISOString(),
    openSessions: sessions.n,
    roles: roles.map(held => ({ id: held.id, role: held.role, until: held.untilAt === null ? null : new Date(held.untilAt).toISOString() })),
    memberships,
  }
}
