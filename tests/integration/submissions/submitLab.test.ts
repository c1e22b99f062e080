import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { DomainError } from '#shared/errors'
import type { LateRule } from '#shared/schemas/lab'
import type { OpenDatabase } from '../../../server/db/open'
import { marksDigest, submissionDigest } from '../../../server/domain/ledger/coveredDigests'
import { attemptsOfShares } from '../../../server/domain/marking/attemptsOf'
import { labTotal } from '../../../server/domain/marking/labTotal'
import type { Reference } from '../../../server/domain/marking/reference'
import { readReceipt } from '../../../server/domain/submissions/readReceipt'
import { submitLab, type Judging } from '../../../server/domain/submissions/submitLab'
import { openTemporary } from '../../fixtures/openTemporary'
import { bodyDigest, handIn, rightAnswers } from '../../fixtures/submitting'
import { referenceIn } from '../../fixtures/reference'
import { workingCourse, type LabTimes, type WorkingCourse } from '../../fixtures/workingCourse'

const chicago: LabTimes = { zone: 'America/Chicago', opens: '2026-10-12T08:00', due: '2026-10-16T17:00' }
const tenOfMaximum: LateRule = { kind: 'of_maximum', percent: 10, closesAfterDays: 7 }
const onTime = Date.parse('2026-10-16T20:00:00Z')

let stores: OpenDatabase & { remove: () => Promise<void> }
let reference: Reference
let course: WorkingCourse
let judging: Judging

beforeEach(async () => {
  stores = await openTemporary()
  reference = await referenceIn(stores.write)
})
afterEach(() => stores.remove())

async function make(given: Partial<Parameters<typeof workingCourse>[1]> = {}) {
  course = await workingCourse(stores, { students: 1, times: chicago, lateRule: tenOfMaximum, ...given })
  judging = { reference, loadShare: async shareId => course.loaded(shareId) }
}

const submit = (no: number, key: string, answers?: Record<string, string>, at = onTime, claimedSentAt: number | null = null) => handIn(stores, judging, course, { no, key, answers, at, claimedSentAt })
const right = (shareId: string) => rightAnswers(course, shareId)
const codeOf = (promise: Promise<unknown>) => promise.then(() => 'done', (error: unknown) => error instanceof DomainError ? error.code : Promise.reject(error))
const count = async (table: 'submission' | 'answer' | 'evaluation' | 'mark' | 'ledger_entry' | 'outbox' | 'request_key') =>
  Number((await stores.read.selectFrom(table).select(eb => eb.fn.countAll().as('n')).executeTakeFirstOrThrow()).n)
async function totalOf(no = 0) {
  const shareId = course.students[no]!.shareId
  return labTotal((await attemptsOfShares(stores.read, [shareId])).get(shareId) ?? [], 'best')
}

