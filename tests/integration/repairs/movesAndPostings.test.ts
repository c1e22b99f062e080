import { afterEach, beforeEach, expect, it } from 'vitest'
import { labBody } from '../../../shared/schemas/lab'
import { defaultConvention } from '../../../shared/thermo/conventions'
import { ensureConvention } from '../../../server/domain/labs/conventions'
import { createLab } from '../../../server/domain/labs/createLab'
import { postLab } from '../../../server/domain/labs/postLab'
import { describeMember } from '../../../server/domain/repairs/describeMember'
import { repairMember } from '../../../server/domain/repairs/repairMember'
import { enrol } from '../../../server/domain/terms/enrol'
import { endMembership } from '../../../server/domain/terms/memberships'
import { openObservations } from '../../../server/observations/chunks'
import type { Acting } from '../../../server/domain/people/actor'
import type { RepairBody } from '../../../shared/schemas/repairs'
import { openTemporary } from '../../fixtures/openTemporary'
import { climb, smallFlight } from '../../fixtures/smallFlight'
import { inTerm, postedLab, smallDepartment } from '../../fixtures/smallDepartment'

let db: Awaited<ReturnType<typeof openTemporary>>
let house: Awaited<ReturnType<typeof smallDepartment>>

beforeEach(async () => {
  db = await openTemporary()
  house = await smallDepartment(db)
})
afterEach(() => db.remove())

const repair = (body: RepairBody, memberId = house.members.first) => repairMember(db, { ...house.asked, courseId: house.courseId, memberId, body }, inTerm)
const page = (memberId = house.members.first, role: Acting['role'] = 'lead') => describeMember(db.read, { courseId: house.courseId, memberId, acting: { actorId: house.asked.actorId, role, courseId: house.courseId, sectionIds: [] } }, inTerm)
const reason = 'Works in the mornings now'

it('K9: a move while a lab is open keeps the later due of the two, and the page says where it comes from', async () => {
  await postedLab(db, { courseId: house.courseId, title: 'Open', times: { [house.sectionA]: ['2026-10-12T08:00', '2026-10-30T23:00'], [house.sectionB]: ['2026-10-12T08:00', '2026-10-28T23:00'] } })
  await postedLab(db, { courseId: house.courseId, title: 'Only in A', times: { [house.sectionA]: ['2026-10-12T08:00', '2026-10-29T23:00'] } })
  const { told } = await repair({ kind: 'section', sectionId: house.sectionB, reason })
  expect(told).toEqual(['Open stays due 2026-10-30, 23:00.', 'Only in A is not posted to the new section.'])
  const after = await page()
  expect(after.member.section).toBe('B')
  expect(after.labs).toMatchObject([{ title: 'Open', dueFrom: 'moved_section', dueLocal: '2026-10-30T23:00', sectionDueAt: '2026-10-29T05:00:59.999Z' }])
  expect(after.repairs).toMatchObject([{ kind: 'moved', reason, labTitle: null }])
  await expect(repair({ kind: 'section', sectionId: house.sectionB, reason })).rejects.toMatchObject({ code: 'invalid' })
})

it('K9: an accommodation goes along and is counted from the new section’s due', async () => {
  await postedLab(db, { courseId: house.courseId, title: 'Open', times: { [house.sectionA]: ['2026-10-12T08:00', '2026-10-28T23:00'], [house.sectionB]: ['2026-10-12T08:00', '2026-10-30T23:00'] } })
  await repair({ kind: 'accommodation', extraDays: 3 })
  expect((await page()).labs).toMatchObject([{ dueFrom: 'accommodation', dueLocal: '2026-10-31T23:00' }])
  await repair({ kind: 'section', sectionId: house.sectionB, reason })
  // three days on the calendar, over the night of 25 hours
  expect((await page()).labs).toMatchObject([{ dueFrom: 'accommodation', dueLocal: '2026-11-02T23:00' }])
})

