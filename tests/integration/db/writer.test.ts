import { Kysely } from 'kysely'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { refuse } from '../../../shared/errors'
import { HouseDialect } from '../../../server/db/dialect'
import type { Database } from '../../../server/db/schema/tables'
import { groupWriter } from '../../../server/db/writer'
import { temporaryStores, type TemporaryStores } from '../../fixtures/temporaryStores'

let stores: TemporaryStores
beforeEach(async () => { stores = await temporaryStores() })
afterEach(() => stores.remove())

const put = (key: string) => stores.write(async (trx) => {
  await trx.insertInto('installation').values({ key, value_json: '1' }).execute()
  return key
})
const keys = async () => (await stores.read.selectFrom('installation').select('key').orderBy('key').execute()).map(row => row.key)

describe('the writer', () => {
  it('undoes a refused piece of work alone', async () => {
    const results = await Promise.allSettled([put('a'), stores.write(async (trx) => {
      await trx.insertInto('installation').values({ key: 'half', value_json: '1' }).execute()
      return refuse('invalid')
    }), put('b')])
    expect(results.map(result => result.status)).toEqual(['fulfilled', 'rejected', 'fulfilled'])
    expect(await keys()).toEqual(['a', 'b'])
  })

  it('joins what waits at the same time into one transaction', async () => {
    let commits = 0
    const counting = new Kysely<Database>({ dialect: new HouseDialect({ database: { close: () => {}, prepare: (text) => {
      if (/^commit/i.test(text)) commits++
      return stores.raw.prepare(text)
    } } }) })
    const write = groupWriter(counting)
    await Promise.all(Array.from({ length: 64 }, (_, at) => write(trx => trx.insertInto('installation').values({ key: `k${at}`, value_json: '1' }).execute())))
    expect(await keys()).toHaveLength(64)
    expect(commits).toBe(1)
  })

  it('settles a promise only after the commit: the reading connection sees what was promised', async () => {
    const seen = await Promise.all(Array.from({ length: 20 }, async (_, at) => {
      const key = await put(`p${at}`)
      return stores.read.selectFrom('installation').select('key').where('key', '=', key).executeTakeFirst()
    }))
    expect(seen.every(row => row !== undefined)).toBe(true)
  })

  it('rejects the whole batch when the transaction itself is gone, and goes on with the next', async () => {
    const full = Object.assign(new Error('database or disk is full'), { code: 'SQLITE_FULL' })
    const results = await Promise.allSettled([put('before'), stores.write(async () => { throw full }), put('after')])
    expect(results.map(result => result.status)).toEqual(['rejected', 'rejected', 'rejected'])
    expect(await keys()).toEqual([])
    await put('later')
    expect(await keys()).toEqual(['later'])
  })

  it('tells of a failed sync once, so that the process can end', async () => {
    const told: unknown[] = []
    const write = groupWriter(stores.connection, { onFailedSync: error => told.push(error) })
    await expect(write(async () => { throw Object.assign(new Error('disk I/O error'), { code: 'SQLITE_IOERR_FSYNC' }) })).rejects.toThrow()
    expect(told).toHaveLength(1)
  })

  it('keeps counters and chains free of gaps over refusals', async () => {
    await put('0')
    const next = (isRefused: boolean) => stores.write(async (trx) => {
      const row = await trx.selectFrom('installation').select(({ fn }) => fn.countAll<number>().as('n')).executeTakeFirstOrThrow()
      await trx.insertInto('installation').values({ key: `${row.n}`, value_json: '1' }).execute()
      if (isRefused) refuse('invalid')
    })
    await Promise.allSettled([next(false), next(true), next(false), next(true), next(false)])
    expect(await keys()).toEqual(['0', '1', '2', '3'])
  })
})
