import { keptQuery } from '../db/keptQuery'
import type { Read } from '../db/writer'
import type { Place } from './authorize'

/** The names that a route's parameters may have; each says what kind of object it is. */
export const placeParams = ['courseId', 'sectionId', 'memberId', 'labId', 'postingId', 'shareId', 'submissionId', 'receiptNo', 'disputeId', 'dataSetId', 'versionId', 'uploadId', 'jobId'] as const
export type PlaceParam = (typeof placeParams)[number]

const nowhere: Place = { courseId: null, sectionIds: [], ownerIds: [], termState: null, openSectionIds: null, isDepartmentWide: false }

/**
 * Finds the place of the object that a route's parameters name, or null where there is none.
 * With several parameters the narrowest decides, and all must agree on the course.
 */
export async function locate(read: Read, params: Readonly<Record<string, string>>, now: number): Promise<Place | null> {
  const places: (Place | null)[] = []
  for (const name of placeParams) {
    const id = params[name]
    if (id !== undefined) places.push(await finders[name](read, id, now))
  }
  if (places.length === 0) return nowhere
  if (places.some(place => place === null)) return null
  const found = places as Place[]
  const narrowest = found[found.length - 1]!
  const courseId = found[0]!.courseId
  if (found.some(place => place.courseId !== courseId && !place.isDepartmentWide)) return null
  // what is the department's is used from a course: whether its term is open decides
  return { ...narrowest, courseId, termState: narrowest.termState ?? found[0]!.termState }
}

type Finder = (read: Read, id: string, now: number) => Promise<Place | null>

const finders: Record<PlaceParam, Finder> = {
  async courseId(read, id) {
    const row = await read.selectFrom('course').innerJoin('term', 'term.id', 'course.term_id').select(['course.id as courseId', 'term.state as termState'])
      .where('course.id', '=', id).executeTakeFirst()
    return row ? { ...nowhere, ...row } : null
  },
  async sectionId(read, id) {
    const row = await read.selectFrom('section').innerJoin('course', 'course.id', 'section.course_id').innerJoin('term', 'term.id', 'course.term_id')
      .select(['course.id as courseId', 'term.state as termState']).where('section.id', '=', id).executeTakeFirst()
    return row ? { ...nowhere, ...row, sectionIds: [id] } : null
  },
  /** A student in a course; staff are found by their roles. */
  async memberId(read, id) {
    const row = await read.selectFrom('membership').innerJoin('course', 'course.id', 'membership.course_id').innerJoin('term', 'term.id', 'course.term_id')
      .select(['course.id as courseId', 'term.state as termState', 'membership.section_id as sectionId']).where('membership.id', '=', id).where('membership.role', '=', 'student').where('membership.state', '=', 'active').executeTakeFirst()
    return row ? { ...nowhere, courseId: row.courseId, termState: row.termState, sectionIds: row.sectionId === null ? [] : [row.sectionId], ownerIds: [id] } : null
  },
  async labId(read, id, now) {
    const row = await read.selectFrom('lab').innerJoin('course', 'course.id', 'lab.course_id').innerJoin('term', 'term.id', 'course.term_id')
      .select(['course.id as courseId', 'term.state as termState', 'lab.state as labState']).where('lab.id', '=', id).executeTakeFirst()
    if (!row) return null
    return { ...nowhere, courseId: row.courseId, termState: row.termState, openSectionIds: await openSections(read, id, now) }
  },
  async postingId(read, id, now) {
    const row = await read.selectFrom('posting').innerJoin('lab', 'lab.id', 'posting.lab_id').innerJoin('course', 'course.id', 'lab.course_id').innerJoin('term', 'term.id', 'course.term_id')
      .select(['course.id as courseId', 'term.state as termState', 'posting.section_id as sectionId', 'lab.id as labId']).where('posting.id', '=', id).executeTakeFirst()
    return row ? { ...nowhere, courseId: row.courseId, termState: row.termState, sectionIds: [row.sectionId], openSectionIds: await openSections(read, row.labId, now) } : null
  },
  shareId: (read, id, now) => placeOfShare(read, id, now),
  async submissionId(read, id, now) {
    const row = await read.selectFrom('submission').select('share_id').where('id', '=', id).executeTakeFirst()
    return row ? placeOfShare(read, row.share_id, now) : null
  },
  async receiptNo(read, no, now) {
    const row = await read.selectFrom('submission').select('share_id').where('receipt_no', '=', no).executeTakeFirst()
    return row ? placeOfShare(read, row.share_id, now) : null
  },
  async disputeId(read, id, now) {
    const row = await read.selectFrom('dispute').innerJoin('submission', 'submission.id', 'dispute.submission_id').select('submission.share_id').where('dispute.id', '=', id).executeTakeFirst()
    return row ? placeOfShare(read, row.share_id, now) : null
  },
  dataSetId: (read, id) => placeOfDataSet(read, id),
  async versionId(read, id) {
    const row = await read.selectFrom('data_set_version').select('data_set_id').where('id', '=', id).executeTakeFirst()
    return row ? placeOfDataSet(read, row.data_set_id) : null
  },
  async uploadId(read, id) {
    const row = await read.selectFrom('upload').select(['id', 'course_id']).where('id', '=', id).executeTakeFirst()
    return row ? placeOfCourseOrDepartment(read, row.course_id) : null
  },
  async jobId(read, id) {
    const row = await read.selectFrom('job').select(['id', 'course_id']).where('id', '=', id).executeTakeFirst()
    return row ? placeOfCourseOrDepartment(read, row.course_id) : null
  },
}

