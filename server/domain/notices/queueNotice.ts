import type { NoticeContent } from '#shared/schemas/notices'
import { keptQuery } from '../../db/keptQuery'
import type { OutboxTable } from '../../db/schema/machinery'
import type { Trx } from '../../db/writer'
import { newId } from '../ids'

export type { NoticeTemplate } from '#shared/schemas/notices'

type Notice = NoticeContent & { eventKey: string, toMembershipId?: string, toPersonId?: string, now: number }

const putNotice = keptQuery((db, given: OutboxTable) => db.insertInto('outbox').values({
  id: given.id, event_key: given.event_key, to_membership_id: given.to_membership_id, to_person_id: given.to_person_id, message_id: given.message_id,
  template: given.template, facts_json: given.facts_json, state: given.state, attempts: given.attempts, next_at: given.next_at,
}).onConflict(conflict => conflict.column('event_key').doNothing()))

/**
 * Puts a mail into the outbox, in the same unit of work as the event that it tells of.
 * `eventKey` is unique per event and person, so that an event told twice is sent once.
 */
export async function queueNotice(trx: Trx, notice: Notice): Promise<void> {
  const id = newId(notice.now)
  await putNotice(trx, {
    id, event_key: notice.eventKey, to_membership_id: notice.toMembershipId ?? null, to_person_id: notice.toPersonId ?? null,
    message_id: `<${id}@tetherhouse>`, template: notice.template, facts_json: JSON.stringify(notice.facts), state: 'waiting', attempts: 0, next_at: notice.now,
  })
}
