import { createHash } from 'node:crypto'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import type { TermDates } from '../../../shared/schemas/department'
import type { RollOverChoices } from '../../../shared/schemas/rollOver'
import { groupWriter } from '../../../server/db/writer'
import { closeAccount } from '../../../server/domain/people/closeAccount'
import { teachingWeeksBetween } from '../../../shared/schemas/teachingWeeks'
import { createTerm } from '../../../server/domain/terms/createTerm'
import { planTerm } from '../../../server/domain/terms/rollOver/planTerm'
import { startTerm } from '../../../server/domain/terms/rollOver/startTerm'
import { allRows, changedTables, digestOfRows } from '../../fixtures/allRows'
import { openTemporary } from '../../fixtures/openTemporary'
import { inTerm, postedLab, smallDepartment, zone } from '../../fixtures/smallDepartment'

const holidays = [{ from: '2027-03-22', to: '2027-03-26', name: 'Spring break' }, { from: '2027-04-02', to: '2027-04-02', name: 'Good Friday' }]
const spring: TermDates = { name: 'Spring 2027', zone, startsOn: '2027-01-11', endsOn: '2027-04-30', calendar: { weeks: teachingWeeksBetween('2027-01-11', '2027-04-30', holidays), holidays } }
const noChoices: RollOverChoices = { leaveOut: [], dates: [] }

let db: Awaited<ReturnType<typeof openTemporary>>
let house: Awaited<ReturnType<typeof smallDepartment>>
let lapse: Awaited<ReturnType<typeof postedLab>>

beforeEach(async () => {
  db = await openTemporary()
  house = await smallDepartment(db)
  lapse = await postedLab(db, {
    courseId: house.courseId, title: 'Lapse and lift',
    times: { [house.sectionA]: ['2026-10-21T08:00', '2026-10-28T23:00'], [house.sectionB]: ['2026-10-22T08:00', '2026-11-06T17:00'] },
  })
})
afterEach(() => db.remove())

const plan = (choices = noChoices, term = spring) => planTerm(db.read, { fromTermId: house.termId, term, choices })
const start = (digest: string, choices = noChoices, term = spring) => startTerm(db, { ...house.asked, fromTermId: house.termId, term, choices, digest }, inTerm)
const labsOf = (termId: string) => db.read.selectFrom('lab').innerJoin('course', 'course.id', 'lab.course_id').selectAll('lab').where('course.term_id', '=', termId).execute()

describe('a plan of the next term', () => {
  it('writes nothing', async () => {
    const before = digestOfRows(allRows(db.raw))
    await plan()
    expect(digestOfRows(allRows(db.raw))).toBe(before)
  })
  it('moves dates by teaching week and weekday at the same local time, and tells of holidays', async () => {
    const [first, second] = (await plan()).courses[0]!.labs[0]!.postings
    expect(first).toMatchObject({ section: 'A', was: { dueLocal: '2026-10-28T23:00', dueWeek: 10 }, becomes: { opensLocal: '2027-03-10T08:00', dueLocal: '2027-03-17T23:00', dueWeek: 10 }, notes: [], problem: null })
    // opens on Mountain standard time, is due on daylight time: the same time on the wall, another distance from UTC
    expect(new Date(first!.becomes.opensAt).toISOString()).toBe('2027-03-10T15:00:00.000Z')
    expect(new Date(first!.becomes.dueAt).toISOString()).toBe('2027-03-18T05:00:59.999Z')
    expect(second).toMatchObject({ section: 'B', becomes: { dueLocal: '2027-04-05T17:00', dueWeek: 12 }, notes: [{ kind: 'holiday', which: 'due', date: '2027-04-02', name: 'Good Friday' }] })
  })
  it('tells of an hour that the clock skips and takes the time after it', async () => {
    await postedLab(db, { courseId: house.courseId, title: 'A night on the roof', times: { [house.sectionA]: ['2026-10-19T20:00', '2026-10-25T02:30'] } }) // Sunday of week 9
    const night = (await plan()).courses[0]!.labs.find(lab => lab.title === 'A night on the roof')!.postings[0]!
    expect(night.becomes.dueLocal).toBe('2027-03-14T02:30')
    expect(new Date(night.becomes.dueAt).toISOString()).toBe('2027-03-14T09:30:59.999Z')
    expect(night.notes).toEqual([{ kind: 'clock', which: 'due', told: 'The clocks skip 02:30 on 2027-03-14: 03:30 is taken.' }])
  })
  it('stops at dates that cannot stand until they are chosen', async () => {
    const bad: RollOverChoices = { leaveOut: [], dates: [{ postingId: lapse.postings[house.sectionA]!, opensLocal: '2027-03-17T23:00', dueLocal: '2027-03-10T08:00' }] }
    const planned = await plan(bad)
    expect(planned.counts.problems).toBe(1)
    await expect(start(planned.digest, bad)).rejects.toMatchObject({ code: 'dates_invalid' })
    const good: RollOverChoices = { leaveOut: [], dates: [{ ...bad.dates[0]!, opensLocal: '2027-03-11T08:00', dueLocal: '2027-03-18T23:00' }] }
    await start((await plan(good)).digest, good)
    expect(await db.read.selectFrom('posting').select('due_local').where('state', '=', 'planned').orderBy('due_local').execute()).toEqual([{ due_local: '2027-03-18T23:00' }, { due_local: '2027-04-05T17:00' }])
  })
})

