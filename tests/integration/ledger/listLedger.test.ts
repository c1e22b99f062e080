import { afterAll, beforeAll, expect, it } from 'vitest'
import { listLedger } from '../../../server/domain/ledger/listLedger'
import { invitePerson } from '../../../server/domain/people/invitePerson'
import { openTemporary } from '../../fixtures/openTemporary'
import { inTerm, smallDepartment } from '../../fixtures/smallDepartment'

let stores: Awaited<ReturnType<typeof openTemporary>>
let house: Awaited<ReturnType<typeof smallDepartment>>
beforeAll(async () => {
  stores = await openTemporary()
  house = await smallDepartment(stores)
})
afterAll(() => stores.remove())

it('says whom an entry is about, by the name that they have now; the chain itself holds none', async () => {
  const { id } = await invitePerson(stores, { ...house.asked, name: 'Rhea Vance', email: 'rhea.vance@example.edu' }, inTerm)
  const newest = async (chain = 'department') => (await listLedger(stores.read, { chain, action: '', before: null })).entries[0]
  expect(await newest()).toMatchObject({ action: 'person.invited', by: 'Ada Min', about: ['Rhea Vance'] })
  await stores.write(trx => trx.updateTable('person').set({ display_name: 'Rhea Moor' }).where('id', '=', id).execute())
  expect((await newest())?.about).toEqual(['Rhea Moor'])
  await stores.write(trx => trx.updateTable('person').set({ display_name: null, email_norm: null, erased_at: inTerm, state: 'erased' }).where('id', '=', id).execute())
  expect((await newest())?.about).toEqual(['a person since erased'])
  expect((await stores.read.selectFrom('ledger_entry').select('facts_json').execute()).map(row => row.facts_json).join()).not.toMatch(/Rhea|Ada|Fay/)
})

it('names the member of a course whom an entry of its chain is about', async () => {
  const { entries } = await listLedger(stores.read, { chain: `course:${house.courseId}`, action: 'membership.started', before: null })
  expect(entries.flatMap(entry => entry.about)).toEqual(expect.arrayContaining(['Ivo Str', 'Tess Aird', 'Fay Ode', 'Sol Ann']))
})
