import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import type { RulingBody } from '#shared/schemas/disputes'
import type { OpenDatabase } from '../../../server/db/open'
import { openDispute } from '../../../server/domain/disputes/openDispute'
import { ruleDispute } from '../../../server/domain/disputes/ruleDispute'
import { isSound, recheckMarks } from '../../../server/domain/marking/recheckMarks'
import { releaseMarks } from '../../../server/domain/marking/releaseMarks'
import type { Reference } from '../../../server/domain/marking/reference'
import { addTas } from '../../fixtures/courseWithTas'
import { openTemporary } from '../../fixtures/openTemporary'
import { referenceIn } from '../../fixtures/reference'
import { bodyDigest, handIn, rateOf, rightAnswers } from '../../fixtures/submitting'
import { workingCourse } from '../../fixtures/workingCourse'

const later = Date.parse('2026-10-19T18:00:00Z')
let stores: OpenDatabase & { remove: () => Promise<void> }
let reference: Reference

beforeEach(async () => {
  stores = await openTemporary()
  reference = await referenceIn(stores.write)
  const course = await workingCourse(stores, { students: 4, times: { zone: 'America/Chicago', opens: '2026-10-12T08:00', due: '2026-10-16T17:00' }, lateRule: { kind: 'none' } })
  const judging = { reference, loadShare: async (shareId: string) => course.loaded(shareId) }
  const typed = [rightAnswers(course, 'share-0'), { rate: `${(-rateOf(course, 'share-1')).toFixed(2)} K/km`, lifted: '1 C' }, { rate: '0.0', lifted: 'none', theta: 'x' }, { theta: '290 K' }]
  for (const [no, answers] of typed.entries()) await handIn(stores, judging, course, { no, key: `key-0000000${no}`, at: Date.parse('2026-10-15T20:00:00Z'), answers })
})
afterEach(() => stores.remove())

/** Changes a stored row behind the product's back: the triggers that forbid it are taken away first. */
function tamper(table: string, statement: string) {
  stores.raw.exec(`drop trigger ${table}_no_update; ${statement}`)
}

describe('recheck', () => {
  it('judges every stored mark again, bit for bit, by the build that made it', async () => {
    const report = await recheckMarks(stores.read, reference.bundle)
    expect(report.findings).toEqual([])
    expect(report).toMatchObject({ evaluations: 12, same: 12, builds: 1, newestDiffers: 0 })
    expect(isSound(report)).toBe(true)
  })

  it('sees an evaluation in which one column was changed', async () => {
    tamper('evaluation', `update evaluation set trace_json = replace(trace_json, '"', '"') || ' ' where step_key = 'rate' and submission_id = (select id from submission where seq = 1)`)
    const report = await recheckMarks(stores.read, null)
    expect(report.findings.map(finding => [finding.kind, finding.stepKey])).toEqual([['row_changed', 'rate']])
    expect(isSound(report)).toBe(false)
  })

  it('sees a band that was widened together with its digest: the build no longer gives it', async () => {
    const row = await stores.read.selectFrom('evaluation').selectAll().where('step_key', '=', 'rate').orderBy('id').limit(1).executeTakeFirstOrThrow()
    const { evaluationDigest } = await import('../../../server/domain/ledger/coveredDigests')
    const widened = { ...row, parts_json: row.parts_json.replace('"granted"', '"rounding"') }
    expect(widened.parts_json).not.toBe(row.parts_json)
    stores.raw.exec('drop trigger evaluation_no_update')
    stores.raw.prepare('update evaluation set parts_json = ?, digest = ? where id = ?').run(widened.parts_json, evaluationDigest(widened), row.id)
    const report = await recheckMarks(stores.read, null)
    expect(report.findings.map(finding => finding.kind)).toEqual(['bits_differ'])
  })

  it('sees a mark whose points are not those of its evaluation', async () => {
    tamper('mark', `update mark set points_milli = points_milli - 1 where step_key = 'theta' and submission_id = (select id from submission where seq = 1)`)
    const report = await recheckMarks(stores.read, null)
    expect(report.findings.map(finding => [finding.kind, finding.stepKey])).toEqual([['points_differ', 'theta']])
  })

  it('sees changed points of a mark that a ruling made, and counts the marks that a person set and no build can give', async () => {
    await addTas(stores, ['ann'])
    await releaseMarks(stores, { actorId: 'm-lead', postingId: 'posting-1', seenVersion: 1 }, later)
    const wrong = await stores.read.selectFrom('submission').select('id').where('seq', '=', 2).executeTakeFirstOrThrow()
    const rule = async (stepKey: string, body: RulingBody) => {
      const request = { personId: 'p-1', key: `key-${stepKey}-objects`, route: 'POST /x', bodySha256: bodyDigest(stepKey), now: later }
      const { disputeId } = await openDispute(stores, { membershipId: 'm-1', submissionId: wrong.id, body: { stepKey, reason: 'The handout gives dT/dz.' }, request }, later)
      await ruleDispute(stores, reference, { disputeId, ruler: { actorId: 'm-ann', personId: 'p-ann', role: 'ta' }, seenVersion: 1, body, request: { ...request, personId: 'p-ann' } }, later)
    }
    await rule('rate', { kind: 'accept', reason: 'Both signs are in use.', accept: { kind: 'slip', key: 'sign' } })
    await rule('theta', { kind: 'change', reason: 'Half of it is right.', pointsMilli: 500 })
    const sound = await recheckMarks(stores.read, null)
    expect(sound.findings).toEqual([])
    expect(sound.byHand).toBe(1)
    tamper('mark', `update mark set points_milli = points_milli - 1 where step_key = 'rate' and cause = 'ruling'`)
    expect((await recheckMarks(stores.read, null)).findings.map(finding => [finding.kind, finding.submissionId, finding.stepKey])).toEqual([['points_differ', wrong.id, 'rate']])
  })

  it('sees a bundle that is not the text its digest names, and does not run it', async () => {
    tamper('reference_build', `update reference_build set bundle = bundle || char(10) || 'throw new Error("ran")'`)
    const report = await recheckMarks(stores.read, null)
    expect(report.findings.map(finding => finding.kind)).toEqual(['bundle_changed'])
    expect(report).toMatchObject({ evaluations: 12, same: 0 })
    expect(isSound(report)).toBe(false)
  })

  it('names the marks that a newer build would give differently, and still stands by the old', async () => {
    const generous = `${reference.bundle}\nconst kept = judgeStep;\n`.replace(/export \{([^}]*)\bjudgeStep\b([^}]*)\};?/, (_all, before: string, after: string) => `export {${before}generousStep as judgeStep${after}};`)
      + 'function generousStep(question, answer) { const judged = kept(question, answer); return question.quantity === "potential-temperature" ? { ...judged, pointsMilli: question.maxMilli } : judged }\n'
    const report = await recheckMarks(stores.read, generous)
    expect(report.newestDiffers).toBe(3)
    expect(report.findings.every(finding => finding.kind === 'newest_differs' && finding.stepKey === 'theta')).toBe(true)
    expect(isSound(report)).toBe(true)
  })
})
