import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { DomainError } from '#shared/errors'
import type { LateRule } from '#shared/schemas/lab'
import type { LateWorkWay, RepairBody } from '#shared/schemas/repairs'
import type { OpenDatabase } from '../../../server/db/open'
import { auditLedger } from '../../../server/domain/ledger/auditLedger'
import { classView } from '../../../server/domain/marking/classView'
import { myCourseMarks } from '../../../server/domain/marking/myCourseMarks'
import { releaseMarks } from '../../../server/domain/marking/releaseMarks'
import { submissionMarks } from '../../../server/domain/marking/submissionMarks'
import type { Reference } from '../../../server/domain/marking/reference'
import type { Acting } from '../../../server/domain/people/actor'
import { acceptLateWork } from '../../../server/domain/repairs/acceptLateWork'
import { describeMember } from '../../../server/domain/repairs/describeMember'
import { repairMember } from '../../../server/domain/repairs/repairMember'
import { readWork } from '../../../server/domain/submissions/readWork'
import type { Judging } from '../../../server/domain/submissions/submitLab'
import { composeMail } from '../../../server/mail/composeMail'
import { openTemporary } from '../../fixtures/openTemporary'
import { referenceIn } from '../../fixtures/reference'
import { handIn, rightAnswers } from '../../fixtures/submitting'
import { workingCourse, type LabTimes, type WorkingCourse } from '../../fixtures/workingCourse'

const chicago: LabTimes = { zone: 'America/Chicago', opens: '2026-10-12T08:00', due: '2026-10-16T17:00' } // a Friday
const tenOfMaximum: LateRule = { kind: 'of_maximum', percent: 10, closesAfterDays: 7 }
const wednesday = Date.parse('2026-10-14T15:00:00Z')
const later = Date.parse('2026-10-30T15:00:00Z')

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
  course = await workingCourse(stores, { students: 2, times: chicago, lateRule: tenOfMaximum, ...given })
  judging = { reference, loadShare: async shareId => course.loaded(shareId) }
}
const asked = { actorId: 'm-lead', once: null }
const repair = (body: RepairBody, at = wednesday, memberId = 'm-0') => repairMember(stores, { ...asked, courseId: 'course-1', memberId, body }, at)
const accept = (submissionId: string, accepts: LateWorkWay, at = later) => acceptLateWork(stores, { ...asked, courseId: 'course-1', memberId: 'm-0', body: { submissionId, accepts, reason: 'The line of the halls was down' } }, at)
const submit = (key: string, at: number, given: { answers?: Record<string, string>, claimedSentAt?: number } = {}) => handIn(stores, judging, course, { no: 0, key, at, ...given })
const lead: Acting = { actorId: 'm-lead', role: 'lead', courseId: 'course-1', sectionIds: [] }
const page = async (at = later) => describeMember(stores.read, { courseId: 'course-1', memberId: 'm-0', acting: lead }, at)
const lab = async (at = later) => (await page(at)).labs[0]!
const mine = (at = later) => myCourseMarks(stores.read, { courseId: 'course-1', membershipId: 'm-0' }, at)
const release = () => releaseMarks(stores, { actorId: 'm-lead', postingId: 'posting-1', seenVersion: 1 }, later)
const codeOf = (promise: Promise<unknown>) => promise.then(() => 'done', (error: unknown) => error instanceof DomainError ? error.code : Promise.reject(error))
const reason = 'A secret reason'

