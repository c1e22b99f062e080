import { refuse } from '#shared/errors'
import type { TermDates } from '#shared/schemas/department'
import type { Stores } from '../../db/writer'
import { doOnce, type Asked } from '../asked'
import { appendEntry, departmentChain, digestOf } from '../ledger/appendEntry'
import { readCalendar } from './describeTerm'

/**
 * Changes a term's name, dates and teaching weeks; dates of labs stay as they are. The zone is what posted times were said in,
 * so it changes only while the term is planned.
 * @throws {DomainError} `changed_meanwhile` where another admin saved since, `term_closed`, `already_exists`, `invalid`
 */
export function editTerm({ write }: Stores, input: Asked & { termId: string, seenVersion: number, term: TermDates }, now: number): Promise<{ id: string, version: number }> {
  return write(trx => doOnce(trx, input, async () => {
    const before = await trx.selectFrom('term').selectAll().where('id', '=', input.termId).executeTakeFirst()
    if (!before) return refuse('not_found')
    if (before.state === 'closed') refuse('term_closed')
    if (before.version !== input.seenVersion) refuse('changed_meanwhile', { version: before.version })
    if (before.state === 'running' && before.zone !== input.term.zone) refuse('invalid', {}, [{ path: 'zone', message: 'The zone of a running term stays.' }])
    const same = await trx.selectFrom('term').select('id').where('name', '=', input.term.name).where('id', '<>', input.termId).executeTakeFirst()
    if (same) refuse('already_exists', { what: `A term "${input.term.name}"` }, [{ path: 'name', message: 'A term of this name is here already.' }])
    const { origin } = readCalendar(before.calendar_json)
    await trx.updateTable('term').set({
      name: input.term.name, zone: input.term.zone, starts_on: input.term.startsOn, ends_on: input.term.endsOn,
      calendar_json: JSON.stringify({ ...input.term.calendar, ...(origin ? { origin } : {}) }), version: before.version + 1,
    }).where('id', '=', input.termId).execute()
    await appendEntry(trx, {
      chain: departmentChain, at: now, actor: input.actorId, action: 'term.edited',
      facts: { termId: input.termId, before: { startsOn: before.starts_on, endsOn: before.ends_on }, after: { startsOn: input.term.startsOn, endsOn: input.term.endsOn }, calendar: digestOf(input.term.calendar).toString('hex') },
    })
    return { id: input.termId, version: before.version + 1 }
  }))
}
