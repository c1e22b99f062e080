import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import type { Browser, BrowserContext, Page } from 'playwright-core'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { openDatabase } from '../../server/db/open'
import { startBuiltServer, type BuiltServer } from '../fixtures/builtServer'
import { labWeek, passphrase, type LabWeek } from '../fixtures/labWeek'
import { chromiumPath, findings, openBrowser, sideways, signInAs } from '../fixtures/openBrowser'

describe.skipIf(!chromiumPath)('the work page', () => {
  let server: BuiltServer
  let browser: Browser
  let context: BrowserContext
  let week: LabWeek
  let dataDir: string
  let workUrl: string

  beforeAll(async () => {
    dataDir = mkdtempSync(join(tmpdir(), 'tetherhouse-work-'))
    week = await labWeek(dataDir)
    server = await startBuiltServer({ dataDir })
    browser = await openBrowser()
    context = await browser.newContext({ viewport: { width: 1280, height: 720 } })
    const page = await context.newPage()
    await signInAs(page, server.url, week.student, passphrase)
    await page.goto(`${server.url}/c/${week.courseId}/work`)
    await page.getByRole('link', { name: 'The layer above the roof' }).click()
    await page.waitForURL(/\/work\/[0-9a-f-]+$/)
    workUrl = page.url()
    await page.close()
  })
  afterAll(async () => {
    await browser?.close()
    await server?.close()
    rmSync(dataDir, { recursive: true, force: true })
  })

  const open = async (url = workUrl): Promise<Page> => {
    const page = await context.newPage()
    await page.goto(url)
    await page.waitForLoadState('networkidle')
    return page
  }
  const field = (page: Page, title: string) => page.getByRole('textbox', { name: title })
  const entry = (page: Page, key: string) => page.locator(`#step-${key}`)
  const rows = async (table: 'draft' | 'submission') => {
    const stores = await openDatabase(dataDir)
    const found = await stores.read.selectFrom(table).selectAll().execute()
    await stores.close()
    return found
  }

  it('saves as one types, tells how it is read, and has it again after a reload', async () => {
    const page = await open()
    await field(page, 'Lapse rate').fill('0.54 K/100 m')
    await entry(page, 'rate').getByText('read as 5.4 K km').waitFor()
    await entry(page, 'rate').getByText(/^saved \d\d:\d\d$/).waitFor()
    await page.reload()
    await page.waitForLoadState('networkidle')
    expect(await field(page, 'Lapse rate').inputValue()).toBe('0.54 K/100 m')
    await page.close()
  })

  it('tells a wrong dimension before submission', async () => {
    const page = await open()
    await field(page, 'Potential temperature').fill('5 hPa')
    await entry(page, 'theta').getByText('hPa is a pressure', { exact: false }).waitFor()
    expect(await field(page, 'Potential temperature').getAttribute('aria-invalid')).toBe('true')
    await page.close()
  })

  it('shows both texts where two tabs typed, and overwrites neither', async () => {
    const [here, there] = [await open(), await open()]
    await field(there, 'Lapse rate').fill('5.1 K/km')
    await entry(there, 'rate').getByText(/^saved/).waitFor()
    await field(here, 'Lapse rate').fill('5.3 K/km')
    const notice = entry(here, 'rate').getByRole('status')
    await notice.waitFor()
    expect(await notice.innerText()).toMatch(/5\.1 K\/km[\s\S]*5\.3 K\/km/)
    await notice.getByRole('button', { name: 'Keep this one' }).click()
    await entry(here, 'rate').getByText(/^saved/).waitFor()
    await there.reload()
    await there.waitForLoadState('networkidle')
    expect(await field(there, 'Lapse rate').inputValue()).toBe('5.3 K/km')
    await Promise.all([here.close(), there.close()])
  })

  it('keeps the text in the browser while the line is down, over a closed tab too, and sends it when it is back', async () => {
    const page = await open()
    await context.setOffline(true)
    await field(page, 'Lapse rate').fill('5.2 K/km')
    await entry(page, 'rate').getByText('kept in this browser').waitFor()
    await page.getByText(/^No connection since \d\d:\d\d\.$/).waitFor()
    await page.close()
    await context.setOffline(false)
    const again = await open()
    expect(await field(again, 'Lapse rate').inputValue()).toBe('5.2 K/km')
    await entry(again, 'rate').getByText(/^saved/).waitFor()
    await again.close()
  })

  it('R8: keeps the text when the session ends while one types', async () => {
    const page = await open()
    const cookies = await context.cookies()
    await context.clearCookies()
    await field(page, 'Lapse rate').fill('5.38 K/km')
    await page.getByText('You are signed out.').waitFor()
    await context.addCookies(cookies)
    await page.reload()
    await page.waitForLoadState('networkidle')
    expect(await field(page, 'Lapse rate').inputValue()).toBe('5.38 K/km')
    await entry(page, 'rate').getByText(/^saved/).waitFor()
    await page.close()
  })

  it('R6: a double click hands in once; the receipt is on the page and is the stored one', async () => {
    const page = await open()
    await field(page, 'Potential temperature').fill('289.0 K')
    await entry(page, 'theta').getByText('read as').waitFor()
    await page.getByRole('button', { name: 'Submit lab' }).dblclick()
    const notice = page.getByRole('status').filter({ hasText: 'Received' })
    await notice.waitFor()
    const submissions = await rows('submission')
    expect(submissions).toHaveLength(1)
    expect(await notice.innerText()).toContain((submissions[0] as { receipt_no: string }).receipt_no)
    await notice.getByRole('link', { name: 'Open the receipt' }).click()
    await page.getByRole('heading', { name: 'What was stored' }).waitFor()
    expect(await page.getByRole('row').filter({ hasText: 'Lapse rate of the layer' }).innerText()).toContain('5.38 K/km')
    await page.close()
  })

  it('tells nothing of band or worked value before release, and all of it after', async () => {
    const stores = await openDatabase(dataDir)
    const evaluations = await stores.read.selectFrom('evaluation').select(['submission_id', 'parts_json']).execute()
    await stores.close()
    const edges = evaluations.flatMap((row) => {
      const { lowDecimal, highDecimal } = JSON.parse(row.parts_json) as { lowDecimal: string, highDecimal: string }
      return [lowDecimal, highDecimal]
    })
    expect(edges).toHaveLength(4)
    const marksUrl = `${server.url}/c/${week.courseId}/marks/${evaluations[0]!.submission_id}`
    const paths = [workUrl, `${server.url}/c/${week.courseId}/work`, `${server.url}/c/${week.courseId}/marks`, marksUrl]
    const told = async () => (await Promise.all(paths.map(async path => (await context.request.get(path)).text()))).join('\n')
    const before = await told()
    for (const edge of edges) expect(before).not.toContain(edge)

    const staff = await browser.newContext()
    const page = await staff.newPage()
    await signInAs(page, server.url, week.lead, passphrase)
    await page.goto(`${server.url}/c/${week.courseId}/labs/${week.labId}/class`)
    await page.waitForLoadState('networkidle')
    expect(await findings(page)).toEqual([])
    await page.getByRole('button', { name: 'Release marks' }).click()
    await page.getByRole('dialog').getByRole('button', { name: 'Release marks' }).click()
    await page.getByText(/^Released /).waitFor()
    await staff.close()

    const after = await told()
    for (const edge of edges) expect(after).toContain(edge)
  })

  it.each([{ width: 360, height: 740 }, { width: 1280, height: 720 }])('is free of findings and does not scroll sideways at $width px, nor do receipt and marks', async (size) => {
    const submissions = await rows('submission') as { id: string, receipt_no: string }[]
    for (const url of [workUrl, `${workUrl}/receipt/${submissions[0]!.receipt_no}`, `${server.url}/c/${week.courseId}/work`, `${server.url}/c/${week.courseId}/marks`, `${server.url}/c/${week.courseId}/marks/${submissions[0]!.id}`]) {
      const page = await open(url)
      await page.setViewportSize(size)
      expect([url, await findings(page)]).toEqual([url, []])
      expect(await sideways(page)).toBeLessThanOrEqual(0)
      await page.close()
    }
  })
})
