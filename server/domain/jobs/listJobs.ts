import type { Read } from '../../db/writer'

const most = 100
const states = ['waiting', 'leased', 'done', 'failed', 'cancelled'] as const

/** Background work: what runs, waits and failed, then what is done, newest first. Payloads stay inside. */
export async function listJobs(read: Read) {
  const [rows, counted] = await Promise.all([
    read.selectFrom('job').leftJoin('course', 'course.id', 'job.course_id').leftJoin('membership', 'membership.id', 'job.by_actor_id').leftJoin('person', 'person.id', 'membership.person_id')
      .select(['job.id', 'job.kind', 'job.state', 'job.attempts', 'job.done_units as doneUnits', 'job.all_units as allUnits', 'job.created_at as createdAt', 'job.run_after as runAfter', 'job.error_json as errorJson', 'course.code as course', 'person.display_name as by'])
      .orderBy(order => order.case().when('job.state', 'in', ['leased', 'failed', 'waiting']).then(0).else(1).end()).orderBy('job.created_at', 'desc').limit(most).execute(),
    read.selectFrom('job').select(count => ['state', count.fn.countAll<number>().as('n')]).groupBy('state').execute(),
  ])
  return {
    jobs: rows.map(({ errorJson, createdAt, runAfter, ...job }) => ({ ...job, createdAt: new Date(createdAt).toISOString(), runAfter: new Date(runAfter).toISOString(), error: reasonOf(errorJson) })),
    counts: Object.fromEntries(states.map(state => [state, counted.find(row => row.state === state)?.n ?? 0])) as Record<typeof states[number], number>,
  }
}

/** The code of what went wrong; never a stack or a path. */
function reasonOf(json: string | null): string | null {
  if (json === null) return null
  const value: unknown = JSON.parse(json)
  return typeof value === 'object' && value !== null && 'code' in value && typeof value.code === 'string' ? value.code : 'failed'
}
