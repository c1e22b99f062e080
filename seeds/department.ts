import type { LateRule } from '#shared/schemas/lab'
import { acceptInvitation } from '../server/domain/people/acceptInvitation'
import { demoPassphrase } from '../server/domain/people/demoPassphrase'
import { setDepartmentRole } from '../server/domain/people/departmentRoles'
import { foundDepartment } from '../server/domain/people/foundDepartment'
import { invitePerson } from '../server/domain/people/invitePerson'
import { tokenOf } from '../server/domain/people/oneTimeToken'
import { createCourse } from '../server/domain/terms/courses'
import { createTerm } from '../server/domain/terms/createTerm'
import { enrol } from '../server/domain/terms/enrol'
import { endMembership, setTaSections } from '../server/domain/terms/memberships'
import { planTerm } from '../server/domain/terms/rollOver/planTerm'
import { openCourse } from '../server/domain/terms/openCourse'
import { startTerm } from '../server/domain/terms/rollOver/startTerm'
import { setTermState } from '../server/domain/terms/setTermState'
import type { Acting } from '../server/domain/people/actor'
import type { Stores } from '../server/db/writer'
import type { DemoCalendar } from './calendar'
import { emailOf, staff, type SeedPerson } from './people'

/** A student of a course, as the demo's stories name them. */
export interface Member { key: string, membershipId: string, personId: string, sectionId: string }

export const lateRules = {
  earned: { kind: 'of_earned', percent: 10, closesAfterDays: 7 },
  maximum: { kind: 'of_maximum', percent: 5, closesAfterDays: 5 },
} as const satisfies Record<string, LateRule>

export const courseCodes = { main: 'ATM 231', small: 'ATM 415' } as const
export type CourseKey = keyof typeof courseCodes

/** The department while it is being made: who is who, and in which role they act. */
export class Department {
  private readonly people = new Map<string, string>()
  private adminActor = ''

  constructor(readonly stores: Stores, readonly calendar: DemoCalendar, private readonly secret: string) {}

  /** Who does things in the department's name. */
  private get admin() {
    return { actorId: this.adminActor, once: null }
  }

  async found(now: number): Promise<void> {
    const { personId, roleId } = await foundDepartment(this.stores, { name: staff.admin.name, email: emailOf(staff.admin) }, now)
    this.people.set(staff.admin.key, personId)
    this.adminActor = roleId
    await this.accept(staff.admin, now + 3_600_000)
  }

  async invite(seeds: readonly SeedPerson[], now: number): Promise<void> {
    await Promise.all(seeds.filter(seed => !this.people.has(seed.key)).map(async (seed) => {
      const { id } = await invitePerson(this.stores, { ...this.admin, name: seed.name, email: emailOf(seed) }, now)
      this.people.set(seed.key, id)
    }))
  }

  /** People follow the link in their mail and choose a passphrase. */
  async acceptAll(seeds: readonly SeedPerson[], now: number): Promise<void> {
    const waiting = await this.stores.read.selectFrom('person').select('id').where('state', '=', 'invited').execute()
    await Promise.all(seeds.filter(seed => this.people.has(seed.key)).filter(seed => waiting.some(person => person.id === this.personId(seed))).map(seed => this.accept(seed, now)))
  }

  private async accept(seed: SeedPerson, now: number): Promise<void> {
    const mail = await this.stores.read.selectFrom('outbox').select('facts_json').where('to_person_id', '=', this.personId(seed)).where('template', '=', 'invitation').executeTakeFirstOrThrow()
    const { tokenId } = JSON.parse(mail.facts_json) as { tokenId: string }
    await acceptInvitation(this.stores, { token: tokenOf('invite', tokenId), passphrase: demoPassphrase(this.secret, emailOf(seed)) }, now)
  }

  personId(seed: SeedPerson): string {
    return this.people.get(seed.key) ?? (() => { throw new Error(`${seed.name} was not invited.`) })()
  }

  async appointTechnician(now: number): Promise<void> {
    await setDepartmentRole(this.stores, { ...this.admin, personId: this.personId(staff.technician), role: 'technician', courseIds: [], until: null }, now)
  }

  async appointVisitor(courseIds: readonly string[], until: string, now: number): Promise<void> {
    await setDepartmentRole(this.stores, { ...this.admin, personId: this.personId(staff.visitor), role: 'visitor', courseIds, until }, now)
  }

  async openPastTerm(now: number): Promise<{ termId: string }> {
    const { id: termId } = await createTerm(this.stores, { ...this.admin, term: this.calendar.past }, now)
    await createCourse(this.stores, {
      ...this.admin,
      course: { termId, code: courseCodes.main, title: 'Thermodynamics of the Lower Atmosphere', alsoListedAs: ['PHY 243', 'ENV 231'], lateRule: lateRules.earned, conventionRevisionId: null, sections: ['A', 'B'], leadPersonId: this.personId(staff.lead) },
    }, now)
    await createCourse(this.stores, {
      ...this.admin,
      course: { termId, code: courseCodes.small, title: 'Measuring the Boundary Layer', alsoListedAs: [], lateRule: lateRules.maximum, conventionRevisionId: null, sections: ['A'], leadPersonId: this.personId(staff.secondLead) },
    }, now)
    await setTermState(this.stores, { ...this.admin, termId, state: 'running' }, now)
    return { termId }
  }

