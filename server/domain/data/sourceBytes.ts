import type { ReadStream } from 'node:fs'
import { refuse } from '#shared/errors'
import type { Read } from '../../db/writer'
import type { FileStore } from '../../files/store'

/** The source file of a version, byte for byte, under the name it came with. */
export async function sourceBytes(read: Read, files: FileStore, input: { versionId: string, ordinal: number }): Promise<{ stream: ReadStream, name: string, size: number, sha256: string }> {
  const source = await read.selectFrom('data_set_version_source as used')
    .innerJoin('source_file', 'source_file.sha256', 'used.source_sha256')
    .innerJoin('upload', 'upload.source_sha256', 'used.source_sha256')
    .select(['source_file.sha256', 'source_file.size', 'upload.original_name']).where('used.version_id', '=', input.versionId).where('used.ordinal', '=', input.ordinal)
    .orderBy('upload.at', 'desc').executeTakeFirst()
  if (!source || !files.has(source.sha256)) return refuse('not_found')
  return { stream: files.read(source.sha256), name: source.original_name, size: source.size, sha256: source.sha256.toString('hex') }
}
