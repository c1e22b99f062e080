import { countWrites, killSubmission, spreadOver, type KillReport, type WriteCount } from './killSubmission'
import { answerBeforeCommit, plantedBuild } from './plantedBuild'
import { preparedWork } from './preparedWork'

export interface KillRun { counted: Record<'submission' | 'mail', WriteCount>, asked: number, submission: KillReport, mail: KillReport, control: KillReport }

/** R1 whole: every point of a submission, every point of the mail that follows, and the control; or so many spread over each. */
export async function killRun(most: { submission: number, mail: number, control: number } = { submission: Infinity, mail: Infinity, control: 12 }): Promise<KillRun> {
  const work = await preparedWork()
  const planted = plantedBuild(answerBeforeCommit)
  try {
    const counted = { submission: await countWrites({ work, of: 'submission' }), mail: await countWrites({ work, of: 'mail' }) }
    const points = { submission: some(counted.submission.points, most.submission), mail: some(counted.mail.points, most.mail) }
    return {
      counted, asked: points.submission.length + points.mail.length,
      submission: await killSubmission(points.submission, { work, of: 'submission' }),
      mail: await killSubmission(points.mail, { work, of: 'mail' }),
      control: await killSubmission(spreadOver(counted.submission.points, most.control), { work, of: 'submission', entry: planted.entry, untilLost: true }),
    }
  }
  finally {
    planted.remove()
    work.remove()
  }
}

function some(points: WriteCount['points'], most: number): WriteCount['points'] {
  return points.length <= most ? points : spreadOver(points, most)
}
