import type { Temporal } from 'temporal-polyfill'
import type { LabBody, SupplyItem } from '#shared/schemas/lab'
import { repairMember } from '../server/domain/repairs/repairMember'
import { grantAllowance } from '../server/domain/terms/grantAllowance'
import { dayOfTerm, instantOf, lastWeekday, nextWeekday } from './calendar'
import type { CourseKey, Member } from './department'
import { randomFrom } from './generator/arithmetic'
import { LabRun, type LabDates } from './labRun'
import { layers, layersOf, readyLab, type ReadyLab } from './labs'
import { tellObjection } from './objecting'
import { mainStudents, pastStudents, smallStudents, staff, type SeedPerson } from './people'
import { termId, type Stage, type TermKey } from './stage'
import { habitsOf } from './students'
import { objections, told, type StoriedLab } from './stories'

const hour = 3_600_000
const day = 24 * hour

interface Told {
  name: StoriedLab
  term: TermKey
  course: CourseKey
  lab: ReadyLab
  /** Which flights of the term, counted from 0, and which of their layers. */
  flights: readonly number[]
  bounds: keyof typeof layers
  opens: Temporal.PlainDate
  due: Temporal.PlainDate
  /** The second section is due later by so many days. */
  laterDays?: number
  released?: { on: Temporal.PlainDate, time: string }
  /** How much of the class has handed in by now, where the lab is still open. */
  soFar?: number
  attempts?: number
}

const title = (body: LabBody, other?: string): LabBody => other === undefined ? body : { ...body, title: other }

/** What labs there were and are, in every state that a lab can be in. */
export function tellLabs(stage: Stage): void {
  const { past, running, today } = stage.department.calendar
  const inPast = (week: number, weekday: number) => dayOfTerm(past, week, weekday)
  const inTerm = (week: number, weekday: number) => dayOfTerm(running, week, weekday)
  const weekday = (date: Temporal.PlainDate) => date.dayOfWeek > 5 ? lastWeekday(date, 5, 0) : date

  tellLab(stage, { name: 'past-inversion', term: 'past', course: 'main', lab: 'morning-inversion', flights: [0], bounds: 'inversion', opens: inPast(3, 1), due: inPast(4, 5), laterDays: 3, released: { on: inPast(5, 4), time: '10:05' } })
  tellLab(stage, { name: 'past-weighing', term: 'past', course: 'main', lab: 'weighing-a-layer', flights: [0, 1, 2, 3, 4, 5], bounds: 'deep', opens: inPast(6, 1), due: inPast(8, 3), released: { on: inPast(9, 2), time: '14:30' } })
  tellLab(stage, { name: 'past-heat', term: 'past', course: 'main', lab: 'heated-layer', flights: [0, 3], bounds: 'inversion', opens: inPast(9, 1), due: inPast(11, 5), released: { on: inPast(12, 4), time: '09:20' } })
  tellLab(stage, { name: 'past-small', term: 'past', course: 'small', lab: 'weighing-a-layer', flights: [1, 2, 4, 5], bounds: 'deep', opens: inPast(6, 1), due: inPast(7, 3), released: { on: inPast(8, 3), time: '16:00' } })

  tellLab(stage, { name: 'inversion', term: 'running', course: 'main', lab: 'morning-inversion', flights: [0], bounds: 'inversion', opens: inTerm(3, 1), due: inTerm(4, 5), laterDays: 3, released: { on: inTerm(5, 4), time: '10:05' } })
  const releasedOn = weekday(today.subtract({ days: 3 }))
  tellLab(stage, { name: 'weighing', term: 'running', course: 'main', lab: 'weighing-a-layer', flights: [0, 1, 3, 4], bounds: 'deep', opens: inTerm(6, 1), due: inTerm(8, 3), laterDays: 1, released: { on: releasedOn, time: '09:40' } })
  tellLab(stage, { name: 'heat', term: 'running', course: 'main', lab: 'heated-layer', flights: [3, 6], bounds: 'inversion', opens: inTerm(8, 4), due: lastWeekday(today, 5, 2) })
  tellLab(stage, { name: 'lid', term: 'running', course: 'main', lab: 'lid-comes-off', flights: [1, 4, 7], bounds: 'floating', opens: weekday(today.subtract({ days: 4 })), due: nextWeekday(today, 5, 3), soFar: 0.35, attempts: 2 })
  tellLab(stage, { name: 'small-weighing', term: 'running', course: 'small', lab: 'weighing-a-layer', flights: [1, 2, 4, 5], bounds: 'deep', opens: inTerm(6, 1), due: inTerm(7, 3), released: { on: inTerm(8, 2), time: '15:10' } })
  tellLab(stage, { name: 'small-inversion', term: 'running', course: 'small', lab: 'morning-inversion', flights: [3, 6], bounds: 'inversion', opens: weekday(today.subtract({ days: 5 })), due: nextWeekday(today, 4, 4), soFar: 0.5 })
  tellDraft(stage)
}

