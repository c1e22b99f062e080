import type { Letter } from '../letter'

export function passphraseReset(url: string): Letter {
  return {
    subject: 'A new passphrase',
    says: ['Somebody, probably you, asked for a new passphrase for this account.'],
    link: { words: 'Choose a new passphrase', url },
    after: ['The link is good once and for one hour, and ends every session that is open. If it was not you, do nothing: your passphrase stays as it is.'],
  }
}
