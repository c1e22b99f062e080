import { refuse } from '#shared/errors'
import type { LateRule } from '#shared/schemas/lab'
import { closed1004 } from '#shared/thermo/conventions/closed1004'
import type { Stores, Trx } from '../../db/writer'
import { doOnce, type Asked } from '../asked'
import { newId } from '../ids'
import { ensureConvention } from '../labs/conventions'
import { noteChange, refuseOlder } from '../lastChange'
import { appendEntry, courseChain } from '../ledger/appendEntry'
import { assertOpenTerm } from './assertOpenTerm'
import { insertMembership } from './enrol'

export interface CourseDraft {
  termId: string
  code: string
  title: string
  /** Codes under which other departments list the same course. */
  alsoListedAs: readonly string[]
  lateRule: LateRule
  /** The set of constants and formulae it teaches with; the house's own where none is named. */
  conventionRevisionId: string | null
  sections: readonly string[]
  leadPersonId: string | null
}

/** Adds a course to a term, with its codes, sections and first lead. */
export function createCourse({ write }: Stores, input: Asked & { course: CourseDraft }, now: number): Promise<{ id: string, sections: { id: string, name: string }[] }> {
  return write(trx => doOnce(trx, input, async () => {
    const { course } = input
    await assertOpenTerm(trx, course.termId)
    const alsoListedAs = await freeCodes(trx, { termId: course.termId, courseId: null, code: course.code, alsoListedAs: course.alsoListedAs })
    const id = newId(now)
    await trx.insertInto('course').values({
      id, term_id: course.termId, code: course.code, title: course.title, ancestor_id: null, convention_revision_id: await conventionRevision(trx, course.conventionRevisionId, now),
      state: 'open', late_rule_json: JSON.stringify(course.lateRule), version: 1,
    }).execute()
    await insertListings(trx, id, alsoListedAs)
    const sections: { id: string, name: string }[] = []
    for (const name of new Set(course.sections)) sections.push({ id: await insertSection(trx, id, name, now), name })
    await appendEntry(trx, { chain: courseChain(id), at: now, actor: input.actorId, action: 'course.created', facts: { courseId: id, termId: course.termId, code: course.code, alsoListedAs, sectionIds: sections.map(section => section.id), lateRule: course.lateRule } })
    if (course.leadPersonId !== null) {
      const membershipId = await insertMembership(trx, { courseId: id, personId: course.leadPersonId, role: 'lead', sectionId: null, sectionIds: [] }, now)
      await appendEntry(trx, { chain: courseChain(id), at: now, actor: input.actorId, action: 'membership.started', facts: { membershipId, role: 'lead', sectionId: null, sectionIds: [] } })
    }
    return { id, sections }
  }))
}

/** Changes a course's codes, title and late rule. Labs that are posted keep the rule that they were posted with. */
export function editCourse({ write }: Stores, input: Asked & { courseId: string, seenVersion: number, course: Pick<CourseDraft, 'code' | 'title' | 'alsoListedAs' | 'lateRule'> }, now: number): Promise<{ version: number }> {
  return write(trx => doOnce(trx, input, async () => {
    const before = await trx.selectFrom('course').selectAll().where('id', '=', input.courseId).executeTakeFirst()
    if (!before) return refuse('not_found')
    await assertOpenTerm(trx, before.term_id)
    if (before.version !== input.seenVersion) await refuseOlder(trx, before.id, before.version)
    const alsoListedAs = await freeCodes(trx, { termId: before.term_id, courseId: before.id, ...input.course })
    const listed = await trx.selectFrom('course_listing').select('code').where('course_id', '=', before.id).orderBy('code').execute()
    const version = before.version + 1
    await trx.updateTable('course').set({ code: input.course.code, title: input.course.title, late_rule_json: JSON.stringify(input.course.lateRule), version }).where('id', '=', before.id).execute()
    await noteChange(trx, before.id, input.actorId, now)
    await trx.deleteFrom('course_listing').where('course_id', '=', before.id).execute()
    await insertListings(trx, before.id, alsoListedAs)
    await appendEntry(trx, {
      chain: courseChain(before.id), at: now, actor: input.actorId, action: 'course.edited',
      facts: {
        courseId: before.id, before: { code: before.code, alsoListedAs: listed.map(row => row.code), lateRule: JSON.parse(before.late_rule_json) as unknown },
        after: { code: input.course.code, alsoListedAs, lateRule: input.course.lateRule },
      },
    })
    return { version }
  }))
}

