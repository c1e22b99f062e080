import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { appendEntry } from '../../../server/domain/ledger/appendEntry'
import { deliverOutbox, UnsendableMail, type OutboxMail } from '../../../server/domain/notices/deliverOutbox'
import { queueNotice } from '../../../server/domain/notices/queueNotice'
import { sendMailAgain } from '../../../server/domain/notices/sendMailAgain'
import { composeMail, isTemplate } from '../../../server/mail/composeMail'
import { openMailer } from '../../../server/mail/send'
import { startMailServer, type MailServer } from '../../fixtures/mailServer'
import { addPerson } from '../../fixtures/people'
import { temporaryStores, type TemporaryStores } from '../../fixtures/temporaryStores'

let stores: TemporaryStores
let mails: MailServer
const start = Date.parse('2026-10-05T14:00:00Z')
const digest = 'ab'.repeat(32)
const facts = { course: 'ATM 210', lab: 'Morning inversion', receiptNo: 'ATM210-00001', at: start, zone: 'America/Denver', digest, chain: 'course:1', seq: 1, path: '/c/1/work' }

beforeEach(async () => {
  stores = await temporaryStores()
  mails = await startMailServer()
})
afterEach(async () => {
  await mails.close()
  await stores.remove()
})

const sender = () => {
  const mailer = openMailer({ url: `smtp://127.0.0.1:${mails.port}`, from: 'labs@department.example' })
  return (mail: OutboxMail) => {
    if (!isTemplate(mail.template)) throw new UnsendableMail('template')
    return mailer.send({ ...composeMail(mail.template, mail.facts, { publicUrl: 'https://labs.example', tokenOf: () => 'token' }), to: mail.to, messageId: mail.messageId })
  }
}
const queue = async (person: { email: string, name?: string }, key = 'receipt:1') => {
  const toPersonId = await addPerson(stores, person, start)
  await stores.write(trx => queueNotice(trx, { eventKey: key, template: 'receipt', facts, toPersonId, now: start }))
  return toPersonId
}