  /** The next term from the last one: the plan is read, and then carried out as it was read. */
  async rollOver(fromTermId: string, now: number): Promise<{ termId: string }> {
    const asked = { fromTermId, term: this.calendar.running, choices: { leaveOut: [], dates: [] } }
    const plan = await planTerm(this.stores.read, asked)
    const started = await startTerm(this.stores, { ...this.admin, ...asked, digest: plan.digest }, now)
    // What came along is a draft: it is opened to its students before the term begins.
    const courses = await this.stores.read.selectFrom('course').select('id').where('term_id', '=', started.termId).execute()
    for (const course of courses) await openCourse(this.stores, { ...this.admin, courseId: course.id }, now)
    return started
  }

  async setTerm(termId: string, state: 'running' | 'closed', now: number): Promise<void> {
    await setTermState(this.stores, { ...this.admin, termId, state }, now)
  }

  async course(termId: string, key: CourseKey): Promise<{ id: string, sections: { id: string, name: string }[] }> {
    const course = await this.stores.read.selectFrom('course').select('id').where('term_id', '=', termId).where('code', '=', courseCodes[key]).executeTakeFirstOrThrow()
    const sections = await this.stores.read.selectFrom('section').select(['id', 'name']).where('course_id', '=', course.id).orderBy('name').execute()
    return { id: course.id, sections }
  }

  /** Takes students into a course, by turns into its sections. */
  async fill(termId: string, key: CourseKey, seeds: readonly SeedPerson[], now: number): Promise<void> {
    const { id: courseId, sections } = await this.course(termId, key)
    for (const [at, seed] of seeds.entries()) {
      const section = sections[at % sections.length]
      if (section) await enrol(this.stores, { ...this.admin, courseId, enrolment: { role: 'student', personId: this.personId(seed), sectionId: section.id } }, now)
    }
  }

  /** An instructor beside the lead, and a TA for each section. */
  async staffMain(termId: string, tas: readonly SeedPerson[], now: number): Promise<void> {
    const { id: courseId, sections } = await this.course(termId, 'main')
    await enrol(this.stores, { ...this.admin, courseId, enrolment: { role: 'instructor', personId: this.personId(staff.instructor) } }, now)
    for (const [at, seed] of tas.entries()) await this.addTa(courseId, seed, [sections[at % sections.length]?.id ?? ''], now)
  }

  private async addTa(courseId: string, seed: SeedPerson, sectionIds: string[], now: number): Promise<void> {
    await enrol(this.stores, { ...this.admin, courseId, enrolment: { role: 'ta', personId: this.personId(seed), sectionIds } }, now)
  }

  /** Between the terms one TA goes over to the smaller course and two come; the one who stays takes both sections beside the new ones. */
  async changeStaff(termId: string, now: number): Promise<void> {
    const { id: courseId, sections } = await this.course(termId, 'main')
    const [a, b] = sections.map(section => section.id)
    if (a === undefined || b === undefined) throw new Error('The main course has two sections.')
    await endMembership(this.stores, { ...this.admin, membershipId: await this.membershipId(courseId, staff.formerTa) }, now)
    await this.addTa(courseId, staff.ta, [a], now)
    await this.addTa(courseId, staff.otherTa, [b], now)
    await setTaSections(this.stores, { ...this.admin, membershipId: await this.membershipId(courseId, staff.taAndStudent), seenVersion: 1, sectionIds: [a, b] }, now)
    const small = await this.course(termId, 'small')
    await this.addTa(small.id, staff.formerTa, small.sections.map(section => section.id), now)
  }

  /** Somebody's membership of a course: in whose name they act there. */
  async membershipId(courseId: string, seed: SeedPerson): Promise<string> {
    const row = await this.stores.read.selectFrom('membership').select('id').where('course_id', '=', courseId).where('person_id', '=', this.personId(seed)).executeTakeFirstOrThrow()
    return row.id
  }

  /** Students of a course who are there at this moment, in the order of the roster. */
  async members(courseId: string, seeds: readonly SeedPerson[]): Promise<Member[]> {
    const rows = await this.stores.read.selectFrom('membership').select(['id', 'person_id as personId', 'section_id as sectionId']).where('course_id', '=', courseId).where('role', '=', 'student').where('state', '=', 'active').execute()
    return seeds.flatMap((seed) => {
      const row = rows.find(known => known.personId === this.people.get(seed.key))
      return row && row.personId !== null && row.sectionId !== null ? [{ key: seed.key, membershipId: row.id, personId: row.personId, sectionId: row.sectionId }] : []
    })
  }

  async drop(courseId: string, seed: SeedPerson, now: number): Promise<void> {
    await endMembership(this.stores, { ...this.admin, membershipId: await this.membershipId(courseId, seed) }, now)
  }

  /** The technician, in whose name files come in. */
  async technician(): Promise<{ acting: Acting, personId: string }> {
    const personId = this.personId(staff.technician)
    const role = await this.stores.read.selectFrom('department_role').select('id').where('person_id', '=', personId).where('role', '=', 'technician').executeTakeFirstOrThrow()
    return { acting: { actorId: role.id, role: 'technician', courseId: null, sectionIds: [] }, personId }
  }
}
