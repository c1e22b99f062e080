import { refuse } from '#shared/errors'
import type { PlannedCourse, RollOverAsked, TermPlan } from '#shared/schemas/rollOver'
import type { Read } from '../../../db/writer'
import { digestOf } from '../../ledger/appendEntry'
import { readCalendar } from '../describeTerm'
import { moveDates } from './moveDates'

/**
 * What the next term would be, made from one that runs: courses, sections, staff, labs as drafts, and their dates moved by
 * teaching week and weekday. Writes nothing; the digest covers everything that carrying it out would write.
 */
export async function planTerm(read: Read, { fromTermId, term, choices }: RollOverAsked): Promise<TermPlan> {
  const from = await read.selectFrom('term').selectAll().where('id', '=', fromTermId).executeTakeFirst()
  if (!from) return refuse('not_found')
  const same = await read.selectFrom('term').select('id').where('name', '=', term.name).executeTakeFirst()
  if (same) refuse('already_exists', { what: `A term "${term.name}"` }, [{ path: 'term.name', message: 'A term of this name is here already.' }])
  const { calendar } = readCalendar(from.calendar_json)
  const courses = await plannedCourses(read, fromTermId, { calendar, term, choices })
  const coming = courses.filter(course => !course.isLeftOut)
  const labs = coming.flatMap(course => course.labs).filter(lab => !lab.isLeftOut)
  const postings = labs.flatMap(lab => lab.postings)
  const plan = { from: { id: from.id, name: from.name, startsOn: from.starts_on, endsOn: from.ends_on, zone: from.zone, calendar }, to: term, courses }
  return {
    ...plan,
    kept: await keptIn(read, fromTermId),
    counts: {
      courses: coming.length, sections: coming.reduce((sum, course) => sum + course.sections.length, 0), staff: coming.reduce((sum, course) => sum + course.staff.length, 0),
      labs: labs.length, dates: postings.length, toldDates: postings.filter(posting => posting.notes.length > 0).length, problems: postings.filter(posting => posting.problem !== null).length,
    },
    digest: digestOf(plan).toString('hex'),
  }
}

type Moving = { calendar: TermPlan['from']['calendar'], term: RollOverAsked['term'], choices: RollOverAsked['choices'] }

async function plannedCourses(read: Read, termId: string, moving: Moving): Promise<PlannedCourse[]> {
  const courses = await read.selectFrom('course').select(['id', 'code', 'title']).where('term_id', '=', termId).orderBy('code').execute()
  const planned: PlannedCourse[] = []
  for (const course of courses) {
    const [listings, sections] = await Promise.all([
      read.selectFrom('course_listing').select('code').where('course_id', '=', course.id).orderBy('code').execute(),
      read.selectFrom('section').select(['id as fromId', 'name']).where('course_id', '=', course.id).orderBy('name').execute(),
    ])
    const { staff, gone } = await staffOf(read, course.id)
    const { labs, kept } = await labsOf(read, course.id, moving)
    planned.push({
      fromId: course.id, code: course.code, title: course.title, alsoListedAs: listings.map(row => row.code), isLeftOut: moving.choices.leaveOut.includes(course.id),
      sections, staff, labs, staysBehind: [...gone, ...kept],
    })
  }
  return planned
}

async function staffOf(read: Read, courseId: string) {
  const [members, taSections] = await Promise.all([
    read.selectFrom('membership').leftJoin('person', 'person.id', 'membership.person_id').select(['membership.id', 'membership.role', 'membership.pseudonym', 'person.id as personId', 'person.display_name as name', 'person.state as personState'])
      .where('membership.course_id', '=', courseId).where('membership.role', '<>', 'student').where('membership.state', '=', 'active').orderBy('membership.role').orderBy('person.display_name').orderBy('membership.id').execute(),
    read.selectFrom('ta_section').innerJoin('section', 'section.id', 'ta_section.section_id').select(['ta_section.membership_id as id', 'section.name']).where('ta_section.course_id', '=', courseId).orderBy('section.name').execute(),
  ])
  const staff: PlannedCourse['staff'] = []
  const gone: PlannedCourse['staysBehind'] = []
  for (const member of members) {
    if (member.role === 'student') continue
    if (member.personId === null || (member.personState !== 'active' && member.personState !== 'invited')) {
      gone.push({ what: `${member.name ?? member.pseudonym}, ${member.role}`, why: 'The account is closed.' })
      continue
    }
    staff.push({ fromId: member.id, personId: member.personId, name: member.name ?? '', role: member.role, sections: taSections.filter(row => row.id === member.id).map(row => row.name) })
  }
  return { staff, gone }
}

async function labsOf(read: Read, courseId: string, { calendar, term, choices }: Moving) {
  const rows = await read.selectFrom('lab').select(['id', 'title', 'state']).where('course_id', '=', courseId).where('state', '<>', 'archived').orderBy('id').execute()
  const labs: PlannedCourse['labs'] = []
  const kept: PlannedCourse['staysBehind'] = []
  for (const lab of rows) {
    if (lab.state === 'withdrawn') {
      kept.push({ what: lab.title, why: 'The lab was withdrawn.' })
      continue
    }
    const revision = await read.selectFrom('lab_revision').select(['id', 'no', 'digest']).where('lab_id', '=', lab.id).orderBy('no', 'desc').executeTakeFirst()
    if (!revision) {
      kept.push({ what: lab.title, why: 'Nothing is written in it yet.' })
      continue
    }
    const postings = await read.selectFrom('posting').innerJoin('section', 'section.id', 'posting.section_id').select(['posting.id', 'posting.section_id as sectionId', 'section.name as section', 'posting.opens_local as opensLocal', 'posting.due_local as dueLocal'])
      .where('posting.lab_id', '=', lab.id).where('posting.state', '<>', 'withdrawn').orderBy('section.name').execute()
    labs.push({
      fromId: lab.id, title: lab.title, revisionId: revision.id, revisionNo: revision.no, revisionDigest: revision.digest.toString('hex'), isLeftOut: choices.leaveOut.includes(lab.id),
      postings: postings.map(({ id, sectionId, section, opensLocal, dueLocal }) => {
        const chosen = choices.dates.find(date => date.postingId === id)
        return { fromId: id, sectionFromId: sectionId, section, ...moveDates(calendar, term, { opensLocal, dueLocal }, chosen ? { opensLocal: chosen.opensLocal, dueLocal: chosen.dueLocal } : null) }
      }),
    })
  }
  const firstDue = (lab: PlannedCourse['labs'][number]) => lab.postings.map(posting => posting.was.dueLocal).sort()[0] ?? '9999'
  labs.sort((a, b) => firstDue(a) < firstDue(b) ? -1 : firstDue(a) > firstDue(b) ? 1 : 0)
  return { labs, kept }
}

async function keptIn(read: Read, termId: string): Promise<TermPlan['kept']> {
  const [students, submissions] = await Promise.all([
    read.selectFrom('membership').innerJoin('course', 'course.id', 'membership.course_id').select(count => count.fn.countAll<number>().as('n'))
      .where('course.term_id', '=', termId).where('membership.role', '=', 'student').where('membership.state', '=', 'active').executeTakeFirstOrThrow(),
    read.selectFrom('submission').innerJoin('share', 'share.id', 'submission.share_id').innerJoin('lab', 'lab.id', 'share.lab_id').innerJoin('course', 'course.id', 'lab.course_id').select(count => count.fn.countAll<number>().as('n'))
      .where('course.term_id', '=', termId).executeTakeFirstOrThrow(),
  ])
  return { students: students.n, submissions: submissions.n }
}
