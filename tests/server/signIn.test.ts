import { randomBytes } from 'node:crypto'
import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { encode } from 'next-auth/jwt'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { openDatabase } from '../../server/db/open'
import { startBuiltServer, type BuiltServer } from '../fixtures/builtServer'
import { addPerson, goodPassphrase } from '../fixtures/people'
import { Visitor } from '../fixtures/visitor'

const secret = 'a secret that only these tests know'
let server: BuiltServer
let dataDir: string
beforeAll(async () => {
  dataDir = mkdtempSync(join(tmpdir(), 'tetherhouse-'))
  const stores = await openDatabase(dataDir)
  for (const name of ['ada', 'ben', 'cleo', 'dora', 'emil', 'finn']) await addPerson(stores, { email: `${name}@department.example` })
  await addPerson(stores, { email: 'gone@department.example', state: 'closed' })
  await stores.close()
  server = await startBuiltServer({ dataDir, env: { AUTH_SECRET: secret, TRUST_PROXY: '1' } })
})
afterAll(async () => {
  await server.close()
  rmSync(dataDir, { recursive: true, force: true })
})

/** Someone at an address of their own: the test stands where the proxy would. */
const from = (address: string) => new Visitor(server.url, { 'x-forwarded-for': address })
const whoIs = async (visitor: Visitor) => (await visitor.get<{ user?: { email: string } } | null>('/api/auth/session'))?.user?.email ?? null

