import type { Trx } from '../../db/writer'
import { newId } from '../ids'

export interface NewJob {
  kind: string
  payload: unknown
  now: number
  courseId?: string | null
  byActorId?: string | null
  /** A second job with the same key is the first one. */
  onceKey?: string
  /** Not before this instant. */
  runAfter?: number
  allUnits?: number
}

/** Puts background work into the queue, in the same unit of work as what asks for it. Returns the job's id. */
export async function enqueueJob(trx: Trx, job: NewJob): Promise<string> {
  if (job.onceKey !== undefined) {
    const earlier = await trx.selectFrom('job').select('id').where('once_key', '=', job.onceKey).executeTakeFirst()
    if (earlier) return earlier.id
  }
  const id = newId(job.now)
  await trx.insertInto('job').values({
    id, course_id: job.courseId ?? null, by_actor_id: job.byActorId ?? null, kind: job.kind, once_key: job.onceKey ?? null, payload_json: JSON.stringify(job.payload),
    state: 'waiting', attempts: 0, run_after: job.runAfter ?? job.now, leased_until: null, lease_owner: null, done_units: 0, all_units: job.allUnits ?? null, result_json: null, error_json: null, created_at: job.now,
  }).execute()
  return id
}