describe('a submission', () => {
  it('is stored whole, with full marks for right values, and its receipt is read back the same', async () => {
    await make()
    const stored = await submit(0, 'key-00000001')
    expect(stored).toMatchObject({ attempt: 1, lateDays: 0 })
    expect(await readReceipt(stores.read, stored.receipt.no)).toEqual(stored.receipt)
    expect(Object.keys(await readReceipt(stores.read, stored.receipt.no)).sort()).toEqual(['at', 'digest', 'ledger', 'no'])
    expect([await count('submission'), await count('answer'), await count('evaluation'), await count('mark'), await count('ledger_entry'), await count('outbox')]).toEqual([1, 3, 3, 3, 1, 1])
    expect(await totalOf()).toMatchObject({ earnedMilli: 6000, maxMilli: 6000, totalMilli: 6000 })
  })

  it('is covered by its entry: digests of its rows, and the marks as the ledger adds them up', async () => {
    await make()
    const { submissionId, receipt } = await submit(0, 'key-00000001')
    const entry = await stores.read.selectFrom('ledger_entry').selectAll().where('chain_id', '=', receipt.ledger.chain).where('seq', '=', receipt.ledger.seq).executeTakeFirstOrThrow()
    const facts = JSON.parse(entry.facts_json) as { covers: Record<string, Record<string, string>>, marks: { step: string, after: number }[] }
    const row = await stores.read.selectFrom('submission').selectAll().where('id', '=', submissionId).executeTakeFirstOrThrow()
    const marks = await stores.read.selectFrom('mark').selectAll().where('submission_id', '=', submissionId).execute()
    expect(facts.covers.submission).toEqual(submissionDigest(row))
    expect(facts.covers.marks).toEqual(marksDigest(marks))
    expect(facts.covers.marks).not.toEqual(marksDigest(marks.map(mark => mark.step_key === 'rate' ? { ...mark, points_milli: mark.points_milli - 1 } : mark)))
    expect(Object.fromEntries(facts.marks.map(mark => [mark.step, mark.after]))).toEqual(Object.fromEntries(marks.map(mark => [mark.step_key, mark.points_milli])))
    expect(receipt.digest).toBe(entry.digest.toString('hex'))
  })

  it('R6: a double click is one submission with one receipt, one after the other or at the same time', async () => {
    await make()
    const [first, second] = await Promise.all([submit(0, 'key-00000001'), submit(0, 'key-00000001')])
    const third = await submit(0, 'key-00000001')
    expect([second, third]).toEqual([first, first])
    expect([await count('submission'), await count('outbox'), await count('ledger_entry')]).toEqual([1, 1, 1])
  })

  it('R6: a retry gets the first answer also when the attempts are used and the lab has closed since', async () => {
    await make({ attempts: 1 })
    const first = await submit(0, 'key-00000001')
    expect(await submit(0, 'key-00000001', undefined, Date.parse('2027-01-01T00:00:00Z'))).toEqual(first)
    expect(await codeOf(submit(0, 'key-00000002'))).toBe('attempts_used')
    expect(await count('submission')).toBe(1)
  })

  it('R6: another body under the same key is refused and nothing is stored of it', async () => {
    await make()
    await submit(0, 'key-00000001')
    expect(await codeOf(submit(0, 'key-00000001', { rate: '1 K/km' }))).toBe('request_key_reused')
    expect([await count('submission'), await count('mark')]).toEqual([1, 3])
  })

  it('R6: 32 clients at once, each sent twice, are 32 submissions in an unbroken order', async () => {
    await make({ students: 32 })
    const answers = await Promise.all(course.students.flatMap((_, no) => [submit(no, `key-of-student-${no}`), submit(no, `key-of-student-${no}`)]))
    expect(new Set(answers.map(answer => answer.receipt.no)).size).toBe(32)
    const rows = await stores.read.selectFrom('submission').select(['seq', 'ledger_seq']).orderBy('seq').execute()
    expect(rows.map(row => row.seq)).toEqual(Array.from({ length: 32 }, (_, at) => at + 1))
    expect(rows.map(row => row.ledger_seq)).toEqual(rows.map(row => row.seq))
    expect([await count('mark'), await count('evaluation')]).toEqual([96, 96])
  })

  it('two tabs with two keys and one attempt left: one is stored, the other is told so', async () => {
    await make({ attempts: 1 })
    const codes = await Promise.all([codeOf(submit(0, 'key-of-tab-one')), codeOf(submit(0, 'key-of-tab-two'))])
    expect(codes.sort()).toEqual(['attempts_used', 'done'])
    expect(await count('submission')).toBe(1)
  })

  it('is refused without a trace when nothing was typed, for a foreign share, for an unknown step', async () => {
    await make({ students: 2 })
    expect(await codeOf(submit(0, 'key-00000001', { rate: '  ' }))).toBe('nothing_to_submit')
    expect(await codeOf(submit(0, 'key-00000002', { other: '1' }))).toBe('invalid')
    const { personId, membershipId } = course.students[0]!
    const foreign = submitLab(stores, judging, { personId, membershipId, shareId: 'share-1', answers: { rate: '1' }, claimedSentAt: null, request: { key: 'key-00000003', route: 'r', bodySha256: bodyDigest(1) } }, onTime)
    expect(await codeOf(foreign)).toBe('not_found')
    expect([await count('submission'), await count('request_key'), await count('ledger_entry')]).toEqual([0, 0, 0])
  })

  it('is refused before the lab opens and once it is withdrawn', async () => {
    await make()
    expect(await codeOf(submit(0, 'key-00000001', undefined, Date.parse('2026-10-12T12:59:59.999Z')))).toBe('lab_not_open')
    await stores.write(trx => trx.updateTable('posting').set({ state: 'withdrawn', version: 2 }).execute())
    expect(await codeOf(submit(0, 'key-00000002'))).toBe('lab_withdrawn')
    expect(await count('submission')).toBe(0)
  })

  it('marks an unreadable value and a value of another kind with 0 and its reason, and the rest as ever', async () => {
    await make()
    await submit(0, 'key-00000001', { ...right('share-0'), rate: 'about six', lifted: '5 hPa' })
    const answers = await stores.read.selectFrom('answer').innerJoin('mark', join => join.onRef('mark.submission_id', '=', 'answer.submission_id').onRef('mark.step_key', '=', 'answer.step_key')).select(['answer.step_key', 'reading', 'points_milli']).execute()
    expect(Object.fromEntries(answers.map(row => [row.step_key, [row.reading, row.points_milli]]))).toEqual({ rate: ['unreadable', 0], lifted: ['wrong_dimension', 0], theta: ['ok', 1000] })
  })
})

