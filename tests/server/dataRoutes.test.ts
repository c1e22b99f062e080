import { readdirSync, readFileSync, rmSync } from 'node:fs'
import { Agent, request } from 'node:http'
import { join } from 'node:path'
import { Readable } from 'node:stream'
import { randomUUID } from 'node:crypto'
import SQLite from 'better-sqlite3'
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { startBuiltServer, type BuiltServer } from '../fixtures/builtServer'
import { DemoPeople } from '../fixtures/demoPeople'
import { copyOf, demoWorld } from '../fixtures/demoWorld'
import type { Visitor } from '../fixtures/visitor'

const mebibyte = 1_048_576
const cap = 24 * mebibyte

let server: BuiltServer
let dataDir: string
let technician: Visitor
let base: string
let before: ReturnType<typeof stored>

beforeAll(async () => {
  dataDir = copyOf(demoWorld())
  server = await startBuiltServer({ dataDir, env: { DEMO: '1', UPLOAD_MAX_BYTES: String(cap) } })
  const people = await DemoPeople.of(server.url)
  const course = await people.courseOf(people.withRole('student'), 'student')
  technician = await people.visitor(people.withRole('technician'))
  base = `/api/courses/${course.id}/data`
})
afterAll(async () => {
  await server?.close()
  rmSync(dataDir, { recursive: true, force: true })
})
beforeEach(() => { before = stored() })

/** Everything that an upload or an import could leave behind, as it lies on the disk. */
function stored() {
  const main = new SQLite(join(dataDir, 'main.db'), { readonly: true })
  const observations = new SQLite(join(dataDir, 'observations.db'), { readonly: true })
  const count = (db: SQLite.Database, table: string) => Number(db.prepare(`select count(*) from ${table}`).pluck().get())
  try {
    return {
      uploads: count(main, 'upload'), sources: count(main, 'source_file'), dataSets: count(main, 'data_set'), versions: count(main, 'data_set_version'), recipes: count(main, 'recipe_revision'), chunks: count(observations, 'chunk'),
      files: readdirSync(join(dataDir, 'files'), { recursive: true, withFileTypes: true }).filter(entry => entry.isFile()).map(entry => join(entry.parentPath, entry.name)).toSorted(),
    }
  }
  finally {
    main.close()
    observations.close()
  }
}

const residentMiB = () => Number(/VmRSS:\s+(\d+) kB/.exec(readFileSync(`/proc/${server.pid}/status`, 'utf8'))?.[1] ?? Number.NaN) / 1024

interface Sent { status: number, code: string }

/** Sends a body as it is made, so that it is never whole in memory here either; without a length it goes in chunks. */
function sendBody(body: Readable, { length, name = 'record.csv', abortAfter }: { length?: number, name?: string, abortAfter?: number } = {}): Promise<Sent> {
  return new Promise((resolve, reject) => {
    let hasAnswer = false
    const agent = new Agent({ keepAlive: true }) // as a browser: the sender does not ask to close, and no old connection is met
    const asked = request(`${server.url}${base}/uploads`, {
      method: 'POST', agent,
      headers: {
        'cookie': technician.cookieHeader, 'origin': server.url, 'sec-fetch-site': 'same-origin', 'content-type': 'application/octet-stream', 'idempotency-key': randomUUID(), 'x-file-name': encodeURIComponent(name),
        ...(length === undefined ? { 'transfer-encoding': 'chunked' } : { 'content-length': length }),
      },
    }, (answer) => {
      hasAnswer = true
      body.destroy() // as a browser does: what is refused is not sent to its end
      let text = ''
      answer.setEncoding('utf8').on('data', (part: string) => { text += part }).on('end', () => {
        agent.destroy()
        resolve({ status: answer.statusCode ?? 0, code: /"code":"(\w+)"/.exec(text)?.[1] ?? '' })
      })
    })
    asked.on('error', (error) => {
      if (abortAfter !== undefined) resolve({ status: 0, code: '' })
      else if (!hasAnswer) reject(error) // the answer must be readable before the connection breaks
    })
    let sent = 0
    body.on('data', (chunk: Buffer) => {
      sent += chunk.length
      if (abortAfter !== undefined && sent >= abortAfter) return void asked.destroy()
      if (!asked.write(chunk)) {
        body.pause()
        asked.once('drain', () => body.resume())
      }
    })
    body.on('end', () => asked.end())
  })
}

