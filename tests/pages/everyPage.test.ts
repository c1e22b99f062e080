import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { chromiumPath } from '../fixtures/openBrowser'
import { addressesOf, NoSampleError, pageFiles } from '../fixtures/pageAddresses'
import { keepBreaches, PageFaults } from '../fixtures/pageFaults'
import { PageRounds } from '../fixtures/pageRounds'

const roles = ['student', 'ta', 'instructor', 'lead', 'admin', 'technician', 'visitor']
const files = pageFiles()

/** Every page that is there, as each role that can open it: on a phone by night and on a laptop by day. */
describe.skipIf(!chromiumPath)('every page', () => {
  let rounds: PageRounds
  /** Pages that somebody could open and was not refused on. */
  const opened = new Set<string>()
  /** Sheets and masts that were already looked at, letter by letter: a page of which both are known shows nothing new. */
  const looked = new Set<string>()
  /** Pages on which somebody was already seen to be refused: a refusal looks the same to all. */
  const refused = new Set<string>()

  beforeAll(async () => {
    rounds = await PageRounds.start()
  })
  afterAll(() => rounds?.close())

  /** What is wrong with the pages that this role can open. */
  async function visit(role: string | null): Promise<string[]> {
    const guest = await rounds.guest(role)
    const broken: string[] = []
    const open: { name: string, path: string }[] = []
    for (const file of files.filter(each => role !== null || each.isPublic)) {
      for (const path of await addressesOf(rounds.database.read, file, guest.visitor)) {
        const answer = await rounds.answer(path, guest)
        if (answer.status >= 500) broken.push(`${path} (${file.pattern}): answers ${answer.status}`)
        // who is signed in and sent on within the house was let in: the page is there to send on
        if (answer.location !== null && role !== null && !answer.location.includes('/sign-in')) opened.add(file.pattern)
        if (answer.status !== 200) continue
        const isRefused = answer.text.includes('class="notice alarm"')
        if (isRefused && refused.has(file.pattern)) continue
        (isRefused ? refused : opened).add(file.pattern)
        const parts = [/<nav[\s\S]*?<\/nav>/, /<main[\s\S]*<\/main>/].map(part => part.exec(answer.text)?.[0] ?? '')
        if (parts.every(part => looked.has(part))) continue
        for (const part of parts) looked.add(part)
        open.push({ name: file.pattern, path })
      }
    }
    return [...broken, ...await rounds.look(guest, open)]
  }

  it.each([{ who: 'who is not signed in', role: null }, ...roles.map(role => ({ who: `a ${role}`, role }))])('has nothing wrong for $who', async ({ role }) => {
    expect((await visit(role)).join('\n')).toBe('')
  })

  it('was opened by somebody, whichever page it is', () => {
    expect(files.map(file => file.pattern).filter(pattern => !opened.has(pattern))).toEqual([])
  })

  it('would tell of each thing that can be wrong', async () => {
    const { browser, server } = rounds
    const context = await browser.newContext()
    await keepBreaches(context)
    const page = await context.newPage()
    const faults = new PageFaults(page, server.url)
    await faults.visit(`${server.url}/sign-in`)
    expect(await faults.lines()).toEqual([])
    await page.evaluate(() => {
      const broad = Object.assign(document.createElement('p'), { textContent: 'too broad' })
      broad.style.width = '5000px'
      const image = Object.assign(document.createElement('img'), { alt: '', src: 'http://127.0.0.1:1/elsewhere.png' })
      document.querySelector('main')!.append(document.createElement('input'), broad, image, document.createElement('h1'))
      // many words set alike, and one of them too faint: the ones alike are looked at once
      const many = Array.from({ length: 40 }, (_, at) => Object.assign(document.createElement('p'), { textContent: 'one of many', style: at === 37 ? 'color: #999; background: #aaa' : '' }))
      document.querySelector('main')!.append(...many)
      document.title = ''
      console.error('something went wrong')
    })
    await page.waitForTimeout(100)
    const told = (await faults.lines()).join('\n')
    for (const fault of ['console: something went wrong', 'content policy: img-src', 'scrolls sideways', '2 first headings', 'title ""', 'axe label', 'axe color-contrast']) expect(told).toContain(fault)
    await context.close()
  })

  it('would tell of a request to another server', async () => {
    const { browser, server } = rounds
    const context = await browser.newContext({ bypassCSP: true })
    const page = await context.newPage()
    const faults = new PageFaults(page, server.url)
    await faults.visit(`${server.url}/sign-in`)
    await page.evaluate(() => fetch('http://127.0.0.1:1/elsewhere').catch(() => null))
    expect(await faults.lines()).toContain('asked elsewhere: http://127.0.0.1:1/elsewhere')
    await context.close()
  })

  it('waits for what a page asks for after it has loaded', async () => {
    const { browser, server } = rounds
    const page = await browser.newPage()
    const faults = new PageFaults(page, server.url)
    await faults.visit(`${server.url}/sign-in`)
    await page.evaluate(() => {
      void fetch('/readyz').then(() => fetch('/readyz')).then(() => document.querySelector('main')!.append(document.createElement('input')))
    })
    await faults.settle()
    expect((await faults.lines()).join()).toContain('axe label')
    await page.close()
  })

  it('says which parameter of a new page has no sample', async () => {
    await expect(addressesOf(rounds.database.read, { pattern: '/c/[courseId]/balloons/[balloonId]', isPublic: false }, { email: null, courseId: rounds.runningCourse }))
      .rejects.toThrow(new NoSampleError('The page /c/[courseId]/balloons/[balloonId] has the parameter [balloonId]: say in tests/fixtures/pageAddresses.ts what stands for it.'))
  })
})
