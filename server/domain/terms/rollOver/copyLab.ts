import type { PlannedCourse } from '#shared/schemas/rollOver'
import type { Trx } from '../../../db/writer'
import { newId } from '../../ids'

/**
 * A lab of the old term as a draft of the new one: its newest revision becomes revision 1, with the data set versions that it names,
 * and its postings become planned ones at the moved times. Shares, readings that rulings accepted, and marks stay where they are.
 */
export async function copyLab(trx: Trx, lab: PlannedCourse['labs'][number], to: { courseId: string, zone: string, sectionId: (name: string) => string }, now: number): Promise<string> {
  const revision = await trx.selectFrom('lab_revision').select(['body_json', 'digest']).where('id', '=', lab.revisionId).executeTakeFirstOrThrow()
  const id = newId(now)
  const revisionId = newId(now)
  await trx.insertInto('lab').values({ id, course_id: to.courseId, ancestor_id: lab.fromId, title: lab.title, state: 'draft', version: 1 }).execute()
  await trx.insertInto('lab_revision').values({ id: revisionId, lab_id: id, no: 1, body_json: revision.body_json, digest: revision.digest, frozen_at: null }).execute()
  const [steps, edges] = await Promise.all([
    trx.selectFrom('step').selectAll().where('lab_revision_id', '=', lab.revisionId).orderBy('rank').execute(),
    trx.selectFrom('step_edge').selectAll().where('lab_revision_id', '=', lab.revisionId).execute(),
  ])
  if (steps.length > 0) await trx.insertInto('step').values(steps.map(step => ({ ...step, lab_revision_id: revisionId }))).execute()
  if (edges.length > 0) await trx.insertInto('step_edge').values(edges.map(edge => ({ ...edge, lab_revision_id: revisionId }))).execute()
  for (const posting of lab.postings) {
    const from = await trx.selectFrom('posting').select(['late_rule_json', 'attempts', 'keep', 'feedback']).where('id', '=', posting.fromId).executeTakeFirstOrThrow()
    await trx.insertInto('posting').values({
      ...from, id: newId(now), lab_id: id, section_id: to.sectionId(posting.section), opens_local: posting.becomes.opensLocal, due_local: posting.becomes.dueLocal, zone: to.zone,
      opens_at: posting.becomes.opensAt, due_at: posting.becomes.dueAt, state: 'planned', released_at: null, version: 1,
    }).execute()
  }
  return id
}
