import { createHash } from 'node:crypto'
import { z } from 'zod'
import type { Read } from '../../db/writer'
import type { LedgerEntryTable } from '../../db/schema/ledger'
import type { RulingTable } from '../../db/schema/moderation'
import type { MarkTable } from '../../db/schema/work'
import { entryDigest } from './appendEntry'
import { answersDigest, evaluationDigest, evaluationsDigest, marksDigest, repairDigest, rulingDigest, rulingReasonDigest, submissionDigest, type ColumnDigests } from './coveredDigests'
import { readPrivateTexts } from './readPrivateTexts'

/** Something that does not add up: where, and what. */
export interface AuditFinding { where: string, what: string }
export interface Anchor { chain: string, seq: number, digest: string }
export interface AuditReport { chains: number, entries: number, marks: number, anchors: number, findings: AuditFinding[] }

const digests = z.record(z.string(), z.string())
const markFact = z.object({ submission: z.string(), step: z.string(), version: z.number(), before: z.number().nullable(), after: z.number(), max: z.number() })
const factsSchema = z.looseObject({
  submission: z.string().optional(), ruling: z.string().optional(), repair: z.string().optional(),
  covers: z.object({ submission: digests.optional(), answers: digests.optional(), evaluations: digests.optional(), marks: digests.optional(), ruling: digests.optional(), repair: digests.optional() }).optional(),
  marks: z.array(markFact).optional(),
})
type Facts = z.infer<typeof factsSchema>
type MarkFact = z.infer<typeof markFact>

/**
 * Proves that the marks that are shown are what the ledger adds up to.
 *
 * Each chain is walked link by link; every row that an entry covers is digested again, column by column; the last `after` of
 * each step must be the mark in force; every mark and every repair must stand in an entry. Anchors, the heads that receipts and mails carry,
 * show what a chain alone cannot: that its end was cut off, or that all of it was written anew.
 */
export async function auditLedger(read: Read, anchors: readonly Anchor[] = []): Promise<AuditReport> {
  const findings: AuditFinding[] = []
  const chains = await read.selectFrom('ledger_chain').selectAll().orderBy('id').execute()
  const told = new Map<string, MarkFact>()
  const repairs = new Map<string, string>()
  let entries = 0
  const digestAt = new Map<string, string>()
  for (const chain of chains) {
    let prev: Buffer = Buffer.alloc(32)
    let seq = 0
    for await (const entry of entriesOf(read, chain.id)) {
      entries++
      if (entry.seq !== seq + 1) findings.push({ where: `${chain.id} ${seq + 1}`, what: `entry is missing (the next one is ${entry.seq})` })
      findings.push(...checkLink(entry, prev))
      const facts = factsOf(entry, findings)
      for (const mark of facts?.marks ?? []) tellMark(told, mark, entry, findings)
      if (facts?.repair !== undefined && facts.covers?.repair) repairs.set(`${entry.chain_id} ${entry.seq}`, facts.repair)
      if (facts?.covers) findings.push(...await checkCovered(read, entry, facts, facts.covers))
      digestAt.set(`${entry.chain_id} ${entry.seq}`, entry.digest.toString('hex'))
      prev = entry.digest
      seq = entry.seq
    }
    if (chain.seq !== seq) findings.push({ where: `${chain.id} ${seq + 1}`, what: `the chain says it has ${chain.seq} entries, ${seq} are there: its end is missing` })
    else if (!chain.head.equals(prev)) findings.push({ where: `${chain.id} ${seq}`, what: 'ledger_chain.head is not the digest of the last entry' })
  }
  const marks = await checkMarks(read, told, findings)
  await checkRepairs(read, repairs, findings)
  await checkEvaluations(read, findings)
  await checkPrivateTexts(read, findings)
  for (const anchor of anchors) {
    const digest = digestAt.get(`${anchor.chain} ${anchor.seq}`)
    if (digest === undefined) findings.push({ where: `${anchor.chain} ${anchor.seq}`, what: 'a receipt or mail names this entry, and it is not there: the end of the chain was cut off' })
    else if (digest !== anchor.digest) findings.push({ where: `${anchor.chain} ${anchor.seq}`, what: 'a receipt or mail carries another digest for this entry: the chain was written anew' })
  }
  return { chains: chains.length, entries, marks, anchors: anchors.length, findings }
}

