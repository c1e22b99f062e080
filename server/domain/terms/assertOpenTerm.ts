import { refuse } from '#shared/errors'
import type { Trx } from '../../db/writer'

/** A closed term's record stays as it is. */
export async function assertOpenTerm(trx: Trx, termId: string): Promise<void> {
  const term = await trx.selectFrom('term').select('state').where('id', '=', termId).executeTakeFirst()
  if (!term) refuse('not_found')
  if (term.state === 'closed') refuse('term_closed')
}
