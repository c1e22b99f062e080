import { createHash } from 'node:crypto'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import { openCounters, type Counters } from '../../../server/db/counters'
import { endAllSessions } from '../../../server/domain/people/endSessions'
import { loadActor } from '../../../server/domain/people/loadActor'
import { resumeSession } from '../../../server/domain/people/resumeSession'
import { signIn } from '../../../server/domain/people/signIn'
import { signInLimits, type SignInLimits } from '../../../server/domain/people/signInLimits'
import { addPerson, goodPassphrase } from '../../fixtures/people'
import { temporaryStores, type TemporaryStores } from '../../fixtures/temporaryStores'

let stores: TemporaryStores
let counters: Counters
let limits: SignInLimits
const start = Date.parse('2026-10-05T14:00:00Z')
const hour = 3_600_000

beforeEach(async () => {
  vi.useFakeTimers({ toFake: ['Date'], now: start })
  stores = await temporaryStores()
  counters = openCounters(stores.dataDir)
  limits = signInLimits(counters)
})
afterEach(async () => {
  counters.close()
  await stores.remove()
  vi.useRealTimers()
})

const attempt = (email: string, passphrase: string, address = '10.0.0.1', browser: string | null = null) =>
  signIn(stores, limits, { email, passphrase, address, browser }, Date.now()).then(signedIn => (signedIn ? 'in' : 'wrong'), (error: { code: string }) => error.code)

/** A wrong try without the work of hashing. */
const guess = (account: string, address: string) =>
  limits.attempt({ account, address, isKnownBrowser: false, browser: null }, async () => null).then(() => 'wrong', (error: { code: string }) => error.code)

describe('the limits of signing in', () => {
  it('refuses the eleventh wrong try on one account from one address, the right passphrase too, until the quarter hour is over', async () => {
    await addPerson(stores, { email: 'ada@department.example' })
    for (let n = 0; n < 10; n++) expect(await attempt('ada@department.example', 'wrong')).toBe('wrong')
    expect(await attempt('ada@department.example', goodPassphrase)).toBe('too_many_requests')
    vi.setSystemTime(start + 15 * 60_000 + 1000)
    expect(await attempt('ada@department.example', goodPassphrase)).toBe('in')
  })

  it('treats an account that does not exist alike', async () => {
    for (let n = 0; n < 10; n++) expect(await attempt('nobody@department.example', 'wrong')).toBe('wrong')
    expect(await attempt('nobody@department.example', 'wrong')).toBe('too_many_requests')
  })

  it('does not let forty tries at once slip past the ten', async () => {
    await addPerson(stores, { email: 'ada@department.example' })
    const answers = await Promise.all(Array.from({ length: 40 }, () => attempt('ada@department.example', 'wrong')))
    expect(answers.filter(answer => answer === 'wrong')).toHaveLength(10)
  })

  it('never refuses a class of sixty who sign in behind one address within a minute, each with two slips first', async () => {
    const people = Array.from({ length: 60 }, (_, n) => `student${n}@department.example`)
    for (const email of people) await addPerson(stores, { email })
    const answers = await Promise.all(people.map(async (email) => {
      await attempt(email, 'slip one')
      await attempt(email, 'slip two')
      return attempt(email, goodPassphrase)
    }))
    expect(answers.filter(answer => answer !== 'in')).toEqual([])
  }, 60_000)

  it('lets sixty right tries at once in on one account, and after them still refuses the eleventh wrong one', async () => {
    await addPerson(stores, { email: 'ada@department.example' })
    const answers = await Promise.all(Array.from({ length: 60 }, () => attempt('ada@department.example', goodPassphrase)))
    expect(answers.filter(answer => answer !== 'in')).toEqual([])
    for (let n = 0; n < 10; n++) expect(await attempt('ada@department.example', 'wrong')).toBe('wrong')
    expect(await attempt('ada@department.example', 'wrong')).toBe('too_many_requests')
  }, 60_000)

  it('ends spraying over many accounts from one address', async () => {
    let refusedAt = 0
    for (let n = 0; n < 320 && refusedAt === 0; n++) if (await guess(`guess${n}@department.example`, '10.9.9.9') === 'too_many_requests') refusedAt = n
    expect(refusedAt).toBe(300)
  })

  it('leaves the owner’s own browser free while strangers guess, from the same address and from a hundred others', async () => {
    await addPerson(stores, { email: 'ada@department.example' })
    for (let n = 0; n < 12; n++) await attempt('ada@department.example', 'guess')
    for (let n = 0; n < 110; n++) await guess('ada@department.example', `10.1.${n}.1`)
    expect(await attempt('ada@department.example', goodPassphrase, '10.0.0.1')).toBe('too_many_requests')
    expect(await attempt('ada@department.example', goodPassphrase, '10.0.0.77')).toBe('too_many_requests') // a new browser: guessing from everywhere is over for today
    expect(await attempt('ada@department.example', goodPassphrase, '10.0.0.1', 'her own browser')).toBe('in')
    await limits.clearAccount({ account: 'ada@department.example', address: '10.0.0.1', browser: null }) // what a reset by mail does
    expect(await attempt('ada@department.example', goodPassphrase, '10.0.0.77')).toBe('in')
    expect(await attempt('ada@department.example', goodPassphrase, '10.0.0.1')).toBe('in')
  })

  it('remembers the count over a restart and holds no address in clear', async () => {
    for (let n = 0; n < 10; n++) await attempt('nobody@department.example', 'wrong', '203.0.113.9')
    counters.close()
    counters = openCounters(stores.dataDir)
    limits = signInLimits(counters)
    expect(await attempt('nobody@department.example', 'wrong', '203.0.113.9')).toBe('too_many_requests')
    const { readFileSync, readdirSync } = await import('node:fs')
    const bytes = readdirSync(stores.dataDir).filter(name => name.startsWith('limits.db')).map(name => readFileSync(`${stores.dataDir}/${name}`, 'latin1')).join('')
    expect(bytes).toContain('place:')
    expect(bytes).not.toContain('203.0.113.9')
    expect(bytes).not.toContain('nobody@')
  })
})

