import { refuse } from '#shared/errors'
import type { PlannedCourse, RollOverAsked } from '#shared/schemas/rollOver'
import type { Stores, Trx } from '../../../db/writer'
import { doOnce, type Asked } from '../../asked'
import { newId } from '../../ids'
import { appendEntry, courseChain, departmentChain } from '../../ledger/appendEntry'
import { insertListings, insertSection } from '../courses'
import { insertTerm } from '../createTerm'
import { readCalendar } from '../describeTerm'
import { insertMembership } from '../enrol'
import { copyLab } from './copyLab'
import { planTerm } from './planTerm'

export interface StartedTerm { termId: string, courses: number, labs: number, dates: number }

/**
 * Starts the term that a plan which was read describes: all of it in one unit of work, or nothing. The plan is made anew inside;
 * where it comes out otherwise than the one that was read, nothing is done. The same plan asked for again is the same term.
 * The old term is read and not touched.
 * @throws {DomainError} `plan_changed`, `already_exists`, `dates_invalid`
 */
export function startTerm({ write }: Stores, input: Asked & RollOverAsked & { digest: string }, now: number): Promise<StartedTerm> {
  return write(trx => doOnce(trx, input, async () => {
    const before = await trx.selectFrom('term').select(['id', 'calendar_json']).where('name', '=', input.term.name).executeTakeFirst()
    if (before && readCalendar(before.calendar_json).origin?.planDigest === input.digest) return countOf(trx, before.id)
    const plan = await planTerm(trx, input)
    if (plan.digest !== input.digest) refuse('plan_changed')
    if (plan.counts.problems > 0) refuse('dates_invalid', { reason: `${plan.counts.problems} labs would be due before they open. Change their dates, or leave them out.` })
    const termId = await insertTerm(trx, input.term, now, { termId: input.fromTermId, planDigest: plan.digest })
    const courseIds: string[] = []
    for (const course of plan.courses) if (!course.isLeftOut) courseIds.push(await copyCourse(trx, course, { termId, zone: input.term.zone, actorId: input.actorId }, now))
    await appendEntry(trx, { chain: departmentChain, at: now, actor: input.actorId, action: 'term.rolled_over', facts: { termId, fromTermId: input.fromTermId, plan: plan.digest, courseIds, counts: plan.counts } })
    return { termId, courses: plan.counts.courses, labs: plan.counts.labs, dates: plan.counts.dates }
  }))
}

async function copyCourse(trx: Trx, course: PlannedCourse, to: { termId: string, zone: string, actorId: string }, now: number): Promise<string> {
  const from = await trx.selectFrom('course').selectAll().where('id', '=', course.fromId).executeTakeFirstOrThrow()
  const id = newId(now)
  await trx.insertInto('course').values({
    id, term_id: to.termId, code: from.code, title: from.title, ancestor_id: from.id, convention_revision_id: from.convention_revision_id, state: 'draft',
    late_rule_json: from.late_rule_json, settings_json: from.settings_json, version: 1,
  }).execute()
  await insertListings(trx, id, course.alsoListedAs)
  const sectionOf = new Map<string, string>()
  const oldSections = await trx.selectFrom('section').select(['id', 'name', 'meets_json']).where('course_id', '=', from.id).orderBy('name').execute()
  for (const section of oldSections) sectionOf.set(section.name, await insertSection(trx, id, section.name, now, section.meets_json))
  const sectionId = (name: string) => sectionOf.get(name) ?? refuse('plan_changed')
  const membershipIds: string[] = []
  for (const member of course.staff) membershipIds.push(await insertMembership(trx, { courseId: id, personId: member.personId, role: member.role, sectionId: null, sectionIds: member.sections.map(sectionId) }, now))
  const labIds: string[] = []
  for (const lab of course.labs) if (!lab.isLeftOut) labIds.push(await copyLab(trx, lab, { courseId: id, zone: to.zone, sectionId }, now))
  await appendEntry(trx, {
    chain: courseChain(id), at: now, actor: to.actorId, action: 'course.rolled_over',
    facts: { courseId: id, ancestorId: from.id, termId: to.termId, sectionIds: [...sectionOf.values()], membershipIds, labIds },
  })
  return id
}

async function countOf(trx: Trx, termId: string): Promise<StartedTerm> {
  const [courses, labs, dates] = await Promise.all([
    trx.selectFrom('course').select(count => count.fn.countAll<number>().as('n')).where('term_id', '=', termId).executeTakeFirstOrThrow(),
    trx.selectFrom('lab').innerJoin('course', 'course.id', 'lab.course_id').select(count => count.fn.countAll<number>().as('n')).where('course.term_id', '=', termId).executeTakeFirstOrThrow(),
    trx.selectFrom('posting').innerJoin('lab', 'lab.id', 'posting.lab_id').innerJoin('course', 'course.id', 'lab.course_id').select(count => count.fn.countAll<number>().as('n')).where('course.term_id', '=', termId).executeTakeFirstOrThrow(),
  ])
  return { termId, courses: courses.n, labs: labs.n, dates: dates.n }
}