describe('the ground under a submission', () => {
  const moveOnce = (times: number, change: (at: number) => Promise<unknown>): Judging => {
    let calls = 0
    return { reference, loadShare: async (shareId) => {
      calls++
      if (calls <= times) await change(calls)
      return course.loaded(shareId)
    } }
  }

  it('is read again inside: a due time that moved while judging decides the lateness', async () => {
    await make()
    const late = Date.parse('2026-10-16T23:00:00Z')
    judging = moveOnce(1, () => stores.write(trx => trx.insertInto('allowance').values({ id: 'a-1', posting_id: 'posting-1', membership_id: 'm-0', due_at: late + 1, reason: 'dead line', by_actor_id: 'm-lead', seq: 1 }).execute()))
    expect(await submit(0, 'key-00000001', undefined, late)).toMatchObject({ lateDays: 0 })
  })

  it('that moves at every judging is given up after three, with nothing stored', async () => {
    await make()
    judging = moveOnce(99, at => stores.write(trx => trx.updateTable('posting').set({ version: at + 1 }).execute()))
    expect(await codeOf(submit(0, 'key-00000001'))).toBe('changed_meanwhile')
    expect([await count('submission'), await count('request_key')]).toEqual([0, 0])
  })

  it('that is withdrawn while judging refuses', async () => {
    await make()
    judging = moveOnce(1, () => stores.write(trx => trx.updateTable('posting').set({ state: 'withdrawn', version: 2 }).execute()))
    expect(await codeOf(submit(0, 'key-00000001'))).toBe('lab_withdrawn')
  })
})

