import { join } from 'node:path'
import SQLite from 'better-sqlite3'
import { auditLedger } from '../../server/domain/ledger/auditLedger'
import { openForReading } from '../../server/db/open'

/** What must hold in a data folder after any fault; an empty list is a sound store. */
export async function checkStore(dataDir: string): Promise<string[]> {
  const wrong: string[] = []
  const raw = new SQLite(join(dataDir, 'main.db'), { readonly: true })
  const integrity = raw.pragma('integrity_check', { simple: true })
  if (integrity !== 'ok') wrong.push(`integrity_check: ${String(integrity)}`)
  const foreign = raw.pragma('foreign_key_check')
  if (Array.isArray(foreign) && foreign.length > 0) wrong.push(`foreign_key_check: ${foreign.length} rows`)
  // No half state: a submission has an answer, an evaluation and a mark for each step, and its receipt's mail.
  const half = raw.prepare(`select s.id from submission s where
    (select count(*) from step t where t.lab_revision_id = s.lab_revision_id) <> (select count(*) from answer a where a.submission_id = s.id)
    or (select count(*) from answer a where a.submission_id = s.id) <> (select count(distinct m.step_key) from mark m where m.submission_id = s.id)
    or (select count(*) from answer a where a.submission_id = s.id) > (select count(distinct e.step_key) from evaluation e where e.submission_id = s.id)
    or not exists (select 1 from outbox o where o.event_key = 'receipt:' || s.id)`).pluck().all()
  for (const id of half) wrong.push(`submission ${String(id)} is half there`)
  raw.close()
  const { read, close } = openForReading(dataDir)
  const report = await auditLedger(read)
  await close()
  wrong.push(...report.findings.map(finding => `${finding.where}: ${finding.what}`))
  return wrong
}

export function countSubmissions(dataDir: string, requestKey: string): number {
  const raw = new SQLite(join(dataDir, 'main.db'), { readonly: true })
  const count = Number(raw.prepare('select count(*) from submission where request_key = ?').pluck().get(requestKey))
  raw.close()
  return count
}
