import { refuse } from '#shared/errors'
import type { Stores } from '../../db/writer'
import { doOnce, type Asked } from '../asked'
import { noteChange, refuseOlder } from '../lastChange'
import { appendEntry, courseChain } from '../ledger/appendEntry'

/** Takes a posted lab back: nobody can hand in any more, and what was handed in stays as it is. */
export function withdrawLab({ write }: Stores, input: Asked & { labId: string, seenVersion: number }, now: number): Promise<{ version: number }> {
  return write(trx => doOnce(trx, input, async () => {
    const lab = await trx.selectFrom('lab').select(['id', 'course_id', 'state', 'version']).where('id', '=', input.labId).executeTakeFirst()
    if (!lab) return refuse('not_found')
    if (lab.version !== input.seenVersion) return refuseOlder(trx, lab.id, lab.version)
    if (lab.state !== 'posted') return refuse('lab_not_open')
    const version = lab.version + 1
    await trx.updateTable('lab').set({ state: 'withdrawn', version }).where('id', '=', lab.id).execute()
    await noteChange(trx, lab.id, input.actorId, now)
    await trx.updateTable('posting').set(set => ({ state: 'withdrawn', version: set('version', '+', 1) })).where('lab_id', '=', lab.id).execute()
    await appendEntry(trx, { chain: courseChain(lab.course_id), at: now, actor: input.actorId, action: 'lab.withdrawn', facts: { labId: lab.id } })
    return { version }
  }))
}
