import { refuse } from '#shared/errors'
import { lateRule } from '#shared/schemas/lab'
import type { SubmissionSent } from '#shared/schemas/work'
import type { Read } from '../../db/writer'
import { lateWords } from '../marking/lateWords'
import { stepsOfBody } from '../marking/markedStep'
import { readTyped } from '../marking/readTyped'
import { readReceipt } from './readReceipt'

/** What was handed in, with its receipt: the same before and after release. */
export async function readSubmission(read: Read, { submissionId }: { submissionId: string }): Promise<SubmissionSent> {
  const row = await read.selectFrom('submission').innerJoin('share', 'share.id', 'submission.share_id').innerJoin('lab', 'lab.id', 'share.lab_id').innerJoin('course', 'course.id', 'lab.course_id').innerJoin('term', 'term.id', 'course.term_id')
    .innerJoin('lab_revision', 'lab_revision.id', 'submission.lab_revision_id').innerJoin('membership', 'membership.id', 'submission.by_membership_id').leftJoin('person', 'person.id', 'membership.person_id')
    .select(['submission.attempt', 'submission.received_at', 'submission.due_at_applied', 'submission.late_units', 'submission.late_rule_json', 'submission.receipt_no', 'submission.share_id', 'course.id as courseId', 'course.code', 'term.zone', 'lab.id as labId', 'lab.title', 'lab_revision.body_json', 'person.display_name', 'membership.pseudonym'])
    .where('submission.id', '=', submissionId).executeTakeFirst()
  if (!row) return refuse('not_found')
  const answers = await read.selectFrom('answer').select(['step_key', 'typed']).where('submission_id', '=', submissionId).execute()
  return {
    submissionId, courseId: row.courseId, courseCode: row.code, shareId: row.share_id, labId: row.labId, labTitle: row.title, attempt: row.attempt, by: row.display_name ?? row.pseudonym,
    at: new Date(row.received_at).toISOString(), dueAt: new Date(row.due_at_applied).toISOString(), zone: row.zone, lateDays: row.late_units, lateWords: lateWords(lateRule.parse(JSON.parse(row.late_rule_json)), row.late_units),
    receipt: await readReceipt(read, row.receipt_no),
    answers: stepsOfBody(row.body_json).map((step, at) => {
      const typed = answers.find(answer => answer.step_key === step.key)?.typed ?? ''
      const { reading, message } = readTyped(step, typed)
      return { stepKey: step.key, no: at + 1, title: step.title, typed, readAs: message, reading }
    }),
  }
}
