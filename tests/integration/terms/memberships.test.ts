import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { createCourse, editCourse } from '../../../server/domain/terms/courses'
import { createTerm } from '../../../server/domain/terms/createTerm'
import { enrol } from '../../../server/domain/terms/enrol'
import { grantAllowance } from '../../../server/domain/terms/grantAllowance'
import { endMembership, moveSection, setTaSections } from '../../../server/domain/terms/memberships'
import { setTermState } from '../../../server/domain/terms/setTermState'
import { openTemporary } from '../../fixtures/openTemporary'
import { fall, inTerm, postedLab, smallDepartment } from '../../fixtures/smallDepartment'

let db: Awaited<ReturnType<typeof openTemporary>>
let house: Awaited<ReturnType<typeof smallDepartment>>

beforeEach(async () => {
  db = await openTemporary()
  house = await smallDepartment(db)
})
afterEach(() => db.remove())

const course = { code: 'ATM 410', title: 'Clouds', alsoListedAs: [] as string[], lateRule: { kind: 'none' as const }, conventionRevisionId: null, sections: [], leadPersonId: null }
const membersOf = (courseId: string) => db.read.selectFrom('membership').selectAll().where('course_id', '=', courseId).execute()

describe('codes of a course', () => {
  const create = (given: Partial<typeof course>, termId = house.termId) => createCourse(db, { ...house.asked, course: { ...course, ...given, termId } }, inTerm)
  it('name one course in a term, as its own code or a cross-listed one', async () => {
    await expect(create({ code: 'atm301' })).rejects.toMatchObject({ code: 'already_exists' })
    await expect(create({ code: 'GEOG 347' })).rejects.toMatchObject({ code: 'already_exists' })
    await expect(create({ alsoListedAs: ['GEOG-347'] })).rejects.toMatchObject({ code: 'already_exists' })
    await expect(create({ alsoListedAs: ['ATM 301'] })).rejects.toMatchObject({ code: 'already_exists' })
  })
  it('are free in another term', async () => {
    const { id } = await createTerm(db, { ...house.asked, term: { ...fall, name: 'Elsewhen' } }, inTerm)
    await create({ code: 'ATM 301', alsoListedAs: ['GEOG 347', 'geog347', 'ATM 301'] }, id)
    const listed = await db.read.selectFrom('course_listing').innerJoin('course', 'course.id', 'course_listing.course_id').select('course_listing.code').where('course.term_id', '=', id).execute()
    expect(listed).toEqual([{ code: 'GEOG 347' }])
  })
  it('can be changed by who saw the newest state, and not by who did not', async () => {
    const edit = (seenVersion: number) => editCourse(db, { ...house.asked, courseId: house.courseId, seenVersion, course: { ...course, code: 'ATM 305', alsoListedAs: ['PHYS 305'] } }, inTerm)
    expect(await edit(1)).toEqual({ version: 2 })
    await expect(edit(1)).rejects.toMatchObject({ code: 'changed_meanwhile' })
    expect(await db.read.selectFrom('course_listing').select('code').execute()).toEqual([{ code: 'PHYS 305' }])
  })
})

