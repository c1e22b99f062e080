// npm run faults [-- --json] [--short] [--only R1,R6]: faults that the product must survive, each with a planted bug that turns it red.
import { spawnSync } from 'node:child_process'
import { killSubmission, type KillReport } from './killSubmission'
import { answerBeforeCommit, plantedBuild } from './plantedBuild'

const asJson = process.argv.includes('--json')
const onlyAt = process.argv.indexOf('--only')
const only = onlyAt === -1 ? null : (process.argv[onlyAt + 1] ?? '').split(',')
const isShort = process.argv.includes('--short')

interface Figure { id: string, part: string, points: number, bad: number, bar: 0, ok: boolean, controlRed: boolean, detail: string, command: string }
const figures: Figure[] = []

if (spawnSync('strace', ['-V'], { stdio: 'ignore' }).status !== 0) {
  console.error('strace is missing: install it (Debian: apt-get install strace) and run again.')
  process.exit(2)
}

if (only === null || only.includes('R1')) {
  const sound = await killSubmission(isShort ? { most: 60, step: 4 } : { most: 400 })
  const planted = plantedBuild(answerBeforeCommit)
  const control = await killSubmission({ entry: planted.entry, from: 3, most: 60, step: 3, isControl: true })
  planted.remove()
  const bad = badOf(sound)
  figures.push({
    id: 'R1', part: 'submit', points: sound.points, bad, bar: 0, ok: bad === 0 && sound.points > 3 && sound.slowestRestartMs <= 5000, controlRed: control.lost > 0,
    detail: `${sound.acknowledged} acknowledged, ${sound.lost} lost, ${sound.half} half, ${sound.storedUnanswered} stored unanswered, restart ${sound.slowestRestartMs} ms at most; planted bug lost ${control.lost}`,
    command: 'npm run faults -- --only R1',
  })
  if (!asJson) for (const line of sound.wrong) console.log(line)
}

for (const figure of figures) {
  console.log(asJson
    ? JSON.stringify(figure)
    : `${figure.id.padEnd(4)} ${figure.part.padEnd(10)} ${String(figure.points).padStart(4)} points  ${figure.ok ? 'ok ' : 'BAD'}  control ${figure.controlRed ? 'red' : 'NOT RED'}  ${figure.detail}`)
}
const isWell = figures.length > 0 && figures.every(figure => figure.ok && figure.controlRed)
if (!asJson) console.log(`figures=${figures.length} ok=${isWell}`)
process.exit(isWell ? 0 : 1)

function badOf(report: KillReport): number {
  return report.lost + report.half + report.wrong.length
}
