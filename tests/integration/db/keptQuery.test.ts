import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { insertRows, keptQuery } from '../../../server/db/keptQuery'
import { openTemporary } from '../../fixtures/openTemporary'

let stores: Awaited<ReturnType<typeof openTemporary>>
beforeAll(async () => {
  stores = await openTemporary()
})
afterAll(() => stores.remove())

describe('a query that is compiled once', () => {
  it('takes the values of each call, wherever they stand in it, beside those that are its own', async () => {
    await stores.write(trx => insertRows(trx, 'counter', [{ name: 'a', value: 1 }, { name: 'b', value: 2 }, { name: 'c', value: 3 }]))
    let built = 0
    const between = keptQuery((db, given: { low: number, high: number }) => {
      built++
      return db.selectFrom('counter').select('name').where('value', '<=', given.high).where('name', '<>', 'none').where('value', '>=', given.low).orderBy('name')
    })
    const names = async (low: number, high: number) => (await between(stores.read, { low, high })).map(row => row.name)
    expect([await names(1, 2), await names(2, 3), await names(3, 1), await names(1, 3)]).toEqual([['a', 'b'], ['b', 'c'], [], ['a', 'b', 'c']])
    expect(built).toBe(1)
  })

  it('does its part inside a unit of work, and is undone with it', async () => {
    const byName = keptQuery((db, given: { name: string }) => db.selectFrom('counter').select('value').where('name', '=', given.name))
    await expect(stores.write(async (trx) => {
      await insertRows(trx, 'counter', [{ name: 'undone', value: 9 }])
      expect(await byName(trx, { name: 'undone' })).toEqual([{ value: 9 }])
      throw new Error('no')
    })).rejects.toThrow('no')
    expect(await byName(stores.read, { name: 'undone' })).toEqual([])
  })

  it('puts rows in by their column names, in whatever order these come, and nothing where there are none', async () => {
    await stores.write(trx => insertRows(trx, 'counter', [{ value: 11, name: 'k' }, { name: 'l', value: 12 }]))
    await stores.write(trx => insertRows(trx, 'counter', []))
    expect(await stores.read.selectFrom('counter').selectAll().where('value', '>', 10).orderBy('name').execute()).toEqual([{ name: 'k', value: 11 }, { name: 'l', value: 12 }])
  })
})
