import type { DisputeLine } from '#shared/schemas/disputes'
import type { Read } from '../../db/writer'
import { stepsOfBody } from '../marking/markedStep'
import { actorName } from './rulers'

export interface DisputeReader { actorId: string, role: string, sectionIds: readonly string[] }

/** The disputes that this person may see, those that wait first: a student's own, a TA's sections', all for who teaches. */
export async function listDisputes(read: Read, reader: DisputeReader, courseId: string): Promise<DisputeLine[]> {
  let query = read.selectFrom('dispute').innerJoin('submission', 'submission.id', 'dispute.submission_id').innerJoin('share', 'share.id', 'submission.share_id').innerJoin('lab', 'lab.id', 'share.lab_id')
    .innerJoin('lab_revision', 'lab_revision.id', 'submission.lab_revision_id').innerJoin('course', 'course.id', 'lab.course_id').innerJoin('term', 'term.id', 'course.term_id')
    .innerJoin('membership', 'membership.id', 'dispute.opened_by_membership_id').leftJoin('person', 'person.id', 'membership.person_id').leftJoin('section', 'section.id', 'membership.section_id')
    .innerJoin('mark_current', join => join.onRef('mark_current.submission_id', '=', 'dispute.submission_id').onRef('mark_current.step_key', '=', 'dispute.step_key'))
    .select(['dispute.id', 'dispute.version', 'dispute.state', 'dispute.opened_at', 'dispute.step_key', 'dispute.taken_by', 'lab.title', 'lab_revision.body_json', 'term.zone', 'membership.pseudonym', 'person.display_name', 'section.name as section', 'mark_current.points_milli', 'mark_current.max_milli'])
    .where('lab.course_id', '=', courseId)
  if (reader.role === 'student') query = query.where('membership.id', '=', reader.actorId)
  if (reader.role === 'ta') query = query.where('membership.section_id', 'in', reader.sectionIds.length > 0 ? [...reader.sectionIds] : [''])
  const rows = await query.orderBy('dispute.opened_at').execute()
  const rulings = rows.length === 0 ? [] : await read.selectFrom('ruling').select(['dispute_id', 'kind', 'by_actor_id', 'at']).where('dispute_id', 'in', rows.map(row => row.id)).orderBy('at').execute()
  const lines = await Promise.all(rows.map(async (row): Promise<DisputeLine> => {
    const ruling = rulings.findLast(each => each.dispute_id === row.id)
    const steps = stepsOfBody(row.body_json)
    const at = steps.findIndex(step => step.key === row.step_key)
    return {
      id: row.id, version: row.version, state: row.state, openedAt: new Date(row.opened_at).toISOString(), zone: row.zone, labTitle: row.title, stepNo: at + 1, stepTitle: steps[at]?.title ?? row.step_key,
      student: row.display_name ?? row.pseudonym, section: row.section, takenBy: row.state === 'taken' && row.taken_by !== null ? await actorName(read, row.taken_by) : null,
      ruledBy: ruling ? await actorName(read, ruling.by_actor_id) : null, kind: ruling?.kind ?? null, pointsMilli: row.points_milli, maxMilli: row.max_milli, isForInstructor: row.state === 'appealed',
    }
  }))
  const waits = (line: DisputeLine) => (line.state === 'open' || line.state === 'taken' || line.state === 'appealed' ? 0 : 1)
  return lines.sort((a, b) => waits(a) - waits(b) || (a.openedAt < b.openedAt ? -1 : 1))
}
