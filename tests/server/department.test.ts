import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import SQLite from 'better-sqlite3'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import type { TermDates } from '../../shared/schemas/department'
import { teachingWeeksBetween } from '../../shared/schemas/teachingWeeks'
import { openDatabase } from '../../server/db/open'
import { hashPassphrase } from '../../server/domain/people/passphrase'
import { allRows, changedTables } from '../fixtures/allRows'
import { startBuiltServer, type BuiltServer } from '../fixtures/builtServer'
import { goodPassphrase } from '../fixtures/people'
import { postedLab, smallDepartment, zone } from '../fixtures/smallDepartment'
import { Visitor } from '../fixtures/visitor'

process.env.AUTH_SECRET = 'a secret that only these tests know'
const dataDir = mkdtempSync(join(tmpdir(), 'tetherhouse-department-'))
let server: BuiltServer
let admin: Visitor
let student: Visitor
let house: Awaited<ReturnType<typeof smallDepartment>>

beforeAll(async () => {
  const db = await openDatabase(dataDir)
  house = await smallDepartment(db)
  await postedLab(db, { courseId: house.courseId, title: 'Lapse and lift', times: { [house.sectionA]: ['2026-10-21T08:00', '2026-10-28T23:00'], [house.sectionB]: ['2026-10-22T08:00', '2026-10-30T17:00'] } })
  const argon2id = await hashPassphrase(goodPassphrase)
  for (const person_id of [house.people.admin, house.people.first]) await db.write(trx => trx.insertInto('credential').values({ person_id, argon2id, changed_at: 0 }).execute())
  await db.close()
  server = await startBuiltServer({ dataDir })
  admin = await new Visitor(server.url).signIn('ada.min@example.edu', goodPassphrase)
  student = await new Visitor(server.url).signIn('fay.ode@example.edu', goodPassphrase)
})
afterAll(async () => {
  await server?.close()
  rmSync(dataDir, { recursive: true, force: true })
})

const key = (name: string) => ({ 'idempotency-key': `key-of-${name.replaceAll(' ', '-')}` })
const answered = async (response: Response) => ({ status: response.status, body: await response.json() as Record<string, unknown> })

describe('what is not there', () => {
  const absent = '0190a1b2-0000-7000-8000-000000000000'
  it.each(['work', 'marks', 'disputes', 'labs', 'data', 'people', 'convention', `work/${absent}`, `work/${absent}/receipt/NO-00001`, `marks/${absent}`, `disputes/${absent}`, `labs/${absent}`, `data/${absent}`])('answers 404 on a page: /c/…/%s', async (page) => {
    const answer = await student.ask(`/c/${absent}/${page}`, { headers: { accept: 'text/html' } })
    expect([answer.status, answer.headers.get('content-type')?.split(';')[0]]).toEqual([404, 'text/html'])
    expect(await answer.text()).toMatch(/Not found|Nothing at this address/)
  })
  it('while what is there answers 200', async () => {
    for (const page of ['work', 'marks', 'disputes']) expect([page, (await student.ask(`/c/${house.courseId}/${page}`)).status]).toEqual([page, 200])
  })
})

describe('a roster over HTTP', () => {
  const text = 'Name;E-mail;Section\nNew One;new.one@example.edu;A\nFay Ode;fay.ode@example.edu;B\n'
  it('is shown first and then carried out once, however often it is sent', async () => {
    const path = `/api/department/courses/${house.courseId}/roster`
    const preview = await answered(await admin.send('POST', `${path}/preview`, { text }))
    expect(preview).toMatchObject({ status: 200, body: { adds: [{ email: 'new.one@example.edu' }], moves: [{ from: 'A', to: 'B' }], absent: [{ email: 'sol.ann@example.edu', ends: false }] } })
    const body = { text, digest: preview.body.digest }
    const first = await answered(await admin.send('POST', path, body, key('roster')))
    expect(first).toMatchObject({ status: 201, body: { added: 1, moved: 1, ended: 0 } })
    expect(await answered(await admin.send('POST', path, body, key('roster')))).toEqual(first)
    expect(await answered(await admin.send('POST', path, body, key('roster again')))).toMatchObject({ status: 409, body: { code: 'plan_changed' } })
    expect(await answered(await admin.send('POST', path, { ...body, text: `${text}\n` }, key('roster')))).toMatchObject({ status: 422, body: { code: 'request_key_reused' } })
  })
  it('is nobody’s but the admin’s', async () => {
    for (const path of [`/api/department/courses/${house.courseId}/roster/preview`, '/api/department/courses/nothing/roster/preview']) expect((await student.send('POST', path, { text })).status).toBe(404)
  })
})

