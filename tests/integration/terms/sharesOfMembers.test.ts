import { afterEach, beforeEach, expect, it } from 'vitest'
import { carryOutRoster } from '../../../server/domain/people/roster/carryOutRoster'
import { planRoster } from '../../../server/domain/people/roster/planRoster'
import { readRoster } from '../../../server/domain/people/roster/readRoster'
import { createSection } from '../../../server/domain/terms/courses'
import { moveSection } from '../../../server/domain/terms/memberships'
import { openTemporary } from '../../fixtures/openTemporary'
import { workingCourse, type WorkingCourse } from '../../fixtures/workingCourse'

const now = Date.parse('2026-10-14T16:00:00Z')
const lead = { actorId: 'm-lead', once: null }
const noChoices = { sectionId: null, makeSections: [], end: [] }

let db: Awaited<ReturnType<typeof openTemporary>>
let course: WorkingCourse
beforeEach(async () => {
  db = await openTemporary()
  course = await workingCourse(db, { students: 3, times: { zone: 'America/Denver', opens: '2026-10-05T08:00', due: '2026-10-23T17:00' }, lateRule: { kind: 'none' } })
})
afterEach(() => db.remove())

const shares = () => db.read.selectFrom('share').innerJoin('holder_member', 'holder_member.holder_id', 'share.holder_id').select(['share.id', 'share.ordinal', 'share.digest', 'holder_member.membership_id']).orderBy('share.ordinal').execute()
async function bringIn(lines: string[]) {
  const roster = readRoster({ text: ['Name,E-mail,Section', ...lines].join('\n'), delimiter: null, columns: null })
  const { digest } = await planRoster(db.read, { courseId: 'course-1', roster, choices: noChoices })
  return carryOutRoster(db, { ...lead, courseId: 'course-1', roster, choices: noChoices, digest }, now)
}

const known = [0, 1, 2].map(no => `Student ${no},s${no}@example.edu,A`)

it('somebody who comes late gets the next share at once, and moves nobody', async () => {
  const before = await shares()
  await bringIn([...known, 'Late Comer,late@example.edu,A'])
  const after = await shares()
  expect(after.slice(0, 3)).toEqual(before)
  expect(after.map(share => share.ordinal)).toEqual([0, 1, 2, 3])
})

it('the same roster in another order leaves every share where it is (K27)', async () => {
  await bringIn([...known, 'Late Comer,late@example.edu,A', 'Later Still,later@example.edu,A'])
  const before = await shares()
  expect(await bringIn(['Later Still,later@example.edu,A', ...[...known].reverse(), 'Late Comer,late@example.edu,A'])).toMatchObject({ added: 0, moved: 0, same: 5 })
  expect(await shares()).toEqual(before)
})

it('a student who changes section keeps the share (K9)', async () => {
  const before = await shares()
  const { id } = await createSection(db, { ...lead, courseId: 'course-1', name: 'B' }, now)
  await moveSection(db, { ...lead, membershipId: course.students[0]!.membershipId, sectionId: id }, now)
  expect(await shares()).toEqual(before)
})
