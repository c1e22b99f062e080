import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { carryOutRoster } from '../../../server/domain/people/roster/carryOutRoster'
import { planRoster } from '../../../server/domain/people/roster/planRoster'
import { readRoster } from '../../../server/domain/people/roster/readRoster'
import { moveSection } from '../../../server/domain/terms/memberships'
import { allRows, digestOfRows } from '../../fixtures/allRows'
import { openTemporary } from '../../fixtures/openTemporary'
import { inTerm, smallDepartment } from '../../fixtures/smallDepartment'

let db: Awaited<ReturnType<typeof openTemporary>>
let house: Awaited<ReturnType<typeof smallDepartment>>

beforeEach(async () => {
  db = await openTemporary()
  house = await smallDepartment(db)
})
afterEach(() => db.remove())

const noChoices = { sectionId: null, makeSections: [] as string[], end: [] as string[] }
const read = (lines: string[]) => readRoster({ text: ['E-mail,Name,Section', ...lines].join('\n'), delimiter: null, columns: null })
const plan = (lines: string[], choices = noChoices) => planRoster(db.read, { courseId: house.courseId, roster: read(lines), choices })
const carryOut = (lines: string[], digest: string, choices = noChoices) => carryOutRoster(db, { ...house.asked, courseId: house.courseId, roster: read(lines), choices, digest }, inTerm)
const students = async () => (await db.read.selectFrom('membership').innerJoin('person', 'person.id', 'membership.person_id').innerJoin('section', 'section.id', 'membership.section_id')
  .select(['person.email_norm as email', 'section.name as section', 'membership.state', 'membership.pseudonym']).where('membership.course_id', '=', house.courseId).orderBy('person.email_norm').execute())

const file = ['fay.ode@example.edu,Fay Ode,B', 'new.one@example.edu,New One,A', 'new.two@example.edu,New Two,Section B', 'tess.aird@example.edu,Tess Aird,A', 'ivo.str@example.edu,Ivo Str,C']

describe('the preview of a roster', () => {
  it('says what it would add, move and leave, and which lines it cannot take, and writes nothing', async () => {
    const before = digestOfRows(allRows(db.raw))
    expect(await plan(file)).toMatchObject({
      adds: [{ email: 'new.one@example.edu', section: 'A', isNew: true, isBack: false }, { email: 'new.two@example.edu', section: 'B', isNew: true, isBack: false }],
      moves: [{ email: 'fay.ode@example.edu', from: 'A', to: 'B' }],
      absent: [{ email: 'sol.ann@example.edu', section: 'B', ends: false }],
      same: 0, newSections: [], unknownSections: [],
      refused: [{ line: 5, reason: 'Is in this course as ta.' }, { line: 6, reason: 'Is in this course as instructor.' }],
    })
    expect(digestOfRows(allRows(db.raw))).toBe(before)
  })
  it('asks before it makes a section', async () => {
    const lines = ['new.one@example.edu,New One,C']
    expect(await plan(lines)).toMatchObject({ adds: [], unknownSections: ['C'], refused: [{ line: 2, reason: 'The course has no section C.' }] })
    expect(await plan(lines, { ...noChoices, makeSections: ['C'] })).toMatchObject({ adds: [{ section: 'C' }], newSections: ['C'], refused: [] })
  })
  it('wants a section for lines without one, unless the course has one only', async () => {
    const roster = readRoster({ text: 'email,name\nnew.one@example.edu,New One', delimiter: null, columns: null })
    expect((await planRoster(db.read, { courseId: house.courseId, roster, choices: noChoices })).refused).toMatchObject([{ reason: 'No section. Choose one for lines without.' }])
    expect((await planRoster(db.read, { courseId: house.courseId, roster, choices: { ...noChoices, sectionId: house.sectionB } })).adds).toMatchObject([{ section: 'B' }])
  })
})

describe('carrying it out', () => {
  it('does what the preview said and no more', async () => {
    const { digest } = await plan(file)
    expect(await carryOut(file, digest)).toEqual({ added: 2, invited: 2, moved: 1, ended: 0, same: 0, left: 1, refused: 2 })
    expect((await students()).map(({ email, section, state }) => [email, section, state])).toEqual([
      ['fay.ode@example.edu', 'B', 'active'], ['new.one@example.edu', 'A', 'active'], ['new.two@example.edu', 'B', 'active'], ['sol.ann@example.edu', 'B', 'active'],
    ])
    expect(await db.read.selectFrom('outbox').innerJoin('person', 'person.id', 'outbox.to_person_id').select('email_norm').where('email_norm', 'like', 'new.%').orderBy('email_norm').execute()).toEqual([{ email_norm: 'new.one@example.edu' }, { email_norm: 'new.two@example.edu' }])
  })
  it('moves nobody when the same roster comes again in another order (K27)', async () => {
    await carryOut(file, (await plan(file)).digest)
    const before = await students()
    const shuffled = [...file].reverse()
    const again = await plan(shuffled)
    expect(again).toMatchObject({ adds: [], moves: [], same: 3 })
    expect(again.digest).toBe((await plan(file)).digest)
    await carryOut(shuffled, again.digest)
    expect(await students()).toEqual(before)
  })
  it('ends only who was named', async () => {
    const choices = { ...noChoices, end: [house.members.second] }
    const { digest, absent } = await plan(['fay.ode@example.edu,Fay Ode,A'], choices)
    expect(absent).toMatchObject([{ email: 'sol.ann@example.edu', ends: true }])
    expect(await carryOut(['fay.ode@example.edu,Fay Ode,A'], digest, choices)).toMatchObject({ ended: 1, left: 0, same: 1 })
    expect((await students()).find(row => row.email === 'sol.ann@example.edu')?.state).toBe('dropped')
    expect(await plan(['sol.ann@example.edu,Sol Ann,B', 'fay.ode@example.edu,Fay Ode,A'])).toMatchObject({ adds: [{ email: 'sol.ann@example.edu', isNew: false, isBack: true }], same: 1 })
  })
  it('does nothing when the course changed since the preview', async () => {
    const { digest } = await plan(file)
    await moveSection(db, { ...house.asked, membershipId: house.members.first, sectionId: house.sectionB }, inTerm)
    const before = digestOfRows(allRows(db.raw))
    await expect(carryOut(file, digest)).rejects.toMatchObject({ code: 'plan_changed' })
    expect(digestOfRows(allRows(db.raw))).toBe(before)
  })
  it('gives everybody a pseudonym that is not made from who they are, and no two the same', async () => {
    const many = Array.from({ length: 120 }, (_, at) => `s${at}@example.edu,Student ${at},A`)
    await carryOut(many, (await plan(many)).digest)
    const names = (await students()).map(row => row.pseudonym)
    expect(new Set(names).size).toBe(122)
    expect(names.every(name => /^[2-9B-DF-HJ-NP-TV-XZ]{5}$/.test(name))).toBe(true)
  })
  it('stands in the ledger with ids and counts, and without a name or an address', async () => {
    await carryOut(file, (await plan(file)).digest)
    const entry = await db.read.selectFrom('ledger_entry').select('facts_json').where('action', '=', 'roster.carried_out').executeTakeFirstOrThrow()
    expect(JSON.parse(entry.facts_json)).toMatchObject({ added: 2, moved: 1, ended: 0, refused: 2 })
    const all = (await db.read.selectFrom('ledger_entry').select('facts_json').execute()).map(row => row.facts_json).join('\n')
    expect(all).not.toMatch(/example\.edu|Fay|New One/)
  })
})
