import type { NoticeFacts } from '#shared/schemas/notices'
import type { Letter } from '../letter'

const outcome: Record<NonNullable<NoticeFacts<'dispute_ruled'>['kind']>, string> = {
  uphold: 'The mark stays as it was.',
  change: 'The marks of this step were changed.',
  accept: 'Your reading or method was accepted.',
  fault: 'A fault in the reference is being looked at by the instructor.',
}

export function disputeRuled(facts: NoticeFacts<'dispute_ruled'>, link: (path: string) => string): Letter {
  return {
    subject: `Your dispute was ruled on: ${facts.lab}`,
    says: [`Your dispute about ${facts.lab} (${facts.course})${facts.step === undefined ? '' : `, step “${facts.step}”,`} was ruled on.${facts.kind === undefined ? '' : ` ${outcome[facts.kind]}`}`, 'The reason, and who gave it, are on its page.'],
    link: { words: 'Read the ruling', url: link(facts.path) },
  }
}
