import { refuse } from '#shared/errors'
import type { Recipe } from '#shared/schemas/data'
import { once } from '../../db/queries/requestKeys'
import type { Stores } from '../../db/writer'
import { findZone } from '../../importing/zone'
import { newId } from '../ids'
import type { Acting } from '../people/actor'
import { getUpload } from './describeUpload'

/** What an import needs to be done, kept with its job. */
export interface ImportPayload { uploadId: string, recipe: Recipe, ownerCourseId: string | null, courseId: string, actorId: string }

export const importJobKind = 'import'

export interface StartImport {
  acting: Acting
  personId: string
  courseId: string
  uploadId: string
  recipe: Recipe
  forDepartment: boolean
  request: { key: string, route: string, bodySha256: Buffer }
}

/** Puts an import in the queue. The runner takes it up after the commit. */
export async function startImport({ read, write }: Stores, input: StartImport, now: number): Promise<{ jobId: string }> {
  if (input.forDepartment && input.acting.role !== 'technician') refuse('not_allowed')
  await getUpload(read, input.uploadId)
  if (!findZone(input.recipe.zone)) refuse('zone_unknown', { zone: input.recipe.zone }, [{ path: 'recipe.zone', message: 'Not a time zone.' }])
  const payload: ImportPayload = { uploadId: input.uploadId, recipe: input.recipe, ownerCourseId: input.forDepartment ? null : input.courseId, courseId: input.courseId, actorId: input.acting.actorId }
  return write(trx => once(trx, { personId: input.personId, ...input.request, now }, async () => {
    const jobId = newId(now)
    await trx.insertInto('job').values({
      id: jobId, course_id: input.courseId, by_actor_id: input.acting.actorId, kind: importJobKind, once_key: null, payload_json: JSON.stringify(payload),
      state: 'waiting', attempts: 0, run_after: now, leased_until: null, lease_owner: null, done_units: 0, all_units: null, result_json: null, error_json: null, created_at: now,
    }).execute()
    return { jobId }
  }))
}
