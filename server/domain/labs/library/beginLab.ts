import { refuse } from '#shared/errors'
import type { LabBody } from '#shared/schemas/lab'
import type { LabBeginning } from '#shared/schemas/labBeginning'
import type { Read, Stores } from '../../../db/writer'
import type { Observations } from '../../../observations/chunks'
import type { Asked } from '../../asked'
import type { ActorMembership } from '../../people/actor'
import { listFlightVersions } from '../../shares/flight'
import { conventionOfCourse } from '../conventions'
import { createLab } from '../createLab'
import { latestRevision } from '../latestRevision'
import { readLabFile } from '../labFile/readLabFile'
import { fillSupply, newestFlights } from './fillSupply'
import { writesIn } from './listBeginnings'
import { readyLabs, type LibraryTexts } from './readyLabs'

export interface BeginLab { courseId: string, memberships: readonly ActorMembership[], texts: LibraryTexts, beginning: LabBeginning }

/**
 * A new draft from the library, from a lab of another course in which the same person writes, or from a text. Its supply is drawn by its own
 * conditions from the course's newest flights; what came with it of flights that are not the course's is left out and counted.
 * @throws {DomainError} `not_found` for a lab that is not there or not theirs, `lab_text_unreadable` with each fault and its line
 */
export async function beginLab(stores: Stores, observations: Observations, input: Asked & BeginLab, now: number) {
  const { body, ancestorId } = await bodyOf(stores.read, input)
  const supply = await supplyOf(stores.read, observations, input.courseId, body)
  const made = await createLab(stores, { actorId: input.actorId, once: input.once, courseId: input.courseId, body: { ...body, supply }, ancestorId, writesIn: writesIn(input.memberships, input.courseId) }, now)
  const known = new Set(supply.map(item => item.versionId))
  return { ...made, shares: supply.length, left: body.supply.filter(item => !known.has(item.versionId)).length }
}

async function bodyOf(read: Read, { courseId, memberships, texts, beginning }: BeginLab): Promise<{ body: LabBody, ancestorId: string | null }> {
  if (beginning.from === 'library') {
    const ready = readyLabs(texts).find(lab => lab.key === beginning.key)
    return ready ? { body: ready.body, ancestorId: null } : refuse('not_found')
  }
  if (beginning.from === 'text') {
    const { body, faults } = readLabFile(beginning.text)
    if (!body) return refuse('lab_text_unreadable', { line: faults[0]?.line ?? 1, reason: faults[0]?.message ?? '' }, faults.map(fault => ({ path: `line ${fault.line}`, message: fault.message })))
    return { body, ancestorId: null }
  }
  const lab = await read.selectFrom('lab').select('id').where('id', '=', beginning.labId).where('course_id', 'in', ['', ...writesIn(memberships, courseId)]).executeTakeFirst()
  return lab ? { body: (await latestRevision(read, lab.id)).body, ancestorId: lab.id } : refuse('not_found')
}

/** New data where the lab says how to choose them; else what it brought along, as far as it is the course's. */
async function supplyOf(read: Read, observations: Observations, courseId: string, body: LabBody): Promise<LabBody['supply']> {
  if (body.conditions) {
    const { convention } = await conventionOfCourse(read, courseId)
    const found = await fillSupply(body, convention, await newestFlights(read, observations, courseId))
    if (found.length > 0) return found
  }
  const known = new Set((await listFlightVersions(read, courseId)).map(row => row.versionId))
  return body.supply.filter(item => known.has(item.versionId))
}
