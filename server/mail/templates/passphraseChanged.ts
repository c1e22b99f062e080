import type { NoticeFacts } from '#shared/schemas/notices'
import type { Letter } from '../letter'

export function passphraseChanged(facts: NoticeFacts<'passphrase_changed'>, link: (path: string) => string): Letter {
  return {
    subject: 'Your passphrase was changed',
    says: [`The passphrase of this account was changed on ${new Date(facts.at).toISOString().replace('T', ' at ').replace(/\.\d+Z$/, ' UTC')}. Every other session was ended.`],
    after: ['If it was not you, ask for a new passphrase at once and tell the department admin.'],
    link: { words: 'Sign in', url: link('/sign-in') },
  }
}
