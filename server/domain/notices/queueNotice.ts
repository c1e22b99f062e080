import type { NoticeContent } from '#shared/schemas/notices'
import type { Trx } from '../../db/writer'
import { newId } from '../ids'

export type { NoticeTemplate } from '#shared/schemas/notices'

type Notice = NoticeContent & { eventKey: string, toMembershipId?: string, toPersonId?: string, now: number }

/**
 * Puts a mail into the outbox, in the same unit of work as the event that it tells of.
 * `eventKey` is unique per event and person, so that an event told twice is sent once.
 */
export async function queueNotice(trx: Trx, notice: Notice): Promise<void> {
  const id = newId(notice.now)
  await trx.insertInto('outbox').values({
    id, event_key: notice.eventKey, to_membership_id: notice.toMembershipId ?? null, to_person_id: notice.toPersonId ?? null,
    message_id: `<${id}@tetherhouse>`, template: notice.template, facts_json: JSON.stringify(notice.facts), state: 'waiting', attempts: 0, next_at: notice.now,
  }).onConflict(conflict => conflict.column('event_key').doNothing()).execute()
}
