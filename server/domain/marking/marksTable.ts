import type { MarksTable } from '#shared/schemas/marks'
import type { Read } from '../../db/writer'
import { standingOf } from '../submissions/workList'
import { closingOf, personalDue } from '../submissions/lateness'
import { lateRule } from '#shared/schemas/lab'
import { attemptsOfShares } from './attemptsOf'
import { labTotal } from './labTotal'

/** The marks of one section: students by labs. Lead and instructor open any section, a TA their own. */
export async function marksTable(read: Read, where: { courseId: string, sectionId: string | null, allowedSectionIds: readonly string[] | null }, now: number): Promise<MarksTable> {
  const all = await read.selectFrom('section').select(['id', 'name']).where('course_id', '=', where.courseId).orderBy('name').execute()
  const sections = all.filter(section => where.allowedSectionIds === null || where.allowedSectionIds.includes(section.id))
  const section = sections.find(each => each.id === where.sectionId) ?? sections[0]
  if (!section) return { sections: [], sectionId: null, labs: [], rows: [] }
  const postings = await read.selectFrom('posting').innerJoin('lab', 'lab.id', 'posting.lab_id').select(['posting.id', 'posting.lab_id', 'lab.title', 'posting.state', 'posting.due_at', 'posting.zone', 'posting.late_rule_json', 'posting.keep', 'posting.released_at'])
    .where('posting.section_id', '=', section.id).where('posting.state', 'in', ['posted', 'withdrawn']).orderBy('posting.due_at').execute()
  const students = await read.selectFrom('membership').leftJoin('person', 'person.id', 'membership.person_id').select(['membership.id', 'membership.pseudonym', 'person.display_name'])
    .where('membership.section_id', '=', section.id).where('membership.role', '=', 'student').where('membership.state', '=', 'active').orderBy('person.display_name').orderBy('membership.id').execute()
  const ids = [...students.map(student => student.id), '']
  const shares = await read.selectFrom('holder_member').innerJoin('share', 'share.holder_id', 'holder_member.holder_id').select(['holder_member.membership_id', 'share.lab_id', 'share.id'])
    .where('holder_member.membership_id', 'in', ids).where('holder_member.lab_id', 'in', [...postings.map(posting => posting.lab_id), '']).orderBy('share.redraw').execute()
  const shareOf = new Map(shares.map(row => [`${row.membership_id} ${row.lab_id}`, row.id]))
  const attempts = await attemptsOfShares(read, [...new Set(shareOf.values())])
  const standings = await read.selectFrom('standing').select(['membership_id', 'lab_id', 'kind']).where('membership_id', 'in', ids).orderBy('seq').execute()
  const standingBy = new Map(standings.map(row => [`${row.membership_id} ${row.lab_id}`, row.kind]))
  const allowances = await read.selectFrom('allowance').select(['membership_id', 'posting_id', 'due_at']).where('membership_id', 'in', ids).orderBy('due_at').execute()
  const allowedBy = new Map(allowances.map(row => [`${row.membership_id} ${row.posting_id}`, row.due_at]))
  return {
    sections, sectionId: section.id,
    labs: postings.map(posting => ({ id: posting.lab_id, postingId: posting.id, title: posting.title, releasedAt: posting.released_at === null ? null : new Date(posting.released_at).toISOString() })),
    rows: students.map(student => ({
      membershipId: student.id, name: student.display_name ?? student.pseudonym,
      cells: postings.map((posting) => {
        const made = attempts.get(shareOf.get(`${student.id} ${posting.lab_id}`) ?? '') ?? []
        const counts = labTotal(made, posting.keep)
        const terms = { dueAt: posting.due_at, allowedUntil: allowedBy.get(`${student.id} ${posting.id}`) ?? null, zone: posting.zone, lateRule: lateRule.parse(JSON.parse(posting.late_rule_json)) }
        return {
          labId: posting.lab_id, submissionId: counts?.submissionId ?? null, totalMilli: counts?.totalMilli ?? null, maxMilli: counts?.maxMilli ?? null, lateDays: counts?.lateDays ?? 0,
          standing: standingOf({ isWithdrawn: posting.state === 'withdrawn', standing: standingBy.get(`${student.id} ${posting.lab_id}`) ?? null, hasSubmission: made.length > 0, releasedAt: posting.released_at, dueAt: personalDue(terms), closesAt: closingOf(terms), now }),
        }
      }),
    })),
  }
}
