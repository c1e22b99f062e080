import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { isAskedNow } from '../../../server/domain/handbook/isAskedNow'
import { openTemporary } from '../../fixtures/openTemporary'
import { body, workingCourse } from '../../fixtures/workingCourse'
import { askedNumbers } from '../../../shared/schemas/askedSteps'

let db: Awaited<ReturnType<typeof openTemporary>>
beforeEach(async () => {
  db = await openTemporary()
})
afterEach(() => db.remove())

describe('the calculator of a student', () => {
  it('is held for what an open lab asks, until its marks are released', async () => {
    await workingCourse(db, { students: 1, times: { zone: 'America/Chicago', opens: '2026-10-12T08:00', due: '2026-10-16T17:00' }, lateRule: { kind: 'none' } })
    const { section_id: section, id } = await db.read.selectFrom('membership').select(['id', 'section_id']).where('role', '=', 'student').executeTakeFirstOrThrow()
    const student = { memberships: [{ id, courseId: 'course-1', role: 'student' as const, sectionIds: [section ?? ''] }] }
    const asked = askedNumbers(body)[0]?.quantity ?? ''
    const during = Date.parse('2026-10-14T20:00:00Z')
    expect(await isAskedNow(db.read, student, asked, during)).toBe(true)
    expect(await isAskedNow(db.read, student, 'no-such-quantity', during)).toBe(false)
    // and what would give it away: the line through the same rows
    for (const key of ['fitted-temperature-at-zero-height', 'lapse-rate-of-two-readings', 'lapse-rate-binned-least-squares']) expect(await isAskedNow(db.read, student, key, during), key).toBe(true)
    expect(await isAskedNow(db.read, student, 'density', during)).toBe(false)
    expect(await isAskedNow(db.read, student, asked, Date.parse('2026-10-01T00:00:00Z'))).toBe(false)
    expect(await isAskedNow(db.read, { memberships: [{ ...student.memberships[0]!, role: 'ta' }] }, asked, during)).toBe(false)
    await db.write(trx => trx.updateTable('posting').set({ released_at: during }).execute())
    expect(await isAskedNow(db.read, student, asked, during)).toBe(false)
  })
})
