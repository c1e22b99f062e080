import { z } from 'zod'

/** An address as people type it; whether mail reaches it is another matter. */
export const email = z.string().trim().min(3).max(254).regex(/^[^\s@]+@[^\s@]+$/, 'This is not an e-mail address.')
/** Length and choice are judged by the house's rules, with words of their own; here only that it is text of a sane size. */
export const passphrase = z.string().min(1, 'Fill this in.').max(1024)
/** The token of a one-time link: it travels in the body, so that no log of addresses holds it. */
export const linkToken = z.string().regex(/^[\w-]{20,100}$/, 'The link is not complete.')

export const askResetBody = z.strictObject({ email })
export const resetBody = z.strictObject({ token: linkToken, passphrase })
export const invitationBody = z.strictObject({ token: linkToken })
export const acceptInvitationBody = z.strictObject({ token: linkToken, passphrase })
export const changePassphraseBody = z.strictObject({ present: passphrase, next: passphrase })
