import { refuse } from '#shared/errors'
import type { RosterChoices } from '#shared/schemas/department'
import type { Read } from '../../../db/writer'
import { digestOf } from '../../ledger/appendEntry'
import type { ReadRoster, RefusedLine } from './readRoster'

export interface RosterPlan {
  /** Not in the course yet; `isNew` people are invited by mail, `isBack` ones were dropped and resume. */
  adds: { line: number, email: string, name: string, section: string, isNew: boolean, isBack: boolean }[]
  /** In the course, in another section than the file says. */
  moves: { line: number, membershipId: string, email: string, name: string, from: string, to: string }[]
  /** Students of the course who are not in the file. They stay unless it is said that they end. */
  absent: { membershipId: string, email: string, name: string, section: string, ends: boolean }[]
  /** As the file says already. */
  same: number
  /** Sections that the course does not have and that are made. */
  newSections: string[]
  /** Sections that the file names and nobody said to make; their lines are among the refused. */
  unknownSections: string[]
  refused: RefusedLine[]
  /** Of everything that will be done: another order of the same lines gives the same one. */
  digest: string
}

/** What a roster would add, change and leave in a course as it is now. Writes nothing. */
export async function planRoster(read: Read, { courseId, roster, choices }: { courseId: string, roster: ReadRoster, choices: RosterChoices }): Promise<RosterPlan> {
  const course = await read.selectFrom('course').innerJoin('term', 'term.id', 'course.term_id').select(['course.id', 'term.state']).where('course.id', '=', courseId).executeTakeFirst()
  if (!course) return refuse('not_found')
  if (course.state === 'closed') refuse('term_closed')
  const [sections, members, people] = await Promise.all([
    read.selectFrom('section').select(['id', 'name']).where('course_id', '=', courseId).orderBy('name').execute(),
    read.selectFrom('membership').leftJoin('person', 'person.id', 'membership.person_id').leftJoin('section', 'section.id', 'membership.section_id')
      .select(['membership.id', 'membership.role', 'membership.state', 'person.email_norm as email', 'person.display_name as name', 'section.name as section']).where('membership.course_id', '=', courseId).execute(),
    peopleByEmail(read, roster.rows.map(row => row.email)),
  ])
  const whole = sections.find(section => section.id === choices.sectionId)
  if (choices.sectionId !== null && !whole) refuse('invalid', {}, [{ path: 'choices.sectionId', message: 'This course has no such section.' }])
  const named = new Map([...sections.map(section => section.name), ...choices.makeSections].map(name => [sectionKey(name), name]))
  const byEmail = new Map(members.flatMap(member => member.email === null ? [] : [[member.email, member] as const]))

  const plan: Omit<RosterPlan, 'digest'> = { adds: [], moves: [], absent: [], same: 0, newSections: [], unknownSections: [], refused: [...roster.refused] }
  const unknown = new Map<string, string>()
  const present = new Set<string>()
  const needed = new Set<string>()
  for (const row of roster.rows) {
    present.add(row.email)
    const refused = (reason: string) => plan.refused.push({ line: row.line, text: `${row.email}, ${row.name}`, reason })
    const member = byEmail.get(row.email)
    if (member && member.role !== 'student') {
      refused(`Is in this course as ${member.role}.`)
      continue
    }
    if (people.get(row.email) === 'closed') {
      refused('The account is closed.')
      continue
    }
    const wanted = row.section ?? whole?.name ?? (sections.length === 1 ? sections[0]!.name : null)
    if (wanted === null) {
      refused('No section. Choose one for lines without.')
      continue
    }
    const section = named.get(sectionKey(wanted))
    if (section === undefined) {
      unknown.set(sectionKey(wanted), wanted)
      refused(`The course has no section ${wanted}.`)
      continue
    }
    needed.add(section)
    if (member?.state === 'active') {
      if (member.section === section) plan.same += 1
      else plan.moves.push({ line: row.line, membershipId: member.id, email: row.email, name: member.name ?? row.name, from: member.section ?? '', to: section })
    }
    else plan.adds.push({ line: row.line, email: row.email, name: row.name, section, isNew: !people.has(row.email), isBack: member !== undefined })
  }
  for (const member of members) {
    if (member.role !== 'student' || member.state !== 'active' || (member.email !== null && present.has(member.email))) continue
    plan.absent.push({ membershipId: member.id, email: member.email ?? '', name: member.name ?? '', section: member.section ?? '', ends: choices.end.includes(member.id) })
  }
  const existing = new Set(sections.map(section => section.name))
  plan.newSections = [...needed].filter(name => !existing.has(name)).sort()
  plan.unknownSections = [...unknown.values()].sort()
  const byPerson = (a: { email: string }, b: { email: string }) => a.email < b.email ? -1 : a.email > b.email ? 1 : 0
  plan.adds.sort(byPerson)
  plan.moves.sort(byPerson)
  plan.absent.sort(byPerson)
  plan.refused.sort((a, b) => a.line - b.line)
  return { ...plan, digest: digestOfPlan(courseId, plan) }
}

/** "Section A" and "a" are one section. */
const sectionKey = (name: string): string => name.toLowerCase().replace(/^(section|sec)\b\.?\s*/, '').replace(/\s+/g, ' ').trim()

function digestOfPlan(courseId: string, plan: Omit<RosterPlan, 'digest'>): string {
  const withoutLine = <T extends { line: number }>({ line: _, ...rest }: T) => rest
  return digestOf({ courseId, adds: plan.adds.map(withoutLine), moves: plan.moves.map(withoutLine), absent: plan.absent, newSections: plan.newSections, same: plan.same }).toString('hex')
}

async function peopleByEmail(read: Read, emails: readonly string[]): Promise<Map<string, 'invited' | 'active' | 'closed' | 'erased'>> {
  const found = new Map<string, 'invited' | 'active' | 'closed' | 'erased'>()
  for (let at = 0; at < emails.length; at += 500) {
    const rows = await read.selectFrom('person').select(['email_norm as email', 'state']).where('email_norm', 'in', emails.slice(at, at + 500)).execute()
    for (const row of rows) if (row.email !== null) found.set(row.email, row.state)
  }
  return found
}