describe('an extension', () => {
  it('K1: due Fri 17:00, extended to Sun 17:00, in Sun 20:00 at 10 % of the maximum: one day off, once', async () => {
    await make()
    await repair({ kind: 'extension', labId: 'lab-1', dueLocal: '2026-10-18T17:00', reason })
    expect(await submit('key-00000001', Date.parse('2026-10-19T01:00:00Z'))).toMatchObject({ lateDays: 1 })
    expect(await lab()).toMatchObject({ dueFrom: 'extension', dueLocal: '2026-10-18T17:00', totalMilli: 5400, maxMilli: 6000 })
    const classmate = await handIn(stores, judging, course, { no: 1, key: 'key-00000002', at: Date.parse('2026-10-19T01:00:00Z') })
    expect(classmate.lateDays).toBe(3)
  })

  it('K5: a time that ends at 23:59 lasts through 23:59:59.999, an own one too', async () => {
    await make()
    await repair({ kind: 'extension', labId: 'lab-1', dueLocal: '2026-10-18T23:59', reason })
    const last = Date.parse('2026-10-19T04:59:59.999Z')
    expect([await submit('key-00000001', last), await submit('key-00000002', last + 1)].map(one => one.lateDays)).toEqual([0, 1])
  })

  it('K7: in the skipped hour it falls after the gap, in the doubled hour it is the later one, and who gave it is told', async () => {
    await make({ times: { zone: 'America/Chicago', opens: '2026-03-02T08:00', due: '2026-03-06T17:00' } })
    const at = Date.parse('2026-03-04T15:00:00Z')
    expect((await repair({ kind: 'extension', labId: 'lab-1', dueLocal: '2026-03-08T02:30', reason }, at)).told).toEqual(['The clocks skip 02:30 on 2026-03-08: 03:30 is taken.'])
    expect((await lab(at)).dueAt).toBe('2026-03-08T08:30:59.999Z')
    expect((await repair({ kind: 'extension', labId: 'lab-1', dueLocal: '2026-11-01T01:30', reason }, at)).told[0]).toContain('twice')
    expect((await lab(at)).dueAt).toBe('2026-11-01T07:30:59.999Z')
  })

  it('K8: late days after it are dates of the calendar: due Sat 23:59 Berlin, in Sun 23:58 after the clocks changed, is one day', async () => {
    await make({ times: { zone: 'Europe/Berlin', opens: '2026-10-12T08:00', due: '2026-10-23T12:00' } })
    await repair({ kind: 'extension', labId: 'lab-1', dueLocal: '2026-10-24T23:59', reason })
    expect((await submit('key-00000001', Date.parse('2026-10-25T22:58:00Z'))).lateDays).toBe(1)
    expect((await submit('key-00000002', Date.parse('2026-10-25T23:00:00Z'))).lateDays).toBe(2)
  })

  it('that takes time away is refused, as is one for nobody of this course', async () => {
    await make()
    expect(await codeOf(repair({ kind: 'extension', labId: 'lab-1', dueLocal: '2026-10-16T17:00', reason }))).toBe('dates_invalid')
    expect(await codeOf(repair({ kind: 'extension', labId: 'lab-1', dueLocal: '2026-10-18T17:00', reason }, wednesday, 'm-lead'))).toBe('not_found')
    expect(await codeOf(repair({ kind: 'extension', labId: 'lab-2', dueLocal: '2026-10-18T17:00', reason }))).toBe('not_found')
    expect(await codeOf(repairMember(stores, { ...asked, courseId: 'course-2', memberId: 'm-0', body: { kind: 'extension', labId: 'lab-1', dueLocal: '2026-10-18T17:00', reason } }, wednesday))).toBe('not_found')
  })
})

