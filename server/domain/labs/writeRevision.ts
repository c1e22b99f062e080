import type { Convention } from '#shared/marking/types'
import type { LabBody } from '#shared/schemas/lab'
import { askedSteps } from '#shared/schemas/askedSteps'
import type { Trx } from '../../db/writer'
import { asksOf } from './askOf'

/** Writes the steps of a draft's revision anew. The database refuses it once the revision is frozen. */
export async function writeSteps(trx: Trx, revisionId: string, body: LabBody, convention: Convention): Promise<void> {
  await trx.deleteFrom('step_edge').where('lab_revision_id', '=', revisionId).execute()
  await trx.deleteFrom('step').where('lab_revision_id', '=', revisionId).execute()
  if (body.steps.length === 0) return
  const asks = asksOf(body, convention, null)
  const steps = askedSteps(body)
  const rankOf = new Map(steps.map((step, rank) => [step.key, rank]))
  await trx.insertInto('step').values(steps.map((step, rank) => ({
    lab_revision_id: revisionId, step_key: step.key, rank, kind: step.kind, points_milli: step.pointsMilli,
    binding_json: JSON.stringify(step.kind === 'choice' ? { options: step.options, isSeveral: step.isSeveral } : { quantity: step.quantity, variant: step.variant, inputs: step.inputs, unit: step.unit, digits: step.digits, block: step.block }),
    ask: asks[step.key] ?? '', band_json: JSON.stringify(step.kind === 'choice' ? {} : { granted: step.granted, slipMilli: step.slipMilli, digitsMilli: step.digitsMilli, near: step.near, divisions: step.divisions, accuracy: step.accuracy }),
  }))).execute()
  const edges = steps.flatMap(step => [...new Set(Object.values(step.kind === 'choice' ? {} : step.inputs).flatMap(source => source.from === 'step' ? [source.key] : []))].map(from => ({
    lab_revision_id: revisionId, from_key: from, to_key: step.key, from_rank: rankOf.get(from) ?? -1, to_rank: rankOf.get(step.key) ?? -1,
  })))
  if (edges.length > 0) await trx.insertInto('step_edge').values(edges).execute()
}
