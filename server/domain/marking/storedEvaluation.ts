import { z } from 'zod'
import type { Accepted, Band, Convention, Judgement, ReadAnswer, StepQuestion } from '#shared/marking/types'
import type { EvaluationTable } from '../../db/schema/work'
import { evaluationDigest } from '../ledger/coveredDigests'

/**
 * An evaluation as a row: the whole question, the answer as it was read, and the whole judgement, so that the mark can be
 * explained, and made again from the row, its convention and its build alone.
 *
 *   inputs_json    the question without what stands in its own column, and the answer as read
 *   carried_json   what came from earlier steps, the band that follows from it, and the note why or why not
 *   accepted_json  what rulings had added, what the value was accepted by, the points, and the classes that earn them
 *   parts_json     the band's edges as decimals and every part of its width
 *   slips_json     the slip that explains the value, and all that could be made
 *   …_bits         center and edges of the band, SI, as the 8 bytes of the double
 */
export interface Judged { stepKey: string, question: StepQuestion, answer: ReadAnswer, judgement: Judgement }

export interface EvaluationIds {
  id: string
  submissionId: string
  referenceDigest: Buffer
  conventionRevisionId: string
  dataSetVersionId: string
  labRevisionId: string
}

export function evaluationRow(ids: EvaluationIds, { stepKey, question, answer, judgement }: Judged): EvaluationTable {
  const { convention: _convention, carried, accepted, ...asked } = question
  const { band } = judgement
  const row: Omit<EvaluationTable, 'id' | 'digest'> = {
    submission_id: ids.submissionId, step_key: stepKey, reference_digest: ids.referenceDigest, convention_revision_id: ids.conventionRevisionId,
    data_set_version_id: ids.dataSetVersionId, lab_revision_id: ids.labRevisionId,
    inputs_json: JSON.stringify({ question: asked, answer }),
    carried_json: JSON.stringify({ carried: carried ?? null, band: judgement.carriedBand, note: judgement.carriedNote }),
    accepted_json: JSON.stringify({ accepted: accepted ?? null, isAccepted: judgement.isAccepted, by: judgement.acceptedBy, pointsMilli: judgement.pointsMilli, classes: judgement.classes, reason: judgement.reason, notes: judgement.notes }),
    center_bits: band ? bitsOf(band.center) : null, low_bits: band ? bitsOf(band.low) : null, high_bits: band ? bitsOf(band.high) : null,
    parts_json: JSON.stringify(band ? { parts: band.parts, lowDecimal: band.lowDecimal, highDecimal: band.highDecimal, unit: band.unit } : null),
    slips_json: JSON.stringify({ slip: judgement.slip, values: judgement.slipValues }),
    trace_json: JSON.stringify(judgement.trace),
    outcome: judgement.outcome, refusal_code: judgement.refusalCode,
  }
  return { id: ids.id, ...row, digest: evaluationDigest(row) }
}

/** The eight bytes of a double, most significant first. A bare NaN or −0 would come back from SQL as something else. */
export function bitsOf(value: number): Buffer {
  if (!Number.isFinite(value)) throw new RangeError(`${value} is no value of a band`)
  const bytes = Buffer.alloc(8)
  bytes.writeDoubleBE(value === 0 ? 0 : value)
  return bytes
}

const storedQuestion = z.object({ question: z.custom<Omit<StepQuestion, 'convention' | 'carried' | 'accepted'>>(isRecord), answer: z.custom<ReadAnswer>(isRecord) })
const storedCarried = z.object({ carried: z.custom<StepQuestion['carried'] | null>(isRecordOrNull), band: z.custom<Band | null>(isRecordOrNull), note: z.string().nullable() })
const storedAccepted = z.object({
  accepted: z.custom<readonly Accepted[] | null>(value => value === null || Array.isArray(value)), isAccepted: z.boolean(),
  by: z.enum(['band', 'carried', 'ruling', 'word']).nullable(), pointsMilli: z.number().int(), classes: z.array(z.string()), reason: z.string().nullable(), notes: z.array(z.string()),
})
const storedParts = z.object({ parts: z.custom<Band['parts']>(Array.isArray), lowDecimal: z.string(), highDecimal: z.string(), unit: z.string() }).nullable()
const storedSlips = z.object({ slip: z.custom<Judgement['slip']>(isRecordOrNull), values: z.custom<Judgement['slipValues']>(Array.isArray) })

function isRecord(value: unknown): boolean {
  return typeof value === 'object' && value !== null && !Array.isArray(value)
}
function isRecordOrNull(value: unknown): boolean {
  return value === null || isRecord(value)
}

/** The question and the answer of a stored evaluation, as the judge took them. */
export function questionOfRow(row: EvaluationTable, convention: Convention): { question: StepQuestion, answer: ReadAnswer } {
  const { question, answer } = storedQuestion.parse(JSON.parse(row.inputs_json))
  const { carried } = storedCarried.parse(JSON.parse(row.carried_json))
  const { accepted } = storedAccepted.parse(JSON.parse(row.accepted_json))
  return { question: { ...question, convention, ...(carried ? { carried } : {}), ...(accepted ? { accepted } : {}) }, answer }
}

/** The judgement of a stored evaluation. */
export function judgementOfRow(row: EvaluationTable): Judgement {
  const carried = storedCarried.parse(JSON.parse(row.carried_json))
  const accepted = storedAccepted.parse(JSON.parse(row.accepted_json))
  const parts = storedParts.parse(JSON.parse(row.parts_json))
  const slips = storedSlips.parse(JSON.parse(row.slips_json))
  const band = parts && row.center_bits && row.low_bits && row.high_bits
    ? { center: row.center_bits.readDoubleBE(), low: row.low_bits.readDoubleBE(), high: row.high_bits.readDoubleBE(), ...parts }
    : null
  return {
    outcome: row.outcome, refusalCode: row.refusal_code, reason: accepted.reason, classes: accepted.classes, band, carriedBand: carried.band, carriedNote: carried.note, isAccepted: accepted.isAccepted, acceptedBy: accepted.by,
    slip: slips.slip, slipValues: slips.values, pointsMilli: accepted.pointsMilli, trace: z.custom<Judgement['trace']>(Array.isArray).parse(JSON.parse(row.trace_json)), notes: accepted.notes,
  }
}
