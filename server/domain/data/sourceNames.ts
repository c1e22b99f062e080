import type { Read } from '../../db/writer'

/** Where no name is left of the place that the data set belongs to. */
export const unnamed = 'source'

/** By hex digest: the name under which a file last came to this course (or, with null, to the department) before a version was made of it. Other courses' names are theirs. */
export async function sourceNames(read: Read, { courseId, digests, before }: { courseId: string | null, digests: readonly Buffer[], before: number }): Promise<ReadonlyMap<string, string>> {
  if (digests.length === 0) return new Map()
  const uploads = await read.selectFrom('upload').select(['source_sha256', 'original_name']).where('source_sha256', 'in', [...digests])
    .where('course_id', courseId === null ? 'is' : '=', courseId).where('at', '<=', before).orderBy('at').execute()
  return new Map(uploads.map(upload => [upload.source_sha256.toString('hex'), upload.original_name]))
}
