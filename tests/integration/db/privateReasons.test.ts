import { createHash } from 'node:crypto'
import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import SQLite from 'better-sqlite3'
import { Kysely, Migrator } from 'kysely'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { HouseDialect } from '../../../server/db/dialect'
import { migrations } from '../../../server/db/migrations'
import { openDatabase, type OpenDatabase } from '../../../server/db/open'
import { disputeFile } from '../../../server/domain/disputes/attachFile'
import { entryDigest } from '../../../server/domain/ledger/appendEntry'
import { auditLedger } from '../../../server/domain/ledger/auditLedger'
import { rulingReasonDigest } from '../../../server/domain/ledger/coveredDigests'

/** A database as an earlier version left it: two students of one class, the same photograph from both, a ruling and a second draw with their reasons. */
let dataDir: string
let opened: OpenDatabase
const photograph = Buffer.alloc(32, 7)

beforeEach(async () => {
  dataDir = mkdtempSync(join(tmpdir(), 'tetherhouse-earlier-'))
  const raw = new SQLite(join(dataDir, 'main.db'))
  const before = Object.fromEntries(Object.entries(migrations).filter(([name]) => name < '0004'))
  const { error } = await new Migrator({ db: new Kysely({ dialect: new HouseDialect({ database: raw }) }), provider: { getMigrations: async () => before } }).migrateToLatest()
  if (error) throw error
  raw.pragma('foreign_keys = OFF')
  raw.pragma('ignore_check_constraints = ON')
  const put = (table: string, given: Record<string, unknown>) => {
    const columns = (raw.pragma(`table_info(${table})`) as { name: string, type: string, notnull: number }[]).filter(column => column.name in given || column.notnull === 1)
    const filler: Record<string, unknown> = { TEXT: 'x', INTEGER: 1, BLOB: Buffer.alloc(32) }
    raw.prepare(`insert into ${table} (${columns.map(column => column.name).join(', ')}) values (${columns.map(() => '?').join(', ')})`).run(...columns.map(column => column.name in given ? given[column.name] : filler[column.type.toUpperCase()]))
  }
  for (const no of [1, 2]) {
    put('actor', { id: `m-${no}` })
    put('membership', { id: `m-${no}`, pseudonym: `P${no}` })
    put('holder_member', { holder_id: `holder-${no}`, membership_id: `m-${no}` })
    put('share', { id: `share-${no}`, holder_id: `holder-${no}`, redraw: no - 1, draw_id: `draw-${no}`, reason: no === 2 ? 'Ben was ill on the day of the flight.' : null })
    put('submission', { id: `submission-${no}`, seq: no, share_id: `share-${no}`, by_membership_id: `m-${no}`, receipt_no: `R-${no}`, request_key: `k-${no}` })
    put('dispute', { id: `dispute-${no}`, submission_id: `submission-${no}`, step_key: 'rate', state: 'ruled' })
    const text = `Added a file: page of ${no}.png`
    const digest = createHash('sha256').update(Buffer.alloc(16, no)).update(text).digest()
    put('private_body', { digest, about_membership_id: `m-${no}`, salt: Buffer.alloc(16, no), body: text })
    put('dispute_note', { id: `note-${no}`, dispute_id: `dispute-${no}`, by_actor_id: `m-${no}`, audience: 'all', private_digest: digest, file_digest: photograph })
  }
  put('work_file', { digest: photograph, about_membership_id: 'm-1', size: 12, original_name: 'page of 1.png' })
  put('ruling', { id: 'ruling-1', dispute_id: 'dispute-1', level: 'first', kind: 'uphold', reason: 'Ana read the plot a tenth too low.', ledger_chain: 'course:c', ledger_seq: 1 })
  const entry = {
    chain: 'course:c', seq: 1, at: 1, actor: 'm-ta', action: 'dispute.ruled', privateDigest: null, prev: Buffer.alloc(32),
    factsJson: JSON.stringify({ covers: { ruling: rulingReasonDigest({ id: 'ruling-1', reason: 'Ana read the plot a tenth too low.' }) }, ruling: 'ruling-1' }),
  }
  put('ledger_chain', { id: 'course:c', seq: 0, head: Buffer.alloc(32) })
  put('ledger_entry', { chain_id: 'course:c', seq: 1, at: 1, actor: 'm-ta', action: 'dispute.ruled', facts_json: entry.factsJson, prev: entry.prev, digest: entryDigest(entry) })
  raw.close()
  opened = await openDatabase(dataDir)
})
afterEach(async () => {
  await opened.close()
  rmSync(dataDir, { recursive: true, force: true })
})

const textsAbout = async (membershipId: string) => (await opened.read.selectFrom('private_body').select('body').where('about_membership_id', '=', membershipId).orderBy('body').execute()).map(row => row.body)
const ofRuling = async () => (await auditLedger(opened.read)).findings.filter(({ what }) => what.includes('ruling'))

describe('reasons that an earlier version kept in their rows', () => {
  it('move to where they can be erased, and stand nowhere else', async () => {
    expect(await textsAbout('m-1')).toEqual(['Added a file: page of 1.png', 'Ana read the plot a tenth too low.'])
    expect(await textsAbout('m-2')).toEqual(['Added a file: page of 2.png', 'Ben was ill on the day of the flight.'])
    const rows = JSON.stringify([await opened.read.selectFrom('ruling').selectAll().execute(), await opened.read.selectFrom('share').selectAll().execute()])
    expect(rows).not.toMatch(/Ana|Ben/)
  })

  it('stay what the ledger covers: a changed one is seen, an erased one is not called a change', async () => {
    expect(await ofRuling()).toEqual([])
    const { reason_digest: digest } = await opened.read.selectFrom('ruling').select('reason_digest').executeTakeFirstOrThrow()
    const own = opened.raw.prepare('update private_body set body = ? where digest = ?')
    own.run('Ana read it well.', Buffer.from(digest, 'hex'))
    expect(await ofRuling()).toEqual([{ where: 'course:c 1', what: 'ruling.reason was changed' }])
    opened.raw.prepare('delete from private_body where digest = ?').run(Buffer.from(digest, 'hex'))
    expect(await ofRuling()).toEqual([])
  })

  it('leave rulings, shares and notes append-only', () => {
    for (const table of ['ruling', 'share', 'dispute_note']) expect(() => opened.raw.prepare(`update ${table} set id = 'other'`).run()).toThrow(/append-only/)
  })
})

describe('the same bytes from two students', () => {
  it('are each one\'s own, by the name that each gave, and erasing one\'s leaves the other\'s', async () => {
    const asked = (no: number) => disputeFile(opened, { disputeId: `dispute-${no}`, digest: photograph.toString('hex') })
    expect([(await asked(1)).name, (await asked(2)).name]).toEqual(['page of 1.png', 'page of 2.png'])
    opened.raw.pragma('foreign_keys = OFF')
    opened.raw.prepare('delete from work_file where about_membership_id = ?').run('m-1')
    await expect(asked(1)).rejects.toMatchObject({ code: 'not_found' })
    expect((await asked(2)).name).toBe('page of 2.png')
  })
})
