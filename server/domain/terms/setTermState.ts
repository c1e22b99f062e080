import { refuse } from '#shared/errors'
import type { Stores } from '../../db/writer'
import { doOnce, type Asked } from '../asked'
import { appendEntry, departmentChain } from '../ledger/appendEntry'

type State = 'planned' | 'running' | 'closed'

/** Opens a planned term, closes a running one, or opens a closed one again; each is in the ledger. */
export function setTermState({ write }: Stores, input: Asked & { termId: string, state: 'running' | 'closed' }, now: number): Promise<{ state: State }> {
  return write(trx => doOnce(trx, input, async () => {
    const term = await trx.selectFrom('term').select('state').where('id', '=', input.termId).executeTakeFirst()
    if (!term) return refuse('not_found')
    if (term.state === input.state) return { state: term.state }
    if (term.state === 'planned' && input.state === 'closed') refuse('invalid', {}, [{ path: 'state', message: 'A planned term is opened before it is closed.' }])
    await trx.updateTable('term').set({ state: input.state }).where('id', '=', input.termId).execute()
    await appendEntry(trx, { chain: departmentChain, at: now, actor: input.actorId, action: input.state === 'running' ? 'term.opened' : 'term.closed', facts: { termId: input.termId, before: term.state, after: input.state } })
    return { state: input.state }
  }))
}
