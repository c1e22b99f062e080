import { spawnSync } from 'node:child_process'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import type { Page } from 'playwright-core'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { DemoHouse, local } from '../fixtures/demoHouse'
import type { DemoPerson } from '../fixtures/demoPeople'
import { chromiumPath } from '../fixtures/openBrowser'
import { slopeOf, textOf } from '../fixtures/shareCsv'

const root = fileURLToPath(new URL('../..', import.meta.url))
const flight = join(root, 'tests/fixtures/generated/flight-morning.csv')
const title = 'The lapse rate of one layer'

/** From a logger's file to a settled dispute and into the next term, as five people in a browser. The steps stand on each other. */
describe.skipIf(!chromiumPath)('the whole chain', () => {
  let house: DemoHouse
  let courseId: string
  let section: { id: string, name: string }
  let rate: number

  beforeAll(async () => {
    house = await DemoHouse.open()
    const course = await house.people.courseOf(house.people.withRole('student'), 'student')
    courseId = course.id
    section = course.sections[0]!
  })
  afterAll(() => house?.close())

  const go = async (page: Page, path: string) => {
    await page.goto(`${house.server.url}${path}`)
    await page.waitForLoadState('networkidle')
  }
  const student = () => house.people.withRole('student')

  it('a technician brings a flight in and sees it drawn', async () => {
    const page = await house.as(house.people.withRole('technician'))
    await go(page, `/c/${courseId}/data/upload`)
    await page.locator('input[type=file]').setInputFiles(flight)
    await page.getByRole('heading', { name: 'First rows, as they would be kept' }).waitFor()
    await page.getByLabel('Name of the data set').fill('Flight of the chain')
    await page.getByRole('button', { name: 'Import', exact: true }).click()
    await page.getByRole('heading', { name: 'Imported' }).waitFor()
    await page.getByRole('link', { name: 'Flight of the chain' }).click()
    await page.getByRole('heading', { level: 1, name: 'Flight of the chain' }).waitFor()
    await page.locator('main figure svg path.d1').first().waitFor()
  })

  it('an instructor writes a lab on it, looks at every share, and posts it', async () => {
    const page = await house.as(house.people.withRole('instructor'))
    await go(page, `/c/${courseId}/labs`)
    await page.getByRole('link', { name: 'Begin a lab' }).click()
    await page.getByLabel('Title of the new lab').fill(title)
    await page.getByRole('button', { name: 'Begin the draft' }).click()
    await page.getByLabel('Title', { exact: true }).waitFor()
    await page.waitForLoadState('networkidle')
    await page.getByLabel(/^Text \(Markdown/).fill('With $z$ upward, $\\Gamma = -\\partial T/\\partial z$.')
    await page.getByText('Layers of one thickness', { exact: true }).click()
    await page.getByLabel(/Flight of the chain/).check()
    await page.getByLabel('up', { exact: true }).check()
    await page.getByLabel('From, m').fill('200')
    await page.getByLabel('To, m').fill('500')
    await page.getByLabel('Thickness, m').fill('300')
    await page.getByRole('button', { name: /^Add \d+ layers?$/ }).click()
    await page.getByRole('button', { name: 'Add a step' }).click()
    const step = page.getByRole('region', { name: 'Step 1', exact: true })
    await step.getByLabel('Title of the step').fill('Lapse rate of your layer')
    await step.getByLabel('Quantity').selectOption('lapse-rate-least-squares')
    await step.getByLabel('Marks', { exact: true }).fill('3')
    await page.getByRole('button', { name: 'Save draft' }).click()
    await page.getByText('saved', { exact: true }).waitFor()

    await page.getByRole('link', { name: 'Proof run' }).click()
    await page.getByRole('region', { name: 'Every share and step' }).waitFor()
    expect(await page.getByText(/cannot be asked|range too wide/).count()).toBe(0)

    await page.getByRole('link', { name: 'Dates and posting' }).click()
    await page.getByLabel(section.name, { exact: true }).check()
    await page.getByLabel(`${section.name}: opens`).fill(local(-2))
    await page.getByLabel(`${section.name}: due`).fill(local(7))
    await page.getByRole('button', { name: 'Post lab' }).click()
    await page.getByRole('heading', { name: 'Posted', exact: true }).waitFor()
  })

  it('a student takes the data, types a value as people do, is told a wrong dimension, submits, and has a receipt', async () => {
    const page = await house.as(student())
    await go(page, `/c/${courseId}/work`)
    await page.getByRole('link', { name: title }).click()
    await page.getByRole('heading', { level: 1, name: title }).waitFor()
    await page.waitForLoadState('networkidle')
    const [download] = await Promise.all([page.waitForEvent('download'), page.getByRole('link', { name: 'Download your data' }).click()])
    rate = slopeOf(await textOf(download))
    const field = page.getByRole('textbox').first()
    await field.fill('9.8 hPa')
    await page.getByText(/pressure/i).last().waitFor()
    // The sign is turned: what a dispute will be about.
    await field.fill(`${(-rate).toFixed(2).replace('-', '−')} K/km`)
    await page.getByText(/read as/).waitFor()
    await page.getByText(/^saved/).first().waitFor()
    await page.getByRole('button', { name: 'Submit lab' }).first().click()
    const ask = page.getByRole('dialog').getByRole('button', { name: 'Submit lab' })
    await Promise.race([ask.click({ timeout: 3_000 }).catch(() => {}), page.getByText('Received.').waitFor()])
    await page.getByText('Received.').waitFor()
    await page.getByRole('link', { name: 'Open the receipt' }).click()
    await page.waitForURL(/\/receipt\//)
    await page.getByRole('heading', { level: 1 }).waitFor()
    expect((await page.locator('main').innerText()).replace(/\s/g, '')).toMatch(/[0-9a-f]{64}/)
  })

  it('nothing is told before release; the instructor sees the class and releases', async () => {
    const own = await house.as(student())
    await go(own, `/c/${courseId}/marks`)
    expect(await own.getByRole('row', { name: new RegExp(title) }).getByText('marks released').count()).toBe(0)
    const page = await house.as(house.people.withRole('instructor'))
    await go(page, `/c/${courseId}/labs`)
    await page.getByRole('link', { name: title }).click()
    await page.waitForURL(/\/labs\/[^/]+$/)
    await go(page, `${new URL(page.url()).pathname}/class`)
    await page.locator('label', { hasText: 'section' }).locator('select').selectOption({ label: section.name })
    await page.getByText(new RegExp(`section ${section.name}$`)).waitFor()
    await page.getByRole('button', { name: 'Release marks' }).click()
    await page.getByRole('dialog').getByRole('button', { name: 'Release marks' }).click()
    await page.getByText(/^Released /).waitFor()
  })

  it('the student reads marks, band, worked value and slip, and objects', async () => {
    const page = await house.as(student())
    await go(page, `/c/${courseId}/marks`)
    await page.getByRole('link', { name: title }).click()
    await page.getByRole('heading', { name: /^Step 1, worked/ }).waitFor()
    await page.locator('main').getByText(/sign/i).first().waitFor()
    expect(await page.getByText(new RegExp(`${rate.toFixed(1).replace('.', '\\.')}`)).count()).toBeGreaterThan(0)
    await page.getByRole('link', { name: /^Object to this mark/ }).click()
    await page.getByLabel(/^Why the mark should be another/).fill('The board on Monday had dT/dz. My slope is that of the fit.')
    await page.getByRole('button', { name: 'Send objection' }).click()
    await page.waitForURL(/\/disputes\/(?!new)/)
  })

  it('a TA of the section rules on the evidence, once', async () => {
    const page = await house.as(await taOfSection())
    await go(page, `/c/${courseId}/disputes`)
    await page.getByRole('link', { name: new RegExp(title) }).click()
    await page.getByRole('heading', { name: 'The reference’s reading' }).waitFor()
    await page.getByRole('button', { name: 'Take this dispute' }).click()
    await page.getByText(/^It is with you/).waitFor()
    await page.getByLabel(/^Accept this reading or method/).check()
    await page.getByLabel(/^Reason, read by every student/).fill('Both signs were taught that week; the magnitude is right.')
    await page.getByRole('button', { name: /^Record ruling for one student/ }).click()
    await page.getByText('reading or method accepted').first().waitFor()
    const own = await house.as(student())
    await go(own, `/c/${courseId}/marks`)
    await own.getByRole('link', { name: title }).click()
    await own.getByText(/accepted by a ruling/).first().waitFor()
    await own.getByText(/ruling, step 1/).first().waitFor()
  })

  it('the admin opens the next term from the running one', async () => {
    const page = await house.as(house.people.withRole('admin'))
    await go(page, '/department/terms')
    await page.getByRole('link', { name: 'Plan the next term' }).click()
    await page.getByRole('heading', { level: 1, name: 'Plan the next term' }).waitFor() // the page before has fields of the same names
    await page.getByLabel('Name', { exact: true }).fill('The term after')
    await page.getByLabel('First day').fill(local(60).slice(0, 10))
    await page.getByLabel('Last day').fill(local(180).slice(0, 10))
    await page.getByRole('button', { name: 'Draw up the plan' }).click()
    await page.getByRole('heading', { name: 'What comes along' }).waitFor()
    expect(await page.getByText(title).count()).toBeGreaterThan(0)
    await page.getByRole('button', { name: 'Start The term after' }).click()
    await page.waitForURL(/\/department\/terms\/(?!roll-over)/)
    await page.getByRole('heading', { level: 1, name: 'The term after' }).waitFor()
  })

  it('what was told along the way stands: audit and recheck find nothing', async () => {
    await house.server.stop()
    for (const command of ['audit', 'recheck']) {
      const done = spawnSync(process.execPath, ['--import', 'tsx', `server/cli/${command}.ts`], { cwd: root, env: { ...process.env, DATA_DIR: house.dataDir }, encoding: 'utf8' })
      expect([command, done.status, done.stdout.trim().split('\n').slice(-3).join('\n')]).toEqual([command, 0, expect.stringMatching(/\w+=\d+/)])
    }
  })

  async function taOfSection(): Promise<DemoPerson> {
    for (const person of house.people.people.filter(each => each.roles.includes('ta'))) {
      const course = await house.people.courseOf(person, 'ta').catch(() => null)
      if (course?.id === courseId && course.sections.some(each => each.id === section.id)) return person
    }
    throw new Error('The section has no TA in the demo.')
  }
})

