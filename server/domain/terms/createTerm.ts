import { refuse } from '#shared/errors'
import type { TermDates } from '#shared/schemas/department'
import type { Stores, Trx } from '../../db/writer'
import { doOnce, type Asked } from '../asked'
import { newId } from '../ids'
import { appendEntry, departmentChain, digestOf } from '../ledger/appendEntry'

/** Adds a term with its zone, dates and teaching weeks. It is planned until it is opened. */
export function createTerm({ write }: Stores, input: Asked & { term: TermDates }, now: number): Promise<{ id: string }> {
  return write(trx => doOnce(trx, input, async () => {
    const id = await insertTerm(trx, input.term, now)
    await appendEntry(trx, { chain: departmentChain, at: now, actor: input.actorId, action: 'term.created', facts: { termId: id, startsOn: input.term.startsOn, endsOn: input.term.endsOn, calendar: digestOf(input.term.calendar).toString('hex') } })
    return { id }
  }))
}

/** What `term.calendar_json` holds; `origin` where the term was opened from an earlier one. */
export interface TermOrigin { termId: string, planDigest: string }

export async function insertTerm(trx: Trx, term: TermDates, now: number, origin?: TermOrigin): Promise<string> {
  const same = await trx.selectFrom('term').select('id').where('name', '=', term.name).executeTakeFirst()
  if (same) refuse('already_exists', { what: `A term "${term.name}"` }, [{ path: 'name', message: 'A term of this name is here already.' }])
  const id = newId(now)
  await trx.insertInto('term').values({
    id, name: term.name, zone: term.zone, starts_on: term.startsOn, ends_on: term.endsOn, state: 'planned', calendar_json: JSON.stringify({ ...term.calendar, ...(origin ? { origin } : {}) }),
  }).execute()
  return id
}
