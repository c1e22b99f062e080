import type { Browser, Page } from 'playwright-core'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { openDatabase } from '../../server/db/open'
import { startBuiltServer, type BuiltServer } from '../fixtures/builtServer'
import { chromiumPath, findings, openBrowser, sideways, signInAs } from '../fixtures/openBrowser'
import { goodPassphrase } from '../fixtures/people'
import { hashPassphrase } from '../../server/domain/people/passphrase'
import { smallDepartment } from '../fixtures/smallDepartment'

describe.skipIf(!chromiumPath)('the face', () => {
  let server: BuiltServer
  let browser: Browser
  let page: Page
  let courseId: string

  beforeAll(async () => {
    process.env.AUTH_SECRET ??= 'a secret that only these tests know' // invitations are made on the way
    server = await startBuiltServer()
    await server.stop()
    const database = await openDatabase(server.dataDir)
    const house = await smallDepartment(database)
    courseId = house.courseId
    const argon2id = await hashPassphrase(goodPassphrase)
    await database.write(trx => trx.insertInto('credential').values(Object.values(house.people).map(person_id => ({ person_id, argon2id, changed_at: 0 }))).execute())
    await database.close()
    await server.restart()
    browser = await openBrowser()
    page = await browser.newPage()
  })
  afterAll(async () => {
    await browser?.close()
    await server?.close()
  })

  const laptop = { width: 1280, height: 720 }
  const looks = [{ sky: 'night', size: { width: 360, height: 740 } }, { sky: 'day', size: laptop }]
  const publicPages = ['/sign-in', '/reset', '/reset/a-token-that-was-never-made', '/invite/a-token-that-was-never-made', '/no-such-page']
  it.each(publicPages)('%s is free of findings and does not scroll sideways, by day and by night', async (path) => {
    for (const { sky, size } of looks) {
      await page.context().addCookies([{ name: 'sky', value: sky, url: server.url }])
      await page.setViewportSize(size)
      await page.goto(server.url + path)
      await page.waitForLoadState('networkidle')
      expect(await page.locator('html').getAttribute('data-sky')).toBe(sky)
      expect(await sideways(page)).toBeLessThanOrEqual(0)
      expect(await findings(page)).toEqual([])
    }
  })

  it('finds a control without a name and pale words where they are put in', async () => {
    await page.goto(`${server.url}/sign-in`)
    await page.waitForLoadState('networkidle')
    await page.evaluate(() => {
      const pale = Object.assign(document.createElement('p'), { textContent: 'too pale to read' })
      pale.style.color = '#cccccc'
      document.querySelector('.bare-form')!.append(document.createElement('input'), pale)
    })
    expect((await findings(page)).map(found => found.rule).toSorted()).toEqual(['color-contrast', 'label'])
  })

  it('fetches nothing from elsewhere, and no font by data', async () => {
    const asked: string[] = []
    page.on('request', request => asked.push(request.url()))
    await page.goto(`${server.url}/sign-in`)
    await page.waitForLoadState('networkidle')
    page.removeAllListeners('request')
    expect(asked.filter(address => !address.startsWith(server.url) && !address.startsWith('data:image/'))).toEqual([])
    expect(asked.some(address => /lora-latin-500.*\.woff2$/.test(address))).toBe(true)
    expect(await page.evaluate(() => [...document.fonts].filter(font => font.status === 'error').length)).toBe(0)
  })

  it('keeps what was typed when e-mail and passphrase do not go together, and says so', async () => {
    await page.goto(`${server.url}/sign-in`)
    await page.waitForLoadState('networkidle')
    await page.getByLabel('University e-mail').fill('fay.ode@example.edu')
    await page.getByLabel('Passphrase', { exact: true }).fill('not this one at all')
    await page.keyboard.press('Enter')
    await page.getByRole('alert').filter({ hasText: 'do not go together' }).waitFor()
    expect(await page.getByLabel('University e-mail').inputValue()).toBe('fay.ode@example.edu')
  })

  it('opens the course switcher by keyboard, walks it, and gives focus back on Escape', async () => {
    await page.setViewportSize(laptop)
    await signInAs(page, server.url, 'tess.aird@example.edu', goodPassphrase)
    await page.goto(`${server.url}/account`)
    await page.waitForLoadState('networkidle')
    const button = page.getByRole('button', { name: 'Courses' })
    await button.focus()
    await page.keyboard.press('ArrowDown')
    expect(await page.evaluate(() => document.activeElement?.textContent)).toContain('ATM 301')
    await page.keyboard.press('Escape')
    expect(await button.getAttribute('aria-expanded')).toBe('false')
    expect(await button.evaluate(element => element === document.activeElement)).toBe(true)
  })

  it('leads a TA to the labs of their one course, with the places of a TA on the mast', async () => {
    await page.goto(`${server.url}/`)
    await page.waitForURL(`**/c/${courseId}/labs`)
    const places = await page.getByRole('navigation', { name: 'Places' }).getByRole('listitem').allInnerTexts()
    expect(places.map(place => place.split('\n')[0])).toContain('Labs')
    expect(places.join()).not.toContain('Work')
  })

  it('turns to night and stays there without a flash of day', async () => {
    await page.goto(`${server.url}/account`)
    await page.waitForLoadState('networkidle')
    await page.getByLabel('Night').check()
    expect(await page.evaluate(() => getComputedStyle(document.documentElement).backgroundColor)).toBe('rgb(17, 23, 28)')
    const html = await (await page.request.get(`${server.url}/account`)).text()
    expect(html).toMatch(/<html[^>]*data-sky="night"/)
  })
})
