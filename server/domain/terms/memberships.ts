import { refuse } from '#shared/errors'
import { nextNumber } from '../../db/queries/counters'
import type { Stores, Trx } from '../../db/writer'
import { doOnce, type Asked } from '../asked'
import { newId } from '../ids'
import { appendEntry, courseChain } from '../ledger/appendEntry'
import { applyAccommodations } from '../repairs/applyAccommodations'
import { ensureShares } from '../shares/ensureShares'
import { assertOpenTerm } from './assertOpenTerm'
import { assertSection, replaceTaSections } from './enrol'

/** Labs whose due stays the later one of the old section, and labs that the new section does not have. */
export interface MovedSection { keptDue: { labId: string, title: string, dueAt: number }[], notPosted: { labId: string, title: string }[] }

/** Moves a student to another section. The share stays; of both sections' dues the later counts; the new section's TA has the student from now on. */
export function moveSection({ write }: Stores, input: Asked & { membershipId: string, sectionId: string }, now: number): Promise<MovedSection> {
  return write(trx => doOnce(trx, input, async () => {
    const member = await activeMembership(trx, input.membershipId)
    if (member.role !== 'student') refuse('invalid', {}, [{ path: 'sectionId', message: 'Only a student is in one section.' }])
    return moveStudent(trx, { membershipId: member.id, sectionId: input.sectionId, actorId: input.actorId }, now)
  }))
}

/** The move itself, for use cases that move many. */
export async function moveStudent(trx: Trx, { membershipId, sectionId, actorId }: { membershipId: string, sectionId: string, actorId: string }, now: number): Promise<MovedSection> {
  const member = await activeMembership(trx, membershipId)
  const from = member.section_id
  if (from === null || from === sectionId) return { keptDue: [], notPosted: [] }
  await assertSection(trx, member.course_id, sectionId)
  await trx.updateTable('membership').set({ section_id: sectionId, version: member.version + 1 }).where('id', '=', member.id).execute()
  await ensureShares(trx, member.id, now) // of labs that only the new section has; a share once given stays
  const moved = await keepLaterDues(trx, { membershipId: member.id, from, to: sectionId, actorId }, now)
  await applyAccommodations(trx, { membershipIds: [member.id], actorId }, now)
  await appendEntry(trx, {
    chain: courseChain(member.course_id), at: now, actor: actorId, action: 'membership.moved',
    facts: { membershipId: member.id, before: { sectionId: from }, after: { sectionId }, keptDue: moved.keptDue.map(({ labId, dueAt }) => ({ labId, dueAt })) },
  })
  return moved
}

/** Where the old section's due (or the student's own there) is the later one, it becomes the student's own in the new section. */
async function keepLaterDues(trx: Trx, { membershipId, from, to, actorId }: { membershipId: string, from: string, to: string, actorId: string }, now: number): Promise<MovedSection> {
  const postings = await trx.selectFrom('posting').innerJoin('lab', 'lab.id', 'posting.lab_id').select(['posting.id', 'posting.section_id as sectionId', 'posting.due_at as dueAt', 'lab.id as labId', 'lab.title'])
    .where('posting.section_id', 'in', [from, to]).where('posting.state', '=', 'posted').orderBy('posting.due_at').execute()
  const moved: MovedSection = { keptDue: [], notPosted: [] }
  for (const old of postings.filter(posting => posting.sectionId === from)) {
    const next = postings.find(posting => posting.sectionId === to && posting.labId === old.labId)
    if (!next) {
      moved.notPosted.push({ labId: old.labId, title: old.title })
      continue
    }
    const [before, after] = await Promise.all([dueOf(trx, old, membershipId), dueOf(trx, next, membershipId)])
    if (before <= after) continue
    await trx.insertInto('allowance').values({ id: newId(now), posting_id: next.id, membership_id: membershipId, due_at: before, reason: 'moved_section', by_actor_id: actorId, seq: await nextNumber(trx, 'allowance') }).execute()
    moved.keptDue.push({ labId: old.labId, title: old.title, dueAt: before })
  }
  return moved
}

async function dueOf(trx: Trx, posting: { id: string, dueAt: number }, membershipId: string): Promise<number> {
  const own = await trx.selectFrom('allowance').select('due_at').where('posting_id', '=', posting.id).where('membership_id', '=', membershipId).execute()
  return Math.max(posting.dueAt, ...own.map(row => row.due_at))
}

/** Ends a membership: a student is dropped, staff leave. Work and marks stay. A course keeps at least one lead. */
export function endMembership({ write }: Stores, input: Asked & { membershipId: string }, now: number): Promise<{ state: 'dropped' | 'ended' }> {
  return write(trx => doOnce(trx, input, () => leaveCourse(trx, { membershipId: input.membershipId, actorId: input.actorId }, now)))
}

export async function leaveCourse(trx: Trx, { membershipId, actorId }: { membershipId: string, actorId: string }, now: number): Promise<{ state: 'dropped' | 'ended' }> {
  const member = await activeMembership(trx, membershipId)
  if (member.role === 'lead') {
    const other = await trx.selectFrom('membership').innerJoin('person', 'person.id', 'membership.person_id').select('membership.id')
      .where('membership.course_id', '=', member.course_id).where('membership.role', '=', 'lead').where('membership.state', '=', 'active').where('membership.id', '<>', member.id)
      .where('person.state', 'in', ['active', 'invited']).executeTakeFirst()
    if (!other) refuse('last_lead')
  }
  const state = member.role === 'student' ? 'dropped' as const : 'ended' as const
  await trx.updateTable('membership').set({ state, version: member.version + 1 }).where('id', '=', member.id).execute()
  await appendEntry(trx, { chain: courseChain(member.course_id), at: now, actor: actorId, action: 'membership.ended', facts: { membershipId: member.id, role: member.role, after: state } })
  return { state }
}

/** Says which sections a TA has. */
export function setTaSections({ write }: Stores, input: Asked & { membershipId: string, seenVersion: number, sectionIds: readonly string[] }, now: number): Promise<{ sectionIds: string[], version: number }> {
  return write(trx => doOnce(trx, input, async () => {
    const member = await activeMembership(trx, input.membershipId)
    if (member.role !== 'ta') refuse('invalid', {}, [{ path: 'sectionIds', message: 'Only a TA has named sections.' }])
    if (member.version !== input.seenVersion) refuse('changed_meanwhile', { version: member.version })
    for (const sectionId of input.sectionIds) await assertSection(trx, member.course_id, sectionId)
    const before = await trx.selectFrom('ta_section').select('section_id').where('membership_id', '=', member.id).execute()
    await replaceTaSections(trx, { membershipId: member.id, courseId: member.course_id, sectionIds: input.sectionIds })
    await trx.updateTable('membership').set({ version: member.version + 1 }).where('id', '=', member.id).execute()
    await appendEntry(trx, {
      chain: courseChain(member.course_id), at: now, actor: input.actorId, action: 'membership.sections',
      facts: { membershipId: member.id, before: before.map(row => row.section_id), after: [...input.sectionIds] },
    })
    return { sectionIds: [...input.sectionIds], version: member.version + 1 }
  }))
}

async function activeMembership(trx: Trx, id: string) {
  const member = await trx.selectFrom('membership').innerJoin('course', 'course.id', 'membership.course_id')
    .select(['membership.id', 'membership.course_id', 'membership.role', 'membership.section_id', 'membership.state', 'membership.version', 'course.term_id as termId']).where('membership.id', '=', id).executeTakeFirst()
  if (!member || member.state !== 'active') return refuse('not_found')
  await assertOpenTerm(trx, member.termId)
  return member
}