describe('an accommodation', () => {
  it('K35: is an effect in days and nothing else; of section, extension and accommodation the latest counts', async () => {
    await make()
    await repair({ kind: 'accommodation', extraDays: 2 })
    expect(await lab(wednesday)).toMatchObject({ dueFrom: 'accommodation', dueLocal: '2026-10-18T17:00' })
    expect(await codeOf(repair({ kind: 'extension', labId: 'lab-1', dueLocal: '2026-10-17T17:00', reason }))).toBe('dates_invalid')
    await repair({ kind: 'extension', labId: 'lab-1', dueLocal: '2026-10-19T17:00', reason })
    expect(await lab(wednesday)).toMatchObject({ dueFrom: 'extension', dueLocal: '2026-10-19T17:00' })
    expect(await stores.read.selectFrom('repair').select(['kind', 'extra_days', 'reason_digest']).where('kind', '=', 'accommodation').execute()).toEqual([{ kind: 'accommodation', extra_days: 2, reason_digest: null }])
    expect((await stores.read.selectFrom('private_body').select('body').execute()).map(row => row.body)).toEqual([reason])
  })

  it('holds from now on: what is over stays, and fewer days take nothing away', async () => {
    await make()
    await repair({ kind: 'accommodation', extraDays: 2 })
    await repair({ kind: 'accommodation', extraDays: 0 })
    expect(await lab(wednesday)).toMatchObject({ dueLocal: '2026-10-18T17:00' })
    expect((await page(wednesday)).member.extraDays).toBe(0)
    await repair({ kind: 'accommodation', extraDays: 3 }, later)
    expect(await lab()).toMatchObject({ dueLocal: '2026-10-18T17:00' })
    expect(await codeOf(repair({ kind: 'accommodation', extraDays: 3 }, later))).toBe('invalid')
  })
})

describe('whether a lab counts', () => {
  it('K11: excused is not zero and leaves the denominator, missing is zero, unreleased is neither', async () => {
    await make()
    expect(await lab()).toMatchObject({ standing: 'missing' })
    expect((await page()).soFar).toEqual({ labs: 1, earnedMilli: 0, maxMilli: 6000 })
    await repair({ kind: 'excused', labId: 'lab-1', reason }, later)
    expect(await lab()).toMatchObject({ standing: 'excused' })
    expect((await mine()).soFar).toEqual({ labs: 0, earnedMilli: 0, maxMilli: 0 })
    await repair({ kind: 'counted', labId: 'lab-1', reason }, later)
    expect((await mine()).soFar).toEqual({ labs: 1, earnedMilli: 0, maxMilli: 6000 })
    expect(await codeOf(repair({ kind: 'counted', labId: 'lab-1', reason }, later))).toBe('invalid')
  })

  it('K10: what waits for staff is not counted, marks or not, until they decide', async () => {
    await make()
    const { theta: _left, ...some } = rightAnswers(course, 'share-0')
    await submit('key-00000001', wednesday, { answers: some })
    await repair({ kind: 'not_counted', labId: 'lab-1', reason }, later)
    await release()
    expect((await mine()).labs[0]).toMatchObject({ standing: 'not_counted', totalMilli: null })
    expect((await mine()).soFar.labs).toBe(0)
    await repair({ kind: 'counted', labId: 'lab-1', reason }, later)
    expect((await mine()).soFar).toEqual({ labs: 1, earnedMilli: 5000, maxMilli: 6000 })
  })
})

describe('a further attempt', () => {
  it('is one more, for this student alone', async () => {
    await make({ attempts: 1 })
    await submit('key-00000001', wednesday)
    expect(await codeOf(submit('key-00000002', wednesday))).toBe('attempts_used')
    await repair({ kind: 'attempt', labId: 'lab-1', reason })
    expect(await lab(wednesday)).toMatchObject({ attempts: 2, granted: 1 })
    expect(await readWork(stores.read, judging.loadShare, { membershipId: 'm-0', shareId: 'share-0' }, wednesday)).toMatchObject({ attempts: 2, stopped: null })
    expect(await submit('key-00000003', wednesday)).toMatchObject({ attempt: 2 })
    expect(await codeOf(submit('key-00000004', wednesday))).toBe('attempts_used')
    await handIn(stores, judging, course, { no: 1, key: 'key-00000005', at: wednesday })
    expect(await codeOf(handIn(stores, judging, course, { no: 1, key: 'key-00000006', at: wednesday }))).toBe('attempts_used')
  })

  it('is not given to whoever has seen the worked value of their data; where the lab is closed, who gives it is told', async () => {
    await make({ attempts: 1 })
    expect((await repair({ kind: 'attempt', labId: 'lab-1', reason }, later)).told[0]).toContain('closed')
    await submit('key-00000001', wednesday)
    await release()
    expect(await codeOf(repair({ kind: 'attempt', labId: 'lab-1', reason }, later + 1))).toBe('invalid')
  })
})