describe('a session', () => {
  const open = async () => {
    await addPerson(stores, { email: 'ada@department.example' }, start)
    const signedIn = await signIn(stores, limits, { email: ' ADA@Department.example ', passphrase: goodPassphrase, address: '10.0.0.1', browser: null }, start)
    return createHash('sha256').update(signedIn!.token).digest()
  }

  it('ends eight hours after it was last seen, being seen noted every five minutes', async () => {
    const token = await open()
    expect(await resumeSession(stores, token, start + 4 * 60_000)).not.toBeNull()
    expect((await stores.read.selectFrom('session').select('seen_at').executeTakeFirstOrThrow()).seen_at).toBe(start)
    expect(await resumeSession(stores, token, start + hour)).not.toBeNull()
    await stores.write(async () => {}) // the note was written before this one
    expect(await loadActor(stores.read, token, start + 8 * hour + 1)).not.toBeNull()
    expect(await loadActor(stores.read, token, start + 9 * hour)).toBeNull()
  })

  it('ends twelve hours after sign-in, however busy', async () => {
    const token = await open()
    for (let h = 1; h < 12; h++) {
      expect(await resumeSession(stores, token, start + h * hour)).not.toBeNull()
      await stores.write(async () => {})
    }
    expect(await resumeSession(stores, token, start + 12 * hour)).toBeNull()
  })

  it('is held in memory where the disk is full, so that signing in and reading go on, and ends like any other', async () => {
    await addPerson(stores, { email: 'ada@department.example' }, start)
    const full = { read: stores.read, write: () => Promise.reject(Object.assign(new Error('database or disk is full'), { code: 'SQLITE_FULL' })) }
    const signedIn = await signIn(full, limits, { email: 'ada@department.example', passphrase: goodPassphrase, address: '10.0.0.1', browser: null }, start)
    const token = createHash('sha256').update(signedIn!.token).digest()
    expect((await resumeSession(full, token, start + hour))?.email).toBe('ada@department.example')
    expect(await loadActor(stores.read, token, start + 8 * hour)).not.toBeNull()
    expect(await loadActor(stores.read, token, start + 9 * hour)).toBeNull()
    await endAllSessions(stores, signedIn!.personId, 'signed out everywhere', start)
    expect(await loadActor(stores.read, token, start + hour)).toBeNull()
    await expect(signIn({ read: stores.read, write: () => Promise.reject(new Error('something else')) }, limits, { email: 'ada@department.example', passphrase: goodPassphrase, address: '10.0.0.1', browser: null }, start)).rejects.toThrow('something else')
  })

  it('ends with the account’s closing, and with signing out everywhere', async () => {
    const token = await open()
    const { personId } = (await loadActor(stores.read, token, start))!
    await stores.write(trx => trx.updateTable('person').set({ state: 'closed' }).execute())
    expect(await loadActor(stores.read, token, start)).toBeNull()
    expect(await attempt('ada@department.example', goodPassphrase)).toBe('wrong')
    await stores.write(trx => trx.updateTable('person').set({ state: 'active' }).execute())
    expect(await loadActor(stores.read, token, start)).not.toBeNull()
    await endAllSessions(stores, personId, 'signed out everywhere', start)
    expect(await loadActor(stores.read, token, start)).toBeNull()
  })
})
