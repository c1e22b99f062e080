import { createTransport } from 'nodemailer'
import type { Mail } from './composeMail'
import { headerName, isMailbox } from './mailbox'

export interface Outgoing extends Mail { to: { name: string, address: string }, messageId: string }

/** Hands a mail to a mail server; settles when that server has taken it. */
export interface Mailer {
  send: (mail: Outgoing) => Promise<void>
  close: () => void
}

export interface MailSettings { url: string, from: string }

/** Where mail goes, from SMTP_URL, or SMTP_HOST with its companions; null where none is named. */
export function mailSettings(env: NodeJS.ProcessEnv, publicUrl: string): MailSettings | null {
  const from = env.MAIL_FROM || `no-reply@${new URL(publicUrl).hostname}`
  if (env.SMTP_URL) return { url: env.SMTP_URL, from }
  if (!env.SMTP_HOST) return null
  const url = new URL(`${env.SMTP_PORT === '465' ? 'smtps' : 'smtp'}://${env.SMTP_HOST}`)
  if (env.SMTP_PORT) url.port = env.SMTP_PORT
  if (env.SMTP_USER) url.username = encodeURIComponent(env.SMTP_USER)
  if (env.SMTP_PASSWORD) url.password = encodeURIComponent(env.SMTP_PASSWORD)
  return { url: url.href, from }
}

/** Opens a connection when there is something to send. Outside this machine it must be encrypted and the server's certificate good. */
export function openMailer({ url, from }: MailSettings): Mailer {
  const { hostname } = new URL(url)
  const isHere = hostname === 'localhost' || hostname === '127.0.0.1' || hostname === '[::1]'
  const transport = createTransport({
    url, requireTLS: !isHere, ignoreTLS: isHere, connectionTimeout: 10_000, greetingTimeout: 10_000, socketTimeout: 30_000, disableFileAccess: true, disableUrlAccess: true,
  })
  return {
    async send({ to, subject, text, html, messageId }) {
      if (!isMailbox(to.address)) throw new Error('The address cannot be written to.')
      await transport.sendMail({
        from, to: { name: headerName(to.name), address: to.address }, subject, text, html, messageId,
        headers: { 'Auto-Submitted': 'auto-generated' },
      })
    },
    close: () => transport.close(),
  }
}