/** Adds a section to a course. */
export function createSection({ write }: Stores, input: Asked & { courseId: string, name: string }, now: number): Promise<{ id: string }> {
  return write(trx => doOnce(trx, input, async () => {
    const course = await trx.selectFrom('course').select(['id', 'term_id']).where('id', '=', input.courseId).executeTakeFirst()
    if (!course) return refuse('not_found')
    await assertOpenTerm(trx, course.term_id)
    const same = await trx.selectFrom('section').select('id').where('course_id', '=', course.id).where('name', '=', input.name).executeTakeFirst()
    if (same) refuse('already_exists', { what: `Section ${input.name}` }, [{ path: 'name', message: 'A section of this name is here already.' }])
    const id = await insertSection(trx, course.id, input.name, now)
    await appendEntry(trx, { chain: courseChain(course.id), at: now, actor: input.actorId, action: 'section.created', facts: { sectionId: id } })
    return { id }
  }))
}

export async function insertSection(trx: Trx, courseId: string, name: string, now: number, meetsJson = '{}'): Promise<string> {
  const id = newId(now)
  await trx.insertInto('section').values({ id, course_id: courseId, name, meets_json: meetsJson }).execute()
  return id
}

export async function insertListings(trx: Trx, courseId: string, codes: readonly string[]): Promise<void> {
  if (codes.length > 0) await trx.insertInto('course_listing').values(codes.map(code => ({ course_id: courseId, code }))).execute()
}

/** A code names one course in a term, whether it is its own or a cross-listed one. Gives the cross-listed codes, each once. */
async function freeCodes(trx: Trx, { termId, courseId, code, alsoListedAs }: { termId: string, courseId: string | null, code: string, alsoListedAs: readonly string[] }): Promise<string[]> {
  const others = trx.selectFrom('course').leftJoin('course_listing', 'course_listing.course_id', 'course.id')
    .select(['course.id', 'course.code', 'course_listing.code as listing']).where('course.term_id', '=', termId)
  const taken = new Set<string>()
  for (const other of await others.execute()) {
    if (other.id === courseId) continue
    taken.add(codeKey(other.code))
    if (other.listing !== null) taken.add(codeKey(other.listing))
  }
  if (taken.has(codeKey(code))) refuse('already_exists', { what: `The code ${code}` }, [{ path: 'code', message: 'Another course of this term has this code.' }])
  const listed = new Map<string, string>()
  for (const other of alsoListedAs) {
    if (taken.has(codeKey(other))) refuse('already_exists', { what: `The code ${other}` }, [{ path: 'alsoListedAs', message: `Another course of this term has the code ${other}.` }])
    if (codeKey(other) !== codeKey(code) && !listed.has(codeKey(other))) listed.set(codeKey(other), other)
  }
  return [...listed.values()]
}

/** "ATM 301" and "atm301" are one code. */
const codeKey = (code: string): string => code.replace(/[\s-]+/g, '').toLowerCase()

/** The revision that was named, or that of the house's own convention. */
async function conventionRevision(trx: Trx, id: string | null, now: number): Promise<string> {
  if (id === null) return (await ensureConvention(trx, closed1004, now)).id
  const found = await trx.selectFrom('convention_revision').select('id').where('id', '=', id).executeTakeFirst()
  return found?.id ?? refuse('not_found')
}
