import { refuse } from '#shared/errors'
import type { Read } from '../../db/writer'

/** The root of a version, by which the observations know it. */
export async function rootOf(read: Read, versionId: string): Promise<Buffer> {
  const version = await read.selectFrom('data_set_version').select('root_sha256').where('id', '=', versionId).executeTakeFirst()
  return version?.root_sha256 ?? refuse('not_found')
}