describe('the people of a course', () => {
  it('are for its staff and the admin, not for its students', async () => {
    expect((await admin.ask(`/api/courses/${house.courseId}/people`)).status).toBe(200)
    expect((await student.ask(`/api/courses/${house.courseId}/people`)).status).toBe(403)
  })
})

describe('the next term over HTTP', () => {
  const term = (name: string): TermDates => ({ name, zone, startsOn: '2027-01-11', endsOn: '2027-04-30', calendar: { weeks: teachingWeeksBetween('2027-01-11', '2027-04-30', []), holidays: [] } })
  const rows = () => {
    const raw = new SQLite(join(dataDir, 'main.db'), { readonly: true })
    try {
      return allRows(raw)
    }
    finally {
      raw.close()
    }
  }
  const termsCalled = (name: string) => [...rows().get('term')!].filter(row => row.includes(`"${name}"`)).length
  const coursesOf = () => rows().get('course')!.size

  it('is started once from a plan that was read, with a key or with another', async () => {
    const asked = { fromTermId: house.termId, term: term('Spring 2027') }
    const plan = await answered(await admin.send('POST', '/api/department/terms/roll-over/plan', asked))
    expect(plan.status).toBe(200)
    const body = { ...asked, digest: plan.body.digest }
    const all = await Promise.all([key('one'), key('one'), key('two'), key('three')].map(async headers => answered(await admin.send('POST', '/api/department/terms/roll-over', body, headers))))
    expect(all[0]).toMatchObject({ status: 201, body: { courses: 1, labs: 1, dates: 2 } })
    expect(all.every(one => JSON.stringify(one) === JSON.stringify(all[0]))).toBe(true)
    expect(termsCalled('Spring 2027')).toBe(1)
  })

  it('killed at any moment is there whole or not at all, and the same request finishes it', async () => {
    const outcomes = { before: 0, after: 0 }
    let usual = 0
    for (let round = 0; round < 7; round++) {
      const name = `Round ${round}`
      const asked = { fromTermId: house.termId, term: term(name) }
      const { body: plan } = await answered(await admin.send('POST', '/api/department/terms/roll-over/plan', asked))
      const before = rows()
      const courses = coursesOf()
      const request = () => admin.send('POST', '/api/department/terms/roll-over', { ...asked, digest: plan.digest }, key(`round ${round}`))
      const sent = performance.now()
      const lost = request().then(response => response.status, () => 0)
      // the first round is left alone, to learn how long it takes; the others are cut somewhere in it or just after
      if (round > 0) await new Promise(resolve => setTimeout(resolve, usual * round / 5))
      else {
        await lost
        usual = performance.now() - sent
      }
      await server.restart('SIGKILL')
      const status = await lost
      const isThere = termsCalled(name) === 1
      if (status === 201) expect(isThere).toBe(true) // what was acknowledged is there
      expect(coursesOf()).toBe(isThere ? courses + 1 : courses)
      outcomes[isThere ? 'after' : 'before'] += 1
      expect((await request()).status).toBe(201)
      expect(termsCalled(name)).toBe(1)
      expect(coursesOf()).toBe(courses + 1)
      expect(changedTables(before, rows()).filter(table => !['ledger_chain', 'session', 'counter'].includes(table))).toEqual([])
    }
    console.log(`killed before it was stored: ${outcomes.before}, after: ${outcomes.after}`)
  })
})

describe('closing an account over HTTP', () => {
  it('ends its sessions with the next request', async () => {
    expect((await student.ask('/api/me')).status).toBe(200)
    expect((await admin.send('POST', `/api/department/people/${house.people.first}/close`, undefined, key('close'))).status).toBe(200)
    expect((await student.ask('/api/me')).status).toBe(401)
  })
})
