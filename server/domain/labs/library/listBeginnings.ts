import { askedSteps } from '#shared/schemas/askedSteps'
import type { LabBody } from '#shared/schemas/lab'
import type { LabKind } from '#shared/schemas/labParts'
import type { Read } from '../../../db/writer'
import type { Observations } from '../../../observations/chunks'
import type { ActorMembership } from '../../people/actor'
import { neededQuantities, type Flight } from '../../shares/servedData'
import { layersThatMeet, missingColumns, newestFlights } from './fillSupply'
import { readyLabs, type LibraryTexts } from './readyLabs'

export interface ReadyLabRow {
  key: string
  title: string
  kind: LabKind | null
  minutes: number | null
  aims: string[]
  steps: number
  pointsMilli: number
  goesOut: boolean
  hasPractice: boolean
  /** Quantities that its data need; those of them that no flight of the course has. */
  needs: string[]
  missing: string[]
  /** Layers of this course's flights that meet its conditions, as far as it would take them; each is tried step by step when the lab is taken. */
  layers: number
}

/** What a lab can begin from in a course: the library, those first that its flights can supply, and the labs of other courses in which the same person writes. */
export async function listBeginnings(read: Read, observations: Observations, input: { courseId: string, memberships: readonly ActorMembership[], texts: LibraryTexts }) {
  const flights = await newestFlights(read, observations, input.courseId)
  const ready = readyLabs(input.texts).map(({ key, body }): ReadyLabRow => ({
    key, ...aboutLab(body), goesOut: body.fieldPlan !== null, hasPractice: body.practice !== null, needs: neededQuantities(body),
    missing: flights.length === 0 ? neededQuantities(body) : flights.map(flight => missingColumns(body, flight)).reduce((least, missing) => missing.length < least.length ? missing : least),
    layers: layersOf(body, flights),
  }))
  return { ready: ready.sort((a, b) => Number(b.layers > 0) - Number(a.layers > 0)), earlier: await listEarlier(read, input), flights: flights.length }
}

function layersOf(body: LabBody, flights: readonly Flight[]): number {
  const most = body.conditions?.atMost ?? 0
  let found = 0
  for (const flight of flights) {
    if (found >= most) break
    found += layersThatMeet(body, flight).length
  }
  return Math.min(found, most)
}

const aboutLab = (body: LabBody) => ({
  title: body.title, kind: body.kind, minutes: body.minutes, aims: body.aims, steps: body.steps.length, pointsMilli: askedSteps(body).reduce((sum, step) => sum + step.pointsMilli, 0),
})

/** Courses in which a person writes labs, but this one. */
export const writesIn = (memberships: readonly ActorMembership[], courseId: string): string[] =>
  memberships.filter(({ role, courseId: of }) => of !== courseId && (role === 'lead' || role === 'instructor')).map(membership => membership.courseId)

async function listEarlier(read: Read, { courseId, memberships }: { courseId: string, memberships: readonly ActorMembership[] }) {
  const courses = writesIn(memberships, courseId)
  if (courses.length === 0) return []
  return read.selectFrom('lab').innerJoin('course', 'course.id', 'lab.course_id').innerJoin('term', 'term.id', 'course.term_id')
    .select(['lab.id as labId', 'lab.title', 'course.code as course', 'term.name as term', 'lab.state'])
    .where('lab.course_id', 'in', courses).orderBy('term.starts_on', 'desc').orderBy('lab.id', 'desc').limit(200).execute()
}
