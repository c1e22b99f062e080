// npm run faults [-- --json] [--short] [--only R1]: faults that the product must survive, each with a planted bug that turns it red.
import { whyNoTracer } from '../fixtures/tracer'
import { median } from '../bench/ratio'
import { killRun } from './killRun'
import type { KillReport } from './killSubmission'

const asJson = process.argv.includes('--json')
const isShort = process.argv.includes('--short')
const onlyAt = process.argv.indexOf('--only')
const only = onlyAt === -1 ? null : (process.argv[onlyAt + 1] ?? '').split(',')

interface Figure { id: string, part: string, points: number, bad: number, bar: 0, ok: boolean, controlRed: boolean, detail: string, command: string }
const faults: Record<string, () => Promise<Figure>> = { R1: killedSubmission }

const unknown = only?.filter(id => !(id in faults)) ?? []
if (unknown.length > 0) stop(`There is no fault ${unknown.join(', ')}; there are ${Object.keys(faults).join(', ')}.`)
const missing = whyNoTracer()
if (missing !== null) stop(missing)

const figures: Figure[] = []
for (const [id, run] of Object.entries(faults)) if (only === null || only.includes(id)) figures.push(await run())

for (const figure of figures) {
  console.log(asJson
    ? JSON.stringify(figure)
    : `${figure.id.padEnd(4)} ${figure.part.padEnd(8)} ${String(figure.points).padStart(4)} points  ${String(figure.bad).padStart(3)} bad  ${figure.ok ? 'ok ' : 'BAD'}  control ${figure.controlRed ? 'red' : 'NOT RED'}  ${figure.detail}`)
}
const isWell = figures.length > 0 && figures.every(figure => figure.ok && figure.controlRed)
if (!asJson) console.log(`figures=${figures.length} ok=${isWell}`)
process.exit(isWell ? 0 : 1)

/** The server killed at every write, sync, rename and removal of a submission and of the mail that follows it. */
async function killedSubmission(): Promise<Figure> {
  const { counted, asked, submission, mail, control } = await killRun(isShort ? { submission: 10, mail: 3, control: 12 } : undefined)
  const sum = (of: (report: KillReport) => number) => of(submission) + of(mail)
  const [points, bad, restarts] = [sum(report => report.points), sum(report => report.lost + report.unsound), [...submission.restartsMs, ...mail.restartsMs]]
  if (!asJson) {
    console.log(`R1: a submission makes ${counted.submission.points.length} writes and syncs, its mail ${counted.mail.points.length}, to ${counted.submission.files.join(', ')}`)
    for (const line of [...submission.wrong, ...mail.wrong]) console.log(`R1: ${line}`)
  }
  return {
    id: 'R1', part: 'submit', points, bad, bar: 0, controlRed: control.lost > 0,
    // Half of the restarts may be slowed by what else the machine does. A few of the points may not come at every submission; were it many, the run would not have tried what it says.
    ok: bad === 0 && points >= 0.9 * asked && submission.storedUnanswered > 0 && mail.acknowledged > 0 && median(restarts) <= 5000,
    detail: `${sum(report => report.acknowledged)} acknowledged, ${sum(report => report.lost)} lost, ${sum(report => report.unsound)} unsound, ${sum(report => report.storedUnanswered)} stored unanswered, ${sum(report => report.unmet)} not met, ready again in ${median(restarts)} ms, ${Math.max(...restarts)} at most; planted bug lost ${control.lost} of ${control.acknowledged} acknowledged`,
    command: `npm run faults -- --only R1${isShort ? ' --short' : ''}`,
  }
}

function stop(why: string): never {
  console.error(why)
  process.exit(2)
}
