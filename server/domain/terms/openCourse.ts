import { refuse } from '#shared/errors'
import type { Stores } from '../../db/writer'
import { doOnce, type Asked } from '../asked'
import { appendEntry, courseChain } from '../ledger/appendEntry'

/**
 * Opens a course to its students. One that came along from an earlier term is a draft: its staff prepare it, and its students, as soon
 * as a roster has brought them in, see nothing of it until now (`loadActor` leaves such a membership out). It does not close again.
 */
export function openCourse({ write }: Stores, input: Asked & { courseId: string }, now: number): Promise<{ state: 'open' }> {
  return write(trx => doOnce(trx, input, async () => {
    const course = await trx.selectFrom('course').select(['id', 'state']).where('id', '=', input.courseId).executeTakeFirst()
    if (!course) return refuse('not_found')
    if (course.state === 'draft') {
      await trx.updateTable('course').set({ state: 'open' }).where('id', '=', course.id).execute()
      await appendEntry(trx, { chain: courseChain(course.id), at: now, actor: input.actorId, action: 'course.opened', facts: { courseId: course.id, before: 'draft', after: 'open' } })
    }
    return { state: 'open' as const }
  }))
}
