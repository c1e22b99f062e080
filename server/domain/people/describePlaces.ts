import { z } from 'zod'
import type { Read } from '../../db/writer'
import type { Acting } from './actor'
import { wallTimeAt } from '../terms/wallClock'

export interface PlacesAsked { acting: Acting, courseId: string }
export interface Places {
  /** The teaching week that today is in; null outside of them. */
  week: number | null
  counts: { due: number, open: number, fresh: number }
}

const newFor = 7 * 86_400_000

/** What stands beside the places of a course: labs due, disputes open, marks just released; and the teaching week. */
export async function describePlaces(read: Read, { acting, courseId }: PlacesAsked, now: number): Promise<Places> {
  const term = await read.selectFrom('course').innerJoin('term', 'term.id', 'course.term_id')
    .select(['term.zone', 'term.calendar_json as calendar']).where('course.id', '=', courseId).executeTakeFirstOrThrow()
  const isStudent = acting.role === 'student'
  const [due, open, fresh] = await Promise.all([
    isStudent ? countDue(read, acting, now) : 0,
    countOpenDisputes(read, acting, courseId),
    isStudent ? countFresh(read, acting, now) : 0,
  ])
  return { week: weekOf(term.calendar, wallTimeAt(now, term.zone).slice(0, 10)), counts: { due, open, fresh } }
}

const calendarWeeks = z.object({ weeks: z.array(z.string()) })

/** The number of the teaching week that holds a date: weeks are named by their Mondays, the first is 1. */
export function weekOf(calendarJson: string, date: string): number | null {
  const calendar = calendarWeeks.safeParse(JSON.parse(calendarJson))
  if (!calendar.success) return null
  const at = calendar.data.weeks.findIndex(monday => monday <= date && date < sevenDaysAfter(monday))
  return at < 0 ? null : at + 1
}

const sevenDaysAfter = (date: string) => new Date(Date.parse(`${date}T00:00:00Z`) + 7 * 86_400_000).toISOString().slice(0, 10)

/** Labs open to the student's section, not yet due, of which nothing was handed in. */
async function countDue(read: Read, acting: Acting, now: number): Promise<number> {
  if (acting.sectionIds.length === 0) return 0
  const rows = await read.selectFrom('posting').innerJoin('lab', 'lab.id', 'posting.lab_id')
    .select(eb => eb.fn.count<number>('posting.id').distinct().as('due'))
    .where('posting.section_id', 'in', acting.sectionIds).where('posting.state', '=', 'posted').where('lab.state', '=', 'posted')
    .where('posting.opens_at', '<=', now).where('posting.due_at', '>=', now)
    .where(eb => eb.not(eb.exists(eb.selectFrom('submission').innerJoin('share', 'share.id', 'submission.share_id').innerJoin('holder_member', 'holder_member.holder_id', 'share.holder_id')
      .select('submission.id').whereRef('share.lab_id', '=', 'posting.lab_id').where('holder_member.membership_id', '=', acting.actorId))))
    .executeTakeFirstOrThrow()
  return Number(rows.due)
}

/** Disputes that wait: a student's own, a TA's sections', everybody's for those who teach the course. */
async function countOpenDisputes(read: Read, acting: Acting, courseId: string): Promise<number> {
  const query = read.selectFrom('dispute').innerJoin('submission', 'submission.id', 'dispute.submission_id').innerJoin('share', 'share.id', 'submission.share_id').innerJoin('lab', 'lab.id', 'share.lab_id')
    .innerJoin('membership', 'membership.id', 'dispute.opened_by_membership_id')
    .select(eb => eb.fn.count<number>('dispute.id').distinct().as('open'))
    .where('lab.course_id', '=', courseId).where('dispute.state', 'in', ['open', 'taken', 'appealed'])
  const mine = acting.role === 'student'
    ? query.where('dispute.opened_by_membership_id', '=', acting.actorId)
    : acting.role === 'ta' ? query.where('membership.section_id', 'in', acting.sectionIds.length > 0 ? acting.sectionIds : ['']) : query
  return Number((await mine.executeTakeFirstOrThrow()).open)
}

/** Labs of the student whose marks were released within the last seven days. */
async function countFresh(read: Read, acting: Acting, now: number): Promise<number> {
  if (acting.sectionIds.length === 0) return 0
  const rows = await read.selectFrom('posting').select(eb => eb.fn.count<number>('posting.id').distinct().as('fresh'))
    .where('posting.section_id', 'in', acting.sectionIds).where('posting.state', '=', 'posted')
    .where('posting.released_at', '>', now - newFor).where('posting.released_at', '<=', now)
    .where(eb => eb.exists(eb.selectFrom('submission').innerJoin('share', 'share.id', 'submission.share_id').innerJoin('holder_member', 'holder_member.holder_id', 'share.holder_id')
      .select('submission.id').whereRef('share.lab_id', '=', 'posting.lab_id').where('holder_member.membership_id', '=', acting.actorId)))
    .executeTakeFirstOrThrow()
  return Number(rows.fresh)
}