describe('a membership', () => {
  it('is one per person and course', async () => {
    await expect(enrol(db, { ...house.asked, courseId: house.courseId, enrolment: { role: 'ta', personId: house.people.first, sectionIds: [] } }, inTerm)).rejects.toMatchObject({ code: 'already_exists' })
  })
  it('has a section of its own course, or is refused', async () => {
    const other = await createCourse(db, { ...house.asked, course: { ...course, termId: house.termId, sections: ['A'] } }, inTerm)
    const personId = await house.addPerson('New Comer')
    await expect(enrol(db, { ...house.asked, courseId: house.courseId, enrolment: { role: 'student', personId, sectionId: other.sections[0]!.id } }, inTerm)).rejects.toMatchObject({ code: 'invalid' })
    await expect(setTaSections(db, { ...house.asked, membershipId: house.members.ta, seenVersion: 1, sectionIds: [other.sections[0]!.id] }, inTerm)).rejects.toMatchObject({ code: 'invalid' })
  })
  it('gives a TA sections by what the admin saw: the second of two is told', async () => {
    const give = (sectionIds: string[], seenVersion: number) => setTaSections(db, { ...house.asked, membershipId: house.members.ta, seenVersion, sectionIds }, inTerm)
    expect(await give([house.sectionB], 1)).toEqual({ sectionIds: [house.sectionB], version: 2 })
    await expect(give([house.sectionA], 1)).rejects.toMatchObject({ code: 'changed_meanwhile' })
    expect(await db.read.selectFrom('ta_section').select('section_id').where('membership_id', '=', house.members.ta).execute()).toEqual([{ section_id: house.sectionB }])
  })
  it('resumes when somebody comes back, with the pseudonym and the work of before', async () => {
    const before = (await membersOf(house.courseId)).find(row => row.id === house.members.first)!
    await endMembership(db, { ...house.asked, membershipId: house.members.first }, inTerm)
    const back = await enrol(db, { ...house.asked, courseId: house.courseId, enrolment: { role: 'student', personId: house.people.first, sectionId: house.sectionB } }, inTerm)
    expect(back.id).toBe(before.id)
    expect((await membersOf(house.courseId)).find(row => row.id === before.id)).toMatchObject({ state: 'active', pseudonym: before.pseudonym, section_id: house.sectionB })
  })
  it('of the last lead does not end', async () => {
    const lead = (await membersOf(house.courseId)).find(row => row.role === 'lead')!
    await expect(endMembership(db, { ...house.asked, membershipId: lead.id }, inTerm)).rejects.toMatchObject({ code: 'last_lead' })
    await enrol(db, { ...house.asked, courseId: house.courseId, enrolment: { role: 'lead', personId: await house.addPerson('Second Lead') } }, inTerm)
    expect(await endMembership(db, { ...house.asked, membershipId: lead.id }, inTerm)).toEqual({ state: 'ended' })
  })
  it('stays as it is in a closed term', async () => {
    await setTermState(db, { ...house.asked, termId: house.termId, state: 'closed' }, inTerm)
    await expect(endMembership(db, { ...house.asked, membershipId: house.members.first }, inTerm)).rejects.toMatchObject({ code: 'term_closed' })
    await expect(moveSection(db, { ...house.asked, membershipId: house.members.first, sectionId: house.sectionB }, inTerm)).rejects.toMatchObject({ code: 'term_closed' })
  })
})

describe('a late add (K10)', () => {
  it('does not count labs that are over, gets a personal due for what runs, and no zero by default', async () => {
    const over = await postedLab(db, { courseId: house.courseId, title: 'Over', times: { [house.sectionA]: ['2026-09-16T08:00', '2026-09-23T23:00'] } })
    const running = await postedLab(db, { courseId: house.courseId, title: 'Running', times: { [house.sectionA]: ['2026-10-10T08:00', '2026-10-30T23:00'] } })
    await postedLab(db, { courseId: house.courseId, title: 'To come', times: { [house.sectionA]: ['2026-11-10T08:00', '2026-11-20T23:00'] } })
    const personId = await house.addPerson('Late Comer')
    const late = await enrol(db, { ...house.asked, courseId: house.courseId, enrolment: { role: 'student', personId, sectionId: house.sectionA } }, inTerm)
    expect(late.notCounted).toEqual([{ labId: over.labId, title: 'Over' }])
    // joined four days after it opened: four days later, at the same time on the wall, over the end of daylight time
    expect(late.personalDue).toEqual([{ labId: running.labId, title: 'Running', dueAt: Date.parse('2026-11-04T06:00:59.999Z') }])
    expect(await db.read.selectFrom('standing').select(['membership_id', 'lab_id', 'kind', 'reason']).execute()).toEqual([{ membership_id: late.id, lab_id: over.labId, kind: 'not_counted', reason: 'late_add' }])
    expect(await db.read.selectFrom('mark').selectAll().execute()).toEqual([])
  })
  it('who was there from the start is left alone', async () => {
    await postedLab(db, { courseId: house.courseId, title: 'Later', times: { [house.sectionA]: ['2026-10-20T08:00', '2026-10-30T23:00'] } })
    expect(await db.read.selectFrom('standing').selectAll().execute()).toEqual([])
    expect(await db.read.selectFrom('allowance').selectAll().execute()).toEqual([])
  })
})

