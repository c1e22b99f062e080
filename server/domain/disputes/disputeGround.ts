import { refuse } from '#shared/errors'
import type { Read } from '../../db/writer'

/** What ruling on a dispute rests on; read again inside the unit of work that rules. */
export interface DisputeGround {
  id: string
  version: number
  state: 'open' | 'taken' | 'ruled' | 'appealed' | 'closed' | 'withdrawn'
  takenBy: string | null
  takenUntil: number | null
  openedAt: number
  submissionId: string
  stepKey: string
  shareId: string
  labId: string
  labTitle: string
  courseId: string
  courseCode: string
  studentIds: readonly string[]
  studentPersonIds: readonly (string | null)[]
  sectionId: string | null
}

/** @throws {DomainError} `not_found` */
export async function disputeGround(db: Read, disputeId: string): Promise<DisputeGround> {
  const row = await db.selectFrom('dispute').innerJoin('submission', 'submission.id', 'dispute.submission_id').innerJoin('share', 'share.id', 'submission.share_id')
    .innerJoin('lab', 'lab.id', 'share.lab_id').innerJoin('course', 'course.id', 'lab.course_id')
    .select(['dispute.id', 'dispute.version', 'dispute.state', 'dispute.taken_by as takenBy', 'dispute.taken_until as takenUntil', 'dispute.opened_at as openedAt', 'dispute.submission_id as submissionId',
      'dispute.step_key as stepKey', 'share.id as shareId', 'share.holder_id as holderId', 'lab.id as labId', 'lab.title as labTitle', 'course.id as courseId', 'course.code as courseCode'])
    .where('dispute.id', '=', disputeId).executeTakeFirst()
  if (!row) return refuse('not_found')
  const { holderId, ...ground } = row
  const members = await db.selectFrom('holder_member').innerJoin('membership', 'membership.id', 'holder_member.membership_id').select(['membership.id', 'membership.person_id', 'membership.section_id']).where('holder_member.holder_id', '=', holderId).execute()
  return { ...ground, studentIds: members.map(member => member.id), studentPersonIds: members.map(member => member.person_id), sectionId: members[0]?.section_id ?? null }
}

export interface Ruler { actorId: string, personId: string, role: string }

/** Why this person does not rule on this dispute; null when they may. */
export async function reasonNotToRule(db: Read, ground: DisputeGround, ruler: Ruler): Promise<'own_work' | 'goes_to_instructor' | 'dispute_closed' | 'not_allowed' | null> {
  if (ground.studentIds.includes(ruler.actorId) || ground.studentPersonIds.includes(ruler.personId)) return 'own_work'
  const conflict = await db.selectFrom('conflict_of_interest').select('membership_id').where('membership_id', '=', ruler.actorId).where('other_id', 'in', [...ground.studentIds]).executeTakeFirst()
  if (conflict) return 'own_work'
  const isTeacher = ruler.role === 'lead' || ruler.role === 'instructor'
  if (!isTeacher && ruler.role !== 'ta') return 'not_allowed'
  if (ground.state !== 'open' && ground.state !== 'taken' && ground.state !== 'appealed') return 'dispute_closed'
  if (ground.state === 'appealed' && !isTeacher) return 'goes_to_instructor'
  // A mark that this TA gave by hand is not theirs to defend; another TA may rule, or the instructor.
  const byHand = await db.selectFrom('mark_current').innerJoin('ledger_entry', join => join.onRef('ledger_entry.chain_id', '=', 'mark_current.ledger_chain').onRef('ledger_entry.seq', '=', 'mark_current.ledger_seq'))
    .select('ledger_entry.actor').where('mark_current.submission_id', '=', ground.submissionId).where('mark_current.step_key', '=', ground.stepKey).where('mark_current.cause', 'in', ['text_marking', 'ruling', 'appeal']).executeTakeFirst()
  return !isTeacher && byHand?.actor === ruler.actorId ? 'goes_to_instructor' : null
}
