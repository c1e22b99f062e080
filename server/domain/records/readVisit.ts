import { z } from 'zod'
import { refuse } from '#shared/errors'
import type { ClassView } from '#shared/schemas/marks'
import type { Visit, VisitedPosting, VisitedWork } from '#shared/schemas/visit'
import type { Read, Stores } from '../../db/writer'
import { appendEntry, departmentChain } from '../ledger/appendEntry'
import { classView } from '../marking/classView'
import { judgedAs } from '../marking/heightBar'
import { currentSteps, type StoredStep } from '../marking/readEvaluations'
import { judgementOfRow, questionOfRow } from '../marking/storedEvaluation'
import { wallTimeAt } from '../terms/wallClock'
import { pieceNumbers } from './samplePieces'

const scope = z.object({ courseIds: z.array(z.string()) })
const piecesPerPosting = 5
const loggedEachMs = 3_600_000
const noConvention = { key: '', title: '', source: '', constants: {}, variants: {}, accepted: [] } as const

/**
 * What a visitor may read: the courses of the stated scope, what the classes reached, and of each released posting a few pieces of work from
 * the lowest to the highest marks. Students stand in it by pseudonym; a typed value is shown as it was read, never as it was typed,
 * because free text can hold a name.
 *
 * Every look is logged: a line for each person whose work was shown, and an entry of the department's ledger once an hour.
 */
export async function readVisit({ read, write }: Stores, { roleId, personId }: { roleId: string, personId: string }, now: number): Promise<Visit> {
  const role = await read.selectFrom('department_role').select(['scope_json', 'until_at']).where('id', '=', roleId).executeTakeFirst()
  if (!role || role.until_at === null || role.scope_json === null) return refuse('not_found')
  const { courseIds } = scope.parse(JSON.parse(role.scope_json))
  const term = await read.selectFrom('term').select('zone').orderBy('starts_on', 'desc').limit(1).executeTakeFirst()
  const courses = courseIds.length === 0
    ? []
    : await read.selectFrom('course').innerJoin('term', 'term.id', 'course.term_id').select(['course.id', 'course.code', 'course.title', 'term.name as term']).where('course.id', 'in', courseIds).orderBy('term.starts_on', 'desc').orderBy('course.code').execute()
  const seen = new Set<string>()
  const shown: Visit['courses'] = []
  for (const course of courses) {
    const postings = await read.selectFrom('posting').innerJoin('lab', 'lab.id', 'posting.lab_id').select('posting.id')
      .where('lab.course_id', '=', course.id).where('lab.state', '=', 'posted').where('posting.state', '=', 'posted').where('posting.released_at', '<=', now).orderBy('posting.due_at').orderBy('posting.id').execute()
    const visited: VisitedPosting[] = []
    for (const posting of postings) visited.push(await visitedPosting(read, await classView(read, posting.id, now), seen))
    shown.push({ ...course, postings: visited })
  }
  await write(async (trx) => {
    if (seen.size > 0) await trx.insertInto('access_log').values([...seen].map(membershipId => ({ at: now, actor_person_id: personId, subject_membership_id: membershipId, route: 'GET /api/department/visit' }))).execute()
    const last = await trx.selectFrom('ledger_entry').select('at').where('chain_id', '=', departmentChain).where('actor', '=', roleId).where('action', '=', 'visit.read').orderBy('seq', 'desc').limit(1).executeTakeFirst()
    if (!last || last.at <= now - loggedEachMs) await appendEntry(trx, { chain: departmentChain, at: now, actor: roleId, action: 'visit.read', facts: { roleId, courseIds: courses.map(course => course.id), people: seen.size } })
  })
  return { lastDay: wallTimeAt(role.until_at - 60_000, term?.zone ?? 'UTC').slice(0, 10), courses: shown }
}

async function visitedPosting(read: Read, view: ClassView, seen: Set<string>): Promise<VisitedPosting> {
  const handedIn = view.people.filter(person => person.submissionId !== null && person.totalMilli !== null).toSorted((a, b) => (a.totalMilli ?? 0) - (b.totalMilli ?? 0) || a.membershipId.localeCompare(b.membershipId))
  const chosen = pieceNumbers(handedIn.length, piecesPerPosting).flatMap(at => handedIn[at] ?? [])
  const [names, stored] = await Promise.all([
    chosen.length === 0 ? [] : read.selectFrom('membership').select(['id', 'pseudonym']).where('id', 'in', chosen.map(person => person.membershipId)).execute(),
    currentSteps(read, chosen.flatMap(person => person.submissionId ?? [])),
  ])
  for (const person of chosen) seen.add(person.membershipId)
  return {
    id: view.posting.id, title: view.lab.title, section: view.posting.section, students: view.students, handedIn: view.handedIn, meanMilli: view.meanMilli, maxMilli: view.maxMilli,
    steps: view.steps.map(step => ({ key: step.key, no: step.no, title: step.title, maxMilli: step.maxMilli, within: step.within, outside: step.outside })),
    pieces: chosen.map((person): VisitedWork => ({
      pseudonym: names.find(row => row.id === person.membershipId)?.pseudonym ?? '', totalMilli: person.totalMilli ?? 0,
      values: view.steps.map(step => valueOf(step.key, stored.find(each => each.submissionId === person.submissionId && each.stepKey === step.key))),
    })),
  }
}

function valueOf(key: string, stored: StoredStep | undefined): VisitedWork['values'][number] {
  if (!stored?.evaluation) return { key, read: '', judged: 'empty', pointsMilli: stored?.pointsMilli ?? 0 }
  const { answer } = questionOfRow(stored.evaluation, noConvention)
  const isValue = answer.reading === 'ok' || answer.reading === 'class' || answer.reading === 'none' || answer.reading === 'not_reached' || answer.reading === 'not_defined'
  return { key, read: isValue ? answer.message.replace(/^read as /, '') : '', judged: judgedAs(judgementOfRow(stored.evaluation), answer), pointsMilli: stored.pointsMilli }
}
