import { refuse } from '#shared/errors'
import type { JobReply } from '#shared/schemas/dataReplies'
import { refusalWords } from '#shared/text'
import type { Read } from '../../db/writer'
import type { ImportFailure, ImportRunner } from './importRunner'
import type { PublishedDataSet } from './publishVersions'
import { importJobKind } from './startImport'

/** Where an import is: rows so far, how much of the file, and about how long it will take. */
export async function describeJob(read: Read, runner: ImportRunner, jobId: string, now: number): Promise<JobReply> {
  const job = await read.selectFrom('job').select(['id', 'state', 'done_units', 'all_units', 'result_json', 'error_json']).where('id', '=', jobId).where('kind', '=', importJobKind).executeTakeFirst()
  if (!job) return refuse('not_found')
  const live = runner.progress(jobId)
  const fraction = job.state === 'done' ? 1 : live?.fraction ?? null
  const elapsedS = live ? (now - live.startedAt) / 1000 : 0
  return {
    id: job.id,
    state: job.state === 'leased' ? 'running' : job.state,
    rows: Math.max(job.done_units, live?.rows ?? 0),
    fraction,
    secondsLeft: live && live.fraction > 0.01 ? Math.max(0, Math.round(elapsedS / live.fraction - elapsedS)) : null,
    dataSets: job.result_json ? JSON.parse(job.result_json) as PublishedDataSet[] : [],
    problem: job.error_json ? problemOf(JSON.parse(job.error_json) as ImportFailure) : null,
  }
}

function problemOf(failure: ImportFailure): JobReply['problem'] {
  const words = refusalWords[failure.code]
  return { code: failure.code, title: words.title, detail: words.detail(failure.facts), first: [...failure.first] }
}
