import { cpSync, mkdtempSync, readFileSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import SQLite from 'better-sqlite3'
import { writingPragmas } from '../../server/db/dialect'
import { prepareEachTime } from '../faults/plantedBuild'
import { ClassAtWork } from './classAtWork'
import type { Ratio, Round } from './ratio'

const clients = 32
/** A server is measured as it runs in a term, and not while its code is still being compiled: that takes it some hundred submissions. */
const warmingUp = 40
/** What a submission writes, in the order in which the foreign keys let it in, and how its rows are found: this column of theirs is that column of the submission. */
const parts = [
  { table: 'ledger_entry', column: 'seq', of: 'ledger_seq', prefix: '' },
  { table: 'submission', column: 'id', of: 'id', prefix: '' },
  { table: 'answer', column: 'submission_id', of: 'id', prefix: '' },
  { table: 'evaluation', column: 'submission_id', of: 'id', prefix: '' },
  { table: 'mark', column: 'submission_id', of: 'id', prefix: '' },
  { table: 'outbox', column: 'event_key', of: 'id', prefix: 'receipt:' },
  { table: 'request_key', column: 'key', of: 'request_key', prefix: '' },
] as const

/**
 * CPU of the whole server for each submission over HTTP (session, rights, judging, ledger, answer), and CPU of putting the very rows that it wrote
 * into a copy of the same database by prepared statements, as many submissions to a transaction as there were clients.
 */
export const submissionCpu: Ratio = {
  id: 'P5', part: 'cpu', bar: 6, says: 'CPU of a submission over HTTP / of its rows by prepared statements, ms',
  command: 'npm run bench -- --only P5/cpu',
  plant: prepareEachTime,
  async measure({ isShort, entry }) {
    const times = isShort ? 5 : 10
    const atWork = await ClassAtWork.of(clients, entry)
    const copies = mkdtempSync(join(tmpdir(), 'tetherhouse-cpu-'))
    try {
      await atWork.handIn(clients, warmingUp)
      const counted: Round[] = []
      for (let round = 0; round < (isShort ? 3 : 7); round++) {
        const copy = join(copies, `${round}`)
        checkpoint(atWork.dataDir)
        cpSync(atWork.dataDir, copy, { recursive: true })
        const before = cpuMs(atWork.server.pid)
        const submissions = await atWork.handIn(clients, times)
        const overHttp = cpuMs(atWork.server.pid) - before
        counted.push({ numerator: overHttp / submissions, denominator: putAgain(join(copy, 'main.db'), join(atWork.dataDir, 'main.db'), submissions) / submissions })
      }
      return counted
    }
    finally {
      await atWork.close()
      rmSync(copies, { recursive: true, force: true })
    }
  },
}

/** User and system time of all its threads; the system counts in hundredths of a second. */
function cpuMs(pid: number): number {
  const [, rest = ''] = readFileSync(`/proc/${pid}/stat`, 'utf8').split(') ')
  const fields = rest.split(' ')
  return (Number(fields[11]) + Number(fields[12])) * 10
}

function checkpoint(dataDir: string): void {
  const raw = new SQLite(join(dataDir, 'main.db'))
  raw.pragma('wal_checkpoint(TRUNCATE)')
  raw.close()
}

interface Row { [column: string]: unknown }

/** Puts into the older file the rows of the submissions that only the newer has; the CPU that this took, in ms. */
function putAgain(older: string, newer: string, submissions: number): number {
  const from = new SQLite(newer, { readonly: true })
  const raw = new SQLite(older)
  try {
    for (const pragma of writingPragmas) raw.pragma(pragma)
    const added = from.prepare<[unknown], Row>('select * from submission where seq > ? order by seq').all(raw.prepare('select coalesce(max(seq), 0) from submission').pluck().get())
    if (added.length !== submissions) throw new Error(`${submissions} submissions were acknowledged, and ${added.length} are there.`)
    const writes = parts.map(({ table, column, of, prefix }) => {
      const rows = from.prepare<[unknown], Row>(`select * from ${table} where ${column} = ?`)
      const found = added.map(submission => rows.all(`${prefix}${String(submission[of])}`))
      const [one] = found[0] ?? []
      if (!one || found.some(each => each.length === 0)) throw new Error(`A submission left nothing in ${table}.`)
      const columns = Object.keys(one)
      return { statement: raw.prepare(`insert into ${table} (${columns.join(', ')}) values (${columns.map(() => '?').join(', ')})`), values: found.map(each => each.map(row => Object.values(row))) }
    })
    const put = raw.transaction((first: number, last: number) => {
      for (let no = first; no < last; no++) for (const { statement, values } of writes) for (const row of values[no] ?? []) statement.run(...row)
    })
    const start = process.cpuUsage()
    for (let no = 0; no < submissions; no += clients) put.immediate(no, Math.min(submissions, no + clients))
    const used = process.cpuUsage(start)
    return (used.user + used.system) / 1000
  }
  finally {
    raw.close()
    from.close()
  }
}
