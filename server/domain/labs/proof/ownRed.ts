import { refuse } from '#shared/errors'
import type { Read, Stores } from '../../../db/writer'
import { doOnce, type Asked } from '../../asked'
import { newId } from '../../ids'
import { actorName } from '../../disputes/rulers'

/** Who answers for a finding, and why. */
export interface Owned { by: string, at: number, reason: string }

/** Which findings of a lab somebody answers for, by their key. */
export async function readOwned(read: Read, labId: string): Promise<Map<string, Owned>> {
  const rows = await read.selectFrom('owned_red').select(['red_key', 'reason', 'by_actor_id', 'at']).where('lab_id', '=', labId).execute()
  return new Map(await Promise.all(rows.map(async row => [row.red_key, { by: await actorName(read, row.by_actor_id), at: row.at, reason: row.reason }] as const)))
}

/**
 * Somebody answers by name, with a reason, for what the proof run found: the lab can then be posted with it. It is written once and stays;
 * a change of the lab makes its findings new ones.
 * @throws {DomainError} `not_found`, `lab_not_draft`, `already_exists`
 */
export async function ownReds({ write }: Stores, input: Asked & { labId: string, keys: readonly string[], reason: string }, now: number): Promise<{ owned: number }> {
  return write(trx => doOnce(trx, input, async () => {
    const lab = await trx.selectFrom('lab').select(['id', 'state']).where('id', '=', input.labId).executeTakeFirst()
    if (!lab) return refuse('not_found')
    if (lab.state !== 'draft') return refuse('lab_not_draft')
    const known = await trx.selectFrom('owned_red').select('red_key').where('lab_id', '=', lab.id).where('red_key', 'in', [...input.keys, '']).execute()
    const fresh = [...new Set(input.keys)].filter(key => !known.some(row => row.red_key === key))
    if (fresh.length > 0) await trx.insertInto('owned_red').values(fresh.map(key => ({ id: newId(now), lab_id: lab.id, red_key: key, reason: input.reason, by_actor_id: input.actorId, at: now }))).execute()
    return { owned: fresh.length }
  }))
}
