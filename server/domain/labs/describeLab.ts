import { refuse } from '#shared/errors'
import { askedSteps } from '#shared/schemas/askedSteps'
import { lateRule } from '#shared/schemas/lab'
import type { Read } from '../../db/writer'
import type { Observations } from '../../observations/chunks'
import { bindingProblems } from './bindingProblems'
import { prepareLab } from './prepareLab'
import { renderLabText } from './renderLabText'
import { asksOf } from './askOf'

/** A lab as its authors see it: what they wrote, the asks printed from it, what is not bound yet, and where it is posted. */
export async function describeLab(read: Read, observations: Observations, labId: string) {
  const prepared = await prepareLab(read, observations, labId)
  const { lab, revision, convention, zone } = prepared
  const course = await read.selectFrom('course').select(['late_rule_json']).where('id', '=', lab.courseId).executeTakeFirst()
  if (!course) return refuse('not_found')
  const [postings, sections] = await Promise.all([
    read.selectFrom('posting').selectAll().where('lab_id', '=', labId).execute(),
    read.selectFrom('section').leftJoin('membership', join => join.onRef('membership.section_id', '=', 'section.id').on('membership.role', '=', 'student').on('membership.state', '=', 'active'))
      .select(eb => ['section.id', 'section.name', eb.fn.count<number>('membership.id').as('students')]).where('section.course_id', '=', lab.courseId).groupBy(['section.id', 'section.name']).orderBy('section.name').execute(),
  ])
  return {
    id: lab.id, courseId: lab.courseId, title: lab.title, state: lab.state, version: lab.version, zone,
    revision: { id: revision.id, no: revision.no, isFrozen: revision.frozenAt !== null, body: revision.body },
    convention: { title: convention.title, source: convention.source, constants: convention.constants },
    html: renderLabText(revision.body.text),
    stepHtml: Object.fromEntries(askedSteps(revision.body).map(step => [step.key, step.text === '' ? '' : renderLabText(step.text)])),
    asks: asksOf(revision.body, convention, null),
    problems: bindingProblems(prepared),
    courseLateRule: lateRule.parse(JSON.parse(course.late_rule_json)),
    sections: sections.map(section => ({ id: section.id, name: section.name, students: Number(section.students) })),
    postings: postings.map(posting => ({
      id: posting.id, sectionId: posting.section_id, state: posting.state, opensLocal: posting.opens_local, dueLocal: posting.due_local, opensAt: posting.opens_at, dueAt: posting.due_at,
      lateRule: lateRule.parse(JSON.parse(posting.late_rule_json)), attempts: posting.attempts, keep: posting.keep, feedback: posting.feedback, releasedAt: posting.released_at,
    })),
  }
}
