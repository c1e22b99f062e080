import { labBody, type LabBody } from '#shared/schemas/lab'
import type { Read, Trx } from '../../db/writer'

export interface StoredRevision { id: string, no: number, body: LabBody, digest: Buffer, frozenAt: number | null }

/** The revision of a lab with the highest number. */
export async function latestRevision(db: Read | Trx, labId: string): Promise<StoredRevision> {
  const row = await db.selectFrom('lab_revision').selectAll().where('lab_id', '=', labId).orderBy('no', 'desc').limit(1).executeTakeFirstOrThrow()
  return { id: row.id, no: row.no, body: labBody.parse(JSON.parse(row.body_json)), digest: row.digest, frozenAt: row.frozen_at }
}