describe('a move to another section while a lab is open (K9)', () => {
  const dueIn = async (posting: string) => (await db.read.selectFrom('allowance').select('due_at').where('posting_id', '=', posting).where('membership_id', '=', house.members.first).execute()).map(row => new Date(row.due_at).toISOString())
  it('keeps the later due of the two', async () => {
    const lab = await postedLab(db, { courseId: house.courseId, title: 'Open', times: { [house.sectionA]: ['2026-10-12T08:00', '2026-10-30T23:00'], [house.sectionB]: ['2026-10-12T08:00', '2026-10-28T23:00'] } })
    const moved = await moveSection(db, { ...house.asked, membershipId: house.members.first, sectionId: house.sectionB }, inTerm)
    expect(moved).toEqual({ keptDue: [{ labId: lab.labId, title: 'Open', dueAt: Date.parse('2026-10-31T05:00:59.999Z') }], notPosted: [] })
    expect(await dueIn(lab.postings[house.sectionB]!)).toEqual(['2026-10-31T05:00:59.999Z'])
  })
  it('takes the new section’s due where that is later, and a personal due along where that is the latest', async () => {
    const lab = await postedLab(db, { courseId: house.courseId, title: 'Open', times: { [house.sectionA]: ['2026-10-12T08:00', '2026-10-28T23:00'], [house.sectionB]: ['2026-10-12T08:00', '2026-10-30T23:00'] } })
    expect((await moveSection(db, { ...house.asked, membershipId: house.members.second, sectionId: house.sectionA }, inTerm)).keptDue).toHaveLength(1)
    await grantAllowance(db, { ...house.asked, postingId: lab.postings[house.sectionA]!, membershipId: house.members.first, dueLocal: '2026-11-02T12:00', reason: 'Away with the sailing team' }, inTerm)
    await moveSection(db, { ...house.asked, membershipId: house.members.first, sectionId: house.sectionB }, inTerm)
    expect(await dueIn(lab.postings[house.sectionB]!)).toEqual(['2026-11-02T19:00:59.999Z'])
  })
  it('names labs that the new section does not have', async () => {
    const lab = await postedLab(db, { courseId: house.courseId, title: 'Only in A', times: { [house.sectionA]: ['2026-10-12T08:00', '2026-10-28T23:00'] } })
    expect((await moveSection(db, { ...house.asked, membershipId: house.members.first, sectionId: house.sectionB }, inTerm)).notPosted).toEqual([{ labId: lab.labId, title: 'Only in A' }])
  })
})

describe('an extension', () => {
  it('ends after the section’s due, for a student of that section, with its reason out of the ledger', async () => {
    const lab = await postedLab(db, { courseId: house.courseId, title: 'Open', times: { [house.sectionA]: ['2026-10-12T08:00', '2026-10-28T23:00'] } })
    const grant = (given: object) => grantAllowance(db, { ...house.asked, postingId: lab.postings[house.sectionA]!, membershipId: house.members.first, dueLocal: '2026-11-01T01:30', reason: 'A secret reason', ...given }, inTerm)
    await expect(grant({ dueLocal: '2026-10-28T23:00' })).rejects.toMatchObject({ code: 'dates_invalid' })
    await expect(grant({ membershipId: house.members.second })).rejects.toMatchObject({ code: 'invalid' })
    // 01:30 comes twice that night (K7): the later one
    expect(await grant({})).toEqual({ dueAt: Date.parse('2026-11-01T08:30:59.999Z'), told: 'The clocks show 01:30 twice on 2026-11-01: the later one is taken.' })
    const told = await db.read.selectFrom('ledger_entry').select(['facts_json', 'private_digest']).where('action', '=', 'allowance.granted').executeTakeFirstOrThrow()
    expect(told.facts_json).not.toContain('secret')
    expect(told.private_digest).not.toBeNull()
  })
})
