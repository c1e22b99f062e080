import { readdirSync, readFileSync } from 'node:fs'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import SQLite from 'better-sqlite3'
import { afterEach, describe, expect, it } from 'vitest'
import { statementsOf } from '../../../server/db/dialect'
import { writtenOnce } from '../../../server/db/migrations/ground/guards'
import { migrations } from '../../../server/db/migrations'
import { migrate, NewerDatabaseError, openDatabase } from '../../../server/db/open'
import { temporaryStores, type TemporaryStores } from '../../fixtures/temporaryStores'

const dbFolder = fileURLToPath(new URL('../../../server/db', import.meta.url))
let stores: TemporaryStores | undefined
afterEach(async () => {
  await stores?.remove()
  stores = undefined
})

describe('migrations', () => {
  it('lists every file of the folder, in order', () => {
    const files = readdirSync(join(dbFolder, 'migrations')).filter(name => /^\d{4}_.*\.ts$/.test(name)).map(name => name.replace(/\.ts$/, '')).sort()
    expect(Object.keys(migrations)).toEqual(files)
  })

  it('gives the tables and columns that the row types name', async () => {
    stores = await temporaryStores()
    const types = readdirSync(join(dbFolder, 'schema')).map(name => readFileSync(join(dbFolder, 'schema', name), 'utf8')).join('\n')
    const database = /export interface Database \{([^}]*)\}/.exec(types)?.[1] ?? ''
    const typed = Object.fromEntries([...database.matchAll(/^ {2}(\w+): (\w+)$/gm)].map(([, table, row]) => {
      const body = new RegExp(`export interface ${row} \\{([^}]*)\\}`).exec(types)?.[1] ?? ''
      return [table, [...body.matchAll(/^ {2}(\w+):/gm)].map(match => match[1])]
    }))
    const names = stores.raw.prepare('select name from sqlite_master where type in (\'table\', \'view\') and name not like \'sqlite_%\' and name not like \'kysely_%\'').pluck().all() as string[]
    const real = Object.fromEntries(names.map(name => [name, (stores!.raw.pragma(`table_info(${name})`) as { name: string }[]).map(column => column.name)]))
    expect(typed).toEqual(real)
  })

  it('makes every table strict', async () => {
    stores = await temporaryStores()
    const loose = stores.raw.prepare('select name from pragma_table_list where type = \'table\' and strict = 0 and name not like \'sqlite_%\' and name not like \'kysely_%\'').pluck().all()
    expect(loose).toEqual([])
  })

  it('keeps synchronous at FULL and refuses writes on the reading connection', async () => {
    stores = await temporaryStores()
    expect(stores.raw.pragma('synchronous', { simple: true })).toBe(2)
    await expect(stores.read.insertInto('installation').values({ key: 'a', value_json: '1' }).execute()).rejects.toThrow()
  })

  it('refuses a database that a newer version made, and leaves it as it was', async () => {
    stores = await temporaryStores()
    const { dataDir } = stores
    stores.raw.prepare('insert into kysely_migration (name, timestamp) values (\'9999_later\', \'2030\')').run()
    await expect(openDatabase(dataDir)).rejects.toThrow(NewerDatabaseError)
    const raw = new SQLite(join(dataDir, 'main.db'), { readonly: true })
    expect(raw.prepare('select count(*) from kysely_migration').pluck().get()).toBe(Object.keys(migrations).length + 1)
    raw.close()
  })

  it('leaves nothing of a migration that fails half way', async () => {
    stores = await temporaryStores()
    migrations['9000_breaks'] = { up: async (db) => {
      await db.schema.createTable('half').addColumn('a', 'text').execute()
      throw new Error('half way')
    } }
    try {
      await expect(migrate(stores.connection)).rejects.toThrow('half way')
    }
    finally {
      delete migrations['9000_breaks']
    }
    expect(stores.raw.prepare('select count(*) from sqlite_master where name = \'half\'').pluck().get()).toBe(0)
  })

  it('splits a text at statements and keeps a trigger whole', () => {
    expect(statementsOf('create table a (x text);\ncreate trigger t before update on a begin\n  select 1; -- one\n  select 2; end;\n')).toHaveLength(2)
  })

  it.each(writtenOnce)('never changes or removes a row of %s', async (table) => {
    stores = await temporaryStores()
    const triggers = stores.raw.prepare('select name from sqlite_master where type = \'trigger\' and tbl_name = ?').pluck().all(table)
    expect(triggers).toContain(`${table}_no_update`)
    expect(triggers).toContain(`${table}_no_delete`)
  })
})
