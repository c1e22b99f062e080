import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { auditLedger } from '../../../server/domain/ledger/auditLedger'
import { repairMember } from '../../../server/domain/repairs/repairMember'
import type { Judging } from '../../../server/domain/submissions/submitLab'
import { openTemporary } from '../../fixtures/openTemporary'
import { referenceIn } from '../../fixtures/reference'
import { handIn } from '../../fixtures/submitting'
import { workingCourse } from '../../fixtures/workingCourse'

const onTime = Date.parse('2026-10-15T20:00:00Z')
let stores: Awaited<ReturnType<typeof openTemporary>>
let receipts: { ledger: { chain: string, seq: number }, digest: string }[]

beforeEach(async () => {
  stores = await openTemporary()
  const course = await workingCourse(stores, { students: 4, times: { zone: 'America/Chicago', opens: '2026-10-12T08:00', due: '2026-10-16T17:00' }, lateRule: { kind: 'none' } })
  const judging: Judging = { reference: await referenceIn(stores.write), loadShare: async shareId => course.loaded(shareId) }
  receipts = []
  for (const no of [0, 1, 2, 3]) receipts.push((await handIn(stores, judging, course, { no, key: `key-0000000${no}`, at: onTime + no })).receipt)
})
afterEach(() => stores.remove())

/** What somebody with the file in their hands can do: the triggers are theirs to drop. */
function tamper(text: string): void {
  const triggers = stores.raw.prepare('select name, sql from sqlite_master where type = \'trigger\'').all() as { name: string, sql: string }[]
  stores.raw.pragma('foreign_keys = OFF')
  for (const trigger of triggers) stores.raw.exec(`drop trigger ${trigger.name}`)
  stores.raw.exec(text)
  for (const trigger of triggers) stores.raw.exec(trigger.sql)
}
const findings = async () => (await auditLedger(stores.read)).findings.map(finding => finding.what).join('\n')

describe('audit', () => {
  it('finds nothing where nothing was touched, and counts what it saw', async () => {
    expect(await auditLedger(stores.read)).toMatchObject({ chains: 1, entries: 4, marks: 12, findings: [] })
  })

  it.each([
    ['answer.typed', 'update answer set typed = \'1\' where step_key = \'rate\''],
    ['submission.received_at', 'update submission set received_at = received_at - 1 where seq = 2'],
    ['submission.late_units', 'update submission set late_units = 3 where seq = 2'],
    ['evaluation.parts_json', 'update evaluation set parts_json = \'null\' where step_key = \'theta\''],
    ['evaluation.low_bits', 'update evaluation set low_bits = zeroblob(8) where step_key = \'rate\''],
    ['mark.points_milli', 'update mark set points_milli = 0 where step_key = \'theta\''],
  ])('names the column %s when it was changed', async (column, text) => {
    tamper(text)
    expect(await findings()).toContain(`${column} was changed`)
  })

  it.each(['extra_days = 9', 'at = at + 1'])('names a repair of which %s was set behind its back', async (change) => {
    await repairMember(stores, { actorId: 'm-lead', once: null, courseId: 'course-1', memberId: 'm-0', body: { kind: 'accommodation', extraDays: 2 } }, onTime)
    expect(await findings()).toBe('')
    tamper(`update repair set ${change}`)
    expect(await findings()).toBe(`repair.${change.split(' ')[0]} was changed`)
  })

  it.each([
    ['another repair', 'ledger_seq', -1],
    ['no repair', '1', 99],
  ])('names a repair that was put in behind its back under an entry that names %s', async (_names, entry, seq) => {
    await repairMember(stores, { actorId: 'm-lead', once: null, courseId: 'course-1', memberId: 'm-0', body: { kind: 'accommodation', extraDays: 2 } }, onTime)
    expect(await findings()).toBe('')
    tamper(`insert into repair select 'planted', ${seq}, 'm-1', lab_id, kind, due_at, 60, submission_id, late_units, late_rule_json, reason_digest, by_actor_id, at, ledger_chain, ${entry} from repair`)
    expect((await auditLedger(stores.read)).findings).toEqual([{ where: 'repair planted', what: 'the repair is not the one that its entry of the ledger names' }])
  })

  it('says what the ledger adds up to where the mark in force is another', async () => {
    tamper('update mark set points_milli = 1 where step_key = \'theta\'')
    expect(await findings()).toMatch(/mark\.points_milli is 1 of 1000 .* the ledger adds up to 1000 of 1000/)
  })

  it('names a mark that stands in no entry', async () => {
    tamper('insert into mark select id || \'x\', submission_id, step_key, 2, 500, max_milli, evaluation_id, \'ruling\', ledger_chain, ledger_seq from mark where step_key = \'rate\' limit 1')
    expect(await findings()).toContain('the ledger adds up to')
  })

  it('names a changed entry, and a missing one', async () => {
    tamper('update ledger_entry set at = at + 1 where seq = 2')
    expect(await findings()).toContain('a column of ledger_entry was changed')
    tamper('delete from ledger_entry where seq = 3')
    expect(await findings()).toContain('entry is missing')
  })

  it('names a removed row that an entry covers', async () => {
    tamper('delete from evaluation where step_key = \'rate\'')
    expect(await findings()).toContain('evaluation')
  })

  it('sees a cut end only with an anchor, as a receipt carries it', async () => {
    const anchors = receipts.map(receipt => ({ chain: receipt.ledger.chain, seq: receipt.ledger.seq, digest: receipt.digest }))
    expect((await auditLedger(stores.read, anchors)).findings).toEqual([])
    tamper(`delete from mark where ledger_seq = 4; delete from evaluation where submission_id = (select id from submission where seq = 4); delete from answer where submission_id = (select id from submission where seq = 4);
      delete from submission where seq = 4; delete from ledger_entry where seq = 4; update ledger_chain set seq = 3, head = (select digest from ledger_entry where seq = 3)`)
    expect((await auditLedger(stores.read)).findings).toEqual([])
    expect((await auditLedger(stores.read, anchors)).findings.map(finding => finding.what).join()).toContain('the end of the chain was cut off')
  })
})
