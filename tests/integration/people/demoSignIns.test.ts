import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { acceptInvitation } from '../../../server/domain/people/acceptInvitation'
import { demoPassphrase } from '../../../server/domain/people/demoPassphrase'
import { describeDemo, recordDemo } from '../../../server/domain/people/describeDemo'
import { foundDepartment } from '../../../server/domain/people/foundDepartment'
import { tokenOf } from '../../../server/domain/people/oneTimeToken'
import { temporaryStores, type TemporaryStores } from '../../fixtures/temporaryStores'

const secret = 'f'.repeat(64)
const admin = { name: 'Ada Invented', email: 'ada@nowhere.example' }
const now = Date.UTC(2026, 8, 1, 12)

describe('the demo’s sign-ins', () => {
  let stores: TemporaryStores
  beforeAll(async () => {
    process.env.AUTH_SECRET ??= 'only for this test, which sends nothing'
    stores = await temporaryStores()
  })
  afterAll(() => stores.remove())

  it('are no such thing in a department that is not a demo, even where the demo is on', async () => {
    await foundDepartment(stores, admin, now)
    await expect(describeDemo(stores.read, true)).rejects.toMatchObject({ code: 'not_found' })
  })

  it('show names, roles and passphrases that were really set, and nothing once the demo is off', async () => {
    const mail = await stores.read.selectFrom('outbox').select('facts_json').where('template', '=', 'invitation').executeTakeFirstOrThrow()
    const { tokenId } = JSON.parse(mail.facts_json) as { tokenId: string }
    await acceptInvitation(stores, { token: tokenOf('invite', tokenId), passphrase: demoPassphrase(secret, admin.email) }, now)
    await recordDemo(stores, { secret, madeAt: now, shown: [admin.email, 'nobody@nowhere.example'] })
    expect(await describeDemo(stores.read, true)).toEqual({ people: [{ ...admin, password: demoPassphrase(secret, admin.email), roles: ['admin'] }] })
    await expect(describeDemo(stores.read, false)).rejects.toMatchObject({ code: 'not_found' })
  })

  it('have passphrases of at least fifteen characters that differ by person and by installation', () => {
    const all = Array.from({ length: 500 }, (_, at) => demoPassphrase(secret, `person${at}@nowhere.example`))
    expect(all.every(passphrase => passphrase.length >= 15)).toBe(true)
    expect(new Set(all).size).toBe(500)
    expect(demoPassphrase('0'.repeat(64), admin.email)).not.toBe(demoPassphrase(secret, admin.email))
  })

  it('let one admin in by the house, once', async () => {
    await expect(foundDepartment(stores, { name: 'Second', email: 'second@nowhere.example' }, now)).rejects.toMatchObject({ code: 'already_exists' })
  })
})