const page = 500

/** Page by page, so that a long chain neither fills memory nor holds a read transaction. */
async function* entriesOf(read: Read, chain: string): AsyncGenerator<LedgerEntryTable> {
  for (let after = 0; ;) {
    const rows = await read.selectFrom('ledger_entry').selectAll().where('chain_id', '=', chain).where('seq', '>', after).orderBy('seq').limit(page).execute()
    yield* rows
    const last = rows.at(-1)
    if (!last || rows.length < page) return
    after = last.seq
  }
}

function checkLink(entry: LedgerEntryTable, prev: Buffer): AuditFinding[] {
  const where = `${entry.chain_id} ${entry.seq}`
  const digest = entryDigest({ chain: entry.chain_id, seq: entry.seq, at: entry.at, actor: entry.actor, action: entry.action, factsJson: entry.facts_json, privateDigest: entry.private_digest, prev: entry.prev })
  return [
    ...(entry.prev.equals(prev) ? [] : [{ where, what: 'ledger_entry.prev is not the digest of the entry before: an entry was changed, left out or put in' }]),
    ...(digest.equals(entry.digest) ? [] : [{ where, what: 'a column of ledger_entry was changed: its digest is another' }]),
  ]
}

function factsOf(entry: LedgerEntryTable, findings: AuditFinding[]): Facts | null {
  const parsed = factsSchema.safeParse(parseJson(entry.facts_json))
  if (parsed.success) return parsed.data
  findings.push({ where: `${entry.chain_id} ${entry.seq}`, what: 'ledger_entry.facts_json cannot be read' })
  return null
}

function parseJson(text: string): unknown {
  try {
    return JSON.parse(text)
  }
  catch {
    return null
  }
}

function tellMark(told: Map<string, MarkFact>, mark: MarkFact, entry: LedgerEntryTable, findings: AuditFinding[]): void {
  const key = `${mark.submission} ${mark.step}`
  const before = told.get(key)
  if ((before?.after ?? null) !== mark.before || (before?.version ?? 0) + 1 !== mark.version) findings.push({ where: `${entry.chain_id} ${entry.seq}`, what: `mark of ${key}: the entry goes on from ${mark.before ?? 'nothing'}, the ledger stood at ${before?.after ?? 'nothing'}; an entry is missing` })
  told.set(key, mark)
}

async function checkCovered(read: Read, entry: LedgerEntryTable, facts: Facts, covers: NonNullable<Facts['covers']>): Promise<AuditFinding[]> {
  const findings: AuditFinding[] = []
  const where = `${entry.chain_id} ${entry.seq}`
  const compare = (table: string, stored: ColumnDigests | undefined, found: ColumnDigests | null) => {
    if (!stored) return
    if (!found) findings.push({ where, what: `${table}: a row that the entry covers is missing` })
    else for (const [column, digest] of Object.entries(stored)) if (found[column] !== digest) findings.push({ where, what: `${table}.${column} was changed` })
  }
  if (covers.submission && facts.submission) {
    const row = await read.selectFrom('submission').selectAll().where('id', '=', facts.submission).executeTakeFirst()
    compare('submission', covers.submission, row ? submissionDigest(row) : null)
  }
  if (covers.answers && facts.submission) {
    compare('answer', covers.answers, answersDigest(await read.selectFrom('answer').selectAll().where('submission_id', '=', facts.submission).execute()))
  }
  const marks = await read.selectFrom('mark').selectAll().where('ledger_chain', '=', entry.chain_id).where('ledger_seq', '=', entry.seq).execute()
  compare('mark', covers.marks, marksDigest(marks))
  if (covers.evaluations) {
    const ids = await evaluationsThatCame(read, marks)
    const rows = ids.length === 0 ? [] : await read.selectFrom('evaluation').selectAll().where('id', 'in', ids).execute()
    compare('evaluation', covers.evaluations, evaluationsDigest(rows))
  }
  if (covers.ruling && facts.ruling) {
    const row = await read.selectFrom('ruling').selectAll().where('id', '=', facts.ruling).executeTakeFirst()
    compare('ruling', covers.ruling, row ? { ...rulingDigest(row), ...await coveredReason(read, row, covers.ruling) } : null)
  }
  if (covers.repair && facts.repair) {
    const row = await read.selectFrom('repair').selectAll().where('id', '=', facts.repair).executeTakeFirst()
    compare('repair', covers.repair, row ? repairDigest(row) : null)
  }
  return findings
}

