import type { Trx } from '../../db/writer'
import { newId } from '../ids'

/** Templates of mail; their words are in `server/mail/templates`. */
export type NoticeTemplate = 'receipt' | 'dispute_opened' | 'dispute_ruled' | 'marks_released' | 'invitation' | 'passphrase_reset' | 'passphrase_changed'

/**
 * Puts a mail into the outbox, in the same unit of work as the event that it tells of.
 * `eventKey` is unique per event and person, so that an event told twice is sent once.
 */
export async function queueNotice(trx: Trx, notice: {
  eventKey: string, template: NoticeTemplate, facts: Readonly<Record<string, string | number | null>>, toMembershipId?: string, toPersonId?: string, now: number
}): Promise<void> {
  const id = newId(notice.now)
  await trx.insertInto('outbox').values({
    id, event_key: notice.eventKey, to_membership_id: notice.toMembershipId ?? null, to_person_id: notice.toPersonId ?? null,
    message_id: `<${id}@tetherhouse>`, template: notice.template, facts_json: JSON.stringify(notice.facts), state: 'waiting', attempts: 0, next_at: notice.now,
  }).onConflict(conflict => conflict.column('event_key').doNothing()).execute()
}
