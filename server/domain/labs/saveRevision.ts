import { refuse } from '#shared/errors'
import type { LabBody } from '#shared/schemas/lab'
import type { Stores } from '../../db/writer'
import { noteChange, refuseOlder } from '../lastChange'
import { digestOf } from '../ledger/appendEntry'
import { conventionOfCourse } from './conventions'
import { latestRevision } from './latestRevision'
import { writeSteps } from './writeRevision'

/**
 * Keeps what an author wrote in a draft. Bindings may still be open: they are told by `bindingProblems` and stop the posting, not the saving.
 * @throws {DomainError} `changed_meanwhile` when somebody saved since, `lab_not_draft` once the revision is frozen
 */
export function saveRevision({ write }: Stores, input: { labId: string, actorId: string, seenVersion: number, body: LabBody }, now: number): Promise<{ version: number }> {
  return write(async (trx) => {
    const lab = await trx.selectFrom('lab').select(['id', 'course_id', 'state', 'version']).where('id', '=', input.labId).executeTakeFirst()
    if (!lab) return refuse('not_found')
    const revision = await latestRevision(trx, lab.id)
    if (lab.state !== 'draft' || revision.frozenAt !== null) return refuse('lab_not_draft')
    if (lab.version !== input.seenVersion) return refuseOlder(trx, lab.id, lab.version)
    const { convention } = await conventionOfCourse(trx, lab.course_id)
    await trx.updateTable('lab_revision').set({ body_json: JSON.stringify(input.body), digest: digestOf(input.body) }).where('id', '=', revision.id).execute()
    await writeSteps(trx, revision.id, input.body, convention)
    const version = lab.version + 1
    await trx.updateTable('lab').set({ title: input.body.title, version }).where('id', '=', lab.id).execute()
    await noteChange(trx, lab.id, input.actorId, now)
    return { version }
  })
}