describe('the outbox', () => {
  it('sends a receipt once, in words and figures that can be kept, and notes where the ledger is anchored', async () => {
    const entry = await stores.write(trx => appendEntry(trx, { chain: 'course:1', at: start, actor: 'someone', action: 'submission.stored', facts: {} }))
    const personId = await queue({ email: 'ada@department.example', name: 'Ada Lindqvist' })
    expect(await deliverOutbox(stores, sender(), () => start)).toEqual({ sent: 1, failed: 0, dead: 0 })
    expect(await deliverOutbox(stores, sender(), () => start)).toEqual({ sent: 0, failed: 0, dead: 0 })
    const [mail] = mails.mails
    expect(mail!.subject).toBe('Receipt ATM210-00001: Morning inversion')
    expect(mail!.text).toContain('08:00:00 MDT')
    expect(mail!.text).toContain('2026-10-05T14:00:00.000Z')
    expect(mail!.text).toContain(digest)
    expect(mail!.text).toContain('course:1 no. 1')
    expect(mail!.text).toContain('https://labs.example/c/1/work')
    expect(await stores.read.selectFrom('ledger_anchor').selectAll().execute()).toEqual([{ chain_id: 'course:1', seq: 1, sent_to: personId, digest: entry.digest, sent_at: start }])
  })

  it('sends a mail that was given up once more when an admin asks, under the same Message-ID; one that went out stays', async () => {
    await queue({ email: 'ada@department.example' })
    const failing = () => Promise.reject(new UnsendableMail('refused'))
    expect(await deliverOutbox(stores, failing, () => start)).toEqual({ sent: 0, failed: 0, dead: 1 })
    const mail = await stores.read.selectFrom('outbox').select(['id', 'message_id']).executeTakeFirstOrThrow()
    const asked = { actorId: 'admin', once: null, mailId: mail.id }
    expect(await sendMailAgain(stores, asked, start)).toEqual({ state: 'waiting' })
    expect(await deliverOutbox(stores, sender(), () => start)).toEqual({ sent: 1, failed: 0, dead: 0 })
    expect(mails.mails.map(one => one.messageId)).toEqual([expect.stringContaining(mail.message_id)])
    await expect(sendMailAgain(stores, asked, start)).rejects.toMatchObject({ code: 'invalid' })
    await expect(sendMailAgain(stores, { ...asked, mailId: 'none' }, start)).rejects.toMatchObject({ code: 'not_found' })
    expect(await stores.read.selectFrom('ledger_entry').select('actor').where('action', '=', 'mail.sent_again').execute()).toEqual([{ actor: 'admin' }])
  })

  it('is queued once per event, however often the event is told', async () => {
    const toPersonId = await queue({ email: 'ada@department.example' })
    await stores.write(trx => queueNotice(trx, { eventKey: 'receipt:1', template: 'receipt', facts, toPersonId, now: start }))
    expect(await stores.read.selectFrom('outbox').select('id').execute()).toHaveLength(1)
  })

  it('sends again under the same Message-ID when it could not note that it had sent', async () => {
    await queue({ email: 'ada@department.example' })
    let isBroken = true
    const failing = { read: stores.read, write: (<T>(work: Parameters<typeof stores.write<T>>[0]) => {
      if (isBroken) return Promise.reject(new Error('the disk is gone'))
      return stores.write(work)
    }) as typeof stores.write }
    await expect(deliverOutbox(failing, sender(), () => start)).rejects.toThrow('the disk is gone')
    isBroken = false
    expect(await deliverOutbox(failing, sender(), () => start)).toMatchObject({ sent: 1 })
    expect(mails.mails.map(mail => mail.messageId)).toEqual([mails.mails[0]!.messageId, mails.mails[0]!.messageId])
  })

  it('waits longer after each failure, and gives up in the end', async () => {
    await queue({ email: 'ada@department.example' })
    const down = () => Promise.reject(new Error('451 try later'))
    let at = start
    const waits: number[] = []
    for (let n = 0; n < 12; n++) {
      await deliverOutbox(stores, down, () => at)
      const row = await stores.read.selectFrom('outbox').select(['state', 'next_at', 'attempts']).executeTakeFirstOrThrow()
      expect(row).toMatchObject({ attempts: n + 1, state: n < 11 ? 'waiting' : 'dead' })
      expect(await deliverOutbox(stores, down, () => at)).toEqual({ sent: 0, failed: 0, dead: 0 }) // not before its time
      waits.push((row.next_at - at) / 60_000)
      at = row.next_at
    }
    expect(waits.slice(0, 8)).toEqual([1, 2, 5, 15, 30, 60, 120, 240])
  })

  it('goes on with the others when one cannot be sent', async () => {
    await queue({ email: 'bad address@department.example' }, 'receipt:1')
    await queue({ email: 'ada@department.example' }, 'receipt:2')
    expect(await deliverOutbox(stores, sender(), () => start)).toEqual({ sent: 1, failed: 1, dead: 0 })
  })

  it('writes to nobody who was erased or closed', async () => {
    await queue({ email: 'ada@department.example' })
    await stores.write(trx => trx.updateTable('person').set({ state: 'closed' }).execute())
    expect(await deliverOutbox(stores, sender(), () => start)).toEqual({ sent: 0, failed: 0, dead: 1 })
    expect(mails.mails).toEqual([])
  })

  it('keeps a header to one line, whatever a name holds (ASVS 1.3.11)', async () => {
    await queue({ email: 'ada@department.example', name: 'Åsa\r\nBcc: everyone@elsewhere.example\r\n\r\nHello' })
    await deliverOutbox(stores, sender(), () => start)
    const [mail] = mails.mails
    expect(mail!.bcc).toBeUndefined()
    expect([mail!.to].flat()[0]!.value[0]!.name).toContain('Åsa')
    expect(mail!.headerLines.filter(line => line.key === 'bcc')).toEqual([])
  })

  it('refuses addresses that would be read as something else', async () => {
    for (const email of ['ada@department.example\r\nRCPT TO:<x@y.example>', 'ada＠department.example', 'ada@dépt.example', '<ada@department.example>', 'ada@department.example,ben@department.example', 'ada', '@department.example']) {
      await expect(sender()({ template: 'receipt', facts, to: { name: 'Ada', address: email }, messageId: '<x@tetherhouse>' }), email).rejects.toThrow()
    }
    expect(mails.mails).toEqual([])
  })
})