describe('late work', () => {
  const due2359 = { ...chicago, due: '2026-10-16T23:59' }
  const claimed = Date.parse('2026-10-17T04:50:00Z')
  const arrived = Date.parse('2026-10-17T05:10:00Z')

  it('K6: sent offline 23:50, arrived 00:10: late by rule, a claim for staff, and one act accepts it', async () => {
    await make({ times: due2359 })
    const { submissionId } = await submit('key-00000001', arrived, { claimedSentAt: claimed })
    expect((await lab()).made[0]).toMatchObject({ lateDays: 1, claimedSentAt: new Date(claimed).toISOString(), accepts: ['claim'], totalMilli: 5400 })
    expect(await accept(submissionId, 'claim')).toEqual({ told: ['The work counts as in time.'] })
    expect((await lab()).made[0]).toMatchObject({ lateDays: 0, accepts: [], isAccepted: true, totalMilli: 6000 })
    await release()
    expect(await submissionMarks(stores.read, { isStaff: false, membershipId: 'm-0' }, submissionId)).toMatchObject({ lateDays: 0, totalMilli: 6000, lateWords: 'on time, as staff accepted it' })
    expect((await classView(stores.read, 'posting-1', later)).people[0]).toMatchObject({ lateDays: 0, claimedSentAt: null })
    // What was decided at receipt stays stored (K24).
    expect(await stores.read.selectFrom('submission').select(['late_units', 'claimed_sent_at']).executeTakeFirst()).toEqual({ late_units: 1, claimed_sent_at: claimed })
    expect(await codeOf(accept(submissionId, 'claim'))).toBe('already_exists')
  })

  it('a claim that is itself late counts from the claimed time, and one that changes nothing is not accepted', async () => {
    await make({ times: due2359 })
    const first = await submit('key-00000001', Date.parse('2026-10-19T15:00:00Z'), { claimedSentAt: Date.parse('2026-10-17T15:00:00Z') })
    const second = await submit('key-00000002', Date.parse('2026-10-19T15:00:00Z'), { claimedSentAt: Date.parse('2026-10-19T14:00:00Z') })
    expect(first.lateDays).toBe(3)
    expect(await accept(first.submissionId, 'claim')).toEqual({ told: ['The work counts as 1 day late.'] })
    expect(await codeOf(accept(second.submissionId, 'claim'))).toBe('invalid')
    expect((await lab()).made.map(one => [one.lateDays, one.totalMilli])).toEqual([[1, 5400], [3, 4200]])
  })

  it('under the rule "none" work is kept, earns nothing, and counts once staff accept it', async () => {
    await make({ lateRule: { kind: 'none' } })
    const { submissionId } = await submit('key-00000001', Date.parse('2026-10-19T15:00:00Z'))
    expect((await lab()).made[0]).toMatchObject({ accepts: ['work'], totalMilli: 0 })
    expect(await codeOf(accept(submissionId, 'claim'))).toBe('invalid')
    await accept(submissionId, 'work')
    expect((await lab()).made[0]).toMatchObject({ lateDays: 3, totalMilli: 6000 })
  })

  it('an extension that comes after the work moves nothing by itself, says so, and repairs it by one act', async () => {
    await make()
    const { submissionId } = await submit('key-00000001', Date.parse('2026-10-19T15:00:00Z'))
    expect((await lab()).made[0]).toMatchObject({ lateDays: 3, accepts: [], totalMilli: 4200 })
    expect(await codeOf(accept(submissionId, 'due'))).toBe('invalid')
    const { told } = await repair({ kind: 'extension', labId: 'lab-1', dueLocal: '2026-10-18T17:00', reason }, later)
    expect(told).toEqual([expect.stringContaining('keeps its lateness')])
    expect((await lab()).made[0]).toMatchObject({ lateDays: 3, accepts: ['due'], totalMilli: 4200 })
    expect(await accept(submissionId, 'due')).toEqual({ told: ['The work counts as 1 day late.'] })
    expect((await lab()).made[0]).toMatchObject({ lateDays: 1, accepts: [], isAccepted: true, totalMilli: 5400 })
    expect((await repair({ kind: 'extension', labId: 'lab-1', dueLocal: '2026-10-18T18:00', reason }, later)).told).toEqual([])
    expect((await auditLedger(stores.read)).findings).toEqual([])
  })

  it('a claim counts from a due that moved since, and staff may take the new due without it', async () => {
    await make()
    const sent = Date.parse('2026-10-18T15:00:00Z')
    const first = await submit('key-00000001', Date.parse('2026-10-19T15:00:00Z'), { claimedSentAt: sent })
    const second = await submit('key-00000002', Date.parse('2026-10-19T15:00:00Z'), { claimedSentAt: sent })
    await repair({ kind: 'extension', labId: 'lab-1', dueLocal: '2026-10-18T17:00', reason }, later)
    expect((await lab()).made.map(one => one.accepts)).toEqual([['due', 'claim'], ['due', 'claim']])
    expect(await accept(first.submissionId, 'claim')).toEqual({ told: ['The work counts as in time.'] })
    expect(await accept(second.submissionId, 'due')).toEqual({ told: ['The work counts as 1 day late.'] })
  })

  it('under the rule "none" a due that moved past the work makes it count; one that does not reach it changes nothing', async () => {
    await make({ lateRule: { kind: 'none' } })
    const { submissionId } = await submit('key-00000001', Date.parse('2026-10-19T15:00:00Z'))
    await repair({ kind: 'extension', labId: 'lab-1', dueLocal: '2026-10-18T17:00', reason }, later)
    expect(await codeOf(accept(submissionId, 'due'))).toBe('invalid')
    await repair({ kind: 'extension', labId: 'lab-1', dueLocal: '2026-10-19T17:00', reason }, later)
    expect(await accept(submissionId, 'due')).toEqual({ told: ['The work counts as in time.'] })
    expect((await lab()).made[0]).toMatchObject({ lateDays: 0, totalMilli: 6000 })
  })

  it('of somebody else, or in time, is not accepted here, nor by whoever declared a conflict', async () => {
    await make({ times: due2359 })
    const inTime = await submit('key-00000001', wednesday)
    const other = await handIn(stores, judging, course, { no: 1, key: 'key-00000002', at: arrived, claimedSentAt: claimed })
    const own = await submit('key-00000003', arrived, { claimedSentAt: claimed })
    expect(await codeOf(accept(inTime.submissionId, 'claim'))).toBe('invalid')
    expect(await codeOf(accept(other.submissionId, 'claim'))).toBe('not_found')
    await stores.write(trx => trx.insertInto('conflict_of_interest').values({ membership_id: 'm-lead', other_id: 'm-0' }).execute())
    expect(await codeOf(accept(own.submissionId, 'claim'))).toBe('own_work')
  })
})

