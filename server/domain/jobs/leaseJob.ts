import type { Stores } from '../../db/writer'

export interface LeasedJob { id: string, kind: string, courseId: string | null, payload: unknown, attempts: number }

/** Takes the job that has waited longest, or one whose lease ran out; null when there is none. */
export async function leaseJob({ read, write }: Stores, { owner, kinds, now, until }: { owner: string, kinds: readonly string[], now: number, until: number }): Promise<LeasedJob | null> {
  const next = () => read.selectFrom('job').select('id').where('kind', 'in', kinds)
    .where(({ and, eb, or }) => or([and([eb('state', '=', 'waiting'), eb('run_after', '<=', now)]), and([eb('state', '=', 'leased'), eb('leased_until', '<=', now)])]))
    .orderBy('run_after').orderBy('id').limit(1).executeTakeFirst()
  if (kinds.length === 0 || !await next()) return null // the usual answer costs no write
  return write(async (trx) => {
    const row = await trx.selectFrom('job').select(['id', 'kind', 'course_id', 'payload_json', 'attempts']).where('kind', 'in', kinds)
      .where(({ and, eb, or }) => or([and([eb('state', '=', 'waiting'), eb('run_after', '<=', now)]), and([eb('state', '=', 'leased'), eb('leased_until', '<=', now)])]))
      .orderBy('run_after').orderBy('id').limit(1).executeTakeFirst()
    if (!row) return null
    await trx.updateTable('job').set({ state: 'leased', lease_owner: owner, leased_until: until, attempts: row.attempts + 1 }).where('id', '=', row.id).execute()
    return { id: row.id, kind: row.kind, courseId: row.course_id, payload: JSON.parse(row.payload_json) as unknown, attempts: row.attempts + 1 }
  })
}
