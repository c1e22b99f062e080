import type { SavedDraft } from '#shared/schemas/work'
import type { Read } from '../../db/writer'

/** What is saved of a share's fields, by step. */
export async function readDrafts(read: Read, shareId: string): Promise<SavedDraft[]> {
  const rows = await read.selectFrom('draft').select(['step_key', 'typed', 'version', 'saved_at']).where('share_id', '=', shareId).orderBy('step_key').execute()
  return rows.map(row => ({ stepKey: row.step_key, typed: row.typed, version: row.version, savedAt: new Date(row.saved_at).toISOString() }))
}
