import type { ReadStream } from 'node:fs'
import { refuse } from '#shared/errors'
import type { Read } from '../../db/writer'
import type { FileStore } from '../../files/store'
import { sourceNames, unnamed } from './sourceNames'

/**
 * The source file of a version, byte for byte, under the name that it was given where the data set belongs: the same bytes may have come
 * to another course as well, and under which name is that course's own.
 */
export async function sourceBytes(read: Read, files: FileStore, input: { versionId: string, ordinal: number }): Promise<{ stream: ReadStream, name: string, size: number, sha256: string }> {
  const source = await read.selectFrom('data_set_version_source as used')
    .innerJoin('source_file', 'source_file.sha256', 'used.source_sha256')
    .innerJoin('data_set_version', 'data_set_version.id', 'used.version_id').innerJoin('data_set', 'data_set.id', 'data_set_version.data_set_id')
    .select(['source_file.sha256', 'source_file.size', 'data_set.owner_course_id as courseId', 'data_set_version.made_at as madeAt', 'data_set_version.by_actor_id as actorId']).where('used.version_id', '=', input.versionId).where('used.ordinal', '=', input.ordinal).executeTakeFirst()
  if (!source || !files.has(source.sha256)) return refuse('not_found')
  const names = await sourceNames(read, [source.sha256], source)
  return { stream: files.read(source.sha256), name: names.get(source.sha256.toString('hex')) ?? unnamed, size: source.size, sha256: source.sha256.toString('hex') }
}
