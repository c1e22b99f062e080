import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { DomainError } from '#shared/errors'
import type { OpenDatabase } from '../../../server/db/open'
import { classView } from '../../../server/domain/marking/classView'
import { marksTable } from '../../../server/domain/marking/marksTable'
import { myMarks } from '../../../server/domain/marking/myMarks'
import { releaseMarks } from '../../../server/domain/marking/releaseMarks'
import { submissionMarks } from '../../../server/domain/marking/submissionMarks'
import { readWork } from '../../../server/domain/submissions/readWork'
import { readSubmission } from '../../../server/domain/submissions/readSubmission'
import type { Judging } from '../../../server/domain/submissions/submitLab'
import { openTemporary } from '../../fixtures/openTemporary'
import { referenceIn } from '../../fixtures/reference'
import { handIn, rateOf, rightAnswers } from '../../fixtures/submitting'
import { workingCourse, type WorkingCourse } from '../../fixtures/workingCourse'

const onTime = Date.parse('2026-10-15T20:00:00Z')
const later = Date.parse('2026-10-26T15:00:00Z')
let stores: OpenDatabase & { remove: () => Promise<void> }
let course: WorkingCourse
let judging: Judging
let submissions: string[]

beforeEach(async () => {
  stores = await openTemporary()
  const reference = await referenceIn(stores.write)
  course = await workingCourse(stores, { students: 5, times: { zone: 'America/Chicago', opens: '2026-10-12T08:00', due: '2026-10-16T17:00' }, lateRule: { kind: 'of_maximum', percent: 10, closesAfterDays: 7 } })
  judging = { reference, loadShare: async shareId => course.loaded(shareId) }
  const turned = { ...rightAnswers(course, 'share-1'), rate: `${(-rateOf(course, 'share-1')).toFixed(2)} K/km` }
  submissions = [
    (await handIn(stores, judging, course, { no: 0, key: 'key-00000000', at: onTime })).submissionId,
    (await handIn(stores, judging, course, { no: 1, key: 'key-00000001', at: onTime, answers: turned })).submissionId,
    (await handIn(stores, judging, course, { no: 2, key: 'key-00000002', at: Date.parse('2026-10-17T20:00:00Z'), claimedSentAt: onTime, answers: { rate: '17 K/km' } })).submissionId,
  ]
  await stores.write(trx => trx.insertInto('standing').values({ id: 's-1', membership_id: 'm-3', lab_id: 'lab-1', kind: 'excused', reason: 'ill', by_actor_id: 'm-lead', seq: 1 }).execute())
})
afterEach(() => stores.remove())

const codeOf = (promise: Promise<unknown>) => promise.then(() => 'done', (error: unknown) => error instanceof DomainError ? error.code : Promise.reject(error))
const student = (no: number) => ({ isStaff: false, membershipId: `m-${no}` })
const release = (seenVersion = 1) => releaseMarks(stores, { actorId: 'm-lead', postingId: 'posting-1', seenVersion }, later)
const mine = (no: number) => myMarks(stores.read, { courseId: 'course-1', membershipId: `m-${no}` }, later)

describe('before release', () => {
  it('no use case that a student reaches tells a mark, a band or a worked value', async () => {
    expect(await codeOf(submissionMarks(stores.read, student(0), submissions[0]!))).toBe('not_released')
    const reached = JSON.stringify([
      await mine(0), await readSubmission(stores.read, { submissionId: submissions[0]! }),
      await readWork(stores.read, judging.loadShare, { membershipId: 'm-0', shareId: 'share-0' }, onTime),
    ])
    const marks = await stores.read.selectFrom('evaluation').select(['low_bits', 'high_bits', 'parts_json']).where('submission_id', '=', submissions[0]!).execute()
    for (const row of marks) {
      const { lowDecimal, highDecimal } = JSON.parse(row.parts_json) as { lowDecimal: string, highDecimal: string }
      expect(reached).not.toContain(lowDecimal)
      expect(reached).not.toContain(highDecimal)
    }
    expect(reached).not.toMatch(/"(band|bar|slip|worked|center|outcome|accepted|earnedMilli":\d)/)
    expect((await mine(0))[0]).toMatchObject({ standing: 'submitted', totalMilli: null, earnedMilli: null })
  })

  it('staff see the class: who is within, who slipped, who is late, who is missing and who is excused', async () => {
    const view = await classView(stores.read, 'posting-1', later)
    expect(view).toMatchObject({ students: 5, handedIn: 3, late: 1, missing: 1, excused: 1 })
    expect(view.steps[0]).toMatchObject({ no: 1, within: 1, outside: 2 })
    expect(view.slips[0]).toMatchObject({ stepNo: 1, students: 1 })
    expect(view.slips[0]?.key).not.toBe('unexplained')
    expect(view.slips.at(-1)).toMatchObject({ key: 'unexplained', stepNo: 1, students: 1 })
    expect(view.people.map(person => person.claimedSentAt)).toEqual([null, null, new Date(onTime).toISOString(), null, null]) // K6
    const within = view.steps[0]?.dots.find(dot => dot.judged === 'within')
    expect(Math.abs(within?.offset ?? 9)).toBeLessThanOrEqual(1)
  })
})