describe('a repair of whichever kind', () => {
  const kinds: RepairBody[] = [
    { kind: 'extension', labId: 'lab-1', dueLocal: '2026-10-18T17:00', reason }, { kind: 'accommodation', extraDays: 2 }, { kind: 'excused', labId: 'lab-1', reason },
    { kind: 'attempt', labId: 'lab-1', reason }, { kind: 'section', sectionId: 'section-b', reason },
  ]
  const nothingDone = async () => {
    for (const table of ['repair', 'allowance', 'ledger_entry', 'outbox'] as const) expect(await stores.read.selectFrom(table).selectAll().execute()).toEqual([])
    expect(await stores.read.selectFrom('membership').select('section_id').where('id', '=', 'm-0').executeTakeFirst()).toEqual({ section_id: 'section-a' })
  }
  beforeEach(async () => {
    await make()
    await stores.write(trx => trx.insertInto('section').values({ id: 'section-b', course_id: 'course-1', name: 'B' }).execute())
  })

  it.each(kinds)('$kind is not given by whoever declared a conflict of interest, and nothing of it stays', async (body) => {
    await stores.write(trx => trx.insertInto('conflict_of_interest').values({ membership_id: 'm-lead', other_id: 'm-0' }).execute())
    expect(await codeOf(repair(body))).toBe('own_work')
    await nothingDone()
    expect(await codeOf(repair(body, wednesday, 'm-1'))).toBe('done')
  })

  it.each(kinds)('$kind is given by nobody to themselves, in a role of the department either', async (body) => {
    await stores.write(async (trx) => {
      await trx.insertInto('actor').values({ id: 'r-admin', kind: 'department_role' }).execute()
      await trx.insertInto('department_role').values({ id: 'r-admin', person_id: 'p-0', pseudonym: 'admin', role: 'admin', scope_json: null, until_at: null, state: 'active', created_at: wednesday }).execute()
    })
    const by = (actorId: string, memberId: string) => codeOf(repairMember(stores, { actorId, once: null, courseId: 'course-1', memberId, body }, wednesday))
    expect([await by('r-admin', 'm-0'), await by('m-0', 'm-0')]).toEqual(['own_work', 'own_work'])
    await nothingDone()
    expect(await by('r-admin', 'm-1')).toBe('done')
  })
})