describe('lateness', () => {
  const allow = (untilLocal: string) => stores.write(trx => trx.insertInto('allowance').values({ id: `a-${untilLocal}`, posting_id: 'posting-1', membership_id: 'm-0', due_at: Date.parse(untilLocal), reason: 'ill', by_actor_id: 'm-lead', seq: 1 }).execute())

  it('K1: counts from the personal due, once: due Fri 17:00, extension Sun 17:00, in Sun 20:00 at 10 % of the maximum', async () => {
    await make()
    await allow('2026-10-18T22:00:00Z')
    expect(await submit(0, 'key-00000001', undefined, Date.parse('2026-10-19T01:00:00Z'))).toMatchObject({ lateDays: 1 })
    expect(await totalOf()).toMatchObject({ earnedMilli: 6000, totalMilli: 5400 })
  })

  it('K2: 20 % of what was earned and of the maximum are two rules', async () => {
    await make({ lateRule: { kind: 'of_earned', percent: 20, closesAfterDays: 7 } })
    const { lifted: _left, ...some } = right('share-0')
    await submit(0, 'key-00000001', some, Date.parse('2026-10-17T01:00:00Z'))
    expect(await totalOf()).toMatchObject({ earnedMilli: 4000, totalMilli: 3200 })
  })

  it('K3: the best attempt is chosen after lateness', async () => {
    await make({ lateRule: { kind: 'of_maximum', percent: 50, closesAfterDays: 7 } })
    const { theta: _left, ...some } = right('share-0')
    await submit(0, 'key-00000001', some)
    await submit(0, 'key-00000002', undefined, Date.parse('2026-10-17T01:00:00Z'))
    expect(await totalOf()).toMatchObject({ attempt: 1, totalMilli: 5000 })
  })

  it('K5: due 23:59 is on time through 23:59:59.999 and late a millisecond later', async () => {
    await make({ times: { ...chicago, due: '2026-10-16T23:59' } })
    const lastInstant = Date.parse('2026-10-17T04:59:59.999Z')
    expect(await submit(0, 'key-00000001', undefined, lastInstant)).toMatchObject({ lateDays: 0 })
    expect(await submit(0, 'key-00000002', undefined, lastInstant + 1)).toMatchObject({ lateDays: 1 })
  })

  it('K6: the device’s time is kept as a claim, and the server’s decides', async () => {
    await make({ times: { ...chicago, due: '2026-10-16T23:59' } })
    const claimed = Date.parse('2026-10-17T04:50:00Z')
    expect(await submit(0, 'key-00000001', undefined, Date.parse('2026-10-17T05:10:00Z'), claimed)).toMatchObject({ lateDays: 1 })
    expect(await stores.read.selectFrom('submission').select(['claimed_sent_at', 'late_reason']).executeTakeFirst()).toEqual({ claimed_sent_at: claimed, late_reason: 'late' })
  })

  it('K8: late days are dates of the local calendar: 24 h 59 min over the end of summer time is one day', async () => {
    await make({ times: { zone: 'Europe/Berlin', opens: '2026-10-12T08:00', due: '2026-10-24T23:59' } })
    const in2458 = Date.parse('2026-10-25T22:58:00Z') // Sun 23:58 in Berlin
    expect(in2458 - Date.parse('2026-10-24T21:59:00Z')).toBe(24 * 3_600_000 + 59 * 60_000)
    expect(await submit(0, 'key-00000001', undefined, in2458)).toMatchObject({ lateDays: 1 })
    expect(await submit(0, 'key-00000002', undefined, Date.parse('2026-10-25T23:00:00Z'))).toMatchObject({ lateDays: 2 })
  })

  it('closes at the end of its closing day, not a millisecond sooner', async () => {
    await make({ lateRule: { kind: 'open', closesAfterDays: 2 } })
    const closes = Date.parse('2026-10-18T22:00:59.999Z')
    expect(await submit(0, 'key-00000001', undefined, closes)).toMatchObject({ lateDays: 2 })
    expect(await codeOf(submit(0, 'key-00000002', undefined, closes + 1))).toBe('lab_closed')
  })

  it('is kept without a closing day where late work earns nothing', async () => {
    await make({ lateRule: { kind: 'none' } })
    expect(await submit(0, 'key-00000001', undefined, Date.parse('2026-12-01T00:00:00Z'))).toMatchObject({ lateDays: 46 })
    expect(await totalOf()).toMatchObject({ earnedMilli: 6000, totalMilli: 0 })
  })

  it('R9: order comes from the sequence when the clock runs backwards', async () => {
    await make()
    await submit(0, 'key-00000001', undefined, onTime)
    await submit(0, 'key-00000002', undefined, onTime - 3_600_000)
    expect((await stores.read.selectFrom('submission').select(['attempt', 'seq']).orderBy('seq').execute())).toEqual([{ attempt: 1, seq: 1 }, { attempt: 2, seq: 2 }])
  })
})