function tellLab(stage: Stage, lab: Told): void {
  const { timeline, workshop, department } = stage
  const run = new LabRun(workshop.stores, workshop.observations, workshop.judging, lab.name)
  const opensAt = instantOf(lab.opens, '08:00')
  const datesOf = (section: number): LabDates => ({ opensLocal: `${lab.opens.toString()}T08:00`, dueLocal: `${lab.due.add({ days: section * (lab.laterDays ?? 0) }).toString()}T17:00` })
  const teacher: SeedPerson = lab.course === 'small' ? staff.secondLead : lab.name === 'heat' || lab.name === 'past-heat' ? staff.instructor : staff.lead
  const course = () => department.course(termId(stage, lab.term), lab.course)
  const supply = (): SupplyItem[] => lab.flights.flatMap((no) => {
    const versionId = stage.flights[lab.term][no]
    return versionId === undefined ? [] : layersOf(versionId, layers[lab.bounds])
  })

  timeline.at(opensAt - 3 * day, async (now) => {
    const { id } = await course()
    const body = readyLab(lab.lab, supply())
    const came = await workshop.stores.read.selectFrom('lab').select('id').where('course_id', '=', id).where('title', '=', body.title).where('state', '=', 'draft').executeTakeFirst()
    const author = await department.membershipId(id, teacher)
    if (came) await run.rewrite(id, body, author, now)
    else await run.write(id, body, author, now)
  })
  timeline.at(opensAt - 1.9 * day, async (now) => {
    const { id, sections } = await course()
    await run.post(sections.map((section, at) => ({ id: section.id, dates: datesOf(at) })), await department.membershipId(id, teacher), now, { attempts: lab.attempts })
  })
  timeline.at(opensAt + hour, () => tellWork(stage, lab, run))
  if (lab.name === 'heat') tellExtension(stage, run, instantOf(lab.due, '11:25'), lab.due.add({ days: 5 }))
  if (lab.released) {
    const releasedAt = instantOf(lab.released.on, lab.released.time)
    timeline.at(releasedAt, async (now) => {
      const { id, sections } = await course()
      for (const section of sections) await run.release(section.id, await department.membershipId(id, teacher), now)
      const members = await department.members(id, seedsOf(lab))
      for (const objection of objections.filter(told => told.lab === lab.name)) {
        const member = members.find(known => known.key === objection.student)
        if (member) tellObjection(timeline, { stores: workshop.stores, reference: workshop.judging.reference, department, until: workshop.now }, objection, member, { courseId: id, labId: run.labId, releasedAt })
      }
    })
  }
}

const seedsOf = (lab: Told) => lab.course === 'small' ? (lab.term === 'past' ? pastStudents : smallStudents) : lab.term === 'past' ? pastStudents : mainStudents