describe('feedback at once', () => {
  it('tells right or not and the marks, and nothing by which the band could be searched', async () => {
    await stores.write(trx => trx.updateTable('posting').set({ feedback: 'at_once' }).execute())
    const marks = await submissionMarks(stores.read, student(1), submissions[1]!)
    expect(marks.isWhole).toBe(false)
    expect(marks.steps.map(step => [step.judged, step.pointsMilli, step.bar, step.slip, step.worked.value, step.worked.lines.length])).toEqual([['wrong', 0, null, null, '', 0], ['within', 2000, null, null, '', 0], ['within', 1000, null, null, '', 0]])
    expect((await mine(1))[0]).toMatchObject({ standing: 'submitted', totalMilli: 3000 })
  })
})

describe('release', () => {
  it('happens once, by the version that was seen, with an entry and a mail to each who handed in', async () => {
    expect(await codeOf(release(7))).toBe('changed_meanwhile')
    expect(await release()).toMatchObject({ version: 2, told: 3 })
    expect(await codeOf(release(2))).toBe('already_released')
    const mails = await stores.read.selectFrom('outbox').select(['to_membership_id']).where('template', '=', 'marks_released').orderBy('to_membership_id').execute()
    expect(mails.map(mail => mail.to_membership_id)).toEqual(['m-0', 'm-1', 'm-2'])
    const entry = await stores.read.selectFrom('ledger_entry').select(['actor', 'facts_json']).where('action', '=', 'marks.released').executeTakeFirstOrThrow()
    expect([entry.actor, (JSON.parse(entry.facts_json) as { students: number }).students]).toEqual(['m-lead', 3])
  })

  it('at the same instant by two people is one release', async () => {
    expect((await Promise.all([codeOf(release()), codeOf(release())])).sort()).toEqual(['already_released', 'done'])
  })

  it('is the end of attempts for whoever has handed in and sees the worked values, and not for whoever has handed in nothing', async () => {
    const inTime = Date.parse('2026-10-18T15:00:00Z')
    await releaseMarks(stores, { actorId: 'm-lead', postingId: 'posting-1', seenVersion: 1 }, inTime)
    expect(await codeOf(handIn(stores, judging, course, { no: 1, key: 'key-00000011', at: inTime + 60_000 }))).toBe('marks_shown')
    expect((await readWork(stores.read, judging.loadShare, { membershipId: 'm-1', shareId: 'share-1' }, inTime + 60_000)).stopped).toBe('marks_shown')
    expect(await codeOf(handIn(stores, judging, course, { no: 4, key: 'key-00000014', at: inTime + 60_000 }))).toBe('done')
    expect((await stores.read.selectFrom('submission').select('attempt').where('share_id', '=', 'share-1').execute()).length).toBe(1)
  })

  it('shows a student marks, the band with its parts, the working with numbers put in, and the slip as a sentence', async () => {
    await release()
    const marks = await submissionMarks(stores.read, student(1), submissions[1]!)
    const [rate, lifted, theta] = marks.steps
    expect(rate).toMatchObject({ judged: 'below', pointsMilli: 0, maxMilli: 3000 })
    expect(rate?.slip?.sentence.length).toBeGreaterThan(20)
    expect(rate?.bar?.parts.length).toBeGreaterThan(0)
    const sum = (side: 'above' | 'below') => rate?.bar?.parts.reduce((total, part) => total + part[side], 0) ?? 0
    expect(Math.abs(rate!.bar!.center + sum('above') - rate!.bar!.high)).toBeLessThan(1e-6)
    expect(Math.abs(rate!.bar!.center - sum('below') - rate!.bar!.low)).toBeLessThan(1e-6)
    expect(Math.abs(Number(rate!.worked.value) - rateOf(course, 'share-1'))).toBeLessThan(0.001)
    expect(rate?.worked.lines.some(line => line.filledHtml.includes('katex'))).toBe(true)
    expect([lifted?.pointsMilli, theta?.pointsMilli]).toEqual([2000, 1000])
    expect(marks).toMatchObject({ earnedMilli: 3000, totalMilli: 3000, maxMilli: 6000, counts: true })
    expect(marks.history.map(entry => [entry.stepKey, entry.beforeMilli, entry.afterMilli])).toEqual([['lifted', null, 2000], ['rate', null, 0], ['theta', null, 1000]])
  })

  it('shows nobody the marks of another', async () => {
    await release()
    expect(await codeOf(submissionMarks(stores.read, student(0), submissions[1]!))).toBe('not_found')
  })

  it('K11: excused is not zero, missing is told as missing, late is applied to the lab once', async () => {
    await release()
    const standings = await Promise.all([0, 1, 2, 3, 4].map(async no => (await mine(no))[0]))
    expect(standings.map(lab => [lab?.standing, lab?.totalMilli])).toEqual([['released', 6000], ['released', 3000], ['released', 0], ['excused', null], ['missing', null]])
    const table = await marksTable(stores.read, { courseId: 'course-1', sectionId: null, allowedSectionIds: null }, later)
    expect(table.rows.map(row => row.cells[0]?.standing)).toEqual(['released', 'released', 'released', 'excused', 'missing'])
  })

  it('shows a TA only the sections that are theirs', async () => {
    expect(await marksTable(stores.read, { courseId: 'course-1', sectionId: 'section-a', allowedSectionIds: [] }, later)).toEqual({ sections: [], sectionId: null, labs: [], rows: [] })
  })
})
