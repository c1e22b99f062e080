import { refuse } from '#shared/errors'
import { isCommonPassphrase } from './commonPassphrases'

export const leastPassphraseLength = 15

/**
 * The rules for a new passphrase: at least 15 characters, any characters, nothing cut off, not among those tried first.
 * Characters are counted as people see them (code points after NFC), so that an accent is not two.
 * @throws {DomainError} `passphrase_too_short`, `passphrase_too_common`
 */
export function checkPassphrase(passphrase: string, own: readonly string[] = []): void {
  const length = [...passphrase.normalize('NFC')].length
  if (length < leastPassphraseLength) refuse('passphrase_too_short', { least: leastPassphraseLength })
  if (isCommonPassphrase(passphrase, own)) refuse('passphrase_too_common')
}
