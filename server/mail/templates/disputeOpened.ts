import type { NoticeFacts } from '#shared/schemas/notices'
import type { Letter } from '../letter'

export function disputeOpened(facts: NoticeFacts<'dispute_opened'>, link: (path: string) => string): Letter {
  return {
    subject: `A mark is in dispute: ${facts.lab}`,
    says: [`A student objects to a mark in ${facts.lab} (${facts.course})${facts.step === undefined ? '' : `, step “${facts.step}”`}. Their reasons and the evidence are on its page.`],
    link: { words: 'Look at the dispute', url: link(facts.path) },
  }
}
