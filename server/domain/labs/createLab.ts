import type { LabBody } from '#shared/schemas/lab'
import { refuse } from '#shared/errors'
import type { Stores } from '../../db/writer'
import { doOnce, type Asked } from '../asked'
import { newId } from '../ids'
import { digestOf } from '../ledger/appendEntry'
import { conventionOfCourse } from './conventions'
import { writeSteps } from './writeRevision'

export interface CreateLab { courseId: string, body: LabBody, /** The lab that this one is a copy of: of the same course, or of one of those in which the same person writes. */ ancestorId?: string | null, writesIn?: readonly string[] }

/** A new lab, a draft with its first revision. Only staff see it until it is posted. */
export function createLab({ write }: Stores, input: Asked & CreateLab, now: number): Promise<{ id: string, revisionId: string, version: number }> {
  return write(trx => doOnce(trx, input, async () => {
    const course = await trx.selectFrom('course').select('id').where('id', '=', input.courseId).executeTakeFirst()
    if (!course) return refuse('not_found')
    if (input.ancestorId && !await trx.selectFrom('lab').select('id').where('id', '=', input.ancestorId).where('course_id', 'in', [course.id, ...input.writesIn ?? []]).executeTakeFirst()) return refuse('not_found')
    const { convention } = await conventionOfCourse(trx, course.id)
    const id = newId(now)
    const revisionId = newId(now)
    await trx.insertInto('lab').values({ id, course_id: course.id, ancestor_id: input.ancestorId ?? null, title: input.body.title, state: 'draft', version: 1 }).execute()
    await trx.insertInto('lab_revision').values({ id: revisionId, lab_id: id, no: 1, body_json: JSON.stringify(input.body), digest: digestOf(input.body), frozen_at: null }).execute()
    await writeSteps(trx, revisionId, input.body, convention)
    return { id, revisionId, version: 1 }
  }))
}
