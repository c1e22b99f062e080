import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { makeDemo, type Made } from '../../../seeds/scenarios'
import { openDatabase, type OpenDatabase } from '../../../server/db/open'
import { auditLedger } from '../../../server/domain/ledger/auditLedger'
import { describeDemo } from '../../../server/domain/people/describeDemo'
import { matchesPassphrase } from '../../../server/domain/people/passphrase'
import { loadShare } from '../../../server/domain/shares/loadShare'
import { openFileStore } from '../../../server/files/store'
import { openObservations, type Observations } from '../../../server/observations/chunks'
import { referenceIn } from '../../fixtures/reference'

const now = Date.UTC(2027, 1, 17, 18) // a Wednesday noon in the place

describe('the demo', () => {
  let dataDir: string
  let stores: OpenDatabase
  let observations: Observations
  let made: Made

  beforeAll(async () => {
    process.env.AUTH_SECRET ??= 'only for this test, which sends nothing'
    dataDir = mkdtempSync(join(tmpdir(), 'tetherhouse-demo-'))
    stores = await openDatabase(dataDir)
    stores.raw.pragma('synchronous = OFF')
    observations = openObservations(dataDir)
    const reference = await referenceIn(stores.write)
    made = await makeDemo({ stores, observations, files: openFileStore(dataDir), dataDir, secret: 'a'.repeat(64), now, judging: { reference, loadShare: shareId => loadShare(stores.read, observations, shareId) } })
  }, 240_000)
  afterAll(async () => {
    observations.close()
    await stores.close()
    rmSync(dataDir, { recursive: true, force: true })
  })

  it('is as large as a department’s two terms: people, flights, submissions, disputes', () => {
    expect(made.people).toBeGreaterThan(55)
    expect(made.flights).toBe(15)
    expect(made.submissions).toBeGreaterThan(120)
    expect(made.disputes).toBeGreaterThan(8)
  })

  it('has a ledger that proves it, each chain in the order of time, nothing after the day of its making', async () => {
    expect((await auditLedger(stores.read)).findings).toEqual([])
    const entries = await stores.read.selectFrom('ledger_entry').select(['chain_id', 'seq', 'at']).orderBy('chain_id').orderBy('seq').execute()
    entries.forEach((entry, at) => {
      const before = entries[at - 1]
      if (before?.chain_id === entry.chain_id) expect(entry.at).toBeGreaterThanOrEqual(before.at)
      expect(entry.at).toBeLessThanOrEqual(now)
    })
  })

  it('has labs in every state that a lab can be in', async () => {
    const labs = await stores.read.selectFrom('lab').innerJoin('course', 'course.id', 'lab.course_id').innerJoin('term', 'term.id', 'course.term_id').leftJoin('posting', 'posting.lab_id', 'lab.id')
      .select(['lab.id', 'lab.state', 'term.state as term', 'posting.opens_at as opens', 'posting.due_at as due', 'posting.released_at as released']).execute()
    const running = labs.filter(lab => lab.term === 'running')
    expect(running.some(lab => lab.state === 'draft')).toBe(true)
    expect(running.some(lab => lab.state === 'posted' && (lab.opens ?? 0) < now && (lab.due ?? 0) > now)).toBe(true)
    expect(running.some(lab => lab.state === 'posted' && (lab.due ?? 0) < now && lab.released === null)).toBe(true)
    expect(running.some(lab => lab.released !== null)).toBe(true)
    expect(labs.filter(lab => lab.term === 'closed').every(lab => lab.state === 'posted' && lab.released !== null)).toBe(true)
    const drafts = await stores.read.selectFrom('draft').select('share_id').execute()
    expect(drafts.length).toBeGreaterThan(5)
  })

  it('has work that came late, work that never came, and slips that explain a value', async () => {
    const late = await stores.read.selectFrom('submission').select('id').where('late_units', '>', 0).execute()
    expect(late.length).toBeGreaterThan(4)
    const slips = await stores.read.selectFrom('evaluation').select('slips_json').execute()
    const keys = new Set(slips.flatMap((row) => {
      const { slip } = JSON.parse(row.slips_json) as { slip: { key: string } | null }
      return slip ? [slip.key] : []
    }))
    for (const key of ['sign', 'station-pressure', 'celsius-for-kelvin', 'per-meter']) expect(keys, key).toContain(key)
  })

  it('has disputes that are open, in hand and ruled, and in the past term none that is not settled', async () => {
    const disputes = await stores.read.selectFrom('dispute').innerJoin('submission', 'submission.id', 'dispute.submission_id').innerJoin('share', 'share.id', 'submission.share_id').innerJoin('lab', 'lab.id', 'share.lab_id')
      .innerJoin('course', 'course.id', 'lab.course_id').innerJoin('term', 'term.id', 'course.term_id').select(['dispute.state', 'term.state as term']).execute()
    const states = new Set(disputes.filter(dispute => dispute.term === 'running').map(dispute => dispute.state))
    for (const state of ['open', 'taken', 'ruled'] as const) expect(states, state).toContain(state)
    expect(disputes.filter(dispute => dispute.term === 'closed').every(dispute => dispute.state === 'ruled')).toBe(true)
  })

  it('lets in everybody whose sign-in it shows: each role, and one who is TA in one course and student in another', async () => {
    const { people } = await describeDemo(stores.read, true)
    for (const role of ['lead', 'instructor', 'ta', 'student', 'admin', 'technician', 'visitor']) expect(people.some(person => person.roles.length === 1 && person.roles[0] === role), role).toBe(true)
    expect(people.filter(person => person.roles.join() === 'student').length).toBeGreaterThanOrEqual(3)
    expect(people.filter(person => person.roles.join() === 'ta').length).toBeGreaterThanOrEqual(2)
    expect(people.some(person => person.roles.includes('ta') && person.roles.includes('student'))).toBe(true)
    for (const person of people) {
      const kept = await stores.read.selectFrom('person').innerJoin('credential', 'credential.person_id', 'person.id').select('credential.argon2id').where('person.email_norm', '=', person.email).executeTakeFirstOrThrow()
      expect(await matchesPassphrase(kept.argon2id, person.password), person.email).toBe(true)
    }
  })

  it('has two courses of which one is listed under other codes, and a roof whose record ends by yesterday', async () => {
    const running = await stores.read.selectFrom('course').innerJoin('term', 'term.id', 'course.term_id').select(['course.id']).where('term.state', '=', 'running').execute()
    expect(running.length).toBe(2)
    const listings = await stores.read.selectFrom('course_listing').select(['course_id']).where('course_id', 'in', running.map(course => course.id)).execute()
    expect(new Set(listings.map(listing => listing.course_id)).size).toBe(1)
    const versions = await stores.read.selectFrom('data_set_version').select(['last_at', 'rows_taken', 'rows_refused']).execute()
    expect(versions.every(version => version.rows_refused === 0 && version.rows_taken > 200 && (version.last_at ?? 0) < now)).toBe(true)
  })
})
