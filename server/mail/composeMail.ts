import { noticeFacts, type NoticeTemplate } from '#shared/schemas/notices'
import { asHtml, asText, type Letter } from './letter'
import { disputeOpened } from './templates/disputeOpened'
import { disputeRuled } from './templates/disputeRuled'
import { invitation } from './templates/invitation'
import { marksReleased } from './templates/marksReleased'
import { passphraseChanged } from './templates/passphraseChanged'
import { passphraseReset } from './templates/passphraseReset'
import { receipt } from './templates/receipt'
import { repair } from './templates/repair'

export interface Links {
  /** Where people reach the house, without a slash at the end. */
  publicUrl: string
  tokenOf: (purpose: 'invite' | 'reset', tokenId: string) => string
}

export interface Mail { subject: string, text: string, html: string }

export const isTemplate = (name: string): name is NoticeTemplate => name in noticeFacts

/** The words of a mail. Throws where the facts are not those of its template: such a mail is never sent. */
export function composeMail(template: NoticeTemplate, facts: unknown, links: Links): Mail {
  const letter = letters[template](facts, links)
  const subject = oneLine(letter.subject)
  return { subject, text: asText(letter), html: asHtml({ ...letter, subject }) }
}

const letters: Record<NoticeTemplate, (facts: unknown, links: Links) => Letter> = {
  receipt: (facts, links) => receipt(noticeFacts.receipt.parse(facts), linkTo(links)),
  dispute_opened: (facts, links) => disputeOpened(noticeFacts.dispute_opened.parse(facts), linkTo(links)),
  dispute_ruled: (facts, links) => disputeRuled(noticeFacts.dispute_ruled.parse(facts), linkTo(links)),
  marks_released: (facts, links) => marksReleased(noticeFacts.marks_released.parse(facts), linkTo(links)),
  repair: (facts, links) => repair(noticeFacts.repair.parse(facts), linkTo(links)),
  invitation: (facts, links) => invitation(linkTo(links)(`/invite/${links.tokenOf('invite', noticeFacts.invitation.parse(facts).tokenId)}`)),
  passphrase_reset: (facts, links) => passphraseReset(linkTo(links)(`/reset/${links.tokenOf('reset', noticeFacts.passphrase_reset.parse(facts).tokenId)}`)),
  passphrase_changed: (facts, links) => passphraseChanged(noticeFacts.passphrase_changed.parse(facts), linkTo(links)),
}

const linkTo = ({ publicUrl }: Links) => (path: string) => `${publicUrl}${path}`

/** A header is one line, whatever a lab's title holds. */
// eslint-disable-next-line no-control-regex -- control characters are what it takes out
const oneLine = (text: string) => text.replace(/[\u0000-\u001f\u007f-\u009f\u2028\u2029]+/g, ' ').trim()
