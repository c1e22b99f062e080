import { refuse } from '#shared/errors'
import type { Convention } from '#shared/marking/types'
import { conventionBody } from '#shared/schemas/convention'
import { conventionFaults } from '#shared/thermo/conventions/closes'
import type { Read, Trx } from '../../db/writer'
import { newId } from '../ids'
import { digestOf } from '../ledger/appendEntry'
import { currentDraw } from '../shares/draws'

export { conventionBody }

/**
 * The row of a convention: found by its digest, or written as the next revision of its key.
 * @throws {DomainError} `convention_open` when cp − cv is not R, or a constant is no constant of air
 */
export async function ensureConvention(trx: Trx, given: Convention, now: number): Promise<{ id: string }> {
  const convention = conventionBody.parse(given)
  const faults = conventionFaults(convention)
  if (faults.length > 0) refuse('convention_open', { reason: faults.join(' ') })
  const digest = digestOf(convention)
  const known = await trx.selectFrom('convention_revision').select('id').where('digest', '=', digest).executeTakeFirst()
  if (known) return known
  const last = await trx.selectFrom('convention_revision').select('no').where('convention_key', '=', convention.key).orderBy('no', 'desc').limit(1).executeTakeFirst()
  const id = newId(now)
  await trx.insertInto('convention_revision').values({ id, convention_key: convention.key, no: (last?.no ?? 0) + 1, body_json: JSON.stringify(convention), digest }).execute()
  return { id }
}

/** Revisions of conventions never change, so the last few stay read. */
const readConventions = new Map<string, Convention>()
const mostRead = 40

export async function getConvention(db: Read | Trx, revisionId: string): Promise<Convention> {
  const known = readConventions.get(revisionId)
  if (known) return known
  const row = await db.selectFrom('convention_revision').select('body_json').where('id', '=', revisionId).executeTakeFirstOrThrow()
  const convention = conventionBody.parse(JSON.parse(row.body_json))
  // A row of a unit of work that is still open may be undone; one that was read back is there for good.
  if (!db.isTransaction) {
    if (readConventions.size >= mostRead) readConventions.delete(readConventions.keys().next().value ?? '')
    readConventions.set(revisionId, convention)
  }
  return convention
}

/** The convention of a lab: the one that its shares were drawn and checked with; before that, the course's. */
export async function conventionOfLab(db: Read | Trx, lab: { id: string, courseId: string }): Promise<{ id: string, convention: Convention }> {
  const draw = await currentDraw(db, lab.id)
  if (!draw) return conventionOfCourse(db, lab.courseId)
  const id = draw.supply.conventionRevisionId
  return { id, convention: await getConvention(db, id) }
}

/** The convention that a course teaches with now. */
export async function conventionOfCourse(db: Read | Trx, courseId: string): Promise<{ id: string, convention: Convention }> {
  const row = await db.selectFrom('course').innerJoin('convention_revision', 'convention_revision.id', 'course.convention_revision_id')
    .select(['convention_revision.id', 'convention_revision.body_json as body']).where('course.id', '=', courseId).executeTakeFirstOrThrow()
  return { id: row.id, convention: conventionBody.parse(JSON.parse(row.body)) }
}
