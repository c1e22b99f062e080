import type { Read } from '../../db/writer'

/** Where no name is left of the place that the data set belongs to. */
export const unnamed = 'source'

/** Of a data set's version: where it belongs (a course, or with null the department), who made it, and when. */
export interface NamedFrom { courseId: string | null, actorId: string, madeAt: number }

/**
 * By hex digest: the name under which a file last came to this course before a version was made of it. A data set of the department is
 * made from some course: there it is the name that its maker gave. What others call the same bytes elsewhere is theirs.
 */
export async function sourceNames(read: Read, digests: readonly Buffer[], { courseId, actorId, madeAt }: NamedFrom): Promise<ReadonlyMap<string, string>> {
  if (digests.length === 0) return new Map()
  let query = read.selectFrom('upload').select(['source_sha256', 'original_name']).where('source_sha256', 'in', [...digests]).where('at', '<=', madeAt)
  query = courseId === null ? query.where('by_actor_id', '=', actorId) : query.where('course_id', '=', courseId)
  return new Map((await query.orderBy('at').execute()).map(upload => [upload.source_sha256.toString('hex'), upload.original_name]))
}
