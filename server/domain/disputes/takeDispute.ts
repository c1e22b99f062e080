import { refuse } from '#shared/errors'
import type { Stores } from '../../db/writer'
import { noteChange, refuseOlder } from '../lastChange'
import { disputeGround, reasonNotToRule, type Ruler } from './disputeGround'
import { actorName } from './rulers'

/** How long a dispute stays with whoever took it. After that anyone may take it. */
export const takenFor = 45 * 60_000

/**
 * Takes a dispute, so that two do not work at it at the same time; taking it again keeps it longer. `giveBack` puts it back.
 * @throws {DomainError} `taken_by_another`, `changed_meanwhile`, `own_work`, `goes_to_instructor`, `dispute_closed`
 */
export async function takeDispute({ write }: Stores, input: { disputeId: string, ruler: Ruler, seenVersion: number, giveBack: boolean }, now: number): Promise<{ version: number, state: 'open' | 'taken' | 'appealed' }> {
  return write(async (trx) => {
    const ground = await disputeGround(trx, input.disputeId)
    const why = await reasonNotToRule(trx, ground, input.ruler)
    if (why) return refuse(why)
    if (ground.state === 'appealed') return { version: ground.version, state: 'appealed' as const }
    const isOthers = ground.takenBy !== null && ground.takenBy !== input.ruler.actorId && (ground.takenUntil ?? 0) > now
    if (isOthers) return refuse('taken_by_another', { by: await actorName(trx, ground.takenBy ?? '') })
    if (ground.version !== input.seenVersion) return refuseOlder(trx, ground.id, ground.version)
    const state = input.giveBack ? 'open' as const : 'taken' as const
    const version = ground.version + 1
    await trx.updateTable('dispute').set({ state, version, taken_by: input.giveBack ? null : input.ruler.actorId, taken_until: input.giveBack ? null : now + takenFor }).where('id', '=', ground.id).execute()
    await noteChange(trx, ground.id, input.ruler.actorId, now)
    return { version, state }
  })
}

/** A student takes an objection back while nobody has ruled on it. */
export async function withdrawDispute({ write }: Stores, input: { disputeId: string, membershipId: string }, now: number): Promise<{ version: number }> {
  return write(async (trx) => {
    const ground = await disputeGround(trx, input.disputeId)
    if (!ground.studentIds.includes(input.membershipId)) return refuse('not_found')
    if (ground.state !== 'open' && ground.state !== 'taken') return refuse('dispute_closed')
    await trx.updateTable('dispute').set({ state: 'withdrawn', version: ground.version + 1, taken_by: null, taken_until: null }).where('id', '=', ground.id).execute()
    await noteChange(trx, ground.id, input.membershipId, now)
    return { version: ground.version + 1 }
  })
}
