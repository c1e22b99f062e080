import { randomUUID } from 'node:crypto'
import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { DomainError } from '#shared/errors'
import type { RulingBody } from '#shared/schemas/disputes'
import type { OpenDatabase } from '../../../server/db/open'
import { attachFile, disputeFile, mostDisputeFiles } from '../../../server/domain/disputes/attachFile'
import { describeDispute } from '../../../server/domain/disputes/describeDispute'
import { listDisputes } from '../../../server/domain/disputes/listDisputes'
import { openDispute } from '../../../server/domain/disputes/openDispute'
import { ruleDispute } from '../../../server/domain/disputes/ruleDispute'
import { takeDispute, withdrawDispute } from '../../../server/domain/disputes/takeDispute'
import { auditLedger } from '../../../server/domain/ledger/auditLedger'
import { releaseMarks } from '../../../server/domain/marking/releaseMarks'
import type { Judging } from '../../../server/domain/submissions/submitLab'
import { openFileStore } from '../../../server/files/store'
import { addTas } from '../../fixtures/courseWithTas'
import { openTemporary } from '../../fixtures/openTemporary'
import { referenceIn } from '../../fixtures/reference'
import { handIn, rateOf, rightAnswers, bodyDigest } from '../../fixtures/submitting'
import { workingCourse, type WorkingCourse } from '../../fixtures/workingCourse'

const onTime = Date.parse('2026-10-15T20:00:00Z')
const released = Date.parse('2026-10-19T15:00:00Z')
const later = Date.parse('2026-10-20T15:00:00Z')
let stores: OpenDatabase & { remove: () => Promise<void> }
let course: WorkingCourse
let judging: Judging
let submissions: string[]

beforeEach(async () => {
  stores = await openTemporary()
  const reference = await referenceIn(stores.write)
  course = await workingCourse(stores, { students: 6, times: { zone: 'America/Chicago', opens: '2026-10-12T08:00', due: '2026-10-16T17:00' }, lateRule: { kind: 'none' } })
  await addTas(stores, ['ann', 'bo'])
  judging = { reference, loadShare: async shareId => course.loaded(shareId) }
  submissions = []
  // 0 works rightly; 1 and 2 turn the sign; 3 is somewhere else; 4 turns the sign as well.
  for (const no of [0, 1, 2, 3, 4]) {
    const answers = rightAnswers(course, `share-${no}`)
    if ([1, 2, 4].includes(no)) answers.rate = `${(-rateOf(course, `share-${no}`)).toFixed(2)} K/km`
    if (no === 3) answers.rate = '17.3 K/km'
    submissions.push((await handIn(stores, judging, course, { no, key: `key-0000000${no}`, at: onTime, answers })).submissionId)
  }
})
afterEach(() => stores.remove())

const codeOf = (promise: Promise<unknown>) => promise.then(() => 'done', (error: unknown) => error instanceof DomainError ? error.code : Promise.reject(error))
const release = () => releaseMarks(stores, { actorId: 'm-lead', postingId: 'posting-1', seenVersion: 1 }, released)
const request = (personId: string, body: unknown) => ({ personId, key: randomUUID(), route: 'POST /x', bodySha256: bodyDigest(body), now: later })
const object = (no: number, stepKey = 'rate', at = later) => openDispute(stores, { membershipId: `m-${no}`, submissionId: submissions[no]!, body: { stepKey, reason: 'The handout gives dT/dz.' }, request: request(`p-${no}`, stepKey) }, at)
const ruler = (name: string, role = 'ta') => ({ actorId: `m-${name}`, personId: `p-${name}`, role })
const rule = (disputeId: string, by: ReturnType<typeof ruler>, body: RulingBody, seenVersion = 1) =>
  ruleDispute(stores, judging.reference, { disputeId, ruler: by, seenVersion, body, request: request(by.personId, body) }, later)
const points = async (no: number, step = 'rate') => (await stores.read.selectFrom('mark_current').select('points_milli').where('submission_id', '=', submissions[no]!).where('step_key', '=', step).executeTakeFirstOrThrow()).points_milli
const mails = async (template: string) => (await stores.read.selectFrom('outbox').select('to_membership_id').where('template', '=', template).orderBy('to_membership_id').execute()).map(row => row.to_membership_id)

