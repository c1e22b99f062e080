import type { RosterChoices, RosterColumns, RosterPreview } from '#shared/schemas/department'
import { refuse } from '#shared/errors'
import type { Read } from '../../../db/writer'
import { planRoster } from './planRoster'
import { readRoster, type Delimiter } from './readRoster'

/** A roster file as it was read, and what it would do to a course, side by side. Writes nothing. */
export async function previewRoster(read: Read, asked: { courseId: string, text: string, delimiter: Delimiter | null, columns: RosterColumns | null, choices: RosterChoices }): Promise<RosterPreview> {
  const course = await read.selectFrom('course').innerJoin('term', 'term.id', 'course.term_id').select(['course.code', 'course.title', 'term.name as term']).where('course.id', '=', asked.courseId).executeTakeFirst()
  if (!course) return refuse('not_found')
  const roster = readRoster(asked)
  const [plan, sections] = await Promise.all([
    planRoster(read, { courseId: asked.courseId, roster, choices: asked.choices }),
    read.selectFrom('section').select(['id', 'name']).where('course_id', '=', asked.courseId).orderBy('name').execute(),
  ])
  const { delimiter, header, columns, isGuess, sample, count } = roster
  return { delimiter, header, columns, isGuess, sample, count, rows: roster.rows.length, course, sections, ...plan }
}