const head = 'time,temp,rh\n'
const row = (n: number) => `${new Date(Date.UTC(2026, 0, 1) + n * 60_000).toISOString().slice(0, 19).replace('T', ' ')},${(10 + Math.sin(n / 200) * 5).toFixed(2)},60.0\n`
/** A record of at least so many bytes, row by row. */
function record(bytes: number): Readable {
  return Readable.from((function* () {
    let at = 0
    for (let made = 0; made < bytes;) {
      let block = at === 0 ? head : ''
      while (block.length < 65_536) block += row(at++)
      made += block.length
      yield Buffer.from(block)
    }
  })())
}

async function uploadText(text: string, name: string) {
  const answer = await technician.ask(`${base}/uploads`, {
    method: 'POST', body: text, headers: { 'origin': server.url, 'sec-fetch-site': 'same-origin', 'content-type': 'application/octet-stream', 'idempotency-key': randomUUID(), 'x-file-name': encodeURIComponent(name) },
  })
  expect(answer.status, await answer.clone().text()).toBe(201)
  return await answer.json() as { id: string, name: string, guess: { recipe: Record<string, unknown> } }
}
interface Job { state: string, rows: number, dataSets: { id: string, versionId: string, rowsTaken: number }[] }
async function startImport(upload: { id: string, guess: { recipe: Record<string, unknown> } }): Promise<string> {
  const answer = await technician.send('POST', `${base}/uploads/${upload.id}/imports`, { recipe: upload.guess.recipe, forDepartment: false }, { 'idempotency-key': randomUUID() })
  const text = await answer.text()
  expect(answer.status, text).toBe(202)
  return (JSON.parse(text) as { jobId: string }).jobId
}
const jobOf = (jobId: string) => technician.get<Job>(`${base}/jobs/${jobId}`)
async function untilJob(jobId: string, isIt: (job: Job) => boolean): Promise<Job> {
  for (const until = Date.now() + 40_000; Date.now() < until; await new Promise(resolve => setTimeout(resolve, 20))) {
    const job = await jobOf(jobId)
    if (isIt(job)) return job
  }
  throw new Error('The job did not come to it.')
}

describe('an upload above the cap', () => {
  it('is refused by its length before a byte of it is read, and leaves nothing', async () => {
    expect(await sendBody(record(cap + mebibyte), { length: 10 * cap })).toEqual({ status: 413, code: 'too_large' })
    expect(stored()).toEqual(before)
  })

  it('is refused while it streams in chunks, with memory flat, and leaves nothing', async () => {
    await sendBody(record(cap / 4)) // warm: what a first upload takes for good
    const settled = stored()
    const idle = residentMiB()
    let most = idle
    const watching = setInterval(() => { most = Math.max(most, residentMiB()) }, 20)
    const answers: Sent[] = []
    try {
      for (let n = 0; n < 4; n++) answers.push(await sendBody(record(2 * cap)))
    }
    finally {
      clearInterval(watching)
    }
    expect(answers).toEqual(Array.from({ length: 4 }, () => ({ status: 413, code: 'too_large' })))
    expect(stored()).toEqual(settled)
    // Four bodies that were held would be 96 MiB and more; what stays is the streams' own buffers and what the collector has not taken yet.
    console.log(`resident memory: ${idle.toFixed(0)} MiB idle, ${most.toFixed(0)} MiB at most over ${4 * cap / mebibyte} MiB of refused uploads`)
    expect(most - idle).toBeLessThan(72)
  })

  it('counts what a packed file holds, not what it weighs', async () => {
    const { gzipSync } = await import('node:zlib')
    const packed = gzipSync(Buffer.from(head + row(1).repeat(Math.ceil(1.5 * cap / row(1).length))))
    expect(packed.length).toBeLessThan(cap / 10)
    const answer = await sendBody(Readable.from([packed]), { length: packed.length, name: 'record.csv.gz' })
    expect(answer).toEqual({ status: 413, code: 'file_too_large_unpacked' })
    expect(stored()).toEqual(before)
  })
})