describe('what was done', () => {
  it('is read by the student with who and why, is told by mail without the reason, and the ledger covers it without the text', async () => {
    await make()
    await repair({ kind: 'extension', labId: 'lab-1', dueLocal: '2026-10-18T17:00', reason })
    await repair({ kind: 'accommodation', extraDays: 4 })
    expect((await mine()).repairs).toMatchObject([{ kind: 'accommodation', extraDays: 4, reason: null, by: 'Lena Ruiz' }, { kind: 'extension', labTitle: 'The layer above the roof', reason, by: 'Lena Ruiz' }])
    const mails = await stores.read.selectFrom('outbox').select(['template', 'to_membership_id', 'facts_json']).execute()
    expect(mails.map(mail => [mail.template, mail.to_membership_id])).toEqual([['repair', 'm-0'], ['repair', 'm-0']])
    const letters = mails.map(mail => composeMail('repair', JSON.parse(mail.facts_json), { publicUrl: 'https://labs.example.edu', tokenOf: () => '' }))
    expect(letters.map(letter => letter.subject)).toEqual(['A later due time: The layer above the roof', 'Your due times in AS 240'])
    expect(letters[0]?.text).toMatch(/18 Oct(ober)? 2026|Oct(ober)? 18/)
    expect(letters[0]?.text).toContain('https://labs.example.edu/c/course-1/marks')
    const entries = await stores.read.selectFrom('ledger_entry').select(['action', 'facts_json']).execute()
    expect(entries.map(entry => entry.action)).toEqual(['allowance.granted', 'accommodation.set'])
    expect(JSON.stringify([mails, entries])).not.toContain('secret')
    expect((await auditLedger(stores.read)).findings).toEqual([])
  })

  it('a repetition under the same key is done once', async () => {
    await make({ attempts: 1 })
    const once = { personId: 'p-lead', key: 'key-00000009', route: 'POST /repairs', bodySha256: Buffer.alloc(32), now: wednesday }
    const ask = () => repairMember(stores, { actorId: 'm-lead', once, courseId: 'course-1', memberId: 'm-0', body: { kind: 'attempt', labId: 'lab-1', reason } }, wednesday)
    await Promise.all([ask(), ask()])
    expect((await lab(wednesday)).granted).toBe(1)
  })
})
