import type { Stores } from '../db/writer'
import { deliverOutbox, UnsendableMail } from '../domain/notices/deliverOutbox'
import { forgetSessions } from '../domain/people/forgetSessions'
import { tokenOf } from '../domain/people/oneTimeToken'
import { composeMail, isTemplate, type Mail } from '../mail/composeMail'
import { startMailFake, type MailFake } from '../mail/fake'
import { isMailbox } from '../mail/mailbox'
import { mailSettings, openMailer } from '../mail/send'
import { handlers } from './handlers'
import { startRunner } from './runner'
import { startSchedule } from './schedule'

export interface MachinerySettings {
  stores: Stores
  dataDir: string
  publicUrl: string
  env: NodeJS.ProcessEnv
  /** Where no mail server is named, a local one catches the mail. */
  catchesMail: boolean
  now: () => number
  log: (level: 'warn' | 'error', facts: Record<string, string | number | null>) => void
}

export interface Machinery { fake: MailFake | null, wake: () => void, stop: () => Promise<void> }

/** Everything that works without being asked: background jobs, the outbox, and what comes round. */
export async function startMachinery({ stores, dataDir, publicUrl, env, catchesMail, now, log }: MachinerySettings): Promise<Machinery> {
  const told = (error: unknown) => (error instanceof Error ? `${error.name}: ${error.message}` : String(error))
  const runner = startRunner({ stores, handlers, now, onError: (error, job) => log('error', { event: 'job failed', job: job.id, kind: job.kind, message: told(error) }) })

  const named = mailSettings(env, publicUrl)
  const fake = named === null && catchesMail ? await startMailFake(dataDir, now) : null
  const settings = named ?? (fake && { url: `smtp://127.0.0.1:${fake.port}`, from: env.MAIL_FROM || 'labs@department.example' })
  const mailer = settings && openMailer(settings)
  if (!mailer) log('warn', { event: 'no mail server', message: 'Mail waits in the outbox until SMTP_URL names a mail server.' })

  const schedule = startSchedule([
    ...(mailer
      ? [{
          everyMs: 1000, onError: (error: unknown) => log('error', { event: 'outbox', message: told(error) }),
          work: () => deliverOutbox(stores, async ({ template, facts, to, messageId }) => {
            const mail = compose(template, facts, publicUrl)
            if (!isMailbox(to.address)) throw new UnsendableMail('address')
            await mailer.send({ ...mail, to, messageId }).catch((error: unknown) => {
              log('warn', { event: 'mail not sent', messageId, message: told(error).replaceAll(to.address, '(address)') })
              throw error
            })
          }, now),
        }]
      : []),
    { everyMs: 6 * 3_600_000, work: () => forgetSessions(stores, now()), onError: error => log('error', { event: 'tidy', message: told(error) }) },
  ])

  return {
    fake,
    wake: runner.wake,
    async stop() {
      await Promise.all([runner.stop(), schedule.stop()])
      mailer?.close()
      await fake?.close()
    },
  }
}

function compose(template: string, facts: unknown, publicUrl: string): Mail {
  if (!isTemplate(template)) throw new UnsendableMail(`no template ${template}`)
  try {
    return composeMail(template, facts, { publicUrl, tokenOf })
  }
  catch (error) {
    throw new UnsendableMail(error instanceof Error ? error.message : 'facts')
  }
}
