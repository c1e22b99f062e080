import { rmSync } from 'node:fs'
import type { Browser } from 'playwright-core'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { openForReading } from '../../server/db/open'
import { startBuiltServer, type BuiltServer } from '../fixtures/builtServer'
import { DemoPeople } from '../fixtures/demoPeople'
import { copyOf, demoWorld } from '../fixtures/demoWorld'
import { chromiumPath, openBrowser } from '../fixtures/openBrowser'
import { addressesOf, NoSampleError, pageFiles, type PageVisitor } from '../fixtures/pageAddresses'
import { keepBreaches, PageFaults } from '../fixtures/pageFaults'

const looks = [{ sky: 'night', width: 360, height: 740 }, { sky: 'day', width: 1280, height: 720 }]
const roles = ['student', 'ta', 'instructor', 'lead', 'admin', 'technician', 'visitor']
const files = pageFiles()
const timeout = 60_000

/** Every page that is there, as each role that can open it: on a phone by night and on a laptop by day. */
describe.skipIf(!chromiumPath)('every page', () => {
  let server: BuiltServer
  let browser: Browser
  let people: DemoPeople
  let database: ReturnType<typeof openForReading>
  let dataDir: string
  let runningCourse: string
  /** Pages that somebody could open and was not refused on. */
  const opened = new Set<string>()

  beforeAll(async () => {
    dataDir = copyOf(demoWorld())
    server = await startBuiltServer({ dataDir, env: { DEMO: '1' } })
    people = await DemoPeople.of(server.url)
    runningCourse = (await people.courseOf(people.withRole('lead'), 'lead')).id
    database = openForReading(dataDir)
    browser = await openBrowser()
  })
  afterAll(async () => {
    await browser?.close()
    await database?.close()
    await server?.close()
    rmSync(dataDir, { recursive: true, force: true })
  })

  async function visitorOf(role: string | null): Promise<{ visitor: PageVisitor, cookies: { name: string, value: string, url: string }[] }> {
    if (role === null) return { visitor: { email: null, courseId: runningCourse }, cookies: [] }
    const person = people.withRole(role)
    const cookies = (await people.visitor(person)).cookieHeader.split('; ').map((pair) => {
      const at = pair.indexOf('=')
      return { name: pair.slice(0, at), value: pair.slice(at + 1), url: server.url }
    })
    const isOfCourse = ['student', 'ta', 'instructor', 'lead'].includes(role)
    return { visitor: { email: person.email, courseId: isOfCourse ? (await people.courseOf(person, role)).id : runningCourse }, cookies }
  }

  /** What is wrong with the pages that this role can open, on a phone and on a laptop at once. */
  async function visit(role: string | null): Promise<string[]> {
    const { visitor, cookies } = await visitorOf(role)
    const lines: string[] = []
    const open: { pattern: string, path: string }[] = []
    const door = await browser.newContext()
    await door.addCookies(cookies)
    for (const file of files.filter(each => role !== null || each.isPublic)) {
      for (const path of await addressesOf(database.read, file, visitor)) {
        const answer = await door.request.get(server.url + path, { maxRedirects: 0, timeout })
        if (answer.status() >= 500) lines.push(`${path} (${file.pattern}): answers ${answer.status()}`)
        if (answer.status() !== 200) continue
        open.push({ pattern: file.pattern, path })
        if (!(await answer.text()).includes('class="notice alarm"')) opened.add(file.pattern)
      }
    }
    await door.close()
    await Promise.all(looks.map(async ({ sky, ...viewport }) => {
      const context = await browser.newContext({ viewport })
      await keepBreaches(context)
      await context.addCookies([...cookies, { name: 'sky', value: sky, url: server.url }])
      const page = await context.newPage()
      const faults = new PageFaults(page, server.url)
      for (const { pattern, path } of open) {
        faults.begin()
        await page.goto(server.url + path, { waitUntil: 'networkidle', timeout })
        lines.push(...(await faults.lines()).map(line => `${path} (${pattern}) at ${viewport.width} by ${sky}: ${line}`))
      }
      await context.close()
    }))
    return lines.toSorted()
  }

  it.each([{ who: 'who is not signed in', role: null }, ...roles.map(role => ({ who: `a ${role}`, role }))])('has nothing wrong for $who', async ({ role }) => {
    expect(await visit(role)).toEqual([])
  })

  it('was opened by somebody, whichever page it is', () => {
    expect(files.map(file => file.pattern).filter(pattern => !opened.has(pattern))).toEqual([])
  })

  it('would tell of each thing that can be wrong', async () => {
    const context = await browser.newContext()
    await keepBreaches(context)
    const page = await context.newPage()
    const faults = new PageFaults(page, server.url)
    await page.goto(`${server.url}/sign-in`, { waitUntil: 'networkidle' })
    expect(await faults.lines()).toEqual([])
    await page.evaluate(() => {
      const broad = Object.assign(document.createElement('p'), { textContent: 'too broad' })
      broad.style.width = '5000px'
      const image = Object.assign(document.createElement('img'), { alt: '', src: 'http://127.0.0.1:1/elsewhere.png' })
      document.querySelector('main')!.append(document.createElement('input'), broad, image, document.createElement('h1'))
      document.title = ''
      console.error('something went wrong')
    })
    await page.waitForTimeout(100)
    const told = (await faults.lines()).join('\n')
    for (const fault of ['console: something went wrong', 'content policy: img-src', 'scrolls sideways', '2 first headings', 'title ""', 'axe label']) expect(told).toContain(fault)
    await context.close()
  })

  it('would tell of a request to another server', async () => {
    const context = await browser.newContext({ bypassCSP: true })
    const page = await context.newPage()
    const faults = new PageFaults(page, server.url)
    await page.goto(`${server.url}/sign-in`, { waitUntil: 'networkidle' })
    await page.evaluate(() => fetch('http://127.0.0.1:1/elsewhere').catch(() => null))
    expect(await faults.lines()).toContain('asked elsewhere: http://127.0.0.1:1/elsewhere')
    await context.close()
  })

  it('says which parameter of a new page has no sample', async () => {
    await expect(addressesOf(database.read, { pattern: '/c/[courseId]/balloons/[balloonId]', isPublic: false }, { email: null, courseId: runningCourse }))
      .rejects.toThrow(new NoSampleError('The page /c/[courseId]/balloons/[balloonId] has the parameter [balloonId]: say in tests/fixtures/pageAddresses.ts what stands for it.'))
  })
})
