import type { Read, Trx } from '../../db/writer'

/** What stands where a text was erased. */
export const erasedText = 'This text was erased.'

/** Erasable texts by the hex digests that stand for them elsewhere; one that was erased is not among them. */
export async function readPrivateTexts(read: Read | Trx, digests: readonly string[]): Promise<ReadonlyMap<string, string>> {
  if (digests.length === 0) return new Map()
  const rows = await read.selectFrom('private_body').select(['digest', 'body']).where('digest', 'in', digests.map(digest => Buffer.from(digest, 'hex'))).execute()
  return new Map(rows.map(row => [row.digest.toString('hex'), row.body]))
}
