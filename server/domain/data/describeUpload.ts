import { refuse } from '#shared/errors'
import type { Read } from '../../db/writer'
import type { FileStore } from '../../files/store'
import { UnreadableFile } from '../../importing/unreadable'
import { guessLayout, sampleBytes, type Guess, type SaidOfLayout } from '../../importing/layout'
import { titleOf } from '../../importing/inspect'
import { readHeadOf } from './readHeadOf'

export interface UploadRow { id: string, name: string, size: number, sha256: Buffer, at: number }

export async function getUpload(read: Read, uploadId: string): Promise<UploadRow> {
  const row = await read.selectFrom('upload').innerJoin('source_file', 'source_file.sha256', 'upload.source_sha256')
    .select(['upload.id', 'upload.original_name as name', 'source_file.size', 'source_file.sha256', 'upload.at']).where('upload.id', '=', uploadId).executeTakeFirst()
  return row ?? refuse('not_found')
}

/** An upload with the guess at its layout, made anew from the kept bytes. */
export async function describeUpload(read: Read, files: FileStore, uploadId: string, said: SaidOfLayout = {}): Promise<Omit<UploadRow, 'sha256'> & { sha256: string, guess: Guess }> {
  const upload = await getUpload(read, uploadId)
  const { bytes, isWhole } = await readHeadOf(files, upload.sha256, sampleBytes)
  try {
    return { ...upload, sha256: upload.sha256.toString('hex'), guess: guessLayout(bytes, isWhole, titleOf(upload.name), said) }
  }
  catch (error) {
    if (error instanceof UnreadableFile) return refuse(error.code, error.facts)
    throw error
  }
}