describe('objecting', () => {
  it('waits for release, ends with its window, and is one at a time for a step', async () => {
    expect(await codeOf(object(1))).toBe('not_released')
    await release()
    expect(await codeOf(object(1, 'rate', released + 15 * 86_400_000))).toBe('dispute_window_over')
    expect(await codeOf(object(1))).toBe('done')
    expect(await codeOf(object(1))).toBe('dispute_exists')
    expect(await codeOf(openDispute(stores, { membershipId: 'm-0', submissionId: submissions[1]!, body: { stepKey: 'rate', reason: 'not mine' }, request: request('p-0', 1) }, later))).toBe('not_found')
    expect(await mails('dispute_opened')).toEqual(['m-ann', 'm-bo'])
  })

  it('takes a few files as evidence, and no more', async () => {
    await release()
    const { disputeId } = await object(1)
    const folder = mkdtempSync(join(tmpdir(), 'tetherhouse-files-'))
    const files = openFileStore(folder)
    const attach = (no: number) => attachFile(stores, files, { disputeId, actorId: 'm-1', name: `page ${no}.png`, body: (async function* () { yield Buffer.from(`page ${no}`) })(), request: request('p-1', no) }, later)
    for (let no = 0; no < mostDisputeFiles; no++) expect((await attach(no)).size).toBe(6)
    expect(await codeOf(attach(99))).toBe('invalid')
    expect(await disputeFile(stores, { disputeId, digest: (await stores.read.selectFrom('work_file').select('digest').limit(1).executeTakeFirstOrThrow()).digest.toString('hex') })).toMatchObject({ size: 6 })
    expect(await codeOf(disputeFile(stores, { disputeId: 'another', digest: 'ab'.repeat(32) }))).toBe('not_found')
    rmSync(folder, { recursive: true })
  })

  it('keeps the same photograph from two students as each one\'s own, under the name that each gave', async () => {
    await release()
    const folder = mkdtempSync(join(tmpdir(), 'tetherhouse-files-'))
    const files = openFileStore(folder)
    const asked: string[] = []
    let digest = ''
    for (const no of [1, 2]) {
      const { disputeId } = await object(no)
      digest = (await attachFile(stores, files, { disputeId, actorId: `m-${no}`, name: `page of ${no}.png`, body: (async function* () { yield Buffer.from('the same page') })(), request: request(`p-${no}`, no) }, later)).digest
      asked.push(disputeId)
    }
    expect(await Promise.all(asked.map(async disputeId => (await disputeFile(stores, { disputeId, digest })).name))).toEqual(['page of 1.png', 'page of 2.png'])
    expect(await stores.read.selectFrom('work_file').select('about_membership_id').orderBy('about_membership_id').execute()).toEqual([{ about_membership_id: 'm-1' }, { about_membership_id: 'm-2' }])
    rmSync(folder, { recursive: true })
  })

  it('can be taken back by its student alone, and only while nobody ruled', async () => {
    await release()
    const { disputeId } = await object(1)
    expect(await codeOf(withdrawDispute(stores, { disputeId, membershipId: 'm-2' }, later))).toBe('not_found')
    expect(await codeOf(withdrawDispute(stores, { disputeId, membershipId: 'm-1' }, later))).toBe('done')
    expect(await codeOf(rule(disputeId, ruler('ann'), { kind: 'uphold', reason: 'no' }, 2))).toBe('dispute_closed')
  })

  it('shows a student neither like cases nor options, and a TA the evidence with whom a ruling would move', async () => {
    await release()
    const { disputeId } = await object(1)
    const seen = await describeDispute(stores.read, judging, ruler('1', 'student'), disputeId)
    expect([seen.options, seen.earlierRulings]).toEqual([[], []])
    const evidence = await describeDispute(stores.read, judging, ruler('ann'), disputeId)
    expect(evidence.step.slip?.key).toBeDefined()
    expect(evidence.options[0]?.cases.map(each => each.submissionId)).toEqual([submissions[1], submissions[2], submissions[4]])
    expect(evidence.notes[0]?.text).toBe('The handout gives dT/dz.')
    expect((await listDisputes(stores.read, { actorId: 'm-ann', role: 'ta', sectionIds: [] }, 'course-1'))).toEqual([])
    expect((await listDisputes(stores.read, { actorId: 'm-ann', role: 'ta', sectionIds: ['section-a'] }, 'course-1'))).toHaveLength(1)
    expect((await listDisputes(stores.read, { actorId: 'm-2', role: 'student', sectionIds: ['section-a'] }, 'course-1'))).toEqual([])
  })
})

