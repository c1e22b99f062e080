import { mkdtempSync, readdirSync, readFileSync, rmSync } from 'node:fs'
import { createServer, type Server } from 'node:net'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { openDatabase } from '../../server/db/open'
import { queueInvitation } from '../../server/domain/people/queueInvitation'
import { startBuiltServer, type BuiltServer } from '../fixtures/builtServer'
import { startMailServer, type MailServer } from '../fixtures/mailServer'
import { addPerson, goodPassphrase } from '../fixtures/people'
import { Visitor } from '../fixtures/visitor'

const secret = 'a secret that only these tests know'
process.env.AUTH_SECRET = secret
let server: BuiltServer
let mails: MailServer
let dataDir: string
beforeAll(async () => {
  dataDir = mkdtempSync(join(tmpdir(), 'tetherhouse-'))
  mails = await startMailServer()
  const stores = await openDatabase(dataDir)
  for (const name of ['ada', 'ben', 'cleo', 'dora']) await addPerson(stores, { email: `${name}@department.example`, name })
  const invited = await addPerson(stores, { email: 'new@department.example', name: 'Nora New', state: 'invited' })
  await stores.write(trx => queueInvitation(trx, { personId: invited, now: Date.now() }))
  await stores.close()
  server = await startBuiltServer({ dataDir, env: { AUTH_SECRET: secret, SMTP_URL: `smtp://127.0.0.1:${mails.port}`, MAIL_FROM: 'labs@department.example' } })
})
afterAll(async () => {
  await server.close()
  await mails.close()
  rmSync(dataDir, { recursive: true, force: true })
})

const visitor = () => new Visitor(server.url)
const tokenIn = (text: string | undefined, page: 'reset' | 'invite') => new RegExp(`${server.url}/${page}/([\\w-]+)`).exec(text ?? '')?.[1] ?? ''
const next = 'eleven lanterns by the weir'

describe('an invitation', () => {
  it('names whom it is for, takes a passphrase once, and opens the account', async () => {
    const mail = await mails.waitFor(one => one.subject?.includes('invited') ?? false)
    const token = tokenIn(mail.text, 'invite')
    expect(await (await visitor().send('POST', '/api/invitations/look', { token })).json()).toEqual({ name: 'Nora New', email: 'new@department.example' })
    expect(await (await visitor().send('POST', '/api/invitations/accept', { token, passphrase: 'Nora New nora new' })).json()).toMatchObject({ code: 'passphrase_too_common' })
    expect((await visitor().send('POST', '/api/invitations/accept', { token, passphrase: goodPassphrase })).status).toBe(200)
    await visitor().signIn('new@department.example', goodPassphrase)
    expect(await (await visitor().send('POST', '/api/invitations/accept', { token, passphrase: next })).json()).toMatchObject({ code: 'token_invalid' })
    expect(await (await visitor().send('POST', '/api/invitations/look', { token })).json()).toMatchObject({ code: 'token_invalid' })
  })
})

describe('a forgotten passphrase', () => {
  const ask = (email: string) => visitor().send('POST', '/api/passphrase/reset-requests', { email })

  it('is answered alike whether there is an account or not', async () => {
    const [known, unknown] = [await ask('cleo@department.example'), await ask('no.one@department.example')]
    expect(known.status).toBe(202)
    expect(unknown.status).toBe(202)
    expect(await known.text()).toBe(await unknown.text())
    await mails.waitFor(mail => [mail.to].flat()[0]?.text.includes('cleo@') ?? false)
  })

  it('takes a mailed link once, ends every session, and says so by mail', async () => {
    const before = await visitor().signIn('ada@department.example', goodPassphrase)
    await ask(' Ada@Department.example ')
    const mail = await mails.waitFor(one => one.subject === 'A new passphrase' && ([one.to].flat()[0]?.text.includes('ada@') ?? false))
    const token = tokenIn(mail.text, 'reset')
    expect(token).toMatch(/^[\w-]{43}$/)
    // It stands in the mail alone.
    const stored = readdirSync(dataDir).filter(name => name.includes('.db')).map(name => readFileSync(join(dataDir, name), 'latin1')).join('')
    expect(stored).toContain('passphrase_reset')
    expect(stored).not.toContain(token)
    expect(server.log()).not.toContain(token)
    expect((await before.ask('/api/me')).status).toBe(200)
    expect(await (await visitor().send('POST', '/api/passphrase/resets', { token, passphrase: 'short' })).json()).toMatchObject({ code: 'passphrase_too_short' })
    expect((await visitor().send('POST', '/api/passphrase/resets', { token, passphrase: next })).status).toBe(200)
    expect((await before.ask('/api/me')).status).toBe(401)
    await visitor().signIn('ada@department.example', next)
    expect(await (await visitor().send('POST', '/api/passphrase/resets', { token, passphrase: 'another one altogether 7' })).json()).toMatchObject({ code: 'token_invalid' })
    await visitor().signIn('ada@department.example', next)
    await mails.waitFor(one => one.subject === 'Your passphrase was changed' && ([one.to].flat()[0]?.text.includes('ada@') ?? false))
  })

  it('lets one of twenty use the same link at once', async () => {
    await ask('dora@department.example')
    const mail = await mails.waitFor(one => one.subject === 'A new passphrase' && ([one.to].flat()[0]?.text.includes('dora@') ?? false))
    const token = tokenIn(mail.text, 'reset')
    const answers = await Promise.all(Array.from({ length: 20 }, (_, n) => visitor().send('POST', '/api/passphrase/resets', { token, passphrase: `lantern number ${n} at the weir` })))
    expect(answers.filter(answer => answer.status === 200)).toHaveLength(1)
    await mails.waitFor(one => one.subject === 'Your passphrase was changed' && ([one.to].flat()[0]?.text.includes('dora@') ?? false))
  })

  it('refuses a made-up token, and one of another kind', async () => {
    for (const token of ['A'.repeat(43), '0', '../../etc/passwd', 'x'.repeat(5000)]) expect((await visitor().send('POST', '/api/passphrase/resets', { token, passphrase: next })).status).toBe(422)
  })
})

