import type { Read } from '../../db/writer'
import type { Acting } from '../people/actor'

/** One row of the log of labs. What a student gets leaves out drafts and everything about others. */
export interface ListedLab {
  id: string
  title: string
  state: 'draft' | 'posted' | 'withdrawn' | 'archived'
  pointsMilli: number
  steps: number
  sections: ListedPosting[]
  /** A student's own; null for staff. */
  own: { dueAt: number, shareId: string | null, submissions: number, lastReceivedAt: number | null, isReleased: boolean } | null
}

export interface ListedPosting { postingId: string, sectionId: string, section: string, state: 'planned' | 'posted' | 'withdrawn', opensAt: number, dueAt: number, releasedAt: number | null, students: number, submitted: number }

/** Labs of a course as this role may see them: staff all of them, a student those that are posted to the own section and open. */
export async function listLabs(read: Read, input: { courseId: string, acting: Acting }, now: number): Promise<ListedLab[]> {
  return input.acting.role === 'student' ? listForStudent(read, input.courseId, input.acting.actorId, now) : listForStaff(read, input.courseId)
}

const stepTotals = async (read: Read, courseId: string) => {
  const rows = await read.selectFrom('step').innerJoin('lab_revision', 'lab_revision.id', 'step.lab_revision_id').innerJoin('lab', 'lab.id', 'lab_revision.lab_id')
    .select(eb => ['lab.id as labId', 'lab_revision.no', eb.fn.countAll<number>().as('steps'), eb.fn.sum<number>('step.points_milli').as('points')])
    .where('lab.course_id', '=', courseId).groupBy(['lab.id', 'lab_revision.no']).orderBy('lab_revision.no').execute()
  return new Map(rows.map(row => [row.labId, { steps: Number(row.steps), pointsMilli: Number(row.points) }]))
}

async function listForStaff(read: Read, courseId: string): Promise<ListedLab[]> {
  const [labs, totals, postings, students, submitted] = await Promise.all([
    read.selectFrom('lab').select(['id', 'title', 'state']).where('course_id', '=', courseId).orderBy('id', 'desc').execute(),
    stepTotals(read, courseId),
    read.selectFrom('posting').innerJoin('lab', 'lab.id', 'posting.lab_id').innerJoin('section', 'section.id', 'posting.section_id')
      .select(['posting.id', 'posting.lab_id as labId', 'section.id as sectionId', 'section.name', 'posting.state', 'posting.opens_at as opensAt', 'posting.due_at as dueAt', 'posting.released_at as releasedAt'])
      .where('lab.course_id', '=', courseId).orderBy('section.name').execute(),
    read.selectFrom('membership').select(eb => ['section_id as sectionId', eb.fn.countAll<number>().as('count')]).where('course_id', '=', courseId).where('role', '=', 'student').where('state', '=', 'active').groupBy('section_id').execute(),
    read.selectFrom('submission').innerJoin('share', 'share.id', 'submission.share_id').innerJoin('membership', 'membership.id', 'submission.by_membership_id')
      .select(eb => ['share.lab_id as labId', 'membership.section_id as sectionId', eb.fn.count<number>('submission.by_membership_id').distinct().as('count')])
      .where('membership.course_id', '=', courseId).where('membership.state', '=', 'active').groupBy(['share.lab_id', 'membership.section_id']).execute(),
  ])
  return labs.map(lab => ({
    ...lab, pointsMilli: totals.get(lab.id)?.pointsMilli ?? 0, steps: totals.get(lab.id)?.steps ?? 0, own: null,
    sections: postings.filter(posting => posting.labId === lab.id).map(posting => ({
      postingId: posting.id, sectionId: posting.sectionId, section: posting.name, state: posting.state, opensAt: posting.opensAt, dueAt: posting.dueAt, releasedAt: posting.releasedAt,
      students: Number(students.find(row => row.sectionId === posting.sectionId)?.count ?? 0),
      submitted: Number(submitted.find(row => row.labId === lab.id && row.sectionId === posting.sectionId)?.count ?? 0),
    })),
  })).toSorted(byDue)
}

/** What has no dates yet stands first, then the latest due: labs that came along from a term were all made in one moment. */
function byDue(one: ListedLab, other: ListedLab): number {
  const [due, otherDue] = [one, other].map(lab => lab.sections.length === 0 ? null : Math.max(...lab.sections.map(section => section.dueAt)))
  if (due === null || otherDue === null) return Number(due !== null) - Number(otherDue !== null)
  return (otherDue ?? 0) - (due ?? 0)
}

async function listForStudent(read: Read, courseId: string, membershipId: string, now: number): Promise<ListedLab[]> {
  const [labs, totals, allowances, shares, work] = await Promise.all([
    read.selectFrom('posting').innerJoin('lab', 'lab.id', 'posting.lab_id').innerJoin('membership', 'membership.section_id', 'posting.section_id')
      .select(['lab.id', 'lab.title', 'lab.state', 'posting.id as postingId', 'posting.due_at as dueAt', 'posting.released_at as releasedAt'])
      .where('lab.course_id', '=', courseId).where('membership.id', '=', membershipId).where('posting.state', 'in', ['posted', 'withdrawn']).where('posting.opens_at', '<=', now)
      .orderBy('posting.due_at').execute(),
    stepTotals(read, courseId),
    read.selectFrom('allowance').select(eb => ['posting_id as postingId', eb.fn.max('due_at').as('dueAt')]).where('membership_id', '=', membershipId).groupBy('posting_id').execute(),
    read.selectFrom('share').innerJoin('holder_member', 'holder_member.holder_id', 'share.holder_id').select(['share.id', 'share.lab_id as labId', 'share.redraw'])
      .where('holder_member.membership_id', '=', membershipId).orderBy('share.redraw').execute(),
    read.selectFrom('submission').innerJoin('share', 'share.id', 'submission.share_id').innerJoin('holder_member', 'holder_member.holder_id', 'share.holder_id')
      .select(eb => ['share.lab_id as labId', eb.fn.countAll<number>().as('count'), eb.fn.max('submission.received_at').as('lastAt')])
      .where('holder_member.membership_id', '=', membershipId).groupBy('share.lab_id').execute(),
  ])
  const shareOf = new Map(shares.map(share => [share.labId, share.id])) // the last drawn stands
  return labs.map((lab) => {
    const done = work.find(row => row.labId === lab.id)
    const allowed = allowances.find(row => row.postingId === lab.postingId)?.dueAt
    return {
      id: lab.id, title: lab.title, state: lab.state, pointsMilli: totals.get(lab.id)?.pointsMilli ?? 0, steps: totals.get(lab.id)?.steps ?? 0, sections: [],
      own: { dueAt: Math.max(lab.dueAt, Number(allowed ?? lab.dueAt)), shareId: shareOf.get(lab.id) ?? null, submissions: Number(done?.count ?? 0), lastReceivedAt: done ? Number(done.lastAt) : null, isReleased: lab.releasedAt !== null },
    }
  })
}
