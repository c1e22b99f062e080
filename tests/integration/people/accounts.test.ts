import { createHash, randomBytes } from 'node:crypto'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { closeAccount, reopenAccount } from '../../../server/domain/people/closeAccount'
import { endDepartmentRole, setDepartmentRole } from '../../../server/domain/people/departmentRoles'
import { inviteAgain, invitePerson } from '../../../server/domain/people/invitePerson'
import { listPeople } from '../../../server/domain/people/listPeople'
import { loadActor } from '../../../server/domain/people/loadActor'
import { tokenOf } from '../../../server/domain/people/oneTimeToken'
import { openTemporary } from '../../fixtures/openTemporary'
import { inTerm, smallDepartment } from '../../fixtures/smallDepartment'

let db: Awaited<ReturnType<typeof openTemporary>>
let house: Awaited<ReturnType<typeof smallDepartment>>

beforeEach(async () => {
  db = await openTemporary()
  house = await smallDepartment(db)
})
afterEach(() => db.remove())

async function session(personId: string): Promise<Buffer> {
  const digest = createHash('sha256').update(randomBytes(32)).digest()
  await db.write(trx => trx.insertInto('session').values({ token_sha256: digest, person_id: personId, credential_epoch: 0, created_at: inTerm, seen_at: inTerm, ends_at: inTerm + 3_600_000, ended_at: null, ended_why: null }).execute())
  return digest
}

describe('an invitation', () => {
  it('is a mail with a link that works once and is stored as a digest only', async () => {
    const { id } = await invitePerson(db, { ...house.asked, name: 'Nia Bell', email: 'nia@example.edu' }, inTerm)
    const mail = await db.read.selectFrom('outbox').select(['template', 'facts_json']).where('to_person_id', '=', id).executeTakeFirstOrThrow()
    const { tokenId } = JSON.parse(mail.facts_json) as { tokenId: string }
    const token = tokenOf('invite', tokenId)
    expect(mail.facts_json).not.toContain(token)
    const stored = await db.read.selectFrom('one_time_token').selectAll().where('person_id', '=', id).executeTakeFirstOrThrow()
    expect(mail.template).toBe('invitation')
    expect(stored.token_sha256.equals(createHash('sha256').update(token).digest())).toBe(true)
    await expect(invitePerson(db, { ...house.asked, name: 'Another', email: 'nia@example.edu' }, inTerm)).rejects.toMatchObject({ code: 'already_exists' })
  })
  it('sent again ends the earlier link', async () => {
    const { id } = await invitePerson(db, { ...house.asked, name: 'Nia Bell', email: 'nia@example.edu' }, inTerm)
    await inviteAgain(db, { ...house.asked, personId: id }, inTerm + 1000)
    const tokens = await db.read.selectFrom('one_time_token').select('used_at').where('person_id', '=', id).execute()
    expect(tokens.map(row => row.used_at === null).sort()).toEqual([false, true])
  })
})

describe('a closed account', () => {
  it('ends its sessions at once, and they stay ended when it is opened again', async () => {
    const token = await session(house.people.first)
    expect(await loadActor(db.read, token, inTerm)).not.toBeNull()
    await closeAccount(db, { ...house.asked, personId: house.people.first }, inTerm)
    expect(await loadActor(db.read, token, inTerm)).toBeNull()
    expect(await reopenAccount(db, { ...house.asked, personId: house.people.first }, inTerm)).toEqual({ state: 'invited' }) // never chose a passphrase
    expect(await loadActor(db.read, token, inTerm)).toBeNull()
  })
  it('is not the last admin’s', async () => {
    await expect(closeAccount(db, { ...house.asked, personId: house.people.admin }, inTerm)).rejects.toMatchObject({ code: 'last_admin' })
    await expect(endDepartmentRole(db, { ...house.asked, roleId: house.asked.actorId }, inTerm)).rejects.toMatchObject({ code: 'last_admin' })
    await setDepartmentRole(db, { ...house.asked, personId: house.people.lead, role: 'admin', courseIds: [], until: null }, inTerm)
    expect(await closeAccount(db, { ...house.asked, personId: house.people.admin }, inTerm)).toEqual({ state: 'closed' })
  })
})

describe('the list of people', () => {
  it('is searched by words of name and address, and takes signs as signs', async () => {
    expect((await listPeople(db.read, { search: 'fay', page: 1 })).people.map(person => person.name)).toEqual(['Fay Ode'])
    expect((await listPeople(db.read, { search: 'EXAMPLE.edu ruiz', page: 1 })).people.map(person => person.name)).toEqual(['Lena Ruiz'])
    expect((await listPeople(db.read, { search: '%', page: 1 })).count).toBe(6)
    expect((await listPeople(db.read, { search: 'nobody', page: 1 })).people).toEqual([])
  })
})
