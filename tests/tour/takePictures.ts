// The README's pictures, taken anew from the demo: node --import tsx tests/tour/takePictures.ts
// It needs a build (npm run build) and Chromium (CHROMIUM=…, or `chromium` on the path); DEMO_WORLD names a demo that is made already.
import { spawnSync } from 'node:child_process'
import { mkdirSync, rmSync, statSync } from 'node:fs'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { chromium } from 'playwright-core'
import { openForReading } from '../../server/db/open'
import { startBuiltServer } from '../fixtures/builtServer'
import { DemoPeople } from '../fixtures/demoPeople'
import { copyOf, demoWorld } from '../fixtures/demoWorld'
import { signInAs } from '../fixtures/openBrowser'

const folder = fileURLToPath(new URL('../../assets/tour', import.meta.url))
const largestBytes = 200_000

const dataDir = copyOf(demoWorld())
const server = await startBuiltServer({ dataDir, env: { DEMO: '1' } })
const people = await DemoPeople.of(server.url)
const { read } = openForReading(dataDir)
const browser = await chromium.launch({ executablePath: process.env.CHROMIUM ?? spawnSync('sh', ['-c', 'command -v chromium'], { encoding: 'utf8' }).stdout.trim(), args: ['--no-sandbox', '--disable-gpu'] })

/** The course that the demo's tour walks through, and what of it is shown: the flight of the last posted lab, that lab, a student's work and marks, a dispute that waits. */
async function places() {
  const student = people.withRole('student')
  const course = await people.courseOf(student, 'student')
  const base = `/c/${course.id}`
  const shares = await read.selectFrom('share').innerJoin('holder_member', 'holder_member.holder_id', 'share.holder_id').innerJoin('membership', 'membership.id', 'holder_member.membership_id')
    .innerJoin('person', 'person.id', 'membership.person_id').innerJoin('submission', 'submission.share_id', 'share.id')
    .innerJoin('posting', join => join.onRef('posting.lab_id', '=', 'share.lab_id').onRef('posting.section_id', '=', 'membership.section_id'))
    .select(['share.id', 'submission.id as submissionId', 'posting.released_at as releasedAt']).where('person.email_norm', '=', student.email).where('membership.course_id', '=', course.id)
    .orderBy('share.id').execute()
  const judged = shares.filter(share => share.releasedAt !== null).at(-1)
  const lab = await read.selectFrom('lab').select('id').where('course_id', '=', course.id).where('state', '=', 'posted').orderBy('id', 'desc').limit(1).executeTakeFirstOrThrow()
  const flight = await read.selectFrom('data_set').select('id').where('kind', '=', 'flight').orderBy('id', 'desc').limit(1).executeTakeFirstOrThrow()
  const assistant = await people.visitor(people.withRole('ta'))
  const { disputes } = await assistant.get<{ disputes: { id: string, state: string }[] }>(`/api/courses/${course.id}/disputes`)
  const dispute = disputes.find(each => each.state === 'open' || each.state === 'taken')
  const work = shares.at(-1)
  if (!judged || !work) throw new Error(`${student.name} has handed in nothing that could be shown.`)
  if (!dispute) throw new Error('No dispute waits for the TA.')
  return [
    { name: 'data', role: 'instructor', path: `${base}/data/${flight.id}` },
    { name: 'work', role: 'student', path: `${base}/work/${work.id}` },
    { name: 'class', role: 'instructor', path: `${base}/labs/${lab.id}/class` },
    { name: 'marks', role: 'student', path: `${base}/marks/${judged.submissionId}` },
    { name: 'dispute', role: 'ta', path: `${base}/disputes/${dispute.id}` },
    { name: 'handbook', role: 'instructor', path: '/handbook/potential-temperature' },
  ]
}

mkdirSync(folder, { recursive: true })
for (const { name, role, path } of await places()) {
  const context = await browser.newContext({ viewport: { width: 1280, height: 860 }, reducedMotion: 'reduce' })
  await context.addCookies([{ name: 'sky', value: 'day', url: server.url }])
  const page = await context.newPage()
  const person = people.withRole(role)
  await signInAs(page, server.url, person.email, person.password)
  const answer = await page.goto(server.url + path, { waitUntil: 'networkidle' })
  if (answer?.status() !== 200) throw new Error(`${path} answers ${answer?.status()} to a ${role}.`)
  if (await page.locator('.notice.alarm').count() > 0) throw new Error(`${path} refuses a ${role}.`)
  await page.evaluate(() => document.fonts.ready.then(() => null))
  const file = join(folder, `${name}.png`)
  await page.screenshot({ path: file })
  const bytes = statSync(file).size
  process.stdout.write(`${name}.png ${(bytes / 1000).toFixed(0)} kB${bytes > largestBytes ? ', too large' : ''}\n`)
  if (bytes > largestBytes) process.exitCode = 1
  await context.close()
}
await browser.close()
await server.close()
rmSync(dataDir, { recursive: true, force: true })
