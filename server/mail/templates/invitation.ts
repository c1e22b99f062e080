import type { Letter } from '../letter'

export function invitation(url: string): Letter {
  return {
    subject: 'You are invited to your department’s teaching labs',
    says: ['An account was made for you. Choose a passphrase to start.'],
    link: { words: 'Choose a passphrase', url },
    after: ['The link is good once and for two weeks. If you did not expect this, ignore it: without the link nothing happens.'],
  }
}