describe('a mail server that misbehaves', () => {
  it('gets the mail again under the same Message-ID when the server died between its 250 and our note', async () => {
    mails.mails.length = 0
    const pid = server.pid
    let died: Promise<void> | undefined
    mails.onMail = (mail) => {
      if (mail.subject !== 'A new passphrase') return
      mails.onMail = null
      process.kill(pid, 'SIGSTOP') // it will not see the 250 that follows
      died = new Promise(resolve => setTimeout(() => {
        process.kill(pid, 'SIGKILL')
        resolve()
      }, 300))
    }
    await visitor().send('POST', '/api/passphrase/reset-requests', { email: 'ben@department.example' })
    const first = await mails.waitFor(mail => mail.subject === 'A new passphrase')
    await died
    await server.restart('SIGKILL')
    const resets = () => mails.mails.filter(mail => mail.subject === 'A new passphrase')
    for (let n = 0; n < 200 && resets().length < 2; n++) await new Promise(resolve => setTimeout(resolve, 50))
    expect(resets()).toHaveLength(2)
    expect(resets()[1]!.messageId).toBe(first.messageId)
    expect(tokenIn(resets()[1]!.text, 'reset')).toBe(tokenIn(first.text, 'reset'))
    expect((await visitor().send('POST', '/api/passphrase/resets', { token: tokenIn(first.text, 'reset'), passphrase: next })).status).toBe(200)
  })

  it('slows no request down: silent, or not there at all', async () => {
    const connections: unknown[] = []
    const silent: Server = createServer(socket => connections.push(socket))
    await new Promise<void>(resolve => silent.listen(0, '127.0.0.1', () => resolve()))
    const address = silent.address()
    if (address === null || typeof address === 'string') throw new Error('No port.')
    for (const port of [address.port, 9]) {
      const other = await startBuiltServer({ dataDir: undefined, env: { AUTH_SECRET: secret, SMTP_URL: `smtp://127.0.0.1:${port}` } })
      const guest = new Visitor(other.url)
      await guest.ask('/readyz')
      const times: number[] = []
      for (let n = 0; n < 20; n++) {
        const began = performance.now()
        expect((await guest.send('POST', '/api/passphrase/reset-requests', { email: `someone${n}@department.example` })).status).toBe(202)
        times.push(performance.now() - began)
      }
      expect(times.toSorted((a, b) => a - b)[10]).toBeLessThan(250)
      expect(await other.stop()).toBe(0) // nor does it hold up the end
      await other.close()
    }
    silent.close()
    for (const socket of connections) (socket as { destroy: () => void }).destroy()
  })
})

describe('the page of caught mail', () => {
  it('is there in the demo, and shows what was sent', async () => {
    const demo = await startBuiltServer({ env: { AUTH_SECRET: secret, DEMO: '1' } })
    const guest = new Visitor(demo.url)
    expect(await guest.get('/api/dev/mail')).toEqual({ mails: [] })
    expect((await guest.ask('/dev/mail')).status).toBe(200)
    await demo.close()
  })

  it('is not there otherwise', async () => {
    const missing = await visitor().ask('/api/dev/mail')
    expect(missing.status).toBe(404)
    expect(await missing.json()).toMatchObject({ code: 'not_found' })
    expect((await visitor().ask('/dev/mail')).status).toBe(404)
  })
})
