import { appendFileSync, existsSync, readFileSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { simpleParser } from 'mailparser'
import { SMTPServer } from 'smtp-server'
import { z } from 'zod'

export const caughtMail = z.object({ id: z.string(), at: z.number(), from: z.string(), to: z.string(), subject: z.string(), text: z.string(), messageId: z.string() })
export type CaughtMail = z.output<typeof caughtMail>

export interface MailFake {
  port: number
  /** Newest first. */
  caught: () => readonly CaughtMail[]
  close: () => Promise<void>
}

const most = 200

/** A mail server on this machine that catches what is sent, for development and the demo. It keeps the last 200. */
export async function startMailFake(dataDir: string, now: () => number): Promise<MailFake> {
  const file = join(dataDir, 'caught-mail.jsonl')
  const caught = readCaught(file)
  const server = new SMTPServer({
    authOptional: true, disabledCommands: ['STARTTLS', 'AUTH'], size: 1_000_000,
    onData(stream, _session, done) {
      simpleParser(stream).then((mail) => {
        const one: CaughtMail = {
          id: String(mail.messageId ?? ''), at: now(), from: mail.from?.text ?? '', to: [mail.to ?? []].flat().map(to => to.text).join(', '),
          subject: mail.subject ?? '', text: mail.text ?? '', messageId: mail.messageId ?? '',
        }
        caught.push(one)
        if (caught.length > most) caught.shift()
        appendFileSync(file, `${JSON.stringify(one)}\n`)
        done()
      }).catch(done)
    },
  })
  await new Promise<void>((resolve, reject) => {
    server.once('error', reject)
    server.listen(0, '127.0.0.1', resolve)
  })
  const address = server.server.address()
  if (address === null || typeof address === 'string') throw new Error('The mail fake has no port.')
  server.on('error', () => {}) // a client that hangs up is not ours to mourn
  return { port: address.port, caught: () => caught.toReversed(), close: () => new Promise(resolve => server.close(() => resolve())) }
}

function readCaught(file: string): CaughtMail[] {
  if (!existsSync(file)) return []
  const lines = readFileSync(file, 'utf8').split('\n').filter(line => line !== '').slice(-most)
  writeFileSync(file, lines.map(line => `${line}\n`).join(''))
  return lines.flatMap(line => caughtMail.safeParse(safeJson(line)).data ?? [])
}

function safeJson(line: string): unknown {
  try {
    return JSON.parse(line)
  }
  catch {
    return null // the last line of a server that was killed
  }
}
