import { DomainError, refuse } from '#shared/errors'
import type { SavedDraft } from '#shared/schemas/work'
import type { Stores } from '../../db/writer'
import { postedGround, readGround } from './ground'

export interface SaveDraft {
  membershipId: string
  shareId: string
  stepKey: string
  typed: string
  /** The saved version over which this was typed; 0 where nothing was saved yet. */
  baseVersion: number
}

/**
 * Saves what stands in one field. Two tabs or devices never overwrite each other: a text typed over an older version than the
 * saved one is refused with the other text, and the person chooses.
 * @throws {DomainError} `changed_meanwhile` with `typed`, `version`, `savedAt` of the other text; `not_found`, `lab_withdrawn`, `lab_not_open`
 */
export async function saveDraft({ read, write }: Stores, input: SaveDraft, now: number): Promise<SavedDraft> {
  const ground = postedGround(await readGround(read, input.shareId, input.membershipId), now)
  const step = await read.selectFrom('step').select('step_key').where('lab_revision_id', '=', ground.labRevisionId).where('step_key', '=', input.stepKey).executeTakeFirst()
  if (!step) return refuse('not_found')
  return write(async (trx) => {
    const saved = await trx.selectFrom('draft').select(['typed', 'version', 'saved_at']).where('share_id', '=', input.shareId).where('step_key', '=', input.stepKey).executeTakeFirst()
    const version = saved?.version ?? 0
    if (saved && saved.typed === input.typed) return { stepKey: input.stepKey, typed: saved.typed, version, savedAt: new Date(saved.saved_at).toISOString() }
    if (saved && version !== input.baseVersion) throw new DomainError('changed_meanwhile', { by: 'Another tab or device', typed: saved.typed, version, savedAt: new Date(saved.saved_at).toISOString() })
    const row = { membership_id: input.membershipId, typed: input.typed, base_version: input.baseVersion, version: version + 1, saved_at: now }
    await trx.insertInto('draft').values({ share_id: input.shareId, step_key: input.stepKey, ...row })
      .onConflict(conflict => conflict.columns(['share_id', 'step_key']).doUpdateSet(row)).execute()
    return { stepKey: input.stepKey, typed: input.typed, version: version + 1, savedAt: new Date(now).toISOString() }
  })
}
