import type { Read } from '../../db/writer'
import type { VersionMeta } from './publishVersions'

/** What the database names in the observations: everything else there is left over. */
export async function liveChunks(read: Read): Promise<{ roots: Buffer[], refusals: Buffer[] }> {
  const versions = await read.selectFrom('data_set_version').select(['root_sha256', 'meta_json']).execute()
  return {
    roots: versions.map(version => version.root_sha256),
    refusals: versions.flatMap(version => (JSON.parse(version.meta_json) as Partial<VersionMeta>).refusals ?? []).map(hex => Buffer.from(hex, 'hex')),
  }
}
