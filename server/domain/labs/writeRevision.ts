import type { Convention } from '#shared/marking/types'
import type { LabBody } from '#shared/schemas/lab'
import { findQuantity } from '#shared/thermo/registry'
import type { Trx } from '../../db/writer'
import { askOf } from './askOf'

/** The asks of a body by step key, as far as they hold for every share. A step whose quantity is not known yet has none. */
export function generalAsks(body: LabBody, convention: Convention): Record<string, string> {
  const titles = Object.fromEntries(body.steps.map(step => [step.key, step.title]))
  return Object.fromEntries(body.steps.map((step) => {
    const definition = findQuantity(step.quantity)
    return [step.key, definition ? askOf(step, definition, convention, titles, null) : '']
  }))
}

/** Writes the steps of a draft's revision anew. The database refuses it once the revision is frozen. */
export async function writeSteps(trx: Trx, revisionId: string, body: LabBody, convention: Convention): Promise<void> {
  await trx.deleteFrom('step_edge').where('lab_revision_id', '=', revisionId).execute()
  await trx.deleteFrom('step').where('lab_revision_id', '=', revisionId).execute()
  if (body.steps.length === 0) return
  const asks = generalAsks(body, convention)
  const rankOf = new Map(body.steps.map((step, rank) => [step.key, rank]))
  await trx.insertInto('step').values(body.steps.map((step, rank) => ({
    lab_revision_id: revisionId, step_key: step.key, rank, kind: step.kind, points_milli: step.pointsMilli,
    binding_json: JSON.stringify({ quantity: step.quantity, variant: step.variant, inputs: step.inputs, unit: step.unit, digits: step.digits }),
    ask: asks[step.key] ?? '', band_json: JSON.stringify({ granted: step.granted, slipMilli: step.slipMilli }),
  }))).execute()
  const edges = body.steps.flatMap(step => [...new Set(Object.values(step.inputs).flatMap(source => source.from === 'step' ? [source.key] : []))].map(from => ({
    lab_revision_id: revisionId, from_key: from, to_key: step.key, from_rank: rankOf.get(from) ?? -1, to_rank: rankOf.get(step.key) ?? -1,
  })))
  if (edges.length > 0) await trx.insertInto('step_edge').values(edges).execute()
}