const openPostings = keptQuery((db, given: { labId: string, now: number }) => db.selectFrom('posting').select('section_id').where('lab_id', '=', given.labId).where('state', 'in', ['posted', 'withdrawn']).where('opens_at', '<=', given.now))

/** A lab that was withdrawn while it was open stays in sight: its students are told so instead of finding nothing. */
async function openSections(read: Read, labId: string, now: number): Promise<string[]> {
  const rows = await openPostings(read, { labId, now })
  return rows.map(row => row.section_id)
}

const holdersOfShare = keptQuery((db, given: { shareId: string }) => db.selectFrom('share')
  .innerJoin('lab', 'lab.id', 'share.lab_id').innerJoin('course', 'course.id', 'lab.course_id').innerJoin('term', 'term.id', 'course.term_id')
  .innerJoin('holder_member', 'holder_member.holder_id', 'share.holder_id').innerJoin('membership', 'membership.id', 'holder_member.membership_id')
  .select(['course.id as courseId', 'term.state as termState', 'lab.id as labId', 'membership.id as ownerId', 'membership.section_id as sectionId'])
  .where('share.id', '=', given.shareId))

/** A share belongs to the sections where its holders are now: a student who moves keeps the share and changes the TA. */
async function placeOfShare(read: Read, shareId: string, now: number): Promise<Place | null> {
  const rows = await holdersOfShare(read, { shareId })
  const first = rows[0]
  if (!first) return null
  return {
    ...nowhere, courseId: first.courseId, termState: first.termState,
    sectionIds: [...new Set(rows.flatMap(row => row.sectionId ?? []))], ownerIds: rows.map(row => row.ownerId), openSectionIds: await openSections(read, first.labId, now),
  }
}

async function placeOfDataSet(read: Read, id: string): Promise<Place | null> {
  const row = await read.selectFrom('data_set').select(['owner_course_id']).where('id', '=', id).executeTakeFirst()
  return row ? placeOfCourseOrDepartment(read, row.owner_course_id) : null
}

async function placeOfCourseOrDepartment(read: Read, courseId: string | null): Promise<Place | null> {
  return courseId === null ? { ...nowhere, isDepartmentWide: true } : finders.courseId(read, courseId, 0)
}
