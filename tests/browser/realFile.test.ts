import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { DemoHouse, local } from '../fixtures/demoHouse'
import { chromiumPath } from '../fixtures/openBrowser'
import { slopeOf, textOf } from '../fixtures/shareCsv'
import { describeWithShared, sharedFile } from '../fixtures/sharedFolder'

const title = 'A lapse rate over the plains'

/** A sounding as somebody else's program wrote it: quoted heads without units, wind in knots, heights above the sea, no clock. */
describeWithShared('a real file in the browser', () => {
  describe.skipIf(!chromiumPath)('the sounding of North Platte', () => {
    let house: DemoHouse
    let course: { id: string, code: string }
    let section: { name: string }
    let rate: number

    beforeAll(async () => {
      house = await DemoHouse.open()
      const found = await house.people.courseOf(house.people.withRole('student'), 'student')
      course = found
      section = found.sections[0]!
    })
    afterAll(() => house?.close())

    it('a technician finds the way from the first page, says what is what, and sees the file\'s own values kept', async () => {
      const page = await house.as(house.people.withRole('technician'))
      await page.goto(`${house.server.url}/`)
      await page.getByRole('navigation', { name: 'Places' }).getByRole('link', { name: 'Data' }).waitFor()
      await page.getByRole('link', { name: `Bring a file into ${course.code}` }).first().click()
      await page.locator('input[type=file]').setInputFiles(sharedFile('data/profiles/northplatte.csv'))
      const preview = page.getByRole('region', { name: 'First rows as they would be stored' })
      await preview.getByRole('cell', { name: '936.6', exact: true }).waitFor()
      await page.getByLabel('Name of the data set').fill('Sounding of the plains')
      await page.getByLabel('Kind').selectOption('flight')
      await page.getByLabel('Unit of ws').selectOption({ label: 'kn' })
      await page.getByRole('button', { name: 'Units are right' }).click()
      await preview.getByRole('columnheader', { name: /ws\s*kn/ }).waitFor()
      // Line 5 of the file: 936.6 hPa, 610 m, 22.2 °C, 11.6 °C, 150°, 31 kn
      expect((await preview.getByRole('row').nth(4).innerText()).split(/\s+/).slice(-6)).toEqual(['936.6', '610', '22.2', '11.6', '150', '31'])
      await page.getByRole('button', { name: 'Import', exact: true }).click()
      await page.getByText(/^71 rows read; one data set made/).waitFor()
      const made = page.getByRole('row', { name: /Sounding of the plains/ })
      expect((await made.innerText()).split(/\t|\n/).map(text => text.trim()).filter(text => text !== '')).toEqual(['Sounding of the plains', '71', 'none'])
      await page.getByRole('link', { name: 'Sounding of the plains' }).click()
      await page.getByRole('heading', { level: 1, name: 'Sounding of the plains' }).waitFor()
      await page.locator('main figure svg path.d1').first().waitFor()
      const rows = page.getByRole('region', { name: 'Rows', exact: true })
      expect((await rows.getByRole('row').nth(4).innerText()).split(/\s+/).slice(-6)).toEqual(['936.6', '610', '22.2', '11.6', '150', '31'])
    })

    it('an instructor asks for the lapse rate of a layer of it', async () => {
      const page = await house.as(house.people.withRole('instructor'))
      await page.goto(`${house.server.url}/c/${course.id}/labs`)
      await page.getByRole('link', { name: 'Begin a lab' }).click()
      await page.getByLabel('Title of the new lab').fill(title)
      await page.getByRole('button', { name: 'Begin the draft' }).click()
      await page.getByLabel('Title', { exact: true }).waitFor()
      await page.getByText('Layers of one thickness', { exact: true }).click()
      await page.getByLabel(/Sounding of the plains/).check()
      await page.getByLabel('up', { exact: true }).check()
      await page.getByLabel('down', { exact: true }).uncheck() // a balloon's sounding has no way down
      await page.getByLabel('From, m').fill('600')
      await page.getByLabel('To, m').fill('3000')
      await page.getByLabel('Thickness, m').fill('2400')
      await page.getByRole('button', { name: /^Add \d+ layers?$/ }).click()
      await page.getByRole('button', { name: 'Add a step' }).click()
      const step = page.getByRole('region', { name: 'Step 1', exact: true })
      await step.getByLabel('Title of the step').fill('Lapse rate of your layer')
      await step.getByLabel('Quantity').selectOption('lapse-rate-least-squares')
      await step.getByLabel('Marks', { exact: true }).fill('2')
      await page.getByRole('button', { name: 'Save draft' }).click()
      await page.getByText('saved', { exact: true }).waitFor()
      await page.getByRole('link', { name: 'Dates and posting' }).click()
      await page.getByLabel(section.name, { exact: true }).check()
      await page.getByLabel(`${section.name}: opens`).fill(local(-2))
      await page.getByLabel(`${section.name}: due`).fill(local(7))
      await page.getByRole('button', { name: 'Post lab' }).click()
      await page.getByRole('heading', { name: 'Posted', exact: true }).waitFor()
    })

    it('a student computes it from the rows served, and earns the marks once they are released', async () => {
      const own = await house.as(house.people.withRole('student'))
      await own.goto(`${house.server.url}/c/${course.id}/work`)
      await own.getByRole('link', { name: title }).click()
      await own.getByRole('heading', { level: 1, name: title }).waitFor()
      const [download] = await Promise.all([own.waitForEvent('download'), own.getByRole('link', { name: 'Download your data' }).click()])
      rate = slopeOf(await textOf(download))
      await own.getByRole('textbox').first().fill(`${rate.toFixed(2)} °C/km`)
      await own.getByText(/read as/).waitFor()
      await own.getByText(/^saved/).first().waitFor()
      await own.getByRole('button', { name: 'Submit lab' }).first().click()
      await Promise.race([own.getByRole('dialog').getByRole('button', { name: 'Submit lab' }).click({ timeout: 5_000 }).catch(() => {}), own.getByText('Received.').waitFor()])
      await own.getByText('Received.').waitFor()

      const page = await house.as(house.people.withRole('instructor'))
      await page.goto(`${house.server.url}/c/${course.id}/labs`)
      await page.getByRole('link', { name: title }).click()
      await page.waitForURL(/\/labs\/[^/]+$/)
      await page.getByRole('link', { name: 'The class' }).click()
      await page.locator('label', { hasText: 'section' }).locator('select').selectOption({ label: section.name })
      await page.getByText(new RegExp(`section ${section.name}$`)).waitFor()
      await page.getByRole('button', { name: 'Release marks' }).click()
      await page.getByRole('dialog').getByRole('button', { name: 'Release marks' }).click()
      await page.getByText(/^Released /).waitFor()

      await own.goto(`${house.server.url}/c/${course.id}/marks`)
      await own.getByRole('link', { name: title }).click()
      await own.getByRole('heading', { name: /^Step 1, worked/ }).waitFor()
      await own.getByText('within', { exact: true }).first().waitFor()
    })
  })
})