describe('ruling', () => {
  beforeEach(release)

  it('of one who saw an older state is refused, and they are told who was first', async () => {
    const { disputeId } = await object(1)
    await takeDispute(stores, { disputeId, ruler: ruler('bo'), seenVersion: 1, giveBack: false }, later)
    await takeDispute(stores, { disputeId, ruler: ruler('bo'), seenVersion: 2, giveBack: true }, later)
    const refused = await rule(disputeId, ruler('ann'), { kind: 'uphold', reason: 'As asked.' }).catch((error: unknown) => error instanceof DomainError ? { code: error.code, by: error.facts.by, version: error.facts.version } : error)
    expect(refused).toEqual({ code: 'changed_meanwhile', by: 'TA bo', version: 3 })
  })

  it('keeps its reason where it can be erased: gone there, it is gone everywhere, and the ledger stays whole', async () => {
    const { disputeId } = await object(1)
    await rule(disputeId, ruler('ann'), { kind: 'change', pointsMilli: 1000, reason: 'Mira read the plot with care.' })
    const seen = async () => {
      const { rulings, history } = await describeDispute(stores.read, judging, ruler('1', 'student'), disputeId)
      return [rulings[0]?.reason, history.at(-1)?.reason]
    }
    expect(await seen()).toEqual(['Mira read the plot with care.', 'Mira read the plot with care.'])
    expect(JSON.stringify([await stores.read.selectFrom('ruling').selectAll().execute(), await stores.read.selectFrom('ledger_entry').selectAll().execute()])).not.toContain('Mira')
    expect(await stores.write(trx => trx.deleteFrom('private_body').where('body', '=', 'Mira read the plot with care.').where('about_membership_id', '=', 'm-1').executeTakeFirstOrThrow())).toMatchObject({ numDeletedRows: 1n })
    expect(await seen()).toEqual(['This text was erased.', 'This text was erased.'])
    expect((await auditLedger(stores.read)).findings).toEqual([])
  })

  it('upholding moves no mark and tells the student', async () => {
    const { disputeId } = await object(1)
    expect(await rule(disputeId, ruler('ann'), { kind: 'uphold', reason: 'The ask defines the sign.' })).toMatchObject({ state: 'ruled', changed: 0 })
    expect(await points(1)).toBe(0)
    expect(await mails('dispute_ruled')).toEqual(['m-1'])
  })

  it('changing moves this student alone, never down and never above the maximum', async () => {
    const { disputeId } = await object(3)
    expect(await codeOf(rule(disputeId, ruler('ann'), { kind: 'change', reason: 'x', pointsMilli: 3001 }))).toBe('points_out_of_range')
    const { disputeId: right } = await object(0)
    expect(await codeOf(rule(right, ruler('ann'), { kind: 'change', reason: 'x', pointsMilli: 1000 }))).toBe('points_out_of_range')
    await rule(disputeId, ruler('ann'), { kind: 'change', reason: 'The working is sound.', pointsMilli: 2000 })
    expect(await Promise.all([0, 1, 2, 3, 4].map(no => points(no)))).toEqual([3000, 0, 0, 2000, 0])
    expect((await auditLedger(stores.read)).findings).toEqual([])
  })

  it('accepting a reading raises all who did the same, asked or not, and settles what they asked', async () => {
    const { disputeId } = await object(1)
    const { disputeId: other } = await object(4)
    const { options } = await describeDispute(stores.read, judging, ruler('ann'), disputeId)
    const { kind, key } = options[0]!
    expect(await rule(disputeId, ruler('ann'), { kind: 'accept', reason: 'Both were taught.', accept: { kind, key } })).toMatchObject({ changed: 3 })
    expect(await Promise.all([0, 1, 2, 3, 4].map(no => points(no)))).toEqual([3000, 3000, 3000, 0, 3000])
    expect(await mails('dispute_ruled')).toEqual(['m-1', 'm-1', 'm-2', 'm-4'].filter((id, at, all) => all.indexOf(id) === at || id !== 'm-1'))
    const states = await stores.read.selectFrom('dispute').select(['id', 'state']).execute()
    expect(new Map(states.map(row => [row.id, row.state]))).toEqual(new Map([[disputeId, 'ruled'], [other, 'closed']]))
    expect((await auditLedger(stores.read)).findings).toEqual([])
  })

  it('K21: what was accepted once is accepted from those who hand in later too', async () => {
    const { disputeId } = await object(1)
    const { options } = await describeDispute(stores.read, judging, ruler('ann'), disputeId)
    await rule(disputeId, ruler('ann'), { kind: 'accept', reason: 'Both were taught.', accept: { kind: options[0]!.kind, key: options[0]!.key } })
    await stores.write(trx => trx.insertInto('allowance').values({ id: 'a-1', posting_id: 'posting-1', membership_id: 'm-5', due_at: later + 86_400_000, reason: 'ill', by_actor_id: 'm-lead', seq: 1 }).execute())
    const again = await handIn(stores, judging, course, { no: 5, key: 'key-10000005', at: later + 1000, answers: { ...rightAnswers(course, 'share-5'), rate: `${(-rateOf(course, 'share-5')).toFixed(2)} K/km` } })
    const mark = await stores.read.selectFrom('mark_current').select('points_milli').where('submission_id', '=', again.submissionId).where('step_key', '=', 'rate').executeTakeFirstOrThrow()
    expect(mark.points_milli).toBe(3000)
  })

  it('a fault goes to the instructor, and from there only the instructor rules', async () => {
    const { disputeId } = await object(3)
    expect(await rule(disputeId, ruler('ann'), { kind: 'fault', reason: 'The reference drops a row.' })).toMatchObject({ state: 'appealed' })
    expect(await mails('dispute_opened')).toContain('m-lead')
    expect(await codeOf(rule(disputeId, ruler('bo'), { kind: 'uphold', reason: 'no' }, 2))).toBe('goes_to_instructor')
    expect(await rule(disputeId, ruler('lead', 'lead'), { kind: 'uphold', reason: 'The row is flagged.' }, 2)).toMatchObject({ state: 'closed' })
  })

  it('of two TAs at once one rules and the other is told by whom', async () => {
    const { disputeId } = await object(1)
    const results = await Promise.allSettled([rule(disputeId, ruler('ann'), { kind: 'uphold', reason: 'a' }), rule(disputeId, ruler('bo'), { kind: 'change', reason: 'b', pointsMilli: 3000 })])
    expect(results.filter(result => result.status === 'fulfilled')).toHaveLength(1)
    const refused = results.find(result => result.status === 'rejected')
    expect(refused?.reason).toMatchObject({ code: 'already_ruled' })
    expect(['TA ann', 'TA bo']).toContain((refused?.reason as DomainError).facts.by)
    expect(await stores.read.selectFrom('ruling').select('id').execute()).toHaveLength(1)
  })

  it('a dispute that somebody took is theirs until the time is over', async () => {
    const { disputeId } = await object(1)
    const taken = await takeDispute(stores, { disputeId, ruler: ruler('ann'), seenVersion: 1, giveBack: false }, later)
    expect(await codeOf(takeDispute(stores, { disputeId, ruler: ruler('bo'), seenVersion: taken.version, giveBack: false }, later))).toBe('taken_by_another')
    expect(await codeOf(rule(disputeId, ruler('bo'), { kind: 'uphold', reason: 'b' }, taken.version))).toBe('taken_by_another')
    expect(await codeOf(takeDispute(stores, { disputeId, ruler: ruler('bo'), seenVersion: taken.version, giveBack: false }, later + 46 * 60_000))).toBe('done')
  })

  it('nobody rules on their own work, in whatever role, and no TA on a mark they gave by hand', async () => {
    const { disputeId } = await object(1)
    expect(await codeOf(rule(disputeId, { actorId: 'm-bo', personId: 'p-1', role: 'ta' }, { kind: 'uphold', reason: 'x' }))).toBe('own_work')
    await stores.write(trx => trx.insertInto('conflict_of_interest').values({ membership_id: 'm-bo', other_id: 'm-1' }).execute())
    expect(await codeOf(rule(disputeId, ruler('bo'), { kind: 'uphold', reason: 'x' }))).toBe('own_work')
    await rule(disputeId, ruler('ann'), { kind: 'change', reason: 'by hand', pointsMilli: 1000 })
    const { disputeId: again } = await object(1)
    expect(await codeOf(rule(again, ruler('ann'), { kind: 'change', reason: 'more', pointsMilli: 2000 }))).toBe('goes_to_instructor')
    expect(await codeOf(rule(again, ruler('lead', 'lead'), { kind: 'change', reason: 'more', pointsMilli: 2000 }))).toBe('done')
  })

  it('a repeated request is one ruling', async () => {
    const { disputeId } = await object(1)
    const body: RulingBody = { kind: 'uphold', reason: 'The ask defines the sign.' }
    const one = { disputeId, ruler: ruler('ann'), seenVersion: 1, body, request: request('p-ann', body) }
    expect(await ruleDispute(stores, judging.reference, one, later)).toEqual(await ruleDispute(stores, judging.reference, one, later))
  })
})
