import { createReadStream } from 'node:fs'
import { refuse } from '#shared/errors'
import { once } from '../../db/queries/requestKeys'
import type { Stores } from '../../db/writer'
import type { FileStore } from '../../files/store'
import { inspectFile } from '../../importing/inspect'
import type { Guess } from '../../importing/layout'
import { UnreadableFile } from '../../importing/unreadable'
import { newId } from '../ids'
import { shownFileName } from './fileName'
import { uploadLimit } from './limits'

export interface AcceptUpload {
  courseId: string
  actorId: string
  personId: string
  name: string
  body: AsyncIterable<Uint8Array>
  /** What Content-Length says, where it is given. It may lie: the bytes are counted. */
  expectedBytes?: number
  request: { key: string, route: string }
}

export interface AcceptedUpload { id: string, name: string, size: number, sha256: string, at: number, guess: Guess }

/**
 * Takes a logger's file: to disk as it comes, looked through, then kept by its digest. A file that is no table of readings
 * is refused and nothing of it stays.
 */
export async function acceptUpload({ write }: Stores, files: FileStore, input: AcceptUpload, now: number): Promise<AcceptedUpload> {
  const limits = uploadLimit()
  const received = await files.receive(input.body, { mostBytes: limits.mostBytes, expectedBytes: input.expectedBytes })
  const name = shownFileName(input.name)
  let guess: Guess
  try {
    guess = await inspectFile(createReadStream(received.path), limits, name)
    await received.keep()
  }
  catch (error) {
    await received.discard()
    if (error instanceof UnreadableFile) return refuse(error.code, error.facts)
    throw error
  }
  const kept = await write(trx => once(trx, { personId: input.personId, ...input.request, bodySha256: received.sha256, now }, async () => {
    const id = newId(now)
    await trx.insertInto('source_file').values({ sha256: received.sha256, size: received.size, stored_at: now }).onConflict(conflict => conflict.column('sha256').doNothing()).execute()
    await trx.insertInto('upload').values({ id, course_id: input.courseId, source_sha256: received.sha256, original_name: name, by_actor_id: input.actorId, at: now }).execute()
    return { id, at: now }
  }))
  return { ...kept, name, size: received.size, sha256: received.sha256.toString('hex'), guess }
}
