import { createServer } from 'node:http'
import { mkdtempSync, readdirSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { routeFiles } from '../../modules/routes'
import { openDatabase } from '../../server/db/open'
import { policies } from '../../server/domain/policies'
import { startBuiltServer, type BuiltServer } from '../fixtures/builtServer'
import { goodPassphrase } from '../fixtures/people'
import { Visitor } from '../fixtures/visitor'
import { buildWorld, type World } from '../fixtures/world'
import { inParallel, leaksOf, operationsOf, policyOf, sweep, type Operation } from './sweep'

let server: BuiltServer
let dataDir: string
let world: World
let operations: Operation[]
let browsers: Record<string, Visitor>

beforeAll(async () => {
  dataDir = mkdtempSync(join(tmpdir(), 'tetherhouse-'))
  const stores = await openDatabase(dataDir)
  world = await buildWorld(stores, dataDir)
  await stores.close()
  server = await startBuiltServer({ dataDir })
  operations = await operationsOf(server.url)
  browsers = await signEverybodyIn(server.url)
  // The account is closed while its session is open: what it still holds must open nothing.
  const closing = await browsers.admin!.send('POST', `/api/department/people/${world.people.closed!.personId}/close`, {}, { 'idempotency-key': 'close-the-account' })
  expect(closing.status).toBeLessThan(300)
})
afterAll(async () => {
  await server.close()
  rmSync(dataDir, { recursive: true, force: true })
})

async function signEverybodyIn(url: string): Promise<Record<string, Visitor>> {
  const entries: [string, Visitor][] = []
  await inParallel(Object.entries(world.people).map(([key, person]) => async () => { entries.push([key, await new Visitor(url).signIn(person.email, goodPassphrase)]) }), 4)
  return Object.fromEntries(entries)
}

describe('the table of who may what', () => {
  it('covers every route that was built, and every route that is built is in the description', () => {
    const files = routeFiles(fileURLToPath(new URL('../../server/api', import.meta.url))).map(route => `${route.method.toUpperCase()} ${route.path}`)
    expect(files.length).toBeGreaterThan(10)
    const described = operations.map(operation => `${operation.method} ${operation.path}`)
    expect(files.filter(file => !described.includes(file)), 'on the disk but not described').toEqual([])
    expect(described.filter(one => !files.includes(one)), 'described but not on the disk: build again').toEqual([])
    expect(operations.filter(operation => !policyOf(operation.action)).map(operation => `${operation.method} ${operation.path}`)).toEqual([])
  })

  // Cells that must hold whatever the table says: the table itself could be wrong.
  it('lets no student act for staff, and no stranger act at all', () => {
    const forStaff = Object.entries(policies).filter(([action]) => /^(lab:(write|edit|post|release|class|preview)|dispute:(take|rule)|data:|allowance:|course:people)/.test(action))
    expect(forStaff.length).toBeGreaterThan(10)
    for (const [action, policy] of forStaff) expect((policy.roles as readonly string[]).includes('student'), action).toBe(false)
    for (const [action, policy] of Object.entries(policies)) if (policy.scope === 'public') expect(action).toMatch(/^(house|passphrase|invitation):/)
    for (const [action, policy] of Object.entries(policies)) if (action.startsWith('department:')) expect([action, policy.scope]).toEqual([action, 'department'])
    for (const action of ['submission:read', 'receipt:read', 'mark:history', 'marks:read', 'draft:save', 'submission:create', 'dispute:read', 'dispute:open', 'share:data', 'lab:work'] as const) expect([action, policies[action].scope]).toEqual([action, 'own'])
  })
})

describe('the access sweep (S1)', () => {
  it('finds every route to answer everybody as the table says, for every object', async () => {
    const swept = await sweep({ url: server.url, operations, world, browsers })
    console.log(`access sweep: ${operations.length} routes, ${Object.keys(world.people).length + 1} people, ${swept.cells} cells`)
    expect(swept.findings.slice(0, 60)).toEqual([])
    expect(swept.cells).toBeGreaterThan(10_000) // as the README says
  }, 600_000)

  it('takes as long over what is foreign as over what is missing', async () => {
    const median = (list: number[]) => list.toSorted((a, b) => a - b)[Math.floor(list.length / 2)]!
    const browser = browsers.studentElsewhere!
    const timed = async (path: string) => {
      const began = performance.now()
      const answer = await browser.ask(path)
      await answer.arrayBuffer()
      expect(answer.status).toBe(404)
      return performance.now() - began
    }
    const { shareId, submissionId, courseId } = world.objects.own!.ids
    for (const path of [`/api/courses/${courseId}/people`, `/api/submissions/${submissionId}`, `/api/shares/${shareId}`]) {
      const missing = path.replace(/[0-9a-f-]{36}/, '0190a1b2-0000-7000-8000-000000000000')
      const ratios: number[] = []
      do {
        const [foreign, absent]: [number[], number[]] = [[], []]
        for (let n = 0; n < 150; n++) {
          foreign.push(await timed(path))
          absent.push(await timed(missing))
        }
        ratios.push(median(foreign) / median(absent))
      } while (Math.min(...ratios.map(ratio => Math.abs(ratio - 1))) > 0.1 && ratios.length < 4)
      console.log(`foreign / missing ${path.replace(/[0-9a-f-]{36}/, '…')}: ${ratios.map(ratio => ratio.toFixed(3)).join(' ')}`)
      expect(Math.min(...ratios.map(ratio => Math.abs(ratio - 1))), path).toBeLessThan(0.1)
    }
  }, 120_000)

  it('turns red over a planted hole: one route that answers a stranger as it would the lead', async () => {
    const holed = operations.find(operation => operation.method === 'GET' && operation.path === '/api/courses/{courseId}/people')!
    const proxy = createServer((request, reply) => {
      const isHole = /^\/api\/courses\/[^/]+\/people$/.test(request.url ?? '') && (request.headers.cookie ?? '').includes(browsers.studentElsewhere!.cookieHeader)
      void fetch(`${server.url}${request.url}`, { headers: { cookie: isHole ? browsers.lead!.cookieHeader : request.headers.cookie ?? '', host: request.headers.host ?? '' } }).then(async (answer) => {
        reply.writeHead(answer.status, { 'content-type': answer.headers.get('content-type') ?? '' })
        reply.end(Buffer.from(await answer.arrayBuffer()))
      })
    })
    await new Promise<void>(resolve => proxy.listen(0, '127.0.0.1', () => resolve()))
    const address = proxy.address()
    if (address === null || typeof address === 'string') throw new Error('No port.')
    try {
      const through = `http://127.0.0.1:${address.port}`
      const same = Object.fromEntries(Object.entries(browsers).map(([key, browser]) => [key, browser.at(through)]))
      const swept = await sweep({ url: through, operations: [holed], world, browsers: same })
      expect(swept.findings.some(finding => finding.includes('/people [own] as studentElsewhere') && finding.includes('expected not_found, got 200'))).toBe(true)
      expect(swept.findings.some(finding => finding.includes('holds what belongs to the main course') || finding.includes('holds what belongs to student'))).toBe(true)
      // and over nothing else
      expect(swept.findings.filter(finding => !finding.includes('studentElsewhere'))).toEqual([])
      // A cell filled wrongly is no control: without the hole the same cells are clean.
      expect((await sweep({ url: server.url, operations: [holed], world, browsers })).findings).toEqual([])
    }
    finally {
      proxy.close()
    }
  }, 120_000)

  it('turns red over a route without an action, and over a parameter that nobody explained', async () => {
    const bare: Operation = { method: 'GET', path: '/api/me', action: undefined, hasBody: false, asksForKey: false }
    expect((await sweep({ url: server.url, operations: [bare], world, browsers, actors: ['student'] })).findings).toEqual(['GET /api/me: no action of the table ("none")'])
    await expect(sweep({ url: server.url, operations: [{ ...bare, path: '/api/things/{thingId}', action: 'course:read' }], world, browsers, actors: ['student'] })).rejects.toThrow('say in tests/access/samples.ts what the parameter "thingId" names')
  })
})

describe('requests from elsewhere (S4)', () => {
  it('change nothing: another site’s origin, a null origin, a form that calls itself text', async () => {
    const mutating = operations.filter(operation => operation.method !== 'GET')
    expect(mutating.length).toBeGreaterThan(5)
    const accepted: string[] = []
    for (const operation of mutating) {
      const path = operation.path.replace(/\{(\w+)\}/g, (_, name: string) => encodeURIComponent(world.objects.own!.ids[name] ?? 'rate'))
      for (const actor of ['lead', 'admin', 'student'] as const) {
        const attempts: [string, RequestInit][] = [
          ['another site', { headers: { 'origin': 'https://elsewhere.example', 'content-type': 'application/json' }, body: '{}' }],
          ['a null origin', { headers: { 'origin': 'null', 'content-type': 'text/plain' }, body: '{}' }],
          ['a neighbour host', { headers: { 'sec-fetch-site': 'same-site', 'content-type': 'application/json' }, body: '{}' }],
          ['a form', { headers: { 'sec-fetch-site': 'cross-site', 'content-type': 'text/plain' }, body: '{"a":"=1"}' }],
          ['another port', { headers: { 'origin': `http://127.0.0.1:${server.port + 1}`, 'content-type': 'application/x-www-form-urlencoded' }, body: 'a=1' }],
        ]
        for (const [how, init] of attempts) {
          const answer = await browsers[actor]!.ask(path, { method: operation.method, ...init })
          const text = await answer.text()
          if (!text.includes('wrong_origin')) accepted.push(`${operation.method} ${operation.path} as ${actor} from ${how}: ${answer.status} ${text.slice(0, 100)}`)
        }
      }
      if (operation.hasBody) {
        // Without any header that says where it comes from, the kind of body still must be ours.
        const answer = await browsers.admin!.ask(path, { method: operation.method, headers: { 'content-type': 'text/plain' }, body: '{}' })
        if (answer.status < 400) accepted.push(`${operation.method} ${operation.path}: took text/plain`)
      }
    }
    expect(accepted).toEqual([])
  }, 120_000)
})

describe('pages', () => {
  it('give nobody what belongs to others, and never fail', async () => {
    const root = fileURLToPath(new URL('../../pages', import.meta.url))
    const pages = readdirSync(root, { recursive: true, withFileTypes: true }).filter(entry => entry.isFile() && entry.name.endsWith('.vue'))
      .map(entry => `${entry.parentPath.slice(root.length)}/${entry.name}`.replace(/\.vue$/, '').replace(/\/index$/, '') || '/')
    expect(pages.length).toBeGreaterThan(2)
    const wrong: string[] = []
    // The API under them was swept cell by cell; here it is enough that each page is seen from near and far.
    const seen: string[] = []
    const places = ['own', 'otherSections', 'otherCourses', 'lastTerms'].map(where => [where, world.objects[where]!] as const)
    const askers = ['nobody', 'student', 'taOfB', 'instructorElsewhere', 'closed']
    const tasks = pages.flatMap(page => places.flatMap(([where, object]) => [...askers, ...(where === 'own' ? ['lead'] : [])].map(actor => async () => {
      const path = page.replace(/\[(?:\.\.\.)?(\w+)\]/g, (_, name: string) => encodeURIComponent(object.ids[name] ?? object.ids[`${name}Id`] ?? 'rate'))
      const answer = await (browsers[actor] ?? new Visitor(server.url)).ask(path, { headers: { accept: 'text/html' } })
      const text = await answer.text()
      if (answer.status >= 500) wrong.push(`${path} [${where}] as ${actor}: ${answer.status}`)
      for (const leak of leaksOf(text, world.people[actor] ?? null, world)) wrong.push(`${path} [${where}] as ${actor}: holds ${leak}`)
      if (actor === 'lead' && text.includes(world.people.student!.canary)) seen.push(path)
    })))
    await inParallel(tasks, 6)
    expect(wrong.slice(0, 40)).toEqual([])
    expect(seen.length, 'pages where the lead sees a student of theirs: else nothing was looked at').toBeGreaterThan(0)
  }, 600_000)
})