describe('signing in', () => {
  it('gives a session whose cookie scripts cannot read and other sites do not send', async () => {
    const visitor = from('10.0.0.1')
    const answer = await visitor.trySignIn('ada@department.example', goodPassphrase)
    const cookies = answer.headers.getSetCookie()
    const session = cookies.find(line => line.startsWith('next-auth.session-token='))
    expect(session).toMatch(/; HttpOnly/i)
    expect(session).toMatch(/; SameSite=Lax/i)
    expect(session).not.toMatch(/; Secure/i) // plain http
    expect(cookies.every(line => /HttpOnly/i.test(line))).toBe(true)
    expect(await whoIs(visitor)).toBe('ada@department.example')
    expect(await visitor.get('/api/me')).toMatchObject({ email: 'ada@department.example' })
  })

  it('makes a new token at each sign-in, so that none can be planted beforehand', async () => {
    const visitor = from('10.0.0.1')
    await visitor.signIn('ada@department.example', goodPassphrase)
    const first = visitor.cookie('next-auth.session-token')
    await visitor.signIn('ada@department.example', goodPassphrase)
    expect(visitor.cookie('next-auth.session-token')).not.toBe(first)
  })

  it('answers a wrong passphrase, an unknown account and a closed one alike', async () => {
    const answers = await Promise.all([['ben@department.example', 'not the passphrase'], ['no.one@department.example', goodPassphrase], ['gone@department.example', goodPassphrase]].map(async ([email, passphrase]) => {
      const answer = await from('10.0.0.2').trySignIn(email!, passphrase!)
      return { status: answer.status, location: answer.headers.get('location'), body: await answer.text(), cookies: answer.headers.getSetCookie().map(line => line.split('=')[0]) }
    }))
    expect(answers[1]).toEqual(answers[0])
    expect(answers[2]).toEqual(answers[0])
    expect(answers[0]!.location).toContain('error=CredentialsSignin')
  })

  it('takes as long for an unknown account as for a known one', async () => {
    const timed = async (email: string) => {
      const visitor = from(`10.77.${Math.floor(Math.random() * 250)}.${Math.floor(Math.random() * 250)}`)
      const { csrfToken } = await visitor.get<{ csrfToken: string }>('/api/auth/csrf')
      const began = performance.now()
      await visitor.ask('/api/auth/callback/credentials', { method: 'POST', body: new URLSearchParams({ csrfToken, email, password: 'wrong all the same' }) })
      return performance.now() - began
    }
    const median = (list: number[]) => list.toSorted((a, b) => a - b)[Math.floor(list.length / 2)]!
    // Measured in turns, so that a busy machine slows both.
    const ratio = async () => {
      const known: number[] = []
      const unknown: number[] = []
      for (let n = 0; n < 25; n++) {
        known.push(await timed('dora@department.example'))
        unknown.push(await timed(`no.one.${n}@department.example`))
      }
      return median(known) / median(unknown)
    }
    // Three further rounds where a busy machine spoils one; leaving out the hash would show in each, at some hundred percent.
    const seen: number[] = []
    do seen.push(Math.abs(await ratio() - 1))
    while (Math.min(...seen) > 0.1 && seen.length < 4)
    expect(Math.min(...seen)).toBeLessThan(0.1)
  }, 120_000)

  it('refuses after ten wrong tries with 429 and Retry-After, there and not elsewhere, and says so to a page', async () => {
    for (let n = 0; n < 10; n++) expect((await from('10.0.0.3').trySignIn('ben@department.example', 'wrong')).status).toBe(302)
    const refused = await from('10.0.0.3').trySignIn('ben@department.example', goodPassphrase)
    expect(refused.status).toBe(429)
    expect(Number(refused.headers.get('retry-after'))).toBeGreaterThan(800)
    const problem = await refused.json() as { code: string, url: string }
    expect(problem.code).toBe('too_many_requests')
    expect(new URL(problem.url).searchParams.get('error')).toBe('too_many_requests')
    expect((await from('10.0.0.33').trySignIn('ben@department.example', goodPassphrase)).headers.get('location')).not.toContain('error')
  })

  it('remembers it over a restart', async () => {
    await server.restart()
    expect((await from('10.0.0.3').trySignIn('ben@department.example', goodPassphrase)).status).toBe(429)
  })

  it('believes the proxy in front and not what the client says it is', async () => {
    // The client's own entry stands left of the proxy's: changing it must not open a fresh count.
    for (let n = 0; n < 11; n++) {
      const answer = await from(`192.0.2.${n}, 10.0.0.4`).trySignIn('cleo@department.example', 'wrong')
      expect(answer.status).toBe(n < 10 ? 302 : 429)
    }
    const claimed = new Visitor(server.url, { 'x-forwarded-for': '10.0.0.4', 'x-tetherhouse-address': '10.9.9.9' })
    expect((await claimed.trySignIn('cleo@department.example', 'wrong')).status).toBe(429)
  })

  it('lets a class of sixty in behind one address', async () => {
    const answers = await Promise.all(Array.from({ length: 60 }, () => from('10.0.0.5').trySignIn('finn@department.example', goodPassphrase)))
    expect(answers.map(answer => answer.status).filter(status => status !== 302)).toEqual([])
    expect(answers.every(answer => answer.headers.getSetCookie().some(line => line.startsWith('next-auth.session-token=')))).toBe(true)
  })

  it('sends nobody to another site afterwards', async () => {
    for (const callbackUrl of ['https://elsewhere.example/', '//elsewhere.example/', '/\\elsewhere.example', 'javascript:alert(1)', 'http://127.0.0.1.elsewhere.example/']) {
      const answer = await from('10.0.0.6').trySignIn('ada@department.example', goodPassphrase, { callbackUrl })
      const location = answer.headers.get('location')
      if (location !== null) expect(new URL(location, server.url).origin, callbackUrl).toBe(server.url)
      expect(answer.status, callbackUrl).toBeLessThan(500)
    }
    const answer = await from('10.0.0.6').trySignIn('ada@department.example', goodPassphrase, { callbackUrl: '/c/1/work' })
    expect(answer.headers.get('location')).toBe(`${server.url}/c/1/work`)
  })

  it('needs the token of its own page, and refuses another site', async () => {
    const visitor = from('10.0.0.7')
    const form = { method: 'POST', headers: { 'content-type': 'application/x-www-form-urlencoded' }, body: new URLSearchParams({ csrfToken: 'made up', email: 'ada@department.example', password: goodPassphrase }) }
    await visitor.ask('/api/auth/callback/credentials', form)
    expect(await whoIs(visitor)).toBeNull()
    expect((await visitor.ask('/api/auth/callback/credentials', { ...form, headers: { ...form.headers, origin: 'https://elsewhere.example' } })).status).toBe(403)
    expect((await visitor.ask('/api/auth/signout', { ...form, headers: { ...form.headers, 'sec-fetch-site': 'cross-site' } })).status).toBe(403)
  })

  it('reads no body of unknown or great length', async () => {
    const large = await from('10.0.0.8').ask('/api/auth/callback/credentials', { method: 'POST', body: 'x'.repeat(20_000) })
    expect(large.status).toBe(413)
    const endless = await from('10.0.0.8').ask('/api/auth/callback/credentials', { method: 'POST', body: new Blob(['a=1']).stream(), duplex: 'half' } as RequestInit)
    expect(endless.status).toBe(413)
  })
})

