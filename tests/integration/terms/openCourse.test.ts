import { afterEach, beforeEach, expect, it } from 'vitest'
import { authorize } from '../../../server/domain/authorize'
import { locate } from '../../../server/domain/locate'
import { describeSelf } from '../../../server/domain/people/describeSelf'
import { loadRoles } from '../../../server/domain/people/loadActor'
import { openCourses } from '../../../server/db/migrations/0002_open_courses'
import { openCourse } from '../../../server/domain/terms/openCourse'
import { createCourse } from '../../../server/domain/terms/courses'
import { inTerm, smallDepartment } from '../../fixtures/smallDepartment'
import { temporaryStores, type TemporaryStores } from '../../fixtures/temporaryStores'

let stores: TemporaryStores
let department: Awaited<ReturnType<typeof smallDepartment>>
beforeEach(async () => {
  stores = await temporaryStores()
  department = await smallDepartment(stores)
  await stores.write(trx => trx.updateTable('course').set({ state: 'draft' }).where('id', '=', department.courseId).execute())
})
afterEach(() => stores.remove())

const actorOf = (personId: string) => loadRoles(stores.read, { personId, displayName: '', email: '', seenAt: inTerm }, Buffer.alloc(32), inTerm)
const reads = async (personId: string) => {
  const place = await locate(stores.read, { courseId: department.courseId }, inTerm)
  const actor = await actorOf(personId)
  try {
    return authorize('course:read', actor, place)?.role ?? null
  }
  catch (error) {
    return (error as { code: string }).code
  }
}

it('a draft course is its staff’s alone; once it is opened its students read it, and the ledger says who opened it', async () => {
  const { people, courseId, asked } = department
  expect([await reads(people.first), await reads(people.ta), await reads(people.lead), await reads(people.admin)]).toEqual(['not_found', 'ta', 'lead', 'admin'])
  expect((await describeSelf(stores.read, await actorOf(people.first))).courses).toEqual([])
  expect((await describeSelf(stores.read, await actorOf(people.lead))).courses[0]?.state).toBe('draft')

  await openCourse(stores, { ...asked, courseId }, inTerm)
  await openCourse(stores, { ...asked, courseId }, inTerm + 1)
  expect(await reads(people.first)).toBe('student')
  expect((await describeSelf(stores.read, await actorOf(people.first))).courses.map(course => course.id)).toEqual([courseId])
  const entries = await stores.read.selectFrom('ledger_entry').select(['actor', 'at']).where('action', '=', 'course.opened').execute()
  expect(entries).toEqual([{ actor: asked.actorId, at: inTerm }])
})

it('a TA, an instructor and a student cannot open it', async () => {
  const place = await locate(stores.read, { courseId: department.courseId }, inTerm)
  for (const [person, code] of [['ta', 'not_allowed'], ['instructor', 'not_allowed'], ['first', 'not_found']] as const) {
    const actor = await actorOf(department.people[person])
    expect(() => authorize('course:open', actor, place)).toThrow(expect.objectContaining({ code }))
  }
})

it('an earlier house’s drafts that have students are open after the migration; those without stay drafts', async () => {
  const { courseId, asked, termId } = department
  const empty = await createCourse(stores, { ...asked, course: { termId, code: 'ATM 302', title: 'Not begun', alsoListedAs: [], lateRule: { kind: 'none' }, conventionRevisionId: null, sections: ['A'], leadPersonId: null } }, inTerm)
  await stores.write(trx => trx.updateTable('course').set({ state: 'draft' }).execute())
  await stores.write(trx => openCourses.up(trx))
  const states = await stores.read.selectFrom('course').select(['id', 'state']).execute()
  expect(Object.fromEntries(states.map(course => [course.id, course.state]))).toEqual({ [courseId]: 'open', [empty.id]: 'draft' })
})
