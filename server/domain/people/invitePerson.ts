import { refuse } from '#shared/errors'
import type { Stores, Trx } from '../../db/writer'
import { doOnce, type Asked } from '../asked'
import { newId } from '../ids'
import { appendEntry, departmentChain } from '../ledger/appendEntry'
import { queueInvitation } from './queueInvitation'

/** Adds a person, who gets a mail with a link to choose a passphrase. The link works once. */
export function invitePerson({ write }: Stores, input: Asked & { name: string, email: string }, now: number): Promise<{ id: string }> {
  return write(trx => doOnce(trx, input, async () => {
    const known = await trx.selectFrom('person').select('id').where('email_norm', '=', input.email).executeTakeFirst()
    if (known) refuse('already_exists', { what: 'A person with this e-mail' }, [{ path: 'email', message: 'A person with this e-mail is here already.' }])
    const id = await addInvited(trx, input, now)
    await appendEntry(trx, { chain: departmentChain, at: now, actor: input.actorId, action: 'person.invited', facts: { personId: id } })
    return { id }
  }))
}

/** Sends a new link; earlier ones stop working. */
export function inviteAgain({ write }: Stores, input: Asked & { personId: string }, now: number): Promise<{ id: string }> {
  return write(trx => doOnce(trx, input, async () => {
    const person = await trx.selectFrom('person').select(['id', 'state']).where('id', '=', input.personId).executeTakeFirst()
    if (!person) refuse('not_found')
    if (person.state !== 'invited') refuse('already_exists', { what: 'The account' })
    await queueInvitation(trx, { personId: person.id, now })
    return { id: person.id }
  }))
}

/** A person without a passphrase yet, with the invitation in the outbox: for use cases that add many. */
export async function addInvited(trx: Trx, person: { name: string, email: string }, now: number): Promise<string> {
  const id = newId(now)
  await trx.insertInto('person').values({ id, display_name: person.name, email_norm: person.email, campus_issuer: null, campus_subject: null, state: 'invited', created_at: now, erased_at: null }).execute()
  await queueInvitation(trx, { personId: id, now })
  return id
}