describe('starting it', () => {
  it('carries courses, codes, sections and staff, and leaves students behind', async () => {
    const { termId } = await start((await plan()).digest)
    const course = await db.read.selectFrom('course').selectAll().where('term_id', '=', termId).executeTakeFirstOrThrow()
    const from = await db.read.selectFrom('course').select('convention_revision_id').where('id', '=', house.courseId).executeTakeFirstOrThrow()
    expect(course).toMatchObject({ code: 'ATM 301', ancestor_id: house.courseId, convention_revision_id: from.convention_revision_id, late_rule_json: '{"kind":"of_earned","percent":10,"closesAfterDays":7}' })
    expect(await db.read.selectFrom('course_listing').select('code').where('course_id', '=', course.id).execute()).toEqual([{ code: 'GEOG 347' }])
    const members = await db.read.selectFrom('membership').selectAll().where('course_id', '=', course.id).orderBy('role').execute()
    expect(members.map(member => [member.role, member.person_id])).toEqual([['instructor', house.people.instructor], ['lead', house.people.lead], ['ta', house.people.ta]])
    const sections = await db.read.selectFrom('ta_section').innerJoin('section', 'section.id', 'ta_section.section_id').select(['section.name', 'section.course_id']).where('ta_section.course_id', '=', course.id).execute()
    expect(sections).toEqual([{ name: 'A', course_id: course.id }])
    const old = await db.read.selectFrom('membership').select('pseudonym').where('course_id', '=', house.courseId).execute()
    expect(members.filter(member => old.some(row => row.pseudonym === member.pseudonym))).toEqual([])
  })
  it('makes drafts of the newest revisions, with steps and planned postings', async () => {
    const { termId } = await start((await plan()).digest)
    const [lab, ...others] = await labsOf(termId)
    expect(others).toEqual([])
    expect(lab).toMatchObject({ title: 'Lapse and lift', state: 'draft', ancestor_id: lapse.labId, version: 1 })
    const revisions = await db.read.selectFrom('lab_revision').selectAll().where('lab_id', '=', lab!.id).execute()
    expect(revisions).toMatchObject([{ no: 1, frozen_at: null, body_json: '{"title":"Lapse and lift","note":"revision 2"}' }])
    expect(await db.read.selectFrom('step').select('points_milli').where('lab_revision_id', '=', revisions[0]!.id).execute()).toEqual([{ points_milli: 2000 }, { points_milli: 2000 }])
    expect(await db.read.selectFrom('step_edge').select('to_key').where('lab_revision_id', '=', revisions[0]!.id).execute()).toEqual([{ to_key: 's2' }])
    expect(await db.read.selectFrom('posting').select(['due_local', 'state', 'attempts', 'keep', 'zone', 'released_at']).where('lab_id', '=', lab!.id).orderBy('due_local').execute()).toEqual([
      { due_local: '2027-03-17T23:00', state: 'planned', attempts: 3, keep: 'best', zone, released_at: null },
      { due_local: '2027-04-05T17:00', state: 'planned', attempts: 3, keep: 'best', zone, released_at: null },
    ])
  })
  it('leaves every row of the old term as it was, to the byte', async () => {
    const before = allRows(db.raw)
    await start((await plan()).digest)
    // only the head of the department's own chain moves on
    expect(changedTables(before, allRows(db.raw))).toEqual(['ledger_chain'])
    const courseHead = () => db.raw.prepare('select seq, hex(head) as head from ledger_chain where id = ?').get(`course:${house.courseId}`)
    const head = courseHead()
    await start((await plan(noChoices, { ...spring, name: 'Spring again' })).digest, noChoices, { ...spring, name: 'Spring again' })
    expect(courseHead()).toEqual(head)
  })
  it('is one term when it is asked for twice, in a row and at once, with and without the same request key', async () => {
    const { digest } = await plan()
    const once = (key: string) => ({ personId: house.people.admin, key, route: 'POST /api/department/terms/roll-over', bodySha256: createHash('sha256').update(digest).digest(), now: inTerm })
    const ask = (key: string | null) => startTerm(db, { ...house.asked, once: key === null ? null : once(key), fromTermId: house.termId, term: spring, choices: noChoices, digest }, inTerm)
    const [first, ...others] = await Promise.all([ask('key-one-1'), ask('key-one-1'), ask('key-two-2'), ask(null)])
    for (const other of [...others, await ask('key-one-1'), await ask(null)]) expect(other).toEqual(first)
    expect(await db.read.selectFrom('term').select('name').orderBy('name').execute()).toEqual([{ name: 'Fall 2026' }, { name: 'Spring 2027' }])
    expect(await labsOf(first.termId)).toHaveLength(1)
  })
  it('does nothing when the old term changed since the plan was read', async () => {
    const { digest } = await plan()
    await closeAccount(db, { ...house.asked, personId: house.people.ta }, inTerm)
    const before = digestOfRows(allRows(db.raw))
    await expect(start(digest)).rejects.toMatchObject({ code: 'plan_changed' })
    expect(digestOfRows(allRows(db.raw))).toBe(before)
    const renewed = await plan()
    expect(renewed.courses[0]!.staysBehind).toEqual([{ what: 'Tess Aird, ta', why: 'The account is closed.' }])
    await start(renewed.digest)
  })
  it('does not mind that students hand in meanwhile: what is kept is not part of the plan', async () => {
    const { digest } = await plan()
    const joined = await house.addPerson('Late Comer')
    await db.write(async (trx) => {
      await trx.insertInto('actor').values({ id: 'm-late', kind: 'membership' }).execute()
      await trx.insertInto('membership').values({ id: 'm-late', course_id: house.courseId, person_id: joined, pseudonym: 'ZZZZZ', role: 'student', section_id: house.sectionA, state: 'active', version: 1, created_at: inTerm }).execute()
    })
    expect((await plan()).kept.students).toBe(3)
    expect((await plan()).digest).toBe(digest)
  })
  it('refuses another plan under a name that is taken', async () => {
    await createTerm(db, { ...house.asked, term: spring }, inTerm)
    await expect(plan()).rejects.toMatchObject({ code: 'already_exists' })
    await expect(start('0'.repeat(64))).rejects.toMatchObject({ code: 'already_exists' })
  })
  it('leaves nothing behind when it fails at any statement', async () => {
    const { digest } = await plan()
    const before = digestOfRows(allRows(db.raw))
    let statements = 0
    for (let failAt = 1; ; failAt++) {
      statements = 0
      const failing = db.connection.withPlugin({
        transformQuery: ({ node }) => {
          if (node.kind === 'InsertQueryNode' && ++statements === failAt) throw new Error('storage went away')
          return node
        },
        transformResult: async ({ result }) => result,
      })
      const outcome = await startTerm({ read: db.read, write: groupWriter(failing) }, { ...house.asked, fromTermId: house.termId, term: spring, choices: noChoices, digest }, inTerm).then(() => 'started', () => 'failed')
      if (outcome === 'started') break
      expect(digestOfRows(allRows(db.raw))).toBe(before)
    }
    expect(statements).toBeGreaterThan(15)
    expect(digestOfRows(allRows(db.raw))).not.toBe(before) // the same digest does see the term once it starts
  })
  it('leaves out what was chosen to stay', async () => {
    const choices: RollOverChoices = { leaveOut: [lapse.labId], dates: [] }
    const { termId, labs } = await start((await plan(choices)).digest, choices)
    expect(labs).toBe(0)
    expect(await labsOf(termId)).toEqual([])
    expect(await db.read.selectFrom('course').select('code').where('term_id', '=', termId).execute()).toEqual([{ code: 'ATM 301' }])
  })
})