describe('a cookie that is not ours', () => {
  it('is nobody: a state cookie as session, a token without a session, another secret, garbage, an unknown session', async () => {
    const sid = randomBytes(32).toString('base64url')
    const forged = [
      await encode({ token: { state: 'made by the server for itself' }, secret }),
      await encode({ token: { uid: 'someone' }, secret }),
      await encode({ token: { sid }, secret }),
      await encode({ token: { uid: 'someone', sid }, secret }),
      await encode({ token: { uid: 'someone', sid }, secret: 'another secret altogether' }),
      'garbage', '%E0%A4%A', '..', 'a.b.c.d.e', '',
    ]
    for (const value of forged) {
      const visitor = from('10.0.1.1')
      visitor.setCookie('next-auth.session-token', value)
      expect(await whoIs(visitor), value).toBeNull()
      expect((await visitor.ask('/api/me')).status, value).toBe(401)
    }
  })

  it('may be a malformed bearer: refused without a crash', async () => {
    for (const authorization of ['Bearer %E0%A4%A', 'Bearer ', 'Bearer', 'Bearer a.b.c', 'Bearer \u00ff', 'Basic YTpi']) {
      const answer = await from('10.0.1.2').ask('/api/me', { headers: { authorization } })
      expect(answer.status, authorization).toBe(401)
    }
    expect((await from('10.0.1.2').ask('/readyz')).status).toBe(200)
  })
})

describe('ending', () => {
  it('signs out for good: the same cookie opens nothing afterwards', async () => {
    const visitor = await from('10.0.2.1').signIn('emil@department.example', goodPassphrase)
    const stolen = visitor.cookie('next-auth.session-token')!
    const answer = await visitor.signOut()
    expect(answer.headers.get('clear-site-data')).toContain('cache')
    const thief = from('10.0.2.2')
    thief.setCookie('next-auth.session-token', stolen)
    expect(await whoIs(thief)).toBeNull()
    expect((await thief.ask('/api/me')).status).toBe(401)
  })

  it('signs out everywhere', async () => {
    const [here, there] = [await from('10.0.2.3').signIn('emil@department.example', goodPassphrase), await from('10.0.2.4').signIn('emil@department.example', goodPassphrase)]
    expect((await here.send('DELETE', '/api/me/sessions')).status).toBe(200)
    expect((await there.ask('/api/me')).status).toBe(401)
    expect((await here.ask('/api/me')).status).toBe(401)
  })

  it('ends other sessions when the passphrase changes, keeps this one, and wants the present passphrase', async () => {
    const [here, there] = [await from('10.0.2.5').signIn('dora@department.example', goodPassphrase), await from('10.0.2.6').signIn('dora@department.example', goodPassphrase)]
    const next = 'seven herons near the slipway'
    expect((await here.send('PUT', '/api/me/passphrase', { present: 'not it', next })).status).toBe(422)
    expect(await (await here.send('PUT', '/api/me/passphrase', { present: goodPassphrase, next: 'too short' })).json()).toMatchObject({ code: 'passphrase_too_short' })
    expect(await (await here.send('PUT', '/api/me/passphrase', { present: goodPassphrase, next: 'PasswordPassword123!' })).json()).toMatchObject({ code: 'passphrase_too_common' })
    expect((await here.send('PUT', '/api/me/passphrase', { present: goodPassphrase, next })).status).toBe(200)
    expect((await here.ask('/api/me')).status).toBe(200)
    expect((await there.ask('/api/me')).status).toBe(401)
    await from('10.0.2.7').signIn('dora@department.example', next)
    await expect(from('10.0.2.7').signIn('dora@department.example', goodPassphrase)).rejects.toThrow()
  })
})

it('prints no passphrase, no token and no cookie', async () => {
  const log = server.log()
  expect(log).toContain('"event":"request"')
  expect(log).toContain('"event":"signed in"')
  for (const secretThing of [goodPassphrase, 'kestrel', 'seven herons', 'next-auth.session-token', 'eyJ']) expect(log).not.toContain(secretThing)
})
