import { rmSync } from 'node:fs'
import type { Browser, Page } from 'playwright-core'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { startBuiltServer, type BuiltServer } from '../fixtures/builtServer'
import { DemoPeople } from '../fixtures/demoPeople'
import { copyOf, demoWorld } from '../fixtures/demoWorld'
import { chromiumPath, openBrowser, signInAs } from '../fixtures/openBrowser'

/** On a slow machine a page is seen before its scripts have come. Here they are held back until the person is done. */
describe.skipIf(!chromiumPath)('what is typed before the scripts of a page have come', () => {
  let server: BuiltServer
  let browser: Browser
  let dataDir: string
  let email: string
  let passphrase: string

  beforeAll(async () => {
    dataDir = copyOf(demoWorld())
    server = await startBuiltServer({ dataDir, env: { DEMO: '1' } })
    browser = await openBrowser()
    const admin = (await DemoPeople.of(server.url)).withRole('admin')
    email = admin.email
    passphrase = admin.password
  })
  afterAll(async () => {
    await browser?.close()
    await server?.close()
    rmSync(dataDir, { recursive: true, force: true })
  })

  const newPage = async () => {
    const page = await (await browser.newContext()).newPage()
    page.setDefaultTimeout(30_000)
    return page
  }
  /** Opens a page whose scripts wait until they are let in. */
  async function openWithoutScripts(page: Page, path: string): Promise<() => void> {
    let letIn = () => {}
    const waiting = new Promise<void>((resolve) => { letIn = resolve })
    await page.route(/\/_nuxt\/.*\.js/, async (route) => {
      await waiting
      await route.continue()
    })
    await page.goto(`${server.url}${path}`, { waitUntil: 'commit' })
    return letIn
  }
  const day = (days: number) => new Date(Date.now() + days * 86_400_000).toISOString().slice(0, 10)
  async function writeTerm(page: Page): Promise<void> {
    await page.getByRole('heading', { level: 1, name: 'Plan the next term' }).waitFor()
    await page.getByLabel('Name', { exact: true }).fill('Typed early')
    await page.getByLabel('First day').fill(day(60))
    await page.getByLabel('Last day').fill(day(180))
    await page.getByRole('button', { name: 'Draw up the plan' }).click()
  }

  it('a sign-in is carried out, and its passphrase never stands in an address', async () => {
    const page = await newPage()
    const addresses: string[] = []
    page.on('request', request => addresses.push(request.url()))
    const letIn = await openWithoutScripts(page, '/sign-in')
    await page.getByLabel('University e-mail').fill(email)
    await page.getByLabel('Passphrase', { exact: true }).fill(passphrase)
    await page.getByRole('button', { name: 'Sign in', exact: true }).click()
    letIn()
    await page.waitForURL(address => !address.pathname.startsWith('/sign-in'))
    expect(addresses.filter(address => address.includes(encodeURIComponent(passphrase)) || address.includes('password='))).toEqual([])
    await page.context().close()
  })

  it('a form is sent with all that was typed', async () => {
    const page = await newPage()
    await signInAs(page, server.url, email, passphrase)
    const letIn = await openWithoutScripts(page, '/department/terms/roll-over')
    await writeTerm(page)
    letIn()
    await page.getByRole('heading', { name: 'What comes along' }).waitFor()
    await page.getByRole('heading', { level: 1, name: 'to Typed early' }).waitFor()
    await page.context().close()
  })

  it('a button does what it says, once, however often it was pressed', async () => {
    const page = await newPage()
    await signInAs(page, server.url, email, passphrase)
    const letIn = await openWithoutScripts(page, '/department/terms/roll-over')
    const add = page.getByRole('button', { name: 'Add days without classes' })
    await add.click()
    await add.click() // again, since nothing was seen to happen
    letIn()
    await page.getByLabel('To, if longer than a day').first().waitFor()
    await page.waitForTimeout(500)
    expect(await page.getByLabel('To, if longer than a day').count()).toBe(1)
    await page.context().close()
  })

  it('strokes that fall on both sides of the moment are all there', async () => {
    const page = await newPage()
    await signInAs(page, server.url, email, passphrase)
    const slow = await page.context().newCDPSession(page)
    const letIn = await openWithoutScripts(page, '/department/terms/roll-over')
    await page.getByRole('heading', { level: 1, name: 'Plan the next term' }).waitFor()
    await slow.send('Emulation.setCPUThrottlingRate', { rate: 6 })
    const text = 'A long name that takes a while to write down, '.repeat(2)
    const typing = page.getByLabel('Name', { exact: true }).pressSequentially(text, { delay: 30 })
    setTimeout(letIn, 400)
    await typing
    await page.waitForLoadState('networkidle')
    await page.waitForTimeout(2_000)
    expect(await page.getByLabel('Name', { exact: true }).inputValue()).toBe(text)
    await page.context().close()
  })

  it('control: a page that hears nothing of it loses what was typed', async () => {
    const page = await newPage()
    await signInAs(page, server.url, email, passphrase)
    await page.addInitScript(() => Object.defineProperty(window, 'earlyDeeds', { get: () => undefined, set: (deeds: { stopListening: () => void }) => deeds.stopListening() }))
    const letIn = await openWithoutScripts(page, '/department/terms/roll-over')
    await page.getByRole('heading', { level: 1, name: 'Plan the next term' }).waitFor()
    await page.getByLabel('Name', { exact: true }).fill('Typed early')
    letIn()
    await page.waitForLoadState('networkidle')
    await expect.poll(() => page.getByLabel('Name', { exact: true }).inputValue(), { timeout: 10_000 }).toBe('')
    await page.context().close()
  })
})