/** The reason that an older entry covers as a text: read where it is kept; once it was erased there is nothing left to compare. */
async function coveredReason(read: Read, row: RulingTable, covered: ColumnDigests): Promise<ColumnDigests> {
  if (covered.reason === undefined) return {}
  const reason = (await readPrivateTexts(read, [row.reason_digest])).get(row.reason_digest)
  return reason === undefined ? { reason: covered.reason } : rulingReasonDigest({ id: row.id, reason })
}

/** A mark that a person changed by hand goes on from the evaluation of the mark before: that one came with another entry. */
async function evaluationsThatCame(read: Read, marks: readonly MarkTable[]): Promise<string[]> {
  const ids: string[] = []
  for (const mark of marks) {
    if (mark.evaluation_id === null) continue
    const before = mark.version === 1
      ? undefined
      : await read.selectFrom('mark').select('id').where('submission_id', '=', mark.submission_id).where('step_key', '=', mark.step_key).where('version', '<', mark.version).where('evaluation_id', '=', mark.evaluation_id).executeTakeFirst()
    if (!before) ids.push(mark.evaluation_id)
  }
  return ids
}

/** Every mark in force is the ledger's last word on it, and every word has its mark. */
async function checkMarks(read: Read, told: ReadonlyMap<string, MarkFact>, findings: AuditFinding[]): Promise<number> {
  const current = await read.selectFrom('mark_current').select(['submission_id', 'step_key', 'version', 'points_milli', 'max_milli']).execute()
  const seen = new Set<string>()
  for (const mark of current) {
    const key = `${mark.submission_id} ${mark.step_key}`
    const last = told.get(key)
    seen.add(key)
    if (!last) findings.push({ where: key, what: 'the mark stands in no entry of the ledger' })
    else if (last.after !== mark.points_milli || last.version !== mark.version || last.max !== mark.max_milli) findings.push({ where: key, what: `mark.points_milli is ${mark.points_milli} of ${mark.max_milli} (version ${mark.version}), the ledger adds up to ${last.after} of ${last.max} (version ${last.version})` })
  }
  for (const key of told.keys()) if (!seen.has(key)) findings.push({ where: key, what: 'the ledger tells of a mark that is not there' })
  return current.length
}

/** Every repair is the one that its entry names and covers: a row that was put in behind the product gives days, attempts or due times that nobody gave. */
async function checkRepairs(read: Read, told: ReadonlyMap<string, string>, findings: AuditFinding[]): Promise<void> {
  const rows = await read.selectFrom('repair').select(['id', 'ledger_chain', 'ledger_seq']).execute()
  for (const row of rows) if (told.get(`${row.ledger_chain} ${row.ledger_seq}`) !== row.id) findings.push({ where: `repair ${row.id}`, what: 'the repair is not the one that its entry of the ledger names' })
}

async function checkEvaluations(read: Read, findings: AuditFinding[]): Promise<void> {
  let after = ''
  for (;;) {
    const rows = await read.selectFrom('evaluation').selectAll().where('id', '>', after).orderBy('id').limit(page).execute()
    for (const row of rows) if (!evaluationDigest(row).equals(row.digest)) findings.push({ where: `evaluation ${row.id}`, what: 'evaluation.digest is not that of its row' })
    const last = rows.at(-1)
    if (!last || rows.length < page) return
    after = last.id
  }
}

async function checkPrivateTexts(read: Read, findings: AuditFinding[]): Promise<void> {
  const rows = await read.selectFrom('private_body').select(['digest', 'salt', 'body']).execute()
  for (const row of rows) if (!createHash('sha256').update(row.salt).update(row.body).digest().equals(row.digest)) findings.push({ where: `private_body ${row.digest.toString('hex').slice(0, 16)}`, what: 'private_body.body was changed: salt and text no longer give the digest that the ledger holds' })
}
