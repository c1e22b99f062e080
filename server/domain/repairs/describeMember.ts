import { refuse } from '#shared/errors'
import { soFarOf } from '#shared/marking/soFar'
import { lateRule } from '#shared/schemas/lab'
import { lateWorkWay, type DueSource, type MemberLab, type MemberPage } from '#shared/schemas/repairs'
import type { Read } from '../../db/writer'
import { attemptsOfShares } from '../marking/attemptsOf'
import { labTotal, totalOfAttempt } from '../marking/labTotal'
import type { Acting } from '../people/actor'
import { personalDue } from '../submissions/lateness'
import { workList } from '../submissions/workList'
import { wallTimeAt } from '../terms/wallClock'
import { acceptedAs } from './acceptedAs'
import { accommodationsOf } from './applyAccommodations'
import { repairsOf } from './repairsOf'
import { studentOf, type Student } from './studentOf'

/** One student of a course, for its staff: their labs with due times and where each comes from, attempts, standing, claims, and what was done for them. */
export async function describeMember(read: Read, { courseId, memberId, acting }: { courseId: string, memberId: string, acting: Acting }, now: number): Promise<MemberPage> {
  const student = await studentOf(read, courseId, memberId)
  const [course, member, sections, labs, repairs, days] = await Promise.all([
    read.selectFrom('course').innerJoin('term', 'term.id', 'course.term_id').select(['course.code', 'course.title', 'term.name as term', 'term.zone', 'term.state']).where('course.id', '=', courseId).executeTakeFirst(),
    read.selectFrom('membership').leftJoin('person', 'person.id', 'membership.person_id').innerJoin('section', 'section.id', 'membership.section_id').select(['membership.pseudonym', 'person.display_name', 'person.email_norm', 'section.name as section']).where('membership.id', '=', memberId).executeTakeFirst(),
    read.selectFrom('section').select(['id', 'name']).where('course_id', '=', courseId).orderBy('name').execute(),
    labsOf(read, student, now), repairsOf(read, memberId), accommodationsOf(read, [memberId]),
  ])
  if (!course || !member) return refuse('not_found')
  const { state, ...shown } = course
  return {
    course: shown, member: { id: memberId, name: member.display_name ?? member.pseudonym, email: member.email_norm ?? '', sectionId: student.sectionId, section: member.section, extraDays: days.get(memberId) ?? 0 },
    sections, mayRepair: acting.role !== 'ta' && state !== 'closed', mayAcceptLate: state !== 'closed',
    labs, repairs, soFar: soFarOf(labs),
  }
}

async function labsOf(read: Read, student: Student, now: number): Promise<MemberLab[]> {
  const entries = await workList(read, student, now, 'all')
  const ids = [...entries.map(entry => entry.postingId), '']
  const [postings, allowances, attempts] = await Promise.all([
    read.selectFrom('posting').select(['id', 'due_at', 'opens_at', 'attempts', 'released_at']).where('id', 'in', ids).execute(),
    read.selectFrom('allowance').select(['posting_id', 'due_at', 'reason']).where('membership_id', '=', student.membershipId).where('posting_id', 'in', ids).orderBy('due_at').execute(),
    attemptsOfShares(read, entries.flatMap(entry => entry.shareId ?? [])),
  ])
  const submissions = await read.selectFrom('submission').select(['id', 'due_at_applied as dueAt']).where('share_id', 'in', [...entries.flatMap(entry => entry.shareId ?? []), '']).execute()
  const dueApplied = new Map(submissions.map(row => [row.id, row.dueAt]))
  return entries.flatMap((entry): MemberLab[] => {
    const posting = postings.find(row => row.id === entry.postingId)
    if (!posting) return []
    const latest = allowances.findLast(row => row.posting_id === posting.id)
    const dueAt = personalDue({ dueAt: posting.due_at, allowedUntil: latest?.due_at ?? null, zone: entry.zone, lateRule: entry.lateRule })
    const made = attempts.get(entry.shareId ?? '') ?? []
    const counts = labTotal(made, entry.keep)
    return [{
      labId: entry.labId, title: entry.title, zone: entry.zone, sectionDueAt: new Date(posting.due_at).toISOString(), dueAt: new Date(dueAt).toISOString(), dueLocal: wallTimeAt(dueAt, entry.zone),
      dueFrom: latest && latest.due_at > posting.due_at ? sourceOf(latest.reason) : 'section', opensAt: new Date(posting.opens_at).toISOString(), closesAt: entry.closesAt,
      attempts: entry.attempts, granted: entry.attempts - posting.attempts, standing: entry.standing, releasedAt: posting.released_at === null ? null : new Date(posting.released_at).toISOString(),
      maxMilli: entry.maxMilli, totalMilli: counts?.totalMilli ?? null,
      made: made.map((attempt) => {
        const late = { receivedAt: attempt.receivedAt, dueAt: dueApplied.get(attempt.submissionId) ?? dueAt, presentDueAt: dueAt, lateUnits: attempt.lateUnits, claimedSentAt: attempt.claimedSentAt }
        const rule = lateRule.parse(JSON.parse(attempt.lateRuleJson))
        const accepts = lateWorkWay.options.filter(way => !attempt.isAccepted && acceptedAs(way, late, rule, entry.zone) !== null)
        return {
          submissionId: attempt.submissionId, attempt: attempt.attempt, receiptNo: attempt.receiptNo, at: new Date(attempt.receivedAt).toISOString(), lateDays: attempt.lateUnits,
          claimedSentAt: attempt.claimedSentAt === null ? null : new Date(attempt.claimedSentAt).toISOString(), isCounting: counts?.submissionId === attempt.submissionId, accepts, isAccepted: attempt.isAccepted, totalMilli: totalOfAttempt(attempt).totalMilli,
        }
      }),
    }]
  })
}

function sourceOf(kind: string): DueSource {
  return kind === 'accommodation' || kind === 'late_add' || kind === 'moved_section' ? kind : 'extension'
}