/** Who hands in, and when: most in the last third, a few late, a few never; stories always on time. */
async function tellWork(stage: Stage, lab: Told, run: LabRun): Promise<void> {
  const { timeline, workshop, department } = stage
  const { id, sections } = await department.course(termId(stage, lab.term), lab.course)
  const members = await department.members(id, seedsOf(lab))
  const story = told[lab.name] ?? {}
  for (const [at, member] of members.entries()) {
    const random = randomFrom(`work ${lab.name} ${member.key}`)
    const section = sections.findIndex(known => known.id === member.sectionId)
    const opensAt = instantOf(lab.opens, '08:00') + hour
    const dueAt = instantOf(lab.due.add({ days: section * (lab.laterDays ?? 0) }), '17:00')
    const isStoried = member.key in story
    const luck = random.uniform()
    if (luck < 0.05 && !isStoried) continue
    if (lab.soFar !== undefined) {
      const share = at / members.length
      if (share < lab.soFar) timeline.at(awake(opensAt + (workshop.now - opensAt) * (0.25 + 0.7 * random.uniform()), workshop.now - hour), now => run.submit(member, story, now))
      else if (share < lab.soFar + 0.3) timeline.at(awake(workshop.now - (2 + 40 * random.uniform()) * hour, workshop.now - 2 * hour), now => run.draft(member, 1 + Math.floor(4 * random.uniform()), now))
      continue
    }
    const isLate = !isStoried && luck > 0.9 && habitsOf(member.key).lateness > 0.35
    const instant = isLate
      ? dueAt + (0.1 + 2.4 * random.uniform()) * day
      : awake(opensAt + (dueAt - opensAt) * (1 - 0.6 * random.uniform() ** 2.5) - 7 * 60_000 * random.uniform(), dueAt - 4 * 60_000)
    // Whoever came a few hours late had no line in time, says their device.
    const claimedSentAt = isLate && instant - dueAt < day ? Math.round(dueAt - 6 * 60_000) : null
    timeline.at(Math.round(instant), now => run.submit(member, story, now, claimedSentAt))
  }
}

/** Nobody hands in between two and seven in the morning; the time moves on to the forenoon, as far as there is room. */
function awake(at: number, latest: number): number {
  const hours = ((at / hour - 6) % 24 + 24) % 24 // by the place's standard time, near enough
  const moved = hours > 1 && hours < 8 ? at + (8.5 - hours) * hour : at
  return Math.round(Math.min(moved, latest))
}

function tellExtension(stage: Stage, run: LabRun, at: number, until: Temporal.PlainDate): void {
  const { timeline, workshop, department } = stage
  timeline.at(at, async (now) => {
    const { id } = await department.course(termId(stage, 'running'), 'main')
    const members: readonly Member[] = await department.members(id, mainStudents)
    const actorId = await department.membershipId(id, staff.instructor)
    const granted = members.find(known => known.key === 'june.halvarson')
    if (granted) await repairMember(workshop.stores, { actorId, once: null, courseId: id, memberId: granted.membershipId, body: { kind: 'accommodation', extraDays: 2 } }, now)
    const member = members.find(known => known.key === 'paloma.ibarrondo')
    if (!member) return
    const posting = await workshop.stores.read.selectFrom('posting').select('id').where('lab_id', '=', run.labId).where('section_id', '=', member.sectionId).executeTakeFirstOrThrow()
    await grantAllowance(workshop.stores, { actorId, once: null, postingId: posting.id, membershipId: member.membershipId, dueLocal: `${until.toString()}T17:00`, reason: 'Ill since Wednesday; a note from the health office is with the instructor.' }, now)
  })
}

/** A lab that is being written. */
function tellDraft(stage: Stage): void {
  const { timeline, workshop, department } = stage
  timeline.at(workshop.now - 1.4 * day, async (now) => {
    const { id } = await department.course(termId(stage, 'running'), 'main')
    const versionIds = [2, 5, 8].flatMap(no => stage.flights.running[no] ?? [])
    const body = title(readyLab('weighing-a-layer', versionIds.flatMap(versionId => layersOf(versionId, layers.deep))), 'Weighing a mixed layer')
    await new LabRun(workshop.stores, workshop.observations, workshop.judging, 'draft').write(id, body, await department.membershipId(id, staff.instructor), now)
  })
}
