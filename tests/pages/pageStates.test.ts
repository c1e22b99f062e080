import type { Page } from 'playwright-core'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { chromiumPath } from '../fixtures/openBrowser'
import { addressesOf } from '../fixtures/pageAddresses'
import type { PageFaults } from '../fixtures/pageFaults'
import { PageRounds } from '../fixtures/pageRounds'

type Then = (faults: PageFaults, page: Page) => Promise<void>

/** What a person reads where something is refused: a notice, or words below a field. */
const refusal = '.notice.alarm, .wrong, [data-invalid] .formkit-messages, .formkit-message, .is-wrong .said'

/** Fills fields by their label, presses a button, and waits until the page says what it refuses. */
const refused = (fill: Readonly<Record<string, string>>, button: string | null, timeout = 8000): Then => async (faults, page) => {
  for (const [label, text] of Object.entries(fill)) await page.getByLabel(label, { exact: true }).first().fill(text)
  if (button !== null) await page.getByRole('button', { name: button, exact: true }).click()
  await page.locator(refusal).filter({ hasText: /\S/ }).first().waitFor({ timeout })
  await faults.settle()
  faults.begin() // a refusal answers 4xx, which a browser writes to its console
}

/** States that no plain visit meets: nothing there yet, refused, not found. */
describe.skipIf(!chromiumPath)('a page', () => {
  let rounds: PageRounds
  beforeAll(async () => {
    rounds = await PageRounds.start()
  })
  afterAll(() => rounds?.close())

  it.each(['lead', 'ta', 'student'])('with nothing on it yet has nothing wrong, for a %s', async (role) => {
    const places = role === 'student' ? ['work', 'marks', 'disputes', 'labs'] : ['labs', 'data', 'marks', 'disputes', 'people']
    const guest = await rounds.guest(role)
    const pages = places.map(place => ({ name: 'empty', path: `/c/${rounds.emptyCourse}/${place}` }))
    for (const { path } of pages) expect(await rounds.answer(path, guest), path).toMatchObject({ status: 200 })
    expect(await rounds.look(guest, pages)).toEqual([])
  })

  it('says what to do next where a list is empty', async () => {
    for (const [role, place, words] of [['lead', 'labs', 'Begin a lab'], ['lead', 'data', 'Bring in a file'], ['student', 'work', 'When your instructor posts one'], ['student', 'disputes', 'Go to Marks'], ['student', 'marks', 'once they are released'], ['ta', 'disputes', 'appear here']] as const) {
      const { text } = await rounds.answer(`/c/${rounds.emptyCourse}/${place}`, await rounds.guest(role))
      expect(text, `${place} as ${role}`).toContain(words)
    }
  })

  it('that is not there says so, to who is not signed in and to who is', async () => {
    const clear: Then = async faults => faults.begin()
    const missing = [{ path: '/no-such-page', role: null }, { path: '/no-such-page', role: 'student' }, { path: '/c/never-made/labs', role: 'student' }, { path: '/department/people/never-made', role: 'admin' }, { path: '/department/terms', role: 'student' }]
    for (const { path, role } of missing) {
      const guest = await rounds.guest(role)
      const { status, text } = await rounds.answer(path, guest)
      expect({ path, role, status, isTold: /Nothing at this address|Not found|not allowed|cannot|may not/i.test(text) }).toEqual({ path, role, status, isTold: true })
      expect(await rounds.look(guest, [{ name: 'missing', path, then: clear }])).toEqual([])
    }
  })

  it.each([
    ['/sign-in', null, { 'University e-mail': 'nobody@tamarackbend.example', 'Passphrase': 'not this one at all' }, 'Sign in'],
    ['/reset', null, {}, 'Send the link'],
    ['/account', 'student', {}, 'Change the passphrase'],
    ['/department/terms', 'admin', {}, 'Add the term'],
    ['/department/courses', 'admin', {}, 'Add the course'],
    ['/department/people', 'admin', {}, 'Send the invitation'],
    ['/c/[courseId]/disputes/new', 'student', { 'Why the mark should be another. Say what you did and where the ask or your data lead to it.': ' ' }, 'Send objection'],
  ] as const)('that refuses what was sent has nothing wrong: %s', async (pattern, role, fill, button) => {
    const guest = await rounds.guest(role)
    const [path] = await addressesOf(rounds.database.read, { pattern, isPublic: role === null }, guest.visitor)
    expect(await rounds.look(guest, [{ name: 'refused', path: path!, then: refused(fill, button) }])).toEqual([])
  })

  it('that refuses a draft, dates, a typed value or a file has nothing wrong', async () => {
    const lead = await rounds.guest('lead')
    const draft = await rounds.database.read.selectFrom('lab').select('id').where('course_id', '=', lead.visitor.courseId).where('state', '=', 'draft').limit(1).executeTakeFirstOrThrow()
    const base = `/c/${lead.visitor.courseId}`
    const sent: Then = async (faults, page) => {
      await page.locator('input[type=file]').setInputFiles({ name: 'not-a-record.csv', mimeType: 'text/csv', buffer: Buffer.from([0, 1, 2, 3, 0, 255]) })
      const button = page.getByRole('button', { name: /Send|Bring|Upload/ })
      if (await button.count() > 0) await button.first().click()
      await refused({}, null)(faults, page)
    }
    expect(await rounds.look(lead, [
      { name: 'refused', path: `${base}/labs/${draft.id}`, then: refused({ Title: '' }, null) },
      { name: 'refused', path: `${base}/labs/${draft.id}/post`, then: refused({ 'A: due': '' }, null) },
      { name: 'refused', path: `${base}/data/upload`, then: sent },
    ])).toEqual([])
    const student = await rounds.guest('student')
    const works = await addressesOf(rounds.database.read, { pattern: '/c/[courseId]/work/[shareId]', isPublic: false }, student.visitor)
    const typed: Then = async (faults, page) => {
      await page.locator('.write input').first().fill('9.8 apples')
      await refused({}, null)(faults, page)
    }
    const open: string[] = []
    for (const path of works) if (!/<input[^>]*disabled[^>]*>/.test((await rounds.answer(path, student)).text)) open.push(path)
    expect(open.length).toBeGreaterThan(0)
    expect(await rounds.look(student, open.slice(0, 1).map(path => ({ name: 'refused', path, then: typed })))).toEqual([])
  })

  it('would be seen where it refuses without a word', async () => {
    await expect(rounds.look(await rounds.guest(null), [{ name: 'refused', path: '/reset', then: refused({}, null, 1500) }])).rejects.toThrow(/Timeout/)
  })
})