describe('an upload or an import that is broken off', () => {
  it('leaves nothing of an upload whose sender went away', async () => {
    await sendBody(record(cap), { abortAfter: 8 * mebibyte })
    await expect.poll(stored, { timeout: 10_000 }).toEqual(before)
  })

  it('leaves nothing of an import that was cancelled while it ran, and the file can be imported after', async () => {
    const lines = Array.from({ length: 400_000 }, (_, n) => row(n)).join('')
    const upload = await uploadText(head + lines, 'long.csv')
    const uploaded = stored()
    const jobId = await startImport(upload)
    await untilJob(jobId, job => job.state === 'running' && job.rows > 0)
    const answer = await technician.send('POST', `${base}/jobs/${jobId}/cancel`, {})
    expect(answer.status, await answer.text()).toBeLessThan(300)
    expect((await untilJob(jobId, job => job.state !== 'running')).state).toBe('cancelled')
    await expect.poll(stored, { timeout: 10_000 }).toEqual(uploaded)
    expect((await untilJob(await startImport(upload), job => job.state === 'done')).dataSets[0]?.rowsTaken).toBe(400_000)
  })
})

describe('a name that somebody gave a file', () => {
  const text = head + Array.from({ length: 20 }, (_, n) => row(n)).join('')
  it.each([
    ['../../../etc/passwd', 'passwd'],
    ['..\\..\\windows\\roof.csv', 'roof.csv'],
    ['/abs/olute.csv', 'olute.csv'],
    ['..', 'record'],
    ['a\u0000b\r\nSet-Cookie: x=1.csv', 'abSet-Cookie: x=1.csv'],
    ['\u202Evsc.exe', 'vsc.exe'],
  ])('%j is shown as %j and becomes no path', async (given, shown) => {
    expect((await uploadText(text, given)).name).toBe(shown)
    const known = new Set(before.files)
    for (const file of stored().files.filter(one => !known.has(one))) expect(file).toMatch(/\/files\/[0-9a-f]{2}\/[0-9a-f]{64}$/)
  })

  it('is handed out as a download that no page shows or runs, under its own name (RFC 6266)', async () => {
    const html = `${head}${row(1)}${row(2)}${row(3)}`
    const upload = await uploadText(html, 'Messung "Dach" – 100 %.html')
    const job = await untilJob(await startImport(upload), one => one.state === 'done')
    const answer = await technician.ask(`${base}/versions/${job.dataSets[0]!.versionId}/source`)
    const at = (name: string) => answer.headers.get(name) ?? ''
    expect(answer.status).toBe(200)
    expect(await answer.text()).toBe(html)
    expect(at('content-type')).toBe('application/octet-stream')
    expect(at('x-content-type-options')).toBe('nosniff')
    expect(at('content-security-policy')).toMatch(/default-src 'none'.*sandbox/)
    expect(at('content-disposition')).toBe('attachment; filename="Messung _Dach_ _ 100 _.html"; filename*=UTF-8\'\'Messung%20%22Dach%22%20%E2%80%93%20100%20%25.html')
    const refused = await technician.ask(`${base}/versions/${job.dataSets[0]!.versionId}/refused.csv`)
    await refused.arrayBuffer()
    expect([refused.status, refused.headers.get('content-disposition')?.startsWith('attachment; filename="'), refused.headers.get('x-content-type-options')]).toEqual([200, true, 'nosniff'])
    expect(refused.headers.get('content-security-policy')).toMatch(/sandbox/)
  })
})
