import { refuse } from '#shared/errors'
import type { conventionChoice, CourseConvention } from '#shared/schemas/convention'
import { constantDefinitions } from '#shared/thermo/constants'
import { conventions, findConvention } from '#shared/thermo/conventions/index'
import { quantities } from '#shared/thermo/registry'
import { formatUnit } from '#shared/units/formatQuantity'
import type { z } from 'zod'
import type { Read, Stores } from '../../db/writer'
import { doOnce, type Asked } from '../asked'
import { conventionBody, ensureConvention } from '../labs/conventions'
import { renderInline } from '../labs/renderLabText'
import { noteChange, refuseOlder } from '../lastChange'
import { appendEntry, courseChain } from '../ledger/appendEntry'
import { assertOpenTerm } from './assertOpenTerm'

/** The key of a course's own convention; its revisions follow each other under it. */
const ownKey = (courseId: string): string => `own-${courseId}`

/** What the course teaches with, and what it could. */
export async function readCourseConvention(read: Read, courseId: string, mayChange: boolean): Promise<CourseConvention> {
  const row = await read.selectFrom('course').innerJoin('convention_revision', 'convention_revision.id', 'course.convention_revision_id')
    .select(['course.version', 'convention_revision.no', 'convention_revision.body_json as body']).where('course.id', '=', courseId).executeTakeFirst()
  if (!row) return refuse('not_found')
  const convention = conventionBody.parse(JSON.parse(row.body))
  return {
    version: row.version, revisionNo: row.no, convention, mayChange, isOwn: convention.key === ownKey(courseId),
    named: conventions.map(one => ({ key: one.key, title: one.title, convention: conventionBody.parse(one) })),
    constants: constantDefinitions.map(({ name, symbol, label, unit, range, isOptional }) => ({ name, symbolHtml: renderInline(`$${symbol}$`), label, unit: unit === '1' ? '' : formatUnit(unit), low: range[0], high: range[1], isOptional: isOptional === true })),
    quantities: quantities.filter(one => one.variants.length > 1).map(one => ({ key: one.key, name: one.name, variants: one.variants.map(({ key, label }) => ({ key, label })) })),
  }
}

/**
 * Chooses what a course teaches with from now on. Labs that are posted keep the convention that they were posted with.
 * @throws {DomainError} `convention_open` for one that does not close, `changed_meanwhile`, `not_found`, `term_closed`
 */
export function chooseConvention({ write }: Stores, input: Asked & { courseId: string, seenVersion: number, choice: z.output<typeof conventionChoice> }, now: number): Promise<{ version: number }> {
  return write(trx => doOnce(trx, input, async () => {
    const course = await trx.selectFrom('course').select(['id', 'term_id', 'version', 'convention_revision_id as before']).where('id', '=', input.courseId).executeTakeFirst()
    if (!course) return refuse('not_found')
    await assertOpenTerm(trx, course.term_id)
    if (course.version !== input.seenVersion) await refuseOlder(trx, course.id, course.version)
    const { choice } = input
    const chosen = choice.is === 'named' ? findConvention(choice.key) : { ...choice.convention, key: ownKey(course.id) }
    if (!chosen) return refuse('not_found')
    assertKnownVariants(chosen.variants)
    const { id } = await ensureConvention(trx, chosen, now)
    const version = course.version + 1
    await trx.updateTable('course').set({ convention_revision_id: id, version }).where('id', '=', course.id).execute()
    await noteChange(trx, course.id, input.actorId, now)
    await appendEntry(trx, { chain: courseChain(course.id), at: now, actor: input.actorId, action: 'course.convention', facts: { courseId: course.id, before: course.before, after: id, key: chosen.key } })
    return { version }
  }))
}

function assertKnownVariants(variants: Readonly<Record<string, string>>): void {
  for (const [key, variant] of Object.entries(variants)) {
    if (!quantities.find(one => one.key === key)?.variants.some(one => one.key === variant)) refuse('invalid', {}, [{ path: `convention.variants.${key}`, message: 'There is no such formula.' }])
  }
}
