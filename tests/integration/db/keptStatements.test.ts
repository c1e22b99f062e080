import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import type { OpenDatabase } from '../../../server/db/open'
import { keptStatements } from '../../../server/db/keptStatements'
import { openTemporary } from '../../fixtures/openTemporary'

let stores: OpenDatabase & { remove: () => Promise<void> }
beforeAll(async () => {
  stores = await openTemporary()
  await stores.write(trx => trx.insertInto('counter').values(['a', 'b', 'c'].map((name, value) => ({ name, value }))).execute())
})
afterAll(() => stores.remove())

const all = () => stores.read.selectFrom('counter').selectAll().orderBy('name')

describe('prepared statements that are kept', () => {
  it('answer a second reader while the first is still at it', () => {
    const kept = keptStatements(stores.raw)
    const text = 'select name from counter order by name'
    const first = kept.prepare(text).iterate([])
    expect(first.next().value).toEqual({ name: 'a' })
    expect(kept.prepare(text).all([])).toEqual([{ name: 'a' }, { name: 'b' }, { name: 'c' }])
    expect(first.next().value).toEqual({ name: 'b' })
    first.return?.()
    expect(kept.prepare(text)).toBe(kept.prepare(text))
  })

  it('see what was written since, with other values', async () => {
    const of = (name: string) => stores.read.selectFrom('counter').select('value').where('name', '=', name).executeTakeFirst()
    expect(await of('b')).toEqual({ value: 1 })
    await stores.write(trx => trx.updateTable('counter').set({ value: 7 }).where('name', '=', 'b').execute())
    expect([await of('b'), await of('c'), await of('d')]).toEqual([{ value: 7 }, { value: 2 }, undefined])
  })

  it('are prepared again when the schema has changed', async () => {
    const before = await stores.connection.selectFrom('counter').selectAll().where('name', '=', 'a').execute()
    expect(before).toEqual([{ name: 'a', value: 0 }])
    stores.raw.exec('alter table counter add column note text')
    expect(await stores.connection.selectFrom('counter').selectAll().where('name', '=', 'a').execute()).toEqual([{ name: 'a', value: 0, note: null }])
  })

  it('are dropped beyond a few hundred without an error', async () => {
    for (let n = 1; n <= 900; n++) await stores.read.selectFrom('counter').select('name').where('value', 'in', Array.from({ length: n }, (_, at) => at)).execute()
    expect((await all().execute()).length).toBe(3)
  })
})
