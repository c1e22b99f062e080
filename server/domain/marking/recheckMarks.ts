import type { Convention } from '#shared/marking/types'
import type { EvaluationTable } from '../../db/schema/work'
import type { Read } from '../../db/writer'
import { getConvention } from '../labs/conventions'
import { evaluationDigest } from '../ledger/coveredDigests'
import { isolatedJudge, type IsolatedJudge } from './isolatedJudge'
import { bundleDigest } from './reference'
import { evaluationRow, judgementOfRow, questionOfRow } from './storedEvaluation'

/** What is wrong, or would be different, with one mark or one build. */
export interface Finding {
  kind: 'bundle_changed' | 'build_failed' | 'row_changed' | 'bits_differ' | 'points_differ' | 'newest_differs'
  submissionId: string | null
  stepKey: string | null
  detail: string
}

export interface RecheckReport {
  evaluations: number
  builds: number
  same: number
  /** Marks that a person set: no build can give them, and the ledger alone says why they are so. */
  byHand: number
  findings: readonly Finding[]
  newestDiffers: number
}

const pageSize = 200

/**
 * Judges every stored mark again: with the build that made it, where every bit must come out the same, and with the newest
 * build, where points that would differ are named. A changed row, a changed bundle or a changed mark is a finding, whatever the mark's cause:
 * the first mark that rests on an evaluation came with it, and a later one on the same was set by a person, which is counted.
 */
export async function recheckMarks(read: Read, newestBundle: string | null, tell: (finding: Finding) => void = () => {}): Promise<RecheckReport> {
  const findings: Finding[] = []
  const found = (finding: Finding) => {
    findings.push(finding)
    tell(finding)
  }
  const builds = await read.selectFrom('reference_build').select(['digest', 'version', 'bundle']).orderBy('added_at').execute()
  const newest = newestBundle === null ? null : isolatedJudge(newestBundle)
  const conventions = new Map<string, Convention>()
  const typed = await read.selectFrom('mark').select(eb => eb.fn.countAll<number>().as('n')).where('evaluation_id', 'is', null).executeTakeFirstOrThrow()
  const report = { evaluations: 0, same: 0, byHand: Number(typed.n), newestDiffers: 0 }
  try {
    for (const build of builds) {
      if (!bundleDigest(build.bundle).equals(build.digest)) {
        const uses = await read.selectFrom('evaluation').select(eb => eb.fn.countAll<number>().as('n')).where('reference_digest', '=', build.digest).executeTakeFirstOrThrow()
        report.evaluations += Number(uses.n)
        found({ kind: 'bundle_changed', submissionId: null, stepKey: null, detail: `build ${build.version} is not the text that its digest ${build.digest.toString('hex')} names; ${uses.n} evaluations rest on it` })
        continue
      }
      const own = isolatedJudge(build.bundle)
      try {
        for await (const page of evaluationsOf(read, build.digest)) {
          report.evaluations += page.length
          for (const row of page) if (!conventions.has(row.convention_revision_id)) conventions.set(row.convention_revision_id, await getConvention(read, row.convention_revision_id))
          await recheckPage(read, page, { own, newest, conventions, found, report })
        }
      }
      catch (error) {
        found({ kind: 'build_failed', submissionId: null, stepKey: null, detail: `build ${build.version}: ${error instanceof Error ? error.message : String(error)}` })
      }
      finally {
        await own.end()
      }
    }
  }
  finally {
    await newest?.end()
  }
  return { ...report, builds: builds.length, findings }
}

async function* evaluationsOf(read: Read, digest: Buffer): AsyncGenerator<EvaluationTable[]> {
  let after = ''
  for (;;) {
    const page = await read.selectFrom('evaluation').selectAll().where('reference_digest', '=', digest).where('id', '>', after).orderBy('id').limit(pageSize).execute()
    if (page.length === 0) return
    yield page
    after = page[page.length - 1]!.id
  }
}

interface Recheck {
  own: IsolatedJudge
  newest: IsolatedJudge | null
  conventions: ReadonlyMap<string, Convention>
  found: (finding: Finding) => void
  report: { same: number, byHand: number, newestDiffers: number }
}

async function recheckPage(read: Read, page: readonly EvaluationTable[], { own, newest, conventions, found, report }: Recheck): Promise<void> {
  const asked = page.map(row => questionOfRow(row, conventions.get(row.convention_revision_id)!))
  const [again, newer] = await Promise.all([own.judge(asked), newest?.judge(asked) ?? null])
  const marks = await read.selectFrom('mark').select(['evaluation_id', 'points_milli', 'max_milli', 'version']).where('evaluation_id', 'in', page.map(row => row.id)).orderBy('version').execute()
  page.forEach((row, at) => {
    const judgement = again[at]!
    const { question, answer } = asked[at]!
    const where = { submissionId: row.submission_id, stepKey: row.step_key }
    const made = evaluationRow({
      id: row.id, submissionId: row.submission_id, referenceDigest: row.reference_digest, conventionRevisionId: row.convention_revision_id, dataSetVersionId: row.data_set_version_id, labRevisionId: row.lab_revision_id,
    }, { stepKey: row.step_key, question, answer, judgement })
    const [mark, ...byHand] = marks.filter(each => each.evaluation_id === row.id)
    report.byHand += byHand.length
    if (!evaluationDigest(row).equals(row.digest)) found({ kind: 'row_changed', ...where, detail: 'a column of the evaluation is not what its digest covers' })
    else if (!made.digest.equals(row.digest)) found({ kind: 'bits_differ', ...where, detail: `judged again by its own build it comes out as ${made.digest.toString('hex')}, stored is ${row.digest.toString('hex')}` })
    else if (!mark) found({ kind: 'points_differ', ...where, detail: 'no mark rests on this evaluation' })
    else if (mark.points_milli !== judgement.pointsMilli || mark.max_milli !== question.maxMilli) found({ kind: 'points_differ', ...where, detail: `mark ${mark.version} says ${mark.points_milli} of ${mark.max_milli} thousandths, its evaluation gives ${judgement.pointsMilli} of ${question.maxMilli}` })
    else report.same++
    const then = newer?.[at]
    if (then && then.pointsMilli !== judgementOfRow(row).pointsMilli) {
      report.newestDiffers++
      found({ kind: 'newest_differs', ...where, detail: `${judgementOfRow(row).pointsMilli} thousandths stand, the newest build would give ${then.pointsMilli}` })
    }
  })
}

/** True when every mark came out the same by its own build. What a newer build would give differently is named, and is no fault. */
export const isSound = (report: RecheckReport): boolean => report.same === report.evaluations && report.findings.every(finding => finding.kind === 'newest_differs')