it('K10: a late add finds what is over not counted and a due of their own in what runs; staff decide, and it counts', async () => {
  const over = await postedLab(db, { courseId: house.courseId, title: 'Over', times: { [house.sectionA]: ['2026-09-16T08:00', '2026-09-23T23:00'] } })
  await postedLab(db, { courseId: house.courseId, title: 'Running', times: { [house.sectionA]: ['2026-10-10T08:00', '2026-10-30T23:00'] } })
  const { id } = await enrol(db, { ...house.asked, courseId: house.courseId, enrolment: { role: 'student', personId: await house.addPerson('Late Comer'), sectionId: house.sectionA } }, inTerm)
  const before = await page(id)
  expect(before.labs.map(lab => [lab.title, lab.standing, lab.dueFrom])).toEqual([['Over', 'not_counted', 'section'], ['Running', 'open', 'late_add']])
  expect(before.soFar).toEqual({ labs: 0, earnedMilli: 0, maxMilli: 0 })
  await repair({ kind: 'counted', labId: over.labId, reason }, id)
  expect((await page(id)).labs.map(lab => lab.standing)).toEqual(['late_open', 'open'])
})

it('a student who comes back has the accommodation that they had', async () => {
  await repair({ kind: 'accommodation', extraDays: 3 })
  await endMembership(db, { ...house.asked, membershipId: house.members.first }, inTerm)
  await expect(page()).rejects.toMatchObject({ code: 'not_found' })
  await postedLab(db, { courseId: house.courseId, title: 'Open', times: { [house.sectionA]: ['2026-10-14T08:00', '2026-10-28T23:00'] } })
  await enrol(db, { ...house.asked, courseId: house.courseId, enrolment: { role: 'student', personId: house.people.first, sectionId: house.sectionA } }, inTerm)
  expect((await page()).labs).toMatchObject([{ dueFrom: 'accommodation', dueLocal: '2026-10-31T23:00' }])
})

it('a lab that is posted later has the accommodation in it, for that student alone', async () => {
  const { id: convention } = await db.write(trx => ensureConvention(trx, defaultConvention, inTerm))
  await db.write(trx => trx.updateTable('course').set({ convention_revision_id: convention }).where('id', '=', house.courseId).execute())
  await repair({ kind: 'accommodation', extraDays: 2 })
  const versionId = await smallFlight(db, db.dataDir, { ownerCourseId: house.courseId, title: 'Flight', rows: climb(500, 10, 5.4), actorId: house.asked.actorId }, inTerm)
  const lab = await createLab(db, { ...house.asked, courseId: house.courseId, body: labBody.parse({
    title: 'Base', text: 'At the base.', supply: [{ versionId, leg: 'up', lowM: 100, highM: 300 }],
    steps: [{ key: 'theta', kind: 'number', title: 'Potential temperature', pointsMilli: 2000, quantity: 'potential-temperature', unit: 'K', digits: 3, inputs: { pressure: { from: 'share', column: 'pressure', read: 'lowest' }, temperature: { from: 'share', column: 'air-temperature', read: 'lowest' } } }],
  }) }, inTerm)
  const observations = openObservations(db.dataDir)
  await postLab(db, observations, {
    ...house.asked, labId: lab.id, seenVersion: lab.version, seed: Buffer.alloc(16, 7),
    posting: { sections: [house.sectionA, house.sectionB].map(sectionId => ({ sectionId, opensLocal: '2026-10-15T08:00', dueLocal: '2026-10-21T23:00' })), attempts: 3, keep: 'best', feedback: 'after_release' },
  }, inTerm)
  observations.close()
  expect((await page()).labs).toMatchObject([{ title: 'Base', dueFrom: 'accommodation', dueLocal: '2026-10-23T23:00' }])
  expect((await page(house.members.second)).labs).toMatchObject([{ dueFrom: 'section', dueLocal: '2026-10-21T23:00' }])
})

it('a TA may look and accept late work, and repairs nothing else', async () => {
  expect(await page(house.members.first, 'ta')).toMatchObject({ mayRepair: false, mayAcceptLate: true })
})
