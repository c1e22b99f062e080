import { refuse } from '#shared/errors'
import type { Enrolment } from '#shared/schemas/department'
import type { Stores, Trx } from '../../db/writer'
import { doOnce, type Asked } from '../asked'
import { newId } from '../ids'
import { appendEntry, courseChain } from '../ledger/appendEntry'
import { freePseudonym } from '../people/pseudonym'
import type { CourseRole } from '../policies'
import { ensureShares } from '../shares/ensureShares'
import { assertOpenTerm } from './assertOpenTerm'
import { settleLateAdd, type LateAdd } from './settleLateAdd'

/** A person in a role of a course, as a row will hold it. */
export interface NewMembership { courseId: string, personId: string, role: CourseRole, sectionId: string | null, sectionIds: readonly string[] }

/**
 * Takes a person into a course: a student into one section, a TA to named sections, a lead or instructor to all.
 * A student who comes late gets a share of what runs, with a personal due, and does not answer for what is over.
 */
export function enrol({ write }: Stores, input: Asked & { courseId: string, enrolment: Enrolment }, now: number): Promise<{ id: string } & LateAdd> {
  return write(trx => doOnce(trx, input, async () => {
    const course = await trx.selectFrom('course').select(['id', 'term_id']).where('id', '=', input.courseId).executeTakeFirst()
    if (!course) return refuse('not_found')
    await assertOpenTerm(trx, course.term_id)
    const { enrolment } = input
    return startMembership(trx, {
      courseId: course.id, personId: enrolment.personId, role: enrolment.role,
      sectionId: enrolment.role === 'student' ? enrolment.sectionId : null, sectionIds: enrolment.role === 'ta' ? enrolment.sectionIds : [],
    }, input.actorId, now)
  }))
}

/** Starts or resumes a membership, with its ledger entry and what a late add needs: for use cases that take in many. */
export async function startMembership(trx: Trx, membership: NewMembership, actorId: string, now: number): Promise<{ id: string } & LateAdd> {
  const id = await insertMembership(trx, membership, now)
  await appendEntry(trx, {
    chain: courseChain(membership.courseId), at: now, actor: actorId, action: 'membership.started',
    facts: { membershipId: id, role: membership.role, sectionId: membership.sectionId, sectionIds: membership.sectionIds },
  })
  if (membership.sectionId === null) return { id, notCounted: [], personalDue: [] }
  await ensureShares(trx, id, now)
  const late = await settleLateAdd(trx, { membershipId: id, courseId: membership.courseId, sectionId: membership.sectionId, actorId }, now)
  return { id, ...late }
}

/** The row of a membership, and its actor row before it. Somebody who left and comes back resumes the old one, with the old work. */
export async function insertMembership(trx: Trx, { courseId, personId, role, sectionId, sectionIds }: NewMembership, now: number): Promise<string> {
  const person = await trx.selectFrom('person').select('state').where('id', '=', personId).executeTakeFirst()
  if (!person || person.state === 'erased') refuse('not_found')
  if (person.state === 'closed') refuse('invalid', {}, [{ path: 'personId', message: 'This account is closed. Open it again first.' }])
  for (const section of sectionId === null ? sectionIds : [sectionId]) await assertSection(trx, courseId, section)
  const earlier = await trx.selectFrom('membership').select(['id', 'role', 'state', 'version']).where('course_id', '=', courseId).where('person_id', '=', personId).executeTakeFirst()
  if (earlier?.state === 'active') refuse('already_exists', { what: `A membership as ${earlier.role}` }, [{ path: 'personId', message: `Already in this course, as ${earlier.role}.` }])
  if (earlier) {
    if (earlier.role !== role && await hasWork(trx, earlier.id)) refuse('already_exists', { what: `Work as ${earlier.role} in this course` }, [{ path: 'personId', message: `Has work in this course as ${earlier.role}, which stays.` }])
    await trx.updateTable('membership').set({ state: 'active', role, section_id: sectionId, version: earlier.version + 1 }).where('id', '=', earlier.id).execute()
    await replaceTaSections(trx, { membershipId: earlier.id, courseId, sectionIds: role === 'ta' ? sectionIds : [] })
    return earlier.id
  }
  const id = newId(now)
  await trx.insertInto('actor').values({ id, kind: 'membership' }).execute()
  await trx.insertInto('membership').values({
    id, course_id: courseId, person_id: personId, pseudonym: await freePseudonym(trx, courseId), role, section_id: sectionId, state: 'active', version: 1, created_at: now,
  }).execute()
  if (role === 'ta') await replaceTaSections(trx, { membershipId: id, courseId, sectionIds })
  return id
}

export async function replaceTaSections(trx: Trx, { membershipId, courseId, sectionIds }: { membershipId: string, courseId: string, sectionIds: readonly string[] }): Promise<void> {
  await trx.deleteFrom('ta_section').where('membership_id', '=', membershipId).execute()
  const ids = [...new Set(sectionIds)]
  if (ids.length > 0) await trx.insertInto('ta_section').values(ids.map(id => ({ membership_id: membershipId, section_id: id, course_id: courseId }))).execute()
}

export async function assertSection(trx: Trx, courseId: string, sectionId: string): Promise<void> {
  const section = await trx.selectFrom('section').select('id').where('id', '=', sectionId).where('course_id', '=', courseId).executeTakeFirst()
  if (!section) refuse('invalid', {}, [{ path: 'sectionId', message: 'This course has no such section.' }])
}

async function hasWork(trx: Trx, membershipId: string): Promise<boolean> {
  return await trx.selectFrom('holder_member').select('holder_id').where('membership_id', '=', membershipId).executeTakeFirst() !== undefined
}
