import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { DomainError } from '#shared/errors'
import { conventionChoice, type ConventionChoice } from '#shared/schemas/convention'
import { closed1004 } from '#shared/thermo/conventions/closed1004'
import { chooseConvention, readCourseConvention } from '../../../server/domain/terms/courseConvention'
import { openTemporary } from '../../fixtures/openTemporary'
import { referenceIn } from '../../fixtures/reference'
import { inTerm, smallDepartment } from '../../fixtures/smallDepartment'
import { handIn } from '../../fixtures/submitting'
import { workingCourse } from '../../fixtures/workingCourse'

let db: Awaited<ReturnType<typeof openTemporary>>
beforeEach(async () => {
  db = await openTemporary()
})
afterEach(() => db.remove())

const { key: _key, ...body } = closed1004
const own = (change: Partial<typeof body>): ConventionChoice => ({ is: 'own', convention: JSON.parse(JSON.stringify({ ...body, title: 'Ours', ...change })) })
const codeOf = (promise: Promise<unknown>) => promise.then(() => 'done', (error: unknown) => error instanceof DomainError ? error.code : Promise.reject(error))

describe('the convention of a course', () => {
  it('is chosen, made, and numbered; the ledger has each', async () => {
    const house = await smallDepartment(db)
    const choose = (seenVersion: number, choice: ConventionChoice) => chooseConvention(db, { ...house.asked, courseId: house.courseId, seenVersion, choice: conventionChoice.parse(choice) }, inTerm)
    const at = () => readCourseConvention(db.read, house.courseId, true)
    expect(await at()).toMatchObject({ version: 1, isOwn: false, convention: { key: 'closed-1004' } })
    expect(await choose(1, own({ constants: { ...closed1004.constants, g: 9.80665 } }))).toEqual({ version: 2 })
    expect(await at()).toMatchObject({ version: 2, isOwn: true, revisionNo: 1, convention: { key: `own-${house.courseId}`, constants: { g: 9.80665 } } })
    await choose(2, own({ constants: { ...closed1004.constants, g: 9.8 } }))
    expect(await at()).toMatchObject({ revisionNo: 2, convention: { constants: { g: 9.8 } } })
    await choose(3, { is: 'named', key: 'closed-1004' })
    await expect(choose(2, own({}))).rejects.toMatchObject({ code: 'changed_meanwhile', facts: { by: 'Ada Min', version: 4 } })
    expect(await at()).toMatchObject({ version: 4, isOwn: false })
    const told = await db.read.selectFrom('ledger_entry').select('action').where('action', '=', 'course.convention').execute()
    expect(told).toHaveLength(3)
  })
  it('is refused where it does not close, names a formula that there is not, or somebody changed the course meanwhile', async () => {
    const house = await smallDepartment(db)
    const code = (seenVersion: number, choice: ConventionChoice) => codeOf(chooseConvention(db, { ...house.asked, courseId: house.courseId, seenVersion, choice: conventionChoice.parse(choice) }, inTerm))
    expect(await code(1, own({ constants: { ...closed1004.constants, R: 287.05 } }))).toBe('convention_open')
    expect(await code(1, own({ variants: { 'dry-adiabatic-lapse-rate': 'no-such' } }))).toBe('invalid')
    expect(await code(1, { is: 'named', key: 'no-such' })).toBe('not_found')
    expect(await code(7, { is: 'named', key: 'closed-1004' })).toBe('changed_meanwhile')
    expect(await readCourseConvention(db.read, house.courseId, true)).toMatchObject({ version: 1 })
  })
  it('does not touch a lab that is posted: work handed in later is judged by the convention of its shares', async () => {
    const reference = await referenceIn(db.write)
    const course = await workingCourse(db, { students: 1, times: { zone: 'America/Chicago', opens: '2026-10-12T08:00', due: '2026-10-16T17:00' }, lateRule: { kind: 'none' } })
    const at = Date.parse('2026-10-14T20:00:00Z')
    await db.write(trx => trx.insertInto('convention_revision').values({ id: 'another', convention_key: 'another', no: 1, body_json: JSON.stringify({ ...closed1004, key: 'another' }), digest: Buffer.alloc(32, 7) }).execute())
    await db.write(trx => trx.updateTable('course').set({ convention_revision_id: 'another' }).execute())
    await handIn(db, { reference, loadShare: async shareId => course.loaded(shareId) }, course, { no: 0, key: 'key-00000001', at })
    const used = await db.read.selectFrom('evaluation').select('convention_revision_id as id').distinct().execute()
    expect(used).toEqual([{ id: 'convention-1' }])
  })
})
